/** Sums of powers as published correlations have them, made ready once so that a call costs one exponential a term and no look-up. */

/** Σ a x^t over rows [a, t], for x > 0. Whole small exponents are summed by Horner's rule. */
export function powerSum(rows: readonly (readonly [a: number, t: number])[]): (x: number) => number {
  const whole = rows.every(([, t]) => Number.isInteger(t) && t >= 0 && t <= 12);
  if (whole) return wholePowers(rows);
  const a = Float64Array.from(rows, (row) => row[0]);
  const t = Float64Array.from(rows, (row) => row[1]);
  return (x) => {
    const log = Math.log(x);
    let sum = 0;
    for (let i = 0; i < a.length; i++) sum += (a[i] as number) * Math.exp((t[i] as number) * log);
    return sum;
  };
}

function wholePowers(rows: readonly (readonly [a: number, t: number])[]): (x: number) => number {
  const coefficients = new Float64Array(1 + Math.max(0, ...rows.map(([, t]) => t)));
  for (const [a, t] of rows) coefficients[t] = (coefficients[t] as number) + a;
  const last = coefficients.length - 1;
  return (x) => {
    let sum = coefficients[last] as number;
    for (let i = last - 1; i >= 0; i--) sum = sum * x + (coefficients[i] as number);
    return sum;
  };
}

/** Σ a τ^t δ^d over rows [a, t, d]. Whole powers of δ come from a table, so that a δ below zero is no obstacle to them. */
export function powerSum2(rows: readonly (readonly [a: number, t: number, d: number])[]): (tau: number, delta: number) => number {
  const temperatures = distinctPowers(rows.map(([, t]) => t));
  const densities = distinctPowers(rows.map(([, , d]) => d));
  const a = Float64Array.from(rows, (row) => row[0]);
  const ofT = Int32Array.from(rows, ([, t]) => temperatures.exponents.indexOf(t));
  const ofD = Int32Array.from(rows, ([, , d]) => densities.exponents.indexOf(d));
  return (tau, delta) => {
    const byT = temperatures.at(tau);
    const byD = densities.at(delta);
    let sum = 0;
    for (let i = 0; i < a.length; i++) sum += (a[i] as number) * (byT[ofT[i] as number] as number) * (byD[ofD[i] as number] as number);
    return sum;
  };
}

/** Σ a τ^t δ^d exp(γ δ^l) over rows [a, t, d, γ, l], the rows of one exponential summed first. */
export function dampedSum(
  rows: readonly (readonly [a: number, t: number, d: number, gamma: number, l: number])[],
): (tau: number, delta: number) => number {
  const keys = [...new Set(rows.map(([, , , gamma, l]) => `${gamma} ${l}`))];
  const groups = keys.map((key) => {
    const own = rows.filter(([, , , gamma, l]) => `${gamma} ${l}` === key);
    const [, , , gamma, l] = own[0] as readonly [number, number, number, number, number];
    return { sum: powerSum2(own.map(([a, t, d]) => [a, t, d] as const)), gamma, l };
  });
  return (tau, delta) => {
    let total = 0;
    for (let k = 0; k < groups.length; k++) {
      const { sum, gamma, l } = groups[k] as (typeof groups)[number];
      total += sum(tau, delta) * (gamma === 0 ? 1 : Math.exp(gamma * (l === 1 ? delta : l === 2 ? delta * delta : delta ** l)));
    }
    return total;
  };
}

/** x to each of a few exponents; the array is the maker's own and changes at the next call. */
function distinctPowers(all: readonly number[]): { readonly exponents: readonly number[]; at(x: number): Float64Array } {
  const exponents = [...new Set(all)].sort((p, q) => p - q);
  const values = new Float64Array(exponents.length);
  if (exponents.every((one) => Number.isInteger(one) && one >= 0 && one <= 20)) {
    const steps = exponents.map((one, k) => one - (exponents[k - 1] ?? 0));
    return {
      exponents,
      at(x) {
        let power = 1;
        for (let k = 0; k < steps.length; k++) {
          for (let n = steps[k] as number; n > 0; n--) power *= x;
          values[k] = power;
        }
        return values;
      },
    };
  }
  const list = Float64Array.from(exponents);
  return {
    exponents,
    at(x) {
      const log = Math.log(x);
      for (let k = 0; k < list.length; k++) values[k] = list[k] === 0 ? 1 : Math.exp((list[k] as number) * log);
      return values;
    },
  };
}
