import type { GivenCell } from "../schema/calculation";

/** A number as one would type it: 1e9 rather than nine zeros, 4e38 rather than 4e+38. */
function typed(value: number): string {
  const text = String(value);
  const isLong = /0{5}$/.test(text) && !text.includes(".");
  return (isLong ? value.toExponential() : text).replace("e+", "e");
}

/** A given's value as one would type it: the inverse of `readValue`. */
export function valueLine(cell: GivenCell): string {
  const unit = cell.unit ? ` ${cell.unit}` : "";
  if (cell.interval) {
    const [lower, upper] = cell.interval;
    return `${typed(lower)} .. ${typed(upper)}${unit}`;
  }
  if (cell.dex !== undefined) return `${typed(cell.value)} ± ${cell.dex} dex${unit}`;
  if (cell.factor !== undefined)
    return `${typed(cell.value)}${unit} within a factor ${cell.factor}`;
  if (cell.uncertainty !== undefined)
    return `${withUncertainty(cell.value, cell.uncertainty)}${unit}`;
  return `${typed(cell.value)}${unit}`;
}

/** `0.34(2)` where the figures allow it exactly, else `4.3 ± 0.015`. */
export function withUncertainty(value: number, uncertainty: number): string {
  return concise(value, uncertainty) ?? `${typed(value)} ± ${typed(uncertainty)}`;
}

/** Parenthesis notation, where value and uncertainty come back from it to the last bit. */
export function concise(value: number, uncertainty: number): string | undefined {
  if (!(uncertainty > 0) || uncertainty > Math.abs(value)) return undefined;
  const [digits = "", power = "0"] = uncertainty.toExponential().split("e");
  const last = digits.replace(".", "");
  if (last.length > 2) return undefined;
  const place = Number(power) - (last.length - 1);
  const valuePower = value === 0 ? 0 : Math.floor(Math.log10(Math.abs(value)));
  const usesPower = valuePower < -3 || valuePower > 5 || place > 0;
  const shift = usesPower ? valuePower : 0;
  const decimals = shift - place;
  if (decimals < 0 || decimals > 15) return undefined;
  const mantissa = (value / 10 ** shift).toFixed(decimals);
  const text = `${mantissa}(${last})${shift === 0 ? "" : `e${shift}`}`;
  const exact =
    Number(`${mantissa}e${shift}`) === value && Number(`${last}e${place}`) === uncertainty;
  return exact ? text : undefined;
}
