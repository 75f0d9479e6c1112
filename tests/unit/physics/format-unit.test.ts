import katex from "katex";
import { describe, expect, it } from "vitest";
import { formatUnit, listUnits, parseUnit, type UnitSystem, unitTex } from "@/lib/physics";
import { expectWithin } from "./approximately";

const si: UnitSystem = { edition: "codata-2018", em: "si" };
const gaussian: UnitSystem = { edition: "codata-2018", em: "gaussian" };

describe("formatUnit", () => {
  it.each([
    ["erg/s/cm^2", "erg s⁻¹ cm⁻²"],
    ["cm^-2 erg/s", "cm⁻² erg s⁻¹"],
    ["Msun/yr", "M⊙ yr⁻¹"],
    ["Rsun", "R⊙"],
    ["Lsun", "L⊙"],
    ["Mearth", "M⊕"],
    ["Rearth^2", "R⊕²"],
    ["ugauss", "µG"],
    ["uas", "µas"],
    ["um", "µm"],
    ["angstrom", "Å"],
    ["kohm", "kΩ"],
    ["g^(1/2) cm^(-1/2)", "g¹ᐟ² cm⁻¹ᐟ²"],
    ["1/s", "s⁻¹"],
    ["", ""],
    ["percent", "%"],
    ["no unit", "no unit"],
  ])("shows “%s” as “%s”", (text, shown) => {
    expect(formatUnit(text, si)).toBe(shown);
  });

  /** Shown by their symbols, which the language leaves to quantities of these names. */
  const symbolsOnly = new Set(["gauss", "day", "hr", "Mjup", "Rjup"]);

  it("shows what can be typed back, for every unit but a few", () => {
    for (const system of [si, gaussian]) {
      for (const { symbol } of listUnits(system)) {
        const typed = `${symbol}^(3/2) s^-2`;
        const back = parseUnit(formatUnit(typed, system), system);
        expect(back.ok, symbol).toBe(!symbolsOnly.has(symbol));
        const meant = parseUnit(typed, system);
        if (!back.ok || !meant.ok) continue;
        expect(back.dimension).toBe(meant.dimension);
        expectWithin(back.factor, meant.factor, 1e-14);
      }
    }
  });
});

describe("unitTex", () => {
  it.each([
    ["erg/s/cm^2", "\\mathrm{erg\\,s^{-1}\\,cm^{-2}}"],
    ["Msun/yr", "\\mathrm{M_\\odot\\,yr^{-1}}"],
    ["Msun^2", "\\mathrm{M_\\odot^{2}}"],
    ["µJy", "\\mathrm{\\mu Jy}"],
    ["angstrom", "\\mathrm{\\mathring{A}}"],
    ["percent", "\\mathrm{\\%}"],
    ["kpc", "\\mathrm{kpc}"],
    ["g^(1/2)", "\\mathrm{g^{1/2}}"],
    ["", ""],
    ["a_b{$}", "\\text{a b   }"],
  ])("sets “%s” as %s", (text, tex) => {
    expect(unitTex(text, si)).toBe(tex);
  });

  it("is TeX that can be set, for every unit and its square", () => {
    for (const { symbol, prefixes } of listUnits(gaussian)) {
      for (const prefix of ["", ...prefixes]) {
        const tex = unitTex(`${prefix}${symbol}^2 s^-1`, gaussian);
        expect(() => katex.renderToString(tex, { strict: "error" }), tex).not.toThrow();
      }
    }
  });
});
