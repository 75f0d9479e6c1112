/**
 * Definite integrals by adaptive Gauss–Kronrod quadrature (7 and 15 points; nodes and weights as in
 * QUADPACK, Piessens et al. 1983). Ranges of positive numbers that span decades are integrated in the
 * logarithm, where power laws are smooth.
 */
export interface Quadrature {
  readonly value: number;
  /** Estimate of the absolute error. */
  readonly error: number;
}

const nodes = [
  0.991455371120812639206854697526329, 0.949107912342758524526189684047851,
  0.864864423359769072789712788640926, 0.741531185599394439863864773280788,
  0.58608723546769113029414483825873, 0.405845151377397166906606412076961,
  0.207784955007898467600689403773245, 0,
];
const kronrodWeights = [
  0.02293532201052922496373200805897, 0.063092092629978553290700663189204,
  0.104790010322250183839876322541518, 0.140653259715525918745189590510238,
  0.16900472663926790282829543641895, 0.190350578064785409913256402421014,
  0.204432940075298892414161999234649, 0.209482141084727828012999174891714,
];
const gaussWeights = [
  0.129484966168869693270611432679082, 0.27970539148927666790146777142378,
  0.381830050505118944950369775488975, 0.417959183673469387755102040816327,
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
  for (let i = 0; i < 7; i++) {
    const offset = half * (nodes[i] as number);
    const pair = f(middle - offset) + f(middle + offset);
    kronrod += pair * (kronrodWeights[i] as number);
    if (i % 2 === 1) gauss += pair * (gaussWeights[(i - 1) / 2] as number);
  }
  return { from, to, value: kronrod * half, error: Math.abs((kronrod - gauss) * half) };
}

function total(pieces: readonly Piece[]): Quadrature {
  let value = 0;
  let error = 0;
  for (const piece of pieces) {
    value += piece.value;
    error += piece.error;
  }
  return { value, error };
}

function refine(f: Integrand, from: number, to: number, tolerance: number): Quadrature {
  const pieces = [measure(f, from, to)];
  for (let rounds = 0; rounds < mostPieces; rounds++) {
    const sum = total(pieces);
    if (sum.error <= tolerance * Math.abs(sum.value) || sum.error === 0) return sum;
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

const mostPieces = 1_000;

/** Positive limits further apart than this are integrated in the logarithm. */
const decadesApart = 1e3;

/** ∫ f(x) dx from `from` to `to`, aimed at a relative error of `tolerance`. */
export function quadrature(f: Integrand, from: number, to: number, tolerance = 1e-12): Quadrature {
  if (from === to) return { value: 0, error: 0 };
  if (from > to) {
    const reversed = quadrature(f, to, from, tolerance);
    return { value: -reversed.value, error: reversed.error };
  }
  if (from > 0 && to / from > decadesApart) {
    const inLog = (u: number) => {
      const x = Math.exp(u);
      return f(x) * x;
    };
    return refine(inLog, Math.log(from), Math.log(to), tolerance);
  }
  return refine(f, from, to, tolerance);
}
