// The trial of another input: the curve is what the cell functions answer at each place, and nothing else.
import { describe, expect, test } from "vitest";
import { answer } from "../../src/cells/answer.js";
import { readSelection } from "../../src/pane/cell-reading.js";
import { bandDrawing } from "../../src/pane/drawings/band.js";
import { markupOf } from "../../src/pane/node.js";
import { caseAt, curveOf, findingWith, type Movable, spanOf } from "../../src/pane/this-cell/what-if.js";
import { MemoryHost } from "./memory-host.js";

async function opened(formula: string, number = 1) {
  const host = new MemoryHost({ Plant: { A1: formula } });
  const read = (await readSelection(await host.selection(), host)).calls[0];
  const one = read === undefined ? undefined : caseAt(read, number);
  if (one === undefined) throw new Error("no case");
  return one;
}

describe("what can be moved", () => {
  test.each([
    ['=FILM.FREE.PLATE("air",80,20,0.3)', ["surface 353.15", "bulk 293.15", "height 0.3"]],
    ['=FILM.FREE.PLATE("air","500 W/m2",20,0.3)', ["surface 500", "bulk 293.15", "height 0.3"]],
    ['=FILM.DUCT.TUBE("water",60,40,"0.4 kg/s",0.02)', ["wall 333.15", "bulk 313.15", "flow 0.4", "diameter 0.02"]],
  ])("%s", async (formula, names) => {
    expect((await opened(formula)).movables.map((one) => `${one.name} ${Number(one.value.toPrecision(6))}`)).toEqual(names);
  });

  test("the case of a block is the one that the cell shows", async () => {
    expect((await opened('=FILM.FREE.PLATE("air",{40;60;80},20,0.3)', 3)).movables[0]?.value).toBeCloseTo(353.15, 9);
  });
});

test("each point of the curve is what a cell with that input would answer", async () => {
  const one = await opened('=FILM.FREE.PLATE("air",80,20,0.3)');
  const curve = curveOf(one, one.movables[2] as Movable);
  expect(curve.points.length).toBeGreaterThan(20);
  for (const point of curve.points.filter((_, i) => i % 7 === 0)) {
    const [h, low, high] = answer("FREE.PLATE", { fluid: [["air"]], surface: [[80]], bulk: [[20]], height: [[point.x]] }, [
      ["h", "h low", "h high"],
    ])[0] as number[];
    expect(point.h).toBeCloseTo(h as number, 9);
    expect(point.low).toBeCloseTo(low as number, 9);
    expect(point.high).toBeCloseTo(high as number, 9);
  }
});

test("beyond the published range the curve goes on, marked", async () => {
  const one = await opened('=FILM.FREE.PLATE("water",60,20,0.9)');
  const curve = curveOf(one, one.movables[2] as Movable);
  expect(new Set(curve.points.map((point) => point.inRange))).toEqual(new Set([true, false]));
});

test.each([0, -200, 500])("a flux of %d W/m² has a span to move in", (value) => {
  const { from, to } = spanOf({ key: "surface", name: "surface", dimension: "heat flux", value });
  expect(to).toBeGreaterThan(from);
});

test("what lies where no formulation holds has no number and does no harm", async () => {
  const one = await opened('=FILM.FREE.PLATE("water",80,20,0.3)');
  expect(findingWith(one, one.movables[0] as Movable, 500).h).toBeUndefined();
  const { points } = curveOf(one, one.movables[0] as Movable);
  for (const point of points) expect([point.h, point.low, point.high].every(Number.isFinite)).toBe(true);
});

test("the drawing", () => {
  const points = [
    { x: 60, h: 4.5, low: 4, high: 5, inRange: true },
    { x: 80, h: 5, low: 4.5, high: 5.5, inRange: true },
    { x: 100, h: 5.4, low: 4.4, high: 6.5, inRange: false },
  ];
  const drawing = bandDrawing({
    says: "h against surface",
    x: { scale: "linear", from: 60, to: 100 },
    y: { scale: "linear", from: 0, to: 8 },
    points,
    now: 80,
    asked: { x: 90, h: 5.2 },
  });
  expect(markupOf(drawing)).toMatchSnapshot();
});
