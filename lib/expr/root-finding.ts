type Expression = (x: number) => number;

/** Two arguments between which an expression changes its sign. */
export interface Bracket {
  readonly from: number;
  readonly to: number;
}

const samples = 200;

/** Points over a range: in equal ratios where it is positive and wide, else in equal steps. */
export function spread(from: number, to: number, count: number): number[] {
  const inRatio = from > 0 && to > 0 && Math.max(from, to) / Math.min(from, to) > 100;
  return Array.from({ length: count }, (_, i) => {
    const share = i / (count - 1);
    if (i === 0) return from;
    if (i === count - 1) return to;
    return inRatio ? from * (to / from) ** share : from + (to - from) * share;
  });
}

/** Every bracket of a sign change found at sample points of the range. */
export function findBrackets(f: Expression, from: number, to: number, most = 1): Bracket[] {
  const brackets: Bracket[] = [];
  const points = spread(from, to, samples);
  let before = points[0] as number;
  let sign = Math.sign(f(before));
  if (sign === 0) return [{ from: before, to: before }];
  for (const x of points.slice(1)) {
    const here = Math.sign(f(x));
    if (here !== sign) brackets.push({ from: before, to: x });
    if (brackets.length >= most) break;
    before = x;
    sign = here;
  }
  return brackets;
}

/**
 * The zero inside a bracket, by Brent's method (Brent 1973, Algorithms for Minimization without
 * Derivatives, ch. 4), to the last digits of a double.
 */
export function brent(f: Expression, bracket: Bracket): number {
  let [a, b] = [bracket.from, bracket.to];
  let [fa, fb] = [f(a), f(b)];
  let [c, fc] = [a, fa];
  let step = b - a;
  let previous = step;
  for (let round = 0; round < 200; round++) {
    if (fb === 0 || a === b) return b;
    if (Math.sign(fb) === Math.sign(fc)) {
      [c, fc] = [a, fa];
      step = b - a;
      previous = step;
    }
    if (Math.abs(fc) < Math.abs(fb)) {
      [a, b, c] = [b, c, b];
      [fa, fb, fc] = [fb, fc, fb];
    }
    const half = (c - b) / 2;
    const tolerance = 2 * Number.EPSILON * Math.abs(b);
    if (Math.abs(half) <= tolerance) return b;
    const trial = interpolate(a, b, c, fa, fb, fc);
    if (trial !== undefined && isSafe(trial, half, previous, tolerance)) {
      previous = step;
      step = trial;
    } else {
      step = half;
      previous = half;
    }
    [a, fa] = [b, fb];
    b += Math.abs(step) > tolerance ? step : Math.sign(half) * tolerance;
    fb = f(b);
  }
  return b;
}

/**
 * True where a change of sign between `ends` is a zero at `x`, not a pole: at a zero an expression is
 * no larger than at both ends.
 */
export function isZero(atRoot: number, ends: readonly [number, number]): boolean {
  return Math.abs(atRoot) <= Math.min(Math.abs(ends[0]), Math.abs(ends[1]));
}

/** The first zero of the range; poles, where the sign changes too, are passed over. */
export function firstZero(f: Expression, from: number, to: number): number | undefined {
  // The rest of the range is looked at only where the first change of sign is a pole.
  for (const most of [1, samples]) {
    for (const bracket of findBrackets(f, from, to, most)) {
      const x = brent(f, bracket);
      if (isZero(f(x), [f(bracket.from), f(bracket.to)])) return x;
    }
  }
  return undefined;
}

/** The step to the zero of the secant or of the inverse parabola, from b. */
function interpolate(a: number, b: number, c: number, fa: number, fb: number, fc: number) {
  if (Math.abs(fa) <= Math.abs(fb)) return undefined;
  const s = fb / fa;
  if (a === c) return (s * (c - b)) / (1 - s);
  const q = fa / fc;
  const r = fb / fc;
  const p = s * ((c - b) * q * (q - r) - (b - a) * (r - 1));
  const divisor = -((q - 1) * (r - 1) * (s - 1));
  return divisor === 0 ? undefined : p / divisor;
}

function isSafe(trial: number, half: number, previous: number, tolerance: number): boolean {
  const inside = trial * Math.sign(half) > 0 && Math.abs(trial) < 1.5 * Math.abs(half) - tolerance;
  return inside && Math.abs(trial) < Math.abs(previous) / 2;
}
