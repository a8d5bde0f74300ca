/** Published short equations for the saturation line: pressure and both densities against temperature. */

import { powerSum } from "./power-sum.js";

/** θ = 1 − T/Tr of the ancillary's own Tr. */
export interface Ancillary {
  /** K */
  readonly T: number;
  /** Pa or mol/m³ */
  readonly value: number;
  readonly terms: readonly (readonly [n: number, t: number])[];
  /**
   * `1 + sum`: value (1 + Σ n θ^t); `exp`: value exp(Σ n θ^t); `exp T`: value exp(Tr/T Σ n θ^t).
   */
  readonly form: "1 + sum" | "exp" | "exp T";
}

/** The value against temperature; above the ancillary's own Tr that at Tr. */
export function ancillary({ T: Tr, value, terms, form }: Ancillary): (T: number) => number {
  const sum = powerSum(terms);
  const series = (T: number): number => (T < Tr ? sum(1 - T / Tr) : 0);
  switch (form) {
    case "1 + sum":
      return (T) => value * (1 + series(T));
    case "exp":
      return (T) => value * Math.exp(series(T));
    case "exp T":
      return (T) => value * Math.exp((Tr / T) * series(T));
  }
}
