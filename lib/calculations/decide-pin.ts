import type { Results, VersionFile, VersionInfo } from "@/lib/schema";

/** A cell that keeps a draft from being pinned without saying so. */
export type FaultyCell = { cell: string; code: string; message: string };

export type PinDecision =
  | { pin: true; number: number }
  | { refused: "errors"; cells: FaultyCell[] }
  | { refused: "same"; version: number };

/** The cells of results that have an error, in the order of the calculation. */
export function faultyCells(results: Results): FaultyCell[] {
  return Object.entries(results.cells).flatMap(([cell, result]) =>
    result.status === "error"
      ? [{ cell, code: result.error.code, message: result.error.message }]
      : [],
  );
}

/** What the decision needs to know of a version that is there already. */
export type Pinned = Pick<VersionInfo, "number" | "contentHash"> & { withdrawn: boolean };

/**
 * Whether a draft becomes a version. The same content is pinned once: a second number for it would
 * make two citations of one thing; only when that version was withdrawn it may come back. Cells with errors are pinned only by who says so.
 */
export function decidePin(
  pinned: readonly Pinned[],
  results: Results,
  acceptErrors: boolean,
): PinDecision {
  const same = pinned.find(
    (version) => !version.withdrawn && version.contentHash === results.contentHash,
  );
  if (same) return { refused: "same", version: same.number };
  const cells = faultyCells(results);
  if (cells.length > 0 && !acceptErrors) return { refused: "errors", cells };
  return { pin: true, number: Math.max(0, ...pinned.map((version) => version.number)) + 1 };
}

/** A calculation, its results and its provenance as one version file. */
export function versionFile(
  calculation: Omit<VersionFile, "version" | "results">,
  version: VersionInfo,
  results: Results,
): VersionFile {
  return { ...calculation, version, results };
}
