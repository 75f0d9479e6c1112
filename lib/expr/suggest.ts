import { distance } from "fastest-levenshtein";
import { listConstants, listUnits, type UnitSystem } from "../physics";
import { functionNames } from "./functions";

/** Names that theorists write out of habit and what they usually mean here. */
const habits: Record<string, string> = {
  e: "For Euler’s number write exp(1); the elementary charge is q_e.",
  k: "The Boltzmann constant is k_B.",
  kb: "The Boltzmann constant is k_B.",
  sigma: "The Stefan–Boltzmann constant is sigma_SB, the Thomson cross-section sigma_T.",
  alpha: "The fine-structure constant is alpha_fs.",
  a: "The radiation constant is a_rad.",
  R: "The gas constant is R_gas.",
  ln: "The natural logarithm is log.",
  i: "There are no complex numbers here.",
  Inf: "There is no infinity; integrate to a large number instead.",
};

/** A remark for names written out of habit. */
export function habitHint(name: string): string | undefined {
  return Object.hasOwn(habits, name) ? habits[name] : undefined;
}

function closeness(name: string, candidate: string): number {
  if (name.toLowerCase() === candidate.toLowerCase()) return 0.5;
  if (name.replace(/_/g, "").toLowerCase() === candidate.replace(/_/g, "").toLowerCase())
    return 0.6;
  return distance(name, candidate);
}

/**
 * The name most likely meant: the closest among what the calculation defines, constants, units and
 * functions, if it is close enough to be a slip of the hand.
 */
export function suggestName(
  name: string,
  defined: Iterable<string>,
  system: UnitSystem,
): string | undefined {
  const constants = listConstants(system).map((constant) => constant.symbol);
  const units = listUnits(system).map((unit) => unit.symbol);
  const most = name.length <= 2 ? 0.6 : name.length <= 4 ? 1 : 2;
  let best: string | undefined;
  let least = most + 1e-9;
  for (const candidate of [...defined, ...constants, ...functionNames, ...units]) {
    const far = candidate === name ? Number.POSITIVE_INFINITY : closeness(name, candidate);
    if (far < least) [best, least] = [candidate, far];
  }
  return best;
}
