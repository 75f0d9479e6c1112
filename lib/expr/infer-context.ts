import { type Dimension, dimension, dimensionless, divideDimensions } from "../physics";
import { raise } from "./faults";
import type { Scope } from "./scope";
import type { Place, Tree } from "./tree";
import type { FunctionInstance, Local, Typed, TypedForm } from "./typed";

/** What the steps of inference share. */
export interface Context {
  readonly scope: Scope;
  readonly locals: ReadonlyMap<string, Local>;
  /** Instances of the calculation's functions already made, by name and dimensions. */
  readonly instances: Map<string, FunctionInstance>;
  /** Infers any node; carried here so that the files of inference need not import each other. */
  readonly read: (tree: Tree, context: Context) => Typed;
}

export type Kind<T extends Tree["type"]> = Extract<Tree, { type: T }>;

/** A typed node at a place. */
export function make(place: Place, of: Dimension, form: TypedForm, truth = false): Typed {
  return { from: place.from, to: place.to, dimension: of, truth, ...form } as Typed;
}

const massParameter = dimension({ length: 3, time: -2 });
const gravitation = dimension({ length: 3, mass: -1, time: -2 });

/** A body mass is its nominal GM over the edition's G, so that G's uncertainty can cancel. */
export function nominalMass(place: Place, nominalGM: number): Typed {
  return make(place, divideDimensions(massParameter, gravitation), {
    op: "divide",
    left: make(place, massParameter, { op: "number", value: nominalGM }),
    right: make(place, gravitation, { op: "input", key: "constant:G" }),
  });
}

/** Only the place of a node. */
export function placeOf({ from, to }: Place): Place {
  return { from, to };
}

/** A node that must be a quantity, not a condition. */
export function inferQuantity(tree: Tree, context: Context): Typed {
  const typed = context.read(tree, context);
  if (typed.truth) raise({ code: "syntax", reason: "condition-as-number", ...placeOf(tree) });
  return typed;
}

/** A node that must be a condition. */
export function inferTruth(tree: Tree, context: Context): Typed {
  const typed = context.read(tree, context);
  if (!typed.truth) raise({ code: "syntax", reason: "number-as-condition", ...placeOf(tree) });
  return typed;
}

/** A quantity that must be dimensionless; `of` says whose argument it is. */
export function inferPure(tree: Tree, context: Context, of: string): Typed {
  const typed = inferQuantity(tree, context);
  if (typed.dimension !== dimensionless) {
    raise({
      code: "dimension",
      reason: "not-dimensionless",
      ...placeOf(tree),
      with: { of, found: typed.dimension },
    });
  }
  return typed;
}

/** The dimension that two nodes share; raises `dimension` where they differ. */
export function requireEqual(left: Typed, right: Typed, place: Place): Dimension {
  if (left.dimension !== right.dimension) {
    raise({
      code: "dimension",
      reason: "differ",
      ...placeOf(place),
      with: { left: left.dimension, right: right.dimension },
    });
  }
  return left.dimension;
}

/** A bare 0 is zero of any dimension, where it is only compared. */
export function adoptZero(part: Typed, other: Typed): Typed {
  const isZero = part.op === "number" && part.value === 0 && part.dimension === dimensionless;
  return isZero ? { ...part, dimension: other.dimension } : part;
}
