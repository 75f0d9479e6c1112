import { beforeAll, describe, expect, it } from "vitest";
import { createEngine } from "@/lib/expr";
import { editionNames, listConstants } from "@/lib/physics";
import type { CalculationFile, CellResult } from "@/lib/schema";
import { expectWithin } from "../unit/physics/approximately";
import nominal from "./nominal.json";
import codata from "./physics/codata.json";
import { askPython } from "./python";

/**
 * Constants as a calculation finds them: value, uncertainty and edition. Against the complete
 * listings of CODATA 2018 and 2022 (`physics/codata.json` names the file), the nominal and defined
 * values of the IAU and the SI Brochure (`nominal.json`, with source and status), and thirty-digit
 * arithmetic for those that are exact. `physics/libraries.test.ts` compares with SciPy and Astropy.
 */
type Edition = (typeof editionNames)[number];

const engine = createEngine();

function relation(formula: string, edition: Edition, unit?: string) {
  const cell = { id: "r", kind: "relation" as const, symbol: "y_result", formula };
  const cells = [unit === undefined ? cell : { ...cell, unit }];
  const file: CalculationFile = { format: "leading-order/1", title: "", edition, cells };
  const result = engine.evaluate(file, "").cells.r as CellResult;
  if (result.status !== "ok" || !("si" in result)) throw new Error(JSON.stringify(result));
  return result;
}

describe("constants that are exact", () => {
  let exact: Record<string, string>;
  beforeAll(async () => {
    exact = await askPython("constants.py", null);
  });

  const symbols = listConstants({ edition: "codata-2018", em: "si" })
    .filter((constant) => constant.exact && constant.nominalGM === undefined)
    .filter(({ source }) => !source.includes("B3"))
    .map(({ symbol }) => symbol);

  it("are fourteen, beside the nominal ones", () => {
    expect([...symbols].sort()).toEqual(Object.keys(exact).sort());
  });

  it.each(editionNames)("agree with thirty digits to 1e-15, without uncertainty: %s", (edition) => {
    for (const [symbol, digits] of Object.entries(exact)) {
      const { si, uncertainty } = relation(symbol, edition);
      expectWithin(si.value, Number(digits), 1e-15);
      expect(uncertainty, symbol).toBeNull();
    }
  });
});

/** The listing’s rows by the names of the language, where they differ. */
const ourNames: Record<string, string> = { m_u: "u_amu", Ry_eV: "Ry", F: "F_faraday" };
const listed = listConstants({ edition: "codata-2018", em: "si" }).map(({ symbol }) => symbol);
const rows = codata.rows.flatMap((row) => {
  const symbol = ourNames[row.symbol] ?? row.symbol;
  return listed.includes(symbol) ? [{ symbol, row }] : [];
});

describe("the listings of CODATA, as a calculation finds them", () => {
  it.each(
    editionNames.flatMap((edition) => rows.map(({ symbol, row }) => ({ edition, symbol, row }))),
  )("give $symbol in $edition, to 1e-12", ({ edition, symbol, row }) => {
    const { value, uncertainty } = relation(symbol, edition, row.unit.replace(/^1$/, ""));
    const figure = row[edition];
    expectWithin(value, Number("twentyDigits" in row ? row.twentyDigits : figure.value), 1e-12);
    if (figure.uncertainty === null) expect(uncertainty).toBeNull();
    else expectWithin(uncertainty ?? Number.NaN, Number(figure.uncertainty), 1e-12);
  });
});

describe("the nominal and defined values", () => {
  it.each(nominal)("give $symbol: $source ($status)", ({ symbol, formula, value, unit }) => {
    const tolerance = symbol === "f_bol0" ? 1e-9 : 1e-15;
    expectWithin(relation(formula, "codata-2018", unit).value, Number(value), tolerance);
    expectWithin(relation(formula, "codata-2022", unit).value, Number(value), tolerance);
  });

  it("lose the uncertainty of G in G M_sun, as IAU 2015 Resolution B3 means it", () => {
    const mass = relation("M_sun", "codata-2018", "kg");
    expectWithin((mass.uncertainty ?? 0) / mass.value, 0.00015 / 6.6743, 1e-12);
    expect(relation("G M_sun", "codata-2018", "m^3/s^2").uncertainty).toBeNull();
  });
});
