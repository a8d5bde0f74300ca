import { describe, expect, test } from "vitest";
import { type Line, compileProgram } from "../../src/equations/program.js";
import { LineError, numberNode, parseLine } from "../../src/equations/line.js";
import { textCode } from "../../src/equations/text-code.js";

/** One line's value with the given inputs. */
function lineValue(text: string, inputs: Readonly<Record<string, number>> = {}): number {
  const program = compileProgram([["value", text]]);
  const values = new Float64Array(program.size);
  for (const name of program.inputs) values[program.slot(name)] = inputs[name] ?? Number.NaN;
  program.run(values);
  return values[program.slot("value")] as number;
}

describe("precedence is that of a spreadsheet", () => {
  // OASIS OpenDocument 1.3 part 4 (formula), 5.5: unary minus before ^, ^ from left to right
  test.each([
    ["-2^2", 4],
    ["2^3^2", 64],
    ["2^-1", 0.5],
    ["-2*-3", 6],
    ["1-2-3", -4],
    ["8/4/2", 1],
    ["2+3*4^2", 50],
    ["(2+3)*4", 20],
    ["1+1=2", 1],
    ["2*3>5", 1],
    ["1e-3*1E+3", 1],
    [".5+1.", 1.5],
    ["+3", 3],
  ])("%s is %d", (text, value) => {
    expect(lineValue(text)).toBe(value);
  });
});

describe("functions", () => {
  // Values of the elementary functions at simple arguments: Abramowitz & Stegun, Handbook of Mathematical Functions (1964)
  test.each([
    ["IF(2>1,3,4)", 3],
    ["IF(AND(1<2,2<1),3,4)", 4],
    ["IF(OR(1<2,2<1),3,4)", 3],
    ["IF(NOT(1<2),3,4)", 4],
    ["AND(5)", 1],
    ["MIN(3,1,2)", 1],
    ["MAX(3,1,2)", 3],
    ["SUM(1,2,3)", 6],
    ["SQRT(9)", 3],
    ["EXP(1)", Math.E],
    ["LN(EXP(2))", 2],
    ["LOG10(1000)", 3],
    ["LOG(100)", 2],
    ["LOG(8,2)", 3],
    ["SINH(1)", 1.1752011936438014],
    ["COSH(1)", 1.5430806348152437],
    ["TANH(1)", 0.7615941559557649],
    ["ATANH(0.5)", 0.5493061443340548],
    ["SIN(RADIANS(30))", 0.5],
    ["COS(RADIANS(60))", 0.5],
    ["TAN(RADIANS(45))", 1],
    ["ASIN(1)", Math.PI / 2],
    ["ACOS(0)", Math.PI / 2],
    ["ATAN(1)", Math.PI / 4],
    ["ABS(-2)", 2],
    ["SIGN(-2)", -1],
    ["INT(-1.5)", -2],
    ["ROUND(2.5,0)", 3],
    ["ROUND(-2.5,0)", -3],
    ["ROUND(1.005,2)", 1.01],
    ["ROUND(1234,-2)", 1200],
    ["PI()", Math.PI],
    ["POWER(2,10)", 1024],
    ["ERF(0.5)", 0.5204998778130465],
    ["ERF(2)", 0.9953222650189527],
    ["ERF(3)", 0.9999779095030014],
    ["ERF(-1)", -0.8427007929497149],
  ])("%s is %d", (text, value) => {
    expect(Math.abs(lineValue(text) - value)).toBeLessThanOrEqual(2e-15 * Math.abs(value));
  });
});

describe("powers by their cheap ways agree with the general power", () => {
  const exponents = [
    "0.5",
    "0.25",
    "0.75",
    "1.5",
    "(1/3)",
    "(2/3)",
    "(1/6)",
    "(9/16)",
    "2",
    "3",
    "4",
    "6",
    "-1",
    "-2",
    "1",
    "0.37",
    "(8/27)",
  ];
  test.each(exponents)("x^%s", (exponent) => {
    for (const x of [1e-12, 1e-6, 0.3, 1, 7, 1e5, 3.3e12]) {
      const general = lineValue("x^n", { x, n: lineValue(exponent) });
      expect(Math.abs(lineValue(`x^${exponent}`, { x }) / general - 1)).toBeLessThanOrEqual(2e-15);
    }
  });
  test.each(["0.5", "0.25", "(1/3)", "(1/6)", "(2/3)", "(9/16)"])("(-8)^%s is no number", (exponent) => {
    expect(lineValue(`x^${exponent}`, { x: -8 })).toBeNaN();
  });
});

describe("every shape of operand gives the same number", () => {
  const operands: readonly [string, number][] = [
    ["3", 3],
    ["x", 5],
    ["(x+y)", 12],
  ];
  const operators: readonly [string, (a: number, b: number) => number][] = [
    ["+", (a, b) => a + b],
    ["-", (a, b) => a - b],
    ["*", (a, b) => a * b],
    ["/", (a, b) => a / b],
    ["^", (a, b) => a ** b],
    ["=", (a, b) => Number(a === b)],
    ["<>", (a, b) => Number(a !== b)],
    ["<", (a, b) => Number(a < b)],
    ["<=", (a, b) => Number(a <= b)],
    [">", (a, b) => Number(a > b)],
    [">=", (a, b) => Number(a >= b)],
  ];
  const all = operators.flatMap(([sign, f]) =>
    operands.flatMap(([a, u]) => operands.map(([b, w]) => [`${a}${sign}${b}`, f(u, w)] as const)),
  );
  test.each(all)("%s", (text, value) => {
    expect(lineValue(text, { x: 5, y: 7 })).toBeCloseTo(value, 9);
  });
});

describe("programs", () => {
  test("inputs stand in order of first use, lines follow, each line may use those before it", () => {
    const program = compileProgram([
      ["a", "Re*Pr"],
      ["Nu", "a^0.5+Re+L"],
    ]);
    expect(program.inputs).toEqual(["Re", "Pr", "L"]);
    expect(program.names).toEqual(["a", "Nu"]);
    expect(program.size).toBe(5);
    const values = Float64Array.from([4, 9, 2, Number.NaN, Number.NaN]);
    program.run(values);
    expect([...values]).toEqual([4, 9, 2, 36, 12]);
  });

  test("lines may come as trees", () => {
    const lines: readonly Line[] = [
      { name: "a", node: numberNode(-2) },
      { name: "b", node: parseLine("a*x") },
    ];
    const program = compileProgram(lines);
    const values = new Float64Array(program.size).fill(3);
    program.run(values);
    expect(values[program.slot("b")]).toBe(-6);
  });

  test("a line that uses a later one or itself, and a name given twice, are refused", () => {
    expect(() =>
      compileProgram([
        ["a", "b+1"],
        ["b", "2"],
      ]),
    ).toThrow(/line a uses b before b is worked out/);
    expect(() => compileProgram([["Re", "MIN(Re,2300)"]])).toThrow(LineError);
    expect(() =>
      compileProgram([
        ["a", "1"],
        ["a", "2"],
      ]),
    ).toThrow(/name a is given to two lines/);
  });

  test("a word in a symbol is compared by its code, whatever its case", () => {
    const program = compileProgram([["y", 'IF(shape="square",1,IF(shape="hexagon on edge",2,3))']]);
    const run = (word: string): number => {
      const values = Float64Array.from([textCode(word), 0]);
      program.run(values);
      return values[1] as number;
    };
    expect(["square", "SQUARE", "hexagon on edge", "hexagon"].map(run)).toEqual([1, 1, 2, 3]);
  });

  test("slot refuses a name that the program does not hold", () => {
    expect(() => compileProgram([["y", "1"]]).slot("z")).toThrow(/no symbol z/);
  });
});

describe("tables", () => {
  const tables = {
    s: {
      of: "Re",
      how: "step",
      rows: [
        [40, 1],
        [4000, 2],
        [40000, 3],
      ],
    },
    l: {
      of: "Re",
      how: "linear",
      rows: [
        [1, 10],
        [2, 30],
        [4, -10],
        [5, -10],
      ],
    },
    k: {
      of: "shape",
      how: "key",
      rows: [
        ["square", 3.61],
        ["circle", 4.36],
      ],
    },
    b: {
      of: ["x", "y"],
      how: "bilinear",
      x: [1, 2, 3],
      y: [10, 20],
      z: [
        [1, 2],
        [3, 5],
        [4, 4],
      ],
    },
  } as const;
  const run = (name: keyof typeof tables, inputs: Readonly<Record<string, number>>): number => {
    const program = compileProgram([["out", `${name}*1`]], { tables });
    const values = new Float64Array(program.size);
    for (const input of program.inputs) values[program.slot(input)] = inputs[input] ?? Number.NaN;
    program.run(values);
    return values[program.slot("out")] as number;
  };

  test.each([
    [0, 1],
    [40, 1],
    [40.1, 2],
    [4000, 2],
    [4001, 3],
    [1e9, 3],
  ])("step at %d", (Re, value) => expect(run("s", { Re })).toBe(value));
  test.each([
    [0, 10],
    [1, 10],
    [1.5, 20],
    [2, 30],
    [3, 10],
    [4.5, -10],
    [9, -10],
  ])("linear at %d", (Re, value) => expect(run("l", { Re })).toBeCloseTo(value, 12));
  test.each([
    [0, 0, 1],
    [1.5, 15, 2.75],
    [2, 20, 5],
    [2.5, 10, 3.5],
    [9, 99, 4],
  ])("bilinear at %d, %d", (x, y, value) => expect(run("b", { x, y })).toBeCloseTo(value, 12));
  test("key by word; an unknown word is no number", () => {
    expect(run("k", { shape: textCode("circle") })).toBe(4.36);
    expect(run("k", { shape: textCode("triangle") })).toBeNaN();
  });
  test("a long table stays shallow and exact", () => {
    const rows = Array.from({ length: 200 }, (_, i) => [i, i * i] as const);
    const program = compileProgram([["y", "t+0"]], { tables: { t: { of: "x", how: "linear", rows } } });
    for (const x of [0, 17, 100.5, 198.25, 199, 500]) {
      const values = new Float64Array(program.size);
      values[program.slot("x")] = x;
      program.run(values);
      const held = Math.min(x, 199);
      const low = Math.min(Math.floor(held), 198);
      expect(values[program.slot("y")]).toBeCloseTo(low * low + (held - low) * (2 * low + 1), 9);
    }
  });
  test.each([
    [{ of: "x", how: "step", rows: [] }],
    [
      {
        of: "x",
        how: "linear",
        rows: [
          [2, 1],
          [1, 2],
        ],
      },
    ],
    [{ of: ["x", "y"], how: "bilinear", x: [1, 2], y: [1, 2], z: [[1, 2]] }],
  ] as const)("a table that is empty, unsorted or ragged is refused", (table) => {
    expect(() => compileProgram([["y", "t"]], { tables: { t: table } })).toThrow(/table t needs/);
  });
});
