/**
 * Extended corresponding states: a fluid's dense transport from that of a reference fluid at the conformal state, where residual Helmholtz energy and
 * compressibility are equal (Klein, McLinden & Laesecke 1997; McLinden, Klein & Perkins 2000; Huber, Laesecke & Perkins 2003). Predictive: 5 to 10 %.
 */
import type { CriticalEnhancement } from "./critical-enhancement.js";
import type { Helmholtz } from "./helmholtz.js";
import { powerSum } from "./power-sum.js";
import { type Conductivity, kineticViscosity, type Substance, type TransportState, type Viscosity } from "./transport.js";

type Rows2 = readonly (readonly [a: number, t: number])[];

/** Shape factor ψ (viscosity) or χ (conductivity): Σ a (ρ/ρr)^t, on the reference's density. */
interface Shape {
  /** mol/m³ */
  readonly rho: number;
  readonly a: Rows2;
}

export interface CorrespondingViscosity {
  readonly form: "corresponding states";
  readonly reference: string;
  readonly lennardJones: { readonly epsilon: number; readonly sigma: number };
  /** Factor on the dilute viscosity, 1 where left out */
  readonly Fc?: number;
  readonly shape: Shape;
}

export interface CorrespondingConductivity {
  readonly form: "corresponding states";
  readonly reference: string;
  /** Of the dilute gas; the viscosity's own dilute part where left out */
  readonly lennardJones?: { readonly epsilon: number; readonly sigma: number };
  readonly Fc?: number;
  readonly shape: Shape;
  /** Eucken factor of the internal degrees of freedom, Σ a T^t */
  readonly internal: Rows2;
  readonly critical?: CriticalEnhancement;
}

/** What the method asks of the reference fluid; every user holds one of its own. */
export interface ReferenceFluid {
  readonly substance: Substance;
  readonly equation: Helmholtz;
  readonly viscosity: Viscosity;
  /** Dense part of its conductivity, without dilute gas and critical enhancement */
  readonly denseConductivity: (T: number, rho: number) => number;
}

export interface Conformal {
  readonly T: number;
  readonly rho: number;
}

/** Finds the reference's conformal state for a state of the fluid, each by its own equation of state. */
export type ConformalSearch = (state: TransportState) => Conformal;

/** A reference fluid with the search for one fluid's conformal states on it. */
export interface Relation {
  readonly reference: ReferenceFluid;
  readonly search: ConformalSearch;
}

/** Newton's method converges quadratically: behind this relative step the conformal state is good to 1e-7. */
const settled = 1e-4;
/** A conformal temperature further off than this (in ln T) belongs to another root. */
const furthest = 0.9;

/** (T0, ρ0) sought from the corresponding state of the critical points. Keeps the last, which viscosity and conductivity share. */
export function conformalSearch(substance: Substance, reference: ReferenceFluid): ConformalSearch {
  const from = substance.reducing;
  const to = reference.substance.reducing;
  let last: Conformal = { T: 0, rho: 0 };
  let ownT = Number.NaN;
  let ownRho = Number.NaN;
  return ({ T, rho, alpha, alphaD }) => {
    if (ownT === T && ownRho === rho) return last;
    const found = solve(reference.equation, alpha, alphaD, { tau: from.T / T, delta: rho / from.rho });
    last = { T: to.T / found.tau, rho: found.delta * to.rho };
    ownT = T;
    ownRho = rho;
    return last;
  };
}

interface Reduced {
  readonly tau: number;
  readonly delta: number;
}

function solve(equation: Helmholtz, a: number, d: number, start: Reduced): Reduced {
  return exact(equation, a, d, start) ?? nearest(equation, a, d, start);
}

/** Newton's method in ln τ and ln δ, where ∂(δα_δ)/∂ln δ = δα_δ + δ²α_δδ; undefined where it does not settle or strays. */
function exact(equation: Helmholtz, a: number, d: number, start: Reduced): Reduced | undefined {
  let { tau, delta } = start;
  for (let count = 0; count < 15; count++) {
    const r = equation.residual(tau, delta);
    const missA = r.a - a;
    const missD = r.d - d;
    const alongD = r.d + r.dd;
    const determinant = r.t * alongD - r.d * r.dt;
    const stepT = (r.d * missD - alongD * missA) / determinant;
    const stepD = (r.dt * missA - r.t * missD) / determinant;
    const longest = Math.max(Math.abs(stepT), Math.abs(stepD));
    if (!(longest < Number.POSITIVE_INFINITY) || (count > 6 && longest > 0.1)) return undefined;
    const held = Math.min(1, 0.3 / longest);
    tau *= Math.exp(held * stepT);
    delta *= Math.exp(held * stepD);
    if (longest < settled) return Math.abs(Math.log(tau / start.tau)) < furthest ? { tau, delta } : undefined;
  }
  return undefined;
}

/** Least squares by Levenberg and Marquardt. In a thin cold gas no state is quite conformal; the nearest one then stands. */
function nearest(equation: Helmholtz, a: number, d: number, start: Reduced): Reduced {
  let { tau, delta } = start;
  let damping = 1e-3;
  let { a: ra, d: rd, t: aT, dt: dT, dd } = equation.residual(tau, delta);
  let miss = (ra - a) ** 2 + (rd - d) ** 2;
  for (let count = 0; count < 40 && miss > 0; count++) {
    const aD = rd;
    const dD = rd + dd;
    const slopeT = aT * (ra - a) + dT * (rd - d);
    const slopeD = aD * (ra - a) + dD * (rd - d);
    const bend = aT * aD + dT * dD;
    const bendT = (aT * aT + dT * dT) * (1 + damping);
    const bendD = (aD * aD + dD * dD) * (1 + damping);
    const determinant = bendT * bendD - bend * bend;
    const stepT = (bend * slopeD - bendD * slopeT) / determinant;
    const stepD = (bend * slopeT - bendT * slopeD) / determinant;
    const longest = Math.max(Math.abs(stepT), Math.abs(stepD));
    if (!(longest < Number.POSITIVE_INFINITY) || longest < 1e-4) break;
    const held = Math.min(1, 0.3 / longest);
    const nextTau = tau * Math.exp(held * stepT);
    const nextDelta = delta * Math.exp(held * stepD);
    const next = equation.residual(nextTau, nextDelta);
    const nextMiss = (next.a - a) ** 2 + (next.d - d) ** 2;
    if (!(nextMiss < miss)) {
      damping *= 10;
      continue;
    }
    damping /= 10;
    tau = nextTau;
    delta = nextDelta;
    const gained = miss - nextMiss;
    miss = nextMiss;
    if (gained < 1e-3 * miss) break;
    ({ a: ra, d: rd, t: aT, dt: dT, dd } = next);
  }
  return { tau, delta };
}

export function correspondingViscosity(record: CorrespondingViscosity, substance: Substance, { reference, search }: Relation): Viscosity {
  const { epsilon, sigma } = record.lennardJones;
  const factor = record.Fc ?? 1;
  const masses = Math.sqrt(substance.molarMass / reference.substance.molarMass);
  const point = emptyState();
  const shape = powerSum(record.shape.a);
  return {
    dilute: (T) => factor * kineticViscosity(T, substance.molarMass, epsilon, sigma),
    excess(state) {
      const { T, rho } = state;
      const conformal = search(state);
      point.T = conformal.T;
      point.rho = conformal.rho * shape(rho / record.shape.rho);
      return reference.viscosity.excess(point) * scaling(T, rho, conformal) * masses;
    },
  };
}

export function correspondingConductivity(
  record: CorrespondingConductivity,
  substance: Substance,
  viscosity: Viscosity,
  { reference, search }: Relation,
  critical: Conductivity,
): Conductivity {
  const { molarMass, gasConstant } = substance;
  const masses = Math.sqrt(reference.substance.molarMass / molarMass);
  const pair = record.lennardJones;
  const shape = powerSum(record.shape.a);
  const internal = powerSum(record.internal);
  const factor = record.Fc ?? 1;
  const diluteViscosity = pair ? (T: number) => factor * kineticViscosity(T, molarMass, pair.epsilon, pair.sigma) : viscosity.dilute;
  return (state, full) => {
    const { T, rho } = state;
    const eta0 = diluteViscosity(T);
    const inner = gasConstant * (1 - state.idealTT) - 2.5 * gasConstant;
    const dilute = (eta0 / molarMass) * (3.75 * gasConstant + 1000 * internal(T) * inner);
    const conformal = search(state);
    const dense = reference.denseConductivity(conformal.T, conformal.rho * shape(rho / record.shape.rho));
    return dilute + dense * scaling(T, rho, conformal) * masses + critical(state, full);
  };
}

/** √f h^(−2/3) with f = T/T0 and h = ρ0/ρ. */
function scaling(T: number, rho: number, conformal: Conformal): number {
  return Math.sqrt(T / conformal.T) * Math.cbrt((rho / conformal.rho) ** 2);
}

function emptyState(): TransportState {
  return {
    T: 0,
    rho: 0,
    p: Number.NaN,
    pT: Number.NaN,
    pRho: Number.NaN,
    cp: Number.NaN,
    cv: Number.NaN,
    alpha: Number.NaN,
    alphaD: Number.NaN,
    idealTT: Number.NaN,
  };
}
