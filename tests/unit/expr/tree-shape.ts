import type { Tree } from "@/lib/expr/tree";

/** The tree in a compact notation with every bracket written. */
export function shape(tree: Tree): string {
  switch (tree.type) {
    case "number":
      return tree.text;
    case "name":
      return tree.name;
    case "unary":
      return `(${tree.operator} ${shape(tree.argument)})`;
    case "binary":
      return `(${shape(tree.left)} ${tree.implicit ? "." : tree.operator} ${shape(tree.right)})`;
    case "comparison":
      return `(${tree.parts.map(shape).join(` ${tree.operators.join(" ")} `)})`;
    case "conditional":
      return `(${shape(tree.test)} ? ${shape(tree.yes)} : ${shape(tree.no)})`;
    case "call":
      return `${tree.name}(${tree.parts.map(shape).join(", ")})`;
  }
}
