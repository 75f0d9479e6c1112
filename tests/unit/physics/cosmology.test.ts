import { describe, expect, it } from "vitest";
import {
  angularDiameterDistance,
  comovingDistance,
  defaultCosmology,
  hubble,
  lookbackTime,
  luminosityDistance,
} from "@/lib/physics";
import { expectExactly, expectWithin } from "./approximately";

const c = 299792458;
const { omegaMatter, hubbleKmSMpc } = defaultCosmology;
const omegaLambda = 1 - omegaMatter;
const hubbleNow = hubble(0);

/** Age of a flat universe in closed form: 2/(3 H₀ √Ω_Λ) asinh(√(Ω_Λ/Ω_m) (1+z)^(-3/2)). */
function age(z: number): number {
  const scale = Math.asinh(Math.sqrt(omegaLambda / omegaMatter) * (1 + z) ** -1.5);
  return (2 * scale) / (3 * hubbleNow * Math.sqrt(omegaLambda));
}

const redshifts = [1e-6, 0.01, 0.5, 1, 3, 10, 1100, 1e6];

describe("the default cosmology", () => {
  it("has its Hubble rate today", () => {
    expectWithin(hubbleNow, (hubbleKmSMpc * 1e3) / 3.085677581491367e22, 1e-14);
  });

  it("has the look-back time of the closed form", () => {
    for (const z of [...redshifts, -0.5]) expectWithin(lookbackTime(z), age(0) - age(z), 1e-9);
    for (const z of redshifts.slice(2)) expectWithin(lookbackTime(z), age(0) - age(z), 1e-12);
  });

  it("follows Hubble’s law nearby", () => {
    expectWithin(comovingDistance(1e-6), (c * 1e-6) / hubbleNow, 1e-6);
    expectWithin(lookbackTime(1e-6), 1e-6 / hubbleNow, 2e-6);
  });

  it("has distances in the ratios of the redshift", () => {
    for (const z of redshifts) {
      expectWithin(luminosityDistance(z), comovingDistance(z) * (1 + z), 1e-15);
      expectWithin(luminosityDistance(z), angularDiameterDistance(z) * (1 + z) ** 2, 1e-15);
    }
  });

  it("grows by c/H per redshift", () => {
    for (const z of redshifts.slice(1)) {
      const step = z * 1e-4;
      const slope = (comovingDistance(z + step) - comovingDistance(z - step)) / (2 * step);
      expectWithin(slope, c / hubble(z), 1e-6);
    }
  });

  it("starts at zero and is no number at or below z = −1", () => {
    for (const f of [comovingDistance, luminosityDistance, lookbackTime]) expectExactly(f(0), 0);
    for (const f of [hubble, comovingDistance, angularDiameterDistance, lookbackTime]) {
      for (const z of [-1, -2, Number.NaN]) expect(f(z)).toBeNaN();
    }
  });
});
