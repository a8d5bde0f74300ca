import type { Correlation } from "../correlations/correlation.js";
import type { State } from "../fluids/fluid.js";
import { coverageProblem, isProblem, type Problem } from "../quantities/problems.js";
import { type Runner, runnerOf } from "./runner.js";
import type { Scene } from "./scene.js";
import type { Circumstances, Inputs, Surface, Variant } from "./surface.js";

/** Stefan–Boltzmann constant, W/(m²·K⁴): exact by the 2019 SI, 2·π⁵·k⁴/(15·h³·c²). */
export const stefanBoltzmann = (2 * Math.PI ** 5 * 1.380649e-23 ** 4) / (15 * 6.62607015e-34 ** 3 * 299792458 ** 2);

/** One equation evaluated for one case at one surface temperature. */
export interface Point {
  readonly surface: Surface;
  readonly scene: Scene;
  readonly at: Circumstances;
  readonly runner: Runner;
  readonly values: Float64Array;
  readonly Ts: number;
  readonly Tref: number;
  readonly Nu: number;
  readonly h: number;
  /** Convective flux, W/m², positive from surface to fluid. */
  readonly q: number;
  readonly hRadiant: number | undefined;
  readonly qRadiant: number | undefined;
  /** The driving group is below the equation's range and the limit stands in for it. */
  readonly atLimit: boolean;
  readonly inRange: boolean;
  /** Buoyancy came from the densities because β·ΔT missed them by more than 10 %. */
  readonly byDensities: boolean;
}

/** A factor on a property or on the Nusselt number, to find what each uncertainty does to h. */
export interface Nudge {
  readonly property?: "density" | "cp" | "conductivity" | "viscosity" | "expansivity";
  readonly factor: number;
}

export function circumstancesOf(surface: Surface, scene: Scene): { at: Circumstances; variant: Variant } {
  const { inputs } = scene;
  const buoyancy = surface.motion === "free" ? scene.buoyancy() : undefined;
  const local = inputs.numbers.position !== undefined;
  const at: Circumstances = {
    inputs,
    Ts: scene.Ts,
    rising: buoyancy?.rising ?? scene.Ts >= inputs.Tb,
    wall: inputs.wall.kind === "flux" ? "uniform flux" : "isothermal",
    local,
    phase: scene.bulk.phase,
  };
  const variant: Variant = {
    flow: inputs.flow ?? "none",
    buoyancy: buoyancy?.taken ?? "expansivity",
    local,
    given: givenOf(surface, inputs),
    words: inputs.words,
  };
  return { at, variant };
}

/** Common settings on which a surface's lines may depend. */
const everywhere = ["sandRoughness", "profileRoughness"] as const;
const nothingGiven: ReadonlySet<string> = new Set();

function givenOf(surface: Surface, inputs: Inputs): ReadonlySet<string> {
  let given: Set<string> | undefined;
  for (const argument of surface.arguments) {
    if (argument.optional === true && inputs.numbers[argument.key] !== undefined) given = (given ?? new Set()).add(argument.key);
  }
  for (const setting of surface.settings) {
    if (setting.kind === "quantity" && inputs.numbers[setting.key] !== undefined) given = (given ?? new Set()).add(setting.key);
  }
  for (const key of everywhere) if (inputs.numbers[key] !== undefined) given = (given ?? new Set()).add(key);
  return given ?? nothingGiven;
}

/** Evaluates one record; the Problem says what the fluid or the inputs lack. */
export function evaluate(surface: Surface, scene: Scene, record: Correlation, nudge?: Nudge): Point | Problem {
  const { at, variant } = circumstancesOf(surface, scene);
  return evaluateWith(surface, scene, at, runnerOf(surface, record, variant), variant.buoyancy === "densities", nudge);
}

export function evaluateWith(
  surface: Surface,
  scene: Scene,
  at: Circumstances,
  runner: Runner,
  byDensities: boolean,
  nudge?: Nudge,
): Point | Problem {
  const values = new Float64Array(runner.program.size);
  const trouble = fill(scene, runner, values, nudge, surface);
  if (trouble !== undefined) return trouble;
  runner.program.run(values);
  let inRange = true;
  let atLimit = false;
  const limit = runner.record.limit;
  for (const range of runner.ranges) {
    const value = values[range.slot] as number;
    if (value >= range.low && value <= range.high) continue;
    if (limit !== undefined && limit.of === range.symbol && value < range.low) atLimit = true;
    else inRange = false;
  }
  let Nu = values[runner.slots.Nu] as number;
  if (atLimit && limit !== undefined) {
    Nu = limit.value;
    writeResult(runner, values, Nu, scene.Ts);
  }
  const h = values[runner.slots.h] as number;
  if (!Number.isFinite(h) || h < 0) return noNumber(runner, values);
  const Tref = values[runner.slots.Tref] as number;
  const radiation = scene.inputs.radiation;
  const hRadiant = radiation === undefined ? undefined : radiantCoefficient(radiation.emissivity, scene.Ts, radiation.surroundings);
  return {
    surface,
    scene,
    at,
    runner,
    values,
    Ts: scene.Ts,
    Tref,
    Nu,
    h,
    q: values[runner.slots.q] as number,
    hRadiant,
    qRadiant: radiation === undefined || hRadiant === undefined ? undefined : hRadiant * (scene.Ts - radiation.surroundings),
    atLimit,
    inRange,
    byDensities,
  };
}

/** Radiation linearised without loss: ε·σ·(Ts² + T∞²)·(Ts + T∞). */
export function radiantCoefficient(emissivity: number, Ts: number, surroundings: number): number {
  return emissivity * stefanBoltzmann * (Ts * Ts + surroundings * surroundings) * (Ts + surroundings);
}

function writeResult(runner: Runner, values: Float64Array, Nu: number, Ts: number): void {
  const k = values[runner.program.slot("k")] as number;
  const L = values[runner.program.slot("L")] as number;
  const h = (Nu * k) / L;
  values[runner.slots.Nu] = Nu;
  values[runner.slots.h] = h;
  values[runner.slots.q] = h * (Ts - (values[runner.slots.Tref] as number));
}

function noNumber(runner: Runner, values: Float64Array): Problem {
  for (const range of runner.ranges) {
    const value = values[range.slot] as number;
    if (!Number.isFinite(value))
      return coverageProblem(undefined, `${runner.record.name} needs ${range.symbol}, which these inputs do not give.`);
  }
  return coverageProblem(undefined, `${runner.record.name} gives no number here: its algebra leaves the real numbers outside its range.`);
}

const missingWords: Readonly<Record<string, string>> = {
  viscosity: "viscosity",
  conductivity: "thermal conductivity",
  expansivity: "thermal expansivity",
  density: "density",
  cp: "specific heat",
};

function fill(scene: Scene, runner: Runner, values: Float64Array, nudge: Nudge | undefined, surface: Surface): Problem | undefined {
  const state = scene.state(runner.fraction);
  if (isProblem(state)) return state;
  let wall: State | undefined;
  if (runner.needsWall && !onlyWallDensity(runner)) {
    const found = scene.state(1);
    if (isProblem(found)) return found;
    wall = found;
  }
  const { inputs } = scene;
  for (const feed of runner.feeds) {
    let value: number | undefined;
    switch (feed.from) {
      case "property":
        value = state[feed.property];
        break;
      case "bulk":
        value = scene.bulk[feed.property];
        break;
      case "wall":
        value = wall === undefined ? scene.wallDensity()?.wall : wall[feed.property];
        break;
      case "Ts":
        value = scene.Ts;
        break;
      case "Tb":
        value = inputs.Tb;
        break;
      case "gravity":
        value = inputs.gravity;
        break;
      case "pressure":
        value = inputs.pressure;
        break;
      case "flux":
        value = inputs.wall.kind === "flux" ? inputs.wall.q : Number.NaN;
        break;
      default:
        value = inputs.numbers[feed.key];
    }
    if (value === undefined) {
      if ("property" in feed && neededByLaw(runner, feed.property, surface)) return lacking(scene, feed.property);
      value = Number.NaN;
    } else if (nudge?.property !== undefined && "property" in feed && feed.property === nudge.property) value *= nudge.factor;
    values[feed.slot] = value;
  }
  return undefined;
}

function onlyWallDensity(runner: Runner): boolean {
  return runner.feeds.every((feed) => feed.from !== "wall" || feed.property === "density");
}

/** Forced flow does without expansivity: Ri is then not judged. Everything else that is missing stops the case. */
function neededByLaw(runner: Runner, property: string, surface: Surface): boolean {
  if (property !== "expansivity") return true;
  return surface.motion === "free" && runner.slot("Ra") !== undefined;
}

function lacking(scene: Scene, property: string): Problem {
  const name = missingWords[property] ?? property;
  const isTable = scene.inputs.fluid.family === "own table";
  return coverageProblem(
    "fluid",
    isTable
      ? `the property table gives no ${name}, which this surface needs; add a column for it${property === "expansivity" ? ", or several rows of density" : ""}.`
      : `no published ${name} of ${scene.inputs.fluid.name} covers this state.`,
  );
}
