// The whole workbook read over a sheet in memory; boundary conditions as tables and as comma-separated values after RFC 4180.
import { describe, expect, test, vi } from "vitest";
import { answer } from "../../src/cells/answer.js";
import { markupOf, textIn } from "../../src/pane/node.js";
import { boundaryTable, csvOf, temperatureRows } from "../../src/pane/workbook/boundaries.js";
import { counts, type Scanned, scanWorkbook, worstFirst } from "../../src/pane/workbook/scan.js";
import { shownRows, workbookBody, type WorkbookState } from "../../src/pane/workbook/view.js";
import { MemoryHost } from "./memory-host.js";

const cells = {
  A1: 40,
  A2: 60,
  A3: "",
  B1: '=FILM.FREE.PLATE("air",A1:A3,20,0.3,{"h","verdict"})',
  A6: '=FILM.FREE.PLATE("water",60,20,30)',
  A7: '=FILM.FREE.PLATE("air",80,20,"0.3 m/s")',
  A8: '=FILM.FREE.PLATE("water",60,20,30,"h","beyond range=flag")',
  A9: '=ROUND(FILM.FREE.CYLINDER("air",80,20,0.05),2)',
  A10: '=FILM.PRANDTL("air",20)',
  A11: "=FILM.FREE.PLATE(",
  A12: '=FILM.FREE.PLATE("air",80,20,ROUND(A1,1))',
  A13: "=SUM(A1:A2)",
};

function host(): MemoryHost {
  return new MemoryHost({ Plant: cells, "=odd": { A1: '=FILM.FREE.PLATE("air",50,20,0.3,"h","area=2 m2")' } });
}

async function scanned(one = host(), signal = new AbortController().signal): Promise<readonly Scanned[]> {
  return (await scanWorkbook(one, signal, () => undefined)).rows;
}

describe("reading", () => {
  test("each case of each call, blank rows left out, other formulas left out", async () => {
    const rows = await scanned();
    expect(rows.map((row) => [row.address, row.kind])).toEqual([
      ["Plant!B1", "good"],
      ["Plant!B2", "good"],
      ["Plant!A6", "bad"],
      ["Plant!A7", "error"],
      ["Plant!A8", "flagged"],
      ["Plant!A9", "good"],
      ["Plant!A10", "good"],
      ["Plant!A11", "error"],
      ["Plant!A12", "remark"],
      ["'=odd'!A1", "good"],
    ]);
  });

  test("worst first, and counted", async () => {
    const rows = await scanned();
    expect(worstFirst(rows).map((row) => row.kind)).toEqual([
      "error",
      "error",
      "bad",
      "flagged",
      "remark",
      "good",
      "good",
      "good",
      "good",
      "good",
    ]);
    expect(Object.fromEntries(counts(rows))).toEqual({ error: 2, bad: 1, flagged: 1, remark: 1, good: 5 });
  });

  test("every sheet is read once, however many formulas refer to it", async () => {
    const one = new MemoryHost({
      Plant: {
        A1: 40,
        ...Object.fromEntries(Array.from({ length: 30 }, (_, i) => [`B${i + 1}`, `=FILM.FREE.PLATE("air",A1,20,0.${i + 1})`])),
      },
    });
    const read = vi.spyOn(one, "read");
    const before = (await one.formulas("film")).length;
    read.mockClear();
    const rows = await scanned(one);
    expect(rows).toHaveLength(before);
    const wholeReads = read.mock.calls.flat(2).filter((area) => area.rows === Number.POSITIVE_INFINITY);
    expect(wholeReads).toHaveLength(1);
  });

  test("it can be called off, and says that the list is not whole", async () => {
    const stop = new AbortController();
    stop.abort();
    expect(await scanWorkbook(host(), stop.signal, () => undefined)).toEqual({ rows: [], isWhole: false });
  });

  test("while it reads, the page hears its user: the turn is given back again and again", async () => {
    const temperatures = Array.from({ length: 1200 }, (_, i) => 30 + (i % 90)).join(";");
    const many = new MemoryHost({ Plant: { B1: `=FILM.FREE.PLATE("air",{${temperatures}},20,0.3)` } });
    let turns = 0;
    const timer = setInterval(() => turns++, 0);
    const { rows } = await scanWorkbook(many, new AbortController().signal, () => undefined);
    clearInterval(timer);
    expect(rows).toHaveLength(1200);
    expect(turns).toBeGreaterThan(2);
  });
});

describe("boundary conditions", () => {
  test("the table holds what the cells would answer", async () => {
    const rows = await scanned();
    const [head, ...lines] = boundaryTable(rows, "SI");
    expect(head).toEqual([
      "cell",
      "function",
      "fluid",
      "area [m²]",
      "h low [W/(m²·K)]",
      "h [W/(m²·K)]",
      "h high [W/(m²·K)]",
      "reference temperature [°C]",
      "verdict",
    ]);
    const wanted = answer("FREE.PLATE", { fluid: [["air"]], surface: [[40]], bulk: [[20]], height: [[0.3]] }, [
      ["h low", "h", "h high", "reference temperature"],
    ])[0] as number[];
    expect(lines[0]?.slice(0, 3)).toEqual(["Plant!B1", "FILM.FREE.PLATE", "air"]);
    lines[0]?.slice(4, 8).forEach((value, i) => expect(value).toBeCloseTo(wanted[i] as number, 6));
    // The flagged case has a number and its verdict beside it; the refused ones have none and are left out.
    expect(lines).toHaveLength(5);
    expect(lines.find((line) => line[0] === "Plant!A8")?.[8]).toMatch(/above/);
  });

  test("in US units, by exact factors: 1 W/(m²·K) is 0.17611 Btu/(h·ft²·°F)", async () => {
    const rows = await scanned();
    const si = boundaryTable(rows, "SI")[1]?.[5] as number;
    const us = boundaryTable(rows, "US")[1]?.[5] as number;
    // 1 Btu (IT) = 1055.05585262 J, 1 ft = 0.3048 m, 1 °F = 5/9 K (exact): factor 0.176110184…
    expect(us / si).toBeCloseTo(0.176110184, 7);
    expect(boundaryTable(rows, "US")[1]?.[7]).toBeCloseTo(68, 6);
  });

  test("a sheet whose name looks like a formula does not become one", async () => {
    const rows = await scanned();
    const table = boundaryTable(rows, "SI");
    expect(table.flat().filter((value) => typeof value === "string" && /^[=+@]/.test(value))).toEqual([]);
  });

  test("h over the surface temperature rises away from the bulk on both sides", async () => {
    const rows = (await scanned()).slice(0, 1);
    const [, ...lines] = [...temperatureRows(rows, { from: 273.15, to: 313.15, count: 5 }, "SI")];
    expect(lines.map((line) => line[1])).toEqual([0, 10, 20, 30, 40]);
    const h = lines.map((line) => line[3] as number);
    expect(h[0]).toBeGreaterThan(h[1] as number);
    expect(h[1]).toBeGreaterThan(h[2] as number);
    expect(h[4]).toBeGreaterThan(h[3] as number);
  });

  // RFC 4180, section 2: quotes around fields with commas, quotes or line breaks; quotes doubled; lines end in CRLF.
  test("comma-separated values", () => {
    expect(
      csvOf([
        ["a", 'say "b"'],
        [1.5, "x,y"],
        [1e-7, "two\nlines"],
      ]),
    ).toBe('a,"say ""b"""\r\n1.5,"x,y"\r\n1e-7,"two\nlines"\r\n');
  });
});

describe("what is shown", () => {
  const nothing = new Proxy({}, { get: () => () => undefined }) as never;
  const state = (rows: readonly Scanned[]): WorkbookState => ({
    rows,
    progress: undefined,
    wasCancelled: false,
    hidden: new Set(),
    search: "",
    most: 100,
    system: "SI",
    span: { from: "0", to: "100", count: "11" },
  });

  test("a button for each result, filtered by verdict and by words", async () => {
    const rows = await scanned();
    expect(shownRows(state(rows))).toHaveLength(10);
    expect(shownRows({ ...state(rows), hidden: new Set(["good", "remark"]) })).toHaveLength(4);
    expect(shownRows({ ...state(rows), search: "cylinder" }).map((row) => row.address)).toEqual(["Plant!A9"]);
    const text = workbookBody(state(rows), nothing).map(textIn).join("\n");
    expect(text).toMatch(/Plant!A7 FILM\.FREE\.PLATE/);
    expect(text).toMatch(/10 results read/);
  });

  test("hostile sheet names and texts are text", async () => {
    const evil = "<img src=x onerror=alert(1)>";
    const rows = await scanned(new MemoryHost({ [evil]: { A1: `=FILM.FREE.PLATE("${evil}",80,20,0.3)` } }));
    const markup = workbookBody(state(rows), nothing).map(markupOf).join("");
    expect(markup).not.toContain("<img");
    expect(markup).toContain("&#60;img");
  });
});
