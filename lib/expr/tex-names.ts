import { type UnitSystem, unitTex } from "../physics";
import { greekNames } from "./normalise";

/** Names as TeX, by the usual rules (ISO 80000-1): quantities italic, subscripts and units upright. */

const greekWithoutCommand: Record<string, string> = { omicron: "o" };
const bodies: Record<string, string> = { sun: "\\odot", earth: "\\oplus" };
const wholeNames: Record<string, string> = {
  hbar: "\\hbar",
  Ry: "\\mathrm{Ry}",
  GM_sun: "(GM)_{\\odot}",
  GM_earth: "(GM)_{\\oplus}",
  GM_jup: "(GM)_{\\mathrm{jup}}",
  pi: "\\pi",
};
const accents: readonly (readonly [RegExp, string])[] = [
  [/^(.+?)_?ddot$/, "\\ddot"],
  [/^(.+?)_?dot$/, "\\dot"],
];

function letterTex(base: string): string {
  if (greekNames.has(base)) return greekWithoutCommand[base] ?? `\\${base}`;
  const accented = accents.find(([pattern]) => pattern.test(base));
  if (accented) {
    const inner = accented[0].exec(base)?.[1] ?? "";
    return `${accented[1]}{${letterTex(inner)}}`;
  }
  const [, word = base, digits = ""] = /^(.*?)(\d*)$/.exec(base) ?? [];
  const set =
    [...word].length === 1 ? word : greekNames.has(word) ? `\\${word}` : `\\mathit{${word}}`;
  return digits === "" ? set : `${set}_{${digits}}`;
}

function subscriptTex(subscript: string): string {
  const parts = subscript.split("_").filter((part) => part !== "");
  const set = parts.map((part) => {
    if (bodies[part]) return bodies[part];
    if (greekNames.has(part)) return greekWithoutCommand[part] ?? `\\${part}`;
    return /^\d+$/.test(part) ? part : `\\mathrm{${part}}`;
  });
  return set.join(",\\,");
}

/** A quantity's name: `sigma_T` as σ with an upright T below, `Mdot` and `M_dot` as Ṁ. */
export function nameTex(name: string): string {
  const whole = wholeNames[name];
  if (whole) return whole;
  if (/^[^_]+_d?dot$/.test(name)) return letterTex(name);
  const at = name.indexOf("_");
  const base = at < 0 ? name : name.slice(0, at);
  const subscript = at < 0 ? "" : name.slice(at + 1);
  const [, before, dot, behind] = /^(?:(.+)_)?(d?dot)(?:_(.+))?$/.exec(subscript) ?? [];
  const rest = before ?? behind;
  if (dot && rest && !(before && behind)) {
    return `\\${dot}{${letterTex(base)}}_{${subscriptTex(rest)}}`;
  }
  const [, word = base, digits = ""] = /^(.*?)(\d*)$/.exec(base) ?? [];
  if (subscript === "") return letterTex(base);
  const below = digits === "" ? subscriptTex(subscript) : `${digits},\\,${subscriptTex(subscript)}`;
  return `${letterTex(digits === "" ? base : word)}_{${below}}`;
}

/** A unit inside a formula, upright. */
export function unitNameTex(name: string, system: UnitSystem): string {
  return unitTex(name, system);
}
