import { findFilm } from "../findings/film-finding.js";
import { isProblem, type Problem } from "../quantities/problems.js";
import { formatQuantity } from "../quantities/format.js";
import { surfaceById } from "../surfaces/index.js";
import type { Inputs, Surface } from "../surfaces/surface.js";
import { type Arguments, answer } from "./answer.js";
import { type CellBlock, CellError } from "./cell.js";
import { cellAt, keyOfName } from "./cases.js";
import type { Explanation, InputShown } from "./explanation.js";
import { argumentNames, openSurfaceCall, type SurfaceCall } from "./surface-call.js";
import { isWanted } from "./request.js";
import { stateFunctions } from "./state-functions.js";

/** The same call explained for one cell of its spilled block: what was read, what was found, and by which word. */
export function explain(
  id: string,
  args: Arguments,
  give: CellBlock | null | undefined,
  settings: CellBlock | null | undefined,
  at: { readonly row: number; readonly column: number },
): Explanation {
  const surface = surfaceById(id);
  return surface === undefined ? explainState(id, args, give, settings, at) : explainSurface(surface, args, give, settings, at);
}

function explainSurface(
  surface: Surface,
  args: Arguments,
  give: CellBlock | null | undefined,
  settings: CellBlock | null | undefined,
  at: { readonly row: number; readonly column: number },
): Explanation {
  const call = openSurfaceCall(surface, args, give, settings);
  const base = {
    functionId: surface.id,
    title: surface.title,
    word: "h",
    value: undefined,
    finding: undefined,
    units: "SI" as const,
    caseNumber: 1,
    cases: 1,
  };
  if ("problems" in call) return { ...base, problems: call.problems, inputs: inputsGiven(surface, args) };
  const { row, column, word } = placeOf(call, at);
  const wanted = call.request.wanted[word];
  const name = isWanted(wanted) ? wanted.word.name : "h";
  const { read, system } = call.readCase(row, column);
  const shown = {
    ...base,
    word: name,
    units: system,
    caseNumber: row * call.cases.columns + column + 1,
    cases: call.cases.rows * call.cases.columns,
    inputs: inputsGiven(surface, args, row, column),
  };
  if (read.kind === "problems") return { ...shown, problems: read.problems };
  if (read.kind !== "inputs") return { ...shown, problems: wordProblem(wanted) };
  const finding = findFilm(surface, read.inputs);
  const isBlock = isWanted(wanted) && wanted.word.kind === "block";
  return {
    ...shown,
    problems: wordProblem(wanted),
    inputs: inputsRead(surface, shown.inputs, read.inputs, system),
    finding,
    value: isBlock ? finding.word("h") : finding.word(name),
  };
}

function wordProblem(wanted: unknown): readonly Problem[] {
  return isProblem(wanted) ? [wanted] : [];
}

/** Which case and which word stand in a cell of the spilled block. */
function placeOf(call: SurfaceCall, at: { readonly row: number; readonly column: number }): { row: number; column: number; word: number } {
  const { cases, request } = call;
  const isBlock = request.wanted.some((one) => isWanted(one) && one.word.kind === "block");
  if (isBlock) return { row: 0, column: 0, word: 0 };
  const within = (value: number, size: number): number => Math.max(0, Math.min(value, size - 1));
  if (cases.rows > 1 && cases.columns > 1) return { row: within(at.row, cases.rows), column: within(at.column, cases.columns), word: 0 };
  if (cases.rows > 1) return { row: within(at.row, cases.rows), column: 0, word: within(at.column, request.wanted.length) };
  if (cases.columns > 1) return { row: 0, column: within(at.column, cases.columns), word: within(at.row, request.wanted.length) };
  const word = request.columns === 1 ? at.row : at.column;
  return { row: 0, column: 0, word: within(word, request.wanted.length) };
}

function inputsGiven(surface: Surface, args: Arguments, row = 0, column = 0): readonly InputShown[] {
  const describes = [
    "name of the fluid, or a property table",
    "temperature or heat flux",
    "bulk temperature",
    ...surface.arguments.map((one) => one.describe),
  ];
  return argumentNames(surface).map((name, i) => {
    const block = args[keyOfName(name)];
    const cell = block === null || block === undefined ? "" : i === 0 && block.length > 1 ? "property table" : cellAt(block, row, column);
    return { name, given: shown(cell), read: "", describe: describes[i] as string };
  });
}

function shown(cell: unknown): string {
  if (cell === null || cell === undefined) return "";
  if (typeof cell === "object") return (cell as { code?: string }).code ?? "";
  return String(cell);
}

function inputsRead(surface: Surface, given: readonly InputShown[], inputs: Inputs, system: "SI" | "US"): readonly InputShown[] {
  const read = [
    inputs.fluid.name,
    inputs.wall.kind === "flux" ? formatQuantity(inputs.wall.q, "heat flux", system) : formatQuantity(inputs.wall.T, "temperature", system),
    formatQuantity(inputs.Tb, "temperature", system),
    ...surface.arguments.map((argument) => {
      const value = inputs.numbers[argument.key];
      const dimension = argument.key === "flow" ? (inputs.flow ?? "speed") : argument.dimensions[0];
      return value === undefined ? "not given" : formatQuantity(value, dimension ?? "none", system);
    }),
  ];
  const keys = ["fluid", "surface", "bulk", ...surface.arguments.map((argument) => argument.key)];
  return given.map((one, i) => ({ ...one, read: (read[i] ?? "") + halfWidth(inputs, keys[i] as string, surface, system) }));
}

function halfWidth(inputs: Inputs, key: string, surface: Surface, system: "SI" | "US"): string {
  const tolerance = inputs.tolerances.find((one) => one.key === key);
  if (tolerance === undefined) return "";
  const dimension =
    key === "surface" && inputs.wall.kind === "flux"
      ? "heat flux"
      : key === "surface" || key === "bulk"
        ? "temperature difference"
        : key === "flow"
          ? (inputs.flow ?? "speed")
          : (surface.arguments.find((one) => one.key === key)?.dimensions[0] ?? "none");
  return ` ± ${formatQuantity(tolerance.halfWidth, dimension, system)}`;
}

/** Functions of state have no finding: their answer and its sentence are all there is. */
function explainState(
  id: string,
  args: Arguments,
  give: CellBlock | null | undefined,
  settings: CellBlock | null | undefined,
  at: { readonly row: number; readonly column: number },
): Explanation {
  const cell = answer(id, args, give, settings)[at.row]?.[at.column];
  const isError = cell instanceof CellError;
  return {
    functionId: id,
    title: stateFunctions.find((one) => one.id === id)?.title ?? titles[id] ?? id,
    problems: isError ? [{ problem: true, fault: cell.code === "#VALUE!" ? "value" : "coverage", sentence: cell.message }] : [],
    inputs: Object.entries(args).map(([name, block]) => ({ name, given: shown(block?.[0]?.[0]), read: "", describe: "" })),
    word: "value",
    value: isError || cell === undefined ? undefined : typeof cell === "number" ? { value: cell, dimension: "none" } : String(cell),
    finding: undefined,
    units: "SI",
    caseNumber: 1,
    cases: 1,
  };
}

const titles: Readonly<Record<string, string>> = {
  FLUID: "Properties of a fluid",
  UNIT: "A quantity in another unit",
  LIST: "What there is: fluids, surfaces, equations, settings, words, units",
};
