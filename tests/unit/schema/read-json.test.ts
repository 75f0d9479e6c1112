import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { limits } from "@/lib/schema";
import { readJson } from "@/lib/schema/read-json";

const nested = (levels: number) => "[".repeat(levels) + "]".repeat(levels);

describe("readJson", () => {
  it("reads whatever JSON writes", () => {
    const tame = fc
      .jsonValue({ maxDepth: 8 })
      .filter((value) => !JSON.stringify(value).includes('"__proto__"'));
    fc.assert(
      fc.property(tame, (value) => {
        const text = JSON.stringify(value, null, 2);
        expect(readJson(text)).toEqual({ ok: true, value: JSON.parse(text) });
      }),
    );
  });

  it.each<[string, string, RegExp]>([
    ["a field twice", '{"a": 1, "a": 2}', /“a” stands twice/],
    ["a field twice in disguise", '{"a": 1, "\\u0061": 2}', /“a” stands twice/],
    ["a field twice deep inside", '[{"b": {"c": 1, "d": 2, "c": 3}}]', /“c” stands twice/],
    ["__proto__", '{"__proto__": {"admin": true}}', /__proto__/],
    ["__proto__ in disguise", '{"\\u005f_proto__": 1}', /__proto__/],
    ["a number beyond a double", '{"a": 1e999}', /larger than a double/],
    ["a negative one", "[-1e999]", /larger than a double/],
    ["a comment", '{"a": 1} // one', /not JSON/],
    ["a comment inside", '{"a": /* one */ 1}', /not JSON/],
    ["a comma at the end", '{"a": 1,}', /not JSON/],
    ["a comma at the end of a list", "[1, 2,]", /not JSON/],
    ["single quotes", "{'a': 1}", /not JSON/],
    ["NaN", '{"a": NaN}', /not JSON/],
    ["two values", "{} {}", /not JSON/],
    ["half a value", '{"a": ', /not JSON/],
    ["a leading zero", "[01]", /not JSON/],
    ["a line break in a string", '["a\nb"]', /not JSON/],
    ["nothing", "", /not JSON/],
    ["a byte order mark", "\ufeff{}", /not JSON/],
  ])("refuses %s", (_what, text, message) => {
    expect(readJson(text)).toMatchObject({ ok: false, message: expect.stringMatching(message) });
  });

  it("allows one name in two objects", () => {
    expect(readJson('[{"a": 1}, {"a": {"a": 2}}]').ok).toBe(true);
  });

  it("reads up to the limit of nesting and not beyond", () => {
    expect(readJson(nested(limits.jsonDepth)).ok).toBe(true);
    expect(readJson(nested(limits.jsonDepth + 1))).toMatchObject({
      ok: false,
      message: expect.stringMatching(/nested more than 30 levels/),
      column: limits.jsonDepth + 1,
    });
  });

  it("does not run out of stack on a million brackets", () => {
    expect(readJson("[".repeat(1_000_000)).ok).toBe(false);
    expect(readJson('{"a":'.repeat(200_000)).ok).toBe(false);
  });

  it("says on which line and in which column", () => {
    expect(readJson('{\n  "a": 1,\n  "a": 2\n}')).toMatchObject({ line: 3, column: 3 });
    expect(readJson('{"a": tru}')).toMatchObject({ line: 1, column: 7 });
  });

  it("leaves the prototypes of objects alone", () => {
    readJson('{"constructor": {"prototype": {"admin": true}}}');
    expect(({} as { admin?: boolean }).admin).toBeUndefined();
  });

  it("never throws", () => {
    fc.assert(
      fc.property(fc.string({ unit: "binary" }), (text) => typeof readJson(text).ok === "boolean"),
    );
  });
});
