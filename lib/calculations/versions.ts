import type { Knex } from "knex";
import { db, transaction } from "@/db";
import { contentHash, editionHash, evaluate, recompute, versionHash } from "@/lib/evaluator";
import {
  type CalculationFile,
  calculationOf,
  type Draft,
  type Results,
  type Role,
  type Verdict,
  type Visibility,
} from "@/lib/schema";
import { type Actor, type Permitted, permit } from "./access";
import { decidePin, type PinDecision, versionFile } from "./decide-pin";
import { loadDraft, type Stale } from "./drafts";
import { isRefused, type Refusal } from "./refusal";
import {
  findLatestVersion,
  findVersion,
  insertVersion,
  listPinned,
  markWithdrawn,
  type StoredVersion,
} from "./version-rows";

export type Pinning = {
  summary: string;
  /** Pin although cells have errors. */
  acceptErrors?: boolean | undefined;
  /** The revision that was on the page; when given, a later one is not pinned unseen. */
  revision?: number | undefined;
};
export type PinnedVersion = { version: number; contentHash: string; url: string };
type PinRefusal = Extract<PinDecision, { refused: string }>;

/** The address of a version, from the root of the product. */
export const versionPath = (id: string, number: number) => `/c/${id}/v/${number}`;

const now = () => new Date().toISOString();

/** The next version file of a calculation, chained to the one before it. */
async function nextVersion(
  tx: Knex,
  { calculation }: Permitted,
  content: { file: CalculationFile; results: Results; summary: string; number: number },
) {
  const previous = await findLatestVersion(tx, calculation.id);
  const { file, results, summary, number } = content;
  const version = {
    calculation: calculation.id,
    number,
    summary,
    authors: [calculation.ownerName],
    pinnedAt: now(),
    lineage: [],
    engine: results.engine,
    editionHash: editionHash(file.edition),
    contentHash: results.contentHash,
    previousHash: previous ? versionHash(previous.file) : null,
  };
  return versionFile(file, version, results);
}

/** Writes the version, unless the draft has moved on since it was evaluated. */
async function writeVersion(
  tx: Knex,
  actor: Actor,
  evaluated: { draft: Draft; results: Results },
  pinning: Pinning,
): Promise<PinnedVersion | PinRefusal | Stale | Refusal> {
  const { draft, results } = evaluated;
  const permitted = await permit(tx, actor, "pin", draft.id);
  if (isRefused(permitted)) return permitted;
  if (permitted.calculation.revision !== draft.revision)
    return { refused: "stale", current: await loadDraft(tx, permitted) };
  const pinned = await listPinned(tx, draft.id);
  const decision = decidePin(pinned, results, pinning.acceptErrors ?? false);
  if (isRefused(decision)) return decision;
  const { number } = decision;
  const content = { file: draft.file, results, summary: pinning.summary, number };
  await insertVersion(tx, permitted.calculation.ownerId, await nextVersion(tx, permitted, content));
  const { contentHash } = results;
  return { version: number, contentHash, url: versionPath(draft.id, number) };
}

/**
 * Pins the draft: evaluates it and keeps content, results and provenance as the next version.
 * Refused for a draft with errors (unless they are accepted), for content that is pinned already,
 * and when the draft is saved anew meanwhile. Returns once it is on disk.
 */
export async function pinVersion(
  actor: Actor,
  id: string,
  pinning: Pinning,
): Promise<PinnedVersion | PinRefusal | Stale | Refusal> {
  const permitted = await permit(db(), actor, "pin", id);
  if (isRefused(permitted)) return permitted;
  const draft = await loadDraft(db(), permitted);
  if (pinning.revision !== undefined && pinning.revision !== draft.revision)
    return { refused: "stale", current: draft };
  const results = await evaluate(draft.file);
  return transaction((tx) => writeVersion(tx, actor, { draft, results }, pinning));
}

export type VersionReading = StoredVersion & {
  role: Role;
  visibility: Visibility;
  /** The number of the latest version. */
  latest: number;
};

/** A version for those who may read it: its file, and the notice above it if it was withdrawn. */
export async function readVersion(
  actor: Actor,
  id: string,
  number: number,
): Promise<VersionReading | Refusal> {
  const permitted = await permit(db(), actor, "read-version", id);
  if (isRefused(permitted)) return permitted;
  const stored = await findVersion(db(), id, number);
  if (!stored) return { refused: "missing" };
  const latest = await findLatestVersion(db(), id);
  const { role, calculation } = permitted;
  return {
    ...stored,
    role,
    visibility: calculation.visibility,
    latest: latest?.file.version.number ?? number,
  };
}

/** What is stored is not what was pinned: its recorded hash is another. */
export type Tampered = { refused: "hash" };

function isAsPinned({ file }: StoredVersion): boolean {
  const hash = contentHash(calculationOf(file));
  return file.version.contentHash === hash && file.results.contentHash === hash;
}

/**
 * Evaluates a version again, under its own constants edition or another; saves nothing. Refused for
 * content that does not have the recorded hash, whose verdict would be on something else.
 */
export async function recomputeVersion(
  actor: Actor,
  id: string,
  number: number,
  edition?: CalculationFile["edition"],
): Promise<Verdict | Tampered | Refusal> {
  const reading = await readVersion(actor, id, number);
  if (isRefused(reading)) return reading;
  return isAsPinned(reading) ? recompute(reading.file, edition) : { refused: "hash" };
}

export type Withdrawn = { withdrawnAt: string; reason: string };

/** Withdraws a version, once: it stays readable, with the reason above it for everybody. */
export async function withdrawVersion(
  actor: Actor,
  id: string,
  number: number,
  reason: string,
): Promise<Withdrawn | { refused: "withdrawn" } | Refusal> {
  return transaction(async (tx) => {
    const permitted = await permit(tx, actor, "withdraw", id);
    if (isRefused(permitted)) return permitted;
    if (!(await findVersion(tx, id, number))) return { refused: "missing" as const };
    const at = now();
    const marked = await markWithdrawn(tx, id, number, { at, reason });
    return marked ? { withdrawnAt: at, reason } : { refused: "withdrawn" as const };
  });
}
