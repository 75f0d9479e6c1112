import Fraction from "fraction.js";
import { dimensionless, dimensionToJson } from "../../physics";
import type { GivenCell } from "../../schema/calculation";
import { type GoodUnit, requireSymbol, requireUnit } from "../cell-faults";
import { raise } from "../faults";
import type { InputKey } from "../typed";
import type { KindOfCell } from "./kind";

/** True where a given states an uncertainty, in whatever form. */
export function isUncertain(cell: GivenCell): boolean {
  return standardUncertainty(cell) !== null;
}

/**
 * One standard deviation of a given in its own unit; null when it is exact. A uniform interval of
 * half-width a has a/√3 (JCGM 100:2008, 4.3.7); dex and factor to first order.
 */
export function standardUncertainty(cell: GivenCell): number | null {
  if (cell.uncertainty !== undefined) return cell.uncertainty === 0 ? null : cell.uncertainty;
  if (cell.interval) return (cell.interval[1] - cell.interval[0]) / Math.sqrt(12);
  if (cell.dex !== undefined) return Math.abs(cell.value) * Math.LN10 * cell.dex;
  if (cell.factor !== undefined) return Math.abs(cell.value) * Math.log(cell.factor);
  return null;
}

function requireSoundUncertainty(cell: GivenCell): void {
  const { uncertainty, interval, dex, factor, value } = cell;
  const fail = (reason: string, field: string) => raise({ code: "domain", reason, field });
  if ((uncertainty ?? 0) < 0) fail("uncertainty-negative", "uncertainty");
  if ((dex ?? 0) < 0) fail("uncertainty-negative", "dex");
  if (factor !== undefined && factor < 1) fail("factor-below-one", "factor");
  if ((dex !== undefined || factor !== undefined) && value <= 0) fail("log-normal-sign", "value");
  if (interval && !(interval[0] < interval[1] && interval[0] <= value && value <= interval[1])) {
    fail("interval-order", "interval");
  }
}

/** A value times the factor of its unit. Raises `overflow` where no double holds it. */
export function inSi(value: number, factor: number): number {
  const si = value * factor;
  if (!Number.isFinite(si)) raise({ code: "overflow", reason: "too-large", field: "value" });
  if (si === 0 && value !== 0) raise({ code: "overflow", reason: "underflow", field: "value" });
  return si;
}

/** A given rests on itself, in its own unit, and through a body mass in its unit on G. */
function restsOn(symbol: string, si: number, unit: GoodUnit, gravity: number) {
  const gradient = new Map<InputKey, number>([[`symbol:${symbol}`, unit.factor]]);
  const powers = new Map<InputKey, Fraction>([[`symbol:${symbol}`, new Fraction(1)]]);
  const masses = unit.nominalMassExponents ?? [];
  const inG = masses.reduce((sum, { exponent }) => sum.sub(exponent), new Fraction(0));
  if (!inG.equals(0)) {
    gradient.set("constant:G", (si * inG.valueOf()) / gravity);
    powers.set("constant:G", inG);
  }
  return { gradient, powers };
}

/** An input or assumption: symbol, value, uncertainty, unit. */
export const givenKind: KindOfCell<GivenCell> = {
  kind: "given",
  declare: (cell) => ({ symbol: requireSymbol(cell.symbol), isFunction: false }),
  read: () => ({ formulas: [] }),
  structure: (cell) => cell.symbol,
  values: (cell) =>
    [cell.value, cell.unit, cell.uncertainty, cell.interval?.join(), cell.dex, cell.factor].join(
      "\u0000",
    ),
  evaluate: (cell, _reading, context) => {
    requireSoundUncertainty(cell);
    const unit = requireUnit(cell.unit ?? "", context.system, "unit");
    const si = inSi(cell.value, unit.factor);
    const exact = unit.dimension === dimensionless && !isUncertain(cell);
    const symbol = requireSymbol(cell.symbol);
    return {
      si,
      ...restsOn(symbol, si, unit, context.value("constant:G")),
      meaning: { kind: "quantity", dimension: unit.dimension, ...(exact ? { exact: si } : {}) },
      result: {
        kind: "given",
        status: "ok",
        symbol,
        value: cell.value,
        unit: cell.unit ?? "",
        si: { value: si, dimension: dimensionToJson(unit.dimension) },
        uncertainty: standardUncertainty(cell),
      },
    };
  },
};
