import type { UnitSystem } from "../physics";
import { findFunction } from "./functions";
import { builtIn } from "./scope";
import { nameTex, unitNameTex } from "./tex-names";
import { bindingFunctions, type Comparison, type Tree } from "./tree";

/** What typesetting needs to know of names. */
export interface TexContext {
  readonly system: UnitSystem;
  /** True for names that the calculation defines, or that are bound or parameters. */
  readonly isQuantity: (name: string) => boolean;
}

/** How tightly a piece of TeX holds together. */
enum Binding {
  Or,
  And,
  Condition,
  Sum,
  Product,
  Sign,
  Power,
  Atom,
}

interface Piece {
  readonly tex: string;
  readonly binding: Binding;
  /** Begins with a digit: behind another factor it needs a ×. */
  readonly startsWithDigit?: boolean;
}

const comparisonTex: Record<Comparison, string> = {
  "<": "<",
  ">": ">",
  "<=": "\\le",
  ">=": "\\ge",
  "==": "=",
  "!=": "\\ne",
};

function wrapped(piece: Piece, least: Binding): string {
  return piece.binding < least ? `\\left(${piece.tex}\\right)` : piece.tex;
}

function numberPiece(text: string): Piece {
  if (text === "%") return { tex: "\\%", binding: Binding.Atom };
  const [, mantissa = text, power] = /^([\d.]+)[eE]\+?(-?\d+)$/.exec(text) ?? [];
  if (power === undefined) {
    return { tex: text, binding: Binding.Atom, startsWithDigit: true };
  }
  const tex = `10^{${Number(power)}}`;
  const digits = { startsWithDigit: true };
  if (/^1(\.0*)?$/.test(mantissa)) return { tex, binding: Binding.Power, ...digits };
  return { tex: `${mantissa} \\times ${tex}`, binding: Binding.Product, ...digits };
}

function isUnitName(tree: Tree, context: TexContext): boolean {
  if (tree.type !== "name" || context.isQuantity(tree.name)) return false;
  return builtIn(tree.name, context.system)?.kind === "unit";
}

function isUnitPower(tree: Tree, context: TexContext): boolean {
  if (tree.type === "binary" && tree.operator === "^") return isUnitName(tree.left, context);
  return isUnitName(tree, context);
}

/** The units of `10 erg/s/cm^2` as one upright product with powers; undefined for anything else. */
function unitProduct(tree: Tree, context: TexContext, sign = 1): string[] | undefined {
  if (isUnitName(tree, context) && tree.type === "name") {
    const set = unitNameTex(tree.name, context.system);
    return [sign < 0 ? `${set}^{-1}` : set];
  }
  if (tree.type !== "binary") return undefined;
  if (tree.operator === "^" && tree.left.type === "name" && isUnitName(tree.left, context)) {
    const power = wholeExponent(tree.right);
    return power === undefined
      ? undefined
      : [`${unitNameTex(tree.left.name, context.system)}^{${sign * power}}`];
  }
  if (tree.operator !== "*" && tree.operator !== "/") return undefined;
  const left = unitProduct(tree.left, context, sign);
  const right = left && unitProduct(tree.right, context, tree.operator === "/" ? -sign : sign);
  return left && right && [...left, ...right];
}

function wholeExponent(tree: Tree): number | undefined {
  if (tree.type === "number" && Number.isInteger(tree.value)) return tree.value;
  if (tree.type === "unary" && tree.operator === "-") {
    const inner = wholeExponent(tree.argument);
    return inner === undefined ? undefined : -inner;
  }
  return undefined;
}

/** A number followed by units and nothing else: `1e38 erg/s`. */
function quantityPiece(tree: Tree, context: TexContext): Piece | undefined {
  const factors: { tree: Tree; sign: number }[] = [];
  const collect = (node: Tree, sign: number): void => {
    if (node.type === "binary" && (node.operator === "*" || node.operator === "/")) {
      collect(node.left, sign);
      collect(node.right, node.operator === "/" ? -sign : sign);
    } else factors.push({ tree: node, sign });
  };
  collect(tree, 1);
  const [first, ...units] = factors;
  if (first?.tree.type !== "number" || units.length === 0) return undefined;
  if (!units.every((unit) => isUnitPower(unit.tree, context))) return undefined;
  const set = units.flatMap((unit) => unitProduct(unit.tree, context, unit.sign) ?? []);
  const number = numberPiece(first.tree.text);
  return {
    tex: `${number.tex}\\,${set.join("\\,")}`,
    binding: Binding.Product,
    startsWithDigit: true,
  };
}

function productPiece(tree: Extract<Tree, { type: "binary" }>, context: TexContext): Piece {
  const quantity = quantityPiece(tree, context);
  if (quantity) return quantity;
  const left = pieceOf(tree.left, context);
  const right = pieceOf(tree.right, context);
  const signedRight = right.binding === Binding.Sign;
  const between = right.startsWithDigit ? " \\times " : "\\,";
  const rightTex = signedRight ? `\\left(${right.tex}\\right)` : wrapped(right, Binding.Product);
  return {
    tex: `${wrapped(left, Binding.Product)}${between}${rightTex}`,
    binding: Binding.Product,
    ...(left.startsWithDigit ? { startsWithDigit: true } : {}),
  };
}

function powerPiece(tree: Extract<Tree, { type: "binary" }>, context: TexContext): Piece {
  const base = pieceOf(tree.left, context);
  const exponent = exponentTex(tree.right, context);
  if (tree.left.type === "call") {
    const plain = base.tex.startsWith("\\left") ? base.tex : `\\left(${base.tex}\\right)`;
    return { tex: `${plain}^{${exponent}}`, binding: Binding.Power };
  }
  const held = base.binding < Binding.Atom ? `\\left(${base.tex}\\right)` : `{${base.tex}}`;
  return {
    tex: `${held}^{${exponent}}`,
    binding: Binding.Power,
    ...(base.startsWithDigit ? { startsWithDigit: true } : {}),
  };
}

/** Exponents are set on one line: 1/3, not a small fraction bar. */
function exponentTex(tree: Tree, context: TexContext): string {
  if (tree.type === "binary" && tree.operator === "/") {
    const [above, below] = [tree.left, tree.right].map((part) =>
      wrapped(pieceOf(part, context), Binding.Power),
    );
    return `${above}/${below}`;
  }
  return pieceOf(tree, context).tex;
}

function binaryPiece(tree: Extract<Tree, { type: "binary" }>, context: TexContext): Piece {
  const { operator } = tree;
  if (operator === "*") return productPiece(tree, context);
  if (operator === "^") return powerPiece(tree, context);
  if (operator === "/") {
    const quantity = quantityPiece(tree, context);
    if (quantity) return quantity;
    const tex = `\\frac{${pieceOf(tree.left, context).tex}}{${pieceOf(tree.right, context).tex}}`;
    // Under an exponent a fraction needs brackets; in a product it does not.
    return { tex, binding: Binding.Power };
  }
  const left = pieceOf(tree.left, context);
  const right = pieceOf(tree.right, context);
  if (operator === "and" || operator === "or") {
    const binding = operator === "or" ? Binding.Or : Binding.And;
    const tex = `${wrapped(left, binding)}\\ \\text{${operator}}\\ ${wrapped(right, binding)}`;
    return { tex, binding };
  }
  const rightTex =
    right.binding === Binding.Sign
      ? `\\left(${right.tex}\\right)`
      : wrapped(right, operator === "-" ? Binding.Product : Binding.Sum);
  return { tex: `${wrapped(left, Binding.Sum)} ${operator} ${rightTex}`, binding: Binding.Sum };
}

function callPiece(tree: Extract<Tree, { type: "call" }>, context: TexContext): Piece {
  const variable = bindingFunctions.has(tree.name) ? tree.parts[1] : undefined;
  const inner: TexContext =
    variable?.type === "name"
      ? { ...context, isQuantity: (name) => name === variable.name || context.isQuantity(name) }
      : context;
  const parts = tree.parts.map((part) => pieceOf(part, inner));
  const isLoop = tree.name === "integrate" || tree.name === "sum";
  const texts = parts.map((part, i) =>
    isLoop && i === 0 ? wrapped(part, Binding.Product) : part.tex,
  );
  const entry = context.isQuantity(tree.name) ? undefined : findFunction(tree.name);
  const [fewest, most] = entry?.arity ?? [0, 0];
  const set = parts.length >= fewest && parts.length <= most ? entry?.tex : undefined;
  if (!set)
    return {
      tex: `${nameTex(tree.name)}\\left(${texts.join(", ")}\\right)`,
      binding: Binding.Atom,
    };
  if (tree.name === "factorial" && (parts[0]?.binding ?? 0) >= Binding.Atom) {
    return { tex: `${texts[0]}!`, binding: Binding.Atom };
  }
  return { tex: set(texts), binding: isLoop ? Binding.Sum : Binding.Atom };
}

function pieceOf(tree: Tree, context: TexContext): Piece {
  switch (tree.type) {
    case "number":
      return numberPiece(tree.text);
    case "name":
      return isUnitName(tree, context)
        ? { tex: unitNameTex(tree.name, context.system), binding: Binding.Atom }
        : { tex: nameTex(tree.name), binding: Binding.Atom };
    case "unary": {
      const inner = wrapped(pieceOf(tree.argument, context), Binding.Product);
      if (tree.operator === "not")
        return { tex: `\\text{not}\\ ${inner}`, binding: Binding.Condition };
      return { tex: `${tree.operator}${inner}`, binding: Binding.Sign };
    }
    case "binary":
      return binaryPiece(tree, context);
    case "comparison": {
      const [first = "", ...rest] = tree.parts.map((part) =>
        wrapped(pieceOf(part, context), Binding.Sum),
      );
      const tail = rest.map((part, i) => ` ${comparisonTex[tree.operators[i] ?? "<"]} ${part}`);
      return { tex: first + tail.join(""), binding: Binding.Condition };
    }
    case "conditional": {
      const [test, yes, no] = [tree.test, tree.yes, tree.no].map(
        (part) => pieceOf(part, context).tex,
      );
      const tex = `\\begin{cases} ${yes} & \\text{if } ${test} \\\\ ${no} & \\text{otherwise} \\end{cases}`;
      return { tex, binding: Binding.Sum };
    }
    case "call":
      return callPiece(tree, context);
  }
}

/** A formula as TeX, set as it was understood: fractions, powers and brackets show the precedence. */
export function formulaTex(tree: Tree, context: TexContext): string {
  return pieceOf(tree, context).tex;
}
