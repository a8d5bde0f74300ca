/**
 * Viscosity from published correlations: dilute gas + first density correction + dense term, each in the shapes that the papers use.
 * Temperatures in K, density in mol/m³ unless a record says kg/m³, viscosity in Pa·s.
 */
import { type CorrespondingViscosity, correspondingViscosity, type Relation } from "./corresponding-states.js";
import { type FrictionTheory, frictionTheory } from "./friction-theory.js";
import { dampedSum, powerSum, powerSum2 } from "./power-sum.js";
import { avogadro, kineticViscosity, type Substance, type Viscosity } from "./transport.js";
import { type Chung, chung } from "./viscosity-chung.js";
import { type NamedViscosity, namedViscosity } from "./viscosity-named.js";
import { type ScaledDense, scaledDense } from "./viscosity-scaled.js";

type Rows2 = readonly (readonly [a: number, t: number])[];

export interface LennardJones {
  /** K */
  readonly epsilon: number;
  /** m */
  readonly sigma: number;
}

export type DiluteViscosity =
  /** C √(1000 M T)/((1e9 σ)² exp(Σ a (ln T*)^t)) */
  | { readonly form: "collision integral"; readonly C: number; readonly M: number; readonly a: Rows2 }
  /** C √T/Σ a (T/Tr)^t */
  | { readonly form: "inverse collision integral"; readonly C: number; readonly T: number; readonly a: Rows2 }
  /** Chapman–Enskog with the integral of Neufeld et al. */
  | { readonly form: "kinetic theory" }
  /** Σ a (T/Tr)^t over Σ b (T/Tr)^t */
  | { readonly form: "ratio"; readonly T: number; readonly a: Rows2; readonly b: Rows2 }
  /** A exp(Σ a ln(T/Tr)^i), i from 1 */
  | { readonly form: "log polynomial"; readonly T: number; readonly A: number; readonly a: readonly number[] }
  /** A √T* Σ C (T*)^(i/3 − 1), i from 0, T* = T/ε */
  | { readonly form: "cube roots"; readonly epsilon: number; readonly A: number; readonly C: readonly number[] }
  /** A √T/exp(a + b/T + c/T²) */
  | { readonly form: "root over exponential"; readonly A: number; readonly a: number; readonly b: number; readonly c: number }
  /** A √T/(a0 + a1 T^(1/6) + a2 exp(a3 T^(1/3)) + (a4 + a5 T^(1/3))/exp(T^(1/3)) + a6 √T), Laesecke & Muzny 2017 */
  | { readonly form: "sixth roots"; readonly A: number; readonly a: readonly [number, number, number, number, number, number, number] };

export type FirstDensity =
  /** η0 ρ N_A σ³ Σ b T*^t (Rainwater–Friend theory); its own ε and σ where they differ from the dilute gas's */
  | { readonly form: "Rainwater-Friend"; readonly b: Rows2; readonly lennardJones?: LennardJones }
  /** ρ Σ n T^−t */
  | { readonly form: "direct"; readonly n: Rows2 };

export type DenseViscosity =
  | Batschinski
  | FrictionTheory
  | ScaledDense
  /** A Σ g δ^r τ^s/(1 + Σ h δ^r τ^s) */
  | { readonly form: "ratio"; readonly T: number; readonly rho: number; readonly A: number; readonly g: Rows3; readonly h: Rows3 }
  /** c0 δ² exp(c1 Tr + c2/Tr + c3 δ²/(c4 + Tr) + c5 δ⁶), density in kg/m³ */
  | {
      readonly form: "symbolic";
      readonly T: number;
      readonly density: number;
      readonly c: readonly [number, number, number, number, number, number];
    }
  /** ηt (c1 Tr δ³ + (δ² + δ^γ)/(Tr − c2)), ηt = ρt^(2/3) √(R Tt)/(M^(1/6) N_A^(1/3)), Laesecke & Muzny 2017; density in kg/m³ */
  | {
      readonly form: "triple point";
      readonly T: number;
      readonly density: number;
      readonly c1: number;
      readonly c2: number;
      readonly gamma: number;
    };

type Rows3 = readonly (readonly [g: number, r: number, s: number])[];

/** Modified Batschinski–Hildebrand: Σ a δ^d τ^t exp(γ δ^l) + Σ f δ^d τ^t (1/(δ0 − δ) − 1/δ0), δ0 = Σ g τ^h/Σ p τ^q. */
export interface Batschinski {
  readonly form: "Batschinski";
  readonly T: number;
  readonly rho: number;
  /** a, t, d, γ, l; the last two left out where there is no exponential */
  readonly a: readonly (readonly [a: number, t: number, d: number, gamma?: number, l?: number])[];
  readonly f?: readonly (readonly [f: number, t: number, d: number])[];
  readonly g?: Rows2;
  readonly p?: Rows2;
}

export type ViscosityRecord =
  | {
      readonly form: "sum";
      readonly lennardJones?: LennardJones;
      readonly dilute: DiluteViscosity;
      readonly first?: FirstDensity;
      readonly dense?: DenseViscosity;
    }
  | CorrespondingViscosity
  | Chung
  | NamedViscosity;

/** `relate` gives a reference fluid and the way to its conformal states to the corresponding-states method. */
export function viscosityOf(record: ViscosityRecord, substance: Substance, relate: (reference: string) => Relation): Viscosity {
  switch (record.form) {
    case "corresponding states":
      return correspondingViscosity(record, substance, relate(record.reference));
    case "Chung":
      return chung(record, substance);
    case "named":
      return namedViscosity(record, substance);
    case "sum":
      return sumOf(record, substance);
  }
}

function sumOf(record: Extract<ViscosityRecord, { form: "sum" }>, substance: Substance): Viscosity {
  const dilute = diluteOf(record.dilute, record.lennardJones, substance);
  const first = record.first ? firstOf(record.first, record.lennardJones) : undefined;
  const dense = record.dense ? denseOf(record.dense, substance) : undefined;
  return {
    dilute,
    excess(state) {
      const correction = first ? first(state.T, state.rho, dilute) : 0;
      return dense ? correction + dense(state) : correction;
    },
  };
}

function given(lennardJones: LennardJones | undefined): LennardJones {
  if (!lennardJones) throw new Error("a record of viscosity lacks its Lennard-Jones pair");
  return lennardJones;
}

function diluteOf(record: DiluteViscosity, pair: LennardJones | undefined, substance: Substance): (T: number) => number {
  switch (record.form) {
    case "collision integral": {
      const { epsilon, sigma } = given(pair);
      const factor = (record.C * Math.sqrt(1000 * record.M)) / (1e18 * sigma * sigma);
      const logIntegral = powerSum(record.a);
      return (T) => (factor * Math.sqrt(T)) / Math.exp(logIntegral(Math.log(T / epsilon)));
    }
    case "inverse collision integral": {
      const below = powerSum(record.a);
      return (T) => (record.C * Math.sqrt(T)) / below(T / record.T);
    }
    case "kinetic theory": {
      const { epsilon, sigma } = given(pair);
      return (T) => kineticViscosity(T, substance.molarMass, epsilon, sigma);
    }
    case "ratio": {
      const above = powerSum(record.a);
      const below = powerSum(record.b);
      return (T) => above(T / record.T) / below(T / record.T);
    }
    case "log polynomial":
      return (T) => logPolynomial(record, T);
    case "cube roots":
      return (T) => {
        const root = Math.cbrt(T / record.epsilon);
        let sum = 0;
        for (let i = record.C.length - 1; i >= 0; i--) sum = sum * root + (record.C[i] as number);
        return (record.A * Math.sqrt(T / record.epsilon) * sum) / (T / record.epsilon);
      };
    case "root over exponential":
      return (T) => (record.A * Math.sqrt(T)) / Math.exp(record.a + record.b / T + record.c / (T * T));
    case "sixth roots": {
      const [a0, a1, a2, a3, a4, a5, a6] = record.a;
      return (T) => {
        const cube = Math.cbrt(T);
        const root = Math.sqrt(T);
        const below = a0 + a1 * Math.sqrt(cube) + a2 * Math.exp(a3 * cube) + (a4 + a5 * cube) / Math.exp(cube) + a6 * root;
        return (record.A * root) / below;
      };
    }
  }
}

/** A exp(Σ a ln(T/Tr)^i), i from 1; conductivities of dilute gases come in the same shape. */
export function logPolynomial(record: { readonly T: number; readonly A: number; readonly a: readonly number[] }, T: number): number {
  const x = Math.log(T / record.T);
  let sum = 0;
  for (let i = record.a.length - 1; i >= 0; i--) sum = (sum + (record.a[i] as number)) * x;
  return record.A * Math.exp(sum);
}

function firstOf(record: FirstDensity, pair: LennardJones | undefined) {
  if (record.form === "direct") {
    const sum = powerSum(record.n);
    return (T: number, rho: number): number => rho * sum(1 / T);
  }
  const sum = powerSum(record.b);
  const { epsilon, sigma } = given(record.lennardJones ?? pair);
  const volume = avogadro * sigma ** 3;
  return (T: number, rho: number, dilute: (T: number) => number): number => dilute(T) * rho * volume * sum(T / epsilon);
}

function denseOf(record: DenseViscosity, substance: Substance): Viscosity["excess"] {
  switch (record.form) {
    case "Batschinski":
      return batschinski(record);
    case "friction theory":
      return frictionTheory(record, substance);
    case "scaled":
      return scaledDense(record, substance);
    case "ratio":
      return ratioOf(record);
    case "symbolic": {
      const [c0, c1, c2, c3, c4, c5] = record.c;
      return ({ T, rho }) => {
        const square = ((rho * substance.molarMass) / record.density) ** 2;
        const Tr = T / record.T;
        return c0 * square * Math.exp(c1 * Tr + c2 / Tr + (c3 * square) / (c4 + Tr) + c5 * square * square * square);
      };
    }
    case "triple point": {
      const { molarMass, gasConstant } = substance;
      const scale = (record.density ** (2 / 3) * Math.sqrt(gasConstant * record.T)) / (molarMass ** (1 / 6) * Math.cbrt(avogadro));
      return ({ T, rho }) => {
        const Tr = T / record.T;
        const delta = (rho * molarMass) / record.density;
        return scale * (record.c1 * Tr * delta ** 3 + (delta * delta + delta ** record.gamma) / (Tr - record.c2));
      };
    }
  }
}

/** Rows as the paper has them, density before temperature, turned for the sum. */
function turned(rows: Rows3): readonly (readonly [number, number, number])[] {
  return rows.map(([g, r, s]) => [g, s, r] as const);
}

function ratioOf(record: Extract<DenseViscosity, { form: "ratio" }>): Viscosity["excess"] {
  const above = powerSum2(turned(record.g));
  const below = powerSum2(turned(record.h));
  return ({ T, rho }) => {
    const delta = rho / record.rho;
    const tau = record.T / T;
    return (record.A * above(tau, delta)) / (1 + below(tau, delta));
  };
}

function batschinski(record: Batschinski): Viscosity["excess"] {
  const terms = dampedSum(record.a.map(([a, t, d, gamma = 0, l = 0]) => [a, t, d, gamma, l] as const));
  const free = record.f && record.g && record.p ? freeVolume(record.f, record.g, record.p) : undefined;
  return ({ T, rho }) => {
    const delta = rho / record.rho;
    const tau = record.T / T;
    return free ? terms(tau, delta) + free(tau, delta) : terms(tau, delta);
  };
}

/** Σ f δ^d τ^t (1/(δ0 − δ) − 1/δ0). */
function freeVolume(f: Rows3, g: Rows2, p: Rows2) {
  const front = powerSum2(f);
  const above = powerSum(g);
  const below = powerSum(p);
  return (tau: number, delta: number): number => {
    const packed = above(tau) / below(tau);
    // Past the packed density the term means nothing.
    if (delta >= packed) return Number.NaN;
    return front(tau, delta) * (1 / (packed - delta) - 1 / packed);
  };
}
