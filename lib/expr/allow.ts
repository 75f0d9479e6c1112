import type { MathNode } from "mathjs";
import { raise } from "./faults";
import type { Token } from "./tokens";
import type { BinaryOperator, Comparison, Tree } from "./tree";

/**
 * The allowlist over what the expression library parsed: each node type that an estimate needs is
 * turned into our own tree, with its place found by walking the words beside it; every other node
 * type is `forbidden`. Nothing of the library's nodes is kept, so nothing of them can be evaluated.
 */

/** The parts of the library's nodes that are read here. */
interface ParsedNode {
  readonly type: string;
  readonly op?: string;
  readonly implicit?: boolean;
  readonly args?: readonly ParsedNode[];
  readonly fn?: ParsedNode | string;
  readonly content?: ParsedNode;
  readonly name?: string;
  readonly value?: unknown;
  readonly condition?: ParsedNode;
  readonly trueExpr?: ParsedNode;
  readonly falseExpr?: ParsedNode;
  readonly conditionals?: readonly string[];
  readonly params?: readonly ParsedNode[];
}

const binary = new Set<string>(["+", "-", "*", "/", "^", "and", "or"]);
const comparison = new Set<string>(["<", ">", "<=", ">=", "==", "!="]);
const relational: Record<string, Comparison> = {
  smaller: "<",
  larger: ">",
  smallerEq: "<=",
  largerEq: ">=",
  equal: "==",
  unequal: "!=",
};

class Reader {
  #at = 0;
  constructor(readonly tokens: readonly Token[]) {}

  /** Take the next word; it must be the one the library saw. */
  take(expected?: string): Token {
    const token = this.tokens[this.#at];
    if (!token || (expected !== undefined && token.text !== expected)) {
      throw new Error(`the words and the parsed tree part ways at ${token?.text ?? "the end"}`);
    }
    this.#at += 1;
    return token;
  }
}

function required(node: ParsedNode | undefined): ParsedNode {
  if (!node) throw new Error("a parsed node lacks a part");
  return node;
}

function readOperator(node: ParsedNode, reader: Reader): Tree {
  const [first, second] = node.args ?? [];
  if (node.args?.length === 1) return readUnary(node, required(first), reader);
  const operator = node.op ?? "";
  if (!binary.has(operator) && !comparison.has(operator)) return refuse(node, reader);
  const left = readNode(required(first), reader);
  const implicit = node.implicit === true;
  if (!implicit) reader.take(operator);
  const right = readNode(required(second), reader);
  const place = { from: left.from, to: right.to };
  if (comparison.has(operator)) {
    return {
      type: "comparison",
      operators: [operator as Comparison],
      parts: [left, right],
      ...place,
    };
  }
  return { type: "binary", operator: operator as BinaryOperator, implicit, left, right, ...place };
}

function readUnary(node: ParsedNode, argument: ParsedNode, reader: Reader): Tree {
  if (node.op === "!") {
    const part = readNode(argument, reader);
    const to = reader.take("!").to;
    return {
      type: "call",
      name: "factorial",
      nameTo: part.from,
      parts: [part],
      from: part.from,
      to,
    };
  }
  if (node.op !== "-" && node.op !== "+" && node.op !== "not") return refuse(node, reader);
  const sign = reader.take(node.op);
  const part = readNode(argument, reader);
  return { type: "unary", operator: node.op, argument: part, from: sign.from, to: part.to };
}

function readCall(node: ParsedNode, reader: Reader): Tree {
  const name = reader.take();
  reader.take("(");
  const parts = (node.args ?? []).map((part, index) => {
    if (index > 0) reader.take(",");
    return readNode(part, reader);
  });
  const to = reader.take(")").to;
  return { type: "call", name: name.text, nameTo: name.to, parts, from: name.from, to };
}

function readBrackets(node: ParsedNode, reader: Reader): Tree {
  const open = reader.take("(");
  const inner = readNode(required(node.content), reader);
  const close = reader.take(")");
  if (!open.added) return { ...inner, from: open.from, to: close.to, bracketed: true };
  return inner.type === "name" ? { ...inner, beforeBracket: true } : inner;
}

function readConditional(node: ParsedNode, reader: Reader): Tree {
  const test = readNode(required(node.condition), reader);
  reader.take("?");
  const yes = readNode(required(node.trueExpr), reader);
  reader.take(":");
  const no = readNode(required(node.falseExpr), reader);
  return { type: "conditional", test, yes, no, from: test.from, to: no.to };
}

function readChain(node: ParsedNode, reader: Reader): Tree {
  const operators: Comparison[] = [];
  const parts = (node.params ?? []).map((part, index) => {
    const operator = relational[node.conditionals?.[index - 1] ?? ""];
    if (index > 0 && operator) {
      reader.take(operator);
      operators.push(operator);
    }
    return readNode(part, reader);
  });
  const place = { from: parts[0]?.from ?? 0, to: parts[parts.length - 1]?.to ?? 0 };
  return { type: "comparison", operators, parts, ...place };
}

function readConstant(node: ParsedNode, reader: Reader): Tree {
  if (typeof node.value !== "number") return refuse(node, reader);
  const { text, from, to } = reader.take();
  return { type: "number", value: node.value, text, from, to };
}

function readName(_node: ParsedNode, reader: Reader): Tree {
  const { text, from, to, percent } = reader.take();
  if (percent) return { type: "number", value: 0.01, text: "%", from, to };
  return { type: "name", name: text, beforeBracket: false, from, to };
}

function refuse(_node: ParsedNode, reader: Reader): never {
  const last = reader.tokens[reader.tokens.length - 1];
  raise({ code: "forbidden", reason: "node", from: 0, to: last?.to ?? 0 });
}

const readers: Record<string, (node: ParsedNode, reader: Reader) => Tree> = {
  ConstantNode: readConstant,
  SymbolNode: readName,
  ParenthesisNode: readBrackets,
  OperatorNode: readOperator,
  FunctionNode: readCall,
  ConditionalNode: readConditional,
  RelationalNode: readChain,
};

function readNode(node: ParsedNode, reader: Reader): Tree {
  const read = Object.hasOwn(readers, node.type) ? readers[node.type] : undefined;
  return read ? read(node, reader) : refuse(node, reader);
}

/**
 * Our own tree of what the library parsed, every node with its place in the normalised text.
 * Raises `forbidden` for any node that is not on the list.
 */
export function allow(parsed: MathNode, tokens: readonly Token[]): Tree {
  return readNode(parsed as unknown as ParsedNode, new Reader(tokens));
}
