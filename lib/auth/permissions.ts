import type { Role, Visibility } from "@/lib/schema";

/** What may be done to a calculation or to one of its versions. */
export type Action =
  | "read-version"
  | "recompute"
  | "read-draft"
  | "edit"
  | "pin"
  | "withdraw"
  | "change-visibility";

/** Somebody who asks: a signed-in person, or nobody in particular. */
export type Actor = { readonly id: string } | null;

/** What of a calculation decides who may do what. */
export interface Guarded {
  readonly ownerId: string;
  readonly visibility: Visibility;
}

/**
 * The table of who may do what. A reader by a public link reads and recomputes versions; the draft,
 * and everything that changes something, is the author's.
 */
const allowed: Record<Action, { author: boolean; public: boolean }> = {
  "read-version": { author: true, public: true },
  recompute: { author: true, public: true },
  "read-draft": { author: true, public: false },
  edit: { author: true, public: false },
  pin: { author: true, public: false },
  withdraw: { author: true, public: false },
  "change-visibility": { author: true, public: false },
};

/** The role somebody has on a calculation; undefined where even its existence is private. */
export function roleOf(actor: Actor, calculation: Guarded): Role | undefined {
  if (actor?.id === calculation.ownerId) return "author";
  return calculation.visibility === "private" ? undefined : "public";
}

/** Whether somebody may do something: the one place where this is decided. */
export function can(actor: Actor, action: Action, calculation: Guarded): boolean {
  const role = roleOf(actor, calculation);
  return role !== undefined && allowed[action][role === "author" ? "author" : "public"];
}
