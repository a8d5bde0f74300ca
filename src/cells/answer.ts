import { coverageProblem, valueProblem } from "../quantities/problems.js";
import { surfaceById } from "../surfaces/index.js";
import { type CellBlock, CellError, type CellValue } from "./cell.js";
import { answerList } from "./list-function.js";
import { errorOf } from "./render.js";
import { answerFluid, answerState, answerUnit } from "./state-call.js";
import { stateFunctions } from "./state-functions.js";
import { answerSurface } from "./surface-call.js";

/** The arguments of a call by name, each a block of cells; omitted ones are null. */
export type Arguments = Readonly<Record<string, CellBlock | null | undefined>>;

/** Answers one call of a cell function: a rectangular block, errors cell by cell, never an exception. */
export function answer(id: string, args: Arguments, give?: CellBlock | null, settings?: CellBlock | null): CellValue[][] {
  try {
    return dispatch(id, args, give, settings);
  } catch (fault) {
    // A fault of ours must not take the sheet down; it must not look like an answer either.
    const what = fault instanceof Error ? fault.message : String(fault);
    return [[new CellError("#N/A", `FILM.${id} met a fault of its own (${what}); please report the formula.`)]];
  }
}

function dispatch(id: string, args: Arguments, give?: CellBlock | null, settings?: CellBlock | null): CellValue[][] {
  const surface = surfaceById(id);
  if (surface !== undefined) return answerSurface(surface, args, give, settings);
  if (id === "FLUID") return answerFluid(args, give, settings);
  if (id === "UNIT") return answerUnit(args);
  if (id === "LIST") return answerList(args.what, args.filter);
  const state = stateFunctions.find((one) => one.id === id);
  if (state !== undefined) return answerState(state, args, settings);
  return [
    [
      errorOf(
        id === ""
          ? valueProblem(undefined, "a function is needed.")
          : coverageProblem(undefined, `FILM.${id} is not a function of this version.`),
      ),
    ],
  ];
}

export { explain } from "./explain.js";
