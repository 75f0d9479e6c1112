import fc from "fast-check";
import Fraction from "fraction.js";
import { describe, expect, it } from "vitest";
import {
  baseQuantities,
  dimension,
  dimensionless,
  dimensionToJson,
  divideDimensions,
  formatDimension,
  multiplyDimensions,
  powerDimension,
} from "@/lib/physics";

const energy = dimension({ mass: 1, length: 2, time: -2 });
const time = dimension({ time: 1 });

const rational = fc
  .tuple(fc.integer({ min: -6, max: 6 }), fc.constantFrom(1, 2, 3))
  .map(([above, below]) => `${above}/${below}`);
const anyDimension = fc
  .tuple(...baseQuantities.map(() => rational))
  .map((exponents) =>
    dimension(Object.fromEntries(baseQuantities.map((name, i) => [name, exponents[i] ?? "0"]))),
  );

describe("a dimension", () => {
  it("is the same object for equal exponents, however they are written", () => {
    expect(dimension({ length: 2, mass: 1, time: -2 })).toBe(energy);
    expect(dimension({ length: "3/2" })).toBe(dimension({ length: 1.5 }));
    expect(dimension({ length: 0 })).toBe(dimensionless);
    expect(dimension({ length: "2/4" })).toBe(dimension({ length: "1/2" }));
    expect(dimension({ length: 1 })).not.toBe(dimension({ mass: 1 }));
  });

  it("takes a number as the rational nearest to it", () => {
    expect(powerDimension(energy, 1 / 3)).toBe(powerDimension(energy, new Fraction("1/3")));
    expect(powerDimension(energy, 0.5)).toBe(dimension({ mass: "1/2", length: 1, time: -1 }));
  });

  it("adds exponents in a product, subtracts them in a quotient", () => {
    const luminosity = dimension({ mass: 1, length: 2, time: -3 });
    expect(divideDimensions(energy, time)).toBe(luminosity);
    expect(multiplyDimensions(luminosity, time)).toBe(energy);
  });
});

describe("the algebra of dimensions", () => {
  it("commutes and associates", () => {
    fc.assert(
      fc.property(anyDimension, anyDimension, anyDimension, (a, b, c) => {
        expect(multiplyDimensions(a, b)).toBe(multiplyDimensions(b, a));
        expect(multiplyDimensions(multiplyDimensions(a, b), c)).toBe(
          multiplyDimensions(a, multiplyDimensions(b, c)),
        );
      }),
    );
  });

  it("undoes a product by a quotient, and a power by its reciprocal", () => {
    fc.assert(
      fc.property(anyDimension, anyDimension, rational, (a, b, text) => {
        expect(divideDimensions(multiplyDimensions(a, b), b)).toBe(a);
        expect(divideDimensions(a, a)).toBe(dimensionless);
        const power = new Fraction(text);
        if (power.equals(0)) expect(powerDimension(a, power)).toBe(dimensionless);
        else expect(powerDimension(powerDimension(a, power), power.inverse())).toBe(a);
      }),
    );
  });

  it("distributes a power over a product", () => {
    fc.assert(
      fc.property(anyDimension, anyDimension, rational, (a, b, text) => {
        const power = new Fraction(text);
        expect(powerDimension(multiplyDimensions(a, b), power)).toBe(
          multiplyDimensions(powerDimension(a, power), powerDimension(b, power)),
        );
      }),
    );
  });

  it("reads back what it writes as JSON", () => {
    fc.assert(
      fc.property(anyDimension, (a) => {
        expect(dimension(dimensionToJson(a))).toBe(a);
      }),
    );
  });

  it("stays right when its tables are emptied", () => {
    for (let i = 1; i <= 5_500; i++) powerDimension(time, i);
    expect(powerDimension(time, 3)).toBe(dimension({ time: 3 }));
  });
});

describe("dimensionToJson", () => {
  it("writes rationals as strings and leaves zeros out", () => {
    expect(dimensionToJson(dimension({ mass: 1, length: 2, time: -3 }))).toEqual({
      mass: "1",
      length: "2",
      time: "-3",
    });
    expect(dimensionToJson(dimension({ mass: "1/2", length: "-3/2" }))).toEqual({
      mass: "1/2",
      length: "-3/2",
    });
    expect(dimensionToJson(dimensionless)).toEqual({});
  });
});

describe("formatDimension", () => {
  it.each([
    [dimension({ mass: 1, length: 2, time: -3 }), "M L² T⁻³"],
    [dimensionless, "1"],
    [dimension({ mass: "1/2", length: "-1/2", time: -1 }), "M¹ᐟ² L⁻¹ᐟ² T⁻¹"],
    [
      dimension({ current: 1, temperature: -4, amount: 1, "luminous intensity": 12 }),
      "I Θ⁻⁴ N J¹²",
    ],
  ])("writes %# as %s", (of, text) => {
    expect(formatDimension(of)).toBe(text);
  });
});
