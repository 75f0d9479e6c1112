import type { Knex } from "knex";
import { calculationOf, type Draft, type VersionFile, versionFileSchema } from "@/lib/schema";
import type { Pinned } from "./decide-pin";

/** A version as it is kept: the file that never changes, and the notice that may be put above it. */
export type StoredVersion = {
  file: VersionFile;
  withdrawn: { at: string; reason: string } | null;
};

type VersionRow = {
  calculation_id: string;
  number: number;
  body: string;
  results: string;
  content_hash: string;
  edition_hash: string;
  engine: string;
  authors: string;
  summary: string;
  lineage: string;
  previous_hash: string | null;
  pinned_at: string;
  withdrawn_at: string | null;
  withdrawn_reason: string | null;
};

/** The version file, put together and parsed again as if it came from outside. */
function reshape(row: VersionRow): StoredVersion {
  const file = versionFileSchema.parse({
    ...JSON.parse(row.body),
    version: {
      calculation: row.calculation_id,
      number: row.number,
      summary: row.summary,
      authors: JSON.parse(row.authors),
      pinnedAt: row.pinned_at,
      lineage: JSON.parse(row.lineage),
      engine: row.engine,
      editionHash: row.edition_hash,
      contentHash: row.content_hash,
      previousHash: row.previous_hash,
    },
    results: JSON.parse(row.results),
  });
  const withdrawn =
    row.withdrawn_at === null ? null : { at: row.withdrawn_at, reason: row.withdrawn_reason ?? "" };
  return { file, withdrawn };
}

/** One version, or undefined. Throws when what is stored is not a version file any more. */
export async function findVersion(
  tx: Knex,
  calculation: string,
  number: number,
): Promise<StoredVersion | undefined> {
  const row = await tx("versions")
    .where({ calculation_id: calculation, number })
    .first<VersionRow | undefined>();
  return row && reshape(row);
}

/** The latest version of a calculation, or undefined when none was pinned. */
export async function findLatestVersion(
  tx: Knex,
  calculation: string,
): Promise<StoredVersion | undefined> {
  const row = await tx("versions")
    .where({ calculation_id: calculation })
    .orderBy("number", "desc")
    .first<VersionRow | undefined>();
  return row && reshape(row);
}

/** The versions of a calculation for a list, first one first. */
export async function listVersions(tx: Knex, calculation: string): Promise<Draft["versions"]> {
  const rows = await tx("versions")
    .where({ calculation_id: calculation })
    .orderBy("number")
    .select<Pick<VersionRow, "number" | "summary" | "pinned_at" | "withdrawn_at">[]>(
      "number",
      "summary",
      "pinned_at",
      "withdrawn_at",
    );
  return rows.map((row) => ({
    number: row.number,
    summary: row.summary,
    pinnedAt: row.pinned_at,
    withdrawn: row.withdrawn_at !== null,
  }));
}

/** What the decision to pin needs to know of the versions there are. */
export async function listPinned(tx: Knex, calculation: string): Promise<Pinned[]> {
  const rows = await tx("versions")
    .where({ calculation_id: calculation })
    .select<Pick<VersionRow, "number" | "content_hash" | "withdrawn_at">[]>(
      "number",
      "content_hash",
      "withdrawn_at",
    );
  return rows.map((row) => ({
    number: row.number,
    contentHash: row.content_hash,
    withdrawn: row.withdrawn_at !== null,
  }));
}

/** Writes a version; nothing in it can be changed afterwards. */
export async function insertVersion(tx: Knex, authorId: string, file: VersionFile): Promise<void> {
  const { version, results } = file;
  await tx("versions").insert({
    calculation_id: version.calculation,
    number: version.number,
    body: JSON.stringify(calculationOf(file)),
    results: JSON.stringify(results),
    content_hash: version.contentHash,
    edition: file.edition,
    edition_hash: version.editionHash,
    engine: version.engine,
    author_id: authorId,
    authors: JSON.stringify(version.authors),
    summary: version.summary,
    lineage: JSON.stringify(version.lineage),
    previous_hash: version.previousHash,
    pinned_at: version.pinnedAt,
  });
}

/** Puts the withdrawal on a version that has none; false when it has one. */
export async function markWithdrawn(
  tx: Knex,
  calculation: string,
  number: number,
  withdrawn: { at: string; reason: string },
): Promise<boolean> {
  const marked = await tx("versions")
    .where({ calculation_id: calculation, number, withdrawn_at: null })
    .update({ withdrawn_at: withdrawn.at, withdrawn_reason: withdrawn.reason });
  return marked > 0;
}

/** The numbers of the versions there are, first one first. */
export async function listVersionNumbers(tx: Knex, calculation: string): Promise<number[]> {
  return tx("versions").where({ calculation_id: calculation }).orderBy("number").pluck("number");
}
