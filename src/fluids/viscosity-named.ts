/** Viscosity correlations of a shape that one paper has for one fluid. */
import { powerSum } from "./power-sum.js";
import { avogadro, neufeldIntegral, type Substance, type TransportState, type Viscosity } from "./transport.js";

type Numbers = readonly number[];

export type NamedViscosity = { readonly form: "named" } & (HeliumViscosity | HeavyWaterViscosity | R23Viscosity | MethanolViscosity);

/** Arp, McCarty & Friend 1998: polynomials of ln T with density in g/cm³ inside an exponential; a second part above 100 K. */
interface HeliumViscosity {
  readonly name: "helium";
  readonly B: Numbers;
  readonly C: Numbers;
  readonly D: Numbers;
  readonly O: Numbers;
}

/** IAPWS 2007: μ/μ* = √T̄/Σ A T̄^−i · exp(ρ̄ Σ B (1/T̄ − 1)^I (ρ̄ − 1)^J). */
interface HeavyWaterViscosity {
  readonly name: "heavy water";
  readonly T: number;
  /** kg/m³ */
  readonly density: number;
  readonly viscosity: number;
  readonly A: Numbers;
  /** B, I, J */
  readonly B: readonly (readonly [B: number, I: number, J: number])[];
}

/** Shan, Penoncello & Jacobsen 2000: residual concentration model, densities in mol/L, result in µPa·s. */
interface R23Viscosity extends ResidualConcentration {
  readonly name: "R23";
  /** g/mol */
  readonly M: number;
  readonly a: Numbers;
  readonly epsilon: number;
  /** nm */
  readonly sigma: number;
}

export interface ResidualConcentration {
  readonly C1: number;
  readonly C2: number;
  /** J/mol */
  readonly dG: number;
  /** mol/L */
  readonly rhoL: number;
  readonly rhoc: number;
  readonly Tc: number;
  readonly max: number;
  readonly R: number;
}

/** Xiang, Laesecke & Huber 2006: Stockmayer gas and its virials blended into an Enskog-type dense term. */
interface MethanolViscosity {
  readonly name: "methanol";
  readonly epsilon: number;
  readonly sigma: number;
  readonly dipole: number;
  /** g/mol */
  readonly M: number;
  readonly T: number;
  /** kg/m³ */
  readonly density: number;
  readonly prefactor: number;
  readonly sigmaDense: number;
  readonly b: readonly (readonly [b: number, t: number])[];
  readonly c: readonly [number, number];
  /** The last seven of the collision integral */
  readonly a: readonly [number, number, number, number, number, number, number];
  readonly d: Numbers;
  readonly e: Numbers;
}

export function namedViscosity(record: NamedViscosity, substance: Substance): Viscosity {
  switch (record.name) {
    case "helium":
      return helium(record, substance);
    case "heavy water":
      return heavyWater(record, substance);
    case "R23":
      return r23(record);
    case "methanol":
      return methanol(record, substance);
  }
}

function helium({ B, C, D, O }: HeliumViscosity, { molarMass }: Substance): Viscosity {
  const series = (v: Numbers, x: number): number =>
    (v[0] as number) / x + (v[1] as number) + x * ((v[2] as number) + x * ((v[3] as number) + x * (v[4] as number)));
  const total = (T: number, rho: number): number => {
    const x = Math.log(Math.min(T, 300));
    const r = (rho * molarMass) / 1000;
    const excess = r * (series(B, x) + r * (series(C, x) + r * series(D, x)));
    const start = series(O, x);
    const cold = Math.exp(start + excess);
    if (T <= 100) return 1e-7 * cold;
    const warm = 196 * T ** 0.71938 * Math.exp(12.451 / T - 295.67 / (T * T) - 4.1249);
    return 1e-7 * (cold + warm - Math.exp(start));
  };
  const dilute = (T: number): number => total(T, 0);
  return { dilute, excess: ({ T, rho }) => total(T, rho) - dilute(T) };
}

function heavyWater(record: HeavyWaterViscosity, { molarMass }: Substance): Viscosity {
  const dilute = (T: number): number => {
    const Tb = T / record.T;
    const below = record.A.reduce((sum, a, i) => sum + a / Tb ** i, 0);
    return (record.viscosity * Math.sqrt(Tb)) / below;
  };
  // Rows turned into powers of the two differences, which may be negative.
  const terms = record.B.map(([B, I, J]) => ({ B, I, J }));
  const xs = new Float64Array(1 + Math.max(...terms.map(({ I }) => I)));
  const ys = new Float64Array(1 + Math.max(...terms.map(({ J }) => J)));
  return {
    dilute,
    excess({ T, rho }) {
      const rb = (rho * molarMass) / record.density;
      const x = record.T / T - 1;
      const y = rb - 1;
      fillPowers(xs, x);
      fillPowers(ys, y);
      let sum = 0;
      for (const { B, I, J } of terms) sum += B * (xs[I] as number) * (ys[J] as number);
      return dilute(T) * Math.expm1(rb * sum);
    },
  };
}

function fillPowers(powers: Float64Array, x: number): void {
  powers[0] = 1;
  for (let k = 1; k < powers.length; k++) powers[k] = (powers[k - 1] as number) * x;
}

/** The dilute value and the liquid's value joined over concentration, with a bell at the critical point; in the units of the record. */
export function residualConcentration(record: ResidualConcentration, dilute: (T: number) => number, { T, rho }: TransportState): number {
  const { C1, C2, dG, rhoL, rhoc, Tc, max, R } = record;
  const r = rho / 1000;
  const left = rhoL - r;
  const liquid = ((C2 * rhoL * rhoL) / left) * Math.sqrt(T) * Math.exp(((r / left) * dG) / (R * T));
  const bell = max / (Math.cosh(r - rhoc) * Math.cosh(T - Tc));
  return (left / rhoL) ** C1 * dilute(T) + (r / rhoL) ** C1 * liquid + bell;
}

function r23(record: R23Viscosity): Viscosity {
  const dilute = (T: number): number => {
    const x = Math.log(T / record.epsilon);
    const integral = Math.exp(record.a.reduce((sum, a, i) => sum + a * x ** i, 0));
    return (1.25 * 0.021357 * Math.sqrt(record.M * T)) / (record.sigma * record.sigma * integral);
  };
  return {
    dilute: (T) => 1e-6 * dilute(T),
    excess: (state) => 1e-6 * (residualConcentration(record, dilute, state) - dilute(state.T)),
  };
}

function methanol(record: MethanolViscosity, { molarMass }: Substance): Viscosity {
  const { a, c, d, e, b } = record;
  const dipole = record.dipole * record.dipole;
  const volume = avogadro * record.sigma ** 3;
  const virial = powerSum(b);
  const dilute = (T: number): number => {
    const Ts = T / record.epsilon;
    const polar = a[1] * Ts ** a[2] + a[3] * Math.exp(a[4] * Ts) + a[5] * Math.exp(a[6] * Ts);
    const integral = neufeldIntegral(Ts) * (1 + (dipole / (1 + a[0] * dipole ** 3)) * polar);
    return (record.prefactor * Math.sqrt(record.M * T)) / (record.sigma * record.sigma * integral);
  };
  return {
    dilute,
    excess({ T, rho }) {
      const Ts = T / record.epsilon;
      const Tr = T / record.T;
      const rr = (rho * molarMass) / record.density;
      const second = volume * virial(Ts);
      const third = volume * volume * c[0] * Ts ** 3 * Math.exp(c[1] / Math.sqrt(Ts));
      let size = 0;
      for (let i = d.length - 1; i >= 0; i--) size = size / Tr + (d[i] as number);
      let grown = 0;
      for (let j = e.length - 1; j >= 0; j--) grown = (grown + (e[j] as number)) * rr;
      const sigma = record.sigmaDense * (size + grown);
      const packed = ((2 * Math.PI * avogadro) / 3) * sigma ** 3 * rho;
      const z = packed / 4;
      const g = (1 - z / 2) / (1 - z) ** 3;
      const thin = 1 / (1 + Math.exp(5 * (rr - 1)));
      const ratio = thin * (1 + rho * (second + third * rho)) + (1 - thin) * (1 / g + 0.8 * packed + 0.761 * g * packed * packed);
      return dilute(T) * (ratio - 1);
    },
  };
}
