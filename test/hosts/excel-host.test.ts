// What the pane sees of Excel, through a stand-in that keeps the documented rules of load and sync.
import { describe, expect, test, vi } from "vitest";
import { ExcelHost } from "../../src/hosts/excel/excel-host.js";
import { readSelection } from "../../src/pane/cell-reading.js";
import { StandIn, type StandInBook } from "./excel-stand-in.js";

const plate = '=FILM.FREE.PLATE("air",A2:A4,20,0.3,B1:C1)';

function book(): StandInBook {
  return {
    sheets: {
      Walls: {
        A1: { value: "Ts" },
        B1: { value: "h" },
        C1: { value: "verdict" },
        A2: { value: 40 },
        A3: { value: 60 },
        A4: { value: 80 },
        B2: { formula: plate, value: 3.9, text: "3.90" },
        C2: { value: "in range" },
        B3: { value: 4.6 },
        B4: { value: 5.0 },
        E1: { value: "#N/A", isError: true },
        E2: { value: "typed text" },
      },
      "my sheet": { A1: { value: 0.3 }, A2: { formula: "=_xldudf_FILM_FLUX(5,80,20)", value: 300 } },
      Empty: {},
    },
    active: { sheet: "Walls", cell: "B4" },
    names: { ambient: 20, heights: "=my sheet!A1" },
    tables: { Faces: { Surface: "Walls!A2:A4", "Surface °C": "Walls!A2:A4" } },
    spills: { "Walls!B2": "B2:C4" },
  };
}

function hosted(version?: string, theme?: { bodyBackgroundColor: string }): { host: ExcelHost; standIn: StandIn } {
  const standIn = new StandIn(book(), version, theme);
  return { host: new ExcelHost(standIn.office, standIn.excel), standIn };
}

describe("selection", () => {
  test("a cell inside a spilled block knows its anchor and place in it", async () => {
    const { host } = hosted();
    expect(await host.selection()).toEqual({
      place: { sheet: "Walls", row: 3, column: 1 },
      address: "Walls!B4",
      area: { sheet: "Walls", row: 3, column: 1, rows: 1, columns: 1 },
      formula: "",
      shown: "5",
      spill: { anchor: { sheet: "Walls", row: 1, column: 1 }, anchorAddress: "Walls!B2", formula: plate, rowOffset: 2, columnOffset: 0 },
    });
  });

  test("the selected block is known; of several blocks none", async () => {
    const { host, standIn } = hosted();
    standIn.book.selected = "A2:A4";
    expect((await host.selection())?.area).toEqual({ sheet: "Walls", row: 1, column: 0, rows: 3, columns: 1 });
    standIn.book.selected = "several";
    expect(await host.selection()).not.toHaveProperty("area");
  });

  test("the anchor itself is no part of another's block", async () => {
    const { host, standIn } = hosted();
    standIn.book.active = { sheet: "Walls", cell: "B2" };
    const selection = await host.selection();
    expect(selection?.spill).toBeUndefined();
    expect(selection?.formula).toBe(plate);
    expect(selection?.shown).toBe("3.90");
  });

  test("a typed text is no formula", async () => {
    const { host, standIn } = hosted();
    standIn.book.active = { sheet: "Walls", cell: "E2" };
    expect((await host.selection())?.formula).toBe("");
  });

  test("an Excel without spilling is read all the same; one without the active cell says so", async () => {
    expect((await hosted("1.9").host.selection())?.spill).toBeUndefined();
    await expect(hosted("1.6").host.selection()).rejects.toThrow(/version of Excel/);
  });

  test("what the pane reads of the third row of a spilled table", async () => {
    const { host } = hosted();
    const selection = await host.selection();
    const cell = await readSelection(selection as NonNullable<typeof selection>, host);
    expect(cell.at).toEqual({ row: 2, column: 0 });
    expect(cell.calls[0]?.args).toEqual({ fluid: [["air"]], surface: [[40], [60], [80]], bulk: [[20]], height: [[0.3]] });
    expect(cell.calls[0]?.give).toEqual([["h", "verdict"]]);
    expect(cell.calls[0]?.troubles).toEqual([]);
  });
});

describe("reading", () => {
  const one = { row: 0, column: 0, rows: 1, columns: 1 };

  test("other sheets, errors, blanks, places that are not there", async () => {
    const { host } = hosted();
    const blocks = await host.read([
      { ...one, sheet: "MY SHEET" },
      { sheet: "Walls", row: 0, column: 4, rows: 3, columns: 1 },
      { ...one, sheet: "Nowhere" },
    ]);
    expect(blocks).toEqual([[[0.3]], [[{ code: "#N/A", message: "" }], ["typed text"], [""]], undefined]);
  });

  test("whole columns and rows end with what is used; an empty sheet gives one blank", async () => {
    const { host } = hosted();
    const [column, row, empty] = await host.read([
      { sheet: "Walls", row: 0, column: 0, rows: Number.POSITIVE_INFINITY, columns: 1 },
      { sheet: "Walls", row: 0, column: 0, rows: 1, columns: Number.POSITIVE_INFINITY },
      { sheet: "Empty", row: 0, column: 0, rows: Number.POSITIVE_INFINITY, columns: 1 },
    ]);
    expect(column).toEqual([["Ts"], [40], [60], [80]]);
    expect(row).toEqual([["Ts", "h", "verdict", "", { code: "#N/A", message: "" }]]);
    expect(empty).toEqual([[""]]);
  });

  test("B2# is what B2 spills", async () => {
    const { host } = hosted();
    const [block] = await host.read([{ sheet: "Walls", row: 1, column: 1, rows: 1, columns: 1, spilled: true }]);
    expect(block).toEqual([
      [3.9, "in range"],
      [4.6, ""],
      [5.0, ""],
    ]);
  });

  test.each([
    ["ambient", [[20]]],
    ["HEIGHTS", [[0.3]]],
    ["Faces[Surface]", [[40], [60], [80]]],
    ["Faces[@Surface]", [[60]]],
    ["Faces[[#This Row],[Surface °C]]", [[60]]],
    ["unknown", undefined],
    ["Faces[Other]", undefined],
    ["Other[Surface]", undefined],
  ])("%s", async (name, block) => {
    const { host } = hosted();
    expect(await host.readName(name, { sheet: "Walls", row: 2, column: 5 })).toEqual(block);
  });
});

describe("writing and finding", () => {
  test("a formula and its inputs", async () => {
    const { host, standIn } = hosted();
    await host.write({ sheet: "Empty", row: 1, column: 1 }, [[80, '=FILM.PRANDTL("air",B2)']]);
    expect(standIn.book.sheets.Empty).toEqual({ B2: { value: 80 }, C2: { formula: '=FILM.PRANDTL("air",B2)', value: 0 } });
    await expect(host.write({ sheet: "Nowhere", row: 0, column: 0 }, [[1]])).rejects.toThrow(/Nowhere/);
  });

  test("every formula that holds the word, on every sheet, however it is spelled", async () => {
    const { host } = hosted();
    expect((await host.formulas("film")).map((one) => [one.address, one.formula, one.shown])).toEqual([
      ["Walls!B2", plate, "3.90"],
      ["'my sheet'!A2", "=_xldudf_FILM_FLUX(5,80,20)", "300"],
    ]);
  });

  test("goes to a cell of another sheet", async () => {
    const { host, standIn } = hosted();
    await host.goTo({ sheet: "my sheet", row: 1, column: 0 });
    expect(standIn.book.active).toEqual({ sheet: "my sheet", cell: "A2" });
  });
});

describe("events", () => {
  test("come until they are stopped", async () => {
    const { host, standIn } = hosted();
    const selected = vi.fn();
    const changed = vi.fn();
    const stops = [host.onSelectionChanged(selected), host.onValuesChanged(changed)];
    await Promise.resolve();
    standIn.fire("selection");
    standIn.fire("calculated");
    standIn.fire("changed");
    expect([selected.mock.calls.length, changed.mock.calls.length]).toEqual([1, 2]);
    for (const stop of stops) stop();
    standIn.fire("selection");
    standIn.fire("changed");
    expect([selected.mock.calls.length, changed.mock.calls.length]).toEqual([1, 2]);
    await vi.waitFor(() => expect(standIn.listeners.selection.size + standIn.listeners.changed.size).toBe(0));
  });

  test("an older Excel has fewer", async () => {
    const { host, standIn } = hosted("1.7");
    host.onValuesChanged(() => undefined);
    await Promise.resolve();
    expect(standIn.listeners.calculated.size + standIn.listeners.changed.size).toBe(0);
  });
});

test.each([
  [undefined, "system"],
  ["#FFFFFF", "light"],
  ["#262626", "dark"],
  ["not a colour", "system"],
])("theme of a host whose paper is %s is %s", async (bodyBackgroundColor, theme) => {
  const { host } = hosted(undefined, bodyBackgroundColor === undefined ? undefined : { bodyBackgroundColor });
  expect((await host.facts()).theme).toBe(theme);
});
