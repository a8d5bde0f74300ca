/** What transport equations are told of a state, and the constants they share. */

/** A single-phase state in molar units; made once for a state and shared by viscosity and conductivity. */
export interface TransportState {
  /** K */
  T: number;
  /** mol/m³ */
  rho: number;
  /** Pa */
  p: number;
  /** (∂p/∂T) at constant density, Pa/K */
  pT: number;
  /** (∂p/∂ρ) at constant temperature, Pa·m³/mol */
  pRho: number;
  /** J/(mol·K) */
  cp: number;
  /** J/(mol·K) */
  cv: number;
  /** Residual Helmholtz energy α and δα_δ */
  alpha: number;
  alphaD: number;
  /** τ²α0_ττ of the ideal gas: cp0 = R (1 − τ²α0_ττ) */
  idealTT: number;
}

/** What the equations need of the fluid itself. */
export interface Substance {
  /** kg/mol */
  readonly molarMass: number;
  /** J/(mol·K), as the equation of state has it */
  readonly gasConstant: number;
  /** Reducing point of the equation of state: K, Pa, mol/m³ */
  readonly reducing: { readonly T: number; readonly p: number; readonly rho: number };
}

/** Viscosity of a fluid as the dilute gas and all that density adds. */
export interface Viscosity {
  /** Pa·s at zero density */
  dilute(T: number): number;
  /** Pa·s above the dilute gas */
  excess(state: TransportState): number;
}

/** W/(m·K), the viscosity (Pa·s) of the same state given. */
export type Conductivity = (state: TransportState, viscosity: number) => number;

/** 1/mol */
export const avogadro = 6.02214129e23;
/** J/K, CODATA 2010, the one that the reference values of the critical enhancement here were made with. */
export const boltzmann = 1.3806488e-23;

/** Ω(2,2)* of the Lennard-Jones 12-6 gas after Neufeld, Janzen & Aziz 1972, without the sine term. */
export function neufeldIntegral(Tstar: number): number {
  return 1.16145 * Tstar ** -0.14874 + 0.52487 * Math.exp(-0.7732 * Tstar) + 2.16178 * Math.exp(-2.43787 * Tstar);
}

/** Chapman–Enskog viscosity of a Lennard-Jones gas, Pa·s; molar mass in kg/mol, σ in m. */
export function kineticViscosity(T: number, molarMass: number, epsilonOverK: number, sigma: number): number {
  const nanometres = 1e9 * sigma;
  return (26.692e-9 * Math.sqrt(1000 * molarMass * T)) / (nanometres * nanometres * neufeldIntegral(T / epsilonOverK));
}
