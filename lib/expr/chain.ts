import type { CompiledFormula } from "./compile";
import { attempt, raise } from "./faults";
import type { EvaluationContext } from "./kinds/kind";
import { freeNames } from "./tree";

/** A symbol as a function of one given: the kernels between the two, in order. */
export interface Chain {
  /** Values in SI of the targets for one value in SI of the given; null where there is none. */
  at(x: number): (number | null)[];
}

interface Link {
  readonly slot: number;
  readonly kernel: CompiledFormula;
  /** Where each input is read: a slot of the chain, or a value that stays. */
  readonly inputs: readonly (number | { readonly fixed: number })[];
}

class ChainBuilder {
  readonly slots = new Map<string, number>();
  readonly links: Link[] = [];
  readonly #dependent = new Map<string, boolean>();

  constructor(
    readonly given: string,
    readonly context: EvaluationContext,
  ) {
    this.slots.set(given, 0);
  }

  /** Whether a symbol depends on the given. */
  depends(symbol: string): boolean {
    if (symbol === this.given) return true;
    const known = this.#dependent.get(symbol);
    if (known !== undefined) return known;
    this.#dependent.set(symbol, false);
    const names = this.context.formulaOf(symbol)?.names ?? [];
    const found = names.some((name) => this.depends(name) || this.#functionDepends(name));
    this.#dependent.set(symbol, found);
    return found;
  }

  /** A function of the calculation may read the given inside its body. */
  #functionDepends(name: string): boolean {
    const meaning = this.context.scope.lookup(name);
    if (meaning?.kind !== "function") return false;
    const { parameters, body } = meaning.definition;
    return [...freeNames(body, new Set(parameters))].some(
      (inner) => this.depends(inner) || this.#functionDepends(inner),
    );
  }

  /** The slot of a symbol, with the links that fill it; undefined where it does not depend. */
  slotOf(symbol: string): number | undefined {
    const known = this.slots.get(symbol);
    if (known !== undefined) return known;
    const formula = this.context.formulaOf(symbol);
    if (!formula || !this.depends(symbol)) return undefined;
    if (formula.exponentNames.has(this.given)) {
      raise({ code: "dimension", reason: "decides-dimension", with: { symbol: this.given } });
    }
    const { kernel } = this.context.formulas.settle(formula, this.context.scope, "quantity");
    const inputs = kernel.inputs.map((key) => {
      const name = key.startsWith("symbol:") ? key.slice("symbol:".length) : undefined;
      const slot = name === undefined ? undefined : this.slotOf(name);
      return slot ?? { fixed: this.context.value(key) };
    });
    const slot = this.slots.size;
    this.slots.set(symbol, slot);
    this.links.push({ slot, kernel, inputs });
    return slot;
  }
}

/**
 * The chain from a given to some relations. Points where a kernel has no value give null; running out
 * of steps ends the whole chain. Raises `dimension` where the given decides a dimension.
 */
export function chainFrom(
  given: string,
  targets: readonly string[],
  context: EvaluationContext,
): Chain {
  const builder = new ChainBuilder(given, context);
  const places = targets.map((target) => {
    const slot = builder.slotOf(target);
    return slot === undefined ? { fixed: context.value(`symbol:${target}`) } : slot;
  });
  const values: (number | null)[] = new Array(builder.slots.size).fill(null);
  const read = (place: number | { readonly fixed: number }) =>
    typeof place === "number" ? (values[place] ?? null) : place.fixed;
  return {
    at: (x) => {
      values[0] = x;
      for (const { slot, kernel, inputs } of builder.links) {
        const numbers = inputs.map(read);
        values[slot] = numbers.includes(null)
          ? null
          : runOrNull(kernel, numbers as number[], context);
      }
      return places.map(read);
    },
  };
}

function runOrNull(
  kernel: CompiledFormula,
  inputs: number[],
  context: EvaluationContext,
): number | null {
  const result = attempt(() => kernel.run(inputs, context.runtime));
  if (result.ok) return result.value;
  return result.fault.code === "limit" ? raise(result.fault) : null;
}

/** Whether a symbol changes with a given. */
export function dependsOn(symbol: string, given: string, context: EvaluationContext): boolean {
  return new ChainBuilder(given, context).depends(symbol);
}
