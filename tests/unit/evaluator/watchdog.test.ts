import { describe, expect, it } from "vitest";
import { underWatchdog } from "@/lib/evaluator/watchdog";

const overrun = () => {
  throw new Error("overrun");
};

describe("underWatchdog", () => {
  it("gives what the work gives", () => {
    expect(underWatchdog(1_000, () => 6 * 7, overrun)).toBe(42);
  });

  it("passes on what the work throws", () => {
    const work = () => {
      throw new RangeError("as asked");
    };
    expect(() => underWatchdog(1_000, work, overrun)).toThrow("as asked");
  });

  it("interrupts an endless loop", () => {
    const spin = () => {
      for (;;) Math.random();
    };
    const before = performance.now();
    expect(() => underWatchdog(100, spin, overrun)).toThrow("overrun");
    expect(performance.now() - before).toBeLessThan(2_000);
  });
});
