import { beforeAll, describe, expect, it } from "vitest";
import { lastOf } from "../unit/expr/calculations";
import { expectWithin } from "../unit/physics/approximately";
import plasma from "./plasma.json";
import { askPython } from "./python";

/**
 * Figures that handbooks print, beside a program that states the same by hand in SI (handbook.py).
 */
interface Answer {
  readonly plasma: Record<string, number>;
  readonly iau: Record<string, number>;
}

let answer: Answer;

beforeAll(async () => {
  answer = await askPython("handbook.py", null);
});

function value(lines: readonly string[], em: "si" | "gaussian" = "si"): number {
  const result = lastOf(lines, { em });
  if (result.status !== "ok" || !("value" in result)) throw new Error(JSON.stringify(result));
  return Number(result.value);
}

/** One unit of the last digit printed: 0.01e4 for “1.76e4”. */
function lastDigit(printed: string): number {
  const [digits = "", power = "0"] = printed.split("e");
  return 10 ** (Number(power) - (digits.split(".")[1] ?? "").length);
}

/**
 * NRL Plasma Formulary (2019), “Fundamental plasma parameters” and “Collisions and transport”:
 * Gaussian units, temperatures in eV, Z = 1, ions of the proton’s mass; printed values from memory.
 * The temperature of 1 eV is cut, not rounded: hence 0.52.
 */
describe("the plasma formulary’s printed coefficients", () => {
  const cgs = ["B = 1 gauss", "n = 1 cm^-3", "T = 1 eV"];

  it.each(plasma)("agree, and with SI by hand: %s, %s", (key, _name, formula, unit, printed) => {
    const line = `y_result = ${formula}${unit === "" ? "" : ` to ${unit}`}`;
    const ours = value([...cgs, line], "gaussian");
    const digit = lastDigit(String(printed));
    expect(Math.abs(ours - Number(printed)) / digit).toBeLessThan(0.52);
    expectWithin(ours, answer.plasma[String(key)] ?? Number.NaN, 1e-9);
  });

  it("are thirty-two, each stated by hand", () => {
    expect(plasma.map(([key]) => key)).toEqual(Object.keys(answer.plasma));
    expect(plasma).toHaveLength(32);
  });
});

/** IAU 2015 Resolutions B2 and B3, IAU 2012 Resolution B2; from memory, arithmetic checked. */
describe("figures that follow from the IAU’s values", () => {
  it.each([
    ["irradiance", ["S = 1361 W/m^2", "L = 4 pi (1 au)^2 S to W"], 3.827531850364948e26],
    ["length", ["x = G M_sun/c^2 to m"], 1476.6250380501249],
    ["time", ["x = GM_sun/c^3 to s"], 4.9254909476412675e-6],
    ["zero point", ["f = 3.0128e28 W/(4 pi (10 pc)^2) to W/m^2"], 2.5180210026333998e-8],
    ["magnitude", ["M_bol = -2.5 log10(L_sun/(3.0128e28 W))"], 4.7399959339194595],
    // All digits of sigma_SB; its printed ones raise this by 8e-12.
    ["temperature", ["T = (L_sun/(4 pi R_sun^2 sigma_SB))^(1/4) to K"], 5772.003429098915],
    ["parsec", ["x = 1 pc to m"], 3.085677581491367e16],
    ["year", ["P = 2 pi sqrt((1 au)^3/GM_sun) to day"], 365.2568983840419],
    ["julian year", ["x = 1 yr to s"], 31557600],
  ])("agree: %s", (key, lines, figure) => {
    expectWithin(value(lines), figure, 1e-12);
    expectWithin(value(lines), answer.iau[key] ?? Number.NaN, 1e-12);
  });

  it("fit the nominal values to their digits", () => {
    expect(value(["L = 4 pi (1 au)^2 * 1361 W/m^2 to W"]) / 3.828e26).toBeCloseTo(1, 3);
    expect(value(["T = (L_sun/(4 pi R_sun^2 sigma_SB))^(1/4) to K"]).toFixed(0)).toBe("5772");
    expect(value(["M_bol = -2.5 log10(L_sun/(3.0128e28 W))"]).toFixed(2)).toBe("4.74");
  });
});
