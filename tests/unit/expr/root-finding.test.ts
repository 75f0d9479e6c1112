import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { brent, findBrackets, firstZero, isZero, spread } from "@/lib/expr/root-finding";

describe("points over a range", () => {
  it("are in equal steps, or in equal ratios where it is positive and wide", () => {
    expect(spread(0, 4, 5)).toEqual([0, 1, 2, 3, 4]);
    expect(spread(1, 50, 3)).toEqual([1, 25.5, 50]);
    const wide = spread(1, 1e4, 5);
    expect(wide.map((x) => Math.log10(x))).toEqual(
      [0, 1, 2, 3, 4].map((x) => expect.closeTo(x, 12)),
    );
    expect(spread(5, -5, 3)).toEqual([5, 0, -5]);
  });

  it("begin and end exactly at the ends", () => {
    const points = spread(0.1, 1e7 / 3, 200);
    expect([points[0], points.at(-1), points.length]).toEqual([0.1, 1e7 / 3, 200]);
  });
});

describe("the zero in a bracket", () => {
  it.each<[string, (x: number) => number, number, number, number]>([
    ["x² − 2", (x) => x * x - 2, 0, 2, Math.SQRT2],
    ["cos x − x", (x) => Math.cos(x) - x, 0, 1, 0.7390851332151607],
    ["x³", (x) => x ** 3, -1, 2, 0],
    ["exp x − 10", (x) => Math.exp(x) - 10, 5, 0, Math.LN10],
    ["a steep edge", (x) => Math.tanh(1e6 * (x - 0.3)), 0, 1, 0.3],
    ["zero at the upper end", (x) => x - 1, 0, 1, 1],
    ["zero at the lower end", (x) => x - 1, 1, 2, 1],
  ])("%s", (_, f, from, to, exact) => {
    expect(brent(f, { from, to })).toBeCloseTo(exact, 12);
  });

  it("is good to a tenth where the expression is flat", () => {
    expect(brent((x) => (x - 1) ** 9, { from: 0, to: 3 })).toBeCloseTo(1, 1);
  });

  it("is exact to the last digits, whatever the scale", () => {
    const scale = fc.double({ min: -200, max: 200, noNaN: true }).map((power) => 10 ** power);
    const share = fc.double({ min: 0.01, max: 0.99, noNaN: true });
    fc.assert(
      fc.property(scale, share, (unit, at) => {
        const f = (x: number) => Math.expm1(x / unit) - Math.expm1(at);
        expect(brent(f, { from: 0, to: unit }) / unit / at).toBeCloseTo(1, 12);
      }),
      { seed: 20261203, numRuns: 200 },
    );
  });
});

describe("the first zero of a range", () => {
  it("is the first of several, from the end the range begins at", () => {
    expect(firstZero(Math.sin, 1, 20)).toBeCloseTo(Math.PI, 12);
    expect(firstZero(Math.sin, 20, 1)).toBeCloseTo(6 * Math.PI, 12);
  });

  it("may lie at an end", () => {
    expect(firstZero((x) => x, 0, 1)).toBe(0);
    expect(firstZero((x) => x - 1, 0, 1)).toBe(1);
  });

  it("is not a pole", () => {
    expect(firstZero(Math.tan, 1, 2)).toBeUndefined();
    expect(firstZero((x) => 1 / (x - 0.3001), 0, 1)).toBeUndefined();
    expect(firstZero(Math.tan, 1, 4)).toBeCloseTo(Math.PI, 12);
  });

  it("does not exist without a change of sign", () => {
    expect(firstZero((x) => x * x + 1, -5, 5)).toBeUndefined();
  });

  it("is found over many decades", () => {
    expect(firstZero((x) => Math.log10(x) - 17.25, 1e-10, 1e40)).toBeCloseTo(10 ** 17.25, -5);
  });
});

describe("brackets", () => {
  it("hold one change of sign each, up to as many as are asked for", () => {
    const brackets = findBrackets(Math.sin, 1, 20, 100);
    expect(brackets).toHaveLength(6);
    for (const { from, to } of brackets) expect(Math.sin(from) * Math.sin(to)).toBeLessThan(0);
    expect(findBrackets(Math.sin, 1, 20)).toEqual(brackets.slice(0, 1));
    expect(findBrackets(() => 1, 0, 1, 100)).toEqual([]);
  });

  it("hold a zero only where the expression is no larger than at their ends", () => {
    expect(isZero(1e-17, [-1, 2])).toBe(true);
    expect(isZero(0, [0, 2])).toBe(true);
    expect(isZero(1e16, [-1, 2])).toBe(false);
  });
});
