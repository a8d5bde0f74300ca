import type { WordEntry } from "../findings/words.js";
import { type Problem, isProblem, valueProblem } from "../quantities/problems.js";
import { findUnit, type Unit } from "../quantities/units.js";
import { type CellBlock, quoted } from "./cell.js";
import { isBlank, sizeOf } from "./cases.js";

/** One word of `give`, with the unit its brackets ask for; undefined where the header cell is blank. */
export interface Wanted {
  readonly word: WordEntry;
  readonly unit?: Unit;
}

export interface Request {
  readonly wanted: readonly (Wanted | Problem | undefined)[];
  readonly rows: number;
  readonly columns: number;
}

/** Reads `give`: a word, or a row or column of words. */
export function readRequest(give: CellBlock | null | undefined, words: readonly WordEntry[], otherwise: string): Request | Problem {
  const block = give === null || give === undefined || give.every((row) => row.every(isBlank)) ? [[otherwise]] : give;
  const [rows, columns] = sizeOf(block);
  if (rows > 1 && columns > 1) {
    return valueProblem("give", `is a block of ${rows} × ${columns} cells; give one word, one row or one column of words.`);
  }
  const cells = block.flat();
  return { wanted: cells.map((cell) => readWord(cell, words)), rows, columns };
}

function readWord(cell: unknown, words: readonly WordEntry[]): Wanted | Problem | undefined {
  if (isBlank(cell) || cell === 0) return undefined;
  if (typeof cell !== "string") return valueProblem("give", `holds ${quoted(cell)}; a word is needed, such as "h" or "verdict".`);
  const text = cell.replace(/\s+/g, " ").trim();
  const exact = lookUp(text, words);
  if (exact !== undefined) return { word: exact };
  const bracketed = /^(.*?)\s*[[(](.*)[\])]$/.exec(text);
  if (bracketed === null) return unknown(text, words);
  const word = lookUp((bracketed[1] as string).trim(), words);
  if (word === undefined) return unknown(text, words);
  const unit = findUnit((bracketed[2] as string).trim());
  if (unit === undefined)
    return valueProblem("give", `"${bracketed[2]}" in "${text}" is not a unit known here; FILM.LIST("units") lists them.`);
  return { word, unit };
}

function lookUp(text: string, words: readonly WordEntry[]): WordEntry | undefined {
  const wanted = text.toLowerCase();
  return words.find((word) => word.name.toLowerCase() === wanted);
}

function unknown(text: string, words: readonly WordEntry[]): Problem {
  const first = text.toLowerCase().slice(0, 2);
  const near = words.filter((word) => word.name.toLowerCase().startsWith(first) || word.name.toLowerCase().includes(text.toLowerCase()));
  const list = (near.length > 0 ? near : words).slice(0, 12).map((word) => `"${word.name}"`);
  return valueProblem(
    "give",
    `"${text}" is not a word known here; write ${near.length > 0 ? "perhaps " : "one of "}${list.join(", ")}${near.length > 0 || words.length <= 12 ? "" : ' … (FILM.LIST("words") lists all)'}.`,
  );
}

export function isWanted(one: Wanted | Problem | undefined): one is Wanted {
  return one !== undefined && !isProblem(one);
}
