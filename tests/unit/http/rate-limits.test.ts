import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { countTry, forgiveEverybody, forgiveTries, type HttpProblem } from "@/lib/http";

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
  forgiveEverybody();
});

const minutes = (count: number) => count * 60_000;

/** Seconds that the next try has to wait; 0 where it may go ahead. */
async function wait(key = "a"): Promise<number> {
  try {
    await countTry("sign-in-account", key);
    return 0;
  } catch (error) {
    const { type, details } = error as HttpProblem;
    expect(type).toBe("too-many-requests");
    return Number(details.headers?.["retry-after"]);
  }
}

async function spendTries(): Promise<number> {
  for (let tries = 0; tries < 8; tries++) expect(await wait()).toBe(0);
  return wait();
}

describe("countTry", () => {
  it("lets eight tries through, then asks to wait", async () => {
    expect(await spendTries()).toBe(60);
    vi.advanceTimersByTime(20_000);
    expect(await wait()).toBe(40);
  });

  it("does not make the wait longer for asking during it", async () => {
    await spendTries();
    for (let tries = 0; tries < 20; tries++) await wait();
    expect(await wait()).toBe(60);
    vi.advanceTimersByTime(61_000);
    expect(await wait()).toBe(0);
  });

  it("doubles the wait each time, up to an hour", async () => {
    const waits: number[] = [];
    for (let round = 0; round < 8; round++) {
      const seconds = await spendTries();
      waits.push(seconds / 60);
      vi.advanceTimersByTime(seconds * 1000 + 1000);
    }
    expect(waits).toEqual([1, 2, 4, 8, 16, 32, 60, 60]);
  });

  it("counts each key by itself", async () => {
    await spendTries();
    expect(await wait("b")).toBe(0);
  });

  it("forgets tries with time", async () => {
    for (let tries = 0; tries < 8; tries++) await wait();
    vi.advanceTimersByTime(minutes(16));
    expect(await wait()).toBe(0);
  });

  it("says in words how long", async () => {
    await spendTries();
    await expect(countTry("sign-in-account", "a")).rejects.toThrow("Wait 60 seconds");
  });
});

describe("forgiveTries", () => {
  it("forgets tries and waits", async () => {
    vi.advanceTimersByTime((await spendTries()) * 1000 + 1000);
    await spendTries();
    await forgiveTries("sign-in-account", "a");
    expect(await spendTries()).toBe(60);
  });
});
