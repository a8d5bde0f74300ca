/** Predictive viscosity of Chung, Ajlan, Lee & Starling 1988 for fluids without a correlation of their own. */
import { neufeldIntegral, type Substance, type Viscosity } from "./transport.js";

export interface Chung {
  readonly form: "Chung";
  /** Critical point: K, mol/m³ */
  readonly T: number;
  readonly rho: number;
  readonly acentric: number;
  /** debye */
  readonly dipole: number;
  readonly molarMass: number;
}

/** E_i = a0 + a1 ω + a2 μr⁴, the table of the paper. */
const table: readonly (readonly [number, number, number])[] = [
  [6.32402, 50.4119, -51.6801],
  [0.0012102, -0.0011536, -0.0062571],
  [5.28346, 254.209, -168.481],
  [6.62263, 38.0957, -8.46414],
  [19.7454, 7.63034, -14.3544],
  [-1.89992, -12.5367, 4.98529],
  [24.2745, 3.44945, -11.2913],
  [0.79716, 1.11764, 0.012348],
  [-0.23816, 0.067695, -0.8163],
  [0.068629, 0.34793, 0.59256],
];

const poise = 0.1;

export function chung(record: Chung, _substance: Substance): Viscosity {
  /** cm³/mol */
  const volume = 1e6 / record.rho;
  const mass = 1000 * record.molarMass;
  const polar = (131.3 * record.dipole) / Math.sqrt(volume * record.T);
  const [e1, e2, e3, e4, e5, e6, e7, e8, e9, e10] = table.map(([a0, a1, a2]) => a0 + a1 * record.acentric + a2 * polar ** 4) as [
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
  const shape = 1 - 0.2756 * record.acentric + 0.059035 * polar ** 4;
  const epsilon = record.T / 1.2593;
  const area = Math.cbrt(volume * volume);
  const dilute = (T: number): number => {
    const Tstar = T / epsilon;
    const integral = neufeldIntegral(Tstar) - 6.435e-4 * Tstar ** 0.14874 * Math.sin(18.0323 * Tstar ** -0.7683 - 7.27371);
    return (poise * 4.0785e-5 * Math.sqrt(mass * T) * shape) / (area * integral);
  };
  return {
    dilute,
    excess({ T, rho }) {
      if (rho === 0) return 0;
      const Y = (rho * 1e-6 * volume) / 6;
      const Tstar = T / epsilon;
      const G1 = (1 - 0.5 * Y) / (1 - Y) ** 3;
      const G2 = ((e1 * (1 - Math.exp(-e4 * Y))) / Y + e2 * G1 * Math.exp(e5 * Y) + e3 * G1) / (e1 * e4 + e2 + e3);
      const kinetic = dilute(T) * (1 / G2 + e6 * Y - 1);
      const collisional =
        ((poise * 36.344e-6 * Math.sqrt(mass * record.T)) / area) * e7 * Y * Y * G2 * Math.exp(e8 + e9 / Tstar + e10 / (Tstar * Tstar));
      return kinetic + collisional;
    },
  };
}
