/** The sentences with which a pure fluid refuses a state: solid, two-phase, at the critical point. */
import { coverageProblem, type Problem } from "../quantities/problems.js";
import { meltingPressure, meltingTemperature } from "./melting-line.js";
import type { SaturationPoint } from "./phase-equation.js";
import type { PureRecord } from "./pure-record.js";
import { figures, impossible, outside, sayPressure, sayTemperature } from "./refusal.js";

/** Lowest pressure offered: a hundredth of a pascal is no continuum in any duct, but vapours of cold liquids reach it. */
export const thinnest = 1e-2;
/** Published melting lines and triple points disagree by some hundredths of a kelvin, K. */
const meltingSlack = 0.1;

/** The name as a sentence begins with it: "Nitrogen", but "n-pentane". */
export function sentenceName(name: string): string {
  return /^[a-z]-/.test(name) ? name : name.charAt(0).toUpperCase() + name.slice(1);
}

function stateWords({ name }: PureRecord, T: number, p: number): string {
  return `${sentenceName(name)} at ${sayTemperature(T)} and ${sayPressure(p)}`;
}

/** What is wrong with a state before any equation is asked; undefined where nothing is. */
export function refusedState(record: PureRecord, T: number, p: number): Problem | undefined {
  const limits = { T: record.T, p: [thinnest, record.pMax] } as const;
  return impossible(T, p) ?? outside(sentenceName(record.name), limits, T, p) ?? solid(record, T, p);
}

function solid(record: PureRecord, T: number, p: number): Problem | undefined {
  if (!record.melting) return undefined;
  const highest = meltingPressure(record.melting, T + meltingSlack);
  if (highest === undefined || p <= Math.max(highest, thinnest)) return undefined;
  const melts = meltingTemperature(record.melting, p);
  const nearest = melts === undefined ? "" : `, or at ${sayTemperature(melts)} at this pressure`;
  const pressure = sayPressure(meltingPressure(record.melting, T) ?? highest);
  return coverageProblem(undefined, `${stateWords(record, T, p)} is solid: it melts at ${pressure} at this temperature${nearest}.`);
}

export function twoPhase(record: PureRecord, T: number, p: number, { liquid, vapour, pressure, dewPressure }: SaturationPoint): Problem {
  const line = record.saturation.dewPressure
    ? `inside its two-phase region: it boils at ${sayPressure(pressure)} and condenses at ${sayPressure(dewPressure)} at this temperature`
    : `on its saturation line (${sayPressure(pressure)} at this temperature)`;
  const densities = `${figures(liquid * record.molarMass)} kg/m³ as liquid, ${figures(vapour * record.molarMass)} kg/m³ as vapour`;
  return coverageProblem(
    undefined,
    `${stateWords(record, T, p)} is ${line}, ${densities}; ask for saturated liquid or vapour, or move off the line.`,
  );
}

export function nearCritical(record: PureRecord, T: number, p: number): Problem {
  const point = `${sayTemperature(record.critical.T)}, ${sayPressure(record.critical.p)}`;
  return coverageProblem(
    undefined,
    `${stateWords(record, T, p)} is at its critical point (${point}), where its properties have no definite value; take a state further away.`,
  );
}
