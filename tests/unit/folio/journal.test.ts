import { describe, expect, it } from "vitest";
import { forgetWork, type JournalEntry, keepWork, takeWork } from "@/components/folio/journal";
import { file, given } from "./a-calculation";

/** A browser's store in memory. */
class MemoryStore {
  readonly kept = new Map<string, string>();
  isFull = false;
  get length() {
    return this.kept.size;
  }
  key(index: number) {
    return [...this.kept.keys()][index] ?? null;
  }
  getItem(key: string) {
    return this.kept.get(key) ?? null;
  }
  setItem(key: string, value: string) {
    if (this.isFull) throw new DOMException("full", "QuotaExceededError");
    this.kept.set(key, value);
  }
  removeItem(key: string) {
    this.kept.delete(key);
  }
}

const noon = Date.UTC(2026, 11, 1, 12);
const minute = 60_000;
const entry = (value: number, at = noon): JournalEntry => ({
  base: file(given("a", "M", 10)),
  file: file(given("a", "M", value)),
  pending: { a: "M =" },
  at,
});

describe("the journal of unsaved work", () => {
  it("gives back to a tab what it kept", () => {
    const store = new MemoryStore();
    expect(keepWork(store, "calc", "tab", entry(20))).toBe(true);
    expect(takeWork(store, "calc", "tab", noon)).toEqual([entry(20)]);
  });
  it("keeps the entry after it was taken, until the server has it", () => {
    const store = new MemoryStore();
    keepWork(store, "calc", "tab", entry(20));
    takeWork(store, "calc", "tab", noon);
    expect(takeWork(store, "calc", "tab", noon)).toHaveLength(1);
    forgetWork(store, "calc", "tab");
    expect(takeWork(store, "calc", "tab", noon)).toEqual([]);
  });
  it("takes over from tabs that are gone, oldest first", () => {
    const store = new MemoryStore();
    keepWork(store, "calc", "late", entry(3, noon - minute));
    keepWork(store, "calc", "early", entry(2, noon - 2 * minute));
    expect(takeWork(store, "calc", "tab", noon).map((one) => one.at)).toEqual([
      noon - 2 * minute,
      noon - minute,
    ]);
  });
  it("leaves a tab that is alive its work", () => {
    const store = new MemoryStore();
    keepWork(store, "calc", "other", entry(2, noon - 1_000));
    expect(takeWork(store, "calc", "tab", noon)).toEqual([]);
    expect(store.length).toBe(1);
  });
  it("does not mix calculations", () => {
    const store = new MemoryStore();
    keepWork(store, "calc", "tab", entry(20));
    expect(takeWork(store, "other", "tab", noon)).toEqual([]);
  });
  it("says so when the browser keeps nothing", () => {
    const store = new MemoryStore();
    store.isFull = true;
    expect(keepWork(store, "calc", "tab", entry(20))).toBe(false);
  });
  it("leaves an entry it cannot read where it is", () => {
    const store = new MemoryStore();
    keepWork(store, "calc", "tab", entry(20));
    const [key = ""] = store.kept.keys();
    store.kept.set(key, '{"format": "of another release"}');
    expect(takeWork(store, "calc", "tab", noon)).toEqual([]);
    expect(store.length).toBe(1);
  });
});
