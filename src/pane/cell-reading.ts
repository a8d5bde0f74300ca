/** From the selected cell to the FILM calls in it, their arguments as blocks of values. */
import { answer } from "../cells/answer.js";
import type { CellBlock } from "../cells/cell.js";
import { evaluate, isUnresolved, type LookUp } from "./arithmetic.js";
import { type Call, type Expression, type FilmCall, filmCalls, isUnread, parseFormula } from "./formula.js";
import type { Area, Place, Selection, SheetHost } from "./host.js";
import { type Signature, signatureOf } from "./signature.js";
import { words } from "./words.js";

/** One FILM call with its arguments worked out. */
export interface ReadCall {
  readonly call: FilmCall;
  /** As it stands in the formula. */
  readonly text: string;
  readonly id: string;
  readonly signature: Signature | undefined;
  readonly args: Readonly<Record<string, CellBlock | null>>;
  readonly give: CellBlock | null;
  readonly settings: CellBlock | null;
  /** What stands for each argument in the formula, by the parameter's name; omitted ones are absent. */
  readonly texts: Readonly<Record<string, string>>;
  /** Why the call cannot be explained: sentences for the reader. */
  readonly troubles: readonly string[];
}

/** The selected cell, read. */
export interface ReadCell {
  readonly selection: Selection;
  /** Of the cell itself, or of the one that spills into it. */
  readonly formula: string;
  readonly anchor: Place;
  readonly calls: readonly ReadCall[];
  /** Which cell of the call's block the selected one shows. */
  readonly at: { readonly row: number; readonly column: number };
  /** Set where the formula itself cannot be read. */
  readonly trouble?: string;
}

export async function readSelection(selection: Selection, host: SheetHost): Promise<ReadCell> {
  const { spill } = selection;
  const formula = spill?.formula ?? selection.formula;
  const anchor = spill?.anchor ?? selection.place;
  const at = { row: spill?.rowOffset ?? 0, column: spill?.columnOffset ?? 0 };
  const base = { selection, formula, anchor, at };
  if (!/film/i.test(formula)) return { ...base, calls: [] };
  const tree = parseFormula(formula);
  if (isUnread(tree)) return { ...base, calls: [], trouble: words.trouble.formulaUnread(formula.slice(tree.at, tree.at + 20)) };
  const calls = filmCalls(tree);
  const lookUp = await gather(calls, formula, anchor, host);
  return { ...base, calls: calls.map((call) => readCall(call, formula, lookUp)) };
}

function readCall(call: FilmCall, formula: string, lookUp: LookUp): ReadCall {
  const signature = signatureOf(call.film);
  const text = formula.slice(call.start, call.end);
  const base = { call, text, id: call.film, signature, args: {}, give: null, settings: null, texts: {} };
  if (signature === undefined) return { ...base, troubles: [words.trouble.unknownFunction(call.name)] };
  const { parameters } = signature;
  if (call.args.length > parameters.length) {
    return {
      ...base,
      troubles: [
        words.trouble.tooMany(
          call.args.length,
          parameters.map((one) => one.name),
        ),
      ],
    };
  }
  const blocks: Record<string, CellBlock | null> = {};
  const texts: Record<string, string> = {};
  const troubles: string[] = [];
  parameters.forEach((parameter, i) => {
    const expression = call.args[i];
    blocks[parameter.key] = null;
    if (expression === undefined) return;
    texts[parameter.name] = formula.slice(expression.start, expression.end);
    const value = evaluate(expression, lookUp);
    if (isUnresolved(value))
      troubles.push(words.trouble.argument(parameter.name, formula.slice(value.unresolved.start, value.unresolved.end)));
    else blocks[parameter.key] = value;
  });
  const { give = null, settings = null, ...args } = blocks;
  return { ...base, args, give, settings, texts, troubles };
}

/** Answers a FILM call that stands inside another formula's argument. */
function nested(call: Call, lookUp: LookUp): CellBlock | undefined {
  const signature = signatureOf(call.film ?? "");
  if (signature === undefined || call.args.length > signature.parameters.length) return undefined;
  const blocks: Record<string, CellBlock | null> = {};
  for (const [i, parameter] of signature.parameters.entries()) {
    const expression = call.args[i];
    const value = expression === undefined ? null : evaluate(expression, lookUp);
    if (value !== null && isUnresolved(value)) return undefined;
    blocks[parameter.key] = value;
  }
  const { give = null, settings = null, ...args } = blocks;
  return answer(signature.id, args, give, settings);
}

/** Asks the host once for everything that the calls refer to. */
async function gather(calls: readonly FilmCall[], formula: string, anchor: Place, host: SheetHost): Promise<LookUp> {
  const references: (Expression & { kind: "reference" })[] = [];
  const foreign: Expression[] = [];
  for (const call of calls) for (const argument of call.args) if (argument !== undefined) collect(argument, references, foreign);
  const known = new Map<Expression, CellBlock>();
  const local = references.filter((one) => one.reference.book === undefined);
  const blocks = local.length === 0 ? [] : await host.read(local.map((one) => areaOf(one, anchor)));
  local.forEach((one, i) => {
    const block = blocks[i];
    if (block !== undefined) known.set(one, block);
  });
  for (const one of foreign) {
    const block = await foreignValue(one, formula, anchor, host);
    if (block !== undefined) known.set(one, block);
  }
  const lookUp: LookUp = (expression) => {
    const value = known.get(expression);
    if (value !== undefined) return value;
    return expression.kind === "call" && expression.film !== undefined ? nested(expression, lookUp) : undefined;
  };
  return lookUp;
}

function collect(expression: Expression, references: (Expression & { kind: "reference" })[], foreign: Expression[]): void {
  switch (expression.kind) {
    case "reference":
      references.push(expression);
      return;
    case "name":
    case "other":
      foreign.push(expression);
      return;
    case "call":
      if (expression.film === undefined) foreign.push(expression);
      else for (const one of expression.args) if (one !== undefined) collect(one, references, foreign);
      return;
    case "sign":
      if (expression.operator === "@") foreign.push(expression);
      collect(expression.of, references, foreign);
      return;
    case "percent":
      collect(expression.of, references, foreign);
      return;
    case "binary":
      collect(expression.left, references, foreign);
      collect(expression.right, references, foreign);
      return;
    default:
      return;
  }
}

function areaOf(one: Expression & { kind: "reference" }, anchor: Place): Area {
  const { sheet, row, column, rows, columns, spilled } = one.reference;
  return { sheet: sheet ?? anchor.sheet, row, column, rows, columns, ...(spilled === true ? { spilled } : {}) };
}

async function foreignValue(one: Expression, formula: string, anchor: Place, host: SheetHost): Promise<CellBlock | undefined> {
  if (one.kind === "name") {
    const named = await host.readName(one.name, anchor);
    if (named !== undefined) return named;
  }
  return host.evaluate?.(formula.slice(one.start, one.end), anchor);
}
