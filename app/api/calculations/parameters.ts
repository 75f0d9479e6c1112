import { z } from "zod";
import { maybeCalculationId } from "@/lib/calculations";

/**
 * Parts of the address, as typed. What cannot be an id or a number becomes one that nothing has, so
 * that the answer is 404 like for anything else that is not there.
 */
const id = z.string().transform((typed) => maybeCalculationId(typed) ?? "");
const n = z.string().transform((typed) => (/^[1-9]\d{0,8}$/.test(typed) ? Number(typed) : 0));

export const calculationParameters = z.object({ id });
export const versionParameters = z.object({ id, n });
