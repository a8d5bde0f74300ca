/** Numbers and values as the pane prints them: powers of ten raised, the unit after a space. */
import type { WordValue } from "../findings/finding.js";
import { formatNumber, formatQuantity } from "../quantities/format.js";
import { isProblem } from "../quantities/problems.js";

const raisedDigits = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/** `0.3`, `101300`, `1.074·10⁸`, `10¹²`; `∞` where there is no limit. */
export function figure(value: number, digits = 4): string {
  if (value === Number.POSITIVE_INFINITY) return "∞";
  if (value === Number.NEGATIVE_INFINITY) return "−∞";
  return raisedPowers(formatNumber(value, digits));
}

/** Turns the `2.1e13` of sentences into `2.1·10¹³`, and a leading hyphen into a minus sign. */
export function raisedPowers(text: string): string {
  return text
    .replace(/\b(\d+(?:\.\d+)?)e([+-]?)(\d+)\b/g, (_, mantissa: string, sign: string, power: string) => {
      const ten = `10${sign === "-" ? "⁻" : ""}${[...power].map((digit) => raisedDigits[Number(digit)]).join("")}`;
      return mantissa === "1" ? ten : `${mantissa}·${ten}`;
    })
    .replace(/^-/, "−");
}

/** What a word of `give` came to, as text; undefined where a problem stands in its place. */
export function shownValue(value: WordValue | undefined, system: "SI" | "US", digits = 4): string | undefined {
  if (value === undefined || isProblem(value)) return undefined;
  return typeof value === "string" ? value : raisedPowers(formatQuantity(value.value, value.dimension, system, digits));
}
