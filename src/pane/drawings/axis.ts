/** A straight axis, linear or logarithmic: where a value lies on it, and where its marks stand. */

import { figure, raisedPowers } from "../figures.js";

export interface Axis {
  readonly scale: "linear" | "log";
  readonly from: number;
  readonly to: number;
}

/** 0 at the start of the axis, 1 at its end; values beyond lie beyond. */
export function along(axis: Axis, value: number): number {
  if (axis.scale === "linear") return (value - axis.from) / (axis.to - axis.from);
  return (Math.log10(value) - Math.log10(axis.from)) / (Math.log10(axis.to) - Math.log10(axis.from));
}

/** The value at a place from 0 to 1: what `along` undoes. */
export function valueAlong(axis: Axis, part: number): number {
  if (axis.scale === "linear") return axis.from + part * (axis.to - axis.from);
  return 10 ** (Math.log10(axis.from) + part * (Math.log10(axis.to) - Math.log10(axis.from)));
}

/** Round values along the axis, at most `most` of them. */
export function marks(axis: Axis, most: number): readonly number[] {
  return axis.scale === "linear" ? linearMarks(axis, most) : logMarks(axis, most);
}

function linearMarks({ from, to }: Axis, most: number): readonly number[] {
  const step = roundStep((to - from) / Math.max(1, most - 1));
  const found: number[] = [];
  // Where the axis is shorter than the digits of its ends can tell, there are no round values on it.
  if (!(Math.abs(from) / step < 1e9 && Math.abs(to) / step < 1e9)) return found;
  for (let i = Math.ceil(from / step - 1e-9); i * step <= to + step * 1e-9; i++) found.push(Number((i * step).toPrecision(12)));
  return found;
}

function roundStep(rough: number): number {
  const power = 10 ** Math.floor(Math.log10(rough));
  return ([1, 2, 5, 10].find((one) => one * power >= rough * 0.999) ?? 10) * power;
}

function logMarks({ from, to }: Axis, most: number): readonly number[] {
  const first = Math.ceil(Math.log10(from) - 1e-9);
  const last = Math.floor(Math.log10(to) + 1e-9);
  const step = Math.max(1, Math.ceil((last - first + 1) / most));
  const found: number[] = [];
  for (let power = Math.ceil(first / step) * step; power <= last; power += step) found.push(Number(`1e${power}`));
  return found;
}

/** A mark as it is printed: on a logarithmic axis powers of ten from 10⁴ and below 10⁻³ on. */
export function markText(axis: Axis, value: number): string {
  const isFar = axis.scale === "log" && Math.abs(Math.log10(value)) >= 3.5;
  return isFar ? raisedPowers(value.toExponential()) : figure(value);
}

/** A linear axis that holds all values, with round ends. */
export function axisAround(values: readonly number[], fromZero: boolean): Axis {
  const low = fromZero ? Math.min(0, ...values) : Math.min(...values);
  const high = Math.max(...values, fromZero ? 0 : Number.NEGATIVE_INFINITY);
  const room = high - low || Math.abs(high) || 1;
  const step = roundStep(room / 4);
  return { scale: "linear", from: Math.floor(low / step + 1e-9) * step, to: Math.ceil(high / step - 1e-9) * step || step };
}
