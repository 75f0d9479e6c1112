import { expect } from "vitest";

/** Expects two numbers to be equal to within a relative tolerance; zero equals zero only. */
export function expectWithin(found: number, expected: number, relative: number): void {
  const off = found === expected ? 0 : Math.abs(found - expected) / Math.abs(expected);
  expect(off, `${found} against ${expected}: off by ${off}`).toBeLessThanOrEqual(relative);
}

/** Expects two numbers to be the same double. */
export function expectExactly(found: number, expected: number): void {
  expect(Object.is(found, expected), `${found} against ${expected}`).toBe(true);
}
