import { describe, expect, it } from "vitest";
import { prefixes } from "@/lib/physics/prefixes";
import { unitRows } from "@/lib/physics/units";

describe("the table of units", () => {
  it("gives each row a name, a source and a factor", () => {
    for (const row of unitRows) {
      expect(row.name, row.symbol).not.toBe("");
      expect(row.source, row.symbol).not.toBe("");
      // Only the atomic mass unit is left to the edition.
      if (Number.isNaN(row.factor)) expect(["u", "Da"]).toContain(row.symbol);
      else expect(row.factor, row.symbol).toBeGreaterThan(0);
    }
  });

  it("uses prefixes that exist", () => {
    for (const row of unitRows) {
      for (const prefix of row.prefixes) expect(prefixes, row.symbol).toHaveProperty(prefix);
    }
  });

  it("has no name twice under one convention", () => {
    for (const em of ["si", "gaussian"]) {
      const names = unitRows
        .filter((row) => row.convention === undefined || row.convention === em)
        .flatMap((row) => [row.symbol, ...row.aliases]);
      expect(names.filter((name, i) => names.indexOf(name) !== i)).toEqual([]);
    }
  });

  it("means one unit by each prefixed name, or a whole name that comes first", () => {
    const whole = new Set(unitRows.flatMap((row) => [row.symbol, ...row.aliases]));
    const seen = new Map<string, string>();
    const clashes: string[] = [];
    for (const row of unitRows.filter((one) => one.convention !== "gaussian")) {
      for (const prefix of row.prefixes) {
        const name = prefix + row.symbol;
        if (whole.has(name)) continue;
        if (seen.has(name)) clashes.push(`${name}: ${seen.get(name)} and ${row.symbol}`);
        seen.set(name, row.symbol);
      }
    }
    expect(clashes).toEqual([]);
  });
});
