/** Trees changed into other trees, and back into text. */
import type { Node, Operator } from "./line.js";

/** The symbols of a tree, each once, in order of first use. */
export function symbolsOf(node: Node): readonly string[] {
  const found = new Set<string>();
  visit(node, (one) => {
    if (one.kind === "name") found.add(one.name);
  });
  return [...found];
}

function visit(node: Node, see: (node: Node) => void): void {
  see(node);
  for (const child of childrenOf(node)) visit(child, see);
}

export function childrenOf(node: Node): readonly Node[] {
  switch (node.kind) {
    case "minus":
      return [node.of];
    case "binary":
      return [node.left, node.right];
    case "call":
      return node.args;
    default:
      return [];
  }
}

/** Every symbol that `map` knows gets its new name; the others keep theirs. */
export function renameSymbols(node: Node, map: Readonly<Record<string, string>>): Node {
  return substitute(node, Object.fromEntries(Object.entries(map).map(([from, name]) => [from, { kind: "name", name }])));
}

/** Every symbol that `by` knows is replaced by its tree. */
export function substitute(node: Node, by: Readonly<Record<string, Node>>): Node {
  // A map, since a symbol may be called "constructor".
  const trees = new Map(Object.entries(by));
  return replaceNames(node, (name) => trees.get(name));
}

function replaceNames(node: Node, replacement: (name: string) => Node | undefined): Node {
  switch (node.kind) {
    case "name":
      return replacement(node.name) ?? node;
    case "minus":
      return { kind: "minus", of: replaceNames(node.of, replacement) };
    case "binary":
      return { ...node, left: replaceNames(node.left, replacement), right: replaceNames(node.right, replacement) };
    case "call":
      return { ...node, args: node.args.map((one) => replaceNames(one, replacement)) };
    default:
      return node;
  }
}

/** Canonical text of a tree; reading it gives the same tree. */
export function printLine(node: Node): string {
  return print(node, { name: (name) => name, number: printNumber });
}

/** How the leaves are written where a tree becomes text. */
export interface Wording {
  readonly name: (name: string) => string;
  readonly number: (value: number) => string;
}

/** A tree as text with the brackets it needs; a minus sign that is not at the head of a sum always stands in brackets. */
export function print(node: Node, wording: Wording): string {
  switch (node.kind) {
    case "number":
      return wording.number(node.value);
    case "text":
      return `"${node.value.replaceAll('"', '""')}"`;
    case "name":
      return wording.name(node.name);
    case "minus":
      return `-${bracketed(node.of, node.of.kind === "binary" || node.of.kind === "minus", wording)}`;
    case "call":
      return `${node.name}(${node.args.map((one) => print(one, wording)).join(",")})`;
    case "binary":
      return printBinary(node, wording);
  }
}

function printBinary(node: Node & { kind: "binary" }, wording: Wording): string {
  const own = tightness(node.operator);
  const left =
    node.left.kind === "binary" ? needsBracket(node.left.operator, node.operator) : node.left.kind === "minus" && own === tightness("^");
  const right = node.right.kind === "minus" || (node.right.kind === "binary" && tightness(node.right.operator) <= own);
  return `${bracketed(node.left, left, wording)}${node.operator}${bracketed(node.right, right, wording)}`;
}

/** Powers of powers and comparisons of comparisons are bracketed though the grammar does not ask for it: no reader should have to know. */
function needsBracket(inner: Operator, outer: Operator): boolean {
  return tightness(inner) < tightness(outer) || (inner === outer && outer === "^") || (tightness(inner) === 0 && tightness(outer) === 0);
}

function bracketed(node: Node, needed: boolean, wording: Wording): string {
  const text = print(node, wording);
  return needed ? `(${text})` : text;
}

function tightness(operator: Operator): number {
  if (operator === "^") return 3;
  if (operator === "*" || operator === "/") return 2;
  if (operator === "+" || operator === "-") return 1;
  return 0;
}

/** Shortest text that reads back as the same number; powers of ten where they are shorter. */
export function printNumber(value: number): string {
  const plain = String(value);
  if (value !== 0 && (value >= 1e6 || value < 1e-3)) {
    const scientific = value.toExponential().replace("e+", "e");
    return scientific.length < plain.length || plain.includes("e") ? scientific : plain;
  }
  return plain;
}
