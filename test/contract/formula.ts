// A small reader of formulas for tests: numbers, texts, array constants, ranges of a grid and omitted arguments of one FILM call.
import { readFileSync } from "node:fs";
import { join, resolve } from "node:path";

const source = readFileSync(join(resolve(import.meta.dirname, "../.."), "src/cells/functions.ts"), "utf8");

/** Parameter names of a function by id, read from its wrapper. */
export function argumentNamesOf(id: string): readonly string[] {
  const at = source.indexOf(`@customfunction ${id} `);
  const declared = /export function \w+\(([\s\S]*?)\): any\[\]\[\] \{/.exec(source.slice(at));
  if (at < 0 || declared === null) throw new Error(`no function ${id}`);
  return [...(declared[1] as string).matchAll(/(\w+)\??: any/g)].map((match) => match[1] as string);
}

export function formulasIn(text: string): readonly string[] {
  return [...text.matchAll(/`(=FILM\.[^`]+)`/g)].map((match) => match[1] as string);
}

/** Cells from A1 on; a blank is null, as in a saved workbook. */
export type Grid = readonly (readonly unknown[])[];

export function runFormula<T>(formula: string, call: (id: string, args: readonly (unknown[][] | null)[]) => T, grid?: Grid): T {
  const match = /^=FILM\.([A-Z.]+)\(([\s\S]*)\)$/.exec(formula);
  if (match === null) throw new Error(`not one FILM call: ${formula}`);
  return call(
    match[1] as string,
    splitOutside(match[2] as string, ",").map((text) => readArgument(text, grid)),
  );
}

function readArgument(text: string, grid: Grid | undefined): unknown[][] | null {
  const trimmed = text.trim();
  if (trimmed === "") return null;
  const range = /^([A-Z])(\d+)(?::([A-Z])(\d+))?$/.exec(trimmed);
  if (range !== null && grid !== undefined) return cellsOf(range, grid);
  if (trimmed.startsWith("{"))
    return splitOutside(trimmed.slice(1, -1), ";").map((row) => splitOutside(row, ",").map((one) => readScalar(one.trim())));
  return [[readScalar(trimmed)]];
}

function cellsOf([, left, top, right = left, bottom = top]: readonly (string | undefined)[], grid: Grid): unknown[][] {
  const columnOf = (letter: string | undefined): number => (letter ?? "").charCodeAt(0) - "A".charCodeAt(0);
  return grid.slice(Number(top) - 1, Number(bottom)).map((row) => row.slice(columnOf(left), columnOf(right) + 1));
}

function readScalar(text: string): unknown {
  if (text.startsWith('"')) return text.slice(1, -1).replace(/""/g, '"');
  if (/^(TRUE|FALSE)$/i.test(text)) return text.toUpperCase() === "TRUE";
  const number = Number(text);
  if (text === "" || Number.isNaN(number)) throw new Error(`not a literal: ${text}`);
  return number;
}

function splitOutside(text: string, mark: string): readonly string[] {
  const parts: string[] = [];
  let depth = 0;
  let quoted = false;
  let from = 0;
  for (let i = 0; i < text.length; i++) {
    const c = text[i];
    if (c === '"') quoted = !quoted;
    else if (!quoted && c === "{") depth++;
    else if (!quoted && c === "}") depth--;
    else if (!quoted && depth === 0 && c === mark) {
      parts.push(text.slice(from, i));
      from = i + 1;
    }
  }
  parts.push(text.slice(from));
  return parts;
}
