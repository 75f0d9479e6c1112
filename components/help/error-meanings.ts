import type { ErrorCode } from "@/lib/schema";

/** What each error code means, in the order of the contract. */
export const errorMeanings: Record<ErrorCode, string> = {
  syntax: "The formula cannot be read. The place is marked, often with what would mend it.",
  "unknown-name": "A name is neither defined here, nor a constant of the edition, nor a unit.",
  dimension: "Two sides have different dimensions; the message says by what they differ.",
  unit: "This is no unit, or one of another dimension than the value.",
  cycle: "Relations define each other in a circle; its members are named.",
  "duplicate-name": "A symbol is defined twice.",
  domain: "A function has no real value there, as the square root of a negative number.",
  overflow: "The value is too large or too small for a double.",
  forbidden: "This is not part of the language of formulas.",
  limit: "A limit was met: of length, depth, size, time or memory.",
  depends: "A cell it needs has an error; that one is named.",
  "no-solution": "No value of the given makes it true in the range.",
};
