/** A tree as a formula that any spreadsheet recalculates. */
import type { Node } from "./line.js";
import { childrenOf, print } from "./rewrite.js";

/** Published limits of a cell's formula, kept by every spreadsheet of today. */
export const longestFormula = 8192;
export const deepestFormula = 64;

/**
 * Formula without its leading equals sign; arguments are separated by commas, decimals by points, as files hold them.
 * `cell` gives the reference of a symbol, such as `$B$12`. Truth values stand as TRUE and FALSE where a line ends in a comparison.
 */
export function toNative(node: Node, cell: (symbol: string) => string): string {
  return print(node, { name: cell, number: nativeNumber });
}

/** Whether the formula stays within the length and the nesting that every spreadsheet accepts. */
export function fitsOneCell(formula: string, node: Node): boolean {
  return formula.length + 1 <= longestFormula && functionDepth(node) <= deepestFormula;
}

function functionDepth(node: Node): number {
  const below = childrenOf(node).reduce((deepest, child) => Math.max(deepest, functionDepth(child)), 0);
  return node.kind === "call" ? below + 1 : below;
}

/** Fifteen digits are what a spreadsheet keeps of a typed number; the records hold none longer. */
function nativeNumber(value: number): string {
  const plain = String(value);
  return plain.includes("e") ? plain.toUpperCase().replace("E+", "E") : plain;
}
