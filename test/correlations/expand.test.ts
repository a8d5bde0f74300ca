import { describe, expect, test } from "vitest";
import type { Correlation } from "../../src/correlations/correlation.js";
import { linesOf } from "../../src/correlations/expand.js";
import { correlationById } from "../../src/correlations/index.js";
import { meaningOf, symbolMath } from "../../src/correlations/symbols.js";
import { printLine } from "../../src/equations/rewrite.js";

const inner: Correlation = {
  ...correlationById("mcadams-1954-plate-laminar"),
  id: "inner",
  tables: {
    C: {
      of: "Pr",
      how: "step",
      rows: [
        [1, 0.5],
        [10, 0.6],
      ],
    },
  },
  lines: { Rat: "C*Ra", Nu: "Rat^0.25+Pr" },
};
const outer: Correlation = {
  ...inner,
  id: "outer",
  tables: undefined,
  parts: { V: { of: inner, with: { Ra: "Ra*cosine" } }, F: { of: inner } },
  lines: { cosine: "COS(RADIANS(tilt))", Nu: "MAX(Nu_V,Nu_F)" },
};
const text = (record: Correlation): string[] => linesOf(record).map((line) => `${line.name} = ${printLine(line.node)}`);

describe("a record with parts", () => {
  test("names of the parts are marked, other symbols are shared, each line stands behind those it uses", () => {
    expect(text(outer)).toEqual([
      "cosine = COS(RADIANS(tilt))",
      "Ra_V = Ra*cosine",
      "C_V = IF(Pr<=1,0.5,0.6)",
      "Rat_V = C_V*Ra_V",
      "Nu_V = Rat_V^0.25+Pr",
      "C_F = IF(Pr<=1,0.5,0.6)",
      "Rat_F = C_F*Ra",
      "Nu_F = Rat_F^0.25+Pr",
      "Nu = MAX(Nu_V,Nu_F)",
    ]);
  });

  test("parts within parts", () => {
    const third: Correlation = { ...outer, id: "third", parts: { X: { of: outer, with: { tilt: "2*tilt" } } }, lines: { Nu: "Nu_X" } };
    const lines = text(third);
    expect(lines).toContain("tilt_X = 2*tilt");
    expect(lines).toContain("cosine_X = COS(RADIANS(tilt_X))");
    expect(lines).toContain("Ra_V_X = Ra*cosine_X");
    expect(lines).toContain("Nu_X = MAX(Nu_V_X,Nu_F_X)");
    expect(lines.at(-1)).toBe("Nu = Nu_X");
  });

  test("a part may replace a symbol by a line of the outer record that itself needs a part", () => {
    const fed: Correlation = {
      ...outer,
      id: "fed",
      parts: { F: { of: inner }, V: { of: inner, with: { Ra: "first*10" } } },
      lines: { first: "Nu_F^2", Nu: "Nu_V" },
    };
    const lines = text(fed);
    expect(lines.indexOf("first = Nu_F^2")).toBeGreaterThan(lines.findIndex((line) => line.startsWith("Nu_F =")));
    expect(lines.indexOf("Ra_V = first*10")).toBeGreaterThan(lines.indexOf("first = Nu_F^2"));
  });
});

test("symbols of parts are told and typeset by their base", () => {
  const record = correlationById("raithby-hollands-1998-tilted-up");
  expect(meaningOf("Ra_V", record)).toBe("Rayleigh number, part V");
  expect(meaningOf("nonsense", record)).toBe("");
  expect(symbolMath("Ra_V")).toBe('<msub><mrow><mi mathvariant="normal">Ra</mi></mrow><mi mathvariant="normal">V</mi></msub>');
  expect(symbolMath("mu")).toBe("<mi>μ</mi>");
});
