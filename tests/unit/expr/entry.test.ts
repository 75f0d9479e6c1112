import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cellLine, editedCell, fieldOffset, readEntry } from "@/lib/expr/entry";
import { type Cell, cellSchema, type GivenCell } from "@/lib/schema";

const system = { edition: "codata-2018", em: "si" } as const;
const read = (line: string) => readEntry(line, system);
const withId = (line: string) => ({ ...read(line), id: "c" }) as Cell;

describe("givens, typed and typed back", () => {
  it.each([
    ["M = 10 Msun", { symbol: "M", value: 10, unit: "Msun" }, "M = 10 Msun"],
    ["kappa = 0.34(2) cm^2/g", { value: 0.34, uncertainty: 0.02 }, "kappa = 0.34(2) cm^2/g"],
    ["M = 4.30 ± 0.01 e6 Msun", { value: 4.3e6, uncertainty: 1e4 }, "M = 4.30(1)e6 Msun"],
    ["eta = 0.1 ± 0.3 dex", { value: 0.1, dex: 0.3 }, "eta = 0.1 ± 0.3 dex"],
    ["L = 3 ± 0.3 dex erg/s", { value: 3, dex: 0.3, unit: "erg/s" }, "L = 3 ± 0.3 dex erg/s"],
    ["n = 1e3 cm^-3 within a factor 3", { value: 1000, factor: 3, unit: "cm^-3" }, undefined],
    ["n = 7 within a factor of 2", { value: 7, factor: 2 }, "n = 7 within a factor 2"],
    ["z = 0.01 .. 0.02", { value: 0.015, interval: [0.01, 0.02] }, "z = 0.01 .. 0.02"],
    ["d = 1..2 Mpc", { value: 1.5, interval: [1, 2], unit: "Mpc" }, "d = 1 .. 2 Mpc"],
    ["v = -1 .. 1 km/s", { value: 0, interval: [-1, 1] }, "v = -1 .. 1 km/s"],
    ["M = (4.3 ± 0.1)e6 Msun", { value: 4.3e6, uncertainty: 1e5 }, "M = 4.3(1)e6 Msun"],
    ["M = (4.3 ± 0.1) × 10^6 Msun", { value: 4.3e6, uncertainty: 1e5 }, "M = 4.3(1)e6 Msun"],
    ["w = 3 × 10⁻⁸ Msun/yr", { value: 3e-8, unit: "Msun/yr" }, "w = 3e-8 Msun/yr"],
    ["w = 3 · 10^8 m", { value: 3e8, unit: "m" }, "w = 3e8 m"],
    ["w = 3⋅10⁸ m", { value: 3e8, unit: "m" }, "w = 3e8 m"],
    ["w = 3*10^(-8) m", { value: 3e-8, unit: "m" }, "w = 3e-8 m"],
    ["q = −3 m", { value: -3, unit: "m" }, "q = -3 m"],
    ["q = +3 m", { value: 3, unit: "m" }, "q = 3 m"],
    ["q = .5", { value: 0.5 }, "q = 0.5"],
    ["q = 5 %", { value: 5, unit: "%" }, "q = 5 %"],
    ["q = 12(3)", { value: 12, uncertainty: 3 }, "q = 12(3)"],
    ["q = 1.2(0.3) cm", { value: 1.2, uncertainty: 0.3 }, "q = 1.2(3) cm"],
    ["q = 6.674(15)e-8", { value: 6.674e-8, uncertainty: 1.5e-10 }, "q = 6.674(15)e-8"],
    ["q = 3 +/- 1 g", { value: 3, uncertainty: 1, unit: "g" }, "q = 3(1) g"],
    ["q = 3 +- 1 g", { value: 3, uncertainty: 1, unit: "g" }, "q = 3(1) g"],
    ["q = 0 ± 1 g", { value: 0, uncertainty: 1 }, "q = 0 ± 1 g"],
    ["q = 10Msun", { value: 10, unit: "Msun" }, "q = 10 Msun"],
    ["q=3", { value: 3 }, "q = 3"],
    ["σ_T = 3 cm²", { symbol: "σ_T", value: 3, unit: "cm²" }, "σ_T = 3 cm²"],
    ["v = 3 km s⁻¹", { value: 3, unit: "km s⁻¹" }, "v = 3 km s⁻¹"],
    ["q = 5(1) furlong", { value: 5, uncertainty: 1, unit: "furlong" }, "q = 5(1) furlong"],
  ])("%s", (line, fields, back) => {
    const cell = withId(line);
    expect(cell).toMatchObject({ kind: "given", ...fields });
    expect(cellLine(cell)).toBe(back ?? cellLine(cell));
    expect(withId(cellLine(cell))).toEqual(cell);
    expect(cellSchema.safeParse(cell).success).toBe(true);
  });

  it("states nothing it was not told", () => {
    expect(read("M = 10 Msun")).toEqual({ kind: "given", symbol: "M", value: 10, unit: "Msun" });
    expect(read("q = 3")).toEqual({ kind: "given", symbol: "q", value: 3 });
  });

  it("leaves a number that no double holds to the engine", () => {
    for (const line of ["q = 1e400", "q = 3 ± 1e400", "q = 1 .. 1e400", "q = -1e999 m"]) {
      expect(read(line)).toMatchObject({ kind: "relation" });
      expect(cellSchema.safeParse(withId(line)).success).toBe(true);
    }
  });
});

describe("what a line becomes", () => {
  it.each([
    ["relation", "L = 4 pi G M m_p c / sigma_T to erg/s"],
    ["relation", "x = 2 pi"],
    ["relation", "x = 3 c"],
    ["relation", "x = 3 M"],
    ["relation", "x = 3 m to km"],
    ["relation", "x = 5 furlong"],
    ["relation", "f(x) = x^2"],
    ["relation", "f(x, y) = 3"],
    ["relation", "f(x) = 3 m"],
    ["relation", "x = 3 = 4"],
    ["relation", "x = a ? b : c"],
    ["relation", "x = a > b ? 2 : a < c ? 3 : 4"],
    ["relation", "L = eta Mdot to erg/s"],
    ["relation", "tau = rho kappa dr"],
    ["relation", "Q = alpha rho Omega"],
    ["relation", "x = 1/3"],
    ["relation", "x = 3 (2)"],
    ["relation", "Ṁ = L / (eta c^2)"],
    ["check", "L_Edd > 1e38 erg/s"],
    ["check", "a < b"],
    ["check", "x<3"],
    ["check", "x<-3"],
    ["check", "x == 3"],
    ["check", "x != 3 erg"],
    ["check", "1 < x < 3"],
    ["check", "a ≤ b"],
    ["check", "not (a > b)"],
    ["check", "x >= 0 and y < 2"],
    ["check", "alpha beta gamma < 2"],
    ["check", "tau_es > 1 or kappa_es > 1 cm^2/g"],
    ["text", ""],
    ["text", "# The limiting luminosity"],
    ["text", "We find that x < 3 holds here."],
    ["text", "The mass M = 3"],
    ["text", "Here M = 10 Msun is the mass"],
    ["text", "Let x = the mass of the star"],
    ["text", "x = the mass of the star"],
    ["text", "x = the way from here to there"],
    ["text", "Note: x < 3"],
    ["text", "- one item = one thing"],
    ["text", "<b>bold</b>"],
    ["text", "$x < 3$"],
    ["text", "`x < 3`"],
    ["text", "> as quoted from the log"],
    ["text", "Electrons -> photons"],
    ["text", "x -> 0"],
    ["text", "a => b"],
    ["text", "M ="],
    ["text", "= 3"],
    ["text", "1 + 1"],
    ["text", "See eq. 3: the disc is thin where H < R, as above"],
    ["text", "It holds while the optical depth > 1"],
  ])("%s: %s", (kind, line) => {
    expect(read(line).kind).toBe(kind);
  });

  it("keeps the words of each in their fields", () => {
    expect(read("L = 2 M to erg/s")).toEqual({
      kind: "relation",
      symbol: "L",
      formula: "2 M",
      unit: "erg/s",
    });
    expect(read(" a < b ")).toEqual({ kind: "check", condition: "a < b" });
    expect(read(" Some *prose*. ")).toEqual({ kind: "text", markdown: "Some *prose*." });
  });
});

const runs = { numRuns: 500, seed: 20261202 };
const unit = fc.constantFrom(undefined, "Msun", "erg/s/cm^2", "erg s^-1 Hz^(1/2)", "km s⁻¹", "%");
const size = fc.double({ min: 1e-300, max: 1e300, noNaN: true });
const value = fc.oneof(
  size,
  size.map((x) => -x),
  fc.constant(0),
  fc.integer(),
);
const given = (fields: fc.Arbitrary<object>): fc.Arbitrary<GivenCell> =>
  fc.tuple(fields, unit).map(([stated, u]) => ({
    id: "c",
    kind: "given",
    symbol: "x_1",
    ...(stated as { value: number }),
    ...(u === undefined ? {} : { unit: u }),
  }));
const middle = (a: number, b: number) => Number(((a + b) / 2).toPrecision(15));

describe("a given of each form comes back from its line", () => {
  const forms: [string, fc.Arbitrary<object>][] = [
    ["exact", fc.record({ value })],
    ["uncertain", fc.record({ value, uncertainty: size })],
    [
      "uncertain to a few digits",
      fc
        .tuple(fc.integer({ min: -99999, max: 99999 }), fc.integer({ min: 1, max: 99 }))
        .chain(([v, u]) =>
          fc.integer({ min: -30, max: 30 }).map((p) => ({
            value: Number(`${v}e${p}`) + 0,
            uncertainty: Number(`${u}e${p}`),
          })),
        ),
    ],
    ["log-normal", fc.record({ value: size, dex: fc.double({ min: 0.01, max: 3, noNaN: true }) })],
    [
      "within a factor",
      fc.record({ value: size, factor: fc.double({ min: 1, max: 1e3, noNaN: true }) }),
    ],
    [
      "an interval",
      fc.tuple(value, value).map(([a, b]) => ({ value: middle(a, b) + 0, interval: [a, b] })),
    ],
  ];

  it.each(forms)("%s", (_, fields) => {
    fc.assert(
      fc.property(given(fields), (cell) => {
        expect({ ...read(cellLine(cell)), id: "c" }).toEqual(cell);
      }),
      runs,
    );
  });
});

describe("whatever is typed", () => {
  const words = [
    "M",
    "=",
    "<",
    "3",
    "1e999",
    "(2)",
    "±",
    "..",
    "e6",
    "dex",
    "within a factor",
    " ",
  ];
  const typed = fc.oneof(
    fc.string({ unit: "grapheme", maxLength: 60 }),
    fc.array(fc.constantFrom(...words), { maxLength: 14 }).map((parts) => parts.join("")),
    fc.array(fc.constantFrom(...words), { maxLength: 10 }).map((parts) => `x = ${parts.join(" ")}`),
  );

  it("makes a cell that can be kept, and whose line makes it again", () => {
    fc.assert(
      fc.property(typed, (line) => {
        const cell = withId(line);
        expect(cellSchema.safeParse(cell).error).toBeUndefined();
        expect(withId(cellLine(cell))).toEqual(cell);
      }),
      { ...runs, numRuns: 2_000 },
    );
  });
});

describe("an edited line", () => {
  const cell: Cell = {
    id: "g1",
    kind: "given",
    symbol: "M",
    value: 10,
    unit: "Msun",
    source: "table 2",
    note: "from the orbit",
    fiducial: 10,
  };

  it("keeps what a line does not show, and the cell's id", () => {
    expect(editedCell(cell, "M = 12(1) Msun", system)).toEqual({
      ...cell,
      value: 12,
      uncertainty: 1,
    });
  });

  it("drops it where the cell becomes another kind", () => {
    expect(editedCell(cell, "M < 3 Msun", system)).toEqual({
      id: "g1",
      kind: "check",
      condition: "M < 3 Msun",
    });
  });

  it("keeps the value of an interval off its middle while the interval stays", () => {
    const off: Cell = { id: "g", kind: "given", symbol: "z", value: 0.012, interval: [0.01, 0.02] };
    expect(editedCell(off, "z = 0.01 .. 0.02", system)).toEqual(off);
    expect(editedCell(off, "z = 0.01 .. 0.03", system)).toMatchObject({ value: 0.02 });
  });
});

describe("where a field begins in the line", () => {
  it.each([
    ["L = 2 M to erg/s", "formula", "2 M to erg/s"],
    ["L = 2 M to erg/s", "unit", "erg/s"],
    ["M = 10(1) Msun", "unit", "Msun"],
    ["M = 10(1) Msun", "value", "10(1) Msun"],
    ["m = 3 m", "unit", "m"],
    ["n = 3 cm^-3 within a factor 2", "unit", "cm^-3 within a factor 2"],
    ["a < b", "condition", "a < b"],
    ["x = 3 m m", "symbol", "x = 3 m m"],
  ])("%s, %s", (line, field, rest) => {
    const cell = withId(line);
    expect(cellLine(cell).slice(fieldOffset(cell, field))).toBe(rest);
  });
});
