import { describe, expect, it } from "vitest";
import { maybeCalculationId, newCalculationId } from "@/lib/calculations/ids";

describe("a calculation id", () => {
  it("has ten characters of Crockford's alphabet and is not met twice", () => {
    const made = Array.from({ length: 2_000 }, newCalculationId);
    for (const id of made) expect(id).toMatch(/^[0-9a-hjkmnp-tv-z]{10}$/);
    expect(new Set(made).size).toBe(made.length);
    expect(new Set(made.join("")).size).toBe(32);
  });

  it("is understood as people write it", () => {
    expect(maybeCalculationId("OIL0A1B2C3")).toBe("0110a1b2c3");
  });

  it.each(["", "short", "abcdefghjkm", "abcdefghju", "../../etc/", "abcdefghj "])(
    "is not “%s”",
    (typed) => expect(maybeCalculationId(typed)).toBeUndefined(),
  );
});
