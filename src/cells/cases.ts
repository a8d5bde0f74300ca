import { type Problem, valueProblem } from "../quantities/problems.js";
import type { CellBlock } from "./cell.js";

/** The cases of one call: a column, a row or a grid, made of arguments that broadcast. */
export interface Cases {
  readonly rows: number;
  readonly columns: number;
}

export function isBlank(cell: unknown): boolean {
  return cell === null || cell === undefined || cell === "" || (typeof cell === "string" && cell.trim() === "");
}

/** A blank may also reach us as 0: the two cannot be told apart. */
export function isBlankOrZero(cell: unknown): boolean {
  return cell === 0 || isBlank(cell);
}

export function isOmitted(block: CellBlock | null | undefined): boolean {
  if (block === null || block === undefined) return true;
  return block.every((row) => row.every(isBlank));
}

/** The common shape of all blocks, or the sentence that states the two that do not fit. */
export function shapeOf(blocks: readonly (readonly [name: string, block: CellBlock])[]): Cases | Problem {
  let rows = 1;
  let columns = 1;
  let tallest = "";
  let widest = "";
  for (const [name, block] of blocks) {
    const [height, width] = sizeOf(block);
    if (height > 1) {
      if (rows > 1 && rows !== height) return misfit(tallest, rows, "rows", name, height);
      rows = height;
      tallest = name;
    }
    if (width > 1) {
      if (columns > 1 && columns !== width) return misfit(widest, columns, "columns", name, width);
      columns = width;
      widest = name;
    }
  }
  return { rows, columns };
}

export function sizeOf(block: CellBlock): readonly [rows: number, columns: number] {
  return [block.length, block[0]?.length ?? 0];
}

function misfit(first: string, size: number, axis: string, second: string, other: number): Problem {
  return valueProblem(second, `has ${other} ${axis}, but ${first} has ${size}; ranges must have the same number of ${axis}, or one.`);
}

/** The cell of a block that belongs to a case: a single row or column serves every case along the other axis. */
export function cellAt(block: CellBlock, row: number, column: number): unknown {
  const [height, width] = sizeOf(block);
  return block[height === 1 ? 0 : row]?.[width === 1 ? 0 : column];
}

export function isSingle(block: CellBlock): boolean {
  return block.length === 1 && block[0]?.length === 1;
}

/** The name under which a wrapper passes an argument: "longitudinal pitch" comes as longitudinalPitch. */
export function keyOfName(name: string): string {
  return name.replace(/ (\w)/g, (_, letter: string) => letter.toUpperCase());
}
