/** Slopes as text: the arithmetic of first derivatives, with zeros and ones left out. */

export const none = "0";

/** The slope of one lane; a lane beyond the end has none. */
export function slopeAt(slopes: readonly string[], lane: number): string {
  return slopes[lane] ?? none;
}

function isPlain(text: string): boolean {
  return /^[\w.[\]]+$/.test(text);
}

function held(text: string): string {
  return isPlain(text) ? text : `(${text})`;
}

export function times(a: string, b: string): string {
  if (a === none || b === none) return none;
  if (a === "1") return b;
  return b === "1" ? a : `${held(a)} * ${held(b)}`;
}

export function plus(a: string, b: string): string {
  if (a === none) return b;
  return b === none ? a : `${a} + ${b}`;
}

export function minus(a: string, b: string): string {
  if (b === none) return a;
  return a === none ? `-${held(b)}` : `${a} - ${held(b)}`;
}

export function over(a: string, b: string): string {
  return a === none ? none : `${held(a)} / ${held(b)}`;
}
