/** Typed text brought to the notation that is parsed, with the way back to what was typed. */
export interface Normalised {
  readonly text: string;
  /** `origin[i]` is the position in the typed text of character `i`; one longer than `text`. */
  readonly origin: readonly number[];
}

const replacements: Record<string, string> = {
  "×": "*",
  "·": "*",
  "⋅": "*",
  "∙": "*",
  "−": "-",
  "–": "-",
  "÷": "/",
  "≤": "<=",
  "≥": ">=",
  "≠": "!=",
  "°": " deg",
  ħ: "hbar",
  ℏ: "hbar",
  "\u00a0": " ",
  "\u2009": " ",
  "\u202f": " ",
  "\u2002": " ",
  "\u2003": " ",
  "\u200a": " ",
  "\u2006": " ",
};

const greek: Record<string, string> = {
  α: "alpha",
  β: "beta",
  γ: "gamma",
  δ: "delta",
  ε: "epsilon",
  ϵ: "epsilon",
  ζ: "zeta",
  η: "eta",
  θ: "theta",
  ϑ: "theta",
  ι: "iota",
  κ: "kappa",
  λ: "lambda",
  μ: "mu",
  µ: "mu",
  ν: "nu",
  ξ: "xi",
  ο: "omicron",
  π: "pi",
  ρ: "rho",
  ς: "sigma",
  σ: "sigma",
  τ: "tau",
  υ: "upsilon",
  φ: "phi",
  ϕ: "phi",
  χ: "chi",
  ψ: "psi",
  ω: "omega",
  Γ: "Gamma",
  Δ: "Delta",
  Θ: "Theta",
  Λ: "Lambda",
  Ξ: "Xi",
  Π: "Pi",
  Σ: "Sigma",
  Υ: "Upsilon",
  Φ: "Phi",
  Ψ: "Psi",
  Ω: "Omega",
};

/** Names of Greek letters as they are spelled, each a TeX command of the same name. */
export const greekNames: ReadonlySet<string> = new Set(Object.values(greek));

const superscripts = "⁰¹²³⁴⁵⁶⁷⁸⁹";
const subscripts = "₀₁₂₃₄₅₆₇₈₉";
const superscriptRun = /^[⁺⁻]?[⁰¹²³⁴⁵⁶⁷⁸⁹]+/u;
const subscriptRun = /^[₀₁₂₃₄₅₆₇₈₉]+/u;

function plainScript(run: string): string {
  return [...run]
    .map((ch) => {
      if (ch === "⁻") return "-";
      if (ch === "⁺") return "";
      const digit = superscripts.indexOf(ch);
      return String(digit >= 0 ? digit : subscripts.indexOf(ch));
    })
    .join("");
}

/** One step at the start of `rest`: what was read and what it becomes. */
function readNotation(rest: string, before: string): { read: number; text: string } {
  const raised = superscriptRun.exec(rest)?.[0];
  if (raised) return { read: raised.length, text: `^(${plainScript(raised)})` };
  const lowered = subscriptRun.exec(rest)?.[0];
  if (lowered) return { read: lowered.length, text: `_${plainScript(lowered)}` };
  const cluster = /^\P{M}\p{M}*/u.exec(rest)?.[0] ?? rest.charAt(0);
  const composed = cluster.normalize("NFC");
  if ((composed === "⊙" || composed === "☉") && /[MRLT]$/.test(before)) {
    return { read: cluster.length, text: "_sun" };
  }
  if (composed === "⊕" && /[MRLT]$/.test(before)) return { read: cluster.length, text: "_earth" };
  if (composed === "√" && /^√\s*\(/.test(rest)) return { read: 1, text: "sqrt" };
  return { read: cluster.length, text: replacements[composed] ?? greek[composed] ?? composed };
}

/**
 * Bring typed notation to what is parsed: `×` to `*`, superscripts to powers, Greek letters to their
 * spelled names (so that `σ_T` and `sigma_T` are one name), and so on. Never fails; characters it
 * does not know pass through for the parser to refuse.
 */
export function normalise(typed: string): Normalised {
  let text = "";
  const origin: number[] = [];
  for (let position = 0; position < typed.length; ) {
    const step = readNotation(typed.slice(position, position + 64), text);
    for (let i = 0; i < step.text.length; i++) origin.push(position);
    text += step.text;
    position += step.read;
  }
  origin.push(typed.length);
  return { text, origin };
}

/** A symbol as the calculation knows it: normalised, without surrounding space. */
export function canonicalName(typed: string): string {
  return normalise(typed.trim()).text;
}

/** Where a range of normalised text lies in the typed text. */
export function typedRange(
  normalised: Normalised,
  from: number,
  to: number,
): { from: number; to: number } {
  const start = normalised.origin[from] ?? 0;
  const last = normalised.origin[Math.max(from, to - 1)] ?? start;
  // The end of the last typed character: the next origin that is larger.
  const end = normalised.origin.find((at, i) => i >= to && at > last);
  return { from: start, to: end ?? normalised.origin[normalised.origin.length - 1] ?? start };
}
