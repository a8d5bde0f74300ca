import type { CellBlock, CellValue } from "./cell.js";
import type { Explanation } from "./explanation.js";

export type Arguments = Readonly<Record<string, CellBlock | null | undefined>>;

/** Answers one call of a cell function: a rectangular block, errors cell by cell, never an exception. */
export declare function answer(id: string, args: Arguments, give?: CellBlock | null, settings?: CellBlock | null): CellValue[][];

/** The same call explained for one cell of its spilled block. */
export declare function explain(id: string, args: Arguments, give: CellBlock | null | undefined, settings: CellBlock | null | undefined, at: { row: number; column: number }): Explanation;
