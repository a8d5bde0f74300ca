import { formatNumber, formatQuantity } from "../quantities/format.js";
import { coverageProblem, isProblem, type Problem } from "../quantities/problems.js";
import { choose } from "./choice.js";
import type { Point } from "./point.js";
import { Scene } from "./scene.js";
import type { Inputs, Surface } from "./surface.js";

export interface Balance {
  readonly point: Point;
  /** Flux carried minus flux asked, W/m². */
  readonly residual: number;
  /** The flux falls inside a regime's jump: no temperature carries it exactly, and the switch point stands in. */
  readonly atSwitch: boolean;
  readonly evaluations: number;
}

/** How the sum of convection and radiation compares with the flux asked; `factor` scales the convective part (scatter). */
type Excess = (Ts: number) => { readonly excess: number; readonly point: Point } | Problem;

const firstStep = 1;
const widest = 1e5;

/**
 * The surface temperature that carries a given flux: marched outwards from the bulk until the flux is bracketed, then
 * closed in by bisection and false position (Illinois), which always ends. Says so when no temperature carries it.
 */
export function balance(surface: Surface, inputs: Inputs, factor = 1): Balance | Problem {
  if (inputs.wall.kind !== "flux") throw new Error("a balance needs a flux");
  const asked = inputs.wall.q;
  let evaluations = 0;
  const excess: Excess = (Ts) => {
    evaluations++;
    const scene = Scene.at(surface, inputs, Ts);
    if (isProblem(scene)) return scene;
    const point = choose(surface, scene);
    if (isProblem(point)) return point;
    return { excess: factor * point.q + (point.qRadiant ?? 0) - asked, point };
  };

  const atBulk = Scene.at(surface, inputs, inputs.Tb);
  if (isProblem(atBulk)) return atBulk;
  const start = excess(inputs.Tb);
  if (isProblem(start) && start.fault === "value") return start;
  if (!isProblem(start) && start.excess === 0) return { point: start.point, residual: 0, atSwitch: false, evaluations };
  // An equation without a limit at zero difference has no number there, but then it carries nothing either.
  const bracket = march(inputs, asked, excess, isProblem(start) ? -asked : start.excess);
  if (isProblem(bracket)) return bracket;
  const closed = closeIn(excess, bracket);
  if (isProblem(closed)) return closed;
  const scale = Math.max(Math.abs(asked), Math.abs(closed.point.q), 1e-300);
  return {
    point: closed.point,
    residual: closed.excess,
    atSwitch: Math.abs(closed.excess) > 1e-6 * scale,
    evaluations,
  };
}

interface Bracket {
  low: number;
  high: number;
  lowExcess: number;
  highExcess: number;
}

function march(inputs: Inputs, asked: number, excess: Excess, startExcess: number): Bracket | Problem {
  const direction = startExcess < 0 ? 1 : -1;
  let from = inputs.Tb;
  let fromExcess = startExcess;
  let step = firstStep;
  let wall: Problem | undefined;
  while (step > 1e-9 && step < widest) {
    const to = from + direction * step;
    const there = excess(to);
    if (isProblem(there)) {
      wall = there;
      step /= 4;
      continue;
    }
    if (Math.sign(there.excess) !== Math.sign(startExcess)) {
      return direction > 0
        ? { low: from, high: to, lowExcess: fromExcess, highExcess: there.excess }
        : { low: to, high: from, lowExcess: there.excess, highExcess: fromExcess };
    }
    from = to;
    fromExcess = there.excess;
    step *= wall === undefined ? 2.5 : 1;
  }
  const reached = asked + fromExcess;
  return coverageProblem(
    undefined,
    `no surface temperature carries ${formatQuantity(asked, "heat flux", "SI")}: up to ${formatQuantity(from, "temperature", "SI")} only ${formatQuantity(reached, "heat flux", "SI")} passes${wall === undefined ? "" : `, and there ${reasonOf(wall)}`}`,
  );
}

function reasonOf(wall: Problem): string {
  return `${wall.argument === undefined ? "" : `the ${wall.argument} `}${wall.sentence}`;
}

function closeIn(excess: Excess, bracket: Bracket): { excess: number; point: Point } | Problem {
  let { low, high, lowExcess, highExcess } = bracket;
  let best: { excess: number; point: Point } | undefined;
  let side = 0;
  for (let step = 0; step < 200; step++) {
    const slope = highExcess - lowExcess;
    let middle = step % 4 === 3 || slope === 0 ? (low + high) / 2 : (low * highExcess - high * lowExcess) / slope;
    if (!(middle > low && middle < high)) middle = (low + high) / 2;
    if (middle <= low || middle >= high) break;
    const there = excess(middle);
    if (isProblem(there)) return there;
    if (best === undefined || Math.abs(there.excess) < Math.abs(best.excess)) best = there;
    if (there.excess === 0 || high - low < 1e-12 * high) break;
    if (Math.abs(there.excess) < 1e-12 * Math.abs(there.point.q)) break;
    if (Math.sign(there.excess) === Math.sign(highExcess)) {
      high = middle;
      highExcess = there.excess;
      if (side === 1) lowExcess /= 2;
      side = 1;
    } else {
      low = middle;
      lowExcess = there.excess;
      if (side === -1) highExcess /= 2;
      side = -1;
    }
  }
  return best ?? coverageProblem(undefined, `the balance did not close between ${formatNumber(low)} K and ${formatNumber(high)} K.`);
}
