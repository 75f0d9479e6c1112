import fc from "fast-check";

/** A formula made at random, apart from how it is written. */
export type Made =
  | { readonly leaf: string }
  | { readonly op: "+" | "-" | "*" | "/" | "^"; readonly left: Made; readonly right: Made }
  | { readonly sign: "-"; readonly of: Made }
  | { readonly call: string; readonly parts: readonly Made[] };

const leaf = fc
  .constantFrom("x", "y", "z", "1", "2", "0.5", "3", "1.25e-3", "7e2", "pi")
  .map((text): Made => ({ leaf: text }));

const oneArgument = [
  ..."sqrt cbrt exp expm1 log log2 log10 log1p sin cos tan asin acos atan sinh cosh tanh".split(
    " ",
  ),
  ..."asinh acosh atanh abs sign floor ceil round gamma lgamma erf".split(" "),
];
const twoArguments = ["atan2", "hypot", "min", "max"];

/** Formulas of x, y and z, a few levels deep. */
export const formulas: fc.Arbitrary<Made> = fc.letrec<{ made: Made }>((tie) => ({
  made: fc.oneof(
    { depthSize: "small", withCrossShrink: true },
    leaf,
    fc.record({
      op: fc.constantFrom("+", "-", "*", "/", "^" as const),
      left: tie("made"),
      right: tie("made"),
    }) as fc.Arbitrary<Made>,
    fc.record({ sign: fc.constant("-" as const), of: tie("made") }),
    fc.record({ call: fc.constantFrom(...oneArgument), parts: fc.tuple(tie("made")) }),
    fc.record({
      call: fc.constantFrom(...twoArguments),
      parts: fc.tuple(tie("made"), tie("made")),
    }),
  ),
})).made;

const levels = { "+": 1, "-": 1, "*": 2, "/": 2, "^": 4 } as const;

function levelOf(made: Made): number {
  if ("op" in made) return levels[made.op];
  return "sign" in made ? 3 : 5;
}

function held(made: Made, least: number): string {
  return levelOf(made) < least ? `(${written(made)})` : written(made);
}

/** As few brackets as precedence allows: −x² is −(x²), a^b^c is a^(b^c), a − b − c is (a − b) − c. */
export function written(made: Made): string {
  if ("leaf" in made) return made.leaf;
  if ("call" in made) return `${made.call}(${made.parts.map(written).join(", ")})`;
  if ("sign" in made) return `-${held(made.of, 3)}`;
  const level = levels[made.op];
  if (made.op === "^") return `${held(made.left, 5)}^${held(made.right, 3)}`;
  return `${held(made.left, level)} ${made.op} ${held(made.right, level + 1)}`;
}

/** Every bracket written, with blanks between the words. */
export function bracketed(made: Made): string {
  if ("leaf" in made) return made.leaf;
  if ("call" in made) return `${made.call}(${made.parts.map(bracketed).join(", ")})`;
  if ("sign" in made) return `(- ${bracketed(made.of)})`;
  return `(${bracketed(made.left)} ${made.op} ${bracketed(made.right)})`;
}

/** The same in the notation of the platform, as a function of x, y and z. Without calls. */
export function asFunction(made: Made): (x: number, y: number, z: number) => number {
  const text = bracketed(made).replaceAll("^", "**");
  return new Function("x", "y", "z", `return ${text};`) as ReturnType<typeof asFunction>;
}
