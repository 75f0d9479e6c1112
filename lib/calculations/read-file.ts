import type { z } from "zod";
import { canonicalText, contentHash } from "@/lib/evaluator/content-hash";
import {
  type CalculationFile,
  calculationOf,
  calculationSchema,
  fileFormat,
  limitSentences,
  limits,
  type VersionFile,
  versionFileSchema,
} from "@/lib/schema";
import { readJson } from "@/lib/schema/read-json";
import { illFormedSentence, isWellFormed } from "./well-formed";

/** What a file turned out to hold, or the one line that says why it cannot be used. */
export type FileReading =
  | { kind: "calculation"; calculation: CalculationFile }
  | { kind: "version"; calculation: CalculationFile; version: VersionFile }
  | { kind: "unusable"; why: string };

/** A version file holds results beside its calculation; nothing larger than this is looked at. */
export const mostFileBytes = 8 * limits.fileBytes;

const unusable = (why: string): FileReading => ({ kind: "unusable", why });

/** `leading-order/2` and later: made by a newer release than this. */
function newerFormat(format: unknown): boolean {
  const [, number] = /^leading-order\/([1-9]\d*)$/.exec(String(format)) ?? [];
  return number !== undefined && format !== fileFormat;
}

function whyNotThisFormat(document: object): string | undefined {
  const format = "format" in document ? document.format : undefined;
  if (format === fileFormat) return undefined;
  if (format === undefined) return `it has no "format"; a calculation file says "${fileFormat}"`;
  const named = JSON.stringify(format);
  if (newerFormat(format))
    return `its format ${named} is newer than this release, which reads "${fileFormat}"`;
  return `its format ${named} is unknown; this release reads "${fileFormat}"`;
}

/** The first fault of the shape, with where it is: `cells.3.unit: …`. */
function whyNotThisShape(error: z.ZodError): string {
  const [issue] = error.issues;
  const where = issue?.path.join(".");
  return `${where ? `${where}: ` : ""}${issue?.message ?? "it is not a calculation file"}`;
}

function readVersion(document: object): FileReading {
  const parsed = versionFileSchema.safeParse(document);
  if (!parsed.success) return unusable(whyNotThisShape(parsed.error));
  const version = parsed.data;
  const calculation = calculationOf(version);
  const hash = contentHash(calculation);
  const recorded = [version.version.contentHash, version.results.contentHash];
  if (recorded.some((other) => other !== hash))
    return unusable(`hash does not match: its content has ${hash}, it records ${recorded[0]}`);
  return { kind: "version", calculation, version };
}

function readCalculation(document: object): FileReading {
  const parsed = calculationSchema.safeParse(document);
  if (!parsed.success) return unusable(whyNotThisShape(parsed.error));
  return { kind: "calculation", calculation: parsed.data };
}

function withinSize(reading: FileReading): FileReading {
  if (reading.kind === "unusable") return reading;
  const bytes = Buffer.byteLength(canonicalText(reading.calculation));
  return bytes > limits.fileBytes ? unusable(limitSentences.fileBytes(bytes)) : reading;
}

function decode(bytes: Uint8Array): string | undefined {
  try {
    return new TextDecoder("utf-8", { fatal: true }).decode(bytes);
  } catch {
    return undefined;
  }
}

/**
 * Reads the bytes of a calculation or version file. A version file whose calculation does not have
 * the content hash that it records is unusable: its numbers would be cited for something else.
 */
export function readCalculationFile(bytes: Uint8Array): FileReading {
  if (bytes.byteLength > mostFileBytes) return unusable(limitSentences.fileBytes(bytes.byteLength));
  const text = decode(bytes);
  if (text === undefined) return unusable("it is not UTF-8 text");
  const json = readJson(text);
  if (!json.ok) return unusable(`line ${json.line}, column ${json.column}: ${json.message}`);
  const document = json.value;
  if (typeof document !== "object" || document === null || Array.isArray(document))
    return unusable("it is not a JSON object");
  if (!isWellFormed(document)) return unusable(illFormedSentence);
  const wrongFormat = whyNotThisFormat(document);
  if (wrongFormat) return unusable(wrongFormat);
  return withinSize("version" in document ? readVersion(document) : readCalculation(document));
}
