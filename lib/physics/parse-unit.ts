import type Fraction from "fraction.js";
import { type Dimension, dimensionless, multiplyDimensions, powerDimension } from "./dimension";
import { type UnitFactor, type UnitFailure, UnitFault, UnitReader } from "./unit-reader";
import type { UnitSystem } from "./unit-system";

/** A body mass in a unit: the factor goes with `(nominalGM / G) ^ exponent`. */
export interface NominalMassExponent {
  readonly symbol: string;
  readonly nominalGM: number;
  readonly exponent: Fraction;
}

/** What a unit string was read as. */
export type ParsedUnit =
  | {
      readonly ok: true;
      /** To coherent SI. */
      readonly factor: number;
      readonly dimension: Dimension;
      /** In the order written, quotients as negative exponents. */
      readonly factors: readonly UnitFactor[];
      /** The body masses among the factors; absent where there are none. */
      readonly nominalMassExponents?: readonly NominalMassExponent[];
    }
  | UnitFailure;

function nominalMasses(factors: readonly UnitFactor[]): NominalMassExponent[] {
  return factors.flatMap(({ unit, symbol, exponent }) =>
    unit.nominalGM === undefined ? [] : [{ symbol, nominalGM: unit.nominalGM, exponent }],
  );
}

function settle(text: string, factors: readonly UnitFactor[]): ParsedUnit {
  let factor = 1;
  let of = dimensionless;
  for (const { unit, exponent } of factors) {
    factor *= unit.factor ** exponent.valueOf();
    of = multiplyDimensions(of, powerDimension(unit.dimension, exponent));
  }
  if (!Number.isFinite(factor) || factor === 0) {
    return { ok: false, code: "syntax", from: 0, to: text.length, suggestions: [] };
  }
  const masses = nominalMasses(factors);
  const linked = masses.length === 0 ? {} : { nominalMassExponents: masses };
  return { ok: true, factor, dimension: of, factors, ...linked };
}

function parse(text: string, system: UnitSystem): ParsedUnit {
  if (text.trim() === "") return settle(text, []);
  try {
    return settle(text, new UnitReader(text, system).read());
  } catch (error) {
    if (error instanceof UnitFault) return error.failure;
    throw error;
  }
}

const parsed = new Map<string, ParsedUnit>();
const mostParsed = 5_000;
/** A longer text is a fault and not worth remembering. */
const longestRemembered = 200;

/**
 * Read a unit string: `erg/s/cm^2`, `erg s^-1 cm^-2`, `g^(1/2) cm^(-1/2) s^-1`, `M⊙ yr⁻¹`; empty is
 * dimensionless. Units side by side multiply and bind tighter than `/`, as in formulas; a bare
 * `^1/2` is a power of one, then a quotient. Never throws: a failure says where (`from`, `to`) and
 * what may have been meant. A unit beyond the range of a double is a `syntax` failure.
 */
export function parseUnit(text: string, system: UnitSystem): ParsedUnit {
  const key = `${system.edition} ${system.em} ${text}`;
  const known = parsed.get(key);
  if (known) return known;
  const made = parse(text, system);
  if (text.length > longestRemembered) return made;
  if (parsed.size >= mostParsed) parsed.clear();
  parsed.set(key, made);
  return made;
}
