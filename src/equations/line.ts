/** The small algebra: one line of spreadsheet algebra read into a tree, with the precedence that a spreadsheet has. */

export type Operator = "+" | "-" | "*" | "/" | "^" | Comparison;
export type Comparison = "=" | "<>" | "<" | "<=" | ">" | ">=";

/** Number nodes are never negative: a minus sign is a node of its own, so that what is printed reads back as the same tree. */
export type Node =
  | { readonly kind: "number"; readonly value: number }
  | { readonly kind: "text"; readonly value: string }
  | { readonly kind: "name"; readonly name: string }
  | { readonly kind: "minus"; readonly of: Node }
  | { readonly kind: "binary"; readonly operator: Operator; readonly left: Node; readonly right: Node }
  | { readonly kind: "call"; readonly name: FunctionName; readonly args: readonly Node[] };

/** Every function of the algebra with the least and the largest number of its arguments. */
export const functions = {
  IF: [3, 3],
  AND: [1, 30],
  OR: [1, 30],
  NOT: [1, 1],
  MIN: [1, 30],
  MAX: [1, 30],
  SUM: [1, 30],
  SQRT: [1, 1],
  EXP: [1, 1],
  LN: [1, 1],
  LOG10: [1, 1],
  LOG: [1, 2],
  SINH: [1, 1],
  COSH: [1, 1],
  TANH: [1, 1],
  ATANH: [1, 1],
  SIN: [1, 1],
  COS: [1, 1],
  TAN: [1, 1],
  ASIN: [1, 1],
  ACOS: [1, 1],
  ATAN: [1, 1],
  ABS: [1, 1],
  SIGN: [1, 1],
  INT: [1, 1],
  ROUND: [2, 2],
  RADIANS: [1, 1],
  PI: [0, 0],
  POWER: [2, 2],
  ERF: [1, 1],
} as const satisfies Record<string, readonly [least: number, most: number]>;

export type FunctionName = keyof typeof functions;

/** A line that cannot be read; the message is a sentence for an engineer. */
export class LineError extends Error {
  constructor(
    message: string,
    /** Where in the line, counted from 1. */
    readonly position: number,
  ) {
    super(message);
    this.name = "LineError";
  }
}

export interface ReadingRules {
  /** Refuses `-x^y` and `a^b^c`, which a spreadsheet and a paper read differently. Our own records are read so. */
  readonly strict?: boolean;
}

const longestLine = 8192;
const deepestNesting = 100;
const comparisons: ReadonlySet<string> = new Set(["=", "<>", "<", "<=", ">", ">="]);

/** Reads one line of algebra. Throws `LineError` where it cannot be read. */
export function parseLine(text: string, rules: ReadingRules = {}): Node {
  return new Reader(text, rules.strict === true).whole();
}

export function numberNode(value: number): Node {
  return value < 0 || Object.is(value, -0) ? { kind: "minus", of: { kind: "number", value: -value } } : { kind: "number", value };
}

export function nameNode(name: string): Node {
  return { kind: "name", name };
}

export function binaryNode(operator: Operator, left: Node, right: Node): Node {
  return { kind: "binary", operator, left, right };
}

export function callNode(name: FunctionName, ...args: readonly Node[]): Node {
  return { kind: "call", name, args };
}

interface Token {
  readonly kind: "number" | "text" | "word" | "sign" | "end";
  readonly text: string;
  /** Counted from 1. */
  readonly at: number;
}

const pattern =
  /(?<space>\s+)|(?<text>"(?:[^"]|"")*")|(?<number>(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?)|(?<word>[A-Za-z_][A-Za-z0-9_]*)|(?<sign><=|>=|<>|[-+*/^(),<>=])/y;

function tokensOf(text: string): readonly Token[] {
  if (text.length > longestLine)
    throw new LineError(`The line has ${text.length} characters; at most ${longestLine} can be read.`, longestLine);
  const tokens: Token[] = [];
  let from = 0;
  while (from < text.length) {
    pattern.lastIndex = from;
    const groups = pattern.exec(text)?.groups;
    if (groups === undefined) throw strangeCharacter(text, from);
    from = pattern.lastIndex;
    const kind = (["text", "number", "word", "sign"] as const).find((one) => groups[one] !== undefined);
    if (kind !== undefined) tokens.push({ kind, text: groups[kind] ?? "", at: from - (groups[kind] ?? "").length + 1 });
  }
  tokens.push({ kind: "end", text: "", at: text.length + 1 });
  return tokens;
}

function strangeCharacter(text: string, at: number): LineError {
  const found = String.fromCodePoint(text.codePointAt(at) ?? 0);
  if (found === '"') return new LineError(`The text that begins at character ${at + 1} has no closing quotation mark.`, at + 1);
  const hint = hints[found] ?? "write algebra as in a cell, for example 0.3*Re^0.6*Pr^(1/3)";
  return new LineError(`"${found}" at character ${at + 1} is not understood; ${hint}.`, at + 1);
}

const hints: Readonly<Record<string, string>> = {
  "·": "write * for a product",
  "×": "write * for a product",
  "÷": "write / for a quotient",
  "−": "write the minus sign of the keyboard, -",
  "²": "write ^2",
  "³": "write ^3",
  "√": "write SQRT(…)",
  "≤": "write <=",
  "≥": "write >=",
  "≠": "write <>",
  "[": "use round brackets",
  "{": "use round brackets",
  ";": "separate arguments with a comma",
  "%": "write the fraction, for example 0.05",
};

class Reader {
  private readonly tokens: readonly Token[];
  private next = 0;
  private depth = 0;

  constructor(
    text: string,
    private readonly strict: boolean,
  ) {
    this.tokens = tokensOf(text);
  }

  whole(): Node {
    if (this.peek().kind === "end") throw new LineError("The line is empty; write algebra such as 0.3*Re^0.6*Pr^(1/3).", 1);
    const node = this.comparison();
    const rest = this.peek();
    if (rest.kind === "end") return node;
    throw this.leftOver(rest);
  }

  private leftOver(rest: Token): LineError {
    if (rest.text === ",") {
      return new LineError(`A comma stands outside a function at character ${rest.at}; write decimals with a point.`, rest.at);
    }
    if (rest.text === ")") return new LineError(`The closing bracket at character ${rest.at} has no opening one.`, rest.at);
    return new LineError(`An operator is missing before "${rest.text}" at character ${rest.at}; write * for a product.`, rest.at);
  }

  private peek(): Token {
    return this.tokens[Math.min(this.next, this.tokens.length - 1)] as Token;
  }

  private take(): Token {
    const token = this.peek();
    this.next += 1;
    return token;
  }

  private takeSign(...signs: readonly string[]): Token | undefined {
    const token = this.peek();
    if (token.kind !== "sign" || !signs.includes(token.text)) return undefined;
    return this.take();
  }

  private comparison(): Node {
    this.depth += 1;
    if (this.depth > deepestNesting) {
      throw new LineError(
        `Brackets are nested more than ${deepestNesting} deep at character ${this.peek().at}; split the line.`,
        this.peek().at,
      );
    }
    let left = this.sum();
    while (this.peek().kind === "sign" && comparisons.has(this.peek().text)) {
      const operator = this.take().text as Comparison;
      left = binaryNode(operator, left, this.sum());
    }
    this.depth -= 1;
    return left;
  }

  private sum(): Node {
    let left = this.product();
    for (let sign = this.takeSign("+", "-"); sign !== undefined; sign = this.takeSign("+", "-")) {
      left = binaryNode(sign.text as Operator, left, this.product());
    }
    return left;
  }

  private product(): Node {
    let left = this.power();
    for (let sign = this.takeSign("*", "/"); sign !== undefined; sign = this.takeSign("*", "/")) {
      left = binaryNode(sign.text as Operator, left, this.power());
    }
    return left;
  }

  private power(): Node {
    const first = this.peek();
    let base = this.signed();
    for (let powers = 0, sign = this.takeSign("^"); sign !== undefined; sign = this.takeSign("^"), powers += 1) {
      if (this.strict && powers > 0) {
        throw new LineError(`a^b^c at character ${sign.at} can be read two ways; write brackets around the power meant first.`, sign.at);
      }
      if (this.strict && base.kind === "minus" && first.text !== "(") {
        throw new LineError(`-x^y at character ${first.at} can be read two ways; write -(x^y) or (-x)^y.`, first.at);
      }
      base = binaryNode("^", base, this.signed());
    }
    return base;
  }

  private signed(): Node {
    let minus = false;
    let signs = 0;
    for (let sign = this.takeSign("+", "-"); sign !== undefined; sign = this.takeSign("+", "-")) {
      minus = sign.text === "-" ? !minus : minus;
      signs += 1;
    }
    if (signs > 2) throw new LineError(`${signs} signs stand in a row before character ${this.peek().at}; one is enough.`, this.peek().at);
    const node = this.atom();
    return minus ? { kind: "minus", of: node } : node;
  }

  private atom(): Node {
    const token = this.take();
    if (token.kind === "number") return this.number(token);
    if (token.kind === "text") return { kind: "text", value: token.text.slice(1, -1).replaceAll('""', '"') };
    if (token.kind === "word") return this.takeSign("(") === undefined ? nameNode(token.text) : this.call(token);
    if (token.text === "(") return this.bracket(token);
    if (token.kind === "end") throw new LineError("The line ends where a number, a symbol or a bracket is expected.", token.at);
    throw new LineError(`"${token.text}" stands at character ${token.at} where a number, a symbol or a bracket is expected.`, token.at);
  }

  private number(token: Token): Node {
    const value = Number(token.text);
    if (Number.isFinite(value)) return { kind: "number", value };
    throw new LineError(`The number ${token.text} at character ${token.at} is too large.`, token.at);
  }

  private bracket(opening: Token): Node {
    const node = this.comparison();
    this.close(opening);
    return node;
  }

  private close(opening: Token): void {
    if (this.takeSign(")") !== undefined) return;
    const found = this.peek();
    if (found.kind === "end" || found.text === ",") {
      throw new LineError(`The bracket opened at character ${opening.at} is not closed.`, opening.at);
    }
    throw this.leftOver(found);
  }

  private call(word: Token): Node {
    const name = word.text.toUpperCase();
    if (!isFunctionName(name)) {
      const known = Object.keys(functions).join(", ");
      throw new LineError(
        `${word.text} at character ${word.at} is no function of the algebra; known are ${known}. Write * for a product.`,
        word.at,
      );
    }
    const args = this.args(word);
    const [least, most] = functions[name];
    if (args.length >= least && args.length <= most) return { kind: "call", name, args };
    const wanted = least === most ? `${least}` : `${least} to ${most}`;
    throw new LineError(`${name} at character ${word.at} has ${args.length} arguments; it takes ${wanted}.`, word.at);
  }

  private args(word: Token): readonly Node[] {
    if (this.takeSign(")") !== undefined) return [];
    const args = [this.comparison()];
    while (this.takeSign(",") !== undefined) args.push(this.comparison());
    const found = this.peek();
    if (this.takeSign(")") !== undefined) return args;
    if (found.kind === "end") throw new LineError(`The bracket of ${word.text} at character ${word.at} is not closed.`, word.at);
    throw this.leftOver(found);
  }
}

function isFunctionName(name: string): name is FunctionName {
  return name in functions;
}
