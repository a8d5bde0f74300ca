/** A line typeset as presentation MathML, straight from its tree. */
import type { FunctionName, Node, Operator } from "./line.js";
import { printNumber } from "./rewrite.js";

/** `symbol` gives the MathML of a symbol; without one of its own, `plainSymbol` typesets a name. */
export function toMathML(name: string, node: Node, symbol: (name: string) => string = plainSymbol): string {
  return `<math display="block"><mrow>${symbol(name)}<mo>=</mo>${new Typesetter(symbol).whole(node)}</mrow></math>`;
}

/** `Nu_V` as Nu with the subscript V; one letter slanted, several upright, as the trade prints groups. */
export function plainSymbol(name: string): string {
  const [base, ...rest] = name.split("_") as [string, ...string[]];
  if (base === "" || rest.length === 0) return identifier(name);
  return `<msub>${identifier(base)}${identifier(rest.join(","))}</msub>`;
}

function identifier(name: string): string {
  return name.length === 1 ? `<mi>${escapeXml(name)}</mi>` : `<mi mathvariant="normal">${escapeXml(name)}</mi>`;
}

export function escapeXml(text: string): string {
  return text.replace(/[&<>"']/g, (found) => `&#${found.charCodeAt(0)};`);
}

const signs: Readonly<Record<Operator, string>> = {
  "+": "+",
  "-": "−",
  "*": "⋅",
  "/": "/",
  "^": "^",
  "=": "=",
  "<>": "≠",
  "<": "&lt;",
  "<=": "≤",
  ">": "&gt;",
  ">=": "≥",
};

const functionWords: Readonly<Partial<Record<FunctionName, string>>> = {
  MIN: "min",
  MAX: "max",
  EXP: "exp",
  LN: "ln",
  SINH: "sinh",
  COSH: "cosh",
  TANH: "tanh",
  ATANH: "artanh",
  SIN: "sin",
  COS: "cos",
  TAN: "tan",
  ASIN: "arcsin",
  ACOS: "arccos",
  ATAN: "arctan",
  SIGN: "sgn",
  ROUND: "round",
  ERF: "erf",
  NOT: "not",
};

class Typesetter {
  constructor(private readonly symbol: (name: string) => string) {}

  whole(node: Node): string {
    switch (node.kind) {
      case "number":
        return number(node.value);
      case "text":
        return `<mtext>${escapeXml(node.value)}</mtext>`;
      case "name":
        return this.symbol(node.name);
      case "minus":
        return `<mrow><mo form="prefix">−</mo>${this.within(node.of, 2)}</mrow>`;
      case "binary":
        return this.binary(node);
      case "call":
        return this.call(node);
    }
  }

  private binary(node: Node & { kind: "binary" }): string {
    switch (node.operator) {
      case "/":
        return this.fraction(node);
      case "^":
        return this.power(node.left, node.right);
      case "*":
        return this.product(node);
      case "+":
      case "-":
        return `<mrow>${this.within(node.left, 1)}<mo>${signs[node.operator]}</mo>${this.term(node.right, node.operator)}</mrow>`;
      default:
        return `<mrow>${this.within(node.left, 1)}<mo>${signs[node.operator]}</mo>${this.within(node.right, 1)}</mrow>`;
    }
  }

  /** a−(b+c) keeps its brackets; so does anything after a sign that begins with a sign. */
  private term(node: Node, operator: Operator): string {
    return this.within(node, operator === "-" || node.kind === "minus" ? 2 : 1);
  }

  /** a/b/c is one fraction over b·c. */
  private fraction(node: Node & { kind: "binary" }): string {
    let above = node.left;
    const below = [node.right];
    while (above.kind === "binary" && above.operator === "/") {
      below.unshift(above.right);
      above = above.left;
    }
    const under = below.length === 1 ? this.whole(below[0] as Node) : `<mrow>${below.map((one) => this.factor(one)).join(times)}</mrow>`;
    return `<mfrac>${this.whole(above)}${under}</mfrac>`;
  }

  private product(node: Node & { kind: "binary" }): string {
    const gap = startsWithDigit(node.right) || node.right.kind === "call" ? times : thinTimes;
    return `<mrow>${this.factor(node.left)}${gap}${this.factor(node.right)}</mrow>`;
  }

  private factor(node: Node): string {
    return this.within(node, 2);
  }

  private power(base: Node, exponent: Node): string {
    const root = rootOf(exponent);
    if (root === 2) return `<msqrt>${this.whole(base)}</msqrt>`;
    if (root === 3) return `<mroot><mrow>${this.whole(base)}</mrow><mn>3</mn></mroot>`;
    return `<msup>${this.powerBase(base)}${this.exponent(exponent)}</msup>`;
  }

  private powerBase(base: Node): string {
    const bare =
      base.kind === "name" || (base.kind === "number" && !isScientific(base.value)) || (base.kind === "call" && base.name === "ABS");
    return bare ? this.whole(base) : brackets(this.whole(base));
  }

  /** Exponents such as 9/16 on one line, as printed tables do. */
  private exponent(node: Node): string {
    if (node.kind === "binary" && node.operator === "/" && node.left.kind === "number" && node.right.kind === "number") {
      return `<mrow>${number(node.left.value)}<mo>/</mo>${number(node.right.value)}</mrow>`;
    }
    return this.whole(node);
  }

  private call(node: Node & { kind: "call" }): string {
    const [first, second] = node.args as readonly [Node, Node];
    switch (node.name) {
      case "IF":
        return this.cases(node);
      case "SQRT":
        return `<msqrt>${this.whole(first)}</msqrt>`;
      case "POWER":
        return this.power(first, second);
      case "ABS":
        return `<mrow><mo stretchy="true">|</mo>${this.whole(first)}<mo stretchy="true">|</mo></mrow>`;
      case "INT":
        return `<mrow><mo>⌊</mo>${this.whole(first)}<mo>⌋</mo></mrow>`;
      case "PI":
        return `<mi>π</mi>`;
      case "RADIANS":
        return `<mrow>${this.within(first, 2)}<mo>°</mo></mrow>`;
      case "LOG10":
        return applied(`<msub>${upright("log")}<mn>10</mn></msub>`, this.whole(first));
      case "LOG":
        return applied(`<msub>${upright("log")}${node.args.length === 1 ? "<mn>10</mn>" : this.whole(second)}</msub>`, this.whole(first));
      case "SUM":
        return `<mrow>${node.args.map((one) => this.within(one, 1)).join("<mo>+</mo>")}</mrow>`;
      case "AND":
      case "OR":
        return `<mrow>${node.args.map((one) => this.whole(one)).join(`<mtext> ${node.name.toLowerCase()} </mtext>`)}</mrow>`;
      default:
        return applied(
          upright(functionWords[node.name] ?? node.name.toLowerCase()),
          node.args.map((one) => this.whole(one)).join("<mo>,</mo>"),
        );
    }
  }

  /** IFs in the last place continue the same list of cases; an unknown word's 0/0 is no case. */
  private cases(node: Node & { kind: "call" }): string {
    const rows: string[] = [];
    let rest: Node = node;
    while (rest.kind === "call" && rest.name === "IF") {
      const [test, yes, no] = rest.args as readonly [Node, Node, Node];
      rows.push(row(this.whole(yes), `<mrow><mtext>if </mtext>${this.whole(test)}</mrow>`));
      rest = no;
    }
    if (!isNoNumber(rest)) rows.push(row(this.whole(rest), "<mtext>otherwise</mtext>"));
    return `<mrow><mo stretchy="true">{</mo><mtable columnalign="left left">${rows.join("")}</mtable></mrow>`;
  }

  /** In brackets where the node binds less tightly than its surroundings: 1 a term of a sum, 2 a factor. */
  private within(node: Node, surroundings: 1 | 2): string {
    const text = this.whole(node);
    return looseness(node) < surroundings ? brackets(text) : text;
  }
}

const thinTimes = `<mo lspace="0.1em" rspace="0.1em">&#x2062;</mo>`;
const times = "<mo>⋅</mo>";

/** 0 comparison or cases, 1 sum or sign, 2 anything that may stand as a factor. */
function looseness(node: Node): number {
  if (node.kind === "minus") return 1;
  if (node.kind === "call") return node.name === "IF" || node.name === "AND" || node.name === "OR" ? 0 : node.name === "SUM" ? 1 : 2;
  if (node.kind !== "binary") return 2;
  if (node.operator === "+" || node.operator === "-") return 1;
  return node.operator === "*" || node.operator === "/" || node.operator === "^" ? 2 : 0;
}

function startsWithDigit(node: Node): boolean {
  if (node.kind === "number") return true;
  if (node.kind !== "binary") return false;
  return node.operator === "^" || node.operator === "*" ? startsWithDigit(node.left) : false;
}

/** 2 for a square root, 3 for a cube root. */
function rootOf(exponent: Node): 2 | 3 | undefined {
  if (exponent.kind === "number") return exponent.value === 0.5 ? 2 : undefined;
  if (exponent.kind !== "binary" || exponent.operator !== "/") return undefined;
  const { left, right } = exponent;
  if (left.kind !== "number" || right.kind !== "number" || left.value !== 1) return undefined;
  return right.value === 2 || right.value === 3 ? right.value : undefined;
}

function isNoNumber(node: Node): boolean {
  return node.kind === "binary" && node.operator === "/" && node.right.kind === "number" && node.right.value === 0;
}

function brackets(inner: string): string {
  return `<mrow><mo>(</mo>${inner}<mo>)</mo></mrow>`;
}

function applied(word: string, inner: string): string {
  return `<mrow>${word}<mo>&#x2061;</mo>${brackets(inner)}</mrow>`;
}

function upright(word: string): string {
  return `<mi mathvariant="normal">${word}</mi>`;
}

function row(value: string, condition: string): string {
  return `<mtr><mtd>${value}</mtd><mtd>${condition}</mtd></mtr>`;
}

function isScientific(value: number): boolean {
  return value !== 0 && (value >= 1e6 || value < 1e-3);
}

function number(value: number): string {
  if (!isScientific(value)) return `<mn>${printNumber(value)}</mn>`;
  const [digits, exponent] = value.toExponential().split("e") as [string, string];
  const power = Number(exponent);
  const sign = power < 0 ? `<mrow><mo form="prefix">−</mo><mn>${-power}</mn></mrow>` : `<mn>${power}</mn>`;
  const ten = `<msup><mn>10</mn>${sign}</msup>`;
  return digits === "1" ? ten : `<mrow><mn>${digits}</mn>${times}${ten}</mrow>`;
}
