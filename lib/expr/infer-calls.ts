import Fraction from "fraction.js";
import { dimensionless, multiplyDimensions, powerDimension, toGaussian, toSi } from "../physics";
import { FaultSignal, raise } from "./faults";
import { type DimensionRule, type FunctionEntry, findFunction } from "./functions";
import {
  adoptZero,
  type Context,
  inferPure,
  inferQuantity,
  type Kind,
  make,
  placeOf,
  requireEqual,
} from "./infer-context";
import { rationalOf } from "./rational";
import type { FunctionDefinition } from "./scope";
import type { FunctionInstance, Local, Typed } from "./typed";

function requireArity(
  tree: Kind<"call">,
  [fewest, most]: readonly [number, number],
  signature: string,
) {
  if (tree.parts.length >= fewest && tree.parts.length <= most) return;
  raise({
    code: "syntax",
    reason: "arity",
    ...placeOf(tree),
    with: { signature, found: String(tree.parts.length) },
  });
}

/** The degree of a root as a rational, so that dimensions stay exact. */
function rootDegree(tree: Kind<"call">, context: Context, degree: number | undefined): Fraction {
  if (degree !== undefined) return new Fraction(degree);
  const second = tree.parts[1];
  const found = second && rationalOf(second, context.scope);
  if (!found || found.n === 0n) {
    raise({ code: "dimension", reason: "root-degree", ...placeOf(second ?? tree) });
  }
  return found;
}

type RuleOf<R extends DimensionRule["rule"]> = Extract<DimensionRule, { rule: R }>;

function inferRoot(tree: Kind<"call">, context: Context, rule: RuleOf<"root">): Typed {
  const parts = tree.parts.map((part, i) =>
    i === 0 ? inferQuantity(part, context) : inferPure(part, context, tree.name),
  );
  const degree = rootDegree(tree, context, rule.degree);
  const of = powerDimension(parts[0]?.dimension ?? dimensionless, degree.inverse());
  // What decides a dimension is a number from here on, as the exponent of a power is.
  const fixed = parts.map((part, i) =>
    i === 0 ? part : make(part, dimensionless, { op: "number", value: degree.valueOf() }),
  );
  return make(tree, of, { op: "call", name: tree.name, parts: fixed });
}

function inferSame(tree: Kind<"call">, context: Context): readonly Typed[] {
  const parts = tree.parts.map((part) => inferQuantity(part, context));
  const reference = parts.find((part) => part.dimension !== dimensionless) ?? parts[0];
  const adopted = parts.map((part) =>
    reference && (tree.name === "min" || tree.name === "max") ? adoptZero(part, reference) : part,
  );
  const [first, ...others] = adopted;
  for (const other of others)
    if (first) requireEqual(first, other, { from: first.from, to: other.to });
  return adopted;
}

function inferFixed(tree: Kind<"call">, context: Context, rule: RuleOf<"fixed">): Typed {
  const parts = tree.parts.map((part, index) => {
    const typed = inferQuantity(part, context);
    const expected = rule.takes[index] ?? dimensionless;
    if (typed.dimension !== expected) {
      raise({
        code: "dimension",
        reason: "argument",
        ...placeOf(part),
        with: { of: tree.name, found: typed.dimension, expected },
      });
    }
    return typed;
  });
  return make(tree, rule.gives, { op: "call", name: tree.name, parts });
}

/** A conversion between conventions is a known factor and another dimension. */
function inferConversion(tree: Kind<"call">, context: Context, rule: RuleOf<"convert">): Typed {
  const part = tree.parts[0];
  if (!part) return raise({ code: "syntax", reason: "empty", ...placeOf(tree) });
  const typed = inferQuantity(part, context);
  const row = rule.to === "gaussian" ? toGaussian(typed.dimension) : toSi(typed.dimension);
  if (!row) {
    raise({
      code: "dimension",
      reason: "not-electromagnetic",
      ...placeOf(part),
      with: { of: tree.name, found: typed.dimension },
    });
  }
  const factor = make(tree, dimensionless, { op: "number", value: row.factor });
  return make(tree, row.dimension, { op: "multiply", left: factor, right: typed });
}

/** `integrate`, `sum` and `root`: the second argument is a name of its own inside the first. */
function inferBinding(tree: Kind<"call">, context: Context): Typed {
  const [expression, name, from, to] = tree.parts;
  if (!expression || !from || !to || name?.type !== "name") {
    raise({
      code: "syntax",
      reason: "bound-name",
      ...placeOf(name ?? tree),
      with: { of: tree.name },
    });
  }
  const lower = inferQuantity(from, context);
  const upper = inferQuantity(to, context);
  const of = requireEqual(lower, upper, { from: lower.from, to: upper.to });
  const op = tree.name as "integrate" | "sum" | "root";
  if (op === "sum" && of !== dimensionless) inferPure(from, context, "sum");
  const variable: Local = { name: name.name, dimension: of };
  const locals = new Map(context.locals).set(name.name, variable);
  const body = inferQuantity(expression, { ...context, locals });
  const result = {
    integrate: () => multiplyDimensions(body.dimension, of),
    sum: () => body.dimension,
    root: () => of,
  }[op]();
  return make(tree, result, { op, variable, body, lower, upper });
}

function inferEntry(tree: Kind<"call">, context: Context, entry: FunctionEntry): Typed {
  requireArity(tree, entry.arity, entry.signature);
  const rule = entry.dimensions;
  switch (rule.rule) {
    case "root":
      return inferRoot(tree, context, rule);
    case "fixed":
      return inferFixed(tree, context, rule);
    case "convert":
      return inferConversion(tree, context, rule);
    case "binding":
      return inferBinding(tree, context);
    case "same":
    case "ratio": {
      const parts = inferSame(tree, context);
      const of = rule.rule === "same" ? (parts[0]?.dimension ?? dimensionless) : dimensionless;
      return make(tree, of, { op: "call", name: tree.name, parts });
    }
    case "sign":
    case "pure": {
      const read = rule.rule === "sign" ? inferQuantity : inferPure;
      const parts = tree.parts.map((part) => read(part, context, tree.name));
      return make(tree, dimensionless, { op: "call", name: tree.name, parts });
    }
  }
}

function instanceOf(
  definition: FunctionDefinition,
  parts: readonly Typed[],
  context: Context,
): FunctionInstance {
  const key = `${definition.symbol}(${parts.map((part) => part.dimension.key).join(";")})`;
  const known = context.instances.get(key);
  if (known) return known;
  const parameters = definition.parameters.map((name, i) => ({
    name,
    dimension: parts[i]?.dimension ?? dimensionless,
  }));
  const locals = new Map(parameters.map((local) => [local.name, local]));
  const body = inferQuantity(definition.body, { ...context, locals });
  const instance = { name: definition.symbol, parameters, body };
  context.instances.set(key, instance);
  return instance;
}

/** A fault in the body of a function is told where the function is called. */
function atCall<T>(tree: Kind<"call">, walk: () => T): T {
  try {
    return walk();
  } catch (error) {
    if (!(error instanceof FaultSignal)) throw error;
    const { fault } = error;
    raise({
      code: fault.code,
      reason: "in-function",
      ...placeOf(tree),
      with: { name: tree.name },
      inner: fault,
    });
  }
}

function inferApplication(
  tree: Kind<"call">,
  context: Context,
  definition: FunctionDefinition,
): Typed {
  const count = definition.parameters.length;
  const signature = `${definition.symbol}(${definition.parameters.join(", ")})`;
  requireArity(tree, [count, count], signature);
  const parts = tree.parts.map((part) => inferQuantity(part, context));
  const instance = atCall(tree, () => instanceOf(definition, parts, context));
  return make(tree, instance.body.dimension, { op: "apply", instance, parts });
}

/** A call: of a function the calculation defines, or of the language. */
export function inferCall(tree: Kind<"call">, context: Context): Typed {
  const meaning = context.locals.has(tree.name) ? undefined : context.scope.lookup(tree.name);
  if (meaning?.kind === "function") return inferApplication(tree, context, meaning.definition);
  if (meaning?.kind === "faulty") {
    const place = { from: tree.from, to: tree.nameTo };
    const { symbol, cell } = meaning;
    raise({ code: "depends", reason: "depends", ...place, with: { symbol, cell } });
  }
  const entry = findFunction(tree.name);
  if (entry) return inferEntry(tree, context, entry);
  return raise({
    code: "unknown-name",
    reason: "unknown-function",
    from: tree.from,
    to: tree.nameTo,
    with: { name: tree.name },
  });
}
