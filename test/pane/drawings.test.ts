// Strips, axes and typeset lines. Places along an axis follow from the definition of a linear and a logarithmic scale.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { allCorrelations } from "../../src/correlations/index.js";
import type { RangeTest } from "../../src/findings/finding.js";
import { along, axisAround, marks, valueAlong } from "../../src/pane/drawings/axis.js";
import { tug, whisker } from "../../src/pane/drawings/bars.js";
import { stripDrawing, stripOf } from "../../src/pane/drawings/strip.js";
import { figure } from "../../src/pane/figures.js";
import { markupOf, type PageElement, textIn } from "../../src/pane/node.js";
import { readMaths, typesetLine } from "../../src/pane/typeset.js";

function range(symbol: string, value: number, low: number, high: number): RangeTest {
  return { symbol, meaning: symbol, value, low, high, within: value >= low && value <= high, origin: "published", source: "Somebody 1990" };
}

describe("axes", () => {
  test("a value's place on a scale, by definition", () => {
    expect(along({ scale: "log", from: 1, to: 1e4 }, 100)).toBeCloseTo(0.5, 12);
    expect(along({ scale: "linear", from: -10, to: 30 }, 0)).toBeCloseTo(0.25, 12);
  });

  test("place and value undo each other", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), fc.constantFrom("linear" as const, "log" as const), (part, scale) => {
        const axis = { scale, from: 0.01, to: 1e6 };
        expect(along(axis, valueAlong(axis, part))).toBeCloseTo(part, 9);
      }),
    );
  });

  test("marks are round and few", () => {
    expect(marks({ scale: "log", from: 0.05, to: 2e12 }, 5)).toEqual([1, 1e3, 1e6, 1e9, 1e12]);
    expect(marks({ scale: "linear", from: 0, to: 7 }, 5)).toEqual([0, 2, 4, 6]);
    expect(marks({ scale: "linear", from: 1e20, to: 1e20 + 65536 }, 5)).toEqual([]);
    expect(axisAround([4.4, 5.8], true)).toEqual({ scale: "linear", from: 0, to: 6 });
  });
});

describe("range strips", () => {
  const cases: readonly (readonly [string, RangeTest])[] = [
    ["inside, logarithmic", range("Ra", 1.074e8, 0.1, 1e12)],
    ["above", range("Ra", 4.1e16, 0.1, 1e12)],
    ["below", range("Re", 1e-3, 0.4, 4e5)],
    ["open above", range("Pr", 7, 0.6, Number.POSITIVE_INFINITY)],
    ["from zero", range("Re", 1500, 0, 2300)],
    ["linear", range("tilt", 30, 0, 60)],
    ["linear, outside", range("x_D", -0.2, 0.5, 2)],
    ["at zero", range("Ra", 0, 1e4, 1e9)],
  ];

  test.each(cases)("%s", (_, one) => {
    expect(markupOf(stripDrawing(stripOf(one)))).toMatchSnapshot();
  });

  test.each(cases)("%s: the point lies on the side of each limit where the value does", (_, one) => {
    const { point, interval, says } = stripOf(one);
    expect(point.at >= interval.from - 1e-9 && point.at <= interval.to + 1e-9).toBe(one.within);
    if (one.value > one.high) expect(point.at).toBeGreaterThan(interval.to);
    if (one.value < one.low) expect(point.at).toBeLessThan(interval.from);
    expect(says).toContain(one.within ? "inside" : "outside");
  });

  test("any interval and any value give finite places in order", () => {
    const number = fc
      .oneof(fc.double({ min: -1e6, max: 1e6, noNaN: true }), fc.double({ min: 1e-12, max: 1e20, noNaN: true }))
      .map((one) => (Math.abs(one) < 1e-12 ? 0 : one));
    fc.assert(
      fc.property(number, number, number, fc.boolean(), (one, other, value, open) => {
        const low = Math.min(one, other);
        const high = open ? Number.POSITIVE_INFINITY : Math.max(one, other);
        fc.pre(high > low);
        const strip = stripOf(range("Re", value, low, high));
        for (const at of [strip.point.at, strip.interval.from, strip.interval.to, ...strip.marks.map((mark) => mark.at)]) {
          expect(Number.isFinite(at)).toBe(true);
          expect(at).toBeGreaterThanOrEqual(-1e-9);
          expect(at).toBeLessThanOrEqual(1 + 1e-9);
        }
        expect(strip.interval.to).toBeGreaterThanOrEqual(strip.interval.from);
      }),
    );
  });

  test("inside and outside differ in shape, not only in colour", () => {
    const shapes = (one: RangeTest): string =>
      markupOf(stripDrawing(stripOf(one))).replace(/^.*<circle|.*/s, (found) => (found.includes("circle") ? "disc" : "other"));
    expect(shapes(range("Ra", 1e6, 1, 1e9))).toContain("disc");
    expect(shapes(range("Ra", 1e11, 1, 1e9))).toBe("other");
  });
});

test("bars", () => {
  const axis = axisAround([3, 6], true);
  expect(markupOf(whisker(axis, 3, 4, 6, "taken", 4))).toMatchSnapshot();
  expect(markupOf(whisker(axis, 3, 4, 6, "outside"))).toMatchSnapshot();
  expect(markupOf(tug(0.5, 1))).toMatchSnapshot();
});

test.each([
  [1.074e8, "1.074·10⁸"],
  [1e12, "10¹²"],
  [3.2e-7, "3.2·10⁻⁷"],
  [-0.25, "−0.25"],
  [101300, "101300"],
  [Number.POSITIVE_INFINITY, "∞"],
])("%d is printed %s", (value, text) => expect(figure(value)).toBe(text));

describe("typeset lines", () => {
  const lines = allCorrelations.flatMap((record) =>
    Object.entries(record.lines).map(([name, line]) => [`${record.id} ${name}`, name, line] as const),
  );

  test("every line of every published equation becomes a tree of maths with its symbols marked", () => {
    expect(lines.length).toBeGreaterThan(100);
    for (const [what, name, line] of lines) {
      const tree = typesetLine(name, line);
      expect(tree?.tag, what).toBe("math");
      expect(symbolsOf(tree as PageElement), what).toContain(name);
    }
  });

  test("a line that is none is left to be shown as text", () => expect(typesetLine("Nu", "2*(")).toBeUndefined());

  test.each(["<math><script>1</script></math>", "<math><mi>a</math>", "<math><mi>a</mi>", "<math>&#x3c;b&#x3e;", "plain", ""])(
    "%s is refused",
    (text) => expect(readMaths(text)).toBeUndefined(),
  );

  test("escaped signs come out as text, never as elements", () => {
    const tree = readMaths("<math><mtext>&#60;img src=x&#62;&amp;</mtext></math>") as PageElement;
    expect(textIn(tree)).toBe("<img src=x>&");
    expect(markupOf(tree)).not.toContain("<img");
  });
});

function symbolsOf(node: PageElement): readonly string[] {
  const own = node.attributes["data-symbol"];
  return [...(own === undefined ? [] : [own]), ...node.children.flatMap((child) => (typeof child === "string" ? [] : symbolsOf(child)))];
}
