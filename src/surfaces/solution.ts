import { isProblem, type Problem } from "../quantities/problems.js";
import { balance } from "./balance.js";
import { choose } from "./choice.js";
import type { Point } from "./point.js";
import { Scene } from "./scene.js";
import type { Inputs, Surface } from "./surface.js";

/** A case solved: the point, and how well the balance closed where the surface was given by its flux. */
export interface Solution {
  readonly point: Point;
  readonly residual: number | undefined;
  readonly atSwitch: boolean;
}

/** Solves one case; `factor` scales the film coefficient, for the equation's scatter inside a balance. */
export function solve(surface: Surface, inputs: Inputs, factor = 1): Solution | Problem {
  if (inputs.wall.kind === "flux") {
    const found = balance(surface, inputs, factor);
    return isProblem(found) ? found : { point: found.point, residual: found.residual, atSwitch: found.atSwitch };
  }
  const scene = Scene.at(surface, inputs, inputs.wall.T);
  if (isProblem(scene)) return scene;
  const point = choose(surface, scene);
  return isProblem(point) ? point : { point, residual: undefined, atSwitch: false };
}

/** The numbers that carry bounds. */
export interface Outcome {
  readonly h: number;
  readonly Nu: number;
  readonly q: number;
  readonly Ts: number;
}

export function outcomeOf(point: Point, factor = 1): Outcome {
  return { h: factor * point.h, Nu: factor * point.Nu, q: factor * point.q, Ts: point.Ts };
}
