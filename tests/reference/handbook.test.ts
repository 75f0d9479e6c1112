import { describe, expect, it } from "vitest";
import { siOf } from "../unit/expr/calculations";

/**
 * Coefficients as the NRL Plasma Formulary (2019, “Fundamental plasma parameters”) prints them, in
 * Gaussian units with temperatures in eV; printed values from memory. Beside each stands the value
 * recomputed outside this project with CODATA 2018 constants.
 */
const cgs = ["B = 1 gauss", "n = 1 cm^-3", "T = 1 eV"];

const rows: readonly (readonly [string, string, string, number, number])[] = [
  ["electron gyrofrequency", "w = q_esu B / (m_e c) to s^-1", "s^-1", 1.76e7, 17588200.107721634],
  [
    "electron gyrofrequency over 2π",
    "f = q_esu B / (2 pi m_e c) to Hz",
    "s^-1",
    2.8e6,
    2799248.9872333044,
  ],
  ["ion gyrofrequency", "w = q_esu B / (m_p c) to s^-1", "s^-1", 9.58e3, 9578.833155943637],
  [
    "electron plasma frequency",
    "w = sqrt(4 pi n q_esu^2 / m_e) to s^-1",
    "s^-1",
    5.64e4,
    56414.60229644967,
  ],
  [
    "electron plasma frequency over 2π",
    "f = sqrt(4 pi n q_esu^2 / m_e) / (2 pi) to Hz",
    "s^-1",
    8.98e3,
    8978.662818043356,
  ],
  [
    "ion plasma frequency",
    "w = sqrt(4 pi n q_esu^2 / m_p) to s^-1",
    "s^-1",
    1.32e3,
    1316.5493294011533,
  ],
  ["Debye length", "d = sqrt(T / (4 pi n q_esu^2)) to cm", "cm", 7.43e2, 743.3941996724053],
  ["electron thermal velocity", "v = sqrt(T / m_e) to cm/s", "cm", 4.19e7, 41938288.12400624],
  ["ion thermal velocity", "v = sqrt(T / m_p) to cm/s", "cm", 9.79e5, 978715.1350594123],
  ["Alfvén velocity", "v = B / sqrt(4 pi n m_p) to cm/s", "cm", 2.18e11, 218120344787.8741],
  [
    "electron inertial length",
    "d = c / sqrt(4 pi n q_esu^2 / m_e) to cm",
    "cm",
    5.31e5,
    531409.3263028582,
  ],
  [
    "classical distance of minimum approach",
    "b = q_esu^2 / T to cm",
    "cm",
    1.44e-7,
    1.4399645470586227e-7,
  ],
  ["electron gyroradius", "r = sqrt(T m_e) c / (q_esu B) to cm", "cm", 2.38, 2.384455934498627],
  [
    "electron de Broglie length",
    "d = hbar / sqrt(m_e T) to cm",
    "cm",
    2.76e-8,
    2.760428269727312e-8,
  ],
  ["plasma β", "b = 8 pi n T / B^2", "", 4.03e-11, 4.026709074502098e-11],
  ["temperature of 1 eV", "K_1 = T / k_B to K", "", 1.1604e4, 11604.518121550082],
];

const inSi: Record<string, number> = { cm: 100, "s^-1": 1, "": 1 };

describe("the plasma formulary’s printed coefficients", () => {
  it.each(rows)("%s", (_name, line, unit, printed, recomputed) => {
    const value = siOf([...cgs, line], { em: "gaussian" }) * (inSi[unit] ?? Number.NaN);
    const digits = String(printed.toExponential()).replace(/e.*|\./g, "").length;
    // Printed figures are rounded or cut, so the last digit may differ by one.
    expect(Math.abs(value / printed - 1)).toBeLessThan(1.1 * 10 ** (1 - Math.max(3, digits)));
    expect(Math.abs(value / recomputed - 1)).toBeLessThan(1e-9);
  });
});
