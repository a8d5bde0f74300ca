/**
 * A liquid known by fits to temperature alone: coolants, oils, metals, salts. Pressure is taken not to matter, which holds to about
 * 1 % in density up to the limit given here.
 */
import { coverageProblem, isProblem, type Problem } from "../quantities/problems.js";
import type { Curve } from "./fit.js";
import type { Fluid, FluidRange, State, Uncertainty } from "./fluid.js";
import { figures, impossible, isBelow, outside, sayPressure, sayTemperature } from "./refusal.js";

/** A fit without pressure serves up to here, Pa. */
export const fitPressureRange: readonly [number, number] = [1, 20e6];

export interface LiquidDescription {
  readonly name: string;
  readonly synonyms: readonly string[];
  readonly family: string;
  readonly sources: readonly string[];
  /** K, of the fits; the freezing point may lie above the lower end. */
  readonly T: readonly [number, number];
  readonly density: Curve;
  readonly cp: Curve;
  readonly viscosity: Curve;
  readonly conductivity: Curve;
  /** 1/K; from the slope of the density where absent. */
  readonly expansivity?: number;
  readonly uncertainty: Uncertainty;
  /** K */
  readonly freezingPoint?: number;
  /** K */
  readonly flashPoint?: number;
  readonly molarMass?: number;
  /** Pa; the pressure below which the liquid boils, where known. */
  readonly vapourPressure?: (T: number) => number;
  /** Said at every state. */
  readonly cautions?: readonly string[];
}

export function fittedLiquid(liquid: LiquidDescription): Fluid {
  const { freezingPoint } = liquid;
  const coldest = Math.max(liquid.T[0], freezingPoint ?? 0);
  const range: FluidRange = { T: [coldest, liquid.T[1]], p: fitPressureRange };
  const refusal = (T: number, p: number): Problem | undefined => impossible(T, p) ?? frozen(liquid, T) ?? outside(liquid.name, range, T, p);
  const state = (T: number, p: number): State | Problem => refusal(T, p) ?? stateAt(liquid, T, p);
  return {
    name: liquid.name,
    synonyms: liquid.synonyms,
    family: liquid.family,
    sources: liquid.sources,
    range,
    molarMass: liquid.molarMass,
    critical: undefined,
    freezingPoint,
    ...(liquid.flashPoint !== undefined && { flashPoint: liquid.flashPoint }),
    constantDensity: false,
    state,
    density: (T, p) => {
      const found = state(T, p);
      return isProblem(found) ? found : found.density;
    },
    uncertainty: () => liquid.uncertainty,
    cautions: (T, p) => cautionsAt(liquid, T, p),
  };
}

function stateAt(liquid: LiquidDescription, T: number, p: number): State {
  const density = liquid.density.at(T);
  return {
    T,
    p,
    phase: "liquid",
    density,
    cp: liquid.cp.at(T),
    viscosity: liquid.viscosity.at(T),
    conductivity: liquid.conductivity.at(T),
    expansivity: liquid.expansivity ?? -liquid.density.slope(T) / density,
    enthalpy: undefined,
    speedOfSound: undefined,
  };
}

function frozen(liquid: LiquidDescription, T: number): Problem | undefined {
  const { freezingPoint, name } = liquid;
  if (freezingPoint === undefined || !isBelow(T, freezingPoint)) return undefined;
  return coverageProblem(
    undefined,
    `${name} starts to freeze at ${sayTemperature(Math.round(freezingPoint * 100) / 100)}; ${sayTemperature(T)} is below it. Take a warmer state or a fluid that freezes lower.`,
  );
}

function cautionsAt(liquid: LiquidDescription, T: number, p: number): readonly string[] {
  const needed = liquid.vapourPressure?.(T) ?? 0;
  const said = [...(liquid.cautions ?? [])];
  if (needed > p) {
    said.push(
      `At ${sayTemperature(T)} ${liquid.name} boils unless it stands under at least ${sayPressure(Number(needed.toPrecision(3)))} absolute; ${sayPressure(p)} was given.`,
    );
  }
  if (liquid.flashPoint !== undefined && T >= liquid.flashPoint) {
    said.push(
      `${sayTemperature(T)} is above the flash point of ${liquid.name}, about ${figures(Math.round(liquid.flashPoint - 273.15))} °C: fire hazard; follow the supplier's data and local codes.`,
    );
  }
  return said;
}
