/**
 * Water and steam by the industrial formulation IAPWS R7-97(2012), with the IAPWS releases for transport and surface tension.
 * 0 °C to 800 °C up to 100 MPa, to 2000 °C up to 50 MPa; transport to 900 °C. The pair of temperature and pressure decides the phase.
 */
import { coverageProblem, isProblem, type Problem } from "../quantities/problems.js";
import type { Fluid, FluidRange, Phase, Saturation, State, Uncertainty } from "./fluid.js";
import { constants } from "./records/water.js";
import { impossible, isBelow, outside, sayPressure, sayTemperature } from "./refusal.js";
import {
  boundaryPressure,
  denseDensity,
  denseState,
  hotSteamState,
  liquidState,
  saturationPressure,
  saturationTemperature,
  steamState,
  type Thermodynamics,
} from "./water-equations.js";
import { surfaceTensionOf, transportLimit, transportOf } from "./water-transport.js";

const criticalTemperature = constants.criticalTemperature;
const criticalPressure = constants.criticalPressure;
const coldest = 273.15;
/** Regions 1 and 2 meet region 3 here, K. */
const denseFrom = 623.15;
const denseTo = 863.15;
const hotFrom = 1073.15;
const hotPressure = 50e6;
/** Above this cp no figure is of use: the critical point itself, J/(kg·K). */
const divergentCp = 5e6;

export const waterRange: FluidRange = { T: [coldest, 2273.15], p: [1, 100e6] };

/** Above this pressure anything in regions 1 and 2 up to 350 °C is liquid, Pa. */
const alwaysLiquid = 16.6e6;

function isLiquid(T: number, p: number): boolean {
  if (T >= criticalTemperature) return false;
  return p > criticalPressure || (T <= denseFrom && p > alwaysLiquid) || p >= saturationPressure(T);
}

function thermodynamicsAt(T: number, p: number, liquid: boolean): Thermodynamics {
  if (T > hotFrom) return hotSteamState(T, p);
  if (T <= denseFrom) return liquid ? liquidState(T, p) : steamState(T, p);
  return T <= denseTo && p > boundaryPressure(T) ? denseState(T, denseDensity(T, p, liquid)) : steamState(T, p);
}

function phaseAt(p: number, liquid: boolean): Phase {
  if (liquid) return "liquid";
  return p >= criticalPressure ? "supercritical" : "gas";
}

function refusal(T: number, p: number): Problem | undefined {
  const nonsense = impossible(T, p);
  if (nonsense) return nonsense;
  if (isBelow(T, coldest)) {
    return coverageProblem(
      undefined,
      `Water at ${sayTemperature(T)} is below its freezing point; the formulation starts at 0 °C. For colder liquids use a coolant such as "ethylene glycol 40 %".`,
    );
  }
  const out = outside("Water", waterRange, T, p);
  if (out) return out;
  if (T > hotFrom && isBelow(hotPressure, p)) {
    return coverageProblem(
      undefined,
      `Steam at ${sayTemperature(T)} and ${sayPressure(p)}: above 800 °C the formulation ends at 50 MPa; nearest: 50 MPa, or 800 °C.`,
    );
  }
  return undefined;
}

function stateOf(T: number, p: number, phase: Phase, t: Thermodynamics): State | Problem {
  if (!(t.cp > 0 && t.cp < divergentCp)) {
    return coverageProblem(
      undefined,
      `Water at ${sayTemperature(T)} and ${sayPressure(p)} is at its critical point (373.946 °C, 22.064 MPa), where cp has no finite value; take a state further away.`,
    );
  }
  const transport = T <= transportLimit ? transportOf(T, t.density, t) : undefined;
  return {
    T,
    p,
    phase,
    density: t.density,
    cp: t.cp,
    viscosity: transport?.viscosity,
    conductivity: transport?.conductivity,
    expansivity: t.expansivity,
    enthalpy: t.enthalpy,
    speedOfSound: t.speedOfSound,
  };
}

function state(T: number, p: number): State | Problem {
  const refused = refusal(T, p);
  if (refused) return refused;
  const liquid = isLiquid(T, p);
  return stateOf(T, p, phaseAt(p, liquid), thermodynamicsAt(T, p, liquid));
}

function density(T: number, p: number): number | Problem {
  return refusal(T, p) ?? thermodynamicsAt(T, p, isLiquid(T, p)).density;
}

/** Both phases on the line. Above 350 °C they come from region 3, each searched from its own side. */
function saturationAt(T: number, p: number): Saturation | Problem {
  const dense = T > denseFrom;
  const liquid = stateOf(T, p, "liquid", dense ? denseState(T, denseDensity(T, p, true)) : liquidState(T, p));
  if (isProblem(liquid)) return liquid;
  const vapour = stateOf(T, p, "gas", dense ? denseState(T, denseDensity(T, p, false)) : steamState(T, p));
  if (isProblem(vapour)) return vapour;
  const latentHeat = (vapour.enthalpy as number) - (liquid.enthalpy as number);
  return { T, p, liquid, vapour, latentHeat, surfaceTension: surfaceTensionOf(T) };
}

function saturationAtTemperature(T: number): Saturation | Problem {
  if (!Number.isFinite(T) || isBelow(T, coldest) || isBelow(criticalTemperature, T)) {
    return coverageProblem(
      undefined,
      `Water has a saturation state only from 0 °C to its critical temperature, 373.946 °C; ${Number.isFinite(T) ? sayTemperature(T) : "no number"} was given.`,
    );
  }
  const inside = Math.min(T, criticalTemperature);
  return saturationAt(inside, saturationPressure(inside));
}

function saturationAtPressure(p: number): Saturation | Problem {
  const lowest = saturationPressure(coldest);
  if (!Number.isFinite(p) || isBelow(p, lowest) || isBelow(criticalPressure, p)) {
    return coverageProblem(
      undefined,
      `Water boils only between 611.213 Pa (0 °C) and its critical pressure, 22.064 MPa; ${Number.isFinite(p) ? sayPressure(p) : "no number"} was given.`,
    );
  }
  const inside = Math.min(p, criticalPressure);
  return saturationAt(Math.min(saturationTemperature(inside), criticalTemperature), inside);
}

function nearCritical(T: number, p: number): boolean {
  return Math.abs(T / criticalTemperature - 1) < 0.05 && p > 0.8 * criticalPressure && p < 1.6 * criticalPressure;
}

const nearCriticalUncertainty: Uncertainty = {
  density: 3e-3,
  cp: 5e-2,
  viscosity: 3e-2,
  conductivity: 5e-2,
  expansivity: 5e-2,
  origin: "from memory",
};
const liquidUncertainty: Uncertainty = {
  density: 1e-4,
  cp: 2e-3,
  viscosity: 1e-2,
  conductivity: 1.5e-2,
  expansivity: 1e-2,
  origin: "from memory",
};
const gasUncertainty: Uncertainty = {
  density: 1e-3,
  cp: 1e-2,
  viscosity: 2e-2,
  conductivity: 2e-2,
  expansivity: 1e-2,
  origin: "from memory",
};
const extremeUncertainty: Uncertainty = {
  density: 3e-3,
  cp: 2e-2,
  viscosity: 3e-2,
  conductivity: 4e-2,
  expansivity: 2e-2,
  origin: "from memory",
};

/** Of the bands that the releases draw, the widest of each region. */
function uncertainty(T: number, p: number): Uncertainty {
  if (nearCritical(T, p)) return nearCriticalUncertainty;
  if (T > hotFrom) return extremeUncertainty;
  if (T <= denseFrom) return isLiquid(Math.max(T, coldest), p) ? liquidUncertainty : gasUncertainty;
  return p > criticalPressure ? extremeUncertainty : gasUncertainty;
}

function cautions(T: number, p: number): readonly string[] {
  const said: string[] = [];
  if (nearCritical(T, p)) {
    said.push(
      "Close to water's critical point properties change steeply and heat transfer can deteriorate; ordinary equations do not hold here.",
    );
  }
  if (T > transportLimit) said.push("The releases for viscosity and conductivity of steam end at 900 °C; none is given here.");
  if (p > 1e6 || (T > 373.15 && isLiquid(T, p))) {
    said.push("Pressurised water or steam: scald and burst hazard; pressure codes and licensed practice come first.");
  }
  return said;
}

export const water: Fluid = {
  name: "water",
  synonyms: ["H2O", "steam", "water vapour", "water vapor", "liquid water", "ordinary water", "R718"],
  family: "water",
  sources: ["iapws-r7-97", "iapws-r12-08", "iapws-r15-11", "iapws-r1-76"],
  range: waterRange,
  molarMass: constants.molarMass,
  critical: { T: criticalTemperature, p: criticalPressure },
  freezingPoint: coldest,
  constantDensity: false,
  state,
  density,
  uncertainty,
  saturationAtPressure,
  saturationAtTemperature,
  cautions,
};
