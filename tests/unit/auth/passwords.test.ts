import { beforeAll, describe, expect, it } from "vitest";
import { findPassword, hashPassword, verifyPassword } from "@/lib/auth/passwords";

let hash = "";
beforeAll(async () => {
  hash = await hashPassword("cooling break");
});

describe("a password", () => {
  it("is kept as argon2id with 19 MiB, two passes and one lane", () => {
    expect(hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });

  it("has a salt of its own each time", async () => {
    expect(await hashPassword("cooling break")).not.toBe(hash);
  });

  it("fits itself and no other", async () => {
    expect(await verifyPassword(hash, "cooling break")).toBe(true);
    expect(await verifyPassword(hash, "cooling Break")).toBe(false);
    expect(await verifyPassword(hash, "")).toBe(false);
  });

  it("fits however its letters are composed", async () => {
    const composed = await hashPassword("r\u00e9union des \u00e9toiles");
    expect(await verifyPassword(composed, "re\u0301union des e\u0301toiles")).toBe(true);
  });
});

describe("findPassword", () => {
  it("gives the place of the hash that fits, or -1", async () => {
    const others = [await hashPassword("first other"), await hashPassword("second other")];
    expect(await findPassword([...others, hash], "cooling break", 3)).toBe(2);
    expect(await findPassword(others, "cooling break", 3)).toBe(-1);
    expect(await findPassword([], "no account has this password", 3)).toBe(-1);
  });

  it("takes as long for nobody as for three", async () => {
    const time = async (hashes: string[]) => {
      const from = performance.now();
      await findPassword(hashes, "a wrong guess", 3);
      return performance.now() - from;
    };
    await time([]);
    const none: number[] = [];
    const three: number[] = [];
    for (let i = 0; i < 12; i++) {
      none.push(await time([]));
      three.push(await time([hash, hash, hash]));
    }
    const ratio = Math.min(...three) / Math.min(...none);
    // Shared machines are noisy; without the padding the ratio is above 100.
    expect(ratio).toBeGreaterThan(0.5);
    expect(ratio).toBeLessThan(2);
  });
});
