/**
 * Aqueous coolants by concentration: thirteen of Melinder's handbook by mass, and the two glycols by volume after ASHRAE. The freezing
 * point of the concentration is the lower limit.
 */
import { coverageProblem, type Problem } from "../quantities/problems.js";
import { type Curve, curveOf, type Fit, valueAt } from "./fit.js";
import { fitPressureRange, fittedLiquid } from "./fitted-liquid.js";
import type { Fluid, Uncertainty } from "./fluid.js";
import records from "./records/aqueous-coolants.json";
import type { Basis, ShelfEntry } from "./shelf-entry.js";
import { saturationPressure } from "./water-equations.js";

interface CoolantRecord {
  readonly name: string;
  readonly T: readonly [number, number];
  readonly base: readonly [number, number];
  readonly density: Fit;
  readonly cp: Fit;
  readonly viscosity: Fit;
  readonly conductivity: Fit;
  readonly freezing: Fit;
  /** Fraction by mass, or by volume in the records so named. */
  readonly x: readonly [number, number];
}

interface Solute {
  readonly name: string;
  readonly synonyms: readonly string[];
  /** Names that mean the solution only where a number follows; alone they are the pure fluid. */
  readonly withNumber?: readonly string[];
  readonly cautions: readonly string[];
  /** kg/mol of a solute whose own vapour may be neglected, so that the water's share by mole gives the vapour pressure. */
  readonly molarMass?: number;
  readonly example: number;
}

const plainSolution = "Inhibitors change viscosity and conductivity by some per cent; these are figures of the plain solution.";
const corrosive = "Chloride brines corrode steel; inhibitors and the makers' advice come first.";
const flammable = "Solutions of alcohol give off flammable vapour; local codes come first.";

const solutes: readonly Solute[] = [
  {
    name: "ethylene glycol",
    synonyms: [
      "MEG",
      "EG",
      "monoethylene glycol",
      "ethylene glycol-water",
      "ethylene glycol water",
      "aqueous ethylene glycol",
      "1,2-ethanediol",
    ],
    cautions: ["Ethylene glycol is toxic; keep it from drinking water and drains.", plainSolution],
    molarMass: 62.068e-3,
    example: 40,
  },
  {
    name: "propylene glycol",
    synonyms: [
      "MPG",
      "PG",
      "monopropylene glycol",
      "propylene glycol-water",
      "propylene glycol water",
      "aqueous propylene glycol",
      "1,2-propanediol",
    ],
    cautions: [plainSolution],
    molarMass: 76.094e-3,
    example: 40,
  },
  {
    name: "ethanol-water",
    synonyms: ["ethanol water", "aqueous ethanol"],
    withNumber: ["ethanol", "ethyl alcohol"],
    cautions: [flammable],
    example: 25,
  },
  {
    name: "methanol-water",
    synonyms: ["methanol water", "aqueous methanol"],
    withNumber: ["methanol", "methyl alcohol"],
    cautions: [`${flammable} Methanol is toxic.`],
    example: 25,
  },
  {
    name: "glycerol-water",
    synonyms: ["glycerol water", "glycerine-water", "glycerin-water", "aqueous glycerol"],
    withNumber: ["glycerol", "glycerine", "glycerin"],
    cautions: [],
    molarMass: 92.094e-3,
    example: 40,
  },
  {
    name: "ammonia-water",
    synonyms: ["ammonia water", "aqueous ammonia", "aqua ammonia", "ammonium hydroxide"],
    withNumber: ["ammonia", "NH3"],
    cautions: ["Ammonia is toxic and leaves the solution as gas; it needs a closed vessel, and codes for ammonia plant come first."],
    example: 20,
  },
  {
    name: "potassium carbonate",
    synonyms: ["K2CO3", "potassium carbonate brine", "potash"],
    cautions: ["Strongly alkaline; attacks aluminium and zinc."],
    molarMass: 138.205e-3,
    example: 30,
  },
  {
    name: "calcium chloride",
    synonyms: ["CaCl2", "calcium chloride brine", "CaCl2 brine"],
    cautions: [corrosive],
    molarMass: 110.984e-3,
    example: 20,
  },
  {
    name: "magnesium chloride",
    synonyms: ["MgCl2", "magnesium chloride brine", "MgCl2 brine"],
    cautions: [corrosive],
    molarMass: 95.211e-3,
    example: 15,
  },
  {
    name: "sodium chloride",
    synonyms: ["NaCl", "sodium chloride brine", "NaCl brine", "salt brine", "salt water"],
    cautions: [corrosive],
    molarMass: 58.443e-3,
    example: 15,
  },
  {
    name: "potassium acetate",
    synonyms: ["CH3COOK", "CH3CO2K", "potassium acetate brine"],
    cautions: [],
    molarMass: 98.142e-3,
    example: 30,
  },
  {
    name: "potassium formate",
    synonyms: ["HCOOK", "KCOOH", "KCHO2", "potassium formate brine"],
    cautions: ["Published data of potassium formate scatter by 2 to 5 % in viscosity."],
    molarMass: 84.116e-3,
    example: 30,
  },
  {
    name: "lithium chloride",
    synonyms: ["LiCl", "lithium chloride brine", "LiCl brine"],
    cautions: [corrosive],
    molarMass: 42.394e-3,
    example: 20,
  },
];

// Typical of the handbook, widest of each: "density 0.2 to 0.5 %, cp 1 to 2 %, viscosity 3 to 5 %, conductivity 2 to 3 %".
const usual: Uncertainty = { density: 0.005, cp: 0.02, viscosity: 0.05, conductivity: 0.03, expansivity: 0.1, origin: "from memory" };
/** Below 5 % several fits miss the values of pure water by up to 1 % in density and cp. */
const dilute: Uncertainty = { ...usual, density: 0.01, cp: 0.03 };
const diluteBelow = 0.05;
const molarMassOfWater = 18.015268e-3;

export const coolants: readonly ShelfEntry[] = solutes.map((solute) => entryOf(solute));

function recordOf(name: string): CoolantRecord | undefined {
  return (records as readonly unknown[] as readonly CoolantRecord[]).find((record) => record.name === name);
}

function entryOf(solute: Solute): ShelfEntry {
  const byMass = recordOf(solute.name) as CoolantRecord;
  const byVolume = recordOf(`${solute.name} by volume`);
  return {
    name: solute.name,
    synonyms: solute.synonyms,
    family: "coolant",
    sources: byVolume ? ["melinder-2010", "ashrae-2001"] : ["melinder-2010"],
    summary: `${capital(solute.name)} in water, ${byVolume ? "per cent by mass or by volume" : "per cent by mass"}; from its freezing point to ${Math.round(byMass.T[1] - 273.15)} °C.`,
    range: { T: [coldestOf(byMass), byMass.T[1]], p: fitPressureRange },
    uncertainty: "density 0.5 %, cp 2 %, viscosity 5 %, conductivity 3 %",
    parameter: {
      meaning: "concentration",
      unit: "%",
      limits: [100 * byMass.x[0], 100 * byMass.x[1]],
      bases: byVolume ? ["mass", "volume"] : ["mass"],
      example: solute.example,
      ...(solute.withNumber && { namesWithNumber: solute.withNumber }),
    },
    fluid: (amount = 0, basis = "mass") => solution(solute, basis === "volume" ? (byVolume as CoolantRecord) : byMass, amount, basis),
  };
}

function coldestOf(record: CoolantRecord): number {
  return Math.max(
    record.T[0],
    Math.min(...[0, 0.25, 0.5, 0.75, 1].map((u) => freezingAt(record, record.x[0] + u * (record.x[1] - record.x[0])))),
  );
}

function freezingAt(record: CoolantRecord, x: number): number {
  return valueAt(record.freezing, record.base, x);
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

function solution(solute: Solute, record: CoolantRecord, percent: number, basis: Basis): Fluid | Problem {
  const x = percent / 100;
  const [low, high] = record.x;
  const unit = basis === "volume" ? "% by volume" : "%";
  if (x < low - 1e-12 || x > high + 1e-12) {
    const nearest = x < low ? low : high;
    return coverageProblem(
      "fluid",
      `"${solute.name} ${percent} ${unit}": the fit covers ${round(100 * low)} to ${round(100 * high)} ${unit}; nearest: "${solute.name} ${round(100 * nearest)} ${unit}".`,
    );
  }
  const curve = (fit: Fit): Curve => curveOf(fit, record.base, x);
  const weak = x < diluteBelow;
  return fittedLiquid({
    name: `${solute.name} ${percent} ${unit}`,
    synonyms: [],
    family: "coolant",
    sources: [basis === "volume" ? "ashrae-2001" : "melinder-2010"],
    T: record.T,
    density: curve(record.density),
    cp: curve(record.cp),
    viscosity: curve(record.viscosity),
    conductivity: curve(record.conductivity),
    uncertainty: weak ? dilute : usual,
    freezingPoint: freezingAt(record, x),
    vapourPressure: (T) => waterShare(solute, x, basis) * saturationPressure(Math.max(T, 273.15)),
    cautions: weak ? [...solute.cautions, "Below 5 % the fit misses pure water by up to 1 % in density and cp."] : solute.cautions,
  });
}

function round(percent: number): number {
  return Number(percent.toFixed(3));
}

/** Raoult's law: the mole fraction of water; 1, the safe side for salts, where by volume or where the solute's vapour is not negligible. */
function waterShare(solute: Solute, x: number, basis: Basis): number {
  if (solute.molarMass === undefined || basis !== "mass") return 1;
  const water = (1 - x) / molarMassOfWater;
  return water / (water + x / solute.molarMass);
}
