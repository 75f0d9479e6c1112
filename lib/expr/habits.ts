import { raise } from "./faults";
import type { Token } from "./tokens";
import { bindingFunctions } from "./tree";

/**
 * Habits of theorists that the expression library gets wrong or refuses: a quantity followed by a
 * bracket multiplies (`pi (r/2)^3`), and so does a number right behind a power or a closed bracket
 * (`c^4 400 Mpc`). The words are rewritten with brackets so that the library reads them so.
 */

function bracket(kind: "open" | "close", at: number): Token {
  return { kind, text: kind === "open" ? "(" : ")", from: at, to: at, added: true };
}

function inBrackets(token: Token): Token[] {
  return [bracket("open", token.from), token, bracket("close", token.to)];
}

/** True for a number that stands in an exponent: `^3`, `^-3`. */
export function isExponent(tokens: readonly Token[], index: number): boolean {
  let before = index - 1;
  while (["-", "+"].includes(tokens[before]?.text ?? "")) before -= 1;
  return tokens[before]?.text === "^";
}

/** True where an operand ends with this word, so that a number behind it multiplies. */
function endsPower(tokens: readonly Token[], index: number): boolean {
  const token = tokens[index];
  if (token?.kind === "close" || token?.kind === "name") return true;
  return token?.kind === "number" ? isExponent(tokens, index) : token?.text === "!";
}

/** A name in front of a bracket or a number multiplies it, unless it is a function being called. */
function multipliesNext(
  tokens: readonly Token[],
  index: number,
  functions: ReadonlySet<string>,
): boolean {
  const token = tokens[index];
  const next = tokens[index + 1];
  if (token?.kind !== "name" || functions.has(token.text)) return false;
  if (next?.kind === "number") return true;
  return next?.kind === "open" && !looksLikeCall(tokens, index + 1);
}

/** A bracket behind a name that holds a comma, or nothing, can only be a call. */
function looksLikeCall(tokens: readonly Token[], open: number): boolean {
  if (tokens[open + 1]?.kind === "close") return true;
  let level = 0;
  for (let i = open; i < tokens.length; i++) {
    if (tokens[i]?.kind === "open") level += 1;
    if (tokens[i]?.kind === "close" && --level === 0) return false;
    if (tokens[i]?.kind === "comma" && level === 1) return true;
  }
  return false;
}

/**
 * `%` as a factor of 0.01. The library also knows it as the remainder of a division and lets `x + 5%`
 * mean x + 0.05 x; here it is a number, and nothing may stand right behind it.
 */
function percentSign(tokens: readonly Token[], index: number): Token {
  const token = tokens[index] as Token;
  const next = tokens[index + 1];
  if (next && ["number", "name", "open"].includes(next.kind)) {
    raise({ code: "forbidden", reason: "remainder", from: token.from, to: token.to });
  }
  return { ...token, kind: "name", text: "percent", percent: true };
}

/**
 * The words with brackets added where a habit asks for them.
 * `functions` are the names that call when a bracket follows; every other name multiplies.
 */
export function honourHabits(typed: readonly Token[], functions: ReadonlySet<string>): Token[] {
  const tokens = typed.map((token, index) =>
    token.text === "%" ? percentSign(typed, index) : token,
  );
  return tokens.flatMap((token, index) => {
    if (multipliesNext(tokens, index, functions)) return inBrackets(token);
    const multiplies = token.kind === "number" && index > 0 && endsPower(tokens, index - 1);
    return multiplies ? inBrackets(token) : [token];
  });
}

/** Names that `integrate`, `sum` and `root` bind: quantities, whatever they mean elsewhere. */
export function boundNames(tokens: readonly Token[]): Set<string> {
  const names = new Set<string>();
  for (const [index, token] of tokens.entries()) {
    if (bindingFunctions.has(token.text) && tokens[index + 1]?.kind === "open") {
      const name = secondArgument(tokens, index + 1);
      if (name) names.add(name);
    }
  }
  return names;
}

function secondArgument(tokens: readonly Token[], open: number): string | undefined {
  let level = 0;
  for (let i = open; i < tokens.length; i++) {
    const token = tokens[i];
    if (token?.kind === "open") level += 1;
    if (token?.kind === "close") level -= 1;
    if (level === 0) return undefined;
    if (token?.kind === "comma" && level === 1) {
      const next = tokens[i + 1];
      return next?.kind === "name" && tokens[i + 2]?.kind === "comma" ? next.text : undefined;
    }
  }
  return undefined;
}

/** A function without its bracket: `sin x`, or `sin^2(x)` for `sin(x)^2`. */
export function refuseBareFunctions(
  tokens: readonly Token[],
  functions: ReadonlySet<string>,
): void {
  for (const [index, token] of tokens.entries()) {
    if (token.kind !== "name" || !functions.has(token.text)) continue;
    if (tokens[index + 1]?.kind === "open") continue;
    const power = raisedCall(tokens, index);
    const place = { from: token.from, to: power?.to ?? token.to };
    raise({
      code: "syntax",
      reason: power ? "raised-function" : "bare-function",
      ...place,
      ...(power ? { suggestion: power.suggestion } : {}),
      with: { name: token.text, ...(power ? { suggestion: power.suggestion } : {}) },
    });
  }
}

/** The exponent right behind `sin`: `^2` or, from a superscript, `^(2)`. */
function exponentAfter(
  tokens: readonly Token[],
  index: number,
): { text: string; next: number } | undefined {
  if (tokens[index]?.text !== "^") return undefined;
  const at = tokens[index + 1]?.kind === "open" ? index + 2 : index + 1;
  const exponent = tokens[at];
  if (exponent?.kind !== "number") return undefined;
  return { text: exponent.text, next: at === index + 1 ? at + 1 : at + 2 };
}

function raisedCall(
  tokens: readonly Token[],
  index: number,
): { to: number; suggestion: string } | undefined {
  const exponent = exponentAfter(tokens, index + 1);
  if (!exponent || tokens[exponent.next]?.kind !== "open") return undefined;
  let level = 0;
  for (let i = exponent.next; i < tokens.length; i++) {
    if (tokens[i]?.kind === "open") level += 1;
    if (tokens[i]?.kind === "close" && --level === 0) {
      const inner = tokens.slice(exponent.next + 1, i).map((token) => token.text);
      const suggestion = `${tokens[index]?.text}(${inner.join(" ")})^${exponent.text}`;
      return { to: tokens[i]?.to ?? 0, suggestion };
    }
  }
  return undefined;
}
