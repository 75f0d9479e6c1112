import { readFileSync, statSync } from "node:fs";
import path from "node:path";
import { parseArgs } from "node:util";
import {
  type FileReading,
  mostFileBytes,
  readCalculationFile,
} from "../lib/calculations/read-file";
import { closeEvaluators, evaluate, recompute, startEvaluators } from "../lib/evaluator";
import {
  type CalculationFile,
  editionSchema,
  limitSentences,
  type Results,
  type Verdict,
} from "../lib/schema";

/**
 * Evaluates calculation and version files without server or database and prints their results.
 * Exit 0: every cell is ok and recorded results are reproduced; 1: some cell has an error or a
 * result differs; 2: a file cannot be used, and one line on standard error says why.
 */
const usage = "usage: npm run --silent recompute -- FILE [FILE …] [--edition NAME]";

type Edition = CalculationFile["edition"];
type Usable = Exclude<FileReading, { kind: "unusable" }>;
type Report = Results & Partial<Pick<Verdict, "verdict" | "differences">>;

class UnusableError extends Error {}

function parseCommand(): { files: string[]; edition: Edition | undefined } {
  const options = { edition: { type: "string" } } as const;
  const { positionals, values } = parseArgs({ options, allowPositionals: true });
  if (positionals.length === 0) throw new UnusableError(usage);
  const edition = editionSchema.optional().safeParse(values.edition);
  if (!edition.success)
    throw new UnusableError(
      `there is no constants edition “${values.edition}”; there are ${editionSchema.options.join(", ")}`,
    );
  return { files: positionals, edition: edition.data };
}

function readBytes(name: string): Uint8Array {
  // npm runs this from the root of the product; a name is meant from where the person is.
  const file = path.resolve(process.env.INIT_CWD ?? ".", name);
  try {
    const { size } = statSync(file);
    if (size > mostFileBytes) throw new UnusableError(`${name}: ${limitSentences.fileBytes(size)}`);
    return readFileSync(file);
  } catch (error) {
    if (error instanceof UnusableError) throw error;
    const { code } = error as NodeJS.ErrnoException;
    const why = code === "ENOENT" ? "there is no such file" : `it cannot be read (${code})`;
    throw new UnusableError(`${name}: ${why}`);
  }
}

function readUsable(name: string): Usable {
  const reading = readCalculationFile(readBytes(name));
  if (reading.kind === "unusable") throw new UnusableError(`${name}: ${reading.why}`);
  return reading;
}

async function report(reading: Usable, edition: Edition | undefined): Promise<Report> {
  if (reading.kind === "calculation") {
    const { calculation } = reading;
    return evaluate({ ...calculation, edition: edition ?? calculation.edition });
  }
  const { results, verdict, differences } = await recompute(reading.version, edition);
  return { ...results, verdict, differences };
}

const isFaultless = (found: Report) =>
  found.verdict !== "differs" && Object.values(found.cells).every((cell) => cell.status === "ok");

async function main(): Promise<number> {
  const { files, edition } = parseCommand();
  const readings = files.map(readUsable);
  await startEvaluators(1);
  const reports: Report[] = [];
  for (const reading of readings) reports.push(await report(reading, edition));
  console.log(JSON.stringify(reports.length === 1 ? reports[0] : reports, null, 2));
  return reports.every(isFaultless) ? 0 : 1;
}

try {
  process.exitCode = await main();
} catch (error) {
  console.error((error as Error).message.split("\n")[0]);
  process.exitCode = 2;
} finally {
  await closeEvaluators();
}
