/** A fluid of the shelf from its record: equation of state, transport, saturation, limits and what to say about them. */
import { coverageProblem, isProblem, type Problem } from "../quantities/problems.js";
import type { Fluid, FluidRange, Phase, Saturation, State, Uncertainty } from "./fluid.js";
import { meltingPressure, meltingTemperature } from "./melting-line.js";
import type { SaturationPoint, Side } from "./phase-equation.js";
import { pureModel, type ReferenceRecords } from "./pure-model.js";
import type { PureRecord } from "./pure-record.js";
import { impossible, isBelow, outside, sayPressure, sayTemperature } from "./refusal.js";

/** Lowest pressure offered: a hundredth of a pascal is no continuum in any duct, but vapours of cold liquids reach it. */
const thinnest = 1e-2;
/** Published melting lines and triple points disagree by some hundredths of a kelvin, K. */
const meltingSlack = 0.1;

export function pureRange(record: PureRecord): FluidRange {
  return { T: record.T, p: [thinnest, record.pMax] };
}

export function pureFluid(record: PureRecord, references: ReferenceRecords): Fluid {
  const range = pureRange(record);
  const model = pureModel(record, references);
  const { phases } = model;
  const blend = record.saturation.dewPressure !== undefined;
  const { molarMass, name } = record;
  const capitalised = /^[a-z]-/.test(name) ? name : name.charAt(0).toUpperCase() + name.slice(1);
  const tripleOrLimit = record.T[0];

  const refusal = (T: number, p: number): Problem | undefined => {
    const out = impossible(T, p) ?? outside(capitalised, range, T, p);
    if (out || !record.melting) return out;
    const solid = meltingPressure(record.melting, T + meltingSlack);
    if (solid === undefined || p <= Math.max(solid, thinnest)) return undefined;
    const melts = meltingTemperature(record.melting, p);
    return coverageProblem(
      undefined,
      `${capitalised} at ${sayTemperature(T)} and ${sayPressure(p)} is solid: it melts at ${sayPressure(solid)} at this temperature${
        melts === undefined ? "" : `, or at ${sayTemperature(melts)} at this pressure`
      }.`,
    );
  };

  // What was found last, since a column repeats its bulk state. It changes no result.
  let lastT = Number.NaN;
  let lastP = Number.NaN;
  let lastRho = 0;
  let lastSide: Side = "beyond";
  let lastState: State | undefined;

  const locate = (T: number, p: number): Problem | undefined => {
    if (T === lastT && p === lastP) return undefined;
    const refused = refusal(T, p);
    if (refused) return refused;
    const side = phases.sideOf(T, p);
    if (side === "between") return twoPhase(T, p);
    const rho = phases.density(T, p, side);
    if (rho === undefined) return nearCritical(T, p);
    lastT = T;
    lastP = p;
    lastRho = rho;
    lastSide = side;
    lastState = undefined;
    return undefined;
  };

  const twoPhase = (T: number, p: number): Problem => {
    const pair = phases.saturation(T);
    if (!pair) return nearCritical(T, p);
    const densities = `${(pair.liquid * molarMass).toPrecision(5)} kg/m³ as liquid, ${(pair.vapour * molarMass).toPrecision(5)} kg/m³ as vapour`;
    const line = blend
      ? `inside its two-phase region: it boils at ${sayPressure(pair.pressure)} and condenses at ${sayPressure(pair.dewPressure)} at this temperature`
      : `on its saturation line (${sayPressure(pair.pressure)} at this temperature)`;
    return coverageProblem(
      undefined,
      `${capitalised} at ${sayTemperature(T)} and ${sayPressure(p)} is ${line}, ${densities}; ask for saturated liquid or vapour, or move off the line.`,
    );
  };

  const nearCritical = (T: number, p: number): Problem =>
    coverageProblem(
      undefined,
      `${capitalised} at ${sayTemperature(T)} and ${sayPressure(p)} is at its critical point (${sayTemperature(record.critical.T)}, ${sayPressure(
        record.critical.p,
      )}), where its properties have no definite value; take a state further away.`,
    );

  const phaseOf = (T: number, p: number, side: Side): Phase => {
    if (side === "liquid") return "liquid";
    return T >= record.critical.T && p >= record.critical.p ? "supercritical" : "gas";
  };

  const stateAt = (T: number, p: number, rho: number, phase: Phase): State | Problem => model.state(T, p, rho, phase) ?? nearCritical(T, p);

  const state = (T: number, p: number): State | Problem => {
    const refused = locate(T, p);
    if (refused) return refused;
    if (lastState) return lastState;
    const found = stateAt(T, p, lastRho, phaseOf(T, p, lastSide));
    if (!isProblem(found)) lastState = found;
    return found;
  };

  const density = (T: number, p: number): number | Problem => locate(T, p) ?? lastRho * molarMass;

  const saturationOf = (T: number, pair: SaturationPoint): Saturation | Problem => {
    const liquid = stateAt(T, pair.pressure, pair.liquid, "liquid");
    if (isProblem(liquid)) return liquid;
    const vapour = stateAt(T, pair.dewPressure, pair.vapour, "gas");
    if (isProblem(vapour)) return vapour;
    return {
      T,
      p: pair.pressure,
      liquid,
      vapour,
      latentHeat: (vapour.enthalpy as number) - (liquid.enthalpy as number),
      surfaceTension: record.surfaceTension && surfaceTension(record.surfaceTension, T),
    };
  };

  const saturationAtTemperature = (T: number): Saturation | Problem => {
    if (!Number.isFinite(T) || isBelow(T, tripleOrLimit) || isBelow(phases.domeTop, T)) {
      return coverageProblem(
        undefined,
        `${capitalised} has a saturation state only from ${sayTemperature(tripleOrLimit)} to ${sayTemperature(phases.domeTop)}; ${
          Number.isFinite(T) ? `${sayTemperature(T)} was given` : "no number was given"
        }.`,
      );
    }
    const pair = phases.saturation(T);
    return pair ? saturationOf(T, pair) : nearCritical(T, phases.roughPressure(T));
  };

  const saturationAtPressure = (p: number): Saturation | Problem => {
    const T = saturationTemperature(p);
    return isProblem(T) ? T : saturationAtTemperature(T);
  };

  const saturationPressure = (T: number): number =>
    blend ? phases.roughPressure(T) : (phases.saturation(T)?.pressure ?? phases.roughPressure(T));

  /** By regula falsi in ln p against 1/T, where the line is nearly straight (Illinois variant, bracketed). */
  const saturationTemperature = (p: number): number | Problem => {
    const lowest = saturationPressure(tripleOrLimit);
    const highest = record.critical.p;
    if (!Number.isFinite(p) || isBelow(p, lowest) || isBelow(highest, p)) {
      return coverageProblem(
        undefined,
        `${capitalised} boils only between ${sayPressure(lowest)} (${sayTemperature(tripleOrLimit)}) and its critical pressure, ${sayPressure(highest)}; ${
          Number.isFinite(p) ? `${sayPressure(p)} was given` : "no number was given"
        }.`,
      );
    }
    let a = 1 / tripleOrLimit;
    let b = 1 / phases.domeTop;
    const miss = (x: number): number => Math.log(saturationPressure(1 / x) / p);
    let fa = miss(a);
    let fb = miss(b);
    if (fa >= 0) return tripleOrLimit;
    if (fb <= 0) return phases.domeTop;
    let kept = 0;
    for (let count = 0; count < 100; count++) {
      const x = (a * fb - b * fa) / (fb - fa);
      const fx = miss(x);
      if (Math.abs(fx) < 1e-12 || Math.abs(b - a) < 1e-14 * a) return 1 / x;
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
    return 2 / (a + b);
  };

  const close = (T: number, p: number): boolean => {
    const { T: Tc, p: pc } = record.critical;
    return Math.abs(T / Tc - 1) < 0.05 && p > 0.75 * pc && p < 1.6 * pc;
  };

  const predictedFrom = predictedFromTemperature(record, references);
  const plain = uncertaintyOf(record, 1);
  const critical = uncertaintyOf(record, 10);

  return {
    name,
    synonyms: record.synonyms,
    family: record.family,
    sources: record.sources,
    range,
    molarMass,
    critical: record.critical,
    freezingPoint: record.beginsAtFreezing === false ? undefined : tripleOrLimit,
    constantDensity: false,
    state,
    density,
    uncertainty: (T, p) => (close(T, p) ? critical : plain),
    saturationAtPressure,
    saturationAtTemperature,
    cautions: (T, p) => cautionsAt(T, p),
  };

  function cautionsAt(T: number, p: number): readonly string[] {
    const said = [...record.cautions];
    if (close(T, p)) {
      said.push(
        `Close to the critical point of ${name} properties change steeply and heat transfer can deteriorate; ordinary equations do not hold here.`,
      );
    }
    if (record.predictive) said.push(`The ${record.predictive} of ${name} comes from a predictive method, good to 5 to 10 %.`);
    if (T < predictedFrom) {
      said.push(
        `Below ${sayTemperature(predictedFrom)} the method that predicts transport of ${name} leaves its reference fluid's range; expect twice its uncertainty or more.`,
      );
    }
    const limits = record.viscosityT;
    if (limits && (T < limits[0] || T > limits[1])) {
      said.push(
        `The viscosity of ${name} holds from ${sayTemperature(limits[0])} to ${sayTemperature(limits[1])} only; none is given here.`,
      );
    }
    if (!record.melting && p > 1e7 && T < 1.2 * tripleOrLimit)
      said.push(`No melting line of ${name} stands on the shelf: under this pressure it may be solid so close to its freezing point.`);
    const here = record.viscosity && !limits ? state(T, p) : undefined;
    if (here && !isProblem(here) && here.viscosity === undefined) {
      said.push(`The published viscosity of ${name} does not reach this state; none is given here.`);
    }
    if (!record.viscosity) said.push(`No published viscosity and conductivity of ${name} stand on the shelf: density and cp only.`);
    return said;
  }
}

/** K: where corresponding states reach the lowest temperature of the reference fluid; 0 where the method is not used. */
function predictedFromTemperature({ viscosity, critical }: PureRecord, references: ReferenceRecords): number {
  if (viscosity?.form !== "corresponding states") return 0;
  const reference = references(viscosity.reference);
  return (reference.T[0] / reference.critical.T) * critical.T;
}

function surfaceTension({ T: Tc, terms }: NonNullable<PureRecord["surfaceTension"]>, T: number): number {
  const theta = Math.max(0, 1 - T / Tc);
  return terms.reduce((sum, [a, n]) => sum + a * theta ** n, 0);
}

function uncertaintyOf({ uncertainty }: PureRecord, factor: number): Uncertainty {
  const share = (percent: number | undefined): number => ((percent ?? 10) * Math.min(factor, 3)) / 100;
  return {
    density: (uncertainty.density * factor) / 100,
    cp: share(uncertainty.cp),
    viscosity: share(uncertainty.viscosity),
    conductivity: share(uncertainty.conductivity),
    expansivity: share(uncertainty.cp + 2 * uncertainty.density),
    origin: uncertainty.origin,
  };
}
