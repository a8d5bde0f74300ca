/**
 * Air with water vapour as a real gas, by mole fraction of vapour: virial coefficients of air and of its pairs with water, and the enhancement
 * of saturation, after Hyland & Wexler 1983; of steam alone by the industrial formulation; transport by mixing rules.
 */
import type { State } from "./fluid.js";
import { gasConstant, mix } from "./gas-mixture.js";
import { type GasComponent, lowDensityGases } from "./low-density-gas.js";
import { region2 } from "./records/water.js";
import { dewPointOf, liquidState, vapourPressureOfWater } from "./water-equations.js";
import { backgroundConductivity, backgroundViscosity } from "./water-transport.js";

const R = gasConstant;
/** kg/mol; dry air as modern humid-air work counts it. */
export const airMass = 28.96546e-3;
export const waterMass = 18.015268e-3;

// ---- virial coefficients, m³/mol and (m³/mol)², after Hyland & Wexler 1983 -----------------------------------------------------------

function airB(T: number): number {
  return 1e-6 * (34.9568 + (-6687.72 + (-2.10141e6 + 9.24746e7 / T) / T) / T);
}

function crossB(T: number): number {
  return 1e-6 * (32.366097 + (-14113.8 + (-1.244535e6 - 2.348789e9 / (T * T)) / T) / T);
}

/** The industrial formulation's steam: its terms of first and second power in pressure are the virial coefficients. */
const steamTerms = [1, 2].map((power) => region2.residual.filter(([I]) => I === power));

function steamTerm(power: 1 | 2, T: number): number {
  const y = region2.temperature / T - 0.5;
  let sum = 0;
  for (const [, J, n] of steamTerms[power - 1] as readonly (readonly [number, number, number])[]) sum += n * y ** J;
  return sum;
}

function waterB(T: number): number {
  return (R * T * steamTerm(1, T)) / region2.pressure;
}

function airC(T: number): number {
  return 1e-12 * (1259.75 + (-190905 + 6.32467e7 / T) / T);
}

function crossCAirAirWater(T: number): number {
  return 1e-12 * (482.737 + (105678 + (-6.56394e7 + (2.94442e10 - 3.19317e12 / T) / T) / T) / T);
}

function crossCAirWaterWater(T: number): number {
  return -1e-6 * Math.exp(-10.72887 + (3478.02 + (-383383 + 3.3406e7 / T) / T) / T);
}

function waterC(T: number): number {
  const b = steamTerm(1, T);
  return ((R * T) / region2.pressure) ** 2 * (2 * steamTerm(2, T) + b * b);
}

function mixtureB(T: number, xw: number): number {
  const xa = 1 - xw;
  return xa * xa * airB(T) + 2 * xa * xw * crossB(T) + xw * xw * waterB(T);
}

function mixtureC(T: number, xw: number): number {
  const xa = 1 - xw;
  return xa ** 3 * airC(T) + 3 * xa * xa * xw * crossCAirAirWater(T) + 3 * xa * xw * xw * crossCAirWaterWater(T) + xw ** 3 * waterC(T);
}

/** m³/mol: p v/(R T) = 1 + B/v + C/v², by Newton's steps from the ideal gas; few are needed below 1 MPa. */
export function molarVolume(T: number, p: number, xw: number): number {
  const B = mixtureB(T, xw);
  const C = mixtureC(T, xw);
  const ideal = (R * T) / p;
  let v = ideal + B;
  for (let k = 0; k < 20; k++) {
    const z = 1 + (B + C / v) / v;
    const f = v - ideal * z;
    const next = v - f / (1 + (ideal * (B + (2 * C) / v)) / (v * v));
    if (Math.abs(next - v) < 1e-13 * v) return next;
    v = next;
  }
  return v;
}

// ---- saturation ----------------------------------------------------------------------------------------------------------------------

/** Mole fraction of vapour in saturated air; the enhancement is 0.4 % at the atmosphere's pressure. One where water boils. */
export function saturatedFraction(T: number, p: number): number {
  const pure = vapourPressureOfWater(T);
  if (pure >= p) return 1;
  let xw = pure / p;
  for (let k = 0; k < 3; k++) xw = Math.min(1, (enhancement(T, p, xw, pure) * pure) / p);
  return xw;
}

/** Hyland & Wexler's equation with its second virial terms and the Poynting term; dissolved air and third virials change it by less than 1e-4. */
function enhancement(T: number, p: number, xw: number, pure: number): number {
  const xa = 1 - xw;
  const condensed = T >= 273.16 ? 1 / liquidState(T, Math.max(p, pure)).density : 1 / 917;
  const poynting = (waterMass * condensed * (p - pure)) / (R * T);
  const virial = (xa * xa * p * (airB(T) - 2 * crossB(T)) - (p - pure - xa * xa * p) * waterB(T)) / (R * T);
  return Math.exp(poynting + virial);
}

// ---- properties ----------------------------------------------------------------------------------------------------------------------

const composition = [
  ["N2", 0.78084],
  ["O2", 0.20946],
  ["Ar", 0.00934],
  ["CO2", 0.0004],
] as const;

function gasNamed(formula: string): GasComponent {
  return lowDensityGases.find((gas) => gas.formula === formula) as GasComponent;
}

const airParts = composition.map(([formula, fraction]) => ({ gas: gasNamed(formula), fraction }));
const airSum = composition.reduce((sum, [, fraction]) => sum + fraction, 0);
const steam = gasNamed("H2O");

/** J/(mol·K) */
function idealCp(T: number, xw: number): number {
  const air = airParts.reduce((sum, { gas, fraction }) => sum + fraction * gas.at(T).cp, 0) / airSum;
  return (1 - xw) * air + xw * steam.at(T).cp;
}

/** Dry air at zero density, Lemmon & Jacobsen 2004: viscosity Pa·s and conductivity W/(m·K). */
function dryAirTransport(T: number): { readonly viscosity: number; readonly conductivity: number } {
  const ln = Math.log(T / 103.3);
  const omega = Math.exp(0.431 + ln * (-0.4623 + ln * (0.08406 + ln * (0.005341 - 0.00331 * ln))));
  const micro = (0.0266958 * Math.sqrt(28.9586 * T)) / (0.36 * 0.36 * omega);
  const tau = 132.6312 / T;
  return { viscosity: 1e-6 * micro, conductivity: 1e-3 * (1.308 * micro + 1.405 * tau ** -1.1 - 1.036 * tau ** -0.3) };
}

/** Between Wilke's 1 and Tondon & Saxena's 0.85; common practice, it meets published tables of moist air within 2 %. */
const polarFactor = 0.9;

function transportOf(T: number, xw: number): { readonly viscosity: number; readonly conductivity: number } {
  const air = dryAirTransport(T);
  if (xw === 0) return air;
  const water = { cp: 0, viscosity: backgroundViscosity(T, 0), conductivity: backgroundConductivity(T, 0) };
  return mix([1 - xw, xw], [airMass, waterMass], [{ cp: 0, ...air }, water], polarFactor);
}

/** What follows exactly from the virial equation: cp, J/(mol·K), from the residual cv and the pressure's slopes; expansivity from the slopes. */
function realGas(T: number, v: number, xw: number): { readonly cp: number; readonly expansivity: number } {
  const B = derivatives((t) => mixtureB(t, xw), T);
  const C = derivatives((t) => mixtureC(t, xw), T);
  const residual = -R * ((2 * T * B.first + T * T * B.second) / v + (2 * T * C.first + T * T * C.second) / (2 * v * v));
  const withT = (R / v) * (1 + (B.value + T * B.first) / v + (C.value + T * C.first) / (v * v));
  const withV = (-R * T * (1 + (2 * B.value) / v + (3 * C.value) / (v * v))) / (v * v);
  return { cp: idealCp(T, xw) - R + residual - (T * withT * withT) / withV, expansivity: -withT / (withV * v) };
}

function derivatives(f: (T: number) => number, T: number): { readonly value: number; readonly first: number; readonly second: number } {
  const step = 0.5;
  const left = f(T - step);
  const value = f(T);
  const right = f(T + step);
  return { value, first: (right - left) / (2 * step), second: (right - 2 * value + left) / (step * step) };
}

/** The state of air with the mole fraction `xw` of vapour. */
export function moistAirState(T: number, p: number, xw: number): State {
  const mass = (1 - xw) * airMass + xw * waterMass;
  const v = molarVolume(T, p, xw);
  const { cp, expansivity } = realGas(T, v, xw);
  const transport = transportOf(T, xw);
  return {
    T,
    p,
    phase: "gas",
    density: mass / v,
    cp: cp / mass,
    viscosity: transport.viscosity,
    conductivity: transport.conductivity,
    expansivity,
    enthalpy: undefined,
    speedOfSound: Math.sqrt((cp / (cp - R)) * ((p * v) / mass)),
  };
}

/** K; where the saturated fraction is this one. */
export function dewPointAt(xw: number, p: number): number {
  let T = dewPointOf(Math.max(xw * p, 1e-4));
  for (let k = 0; k < 4; k++) {
    const pure = vapourPressureOfWater(T);
    if (pure >= p) return T;
    T = dewPointOf(Math.max((xw * p) / enhancement(T, p, xw, pure), 1e-4));
  }
  return T;
}
