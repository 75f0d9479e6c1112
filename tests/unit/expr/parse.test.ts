import { describe, expect, it } from "vitest";
import { attempt } from "@/lib/expr/faults";
import { readFormula, readWords } from "@/lib/expr/formula";
import { shape } from "./tree-shape";

const roles = {
  functions: new Set(["f"]),
  quantities: new Set(["x", "y", "gamma", "M"]),
};

const parse = (typed: string) => shape(readFormula(readWords(typed), roles).tree);
function faultOf(typed: string) {
  const read = attempt(() => readFormula(readWords(typed), roles));
  return read.ok ? undefined : read.fault;
}

describe("precedence", () => {
  it.each([
    ["a/b c", "(a / (b . c))"],
    ["1/2 x", "((1 / 2) . x)"],
    ["-2^2", "(- (2 ^ 2))"],
    ["2^3^2", "(2 ^ (3 ^ 2))"],
    ["a - b - c", "((a - b) - c)"],
    ["x ? y : 2", "(x ? y : 2)"],
    ["5%", "(5 . %)"],
    ["5% + x", "((5 . %) + x)"],
    ["x / 5%", "(x / (5 . %))"],
    ["x!", "factorial(x)"],
    ["not (x > 1) and y < 2", "((not (x > 1)) and (y < 2))"],
  ])("reads %s as %s", (typed, expected) => {
    expect(parse(typed)).toBe(expected);
  });
});

describe("habits of theorists", () => {
  it.each([
    ["4/3 pi (r/2)^3", "(((4 / 3) . pi) . ((r / 2) ^ 3))"],
    ["pi (r/2)^2", "(pi . ((r / 2) ^ 2))"],
    ["c^4 400 Mpc", "(((c ^ 4) . 400) . Mpc)"],
    ["x^3 2", "((x ^ 3) . 2)"],
    ["x^-3 2", "((x ^ (- 3)) . 2)"],
    ["(x) 2", "(x . 2)"],
    ["x 2", "(x . 2)"],
    ["gamma (1 + x)", "(gamma . (1 + x))"],
    ["f(x) 2", "(f(x) . 2)"],
    ["c² 3", "((c ^ 2) . 3)"],
    ["y^x 2", "((y ^ x) . 2)"],
  ])("reads %s as %s", (typed, expected) => {
    expect(parse(typed)).toBe(expected);
  });
});

describe("faults", () => {
  it.each([
    ["3 2", "syntax", 0, 3],
    ["sin^2(x)", "syntax", 0, 8],
    ["sin²(x)", "syntax", 0, 7],
    ["sin x", "syntax", 0, 3],
    ["(x + 1", "syntax", 0, 1],
    ["x + 1)", "syntax", 5, 6],
    ["x +", "syntax", 2, 3],
    ["x * / y", "syntax", 4, 5],
    ["", "syntax", 0, 0],
    ['"text"', "forbidden", 0, 6],
    ["x.constructor", "forbidden", 1, 2],
    ["[1, 2]", "forbidden", 0, 1],
    ["{a: 1}", "forbidden", 0, 1],
    ["x; y", "forbidden", 1, 2],
    ["x & y", "forbidden", 2, 3],
    ["x << 2", "forbidden", 2, 4],
    ["5 mod 3", "forbidden", 2, 5],
    ["x = y = 2", "forbidden", 6, 7],
    ["1:3", "forbidden", 0, 3],
    ["5 % 3", "forbidden", 2, 3],
    ["1e400", "overflow", 0, 5],
    ["1e-400", "overflow", 0, 6],
    ["0x1F", "syntax", 0, 3],
    ["x # y", "forbidden", 2, 3],
    ["x → y", "syntax", 2, 3],
  ])("%s is %s at %i to %i", (typed, code, from, to) => {
    expect(faultOf(typed)).toMatchObject({ code, from, to });
  });

  it("suggests where the exponent of a function belongs", () => {
    expect(faultOf("sin^2(x)")?.suggestion).toBe("sin(x)^2");
  });

  it("stops at sixty levels and at two thousand characters", () => {
    const nested = (levels: number) => `${"(".repeat(levels)}x${")".repeat(levels)}`;
    expect(faultOf(nested(60))).toBeUndefined();
    expect(faultOf(nested(61))?.code).toBe("limit");
    expect(faultOf(`${"-".repeat(100)}x`)?.code).toBe("limit");
    expect(faultOf(`${"1+".repeat(1_000)}1`)?.code).toBe("limit");
    expect(faultOf(`${"1+".repeat(900)}1`)).toBeUndefined();
  });

  it("keeps a chain of percentages small", () => {
    expect(faultOf(`x${" + 5%".repeat(40)}`)).toBeUndefined();
  });
});

describe("heads and units", () => {
  it("takes symbol, parameters and unit apart", () => {
    expect(readWords("L = 4 pi r^2 to erg/s")).toMatchObject({
      head: { name: "L" },
      unit: { text: "erg/s", from: 16 },
    });
    expect(readWords("g(a, b) = a b").head).toEqual({ name: "g", parameters: ["a", "b"] });
  });

  it("tells implicit products behind a division", () => {
    const { ambiguous } = readFormula(readWords("a/b c"), roles);
    expect(ambiguous).toEqual([{ from: 2, to: 5 }]);
    expect(readFormula(readWords("a/(b c)"), roles).ambiguous).toEqual([]);
    expect(readFormula(readWords("1/2 x"), roles).ambiguous).toEqual([]);
  });
});
