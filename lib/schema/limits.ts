/**
 * Every limit of the product in one place, each beside the sentence a person reads when it is met.
 * The figures are part of the contract of formulas, files and results.
 */
export const limits = {
  /** Characters of one formula, as typed. */
  formulaLength: 2_000,
  /** Levels of nesting of one formula. */
  formulaDepth: 60,
  /** Cells of one calculation. */
  cells: 500,
  /** Bytes of one calculation file as UTF-8. */
  fileBytes: 1_000_000,
  /** Points of a sweep times the relations it shows. */
  sweepPoints: 1_000_000,
  /** Milliseconds one evaluation may take before its process is ended. */
  evaluationMs: 5_000,
  /** Megabytes of heap of one evaluator process. */
  evaluationMegabytes: 256,
  /** Characters of a title. */
  titleLength: 300,
  /** Characters of one piece of prose: an abstract, a text cell, a note. */
  proseLength: 100_000,
  /** Levels of nesting of a JSON document sent to the API. */
  jsonDepth: 30,
} as const;

export const limitSentences = {
  formulaLength: (found: number) =>
    `This formula has ${found} characters; at most ${limits.formulaLength} are read. Split it into several relations.`,
  formulaDepth: () =>
    `This formula is nested more than ${limits.formulaDepth} levels deep. Give the inner parts names of their own.`,
  cells: (found: number) =>
    `A calculation holds at most ${limits.cells} cells; this one has ${found}. Split it in two.`,
  fileBytes: (found: number) =>
    `A calculation holds at most 1 MB; this one has ${(found / 1e6).toFixed(2)} MB. Shorten its texts or split it.`,
  evaluation: () =>
    `The evaluation took longer than ${limits.evaluationMs / 1000} s or more than ${limits.evaluationMegabytes} MB and was stopped. Look for a sum or an integral over very many terms.`,
} as const;
