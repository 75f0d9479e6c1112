export { decodeCursor, encodeCursor } from "./cursor";
export {
  HttpProblem,
  type ProblemDetails,
  type ProblemType,
  problemResponse,
  problems,
} from "./problems";
export { addressOf, countTry, forgiveTries } from "./rate-limits";
export { safeReturnPath } from "./return-path";
export { json, route } from "./route";
