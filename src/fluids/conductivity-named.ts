/** Conductivity correlations of a shape that one paper has for one fluid. */
import type { ConductivityParts } from "./conductivity.js";
import { powerSum, powerSum2 } from "./power-sum.js";
import type { Conductivity, Substance, TransportState } from "./transport.js";
import { type ResidualConcentration, residualConcentration } from "./viscosity-named.js";

type Numbers = readonly number[];
type Rows3 = readonly (readonly [g: number, r: number, s: number])[];

export type ConductivityNamed = { readonly form: "named" } & (
  | HeliumConductivity
  | HeavyWaterConductivity
  | R23Conductivity
  | MethaneConductivity
);

/** Hands & Arp 1981, with its critical term between 3.5 and 12 K. */
interface HeliumConductivity {
  readonly name: "helium";
  readonly s: readonly [number, number, number, number];
  readonly c: Numbers;
}

/** IAPWS 2007. */
interface HeavyWaterConductivity {
  readonly name: "heavy water";
  readonly T: number;
  readonly density: number;
  readonly conductivity: number;
  readonly A: readonly (readonly [number, number])[];
  readonly Be: number;
  readonly B: readonly [number, number, number, number, number];
  readonly C1: number;
  readonly C2: number;
  readonly CT1: number;
  readonly CT2: number;
  readonly CR1: number;
  readonly CR2: number;
  readonly CR3: number;
  readonly rhor1: number;
  readonly D1: number;
}

/** Shan, Penoncello & Jacobsen 2000, as the viscosity; mW/(m·K) with dilute B1 + B2 T. */
interface R23Conductivity extends ResidualConcentration {
  readonly name: "R23";
  readonly B1: number;
  readonly B2: number;
}

/** Friend, Ely & Ingham 1989, with that paper's own viscosity inside. */
interface MethaneConductivity {
  readonly name: "methane";
  readonly C: Numbers;
  /** g, r, s of the numerator and of the denominator of the dense viscosity */
  readonly over: Rows3;
  readonly under: Rows3;
  /** j, r, s of the dense conductivity, and the last coefficient */
  readonly j: Rows3;
  readonly j6: number;
}

export function namedConductivity(record: ConductivityNamed, parts: ConductivityParts): Conductivity {
  switch (record.name) {
    case "helium":
      return helium(record, parts.substance);
    case "heavy water":
      return heavyWater(record, parts.substance);
    case "R23":
      return (state) => 1e-3 * residualConcentration(record, (T) => record.B1 + record.B2 * T, state);
    case "methane":
      return methane(record, parts);
  }
}

function helium({ s, c }: HeliumConductivity, { molarMass }: Substance): Conductivity {
  const [c0, c1, c2, c3, c4, c5, c6, c7, c8, c9, c10] = c as readonly [
    number,
    number,
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
  return (state, viscosity) => {
    const { T } = state;
    const r = state.rho * molarMass;
    const x = 1 / T;
    const root = Math.cbrt(T);
    const square = root * root;
    const dilute = 2.7870034e-3 * T ** 0.7034007057 * Math.exp(x * (s[0] + x * (s[1] + x * (s[2] + x * s[3]))));
    if (r === 0) return dilute;
    return (
      dilute +
      (c0 + c1 * T + c2 * root + c3 * square) * r +
      (c4 + c5 * root + c6 * square) * r ** 3 +
      (c7 + c8 * root + c9 * square + c10 / T) * r * r * Math.log(r / 68) +
      (T > 3.5 && T < 12 ? heliumCritical(state, r, viscosity) : 0)
    );
  };
}

/**
 * The critical term with the scaled equation of state of its paper near the critical point (all constants of helium-4). The factor in front is the one
 * in common use, which differs from the printed one.
 */
function heliumCritical({ T, rho, pRho, pT }: TransportState, r: number, viscosity: number): number {
  const x0 = 0.392;
  const E1 = 2.8461;
  const E2 = 0.27156;
  const beta = 0.3554;
  const gamma = 1.1743;
  const delta = 4.304;
  const rhoc = 69.158;
  const Tc = 5.18992;
  const pc = 2.2746e5;
  const awayT = Math.abs(1 - T / Tc);
  const awayRho = Math.max(Math.abs(1 - r / rhoc), 1e-9);
  const plain = 1 / (rho * pRho);
  const weight = (awayT / 0.2) ** 2 + (awayRho / 0.25) ** 2;
  let compressibility = plain;
  if (weight <= 1) {
    const x = (awayT / awayRho) ** (1 / beta);
    const grown = 1 + x / x0;
    const inner = 1 + E2 * grown ** (2 / beta);
    const power = (gamma - 1) / (2 * beta);
    const h = E1 * grown * inner ** power;
    const slope = (E1 / x0) * (inner ** power + (((gamma - 1) * E2) / (beta * beta)) * grown ** (2 / beta) * inner ** (power - 1));
    const scaled = awayRho ** (delta - 1) * (delta * h - (x / beta) * slope);
    if (scaled > 0) compressibility = weight * plain + (1 - weight) / (scaled * (r / rhoc) ** 2 * pc);
  }
  const front = 3.4685233e-17 * 3.726229668;
  const decay = Math.exp(-18.66 * awayT * awayT - 4.25 * awayRho ** 4);
  return ((front * Math.sqrt(compressibility) * T * T * pT * pT) / (r * viscosity)) * decay;
}

function heavyWater(record: HeavyWaterConductivity, { molarMass }: Substance): Conductivity {
  const { Be, B, C1, C2, CT1, CT2, CR1, CR2, CR3, rhor1, D1 } = record;
  const dilute = powerSum(record.A);
  return ({ T, rho }) => {
    const t = T / record.T;
    const r = (rho * molarMass) / record.density;
    const background = dilute(t) - B[0] * Math.expm1(Be * r) + r * (B[1] + r * (B[2] + r * (B[3] + r * B[4])));
    const f1 = Math.exp(t * (CT1 + CT2 * t));
    const f2 = Math.exp(CR1 * (r - 1) ** 2) + CR2 * Math.exp(CR3 * (r - rhor1) ** 2);
    const ta = t / (Math.abs(t - 1.1) + 1.1);
    const f3 = 1 + Math.exp(60 * (ta - 1) + 20);
    const f4 = 1 + Math.exp(100 * (ta - 1) + 15);
    const critical = C1 * f1 * f2 * (1 + f2 * f2 * ((C2 * f1 ** 4) / f3 + (3.5 * f2) / f4));
    const rest = -D1 * f1 ** 1.2 * Math.expm1(-((r / 2.5) ** 10));
    return record.conductivity * (background + critical + rest);
  };
}

const methaneT = 190.55;
const methaneRho = 10139;

function methane(record: MethaneConductivity, { vapourDensity, substance, equation }: ConductivityParts): Conductivity {
  const own = equation();
  const over = powerSum2(turned(record.over));
  const under = powerSum2(turned(record.under));
  const thick = powerSum2(turned(record.j));
  return ({ T, rho, idealTT }) => {
    const d = rho / methaneRho;
    const t = methaneT / T;
    const x = T / 174;
    const root = Math.cbrt(x);
    let dilute = 0;
    for (let i = record.C.length - 1; i >= 0; i--) dilute = dilute * root + (record.C[i] as number);
    const eta0 = (10.5 * Math.sqrt(x) * dilute) / x;
    const eta = eta0 + (12.149 * over(t, d)) / (1 + under(t, d));
    const free = 1.45885 - 0.4377162 / x;
    const k0 = 0.51828 * eta0 * (3.75 - free * (idealTT + 1.5));
    const thinner = T < methaneT && rho < methaneRho ? vapourDensity(T) / methaneRho : 1;
    const dense = 6.29638 * (thick(t, d) + (record.j6 * d * d) / thinner);
    return 1e-3 * (k0 + dense + criticalOf(T, rho, d, t, eta));
  };

  function criticalOf(T: number, rho: number, d: number, t: number, eta: number): number {
    const r = own.residual(substance.reducing.T / T, rho / substance.reducing.rho);
    const slope = 1 + 2 * r.d + r.dd;
    const susceptibility = (0.28631 * d * t) / Math.max(slope, 1e-3);
    const away = 1 - 1 / t;
    const F = Math.exp(-2.646 * Math.sqrt(Math.abs(away)) - 2.678 * (1 - d) ** 2 + 0.637 * (1 - d));
    return (91.855 / (eta * t * t)) * (1 + r.d - r.dt) ** 2 * susceptibility ** 0.4681 * F;
  }
}

/** Rows as the paper has them, density before temperature, turned for the sum. */
function turned(rows: Rows3): readonly (readonly [number, number, number])[] {
  return rows.map(([g, r, s]) => [g, s, r] as const);
}
