export type { Actor } from "./access";
export { type ChainFault, checkChain } from "./chain";
export { type FaultyCell, faultyCells } from "./decide-pin";
export { listCalculationIds } from "./draft-rows";
export {
  changeVisibility,
  createCalculation,
  deleteDraft,
  readDraft,
  type Saved,
  type Stale,
  saveDraft,
} from "./drafts";
export { maybeCalculationId, newCalculationId } from "./ids";
export { type ListQuery, listCalculations } from "./list";
export { type Conflict, type Merge, merge, sameValue, settle } from "./merge";
export { type Overview, readOverview } from "./overview";
export { type FileReading, mostFileBytes, readCalculationFile } from "./read-file";
export { isRefused, type Refusal } from "./refusal";
export { type Finding, verifyCalculation } from "./verify";
export type { StoredVersion } from "./version-rows";
export {
  type PinnedVersion,
  type Pinning,
  pinVersion,
  readVersion,
  recomputeVersion,
  type Tampered,
  type VersionReading,
  versionPath,
  type Withdrawn,
  withdrawVersion,
} from "./versions";
export { illFormedSentence, isWellFormed } from "./well-formed";
