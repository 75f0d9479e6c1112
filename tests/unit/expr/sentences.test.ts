import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, it } from "vitest";
import { tellableReasons } from "@/lib/expr/sentences";

const folder = path.join(import.meta.dirname, "../../../lib/expr");
const files = readdirSync(folder, { recursive: true, encoding: "utf8" }).filter((name) =>
  name.endsWith(".ts"),
);
const source = files
  .filter((name) => name !== "sentences.ts")
  .map((name) => readFileSync(path.join(folder, name), "utf8"))
  .join("\n");

describe("faults", () => {
  it("have a sentence each, whichever is raised", () => {
    const raised = [...source.matchAll(/reason: "([\w-]+)"/g)].map((match) => match[1]);
    expect(raised.length).toBeGreaterThan(40);
    expect(raised.filter((reason) => !tellableReasons.includes(reason ?? ""))).toEqual([]);
  });

  it("are all raised somewhere", () => {
    expect(tellableReasons.filter((reason) => !source.includes(`"${reason}"`))).toEqual([]);
  });
});
