import {
  type Constant,
  type Dimension,
  findConstant,
  findUnit,
  type Unit,
  type UnitSystem,
} from "../physics";
import type { Tree } from "./tree";

/** A function the calculation defines: `f(x, y) = …`. */
export interface FunctionDefinition {
  readonly symbol: string;
  readonly parameters: readonly string[];
  readonly body: Tree;
}

/** What a name means in a calculation. */
export type Meaning =
  | {
      readonly kind: "quantity";
      readonly dimension: Dimension;
      /** The value in SI, where it is a given without uncertainty. */
      readonly exact?: number;
    }
  | {
      readonly kind: "function";
      readonly definition: FunctionDefinition;
      /** Differs wherever the definition, or the dimension of anything it uses, differs. */
      readonly identity: string;
    }
  | { readonly kind: "constant"; readonly constant: Constant }
  | { readonly kind: "unit"; readonly unit: Unit }
  | { readonly kind: "number"; readonly value: number }
  /** Defined, but the cell that defines it has a fault. */
  | { readonly kind: "faulty"; readonly cell: string; readonly symbol: string };

/** What the calculation itself defines, by name. */
export type Definitions = (name: string) => Meaning | undefined;

/** Names to look up: first what the calculation defines, then a constant, then a unit. */
export interface Scope {
  readonly system: UnitSystem;
  lookup(name: string): Meaning | undefined;
}

/** The scope of a calculation under an edition and a convention. */
export function makeScope(system: UnitSystem, definitions: Definitions): Scope {
  return { system, lookup: (name) => definitions(name) ?? builtIn(name, system) };
}

/** What a name means when the calculation does not define it. */
export function builtIn(name: string, system: UnitSystem): Meaning | undefined {
  if (name === "pi") return { kind: "number", value: Math.PI };
  const constant = findConstant(name, system);
  if (constant) return { kind: "constant", constant };
  // A typed µ has become the Greek letter's name by now.
  const unit = findUnit(name, system) ?? findUnit(name.replace(/^mu(?=.)/, "µ"), system);
  return unit && { kind: "unit", unit };
}
