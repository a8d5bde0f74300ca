/**
 * Seawater and brine by salinity. Density, cp and expansivity by the scientific Gibbs function (IAPWS R13-08 over R7-97's liquid water) in
 * the ocean's range, to 40 °C and 42 g/kg; by the engineering fits (Sharqawy 2010, Nayar 2016) from 80 °C or 80 g/kg on; between them a
 * straight passage from one to the other. Transport by the engineering fits throughout. Salinity is absolute, per cent by mass.
 */
import { coverageProblem, type Problem } from "../quantities/problems.js";
import { horner } from "./fit.js";
import type { Fluid, FluidRange, State, Uncertainty } from "./fluid.js";
import {
  density as densityFit,
  heatCapacity,
  saline,
  salinityUnit,
  vapourPressure,
  viscosity as viscosityFit,
} from "./records/seawater.js";
import { impossible, isBelow, outside, sayPressure, sayTemperature } from "./refusal.js";
import type { ShelfEntry } from "./shelf-entry.js";
import { liquidState } from "./water-equations.js";

const zeroCelsius = 273.15;
const atmosphere = 101_325;
/** g/kg */
const most = 120;
/** The engineering pressure terms end here, Pa. */
const highestPressure = 12e6;
const hottest = 180 + zeroCelsius;

interface Thermal {
  readonly density: number;
  readonly cp: number;
  readonly expansivity: number;
}

// ---- the scientific Gibbs function ---------------------------------------------------------------------------------------------------

/** Derivatives of the saline part that density, expansivity and cp need: g_p, g_Tp, g_TT. */
function salineDerivatives(T: number, p: number, S: number): { readonly gp: number; readonly gTp: number; readonly gTT: number } {
  const X = Math.sqrt(S / salinityUnit);
  const y = (T - zeroCelsius) / 40;
  const z = (p - atmosphere) / 100e6;
  const lnX = Math.log(X);
  let gp = 0;
  let gTp = 0;
  let gTT = 0;
  for (const [i, j, k, g] of saline) {
    const x = i === 1 ? X * X * lnX : X ** i;
    if (k > 0) gp += k * g * x * y ** j * z ** (k - 1);
    if (k > 0 && j > 0) gTp += k * j * g * x * y ** (j - 1) * z ** (k - 1);
    if (j > 1) gTT += j * (j - 1) * g * x * y ** (j - 2) * z ** k;
  }
  return { gp: gp / 100e6, gTp: gTp / 40 / 100e6, gTT: gTT / 1600 };
}

/** Water's part is the liquid of the industrial formulation, which R13-08 allows in its place; below 0 °C it is carried a little further. */
function scientific(T: number, p: number, S: number): Thermal {
  const water = liquidState(T, p);
  if (S <= 0) return { density: water.density, cp: water.cp, expansivity: water.expansivity };
  const { gp, gTp, gTT } = salineDerivatives(T, p, S);
  const volume = 1 / water.density + gp;
  return {
    density: 1 / volume,
    cp: water.cp - T * gTT,
    expansivity: (water.expansivity / water.density + gTp) / volume,
  };
}

// ---- the engineering fits ------------------------------------------------------------------------------------------------------------

function vapourPressureOf(T: number, S: number): number {
  const [p0, p1, p2, p3, p4, p5] = vapourPressure.p;
  const [q0, q1] = vapourPressure.q;
  return Math.exp(p0 / T + p1 + T * (p2 + T * (p3 + T * p4)) + p5 * Math.log(T) + S * (q0 + q1 * S));
}

/** MPa; the pressure at which the fits without pressure term stand. */
function referencePressure(t: number, S: number): number {
  return t < 100 ? atmosphere / 1e6 : vapourPressureOf(t + zeroCelsius, S) / 1e6;
}

function engineeringDensity(t: number, p: number, S: number): number {
  const s = S / 1000;
  const { a, b, b4, c, cSquare, d, dSquare } = densityFit;
  const atReference = horner(a, t) + s * horner(b, t) + b4 * s * s * t * t;
  const P = p / 1e6;
  const P0 = referencePressure(t, S);
  const linear = horner(c, t) + S * horner(d, t);
  const square = cSquare[0] + cSquare[1] * t + cSquare[2] * t ** 3 + dSquare * S;
  return atReference * Math.exp((P - P0) * linear + ((P * P - P0 * P0) / 2) * square);
}

function engineeringCp(t: number, p: number, S: number): number {
  const T68 = 1.00024 * (t + zeroCelsius);
  const atReference =
    1000 *
    horner(
      heatCapacity.temperature.map((row) => horner(row, S)),
      T68,
    );
  const slope = horner(heatCapacity.pressure, t) + S * horner(heatCapacity.pressureSalinity, t);
  return atReference + (p / 1e6 - referencePressure(t, S)) * slope;
}

function engineering(T: number, p: number, S: number): Thermal {
  const t = T - zeroCelsius;
  const density = engineeringDensity(t, p, S);
  const step = 0.01;
  const slope = (engineeringDensity(t + step, p, S) - engineeringDensity(t - step, p, S)) / (2 * step);
  return { density, cp: engineeringCp(t, p, S), expansivity: -slope / density };
}

function viscosityOf(t: number, S: number): number {
  const [m0, m1, m2, m3, m4, m5, m6, m7, m8, m9] = viscosityFit;
  const s = S / 1000;
  const water = m3 + 1 / (m0 * (t + m1) ** 2 + m2);
  return water * (1 + s * (m4 + t * (m5 + t * m6) + s * (m7 + t * (m8 + t * m9))));
}

function conductivityOf(t: number, S: number): number {
  const T = 1.00024 * t + zeroCelsius;
  const Sp = S / 1.00472;
  // The paper prints log₁₀ e with three digits, and 2.3 to match; the exact constant would raise k by 0.07 %.
  const printed = 434 / 1000;
  const exponent = Math.log10(240 + 2e-4 * Sp) + printed * (2.3 - (343.5 + 0.037 * Sp) / T) * Math.cbrt(1 - T / (647.3 + 0.03 * Sp));
  return 1e-3 * 10 ** exponent;
}

// ---- the passage between them --------------------------------------------------------------------------------------------------------

/** 1 where the scientific function is best, 0 where only the engineering fits hold, and its slope with temperature, 1/K. */
function share(T: number, S: number): { readonly weight: number; readonly slope: number } {
  const t = T - zeroCelsius;
  const ofT = Math.min(1, Math.max(0, (80 - t) / 40));
  const ofS = Math.min(1, Math.max(0, (80 - S) / 38));
  return { weight: ofT * ofS, slope: t > 40 && t < 80 ? -ofS / 40 : 0 };
}

function thermal(T: number, p: number, S: number): Thermal {
  const { weight, slope } = share(T, S);
  if (weight === 0) return engineering(T, p, S);
  if (weight === 1) return scientific(T, p, S);
  const a = scientific(T, p, S);
  const b = engineering(T, p, S);
  const density = weight * a.density + (1 - weight) * b.density;
  const densitySlope = slope * (a.density - b.density) - weight * a.density * a.expansivity - (1 - weight) * b.density * b.expansivity;
  return { density, cp: weight * a.cp + (1 - weight) * b.cp, expansivity: -densitySlope / density };
}

// ---- the fluid -----------------------------------------------------------------------------------------------------------------------

/** K at 101325 Pa; Millero 1978, made for practical salinity to 40 and carried on: 0.3 K off at 120 g/kg. */
function freezingOf(S: number): number {
  return zeroCelsius - 0.0575 * S + 1.710523e-3 * S ** 1.5 - 2.154996e-4 * S * S;
}

function seawaterOf(percent: number): Fluid {
  const S = 10 * percent;
  const name = `seawater ${percent} %`;
  const freezingPoint = freezingOf(S / 1.00472);
  const range: FluidRange = { T: [freezingPoint, hottest], p: [1, highestPressure] };
  const refusal = (T: number, p: number): Problem | undefined => {
    const nonsense = impossible(T, p);
    if (nonsense) return nonsense;
    if (isBelow(T, freezingPoint)) {
      return coverageProblem(
        undefined,
        `${name} freezes at ${sayTemperature(Math.round(100 * freezingPoint) / 100)}; ${sayTemperature(T)} is below it.`,
      );
    }
    const out = outside(name, range, T, p);
    if (out) return out;
    const boiling = vapourPressureOf(T, S);
    if (!isBelow(p, boiling)) return undefined;
    return coverageProblem(
      undefined,
      `${name} at ${sayTemperature(T)} boils below ${sayPressure(Number(boiling.toPrecision(4)))} absolute; ${sayPressure(p)} was given. Raise the pressure.`,
    );
  };
  const state = (T: number, p: number): State | Problem => refusal(T, p) ?? stateAt(T, p, S);
  return {
    name,
    synonyms: [],
    family: "coolant",
    sources,
    range,
    molarMass: undefined,
    critical: undefined,
    freezingPoint,
    constantDensity: false,
    state,
    density: (T, p) => refusal(T, p) ?? thermal(T, p, S).density,
    uncertainty: (T, p) => uncertaintyAt(T, p, S),
    cautions: (T) =>
      T > zeroCelsius + 80 ? ["Hot seawater lays down scale and corrodes; the film coefficient is of the clean surface."] : [],
  };
}

function stateAt(T: number, p: number, S: number): State {
  const t = T - zeroCelsius;
  const { density, cp, expansivity } = thermal(T, p, S);
  return {
    T,
    p,
    phase: "liquid",
    density,
    cp,
    viscosity: viscosityOf(t, S),
    conductivity: conductivityOf(t, S),
    expansivity,
    enthalpy: undefined,
    speedOfSound: undefined,
  };
}

const oceanic: Uncertainty = { density: 1e-4, cp: 1e-3, viscosity: 0.015, conductivity: 0.03, expansivity: 0.01, origin: "published" };
const hot: Uncertainty = { density: 1e-3, cp: 3e-3, viscosity: 0.015, conductivity: 0.03, expansivity: 0.05, origin: "published" };
const pressed: Uncertainty = { ...hot, cp: 0.01 };

function uncertaintyAt(T: number, p: number, S: number): Uncertainty {
  if (share(T, S).weight === 1) return oceanic;
  return p > 1e6 ? pressed : hot;
}

const sources = [
  "iapws-r13-08",
  "iapws-r7-97",
  "sharqawy-2010",
  "nayar-2016",
  "jamieson-1969",
  "jamieson-tudhope-1970",
  "millero-1978",
] as const;

export const seawater: ShelfEntry = {
  name: "seawater",
  synonyms: ["sea water", "sea brine", "ocean water"],
  family: "coolant",
  sources,
  summary: "Seawater by absolute salinity, per cent by mass or g/kg; 3.5 % where the name gives none.",
  range: { T: [freezingOf(most), hottest], p: [1, highestPressure] },
  uncertainty: "density 0.01 to 0.1 %, cp 0.1 to 1 %, viscosity 1.5 %, conductivity 3 %",
  parameter: { meaning: "salinity", unit: "%", limits: [0, most / 10], otherwise: 3.5, bases: ["mass"], perMille: true, example: 3.5 },
  fluid: (amount = 3.5) => seawaterOf(amount),
};
