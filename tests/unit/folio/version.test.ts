import { describe, expect, it } from "vitest";
import { keptLine } from "@/components/typeset/kept-line";
import { countFaults, versionCells } from "@/components/version/read-version";
import { ratioText, tellValue } from "@/components/version/tell-difference";
import { versionMetadata } from "@/components/version/version-metadata";
import type { CellResult, VersionFile } from "@/lib/schema";
import { file, relation } from "./a-calculation";

const luminosity: CellResult = {
  kind: "relation",
  status: "ok",
  symbol: "L",
  value: 1.2570651798e39,
  unit: "erg/s",
  si: { value: 1.2570651798e32, dimension: { mass: "1", length: "2", time: "-3" } },
};
const version: VersionFile = {
  ...file(relation("r", "L", "4 pi G M c"), { id: "k", kind: "check", condition: "L > 1" }),
  abstract: "What *$L$* is near THX 14−2.",
  version: {
    calculation: "0123456789",
    number: 3,
    summary: "As submitted",
    authors: ["Ines Aldermoor"],
    pinnedAt: "2026-12-01T12:04:31.000Z",
    lineage: [],
    engine: "1.0.0",
    editionHash: "sha256:0",
    contentHash: "sha256:1",
    previousHash: null,
  },
  results: {
    format: "leading-order/results/1",
    engine: "1.0.0",
    edition: "codata-2022",
    contentHash: "sha256:1",
    cells: {
      r: luminosity,
      k: { kind: "check", status: "ok", holds: false, ratio: 0.5 },
    },
  },
};
const presented = (valueText: string) => ({
  cells: {
    r: {
      number: 1,
      line: "",
      tex: "L",
      valueTex: valueText,
      valueText,
      uses: [],
      usedBy: [],
      constants: [],
    },
  },
});

describe("a version page", () => {
  it("shows the value that was recorded, whatever today's engine says", () => {
    const [cell] = versionCells(version, presented("9.99 erg/s"));
    expect(cell?.shown?.valueText).toBe("1.26 × 10³⁹ erg s⁻¹");
    expect(cell?.shown?.tex).toBe("L");
  });
  it("shows no value where none was recorded", () => {
    const error: CellResult = {
      kind: "relation",
      status: "error",
      error: { code: "domain", message: "The root of a negative number." },
    };
    const faulty = { ...version, results: { ...version.results, cells: { r: error } } };
    const [cell] = versionCells(faulty, presented("9.99 erg/s"));
    expect(cell?.shown).toBeDefined();
    expect(cell?.shown).not.toHaveProperty("valueText");
  });
  it("counts its faults", () => {
    expect(countFaults(version)).toEqual({ errors: 0, failing: 1 });
  });
  it("says in its preview that a check fails, or that it is withdrawn", () => {
    const preview = (withdrawn: boolean) =>
      versionMetadata(version, withdrawn, "public", "http://localhost/c/0123456789/v/3");
    expect(preview(false).description).toBe("A check fails. What L is near THX 14−2.");
    expect(preview(true).description).toMatch(/^Withdrawn\. /);
  });
  it("is offered to search engines only when it is public", () => {
    const robots = (visibility: "public" | "link" | "private") =>
      versionMetadata(version, false, visibility, "http://localhost/").robots;
    expect(robots("public")).toBeUndefined();
    expect(robots("link")).toEqual({ index: false });
    expect(robots("private")).toEqual({ index: false });
  });
});

describe("a difference", () => {
  it.each([
    [1.25706517981234e39, "1.25706517981e+39"],
    [true, "holds"],
    [false, "fails"],
    [null, "none"],
    ["erg/s", "erg/s"],
  ])("tells %s as %s", (value, told) => {
    expect(tellValue(value)).toBe(told);
  });
  it.each([
    [2, "2"],
    [1 + 2.2e-5, "1 + 2.20e-5"],
    [1 - 2.2e-5, "1 − 2.20e-5"],
    [null, ""],
  ])("tells the ratio %s as “%s”", (ratio, told) => {
    expect(ratioText(ratio)).toBe(told);
  });
});

describe("a cell that is only kept", () => {
  it("is told in one line", () => {
    expect(
      keptLine({ id: "s", kind: "sweep", over: "M", from: 1, to: 1e9, unit: "Msun", show: ["L"] }),
    ).toBe("L over M from 1 to 1000000000 Msun");
    expect(
      keptLine({ id: "v", kind: "solve", for: "M", from: 1, to: 10, target: "L", equals: 5 }),
    ).toBe("M from 1 to 10 where L = 5");
  });
});
