import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { decodeCursor, encodeCursor } from "@/lib/http";

describe("a cursor", () => {
  it("comes back as it went, through a query", () => {
    fc.assert(
      fc.property(fc.array(fc.oneof(fc.string(), fc.integer())), (place) => {
        const cursor = encodeCursor(place);
        expect(encodeURIComponent(cursor)).toBe(cursor);
        expect(decodeCursor(cursor)).toEqual(place);
      }),
    );
  });

  it.each(["x", "e30", "bnVsbA", "W251bGxd", "W3siYSI6MX1d", "%%%"])("is not %s", (text) => {
    expect(() => decodeCursor(text)).toThrow(expect.objectContaining({ type: "validation" }));
  });
});
