/** A cell's number or text to a quantity in SI, or the sentence that says what to write instead. */
import { kindOf, phraseOf } from "./dimensions.js";
import { formatNumber } from "./format.js";
import { isProblem, type Problem, valueProblem } from "./problems.js";
import type { Dimension, Quantity, Reading } from "./quantity.js";
import { type HalfWidth, parseQuantity, type QuantityText, type TextRefusal } from "./quantity-text.js";
import { toSI } from "./scale.js";
import { asDifference, defaultUnit, readUnit, shorten, spellingsOf, type Unit, type UnitProblem } from "./units.js";

/**
 * Reads one argument. A bare number has the default unit of the first wanted dimension, or `reading.unit`; a text carries its own and
 * its dimension decides among those wanted. Value and half-width come back in SI, temperatures in kelvin, pressures absolute.
 * Zero and negative lengths and the like pass: whether they make sense is the surface's to say.
 */
export function readQuantity(
  given: string | number,
  wanted: Dimension | readonly Dimension[],
  reading: Reading,
  argument: string,
): Quantity | Problem {
  if (typeof given !== "number") return readText(String(given), typeof wanted === "string" ? [wanted] : wanted, reading, argument);
  const unit = bareUnit(wanted, reading, argument);
  if (isProblem(unit)) return unit;
  return quantity(given, unit, given, unit.symbol, wanted, reading, argument);
}

function bareUnit(wanted: Dimension | readonly Dimension[], reading: Reading, argument: string): Unit | Problem {
  if (reading.unit !== undefined) return chosenUnit(reading.unit, wanted, argument);
  return defaultUnit(typeof wanted === "string" ? wanted : (wanted[0] ?? "none"), reading.system);
}

/** The unit of the setting `unit of NAME`. */
function chosenUnit(text: string, wanted: Dimension | readonly Dimension[], argument: string): Unit | Problem {
  const dimensions = typeof wanted === "string" ? [wanted] : wanted;
  const unit = readUnit(text);
  const fitting = isProblem(unit) ? undefined : asWanted(unit, dimensions);
  if (fitting) return fitting;
  const what = isProblem(unit) ? `which ${unit.says}` : `which is ${kindOf(unit.dimension).phrase}`;
  const instead = `${phraseOf(dimensions)} needs a unit such as "${defaultUnit(dimensions[0] ?? "none", "SI").symbol}"`;
  return valueProblem(argument, `has the setting "unit of ${argument}" as "${shorten(text)}", ${what}; ${instead}.`);
}

/** The unit as one of the wanted dimensions; degrees serve as a temperature or as a difference, a Δ only as a difference. */
function asWanted(unit: Unit, wanted: readonly Dimension[]): Unit | undefined {
  if (wanted.includes(unit.dimension)) return unit;
  return unit.dimension === "temperature" && wanted.includes("temperature difference") ? asDifference(unit) : undefined;
}

/** The one door to SI: finite, not below absolute zero, not below vacuum. */
function quantity(
  number: number,
  unit: Unit,
  given: string | number,
  unitText: string,
  wanted: Dimension | readonly Dimension[],
  reading: Reading,
  argument: string,
): Quantity | Problem {
  const value = toSI(number, unit, reading.ambient);
  if (!Number.isFinite(value)) return notFinite(given, wanted, reading, argument);
  if (value < 0 && unit.dimension === "temperature") return belowAbsoluteZero(given, unitText, argument);
  if (value < 0 && unit.dimension === "pressure") return belowVacuum(given, unitText, value, argument);
  return { value, dimension: unit.dimension, given, unit: unitText };
}

function notFinite(given: string | number, wanted: Dimension | readonly Dimension[], reading: Reading, argument: string): Problem {
  const fault = typeof given === "string" ? `${quote(given)} is too large a number` : "is not a finite number";
  return valueProblem(argument, `${fault}; ${needed(typeof wanted === "string" ? [wanted] : wanted, reading)}.`);
}

function belowAbsoluteZero(given: string | number, unitText: string, argument: string): Problem {
  return valueProblem(argument, `${shownWithUnit(given, unitText)} is below absolute zero, which is -273.15 °C, -459.67 °F or 0 K.`);
}

function belowVacuum(given: string | number, unitText: string, absolute: number, argument: string): Problem {
  const shown = shownWithUnit(given, unitText);
  return valueProblem(
    argument,
    `${shown} is below vacuum (${formatNumber(absolute)} Pa absolute); write a positive pressure, or "psig" or "barg" for one against the ambient.`,
  );
}

function quote(text: string): string {
  return `"${shorten(text.trim())}"`;
}

function shownWithUnit(given: string | number, unitText: string): string {
  return typeof given === "string" ? quote(given) : `${given} ${unitText}`;
}

/** `a length is needed, such as 0.3 or "0.3 m"`. */
function needed(wanted: readonly Dimension[], reading: Reading): string {
  const first = kindOf(wanted[0] ?? "none");
  const example = first.example[reading.system];
  const text = `"${example} ${first[reading.system]}"`;
  if (first.dimension === "none") return `${phraseOf(wanted)} is needed, such as ${example}`;
  return `${phraseOf(wanted)} is needed, such as ${reading.unit === undefined ? `${example} or ${text}` : text}`;
}

function readText(given: string, wanted: readonly Dimension[], reading: Reading, argument: string): Quantity | Problem {
  const parsed = parseQuantity(given);
  if (parsed.kind !== "quantity") return valueProblem(argument, refusalSentence(given, parsed, wanted, reading));
  const unit =
    parsed.unit === undefined
      ? bareUnit(wanted, reading, argument)
      : unitOfText(given, parsed.unit, parsed.unitText, wanted, reading, argument);
  if (isProblem(unit)) return unit;
  const unitText = parsed.unitText === "" ? unit.symbol : parsed.unitText;
  const nominal = quantity(parsed.number, unit, given, unitText, wanted, reading, argument);
  if (isProblem(nominal) || parsed.half === undefined) return nominal;
  const tolerance = halfWidth(given, parsed, parsed.half, unit, argument);
  if (isProblem(tolerance)) return tolerance;
  if (!Number.isFinite(tolerance)) return notFinite(given, wanted, reading, argument);
  // Written out: a spread would take most of the time of reading a text again.
  return { value: nominal.value, dimension: nominal.dimension, tolerance, given, unit: unitText };
}

function refusalSentence(given: string, refusal: TextRefusal, wanted: readonly Dimension[], reading: Reading): string {
  if (refusal.kind === "refused") return `${quote(given)} ${refusal.says}.`;
  if (refusal.kind === "empty") return `${refusal.says}; ${needed(wanted, reading)}.`;
  return `${quote(given)} ${refusal.says}; ${needed(wanted, reading)}.`;
}

function unitOfText(
  given: string,
  unit: Unit | UnitProblem,
  unitText: string,
  wanted: readonly Dimension[],
  reading: Reading,
  argument: string,
): Unit | Problem {
  if (isProblem(unit)) return valueProblem(argument, unitSentence(given, unit, unitText, wanted, reading));
  const fitting = asWanted(unit, wanted);
  if (fitting) return fitting;
  return valueProblem(argument, `${quote(given)} is ${kindOf(unit.dimension).phrase}; ${needed(wanted, reading)}.`);
}

function unitSentence(given: string, unit: UnitProblem, unitText: string, wanted: readonly Dimension[], reading: Reading): string {
  if (unit.kind === "foreign") return `${quote(given)} ${unit.says}; ${needed(wanted, reading)}.`;
  if (unit.kind === "unclear") return `${quote(given)} has an unclear unit: ${unit.sentence}`;
  const units = nearest(unitText, wanted);
  return `${quote(given)} has an unknown unit, "${shorten(unitText)}"; ${needed(wanted, reading)}, in a unit such as ${units}.`;
}

const suggestions = 3;

/** The wanted units whose spelling is nearest to what was written. */
function nearest(written: string, wanted: readonly Dimension[]): string {
  const target = letters(written);
  const ranked = wanted
    .flatMap((dimension) => spellingsOf(dimension))
    .map((spellings) => ({ symbol: spellings[0], distance: Math.min(...spellings.map((one) => editDistance(letters(one), target))) }))
    .sort((one, other) => one.distance - other.distance)
    .slice(0, suggestions)
    .map((one) => one.symbol);
  const last = ranked.pop() ?? "-";
  return ranked.length === 0 ? last : `${ranked.join(", ")} or ${last}`;
}

function letters(text: string): string {
  return text
    .slice(0, 40)
    .normalize("NFKC")
    .toLowerCase()
    .replace(/[^a-zμ°%0-9]/g, "");
}

/** Levenshtein's distance, by rows. */
function editDistance(one: string, other: string): number {
  let row = Array.from({ length: other.length + 1 }, (_, at) => at);
  for (let i = 1; i <= one.length; i++) {
    const next = [i];
    for (let j = 1; j <= other.length; j++) {
      const changed = (row[j - 1] as number) + (one[i - 1] === other[j - 1] ? 0 : 1);
      next.push(Math.min(changed, (row[j] as number) + 1, (next[j - 1] as number) + 1));
    }
    row = next;
  }
  return row[other.length] as number;
}

/** Half-width in SI; of temperatures a difference in kelvin. */
function halfWidth(given: string, parsed: QuantityText, half: HalfWidth, unit: Unit, argument: string): number | Problem {
  if (half.percent) return percentOf(given, parsed.number, half.size, unit, argument);
  if (half.unit === undefined) return half.size * unit.factor;
  if (isProblem(half.unit)) return valueProblem(argument, `${quote(given)} has a tolerance whose unit ${half.unit.sentence}`);
  if (kindOf(half.unit.dimension).vector.join() === kindOf(unit.dimension).vector.join()) return half.size * half.unit.factor;
  const { phrase } = kindOf(half.unit.dimension);
  const own = kindOf(unit.dimension).phrase;
  return valueProblem(
    argument,
    `${quote(given)} has a tolerance that is ${phrase}; the tolerance of ${own} is needed, such as "± ${formatNumber(half.size)} ${parsed.unitText}".`,
  );
}

function percentOf(given: string, number: number, size: number, unit: Unit, argument: string): number | Problem {
  const shown = formatNumber(number);
  const part = formatNumber((Math.abs(number) * size) / 100);
  if (unit.offset !== undefined) {
    const example = `"${shown} ± 2 ${unit.symbol}"`;
    return valueProblem(
      argument,
      `${quote(given)} has a percentage of ${unit.symbol}, whose zero is arbitrary; write the half-width in degrees, such as ${example}.`,
    );
  }
  if (unit.dimension === "none") {
    const percentSign = unit.symbol === "%";
    const relative = percentSign ? `"(${shown} ± ${part}) %"` : `"${shown} ± ${part}"`;
    const points = `"(${shown} ± ${formatNumber(size)}) %"`;
    return valueProblem(argument, `${quote(given)} may mean percent of the value or percentage points; write ${relative} or ${points}.`);
  }
  return ((Math.abs(number) * size) / 100) * unit.factor;
}
