import { describe, expect, it } from "vitest";
import { decidePin, faultyCells } from "@/lib/calculations/decide-pin";
import type { CellResult, Results } from "@/lib/schema";

const results = (contentHash: string, ...statuses: string[]): Results => ({
  format: "leading-order/results/1",
  engine: "1.0.0",
  edition: "codata-2022",
  contentHash,
  cells: Object.fromEntries(
    statuses.map((status, index): [string, CellResult] => [
      `c${index}`,
      status === "ok"
        ? { kind: "text", status }
        : {
            kind: "relation",
            status: "error",
            error: { code: status as "domain", message: "no" },
          },
    ]),
  ),
});

const pinned = (...hashes: string[]) =>
  hashes.map((contentHash, index) => ({ number: index + 1, contentHash, withdrawn: false }));

describe("decidePin", () => {
  it("numbers versions from 1", () => {
    expect(decidePin([], results("a", "ok"), false)).toEqual({ pin: true, number: 1 });
    expect(decidePin(pinned("x", "y"), results("a"), false)).toEqual({ pin: true, number: 3 });
  });

  it("refuses errors and names the cells", () => {
    expect(decidePin([], results("a", "ok", "domain"), false)).toEqual({
      refused: "errors",
      cells: [{ cell: "c1", code: "domain", message: "no" }],
    });
  });

  it("takes errors from who accepts them", () => {
    expect(decidePin([], results("a", "domain"), true)).toEqual({ pin: true, number: 1 });
  });

  it("refuses what is pinned already, errors or not, and says where", () => {
    expect(decidePin(pinned("a", "b"), results("a", "domain"), true)).toEqual({
      refused: "same",
      version: 1,
    });
  });

  it("lets content come back whose version was withdrawn", () => {
    const withdrawn = [{ number: 1, contentHash: "a", withdrawn: true }];
    expect(decidePin(withdrawn, results("a"), false)).toEqual({ pin: true, number: 2 });
  });
});

describe("faultyCells", () => {
  it("finds none where all went well", () => {
    expect(faultyCells(results("a", "ok", "ok"))).toEqual([]);
  });
});
