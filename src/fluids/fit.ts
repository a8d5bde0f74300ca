/** The few forms in which handbooks fit a property of a liquid to temperature and concentration. T in kelvin, x a fraction. */

export interface Fit {
  readonly form: "polynomial" | "exppolynomial" | "exponential" | "logexponential";
  /** Polynomials: rows by power of temperature, columns by power of concentration; a flat row is in concentration alone. */
  readonly c: readonly (number | readonly number[])[];
}

/** A property along temperature at one concentration. */
export interface Curve {
  at(T: number): number;
  slope(T: number): number;
}

/** `base`: the temperature and the concentration from which a polynomial counts. */
export function curveOf(fit: Fit, base: readonly [number, number], x: number): Curve {
  switch (fit.form) {
    case "polynomial":
      return polynomial(atConcentration(fit, base, x), base[0]);
    case "exppolynomial":
      return exponentialOf(polynomial(atConcentration(fit, base, x), base[0]));
    case "exponential": {
      const [c0 = 0, c1 = 0, c2 = 0] = fit.c as readonly number[];
      return exponentialOf({ at: (T) => c0 / (T + c1) - c2, slope: (T) => -c0 / ((T + c1) * (T + c1)) });
    }
    case "logexponential": {
      const [c0 = 0, c1 = 0, c2 = 0] = fit.c as readonly number[];
      const inner = (T: number): number => 1 / (T + c0);
      return exponentialOf({
        at: (T) => c1 * Math.log(inner(T) + inner(T) ** 2) + c2,
        slope: (T) => (-c1 * inner(T) * (1 + 2 * inner(T))) / (1 + inner(T)),
      });
    }
  }
}

/** A fit of concentration alone, such as the freezing point. */
export function valueAt(fit: Fit, base: readonly [number, number], x: number): number {
  const [value = Number.NaN] = atConcentration(fit, base, x);
  return fit.form === "exppolynomial" ? Math.exp(value) : value;
}

function atConcentration(fit: Fit, base: readonly [number, number], x: number): readonly number[] {
  return fit.c.map((row) => (typeof row === "number" ? row : horner(row, x - base[1])));
}

export function horner(c: readonly number[], x: number): number {
  let sum = 0;
  for (let k = c.length - 1; k >= 0; k--) sum = sum * x + (c[k] as number);
  return sum;
}

/** Σ c (T − base)^k */
export function polynomial(c: readonly number[], base = 0): Curve {
  const derivative = c.slice(1).map((value, k) => value * (k + 1));
  return { at: (T) => horner(c, T - base), slope: (T) => horner(derivative, T - base) };
}

export function exponentialOf(exponent: Curve): Curve {
  return { at: (T) => Math.exp(exponent.at(T)), slope: (T) => Math.exp(exponent.at(T)) * exponent.slope(T) };
}

/** For forms without a written derivative: central difference over a step in which rounding and curvature are both below 1e-7. */
export function numerical(at: (T: number) => number): Curve {
  return { at, slope: (T) => (at(T + 0.05) - at(T - 0.05)) / 0.1 };
}
