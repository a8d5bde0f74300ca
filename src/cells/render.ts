import type { WordValue } from "../findings/finding.js";
import { fromSI } from "../quantities/conversion.js";
import { isProblem, type Problem, sentenceOf } from "../quantities/problems.js";
import type { Dimension } from "../quantities/quantity.js";
import { defaultUnit, type Unit } from "../quantities/units.js";
import { CellError, type CellValue } from "./cell.js";

/** A problem as a cell shows it: #VALUE! for arguments, #N/A for what no equation or formulation covers. */
export function errorOf(problems: Problem | readonly Problem[]): CellError {
  const list = Array.isArray(problems) ? (problems as readonly Problem[]) : [problems as Problem];
  const isValue = list.some((problem) => problem.fault === "value");
  return new CellError(isValue ? "#VALUE!" : "#N/A", sentenceOf(list));
}

/** A word's value in the unit its header asks for, or in the default unit of the system. */
export function render(value: WordValue, system: "SI" | "US", unit?: Unit): CellValue {
  if (typeof value === "string") return value;
  if (isProblem(value)) return errorOf(value);
  const { dimension } = value;
  if (unit !== undefined && !fits(unit.dimension, dimension)) {
    return new CellError("#VALUE!", `give: ${unit.symbol} is a unit of ${unit.dimension}; a unit of ${dimension} is needed.`);
  }
  const shown = fromSI(value.value, unit ?? defaultUnit(dimension, system));
  return Number.isFinite(shown) ? shown : new CellError("#N/A", "There is no number here.");
}

/** Vectors that two kinds of quantity share are told apart by the word, not by the unit. */
function fits(given: Dimension, wanted: Dimension): boolean {
  return given === wanted;
}
