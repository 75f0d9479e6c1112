import { describe, expect, it } from "vitest";
import { canonicalName, normalise, typedRange } from "@/lib/expr/normalise";

describe("normalise", () => {
  it.each([
    ["4 × π", "4 * pi"],
    ["a·b⋅c", "a*b*c"],
    ["x − y – z", "x - y - z"],
    ["a ÷ b", "a / b"],
    ["c²", "c^(2)"],
    ["T⁻¹²", "T^(-12)"],
    ["M⊙ + R☉", "M_sun + R_sun"],
    ["M⊕", "M_earth"],
    ["√(x)", "sqrt(x)"],
    ["a ≤ b ≥ c ≠ d", "a <= b >= c != d"],
    ["a\u00a0b\u2009c", "a b c"],
    ["x₁₂", "x_12"],
    ["ħ ω", "hbar omega"],
  ])("reads %s as %s", (typed, expected) => {
    expect(normalise(typed).text).toBe(expected);
  });

  it("makes typed and spelled Greek one name", () => {
    expect(canonicalName("σ_T")).toBe("sigma_T");
    expect(canonicalName(" sigma_T ")).toBe("sigma_T");
  });

  it("takes Unicode in its composed form", () => {
    expect(normalise("A\u030a").text).toBe("Å");
  });

  it("finds the way back to what was typed", () => {
    const typed = "σ_T² x";
    const normalised = normalise(typed);
    const at = normalised.text.indexOf("x");
    expect(typedRange(normalised, at, at + 1)).toEqual({ from: 5, to: 6 });
    expect(typedRange(normalised, 0, "sigma_T".length)).toEqual({ from: 0, to: 3 });
  });
});
