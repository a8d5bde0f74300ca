import type { Correlation } from "../correlations/correlation.js";
import { isProblem, type Problem, valueProblem } from "../quantities/problems.js";
import { evaluate, type Point, settingOf } from "./point.js";
import type { Scene } from "./scene.js";
import type { Circumstances, Surface } from "./surface.js";

/** Decades (at least a trace) by which a point leaves its equation's ranges; 0 inside. */
export function decadesOutside(point: Point): number {
  let decades = 0;
  const limit = point.runner.record.limit;
  for (const range of point.runner.ranges) {
    const value = point.values[range.slot] as number;
    if (value >= range.low && value <= range.high) continue;
    if (limit !== undefined && limit.of === range.symbol && value < range.low) continue;
    decades += distance(value, range.low, range.high);
  }
  return decades;
}

/** Decades where the interval is of positive numbers, else widths of the interval. */
function distance(value: number, low: number, high: number): number {
  const edge = value < low ? low : high;
  if (value > 0 && edge > 0) return Math.abs(Math.log10(value / edge));
  return Math.abs(value - edge) / (high - low);
}

/** The published equations that may serve this case, in order of preference; narrowed by the setting `equation`. */
export function candidatesFor(surface: Surface, at: Circumstances): readonly Correlation[] | Problem {
  if (at.inputs.only !== undefined) return [at.inputs.only];
  const all = surface.candidates(at);
  const wanted = at.inputs.equation;
  return wanted === undefined ? all : named(wanted, all);
}

/** Records from memory are taken only where their surface prefers them or the user names them. */
function isTakenUnasked(surface: Surface, record: Correlation): boolean {
  return record.confidence !== "M" || surface.prefers.some((id) => record.id.startsWith(id));
}

/** The preferred equation in range; failing that, the one that is least far outside. */
export function choose(surface: Surface, scene: Scene): Point | Problem {
  const setting = settingOf(surface, scene);
  const { at } = setting;
  const candidates = candidatesFor(surface, at);
  if (isProblem(candidates)) return candidates;
  let nearest: Point | undefined;
  let nearestBy = Number.POSITIVE_INFINITY;
  let trouble: Problem | undefined;
  const asked = at.inputs.equation !== undefined || at.inputs.only !== undefined;
  for (const record of candidates as readonly Correlation[]) {
    if (!asked && !isTakenUnasked(surface, record)) continue;
    const point = evaluate(surface, setting, record);
    if (isProblem(point)) {
      trouble ??= point;
      continue;
    }
    if (point.inRange) return point;
    const by = decadesOutside(point);
    if (by < nearestBy) {
      nearest = point;
      nearestBy = by;
    }
  }
  return nearest ?? trouble ?? valueProblem(undefined, `no published equation of FILM.${surface.id} serves ${described(at)}.`);
}

export function described(at: Circumstances): string {
  return `${at.wall === "isothermal" ? "a surface of one temperature" : "a uniform flux"}${at.local ? " at a position" : ""}`;
}

/** Words of authors, year or name, case-blind and without accents. */
function named(wanted: string, all: readonly Correlation[]): readonly Correlation[] | Problem {
  const words = wordsOf(wanted);
  const ownWords = (record: Correlation): readonly string[] =>
    wordsOf(`${record.name} ${record.source.work} ${record.id} ${record.set ?? ""}`);
  const whole = all.filter((record) => words.every((word) => ownWords(record).includes(word)));
  const found =
    whole.length > 0 ? whole : all.filter((record) => words.every((word) => ownWords(record).some((one) => one.startsWith(word))));
  const list = (records: readonly Correlation[]): string => records.map((record) => `"${labelOf(record)}"`).join(", ");
  if (found.length === 0) {
    return valueProblem("equation", `"${wanted}" names no equation that serves here; there are ${list(all)}.`);
  }
  const sets = new Set(found.map((record) => record.set ?? record.id));
  if (sets.size > 1) {
    const exact = found.filter((record) => wordsOf(labelOf(record)).join(" ") === words.join(" ") || record.id === wanted.trim());
    if (exact.length === 1) return exact;
    return valueProblem("equation", `"${wanted}" fits several equations; write more of one of ${list(found)}.`);
  }
  return found;
}

export function labelOf(record: Correlation): string {
  const year = /\d{4}/.exec(record.source.work)?.[0];
  return year === undefined || record.name.includes(year) ? record.name : `${record.name}, ${year}`;
}

const joining = new Set(["and", "et", "al", "the"]);

function wordsOf(text: string): readonly string[] {
  return text
    .normalize("NFD")
    .replace(/[\u0300-\u036f]/g, "")
    .toLowerCase()
    .split(/[^a-z0-9]+/)
    .filter((word) => word !== "" && !joining.has(word));
}
