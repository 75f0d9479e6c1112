import { readJson } from "@/lib/schema/read-json";
import { HttpProblem } from "./problems";

async function readBytes(request: Request, most: number): Promise<Uint8Array> {
  const declared = Number(request.headers.get("content-length") ?? 0);
  if (declared > most) throw tooLarge(most);
  const parts: Uint8Array[] = [];
  let size = 0;
  const reader = request.body?.getReader();
  for (;;) {
    const part = await reader?.read();
    if (!part || part.done) break;
    size += part.value.byteLength;
    if (size > most) {
      await reader?.cancel();
      throw tooLarge(most);
    }
    parts.push(part.value);
  }
  return Buffer.concat(parts);
}

function tooLarge(most: number): HttpProblem {
  return new HttpProblem("too-large", {
    detail: `At most ${(most / 1e6).toFixed(1)} MB are read. A calculation holds at most 1 MB.`,
  });
}

/** The JSON body of a request, read strictly and up to `most` bytes. Throws HttpProblem. */
export async function readBody(request: Request, most: number): Promise<unknown> {
  const type = request.headers.get("content-type") ?? "";
  if (!/^application\/json\s*(;|$)/i.test(type)) throw new HttpProblem("unsupported-media-type");
  const bytes = await readBytes(request, most);
  let text: string;
  try {
    text = new TextDecoder("utf-8", { fatal: true }).decode(bytes);
  } catch {
    throw new HttpProblem("bad-json", { detail: "The body is not UTF-8." });
  }
  const read = readJson(text);
  if (read.ok) return read.value;
  const detail = `Line ${read.line}, column ${read.column}: ${read.message}`;
  throw new HttpProblem("bad-json", { detail });
}
