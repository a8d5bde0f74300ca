/**
 * Transport of water and steam: viscosity IAPWS R12-08, thermal conductivity IAPWS R15-11, surface tension IAPWS R1-76(2014).
 * Kelvin, kg/m³; the caller tests the releases' ranges.
 */
import { conductivity, constants, surfaceTension, type Term, viscosity } from "./records/water.js";

/** Upper limit of both transport releases at the pressures of the industrial formulation, K. */
export const transportLimit = 1173.15;

/** Below this correlation length, nm, the viscosity's enhancement is less than 1e-6. */
const unfelt = 0.1;

/** IAPWS R6-95(2018), used to make cp dimensionless in R15-11. */
const referenceGasConstant = 461.51805;

/** Σ c (1/T̄ − 1)^i (ρ̄ − 1)^j, gathered to one polynomial in the temperature for each power of the density. */
function residualOf(terms: readonly Term[]): (t: number, r: number) => number {
  const powersOfDensity = Math.max(...terms.map((term) => term[1])) + 1;
  const powersOfTemperature = Math.max(...terms.map((term) => term[0])) + 1;
  const table = new Float64Array(powersOfDensity * powersOfTemperature);
  for (const [i, j, value] of terms) table[j * powersOfTemperature + i] = value;
  return (t, r) => {
    let sum = 0;
    for (let j = powersOfDensity - 1; j >= 0; j--) {
      let inner = 0;
      for (let i = powersOfTemperature - 1; i >= 0; i--) inner = inner * t + (table[j * powersOfTemperature + i] as number);
      sum = sum * r + inner;
    }
    return sum;
  };
}

const [h0, h1, h2, h3] = viscosity.dilute;
const [l0, l1, l2, l3, l4] = conductivity.dilute;
const { amplitude, cutoff, gamma, nu, correlationLength, susceptibility, referenceTemperature } = conductivity.critical;
const [limit1, limit2, limit3, limit4] = conductivity.referenceLimits;
const viscosityResidual = residualOf(viscosity.residual);
const conductivityResidual = residualOf(conductivity.residual);

/** Pa·s; R12-08 without its critical enhancement, as the release allows for industrial use. */
export function backgroundViscosity(T: number, density: number): number {
  const t = constants.criticalTemperature / T;
  const r = density / constants.criticalDensity;
  const dilute = 100 / (Math.sqrt(t) * (h0 + t * (h1 + t * (h2 + t * h3))));
  return 1e-6 * dilute * Math.exp(r * viscosityResidual(t - 1, r - 1));
}

/** Factor on the background viscosity, R12-08, equations 16 to 20; ξ in nm. Felt within a few kelvin of the critical point only, 9 % at most. */
export function viscosityEnhancement(xi: number): number {
  const c = xi / 1.9;
  const d = xi / 1.1;
  if (xi <= 0.3817016416) {
    return Math.exp((0.068 / 5) * c * d ** 5 * (1 - c + c * c - (765 / 504) * d * d));
  }
  const psi = Math.acos(1 / Math.sqrt(1 + d * d));
  const w = Math.sqrt(Math.abs((c - 1) / (c + 1))) * Math.tan(psi / 2);
  const L = c > 1 ? Math.log((1 + w) / (1 - w)) : 2 * Math.atan(Math.abs(w));
  const Y =
    Math.sin(3 * psi) / 12 -
    Math.sin(2 * psi) / (4 * c) +
    ((1 - 1.25 * c * c) * Math.sin(psi)) / (c * c) -
    ((1 - 1.5 * c * c) * psi - Math.abs(c * c - 1) ** 1.5 * L) / (c * c * c);
  return Math.exp(0.068 * Y);
}

/** W/(m·K); R15-11 without its critical enhancement. */
export function backgroundConductivity(T: number, density: number): number {
  const t = constants.criticalTemperature / T;
  const r = density / constants.criticalDensity;
  const dilute = 1 / (Math.sqrt(t) * (l0 + t * (l1 + t * (l2 + t * (l3 + t * l4)))));
  return 1e-3 * dilute * Math.exp(r * conductivityResidual(t - 1, r - 1));
}

/** What the critical enhancement needs of the equation of state. */
export interface CriticalInputs {
  readonly cp: number;
  readonly cv: number;
  /** kg/(m³·Pa) */
  readonly compressibility: number;
}

export interface Transport {
  /** Pa·s */
  readonly viscosity: number;
  /** W/(m·K) */
  readonly conductivity: number;
}

/**
 * Viscosity with its critical enhancement, which the release lets industry leave out but which costs nothing here; conductivity as R15-11
 * advises for industry: reference compressibility from its table, background viscosity in the enhancement.
 */
export function transportOf(T: number, density: number, state: CriticalInputs): Transport {
  const background = backgroundViscosity(T, density);
  const xi = correlationLengthOf(T, density, state.compressibility);
  return {
    viscosity: xi < unfelt ? background : background * viscosityEnhancement(xi),
    conductivity: backgroundConductivity(T, density) + criticalConductivity(T, density, state, xi, background),
  };
}

/** W/(m·K); the critical enhancement of R15-11, ξ in nm. */
export function criticalConductivity(T: number, density: number, state: CriticalInputs, xi: number, viscosityHere: number): number {
  const r = density / constants.criticalDensity;
  const y = xi / cutoff;
  if (y < 1.2e-7) return 0;
  const ratio = state.cv / state.cp;
  const crossover = (1 - ratio) * Math.atan(y) + ratio * y - (1 - Math.exp(-1 / (1 / y + (y * y) / (3 * r * r))));
  const cpBar = limited(state.cp / referenceGasConstant);
  const Tbar = T / constants.criticalTemperature;
  return ((1e-3 * amplitude * r * cpBar * Tbar) / (viscosityHere * 1e6)) * (2 / (Math.PI * y)) * crossover;
}

/** nm; the correlation length of density fluctuations, of which both enhancements are made. */
export function correlationLengthOf(T: number, density: number, compressibility: number): number {
  const Tbar = T / constants.criticalTemperature;
  const r = density / constants.criticalDensity;
  const zeta = limited((compressibility * constants.criticalPressure) / constants.criticalDensity);
  const excess = r * (zeta - (referenceCompressibility(r) * referenceTemperature) / Tbar);
  return excess > 0 ? correlationLength * (excess / susceptibility) ** (nu / gamma) : 0;
}

/** R15-11: a slope that is negative or beyond 1e13, as the critical point may yield, counts as 1e13. */
function limited(value: number): number {
  return value >= 0 && value <= 1e13 ? value : 1e13;
}

function referenceCompressibility(r: number): number {
  const at = r <= limit1 ? 0 : r <= limit2 ? 1 : r <= limit3 ? 2 : r <= limit4 ? 3 : 4;
  const row = conductivity.referencePolynomials[at] as readonly number[];
  let sum = 0;
  for (let k = row.length - 1; k >= 0; k--) sum = sum * r + (row[k] as number);
  return 1 / sum;
}

/** N/m, up to the critical temperature. */
export function surfaceTensionOf(T: number): number {
  const tau = 1 - T / constants.criticalTemperature;
  return tau <= 0 ? 0 : surfaceTension.amplitude * tau ** surfaceTension.exponent * (1 + surfaceTension.correction * tau);
}
