import { z } from "zod";
import {
  createCalculation,
  illFormedSentence,
  isWellFormed,
  listCalculations,
} from "@/lib/calculations";
import { json, route } from "@/lib/http";
import { createCalculationSchema } from "@/lib/schema";
import { entityTag } from "./entity-tag";

const listSchema = z.strictObject({
  scope: z.enum(["mine", "public"]).default("mine"),
  q: z.string().max(200).optional(),
  cursor: z.string().max(500).optional(),
});

/** A page of one's own calculations, or of the public ones. */
export const GET = route({ permission: "anyone", query: listSchema }, async ({ person, query }) =>
  json(await listCalculations(person, query)),
);

/** Start a calculation from a file; it is private until its author opens it. */
export const POST = route(
  {
    permission: "signed-in",
    body: createCalculationSchema.refine(isWellFormed, illFormedSentence),
  },
  async ({ person, body }) => {
    const saved = await createCalculation(person, body.file);
    return json(saved, {
      status: 201,
      headers: { etag: entityTag(saved.revision), location: `/api/calculations/${saved.id}` },
    });
  },
);
