/** Numbers and quantities as an engineer writes them in a sentence. Cells get plain numbers; only messages and traces come here. */
import type { Dimension } from "./quantity.js";
import { fromSI } from "./scale.js";
import { defaultUnit } from "./units.js";

const plainFrom = 1e-3;
const plainTo = 1e6;

/** `0.3`, `101300`, `2.1e13`: so many significant digits (four when not said), no trailing zeros, the minus an ASCII hyphen. */
export function formatNumber(value: number, digits = 4): string {
  if (Number.isNaN(value)) return "no number";
  if (!Number.isFinite(value)) return value > 0 ? "no upper limit" : "no lower limit";
  const places = Math.min(17, Math.max(1, Math.round(digits)));
  const rounded = Number(value.toPrecision(places));
  if (rounded === 0) return "0";
  const size = Math.abs(rounded);
  if (size >= plainFrom && size < plainTo) return String(rounded);
  const [mantissa = "0", exponent = "0"] = rounded.toExponential().split("e");
  return `${mantissa}e${Number(exponent)}`;
}

/** A value in SI (temperatures in kelvin) in the default unit of its dimension: `72 °F`, `0.3 m`, `2.1e13`. */
export function formatQuantity(valueSI: number, dimension: Dimension, system: "SI" | "US", digits = 4): string {
  const unit = defaultUnit(dimension, system);
  const number = formatNumber(withoutNoise(fromSI(valueSI, unit), dimension), digits);
  return unit.symbol === "-" ? number : `${number} ${unit.symbol}`;
}

/** Taking 273.15 from a kelvin value leaves a residue where the answer is zero. */
function withoutNoise(value: number, dimension: Dimension): number {
  return dimension === "temperature" && Math.abs(value) < 1e-9 ? 0 : value;
}
