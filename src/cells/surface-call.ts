import { findFilm } from "../findings/film-finding.js";
import type { Finding } from "../findings/finding.js";
import { surfaceWords, type WordEntry } from "../findings/words.js";
import type { Fluid } from "../fluids/fluid.js";
import { isProblem, type Problem, valueProblem } from "../quantities/problems.js";
import { settingsOf } from "../surfaces/settings.js";
import type { Surface } from "../surfaces/surface.js";
import type { Arguments } from "./answer.js";
import { allBlock, compareBlock, traceBlock } from "./blocks.js";
import { type Cases, cellAt, isSingle, keyOfName, shapeOf } from "./cases.js";
import { type CellBlock, CellError, type CellValue } from "./cell.js";
import { isOwnTable, type RawCase, type ReadCase, readCase, readFluid } from "./inputs.js";
import { layOut, problemCells, problemsEverywhere, unanswered } from "./layout.js";
import { namedFluid } from "./make-up.js";
import { errorOf, render } from "./render.js";
import { isWanted, readRequest, type Request, type Wanted } from "./request.js";
import { readSettings, type Settled, settle } from "./settings.js";

/** A call of a surface function, its shapes settled; cases are read one by one. */
export interface SurfaceCall {
  readonly surface: Surface;
  readonly request: Request;
  readonly cases: Cases;
  readCase(row: number, column: number): { readonly read: ReadCase; readonly system: "SI" | "US"; readonly settled: Settled | undefined };
  rawCase(row: number, column: number): RawCase;
}

export function wordsOfSurface(surface: Surface): readonly WordEntry[] {
  const own = Object.entries(surface.words ?? {})
    .filter(([name]) => !surfaceWords.some((word) => word.name === name))
    .map(([name, word]): WordEntry => ({ name, kind: "number", describe: word.describe }));
  return own.length === 0 ? surfaceWords : [...surfaceWords, ...own];
}

/** Names of the arguments as help spells them, the fluid first. */
export function argumentNames(surface: Surface): readonly string[] {
  return ["fluid", surface.wallName, "bulk", ...surface.arguments.map((argument) => argument.name)];
}

const omitted: CellBlock = [[null]];

/** Settles shapes, words and settings of a call; problems that concern the whole call come back at once. */
export function openSurfaceCall(
  surface: Surface,
  args: Arguments,
  give: CellBlock | null | undefined,
  settings: CellBlock | null | undefined,
): SurfaceCall | { readonly problems: readonly Problem[]; readonly request: Request | Problem } {
  const request = readRequest(give, wordsOfSurface(surface), "h");
  const names = argumentNames(surface);
  const optional = [false, false, false, ...surface.arguments.map((argument) => argument.optional === true)];
  const blocks = names.map((name, i) => ({ name, block: args[keyOfName(name)] ?? undefined, optional: optional[i] }));
  const problems: Problem[] = [];
  for (const one of blocks) {
    if (one.block === undefined && one.optional !== true) {
      problems.push(valueProblem(one.name, "is missing; every argument before give must be there."));
    }
  }
  const known = settingsOf(surface);
  const raw = readSettings(settings, known);
  if (isProblem(raw)) problems.push(raw);
  if (isProblem(request)) problems.push(request);
  if (problems.length > 0) return { problems, request };

  const filled = blocks.map((one) => ({ name: one.name, block: one.block ?? omitted }));
  const fluidBlock = (filled[0] as { block: CellBlock }).block;
  const table = isOwnTable(fluidBlock);
  const shaped = filled.filter((_, i) => !(i === 0 && table)).map((one) => [one.name, one.block] as const);
  const settingRows = (raw as { rows: readonly ReadonlyMap<string, unknown>[] }).rows;
  const perCase: CellBlock = settingRows.length > 1 ? settingRows.map(() => [0]) : [[0]];
  const cases = shapeOf([...shaped, ["settings", perCase]]);
  if (isProblem(cases)) return { problems: [cases], request };

  const settledRows: (Settled | readonly Problem[] | undefined)[] = [];
  const settledAt = (row: number): Settled | readonly Problem[] => {
    const at = settingRows.length === 1 ? 0 : row;
    settledRows[at] ??= settle(settingRows[at] as ReadonlyMap<string, unknown>, known);
    return settledRows[at] as Settled | readonly Problem[];
  };
  // One cell names the fluid of all cases; it is found once for each way the settings make it up.
  const fluids = new Map<Settled, Fluid | readonly Problem[]>();
  const oneFluid = table || isSingle(fluidBlock);
  const fluidOf = (settled: Settled): Fluid | readonly Problem[] | undefined => {
    if (!oneFluid) return undefined;
    let found = fluids.get(settled);
    if (found === undefined) {
      const fluid = table ? readFluid(fluidBlock, settled.reading) : namedFluid(fluidBlock[0]?.[0], settled);
      found = isProblem(fluid) ? [fluid] : fluid;
      fluids.set(settled, found);
    }
    return found;
  };
  const manyCells = filled.map((one, i) => !(i === 0 && table) && !isSingle(one.block));
  const rawCase = (row: number, column: number): RawCase => {
    const cells = filled.map((one, i) => (i === 0 && table ? "own table" : cellAt(one.block, row, column)));
    return {
      fluid: cells[0],
      surface: cells[1],
      bulk: cells[2],
      others: cells.slice(3),
      fromRanges: cells.filter((_, i) => manyCells[i]),
    };
  };
  return {
    surface,
    request: request as Request,
    cases,
    rawCase,
    readCase: (row, column) => {
      const settled = settledAt(row);
      if (Array.isArray(settled)) {
        return { read: { kind: "problems", problems: settled as readonly Problem[] }, system: "SI", settled: undefined };
      }
      const good = settled as Settled;
      return { read: readCase(surface, rawCase(row, column), fluidOf(good), good), system: good.system, settled: good };
    },
  };
}

/** Answers a call of a surface function: a block of numbers, texts and errors. */
export function answerSurface(
  surface: Surface,
  args: Arguments,
  give: CellBlock | null | undefined,
  settings: CellBlock | null | undefined,
): CellValue[][] {
  const call = openSurfaceCall(surface, args, give, settings);
  if ("problems" in call) return problemsEverywhere(call.problems, call.request);
  const { request, cases } = call;
  const block = request.wanted.find((one) => isWanted(one) && one.word.kind === "block");
  if (block !== undefined) return answerBlock(call, block as Wanted);
  return layOut(request, cases, (row, column) => answerCase(call, row, column));
}

function answerCase(call: SurfaceCall, row: number, column: number): CellValue[] {
  const { read, system } = call.readCase(row, column);
  const { wanted } = call.request;
  switch (read.kind) {
    case "blank":
      return wanted.map(() => "");
    case "error":
      return wanted.map(() => new CellError(read.code as CellError["code"], read.message));
    case "problems":
      return problemCells(read.problems, call.request);
    default: {
      const finding = findFilm(call.surface, read.inputs);
      return wanted.map((one) => (isWanted(one) ? render(finding.word(one.word.name), system, one.unit) : unanswered(one)));
    }
  }
}

function answerBlock(call: SurfaceCall, wanted: Wanted): CellValue[][] {
  const { cases, request } = call;
  if (cases.rows > 1 || cases.columns > 1) {
    return [
      [
        new CellError(
          "#VALUE!",
          `give: ${wanted.word.name} spills a block and takes one case, but the cases are ${cases.rows} × ${cases.columns}.`,
        ),
      ],
    ];
  }
  if (request.wanted.length > 1) {
    return [[new CellError("#VALUE!", `give: ${wanted.word.name} spills a block of its own; ask for it alone.`)]];
  }
  const { read, system } = call.readCase(0, 0);
  if (read.kind === "blank") return [[""]];
  if (read.kind === "error") return [[new CellError(read.code as CellError["code"], read.message)]];
  if (read.kind === "problems") return [[errorOf(read.problems)]];
  const finding: Finding = findFilm(call.surface, read.inputs);
  if (wanted.word.name === "trace") return traceBlock(finding, system);
  if (wanted.word.name === "compare") return compareBlock(finding, system);
  return allBlock(finding, system, wordsOfSurface(call.surface));
}
