import { pinVersion, readOverview } from "@/lib/calculations";
import { json, route } from "@/lib/http";
import { pinSchema } from "@/lib/schema";
import { calculationParameters } from "../../parameters";
import { granted } from "../../refusals";

/** The versions there are, first one first. */
export const GET = route(
  { permission: "anyone", params: calculationParameters },
  async ({ person, params }) => {
    const { versions } = granted(await readOverview(person, params.id));
    return json({ items: versions });
  },
);

/** Pin the draft as the next version. */
export const POST = route(
  { permission: "signed-in", params: calculationParameters, body: pinSchema },
  async ({ person, params, body }) => {
    const pinned = granted(await pinVersion(person, params.id, body));
    return json(pinned, { status: 201, headers: { location: pinned.url } });
  },
);
