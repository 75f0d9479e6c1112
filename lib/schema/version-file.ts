import { z } from "zod";
import { calculationSchema } from "./calculation";
import { resultsSchema } from "./results";

/** What a version file adds to the calculation it holds: who pinned it, when, and from what. */
export const versionInfoSchema = z.strictObject({
  calculation: z.string(),
  number: z.int().positive(),
  summary: z.string(),
  authors: z.array(z.string()),
  pinnedAt: z.string(),
  /** The chain of versions this one descends from, nearest first; empty without a fork. */
  lineage: z.array(z.strictObject({ calculation: z.string(), number: z.int().positive() })),
  engine: z.string(),
  editionHash: z.string(),
  contentHash: z.string(),
  previousHash: z.string().nullable(),
});

/** A version file: the calculation file plus `version` and `results`. */
export const versionFileSchema = calculationSchema.safeExtend({
  version: versionInfoSchema,
  results: resultsSchema,
});

export type VersionInfo = z.infer<typeof versionInfoSchema>;
export type VersionFile = z.infer<typeof versionFileSchema>;

/** The calculation inside a version file: the object whose content hash the version records. */
export function calculationOf(file: VersionFile) {
  const { version: _version, results: _results, ...calculation } = file;
  return calculation;
}
