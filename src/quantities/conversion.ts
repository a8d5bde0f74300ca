/** From a unit to SI, back, and from any unit to any other of the same dimension. */
import { kindOf } from "./dimensions.js";
import { isProblem, type Problem, valueProblem } from "./problems.js";
import { parseQuantity, type TextRefusal } from "./quantity-text.js";
import { fromSI, toSI } from "./scale.js";
import { readUnit, shorten, type Unit, type UnitProblem } from "./units.js";

export { fromSI, fromSITolerance, toSI } from "./scale.js";

interface Measured {
  readonly number: number;
  readonly unit: Unit;
}

/**
 * The number that `value` is in the unit `to`. A text carries its own unit, then `from` stays empty. Temperatures convert as
 * temperatures; differences are asked for with a Δ (`ΔK`, `Δ°F`). Gauge pressures are above a standard atmosphere of 101 325 Pa.
 */
export function convert(value: number | string, from: string, to: string): number | Problem {
  const target = namedUnit(to, "to");
  const source = typeof value === "number" ? measuredNumber(value, from) : measuredText(value, from);
  if (isProblem(source)) return source;
  if (isProblem(target)) return target;
  const { unit } = source;
  if (unit.dimension !== target.dimension) return mismatch(unit, target);
  const si = toSI(source.number, unit);
  if (unit.dimension === "temperature" && si < 0) {
    return valueProblem("value", `${source.number} ${unit.symbol} is below absolute zero, which is -273.15 °C, -459.67 °F or 0 K.`);
  }
  const converted = withoutResidue(fromSI(si, target), target);
  return Number.isFinite(converted) ? converted : valueProblem("value", "is too large a number to convert.");
}

/** The way over kelvin leaves a residue of some 1e-13 degrees, so that 32 °F would not quite be zero. */
function withoutResidue(value: number, unit: Unit): number {
  return unit.offset === undefined ? value : Number(value.toFixed(11));
}

function namedUnit(text: string, argument: string): Unit | Problem {
  if (text.trim() === "") return valueProblem(argument, 'is empty; a unit is needed, such as "m" or "degF".');
  const unit = readUnit(text);
  return isProblem(unit) ? valueProblem(argument, sentenceAbout(unit)) : unit;
}

function sentenceAbout(unit: UnitProblem): string {
  if (unit.kind === "unclear") return unit.sentence;
  return `${unit.sentence.slice(0, -1)}; write a unit such as "m", "degF" or "W/(m²·K)".`;
}

function measuredNumber(number: number, from: string): Measured | Problem {
  if (!Number.isFinite(number)) return valueProblem("value", "is not a finite number; write a number such as 72.");
  if (from.trim() === "")
    return valueProblem("from", 'is empty; a number needs its unit, such as "degF", or write the value as text, such as "72 degF".');
  const unit = namedUnit(from, "from");
  return isProblem(unit) ? unit : { number, unit };
}

function measuredText(text: string, from: string): Measured | Problem {
  const shown = `"${shorten(text.trim())}"`;
  const parsed = parseQuantity(text);
  if (parsed.kind !== "quantity") return valueProblem("value", refusalSentence(shown, parsed));
  if (parsed.half !== undefined)
    return valueProblem("value", `${shown} has a tolerance, which one number cannot show; convert value and half-width apart.`);
  if (parsed.unit === undefined) return measuredNumber(parsed.number, from);
  if (isProblem(parsed.unit)) return valueProblem("value", sentenceAbout(parsed.unit));
  if (from.trim() !== "") return valueProblem("from", `must stay empty, for the value ${shown} carries its own unit.`);
  return { number: parsed.number, unit: parsed.unit };
}

function refusalSentence(shown: string, refusal: TextRefusal): string {
  if (refusal.kind === "empty") return 'is empty; write a number, or a text with its unit such as "72 degF".';
  if (refusal.kind === "refused") return `${shown} ${refusal.says}.`;
  return `${shown} ${refusal.says}; write a text such as "72 degF".`;
}

function mismatch(source: Unit, target: Unit): Problem {
  const what = `"${source.symbol}" is ${kindOf(source.dimension).phrase}`;
  return valueProblem("to", `"${target.symbol}" is ${kindOf(target.dimension).phrase} and ${what}; both units must be of one kind.`);
}
