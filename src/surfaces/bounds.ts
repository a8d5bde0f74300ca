import { isProblem } from "../quantities/problems.js";
import { candidatesFor, choose, decadesOutside } from "./choice.js";
import { evaluate, nudgedCoefficient, type Point, type Setting, valueAt, withBuoyancy } from "./point.js";
import { Scene } from "./scene.js";
import { type Outcome, outcomeOf, type Solution, solve } from "./solution.js";
import type { Inputs, Rival, Surface, Tolerance } from "./surface.js";

/** How far one cause alone moves each result: `below` and `above` are zero or positive. */
export interface Share {
  readonly cause: string;
  readonly origin: string;
  readonly below: Outcome;
  readonly above: Outcome;
}

export interface Interval {
  readonly low: Outcome;
  readonly high: Outcome;
  readonly shares: readonly Share[];
}

/** Near the edge of its range, within this ratio, an equation's bounds reach to the equation that takes over. */
const nearEdge = 1.1;

/** The scatter that holds at a point: by regime where the source says so, doubled for each decade outside (common practice). */
export function scatterAt(point: Point): number {
  const { scatter } = point.runner.record;
  let value = scatter.value;
  if (scatter.by !== undefined) {
    const at = valueAt(point, scatter.by.symbol);
    for (const [upTo, here] of scatter.by.steps) {
      if (at <= upTo) {
        value = here;
        break;
      }
    }
  }
  return value * 2 ** decadesOutside(point);
}

/** Low and high of every result at about 95 %, with the share of each cause. */
export function boundsOf(surface: Surface, inputs: Inputs, solution: Solution): Interval {
  const nominal = outcomeOf(solution.point);
  const shares: Share[] = [
    ...scatterShare(solution.point, nominal),
    ...formulationShare(solution.point, nominal),
    ...inputs.tolerances.flatMap((tolerance) => toleranceShare(surface, inputs, tolerance, nominal)),
    ...profileShare(surface, inputs, nominal),
    ...rivalsOf(solution.point).flatMap((rival) => rivalShare(solution.point, rival, nominal)),
    ...limitShare(solution.point, nominal),
    ...buoyancyShare(solution.point, nominal),
    ...splitShare(solution.point, nominal),
    ...edgeShare(surface, inputs, solution.point, nominal),
    ...switchShare(surface, inputs, solution, nominal),
  ];
  const combine = inputs.bounds === "worst" ? sumOf : quadratureOf;
  const below = combine(shares, true);
  const above = combine(shares, false);
  return {
    low: {
      h: Math.max(0, nominal.h - below.h),
      Nu: Math.max(0, nominal.Nu - below.Nu),
      q: nominal.q - below.q,
      Ts: nominal.Ts - below.Ts,
    },
    high: { h: nominal.h + above.h, Nu: nominal.Nu + above.Nu, q: nominal.q + above.q, Ts: nominal.Ts + above.Ts },
    shares,
  };
}

function sumOf(shares: readonly Share[], downwards: boolean): Outcome {
  let [h, Nu, q, Ts] = [0, 0, 0, 0];
  for (const share of shares) {
    const part = downwards ? share.below : share.above;
    h += part.h;
    Nu += part.Nu;
    q += part.q;
    Ts += part.Ts;
  }
  return { h, Nu, q, Ts };
}

function quadratureOf(shares: readonly Share[], downwards: boolean): Outcome {
  let [h, Nu, q, Ts] = [0, 0, 0, 0];
  for (const share of shares) {
    const part = downwards ? share.below : share.above;
    h += part.h * part.h;
    Nu += part.Nu * part.Nu;
    q += part.q * part.q;
    Ts += part.Ts * part.Ts;
  }
  return { h: Math.sqrt(h), Nu: Math.sqrt(Nu), q: Math.sqrt(q), Ts: Math.sqrt(Ts) };
}

/** How far the other outcomes of one cause reach below and above the nominal one. */
function shareOf(cause: string, origin: string, nominal: Outcome, others: readonly Outcome[]): Share {
  const low = { h: 0, Nu: 0, q: 0, Ts: 0 };
  const high = { h: 0, Nu: 0, q: 0, Ts: 0 };
  for (const other of others) {
    low.h = Math.max(low.h, nominal.h - other.h);
    low.Nu = Math.max(low.Nu, nominal.Nu - other.Nu);
    low.q = Math.max(low.q, nominal.q - other.q);
    low.Ts = Math.max(low.Ts, nominal.Ts - other.Ts);
    high.h = Math.max(high.h, other.h - nominal.h);
    high.Nu = Math.max(high.Nu, other.Nu - nominal.Nu);
    high.q = Math.max(high.q, other.q - nominal.q);
    high.Ts = Math.max(high.Ts, other.Ts - nominal.Ts);
  }
  return { cause, origin, below: low, above: high };
}

/** A changed film coefficient at the same inputs: under a given flux the surface temperature answers to it. */
function scaled(point: Point, factor: number): Outcome {
  if (point.scene.inputs.wall.kind === "temperature") return outcomeOf(point, factor);
  const again = solve(point.surface, point.scene.inputs, factor);
  return isProblem(again) ? outcomeOf(point, factor) : outcomeOf(again.point, factor);
}

function scatterShare(point: Point, nominal: Outcome): Share[] {
  const { record } = point.runner;
  const scatter = scatterAt(point);
  if (scatter === 0) return [];
  return [
    shareOf(`scatter of the equation ±${Math.round(1000 * scatter) / 10} %`, record.scatter.origin, nominal, [
      scaled(point, Math.max(0, 1 - scatter)),
      scaled(point, 1 + scatter),
    ]),
  ];
}

const formulated = ["density", "cp", "viscosity", "conductivity", "expansivity"] as const;

function formulationShare(point: Point, nominal: Outcome): Share[] {
  const { fluid, pressure, Tb } = point.scene.inputs;
  const uncertainty = fluid.uncertainty(Tb + point.runner.fraction * (point.Ts - Tb), pressure);
  let squares = 0;
  for (const property of formulated) {
    const part = uncertainty[property];
    if (!(part > 0)) continue;
    const moved = nudgedCoefficient(point, { property, factor: 1 + part });
    if (moved !== undefined && point.h > 0) squares += (moved / point.h - 1) ** 2;
  }
  if (squares === 0) return [];
  const relative = Math.sqrt(squares);
  return [shareOf("property formulation", uncertainty.origin, nominal, [scaled(point, 1 - relative), scaled(point, 1 + relative)])];
}

/** The same inputs with one of them moved, SI. */
export function shifted(inputs: Inputs, key: string, by: number): Inputs {
  if (key === "surface") {
    return inputs.wall.kind === "flux"
      ? { ...inputs, wall: { kind: "flux", q: inputs.wall.q + by } }
      : { ...inputs, wall: { kind: "temperature", T: inputs.wall.T + by } };
  }
  if (key === "bulk") return { ...inputs, Tb: inputs.Tb + by };
  if (key === "pressure") return { ...inputs, pressure: inputs.pressure + by };
  if (key === "gravity") return { ...inputs, gravity: inputs.gravity + by };
  if (inputs.radiation !== undefined && (key === "emissivity" || key === "surroundings")) {
    return { ...inputs, radiation: { ...inputs.radiation, [key]: inputs.radiation[key] + by } };
  }
  return { ...inputs, numbers: { ...inputs.numbers, [key]: (inputs.numbers[key] ?? 0) + by } };
}

function toleranceShare(surface: Surface, inputs: Inputs, tolerance: Tolerance, nominal: Outcome): Share[] {
  const others: Outcome[] = [];
  for (const by of [-tolerance.halfWidth, tolerance.halfWidth]) {
    const end = solve(surface, shifted(inputs, tolerance.key, by));
    if (!isProblem(end)) others.push(outcomeOf(end.point));
  }
  const zero = crossing(surface, inputs, tolerance);
  if (zero !== undefined) others.push(zero);
  return [shareOf(`tolerance of ${tolerance.name}`, "given with the input", nominal, others)];
}

/** An arithmetic profile roughness stands for a sand roughness only within a factor of two. */
function profileShare(surface: Surface, inputs: Inputs, nominal: Outcome): Share[] {
  const profile = inputs.numbers.profileRoughness;
  if (profile === undefined || surface.takesRoughness !== true) return [];
  const others: Outcome[] = [];
  for (const factor of [0.5, 2]) {
    const end = solve(surface, { ...inputs, numbers: { ...inputs.numbers, profileRoughness: profile * factor } });
    if (!isProblem(end)) others.push(outcomeOf(end.point));
  }
  return [shareOf("sand roughness from profile roughness, within a factor of 2", "common practice", nominal, others)];
}

/** Where the tolerance changes the sign of the difference, the limit at zero difference lies between its ends. */
function crossing(surface: Surface, inputs: Inputs, tolerance: Tolerance): Outcome | undefined {
  if (inputs.wall.kind !== "temperature" || (tolerance.key !== "surface" && tolerance.key !== "bulk")) return undefined;
  if (Math.abs(inputs.wall.T - inputs.Tb) >= tolerance.halfWidth) return undefined;
  const even: Inputs =
    tolerance.key === "surface" ? { ...inputs, wall: { kind: "temperature", T: inputs.Tb } } : { ...inputs, Tb: inputs.wall.T };
  const there = solve(surface, even);
  return isProblem(there) ? undefined : outcomeOf(there.point);
}

export function rivalsOf(point: Point): readonly Rival[] {
  const { surface } = point;
  if (surface.rivals === undefined || point.scene.inputs.equation !== undefined || point.scene.inputs.only !== undefined) return [];
  return surface.rivals(point.at, (symbol) => valueAt(point, symbol), point.runner.record);
}

function settingAt(point: Point): Setting {
  return { scene: point.scene, at: point.at, variant: point.variant };
}

function rivalShare(point: Point, rival: Rival, nominal: Outcome): Share[] {
  const other = evaluate(point.surface, settingAt(point), rival.record);
  if (isProblem(other) || point.h === 0) return [];
  return [shareOf(rival.cause, rival.origin, nominal, [scaled(point, other.h / point.h)])];
}

/** Below the equation's range its limit stands in; the value at the edge of the range is the other end. */
function limitShare(point: Point, nominal: Outcome): Share[] {
  const { limit, ranges } = point.runner.record;
  if (!point.atLimit || limit === undefined) return [];
  const edge = ranges[limit.of]?.[0];
  if (edge === undefined) return [];
  const law = point.runner.law();
  const values = new Float64Array(law.size);
  for (const symbol of law.inputs) values[law.slot(symbol)] = symbol === limit.of ? edge : valueAt(point, symbol);
  law.run(values);
  const name = law.names[law.names.length - 1] as string;
  const Nu = values[law.slot(name)] as number;
  if (!Number.isFinite(Nu)) return [];
  const h = (Nu * valueAt(point, "k")) / valueAt(point, "L");
  return [
    shareOf("from the limit to the lower edge of the range", "published range", nominal, [
      { h, Nu, q: h * (point.Ts - point.Tref), Ts: point.Ts },
    ]),
  ];
}

function buoyancyShare(point: Point, nominal: Outcome): Share[] {
  if (point.variant.buoyancy !== "densities" || point.h === 0) return [];
  const other = evaluate(point.surface, withBuoyancy(point.surface, settingAt(point), "expansivity"), point.runner.record);
  if (isProblem(other)) return [];
  return [shareOf("buoyancy by expansivity instead of by densities", "common practice", nominal, [scaled(point, other.h / point.h)])];
}

/** Across a density extreme the layer may split into streams up and down: no equation holds closer than by half. */
const splitFlow = 0.5;

function splitShare(point: Point, nominal: Outcome): Share[] {
  if (point.surface.motion !== "free" || !point.scene.spansDensityExtreme()) return [];
  const others = [scaled(point, 1 - splitFlow), scaled(point, 1 + splitFlow)];
  return [shareOf("flow both ways across the density maximum", "common practice", nominal, others)];
}

/** Close to the edge of its range, the bounds also hold the equation that would be taken beyond it. */
function edgeShare(surface: Surface, inputs: Inputs, point: Point, nominal: Outcome): Share[] {
  if (inputs.equation !== undefined || inputs.only !== undefined || point.atLimit || !point.inRange || point.h === 0) return [];
  const atEdge = point.runner.ranges.some((range) => {
    const value = point.values[range.slot] as number;
    return value > 0 && ((range.low > 0 && value < range.low * nearEdge) || value > range.high / nearEdge);
  });
  const candidates = candidatesFor(surface, point.at);
  if (isProblem(candidates)) return [];
  const list = candidates as readonly Point["runner"]["record"][];
  const others: Outcome[] = [];
  for (const record of list) {
    if (record === point.runner.record) {
      if (!atEdge) break;
      continue;
    }
    const other = evaluate(surface, settingAt(point), record);
    if (isProblem(other)) continue;
    const preferred = list.indexOf(record) < list.indexOf(point.runner.record);
    if (preferred && !other.inRange && justOutside(other)) others.push(scaled(point, other.h / point.h));
    if (!preferred && other.inRange) {
      others.push(scaled(point, other.h / point.h));
      break;
    }
  }
  return others.length === 0 ? [] : [shareOf("another equation takes over close by", "published range", nominal, others)];
}

function justOutside(point: Point): boolean {
  return decadesOutside(point) < Math.log10(nearEdge);
}

function switchShare(surface: Surface, inputs: Inputs, solution: Solution, nominal: Outcome): Share[] {
  if (!solution.atSwitch) return [];
  const others: Outcome[] = [];
  for (const factor of [1 - 1e-9, 1 + 1e-9]) {
    const scene = Scene.at(surface, inputs, solution.point.Ts * factor);
    const side = isProblem(scene) ? scene : choose(surface, scene);
    if (!isProblem(side)) others.push(outcomeOf(side));
  }
  return [shareOf("both sides of the jump in which the flux falls", "published ranges", nominal, others)];
}
