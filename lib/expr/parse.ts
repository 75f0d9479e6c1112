import { create, parseDependencies } from "mathjs/number";
import { limits } from "../schema/limits";
import { allow } from "./allow";
import { FaultSignal, raise } from "./faults";
import { functionNames } from "./functions";
import { boundNames, honourHabits, isExponent, refuseBareFunctions } from "./habits";
import type { Token } from "./tokens";
import { depthOf, type Tree } from "./tree";

// Only the parser of the library is made here: no evaluator, no units, no configuration to reach.
const library = create({ ...parseDependencies }, {});
const parseWithLibrary = library.parse as (text: string) => import("mathjs").MathNode;

/** What the calculation defines, as far as reading a formula depends on it. */
export interface Roles {
  /** Names the calculation defines as functions. */
  readonly functions: ReadonlySet<string>;
  /** Names the calculation defines as quantities; they win over the functions of the language. */
  readonly quantities: ReadonlySet<string>;
}

/** Names that call when a bracket follows them, in one formula. */
export function callableNames(tokens: readonly Token[], roles: Roles): Set<string> {
  const bound = boundNames(tokens);
  const callable = new Set<string>(roles.functions);
  for (const name of functionNames) {
    if (!roles.quantities.has(name) && !bound.has(name)) callable.add(name);
  }
  return callable;
}

function refuseDeepBrackets(tokens: readonly Token[]): void {
  let level = 0;
  for (const token of tokens) {
    if (token.kind === "open") level += 1;
    if (token.kind === "close") level -= 1;
    if (level > limits.formulaDepth) {
      raise({ code: "limit", reason: "formula-depth", from: token.from, to: token.to });
    }
  }
}

function refuseUnbalanced(tokens: readonly Token[]): void {
  const open: Token[] = [];
  for (const token of tokens) {
    if (token.kind === "open") open.push(token);
    if (token.kind === "close" && !open.pop()) {
      raise({ code: "syntax", reason: "bracket-extra", from: token.from, to: token.to });
    }
  }
  const left = open.pop();
  if (left) raise({ code: "syntax", reason: "bracket-open", from: left.from, to: left.to });
}

/** Two bare numbers side by side are a slip, not a product. */
function refuseTwoNumbers(tokens: readonly Token[]): void {
  for (const [index, token] of tokens.entries()) {
    const next = tokens[index + 1];
    if (token.kind === "number" && next?.kind === "number" && !isExponent(tokens, index)) {
      const place = { from: token.from, to: next.to };
      raise({
        code: "syntax",
        reason: "two-numbers",
        ...place,
        suggestion: `${token.text} * ${next.text}`,
        with: { first: token.text, second: next.text },
      });
    }
  }
}

/** The library tells where it stopped by a character of the text it was given. */
function faultFromLibrary(
  error: unknown,
  words: readonly Token[],
  starts: readonly number[],
): never {
  if (error instanceof FaultSignal) throw error;
  if (error instanceof RangeError) raise({ code: "limit", reason: "formula-depth" });
  const at = ((error as { char?: number }).char ?? 1) - 1;
  const index = starts.findIndex((start, i) => at < start + (words[i]?.text.length ?? 0) + 1);
  const word = words[index];
  const end = words[words.length - 1]?.to ?? 0;
  if (
    !word ||
    at >= (starts[starts.length - 1] ?? 0) + (words[words.length - 1]?.text.length ?? 0)
  ) {
    raise({ code: "syntax", reason: "ends-early", from: Math.max(0, end - 1), to: end });
  }
  raise({
    code: "syntax",
    reason: "unexpected",
    from: word.from,
    to: word.to,
    with: { word: word.text },
  });
}

/**
 * The tree of one formula, from its words. Names keep their spelling; none is looked up.
 * Raises `syntax`, `forbidden` or `limit`, with places in the normalised text.
 */
export function parseTokens(tokens: readonly Token[], roles: Roles): Tree {
  if (tokens.length === 0) raise({ code: "syntax", reason: "empty", from: 0, to: 0 });
  refuseDeepBrackets(tokens);
  refuseUnbalanced(tokens);
  const callable = callableNames(tokens, roles);
  refuseBareFunctions(tokens, callable);
  refuseTwoNumbers(tokens);
  const words = honourHabits(tokens, callable);
  const starts: number[] = [];
  let text = "";
  for (const word of words) {
    starts.push(text.length);
    text += `${word.text} `;
  }
  let tree: Tree;
  try {
    tree = allow(parseWithLibrary(text), words);
  } catch (error) {
    return faultFromLibrary(error, words, starts);
  }
  if (depthOf(tree) > limits.formulaDepth) raise({ code: "limit", reason: "formula-depth" });
  return tree;
}
