import { derivatives } from "./derivatives";
import { findFunction } from "./functions";
import { numberText, powerText } from "./kernel-text";
import { nativeFunctions } from "./kernels";
import { minus, none, over, plus, slopeAt, times } from "./slopes";
import type { FunctionInstance, InputKey, Local, Typed } from "./typed";

type Of<Op extends Typed["op"]> = Extract<Typed, { op: Op }>;
type Pair = Extract<Typed, { left: Typed }>;
type Loop = Extract<Typed, { variable: Local }>;

/** A piece of a kernel: the name that holds its value, and its slope in each lane. */
export interface Emitted {
  readonly value: string;
  readonly slopes: readonly string[];
}

const flat: readonly string[] = [];

/**
 * Writes a typed formula as the text of a kernel: one variable for each step, with its checks, and
 * beside it one for each slope that is not zero. A lane is an input that slopes are taken in; with no
 * lanes only the value is computed.
 */
export class Emitter {
  readonly inputs: InputKey[] = [];
  readonly #locals = new Map<Local, Emitted>();
  readonly #instances = new Map<
    FunctionInstance,
    Map<number, { name: string; outlets: readonly string[] }>
  >();
  readonly #functions: string[] = [];
  #lines: string[] = [];
  #count = 0;
  /** Places are those of the formula; inside a function of the calculation there are none. */
  #placed = true;
  /** Inside an integral or a sum a vanishing product is a vanishing contribution. */
  #mayVanish = false;
  #lanes: number;

  /** `lanes` inputs have slopes: those first in `inputs`. */
  constructor(inputs: readonly InputKey[] = [], lanes = 0) {
    this.inputs.push(...inputs);
    this.#lanes = lanes;
  }

  /** The whole kernel's text: the value is returned, the slopes are left in `g`. */
  program(root: Typed): string {
    const { value, slopes } = this.emit(root);
    const slopeLines = Array.from(
      { length: this.#lanes },
      (_, i) => `g[${i}] = ${slopeAt(slopes, i)};`,
    );
    const lines = [...this.#functions, ...this.#lines, ...slopeLines, `return +${value};`];
    return `"use strict";\n${lines.join("\n")}`;
  }

  emit(node: Typed): Emitted {
    switch (node.op) {
      case "number":
        return { value: numberText(node.value), slopes: flat };
      case "input":
        return this.#input(node.key);
      case "local":
        return this.#locals.get(node.local) ?? { value: "NaN", slopes: flat };
      case "negate": {
        const part = this.emit(node.argument);
        return this.#held(`-${part.value}`, (lane) => minus(none, slopeAt(part.slopes, lane)));
      }
      case "not":
        return this.#held(`!${this.emit(node.argument).value}`);
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
        return this.#choice(node);
      case "call":
        return this.#call(node);
      case "apply":
        return this.#application(node);
      case "integrate":
      case "sum":
        return this.#series(node);
      case "root":
        return this.#root(node);
    }
  }

  #name(prefix: string): string {
    this.#count += 1;
    return `${prefix}${this.#count}`;
  }

  #place(node: Typed): string {
    return this.#placed ? `${node.from}, ${node.to}` : "-1, -1";
  }

  #input(key: InputKey): Emitted {
    const known = this.inputs.indexOf(key);
    const index = known >= 0 ? known : this.inputs.push(key) - 1;
    const slopes =
      index < this.#lanes
        ? Array.from({ length: index + 1 }, (_, i) => (i === index ? "1" : none))
        : flat;
    return { value: `v[${index}]`, slopes };
  }

  #variable(prefix: string, code: string): string {
    const name = this.#name(prefix);
    this.#lines.push(`const ${name} = ${code};`);
    return name;
  }

  /** A slope in a variable of its own, unless it is short. */
  #slope(code: string): string {
    return /^-?[\w.[\]]+$/.test(code) ? code : this.#variable("s", code);
  }

  #slopes(of: (lane: number) => string): string[] {
    return Array.from({ length: this.#lanes }, (_, lane) => this.#slope(of(lane)));
  }

  /** A new variable that holds `code`, checked where it is not finite or (often) zero. */
  #held(
    code: string,
    slope?: (lane: number, value: string) => string,
    check?: (name: string) => string,
  ): Emitted {
    const value = this.#variable("t", code);
    if (check) this.#lines.push(check(value));
    return { value, slopes: slope ? this.#slopes((lane) => slope(lane, value)) : flat };
  }

  #sum(node: Pair): Emitted {
    const [a, b] = [this.emit(node.left), this.emit(node.right)];
    const [sign, combine] = node.op === "add" ? (["+", plus] as const) : (["-", minus] as const);
    return this.#held(
      `${a.value} ${sign} ${b.value}`,
      (lane) => combine(slopeAt(a.slopes, lane), slopeAt(b.slopes, lane)),
      (t) => `if (${t} - ${t} !== 0) $.result(${t}, "", ${this.#place(node)});`,
    );
  }

  #suspect(name: string): string {
    return this.#mayVanish ? `${name} - ${name} !== 0` : `${name} - ${name} !== 0 || ${name} === 0`;
  }

  #product(node: Pair): Emitted {
    const [a, b] = [this.emit(node.left), this.emit(node.right)];
    const isProduct = node.op === "multiply";
    const slope = (lane: number, t: string) => {
      const [da, db] = [slopeAt(a.slopes, lane), slopeAt(b.slopes, lane)];
      if (isProduct) return plus(times(da, b.value), times(a.value, db));
      return over(minus(da, times(t, db)), b.value);
    };
    return this.#held(
      `${a.value} ${isProduct ? "*" : "/"} ${b.value}`,
      slope,
      (t) =>
        `if (${this.#suspect(t)}) $.${isProduct ? "product" : "quotient"}(${t}, ${a.value}, ${b.value}, ${this.#place(node)});`,
    );
  }

  #power(node: Pair): Emitted {
    const exponent = node.right.op === "number" ? node.right.value : undefined;
    const [a, b] = [this.emit(node.left), this.emit(node.right)];
    const slope = (lane: number, t: string) => {
      const [da, db] = [slopeAt(a.slopes, lane), slopeAt(b.slopes, lane)];
      const byBase = times(`${b.value} * Math.pow(${a.value}, ${b.value} - 1)`, da);
      return plus(byBase, times(`${t} * Math.log(${a.value})`, db));
    };
    return this.#held(
      powerText(a.value, b.value, exponent),
      slope,
      (t) =>
        `if (${this.#suspect(t)}) $.power(${t}, ${a.value}, ${b.value}, ${this.#place(node)});`,
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

  #choice(node: Of<"choose">): Emitted {
    const condition = this.emit(node.test).value;
    const value = this.#name("t");
    const slopes = Array.from({ length: this.#lanes }, () => this.#name("s"));
    const branch = (part: Typed) =>
      this.#block(() => {
        const taken = this.emit(part);
        const lines = slopes.map((name, lane) => `${name} = ${slopeAt(taken.slopes, lane)};`);
        return [`${value} = ${taken.value};`, ...lines].join(" ");
      });
    const [yes, no] = [branch(node.yes), branch(node.no)];
    this.#lines.push(
      `let ${[value, ...slopes].join(", ")};`,
      `if (${condition}) ${yes} else ${no}`,
    );
    return { value, slopes };
  }

  #connective(node: Pair): Emitted {
    const value = this.#name("t");
    this.#lines.push(`let ${value} = ${this.emit(node.left).value};`);
    const rest = this.#block(() => `${value} = ${this.emit(node.right).value};`);
    this.#lines.push(`if (${node.op === "and" ? value : `!${value}`}) ${rest}`);
    return { value, slopes: flat };
  }

  #comparison(node: Of<"compare">): Emitted {
    const values = node.parts.map((part) => this.emit(part).value);
    const tests = node.operators.map((operator, i) => {
      const [a, b] = [values[i], values[i + 1]];
      if (operator === "<") return `$.less(${a}, ${b})`;
      if (operator === ">") return `$.less(${b}, ${a})`;
      if (operator === "<=") return `!$.less(${b}, ${a})`;
      if (operator === ">=") return `!$.less(${a}, ${b})`;
      return `${operator === "==" ? "" : "!"}$.equal(${a}, ${b})`;
    });
    return this.#held(tests.join(" && "));
  }

  #call(node: Of<"call">): Emitted {
    const parts = node.parts.map((part) => this.emit(part));
    const values = parts.map((part) => part.value);
    const cost = findFunction(node.name)?.cost;
    if (cost) this.#lines.push(`$.spend(${cost});`);
    const callee = nativeFunctions.has(node.name) ? `Math.${node.name}` : `k.${node.name}`;
    const slope = (lane: number, t: string) => {
      const slopes = parts.map((part) => slopeAt(part.slopes, lane));
      if (slopes.every((one) => one === none)) return none;
      const partials = derivatives[node.name]?.(values, t) ?? values.map(() => "NaN");
      return partials.map((partial, i) => times(partial, slopes[i] ?? none)).reduce(plus, none);
    };
    return this.#held(
      `${callee}(${values.join(", ")})`,
      slope,
      (t) => `if (${t} - ${t} !== 0) $.result(${t}, "${node.name}", ${this.#place(node)});`,
    );
  }

  /** Names under which a function leaves its slopes. */
  #outlets(): string[] {
    const names = Array.from({ length: this.#lanes }, () => this.#name("o"));
    if (names.length > 0) this.#functions.push(`let ${names.join(", ")};`);
    return names;
  }

  /**
   * A function of locals as text, which counts a step at each call, returns its value and leaves its
   * slopes in `outlets`.
   */
  #lambda(
    name: string,
    parameters: readonly (readonly [Local, Emitted])[],
    body: Typed,
    outlets: readonly string[],
  ): string {
    for (const [local, emitted] of parameters) this.#locals.set(local, emitted);
    const block = this.#block(() => {
      this.#lines.push("$.spend(1);");
      const { value, slopes } = this.emit(body);
      const lines = outlets.map((outlet, lane) => `${outlet} = ${slopeAt(slopes, lane)};`);
      return `${lines.join(" ")} return ${value};`;
    });
    const names = parameters.flatMap(([, { value, slopes }]) => [value, ...slopes]);
    return `const ${name} = (${names.join(", ")}) => ${block};`;
  }

  #application(node: Of<"apply">): Emitted {
    const parts = node.parts.map((part) => this.emit(part));
    const { name, outlets } = this.#instance(node.instance);
    const all = Array.from({ length: this.#lanes }, (_, lane) => lane);
    const given = parts.flatMap(({ value, slopes }) => [
      value,
      ...all.map((lane) => slopeAt(slopes, lane)),
    ]);
    const value = this.#variable("t", `${name}(${given.join(", ")})`);
    // Copied at once: the next call of the function leaves others there.
    return { value, slopes: outlets.map((outlet) => this.#variable("s", outlet)) };
  }

  #instance(instance: FunctionInstance): { name: string; outlets: readonly string[] } {
    const byLanes = this.#instances.get(instance) ?? new Map();
    this.#instances.set(instance, byLanes);
    const known = byLanes.get(this.#lanes);
    if (known) return known;
    const made = { name: this.#name("f"), outlets: this.#outlets() };
    byLanes.set(this.#lanes, made);
    const parameters = instance.parameters.map((local) => [local, this.#parameter(true)] as const);
    const [placed, mayVanish] = [this.#placed, this.#mayVanish];
    [this.#placed, this.#mayVanish] = [false, false];
    const text = this.#lambda(made.name, parameters, instance.body, made.outlets);
    [this.#placed, this.#mayVanish] = [placed, mayVanish];
    this.#functions.push(text);
    return made;
  }

  #parameter(withSlopes: boolean): Emitted {
    const slopes = withSlopes ? Array.from({ length: this.#lanes }, () => this.#name("d")) : flat;
    return { value: this.#name("p"), slopes };
  }

  /** Run `build` with another number of lanes. */
  #withLanes<T>(lanes: number, build: () => T): T {
    const outer = this.#lanes;
    this.#lanes = lanes;
    const built = build();
    this.#lanes = outer;
    return built;
  }

  /** The body of a loop as a function of its variable: the value, or the slope of one lane. */
  #body(node: Loop, lane?: number): string | undefined {
    const name = this.#name("b");
    const outer = this.#mayVanish;
    this.#mayVanish = node.op !== "root";
    const variable = this.#parameter(false);
    this.#locals.set(node.variable, variable);
    let isFlat = false;
    const block = this.#block(() => {
      this.#lines.push("$.spend(1);");
      if (lane === undefined) {
        return `return ${this.#withLanes(0, () => this.emit(node.body)).value};`;
      }
      const slope = slopeAt(this.emit(node.body).slopes, lane);
      isFlat = slope === none;
      return `return ${slope};`;
    });
    this.#mayVanish = outer;
    if (isFlat) return undefined;
    this.#lines.push(`const ${name} = (${variable.value}) => ${block};`);
    return name;
  }

  /** Integrals and sums: slopes go under the sign, and the limits of an integral bring their own. */
  #series(node: Loop): Emitted {
    const [lower, upper] = [this.emit(node.lower), this.emit(node.upper)];
    const body = this.#body(node);
    const over = (f: string) =>
      `$.${node.op}(${f}, ${lower.value}, ${upper.value}, ${this.#place(node)})`;
    const value = this.#variable("t", over(body ?? "NaN"));
    const slopes = Array.from({ length: this.#lanes }, (_, lane) => {
      const inside = this.#body(node, lane);
      const within = inside === undefined ? none : over(inside);
      if (node.op === "sum") return this.#slope(within);
      const ends = minus(
        times(slopeAt(upper.slopes, lane), `${body}(${upper.value})`),
        times(slopeAt(lower.slopes, lane), `${body}(${lower.value})`),
      );
      return this.#slope(plus(within, ends));
    });
    return { value, slopes };
  }

  /** A root x(θ) of f(x, θ): its slope is −(∂f/∂θ)/(∂f/∂x), with one more lane for x. */
  #root(node: Loop): Emitted {
    const [lower, upper] = [this.emit(node.lower), this.emit(node.upper)];
    const body = this.#body(node);
    const value = this.#variable(
      "t",
      `$.root(${body}, ${lower.value}, ${upper.value}, ${this.#place(node)})`,
    );
    const lanes = this.#lanes;
    if (lanes === 0) return { value, slopes: flat };
    const slopes = this.#withLanes(lanes + 1, () => {
      const along = Array.from({ length: lanes + 1 }, (_, lane) => (lane === lanes ? "1" : none));
      this.#locals.set(node.variable, { value, slopes: along });
      const { slopes: partials } = this.emit(node.body);
      const byVariable = this.#slope(slopeAt(partials, lanes));
      return Array.from({ length: lanes }, (_, lane) =>
        this.#slope(minus(none, over(slopeAt(partials, lane), byVariable))),
      );
    });
    return { value, slopes };
  }
}
