/**
 * A cell's text taken apart: number, tolerance, unit. What is wanted there, and which unit a bare number has, is not known here,
 * so one parse serves every argument and is kept.
 */
import { formatNumber } from "./format.js";
import { isProblem } from "./problems.js";
import { superscriptsToPowers } from "./unit-grammar.js";
import { readUnit, shorten, type Unit, type UnitProblem } from "./units.js";

export interface HalfWidth {
  readonly size: number;
  readonly percent: boolean;
  /** Its own unit, when one stands after it besides the value's. */
  readonly unit?: Unit | UnitProblem;
}

export interface QuantityText {
  readonly kind: "quantity";
  readonly number: number;
  readonly half?: HalfWidth;
  /** Absent for a bare number. */
  readonly unit?: Unit | UnitProblem;
  /** The unit as written. */
  readonly unitText: string;
}

/** `says` follows the quoted text; with `kind: "no number"` it wants to hear what is needed. */
export interface TextRefusal {
  readonly kind: "empty" | "no number" | "refused";
  readonly says: string;
}

const cacheSize = 400;
const longestText = 200;
const cache = new Map<string, QuantityText | TextRefusal>();

/** Never throws; texts read before come from a bounded cache. */
export function parseQuantity(text: string): QuantityText | TextRefusal {
  const known = cache.get(text);
  if (known !== undefined) return known;
  const parsed = parsePlain(text) ?? parse(tidy(text));
  if (text.length > longestText) return parsed;
  if (cache.size >= cacheSize) cache.clear();
  cache.set(text, parsed);
  return parsed;
}

const plain = /^([+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?) ?([A-Za-zµμ°%][^±+]*)?$/;

/** Most texts of a long column are a plain number and a known unit; they need none of what follows. */
function parsePlain(text: string): QuantityText | undefined {
  const found = plain.exec(text);
  if (found === null) return undefined;
  const unitText = found[2]?.trim() ?? "";
  const unit = unitText === "" ? undefined : readUnit(unitText);
  if (isProblem(unit)) return undefined;
  return { kind: "quantity", number: Number(found[1]), unit, unitText };
}

const NUMBER = "[+-]?(?:\\d[\\d.,]*|[.,]\\d[\\d.,]*)(?:[eE][+-]?\\d+(?![\\d.,]))?";
const RANGE_MARK = "(?:-|–|—|~|…|\\.\\.+|to\\b|through\\b)";
const number = new RegExp(`^(${NUMBER})`);
const timesPowerOfTen = /^\s?[×x·*]\s?10(?:\^([+-]?\d{1,3})|([⁺⁻]?[⁰¹²³⁴-⁹]{1,3}))(?!\d)/;
const range = new RegExp(`^(${NUMBER})\\s*${RANGE_MARK}\\s*(${NUMBER})(.*)$`);
const laterRange = new RegExp(`^(.+?)\\s*${RANGE_MARK}\\s*(${NUMBER})(.*)$`);
const fraction = /^([+-]?)(?:(\d+)[\s-]+)?(\d+)\s*[/⁄]\s*(\d+)(?![\d.,])(.*)$/;

/** Typographic signs and spaces as their plain ones. Groups of three are joined only over spaces that no one types by chance. */
function tidy(text: string): string {
  return text
    .slice(0, longestText + 1)
    .replace(/(?<![\d.,])\d{1,3}(?:[\u00a0\u2009\u202f]\d{3})+(?![\u00a0\u2009\u202f]?\d)/g, (digits) => digits.replace(/\D/g, ""))
    .replace(/[\s\u200b\u2060\ufeff]+/g, " ")
    .trim()
    .replace(/[−﹣-]/g, "-")
    .replace(/\+\s?\/\s?-|\+-/g, "±")
    .replace(/(^|±) ?[–‐‑] ?(?=[\d.,])/g, "$1-")
    .replace(/^([+-]) (?=[\d.,])/, "$1");
}

function parse(text: string): QuantityText | TextRefusal {
  if (text === "") return { kind: "empty", says: "is empty" };
  if (text.length > longestText) return { kind: "no number", says: "is too long for a quantity" };
  const enclosed = /^\(([^()]*±[^()]*)\)(.*)$/.exec(text);
  const parts = (enclosed?.[1] ?? text).split("±");
  if (parts.length > 2) return refused('has more than one tolerance; write one half-width, such as "20 ± 2 °C"');
  const [left = "", right] = parts.map((part) => part.trim());
  const trouble = fractionIn(left) ?? rangeIn(left) ?? mixedDecimals(left, right);
  if (trouble) return trouble;
  const value = leadingNumber(left);
  if (!("value" in value)) return value;
  if (right === undefined) return withUnit(value.value, value.rest, undefined);
  return withTolerance(value, right, enclosed?.[2]?.trim());
}

interface Leading {
  readonly value: number;
  readonly rest: string;
}

function refused(says: string): TextRefusal {
  return { kind: "refused", says };
}

function leadingNumber(text: string): Leading | TextRefusal {
  const written = number.exec(text)?.[1];
  if (written === undefined) return { kind: "no number", says: "does not begin with a number" };
  const value = decimal(written);
  if (typeof value !== "number") return value;
  const after = text.slice(written.length);
  const power = timesPowerOfTen.exec(after);
  if (power === null) return { value, rest: after.trim() };
  const scaled = Number(`${value}e${power[1] ?? superscriptsToPowers(power[2] as string).slice(1)}`);
  // A number that has an exponent already takes no second one; `Number` then yields nothing.
  if (Number.isNaN(scaled)) return { kind: "no number", says: "does not begin with a number" };
  return { value: scaled, rest: after.slice(power[0].length).trim() };
}

/** One comma, no point, not exactly three digits after it: a decimal comma. Any other comma is refused. */
function decimal(written: string): number | TextRefusal {
  const [digits = "", exponent] = written.split(/e/i);
  const commas = digits.split(",").length - 1;
  const points = digits.split(".").length - 1;
  const tail = exponent === undefined ? "" : `e${exponent}`;
  if (commas === 0)
    return points > 1 ? { kind: "no number", says: `holds "${shorten(digits)}", which is not a number` } : Number(digits + tail);
  const after = digits.length - digits.indexOf(",") - 1;
  if (commas > 1 || points > 0 || after === 0) {
    return refused(
      "has a comma that cannot be read for certain; write the number with one decimal point and no thousands separators, such as 1234.5",
    );
  }
  if (after !== 3) return Number(digits.replace(",", ".") + tail);
  const asDecimal = digits.replace(",", ".").replace(/^([+-]?)\./, "$10.");
  if (/^[+-]?0*,/.test(digits)) return refused(`has a comma with three digits after it; write ${asDecimal}${tail} with a decimal point`);
  return refused(`has a comma that may separate thousands or decimals; write ${digits.replace(",", "")}${tail} or ${asDecimal}${tail}`);
}

function mixedDecimals(left: string, right: string | undefined): TextRefusal | undefined {
  const value = number.exec(left)?.[1] ?? "";
  const half = number.exec(right ?? "")?.[1] ?? "";
  const mixes = (one: string, other: string): boolean => one.includes(",") && other.includes(".");
  if (!mixes(value, half) && !mixes(half, value)) return undefined;
  return refused("mixes a decimal comma with a decimal point; write both numbers with a point");
}

function fractionIn(text: string): TextRefusal | undefined {
  const found = fraction.exec(text);
  if (found) {
    const [, sign = "", whole = "0", above = "0", below = "1", rest = ""] = found;
    const value = Number(whole) + Number(above) / Number(below);
    const example = Number.isFinite(value) ? `, such as "${`${sign}${formatNumber(value, 7)} ${rest.trim()}`.trim()}"` : "";
    return refused(`holds a fraction; write it as a decimal${example}`);
  }
  return /[¼½¾⅐-⅞]/.test(text) ? refused('holds a fraction; write it as a decimal, such as "0.5 in"') : undefined;
}

function rangeIn(text: string): TextRefusal | undefined {
  const found = range.exec(text);
  if (!found) return undefined;
  return rangeRefusal(found[1] as string, found[2] as string, (found[3] as string).trim());
}

function rangeRefusal(from: string, to: string, unitText: string): TextRefusal {
  const low = decimal(from);
  const high = decimal(to);
  const unit = unitText === "" || isProblem(readUnit(unitText)) ? "" : ` ${unitText}`;
  const known = typeof low === "number" && typeof high === "number" && Number.isFinite(low) && Number.isFinite(high);
  const example = known ? `${formatNumber(low + (high - low) / 2)} ± ${formatNumber(Math.abs(high - low) / 2)}${unit}` : "6 ± 1";
  return refused(`is a range of two numbers; write the middle and the half-width, such as "${example}"`);
}

function withUnit(value: number, unitText: string, half: HalfWidth | undefined): QuantityText | TextRefusal {
  const parsed = { kind: "quantity", number: value, unitText, half } as const;
  if (unitText === "") return parsed;
  const unit = readUnit(unitText);
  const trouble = isProblem(unit) && unit.kind === "unknown" ? severalNumbers(value, unitText) : undefined;
  return trouble ?? { ...parsed, unit };
}

/** `5 m - 7 m`, `5 ft 6 in`, `101 325 Pa`: the unit is unreadable because a second number stands in it. */
function severalNumbers(value: number, unitText: string): TextRefusal | undefined {
  const later = laterRange.exec(unitText);
  if (later && !isProblem(readUnit(later[1] as string))) {
    return rangeRefusal(String(value), later[2] as string, later[1] as string);
  }
  if (!/(?:^|[\s'"’′″])[+-]?\d/.test(unitText)) return undefined;
  return refused('holds more than one number; write one number without spaces and one unit, such as "1500 mm"');
}

function withTolerance(value: Leading, right: string, sharedUnit: string | undefined): QuantityText | TextRefusal {
  const half = leadingNumber(right);
  if (!("value" in half)) return half.kind === "refused" ? half : refused('has no number after the ±; write it as in "20 ± 2 °C"');
  if (half.value < 0) return refused("has a negative tolerance; write the half-width as a positive number");
  const percent = half.rest.startsWith("%") || /^per ?cent\b/i.test(half.rest);
  const rest = percent ? half.rest.replace(/^%|^per ?cent/i, "").trim() : half.rest;
  const width = { size: half.value, percent };
  if (sharedUnit !== undefined) {
    if (value.rest !== "" || rest !== "") return refused('has units inside and outside the parentheses; write it as in "(20 ± 2) °C"');
    return withUnit(value.value, sharedUnit, width);
  }
  if (value.rest === "") return withUnit(value.value, rest, width);
  if (rest === "") return withUnit(value.value, value.rest, width);
  if (percent) return refused('has a unit after a percentage as well; write it as in "12 m/s ± 10 %"');
  return withUnit(value.value, value.rest, { ...width, unit: readUnit(rest) });
}
