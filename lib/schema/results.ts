import { z } from "zod";
import { editionSchema } from "./calculation";

/** The results object, format `leading-order/results/1`: what an evaluation gives back. */
export const resultsFormat = "leading-order/results/1";

export const errorCodes = [
  "syntax",
  "unknown-name",
  "dimension",
  "unit",
  "cycle",
  "duplicate-name",
  "domain",
  "overflow",
  "forbidden",
  "limit",
  "depends",
  "no-solution",
] as const;

export const errorCodeSchema = z.enum(errorCodes);

/** A fault of one cell. `from` and `to` count characters of what was typed. */
export const cellErrorSchema = z.object({
  code: errorCodeSchema,
  message: z.string(),
  /** Which field of the cell the positions refer to, e.g. `formula`, `unit`, `condition`, `symbol`. */
  field: z.string().optional(),
  from: z.number().optional(),
  to: z.number().optional(),
  /** A replacement for the marked characters that would mend it. */
  suggestion: z.string().optional(),
});

/** Something worth saying that does not stop the cell. */
export const noticeSchema = z.object({
  code: z.string(),
  level: z.enum(["notice", "warning"]),
  message: z.string(),
  field: z.string().optional(),
  from: z.number().optional(),
  to: z.number().optional(),
});

const notices = { notices: z.array(noticeSchema).optional() };

export const siSchema = z.object({
  value: z.number(),
  /** Exponents as rationals written as strings, zero ones left out. */
  dimension: z.record(z.string(), z.string()),
});

const failed = z.object({
  kind: z.enum(["given", "relation", "check", "text", "sweep", "solve"]),
  status: z.literal("error"),
  symbol: z.string().optional(),
  error: cellErrorSchema,
  ...notices,
});

export const textResultSchema = z.object({
  kind: z.literal("text"),
  status: z.literal("ok"),
  ...notices,
});

export const givenResultSchema = z.object({
  kind: z.literal("given"),
  status: z.literal("ok"),
  symbol: z.string(),
  value: z.number(),
  unit: z.string(),
  si: siSchema,
  uncertainty: z.number().nullable(),
  ...notices,
});

/** Which input the uncertainty comes from, as its share of the variance. */
export const shareSchema = z.object({ symbol: z.string(), share: z.number() });

/** The local exponent in one given; exact where it is a true power law. */
export const scalingSchema = z.object({
  symbol: z.string(),
  exponent: z.number(),
  exact: z.boolean(),
});

/** Prefactor at the fiducials times powers of (input / fiducial). */
export const normalisedSchema = z.object({
  prefactor: z.number(),
  terms: z.array(
    z.object({ symbol: z.string(), fiducial: z.number(), unit: z.string(), exponent: z.number() }),
  ),
});

export const relationResultSchema = z.object({
  kind: z.literal("relation"),
  status: z.literal("ok"),
  symbol: z.string(),
  value: z.number(),
  unit: z.string(),
  si: siSchema,
  /** One standard deviation in `unit`, to first order; null when every input is exact. */
  uncertainty: z.number().nullable().optional(),
  budget: z.array(shareSchema).optional(),
  scaling: z.array(scalingSchema).optional(),
  normalised: normalisedSchema.optional(),
  ...notices,
});

/** A relation that defines a function has no value of its own. */
export const functionResultSchema = z.object({
  kind: z.literal("relation"),
  status: z.literal("ok"),
  symbol: z.string(),
  parameters: z.array(z.string()),
  ...notices,
});

export const checkResultSchema = z.object({
  kind: z.literal("check"),
  status: z.literal("ok"),
  holds: z.boolean(),
  /** Left side over right side of a simple comparison; null where there is none. */
  ratio: z.number().nullable(),
  ...notices,
});

/** One relation over the points of a sweep; null where it has no value. */
export const seriesSchema = z.object({
  symbol: z.string(),
  unit: z.string(),
  values: z.array(z.number().nullable()),
});

export const sweepResultSchema = z.object({
  kind: z.literal("sweep"),
  status: z.literal("ok"),
  over: z.string(),
  unit: z.string(),
  spacing: z.enum(["log", "linear"]),
  points: z.array(z.number()),
  series: z.array(seriesSchema),
  ...notices,
});

export const solveResultSchema = z.object({
  kind: z.literal("solve"),
  status: z.literal("ok"),
  /** The given that was solved for, and every value of it found, in `unit`. */
  symbol: z.string(),
  unit: z.string(),
  solutions: z.array(z.number()),
  ...notices,
});

export const cellResultSchema = z.union([
  failed,
  textResultSchema,
  givenResultSchema,
  functionResultSchema,
  relationResultSchema,
  checkResultSchema,
  sweepResultSchema,
  solveResultSchema,
]);

export const resultsSchema = z.object({
  format: z.literal(resultsFormat),
  engine: z.string(),
  edition: editionSchema,
  contentHash: z.string(),
  cells: z.record(z.string(), cellResultSchema),
});

export type ErrorCode = z.infer<typeof errorCodeSchema>;
export type CellError = z.infer<typeof cellErrorSchema>;
export type Notice = z.infer<typeof noticeSchema>;
export type FailedResult = z.infer<typeof failed>;
export type Share = z.infer<typeof shareSchema>;
export type Scaling = z.infer<typeof scalingSchema>;
export type Normalised = z.infer<typeof normalisedSchema>;
export type GivenResult = z.infer<typeof givenResultSchema>;
export type RelationResult = z.infer<typeof relationResultSchema>;
export type FunctionResult = z.infer<typeof functionResultSchema>;
export type CheckResult = z.infer<typeof checkResultSchema>;
export type SweepResult = z.infer<typeof sweepResultSchema>;
export type SolveResult = z.infer<typeof solveResultSchema>;
export type CellResult = z.infer<typeof cellResultSchema>;
export type Results = z.infer<typeof resultsSchema>;
