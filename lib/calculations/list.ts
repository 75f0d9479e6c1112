import { db } from "@/db";
import { decodeCursor, encodeCursor } from "@/lib/http/cursor";
import type { CalculationPage } from "@/lib/schema";
import type { Actor } from "./access";
import { listSummaries } from "./list-rows";

const pageLength = 30;
/** More words than this do not narrow a search. */
const mostWords = 8;

export type ListQuery = {
  /** One's own calculations, by their drafts; or the public ones, by their latest versions. */
  scope: "mine" | "public";
  /** Words to find in titles, abstracts and names; all must be there. */
  q?: string | undefined;
  cursor?: string | undefined;
};

function placeOf(cursor: string | undefined) {
  if (!cursor) return undefined;
  const [at, id] = decodeCursor(cursor);
  return { at: String(at), id: String(id) };
}

/**
 * A page of a list, the latest first. A visitor's own list is empty. Throws a validation problem for
 * a cursor that is none.
 */
export async function listCalculations(actor: Actor, query: ListQuery): Promise<CalculationPage> {
  if (query.scope === "mine" && !actor) return { items: [], nextCursor: null };
  const words = (query.q ?? "").split(/\s+/).filter(Boolean).slice(0, mostWords);
  const ownerId = query.scope === "mine" ? actor?.id : undefined;
  const after = placeOf(query.cursor);
  // One more than the page, to know whether there is another.
  const found = await listSummaries(db(), { ownerId, words, after, length: pageLength + 1 });
  const items = found.slice(0, pageLength);
  const last = items.at(-1);
  const more = found.length > pageLength && last;
  return { items, nextCursor: more ? encodeCursor([last.updatedAt, last.id]) : null };
}
