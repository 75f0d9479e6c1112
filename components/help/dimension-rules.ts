import type { FunctionEntry } from "@/lib/expr/functions";
import { dimensionName, formatDimension } from "@/lib/physics";

type Rule = FunctionEntry["dimensions"];
type Fixed = Extract<Rule, { rule: "fixed" }>;

const nameOf = (of: Fixed["gives"]) => dimensionName(of) ?? formatDimension(of) ?? "a pure number";

const sentences: { readonly [R in Rule["rule"]]: (rule: Extract<Rule, { rule: R }>) => string } = {
  pure: () => "pure numbers in and out",
  same: () => "any one dimension, kept",
  ratio: () => "any one dimension in, a pure number out",
  sign: () => "any dimension in, a pure number out",
  root: ({ degree }) => `any dimension, divided by ${degree ?? "n"}`,
  fixed: ({ takes, gives }) => `${takes.map(nameOf).join(", ")} in, ${nameOf(gives)} out`,
  convert: ({ to }) => `an electromagnetic quantity into ${to === "si" ? "SI" : "Gaussian units"}`,
  binding: () => "that of the expression, and of the variable where it is integrated over",
};

/** What a function does to dimensions, in words. */
export function dimensionRule({ dimensions }: FunctionEntry): string {
  return sentences[dimensions.rule](dimensions as never);
}
