import type { Knex } from "knex";
import type { CalculationSummary } from "@/lib/schema";

/** What a list is asked for: whose, which words, and where the page before it ended. */
export type ListSelection = {
  /** Own calculations by their drafts; without it, public ones by their latest version. */
  ownerId?: string | undefined;
  words: readonly string[];
  after?: { at: string; id: string } | undefined;
  length: number;
};

type SummaryRow = {
  id: string;
  visibility: CalculationSummary["visibility"];
  owner: string;
  revision: number;
  latest: number | null;
  updated_at: string;
  title: string;
  abstract: string | null;
};

const reshape = (row: SummaryRow): CalculationSummary => ({
  id: row.id,
  title: row.title,
  abstract: row.abstract ?? "",
  visibility: row.visibility,
  owner: row.owner,
  revision: row.revision,
  latestVersion: row.latest,
  updatedAt: row.updated_at,
});

/** `%` and `_` mean themselves in a search: the pattern that finds a text anywhere. */
export function containsPattern(text: string): string {
  return `%${text.toLowerCase().replaceAll(/[!%_]/g, "!$&")}%`;
}

/** The number of the latest version that stands, of the calculation in the outer query. */
function latestVersion(tx: Knex) {
  return tx({ standing: "versions" })
    .max("standing.number")
    .whereRaw("standing.calculation_id = calculations.id")
    .whereNull("standing.withdrawn_at");
}

/** One row for each calculation of a person, as their drafts stand. */
function ownDrafts(tx: Knex, ownerId: string) {
  return tx("calculations")
    .join("users", "users.id", "calculations.owner_id")
    .where("calculations.owner_id", ownerId)
    .select(
      "calculations.id",
      "calculations.visibility",
      "calculations.revision",
      "calculations.updated_at",
      "calculations.title",
      "calculations.abstract",
      { owner: "users.name", latest: latestVersion(tx) },
    );
}

/**
 * One row for each public calculation that has a version, as that version stands: what its authors
 * have saved since then is not for everybody.
 */
function publicVersions(tx: Knex) {
  return tx("calculations")
    .join("users", "users.id", "calculations.owner_id")
    .join("versions", "versions.calculation_id", "calculations.id")
    .where("calculations.visibility", "public")
    .where("versions.number", latestVersion(tx))
    .select("calculations.id", "calculations.visibility", "calculations.revision", {
      updated_at: "versions.pinned_at",
      owner: "users.name",
      latest: "versions.number",
    })
    .jsonExtract([
      ["versions.body", "$.title", "title"],
      ["versions.body", "$.abstract", "abstract"],
    ]);
}

/** The page of a list: the words found, behind the cursor, latest first. */
export async function listSummaries(
  tx: Knex,
  selection: ListSelection,
): Promise<CalculationSummary[]> {
  const { ownerId, words, after, length } = selection;
  const source = ownerId === undefined ? publicVersions(tx) : ownDrafts(tx, ownerId);
  const rows = tx
    .from(source.as("listed"))
    .orderBy([
      { column: "updated_at", order: "desc" },
      { column: "id", order: "desc" },
    ])
    .limit(length);
  for (const word of words) {
    const pattern = containsPattern(word);
    const found = ["title", "abstract", "owner"].map(
      (column) => `lower(${column}) LIKE ? ESCAPE '!'`,
    );
    rows.whereRaw(`(${found.join(" OR ")})`, [pattern, pattern, pattern]);
  }
  if (after) rows.whereRaw("(updated_at, id) < (?, ?)", [after.at, after.id]);
  return (await rows.select<SummaryRow[]>()).map(reshape);
}
