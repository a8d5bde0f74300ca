/**
 * Silicone oil (polydimethylsiloxane) by its grade, the kinematic viscosity at 25 °C in mm²/s: typical values between the printed grades.
 */
import { numerical, polynomial } from "./fit.js";
import { fitPressureRange, fittedLiquid } from "./fitted-liquid.js";
import type { Fluid, Uncertainty } from "./fluid.js";
import { monotone } from "./interpolation.js";
import type { ShelfEntry } from "./shelf-entry.js";

const zeroCelsius = 273.15;

/** Grade; density at 25 °C, kg/m³; expansivity, 1/K; cp, J/(kg·K); conductivity, W/(m·K); flash point, °C; highest temperature in air, °C. */
const grades: readonly (readonly [number, number, number, number, number, number, number])[] = [
  [10, 935, 1.08e-3, 1610, 0.134, 160, 150],
  [20, 949, 1.03e-3, 1590, 0.142, 230, 160],
  [50, 960, 9.9e-4, 1550, 0.151, 280, 180],
  [100, 966, 9.6e-4, 1510, 0.155, 300, 200],
  [350, 970, 9.6e-4, 1470, 0.159, 300, 200],
  [1000, 971, 9.6e-4, 1460, 0.159, 300, 200],
  [12500, 974, 9.6e-4, 1460, 0.16, 300, 200],
];

const limits = [10, 12_500] as const;
const coldest = -40 + zeroCelsius;
const usual: Uncertainty = { density: 0.01, cp: 0.05, viscosity: 0.15, conductivity: 0.1, expansivity: 0.05, origin: "from memory" };
const sources = ["silicone-typical-values"] as const;

function siliconeOil(grade: number): Fluid {
  const logs = grades.map((row) => Math.log(row[0]));
  const of = (column: 1 | 2 | 3 | 4 | 5 | 6): number =>
    monotone(
      logs,
      grades.map((row) => row[column]),
    ).at(Math.log(grade));
  const density25 = of(1);
  const beta = of(2);
  const density = numerical((T) => density25 / (1 + beta * (T - zeroCelsius - 25)));
  // log₁₀ (ν/ν₂₅) = 763.1/T − 2.559 of the trade's tables, T in K.
  const ratio = (T: number): number => 10 ** (763.1 / T - 763.1 / (25 + zeroCelsius));
  return fittedLiquid({
    name: `silicone oil ${grade} cSt`,
    synonyms: [],
    family: "oil",
    sources,
    T: [coldest, of(6) + zeroCelsius],
    density,
    cp: polynomial([of(3)]),
    conductivity: polynomial([of(4)]),
    viscosity: numerical((T) => 1e-6 * grade * ratio(T) * density.at(T)),
    uncertainty: usual,
    flashPoint: of(5) + zeroCelsius,
    cautions: ["Typical values of silicone oil of this grade; the supplier's sheet comes first."],
  });
}

export const siliconeOils: ShelfEntry = {
  name: "silicone oil",
  synonyms: ["polydimethylsiloxane", "PDMS", "dimethyl silicone", "silicone fluid"],
  family: "oil",
  sources,
  summary: "Silicone oil by grade, mm²/s (cSt) at 25 °C.",
  range: { T: [coldest, 200 + zeroCelsius], p: fitPressureRange },
  uncertainty: "density 1 %, cp 5 %, viscosity 15 %, conductivity 10 %",
  parameter: { meaning: "viscosity grade", unit: "cSt", limits, example: 100 },
  fluid: (grade = 100) => siliconeOil(grade),
};
