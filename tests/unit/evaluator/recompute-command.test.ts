import { execFile } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, describe, expect, it } from "vitest";
import { contentHash, versionHash } from "@/lib/evaluator";
import type { CalculationFile, Results, VersionFile } from "@/lib/schema";

const root = path.resolve(__dirname, "../../..");
const folder = mkdtempSync(path.join(tmpdir(), "recompute-"));
afterAll(() => rmSync(folder, { recursive: true }));

type Run = { code: number; out: string; err: string };

/** Runs the command as npm does, in a folder of its own. */
function recompute(...args: string[]): Promise<Run> {
  const command = ["--import", "tsx", "scripts/recompute.ts", ...args];
  const env = { NODE_ENV: "test" as const, PATH: process.env.PATH ?? "", INIT_CWD: folder };
  return new Promise((resolve) => {
    execFile(process.execPath, command, { cwd: root, env }, (error, out, err) =>
      resolve({ code: typeof error?.code === "number" ? error.code : 0, out, err }),
    );
  });
}

let files = 0;
/** Writes a file and gives its name. */
function written(content: unknown): string {
  files += 1;
  const name = `${files}.json`;
  const text = typeof content === "string" ? content : JSON.stringify(content);
  writeFileSync(path.join(folder, name), text);
  return name;
}

const calculation = (formula = "M c^2"): CalculationFile => ({
  format: "leading-order/1",
  title: "Rest energy",
  edition: "codata-2018",
  cells: [
    { id: "g1", kind: "given", symbol: "M", value: 10, uncertainty: 0.5, unit: "Msun" },
    { id: "r1", kind: "relation", symbol: "E", formula, unit: "erg" },
    { id: "k1", kind: "check", condition: "E > 1 erg" },
  ],
});

async function version(change: (results: Results) => void = () => {}): Promise<VersionFile> {
  const file = calculation();
  const results: Results = JSON.parse((await recompute(written(file))).out);
  change(results);
  return {
    ...file,
    version: {
      calculation: "0123456789",
      number: 1,
      summary: "first",
      authors: ["Ilse Wray"],
      pinnedAt: "2031-05-04T12:00:00.000Z",
      lineage: [],
      engine: results.engine,
      editionHash: "sha256:0",
      contentHash: contentHash(file),
      previousHash: null,
    },
    results,
  };
}

/** Expects exit 2, nothing on standard output and one line on standard error. */
async function cannotUse(args: string[], why: RegExp) {
  const { code, out, err } = await recompute(...args);
  expect(err).toMatch(why);
  expect(err.trimEnd().split("\n")).toHaveLength(1);
  expect(out).toBe("");
  expect(code).toBe(2);
}

describe("recompute, exit 0", () => {
  it("prints the results of a calculation", async () => {
    const { code, out, err } = await recompute(written(calculation()));
    const results = JSON.parse(out);
    expect(results).toMatchObject({
      format: "leading-order/results/1",
      edition: "codata-2018",
      contentHash: contentHash(calculation()),
      cells: { r1: { kind: "relation", status: "ok", unit: "erg" }, k1: { holds: true } },
    });
    expect(results.cells.r1.value / 1.787e55).toBeCloseTo(1, 3);
    expect(results).not.toHaveProperty("verdict");
    expect(err).toBe("");
    expect(code).toBe(0);
  });

  it("prints an array for several files", async () => {
    const { code, out } = await recompute(written(calculation()), written(calculation("2 M c^2")));
    expect(JSON.parse(out)).toHaveLength(2);
    expect(code).toBe(0);
  });

  it("says that a version is reproduced", async () => {
    const { code, out } = await recompute(written(await version()));
    expect(JSON.parse(out)).toMatchObject({ verdict: "reproduces", differences: [] });
    expect(code).toBe(0);
  });

  it("takes another edition", async () => {
    const { code, out } = await recompute(written(calculation()), "--edition", "codata-2022");
    expect(JSON.parse(out).edition).toBe("codata-2022");
    expect(code).toBe(0);
  });
});

describe("recompute, exit 1", () => {
  it("is for a cell with an error; the others are printed", async () => {
    const { code, out } = await recompute(written(calculation("M + c")));
    expect(JSON.parse(out).cells).toMatchObject({
      g1: { status: "ok" },
      r1: { status: "error", error: { code: "dimension" } },
      k1: { status: "error", error: { code: "depends" } },
    });
    expect(code).toBe(1);
  });

  it("is for a recorded result that differs, and names the cell", async () => {
    const tampered = await version((results) => {
      const cell = results.cells.r1;
      if (cell?.kind === "relation" && "value" in cell) cell.value *= 1 + 1e-11;
    });
    const { code, out } = await recompute(written(tampered));
    expect(JSON.parse(out)).toMatchObject({
      verdict: "differs",
      differences: [{ cell: "r1", symbol: "E", what: "value" }],
    });
    expect(code).toBe(1);
  });

  it("is for one bad file among good ones", async () => {
    const { code } = await recompute(written(calculation()), written(calculation("nope")));
    expect(code).toBe(1);
  });
});

describe("recompute, exit 2", () => {
  const good = calculation();

  it("is for a version whose content was changed", async () => {
    const changed = { ...(await version()), title: "Rest energy, improved" };
    await cannotUse([written(changed)], /hash does not match/);
  });

  it.each<[string, unknown, RegExp]>([
    ["a newer format", { ...good, format: "leading-order/2" }, /newer/],
    ["an unknown format", { ...good, format: "something/1" }, /unknown/],
    ["no format", { title: "x" }, /no "format"/],
    ["an unknown field", { ...good, colour: "red" }, /colour/],
    ["an unknown field of a cell", { ...good, cells: [{ ...good.cells[0], hue: 1 }] }, /hue/],
    ["a wrong type", { ...good, title: 7 }, /title/],
    ["an unknown edition", { ...good, edition: "codata-1066" }, /edition/],
    ["bad JSON, with its line", '{\n"format":\n oops }', /line 3/],
    ["a key that stands twice", '{"format": "leading-order/1", "format": "x"}', /format/],
    [
      "a number beyond double",
      JSON.stringify(good).replace('"value":10', '"value":1e999'),
      /1e999|number/i,
    ],
    ["an array", [good], /not a JSON object/],
    ["an empty file", "", /./],
    [
      "more than 500 cells",
      {
        ...good,
        cells: Array.from({ length: 501 }, (_, i) => ({ id: `t${i}`, kind: "text", markdown: "" })),
      },
      /500 cells/,
    ],
    [
      "more than 1 MB",
      {
        ...good,
        cells: Array.from({ length: 11 }, (_, i) => ({
          id: `t${i}`,
          kind: "text",
          markdown: "x".repeat(99_000),
        })),
      },
      /1 MB/,
    ],
    ["deep nesting", "[".repeat(5_000) + "]".repeat(5_000), /./],
  ])("is for %s", (_title, content, why) => cannotUse([written(content)], why));

  it("is for a file that is not there, not readable, or not text", async () => {
    await cannotUse(["nowhere.json"], /nowhere\.json: there is no such file/);
    await cannotUse(["."], /cannot be read/);
    writeFileSync(path.join(folder, "latin.json"), Buffer.from([0x7b, 0xff, 0xfe, 0x7d]));
    await cannotUse(["latin.json"], /not UTF-8/);
  });

  it("is for a command that is not understood", async () => {
    await cannotUse([], /usage/);
    await cannotUse([written(good), "--edition", "codata-1066"], /codata-1066/);
    await cannotUse([written(good), "--colour"], /colour/);
  });
});

it("keeps the chain's hash apart from the content's", async () => {
  const file = await version();
  expect(versionHash(file)).not.toBe(file.version.contentHash);
});
