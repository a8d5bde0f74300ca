/** Every FILM result of the workbook, found in short steps so that the page stays quick, and can be called off. */
import { CellError } from "../../cells/cell.js";
import { openSurfaceCall } from "../../cells/surface-call.js";
import { explain } from "../../cells/answer.js";
import { findFilm } from "../../findings/film-finding.js";
import type { Finding } from "../../findings/finding.js";
import { isProblem, sentenceOf } from "../../quantities/problems.js";
import { surfaceById } from "../../surfaces/index.js";
import type { Inputs, Surface } from "../../surfaces/surface.js";
import { type ReadCall, type ReadCell, readSelection } from "../cell-reading.js";
import type { FormulaCell, Place, SheetHost } from "../host.js";
import { cellName, sheetPrefix } from "../reference.js";
import { readingOnce } from "./read-once.js";
import type { VerdictKind } from "../this-cell/sections.js";
import { words } from "../words.js";

/** One case of one call: what a row of the list shows. SI; temperatures in kelvin. */
export interface Scanned {
  readonly place: Place;
  readonly address: string;
  readonly functionId: string;
  readonly kind: VerdictKind;
  readonly verdict: string;
  /** Present for surfaces whose number may be shown. */
  readonly boundary?: Boundary;
}

export interface Boundary {
  readonly fluid: string;
  readonly area: number | undefined;
  readonly h: number;
  readonly hLow: number;
  readonly hHigh: number;
  readonly reference: number;
  readonly surface: Surface;
  readonly inputs: Inputs;
}

export interface Progress {
  readonly cells: number;
  readonly of: number;
}

export interface Scan {
  readonly rows: readonly Scanned[];
  readonly isWhole: boolean;
}

/** No step takes the screen for longer than this, in milliseconds. */
const step = 12;
/** A column of a hundred thousand cases is told by its first ones. */
const mostCases = 2000;

export async function scanWorkbook(
  host: SheetHost,
  signal: AbortSignal,
  tell: (progress: Progress, rows: readonly Scanned[]) => void,
): Promise<Scan> {
  const rows: Scanned[] = [];
  const cells = await host.formulas("film");
  const once = readingOnce(host);
  let until = now() + step;
  const breathe = async (done: number): Promise<void> => {
    if (now() < until) return;
    tell({ cells: done, of: cells.length }, rows);
    await pause();
    until = now() + step;
  };
  for (const [i, cell] of cells.entries()) {
    if (signal.aborted) return { rows, isWhole: false };
    const read = await readSelection({ place: cell.place, address: cell.address, formula: cell.formula, shown: cell.shown }, once);
    for (const row of rowsOf(cell, read)) {
      rows.push(row);
      await breathe(i);
      if (signal.aborted) return { rows, isWhole: false };
    }
    await breathe(i + 1);
  }
  tell({ cells: cells.length, of: cells.length }, rows);
  return { rows, isWhole: true };
}

function now(): number {
  return performance.now();
}

/** Lets the browser draw and hear the user. */
function pause(): Promise<void> {
  return new Promise((resume) => setTimeout(resume, 0));
}

function* rowsOf(cell: FormulaCell, read: ReadCell): Generator<Scanned> {
  if (read.trouble !== undefined) yield { place: cell.place, address: cell.address, functionId: "", kind: "error", verdict: read.trouble };
  for (const call of read.calls) yield* rowsOfCall(cell, read, call);
}

function* rowsOfCall(cell: FormulaCell, read: ReadCell, call: ReadCall): Generator<Scanned> {
  const base = { place: cell.place, address: cell.address, functionId: call.id };
  if (call.troubles.length > 0) {
    yield { ...base, kind: "remark", verdict: call.troubles.join(" ") };
    return;
  }
  const surface = surfaceById(call.id);
  if (surface === undefined) {
    const { problems } = explain(call.id, call.args, call.give, call.settings, { row: 0, column: 0 });
    yield {
      ...base,
      ...(problems.length === 0
        ? { kind: "good" as const, verdict: words.workbook.answers }
        : { kind: faultKind(problems), verdict: sentenceOf(problems) }),
    };
    return;
  }
  yield* cases(surface, cell, read, call);
}

function faultKind(problems: readonly { readonly fault: string }[]): VerdictKind {
  return problems.some((one) => one.fault === "value") ? "error" : "bad";
}

function* cases(surface: Surface, cell: FormulaCell, read: ReadCell, call: ReadCall): Generator<Scanned> {
  const opened = openSurfaceCall(surface, call.args, call.give, call.settings);
  const base = { place: cell.place, address: cell.address, functionId: call.id };
  if ("problems" in opened) {
    yield { ...base, kind: faultKind(opened.problems), verdict: sentenceOf(opened.problems) };
    return;
  }
  // Only where the call is the whole formula do its cases stand in the cells below and beside it.
  const isWhole = read.formula.replace(/^=\s*\+?\s*/, "").trim() === call.text;
  const { rows, columns } = opened.cases;
  let left = mostCases;
  for (let row = 0; row < rows; row++) {
    for (let column = 0; column < columns; column++) {
      if (left-- <= 0) return;
      const at = isWhole ? { ...cell.place, row: cell.place.row + row, column: cell.place.column + column } : cell.place;
      const place = { ...base, place: at, address: addressOf(at) };
      const one = opened.readCase(row, column).read;
      if (one.kind === "blank") continue;
      if (one.kind === "error") yield { ...place, kind: "error", verdict: new CellError(one.code as CellError["code"]).code };
      else if (one.kind === "problems") yield { ...place, kind: faultKind(one.problems), verdict: sentenceOf(one.problems) };
      else yield { ...place, ...judged(surface, one.inputs) };
    }
  }
}

function addressOf(place: Place): string {
  return `${sheetPrefix(place.sheet)}${cellName(place.row, place.column)}`;
}

function judged(surface: Surface, inputs: Inputs): Pick<Scanned, "kind" | "verdict" | "boundary"> {
  const finding = findFilm(surface, inputs);
  const boundary = boundaryOf(surface, inputs, finding);
  const kind: VerdictKind = !finding.inRange ? (finding.answered ? "flagged" : "bad") : finding.verdict === "in range" ? "good" : "remark";
  return { kind, verdict: finding.verdict, ...(boundary === undefined ? {} : { boundary }) };
}

function boundaryOf(surface: Surface, inputs: Inputs, finding: Finding): Boundary | undefined {
  const { h, hLow, hHigh } = finding;
  const reference = numberOf(finding, "reference temperature");
  if (h === undefined || hLow === undefined || hHigh === undefined || reference === undefined) return undefined;
  return { fluid: inputs.fluid.name, area: numberOf(finding, "area"), h, hLow, hHigh, reference, surface, inputs };
}

function numberOf(finding: Finding, word: string): number | undefined {
  const value = finding.word(word);
  return isProblem(value) || typeof value === "string" ? undefined : value.value;
}

const severity: readonly VerdictKind[] = ["error", "bad", "flagged", "remark", "good"];

/** Worst first; equals in the order of the workbook. */
export function worstFirst(rows: readonly Scanned[]): readonly Scanned[] {
  return [...rows].sort((one, other) => severity.indexOf(one.kind) - severity.indexOf(other.kind));
}

export function counts(rows: readonly Scanned[]): readonly (readonly [kind: VerdictKind, count: number])[] {
  return severity.map((kind) => [kind, rows.filter((row) => row.kind === kind).length] as const);
}
