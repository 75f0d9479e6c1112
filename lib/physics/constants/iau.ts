import type { ConstantRow } from "./constant";

/** Nominal and defined values of the IAU: conversion constants, exact by resolution. */
const checked = "from memory, checked against a general-purpose library";
const divided = "computed";
const b3 = "IAU 2015 Resolution B3 (nominal conversion constant)";
const overG = "IAU 2015 Resolution B3, nominal GM over the edition’s G";

const nominal = (symbol: string, name: string, value: string, unit: string): ConstantRow => ({
  symbol,
  name,
  value,
  uncertainty: null,
  unit,
  source: b3,
  sourceStatus: checked,
});

const mass = (symbol: string, name: string, massParameter: string): ConstantRow => ({
  symbol,
  name,
  value: "",
  uncertainty: null,
  unit: "kg",
  source: overG,
  sourceStatus: divided,
  massParameter,
});

export const iauConstants: readonly ConstantRow[] = [
  mass("M_sun", "solar mass", "1.3271244e20"),
  nominal("R_sun", "nominal solar radius", "6.957e8", "m"),
  nominal("L_sun", "nominal solar luminosity", "3.828e26", "W"),
  nominal("T_sun", "nominal solar effective temperature", "5772", "K"),
  nominal("GM_sun", "nominal solar mass parameter", "1.3271244e20", "m^3 s^-2"),
  mass("M_earth", "Earth mass", "3.986004e14"),
  nominal("R_earth", "nominal terrestrial equatorial radius", "6.3781e6", "m"),
  nominal("GM_earth", "nominal terrestrial mass parameter", "3.986004e14", "m^3 s^-2"),
  mass("M_jup", "Jupiter mass", "1.2668653e17"),
  nominal("R_jup", "nominal jovian equatorial radius", "7.1492e7", "m"),
  nominal("GM_jup", "nominal jovian mass parameter", "1.2668653e17", "m^3 s^-2"),
  {
    symbol: "au",
    name: "astronomical unit",
    value: "149597870700",
    uncertainty: null,
    unit: "m",
    source: "IAU 2012 Resolution B2",
    sourceStatus: checked,
  },
  {
    symbol: "pc",
    name: "parsec (648000/π au)",
    value: "30856775814913672.789",
    uncertainty: null,
    unit: "m",
    source: "IAU 2015 Resolution B2",
    sourceStatus: checked,
  },
  {
    symbol: "ly",
    name: "light-year (Julian)",
    value: "9460730472580800",
    uncertainty: null,
    unit: "m",
    source: "IAU Style Manual (Wilkins 1989)",
    sourceStatus: checked,
  },
];
