import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { safeReturnPath } from "@/lib/http";

describe("safeReturnPath", () => {
  it.each(["/", "/desk", "/c/0123456789/v/1", "/c/a?from=a.1&to=b.2#r1", "/c/1?next=//x.example"])(
    "keeps %s",
    (path) => {
      expect(safeReturnPath(path)).toBe(path);
    },
  );

  it.each([
    null,
    undefined,
    "",
    "desk",
    "https://evil.example",
    "//evil.example",
    "///evil.example",
    "/\\evil.example",
    "\\/evil.example",
    "/\t/evil.example",
    "/\n/evil.example",
    "/..//evil.example",
    "/.//evil.example",
    "/%2e%2e//evil.example",
    "/c/../..//evil.example",
    "/a/..//evil.example/x",
    "javascript:alert(1)",
    "data:text/html,x",
    "/ok\r\nSet-Cookie: a=b",
    "@evil.example",
    ".evil.example",
  ])("leads to the desk instead of %j", (path) => {
    expect(safeReturnPath(path)).toBe("/desk");
  });

  it("never leaves the product, whatever was asked", () => {
    const parts = fc.constantFrom(
      "/",
      "\\",
      "..",
      ".",
      "%2e",
      "%2f",
      "@",
      ":",
      "evil.example",
      "a",
      "?",
      "#",
      "\t",
    );
    const asked = fc.oneof(
      fc.array(parts).map((list) => list.join("")),
      fc.webUrl(),
      fc.string(),
    );
    fc.assert(
      fc.property(asked, (path) => {
        const url = new URL(safeReturnPath(path), "https://estimates.example/sign-in");
        expect(url.origin).toBe("https://estimates.example");
      }),
      { numRuns: 3000 },
    );
  });
});
