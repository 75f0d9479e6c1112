import { withdrawVersion } from "@/lib/calculations";
import { json, route } from "@/lib/http";
import { withdrawSchema } from "@/lib/schema";
import { versionParameters } from "../../../../parameters";
import { granted } from "../../../../refusals";

/** Withdraw the version, with a reason that everybody reads. */
export const POST = route(
  { permission: "signed-in", params: versionParameters, body: withdrawSchema },
  async ({ person, params, body }) =>
    json(granted(await withdrawVersion(person, params.id, params.n, body.reason))),
);
