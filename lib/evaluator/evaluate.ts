import { LRUCache } from "lru-cache";
import { engineRelease } from "@/lib/expr/release";
import {
  type CalculationFile,
  calculationOf,
  type EvaluateAnswer,
  type Results,
  type Verdict,
  type VersionFile,
} from "@/lib/schema";
import { contentHash, editionHash } from "./content-hash";
import { startEvaluators } from "./evaluators";
import { stoppedResults } from "./stopped";
import { verdictOn } from "./verdict";

/** Cells whose results are kept, over all cached answers: some tens of megabytes. */
const cachedCells = 50_000;
/** Milliseconds for which the same stopped calculation is not tried again. */
const stoppedAnswerMs = 30_000;

const answers = new LRUCache<string, EvaluateAnswer>({
  maxSize: cachedCells,
  sizeCalculation: (answer) => Object.keys(answer.cells).length + 1,
});
/** Answers on their way, so that ten tabs asking the same cost one evaluation. */
const pending = new Map<string, Promise<EvaluateAnswer>>();

async function evaluateNow(
  file: CalculationFile,
  hash: string,
  present: boolean,
  key: string,
): Promise<EvaluateAnswer> {
  const pool = await startEvaluators();
  const outcome = await pool.run("evaluate", { file, contentHash: hash, present });
  if (outcome.status === "done") {
    answers.set(key, outcome.answer);
    return outcome.answer;
  }
  const stopped = stoppedResults(file, hash, engineRelease);
  answers.set(key, stopped, { ttl: stoppedAnswerMs });
  return stopped;
}

/**
 * The results of a calculation, from an evaluator process or from the cache; with `present`, also
 * how each cell is shown. Never throws for what is in the file: a bad cell has an error, and one
 * that takes too much time or memory gives a `limit` error in every cell. Throws EvaluatorBusyError
 * when too many evaluations are waiting.
 */
export async function evaluate(
  file: CalculationFile,
  options: { present?: boolean } = {},
): Promise<EvaluateAnswer> {
  const hash = contentHash(file);
  const present = options.present ?? false;
  const key = [hash, editionHash(file.edition), engineRelease, present].join(" ");
  const known = answers.get(key) ?? pending.get(key);
  if (known) return known;
  const answer = evaluateNow(file, hash, present, key).finally(() => pending.delete(key));
  pending.set(key, answer);
  return answer;
}

/** A calculation beside the results it gave when it was pinned. */
export type Recorded = { calculation: CalculationFile; results: Results };

/**
 * Evaluates what a version recorded again, with today's engine and (if given) under another
 * constants edition, and says whether the recorded results are reproduced.
 */
export async function recompute(
  recorded: VersionFile | Recorded,
  edition?: CalculationFile["edition"],
): Promise<Verdict> {
  const calculation = "version" in recorded ? calculationOf(recorded) : recorded.calculation;
  const today = await evaluate({ ...calculation, edition: edition ?? calculation.edition });
  return verdictOn(recorded.results, today);
}
