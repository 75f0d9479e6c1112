import { describe, expect, it } from "vitest";
import { editionNames, findConstant, parseUnit, type UnitSystem } from "@/lib/physics";
import { expectWithin } from "../../unit/physics/approximately";
import codata from "./codata.json";

/** Against the complete listings of NIST, both editions; `codata.json` names its source. */

type Row = (typeof codata.rows)[number];

/** The listing’s rows by the names of the language, where they differ. */
const ourNames: Record<string, string> = { m_u: "u_amu", Ry_eV: "Ry", F: "F_faraday" };

const rowsOfOurs = codata.rows.flatMap((row) => {
  const symbol = ourNames[row.symbol] ?? row.symbol;
  return findConstant(symbol, { edition: "codata-2018", em: "si" }) ? [{ symbol, row }] : [];
});

const cases = editionNames.flatMap((edition) =>
  rowsOfOurs.map(({ symbol, row }) => ({ edition, symbol, row, listed: row[edition] })),
);

const systemOf = (edition: (typeof editionNames)[number]): UnitSystem => ({ edition, em: "si" });

function value(name: string, system: UnitSystem): number {
  return findConstant(name, system)?.siValue ?? Number.NaN;
}

describe("the listings of CODATA", () => {
  it("have 54 rows, 28 of them constants of the language", () => {
    expect(codata.rows).toHaveLength(54);
    expect(rowsOfOurs).toHaveLength(28);
  });

  it.each(cases)("give $symbol in $edition", ({ edition, symbol, row, listed }) => {
    const ours = findConstant(symbol, systemOf(edition));
    if (!ours) throw new Error(symbol);
    const full = "twentyDigits" in row ? row.twentyDigits : undefined;
    if (listed.truncated) expectWithin(ours.value, Number(full), 1e-15);
    else expect(ours.text).toBe(listed.value);
    expect(ours.uncertaintyText).toBe(listed.uncertainty);
    expectSameUnit(ours.unit, row, systemOf(edition));
  });
});

function expectSameUnit(unit: string, row: Row, system: UnitSystem): void {
  const [ours, theirs] = [parseUnit(unit, system), parseUnit(row.unit.replace(/^1$/, ""), system)];
  if (!ours.ok || !theirs.ok) throw new Error(`${unit}, ${row.unit}`);
  expect(ours.dimension).toBe(theirs.dimension);
  expectWithin(ours.factor, theirs.factor, 1e-15);
}

/** Listed quantities that the language derives from its constants. */
const derived: Record<string, (of: (name: string) => number) => number> = {
  inv_alpha: (of) => 1 / of("alpha_fs"),
  mp_over_me: (of) => of("m_p") / of("m_e"),
  m_e_c2_MeV: (of) => (of("m_e") * of("c") ** 2) / of("q_e") / 1e6,
  m_p_c2_MeV: (of) => (of("m_p") * of("c") ** 2) / of("q_e") / 1e6,
  m_n_c2_MeV: (of) => (of("m_n") * of("c") ** 2) / of("q_e") / 1e6,
  m_u_c2_MeV: (of) => (of("u_amu") * of("c") ** 2) / of("q_e") / 1e6,
  E_h: (of) => 2 * of("Ry"),
  l_P: (of) => Math.sqrt((of("hbar") * of("G")) / of("c") ** 3),
  m_P: (of) => Math.sqrt((of("hbar") * of("c")) / of("G")),
  t_P: (of) => Math.sqrt((of("hbar") * of("G")) / of("c") ** 5),
  T_P: (of) => Math.sqrt((of("hbar") * of("c") ** 5) / of("G")) / of("k_B"),
  Z_0: (of) => of("mu_0") * of("c"),
  Phi_0: (of) => of("h") / (2 * of("q_e")),
};

describe("what follows from the constants", () => {
  it.each(
    editionNames.flatMap((edition) => Object.keys(derived).map((symbol) => ({ edition, symbol }))),
  )("agrees with the listing: $symbol in $edition", ({ edition, symbol }) => {
    const row = codata.rows.find((one) => one.symbol === symbol);
    const follows = derived[symbol]?.((name) => value(name, systemOf(edition)));
    const listed = row?.[edition];
    if (!row || !listed || follows === undefined) throw new Error(symbol);
    const full = "twentyDigits" in row ? Number(row.twentyDigits) : undefined;
    const tolerance = Number(listed.uncertainty ?? 0) / Math.abs(Number(listed.value));
    expectWithin(follows, full ?? Number(listed.value), full ? 1e-15 : tolerance);
  });

  it("has the units atm, eV and the full digits of a_rad and q_esu", () => {
    const si = systemOf("codata-2018");
    for (const [symbol, unit] of [
      ["atm", "atm"],
      ["eV", "eV"],
    ] as const) {
      const listed = codata.rows.find((row) => row.symbol === symbol)?.["codata-2018"].value;
      expect(parseUnit(unit, si)).toMatchObject({ factor: Number(listed) });
    }
    const [aRad, charge] = codata.derived;
    expectWithin(value("a_rad", si), Number(aRad?.value), 1e-15);
    const esu = findConstant("q_esu", { edition: "codata-2018", em: "gaussian" });
    expect(esu?.text).toBe(charge?.value);
  });
});
