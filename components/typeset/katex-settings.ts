import type { KatexOptions } from "katex";

/**
 * How mathematics is set: with MathML for those who hear it, never trusting a command that could load
 * or link, never expanding without end, and showing a fault instead of failing.
 */
export const katexSettings = {
  output: "htmlAndMathml",
  trust: false,
  strict: "ignore",
  throwOnError: false,
  maxExpand: 200,
  maxSize: 20,
  errorColor: "var(--color-halpha)",
} as const satisfies KatexOptions;
