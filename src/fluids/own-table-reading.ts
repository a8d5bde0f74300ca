/** Reads the cells of an own table: headers to columns, cells to quantities, rows to rising temperature; every fault names its cell. */
import { isProblem, type Problem, valueProblem } from "../quantities/problems.js";
import type { Quantity, Reading } from "../quantities/quantity.js";
import { readQuantity } from "../quantities/reading.js";
import { type Column, type ColumnName, columnKinds, columnOf } from "./own-table-columns.js";
import { sayTemperature } from "./refusal.js";

export interface TableRow {
  /** TableRow of the range, its header being row 1. */
  readonly number: number;
  readonly values: Partial<Record<ColumnName, Quantity>>;
}

export interface TableCells {
  readonly columns: readonly Column[];
  /** By rising temperature. */
  readonly rows: readonly TableRow[];
}

export function isProblemList(thing: unknown): thing is readonly Problem[] {
  return Array.isArray(thing) && thing.length > 0 && isProblem(thing[0]);
}

/** The table's columns and rows, or everything that is wrong with its cells. */
export function readTable(cells: readonly (readonly unknown[])[], reading: Reading): TableCells | readonly Problem[] {
  const trimmed = trim(cells);
  const columns = readColumns(trimmed[0] ?? []);
  if (isProblemList(columns)) return columns;
  const rows = readRows(trimmed.slice(1), columns, reading);
  if (isProblemList(rows)) return rows;
  const ordered = inOrder(rows, columns);
  return isProblemList(ordered) ? ordered : { columns, rows: ordered };
}

function isBlank(cell: unknown): boolean {
  return cell === undefined || cell === null || (typeof cell === "string" && cell.trim() === "");
}

/** Without blank rows and columns at the end. A blank numeric cell may reach us as 0, so a row of nothing but blanks and zeros is one. */
function trim(cells: readonly (readonly unknown[])[]): readonly (readonly unknown[])[] {
  const width = (cells[0] ?? []).reduce<number>((last, cell, k) => (isBlank(cell) ? last : k + 1), 0);
  const rows = cells.map((row) => row.slice(0, width));
  let height = rows.length;
  while (height > 1 && (rows[height - 1] as readonly unknown[]).every((cell) => isBlank(cell) || cell === 0)) height--;
  return rows.slice(0, height);
}

function readColumns(header: readonly unknown[]): readonly Column[] | readonly Problem[] {
  const problems: Problem[] = [];
  const columns: Column[] = [];
  header.forEach((cell, at) => {
    if (isBlank(cell)) return;
    const column =
      typeof cell === "string"
        ? columnOf(cell, at)
        : valueProblem("fluid", `The table's header ${nameOfColumn(at)} is not text; headers are names with a unit in brackets.`);
    if (isProblem(column)) problems.push(column);
    else if (columns.some((other) => other.name === column.name))
      problems.push(valueProblem("fluid", `The table has two columns for ${column.name}; keep one.`));
    else columns.push(column);
  });
  if (problems.length > 0) return problems;
  if (columns.length === 0)
    return [valueProblem("fluid", 'The table has no header row; its first row must name the columns, such as "temperature [°C]".')];
  return columns;
}

/** Column in the table, counted from A at its left edge. */
function nameOfColumn(at: number): string {
  return `in column ${at + 1}`;
}

function readRows(
  cells: readonly (readonly unknown[])[],
  columns: readonly Column[],
  reading: Reading,
): readonly TableRow[] | readonly Problem[] {
  if (cells.length === 0) return [valueProblem("fluid", "The table has headers but no row of values.")];
  const problems: Problem[] = [];
  const single = cells.length === 1;
  const rows = cells.map((row, k) => {
    const values: Partial<Record<ColumnName, Quantity>> = {};
    for (const column of columns) {
      const cell = row[column.at];
      const quantity = readCell(cell, column, k + 2, reading, single);
      if (quantity === undefined) continue;
      if (isProblem(quantity)) problems.push(quantity);
      else values[column.name] = quantity;
    }
    return { number: k + 2, values };
  });
  return problems.length > 0 ? problems : rows;
}

/** Columns for change of phase, which may stay blank in some rows. */
export const phaseChangeColumns: ReadonlySet<ColumnName> = new Set([
  "saturation temperature",
  "latent heat",
  "surface tension",
  "vapour density",
  "vapour cp",
  "vapour conductivity",
  "vapour viscosity",
]);

function readCell(cell: unknown, column: Column, row: number, reading: Reading, single: boolean): Quantity | Problem | undefined {
  const where = `the table's ${column.name} in row ${row}`;
  if (isBlank(cell)) {
    if (phaseChangeColumns.has(column.name) || single) return undefined;
    return valueProblem("fluid", `There is a gap: ${where} is blank. Fill it, or leave the row out.`);
  }
  if (isErrorCell(cell)) return valueProblem("fluid", `There is an error value in the table: ${where}.`);
  if (typeof cell !== "number" && typeof cell !== "string") return valueProblem("fluid", `A number is needed for ${where}.`);
  const kind = columnKinds[column.name];
  const quantity = readQuantity(cell, kind.dimension, column.unit === undefined ? reading : { ...reading, unit: column.unit }, "fluid");
  if (isProblem(quantity)) return { ...quantity, sentence: `In row ${row} of the table, ${column.name}: ${quantity.sentence}` };
  if (!kind.signed && quantity.value <= 0) return valueProblem("fluid", `${capital(where)} is ${cell}; it must be above zero.`);
  if (kind.dimension === "temperature" && quantity.value <= 0)
    return valueProblem("fluid", `${capital(where)} is at or below absolute zero.`);
  return quantity;
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

function isErrorCell(cell: unknown): boolean {
  if (typeof cell === "object" && cell !== null) return true;
  return typeof cell === "string" && /^#(?:N\/A|VALUE!|REF!|DIV\/0!|NUM!|NAME\?|NULL!|SPILL!|CALC!|BUSY!|GETTING_DATA)/i.test(cell.trim());
}

function inOrder(rows: readonly TableRow[], columns: readonly Column[]): readonly TableRow[] | readonly Problem[] {
  if (rows.length === 1) return rows;
  if (!columns.some((column) => column.name === "temperature")) {
    return [valueProblem("fluid", 'A table of several rows needs a column "temperature".')];
  }
  const first = temperatureOf(rows[0] as TableRow);
  const rising = first <= temperatureOf(rows[rows.length - 1] as TableRow);
  const ordered = rising ? rows : [...rows].reverse();
  for (let k = 1; k < ordered.length; k++) {
    const before = ordered[k - 1] as TableRow;
    const here = ordered[k] as TableRow;
    const step = temperatureOf(here) - temperatureOf(before);
    const [earlier, later] = rising ? [before, here] : [here, before];
    if (step === 0)
      return [
        valueProblem(
          "fluid",
          `The table's rows ${earlier.number} and ${later.number} have the same temperature, ${sayTemperature(temperatureOf(here))}; keep one.`,
        ),
      ];
    if (step < 0) {
      return [
        valueProblem(
          "fluid",
          `The table's temperatures are out of order: ${sayTemperature(temperatureOf(earlier))} in row ${earlier.number}, then ${sayTemperature(temperatureOf(later))} in row ${later.number}. Sort the rows by temperature.`,
        ),
      ];
    }
  }
  return ordered;
}

/** K; not a number in the one row of a table that gives no temperature. */
export function temperatureOf(row: TableRow): number {
  return row.values.temperature?.value ?? Number.NaN;
}
