/** What a formula says, before names are known: our own tree, every node with where it was typed. */
export interface Place {
  readonly from: number;
  readonly to: number;
  /** True where brackets were typed around it. */
  readonly bracketed?: boolean;
}

export type BinaryOperator = "+" | "-" | "*" | "/" | "^" | "and" | "or";
export type Comparison = "<" | ">" | "<=" | ">=" | "==" | "!=";

export type Tree = Place &
  (
    | { readonly type: "number"; readonly value: number; readonly text: string }
    | { readonly type: "name"; readonly name: string; readonly beforeBracket: boolean }
    | { readonly type: "unary"; readonly operator: "-" | "+" | "not"; readonly argument: Tree }
    | {
        readonly type: "binary";
        readonly operator: BinaryOperator;
        readonly implicit: boolean;
        readonly left: Tree;
        readonly right: Tree;
      }
    | {
        readonly type: "comparison";
        readonly operators: readonly Comparison[];
        readonly parts: readonly Tree[];
      }
    | {
        readonly type: "conditional";
        readonly test: Tree;
        readonly yes: Tree;
        readonly no: Tree;
      }
    | {
        readonly type: "call";
        readonly name: string;
        readonly nameTo: number;
        readonly parts: readonly Tree[];
      }
  );

/** The parts of a node, in the order of reading. */
export function partsOf(tree: Tree): readonly Tree[] {
  switch (tree.type) {
    case "number":
    case "name":
      return [];
    case "unary":
      return [tree.argument];
    case "binary":
      return [tree.left, tree.right];
    case "conditional":
      return [tree.test, tree.yes, tree.no];
    case "comparison":
    case "call":
      return tree.parts;
  }
}

/** Visit every node, parents first. */
export function walk(tree: Tree, visit: (node: Tree) => void): void {
  visit(tree);
  for (const part of partsOf(tree)) walk(part, visit);
}

const additive = new Set(["+", "-"]);
const multiplicative = new Set(["*", "/"]);

/** A chain such as `a + b + c` is one level, however long it is. */
function continuesChain(tree: Tree, left: Tree): boolean {
  if (tree.type !== "binary" || left.type !== "binary") return false;
  return [additive, multiplicative].some((set) => set.has(tree.operator) && set.has(left.operator));
}

/** Levels of nesting; the chain of a long sum or product counts as one. */
export function depthOf(tree: Tree): number {
  let deepest = 0;
  for (const part of partsOf(tree)) {
    deepest = Math.max(deepest, depthOf(part) - (continuesChain(tree, part) ? 1 : 0));
  }
  return deepest + 1;
}

/** Every name a formula looks up, without those it binds itself (`x` in `integrate(f, x, 0, 1)`). */
export function freeNames(tree: Tree, bound: ReadonlySet<string> = new Set()): Set<string> {
  const found = new Set<string>();
  const collect = (node: Tree, inner: ReadonlySet<string>) => {
    for (const name of freeNames(node, inner)) found.add(name);
  };
  if (tree.type === "name") {
    if (!bound.has(tree.name)) found.add(tree.name);
    return found;
  }
  if (tree.type === "call") found.add(tree.name);
  const variable = boundName(tree);
  for (const [index, part] of partsOf(tree).entries()) {
    if (variable !== undefined && index === 1) continue;
    collect(part, variable !== undefined && index === 0 ? new Set([...bound, variable]) : bound);
  }
  return found;
}

/** Functions that bind a name of their own: `(expression, variable, from, to)`. */
export const bindingFunctions: ReadonlySet<string> = new Set(["integrate", "sum", "root"]);

/** The name that a call of a binding function binds, if it is well formed. */
export function boundName(tree: Tree): string | undefined {
  if (tree.type !== "call" || !bindingFunctions.has(tree.name)) return undefined;
  const variable = tree.parts[1];
  return variable?.type === "name" ? variable.name : undefined;
}
