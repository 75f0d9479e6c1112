import "./without-eval";
import { z } from "zod";
import { limitSentences, limits } from "./limits";

/**
 * The calculation file, format `leading-order/1`: what is stored, hashed, exported and read back.
 * The schema settles the *shape*; whether a formula makes sense is for the engine to say, cell by
 * cell, so that a draft with faults in it can always be kept. Unknown fields are an error.
 */
export const fileFormat = "leading-order/1";

const prose = z.string().max(limits.proseLength);
const shortText = z.string().max(2_000);
const symbol = z.string().max(200);
const unit = z.string().max(500);
const finite = z.number();

export const cellIdSchema = z
  .string()
  .regex(
    /^[A-Za-z0-9][A-Za-z0-9_-]{0,39}$/,
    "A cell id is 1 to 40 letters, digits, - or _, and begins with a letter or digit.",
  );

const cellBase = { id: cellIdSchema, note: prose.optional() };

export const textCellSchema = z.strictObject({
  id: cellIdSchema,
  kind: z.literal("text"),
  markdown: prose,
});

export const givenCellSchema = z
  .strictObject({
    ...cellBase,
    kind: z.literal("given"),
    symbol,
    value: finite,
    unit: unit.optional(),
    /** One standard deviation, in the given's unit. */
    uncertainty: finite.optional(),
    /** Lower and upper end of a uniform distribution, in the given's unit. */
    interval: z.tuple([finite, finite]).optional(),
    /** Log-normal: standard deviation of log10. */
    dex: finite.optional(),
    /** Log-normal: a factor either way, one sigma. */
    factor: finite.optional(),
    source: shortText.optional(),
    fiducial: finite.optional(),
  })
  .refine(
    (given) =>
      [given.uncertainty, given.interval, given.dex, given.factor].filter((x) => x !== undefined)
        .length <= 1,
    "A given has one of uncertainty, interval, dex and factor, not several.",
  );

export const relationCellSchema = z.strictObject({
  ...cellBase,
  kind: z.literal("relation"),
  symbol,
  formula: prose,
  unit: unit.optional(),
  source: shortText.optional(),
});

export const checkCellSchema = z.strictObject({
  ...cellBase,
  kind: z.literal("check"),
  condition: prose,
  because: prose.optional(),
});

const spacing = z.enum(["log", "linear"]);

export const sweepCellSchema = z.strictObject({
  ...cellBase,
  kind: z.literal("sweep"),
  over: symbol,
  from: finite,
  to: finite,
  unit: unit.optional(),
  spacing: spacing.optional(),
  points: z.int().min(2).max(limits.sweepPoints).optional(),
  show: z.array(symbol).max(50),
});

export const solveCellSchema = z.strictObject({
  ...cellBase,
  kind: z.literal("solve"),
  for: symbol,
  from: finite,
  to: finite,
  unit: unit.optional(),
  target: symbol,
  equals: finite,
  targetUnit: unit.optional(),
});

export const cellSchema = z.discriminatedUnion("kind", [
  textCellSchema,
  givenCellSchema,
  relationCellSchema,
  checkCellSchema,
  sweepCellSchema,
  solveCellSchema,
]);

export const editionSchema = z.enum(["codata-2018", "codata-2022"]);
export const emSchema = z.enum(["si", "gaussian"]);

export const calculationSchema = z.strictObject({
  format: z.literal(fileFormat),
  title: z
    .string()
    .max(limits.titleLength)
    .regex(/^[^\p{Cc}]*$/u, "A title is one line without control characters."),
  abstract: prose.optional(),
  edition: editionSchema,
  em: emSchema.optional(),
  cells: z.array(cellSchema).check((context) => {
    if (context.value.length > limits.cells) {
      context.issues.push({
        code: "custom",
        input: context.value,
        message: limitSentences.cells(context.value.length),
        params: { limit: "cells" },
      });
    }
    const seen = new Set<string>();
    for (const [index, cell] of context.value.entries()) {
      if (seen.has(cell.id)) {
        context.issues.push({
          code: "custom",
          input: cell.id,
          path: [index, "id"],
          message: `The cell id “${cell.id}” stands twice; ids are unique in a calculation.`,
        });
      }
      seen.add(cell.id);
    }
  }),
});

export type CalculationFile = z.infer<typeof calculationSchema>;
export type Cell = z.infer<typeof cellSchema>;
export type CellKind = Cell["kind"];
export type TextCell = z.infer<typeof textCellSchema>;
export type GivenCell = z.infer<typeof givenCellSchema>;
export type RelationCell = z.infer<typeof relationCellSchema>;
export type CheckCell = z.infer<typeof checkCellSchema>;
export type SweepCell = z.infer<typeof sweepCellSchema>;
export type SolveCell = z.infer<typeof solveCellSchema>;
