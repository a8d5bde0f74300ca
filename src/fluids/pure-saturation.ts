/** Saturated liquid and vapour of a pure fluid, by temperature and by pressure. */
import { coverageProblem, isProblem, type Problem } from "../quantities/problems.js";
import type { Saturation } from "./fluid.js";
import type { PureModel } from "./pure-model.js";
import type { PureRecord } from "./pure-record.js";
import { nearCritical, sentenceName } from "./pure-refusal.js";
import { isBelow, sayPressure, sayTemperature } from "./refusal.js";

/** The state of both phases at a temperature in K. */
export function saturationAtTemperature(record: PureRecord, model: PureModel, T: number): Saturation | Problem {
  const { phases } = model;
  const coldest = record.T[0];
  if (!Number.isFinite(T) || isBelow(T, coldest) || isBelow(phases.domeTop, T)) {
    const given = Number.isFinite(T) ? `${sayTemperature(T)} was given` : "no number was given";
    const span = `${sayTemperature(coldest)} to ${sayTemperature(phases.domeTop)}`;
    return coverageProblem(undefined, `${sentenceName(record.name)} has a saturation state only from ${span}; ${given}.`);
  }
  const pair = phases.saturation(T);
  const liquid = pair && model.state(T, pair.pressure, pair.liquid, "liquid");
  const vapour = pair && model.state(T, pair.dewPressure, pair.vapour, "gas");
  if (!liquid || !vapour) return nearCritical(record, T, phases.roughPressure(T));
  const latentHeat = (vapour.enthalpy as number) - (liquid.enthalpy as number);
  return { T, p: pair.pressure, liquid, vapour, latentHeat, surfaceTension: surfaceTension(record, T) };
}

/** The state of both phases at a pressure in Pa; of a blend at its bubble point. */
export function saturationAtPressure(record: PureRecord, model: PureModel, p: number): Saturation | Problem {
  const T = saturationTemperature(record, model, p);
  return isProblem(T) ? T : saturationAtTemperature(record, model, T);
}

function surfaceTension({ surfaceTension: given }: PureRecord, T: number): number | undefined {
  if (!given) return undefined;
  const theta = Math.max(0, 1 - T / given.T);
  return given.terms.reduce((sum, [a, n]) => sum + a * theta ** n, 0);
}

function saturationTemperature(record: PureRecord, { phases }: PureModel, p: number): number | Problem {
  const pressureAt = (T: number): number => phases.saturation(T)?.pressure ?? phases.roughPressure(T);
  const coldest = record.T[0];
  const lowest = pressureAt(coldest);
  const highest = record.critical.p;
  if (!Number.isFinite(p) || isBelow(p, lowest) || isBelow(highest, p)) {
    const given = Number.isFinite(p) ? `${sayPressure(p)} was given` : "no number was given";
    const span = `${sayPressure(lowest)} (${sayTemperature(coldest)}) and its critical pressure, ${sayPressure(highest)}`;
    return coverageProblem(undefined, `${sentenceName(record.name)} boils only between ${span}; ${given}.`);
  }
  // ln p against 1/T is nearly straight.
  return 1 / rootBetween((x) => Math.log(pressureAt(1 / x) / p), 1 / coldest, 1 / phases.domeTop);
}

/** Root of a rising function by regula falsi (Illinois variant); the end itself where the root lies beyond it. */
function rootBetween(f: (x: number) => number, from: number, to: number): number {
  let a = from;
  let b = to;
  let fa = f(a);
  let fb = f(b);
  if (fa >= 0) return a;
  if (fb <= 0) return b;
  let kept = 0;
  for (let count = 0; count < 100; count++) {
    const x = (a * fb - b * fa) / (fb - fa);
    const fx = f(x);
    if (Math.abs(fx) < 1e-12 || Math.abs(b - a) < 1e-14 * a) return x;
    if (fx < 0) {
      a = x;
      fa = fx;
      if (kept < 0) fb /= 2;
      kept = -1;
    } else {
      b = x;
      fb = fx;
      if (kept > 0) fa /= 2;
      kept = 1;
    }
  }
  return (a + b) / 2;
}
