import { transaction } from "@/db";
import { hashPassword } from "@/lib/auth/passwords";
import { findAccounts, insertPerson } from "@/lib/auth/people";
import { markConfirmed } from "@/lib/auth/sign-up";
import {
  changeVisibility,
  createCalculation,
  isRefused,
  listCalculations,
  pinVersion,
  saveDraft,
  withdrawVersion,
} from "@/lib/calculations";
import type { CalculationFile } from "@/lib/schema";
import { type DemoCalculation, type DemoVersion, demoCalculations } from "./calculations";
import { demoSignIns } from "./people";

export { demoSignIns } from "./people";

type DemoPerson = { id: string; email: string };

/** The person with this demo account, made with a confirmed address if there is none. */
async function ensurePerson(entry: (typeof demoSignIns)[number]): Promise<DemoPerson> {
  const passwordHash = await hashPassword(entry.password);
  return transaction(async (tx) => {
    const [known] = await findAccounts(tx, entry.email);
    if (known) return { id: known.id, email: entry.email };
    const { name, email } = entry;
    const made = await insertPerson(tx, { name, email, passwordHash });
    await markConfirmed(tx, made.id);
    return { id: made.id, email };
  });
}

/** The answer; a demo that is refused is a fault of the demo. */
function granted<Answer extends object>(answer: Answer): Exclude<Answer, { refused: string }> {
  if (isRefused(answer)) throw new Error(`The demo was refused: ${JSON.stringify(answer)}`);
  return answer as Exclude<Answer, { refused: string }>;
}

function asItWas(file: CalculationFile, { given }: DemoVersion): CalculationFile {
  if (!given) return file;
  const [id, value] = given;
  const cells = file.cells.map((cell) =>
    cell.kind === "given" && cell.id === id ? { ...cell, value } : cell,
  );
  return { ...file, cells };
}

async function pinDemoVersion(
  actor: DemoPerson,
  calculation: { id: string; revision: number },
  file: CalculationFile,
  version: DemoVersion,
): Promise<number> {
  const { id, revision } = calculation;
  const saved = granted(await saveDraft(actor, id, { file: asItWas(file, version), revision }));
  const pinned = granted(await pinVersion(actor, id, { summary: version.summary }));
  if (version.withdrawn)
    granted(await withdrawVersion(actor, id, pinned.version, version.withdrawn));
  return saved.revision;
}

/** Makes a calculation with its versions, unless its owner has one of this title. */
async function ensureCalculation(actor: DemoPerson, demo: DemoCalculation): Promise<void> {
  const { items } = await listCalculations(actor, { scope: "mine", q: demo.file.title });
  if (items.some((item) => item.title === demo.file.title)) return;
  const { id, revision } = await createCalculation(actor, demo.file);
  let current = revision;
  for (const version of demo.versions)
    current = await pinDemoVersion(actor, { id, revision: current }, demo.file, version);
  granted(await changeVisibility(actor, id, demo.visibility));
}

/**
 * Enters the demo people and their calculations, through the same functions that people use. What
 * is there already is left as it is, so that it may be called at every start.
 */
export async function seedDemo(): Promise<void> {
  for (const entry of demoSignIns) {
    const person = await ensurePerson(entry);
    for (const demo of demoCalculations)
      if (demo.owner === person.email) await ensureCalculation(person, demo);
  }
}
