import type { Correlation } from "../correlations/correlation.js";
import { coverageProblem, isProblem, type Problem } from "../quantities/problems.js";
import { properties, type Property, putState } from "./intake.js";
import { type Evaluator, type Runner, runnerOf } from "./runner.js";
import type { Scene } from "./scene.js";
import type { Circumstances, Inputs, Surface, Variant } from "./surface.js";

/** Stefan–Boltzmann constant, W/(m²·K⁴): exact by the 2019 SI, 2·π⁵·k⁴/(15·h³·c²). */
export const stefanBoltzmann = (2 * Math.PI ** 5 * 1.380649e-23 ** 4) / (15 * 6.62607015e-34 ** 3 * 299792458 ** 2);

/** One equation evaluated for one case at one surface temperature. */
export interface Point {
  readonly surface: Surface;
  readonly scene: Scene;
  readonly at: Circumstances;
  readonly variant: Variant;
  readonly runner: Runner;
  /** Values of the core lines; `valueAt` also reaches the others. */
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
}

/** A factor on a property or on the Nusselt number, to find what each uncertainty does to h. */
export interface Nudge {
  readonly property: Property;
  readonly factor: number;
}

/** What a scene is to its surface; worked out once for all the equations that are tried on it. */
export interface Setting {
  readonly scene: Scene;
  readonly at: Circumstances;
  readonly variant: Variant;
}

export function settingOf(surface: Surface, scene: Scene): Setting {
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
  return { scene, at, variant: variantOf(surface, inputs, buoyancy?.taken ?? "expansivity") };
}

/** The same setting with buoyancy taken the other way. */
export function withBuoyancy(surface: Surface, setting: Setting, buoyancy: Variant["buoyancy"]): Setting {
  return { ...setting, variant: variantOf(surface, setting.scene.inputs, buoyancy) };
}

// Columns ask for the same variant row after row; the cache changes no answer.
const variants = new WeakMap<Surface, Map<string, Variant>>();

function variantOf(surface: Surface, inputs: Inputs, buoyancy: Variant["buoyancy"]): Variant {
  let key = buoyancy === "expansivity" ? "e" : "d";
  if (inputs.flow !== undefined) key += inputs.flow;
  if (inputs.numbers.position !== undefined) key += "|position";
  for (const name of optionalKeys(surface)) if (inputs.numbers[name] !== undefined) key += `|${name}`;
  for (const word of surface.wordsInLines ?? []) key += `|${word}=${inputs.words[word] ?? ""}`;
  let mine = variants.get(surface);
  if (mine === undefined) {
    mine = new Map();
    variants.set(surface, mine);
  }
  let variant = mine.get(key);
  if (variant === undefined) {
    variant = {
      key,
      flow: inputs.flow ?? "none",
      buoyancy,
      local: inputs.numbers.position !== undefined,
      given: new Set(optionalKeys(surface).filter((name) => inputs.numbers[name] !== undefined)),
      words: inputs.words,
    };
    mine.set(key, variant);
  }
  return variant;
}

const optional = new WeakMap<Surface, readonly string[]>();

/** Numbers that a case of this surface may or may not give. */
function optionalKeys(surface: Surface): readonly string[] {
  let keys = optional.get(surface);
  if (keys === undefined) {
    keys = [
      ...surface.arguments.filter((argument) => argument.optional === true).map((argument) => argument.key),
      ...surface.settings.filter((one) => one.kind === "quantity").map((one) => one.key),
      "sandRoughness",
      "profileRoughness",
    ];
    optional.set(surface, keys);
  }
  return keys;
}

/** Evaluates one record; the Problem says what the fluid or the inputs lack. */
export function evaluate(surface: Surface, setting: Setting, record: Correlation): Point | Problem {
  const { scene } = setting;
  const runner = runnerOf(surface, record, setting.variant);
  const values = new Float64Array(runner.core.program.size);
  const trouble = fill(surface, scene, runner, runner.core, values);
  if (trouble !== undefined) return trouble;
  runner.core.program.run(values);
  const { limit } = record;
  let inRange = true;
  let atLimit = false;
  for (const range of runner.ranges) {
    const value = values[range.slot] as number;
    if (value >= range.low && value <= range.high) continue;
    if (limit !== undefined && limit.of === range.symbol && value < range.low) atLimit = true;
    else inRange = false;
  }
  const { slots } = runner;
  if (atLimit && limit !== undefined) {
    values[slots.Nu] = limit.value;
    values[slots.h] = (limit.value * (values[slots.k] as number)) / (values[slots.L] as number);
    values[slots.q] = (values[slots.h] as number) * (scene.Ts - (values[slots.Tref] as number));
  }
  const h = values[slots.h] as number;
  if (!Number.isFinite(h) || h < 0) return noNumber(runner, values);
  const { radiation } = scene.inputs;
  const hRadiant = radiation === undefined ? undefined : radiantCoefficient(radiation.emissivity, scene.Ts, radiation.surroundings);
  return {
    surface,
    scene,
    at: setting.at,
    variant: setting.variant,
    runner,
    values,
    Ts: scene.Ts,
    Tref: values[slots.Tref] as number,
    Nu: values[slots.Nu] as number,
    h,
    q: values[slots.q] as number,
    hRadiant,
    qRadiant: radiation === undefined || hRadiant === undefined ? undefined : hRadiant * (scene.Ts - radiation.surroundings),
    atLimit,
    inRange,
  };
}

// One working copy for each runner: nothing of it outlives the call.
const scratch = new WeakMap<Runner, Float64Array>();

/** The film coefficient with one property scaled, everything else at the point as it was. */
export function nudgedCoefficient(point: Point, nudge: Nudge): number | undefined {
  if (point.atLimit) return nudge.property === "conductivity" ? point.h * nudge.factor : undefined;
  const { core, slots } = point.runner;
  let values = scratch.get(point.runner);
  if (values === undefined) {
    values = new Float64Array(core.program.size);
    scratch.set(point.runner, values);
  }
  values.set(point.values);
  const property = properties.indexOf(nudge.property);
  for (const place of [core.intake.own, core.intake.bulk, core.intake.wall]) {
    const slot = place?.[property] ?? -1;
    if (slot >= 0) values[slot] = (values[slot] as number) * nudge.factor;
  }
  core.program.run(values);
  const h = values[slots.h] as number;
  return Number.isFinite(h) ? h : undefined;
}

const wholes = new WeakMap<Point, Float64Array>();

/** Values of all lines at a point; worked out when a word or the trace first asks. */
export function wholeValues(point: Point): Float64Array {
  let values = wholes.get(point);
  if (values === undefined) {
    const { program } = point.runner.whole();
    values = new Float64Array(program.size);
    fill(point.surface, point.scene, point.runner, point.runner.whole(), values);
    program.run(values);
    if (point.atLimit) {
      for (const [name, value] of [
        ["Nu", point.Nu],
        ["h", point.h],
        ["q", point.q],
      ] as const)
        values[program.slot(name)] = value;
    }
    wholes.set(point, values);
  }
  return values;
}

/** The value of any symbol at a point; NaN where the case does not give it. */
export function valueAt(point: Point, symbol: string): number {
  const { core } = point.runner;
  if (core.has(symbol)) return point.values[core.program.slot(symbol)] as number;
  const whole = point.runner.whole();
  if (whole.has(symbol)) return wholeValues(point)[whole.program.slot(symbol)] as number;
  return point.scene.inputs.numbers[symbol] ?? Number.NaN;
}

/** Radiation linearised without loss: ε·σ·(Ts² + T∞²)·(Ts + T∞). */
export function radiantCoefficient(emissivity: number, Ts: number, surroundings: number): number {
  return emissivity * stefanBoltzmann * (Ts * Ts + surroundings * surroundings) * (Ts + surroundings);
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

function fill(surface: Surface, scene: Scene, runner: Runner, evaluator: Evaluator, values: Float64Array): Problem | undefined {
  const { intake } = evaluator;
  const { inputs } = scene;
  const state = scene.state(runner.fraction);
  if (isProblem(state)) return state;
  let missing = putState(values, intake.own, state);
  if (intake.bulk !== undefined) missing = putState(values, intake.bulk, scene.bulk) ?? missing;
  if (intake.wall !== undefined) {
    if (intake.wallDensityOnly) values[intake.wall[0]] = scene.wallDensity()?.wall ?? Number.NaN;
    else {
      const wall = scene.state(1);
      if (isProblem(wall)) return wall;
      missing = putState(values, intake.wall, wall) ?? missing;
    }
  }
  if (missing !== undefined && (missing !== "expansivity" || surface.motion === "free")) return lacking(scene, missing);
  if (intake.Ts >= 0) values[intake.Ts] = scene.Ts;
  if (intake.Tb >= 0) values[intake.Tb] = inputs.Tb;
  if (intake.gravity >= 0) values[intake.gravity] = inputs.gravity;
  if (intake.pressure >= 0) values[intake.pressure] = inputs.pressure;
  if (intake.flux >= 0) values[intake.flux] = inputs.wall.kind === "flux" ? inputs.wall.q : Number.NaN;
  for (const [slot, key] of intake.numbers) values[slot] = inputs.numbers[key] ?? Number.NaN;
  return undefined;
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
