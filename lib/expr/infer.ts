import { dimensionless, divideDimensions, multiplyDimensions, powerDimension } from "../physics";
import { raise } from "./faults";
import { inferCall } from "./infer-calls";
import {
  adoptZero,
  type Context,
  inferPure,
  inferQuantity,
  inferTruth,
  type Kind,
  make,
  nominalMass,
  placeOf,
  requireEqual,
} from "./infer-context";
import { rationalOf } from "./rational";
import type { Meaning, Scope } from "./scope";
import type { Place, Tree } from "./tree";
import type { InputKey, Typed, TypedForm } from "./typed";

/**
 * Dimensions, inferred from the tree before anything is evaluated and whether or not a branch is
 * taken. What comes out has every name settled and no unit left.
 */

function inferConstant(place: Place, meaning: Extract<Meaning, { kind: "constant" }>): Typed {
  const { constant } = meaning;
  if (constant.nominalGM !== undefined) return nominalMass(place, constant.nominalGM);
  const form: TypedForm = constant.exact
    ? { op: "number", value: constant.siValue }
    : { op: "input", key: `constant:${constant.symbol}` };
  return make(place, constant.dimension, form);
}

function inferName(tree: Kind<"name">, context: Context): Typed {
  const local = context.locals.get(tree.name);
  if (local) return make(tree, local.dimension, { op: "local", local });
  const meaning = context.scope.lookup(tree.name);
  if (!meaning) {
    // Behind a name that is unknown, a bracket was more likely meant as a call.
    const reason = tree.beforeBracket ? "unknown-function" : "unknown-name";
    return raise({ code: "unknown-name", reason, ...placeOf(tree), with: { name: tree.name } });
  }
  switch (meaning.kind) {
    case "quantity": {
      const key: InputKey = `symbol:${tree.name}`;
      return make(tree, meaning.dimension, { op: "input", key });
    }
    case "number":
      return make(tree, dimensionless, { op: "number", value: meaning.value });
    case "constant":
      return inferConstant(tree, meaning);
    case "unit":
      return meaning.unit.nominalGM !== undefined
        ? nominalMass(tree, meaning.unit.nominalGM)
        : make(tree, meaning.unit.dimension, { op: "number", value: meaning.unit.factor });
    case "function":
      return raise({
        code: "syntax",
        reason: "bare-function",
        ...placeOf(tree),
        with: { name: tree.name },
      });
    case "faulty":
      return raise({
        code: "depends",
        reason: "depends",
        ...placeOf(tree),
        with: { symbol: meaning.symbol, cell: meaning.cell },
      });
  }
}

/** Where a mismatch of a chain is marked: the last two operands, not the whole chain. */
function mismatchPlace(left: Tree, right: Tree): Place {
  const chained = left.type === "binary" && (left.operator === "+" || left.operator === "-");
  return { from: chained ? left.right.from : left.from, to: right.to };
}

function inferPower(tree: Kind<"binary">, context: Context): Typed {
  const left = inferQuantity(tree.left, context);
  const right = inferPure(tree.right, context, "exponent");
  if (left.dimension === dimensionless) {
    return make(tree, dimensionless, { op: "power", left, right });
  }
  const exponent = rationalOf(tree.right, context.scope);
  if (!exponent) {
    raise({
      code: "dimension",
      reason: "exponent-unknown",
      ...placeOf(tree.right),
      with: { found: left.dimension },
    });
  }
  const fixed = make(tree.right, dimensionless, { op: "number", value: exponent.valueOf() });
  return make(tree, powerDimension(left.dimension, exponent), { op: "power", left, right: fixed });
}

const binaryOps = {
  "+": "add",
  "-": "subtract",
  "*": "multiply",
  "/": "divide",
  "^": "power",
  and: "and",
  or: "or",
} as const;

function inferBinary(tree: Kind<"binary">, context: Context): Typed {
  const op = binaryOps[tree.operator];
  if (op === "power") return inferPower(tree, context);
  if (op === "and" || op === "or") {
    const left = inferTruth(tree.left, context);
    return make(tree, dimensionless, { op, left, right: inferTruth(tree.right, context) }, true);
  }
  const left = inferQuantity(tree.left, context);
  const right = inferQuantity(tree.right, context);
  if (op === "multiply") {
    return make(tree, multiplyDimensions(left.dimension, right.dimension), { op, left, right });
  }
  if (op === "divide") {
    return make(tree, divideDimensions(left.dimension, right.dimension), { op, left, right });
  }
  const place = mismatchPlace(tree.left, tree.right);
  return make(tree, requireEqual(left, right, place), { op, left, right });
}

function inferComparison(tree: Kind<"comparison">, context: Context): Typed {
  const parts = tree.parts.map((part) => inferQuantity(part, context));
  const reference = parts.find((part) => part.dimension !== dimensionless) ?? parts[0];
  const adopted = parts.map((part) => (reference ? adoptZero(part, reference) : part));
  for (let i = 1; i < adopted.length; i++) {
    const [left, right] = [adopted[i - 1], adopted[i]];
    if (left && right) requireEqual(left, right, { from: left.from, to: right.to });
  }
  return make(
    tree,
    dimensionless,
    { op: "compare", operators: tree.operators, parts: adopted },
    true,
  );
}

function inferConditional(tree: Kind<"conditional">, context: Context): Typed {
  const test = inferTruth(tree.test, context);
  const yes = inferQuantity(tree.yes, context);
  const no = inferQuantity(tree.no, context);
  const of = requireEqual(yes, no, { from: yes.from, to: no.to });
  return make(tree, of, { op: "choose", test, yes, no });
}

function inferTree(tree: Tree, context: Context): Typed {
  switch (tree.type) {
    case "number":
      return make(tree, dimensionless, { op: "number", value: tree.value });
    case "name":
      return inferName(tree, context);
    case "unary": {
      if (tree.operator === "not") {
        return make(
          tree,
          dimensionless,
          { op: "not", argument: inferTruth(tree.argument, context) },
          true,
        );
      }
      const argument = inferQuantity(tree.argument, context);
      return tree.operator === "+"
        ? argument
        : make(tree, argument.dimension, { op: "negate", argument });
    }
    case "binary":
      return inferBinary(tree, context);
    case "comparison":
      return inferComparison(tree, context);
    case "conditional":
      return inferConditional(tree, context);
    case "call":
      return inferCall(tree, context);
  }
}

function start(scope: Scope): Context {
  return { scope, locals: new Map(), instances: new Map(), read: inferTree };
}

/** The typed form of a quantity. Raises `dimension`, `unknown-name`, `syntax` or `depends`. */
export function infer(tree: Tree, scope: Scope): Typed {
  return inferQuantity(tree, start(scope));
}

/** The typed form of a condition. Raises as `infer` does. */
export function inferCondition(tree: Tree, scope: Scope): Typed {
  return inferTruth(tree, start(scope));
}
