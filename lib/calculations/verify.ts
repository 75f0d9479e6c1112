import type { Knex } from "knex";
import { contentHash } from "@/lib/evaluator/content-hash";
import type { VersionFile } from "@/lib/schema";
import { type ChainFault, checkChain } from "./chain";
import { findCalculation, findRevision, listRevisionNumbers } from "./draft-rows";
import { findVersion, listVersionNumbers } from "./version-rows";

/** Something that is not as it was written: where, and what. */
export type Finding = { calculation: string; where: string; what: string };

const sentences: Record<ChainFault["code"], string> = {
  "content-hash": "hash does not match: the content is not the one that was pinned",
  "results-hash": "hash does not match: the results belong to another content",
  "previous-hash": "hash does not match: the version before it is not the one it was chained to",
  gap: "its number does not follow the one before it",
};

/** What `read` gives, or the reason why it cannot be read. */
async function readable<Value>(
  read: () => Promise<Value | undefined>,
): Promise<{ value: Value } | { why: string }> {
  try {
    const value = await read();
    return value === undefined ? { why: "is missing" } : { value };
  } catch (error) {
    return { why: `cannot be read: ${(error as Error).message.replaceAll(/\s+/g, " ")}` };
  }
}

async function revisionFindings(tx: Knex, id: string): Promise<Omit<Finding, "calculation">[]> {
  const calculation = await findCalculation(tx, id);
  const numbers = await listRevisionNumbers(tx, id);
  const findings: Omit<Finding, "calculation">[] = [];
  if (calculation && !numbers.includes(calculation.revision))
    findings.push({ where: `revision ${calculation.revision}`, what: "is missing" });
  for (const number of numbers) {
    const where = `revision ${number}`;
    const read = await readable(() => findRevision(tx, id, number));
    if ("why" in read) findings.push({ where, what: read.why });
    else if (contentHash(read.value.file) !== read.value.hash)
      findings.push({ where, what: "hash does not match: it is not what was saved" });
  }
  return findings;
}

async function versionFindings(tx: Knex, id: string): Promise<Omit<Finding, "calculation">[]> {
  const files: VersionFile[] = [];
  const findings: Omit<Finding, "calculation">[] = [];
  for (const number of await listVersionNumbers(tx, id)) {
    const read = await readable(() => findVersion(tx, id, number));
    if ("value" in read) files.push(read.value.file);
    else findings.push({ where: `version ${number}`, what: read.why });
  }
  const faults = checkChain(files);
  return [
    ...findings,
    ...faults.map(({ number, code }) => ({ where: `version ${number}`, what: sentences[code] })),
  ];
}

/** Reads everything that is kept of one calculation and compares it with its hashes. */
export async function verifyCalculation(tx: Knex, id: string): Promise<Finding[]> {
  const found = [...(await revisionFindings(tx, id)), ...(await versionFindings(tx, id))];
  return found.map((finding) => ({ calculation: id, ...finding }));
}
