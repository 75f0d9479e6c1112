import { db } from "@/db";
import { evaluatorIsWarm } from "@/lib/evaluator";
import { json, route } from "@/lib/http";

/** 200 when the database answers and an evaluator is warm, else 503. */
export const GET = route({ permission: "anyone" }, async () => {
  await db().raw("SELECT 1");
  const warm = await evaluatorIsWarm();
  return json({ database: true, evaluator: warm }, { status: warm ? 200 : 503 });
});
