// The reader of cell formulas. Expected trees follow the grammar of spreadsheet formulas (OpenFormula, ISO/IEC 26300-2: precedence of signs,
// per cent, power, product, sum, joining, comparison); what a text means was settled by hand.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { evaluate, isUnresolved } from "../../src/pane/arithmetic.js";
import { type Expression, filmCalls, filmId, isUnread, parseFormula } from "../../src/pane/formula.js";
import { cellName, columnLetters, columnNumber, parseArea, parsePrefix, sheetPrefix } from "../../src/pane/reference.js";

function tree(text: string): Expression {
  const found = parseFormula(text);
  if (isUnread(found)) throw new Error(`not read from ${found.at} on: ${text}`);
  return found;
}

function value(text: string): unknown {
  const found = evaluate(tree(text), () => undefined);
  return isUnresolved(found) ? "unresolved" : found.length === 1 && found[0]?.length === 1 ? found[0][0] : found;
}

describe("names of FILM functions", () => {
  test.each([
    ["FILM.FREE.PLATE", "FREE.PLATE"],
    ["film.free.plate", "FREE.PLATE"],
    ["_xldudf_FILM_FREE_PLATE", "FREE.PLATE"],
    ["_XLDUDF_FILM_FORCED_CYLINDER", "FORCED.CYLINDER"],
    ["_xlfn.FILM.FLUID", "FLUID"],
    ["FILM_UNIT", "UNIT"],
  ])("%s is %s", (name, id) => expect(filmId(name)).toBe(id));

  test.each(["FILMSTRIP", "SUM", "MYFILM.FREE.PLATE", "FILM", "FILM."])("%s is none", (name) => expect(filmId(name)).toBeUndefined());
});

describe("calls found", () => {
  test("several, nested in others, with their text", () => {
    const text = '=ROUND(film.free.plate("air",A2,$B$1,0.3),2)+_xldudf_FILM_FLUX(FILM.FREE.CYLINDER("air",80,20,0.05),80,20)';
    const calls = filmCalls(tree(text));
    expect(calls.map((one) => one.film)).toEqual(["FREE.PLATE", "FLUX", "FREE.CYLINDER"]);
    expect(calls.map((one) => text.slice(one.start, one.end))[2]).toBe('FILM.FREE.CYLINDER("air",80,20,0.05)');
  });

  test("omitted arguments stay omitted", () => {
    const [call] = filmCalls(tree('=FILM.DUCT.TUBE("water",60,40,1,0.02,,"h")'));
    expect(call?.args.map((one) => one?.kind)).toEqual(["text", "number", "number", "number", "number", undefined, "text"]);
  });

  test("a call without arguments has none", () => expect(filmCalls(tree("=FILM.LIST()"))[0]?.args).toEqual([]));

  test("a name in a text is no call", () => expect(filmCalls(tree('="FILM.FREE.PLATE(1)"'))).toEqual([]));
});

describe("references", () => {
  test.each([
    ["A1", { row: 0, column: 0, rows: 1, columns: 1 }],
    ["$A$1:b9", { row: 0, column: 0, rows: 9, columns: 2 }],
    ["B9:A1", { row: 0, column: 0, rows: 9, columns: 2 }],
    ["A:C", { row: 0, column: 0, rows: Number.POSITIVE_INFINITY, columns: 3 }],
    ["2:4", { row: 1, column: 0, rows: 3, columns: Number.POSITIVE_INFINITY }],
    ["Sheet2!A1", { sheet: "Sheet2", row: 0, column: 0, rows: 1, columns: 1 }],
    ["'my sheet'!A1:B2", { sheet: "my sheet", row: 0, column: 0, rows: 2, columns: 2 }],
    ["'it''s ! here'!XFD1048576", { sheet: "it's ! here", row: 1048575, column: 16383, rows: 1, columns: 1 }],
    ["'[Other.xlsx]Plant'!A1", { book: "Other.xlsx", sheet: "Plant", row: 0, column: 0, rows: 1, columns: 1 }],
    ["[Other.xlsx]Plant!A1", { book: "Other.xlsx", sheet: "Plant", row: 0, column: 0, rows: 1, columns: 1 }],
    ["A2#", { row: 1, column: 0, rows: 1, columns: 1, spilled: true }],
  ])("%s", (text, reference) => expect(tree(`=${text}`)).toMatchObject({ kind: "reference", reference }));

  test.each(["rate", "Table1[Surface]", "Table1[[#This Row],[surface °C]]", "ABCD1", "A1048577", "Sheet1!rate", "höhe_2"])(
    "%s is a name",
    (name) => expect(tree(`=${name}`)).toMatchObject({ kind: "name", name }),
  );

  test.each(["A1:INDEX(B1:B9,3)", "(A1,B2)", "Sheet1:Sheet3!A1"])("%s is left to the sheet", (text) =>
    expect(tree(`=${text}`).kind).toBe("other"),
  );

  test("letters and numbers of columns undo each other", () => {
    fc.assert(fc.property(fc.integer({ min: 0, max: 16383 }), (column) => columnNumber(columnLetters(column)) === column));
    expect([columnLetters(0), columnLetters(25), columnLetters(26), columnLetters(16383)]).toEqual(["A", "Z", "AA", "XFD"]);
  });

  test("a sheet's name is written so that it reads back", () => {
    fc.assert(
      fc.property(
        fc
          .string({ minLength: 1, maxLength: 31 })
          .filter((name) => !/[[\]:*?/\\]/.test(name) && !name.startsWith("'") && !name.endsWith("'")),
        (name) => {
          expect(parsePrefix(sheetPrefix(name))).toEqual({ sheet: name });
        },
      ),
    );
    expect(sheetPrefix("A1")).toBe("'A1'!");
    expect(cellName(3, 27)).toBe("AB4");
    expect(parseArea("A0")).toBeUndefined();
  });
});

describe("values", () => {
  test.each([
    ["=1+2*3", 7],
    ["=-2^2", 4],
    ["=2^-1", 0.5],
    ["=2^3^2", 64],
    ["=50%", 0.5],
    ["=20%*50", 10],
    ["=-3%", -0.03],
    ["=(1+2)*3", 9],
    ['="it""s "&12.5&" mm"', 'it"s 12.5 mm'],
    ["=1&TRUE", "1TRUE"],
    ['=1e21&""', "1E+21"],
    ['=0.1+0.2&""', "0.3"],
    ['="3"*2', 6],
    ["=1=1", true],
    ['="a"="A"', true],
    ["=2<>2", false],
    ['="b">5', true],
    ["=+-+4", -4],
    [
      "={1,2;3,4}",
      [
        [1, 2],
        [3, 4],
      ],
    ],
    [
      "={1;2}+{10,20}",
      [
        [11, 21],
        [12, 22],
      ],
    ],
    ['={1;2}&" m"', [["1 m"], ["2 m"]]],
    ["={-1,50%}", [[-1, 0.5]]],
    ["=.5", 0.5],
    ["=1.5E-3", 0.0015],
  ])("%s", (text, wanted) => expect(value(text)).toEqual(wanted));

  test.each([
    ["=1/0", "#DIV/0!"],
    ['="x"+1', "#VALUE!"],
    ["=#N/A+1", "#N/A"],
    ["=(-8)^0.5", "#NUM!"],
    ["=1/#REF!", "#REF!"],
  ])("%s is %s", (text, code) => expect(value(text)).toMatchObject({ code }));

  test("blocks of different sizes leave #N/A where there is no partner", () => {
    expect(value("={1,2,3}+{1,2}")).toMatchObject([[2, 4, { code: "#N/A" }]]);
  });

  test("what a name or another function comes to is not guessed", () => {
    expect(value("=rate*2")).toBe("unresolved");
    expect(value("=ROUND(2.5,0)")).toBe("unresolved");
  });
});

describe("hostile text", () => {
  test.each([
    "=",
    "=(",
    "=)",
    "=FILM.FREE.PLATE(",
    "=FILM.FREE.PLATE(,,,",
    '="never closed',
    "='never closed!A1",
    "={1,2;3}",
    "={A1}",
    "=1 2",
    "=A1#B2#",
    "=<script>alert(1)</script>",
    "=\u0000\uD800",
    "=" + "(".repeat(5000),
    "=" + "-".repeat(5000) + "1",
    "=" + "1+".repeat(4000) + "1",
    "=" + "{".repeat(5000),
    "=" + "A1:".repeat(2000),
    "=" + "'".repeat(8000),
    "=" + "IF(".repeat(500),
    "x".repeat(50000),
  ])("%#: never throws", (text) => {
    const found = parseFormula(text);
    if (!isUnread(found)) expect(() => evaluate(found, () => undefined)).not.toThrow();
    else expect(found.at).toBeGreaterThanOrEqual(0);
  });

  test("any text", () => {
    const pieces = fc.constantFrom(
      "FILM.FREE.PLATE(",
      "A1",
      "$B$2:C9",
      ",",
      ")",
      "(",
      '"',
      "'",
      "!",
      "{",
      "}",
      ";",
      "#",
      "%",
      "&",
      "-",
      "1",
      "e5",
      "[",
      "]",
      ":",
      " ",
      "Σ",
      "@",
      "=",
      "<>",
    );
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ unit: "binary" }),
          fc.array(pieces).map((all) => all.join("")),
        ),
        (text) => {
          const found = parseFormula(text);
          if (!isUnread(found)) {
            filmCalls(found);
            evaluate(found, () => undefined);
          }
        },
      ),
      { numRuns: 2000 },
    );
  });
});
