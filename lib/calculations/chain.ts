import { contentHash, versionHash } from "@/lib/evaluator/content-hash";
import { calculationOf, type VersionFile } from "@/lib/schema";

/** What is wrong with a stored version, as data. */
export type ChainFault = {
  number: number;
  code: "content-hash" | "results-hash" | "previous-hash" | "gap";
};

function faultsOf(file: VersionFile, previous: VersionFile | undefined): ChainFault["code"][] {
  const { version, results } = file;
  const hash = contentHash(calculationOf(file));
  const codes: ChainFault["code"][] = [];
  if (version.number !== (previous?.version.number ?? 0) + 1) codes.push("gap");
  if (version.contentHash !== hash) codes.push("content-hash");
  if (results.contentHash !== hash) codes.push("results-hash");
  if (version.previousHash !== (previous ? versionHash(previous) : null))
    codes.push("previous-hash");
  return codes;
}

/**
 * Checks the versions of one calculation, in order: numbers without a gap, each content with the
 * hash it records, each version with the hash of the whole one before it.
 */
export function checkChain(versions: readonly VersionFile[]): ChainFault[] {
  return versions.flatMap((file, index) =>
    faultsOf(file, versions[index - 1]).map((code) => ({ number: file.version.number, code })),
  );
}
