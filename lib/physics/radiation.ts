/** Thermal radiation, on plain numbers in SI. The constants are exact in every edition since 2018. */
const h = 6.62607015e-34;
const c = 299792458;
const k = 1.380649e-23;

/**
 * Planck function B_ν(T) in W m⁻² Hz⁻¹ sr⁻¹, for a frequency in Hz and a temperature in K.
 * Rybicki & Lightman 1979, eq. 1.51. NaN for a temperature or a frequency that is not positive.
 */
export function planckNu(nuHz: number, temperatureK: number): number {
  if (!(temperatureK > 0) || !(nuHz > 0)) return Number.NaN;
  return (((2 * h * nuHz) / c) * (nuHz / c) * nuHz) / Math.expm1((h * nuHz) / (k * temperatureK));
}

/**
 * Planck function B_λ(T) in W m⁻³ sr⁻¹, for a wavelength in m and a temperature in K.
 * Rybicki & Lightman 1979, eq. 1.52. NaN for a temperature or a wavelength that is not positive.
 */
export function planckLambda(lambdaM: number, temperatureK: number): number {
  if (!(temperatureK > 0) || !(lambdaM > 0)) return Number.NaN;
  return (2 * h * c * c) / lambdaM ** 5 / Math.expm1((h * c) / (lambdaM * k * temperatureK));
}
