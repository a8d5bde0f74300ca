/** One tree compiled to one closure. Constants are folded and the common shapes have closures of their own, because each call costs. */
import { erf } from "./erf.js";
import type { Comparison, FunctionName, Node } from "./line.js";
import { powerOf } from "./power.js";
import { textCode } from "./text-code.js";

/** Reads its operands from their slots and gives the value; truth is 1 and 0. */
export type Step = (values: Float64Array) => number;

type Piece =
  | { readonly kind: "constant"; readonly value: number }
  | { readonly kind: "slot"; readonly slot: number }
  | { readonly kind: "step"; readonly step: Step };

/** Compiles a tree; `slot` gives the place of each symbol. */
export function compileNode(node: Node, slot: (name: string) => number): Step {
  return asStep(compile(node, slot));
}

function asStep(piece: Piece): Step {
  if (piece.kind === "step") return piece.step;
  if (piece.kind === "constant") {
    const { value } = piece;
    return () => value;
  }
  const { slot } = piece;
  return (v) => v[slot] as number;
}

function constant(value: number): Piece {
  return { kind: "constant", value };
}

function stepOf(step: Step): Piece {
  return { kind: "step", step };
}

function compile(node: Node, slot: (name: string) => number): Piece {
  switch (node.kind) {
    case "number":
      return constant(node.value);
    case "text":
      return constant(textCode(node.value));
    case "name":
      return { kind: "slot", slot: slot(node.name) };
    case "minus":
      return map(compile(node.of, slot), (x) => -x);
    case "binary":
      return compileBinary(node, slot);
    case "call":
      return compileCall(
        node.name,
        node.args.map((one) => compile(one, slot)),
      );
  }
}

function map(of: Piece, f: (x: number) => number): Piece {
  if (of.kind === "constant") return constant(f(of.value));
  if (of.kind === "slot") {
    const { slot } = of;
    return stepOf((v) => f(v[slot] as number));
  }
  const { step } = of;
  return stepOf((v) => f(step(v)));
}

function compileBinary(node: Node & { kind: "binary" }, slot: (name: string) => number): Piece {
  const a = compile(node.left, slot);
  const b = compile(node.right, slot);
  switch (node.operator) {
    case "+":
      return a.kind === "constant" ? plus(b, a) : plus(a, b);
    case "-":
      return b.kind === "constant" ? plus(a, constant(-b.value)) : minus(a, b);
    case "*":
      return a.kind === "constant" ? times(b, a) : times(a, b);
    case "/":
      return over(a, b);
    case "^":
      return power(a, b);
    default:
      return comparison(node.operator, a, b);
  }
}

function plus(a: Piece, b: Piece): Piece {
  if (b.kind === "constant") {
    const c = b.value;
    if (a.kind === "constant") return constant(a.value + c);
    if (a.kind === "step") {
      const f = a.step;
      return stepOf((v) => f(v) + c);
    }
    const i = a.slot;
    return stepOf((v) => (v[i] as number) + c);
  }
  if (a.kind === "slot" && b.kind === "slot") {
    const [i, j] = [a.slot, b.slot];
    return stepOf((v) => (v[i] as number) + (v[j] as number));
  }
  const [f, g] = [asStep(a), asStep(b)];
  return stepOf((v) => f(v) + g(v));
}

function minus(a: Piece, b: Piece): Piece {
  if (a.kind === "constant") {
    const c = a.value;
    const g = asStep(b);
    return stepOf((v) => c - g(v));
  }
  if (a.kind === "slot" && b.kind === "slot") {
    const [i, j] = [a.slot, b.slot];
    return stepOf((v) => (v[i] as number) - (v[j] as number));
  }
  const [f, g] = [asStep(a), asStep(b)];
  return stepOf((v) => f(v) - g(v));
}

function times(a: Piece, b: Piece): Piece {
  if (b.kind === "constant") {
    const c = b.value;
    if (a.kind === "constant") return constant(a.value * c);
    if (a.kind === "step") {
      const f = a.step;
      return stepOf((v) => f(v) * c);
    }
    const i = a.slot;
    return stepOf((v) => (v[i] as number) * c);
  }
  if (a.kind === "slot" && b.kind === "slot") {
    const [i, j] = [a.slot, b.slot];
    return stepOf((v) => (v[i] as number) * (v[j] as number));
  }
  const [f, g] = [asStep(a), asStep(b)];
  return stepOf((v) => f(v) * g(v));
}

function over(a: Piece, b: Piece): Piece {
  if (b.kind === "constant") {
    const c = b.value;
    return map(a, (x) => x / c);
  }
  if (a.kind === "constant" && b.kind === "slot") {
    const [c, j] = [a.value, b.slot];
    return stepOf((v) => c / (v[j] as number));
  }
  if (a.kind === "slot" && b.kind === "slot") {
    const [i, j] = [a.slot, b.slot];
    return stepOf((v) => (v[i] as number) / (v[j] as number));
  }
  const [f, g] = [asStep(a), asStep(b)];
  return stepOf((v) => f(v) / g(v));
}

function power(a: Piece, b: Piece): Piece {
  if (b.kind !== "constant") {
    const [f, g] = [asStep(a), asStep(b)];
    return stepOf((v) => f(v) ** g(v));
  }
  if (a.kind === "constant") return constant(a.value ** b.value);
  return stepOf(powerOf(asStep(a), b.value));
}

function comparison(operator: Comparison, a: Piece, b: Piece): Piece {
  const [f, g] = [asStep(a), asStep(b)];
  const holds = comparisons[operator];
  if (a.kind === "constant" && b.kind === "constant") return constant(holds(a.value, b.value) ? 1 : 0);
  switch (operator) {
    case "<=":
      return stepOf((v) => (f(v) <= g(v) ? 1 : 0));
    case "<":
      return stepOf((v) => (f(v) < g(v) ? 1 : 0));
    default:
      return stepOf((v) => (holds(f(v), g(v)) ? 1 : 0));
  }
}

const comparisons: Readonly<Record<Comparison, (a: number, b: number) => boolean>> = {
  "=": (a, b) => a === b,
  "<>": (a, b) => a !== b,
  "<": (a, b) => a < b,
  "<=": (a, b) => a <= b,
  ">": (a, b) => a > b,
  ">=": (a, b) => a >= b,
};

function compileCall(name: FunctionName, args: readonly Piece[]): Piece {
  const [first, second, third] = args as readonly [Piece, Piece, Piece];
  if (name === "PI") return constant(Math.PI);
  if (name === "IF") return choice(first, second, third);
  if (name === "POWER") return power(first, second);
  if (name === "LOG") return args.length === 1 ? map(first, Math.log10) : pair(first, second, (x, base) => Math.log(x) / Math.log(base));
  if (name === "ROUND") return pair(first, second, round);
  if (name in folds) return args.slice(1).reduce((sofar, one) => pair(sofar, one, folds[name] as Fold), startOf(name, first));
  return map(first, ofOne[name] as (x: number) => number);
}

function choice(test: Piece, yes: Piece, no: Piece): Piece {
  if (test.kind === "constant") return test.value === 0 ? no : yes;
  const [f, g, h] = [asStep(test), asStep(yes), asStep(no)];
  return stepOf((v) => (f(v) !== 0 ? g(v) : h(v)));
}

type Fold = (a: number, b: number) => number;

function pair(a: Piece, b: Piece, f: Fold): Piece {
  if (a.kind === "constant" && b.kind === "constant") return constant(f(a.value, b.value));
  const [g, h] = [asStep(a), asStep(b)];
  if (f === Math.min) return stepOf((v) => Math.min(g(v), h(v)));
  if (f === Math.max) return stepOf((v) => Math.max(g(v), h(v)));
  return stepOf((v) => f(g(v), h(v)));
}

const folds: Readonly<Partial<Record<FunctionName, Fold>>> = {
  MIN: Math.min,
  MAX: Math.max,
  SUM: (a, b) => a + b,
  AND: (a, b) => (a !== 0 && b !== 0 ? 1 : 0),
  OR: (a, b) => (a !== 0 || b !== 0 ? 1 : 0),
};

/** AND and OR of one argument still give 1 or 0. */
function startOf(name: FunctionName, first: Piece): Piece {
  return name === "AND" || name === "OR" ? map(first, (x) => (x !== 0 ? 1 : 0)) : first;
}

const ofOne: Readonly<Partial<Record<FunctionName, (x: number) => number>>> = {
  SQRT: Math.sqrt,
  EXP: Math.exp,
  LN: Math.log,
  LOG10: Math.log10,
  SINH: Math.sinh,
  COSH: Math.cosh,
  TANH: Math.tanh,
  ATANH: Math.atanh,
  SIN: Math.sin,
  COS: Math.cos,
  TAN: Math.tan,
  ASIN: Math.asin,
  ACOS: Math.acos,
  ATAN: Math.atan,
  ABS: Math.abs,
  SIGN: Math.sign,
  INT: Math.floor,
  NOT: (x) => (x === 0 ? 1 : 0),
  RADIANS: (x) => (x * Math.PI) / 180,
  ERF: erf,
};

/** Half away from zero, on the decimal digits that are shown, as a spreadsheet rounds. */
function round(x: number, digits: number): number {
  const whole = Math.trunc(digits);
  const shifted = Number(`${Math.abs(x)}e${whole}`);
  if (!Number.isFinite(shifted)) return roundScaled(x, 10 ** whole);
  return Math.sign(x) * Number(`${Math.round(shifted)}e${-whole}`);
}

function roundScaled(x: number, scale: number): number {
  return (Math.sign(x) * Math.round(Math.abs(x) * scale)) / scale;
}
