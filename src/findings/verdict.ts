import { formatNumber } from "../quantities/format.js";
import { rivalsOf } from "../surfaces/bounds.js";
import type { Point } from "../surfaces/point.js";
import type { Solution } from "../surfaces/solution.js";
import { shortCitation } from "./citation.js";

/** "Ra 2.1e13 is above 1e12 (Churchill & Chu 1975)" for each group out of range. */
export function rangeSentences(point: Point): readonly string[] {
  const { record, ranges } = point.runner;
  const sentences: string[] = [];
  for (const range of ranges) {
    const value = point.values[range.slot] as number;
    if (value >= range.low && value <= range.high) continue;
    if (point.atLimit && record.limit?.of === range.symbol && value < range.low) continue;
    sentences.push(outside(range.symbol, value, range.low, range.high, shortCitation(record.source.work)));
  }
  return sentences;
}

function outside(symbol: string, value: number, low: number, high: number, source: string): string {
  return value < low
    ? `${symbol} ${formatNumber(value)} is below ${formatNumber(low)} (${source})`
    : `${symbol} ${formatNumber(value)} is above ${formatNumber(high)} (${source})`;
}

/** The verdict: what is wrong, first things first, else "in range" and what the bounds had to take in. */
export function verdictOf(solution: Solution): string {
  const { point } = solution;
  const parts = [...rangeSentences(point)];
  if (parts.length === 0) parts.push(point.atLimit ? "no driving difference" : "in range");
  if (solution.atSwitch) parts.push("the flux falls in a jump between two regimes: the switch point is given, the bounds hold both sides");
  for (const rival of rivalsOf(point)) if (rival.remark !== undefined) parts.push(rival.remark);
  return parts.join("; ");
}
