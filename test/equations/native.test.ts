import { beforeAll, describe, expect, test } from "vitest";
import { parseLine } from "../../src/equations/line.js";
import { fitsOneCell, toNative } from "../../src/equations/native.js";
import { compileProgram } from "../../src/equations/program.js";
import { lowerTable } from "../../src/equations/table.js";
import { textCode } from "../../src/equations/text-code.js";
import { canRecalculate, columnName, recalculate, type SheetCell } from "./recalculation.js";

const cell = (symbol: string): string => ({ Ra: "$B$2", Pr: "$B$3" })[symbol] ?? `$C$${symbol.length}`;

describe("native text", () => {
  test.each([
    ["(0.825+0.387*Ra^(1/6)/(1+(0.492/Pr)^(9/16))^(8/27))^2", "(0.825+0.387*$B$2^(1/6)/(1+(0.492/$B$3)^(9/16))^(8/27))^2"],
    ["-(Ra^2)", "-($B$2^2)"],
    ["Ra*(-Pr)", "$B$2*(-$B$3)"],
    ["IF(Ra<=1e9,0.59,1e-7)", "IF($B$2<=1000000000,0.59,1E-7)"],
    ["2^3^2", "(2^3)^2"],
    ["1e22*Ra", "1E22*$B$2"],
  ])("%s", (text, native) => {
    expect(toNative(parseLine(text), cell)).toBe(native);
  });

  test("length and nesting limits are told", () => {
    const deep = parseLine(`${"ABS(".repeat(70)}Ra${")".repeat(70)}`);
    expect(fitsOneCell(toNative(deep, cell), deep)).toBe(false);
    const long = parseLine(Array.from({ length: 2000 }, () => "Ra").join("+"));
    expect(fitsOneCell(toNative(long, cell), long)).toBe(false);
    const fine = parseLine("Ra+1");
    expect(fitsOneCell(toNative(fine, cell), fine)).toBe(true);
  });
});

/** Every function and every operator, over points where each has a value. */
const lines = [
  "-x^2",
  "-(x^2)",
  "2^x^0.5",
  "x^-1",
  "x-y-1",
  "x/y/2",
  "x/(y*2)",
  "x-(y-1)",
  "x*(-y)",
  "1e-7*x*1e9",
  "1.5e22/x",
  "0.1+x*3e-5",
  "IF(x>y,x-y,y-x)",
  "IF(x=y,1,2)",
  "IF(x<>y,1,2)",
  "IF(x>=1,IF(y<=1,1,2),3)",
  "IF(AND(x>1,y>1),1,0)",
  "IF(OR(x>2,y>2),1,0)",
  "IF(NOT(x>y),1,0)",
  "(x>y)*2",
  "MIN(x,y,1)",
  "MAX(x,y,1)",
  "SUM(x,y,1)",
  "SQRT(x)",
  "EXP(-x)",
  "LN(x)",
  "LOG10(x)",
  "LOG(x)",
  "LOG(x,3)",
  "SINH(x)",
  "COSH(x)",
  "TANH(x)",
  "ATANH(x/10)",
  "SIN(x)",
  "COS(x)",
  "TAN(x)",
  "ASIN(x/10)",
  "ACOS(x/10)",
  "ATAN(x)",
  "ABS(x-y)",
  "SIGN(x-y)",
  "INT(x-y)",
  "ROUND(x-y,2)",
  "ROUND(x*1000,-1)",
  "RADIANS(x)*PI()",
  "POWER(x,y)",
  "ERF(x)",
  "ERF(x/5)",
  "x^0.25+y^0.5+x^(1/3)+y^(1/6)+x^(2/3)+y^(9/16)",
  "x^2+y^3+x^4+y^6+x^-2",
  "x^(8/27)",
  "1-x^2",
  "-x*y",
  "-x/y+1",
  "2-(-x)",
];
const words = ['IF(shape="square",x,IF(shape="hexagon",y,0))', 'IF(shape<>"SQUARE",1,2)'];
const table = lowerTable("t", {
  of: ["x", "y"],
  how: "bilinear",
  x: [0, 2, 4],
  y: [1, 3],
  z: [
    [1, 5],
    [2, 2],
    [-3, 0.5],
  ],
});

describe.runIf(canRecalculate())("LibreOffice Calc recalculates to the compiled number", () => {
  const points = Array.from({ length: 12 }, (_, i) => ({
    x: 0.2 + ((i * 37) % 43) / 10,
    y: 0.3 + ((i * 29) % 31) / 7,
    shape: ["square", "hexagon", "Square"][i % 3] as string,
  }));
  const nodes = [...lines.map((text) => parseLine(text)), ...words.map((text) => parseLine(text)), table];
  const programs = nodes.map((node) => compileProgram([{ name: "value", node }]));
  const formulaRow = (point: (typeof points)[number], row: number): SheetCell[] => {
    const place: Readonly<Record<string, string>> = { x: `$A$${row + 1}`, y: `$B$${row + 1}`, shape: `$C$${row + 1}` };
    return [point.x, point.y, point.shape, ...nodes.map((node) => `=${toNative(node, (name) => place[name] as string)}`)];
  };
  let answers: ReturnType<typeof recalculate> = [];
  beforeAll(() => {
    answers = recalculate(points.map(formulaRow));
  }, 200_000);

  test.each(nodes.map((_, i) => [[...lines, ...words, "a table"][i] as string, i] as const))("%s", (_, i) => {
    points.forEach((point, row) => {
      const program = programs[i] as ReturnType<typeof compileProgram>;
      const values = new Float64Array(program.size);
      for (const name of program.inputs)
        values[program.slot(name)] = name === "shape" ? textCode(point.shape) : (point[name as "x"] as number);
      program.run(values);
      const ours = values[program.slot("value")] as number;
      const theirs = Number(answers[row]?.[3 + i]);
      expect(Math.abs(theirs - ours), `${columnName(3 + i)}${row + 1}: ${answers[row]?.[3 + i]} against ${ours}`).toBeLessThanOrEqual(
        2e-13 * Math.max(Math.abs(ours), 1e-3),
      );
    });
  });
});
