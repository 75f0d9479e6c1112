import type { Knex } from "knex";
import { db, transaction } from "@/db";
import { contentHash } from "@/lib/evaluator";
import type { CalculationFile, Draft, Visibility } from "@/lib/schema";
import { type Actor, type Permitted, permit } from "./access";
import {
  type CalculationRecord,
  deleteCalculation,
  findRevision,
  insertCalculation,
  insertRevision,
  updateVisibility,
} from "./draft-rows";
import { newCalculationId } from "./ids";
import { isRefused, type Refusal } from "./refusal";
import { listVersions } from "./version-rows";

/** What a save is acknowledged with, once it is on disk. */
export type Saved = { id: string; revision: number; savedAt: string };

/** Somebody saved first: here is what they saved. */
export type Stale = { refused: "stale"; current: Draft };

const now = () => new Date().toISOString();

/** The draft as its readers get it. Throws when the current revision is not there: damaged data. */
export async function loadDraft(tx: Knex, { calculation, role }: Permitted): Promise<Draft> {
  const revision = await findRevision(tx, calculation.id, calculation.revision);
  if (!revision)
    throw new Error(`Calculation ${calculation.id} lacks its revision ${calculation.revision}.`);
  return {
    id: calculation.id,
    file: revision.file,
    revision: revision.number,
    role,
    visibility: calculation.visibility,
    savedAt: revision.savedAt,
    versions: await listVersions(tx, calculation.id),
  };
}

/** Starts a private calculation with its first revision. Returns once it is on disk. */
export async function createCalculation(
  actor: { id: string },
  file: CalculationFile,
): Promise<Saved> {
  const id = newCalculationId();
  const at = now();
  await transaction(async (tx) => {
    await insertCalculation(tx, { id, ownerId: actor.id, at });
    const hash = contentHash(file);
    await insertRevision(tx, { calculation: id, after: 0, authorId: actor.id, file, hash, at });
  });
  return { id, revision: 1, savedAt: at };
}

/** The current draft, for those who may read it. */
export async function readDraft(actor: Actor, id: string): Promise<Draft | Refusal> {
  const permitted = await permit(db(), actor, "read-draft", id);
  return isRefused(permitted) ? permitted : loadDraft(db(), permitted);
}

type SaveDecision = "write" | "unchanged" | "stale";

/** Whether a save goes through: who read the latest revision writes; a repeated save is no other. */
export function decideSave(
  current: { revision: number; hash: string },
  offered: { revision: number; hash: string },
): SaveDecision {
  if (offered.hash === current.hash) return "unchanged";
  return offered.revision === current.revision ? "write" : "stale";
}

async function writeDraft(
  tx: Knex,
  calculation: CalculationRecord,
  file: CalculationFile,
  hash: string,
): Promise<Saved> {
  const at = now();
  const entry = { calculation: calculation.id, after: calculation.revision };
  const authorId = calculation.ownerId;
  const written = await insertRevision(tx, { ...entry, authorId, file, hash, at });
  if (!written) throw new Error("The draft moved on within its own transaction.");
  return { id: calculation.id, revision: calculation.revision + 1, savedAt: at };
}

/**
 * Saves a draft that was made from `revision`. When somebody saved in between, nothing is written
 * and the answer carries their draft, to be merged. The same content again is acknowledged with the
 * revision that holds it. Returns once it is on disk.
 */
export async function saveDraft(
  actor: Actor,
  id: string,
  offered: { file: CalculationFile; revision: number },
): Promise<Saved | Stale | Refusal> {
  const hash = contentHash(offered.file);
  return transaction(async (tx): Promise<Saved | Stale | Refusal> => {
    const permitted = await permit(tx, actor, "edit", id);
    if (isRefused(permitted)) return permitted;
    const { calculation } = permitted;
    const current = await loadDraft(tx, permitted);
    const decision = decideSave(
      { revision: current.revision, hash: contentHash(current.file) },
      { revision: offered.revision, hash },
    );
    if (decision === "stale") return { refused: "stale", current };
    if (decision === "unchanged")
      return { id, revision: current.revision, savedAt: current.savedAt };
    return writeDraft(tx, calculation, offered.file, hash);
  });
}

/** Opens a calculation to others, or closes it. */
export async function changeVisibility(
  actor: Actor,
  id: string,
  visibility: Visibility,
): Promise<{ id: string; visibility: Visibility } | Refusal> {
  return transaction(async (tx) => {
    const permitted = await permit(tx, actor, "change-visibility", id);
    if (isRefused(permitted)) return permitted;
    await updateVisibility(tx, id, visibility);
    return { id, visibility };
  });
}

/** Throws a draft away, with its revisions, as long as nothing of it can have been cited. */
export async function deleteDraft(
  actor: Actor,
  id: string,
): Promise<{ deleted: true } | { refused: "has-versions" } | Refusal> {
  return transaction(async (tx) => {
    const permitted = await permit(tx, actor, "edit", id);
    if (isRefused(permitted)) return permitted;
    if ((await listVersions(tx, id)).length > 0) return { refused: "has-versions" as const };
    await deleteCalculation(tx, id);
    return { deleted: true as const };
  });
}
