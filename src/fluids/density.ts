/**
 * Density from temperature and pressure on a Helmholtz equation of state. Every search is bracketed, so that none diverges and none changes branch:
 * Newton's step is taken only inside the bracket, and halving stands behind it.
 */
import type { Helmholtz } from "./helmholtz.js";

/** Part of an isotherm on which pressure rises with density, in reduced density; `high` may be infinite where nothing bounds it. */
export interface Branch {
  readonly low: number;
  readonly high: number;
  /** Where to begin. */
  readonly start: number;
}

/** Above this reduced density no equation of the shelf means anything. */
const densest = 8;
const mostSteps = 120;

/**
 * The reduced density δ with δ(1 + δα_δ) = `target` (p over ρr R T), to a few units of the last place; undefined where the branch does not hold one.
 */
export function densityOn(equation: Helmholtz, tau: number, target: number, branch: Branch): number | undefined {
  let low = branch.low;
  let high = branch.high;
  let x = Math.min(Math.max(branch.start, low), Math.min(high, densest));
  let stepBefore = Number.POSITIVE_INFINITY;
  for (let count = 0; count < mostSteps; count++) {
    const part = equation.pressurePart(tau, x);
    const excess = x * (1 + part.d) - target;
    const slope = 1 + 2 * part.d + part.dd;
    if (excess === 0) return x;
    if (excess < 0) low = x;
    else high = x;
    const newton = slope > 0 ? x - excess / slope : Number.NaN;
    if (Math.abs(newton - x) <= 1e-14 * x) return x;
    // The bracket has closed: on the root, or on an end of a branch that does not reach the pressure.
    if (high - low <= 4e-16 * high && high < Number.POSITIVE_INFINITY)
      return Math.abs(excess) <= 1e-9 * Math.max(target, x) ? x : undefined;
    const inside = newton > low && newton < high;
    const slow = count > 3 && Math.abs(newton - x) > 0.5 * stepBefore;
    // Newton's method converges quadratically: behind a step of 1e-8 only rounding is left.
    if (inside && Math.abs(newton - x) <= 1e-8 * x) return newton;
    // An overshoot towards an open end is let go as far as a factor 2: beyond, halving takes over once the end is closed.
    const next = inside && !slow && newton <= 2 * x ? newton : further(low, high, x, excess);
    const step = Math.abs(next - x);
    if (next > densest) return undefined;
    stepBefore = step;
    x = next;
  }
  return undefined;
}

function further(low: number, high: number, x: number, excess: number): number {
  if (high === Number.POSITIVE_INFINITY) return excess < 0 ? 1.6 * x : x / 1.6;
  if (low > 0 && high > 4 * low) return Math.sqrt(low * high);
  return low === 0 && high > 0 ? high / 4 : (low + high) / 2;
}

/**
 * Reduced density of a liquid compressed from `known` to a pressure, on Murnaghan's law with the usual exponent of liquids.
 * A start for the search, never a result.
 */
export function compressedDensity(equation: Helmholtz, tau: number, target: number, known: number): number {
  const part = equation.pressurePart(tau, known);
  const stiffness = known * (1 + 2 * part.d + part.dd);
  const rise = target - known * (1 + part.d);
  return stiffness > 0 && rise > 0 ? known * (1 + (murnaghan * rise) / stiffness) ** (1 / murnaghan) : known;
}

const murnaghan = 9;

/**
 * Compressibility by the cubic equation of Peng and Robinson, reduced pressure and temperature and acentric factor given: the largest root.
 * A start for the search, never a result.
 */
export function cubicCompressibility(Tr: number, pr: number, acentric: number): number {
  const kappa = 0.37464 + acentric * (1.54226 - 0.26992 * acentric);
  const root = 1 + kappa * (1 - Math.sqrt(Math.min(Tr, 20)));
  const A = (0.45724 * root * root * pr) / (Tr * Tr);
  const B = (0.0778 * pr) / Tr;
  const c2 = B - 1;
  const c1 = A - 3 * B * B - 2 * B;
  const c0 = -(A * B - B * B - B * B * B);
  const q = (c2 * c2 - 3 * c1) / 9;
  const r = (2 * c2 * c2 * c2 - 9 * c2 * c1 + 27 * c0) / 54;
  const inner = r * r - q * q * q;
  if (inner < 0) {
    const angle = Math.acos(r / Math.sqrt(q * q * q));
    return -2 * Math.sqrt(q) * Math.cos((angle + 2 * Math.PI) / 3) - c2 / 3;
  }
  const a = -Math.sign(r) * Math.cbrt(Math.abs(r) + Math.sqrt(inner));
  return a + (a === 0 ? 0 : q / a) - c2 / 3;
}
