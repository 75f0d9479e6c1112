import { equalWithin } from "./equal-within";
import { type Fault, raise } from "./faults";
import { growsBeyond } from "./kernels";
import { quadrature } from "./quadrature";
import { firstZero } from "./root-finding";

/** Elementary calls that one evaluation of a calculation may take in all. */
export const stepBudget = 20_000_000;
/** Terms of one sum. */
const mostTerms = 10_000_000;
/** An integral whose error estimate stays above this has not converged. */
const integralTolerance = 1e-8;
/** The same against the integral of the absolute value, where positive and negative parts cancel. */
const cancelledTolerance = 1e-12;

type Body = (x: number) => number;

/**
 * What a kernel calls while it runs: the slow side of its checks, and the loops. It counts steps, so
 * that a hostile formula ends in a *limit* fault instead of at the deadline.
 * `from` and `to` are the place in the formula; −1 where it lies inside a function.
 */
export class Runtime {
  #left: number;

  constructor(budget: number = stepBudget) {
    this.#left = budget;
  }

  /** Account for `cost` elementary calls. */
  spend(cost: number): void {
    this.#left -= cost;
    if (this.#left < 0) raise({ code: "limit", reason: "steps" });
  }

  /** A product, quotient or power that is not finite, or zero: say which fault it is, if one. */
  product(value: number, a: number, b: number, from: number, to: number): void {
    if (value === 0 && (a === 0 || b === 0)) return;
    if (value === 0) fail("overflow", "underflow", from, to);
    fail(
      Number.isNaN(value) ? "domain" : "overflow",
      Number.isNaN(value) ? "undefined" : "too-large",
      from,
      to,
    );
  }

  quotient(value: number, a: number, b: number, from: number, to: number): void {
    if (b === 0) fail("domain", "division-by-zero", from, to);
    if (value === 0 && a === 0) return;
    if (value === 0) fail("overflow", "underflow", from, to);
    fail("overflow", "too-large", from, to);
  }

  power(value: number, base: number, exponent: number, from: number, to: number): void {
    if (value === 0 && base === 0) return;
    if (value === 0) fail("overflow", "underflow", from, to);
    if (Number.isNaN(value))
      fail("domain", "root-of-negative", from, to, {
        base: String(base),
        exponent: String(exponent),
      });
    if (base === 0) fail("domain", "division-by-zero", from, to);
    fail("overflow", "too-large", from, to);
  }

  /** A sum, or the result of a function, that is not finite. */
  result(value: number, name: string, from: number, to: number): void {
    const large = !Number.isNaN(value) && (name === "" || growsBeyond.has(name));
    if (large) fail("overflow", "too-large", from, to);
    fail("domain", name === "" ? "undefined" : "function-domain", from, to, { name });
  }

  less(a: number, b: number): boolean {
    return a < b && !equalWithin(a, b);
  }

  equal(a: number, b: number): boolean {
    return equalWithin(a, b);
  }

  integrate(body: Body, lower: number, upper: number, from: number, to: number): number {
    const { value, error, size } = quadrature(body, lower, upper);
    if (!Number.isFinite(value)) fail("overflow", "too-large", from, to);
    const tolerated = Math.max(integralTolerance * Math.abs(value), cancelledTolerance * size);
    if (error > tolerated && error > 1e-300) {
      fail("domain", "integral-diverges", from, to);
    }
    return value;
  }

  sum(body: Body, lower: number, upper: number, from: number, to: number): number {
    const [first, last] = [Math.round(lower), Math.round(upper)];
    if (!equalWithin(first, lower) || !equalWithin(last, upper)) {
      fail("domain", "sum-limits", from, to);
    }
    if (last - first + 1 > mostTerms)
      fail("limit", "sum-terms", from, to, { terms: String(last - first + 1) });
    let sum = 0;
    let correction = 0;
    for (let i = first; i <= last; i++) {
      const term = body(i);
      const next = sum + term;
      correction += Math.abs(sum) >= Math.abs(term) ? sum - next + term : term - next + sum;
      sum = next;
    }
    const value = sum + correction;
    if (!Number.isFinite(value)) fail("overflow", "too-large", from, to);
    return value;
  }

  root(body: Body, lower: number, upper: number, from: number, to: number): number {
    const zero = firstZero(body, lower, upper);
    if (zero !== undefined) return zero;
    const ends = { lower: String(body(lower)), upper: String(body(upper)) };
    return fail("no-solution", "no-root", from, to, ends);
  }
}

function fail(
  code: Fault["code"],
  reason: string,
  from: number,
  to: number,
  details?: Record<string, string>,
): never {
  const place = from >= 0 ? { from, to } : {};
  raise({ code, reason, ...place, ...(details ? { with: details } : {}) });
}
