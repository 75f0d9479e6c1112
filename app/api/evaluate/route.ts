import { illFormedSentence, isWellFormed } from "@/lib/calculations";
import { evaluate } from "@/lib/evaluator";
import { addressOf, countTry, json, route } from "@/lib/http";
import { evaluateSchema } from "@/lib/schema";

/** Evaluate a calculation for anybody; nothing is saved. */
export const POST = route(
  { permission: "anyone", body: evaluateSchema.refine(isWellFormed, illFormedSentence) },
  async ({ request, body }) => {
    await countTry("evaluate", addressOf(request));
    return json(await evaluate(body.file, { present: body.present ?? false }));
  },
);
