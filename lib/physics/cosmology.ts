/**
 * Distances and times of a flat universe of matter and a cosmological constant, without radiation:
 * H₀ = 70 km s⁻¹ Mpc⁻¹, Ω_m = 0.3. Hogg 1999, astro-ph/9905116: eq. 14 for E(z), 15 for the
 * comoving distance, 30 for the look-back time (numbers as others cite them, the paper not seen);
 * checked against a general-purpose library. All results in SI; NaN for z ≤ −1.
 */
export const defaultCosmology = { hubbleKmSMpc: 70, omegaMatter: 0.3 } as const;

const c = 299792458;
const megaparsec = (648000 / Math.PI) * 149597870700 * 1e6;
const hubbleNow = (defaultCosmology.hubbleKmSMpc * 1e3) / megaparsec;
const omegaLambda = 1 - defaultCosmology.omegaMatter;

function expansion(z: number): number {
  return Math.sqrt(defaultCosmology.omegaMatter * (1 + z) ** 3 + omegaLambda);
}

/** Ten-point Gauss–Legendre nodes and weights on [−1, 1] (Abramowitz & Stegun, table 25.4). */
const nodes = [
  0.14887433898163122, 0.4333953941292472, 0.6794095682990244, 0.8650633666889845,
  0.9739065285171717,
];
const weights = [
  0.29552422471475287, 0.26926671930999635, 0.21908636251598204, 0.1494513491505806,
  0.06667134430868814,
];

/** ∫ f from 0 to `upper`, over panels of equal width. */
function integral(f: (x: number) => number, upper: number): number {
  const panels = Math.max(4, Math.ceil(Math.abs(upper) * 4));
  const half = upper / panels / 2;
  let sum = 0;
  for (let panel = 0; panel < panels; panel++) {
    const middle = (2 * panel + 1) * half;
    for (const [i, node] of nodes.entries()) {
      sum += (weights[i] ?? 0) * (f(middle + half * node) + f(middle - half * node));
    }
  }
  return sum * half;
}

/** Expansion rate H(z) in s⁻¹. */
export function hubble(z: number): number {
  return z > -1 ? hubbleNow * expansion(z) : Number.NaN;
}

/** dH/dz in s⁻¹: (3/2) H₀ Ω_m (1 + z)² / E(z). */
export function hubbleSlope(z: number): number {
  const growth = 1.5 * defaultCosmology.omegaMatter * (1 + z) ** 2;
  return z > -1 ? (hubbleNow * growth) / expansion(z) : Number.NaN;
}

/** Line-of-sight comoving distance in m: c ∫ dz / H. Integrated in ln(1 + z), where it is smooth. */
export function comovingDistance(z: number): number {
  if (!(z > -1)) return Number.NaN;
  const inLog = (u: number) => Math.exp(u) / expansion(Math.expm1(u));
  return (c / hubbleNow) * integral(inLog, Math.log1p(z));
}

/** Luminosity distance in m. */
export function luminosityDistance(z: number): number {
  return (1 + z) * comovingDistance(z);
}

/** Angular-diameter distance in m. */
export function angularDiameterDistance(z: number): number {
  return comovingDistance(z) / (1 + z);
}

/** Look-back time in s: ∫ dz / ((1 + z) H). */
export function lookbackTime(z: number): number {
  if (!(z > -1)) return Number.NaN;
  return integral((u) => 1 / expansion(Math.expm1(u)), Math.log1p(z)) / hubbleNow;
}
