/**
 * Definite integrals by adaptive Gauss–Kronrod quadrature (7 and 15 points; nodes and weights as in
 * QUADPACK, Piessens et al. 1983). Ranges of positive numbers that span decades are integrated in the
 * logarithm, where power laws are smooth; ranges that reach zero begin with pieces that grow by
 * decades away from it, so that what happens near zero is not missed.
 */
export interface Quadrature {
  readonly value: number;
  /** Estimate of the absolute error. */
  readonly error: number;
  /** The integral of the absolute value. */
  readonly size: number;
}

const nodes = [
  0.9914553711208126, 0.9491079123427585, 0.8648644233597691, 0.7415311855993945,
  0.5860872354676911, 0.4058451513773972, 0.20778495500789848, 0,
];
const kronrodWeights = [
  0.022935322010529224, 0.06309209262997856, 0.10479001032225019, 0.14065325971552592,
  0.1690047266392679, 0.19035057806478542, 0.20443294007529889, 0.20948214108472782,
];
const gaussWeights = [
  0.1294849661688697, 0.27970539148927664, 0.3818300505051189, 0.4179591836734694,
];

interface Piece extends Quadrature {
  readonly from: number;
  readonly to: number;
}

type Integrand = (x: number) => number;

function measure(f: Integrand, from: number, to: number): Piece {
  const half = (to - from) / 2;
  const middle = (from + to) / 2;
  const centre = f(middle);
  let kronrod = centre * (kronrodWeights[7] as number);
  let gauss = centre * (gaussWeights[3] as number);
  let size = Math.abs(kronrod);
  for (let i = 0; i < 7; i++) {
    const offset = half * (nodes[i] as number);
    const [left, right] = [f(middle - offset), f(middle + offset)];
    const pair = left + right;
    kronrod += pair * (kronrodWeights[i] as number);
    size += (Math.abs(left) + Math.abs(right)) * (kronrodWeights[i] as number);
    if (i % 2 === 1) gauss += pair * (gaussWeights[(i - 1) / 2] as number);
  }
  const error = Math.abs((kronrod - gauss) * half);
  return { from, to, value: kronrod * half, error, size: size * half };
}

function total(pieces: readonly Piece[]): Quadrature {
  let value = 0;
  let error = 0;
  let size = 0;
  for (const piece of pieces) {
    value += piece.value;
    error += piece.error;
    size += piece.size;
  }
  // What is left of parts that cancel is rounding.
  return { value: Math.abs(value) <= roundingOf(size) ? 0 : value, error, size };
}

/** Below this an error is rounding, as in QUADPACK. */
function roundingOf(size: number): number {
  return 50 * Number.EPSILON * size;
}

/** The integral over pieces between neighbouring `ends`, cut further where it is worst known. */
function refine(f: Integrand, ends: readonly number[], tolerance: number): Quadrature {
  const pieces = ends.slice(1).map((to, i) => measure(f, ends[i] as number, to));
  for (let rounds = 0; rounds < mostPieces; rounds++) {
    const sum = total(pieces);
    const enough = Math.max(tolerance * Math.abs(sum.value), roundingOf(sum.size));
    if (sum.error <= enough) return sum;
    let worst = 0;
    for (let i = 1; i < pieces.length; i++) {
      if ((pieces[i] as Piece).error > (pieces[worst] as Piece).error) worst = i;
    }
    const piece = pieces[worst] as Piece;
    const middle = (piece.from + piece.to) / 2;
    if (middle === piece.from || middle === piece.to) return sum;
    pieces.splice(worst, 1, measure(f, piece.from, middle), measure(f, middle, piece.to));
  }
  return total(pieces);
}

const mostPieces = 900;

/** Positive limits further apart than this are integrated in the logarithm. */
const decadesApart = 1e3;

/** Equal steps of at most `longest` from one end to the other. */
function steps(from: number, to: number, longest: number): number[] {
  const count = Math.ceil((to - from) / longest);
  return Array.from({ length: count + 1 }, (_, i) =>
    i === count ? to : from + ((to - from) * i) / count,
  );
}

/** Pieces of the logarithm: two decades each. */
const logStep = Math.log(100);

/** From zero to `to` (not zero) in pieces, each a hundred times longer than the one before. */
function awayFromZero(to: number): number[] {
  return [0, ...Array.from({ length: 10 }, (_, i) => to * 100 ** (i - 9))];
}

/** Where the pieces of a range begin and end at first. */
function firstEnds(from: number, to: number): number[] {
  if (from > 0 || to < 0) return [from, to];
  const above = to > 0 ? awayFromZero(to) : [0];
  const below = from < 0 ? awayFromZero(from).reverse() : [0];
  return [...below, ...above.slice(1)];
}

/** ∫ f(x) dx from `from` to `to`, aimed at a relative error of `tolerance`. */
export function quadrature(f: Integrand, from: number, to: number, tolerance = 1e-12): Quadrature {
  if (from === to) return { value: 0, error: 0, size: 0 };
  if (from > to) {
    const reversed = quadrature(f, to, from, tolerance);
    return { ...reversed, value: 0 - reversed.value };
  }
  if (from > 0 && to / from > decadesApart) {
    const inLog = (u: number) => {
      const x = Math.exp(u);
      return f(x) * x;
    };
    return refine(inLog, steps(Math.log(from), Math.log(to), logStep), tolerance);
  }
  return refine(f, firstEnds(from, to), tolerance);
}
