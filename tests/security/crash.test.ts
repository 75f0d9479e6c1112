import { type ChildProcess, spawn } from "node:child_process";
import { once } from "node:events";
import { rmSync } from "node:fs";
import path from "node:path";
import { createInterface } from "node:readline";
import { build } from "esbuild";
import { afterAll, beforeAll, expect, it } from "vitest";
import { db } from "@/db";
import { isRefused, readVersion, verifyCalculation } from "@/lib/calculations";
import { findCalculation, findRevision, listCalculationIds } from "@/lib/calculations/draft-rows";
import { contentHash, versionHash } from "@/lib/evaluator";
import { evaluatorScript } from "@/lib/evaluator/bundle";
import {
  databaseFile,
  dropTemporaryDatabase,
  openTemporaryDatabase,
  person,
} from "../unit/calculations/temporary-database";

/** How often the writer is killed; a release is tried with CRASH_ROUNDS=100. */
const rounds = Number(process.env.CRASH_ROUNDS ?? 30);
/** Longest a writer lives after its first acknowledgement, in milliseconds. */
const longestMs = 250;

const root = path.resolve(__dirname, "../..");
/** Within the product, so that packages are found. */
const writer = path.join(root, "dist", `crash-writer.${process.pid}.mjs`);

type Acknowledged =
  | { save: string; revision: number; hash: string }
  | { pin: string; version: number; hash: string };

beforeAll(async () => {
  await evaluatorScript(root);
  await build({
    entryPoints: [path.join(__dirname, "crash-writer.ts")],
    outfile: writer,
    bundle: true,
    platform: "node",
    format: "esm",
    packages: "external",
    alias: { "@": root, "server-only": path.join(root, "tests/empty-module.ts") },
    logLevel: "silent",
  });
  await openTemporaryDatabase();
  await person("crash");
});
afterAll(async () => {
  await dropTemporaryDatabase();
  rmSync(writer, { force: true });
});

function startWriter(): ChildProcess {
  return spawn(process.execPath, [writer, "crash"], {
    cwd: root,
    env: {
      PATH: process.env.PATH ?? "",
      NODE_ENV: "test",
      DATABASE_FILE: databaseFile,
      EVALUATORS: "1",
    },
    stdio: ["ignore", "pipe", "pipe"],
  });
}

/** Lets a writer work for a moment, kills it, and gives what it had acknowledged by then. */
async function acknowledgedBeforeKill(): Promise<Acknowledged[]> {
  const child = startWriter();
  let complaints = "";
  child.stderr?.on("data", (data) => {
    complaints += data;
  });
  const acknowledged: Acknowledged[] = [];
  const lines = createInterface({ input: child.stdout as NodeJS.ReadableStream });
  lines.on("line", (line) => {
    if (acknowledged.length === 0)
      setTimeout(() => child.kill("SIGKILL"), Math.random() * longestMs);
    // The kill may cut the last line short: what was not read whole was not acknowledged.
    if (line.endsWith("}")) acknowledged.push(JSON.parse(line));
  });
  const [, signal] = await once(child, "close");
  expect(signal, complaints).toBe("SIGKILL");
  return acknowledged;
}

const versionHashes = new Map<string, string>();

async function isThere(entry: Acknowledged) {
  if ("save" in entry) {
    const revision = await findRevision(db(), entry.save, entry.revision);
    expect(revision?.hash).toBe(entry.hash);
    expect(revision && contentHash(revision.file)).toBe(entry.hash);
    return;
  }
  const reading = await readVersion({ id: "crash" }, entry.pin, entry.version);
  if (isRefused(reading)) throw new Error(`version ${entry.version} is ${reading.refused}`);
  expect(reading.file.version.contentHash).toBe(entry.hash);
  versionHashes.set(`${entry.pin} ${entry.version}`, versionHash(reading.file));
}

async function nothingIsBroken() {
  expect(await db().raw("PRAGMA integrity_check")).toEqual([{ integrity_check: "ok" }]);
  expect(await db().raw("PRAGMA foreign_key_check")).toEqual([]);
  for (const id of await listCalculationIds(db())) {
    expect(await verifyCalculation(db(), id)).toEqual([]);
    expect((await findCalculation(db(), id))?.revision).toBeGreaterThan(0);
  }
}

it(
  `keeps every acknowledged save and version through ${rounds} kills`,
  async () => {
    let saves = 0;
    let pins = 0;
    for (let round = 0; round < rounds; round += 1) {
      const acknowledged = await acknowledgedBeforeKill();
      for (const entry of acknowledged) await isThere(entry);
      saves += acknowledged.filter((entry) => "save" in entry).length;
      pins += acknowledged.filter((entry) => "pin" in entry).length;
      await nothingIsBroken();
    }
    expect(saves).toBeGreaterThan(rounds);
    expect(pins).toBeGreaterThan(rounds / 3);
    for (const [key, hash] of versionHashes) {
      const [id = "", number] = key.split(" ");
      const reading = await readVersion({ id: "crash" }, id, Number(number));
      expect(isRefused(reading) || versionHash(reading.file)).toBe(hash);
    }
  },
  60_000 + rounds * 5_000,
);
