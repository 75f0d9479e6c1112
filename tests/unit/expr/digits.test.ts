import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { showExactly, showNumber, shownTex, shownText, superscript } from "@/lib/expr/digits";

describe("a number to three digits", () => {
  it.each([
    [0, "0", "0"],
    [1, "1.00", "1.00"],
    [12.57, "12.6", "12.6"],
    [123.4, "123", "123"],
    [999.4, "999", "999"],
    [999.6, "1.00 × 10³", "1.00 \\times 10^{3}"],
    [1234, "1.23 × 10³", "1.23 \\times 10^{3}"],
    [0.0123, "0.0123", "0.0123"],
    [0.01, "0.0100", "0.0100"],
    [0.00999, "9.99 × 10⁻³", "9.99 \\times 10^{-3}"],
    [1.2570651798e39, "1.26 × 10³⁹", "1.26 \\times 10^{39}"],
    [-6.6743e-11, "−6.67 × 10⁻¹¹", "-6.67 \\times 10^{-11}"],
    [5e-324, "4.94 × 10⁻³²⁴", "4.94 \\times 10^{-324}"],
    [Number.MAX_VALUE, "1.80 × 10³⁰⁸", "1.80 \\times 10^{308}"],
  ])("%d is %s", (value, text, tex) => {
    expect(shownText(showNumber(value))).toBe(text);
    expect(shownTex(showNumber(value))).toBe(tex);
  });

  it("is the number, to half of the last digit", () => {
    const value = fc.double({ noNaN: true, noDefaultInfinity: true }).filter((x) => x !== 0);
    fc.assert(
      fc.property(value, fc.integer({ min: 1, max: 15 }), (x, digits) => {
        const { mantissa, exponent } = showNumber(x, digits);
        const back = Number(`${mantissa}e${exponent}`);
        expect(back).toBe(Number(x.toPrecision(digits)));
        expect(mantissa.replace(/^-?0\.0*|[-.]/g, "")).toHaveLength(digits);
      }),
      { seed: 20261205, numRuns: 2_000 },
    );
  });
});

describe("a number as it was typed", () => {
  it.each([
    [10, "10"],
    [0.34, "0.34"],
    [1500, "1500"],
    [1000, "1000"],
    [10_000, "10⁴"],
    [4_300_000, "4.3 × 10⁶"],
    [299792458, "299792458"],
    [0.001, "0.001"],
    [0.0005, "5 × 10⁻⁴"],
    [1e-8, "10⁻⁸"],
    [-1e-8, "−10⁻⁸"],
    [3e38, "3 × 10³⁸"],
    [-2.5, "−2.5"],
    [0, "0"],
    [1e21, "10²¹"],
  ])("%d is %s", (value, text) => {
    expect(shownText(showExactly(value))).toBe(text);
  });

  it("loses nothing", () => {
    const value = fc.double({ noNaN: true, noDefaultInfinity: true }).filter((x) => x !== 0);
    fc.assert(
      fc.property(fc.oneof(value, fc.integer()), (x) => {
        const { mantissa, exponent } = showExactly(x);
        expect(Number(`${mantissa}e${exponent}`)).toBe(x);
      }),
      { seed: 20261206, numRuns: 2_000 },
    );
  });
});

describe("superscripts", () => {
  it.each([
    [-27, "⁻²⁷"],
    [1234567890, "¹²³⁴⁵⁶⁷⁸⁹⁰"],
    [0, "⁰"],
  ])("%i is %s", (n, text) => {
    expect(superscript(n)).toBe(text);
  });
});
