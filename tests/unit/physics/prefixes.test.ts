import { describe, expect, it } from "vitest";
import { findUnit } from "@/lib/physics";
import { prefixes } from "@/lib/physics/prefixes";
import { expectExactly } from "./approximately";

const si = { edition: "codata-2018", em: "si" } as const;

describe("the prefixes", () => {
  it("are the 24 of the SI", () => {
    expect(Object.keys(prefixes)).toHaveLength(24);
  });

  it("come in pairs of reciprocals", () => {
    const powers = Object.values(prefixes).map((factor) => Math.round(Math.log10(factor)));
    expect(powers.filter((power) => power > 0).sort()).toEqual(
      powers
        .filter((power) => power < 0)
        .map((power) => -power)
        .sort(),
    );
  });

  it.each(Object.entries(prefixes))("%s multiplies a metre by %d", (prefix, factor) => {
    // `cd` and `min` are units of their own; a metre has no such namesake.
    expectExactly(findUnit(`${prefix}m`, si)?.factor ?? Number.NaN, factor);
  });

  it("are written with a micro sign, a Greek mu or a u", () => {
    for (const name of ["um", "µm", "μm"]) expect(findUnit(name, si)?.symbol).toBe("µm");
  });
});
