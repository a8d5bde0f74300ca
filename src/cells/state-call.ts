import type { WordValue } from "../findings/finding.js";
import type { WordEntry } from "../findings/words.js";
import type { Fluid } from "../fluids/fluid.js";
import { convert } from "../quantities/conversion.js";
import { isProblem, type Problem, sentenceOf, valueProblem } from "../quantities/problems.js";
import type { Quantity } from "../quantities/quantity.js";
import { defaultUnit } from "../quantities/units.js";
import { commonSettings } from "../surfaces/settings.js";
import type { ArgumentDefinition } from "../surfaces/surface.js";
import type { Arguments } from "./answer.js";
import { cellAt, type Cases, isBlank, isBlankOrZero, isSingle, keyOfName, shapeOf } from "./cases.js";
import { type CellBlock, CellError, type CellValue, isErrorCell, quoted } from "./cell.js";
import { fluidWord, fluidWords } from "./fluid-function.js";
import { isOwnTable, readCell, readFluid } from "./inputs.js";
import { layOut, problemCells, problemsEverywhere, unanswered } from "./layout.js";
import { namedFluid } from "./make-up.js";
import { errorOf, render } from "./render.js";
import { isWanted, readRequest, type Request } from "./request.js";
import { readSettings, type Settled, settle } from "./settings.js";
import type { StateFunction } from "./state-functions.js";

/** What any function of state asks of the reader: its arguments, and what one case comes to. */
interface Definition {
  readonly takesFluid: boolean;
  readonly arguments: readonly ArgumentDefinition[];
  readonly words: readonly WordEntry[];
  readonly otherwise: string;
  answer(word: string, one: Resolved): WordValue;
}

interface Resolved {
  readonly fluid: Fluid | undefined;
  readonly quantities: Readonly<Record<string, Quantity>>;
  readonly settled: Settled;
  readonly remarks: readonly string[];
}

type ReadState =
  | { readonly kind: "blank" }
  | { readonly kind: "error"; readonly error: CellError }
  | { readonly kind: "problems"; readonly problems: readonly Problem[] }
  | { readonly kind: "case"; readonly one: Resolved };

const valueWord: WordEntry = { name: "value", kind: "number", describe: "the number" };
const zeroTaken = "A temperature of 0 °C was taken where the cell holds 0 or is blank: check that it is meant.";

const fluidDefinition: Definition = {
  takesFluid: true,
  arguments: [{ key: "temperature", name: "temperature", dimensions: ["temperature"], sign: "any", describe: "of the fluid, °C" }],
  words: fluidWords,
  otherwise: "all",
  answer: (word, one) =>
    fluidWord(word, one.fluid as Fluid, (one.quantities.temperature as Quantity).value, one.settled.pressure, one.remarks),
};

export function answerFluid(args: Arguments, give: CellBlock | null | undefined, settings: CellBlock | null | undefined): CellValue[][] {
  return answerDefinition(fluidDefinition, args, give, settings);
}

export function answerState(definition: StateFunction, args: Arguments, settings: CellBlock | null | undefined): CellValue[][] {
  return answerDefinition(definitionOf(definition), args, null, settings);
}

function definitionOf(definition: StateFunction): Definition {
  return { ...definition, words: [valueWord], otherwise: "value", answer: (_, one) => definition.value(one) };
}

function answerDefinition(
  definition: Definition,
  args: Arguments,
  give: CellBlock | null | undefined,
  settings: CellBlock | null | undefined,
): CellValue[][] {
  const request = readRequest(give, definition.words, definition.otherwise);
  const problems: Problem[] = [];
  const raw = readSettings(settings, commonSettings);
  if (isProblem(raw)) problems.push(raw);
  if (isProblem(request)) problems.push(request);
  const names = [...(definition.takesFluid ? [{ name: "fluid" }] : []), ...definition.arguments];
  const blocks = names.map(({ name }) => ({ name, block: args[keyOfName(name)] ?? undefined }));
  for (const one of blocks) if (one.block === undefined) problems.push(valueProblem(one.name, "is missing; this argument must be there."));
  if (problems.length > 0) return problemsEverywhere(problems, request);

  const filled = blocks as readonly { name: string; block: CellBlock }[];
  const table = definition.takesFluid && isOwnTable((filled[0] as { block: CellBlock }).block);
  const rows = (raw as { rows: readonly ReadonlyMap<string, unknown>[] }).rows;
  const shaped = filled.filter((_, i) => !(i === 0 && table)).map((one) => [one.name, one.block] as const);
  const cases = shapeOf([...shaped, ["settings", rows.length > 1 ? rows.map(() => [0]) : [[0]]]]);
  if (isProblem(cases)) return problemsEverywhere([cases], request);
  const settledRows = rows.map((row) => settle(row, commonSettings));
  const read = (row: number, column: number): ReadState => {
    const settled = settledRows[rows.length === 1 ? 0 : row] as Settled | readonly Problem[];
    if (Array.isArray(settled)) return { kind: "problems", problems: settled as readonly Problem[] };
    return readState(definition, filled, table, row, column, settled as Settled);
  };
  return answerCases(definition, request as Request, cases, read);
}

function answerCases(
  definition: Definition,
  request: Request,
  cases: Cases,
  read: (row: number, column: number) => ReadState,
): CellValue[][] {
  if (request.wanted.some((one) => isWanted(one) && one.word.kind === "block")) {
    if (cases.rows > 1 || cases.columns > 1) {
      return [
        [
          new CellError(
            "#VALUE!",
            `give: "all" spills a block and takes one case, but the cases are ${cases.rows} × ${cases.columns}; name the words wanted.`,
          ),
        ],
      ];
    }
    if (request.wanted.length > 1) return [[new CellError("#VALUE!", 'give: "all" spills a block of its own; ask for it alone.')]];
    return wholeBlock(definition, read(0, 0));
  }
  return layOut(request, cases, (row, column) => {
    const found = read(row, column);
    if (found.kind === "blank") return request.wanted.map(() => "");
    if (found.kind === "error") return request.wanted.map(() => found.error);
    if (found.kind === "problems") return problemCells(found.problems, request);
    return request.wanted.map((one) =>
      isWanted(one) ? render(definition.answer(one.word.name, found.one), found.one.settled.system, one.unit) : unanswered(one),
    );
  });
}

function wholeBlock(definition: Definition, found: ReadState): CellValue[][] {
  if (found.kind === "blank") return [[""]];
  if (found.kind === "error") return [[found.error]];
  if (found.kind === "problems") return [[errorOf(found.problems)]];
  const verdict = definition.answer("verdict", found.one);
  const phase = definition.answer("phase", found.one);
  if (isProblem(phase)) return [[new CellError("#N/A", typeof verdict === "string" ? verdict : sentenceOf(phase))]];
  const { system } = found.one.settled;
  const lines: CellValue[][] = [["name", "value", "unit"]];
  for (const word of definition.words) {
    if (word.kind === "block") continue;
    const value = definition.answer(word.name, found.one);
    if (isProblem(value)) continue;
    lines.push([word.name, render(value, system), typeof value === "string" ? "" : defaultUnit(value.dimension, system).symbol]);
  }
  return lines;
}

function readState(
  definition: Definition,
  filled: readonly { readonly name: string; readonly block: CellBlock }[],
  table: boolean,
  row: number,
  column: number,
  settled: Settled,
): ReadState {
  const cells = filled.map((one, i) => (i === 0 && table ? "own table" : cellAt(one.block, row, column)));
  const error = cells.find(isErrorCell);
  if (error !== undefined) return { kind: "error", error: new CellError(error.code as CellError["code"], error.message ?? "") };
  const fromRanges = cells.filter((_, i) => !(i === 0 && table) && !isSingle((filled[i] as { block: CellBlock }).block));
  if (fromRanges.length > 0 && fromRanges.every(isBlankOrZero)) return { kind: "blank" };
  if (definition.takesFluid && isBlank(cells[0])) return { kind: "blank" };
  const own = definition.takesFluid ? cells.slice(1) : cells;
  if (definition.arguments.some((argument, i) => argument.sign === "positive" && isBlankOrZero(own[i]))) return { kind: "blank" };

  const problems: Problem[] = [];
  const remarks: string[] = [];
  let fluid: Fluid | undefined;
  if (definition.takesFluid) {
    const found = table ? readFluid((filled[0] as { block: CellBlock }).block, settled.reading) : namedFluid(cells[0], settled);
    if (Array.isArray(found)) problems.push(...(found as readonly Problem[]));
    else if (isProblem(found)) problems.push(found);
    else fluid = found as Fluid;
  }
  const quantities: Record<string, Quantity> = {};
  definition.arguments.forEach((argument, i) => {
    const cell = own[i];
    if (argument.dimensions[0] === "temperature" && isBlankOrZero(cell)) remarks.push(`${argument.name}: ${zeroTaken}`);
    const quantity = readCell(isBlank(cell) ? 0 : cell, argument.dimensions, argument.name, settled);
    if (isProblem(quantity)) problems.push(quantity);
    else if (argument.sign !== "any" && quantity.value < 0)
      problems.push(valueProblem(argument.name, `${quoted(quantity.given)} is below zero; ${argument.describe}.`));
    else quantities[argument.key] = quantity;
  });
  return problems.length > 0 ? { kind: "problems", problems } : { kind: "case", one: { fluid, quantities, settled, remarks } };
}

/** FILM.UNIT: a number, or text with its unit, in another unit. */
export function answerUnit(args: Arguments): CellValue[][] {
  const blocks = (["value", "from", "to"] as const).map((name) => [name, args[name] ?? [[""]]] as const);
  const cases = shapeOf(blocks);
  if (isProblem(cases)) return [[errorOf(cases)]];
  const request: Request = { wanted: [{ word: valueWord }], rows: 1, columns: 1 };
  return layOut(request, cases, (row, column) => [
    convertCell(...(blocks.map(([, block]) => cellAt(block, row, column)) as [unknown, unknown, unknown])),
  ]);
}

function convertCell(value: unknown, from: unknown, to: unknown): CellValue {
  const error = [value, from, to].find(isErrorCell);
  if (error !== undefined) return new CellError(error.code as CellError["code"], error.message ?? "");
  if (isBlank(value)) return "";
  if (typeof value !== "number" && typeof value !== "string")
    return errorOf(valueProblem("value", `${quoted(value)} is not a quantity; write a number, or text with its unit.`));
  if (isBlankOrZero(to)) return errorOf(valueProblem("to", 'is empty; write the unit wanted, such as "W/(m²·K)".'));
  const found = convert(value, isBlankOrZero(from) ? "" : String(from), String(to));
  if (isProblem(found)) return errorOf(found);
  return Number.isFinite(found) ? found : new CellError("#N/A", "There is no number here.");
}
