/**
 * What “equal” means for computed numbers: within 1e-12 of the larger, with no absolute tolerance,
 * since astrophysics in SI lives far below 1e-15.
 */
export const relativeTolerance = 1e-12;

/** True where two finite numbers agree to within `tolerance` of the larger. */
export function equalWithin(a: number, b: number, tolerance: number = relativeTolerance): boolean {
  return a === b || Math.abs(a - b) <= tolerance * Math.max(Math.abs(a), Math.abs(b));
}
