import type { Knex } from "knex";
import { type Action, type Actor, can, roleOf } from "@/lib/auth/permissions";
import type { Role } from "@/lib/schema";
import { type CalculationRecord, findCalculation } from "./draft-rows";
import { forbidden, missing, type Refusal } from "./refusal";

export type { Action, Actor };

/** A calculation that somebody may do something with, and as whom. */
export type Permitted = { calculation: CalculationRecord; role: Role };

/**
 * The calculation, if the actor may do this to it. What is private is `missing` to everybody it is
 * not open to, just like what was never there.
 */
export async function permit(
  tx: Knex,
  actor: Actor,
  action: Action,
  id: string,
): Promise<Permitted | Refusal> {
  const calculation = await findCalculation(tx, id);
  const role = calculation && roleOf(actor, calculation);
  if (!calculation || !role) return missing;
  return can(actor, action, calculation) ? { calculation, role } : forbidden;
}
