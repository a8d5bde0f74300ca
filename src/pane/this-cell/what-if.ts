/** What if one input were another: h over that input with its bounds, worked out beside the sheet and never written to it. */
import { findFilm } from "../../findings/film-finding.js";
import type { Finding } from "../../findings/finding.js";
import type { Dimension } from "../../quantities/quantity.js";
import { openSurfaceCall } from "../../cells/surface-call.js";
import { surfaceById } from "../../surfaces/index.js";
import type { Inputs, Surface } from "../../surfaces/surface.js";
import type { ReadCall } from "../cell-reading.js";

/** An input that can be moved. SI; temperatures in kelvin. */
export interface Movable {
  readonly key: string;
  readonly name: string;
  readonly dimension: Dimension;
  readonly value: number;
}

export interface Case {
  readonly surface: Surface;
  readonly inputs: Inputs;
  readonly movables: readonly Movable[];
}

export interface CurvePoint {
  readonly x: number;
  readonly h: number;
  readonly low: number;
  readonly high: number;
  readonly inRange: boolean;
}

export interface Curve {
  readonly movable: Movable;
  readonly from: number;
  readonly to: number;
  /** Where there is no number there is no point. */
  readonly points: readonly CurvePoint[];
}

/** The case of a call that stands at a cell of its block; undefined where it is none of a surface, or has no number to move. */
export function caseAt(read: ReadCall, caseNumber: number): Case | undefined {
  const surface = surfaceById(read.id);
  if (surface === undefined) return undefined;
  const call = openSurfaceCall(surface, read.args, read.give, read.settings);
  if ("problems" in call) return undefined;
  const at = caseNumber - 1;
  const one = call.readCase(Math.floor(at / call.cases.columns), at % call.cases.columns).read;
  return one.kind === "inputs" ? { surface, inputs: one.inputs, movables: movablesOf(surface, one.inputs) } : undefined;
}

function movablesOf(surface: Surface, inputs: Inputs): readonly Movable[] {
  const { wall } = inputs;
  const own: Movable =
    wall.kind === "flux"
      ? { key: "surface", name: surface.wallName, dimension: "heat flux", value: wall.q }
      : { key: "surface", name: surface.wallName, dimension: "temperature", value: wall.T };
  const numbers = surface.arguments.flatMap((argument): Movable[] => {
    const value = inputs.numbers[argument.key];
    const dimension = argument.key === "flow" ? (inputs.flow ?? "speed") : (argument.dimensions[0] ?? "none");
    return value === undefined ? [] : [{ key: argument.key, name: argument.name, dimension, value }];
  });
  return [own, { key: "bulk", name: "bulk", dimension: "temperature", value: inputs.Tb }, ...numbers];
}

function moved(inputs: Inputs, movable: Movable, value: number): Inputs {
  if (movable.key === "bulk") return { ...inputs, Tb: value };
  if (movable.key !== "surface") return { ...inputs, numbers: { ...inputs.numbers, [movable.key]: value } };
  return { ...inputs, wall: movable.dimension === "heat flux" ? { kind: "flux", q: value } : { kind: "temperature", T: value } };
}

/** What the surface comes to with one input moved; beyond a range its number is marked, not withheld. */
export function findingWith(one: Case, movable: Movable, value: number): Finding {
  return findFilm(one.surface, { ...moved(one.inputs, movable, value), beyondRange: "flag" });
}

const swing = 40;
const points = 28;

export function spanOf(movable: Movable): { readonly from: number; readonly to: number } {
  if (movable.dimension === "temperature") return { from: Math.max(1, movable.value - swing), to: movable.value + swing };
  if (movable.value === 0) return { from: 0, to: 1 };
  const ends = [movable.value * 0.25, movable.value * 2.5];
  return { from: Math.min(...ends), to: Math.max(...ends) };
}

export function curveOf(one: Case, movable: Movable): Curve {
  const { from, to } = spanOf(movable);
  const found = Array.from({ length: points + 1 }, (_, i): CurvePoint | undefined => {
    const x = from + ((to - from) * i) / points;
    const finding = findingWith(one, movable, x);
    const { h, hLow, hHigh, inRange } = finding;
    return h === undefined || hLow === undefined || hHigh === undefined ? undefined : { x, h, low: hLow, high: hHigh, inRange };
  });
  return { movable, from, to, points: found.filter((point): point is CurvePoint => point !== undefined) };
}
