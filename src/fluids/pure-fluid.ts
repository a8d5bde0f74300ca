/** A fluid of the shelf from its record: equations, limits, saturation and what to say about them. */
import type { Problem } from "../quantities/problems.js";
import type { Fluid, FluidRange, Phase, State } from "./fluid.js";
import type { Side } from "./phase-equation.js";
import { pureModel, type ReferenceRecords } from "./pure-model.js";
import type { PureRecord } from "./pure-record.js";
import { nearCritical, refusedState, thinnest, twoPhase } from "./pure-refusal.js";
import { cautionsOf, uncertaintyOf } from "./pure-reliability.js";
import { saturationAtPressure, saturationAtTemperature } from "./pure-saturation.js";

export function pureRange(record: PureRecord): FluidRange {
  return { T: record.T, p: [thinnest, record.pMax] };
}

export function pureFluid(record: PureRecord, references: ReferenceRecords): Fluid {
  const model = pureModel(record, references);
  const { phases } = model;

  // What was found last, since a column repeats its bulk state. It changes no result.
  let lastT = Number.NaN;
  let lastP = Number.NaN;
  let lastRho = 0;
  let lastSide: Side = "beyond";
  let lastState: State | undefined;

  const locate = (T: number, p: number): Problem | undefined => {
    if (T === lastT && p === lastP) return undefined;
    const refused = refusedState(record, T, p);
    if (refused) return refused;
    const side = phases.sideOf(T, p);
    if (side === "between") {
      const pair = phases.saturation(T);
      return pair ? twoPhase(record, T, p, pair) : nearCritical(record, T, p);
    }
    const rho = phases.density(T, p, side);
    if (rho === undefined) return nearCritical(record, T, p);
    lastT = T;
    lastP = p;
    lastRho = rho;
    lastSide = side;
    lastState = undefined;
    return undefined;
  };

  const state = (T: number, p: number): State | Problem => {
    const refused = locate(T, p);
    if (refused) return refused;
    lastState ??= model.state(T, p, lastRho, phaseOf(record, T, p, lastSide));
    return lastState ?? nearCritical(record, T, p);
  };

  return {
    name: record.name,
    synonyms: record.synonyms,
    family: record.family,
    sources: record.sources,
    range: pureRange(record),
    molarMass: record.molarMass,
    critical: record.critical,
    freezingPoint: record.beginsAtFreezing === false ? undefined : record.T[0],
    constantDensity: false,
    state,
    density: (T, p) => locate(T, p) ?? lastRho * record.molarMass,
    uncertainty: uncertaintyOf(record),
    saturationAtPressure: (p) => saturationAtPressure(record, model, p),
    saturationAtTemperature: (T) => saturationAtTemperature(record, model, T),
    cautions: cautionsOf(record, references, state),
  };
}

function phaseOf({ critical }: PureRecord, T: number, p: number, side: Side): Phase {
  if (side === "liquid") return "liquid";
  return T >= critical.T && p >= critical.p ? "supercritical" : "gas";
}
