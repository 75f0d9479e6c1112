import { describe, expect, it } from "vitest";
import { findUnit } from "@/lib/physics";
import { suggestUnits } from "@/lib/physics/suggest-units";

const si = { edition: "codata-2018", em: "si" } as const;

describe("suggestUnits", () => {
  it.each([
    ["G", "gauss"],
    ["d", "day"],
    ["h", "hr"],
    ["a", "yr"],
    ["Erg", "erg"],
    ["ergs", "erg"],
    ["gaus", "gauss"],
    ["MSUN", "Msun"],
    ["KeV", "keV"],
    ["KPC", "kpc"],
    ["jy", "Jy"],
    ["Angstroms", "Angstrom"],
    ["arcsecs", "arcsec"],
    ["parsec", "pc"],
    ["seconds", "s"],
    ["Kelvin", "K"],
    ["sec", "s"],
    ["years", "yr"],
    ["Msol", "Msun"],
  ])("takes %s for a slip of %s", (name, meant) => {
    expect(suggestUnits(name, si)).toContain(meant);
  });

  it("puts a unit written out before a likeness", () => {
    expect(suggestUnits("parsec", si)[0]).toBe("pc");
  });

  it("names units that exist, three at most, never what was typed", () => {
    for (const name of ["G", "Kev", "ms2", "Rsum", "barns", "mpC", "x", "constructor"]) {
      const suggested = suggestUnits(name, si);
      expect(suggested.length).toBeLessThanOrEqual(3);
      for (const one of suggested) {
        expect(findUnit(one, si)).toBeDefined();
        expect(one).not.toBe(name);
      }
    }
  });

  it("is silent where nothing is near", () => {
    for (const name of ["x", "luminosity", "qq", "constructor"]) {
      expect(suggestUnits(name, si)).toEqual([]);
    }
  });
});
