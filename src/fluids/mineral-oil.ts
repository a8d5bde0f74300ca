/**
 * Mineral oils from what a data sheet says of them: two kinematic viscosities give the viscosity over temperature (ASTM D341), the density at
 * 15 °C gives the rest by Cragoe's estimates (NBS Miscellaneous Publication 97) and the thermal expansion of lubricants.
 */
import { type Problem, valueProblem } from "../quantities/problems.js";
import { type Curve, numerical } from "./fit.js";
import { fitPressureRange, fittedLiquid } from "./fitted-liquid.js";
import type { Fluid, Uncertainty } from "./fluid.js";
import type { ShelfEntry } from "./shelf-entry.js";
import { viscosityAt100 } from "./viscosity-index.js";

const zeroCelsius = 273.15;

export interface OilSheet {
  readonly name: string;
  /** mm²/s at 40 °C and at 100 °C. */
  readonly viscosity40: number;
  readonly viscosity100: number;
  /** kg/m³ at 15 °C */
  readonly density15: number;
  /** °C */
  readonly flashPoint: number;
  /** K, where the estimates are used. */
  readonly T: readonly [number, number];
  readonly sources: Fluid["sources"];
  /** Relative uncertainty of the viscosity: how well the two figures are known. */
  readonly viscosityUncertainty: number;
  readonly cautions?: readonly string[];
}

/** ASTM D341: log₁₀ log₁₀ (ν + 0.7) = A − B log₁₀ T, ν in mm²/s above 2. */
export function kinematicViscosity(viscosity40: number, viscosity100: number): (T: number) => number {
  const W = (viscosity: number): number => Math.log10(Math.log10(viscosity + 0.7));
  const cold = Math.log10(40 + zeroCelsius);
  const hot = Math.log10(100 + zeroCelsius);
  const B = (W(viscosity40) - W(viscosity100)) / (hot - cold);
  const A = W(viscosity40) + B * cold;
  return (T) => 10 ** (10 ** (A - B * Math.log10(T))) - 0.7;
}

/** Thermal expansion of lubricating oils: α₁₅ = 0.6278/ρ₁₅, ρ = ρ₁₅ exp(−α Δt (1 + 0.8 α Δt)). */
function densityOf(density15: number): Curve {
  const alpha = 0.6278 / density15;
  const at = (T: number): number => {
    const step = T - zeroCelsius - 15;
    return density15 * Math.exp(-alpha * step * (1 + 0.8 * alpha * step));
  };
  return { at, slope: (T) => -at(T) * alpha * (1 + 1.6 * alpha * (T - zeroCelsius - 15)) };
}

/** Density of water at 60 °F, to which a specific gravity refers, kg/m³. */
const waterAt60F = 999.016;

/** The oil of a data sheet as a fluid; contradictory or missing figures are a `Problem`. */
export function mineralOil(sheet: OilSheet): Fluid | Problem {
  if (!(sheet.viscosity40 > sheet.viscosity100 && sheet.viscosity100 >= 1)) {
    return valueProblem(
      "fluid",
      `An oil of ${sheet.viscosity40} mm²/s at 40 °C cannot have ${sheet.viscosity100} mm²/s at 100 °C; the second must be smaller, and 1 or more.`,
    );
  }
  if (!(sheet.density15 > 600 && sheet.density15 < 1200))
    return valueProblem("fluid", `A density of ${sheet.density15} kg/m³ at 15 °C is none of a mineral oil.`);
  const nu = kinematicViscosity(sheet.viscosity40, sheet.viscosity100);
  const density = densityOf(sheet.density15);
  const gravity = sheet.density15 / waterAt60F;
  return fittedLiquid({
    name: sheet.name,
    synonyms: [],
    family: "oil",
    sources: sheet.sources,
    T: sheet.T,
    density,
    // Cragoe 1929
    cp: { at: (T) => (1685 + 3.4 * (T - zeroCelsius)) / Math.sqrt(gravity), slope: () => 3.4 / Math.sqrt(gravity) },
    conductivity: { at: (T) => (0.1172 * (1 - 5.4e-4 * (T - zeroCelsius))) / gravity, slope: () => (-0.1172 * 5.4e-4) / gravity },
    viscosity: numerical((T) => 1e-6 * nu(T) * density.at(T)),
    uncertainty: {
      density: 0.02,
      cp: 0.05,
      viscosity: sheet.viscosityUncertainty,
      conductivity: 0.1,
      expansivity: 0.1,
      origin: "common practice",
    } satisfies Uncertainty,
    flashPoint: sheet.flashPoint + zeroCelsius,
    cautions: sheet.cautions ?? [],
  });
}

// ---- gear and machine oils by ISO grade ----------------------------------------------------------------------------------------------

const gearRange = [-5 + zeroCelsius, 150 + zeroCelsius] as const;
const gearSources = ["iso-3448", "astm-d341", "astm-d2270", "cragoe-1929", "api-mpms-11.1"] as const;
/** Of a paraffinic mineral gear oil; common practice. */
const usualIndex = 95;

/** A mineral gear oil of an ISO viscosity grade with an index of 95 and the density usual for its grade. */
function gearOil(grade: number): Fluid | Problem {
  return mineralOil({
    name: `gear oil ${grade}`,
    viscosity40: grade,
    viscosity100: viscosityAt100(grade, usualIndex),
    density15: 815 + 15 * Math.log(grade),
    flashPoint: grade < 100 ? 180 : 200,
    T: gearRange,
    sources: gearSources,
    // The grade allows ±10 % at 40 °C; the index of mineral oils, 90 to 100, adds as much at the ends.
    viscosityUncertainty: 0.2,
    cautions: [
      "Viscosity from the ISO grade with a viscosity index of 95; synthetic and multigrade oils differ: give the data sheet's figures in a table.",
    ],
  });
}

const gear: ShelfEntry = {
  name: "gear oil",
  synonyms: [
    "gear oil VG",
    "gear oil ISO VG",
    "ISO VG",
    "VG",
    "hydraulic oil",
    "hydraulic oil VG",
    "hydraulic oil ISO VG",
    "machine oil",
    "mineral oil ISO VG",
    "turbine oil",
  ],
  family: "oil",
  sources: gearSources,
  summary: "Mineral gear, machine or hydraulic oil by its ISO viscosity grade; estimates from grade and density.",
  range: { T: gearRange, p: fitPressureRange },
  uncertainty: "density 2 %, cp 5 %, viscosity 20 %, conductivity 10 %",
  parameter: { meaning: "ISO viscosity grade", unit: "", limits: [10, 1500], example: 220 },
  fluid: (grade = 220) => gearOil(grade),
};

// ---- other oils by typical sheets ----------------------------------------------------------------------------------------------------

interface TypicalOil extends Omit<OilSheet, "sources"> {
  readonly synonyms: readonly string[];
  readonly summary: string;
  readonly source: "quench-oil-typical-values" | "transformer-oil-typical-values";
}

const quenchCaution =
  "Quench oil ages, and water in it is dangerous: fire and explosion hazard; local codes and licensed practice come first.";

const typicalOils: readonly TypicalOil[] = [
  {
    name: "transformer oil",
    synonyms: ["mineral transformer oil", "insulating oil", "mineral insulating oil"],
    summary: "Uninhibited mineral insulating oil, typical of the standard's class: 9.5 mm²/s at 40 °C.",
    source: "transformer-oil-typical-values",
    viscosity40: 9.5,
    viscosity100: 2.5,
    density15: 880,
    flashPoint: 135,
    T: [-30 + zeroCelsius, 110 + zeroCelsius],
    viscosityUncertainty: 0.15,
  },
  {
    name: "quench oil, fast",
    synonyms: ["fast quench oil", "fast quenching oil", "quench oil fast", "accelerated quench oil"],
    summary: "Fast quench oil, typical: 14 mm²/s at 40 °C.",
    source: "quench-oil-typical-values",
    viscosity40: 14,
    viscosity100: 3.2,
    density15: 865,
    flashPoint: 170,
    T: [10 + zeroCelsius, 150 + zeroCelsius],
    viscosityUncertainty: 0.3,
    cautions: [quenchCaution],
  },
  {
    name: "quench oil, medium",
    synonyms: ["medium quench oil", "medium quenching oil", "quench oil medium", "quench oil", "medium speed quench oil"],
    summary: "Medium-speed quench oil, typical: 22 mm²/s at 40 °C.",
    source: "quench-oil-typical-values",
    viscosity40: 22,
    viscosity100: 4.3,
    density15: 870,
    flashPoint: 190,
    T: [10 + zeroCelsius, 160 + zeroCelsius],
    viscosityUncertainty: 0.3,
    cautions: [quenchCaution],
  },
  {
    name: "quench oil, hot",
    synonyms: ["marquench oil", "martempering oil", "hot quench oil"],
    summary: "Hot quench oil for martempering, typical: 100 mm²/s at 40 °C.",
    source: "quench-oil-typical-values",
    viscosity40: 100,
    viscosity100: 11.2,
    density15: 885,
    flashPoint: 240,
    T: [40 + zeroCelsius, 200 + zeroCelsius],
    viscosityUncertainty: 0.3,
    cautions: [quenchCaution],
  },
];

function typicalEntry(oil: TypicalOil): ShelfEntry {
  const sources = [oil.source, "astm-d341", "cragoe-1929", "api-mpms-11.1"];
  return {
    name: oil.name,
    synonyms: oil.synonyms,
    family: "oil",
    sources,
    summary: oil.summary,
    range: { T: oil.T, p: fitPressureRange },
    uncertainty: `density 2 %, cp 5 %, viscosity ${Math.round(100 * oil.viscosityUncertainty)} %, conductivity 10 %`,
    fluid: () => mineralOil({ ...oil, sources }),
  };
}

export const mineralOils: readonly ShelfEntry[] = [gear, ...typicalOils.map(typicalEntry)];
