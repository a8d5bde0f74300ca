/**
 * Humid air by relative humidity, dew point or humidity ratio. cp is for a kilogram of humid air; cp and expansivity hold the humidity ratio.
 */
import { coverageProblem, isProblem, type Problem, valueProblem } from "../quantities/problems.js";
import type { Fluid, FluidRange, Uncertainty } from "./fluid.js";
import { airMass, dewPointAt, moistAirState, molarVolume, saturatedFraction, waterMass } from "./moist-air.js";
import { figures, impossible, isBelow, outside, sayPressure, sayTemperature, sayTenths } from "./refusal.js";
import type { ShelfEntry } from "./shelf-entry.js";
import { vapourPressureOfWater } from "./water-equations.js";

/** What says how moist the air is; per cent, kelvin, kg of water per kg of dry air. */
export type Moisture = { readonly relativeHumidity: number } | { readonly dewPoint: number } | { readonly humidityRatio: number };

const range: FluidRange = { T: [203.15, 473.15], p: [1e3, 1e6] };

const uncertaintyOfHumidAir: Uncertainty = {
  density: 1e-3,
  cp: 0.01,
  viscosity: 0.03,
  conductivity: 0.03,
  expansivity: 2e-3,
  origin: "from memory",
};
const sources = ["hyland-wexler-1983", "iapws-r7-97", "mcbride-2002", "lemmon-2004-ijt", "wilke-1950", "mason-saxena-1958"] as const;
const synonyms = ["moist air", "wet air", "damp air"] as const;

/** Humid air of a moisture; everything that is wrong with the moisture is a `Problem`. */
export function humidAir(moisture: Moisture): Fluid | Problem {
  if ("relativeHumidity" in moisture) return ofRelativeHumidity(moisture.relativeHumidity);
  if ("dewPoint" in moisture) return ofDewPoint(moisture.dewPoint);
  return ofHumidityRatio(moisture.humidityRatio);
}

function ofRelativeHumidity(percent: number): Fluid | Problem {
  if (!(percent >= 0 && percent <= 100)) {
    return valueProblem("humidity", `A relative humidity of ${figures(percent)} % does not exist; 0 to 100 % is needed, such as "60 %".`);
  }
  const fraction = (T: number, p: number): number | Problem => {
    const xw = (percent / 100) * saturatedFraction(T, p);
    if (percent > 0 && vapourPressureOfWater(Math.min(T, 647)) >= p) {
      return coverageProblem(
        undefined,
        `Relative humidity has no meaning at ${sayTemperature(T)} and ${sayPressure(p)}, where water boils; give a dew point instead.`,
      );
    }
    return xw;
  };
  const name = `humid air ${Number(percent.toPrecision(6))} %`;
  return fluidOf(name, fraction, (T, p) => {
    const refused = impossible(T, p) ?? outside(name, range, T, p);
    if (refused) return refused;
    const xw = fraction(T, p);
    return isProblem(xw) ? xw : ofFraction(xw, name);
  });
}

function ofDewPoint(T: number): Fluid | Problem {
  if (!Number.isFinite(T) || isBelow(T, 173.15) || isBelow(range.T[1], T)) {
    return valueProblem(
      "dew point",
      `A dew point between -100 °C and 200 °C is needed; ${Number.isFinite(T) ? sayTemperature(T) : "no number"} was given.`,
    );
  }
  return fluidOf(`humid air of dew point ${sayTemperature(Number(T.toFixed(3)))}`, (_T, p) => {
    const xw = saturatedFraction(T, p);
    if (xw < 1) return xw;
    return coverageProblem(
      undefined,
      `A dew point of ${sayTemperature(T)} does not exist at ${sayPressure(p)}, where water boils below it.`,
    );
  });
}

function ofHumidityRatio(ratio: number): Fluid | Problem {
  if (!(ratio >= 0 && ratio <= 10))
    return valueProblem("humidity", `A humidity ratio of ${figures(ratio)} kg/kg is none; zero to 10 is needed.`);
  const moles = ratio / waterMass;
  return ofFraction(moles / (moles + 1 / airMass), `humid air of ${figures(ratio)} kg/kg`);
}

/** Air that keeps its moisture while its temperature changes. */
function ofFraction(xw: number, name: string): Fluid {
  return fluidOf(name, () => xw);
}

function fluidOf(name: string, fraction: (T: number, p: number) => number | Problem, atBulk?: Fluid["atBulk"]): Fluid {
  const refusal = (T: number, p: number): Problem | undefined => impossible(T, p) ?? outside(name, range, T, p);
  const moistureAt = (T: number, p: number): number | Problem => refusal(T, p) ?? fraction(T, p);
  const dewPoint = (T: number, p: number): number | Problem => {
    const xw = moistureAt(T, p);
    return isProblem(xw) ? xw : dewPointAt(xw, p);
  };
  return {
    name,
    synonyms,
    family: "mixture",
    sources,
    range,
    molarMass: undefined,
    critical: undefined,
    freezingPoint: undefined,
    constantDensity: false,
    state: (T, p) => {
      const xw = moistureAt(T, p);
      return isProblem(xw) ? xw : moistAirState(T, p, xw);
    },
    density: (T, p) => {
      const xw = moistureAt(T, p);
      return isProblem(xw) ? xw : ((1 - xw) * airMass + xw * waterMass) / molarVolume(T, p, xw);
    },
    uncertainty: () => uncertaintyOfHumidAir,
    ...(atBulk && { atBulk }),
    dewPoint,
    cautions: (T, p) => cautionsAt(dewPoint(T, p), T),
  };
}

function cautionsAt(dew: number | Problem, T: number): readonly string[] {
  if (isProblem(dew) || T >= dew - 1e-6) return [];
  return [`${sayTemperature(T)} is below the dew point, ${sayTenths(dew)}: water condenses there, and its latent heat is not in h.`];
}

export const humidAirEntry: ShelfEntry = {
  name: "humid air",
  synonyms,
  family: "mixture",
  sources,
  summary: "Air with water vapour by relative humidity at the temperature asked; surfaces keep the bulk's moisture.",
  range,
  uncertainty: "density 0.1 %, cp 1 %, viscosity 3 %, conductivity 3 %",
  parameter: { meaning: "relative humidity", unit: "%", limits: [0, 100], example: 60 },
  fluid: (amount = 0) => humidAir({ relativeHumidity: amount }),
};
