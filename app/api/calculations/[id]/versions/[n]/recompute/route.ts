import { recomputeVersion } from "@/lib/calculations";
import { addressOf, countTry, json, route } from "@/lib/http";
import { recomputeSchema } from "@/lib/schema";
import { versionParameters } from "../../../../parameters";
import { granted } from "../../../../refusals";

/** Evaluate the version again, for anybody who may read it, and say whether it reproduces. */
export const POST = route(
  { permission: "anyone", params: versionParameters, body: recomputeSchema },
  async ({ request, person, params, body }) => {
    await countTry("evaluate", addressOf(request));
    return json(granted(await recomputeVersion(person, params.id, params.n, body.edition)));
  },
);
