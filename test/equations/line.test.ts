import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  binaryNode,
  callNode,
  type FunctionName,
  functions,
  LineError,
  type Node,
  nameNode,
  numberNode,
  type Operator,
  parseLine,
} from "../../src/equations/line.js";
import { printLine, renameSymbols, substitute, symbolsOf } from "../../src/equations/rewrite.js";

function problemOf(text: string, strict = false): LineError {
  try {
    parseLine(text, { strict });
  } catch (thrown) {
    if (thrown instanceof LineError) return thrown;
    throw thrown;
  }
  throw new Error(`${text} was read`);
}

describe("a line that cannot be read says where and what to write", () => {
  test.each([
    ["", 1, /empty/],
    ["  ", 1, /empty/],
    ["0.3*Re^", 8, /ends where a number/],
    ["0.3*(Re+1", 5, /opened at character 5 is not closed/],
    ["0.3*Re)", 7, /no opening one/],
    ["0,3*Re", 2, /decimals with a point/],
    ["2 Re", 3, /write \* for a product/],
    ["Re Pr", 4, /operator is missing before "Pr"/],
    ["f(Re)", 1, /f at character 1 is no function/],
    ["SQRT(1,2)", 1, /has 2 arguments; it takes 1/],
    ["MIN()", 1, /has 0 arguments; it takes 1 to 30/],
    ["IF(1,2)", 1, /it takes 3/],
    ["MAX(1,2", 1, /bracket of MAX at character 1 is not closed/],
    ["3·Re", 2, /write \* for a product/],
    ["Re²", 3, /write \^2/],
    ["5%", 2, /write the fraction/],
    ['shape="square', 7, /no closing quotation mark/],
    ["1e999", 1, /too large/],
    ["*3", 1, /stands at character 1/],
    ["1----2", 6, /signs stand in a row/],
    [`${"(".repeat(200)}1${")".repeat(200)}`, 101, /nested more than 100/],
    ["1".repeat(9000), 8192, /at most 8192/],
  ] as const)("%s", (text, position, sentence) => {
    const error = problemOf(text);
    expect(error.message).toMatch(sentence);
    expect(error.position).toBe(position);
  });

  test.each(["-x^2", "1+-x^2", "2^3^2", "x^-1^2", "+-x^2"])("strict reading refuses %s", (text) => {
    expect(problemOf(text, true).message).toMatch(/two ways/);
    expect(() => parseLine(text)).not.toThrow();
  });

  test.each(["(-x)^2", "-(x^2)", "(2^3)^2", "x^(-1)", "x^-1", "1-x^2", "a*b^c*d^e"])("strict reading takes %s", (text) => {
    expect(() => parseLine(text, { strict: true })).not.toThrow();
  });
});

const names = fc.constantFrom("Ra", "Pr", "x", "D_L", "Nu_V", "constructor");
const operators = fc.constantFrom<Operator>("+", "-", "*", "/", "^", "=", "<>", "<", "<=", ">", ">=");
const calls = fc.constantFrom(...(Object.keys(functions) as FunctionName[]));

const { tree } = fc.letrec<{ tree: Node }>((tie) => ({
  tree: fc.oneof(
    { maxDepth: 6 },
    names.map(nameNode),
    fc.double({ min: 0, noNaN: true, noDefaultInfinity: true }).map(numberNode),
    fc.string().map((value): Node => ({ kind: "text", value })),
    tie("tree").map((of): Node => ({ kind: "minus", of })),
    fc.tuple(operators, tie("tree"), tie("tree")).map(([operator, left, right]) => binaryNode(operator, left, right)),
    fc
      .tuple(calls, fc.array(tie("tree"), { minLength: 3, maxLength: 3 }))
      .map(([name, args]) => callNode(name, ...args.slice(0, functions[name][1]))),
  ),
}));

describe("rewriting", () => {
  test("printed text reads back as the same tree, by strict rules too", () => {
    fc.assert(
      fc.property(tree, (node) => {
        const text = printLine(node);
        fc.pre(text.length <= 8192);
        expect(parseLine(text, { strict: true })).toEqual(node);
      }),
      { numRuns: 1000 },
    );
  });

  test.each([
    ["a-(b-c)", "a-(b-c)"],
    ["(a-b)-c", "a-b-c"],
    ["(a*b)/c", "a*b/c"],
    ["a/(b*c)", "a/(b*c)"],
    ["-(x^2)", "-(x^2)"],
    ["(-x)^2", "(-x)^2"],
    ["a*(-b)", "a*(-b)"],
    ["2 ^ 3 ^ 2", "(2^3)^2"],
    ["if( Re<=2300 , 3.66 , f )", "IF(Re<=2300,3.66,f)"],
    ["1400000000*0.00012", "1.4e9*1.2e-4"],
    ["2300+0.001", "2300+0.001"],
    ['"a ""b"""', '"a ""b"""'],
  ])("%s prints as %s", (text, printed) => {
    expect(printLine(parseLine(text))).toBe(printed);
  });

  test("symbols come once, in order of first use; function names are none", () => {
    expect(symbolsOf(parseLine("Re*Pr+MAX(Re,L)+PI()"))).toEqual(["Re", "Pr", "L"]);
  });

  test("renaming and substituting leave other symbols alone", () => {
    expect(printLine(renameSymbols(parseLine("Ra+constructor+Pr"), { Ra: "Ra_V" }))).toBe("Ra_V+constructor+Pr");
    expect(printLine(substitute(parseLine("0.59*Ra^0.25"), { Ra: parseLine("Gr*Pr") }))).toBe("0.59*(Gr*Pr)^0.25");
    expect(printLine(substitute(parseLine("-Ra"), { Ra: parseLine("-x") }))).toBe("-(-x)");
  });
});
