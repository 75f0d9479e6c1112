import { askPython } from "../python";

interface Figure {
  readonly value: number;
  readonly uncertainty: number;
}

/** What the libraries say; the shapes are those of `reference.py`. */
export interface Reference {
  readonly versions: { readonly astropy: string; readonly scipy: string };
  readonly scipy: Record<string, Figure>;
  readonly astropy: Record<string, Figure>;
  readonly elementaryChargeEsu: number;
  readonly units: Record<string, { factor: number; exponents: Record<string, string> }>;
  readonly gaussian: Record<string, { unit: string; count: number }>;
  readonly cosmology: readonly Record<
    "z" | "hubble" | "comoving" | "luminosity" | "angular" | "lookback",
    number
  >[];
  readonly planck: readonly Record<
    "nu" | "wavelength" | "temperature" | "perFrequency" | "perWavelength",
    number
  >[];
}

/** What to ask the libraries for. */
export interface Question {
  readonly units: Record<string, string>;
  readonly redshifts: readonly number[];
  readonly planck: readonly (readonly [hertz: number, kelvin: number])[];
}

/** Asks SciPy and Astropy. */
export function askLibraries(question: Question): Promise<Reference> {
  return askPython("physics/reference.py", question);
}
