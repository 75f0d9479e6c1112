import { z } from "zod";
import { editionHash } from "@/lib/evaluator";
import { json, route } from "@/lib/http";
import {
  type Constant,
  dimensionToJson,
  type EditionName,
  type EmConvention,
  editionNames,
  editionTitle,
  listConstants,
} from "@/lib/physics";
import { editionSchema, emSchema } from "@/lib/schema";

const querySchema = z.strictObject({
  edition: editionSchema.optional(),
  em: emSchema.default("si"),
});

const shown = (constant: Constant) => ({
  symbol: constant.symbol,
  name: constant.name,
  value: constant.value,
  text: constant.text,
  uncertainty: constant.exact ? null : constant.uncertainty,
  uncertaintyText: constant.uncertaintyText,
  unit: constant.unit,
  si: { value: constant.siValue, dimension: dimensionToJson(constant.dimension) },
  source: constant.source,
});

const editionOf = (edition: EditionName, em: EmConvention) => ({
  edition,
  title: editionTitle(edition),
  hash: editionHash(edition),
  em,
  constants: listConstants({ edition, em }).map(shown),
});

/** The constants of one edition, or without `edition` of all of them side by side. */
export const GET = route({ permission: "anyone", query: querySchema }, ({ query }) => {
  const { edition, em } = query;
  const answer = edition
    ? editionOf(edition, em)
    : { editions: editionNames.map((name) => editionOf(name, em)) };
  return json(answer, { headers: { "cache-control": "public, max-age=300" } });
});
