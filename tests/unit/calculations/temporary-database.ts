import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { closeDatabase, db } from "@/db";
import { migrate } from "@/db/migrate";

/** A folder for one database file, which the settings of this process point to. */
const folder = mkdtempSync(path.join(tmpdir(), "calculations-"));
export const databaseFile = path.join(folder, "test.sqlite");
process.env.DATABASE_FILE = databaseFile;

/** Brings the database to the newest shape. */
export async function openTemporaryDatabase(): Promise<void> {
  await migrate(db());
}

export async function dropTemporaryDatabase(): Promise<void> {
  await closeDatabase();
  rmSync(folder, { recursive: true });
}

/** Enters a person who cannot sign in, and gives them as an actor. */
export async function person(id: string, name = id): Promise<{ id: string; name: string }> {
  const email = `${id}@tarn-hollow.example`;
  await db()("users").insert({
    id,
    email,
    email_key: email,
    name,
    password_hash: "none",
    created_at: new Date().toISOString(),
  });
  return { id, name };
}
