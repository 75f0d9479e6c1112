import { type ParseErrorCode, visit } from "jsonc-parser";
import { limits } from "./limits";

export type JsonReading =
  | { readonly ok: true; readonly value: unknown }
  | {
      readonly ok: false;
      readonly message: string;
      readonly line: number;
      readonly column: number;
    };

class JsonFault extends Error {
  constructor(
    message: string,
    readonly line: number,
    readonly column: number,
  ) {
    super(message);
  }
}

function position(text: string, offset: number): { line: number; column: number } {
  const before = text.slice(0, offset);
  const line = before.split("\n").length;
  return { line, column: offset - before.lastIndexOf("\n") };
}

function requireSound(text: string): void {
  const keys: Set<string>[] = [];
  let depth = 0;
  const fail = (message: string, offset: number): never => {
    const { line, column } = position(text, offset);
    throw new JsonFault(message, line, column);
  };
  const enter = (offset: number) => {
    depth += 1;
    if (depth > limits.jsonDepth)
      fail(`It is nested more than ${limits.jsonDepth} levels deep.`, offset);
  };
  visit(
    text,
    {
      onObjectBegin: (offset) => {
        enter(offset);
        keys.push(new Set());
      },
      onObjectEnd: () => {
        depth -= 1;
        keys.pop();
      },
      onArrayBegin: (offset) => enter(offset),
      onArrayEnd: () => {
        depth -= 1;
      },
      onObjectProperty: (key, offset) => {
        const seen = keys[keys.length - 1];
        if (key === "__proto__") fail("A field may not be called “__proto__”.", offset);
        if (seen?.has(key)) fail(`The field “${key}” stands twice in one object.`, offset);
        seen?.add(key);
      },
      onLiteralValue: (value, offset) => {
        if (typeof value === "number" && !Number.isFinite(value)) {
          fail("A number is larger than a double holds.", offset);
        }
      },
      onError: (_code: ParseErrorCode, offset) => fail("This is not JSON.", offset),
    },
    { disallowComments: true, allowTrailingComma: false, allowEmptyContent: false },
  );
}

/**
 * Read a JSON text strictly: besides what JSON itself forbids, no field twice in one object, no
 * `__proto__`, no number beyond a double, no nesting beyond the limit. Never throws; a failure says
 * what is wrong and on which line and column, counted from 1.
 */
export function readJson(text: string): JsonReading {
  try {
    requireSound(text);
    return { ok: true, value: JSON.parse(text) };
  } catch (error) {
    if (error instanceof JsonFault) {
      return { ok: false, message: error.message, line: error.line, column: error.column };
    }
    return { ok: false, message: "This is not JSON.", line: 1, column: 1 };
  }
}
