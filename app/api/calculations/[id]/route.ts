import {
  changeVisibility,
  deleteDraft,
  illFormedSentence,
  isWellFormed,
  readDraft,
  saveDraft,
} from "@/lib/calculations";
import { json, route } from "@/lib/http";
import { saveCalculationSchema, visibilityChangeSchema } from "@/lib/schema";
import { entityTag, requireRevision } from "../entity-tag";
import { calculationParameters } from "../parameters";
import { granted } from "../refusals";

/** The draft, with its revision as the entity tag. */
export const GET = route(
  { permission: "anyone", params: calculationParameters },
  async ({ person, params }) => {
    const draft = granted(await readDraft(person, params.id));
    return json(draft, { headers: { etag: entityTag(draft.revision) } });
  },
);

/** Save the draft that was made from the revision in `If-Match`. */
export const PUT = route(
  {
    permission: "signed-in",
    params: calculationParameters,
    body: saveCalculationSchema.refine(isWellFormed, illFormedSentence),
  },
  async ({ request, person, params, body }) => {
    const revision = requireRevision(request);
    const saved = granted(await saveDraft(person, params.id, { file: body.file, revision }));
    return json(saved, { headers: { etag: entityTag(saved.revision) } });
  },
);

/** Open the calculation to others, or close it. */
export const PATCH = route(
  { permission: "signed-in", params: calculationParameters, body: visibilityChangeSchema },
  async ({ person, params, body }) =>
    json(granted(await changeVisibility(person, params.id, body.visibility))),
);

/** Throw away a draft that has no versions. */
export const DELETE = route(
  { permission: "signed-in", params: calculationParameters },
  async ({ person, params }) => {
    granted(await deleteDraft(person, params.id));
    return new Response(null, { status: 204 });
  },
);
