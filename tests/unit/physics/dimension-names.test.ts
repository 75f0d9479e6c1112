import { describe, expect, it } from "vitest";
import {
  customaryUnit,
  type Dimension,
  describeDimension,
  dimension,
  dimensionName,
  type EmConvention,
  parseUnit,
} from "@/lib/physics";
import { namedDimensions } from "@/lib/physics/dimension-names";

const conventions: EmConvention[] = ["si", "gaussian"];

function of(unit: string, em: EmConvention = "si"): Dimension {
  const parsed = parseUnit(unit, { edition: "codata-2018", em });
  if (!parsed.ok) throw new Error(unit);
  return parsed.dimension;
}

describe("dimensionName", () => {
  it.each([
    ["erg", "energy"],
    ["Lsun", "luminosity"],
    ["Jy", "spectral flux density"],
    ["cm^2/g", "opacity"],
    ["yr", "time"],
    ["erg/s/cm^2", "flux"],
    ["Msun/yr", "mass rate"],
    ["g/cm^3", "mass density"],
    ["Msun/pc^2", "surface density"],
    ["cm^-3", "number density"],
    ["km/s", "velocity"],
    ["dyn", "force"],
    ["erg/K", "entropy"],
    ["erg s", "angular momentum"],
    ["percent", "pure number"],
    ["gauss", "magnetic field"],
    ["C", "electric charge"],
  ])("calls what is measured in %s a %s", (unit, name) => {
    expect(dimensionName(of(unit))).toBe(name);
  });

  it("knows the Gaussian dimensions under that convention only", () => {
    const field = of("gauss", "gaussian");
    expect(dimensionName(field, "gaussian")).toBe("magnetic field");
    expect(dimensionName(field, "si")).toBeUndefined();
    expect(dimensionName(of("esu", "gaussian"), "gaussian")).toBe("electric charge");
    expect(dimensionName(of("statV", "gaussian"), "gaussian")).toBe("electric potential");
    expect(dimensionName(of("erg/gauss", "gaussian"), "gaussian")).toBe("magnetic moment");
  });

  it("is undefined for what has no name", () => {
    expect(dimensionName(dimension({ mass: 7 }))).toBeUndefined();
  });

  it("knows at least 70 dimensions, each with a unit of it", () => {
    for (const em of conventions) {
      const named = [...namedDimensions(em)];
      expect(named.length).toBeGreaterThanOrEqual(70);
      for (const [one, row] of named) {
        expect(of(row.unit, em), row.name).toBe(one);
        expect(dimensionName(one, em)).toBe(row.name);
        expect(customaryUnit(one, em)).toBe(row.unit);
      }
    }
  });

  it("has a name once, but for SI quantities met in a Gaussian calculation", () => {
    const names = (em: EmConvention) => [...namedDimensions(em).values()].map((row) => row.name);
    expect(new Set(names("si")).size).toBe(names("si").length);
    expect(new Set(names("gaussian")).size).toBe(new Set(names("si")).size);
  });
});

describe("describeDimension", () => {
  it.each([
    ["W", "a luminosity (erg s⁻¹)"],
    ["J", "an energy (erg)"],
    ["m^2/kg", "an opacity (cm² g⁻¹)"],
    ["g cm", "a quantity of dimension M L (g cm)"],
    ["", "a pure number"],
    ["T", "a magnetic field (T)"],
  ])("tells %s as “%s”", (unit, text) => {
    expect(describeDimension(of(unit))).toBe(text);
  });

  it("tells Gaussian quantities in Gaussian units, SI ones still in SI", () => {
    expect(describeDimension(of("gauss", "gaussian"), "gaussian")).toBe("a magnetic field (G)");
    expect(describeDimension(of("T", "gaussian"), "gaussian")).toBe("a magnetic field (T)");
  });
});
