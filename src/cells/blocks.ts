import type { Finding } from "../findings/finding.js";
import type { WordEntry } from "../findings/words.js";
import { isProblem } from "../quantities/problems.js";
import { defaultUnit } from "../quantities/units.js";
import { CellError, type CellValue } from "./cell.js";
import { render } from "./render.js";

/** Every step from inputs to h: symbol, meaning, value, unit, how it came about. SI throughout, as the algebra runs. */
export function traceBlock(finding: Finding, system: "SI" | "US"): CellValue[][] {
  const steps = finding.steps();
  if (steps.length === 0) return [[new CellError("#N/A", finding.verdict)]];
  const rows: CellValue[][] = [["symbol", "meaning", "value (SI)", "unit", "line or origin"]];
  for (const step of steps) {
    rows.push([step.symbol, step.meaning, step.value, step.unit, step.line === undefined ? (step.note ?? step.kind) : `= ${step.line}`]);
  }
  for (const test of finding.rangeTests()) {
    rows.push([
      test.symbol,
      `range of ${test.source}, ${test.origin}`,
      test.value,
      "",
      `${test.low} to ${test.high}: ${test.within ? "inside" : "outside"}`,
    ]);
  }
  if (finding.answered) {
    for (const share of finding.contributions()) {
      rows.push(["h", share.cause, share.above, "W/(m²·K)", `up; ${share.below} down; ${share.origin}`]);
    }
    const unit = defaultUnit("film coefficient", system).symbol;
    for (const word of ["h low", "h high"])
      rows.push([word, "about 95 %", render(finding.word(word), system), unit, "contributions combined"]);
  }
  rows.push(["verdict", finding.verdict, "", "", ""]);
  for (const caution of finding.cautions()) rows.push(["caution", caution, "", "", ""]);
  return rows;
}

/** Every published equation that serves: h, bounds, whether in range. */
export function compareBlock(finding: Finding, system: "SI" | "US"): CellValue[][] {
  const unit = defaultUnit("film coefficient", system);
  const list = finding.compare();
  if (list.length === 0) return [[new CellError("#N/A", finding.verdict)]];
  const shown = (value: number | undefined, why: string): CellValue =>
    value === undefined ? new CellError("#N/A", why) : render({ value, dimension: "film coefficient" }, system, unit);
  return [
    ["equation", `h [${unit.symbol}]`, "h low", "h high", "verdict", "taken", "source"],
    ...list.map((one): CellValue[] => [
      one.equation,
      shown(one.h, one.verdict),
      shown(one.low, one.verdict),
      shown(one.high, one.verdict),
      one.verdict,
      one.chosen ? "taken" : "",
      one.source,
    ]),
  ];
}

/** Name, value and unit of every word that has a value here. */
export function allBlock(finding: Finding, system: "SI" | "US", words: readonly WordEntry[]): CellValue[][] {
  const rows: CellValue[][] = [["name", "value", "unit"]];
  for (const word of words) {
    if (word.kind === "block") continue;
    const value = finding.word(word.name);
    if (isProblem(value) && (finding.answered || value.fault === "value")) continue;
    const unit = typeof value === "string" || isProblem(value) ? "" : defaultUnit(value.dimension, system).symbol;
    rows.push([word.name, render(value, system), unit]);
  }
  return rows;
}
