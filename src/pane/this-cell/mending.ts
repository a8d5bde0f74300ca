/** Changes of the formula that would mend what is wrong, each as a whole new formula for a button. */
import type { Explanation } from "../../cells/explanation.js";
import { surfaceWords } from "../../findings/words.js";
import { type Problem, isProblem } from "../../quantities/problems.js";
import { findFluid } from "../../fluids/shelf.js";
import { parseQuantity } from "../../quantities/quantity-text.js";
import { defaultUnit } from "../../quantities/units.js";
import { surfaceById } from "../../surfaces/index.js";
import type { ReadCall } from "../cell-reading.js";
import type { FilmCall } from "../formula.js";
import { words } from "../words.js";

export interface Mending {
  readonly label: string;
  readonly formula: string;
}

const most = 4;

export function mendings(formula: string, read: ReadCall, explanation: Explanation): readonly Mending[] {
  const found =
    explanation.problems.length > 0
      ? explanation.problems.flatMap((problem) => forProblem(formula, read, problem))
      : forRange(formula, read, explanation);
  return found.slice(0, most);
}

function forRange(formula: string, read: ReadCall, explanation: Explanation): readonly Mending[] {
  const { finding } = explanation;
  if (finding === undefined || finding.answered) return [];
  const other = finding.compare().find((one) => one.inRange);
  const flag = withSetting(formula, read, "beyond range", "flag");
  const equation = other === undefined ? undefined : withSetting(formula, read, "equation", other.equation.replace(/[;="]/g, " "));
  return [
    ...(equation === undefined || other === undefined ? [] : [{ label: words.problems.equation(other.equation), formula: equation }]),
    ...(flag === undefined ? [] : [{ label: words.problems.flag, formula: flag }]),
  ];
}

function forProblem(formula: string, read: ReadCall, problem: Problem): readonly Mending[] {
  const at = read.signature?.parameters.findIndex((one) => one.name === problem.argument) ?? -1;
  const argument = read.call.args[at];
  if (argument === undefined || argument.kind !== "text") return [];
  const name = problem.argument as string;
  return replacements(read.id, name, argument.value).map((text) => ({
    label: words.problems.replace(name, `“${text}”`),
    formula: withArgument(formula, read.call, at, quote(text)),
  }));
}

function replacements(id: string, name: string, given: string): readonly string[] {
  if (name === "fluid") return nearFluids(given);
  if (name === "give") return nearWords(given);
  return withFittingUnit(id, name, given);
}

/** The names that the shelf's own refusal quotes, those that the shelf knows. */
function nearFluids(given: string): readonly string[] {
  const refusal = findFluid(given);
  if (!isProblem(refusal)) return [];
  const quoted = [...refusal.sentence.matchAll(/"([^"]+)"/g)].map((found) => found[1] as string);
  return [...new Set(quoted)].filter((one) => one !== given && !isProblem(findFluid(one)));
}

function nearWords(given: string): readonly string[] {
  const wanted = given.trim().toLowerCase();
  const distance = (name: string): number => steps(wanted, name.toLowerCase());
  return surfaceWords
    .map((word) => ({ name: word.name, distance: distance(word.name) }))
    .filter((one) => one.distance <= Math.max(1, Math.floor(one.name.length / 3)))
    .sort((one, other) => one.distance - other.distance)
    .slice(0, 3)
    .map((one) => one.name);
}

/** Single letters to change, add or leave out. */
function steps(one: string, other: string): number {
  let row = Array.from({ length: other.length + 1 }, (_, at) => at);
  for (let i = 1; i <= one.length; i++) {
    const next = [i];
    for (let j = 1; j <= other.length; j++) {
      next.push(
        Math.min((row[j - 1] as number) + (one[i - 1] === other[j - 1] ? 0 : 1), (row[j] as number) + 1, (next[j - 1] as number) + 1),
      );
    }
    row = next;
  }
  return row[other.length] as number;
}

/** The number kept, the unit one that belongs there: a length where a speed stood. */
function withFittingUnit(id: string, name: string, given: string): readonly string[] {
  const surface = surfaceById(id);
  const dimension =
    name === "bulk" || name === surface?.wallName ? "temperature" : surface?.arguments.find((one) => one.name === name)?.dimensions[0];
  const parsed = parseQuantity(given);
  if (dimension === undefined || parsed.kind !== "quantity") return [];
  const unit = defaultUnit(dimension, "SI").symbol;
  const number = /^\s*[-+]?[\d.,]+(?:e[-+]?\d+)?/i.exec(given)?.[0]?.trim();
  return number === undefined || parsed.unitText === unit ? [] : [`${number} ${unit}`];
}

export function quote(text: string): string {
  return `"${text.replace(/"/g, '""')}"`;
}

/** The formula with one argument of a call written anew; arguments left out before it stay empty. */
export function withArgument(formula: string, call: FilmCall, at: number, text: string): string {
  const texts = call.args.map((one) => (one === undefined ? "" : formula.slice(one.start, one.end)));
  while (texts.length <= at) texts.push("");
  texts[at] = text;
  return `${formula.slice(0, call.start)}${call.name}(${texts.join(",")})${formula.slice(call.end)}`;
}

/** The formula with a setting added; undefined where the settings stand in cells. */
export function withSetting(formula: string, read: ReadCall, name: string, value: string): string | undefined {
  const at = read.signature?.parameters.findIndex((one) => one.key === "settings") ?? -1;
  if (at < 0) return undefined;
  const present = read.call.args[at];
  if (present !== undefined && present.kind !== "text") return undefined;
  const kept = (present?.value ?? "")
    .split(";")
    .filter((piece) => piece.trim() !== "" && piece.split("=")[0]?.trim().toLowerCase() !== name);
  return withArgument(formula, read.call, at, quote([...kept.map((piece) => piece.trim()), `${name}=${value}`].join("; ")));
}
