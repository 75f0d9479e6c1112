export { decodeCursor, encodeCursor } from "./cursor";
export { forgetAnswersBefore, forgetUnfinished } from "./idempotency";
export { addressOf, notePeerAddresses } from "./peer-address";
export {
  HttpProblem,
  type ProblemDetails,
  type ProblemType,
  problemResponse,
  problems,
} from "./problems";
export { countTry, forgiveEverybody, forgiveTries, type RateLimit } from "./rate-limits";
export { safeReturnPath } from "./return-path";
export { json, route } from "./route";
