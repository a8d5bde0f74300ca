/** Monotone cubic interpolation (Fritsch & Carlson's condition with Brodlie's weighted harmonic slopes): no overshoot between the rows of a table. */

export interface Interpolant {
  at(x: number): number;
  slope(x: number): number;
}

/** `xs` strictly rising, as many `ys`, at least two. Outside the rows the caller refuses; here the end pieces simply go on. */
export function monotone(xs: readonly number[], ys: readonly number[]): Interpolant {
  const count = xs.length;
  const slopes = nodeSlopes(xs, ys);
  const pieceAt = (x: number): number => {
    let low = 0;
    let high = count - 1;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if ((xs[middle] as number) <= x) low = middle;
      else high = middle;
    }
    return low;
  };
  return {
    at(x) {
      const k = pieceAt(x);
      const x0 = xs[k] as number;
      const h = (xs[k + 1] as number) - x0;
      const t = (x - x0) / h;
      const y0 = ys[k] as number;
      const rise = (ys[k + 1] as number) - y0;
      const left = (slopes[k] as number) * h;
      const right = (slopes[k + 1] as number) * h;
      return y0 + t * (left + t * (3 * rise - 2 * left - right + t * (left + right - 2 * rise)));
    },
    slope(x) {
      const k = pieceAt(x);
      const x0 = xs[k] as number;
      const h = (xs[k + 1] as number) - x0;
      const t = (x - x0) / h;
      const rise = (ys[k + 1] as number) - (ys[k] as number);
      const left = (slopes[k] as number) * h;
      const right = (slopes[k + 1] as number) * h;
      return (left + t * (2 * (3 * rise - 2 * left - right) + 3 * t * (left + right - 2 * rise))) / h;
    },
  };
}

function nodeSlopes(xs: readonly number[], ys: readonly number[]): readonly number[] {
  const steps = xs.slice(1).map((x, k) => x - (xs[k] as number));
  const secants = steps.map((h, k) => ((ys[k + 1] as number) - (ys[k] as number)) / h);
  if (secants.length === 1) return [secants[0] as number, secants[0] as number];
  const inner = secants.slice(1).map((right, k) => {
    const left = secants[k] as number;
    if (left * right <= 0) return 0;
    const before = steps[k] as number;
    const after = steps[k + 1] as number;
    const w1 = 2 * after + before;
    const w2 = after + 2 * before;
    return (w1 + w2) / (w1 / left + w2 / right);
  });
  const last = secants.length - 1;
  const first = endSlope(steps[0] as number, steps[1] as number, secants[0] as number, secants[1] as number);
  const end = endSlope(steps[last] as number, steps[last - 1] as number, secants[last] as number, secants[last - 1] as number);
  return [first, ...inner, end];
}

/** Three-point slope at an end, held to the sign and three times the size of the end's secant. */
function endSlope(h: number, next: number, secant: number, nextSecant: number): number {
  const slope = ((2 * h + next) * secant - h * nextSecant) / (h + next);
  if (slope * secant <= 0) return 0;
  return secant * nextSecant < 0 && Math.abs(slope) > 3 * Math.abs(secant) ? 3 * secant : slope;
}
