import { createHash } from "node:crypto";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { canonicalText, contentHash, editionHash, textHash } from "@/lib/evaluator/content-hash";
import type { CalculationFile } from "@/lib/schema";

const file: CalculationFile = {
  format: "leading-order/1",
  title: "Limiting luminosity",
  edition: "codata-2022",
  em: "si",
  cells: [
    { id: "g1", kind: "given", symbol: "M", value: 10, uncertainty: 0.5, unit: "Msun" },
    { id: "t1", kind: "text", markdown: "$L \\propto M$ — “as \u20ac\u{1d4d0}”" },
  ],
};

/** The same JSON value with the keys of every object in an order drawn from `random`. */
function shuffled(value: unknown, random: () => number): unknown {
  if (Array.isArray(value)) return value.map((item) => shuffled(item, random));
  if (typeof value !== "object" || value === null) return value;
  const entries = Object.entries(value).map(([key, item]) => [random(), key, item] as const);
  const turned = entries.sort((a, b) => a[0] - b[0]);
  return Object.fromEntries(turned.map(([, key, item]) => [key, shuffled(item, random)]));
}

describe("canonicalText", () => {
  it("writes the example of RFC 8785, section 3.2.2", () => {
    const example = JSON.parse(String.raw`{
      "numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
      "string": "\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\"\/",
      "literals": [null, true, false]
    }`);
    expect(canonicalText(example)).toBe(
      String.raw`{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\u000f\nA'B\"\\\\\"/"}`,
    );
  });

  it("refuses what JSON cannot hold", () => {
    for (const value of [Number.NaN, Number.POSITIVE_INFINITY, "\ud800", undefined])
      expect(() => canonicalText(value)).toThrow();
  });
});

describe("contentHash", () => {
  it("is SHA-256 of the canonical form", () => {
    const digest = createHash("sha256").update(canonicalText(file)).digest("hex");
    expect(contentHash(file)).toBe(`sha256:${digest}`);
  });

  it("does not depend on the order of keys, nor on white space", () => {
    fc.assert(
      fc.property(fc.infiniteStream(fc.double({ noNaN: true })), (stream) => {
        const turned = shuffled(file, () => stream.next().value as number) as CalculationFile;
        expect(contentHash(turned)).toBe(contentHash(file));
        expect(contentHash(JSON.parse(JSON.stringify(turned, null, 3)))).toBe(contentHash(file));
      }),
    );
  });

  it("changes with every change of the content", () => {
    const [given, text] = file.cells;
    if (given?.kind !== "given" || !text) throw new Error("the example has lost its cells");
    const changed: CalculationFile[] = [
      { ...file, title: "Limiting luminosity " },
      { ...file, edition: "codata-2018" },
      { ...file, em: "gaussian" },
      { ...file, cells: [text, given] },
      { ...file, cells: [{ ...given, value: 10.000000000000002 }, text] },
      { ...file, cells: [{ ...given, unit: "Msun " }, text] },
    ];
    expect(new Set([file, ...changed].map(contentHash)).size).toBe(changed.length + 1);
  });
});

describe("editionHash", () => {
  it("tells the editions apart and stays the same", () => {
    expect(editionHash("codata-2018")).toBe(editionHash("codata-2018"));
    expect(editionHash("codata-2018")).not.toBe(editionHash("codata-2022"));
    expect(editionHash("codata-2022")).toMatch(/^sha256:[0-9a-f]{64}$/);
  });
});

describe("textHash", () => {
  it("is the SHA-256 of UTF-8 text", () => {
    expect(textHash("")).toBe(
      "sha256:e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855",
    );
  });
});
