/** One half of a pair of UTF-16 units: no character, and nothing that UTF-8 can write. */
const halfCharacter = /\p{Cs}/u;

/** Whether every text in a JSON value is whole characters, so that it can be hashed and written. */
export function isWellFormed(value: unknown): boolean {
  if (typeof value === "string") return !halfCharacter.test(value);
  if (typeof value !== "object" || value === null) return true;
  return Object.values(value).every(isWellFormed);
}

/** The sentence for a text that is not. */
export const illFormedSentence =
  "A text holds half a character (a lone surrogate), which no file can hold. Type it again.";
