import { z } from "zod";
import { readVersion, type VersionReading } from "@/lib/calculations";
import { route } from "@/lib/http";
import { versionParameters } from "../../../parameters";
import { granted } from "../../../refusals";

const querySchema = z.object({ download: z.literal("1").optional() });

/** What is public and stands may be kept for a year anywhere: it never changes. */
const forEver = "public, max-age=31536000, immutable";

function headersOf({ file, visibility, withdrawn }: VersionReading, download: boolean) {
  const { calculation, number } = file.version;
  const keeps = visibility === "public" && !withdrawn;
  return {
    "content-type": "application/json; charset=utf-8",
    "cache-control": keeps ? forEver : "no-store",
    etag: `"${file.version.contentHash}"`,
    ...(withdrawn ? { "leading-order-withdrawn": withdrawn.at } : {}),
    ...(download
      ? { "content-disposition": `attachment; filename="${calculation}-v${number}.json"` }
      : {}),
  };
}

/** The version file, as it is exported and read back. */
export const GET = route(
  { permission: "anyone", params: versionParameters, query: querySchema },
  async ({ person, params, query }) => {
    const reading = granted(await readVersion(person, params.id, params.n));
    const text = `${JSON.stringify(reading.file, null, 2)}\n`;
    return new Response(text, { headers: headersOf(reading, query.download === "1") });
  },
);
