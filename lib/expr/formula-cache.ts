import { type CompiledFormula, type CompiledGradient, compile, compileGradient } from "./compile";
import { attempt, type Fault, raise } from "./faults";
import { type Formula, type FormulaWords, inTyped, readFormula, readWords } from "./formula";
import { infer, inferCondition } from "./infer";
import type { Roles } from "./parse";
import { type Exponents, powerLaw } from "./power-law";
import type { Meaning, Scope } from "./scope";
import type { Typed } from "./typed";

type Kept<T> = { ok: true; value: T } | { ok: false; fault: Fault };

/** A formula with its dimensions settled and its kernel made when first asked for. */
export class SettledFormula {
  #kernel: CompiledFormula | undefined;
  #gradient: CompiledGradient | undefined;
  #powerLaw: Exponents | undefined;
  readonly #parts = new Map<Typed, CompiledFormula>();
  constructor(readonly typed: Typed) {}

  /** The kernel with slopes in the inputs of `kernel`. */
  get gradient(): CompiledGradient {
    this.#gradient ??= compileGradient(this.typed, this.kernel.inputs);
    return this.#gradient;
  }

  /** Exact exponents in the inputs, read off the form. */
  get powerLaw(): Exponents {
    this.#powerLaw ??= powerLaw(this.typed);
    return this.#powerLaw;
  }

  get kernel(): CompiledFormula {
    this.#kernel ??= compile(this.typed);
    return this.#kernel;
  }

  /** The kernel of a part of it, such as one side of a comparison. */
  kernelOf(part: Typed): CompiledFormula {
    const known = this.#parts.get(part) ?? compile(part);
    this.#parts.set(part, known);
    return known;
  }
}

/** A map that forgets everything when it is full: simple, and full only after long use. */
class BoundedMap<T> {
  readonly #entries = new Map<string, T>();
  constructor(readonly most: number) {}

  get(key: string, make: () => T): T {
    const known = this.#entries.get(key);
    if (known !== undefined) return known;
    if (this.#entries.size >= this.most) this.#entries.clear();
    const made = make();
    this.#entries.set(key, made);
    return made;
  }
}

function unwrap<T>(kept: Kept<T>): T {
  return kept.ok ? kept.value : raise(kept.fault);
}

/**
 * Formulas already read, settled and compiled. Reading depends on the text and on which of its names
 * are functions or quantities; settling depends further on the dimensions of those names, not on
 * their values, so that a changed value costs neither.
 */
export class FormulaCache {
  readonly #words = new BoundedMap<Kept<FormulaWords>>(20_000);
  readonly #formulas = new BoundedMap<Kept<Formula>>(20_000);
  readonly #settled = new BoundedMap<Kept<SettledFormula>>(20_000);

  readonly #identities = new BoundedMap<string>(20_000);
  #identified = 0;

  /** The words of a typed formula. Raises what `readWords` raises. */
  words(typed: string): FormulaWords {
    return unwrap(this.#words.get(typed, () => attempt(() => readWords(typed))));
  }

  /** The formula, read. Raises what `readFormula` raises. */
  read(typed: string, roles: Roles, parameters: readonly string[] = []): Formula {
    const words = this.words(typed);
    const names = words.body.filter((token) => token.kind === "name");
    const role = (name: string) =>
      roles.quantities.has(name) ? "q" : roles.functions.has(name) ? "f" : "-";
    const roleKey = names.map((token) => role(token.text)).join("");
    const key = `${roleKey}|${parameters.join()}|${typed}`;
    return unwrap(
      this.#formulas.get(key, () => attempt(() => readFormula(words, roles, parameters))),
    );
  }

  /** A short name for a formula together with what its names mean, as far as dimensions go. */
  identify(formula: Formula, scope: Scope): string {
    const key = [
      formula.words.typed,
      ...formula.names.map((n) => keyOf(n, scope.lookup(n), formula)),
    ];
    return this.#identities.get(key.join("\u0000"), () => `#${++this.#identified}`);
  }

  /** The formula with its dimensions settled. Raises what `infer` raises, placed in the typed text. */
  settle(formula: Formula, scope: Scope, as: "quantity" | "condition"): SettledFormula {
    const meanings = formula.names.map((name) => keyOf(name, scope.lookup(name), formula));
    const { edition, em } = scope.system;
    const key = [formula.words.typed, as, edition, em, ...meanings].join("\u0000");
    return unwrap(
      this.#settled.get(key, () =>
        attempt(() => {
          const settled = attempt(() =>
            as === "quantity" ? infer(formula.tree, scope) : inferCondition(formula.tree, scope),
          );
          if (!settled.ok) raise(inTyped(settled.fault, formula.words.normalised));
          return new SettledFormula(settled.value);
        }),
      ),
    );
  }
}

/** What of a name's meaning decides the dimensions of a formula that uses it. */
function keyOf(name: string, meaning: Meaning | undefined, formula: Formula): string {
  if (meaning === undefined) return `${name}?`;
  if (meaning.kind === "quantity") {
    const decides = formula.exponentNames.has(name) && meaning.exact !== undefined;
    return `${name}:${meaning.dimension.key}${decides ? `=${meaning.exact}` : ""}`;
  }
  if (meaning.kind === "function") return `${name}()${meaning.identity}`;
  return meaning.kind === "faulty" ? `${name}!${meaning.cell}` : `${name}.${meaning.kind}`;
}
