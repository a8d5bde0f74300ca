/** Dense viscosity by friction theory (Quiñones-Cisneros & Deiters 2006): quadratic and cubic in the attractive and repulsive pressure of the equation of state. */
import type { Substance, Viscosity } from "./transport.js";

type Triple = readonly [number, number, number];

/** Coefficients of κ = (A0 + A1 ψ1 + A2 ψ2) Γ^N, Γ = Tr/T, ψ1 = e^Γ − c1, ψ2 = e^(Γ²) − c2; pressures in bar. */
export interface FrictionTheory {
  readonly form: "friction theory";
  readonly T: number;
  readonly c1: number;
  readonly c2: number;
  /** On the ideal, attractive and residual repulsive pressure */
  readonly i: readonly [Triple, number];
  readonly a: readonly [Triple, number];
  readonly r: readonly [Triple, number];
  /** On squares of the ideal, attractive, repulsive and residual repulsive pressure */
  readonly ii?: readonly [Triple, number];
  readonly aa?: readonly [Triple, number];
  readonly rr?: readonly [Triple, number];
  readonly drdr?: readonly [Triple, number];
  /** On cubes */
  readonly aaa?: readonly [Triple, number];
  readonly rrr?: readonly [Triple, number];
}

const bar = 1e5;

export function frictionTheory(record: FrictionTheory, substance: Substance): Viscosity["excess"] {
  return ({ T, rho, p, pT }) => {
    const gamma = record.T / T;
    const psi1 = Math.exp(gamma) - record.c1;
    const psi2 = Math.exp(gamma * gamma) - record.c2;
    const kappa = (given: readonly [Triple, number] | undefined): number => {
      if (!given) return 0;
      const [[a0, a1, a2], power] = given;
      return (a0 + a1 * psi1 + a2 * psi2) * gamma ** power;
    };
    const repulsive = (T * pT) / bar;
    const attractive = p / bar - repulsive;
    const ideal = (rho * substance.gasConstant * T) / bar;
    const residual = repulsive - ideal;
    return (
      kappa(record.i) * ideal +
      kappa(record.a) * attractive +
      kappa(record.r) * residual +
      kappa(record.ii) * ideal ** 2 +
      kappa(record.aa) * attractive ** 2 +
      kappa(record.rr) * repulsive ** 2 +
      kappa(record.drdr) * residual ** 2 +
      kappa(record.aaa) * attractive ** 3 +
      kappa(record.rrr) * repulsive ** 3
    );
  };
}
