import { z } from "zod";

/**
 * How a calculation is shown: what the engine says beside the numbers, so that the folio and the
 * version page typeset what was *understood*, not what was typed.
 */
export const cellPresentationSchema = z.object({
  /** The number of a relation, as in a paper: 1, 2, … */
  number: z.number().optional(),
  /** The one line of typing that makes this cell; empty for text. */
  line: z.string(),
  /** The equation, given or condition as TeX for KaTeX, without its value. */
  tex: z.string().optional(),
  /** “1.26 × 10³⁹ erg s⁻¹” as TeX and as plain text; absent without a value. */
  valueTex: z.string().optional(),
  valueText: z.string().optional(),
  /** “1.26 × 10³⁹ (M / 10 M⊙) erg s⁻¹”; `normalisedLocal` where some exponent holds only locally. */
  normalisedTex: z.string().optional(),
  normalisedText: z.string().optional(),
  normalisedLocal: z.boolean().optional(),
  /** Ids of the cells this one uses, and of those that use it. */
  uses: z.array(z.string()),
  usedBy: z.array(z.string()),
  /** Names of constants this cell uses. */
  constants: z.array(z.string()),
});

export const presentationSchema = z.object({
  cells: z.record(z.string(), cellPresentationSchema),
});

export type CellPresentation = z.infer<typeof cellPresentationSchema>;
export type Presentation = z.infer<typeof presentationSchema>;
