import type { Problem } from "../quantities/problems.js";

export type Phase = "liquid" | "gas" | "supercritical";

/** A single-phase state. SI; kelvin, pascal absolute. What a formulation lacks is undefined. */
export interface State {
  readonly T: number;
  readonly p: number;
  readonly phase: Phase;
  /** kg/m³ */
  readonly density: number;
  /** J/(kg·K) */
  readonly cp: number;
  /** Pa·s; undefined where no published formulation covers the state. */
  readonly viscosity: number | undefined;
  /** W/(m·K); undefined where no published formulation covers the state. */
  readonly conductivity: number | undefined;
  /** 1/K; may be zero or negative. */
  readonly expansivity: number | undefined;
  /** J/kg */
  readonly enthalpy: number | undefined;
  /** m/s */
  readonly speedOfSound: number | undefined;
}

/** Relative 95 % uncertainties of a formulation, as fractions. */
export interface Uncertainty {
  readonly density: number;
  readonly cp: number;
  readonly viscosity: number;
  readonly conductivity: number;
  readonly expansivity: number;
  /** "published" when the source states them, else "common practice" or "from memory". */
  readonly origin: string;
}

export interface Saturation {
  /** K; for a blend the bubble (liquid) side. */
  readonly T: number;
  /** Pa */
  readonly p: number;
  readonly liquid: State;
  readonly vapour: State;
  /** J/kg */
  readonly latentHeat: number;
  /** N/m; undefined where no published formulation exists. */
  readonly surfaceTension: number | undefined;
  /** False where an own table gives no vapour cp, so that `vapour.cp` stands for nothing. */
  readonly vapourCpGiven?: boolean;
}

/** Outer limits of a formulation, kelvin and pascal. */
export interface FluidRange {
  readonly T: readonly [number, number];
  readonly p: readonly [number, number];
}

export interface Fluid {
  readonly name: string;
  readonly synonyms: readonly string[];
  /** One of a few families, for lists: "gas", "refrigerant", "water", "coolant", "oil", "metal or salt", "mixture", "own table" … */
  readonly family: string;
  /** Bibliography keys, the formulation first. */
  readonly sources: readonly string[];
  /** Outer limits of the formulation; `state` may refuse inside them (two-phase, melting). */
  readonly range: FluidRange;
  /** kg/mol; undefined for mixtures of unknown make-up. */
  readonly molarMass: number | undefined;
  readonly critical: { readonly T: number; readonly p: number } | undefined;
  /** K */
  readonly freezingPoint: number | undefined;
  /** K, open or closed cup, of a named oil. */
  readonly flashPoint?: number;
  /** True where density is a table's constant, so that a density difference says nothing about buoyancy. */
  readonly constantDensity: boolean;
  /**
   * True where an own table gives no density, only kinematic viscosity, diffusivity and conductivity: 1 kg/m³ stands in its place. Density, cp and
   * viscosity are then no figures to show or to use with a mass flow; their ratios hold.
   */
  readonly densityAssumed?: boolean;
  /** The state at kelvin and pascal, or the sentence that says why there is none and what the nearest limit is. */
  state(T: number, p: number): State | Problem;
  /** Density alone, for buoyancy; same refusals as `state`. */
  density(T: number, p: number): number | Problem;
  uncertainty(T: number, p: number): Uncertainty;
  /** Undefined for fluids without saturation data (air below its dome's use, oils, own tables that give none). */
  saturationAtPressure?(p: number): Saturation | Problem;
  saturationAtTemperature?(T: number): Saturation | Problem;
  /**
   * Of a fluid whose make-up follows from where it is asked, such as air of a relative humidity: the same fluid with the make-up that it has at
   * the bulk's temperature and pressure, so that film and wall states keep the bulk's moisture.
   */
  atBulk?(T: number, p: number): Fluid | Problem;
  /** K; below this temperature a surface in the gas is wetted. Only of gases that hold water vapour. */
  dewPoint?(T: number, p: number): number | Problem;
  /** What the user must know about this fluid at this state (toxic, flammable, needs pressure, predictive transport …). */
  cautions(T: number, p: number): readonly string[];
}
