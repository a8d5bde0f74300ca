// A short way for tests to write a call: scalars become single cells, arrays of arrays stand as they are.
import { answer, type Arguments } from "../../src/cells/answer.js";
import { CellError, type CellValue } from "../../src/cells/cell.js";
import { keyOfName } from "../../src/cells/cases.js";
import { argumentNames } from "../../src/cells/surface-call.js";
import { stateFunctions } from "../../src/cells/state-functions.js";
import { surfaceById } from "../../src/surfaces/index.js";

const others: Readonly<Record<string, readonly string[]>> = {
  FLUID: ["fluid", "temperature"],
  UNIT: ["value", "from", "to"],
  LIST: ["what", "filter"],
};

export function namesOf(id: string): readonly string[] {
  const surface = surfaceById(id);
  if (surface !== undefined) return argumentNames(surface);
  const state = stateFunctions.find((one) => one.id === id);
  if (state !== undefined) return [...(state.takesFluid ? ["fluid"] : []), ...state.arguments.map((argument) => argument.name)];
  return others[id] ?? [];
}

function block(value: unknown): unknown[][] | null {
  if (value === null || value === undefined) return null;
  return Array.isArray(value) ? (value as unknown[][]) : [[value]];
}

/** film("FREE.PLATE", ["air", 80, 20, 0.3], give, settings): the whole block. */
export function film(id: string, values: readonly unknown[], give?: unknown, settings?: unknown): CellValue[][] {
  const args: Record<string, unknown[][] | null> = {};
  namesOf(id).forEach((name, i) => {
    args[keyOfName(name)] = block(values[i]);
  });
  return answer(id, args as Arguments, block(give), block(settings));
}

/** The first cell of the answer. */
export function one(id: string, values: readonly unknown[], give?: unknown, settings?: unknown): CellValue {
  return film(id, values, give, settings)[0]?.[0] as CellValue;
}

export function numberOf(cell: CellValue): number {
  if (typeof cell === "number") return cell;
  throw new Error(`a number was expected, ${cell instanceof CellError ? `${cell.code} ${cell.message}` : String(cell)} came`);
}

export function sentence(cell: CellValue): string {
  if (cell instanceof CellError) return `${cell.code} ${cell.message}`;
  throw new Error(`an error was expected, ${String(cell)} came`);
}

export const column = (...values: readonly unknown[]): unknown[][] => values.map((value) => [value]);
export const row = (...values: readonly unknown[]): unknown[][] => [[...values]];
