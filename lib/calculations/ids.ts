import { randomBytes } from "node:crypto";

/** Crockford's base 32 in lower case: no i, l, o or u, so that an id can be read aloud and typed. */
const alphabet = "0123456789abcdefghjkmnpqrstvwxyz";
const idLength = 10;

/** A new calculation id: 10 characters, 50 random bits. */
export function newCalculationId(): string {
  // 256 is a multiple of 32: every character is equally likely.
  return Array.from(randomBytes(idLength), (byte) => alphabet[byte % alphabet.length]).join("");
}

/** The id as it is stored, from one that was typed or read aloud; undefined when it is none. */
export function maybeCalculationId(typed: string): string | undefined {
  const id = typed.toLowerCase().replaceAll(/[il]/g, "1").replaceAll("o", "0");
  const isId = id.length === idLength && [...id].every((letter) => alphabet.includes(letter));
  return isId ? id : undefined;
}
