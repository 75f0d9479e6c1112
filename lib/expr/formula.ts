import { limits } from "../schema/limits";
import { attempt, type Fault, raise } from "./faults";
import { type Normalised, normalise, typedRange } from "./normalise";
import { parseTokens, type Roles } from "./parse";
import { readTokens, type Token } from "./tokens";
import { freeNames, type Place, partsOf, type Tree, walk } from "./tree";

/** The words of a typed formula, taken apart where the language does: `head = body to unit`. */
export interface FormulaWords {
  readonly typed: string;
  readonly normalised: Normalised;
  /** `f` or `f(x, y)` in front of one `=`; absent without one. */
  readonly head?: FormulaHead;
  readonly body: readonly Token[];
  /** The unit behind a last `to`, as typed, and where it begins. */
  readonly unit?: { readonly text: string; readonly from: number };
}

export interface FormulaHead {
  readonly name: string;
  /** Parameters, where the head defines a function. */
  readonly parameters?: readonly string[];
}

/** A formula as read: its tree and what can be said of it before names are known. */
export interface Formula {
  readonly words: FormulaWords;
  readonly tree: Tree;
  /** Names it looks up. */
  readonly names: readonly string[];
  /** Names in exponents, whose values can decide a dimension. */
  readonly exponentNames: ReadonlySet<string>;
  /** Implicit products right behind a division, as typed. */
  readonly ambiguous: readonly Place[];
  /** Names right behind a number, as typed. */
  readonly behindNumbers: readonly (Place & { readonly name: string })[];
}

/** Raise a fault again with its place counted in the typed text. */
export function inTyped(fault: Fault, normalised: Normalised): Fault {
  if (fault.from === undefined || fault.to === undefined) return fault;
  return { ...fault, ...typedRange(normalised, fault.from, fault.to) };
}

function findAssignment(tokens: readonly Token[]): number {
  return tokens.findIndex((token) => token.text === "=");
}

/** `f`, or `f(x, y)`. Raises `syntax` for anything else in front of an `=`. */
export function readHead(tokens: readonly Token[]): FormulaHead {
  const [name, open] = tokens;
  const place = { from: name?.from ?? 0, to: tokens[tokens.length - 1]?.to ?? 0 };
  if (name?.kind !== "name") raise({ code: "syntax", reason: "head", ...place });
  if (tokens.length === 1) return { name: name.text };
  const inner = tokens.slice(2, -1);
  const wellFormed =
    open?.kind === "open" &&
    tokens[tokens.length - 1]?.kind === "close" &&
    inner.length % 2 === 1 &&
    inner.every((token, i) => token.kind === (i % 2 === 0 ? "name" : "comma"));
  if (!wellFormed) raise({ code: "syntax", reason: "head", ...place });
  const parameters = inner.filter((token) => token.kind === "name").map((token) => token.text);
  if (new Set(parameters).size < parameters.length) {
    raise({ code: "syntax", reason: "head-twice", ...place });
  }
  return { name: name.text, parameters };
}

function splitUnit(typed: string, normalised: Normalised, tokens: readonly Token[]) {
  const at = tokens.map((token) => token.text).lastIndexOf("to");
  const word = tokens[at];
  if (!word) return { body: tokens };
  const after = normalised.origin[word.to] ?? typed.length;
  const rest = typed.slice(after);
  const from = after + (rest.length - rest.trimStart().length);
  if (rest.trim() === "")
    raise({ code: "unit", reason: "unit-missing", from: word.from, to: word.to });
  return { body: tokens.slice(0, at), unit: { text: rest.trim(), from } };
}

/** Take a typed formula apart. Raises faults with places in the typed text. */
export function readWords(typed: string): FormulaWords {
  if (typed.length > limits.formulaLength) {
    raise({
      code: "limit",
      reason: "formula-length",
      from: 0,
      to: typed.length,
      with: { found: String(typed.length) },
    });
  }
  const normalised = normalise(typed);
  const read = attempt(() => {
    const tokens = readTokens(normalised.text);
    const at = findAssignment(tokens);
    const head = at >= 0 ? readHead(tokens.slice(0, at)) : undefined;
    const rest = tokens.slice(at + 1);
    const again = rest.find((token) => token.text === "=");
    if (again) raise({ code: "forbidden", reason: "assignment", from: again.from, to: again.to });
    return { typed, normalised, ...(head ? { head } : {}), ...splitUnit(typed, normalised, rest) };
  });
  if (!read.ok) raise(inTyped(read.fault, normalised));
  return read.value;
}

function exponentNames(tree: Tree): Set<string> {
  const names = new Set<string>();
  walk(tree, (node) => {
    const exponent =
      node.type === "binary" && node.operator === "^"
        ? node.right
        : node.type === "call" && node.name === "nthRoot"
          ? node.parts[1]
          : undefined;
    if (exponent) for (const name of freeNames(exponent)) names.add(name);
  });
  return names;
}

function ambiguousDivisions(tree: Tree, normalised: Normalised): Place[] {
  const places: Place[] = [];
  walk(tree, (node) => {
    if (node.type !== "binary" || node.operator !== "/") return;
    const { right } = node;
    if (right.type === "binary" && right.implicit && !right.bracketed) {
      places.push(typedRange(normalised, right.from, right.to));
    }
  });
  return places;
}

function namesBehindNumbers(tree: Tree, normalised: Normalised) {
  const found: (Place & { name: string })[] = [];
  walk(tree, (node) => {
    if (node.type !== "binary" || !node.implicit || rightmost(node.left).type !== "number") return;
    const name = leftmost(node.right);
    if (name.type === "name") {
      found.push({ name: name.name, ...typedRange(normalised, name.from, name.to) });
    }
  });
  return found;
}

function leftmost(tree: Tree): Tree {
  const first = tree.type === "call" || tree.bracketed ? undefined : partsOf(tree)[0];
  return first ? leftmost(first) : tree;
}

function rightmost(tree: Tree): Tree {
  const parts = tree.type === "call" || tree.bracketed ? [] : partsOf(tree);
  const last = parts[parts.length - 1];
  return last ? rightmost(last) : tree;
}

/**
 * The tree of a formula already taken apart; `parameters` are those of the function it defines.
 * Raises faults with places in the typed text.
 */
export function readFormula(
  words: FormulaWords,
  roles: Roles,
  parameters: readonly string[] = [],
): Formula {
  const read = attempt(() => parseTokens(words.body, rolesInside(parameters, roles)));
  if (!read.ok) raise(inTyped(read.fault, words.normalised));
  const tree = read.value;
  return {
    words,
    tree,
    names: [...freeNames(tree, new Set(parameters))],
    exponentNames: exponentNames(tree),
    ambiguous: ambiguousDivisions(tree, words.normalised),
    behindNumbers: namesBehindNumbers(tree, words.normalised),
  };
}

/** Parameters of the function being defined are quantities inside it. */
function rolesInside(parameters: readonly string[], roles: Roles): Roles {
  if (parameters.length === 0) return roles;
  const functions = new Set([...roles.functions].filter((name) => !parameters.includes(name)));
  return { functions, quantities: new Set([...roles.quantities, ...parameters]) };
}
