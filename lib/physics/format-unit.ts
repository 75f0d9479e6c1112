import Fraction from "fraction.js";
import { superscriptExponent } from "./dimension";
import { parseUnit, type UnitFactor } from "./parse-unit";
import type { UnitSystem } from "./unit-system";

const pretty: Readonly<Record<string, string>> = {
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
  day: "d",
  hr: "h",
};

const texNames: Readonly<Record<string, string>> = {
  Msun: "M_{\\odot}",
  Rsun: "R_{\\odot}",
  Lsun: "L_{\\odot}",
  Mearth: "M_{\\oplus}",
  Rearth: "R_{\\oplus}",
  Mjup: "M_{\\mathrm{J}}",
  Rjup: "R_{\\mathrm{J}}",
  angstrom: "\\mathrm{\\mathring{A}}",
  ohm: "\\Omega",
  percent: "\\%",
  deg: "{}^{\\circ}",
};

function prettySymbol({ unit }: UnitFactor): string {
  const shown = pretty[unit.row.symbol];
  return shown === undefined ? unit.symbol : unit.symbol.replace(unit.row.symbol, shown);
}

/** “erg s⁻¹ cm⁻²”: quotients as negative powers, the order kept. The text itself if it is no unit. */
export function formatUnit(text: string, system: UnitSystem): string {
  const unit = parseUnit(text, system);
  if (!unit.ok) return text;
  return unit.factors
    .map((factor) => prettySymbol(factor) + superscriptExponent(factor.exponent))
    .join(" ");
}

function texSymbol({ unit }: UnitFactor): string {
  const { symbol } = unit.row;
  const prefix = unit.symbol.slice(0, unit.symbol.length - symbol.length);
  const prefixTex = prefix === "µ" ? "\\mu" : prefix === "" ? "" : `\\mathrm{${prefix}}`;
  const special = texNames[symbol];
  if (special !== undefined) return prefixTex + special;
  const plain = pretty[symbol] ?? symbol;
  return prefix === "µ" ? `\\mu\\mathrm{${plain}}` : `\\mathrm{${prefix}${plain}}`;
}

function texFactor(factor: UnitFactor): string {
  const base = texSymbol(factor);
  if (factor.exponent.equals(new Fraction(1))) return base;
  const exponent = factor.exponent.toFraction();
  return base.includes("_{") ? `{${base}}^{${exponent}}` : `${base}^{${exponent}}`;
}

/** The same as TeX, upright, with thin spaces. */
export function unitTex(text: string, system: UnitSystem): string {
  const unit = parseUnit(text, system);
  if (!unit.ok) return `\\text{${text.replace(/[\\{}$&#^_%~]/g, " ")}}`;
  return unit.factors.map(texFactor).join("\\,");
}
