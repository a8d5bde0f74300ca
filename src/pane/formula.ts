/**
 * The text of a cell's formula read into a tree, with the precedence that a spreadsheet has, so that the pane can find the FILM calls in it and their
 * arguments. Hostile text never throws: what cannot be read says where.
 */
import { type Reference, parseArea, parsePrefix } from "./reference.js";

export type Operator = "+" | "-" | "*" | "/" | "^" | "&" | "=" | "<>" | "<" | "<=" | ">" | ">=";

/** From `start` up to `end` in the formula's text. */
export interface Span {
  readonly start: number;
  readonly end: number;
}

export type Expression = Span &
  (
    | { readonly kind: "number"; readonly value: number }
    | { readonly kind: "text"; readonly value: string }
    | { readonly kind: "boolean"; readonly value: boolean }
    | { readonly kind: "error"; readonly code: string }
    | { readonly kind: "array"; readonly rows: readonly (readonly Expression[])[] }
    | { readonly kind: "reference"; readonly reference: Reference }
    | { readonly kind: "name"; readonly name: string }
    | { readonly kind: "sign"; readonly operator: "+" | "-" | "@"; readonly of: Expression }
    | { readonly kind: "percent"; readonly of: Expression }
    | { readonly kind: "binary"; readonly operator: Operator; readonly left: Expression; readonly right: Expression }
    | Call
    /** A piece that stands for a value we cannot work out ourselves, such as `A1:INDEX(…)`. */
    | { readonly kind: "other" }
  );

/** An omitted argument is undefined. */
export interface Call {
  readonly kind: "call";
  readonly name: string;
  /** The id of a FILM function, e.g. "FREE.PLATE"; undefined for any other function. */
  readonly film: string | undefined;
  readonly args: readonly (Expression | undefined)[];
}

export type FilmCall = Span & Call & { readonly film: string };

export interface Unread {
  readonly unread: true;
  /** Counted from 0 in the formula's text. */
  readonly at: number;
}

const longest = 8192;
const deepest = 64;

/** Reads a formula, with or without its "=". */
export function parseFormula(text: string): Expression | Unread {
  if (text.length > longest) return { unread: true, at: longest };
  try {
    return new Reader(text).whole();
  } catch (trouble) {
    if (trouble instanceof Trouble) return { unread: true, at: trouble.at };
    throw trouble;
  }
}

export function isUnread(thing: Expression | Unread): thing is Unread {
  return "unread" in thing;
}

/** Every FILM call of a formula, the outer before the inner, left before right. */
export function filmCalls(expression: Expression): readonly FilmCall[] {
  const found: FilmCall[] = [];
  walk(expression, (one) => {
    if (one.kind === "call" && one.film !== undefined) found.push(one as FilmCall);
  });
  return found;
}

export function walk(expression: Expression, visit: (one: Expression) => void): void {
  visit(expression);
  for (const part of partsOf(expression)) walk(part, visit);
}

function partsOf(expression: Expression): readonly Expression[] {
  switch (expression.kind) {
    case "call":
      return expression.args.filter((one): one is Expression => one !== undefined);
    case "binary":
      return [expression.left, expression.right];
    case "sign":
    case "percent":
      return [expression.of];
    case "array":
      return expression.rows.flat();
    default:
      return [];
  }
}

/**
 * The id of a FILM function, however the host or the file spells it: `FILM.FREE.PLATE`, `film.free.plate`, `_xldudf_FILM_FREE_PLATE`; undefined for others.
 */
export function filmId(name: string): string | undefined {
  const bare = name.replace(/^(?:_xl[a-z]+[._])+/i, "").toUpperCase();
  const found = /^FILM[._]([A-Z0-9][A-Z0-9._]*)$/.exec(bare);
  return found?.[1]?.replace(/_/g, ".");
}

class Trouble extends Error {
  constructor(readonly at: number) {
    super(`The formula cannot be read from place ${at} on.`);
  }
}

interface Token extends Span {
  readonly kind: "number" | "text" | "error" | "reference" | "word" | "table" | "sign" | "end";
  readonly text: string;
  /** The function's name is directly followed by its bracket. */
  readonly opens?: boolean;
}

const sheetName = String.raw`(?:'(?:[^']|'')+'!|(?:\[[^\][]*\])?[\p{L}_\\][\p{L}\p{N}_.\\?]*(?::[\p{L}_\\][\p{L}\p{N}_.\\?]*)?!)`;
const cellName = String.raw`\$?[A-Za-z]{1,3}\$?\d{1,7}`;
const areaName = String.raw`(?:${cellName}:${cellName}|\$?[A-Za-z]{1,3}:\$?[A-Za-z]{1,3}|\$?\d{1,7}:\$?\d{1,7}|${cellName})`;
const afterName = String.raw`(?![\p{L}\p{N}_.(\\?!])`;
const pattern = new RegExp(
  [
    String.raw`(?<space>\s+)`,
    String.raw`(?<text>"(?:[^"]|"")*")`,
    String.raw`(?<error>#(?:N\/A|VALUE!|REF!|DIV\/0!|NUM!|NAME\?|NULL!|SPILL!|CALC!|GETTING_DATA|BUSY!|FIELD!|BLOCKED!|CONNECT!|UNKNOWN!))`,
    String.raw`(?<reference>(?:${sheetName})?${areaName}${afterName})`,
    String.raw`(?<number>(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?)`,
    String.raw`(?<table>(?:[\p{L}_\\][\p{L}\p{N}_.\\?]*)?\[(?:[^\][]|\[[^\][]*\])*\])`,
    String.raw`(?<word>(?:${sheetName})?[\p{L}_\\][\p{L}\p{N}_.\\?]*)`,
    String.raw`(?<sign><=|>=|<>|[-+*/^&=<>%(),;{}:#@!])`,
  ].join("|"),
  "uy",
);
const kinds = ["text", "error", "reference", "number", "table", "word", "sign"] as const;

function tokensOf(text: string): readonly Token[] {
  const tokens: Token[] = [];
  let from = 0;
  while (from < text.length) {
    pattern.lastIndex = from;
    const groups = pattern.exec(text)?.groups;
    if (groups === undefined) throw new Trouble(from);
    const end = pattern.lastIndex;
    const kind = kinds.find((one) => groups[one] !== undefined);
    if (kind !== undefined) tokens.push({ kind, text: groups[kind] as string, start: from, end, opens: text[end] === "(" });
    from = end;
  }
  tokens.push({ kind: "end", text: "", start: text.length, end: text.length });
  return tokens;
}

const levels: readonly (readonly string[])[] = [["=", "<>", "<", "<=", ">", ">="], ["&"], ["+", "-"], ["*", "/"], ["^"]];

class Reader {
  private readonly tokens: readonly Token[];
  private at = 0;
  private depth = 0;

  constructor(text: string) {
    this.tokens = tokensOf(text);
  }

  whole(): Expression {
    if (this.isSign("=")) this.at++;
    const expression = this.binary(0);
    if (this.token.kind !== "end") throw new Trouble(this.token.start);
    return expression;
  }

  private get token(): Token {
    return this.tokens[this.at] as Token;
  }

  private isSign(text: string): boolean {
    return this.token.kind === "sign" && this.token.text === text;
  }

  private take(text: string): Token {
    if (!this.isSign(text)) throw new Trouble(this.token.start);
    return this.tokens[this.at++] as Token;
  }

  private binary(level: number): Expression {
    const signs = levels[level];
    if (signs === undefined) return this.signed();
    let left = this.binary(level + 1);
    while (this.token.kind === "sign" && signs.includes(this.token.text)) {
      const operator = this.token.text as Operator;
      this.at++;
      const right = this.binary(level + 1);
      left = { kind: "binary", operator, left, right, start: left.start, end: right.end };
    }
    return left;
  }

  private signed(): Expression {
    const { token } = this;
    const operator = token.kind === "sign" ? token.text : "";
    if (operator !== "+" && operator !== "-" && operator !== "@") return this.postfixed();
    this.at++;
    const of = this.deeper(() => this.signed());
    return { kind: "sign", operator, of, start: token.start, end: of.end };
  }

  private postfixed(): Expression {
    let one = this.single();
    while (this.token.kind === "sign" && (this.token.text === "%" || this.token.text === "#" || this.token.text === ":")) {
      const { text, end } = this.token;
      this.at++;
      if (text === "%") one = { kind: "percent", of: one, start: one.start, end };
      else if (text === "#") one = spilled(one, end);
      else one = { kind: "other", start: one.start, end: this.single().end };
    }
    return one;
  }

  private deeper<T>(read: () => T): T {
    if (++this.depth > deepest) throw new Trouble(this.token.start);
    const result = read();
    this.depth--;
    return result;
  }

  private single(): Expression {
    const { token } = this;
    const { start, end, text } = token;
    if (token.kind === "sign") return this.bracketed();
    this.at++;
    switch (token.kind) {
      case "number":
        return { kind: "number", value: Number(text), start, end };
      case "text":
        return { kind: "text", value: text.slice(1, -1).replace(/""/g, '"'), start, end };
      case "error":
        return { kind: "error", code: text.toUpperCase(), start, end };
      case "reference":
        return referenceOf(token);
      case "table":
        return { kind: "name", name: text, start, end };
      case "word":
        return token.opens === true ? this.deeper(() => this.call(token)) : wordOf(token);
      default:
        throw new Trouble(start);
    }
  }

  private bracketed(): Expression {
    const { start } = this.token;
    if (this.isSign("{")) return this.array();
    this.take("(");
    const inner = this.deeper(() => this.binary(0));
    if (this.isSign(",")) return this.union(start);
    const { end } = this.take(")");
    return { ...inner, start, end };
  }

  /** `(A1,B2)`: several areas in one argument are nothing a FILM function takes; the host may still know its value. */
  private union(start: number): Expression {
    while (this.isSign(",")) {
      this.at++;
      this.deeper(() => this.binary(0));
    }
    return { kind: "other", start, end: this.take(")").end };
  }

  private array(): Expression {
    const { start } = this.take("{");
    const rows: Expression[][] = [[]];
    for (;;) {
      (rows[rows.length - 1] as Expression[]).push(this.constant());
      if (this.isSign(",")) this.at++;
      else if (this.isSign(";")) {
        this.at++;
        rows.push([]);
      } else break;
    }
    const { end } = this.take("}");
    if (rows.some((row) => row.length !== rows[0]?.length)) throw new Trouble(start);
    return { kind: "array", rows, start, end };
  }

  private constant(): Expression {
    const one = this.deeper(() => this.signed());
    const bare = one.kind === "sign" ? one.of : one;
    if (!["number", "text", "boolean", "error", "percent"].includes(bare.kind)) throw new Trouble(one.start);
    return one;
  }

  private call(token: Token): Expression {
    this.take("(");
    const args: (Expression | undefined)[] = [];
    if (!this.isSign(")")) {
      for (;;) {
        args.push(this.isSign(",") || this.isSign(")") ? undefined : this.binary(0));
        if (!this.isSign(",")) break;
        this.at++;
      }
    }
    const { end } = this.take(")");
    return { kind: "call", name: token.text, film: filmId(token.text), args, start: token.start, end };
  }
}

function spilled(one: Expression, end: number): Expression {
  if (one.kind !== "reference") throw new Trouble(one.end);
  return { ...one, reference: { ...one.reference, spilled: true }, end };
}

function referenceOf(token: Token): Expression {
  const { text, start, end } = token;
  const cut = text.lastIndexOf("!") + 1;
  const area = parseArea(text.slice(cut));
  const prefix = cut === 0 ? {} : parsePrefix(text.slice(0, cut));
  if (area !== undefined && prefix !== undefined) return { kind: "reference", reference: { ...prefix, ...area }, start, end };
  return cut === 0 && /^[\p{L}_]/u.test(text) ? { kind: "name", name: text, start, end } : { kind: "other", start, end };
}

function wordOf(token: Token): Expression {
  const { text, start, end } = token;
  if (/^(?:TRUE|FALSE)$/i.test(text)) return { kind: "boolean", value: text.toUpperCase() === "TRUE", start, end };
  return { kind: "name", name: text, start, end };
}
