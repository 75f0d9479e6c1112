/**
 * Why somebody does not get what they asked for. `missing` is also the answer where the very
 * existence is private, so that nobody learns it from the difference.
 */
export type Refusal = { refused: "missing" | "forbidden" };

export const missing: Refusal = { refused: "missing" };
export const forbidden: Refusal = { refused: "forbidden" };

/** Whether an answer is a refusal of some kind: `if (isRefused(answer)) …`. */
export function isRefused<Answer extends object>(
  answer: Answer,
): answer is Extract<Answer, { refused: string }> {
  return "refused" in answer;
}
