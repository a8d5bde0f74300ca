/** Rise of conductivity near the critical point. */
import type { Helmholtz } from "./helmholtz.js";
import { boltzmann, type Conductivity, type Substance } from "./transport.js";

/** The simplified crossover model of Olchowy & Sengers 1989 and what some papers use in its place. */
export type CriticalEnhancement =
  | {
      readonly form: "Olchowy-Sengers";
      readonly R0?: number;
      readonly gamma?: number;
      readonly nu?: number;
      readonly Gamma?: number;
      /** m */
      readonly zeta0?: number;
      /** 1/m */
      readonly qD?: number;
      /** K; 1.5 times the reducing temperature where left out */
      readonly T?: number;
    }
  /** A exp(b (τ − 1)⁴ + c (δ − 1)²), Laesecke, Perkins & Howley 1996 */
  | { readonly form: "bell"; readonly A: number; readonly b: number; readonly c: number }
  /** Tufeu, Ivanov, Garrabos & Le Neindre 1984, ammonia only; numbers of the paper stand in the evaluator */
  | { readonly form: "Tufeu" };

/** `equation` is an evaluator of the fluid's own that only this term uses: its temperature never changes. */
export function criticalEnhancement(record: CriticalEnhancement, substance: Substance, equation: Helmholtz): Conductivity {
  switch (record.form) {
    case "Olchowy-Sengers":
      return olchowySengers(record, substance, equation);
    case "bell":
      return ({ T, rho }) =>
        record.A * Math.exp(record.b * (substance.reducing.T / T - 1) ** 4 + record.c * (rho / substance.reducing.rho - 1) ** 2);
    case "Tufeu":
      return tufeu(substance);
  }
}

function olchowySengers(
  record: Extract<CriticalEnhancement, { form: "Olchowy-Sengers" }>,
  substance: Substance,
  equation: Helmholtz,
): Conductivity {
  const { reducing, gasConstant } = substance;
  const { R0 = 1.03, gamma = 1.239, nu = 0.63, Gamma = 0.0496, zeta0 = 1.94e-10, qD = 2e9 } = record;
  const far = record.T ?? 1.5 * reducing.T;
  const farTau = reducing.T / far;
  const scale = reducing.p / (reducing.rho * reducing.rho);
  return ({ T, rho, pRho, cp, cv }, viscosity) => {
    const part = equation.pressurePart(farTau, rho / reducing.rho);
    const farSlope = gasConstant * far * (1 + 2 * part.d + part.dd);
    const susceptibility = scale * rho * (1 / pRho - far / (T * farSlope));
    if (!(susceptibility > 0)) return 0;
    const length = zeta0 * (susceptibility / Gamma) ** (nu / gamma);
    const x = qD * length;
    const share = cv / cp;
    const whole = (2 / Math.PI) * ((1 - share) * Math.atan(x) + share * x);
    const background = (2 / Math.PI) * -Math.expm1(-1 / (1 / x + ((x * reducing.rho) / rho) ** 2 / 3));
    return ((rho * cp * R0 * boltzmann * T) / (6 * Math.PI * viscosity * length)) * (whole - background);
  };
}

function tufeu({ molarMass }: Substance): Conductivity {
  const Tc = 405.4;
  const rhoc = 235;
  return ({ T, rho }) => {
    const density = rho * molarMass;
    const t = Math.max(Math.abs((T - Tc) / Tc), 1e-6);
    const eta = (2.6 + 1.6 * t) * 1e-5;
    const dpdT = (2.18 - 0.12 / Math.exp(17.8 * t)) * 1e5;
    const X = 0.61 * rhoc + 16.5 * Math.log(t);
    const diffusing = (1.2 * 1.3806504e-23 * T * T) / (6 * Math.PI * eta * 1.34e-10 * t ** -0.63 * (1 + Math.sqrt(t)));
    const onLine = diffusing * dpdT * dpdT * 0.423e-8 * t ** -1.24 * (1 + Math.sqrt(t) / 0.7);
    const damped = onLine * Math.exp(-36 * t * t);
    const side = 0.6 * rhoc;
    const away = Math.max(density, side) - 0.96 * rhoc;
    const bell = (damped * X * X) / (X * X + away * away);
    return density < side ? bell * (density / side) ** 2 : bell;
  };
}
