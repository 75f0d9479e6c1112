export { renamePerson } from "./people";
export { type Action, type Actor, can, type Guarded, roleOf } from "./permissions";
export {
  blankCookie,
  closeSession,
  listSessions,
  openSession,
  personFromRequest,
  revokeSession,
  type SignedIn,
} from "./sessions";
export { changePassword, requestReset, resetPassword, signIn } from "./sign-in";
export { confirmEmail, findPerson, resendConfirmation, signUp } from "./sign-up";
