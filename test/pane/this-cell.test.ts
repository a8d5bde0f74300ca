// "This cell" from the text of a formula to the tree that is shown, over a sheet in memory and the real cell functions.
import { describe, expect, test } from "vitest";
import { readSelection } from "../../src/pane/cell-reading.js";
import { type Child, markupOf, type PageElement, textIn } from "../../src/pane/node.js";
import { explanationOf } from "../../src/pane/this-cell/page.js";
import { mendings } from "../../src/pane/this-cell/mending.js";
import { reportText } from "../../src/pane/this-cell/report.js";
import { type Actions, cellView, emptyView } from "../../src/pane/this-cell/view.js";
import { type MemoryCells, MemoryHost } from "./memory-host.js";

const nothing: Actions = { choose: () => undefined, mend: () => undefined, copyReport: () => undefined };

async function shown(cells: MemoryCells, address: string, call = 0, names?: Readonly<Record<string, string>>) {
  const host = new MemoryHost({ Plant: cells, "my sheet": { A1: 0.3, B2: "air" } }, names).stand("Plant", address);
  const cell = await readSelection(await host.selection(), host);
  const explanation = explanationOf(cell, call);
  const view = cell.calls.length === 0 && cell.trouble === undefined ? emptyView(nothing) : cellView(cell, call, explanation, nothing);
  return { host, cell, explanation, view, text: view.map(textIn).join("\n"), markup: view.map(markupOf).join("\n") };
}

function sections(view: readonly Child[]): readonly string[] {
  const found: string[] = [];
  const visit = (child: Child): void => {
    if (typeof child === "string") return;
    if (child.attributes.class?.startsWith("part ")) found.push(child.attributes.class.slice(5));
    child.children.forEach(visit);
  };
  view.forEach(visit);
  return found;
}

function all(view: readonly Child[], tag: string): readonly PageElement[] {
  return view.flatMap((child) => (typeof child === "string" ? [] : [...(child.tag === tag ? [child] : []), ...all(child.children, tag)]));
}

describe("a film coefficient", () => {
  test("has every section, in the order a reader asks", async () => {
    const { view } = await shown({ A1: '=FILM.FREE.PLATE("air",80,20,0.3)' }, "A1");
    expect(sections(view)).toEqual([
      "result",
      "ranges",
      "equation",
      "symbols",
      "inputs",
      "state",
      "source-0",
      "groups",
      "bounds",
      "compare",
      "cautions",
      "trace",
    ]);
  });

  // Gas at film temperature 50 °C; Ra of a 0.3 m plate with a difference of 60 K is about 1.07e8 (g·β·ΔT·L³/(ν·α) with handbook air; from memory).
  test("shows the number, the group and the published interval", async () => {
    const { text } = await shown({ A1: '=FILM.FREE.PLATE("air",80,20,0.3)' }, "A1");
    expect(text).toMatch(/Film coefficient h\s*(4\.9|5\.0)\d* W\/\(m²·K\)/);
    expect(text).toMatch(/1\.0\d+·10⁸/);
    expect(text).toMatch(/inside 0\.1 to 10¹²/);
    expect(text).toContain("In range");
    expect(text).toContain("air at 50 °C");
  });

  test("arguments from cells, names, other sheets, joined text and arithmetic are resolved", async () => {
    const cells = {
      A1: 80,
      B1: 300,
      C1: "=FILM.FREE.PLATE('my sheet'!B2,A1,ambient,B1&\" mm\")",
      D1: "=FILM.FREE.PLATE(\"air\",A1,2*10,'my sheet'!$A$1)",
    };
    for (const address of ["C1", "D1"]) {
      const { explanation, text } = await shown(cells, address, 0, { ambient: "=20" });
      expect(explanation?.problems).toEqual([]);
      expect(explanation?.finding?.h).toBeCloseTo(5, 0);
      expect(text).toContain(address === "C1" ? "300 mm" : "0.3 m");
    }
  });

  test("a cell inside a spilled block shows its own case and word", async () => {
    const cells = { A1: 40, A2: 60, A3: 80, B1: '=FILM.FREE.PLATE("air",A1:A3,20,0.3,{"h","verdict"})' };
    const { cell, explanation, text } = await shown(cells, "C3");
    expect(cell.at).toEqual({ row: 2, column: 1 });
    expect(explanation?.caseNumber).toBe(3);
    expect(explanation?.word).toBe("verdict");
    expect(text).toContain("case 3 of 3");
    expect(text).toContain("part of the block that B1 spills");
  });

  test("tolerances are read with the input, and each has its share of the bounds", async () => {
    const { text } = await shown({ A1: '=FILM.FREE.PLATE("air","80 ± 5 °C","20 ± 2 °C",0.3)' }, "A1");
    expect(text).toMatch(/80 °C ± 5 K/);
    expect(text).toMatch(/tolerance of surface/);
    expect(text).toMatch(/% of the width/);
  });

  test("every other published equation stands on the same axis", async () => {
    const { view, explanation } = await shown({ A1: '=FILM.FREE.PLATE("air",80,20,0.3)' }, "A1");
    const list = all(view, "ul").find((one) => one.attributes.class === "alternatives");
    expect(list?.children).toHaveLength(explanation?.finding?.compare().length ?? -1);
    expect(textIn(list as PageElement)).toMatch(/taken; in range/);
  });

  test("US units are shown where they are asked for", async () => {
    const { text } = await shown({ A1: '=FILM.FREE.PLATE("air",176,68,0.984,"h","units=US")' }, "A1");
    expect(text).toMatch(/0\.8\d+ Btu\/\(h·ft²·°F\)/);
    expect(text).toContain("176 °F");
  });
});

describe("other cells", () => {
  test("several calls: a chooser, the inner one explained when chosen", async () => {
    const cells = { A1: '=ROUND(FILM.FLUX(FILM.FREE.CYLINDER("air",80,20,0.05),80,20),1)' };
    const first = await shown(cells, "A1");
    expect(all(first.view, "input").map((one) => one.attributes.type)).toEqual(["radio", "radio"]);
    expect(first.text).toMatch(/Value|Result/);
    const second = await shown(cells, "A1", 1);
    expect(second.explanation?.functionId).toBe("FREE.CYLINDER");
    expect(second.explanation?.finding?.h).toBeGreaterThan(0);
  });

  test("a nested FILM call is an argument like any other", async () => {
    const { explanation } = await shown({ A1: '=FILM.FLUX(FILM.FREE.CYLINDER("air",80,20,0.05),80,20)' }, "A1");
    expect(explanation?.problems).toEqual([]);
    expect((explanation?.value as { value: number }).value).toBeGreaterThan(100);
  });

  test("a function that only the sheet knows is named, not guessed", async () => {
    const { cell, explanation, text } = await shown({ A1: 0.3, B1: '=FILM.FREE.PLATE("air",80,20,ROUND(A1,1))' }, "B1");
    expect(explanation).toBeUndefined();
    expect(cell.calls[0]?.troubles).toHaveLength(1);
    expect(text).toContain("ROUND(A1,1)");
    expect(text).toMatch(/height/);
  });

  test("settings in cells are shown as they stand there", async () => {
    const { text } = await shown(
      { B1: "pressure", C1: "2 bar", B2: "gravity", C2: 1.62, A1: '=FILM.FREE.PLATE("air",80,20,0.3,"h",B1:C2)' },
      "A1",
    );
    expect(text).toContain("pressure = 2 bar; gravity = 1.62");
  });

  test("a fluid has its table of properties", async () => {
    const { text } = await shown({ A1: '=FILM.FLUID("water",20)' }, "A1");
    expect(text).toMatch(/density\s*998\.2/);
  });

  test("no FILM function: an example to type", async () => {
    for (const cells of [{ A1: 12 }, { A1: "=SUM(B1:B9)" }, {}]) {
      const { text } = await shown(cells as MemoryCells, "A1");
      expect(text).toContain('=FILM.FREE.PLATE("air",80,20,0.3)');
    }
  });

  test("a formula that cannot be read, an unknown function, too many arguments", async () => {
    expect((await shown({ A1: '=FILM.FREE.PLATE("air",80' }, "A1")).text).toMatch(/cannot be read/);
    expect((await shown({ A1: '=FILM.FREE.MOON("air")' }, "A1")).text).toMatch(/not a function of this version/);
    expect((await shown({ A1: '=FILM.FREE.PLATE("air",1,2,3,4,5,6,7)' }, "A1")).text).toMatch(
      /8 arguments are given, but the function takes 6/,
    );
  });
});

describe("errors say what to mend, and the offered change mends it", () => {
  test.each([
    ["a speed for a length", '=FILM.FREE.PLATE("air",80,20,"0.3 m/s")', /is a speed; a length is needed/],
    ["a misspelt fluid", '=FILM.FREE.PLATE("watr",60,20,0.3)', /watr/],
    ["a misspelt word", '=FILM.FREE.PLATE("air",80,20,0.3,"verdct")', /verdct/],
    ["out of range", '=FILM.FREE.PLATE("water",60,20,30)', /is above 10¹²/],
    ["out of range, settings already there", '=2*FILM.FREE.PLATE("water",60,20,30,"h","pressure=2 bar")+1', /is above 10¹²/],
  ])("%s", async (_, formula, sentence) => {
    const { text, cell, explanation } = await shown({ A1: formula }, "A1");
    expect(text).toMatch(sentence);
    const read = cell.calls[0];
    if (read === undefined || explanation === undefined) throw new Error("not explained");
    const offers = mendings(formula, read, explanation);
    expect(offers.length).toBeGreaterThan(0);
    for (const offer of offers) {
      const mended = await shown({ A1: offer.formula }, "A1");
      expect(mended.explanation?.problems, offer.formula).toEqual([]);
      expect(mended.explanation?.finding?.answered, offer.formula).toBe(true);
    }
  });

  test("an equation that is in range where the chosen one is not is offered by name", async () => {
    const formula = '=FILM.FREE.PLATE("air",80,20,0.3,"h","equation=McAdams vertical turbulent")';
    const { cell, explanation } = await shown({ A1: formula }, "A1");
    if (cell.calls[0] === undefined || explanation === undefined) throw new Error("not explained");
    const [offer] = mendings(formula, cell.calls[0], explanation);
    const mended = await shown({ A1: offer?.formula ?? "" }, "A1");
    expect(mended.explanation?.problems).toEqual([]);
    expect(mended.explanation?.finding?.inRange).toBe(true);
  });

  test("settings that stand in cells are not written over", async () => {
    const { cell, explanation } = await shown({ B1: "pressure", C1: "2 bar", A1: '=FILM.FREE.PLATE("water",60,20,30,"h",B1:C1)' }, "A1");
    if (cell.calls[0] === undefined || explanation === undefined) throw new Error("not explained");
    expect(mendings(cell.formula, cell.calls[0], explanation)).toEqual([]);
  });
});

describe("hostile cells", () => {
  const hostile = [
    '<img src=x onerror="alert(1)">',
    "</script><script>alert(1)</script>",
    "javascript:alert(1)",
    '"><svg onload=alert(1)>',
    "\u202Eevil",
    "&lt;b&gt;",
    "${7*7}",
  ];

  test.each(hostile)("%s is text wherever it appears", async (evil) => {
    const { markup, text } = await shown({ B1: evil, A1: '=FILM.FREE.PLATE(B1,80,20,B1,"h",B1)', A2: evil }, "A1");
    expect(markup).not.toMatch(/<img|<script|<svg onload|onerror="|<b>/);
    expect(text).toContain(evil.slice(0, 12));
  });

  test("in the formula itself", async () => {
    const { markup } = await shown({ A1: '=FILM.FREE.PLATE("<img src=x onerror=alert(1)>",80,20,0.3)+FILM.FREE.PLATE("<b>",1,2,3)' }, "A1");
    expect(markup).not.toMatch(/<img|<b>/);
  });
});

test("the report holds formula, inputs, equation, range and every step", async () => {
  const { cell, explanation } = await shown({ A1: '=FILM.FREE.PLATE("air",80,20,0.3)' }, "A1");
  if (cell.calls[0] === undefined || explanation === undefined) throw new Error("not explained");
  const text = reportText("Plant!A1", cell.formula, cell.calls[0], explanation);
  for (const piece of ["FILM.FREE.PLATE", "Plant!A1", "height: 0.3 m", "verdict", "Nu = ", "Ra is 1.0", "Filmbook 0."])
    expect(text.toLowerCase()).toContain(piece.toLowerCase());
  expect(text).not.toMatch(/undefined|NaN|\[object/);
});
