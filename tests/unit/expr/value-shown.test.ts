import { describe, expect, it } from "vitest";
import { createEngine } from "@/lib/expr";
import { shownText } from "@/lib/expr/digits";
import { readEntry } from "@/lib/expr/entry";
import { normalisedShown, relationValue, showUncertain } from "@/lib/expr/value-shown";
import type { CalculationFile, Cell, RelationResult } from "@/lib/schema";

const system = { edition: "codata-2018", em: "si" } as const;

/** The last relation of a calculation typed line by line. */
function resultOf(...lines: string[]): RelationResult {
  const cells = lines.map((line, i) => ({ ...readEntry(line, system), id: `c${i}` }) as Cell);
  const file: CalculationFile = {
    format: "leading-order/1",
    title: "",
    edition: "codata-2018",
    cells,
  };
  return createEngine().evaluate(file, "").cells[`c${lines.length - 1}`] as RelationResult;
}

describe("digits of an uncertain value (JCGM 100:2008, 7.2.2 and 7.2.6)", () => {
  it.each([
    [1.2570651798e39, 6.285e37, "1.257(63) × 10³⁹"],
    [6.6743e-11, 1.5e-15, "6.67430(15) × 10⁻¹¹"],
    [100.02147, 0.00035, "100.02147(35)"],
    [9.66e42, 1.13e43, "1.0(11) × 10⁴³"],
    [0.34, 0.02, "0.340(20)"],
    [123.4, 0.996, "123.4(10)"],
    [-5.2, 0.31, "−5.20(31)"],
    [0, 0.25, "0.00(25)"],
    [4321, 1234, "4.3(12) × 10³"],
  ])("%d ± %d is %s", (value, uncertainty, shown) => {
    expect(shownText(showUncertain(value, uncertainty))).toBe(shown);
  });
});

describe("the value of a relation", () => {
  const formula = "L = 4 pi G M m_p c / sigma_T to erg/s";

  it("follows the uncertainty of the givens", () => {
    expect(relationValue(resultOf("M = 10.0(5) Msun", formula), system).text).toBe(
      "1.257(63) × 10³⁹ erg s⁻¹",
    );
  });

  it("keeps three digits where only constants are uncertain", () => {
    const result = resultOf("M = 10 Msun", formula);
    expect(result.uncertainty).toBeGreaterThan(0);
    expect(relationValue(result, system).text).toBe("1.26 × 10³⁹ erg s⁻¹");
  });

  it("has a normalised form ready to paste", () => {
    const shown = normalisedShown(resultOf("M = 10.0(5) Msun", formula), system);
    expect(shown?.text).toBe("1.26 × 10³⁹ (M / 10 M⊙) erg s⁻¹");
    expect(shown?.local).toBe(false);
  });

  it("writes powers as short rationals and says where they are only local", () => {
    const exact = normalisedShown(resultOf("M = 1e6 Msun", "R = Rsun (M / Msun)^(1/3)"), system);
    expect(exact?.text).toBe("100 (M / 10⁶ M⊙)^(1/3) R⊙");
    const local = normalisedShown(resultOf("eta = 0.1", "t = (1 s) eta / (1 - eta)"), system);
    expect(local?.local).toBe(true);
    expect(local?.text).toBe("111 (eta / 0.1)^(1.1) ms");
  });

  it("is written at the fiducials that the givens state", () => {
    const file: CalculationFile = {
      format: "leading-order/1",
      title: "",
      edition: "codata-2018",
      cells: [
        { id: "g", kind: "given", symbol: "M", value: 12, unit: "Msun", fiducial: 10 },
        {
          id: "r",
          kind: "relation",
          symbol: "L",
          formula: "4 pi G M m_p c / sigma_T",
          unit: "erg/s",
        },
      ],
    };
    const result = createEngine().evaluate(file, "").cells.r as RelationResult;
    expect(result.normalised?.prefactor).toBeCloseTo(1.2570651798e39, -29);
    expect(normalisedShown(result, system)?.text).toBe("1.26 × 10³⁹ (M / 10 M⊙) erg s⁻¹");
  });
});
