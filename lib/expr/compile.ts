import { findFunction } from "./functions";
import { kernels, nativeFunctions } from "./kernels";
import type { Runtime } from "./runtime";
import type { FunctionInstance, InputKey, Local, Typed } from "./typed";

/**
 * A typed formula as one numeric function. The kernel carries no units: they were settled by
 * `infer`. Its text is made only of numbers, counters and names of kernels, never of anything typed.
 */
export interface CompiledFormula {
  /** What the kernel reads, in the order of its values. */
  readonly inputs: readonly InputKey[];
  /** The value in SI, or 1 and 0 for a condition. Raises `domain`, `overflow`, `limit`, `no-solution`. */
  readonly run: (values: ArrayLike<number>, runtime: Runtime) => number;
}

type Of<Op extends Typed["op"]> = Extract<Typed, { op: Op }>;
type Pair = Extract<Typed, { left: Typed }>;

class Emitter {
  readonly inputs: InputKey[] = [];
  readonly #locals = new Map<Local, string>();
  readonly #instances = new Map<FunctionInstance, string>();
  readonly #functions: string[] = [];
  #lines: string[] = [];
  #count = 0;
  /** Places are those of the formula; inside a function of the calculation there are none. */
  #placed = true;
  /** Inside an integral or a sum a vanishing product is a vanishing contribution. */
  #mayVanish = false;

  /** The whole kernel's text. */
  program(root: Typed): string {
    const result = this.emit(root);
    const lines = [...this.#functions, ...this.#lines, `return +${result};`];
    return `"use strict";\n${lines.join("\n")}`;
  }

  #name(prefix: string): string {
    this.#count += 1;
    return `${prefix}${this.#count}`;
  }

  #place(node: Typed): string {
    return this.#placed ? `${node.from}, ${node.to}` : "-1, -1";
  }

  #input(key: InputKey): string {
    const known = this.inputs.indexOf(key);
    const index = known >= 0 ? known : this.inputs.push(key) - 1;
    return `v[${index}]`;
  }

  /** A new variable that holds `code`, checked by `check` where it is not finite or (often) zero. */
  #hold(code: string, check?: (name: string) => string): string {
    const name = this.#name("t");
    this.#lines.push(`const ${name} = ${code};`);
    if (check) this.#lines.push(check(name));
    return name;
  }

  emit(node: Typed): string {
    switch (node.op) {
      case "number":
        return node.value < 0 || Object.is(node.value, -0) ? `(${node.value})` : String(node.value);
      case "input":
        return this.#input(node.key);
      case "local":
        return this.#locals.get(node.local) ?? "NaN";
      case "negate":
        return this.#hold(`-${this.emit(node.argument)}`);
      case "not":
        return this.#hold(`!${this.emit(node.argument)}`);
      case "add":
      case "subtract":
        return this.#sum(node);
      case "multiply":
      case "divide":
        return this.#product(node);
      case "power":
        return this.#power(node);
      case "and":
      case "or":
        return this.#connective(node);
      case "compare":
        return this.#comparison(node);
      case "choose":
        return this.#choice(node.test, node.yes, node.no);
      case "call":
        return this.#call(node);
      case "apply":
        return this.#application(node);
      case "integrate":
      case "sum":
      case "root":
        return this.#loop(node);
    }
  }

  #sum(node: Pair): string {
    const [a, b] = [this.emit(node.left), this.emit(node.right)];
    const sign = node.op === "add" ? "+" : "-";
    const check = (t: string) => `if (${t} - ${t} !== 0) $.result(${t}, "", ${this.#place(node)});`;
    return this.#hold(`${a} ${sign} ${b}`, check);
  }

  #suspect(name: string): string {
    return this.#mayVanish ? `${name} - ${name} !== 0` : `${name} - ${name} !== 0 || ${name} === 0`;
  }

  #product(node: Pair): string {
    const [a, b] = [this.emit(node.left), this.emit(node.right)];
    const [sign, check] = node.op === "multiply" ? ["*", "product"] : ["/", "quotient"];
    return this.#hold(
      `${a} ${sign} ${b}`,
      (t) => `if (${this.#suspect(t)}) $.${check}(${t}, ${a}, ${b}, ${this.#place(node)});`,
    );
  }

  #power(node: Pair): string {
    const a = this.emit(node.left);
    const exponent = node.right.op === "number" ? node.right.value : undefined;
    const b = this.emit(node.right);
    const code =
      exponent === 2
        ? `${a} * ${a}`
        : exponent === 3
          ? `${a} * ${a} * ${a}`
          : `Math.pow(${a}, ${b})`;
    return this.#hold(
      code,
      (t) => `if (${this.#suspect(t)}) $.power(${t}, ${a}, ${b}, ${this.#place(node)});`,
    );
  }

  /** Lines of `build` inside a block, so that an untaken branch is not evaluated. */
  #block(build: () => string): string {
    const outer = this.#lines;
    this.#lines = [];
    const last = build();
    const text = `{ ${this.#lines.join(" ")} ${last} }`;
    this.#lines = outer;
    return text;
  }

  #choice(test: Typed, yes: Typed, no: Typed): string {
    const condition = this.emit(test);
    const name = this.#name("t");
    const [first, second] = [yes, no].map((part) =>
      this.#block(() => `${name} = ${this.emit(part)};`),
    );
    this.#lines.push(`let ${name};`, `if (${condition}) ${first} else ${second}`);
    return name;
  }

  #connective(node: Pair): string {
    const name = this.#name("t");
    this.#lines.push(`let ${name} = ${this.emit(node.left)};`);
    const rest = this.#block(() => `${name} = ${this.emit(node.right)};`);
    this.#lines.push(`if (${node.op === "and" ? name : `!${name}`}) ${rest}`);
    return name;
  }

  #comparison(node: Of<"compare">): string {
    const values = node.parts.map((part) => this.emit(part));
    const tests = node.operators.map((operator, i) => {
      const [a, b] = [values[i], values[i + 1]];
      if (operator === "<") return `$.less(${a}, ${b})`;
      if (operator === ">") return `$.less(${b}, ${a})`;
      if (operator === "<=") return `!$.less(${b}, ${a})`;
      if (operator === ">=") return `!$.less(${a}, ${b})`;
      return `${operator === "==" ? "" : "!"}$.equal(${a}, ${b})`;
    });
    return this.#hold(tests.join(" && "));
  }

  #call(node: Of<"call">): string {
    const parts = node.parts.map((part) => this.emit(part)).join(", ");
    const cost = findFunction(node.name)?.cost;
    if (cost) this.#lines.push(`$.spend(${cost});`);
    const callee = nativeFunctions.has(node.name) ? `Math.${node.name}` : `k.${node.name}`;
    return this.#hold(
      `${callee}(${parts})`,
      (t) => `if (${t} - ${t} !== 0) $.result(${t}, "${node.name}", ${this.#place(node)});`,
    );
  }

  /** A function of one or more locals, as text; counts a step at each call. */
  #lambda(name: string, locals: readonly Local[], body: Typed): string {
    const parameters = locals.map((local) => {
      const parameter = this.#name("p");
      this.#locals.set(local, parameter);
      return parameter;
    });
    const block = this.#block(() => {
      this.#lines.push("$.spend(1);");
      return `return ${this.emit(body)};`;
    });
    return `const ${name} = (${parameters.join(", ")}) => ${block};`;
  }

  #application(node: Of<"apply">): string {
    const parts = node.parts.map((part) => this.emit(part)).join(", ");
    return this.#hold(`${this.#instance(node.instance)}(${parts})`);
  }

  #instance(instance: FunctionInstance): string {
    const known = this.#instances.get(instance);
    if (known) return known;
    const name = this.#name("f");
    this.#instances.set(instance, name);
    const [placed, mayVanish] = [this.#placed, this.#mayVanish];
    [this.#placed, this.#mayVanish] = [false, false];
    const text = this.#lambda(name, instance.parameters, instance.body);
    [this.#placed, this.#mayVanish] = [placed, mayVanish];
    this.#functions.push(text);
    return name;
  }

  #loop(node: Of<"integrate" | "sum" | "root">): string {
    const [lower, upper] = [this.emit(node.lower), this.emit(node.upper)];
    const name = this.#name("b");
    const mayVanish = this.#mayVanish;
    this.#mayVanish = node.op !== "root";
    this.#lines.push(this.#lambda(name, [node.variable], node.body));
    this.#mayVanish = mayVanish;
    return this.#hold(`$.${node.op}(${name}, ${lower}, ${upper}, ${this.#place(node)})`);
  }
}

/** The kernel of a typed formula. */
export function compile(typed: Typed): CompiledFormula {
  const emitter = new Emitter();
  const text = emitter.program(typed);
  // The text holds numbers and counters only: see Emitter.
  const run = new Function("k", "v", "$", text) as (
    k: typeof kernels,
    values: ArrayLike<number>,
    runtime: Runtime,
  ) => number;
  return { inputs: emitter.inputs, run: (values, runtime) => run(kernels, values, runtime) };
}
