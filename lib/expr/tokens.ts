import { raise } from "./faults";

export type TokenKind = "number" | "name" | "operator" | "open" | "close" | "comma";

/** One word of a formula; positions count characters of the normalised text. */
export interface Token {
  readonly kind: TokenKind;
  readonly text: string;
  readonly from: number;
  readonly to: number;
  /** Added by the reader of habits, not typed. */
  readonly added?: boolean;
  /** A typed `%`, read as the number 0.01. */
  readonly percent?: boolean;
}

const space = /\s+/y;
const number = /(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?/y;
const name =
  /[A-Za-z\u00C0-\u00D6\u00D8-\u00F6\u00F8-\u024F\u0370-\u03FF][A-Za-z0-9_\u00C0-\u00D6\u00D8-\u00F6\u00F8-\u024F\u0370-\u03FF]*/y;
const operator = /<=|>=|==|!=|[-+*/^!%<>=?:]/y;
/** Syntax of the expression library that a formula may not use. */
const forbidden = /=>|\.[*/^']|<<|>>>?|"[^"]*"?|'[^']*'?|[[\]{};&|~'".@$`\\#_]/y;

const words: Record<string, TokenKind> = {
  and: "operator",
  or: "operator",
  not: "operator",
  to: "operator",
};
const brackets: Record<string, TokenKind> = { "(": "open", ")": "close", ",": "comma" };
const forbiddenWords = new Set([
  "mod",
  "xor",
  "in",
  "true",
  "false",
  "null",
  "undefined",
  "NaN",
  "Infinity",
  "end",
]);

function match(pattern: RegExp, text: string, at: number): string | undefined {
  pattern.lastIndex = at;
  return pattern.exec(text)?.[0];
}

function readName(text: string, from: number): Token {
  const word = match(name, text, from) ?? "";
  const to = from + word.length;
  if (forbiddenWords.has(word)) {
    raise({
      code: "forbidden",
      reason: word === "in" ? "word-in" : "word",
      from,
      to,
      with: { word },
    });
  }
  return { kind: words[word] ?? "name", text: word, from, to };
}

function readNumber(text: string, from: number, word: string): Token {
  const to = from + word.length;
  if (word === "0" && /^[bxo][0-9a-fA-F]/.test(text.slice(to, to + 2))) {
    raise({ code: "syntax", reason: "number-base", from, to: to + 2 });
  }
  if (!Number.isFinite(Number(word))) {
    raise({ code: "overflow", reason: "number-too-large", from, to, with: { word } });
  }
  if (Number(word) === 0 && /[1-9]/.test(word.split(/e/i)[0] ?? "")) {
    raise({ code: "overflow", reason: "number-too-small", from, to, with: { word } });
  }
  return { kind: "number", text: word, from, to };
}

function refuseCharacter(text: string, from: number): never {
  const character = String.fromCodePoint(text.codePointAt(from) ?? 0);
  const to = from + character.length;
  raise({ code: "syntax", reason: "character", from, to, with: { character } });
}

function readToken(text: string, from: number): Token {
  const digits = match(number, text, from);
  if (digits) return readNumber(text, from, digits);
  if (match(name, text, from)) return readName(text, from);
  const bracket = brackets[text.charAt(from)];
  if (bracket) return { kind: bracket, text: text.charAt(from), from, to: from + 1 };
  const word = match(forbidden, text, from);
  if (word) {
    const to = from + word.length;
    raise({ code: "forbidden", reason: "syntax-forbidden", from, to, with: { word } });
  }
  const sign = match(operator, text, from);
  if (!sign) refuseCharacter(text, from);
  return { kind: "operator", text: sign, from, to: from + sign.length };
}

/**
 * The words of a normalised formula.
 * Raises `syntax` for a character that means nothing, `forbidden` for syntax that formulas may not
 * use, `overflow` for a number that no double holds.
 */
export function readTokens(text: string): Token[] {
  const tokens: Token[] = [];
  for (let at = 0; at < text.length; ) {
    const blank = match(space, text, at);
    if (blank) {
      at += blank.length;
      continue;
    }
    const token = readToken(text, at);
    tokens.push(token);
    at = token.to;
  }
  return tokens;
}
