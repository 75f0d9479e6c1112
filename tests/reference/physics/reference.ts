import { execFile } from "node:child_process";
import { fileURLToPath } from "node:url";

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

const python = "/usr/bin/python3";
const script = fileURLToPath(new URL("reference.py", import.meta.url));

/** Asks SciPy and Astropy; fails with what Python said where they are missing. */
export function askLibraries(question: Question): Promise<Reference> {
  return new Promise((resolve, reject) => {
    const child = execFile(python, [script], { timeout: 60_000 }, (error, out, said) => {
      if (error) reject(new Error(`Python 3 with SciPy and Astropy is needed. ${said}`));
      else resolve(JSON.parse(out) as Reference);
    });
    child.stdin?.end(JSON.stringify(question));
  });
}
