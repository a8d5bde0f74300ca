/** Cell references in A1 writing: read and written. Nothing here touches a sheet. */

/** A reference as a formula writes it; `sheet` absent means the sheet of the formula. Rows and columns count from 0. */
export interface Reference {
  readonly book?: string;
  readonly sheet?: string;
  readonly row: number;
  readonly column: number;
  /** Infinity for whole columns. */
  readonly rows: number;
  /** Infinity for whole rows. */
  readonly columns: number;
  readonly spilled?: boolean;
}

const lastColumn = 16384;
const lastRow = 1048576;

/** `A` is 0, `XFD` is 16383; undefined beyond. */
export function columnNumber(letters: string): number | undefined {
  let number = 0;
  for (const letter of letters.toUpperCase()) number = number * 26 + (letter.charCodeAt(0) - 64);
  return number >= 1 && number <= lastColumn ? number - 1 : undefined;
}

export function columnLetters(column: number): string {
  let letters = "";
  for (let rest = column + 1; rest > 0; rest = Math.floor((rest - 1) / 26)) letters = String.fromCharCode(65 + ((rest - 1) % 26)) + letters;
  return letters;
}

export function cellName(row: number, column: number): string {
  return `${columnLetters(column)}${row + 1}`;
}

/** A sheet's name as a formula needs it: in quotes where it is not a plain word. */
export function sheetPrefix(sheet: string): string {
  const plain = /^[\p{L}_][\p{L}\p{N}_.]*$/u.test(sheet) && !/^[A-Za-z]{1,3}\d+$/.test(sheet) && !/^R\d*C?\d*$/i.test(sheet);
  return plain ? `${sheet}!` : `'${sheet.replace(/'/g, "''")}'!`;
}

const cell = /^\$?([A-Za-z]{1,3})\$?(\d{1,7})$/;
const wholeColumn = /^\$?([A-Za-z]{1,3})$/;
const wholeRow = /^\$?(\d{1,7})$/;

/** Reads `A1`, `$A$1:B9`, `A:C` or `2:4`, without a sheet; undefined where it is none of these. */
export function parseArea(text: string): Reference | undefined {
  const [first = "", second] = text.split(":");
  if (second === undefined) return cornerArea(first, first);
  return cornerArea(first, second) ?? columnArea(first, second) ?? rowArea(first, second);
}

function cornerArea(first: string, second: string): Reference | undefined {
  const one = corner(first);
  const other = corner(second);
  if (one === undefined || other === undefined) return undefined;
  const [row, bottom] = [Math.min(one.row, other.row), Math.max(one.row, other.row)];
  const [column, right] = [Math.min(one.column, other.column), Math.max(one.column, other.column)];
  return { row, column, rows: bottom - row + 1, columns: right - column + 1 };
}

function corner(text: string): { readonly row: number; readonly column: number } | undefined {
  const found = cell.exec(text);
  const column = columnNumber(found?.[1] ?? "");
  const row = rowNumber(found?.[2]);
  return column === undefined || row === undefined ? undefined : { row, column };
}

function rowNumber(digits: string | undefined): number | undefined {
  const number = Number(digits);
  return number >= 1 && number <= lastRow ? number - 1 : undefined;
}

function columnArea(first: string, second: string): Reference | undefined {
  const one = columnNumber(wholeColumn.exec(first)?.[1] ?? "");
  const other = columnNumber(wholeColumn.exec(second)?.[1] ?? "");
  if (one === undefined || other === undefined) return undefined;
  return { row: 0, column: Math.min(one, other), rows: Number.POSITIVE_INFINITY, columns: Math.abs(one - other) + 1 };
}

function rowArea(first: string, second: string): Reference | undefined {
  const one = rowNumber(wholeRow.exec(first)?.[1]);
  const other = rowNumber(wholeRow.exec(second)?.[1]);
  if (one === undefined || other === undefined) return undefined;
  return { row: Math.min(one, other), column: 0, rows: Math.abs(one - other) + 1, columns: Number.POSITIVE_INFINITY };
}

/** `'my sheet'!` or `[Book.xlsx]Sheet!` apart; undefined where the prefix is none, or spans sheets. */
export function parsePrefix(prefix: string): { readonly book?: string; readonly sheet: string } | undefined {
  const bare = prefix.endsWith("!") ? prefix.slice(0, -1) : prefix;
  const name = bare.startsWith("'") ? bare.slice(1, -1).replace(/''/g, "'") : bare;
  const book = /^(.*)\[([^\]]*)\](.*)$/.exec(name);
  if (book !== null) return { book: book[2] as string, sheet: book[3] as string };
  return name === "" || name.includes(":") ? undefined : { sheet: name };
}
