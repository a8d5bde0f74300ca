/** The sentences with which a formulation refuses a state: what was asked, the nearest limit, what to do. */
import { coverageProblem, type Problem } from "../quantities/problems.js";
import type { FluidRange } from "./fluid.js";

const zeroCelsius = 273.15;

/** "373.946 °C": six figures at most, no trailing zeros. */
export function sayTemperature(T: number): string {
  return `${figures(T - zeroCelsius)} °C`;
}

/** "56.2 °C": to a tenth of a degree, for values that are known no better. */
export function sayTenths(T: number): string {
  return `${figures(Math.round(10 * (T - zeroCelsius)) / 10)} °C`;
}

/** "101.325 kPa", in the unit that keeps the number short. */
export function sayPressure(p: number): string {
  if (p >= 1e6) return `${figures(p / 1e6)} MPa`;
  if (p >= 1e3) return `${figures(p / 1e3)} kPa`;
  return `${figures(p)} Pa`;
}

export function figures(value: number): string {
  const rounded = Number(value.toPrecision(6));
  return Math.abs(rounded) < 1e-9 ? "0" : String(rounded);
}

/** A value that no fluid has: not a number, zero or negative absolute temperature, zero or negative pressure. */
export function impossible(T: number, p: number): Problem | undefined {
  if (!Number.isFinite(T)) return coverageProblem(undefined, "The temperature is not a number.");
  if (T <= 0) return coverageProblem(undefined, `${sayTemperature(T)} is at or below absolute zero (-273.15 °C).`);
  if (!Number.isFinite(p)) return coverageProblem(undefined, "The pressure is not a number.");
  if (p <= 0) return coverageProblem(undefined, `An absolute pressure must be above zero; ${sayPressure(p)} was given.`);
  return undefined;
}

/** Outside the rectangle of a formulation: names the value, the limits, and the nearest temperature or pressure that is covered. */
export function outside(name: string, range: FluidRange, T: number, p: number): Problem | undefined {
  const [coldest, hottest] = range.T;
  const [thinnest, highest] = range.p;
  if (isBelow(T, coldest) || isBelow(hottest, T)) {
    const side = T < coldest ? "below" : "above";
    const limit = T < coldest ? coldest : hottest;
    return coverageProblem(
      undefined,
      `${name} at ${sayTemperature(T)} is ${side} its published range, ${sayTemperature(coldest)} to ${sayTemperature(hottest)}; nearest: ${sayTemperature(limit)}.`,
    );
  }
  if (isBelow(p, thinnest) || isBelow(highest, p)) {
    const side = p < thinnest ? "below" : "above";
    const limit = p < thinnest ? thinnest : highest;
    return coverageProblem(
      undefined,
      `${name} at ${sayPressure(p)} is ${side} its published range, ${sayPressure(thinnest)} to ${sayPressure(highest)}; nearest: ${sayPressure(limit)}.`,
    );
  }
  return undefined;
}

/** Less by more than a conversion between units leaves behind, so that 32 °F is not below 0 °C. */
export function isBelow(value: number, limit: number): boolean {
  return value < limit - 1e-9 * Math.abs(limit);
}
