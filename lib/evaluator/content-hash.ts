import { createHash } from "node:crypto";
import canonicalize from "canonicalize";
import { type EditionName, editionText } from "@/lib/physics";
import type { CalculationFile, VersionFile } from "@/lib/schema";

/** How every hash of the product is written: the algorithm, a colon, hexadecimal digits. */
const hashPrefix = "sha256:";

/** SHA-256 of a text as UTF-8, written `sha256:<64 hexadecimal digits>`. */
export function textHash(text: string): string {
  return hashPrefix + createHash("sha256").update(text, "utf8").digest("hex");
}

/**
 * The RFC 8785 canonical form of a JSON value: keys sorted, no white space, one way of writing each
 * number. Throws on what JSON cannot hold: NaN, infinities, lone surrogates, cycles.
 */
export function canonicalText(value: unknown): string {
  const text = canonicalize(value);
  if (text === undefined) throw new TypeError("This value has no JSON form.");
  return text;
}

/**
 * The content hash of a calculation file: SHA-256 of its RFC 8785 canonical form. It does not
 * depend on the order of keys or on white space, and on nothing that is not in the file.
 */
export function contentHash(file: CalculationFile): string {
  return textHash(canonicalText(file));
}

/** The hash of a constants edition: SHA-256 of its rows as `lib/physics` writes them out. */
export function editionHash(name: EditionName): string {
  return textHash(editionText(name));
}

/**
 * The hash of a whole version file, recorded results and provenance included. The next version
 * records it as `previousHash`, so that no version can be changed without breaking the chain.
 */
export function versionHash(file: VersionFile): string {
  return textHash(canonicalText(file));
}
