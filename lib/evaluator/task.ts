import type { CalculationFile, EvaluateAnswer } from "@/lib/schema";

/** What crosses to an evaluator process: plain data only. */
export type EvaluationTask = {
  file: CalculationFile;
  contentHash: string;
  /** Ask for the presentation beside the results. */
  present: boolean;
};

/** The methods an evaluator process answers to. */
export type EvaluatorMethods = {
  evaluate(task: EvaluationTask): EvaluateAnswer;
  /** Answers at once: the process is up and its engine loaded. */
  ping(): string;
};

/** The first thing a process sends about a task: its id, so that the parent can end it. */
export type StartSignal = { startedBy: number };
