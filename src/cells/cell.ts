/** What may stand in a cell as we receive it, and what we send back. No host type appears here. */

/** An error in a cell: the host's entry turns it into the platform's own error object. */
export class CellError {
  constructor(
    readonly code:
      | "#VALUE!"
      | "#N/A"
      | "#DIV/0!"
      | "#NUM!"
      | "#NAME?"
      | "#REF!"
      | "#NULL!"
      | "#SPILL!"
      | "#CALC!"
      | "#BUSY!"
      | "#GETTING_DATA"
      | "#FIELD!"
      | "#BLOCKED!"
      | "#CONNECT!"
      | "#UNKNOWN!",
    readonly message: string = "",
  ) {}
}

export type CellValue = number | string | boolean | CellError;

/** A block of cells as a function receives it: always two-dimensional; blanks may be 0, "" or null. */
export type CellBlock = readonly (readonly unknown[])[];

/** Errors arrive from hosts as objects with a code; ours and theirs are told by that alone. */
export function isErrorCell(cell: unknown): cell is { readonly code: string; readonly message?: string } {
  return typeof cell === "object" && cell !== null && typeof (cell as { code?: unknown }).code === "string";
}

/** What a cell holds, as messages quote it. */
export function quoted(cell: unknown): string {
  if (isErrorCell(cell)) return `the error ${cell.code}`;
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  if (typeof cell === "number" && !Number.isFinite(cell)) return "a number without value";
  return typeof cell === "object" ? "an object" : JSON.stringify(cell);
}
