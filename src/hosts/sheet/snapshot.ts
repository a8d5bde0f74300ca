/** The prepared workbook as the embedded sheet stores one. */
import { parseArea } from "../../pane/reference.js";
import type { ExampleCell, ExampleSheet, StyleName } from "./example.js";
import { example } from "./example.js";
import type { WorkbookData } from "./univer-types.js";

type Sheet = WorkbookData["sheets"][string];
type Style = NonNullable<WorkbookData["styles"][string]>;

const yes = 1;
const line = 1;
const wrapped = 3;
const middle = 2;
const left = 1;
const right = 3;
const rowsOfEach = 200;
const columnsOfEach = 26;

const ink = "#5b6470";
const number = (pattern: string): Style => ({ n: { pattern } });

const indented = { l: 8 };
const headed: Style = { bl: yes, bg: { rgb: "#e8edf3" }, bd: { b: { s: line, cl: { rgb: "#8a96a3" } } } };

const styles: Readonly<Record<StyleName, Style>> = {
  title: { bl: yes, fs: 16 },
  lead: { tb: wrapped, vt: middle, cl: { rgb: ink } },
  step: { bl: yes, fs: 12 },
  note: { cl: { rgb: ink } },
  head: { ...headed, ht: right },
  headText: { ...headed, ht: left, pd: indented },
  input: { cl: { rgb: "#1b4fa0" }, bg: { rgb: "#f2f7ff" } },
  text: {},
  one: number("0.0"),
  two: number("0.00"),
  three: number("0.000"),
  whole: number("0"),
  group: number("0.00E+00"),
  words: { ht: left, pd: indented },
};

export function exampleWorkbook(): WorkbookData {
  const sheets = example.sheets.map((sheet, i) => sheetOf(sheet, `sheet-${i + 1}`));
  return {
    id: "filmbook",
    name: example.name,
    appVersion: "0.25.1",
    locale: "enUS",
    styles: { ...styles },
    sheetOrder: sheets.map((sheet) => sheet.id as string),
    sheets: Object.fromEntries(sheets.map((sheet) => [sheet.id as string, sheet])),
    resources: [],
  } as unknown as WorkbookData;
}

function sheetOf(sheet: ExampleSheet, id: string): Sheet {
  const cellData: Record<number, Record<number, Record<string, unknown>>> = {};
  for (const cell of sheet.cells) {
    const { row, column } = placeOf(cell);
    cellData[row] = { ...cellData[row], [column]: dataOf(cell) };
  }
  return {
    id,
    name: sheet.name,
    rowCount: rowsOfEach,
    columnCount: columnsOfEach,
    cellData: cellData as Sheet["cellData"],
    columnData: Object.fromEntries(sheet.widths.map((w, i) => [i, { w }])),
    rowData: Object.fromEntries(Object.entries(sheet.heights ?? {}).map(([row, h]) => [Number(row) - 1, { h, ia: 0 }])) as Sheet["rowData"],
    mergeData: (sheet.merged ?? []).map(rangeOf),
    ...(sheet.frozenRows === undefined
      ? {}
      : { freeze: { xSplit: 0, ySplit: sheet.frozenRows, startRow: sheet.frozenRows, startColumn: -1 } }),
  };
}

function placeOf(cell: ExampleCell): { readonly row: number; readonly column: number } {
  const area = parseArea(cell.at);
  if (area === undefined) throw new Error(`${cell.at} is no cell`);
  return area;
}

function rangeOf(text: string): { startRow: number; endRow: number; startColumn: number; endColumn: number } {
  const area = parseArea(text);
  if (area === undefined) throw new Error(`${text} is no range`);
  return { startRow: area.row, endRow: area.row + area.rows - 1, startColumn: area.column, endColumn: area.column + area.columns - 1 };
}

function dataOf(cell: ExampleCell): Record<string, unknown> {
  const s = cell.style;
  if (cell.value === undefined) return { s };
  if (typeof cell.value === "string" && cell.value.startsWith("=")) return { f: cell.value, s };
  return { v: cell.value, t: typeof cell.value === "number" ? 2 : 1, s };
}
