/** What a tree comes to, cell by cell: the few operators of a spreadsheet over blocks, errors passed on. */
import { type CellBlock, CellError, isErrorCell } from "../cells/cell.js";
import type { Expression, Operator } from "./formula.js";

/** A piece of the formula whose value is not known, as it stands in the formula. */
export interface Unresolved {
  readonly unresolved: Expression;
}

export function isUnresolved(thing: CellBlock | Unresolved): thing is Unresolved {
  return "unresolved" in thing;
}

/** Where values come from that a formula only names. */
export type LookUp = (expression: Expression) => CellBlock | undefined;

/** Evaluates a tree; references, names and functions are looked up. */
export function evaluate(expression: Expression, lookUp: LookUp): CellBlock | Unresolved {
  switch (expression.kind) {
    case "number":
      return [[expression.value]];
    case "text":
      return [[expression.value]];
    case "boolean":
      return [[expression.value]];
    case "error":
      return [[new CellError(expression.code as CellError["code"])]];
    case "array":
      return arrayOf(expression.rows, lookUp);
    case "sign":
      return signed(expression, lookUp);
    case "percent":
      return mapped(evaluate(expression.of, lookUp), (cell) => arithmetic("/", cell, 100));
    case "binary":
      return combined(expression.operator, evaluate(expression.left, lookUp), evaluate(expression.right, lookUp));
    default:
      return lookUp(expression) ?? { unresolved: expression };
  }
}

function arrayOf(rows: readonly (readonly Expression[])[], lookUp: LookUp): CellBlock | Unresolved {
  const cells: unknown[][] = [];
  for (const row of rows) {
    const line: unknown[] = [];
    for (const one of row) {
      const value = evaluate(one, lookUp);
      if (isUnresolved(value)) return value;
      line.push(value[0]?.[0]);
    }
    cells.push(line);
  }
  return cells;
}

function signed(expression: Expression & { kind: "sign" }, lookUp: LookUp): CellBlock | Unresolved {
  const of = evaluate(expression.of, lookUp);
  if (expression.operator === "-") return mapped(of, (cell) => arithmetic("-", 0, cell));
  if (expression.operator === "+" || isUnresolved(of)) return of;
  const single = of.length === 1 && of[0]?.length === 1;
  // `@A2:A9` takes the cell of the formula's own row, which only the host knows.
  return single ? of : (lookUp(expression) ?? { unresolved: expression });
}

function mapped(block: CellBlock | Unresolved, of: (cell: unknown) => unknown): CellBlock | Unresolved {
  return isUnresolved(block) ? block : block.map((row) => row.map(of));
}

/** Blocks stretch as a dynamic array does: a single row or column serves all; what has no partner is #N/A. */
function combined(operator: Operator, left: CellBlock | Unresolved, right: CellBlock | Unresolved): CellBlock | Unresolved {
  if (isUnresolved(left)) return left;
  if (isUnresolved(right)) return right;
  const rows = Math.max(left.length, right.length);
  const columns = Math.max(left[0]?.length ?? 0, right[0]?.length ?? 0);
  return Array.from({ length: rows }, (_, row) =>
    Array.from({ length: columns }, (__, column) => {
      const one = stretched(left, row, column);
      const other = stretched(right, row, column);
      return one === missing || other === missing ? new CellError("#N/A") : operate(operator, one, other);
    }),
  );
}

const missing = Symbol("no partner");

function stretched(block: CellBlock, row: number, column: number): unknown {
  const line = block[block.length === 1 ? 0 : row];
  const at = line?.length === 1 ? 0 : column;
  return line === undefined || at >= line.length ? missing : line[at];
}

function operate(operator: Operator, left: unknown, right: unknown): unknown {
  if (isErrorCell(left)) return left;
  if (isErrorCell(right)) return right;
  if (operator === "&") return textOf(left) + textOf(right);
  if (["+", "-", "*", "/", "^"].includes(operator)) return arithmetic(operator as "+", left, right);
  return compare(operator, left, right);
}

function arithmetic(operator: "+" | "-" | "*" | "/" | "^", left: unknown, right: unknown): unknown {
  if (isErrorCell(left)) return left;
  if (isErrorCell(right)) return right;
  const one = numberOf(left);
  const other = numberOf(right);
  if (one === undefined || other === undefined) return new CellError("#VALUE!");
  if (operator === "/" && other === 0) return new CellError("#DIV/0!");
  const value = { "+": one + other, "-": one - other, "*": one * other, "/": one / other, "^": one ** other }[operator];
  return Number.isFinite(value) ? value : new CellError("#NUM!");
}

function numberOf(cell: unknown): number | undefined {
  if (typeof cell === "number") return cell;
  if (typeof cell === "boolean") return cell ? 1 : 0;
  if (cell === null || cell === undefined || cell === "") return 0;
  const text = String(cell).trim();
  return /^[-+]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d+)?$/i.test(text) ? Number(text) : undefined;
}

/** As a spreadsheet joins a number to text: fifteen digits, large and small ones with an exponent. */
export function textOf(cell: unknown): string {
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  if (typeof cell !== "number") return cell === null || cell === undefined ? "" : String(cell);
  const rounded = Number(cell.toPrecision(15));
  return String(rounded)
    .replace(/e([-+])(\d)$/, "E$10$2")
    .replace("e", "E");
}

function compare(operator: Operator, left: unknown, right: unknown): boolean {
  const order = ordered(left, right);
  switch (operator) {
    case "=":
      return order === 0;
    case "<>":
      return order !== 0;
    case "<":
      return order < 0;
    case "<=":
      return order <= 0;
    case ">":
      return order > 0;
    default:
      return order >= 0;
  }
}

/** Numbers before texts before booleans; texts case-blind; a blank counts as the other side's nothing. */
function ordered(left: unknown, right: unknown): number {
  const [one, other] = [filled(left, right), filled(right, left)];
  const rank = (cell: unknown): number => (typeof cell === "number" ? 0 : typeof cell === "string" ? 1 : 2);
  if (rank(one) !== rank(other)) return rank(one) - rank(other);
  if (typeof one === "string")
    return one.toLowerCase() === String(other).toLowerCase() ? 0 : one.toLowerCase() < String(other).toLowerCase() ? -1 : 1;
  return Number(one) - Number(other);
}

function filled(cell: unknown, partner: unknown): unknown {
  if (cell !== null && cell !== undefined) return cell;
  return typeof partner === "number" ? 0 : typeof partner === "boolean" ? false : "";
}
