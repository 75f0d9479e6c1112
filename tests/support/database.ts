import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll } from "vitest";
import { closeDatabase, db } from "@/db";
import { migrate } from "@/db/migrate";

/** A folder for the files of one test file, gone when it ends. */
export function withFolder(): string {
  const folder = mkdtempSync(path.join(tmpdir(), "leading-order-"));
  afterAll(() => rmSync(folder, { recursive: true, force: true }));
  return folder;
}

/** Gives a test file a fresh migrated database of its own, which the settings point to. */
export function withDatabase(): { readonly file: string } {
  const file = path.join(withFolder(), "test.sqlite");
  process.env.DATABASE_FILE = file;
  beforeAll(() => migrate(db()));
  afterAll(closeDatabase);
  return { file };
}
