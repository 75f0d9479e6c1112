import { closeDatabase, db } from "../db";
import { listCalculationIds, verifyCalculation } from "../lib/calculations";
import { settings } from "../lib/settings";

/**
 * Reads everything that is kept and compares it with its hashes: the file of the database, every
 * revision, every version and the chain of versions. Exit 0: all is as it was written; 1: something
 * is not, and each is named on a line of its own; 2: the database cannot be read at all.
 */
async function damageOfFile(): Promise<string[]> {
  const rows: { integrity_check: string }[] = await db().raw("PRAGMA integrity_check(20)");
  return rows.map((row) => row.integrity_check).filter((line) => line !== "ok");
}

async function verify(): Promise<number> {
  const damage = await damageOfFile();
  for (const line of damage) console.log(`database: ${line}`);
  const ids = await listCalculationIds(db());
  let findings = damage.length;
  for (const id of ids) {
    for (const { where, what } of await verifyCalculation(db(), id)) {
      findings += 1;
      console.log(`${id}, ${where}: ${what}`);
    }
  }
  console.log(`${ids.length} calculations read, ${findings} findings`);
  return findings === 0 ? 0 : 1;
}

try {
  process.exitCode = await verify();
} catch (error) {
  const { message } = error as Error;
  console.error(`${settings().databaseFile} cannot be read: ${message}. Restore a backup.`);
  process.exitCode = 2;
} finally {
  await closeDatabase();
}
