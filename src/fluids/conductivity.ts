/**
 * Thermal conductivity from published correlations: dilute gas + dense term + critical enhancement.
 * Temperatures in K, density in kg/m³ in the dense polynomials, conductivity in W/(m·K).
 */
import { type ConductivityNamed, namedConductivity } from "./conductivity-named.js";
import { type CorrespondingConductivity, correspondingConductivity, type Relation } from "./corresponding-states.js";
import { type CriticalEnhancement, criticalEnhancement } from "./critical-enhancement.js";
import type { Helmholtz } from "./helmholtz.js";
import { dampedSum, powerSum, powerSum2 } from "./power-sum.js";
import type { Conductivity, Substance, TransportState, Viscosity } from "./transport.js";
import { logPolynomial } from "./viscosity.js";

type Rows2 = readonly (readonly [a: number, t: number])[];

export type DiluteConductivity =
  /** Σ a (T/Tr)^t over Σ b (T/Tr)^t */
  | { readonly form: "ratio"; readonly T: number; readonly a: Rows2; readonly b: Rows2 }
  /** A0 η0 + Σ a τ^t with η0 the dilute viscosity in µPa·s and τ on the reducing temperature, Lemmon & Jacobsen 2004 */
  | { readonly form: "viscosity and powers"; readonly A0: number; readonly a: Rows2 }
  /** A exp(Σ a ln(T/Tr)^i), i from 1 */
  | { readonly form: "log polynomial"; readonly T: number; readonly A: number; readonly a: readonly number[] }
  /** A η0 (3.75 − (f0 + f1/T*)(τ²α0_ττ + 1.5)) with η0 the dilute viscosity in µPa·s, Friend, Ingham & Ely 1991 */
  | { readonly form: "Eucken"; readonly A: number; readonly epsilon: number; readonly f0: number; readonly f1: number }
  /** τ^−½/Σ l τ^i in mW/(m·K), τ on the reducing temperature, Huber et al. 2016 */
  | { readonly form: "inverse polynomial"; readonly l: readonly number[] };

export type DenseConductivity =
  /** Σ B (Tr/T)^t (ρ/ρr)^d, density in kg/m³ */
  | {
      readonly form: "polynomial";
      readonly T: number;
      readonly density: number;
      readonly B: readonly (readonly [B: number, t: number, d: number])[];
    }
  /** Σ A τ^t δ^d exp(−γ δ^l) on the reducing point, Lemmon & Jacobsen 2004 */
  | { readonly form: "exponentials"; readonly A: readonly (readonly [A: number, t: number, d: number, l: number])[] };

export type ConductivityRecord =
  | {
      readonly form: "sum";
      readonly dilute: DiluteConductivity;
      readonly dense?: DenseConductivity;
      readonly critical?: CriticalEnhancement;
    }
  | CorrespondingConductivity
  | ConductivityNamed;

export interface ConductivityParts {
  readonly substance: Substance;
  readonly viscosity: Viscosity;
  /** A fresh evaluator of the fluid's own equation of state. */
  equation(): Helmholtz;
  relate(reference: string): Relation;
  /** mol/m³ of saturated vapour at a temperature, good enough for a crossover term */
  vapourDensity(T: number): number;
}

export function conductivityOf(record: ConductivityRecord, parts: ConductivityParts): Conductivity {
  switch (record.form) {
    case "named":
      return namedConductivity(record, parts);
    case "corresponding states": {
      const critical = criticalEnhancement(record.critical ?? { form: "Olchowy-Sengers" }, parts.substance, parts.equation());
      return correspondingConductivity(record, parts.substance, parts.viscosity, parts.relate(record.reference), critical);
    }
    case "sum":
      return sumOf(record, parts);
  }
}

function sumOf(record: Extract<ConductivityRecord, { form: "sum" }>, parts: ConductivityParts): Conductivity {
  const dilute = diluteOf(record.dilute, parts);
  const dense = record.dense ? denseConductivityOf(record.dense, parts.substance) : undefined;
  const critical = record.critical ? criticalEnhancement(record.critical, parts.substance, parts.equation()) : undefined;
  return (state, viscosity) => {
    const background = dilute(state) + (dense ? dense(state.T, state.rho) : 0);
    return critical ? background + critical(state, viscosity) : background;
  };
}

function diluteOf(record: DiluteConductivity, { substance, viscosity }: ConductivityParts): (state: TransportState) => number {
  switch (record.form) {
    case "ratio": {
      const above = powerSum(record.a);
      const below = powerSum(record.b);
      return ({ T }) => above(T / record.T) / below(T / record.T);
    }
    case "viscosity and powers": {
      const rest = powerSum(record.a);
      return ({ T }) => record.A0 * 1e6 * viscosity.dilute(T) + rest(substance.reducing.T / T);
    }
    case "log polynomial":
      return ({ T }) => logPolynomial(record, T);
    case "Eucken":
      return ({ T, idealTT }) =>
        record.A * 1e6 * viscosity.dilute(T) * (3.75 - (record.f0 + (record.f1 * record.epsilon) / T) * (idealTT + 1.5));
    case "inverse polynomial":
      return ({ T }) => {
        const tau = substance.reducing.T / T;
        let sum = 0;
        for (let i = record.l.length - 1; i >= 0; i--) sum = sum * tau + (record.l[i] as number);
        return 1e-3 / (Math.sqrt(tau) * sum);
      };
  }
}

/** Also what the corresponding-states method takes from its reference fluid. */
export function denseConductivityOf(record: DenseConductivity, substance: Substance): (T: number, rho: number) => number {
  if (record.form === "polynomial") {
    const sum = powerSum2(record.B);
    return (T, rho) => sum(record.T / T, (rho * substance.molarMass) / record.density);
  }
  const sum = dampedSum(record.A.map(([A, t, d, l]) => [A, t, d, l === 0 ? 0 : -1, l] as const));
  return (T, rho) => sum(substance.reducing.T / T, rho / substance.reducing.rho);
}
