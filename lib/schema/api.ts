import { z } from "zod";
import { calculationSchema, editionSchema } from "./calculation";
import { presentationSchema } from "./presentation";
import { resultsSchema } from "./results";

/** Shapes of the JSON API: what the client sends and reads, and what the routes parse and answer. */

const email = z.email("This is not an e-mail address.").max(254);
const password = z
  .string()
  .min(10, "A password has at least 10 characters.")
  .max(200, "A password has at most 200 characters.");
const personName = z
  .string()
  .trim()
  .min(1, "Give the name you publish under.")
  .max(120)
  .regex(/^[^\p{Cc}<>]*$/u, "A name is one line without control characters or angle brackets.");

export const signUpSchema = z.strictObject({ email, name: personName, password });
export const signInSchema = z.strictObject({
  email: z.string().max(254),
  password: z.string().max(200),
});
export const resetRequestSchema = z.strictObject({ email: z.string().max(254) });
export const resetSchema = z.strictObject({ token: z.string().max(200), password });
export const confirmEmailSchema = z.strictObject({ token: z.string().max(200) });
export const changePasswordSchema = z.strictObject({
  currentPassword: z.string().max(200),
  newPassword: password,
});
export const profileSchema = z.strictObject({ name: personName });

export const personSchema = z.object({
  id: z.string(),
  name: z.string(),
  email: z.string(),
  emailConfirmed: z.boolean(),
});

export const sessionSchema = z.object({
  id: z.string(),
  createdAt: z.string(),
  lastSeenAt: z.string(),
  userAgent: z.string(),
  current: z.boolean(),
});

export const roles = ["author", "reader", "public"] as const;
export const visibilities = ["private", "link", "public"] as const;
export const visibilitySchema = z.enum(visibilities);

export const createCalculationSchema = z.strictObject({ file: calculationSchema });
export const saveCalculationSchema = z.strictObject({ file: calculationSchema });
export const visibilityChangeSchema = z.strictObject({ visibility: visibilitySchema });

export const evaluateSchema = z.strictObject({
  file: calculationSchema,
  /** Ask for what the folio shows beside the numbers: TeX, one-line sources, links between cells. */
  present: z.boolean().optional(),
});
export const evaluateAnswerSchema = resultsSchema.extend({
  presentation: presentationSchema.optional(),
});

export const pinSchema = z.strictObject({
  summary: z.string().trim().min(1, "Say in a line what this version is.").max(500),
  /** A version that has errors is pinned only after saying so. */
  acceptErrors: z.boolean().optional(),
  /** The revision that was looked at; a later one is not pinned unseen. */
  revision: z.int().positive().optional(),
});
export const withdrawSchema = z.strictObject({
  reason: z.string().trim().min(1, "Give the reason; readers will see it.").max(2_000),
});
export const recomputeSchema = z.strictObject({ edition: editionSchema.optional() });

export const calculationSummarySchema = z.object({
  id: z.string(),
  title: z.string(),
  abstract: z.string(),
  visibility: visibilitySchema,
  owner: z.string(),
  revision: z.number(),
  latestVersion: z.number().nullable(),
  updatedAt: z.string(),
});
export const calculationPageSchema = z.object({
  items: z.array(calculationSummarySchema),
  nextCursor: z.string().nullable(),
});

export const draftSchema = z.object({
  id: z.string(),
  file: calculationSchema,
  revision: z.number(),
  role: z.enum(roles),
  visibility: visibilitySchema,
  savedAt: z.string(),
  versions: z.array(
    z.object({
      number: z.number(),
      summary: z.string(),
      pinnedAt: z.string(),
      withdrawn: z.boolean(),
    }),
  ),
});

/** RFC 9457 problem details, with the fields this API adds. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number(),
  detail: z.string().optional(),
  /** Validation errors: where, as a path of keys joined by dots, and what. */
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  /** With 412: the draft as somebody else saved it. */
  current: draftSchema.optional(),
});

export type Person = z.infer<typeof personSchema>;
export type SessionInfo = z.infer<typeof sessionSchema>;
export type Role = (typeof roles)[number];
export type Visibility = z.infer<typeof visibilitySchema>;
export type CalculationSummary = z.infer<typeof calculationSummarySchema>;
export type CalculationPage = z.infer<typeof calculationPageSchema>;
export type Draft = z.infer<typeof draftSchema>;
export type EvaluateAnswer = z.infer<typeof evaluateAnswerSchema>;
export type Problem = z.infer<typeof problemSchema>;
