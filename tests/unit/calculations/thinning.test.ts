import { describe, expect, it } from "vitest";
import { keptRevisions, revisionsToThin } from "@/lib/calculations/thinning";

/** What is left after saving `count` revisions one by one. */
function historyAfter(count: number): number[] {
  const kept = new Set<number>();
  for (let number = 1; number <= count; number += 1) {
    kept.add(number);
    for (const gone of revisionsToThin(number)) kept.delete(gone);
  }
  return [...kept];
}

describe("thinning of revisions", () => {
  it("keeps all of the first two hundred", () => {
    expect(historyAfter(keptRevisions)).toHaveLength(keptRevisions);
  });

  it("always keeps the last two hundred", () => {
    const kept = new Set(historyAfter(3_217));
    for (let back = 0; back < keptRevisions; back += 1) expect(kept).toContain(3_217 - back);
  });

  it("keeps every tenth of the older and every hundredth of the very old", () => {
    const old = historyAfter(3_217).filter((number) => number <= 3_217 - keptRevisions);
    expect(old.slice(0, 3)).toEqual([100, 200, 300]);
    expect(old.slice(-3)).toEqual([2_990, 3_000, 3_010]);
    expect(old.length).toBeLessThan(220);
  });
});
