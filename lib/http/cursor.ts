import { HttpProblem } from "./problems";

/** A place in a list, as an opaque text for the caller to send back. */
export function encodeCursor(place: readonly (string | number)[]): string {
  return Buffer.from(JSON.stringify(place)).toString("base64url");
}

/** The place a cursor stands for. Throws a validation problem for a text that is no cursor. */
export function decodeCursor(cursor: string): (string | number)[] {
  try {
    const place: unknown = JSON.parse(Buffer.from(cursor, "base64url").toString("utf8"));
    if (
      Array.isArray(place) &&
      place.every((x) => typeof x === "string" || typeof x === "number")
    ) {
      return place;
    }
  } catch {
    // Told below, like any other text that is no cursor.
  }
  const errors = [{ path: "cursor", message: "This is not a cursor of this list." }];
  throw new HttpProblem("validation", { errors });
}
