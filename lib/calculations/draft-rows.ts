import type { Knex } from "knex";
import { type CalculationFile, calculationSchema, type Visibility } from "@/lib/schema";
import { revisionsToThin } from "./thinning";

/** A calculation without its body: whose it is, who may see it, and how far it has come. */
export type CalculationRecord = {
  id: string;
  ownerId: string;
  ownerName: string;
  visibility: Visibility;
  revision: number;
  updatedAt: string;
};

type CalculationRow = {
  id: string;
  owner_id: string;
  owner_name: string;
  visibility: Visibility;
  revision: number;
  updated_at: string;
};

const reshape = (row: CalculationRow): CalculationRecord => ({
  id: row.id,
  ownerId: row.owner_id,
  ownerName: row.owner_name,
  visibility: row.visibility,
  revision: row.revision,
  updatedAt: row.updated_at,
});

/** The calculation with this id, or undefined. */
export async function findCalculation(
  tx: Knex,
  id: string,
): Promise<CalculationRecord | undefined> {
  const row = await tx("calculations")
    .join("users", "users.id", "calculations.owner_id")
    .where("calculations.id", id)
    .first<CalculationRow | undefined>("calculations.*", { owner_name: "users.name" });
  return row && reshape(row);
}

/** A saved draft: one revision of a calculation. */
export type Revision = { number: number; file: CalculationFile; hash: string; savedAt: string };

/** One revision as it was saved, parsed again; undefined when it was never there or is thinned out. */
export async function findRevision(
  tx: Knex,
  calculation: string,
  number: number,
): Promise<Revision | undefined> {
  const row = await tx("revisions")
    .where({ calculation_id: calculation, number })
    .first<{ body: string; hash: string; saved_at: string } | undefined>(
      "body",
      "hash",
      "saved_at",
    );
  if (!row) return undefined;
  const file = calculationSchema.parse(JSON.parse(row.body));
  return { number, file, hash: row.hash, savedAt: row.saved_at };
}

/** Enters a new calculation without any revision. */
export async function insertCalculation(
  tx: Knex,
  entry: { id: string; ownerId: string; at: string },
): Promise<void> {
  await tx("calculations").insert({
    id: entry.id,
    owner_id: entry.ownerId,
    visibility: "private",
    revision: 0,
    title: "",
    abstract: "",
    created_at: entry.at,
    updated_at: entry.at,
  });
}

/**
 * Writes the next revision, if `after` still is the current one; false when somebody was faster.
 * Within a transaction: the number and the body are there together or not at all.
 */
export async function insertRevision(
  tx: Knex,
  entry: {
    calculation: string;
    after: number;
    authorId: string;
    file: CalculationFile;
    hash: string;
    at: string;
  },
): Promise<boolean> {
  const number = entry.after + 1;
  const moved = await tx("calculations")
    .where({ id: entry.calculation, revision: entry.after })
    .update({
      revision: number,
      title: entry.file.title,
      abstract: entry.file.abstract ?? "",
      updated_at: entry.at,
    });
  if (moved === 0) return false;
  await tx("revisions").insert({
    calculation_id: entry.calculation,
    number,
    author_id: entry.authorId,
    body: JSON.stringify(entry.file),
    hash: entry.hash,
    saved_at: entry.at,
  });
  await tx("revisions")
    .where({ calculation_id: entry.calculation })
    .whereIn("number", revisionsToThin(number))
    .delete();
  return true;
}

/** Sets who may see a calculation. */
export async function updateVisibility(
  tx: Knex,
  id: string,
  visibility: Visibility,
): Promise<void> {
  await tx("calculations").where({ id }).update({ visibility });
}

/** Removes a calculation and its revisions; the database refuses when it has versions. */
export async function deleteCalculation(tx: Knex, id: string): Promise<void> {
  await tx("revisions").where({ calculation_id: id }).delete();
  await tx("calculations").where({ id }).delete();
}

/** The numbers of the revisions that are kept, first one first. */
export async function listRevisionNumbers(tx: Knex, calculation: string): Promise<number[]> {
  return tx("revisions").where({ calculation_id: calculation }).orderBy("number").pluck("number");
}

/** The ids of all calculations, for upkeep. */
export async function listCalculationIds(tx: Knex): Promise<string[]> {
  return tx("calculations").orderBy("id").pluck("id");
}
