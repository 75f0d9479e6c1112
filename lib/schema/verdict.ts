import { z } from "zod";
import { resultsSchema } from "./results";

/** One result that differs between what a version recorded and what today's engine gives. */
export const differenceSchema = z.object({
  cell: z.string(),
  symbol: z.string().optional(),
  /** What differs: a value, its uncertainty, a status, a check's outcome. */
  what: z.enum(["value", "uncertainty", "unit", "status", "holds", "missing"]),
  recorded: z.union([z.number(), z.string(), z.boolean(), z.null()]),
  recomputed: z.union([z.number(), z.string(), z.boolean(), z.null()]),
  /** recomputed / recorded, for numbers. */
  ratio: z.number().nullable(),
});

export const verdictSchema = z.object({
  verdict: z.enum(["reproduces", "differs"]),
  differences: z.array(differenceSchema),
  results: resultsSchema,
});

export type Difference = z.infer<typeof differenceSchema>;
export type Verdict = z.infer<typeof verdictSchema>;
