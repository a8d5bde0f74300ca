// The form of "New formula": what its boxes put into a formula, and a formula back into boxes. Whether a formula is right is settled by the cell functions
// themselves, which answer it over a sheet in memory.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { isErrorCell } from "../../src/cells/cell.js";
import { boxText, type Form, formOfCall, formulaText, freshForm, tableCells, unitsFor } from "../../src/pane/compose/form.js";
import { askView, chooserBody, formView, liveView } from "../../src/pane/compose/view.js";
import { filmCalls, isUnread, parseFormula } from "../../src/pane/formula.js";
import { library, searched } from "../../src/pane/library/entries.js";
import { markupOf, textIn } from "../../src/pane/node.js";
import { allSignatures } from "../../src/pane/signature.js";
import { cellName } from "../../src/pane/reference.js";
import { MemoryHost } from "./memory-host.js";

const length = ["length"] as const;

describe("a box", () => {
  test.each([
    ["0.3", "m", length, "0.3"],
    ["0,25", "m", length, "0.25"],
    ["+4", "m", length, "4"],
    ["-4e-3", "m", length, "-4e-3"],
    ["300", "mm", length, '"300 mm"'],
    ["3 in", "m", length, '"3 in"'],
    ["0.30 ± 0.01", "m", length, '"0.30 ± 0.01 m"'],
    ["80 ± 5 °C", "°C", ["temperature"] as const, '"80 ± 5 °C"'],
    ["500 W/m2", "°C", ["temperature", "heat flux"] as const, '"500 W/m2"'],
    ["500", "W/m²", ["temperature", "heat flux"] as const, '"500 W/m²"'],
    ["A2", "m", length, "A2"],
    ["A2:A9", "mm", length, 'A2:A9&" mm"'],
    ["'my sheet'!B2", "m", length, "'my sheet'!B2"],
    ["=A2*2", "m", length, "A2*2"],
    ["=", "m", length, '"="'],
    ["air", "", [], '"air"'],
    ['say "air"', "", [], '"say ""air"""'],
    ["", "m", length, ""],
    ["1,234", "m", length, '"1,234"'],
  ] as const)("%s beside %s", (typed, unit, dimensions, text) => expect(boxText({ typed, unit }, dimensions, "SI")).toBe(text));

  test("whatever is typed, the formula can be read and holds one argument more", () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 40 }), (typed) => {
        const fresh = freshForm("FREE.PLATE");
        const tree = parseFormula(formulaText({ ...fresh, boxes: { ...fresh.boxes, height: { typed: `${typed}x`, unit: "m" } } }));
        fc.pre(!`${typed}x`.trim().startsWith("="));
        if (isUnread(tree)) throw new Error("not read");
        expect(filmCalls(tree)[0]?.args).toHaveLength(4);
      }),
    );
  });
});

describe("every function", () => {
  const ids = allSignatures()
    .map((one) => one.id)
    .filter((id) => id !== "LIST" && id !== "UNIT");

  test.each(ids)("%s begins with a case that answers", async (id) => {
    const host = new MemoryHost({ Sheet: { A1: formulaText(freshForm(id)) } });
    const block = await host.block({ sheet: "Sheet", row: 0, column: 0 });
    expect(block.flat().filter(isErrorCell)).toEqual([]);
  });

  test.each(ids)("%s survives the way from formula to form and back", (id) => {
    const formula = formulaText({ ...freshForm(id), settings: [{ name: "pressure", value: "2 bar" }] });
    expect(formulaText(back(formula))).toBe(formula);
  });
});

function back(formula: string): Form {
  const tree = parseFormula(formula);
  if (isUnread(tree)) throw new Error(`not read: ${formula}`);
  const [call] = filmCalls(tree);
  if (call === undefined) throw new Error("no call");
  return formOfCall(formula, call);
}

describe("an existing formula in the form", () => {
  test.each([
    '=FILM.FREE.PLATE("air",80,20,0.3)',
    '=FILM.FREE.PLATE("air",A2:A9,"20 ± 2 °C",B2&" mm",D1:G1,K1:L3)',
    '=FILM.FREE.PLATE("air","500 W/m²",20,"300 mm",{"h","Ts","verdict"},"tilt=30; emissivity=0.9; surroundings=20")',
    '=FILM.DUCT.TUBE("water",60,40,"0.4 kg/s",0.02,,"pressure drop")',
    "=FILM.FREE.PLATE(FILM_NAME,-10,ROUND(A2,1),Sheet2!$B$3)",
  ])("%s comes back unchanged", (formula) => expect(formulaText(back(formula)).replace(/=(?=FILM_NAME)/, "")).toBe(formula));

  test("text with a unit of the list stands as number and unit", () => {
    const form = back('=FILM.FREE.PLATE("air","72 degF",20,"11.8 in")');
    expect(form.boxes.surface).toEqual({ typed: "72", unit: "°F" });
    expect(form.boxes.height).toEqual({ typed: "11.8", unit: "in" });
  });
});

test("units to choose from begin with that of bare numbers", () => {
  expect(unitsFor(["length"], "SI")[0]).toBe("m");
  expect(unitsFor(["length"], "US")[0]).toBe("ft");
  expect(unitsFor(["temperature", "heat flux"], "SI")).toEqual(expect.arrayContaining(["°C", "K", "°F", "W/m²"]));
  expect(unitsFor([], "SI")).toEqual([]);
});

describe("a table of cases", () => {
  const form = { ...freshForm("FREE.PLATE"), settings: [{ name: "tilt", value: "10" }] };

  test("has a head row that is its request, inputs, and one formula that answers all of it", async () => {
    const at = { sheet: "Sheet", row: 2, column: 1 };
    const cells = tableCells(
      { ...form, boxes: { ...form.boxes, height: { typed: "300", unit: "mm" } } },
      { name: "surface", from: 30, to: 80, count: 6 },
      at,
    );
    if (cells === undefined) throw new Error("no table");
    expect(cells[0]).toEqual(["surface [°C]", "bulk [°C]", "height [mm]", "h", "h low", "h high", "verdict"]);
    expect(cells.slice(1).map((row) => row[0])).toEqual([30, 40, 50, 60, 70, 80]);
    expect(cells[1]?.[2]).toBe("300 mm");
    const sheet = Object.fromEntries(
      cells
        .flatMap((row, i) => row.map((value, j) => [cellName(at.row + i, at.column + j), value] as const))
        .filter(([, value]) => value !== ""),
    );
    const block = await new MemoryHost({ Sheet: sheet }).block({ sheet: "Sheet", row: 3, column: 4 });
    expect(block).toHaveLength(6);
    expect(block.flat().filter(isErrorCell)).toEqual([]);
    const h = block.map((row) => row[0] as number);
    for (let i = 1; i < h.length; i++) expect(h[i]).toBeGreaterThan(h[i - 1] as number);
    expect(block[0]?.[3]).toBe("in range");
  });

  test.each([
    ["an argument that is left out", { name: "nothing", from: 1, to: 2, count: 3 }],
    ["a single row", { name: "surface", from: 1, to: 2, count: 1 }],
    ["no number", { name: "surface", from: Number.NaN, to: 2, count: 5 }],
  ])("%s makes none", (_, variation) => expect(tableCells(form, variation, { sheet: "Sheet", row: 0, column: 0 })).toBeUndefined());
});

describe("what is shown", () => {
  const nothing = new Proxy({}, { get: () => () => undefined }) as never;
  const texts = { target: "Sheet!B2", isEdit: false, variation: { name: "surface", from: "60", to: "90", count: "8" } };

  test("every box has its label, unit and place for a fault", () => {
    const markup = formView(freshForm("FORCED.PLATE"), texts, nothing).map(markupOf).join("");
    const inputs = [...markup.matchAll(/<input type="text" id="(box-[^"]+)"/g)].map((found) => found[1]);
    expect(inputs).toEqual(["box-fluid", "box-surface", "box-bulk", "box-speed", "box-length"]);
    for (const id of inputs) expect(markup).toContain(`for="${id}"`);
    expect(markup).toContain('aria-label="Unit of speed"');
  });

  test("hostile text in a box is text", () => {
    const fresh = freshForm("FREE.PLATE");
    const evil = '"><img src=x onerror=alert(1)>';
    const markup = formView(
      { ...fresh, boxes: { ...fresh.boxes, fluid: { typed: evil, unit: "" } }, give: [evil], settings: [{ name: evil, value: evil }] },
      texts,
      nothing,
    )
      .map(markupOf)
      .join("");
    expect(markup).not.toContain("<img");
    expect(
      liveView(undefined, [evil]).map(markupOf).join("") +
        askView(evil, () => undefined)
          .map(markupOf)
          .join(""),
    ).not.toContain("<img");
  });

  test("the choice is narrowed by words", () => {
    const shown = (search: string): string => chooserBody(searched(library(), search), nothing).map(textIn).join("\n");
    expect(shown("")).toContain("FILM.DUCT.TUBE");
    expect(shown("cylinder free")).toContain("FILM.FREE.CYLINDER");
    expect(shown("cylinder free")).not.toContain("FILM.DUCT.TUBE");
    expect(shown("reynolds")).toContain("FILM.REYNOLDS");
    expect(shown("no such thing")).toMatch(/Nothing/);
  });
});
