export { bundleFile } from "./bundle";
export { canonicalText, contentHash, editionHash, textHash, versionHash } from "./content-hash";
export { evaluate, recompute } from "./evaluate";
export { closeEvaluators, evaluatorIsWarm, startEvaluators } from "./evaluators";
export { compareResults, uncertaintyTolerance, valueTolerance, verdictOn } from "./verdict";
export { EvaluatorBusyError } from "./waiting-line";
