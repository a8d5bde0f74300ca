/** Dense viscosity η = δ^(2/3) √Tr · bracket, the shape of the reference correlations since 2012; δ and Tr on the record's own reducing point. */
import { powerSum2 } from "./power-sum.js";
import type { Substance, Viscosity } from "./transport.js";

export interface ScaledDense {
  readonly form: "scaled";
  /** K */
  readonly T: number;
  /** kg/m³ */
  readonly density: number;
  /** Pa·s in front of the bracket */
  readonly scale: number;
  readonly bracket: Bracket;
}

type Numbers = readonly number[];

/** The terms inside the brackets, each as its paper prints it. */
export type Bracket =
  /** Σ a Tr^b δ^c + q δ/(Tr (d0 + d1 δ)), the last where `q` is given */
  | {
      readonly of: "powers";
      readonly a: readonly (readonly [a: number, b: number, c: number])[];
      readonly pole?: readonly [q: number, d0: number, d1: number];
    }
  /** p δ + (q0 + q1 δ + q2 δ⁵ + q3 Tr² δ⁸)/(Tr + s δ) */
  | { readonly of: "acetone"; readonly c: Numbers }
  /** c0 δ² + c1 δ/(c2 + c3 Tr + c4 δ) + (c5 δ + c6 δ²)/(c7 + c8 δ²) */
  | { readonly of: "benzene"; readonly c: Numbers }
  /** (c0 δ + c1 δ⁴)/Tr + c2 δ³/(δ² + c3 + c4 Tr) + c5 δ */
  | { readonly of: "toluene"; readonly c: Numbers }
  /** c0/Tr + c1/(c2 + Tr + c3 δ²) + c4 (1 + δ)/(c5 + c6 Tr + c7 δ + δ² + c8 δ Tr) */
  | { readonly of: "hexane"; readonly c: Numbers }
  /** c0 δ + c1 δ² + c2 δ³ + c3 δ/(c4 + c5 Tr + c6 δ + δ² + c7 δ Tr) */
  | { readonly of: "heptane"; readonly c: Numbers };

export function scaledDense(record: ScaledDense, substance: Substance): Viscosity["excess"] {
  const inside = bracketOf(record.bracket);
  return ({ T, rho }) => {
    const delta = (rho * substance.molarMass) / record.density;
    const Tr = T / record.T;
    return record.scale * Math.cbrt(delta * delta) * Math.sqrt(Tr) * inside(Tr, delta);
  };
}

function bracketOf(bracket: Bracket): (Tr: number, delta: number) => number {
  if (bracket.of === "powers") return powersOf(bracket);
  const [c0, c1, c2, c3, c4, c5, c6, c7, c8] = bracket.c as readonly [
    number,
    number,
    number,
    number,
    number,
    number,
    number,
    number,
    number,
  ];
  switch (bracket.of) {
    case "acetone":
      return (Tr, d) => c0 * d + (c1 + c2 * d + c3 * d ** 5 + c4 * Tr * Tr * d ** 8) / (Tr + c5 * d);
    case "benzene":
      return (Tr, d) => c0 * d * d + (c1 * d) / (c2 + c3 * Tr + c4 * d) + (c5 * d + c6 * d * d) / (c7 + c8 * d * d);
    case "toluene":
      return (Tr, d) => (c0 * d + c1 * d ** 4) / Tr + (c2 * d ** 3) / (d * d + c3 + c4 * Tr) + c5 * d;
    case "hexane":
      return (Tr, d) => c0 / Tr + c1 / (c2 + Tr + c3 * d * d) + (c4 * (1 + d)) / (c5 + c6 * Tr + c7 * d + d * d + c8 * d * Tr);
    case "heptane":
      return (Tr, d) => c0 * d + c1 * d * d + c2 * d ** 3 + (c3 * d) / (c4 + c5 * Tr + c6 * d + d * d + c7 * d * Tr);
  }
}

function powersOf({ a, pole }: Extract<Bracket, { of: "powers" }>): (Tr: number, delta: number) => number {
  const powers = powerSum2(a);
  return (Tr, delta) => {
    const sum = powers(Tr, delta);
    return pole ? sum + (pole[0] * delta) / (Tr * (pole[1] + pole[2] * delta)) : sum;
  };
}
