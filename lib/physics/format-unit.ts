import { superscriptExponent } from "./dimension";
import { parseUnit } from "./parse-unit";
import type { UnitFactor } from "./unit-reader";
import type { UnitSystem } from "./unit-system";

/** Symbols of the trade for the names of the unit language, in running text. */
const textSymbols: Readonly<Record<string, string>> = {
  Msun: "M⊙",
  Rsun: "R⊙",
  Lsun: "L⊙",
  Mearth: "M⊕",
  Rearth: "R⊕",
  Mjup: "M_J",
  Rjup: "R_J",
  angstrom: "Å",
  gauss: "G",
  ohm: "Ω",
  percent: "%",
  deg: "°",
  uas: "µas",
  day: "d",
  hr: "h",
};

/** The same inside `\mathrm{…}`, where they are written differently. */
const texSymbols: Readonly<Record<string, string>> = {
  Msun: "M_\\odot",
  Rsun: "R_\\odot",
  Lsun: "L_\\odot",
  Mearth: "M_\\oplus",
  Rearth: "R_\\oplus",
  Mjup: "M_J",
  Rjup: "R_J",
  angstrom: "\\mathring{A}",
  ohm: "\\Omega",
  percent: "\\%",
  deg: "{}^{\\circ}",
  uas: "\\mu as",
};

function prefixOf({ unit }: UnitFactor): string {
  return unit.symbol.slice(0, unit.symbol.length - unit.row.symbol.length);
}

function textFactor(factor: UnitFactor): string {
  const { symbol } = factor.unit.row;
  const shown = prefixOf(factor) + (textSymbols[symbol] ?? symbol);
  return shown + superscriptExponent(factor.exponent);
}

/** “erg s⁻¹ cm⁻²”: quotients as negative powers, the order kept. The text itself if it is no unit. */
export function formatUnit(text: string, system: UnitSystem): string {
  const unit = parseUnit(text, system);
  return unit.ok ? unit.factors.map(textFactor).join(" ") : text;
}

function texFactor(factor: UnitFactor): string {
  const { symbol } = factor.unit.row;
  const prefix = prefixOf(factor);
  const shown = texSymbols[symbol] ?? textSymbols[symbol] ?? symbol;
  const whole = `${prefix === "µ" ? "\\mu " : prefix}${shown}`;
  if (factor.exponent.equals(1)) return whole;
  // A sign of its own above needs a group below the exponent.
  const base = symbol === "deg" ? `{${whole}}` : whole;
  return `${base}^{${factor.exponent.toFraction()}}`;
}

/**
 * The same as TeX: upright, with thin spaces, `\mathrm{erg\,s^{-1}\,cm^{-2}}`. A pure number is an
 * empty text; what is no unit is set as text.
 */
export function unitTex(text: string, system: UnitSystem): string {
  const unit = parseUnit(text, system);
  if (!unit.ok) return `\\text{${text.replace(/[\\{}$&#^_%~]/g, " ")}}`;
  if (unit.factors.length === 0) return "";
  return `\\mathrm{${unit.factors.map(texFactor).join("\\,")}}`;
}
