// The prepared workbook: every formula of it answers, but for those that are there to show a refusal.
import { describe, expect, test } from "vitest";
import { isErrorCell } from "../../src/cells/cell.js";
import { example } from "../../src/hosts/sheet/example.js";
import { exampleWorkbook } from "../../src/hosts/sheet/snapshot.js";
import { withoutResults } from "../../src/hosts/sheet/keeping.js";
import { parseArea } from "../../src/pane/reference.js";
import { MemoryHost } from "../pane/memory-host.js";

const cells = Object.fromEntries(
  example.sheets.map((sheet) => [
    sheet.name,
    Object.fromEntries(sheet.cells.filter((one) => one.value !== undefined).map((one) => [one.at, one.value as string | number])),
  ]),
);
const formulas = example.sheets.flatMap((sheet) =>
  sheet.cells
    .filter((one) => typeof one.value === "string" && one.value.startsWith("="))
    .map((one) => [sheet.name, one.at, one.value as string] as const),
);

/** Cells that are there to be refused, and what they must say. */
const refused: Readonly<Record<string, RegExp>> = {
  "Start here!B34": /is a speed; a length is needed/,
  "Start here!B35": /is above/,
};

describe.each(formulas)("%s %s %s", (sheet, at) => {
  const area = parseArea(at) as { row: number; column: number };
  const host = new MemoryHost(cells);

  test("answers, or refuses as it should", async () => {
    const block = await host.block({ sheet, row: area.row, column: area.column });
    const errors = block.flat().filter(isErrorCell);
    const meant = refused[`${sheet}!${at}`];
    if (meant === undefined) {
      // Rows of comparison and of list may lack a value; nothing else may.
      const open = /"compare"/.test(cells[sheet]?.[at] as string);
      expect(open ? [] : errors.map((one) => `${one.code} ${one.message}`)).toEqual([]);
    } else {
      expect(errors).toHaveLength(1);
      expect(errors[0]?.message).toMatch(meant);
    }
  });

  test("spills over no other content", async () => {
    const block = await host.block({ sheet, row: area.row, column: area.column });
    const taken = Object.keys(cells[sheet] ?? {}).filter((other) => {
      const place = parseArea(other) as { row: number; column: number };
      const isInside =
        place.row >= area.row &&
        place.row < area.row + block.length &&
        place.column >= area.column &&
        place.column < area.column + (block[0]?.length ?? 0);
      return isInside && other !== at;
    });
    expect(taken).toEqual([]);
  });
});

test("blank rows of the teaching table stay blank, and a negative difference gives a negative flux", async () => {
  const host = new MemoryHost(cells);
  const block = await host.block({ sheet: "Start here", row: 9, column: 4 });
  expect(block).toHaveLength(6);
  expect(block[4]).toEqual(["", "", "", "", ""]);
  expect(block[3]?.[3]).toBeLessThan(0);
});

test("the workbook holds each cell of the example once, and survives being kept without results", () => {
  const book = exampleWorkbook();
  expect(book.sheetOrder).toHaveLength(example.sheets.length);
  const first = book.sheets[book.sheetOrder[0] as string];
  expect(first?.cellData?.[4]?.[1]).toEqual({ f: '=FILM.FREE.PLATE("air",80,20,0.3)', s: "two" });
  const calculated = {
    ...book,
    sheets: { a: { ...first, cellData: { 0: { 0: { f: "=1", v: 1, t: 2, s: "two" }, 1: { v: 7, t: 2 } } } } },
  } as typeof book;
  expect(withoutResults(calculated).sheets.a?.cellData).toEqual({ 0: { 0: { f: "=1", s: "two" }, 1: { v: 7, t: 2 } } });
});

test("every style of a cell is a style of the workbook", () => {
  const known = new Set(Object.keys(exampleWorkbook().styles));
  for (const sheet of example.sheets)
    for (const cell of sheet.cells) expect(known.has(cell.style), `${sheet.name} ${cell.at} ${cell.style}`).toBe(true);
});
