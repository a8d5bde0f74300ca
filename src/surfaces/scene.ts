import type { Fluid, State } from "../fluids/fluid.js";
import { formatQuantity } from "../quantities/format.js";
import { coverageProblem, isProblem, type Problem } from "../quantities/problems.js";
import { type Buoyancy, buoyancyOf } from "./buoyancy.js";
import type { Inputs, Surface } from "./surface.js";

interface Remembered<T> {
  fluid: Fluid;
  a: number;
  b: number;
  value: T;
}
// Columns repeat the bulk state and the saturation temperature row after row; both caches change no answer.
let lastBulk: Remembered<State | Problem> | undefined;
let lastSaturation: Remembered<number | undefined> | undefined;

function bulkState(fluid: Fluid, T: number, p: number): State | Problem {
  if (lastBulk !== undefined && lastBulk.fluid === fluid && lastBulk.a === T && lastBulk.b === p) return lastBulk.value;
  const value = fluid.state(T, p);
  lastBulk = { fluid, a: T, b: p, value };
  return value;
}

/** Saturation temperature at a pressure, K; undefined where the fluid has none there. */
export function saturationTemperature(fluid: Fluid, p: number): number | undefined {
  if (fluid.saturationAtPressure === undefined) return undefined;
  if (fluid.critical !== undefined && p >= fluid.critical.p) return undefined;
  if (lastSaturation !== undefined && lastSaturation.fluid === fluid && lastSaturation.a === p) return lastSaturation.value;
  const saturation = fluid.saturationAtPressure(p);
  const value = isProblem(saturation) ? undefined : saturation.T;
  lastSaturation = { fluid, a: p, b: 0, value };
  return value;
}

/** The states of one case at one surface temperature, each worked out once and only when asked for. */
export class Scene {
  readonly bulk: State;
  private readonly byFraction: (State | Problem | undefined)[] = [];
  private readonly fractions: number[] = [];
  private densities: { wall: number; bulk: number } | undefined | null = null;

  private constructor(
    readonly inputs: Inputs,
    readonly Ts: number,
    bulk: State,
  ) {
    this.bulk = bulk;
  }

  /** The scene, or why there is none: bulk outside its formulation, surface across boiling or freezing. */
  static at(surface: Surface, inputs: Inputs, Ts: number): Scene | Problem {
    const bulk = bulkState(inputs.fluid, inputs.Tb, inputs.pressure);
    if (isProblem(bulk)) return bulk.argument === undefined ? { ...bulk, argument: "bulk" } : bulk;
    const crossed = phaseCrossed(surface, inputs, Ts, bulk);
    return crossed ?? new Scene(inputs, Ts, bulk);
  }

  /** The state at a fraction of the way from bulk to surface. */
  state(fraction: number): State | Problem {
    if (fraction === 0 || this.Ts === this.inputs.Tb) return this.bulk;
    const known = this.fractions.indexOf(fraction);
    if (known >= 0) return this.byFraction[known] as State | Problem;
    const T = this.inputs.Tb + fraction * (this.Ts - this.inputs.Tb);
    const found = this.inputs.fluid.state(T, this.inputs.pressure);
    const state = isProblem(found) ? named(found, fraction) : found;
    this.fractions.push(fraction);
    this.byFraction.push(state);
    return state;
  }

  /** Densities at wall and bulk; undefined where the fluid cannot tell them apart. */
  wallDensity(): { wall: number; bulk: number } | undefined {
    if (this.densities !== null) return this.densities;
    this.densities = undefined;
    if (!this.inputs.fluid.constantDensity) {
      const wall = this.inputs.fluid.density(this.Ts, this.inputs.pressure);
      if (!isProblem(wall)) this.densities = { wall, bulk: this.bulk.density };
    }
    return this.densities;
  }

  /** A density extreme lies between surface and bulk (water around 4 °C): the layer may flow both ways at once. */
  spansDensityExtreme(): boolean {
    if (this.bulk.phase !== "liquid" || this.bulk.expansivity === undefined) return false;
    const wall = this.state(1);
    return !isProblem(wall) && wall.expansivity !== undefined && wall.expansivity * this.bulk.expansivity < 0;
  }

  /** How buoyancy acts at the film: its size by expansivity and by densities, which of them counts, and its direction. */
  buoyancy(): Buoyancy {
    const film = this.state(0.5);
    return buoyancyOf(this.Ts - this.inputs.Tb, isProblem(film) ? undefined : film, this.wallDensity());
  }
}

function named(problem: Problem, fraction: number): Problem {
  if (problem.argument !== undefined) return problem;
  return { ...problem, argument: fraction === 1 ? "surface" : fraction === 0.5 ? "film" : "reference" };
}

function phaseCrossed(surface: Surface, inputs: Inputs, Ts: number, bulk: State): Problem | undefined {
  const wall = surface.wallName;
  if (!(Ts > 0)) return coverageProblem(wall, "falls below absolute zero.");
  const { fluid, pressure, Tb } = inputs;
  if (bulk.phase === "liquid" && fluid.freezingPoint !== undefined && Ts < fluid.freezingPoint - 1e-9) {
    return coverageProblem(
      wall,
      `${shown(Ts)} is below the freezing point of ${fluid.name} (${shown(fluid.freezingPoint)}): a solid layer forms and no equation for a liquid holds there.`,
    );
  }
  if (fluid.critical !== undefined && Tb > fluid.critical.T && Ts > fluid.critical.T) return undefined;
  const Tsat = saturationTemperature(fluid, pressure);
  if (Tsat === undefined) return undefined;
  if (bulk.phase === "liquid" && Ts > Tsat) {
    return coverageProblem(
      wall,
      `${shown(Ts)} is above the saturation temperature of ${fluid.name} (${shown(Tsat)} at ${formatQuantity(pressure, "pressure", "SI")}): the liquid may boil. FILM.BOIL.POOL, FILM.BOIL.TUBE or FILM.QUENCH serve boiling; a higher setting pressure keeps it liquid.`,
    );
  }
  if (bulk.phase === "gas" && Ts < Tsat) {
    return coverageProblem(
      wall,
      `${shown(Ts)} is below the saturation temperature of ${fluid.name} (${shown(Tsat)} at ${formatQuantity(pressure, "pressure", "SI")}): the vapour condenses. FILM.CONDENSE.PLATE, FILM.CONDENSE.TUBE or FILM.CONDENSE.INSIDE serve condensation.`,
    );
  }
  return undefined;
}

function shown(T: number): string {
  return formatQuantity(T, "temperature", "SI");
}
