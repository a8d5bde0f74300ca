/** Published short equations for the saturation line: pressure and both densities against temperature. */

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

/** The value at a temperature; above the ancillary's own Tr that at Tr. */
export function ancillaryAt({ T: Tr, value, terms, form }: Ancillary, T: number): number {
  const theta = Math.max(0, 1 - T / Tr);
  let sum = 0;
  for (const [n, t] of terms) sum += n * theta ** t;
  if (form === "1 + sum") return value * (1 + sum);
  return value * Math.exp(form === "exp" ? sum : (Tr / T) * sum);
}
