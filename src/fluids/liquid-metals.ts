/** Liquid metals and molten salts at about atmospheric pressure, by the handbooks' fits. */
import { type Curve, exponentialOf, numerical, polynomial } from "./fit.js";
import { fitPressureRange, fittedLiquid } from "./fitted-liquid.js";
import type { Uncertainty } from "./fluid.js";
import { type MetalFit, type MetalRecord, metals } from "./records/liquid-metals.js";
import type { ShelfEntry } from "./shelf-entry.js";

const zeroCelsius = 273.15;

export const liquidMetals: readonly ShelfEntry[] = metals.map(entryOf);

function entryOf(record: MetalRecord): ShelfEntry {
  const { density, cp, viscosity, conductivity } = record.uncertainty;
  const percent = (fraction: number): string => `${Number((100 * fraction).toPrecision(2))} %`;
  return {
    name: record.name,
    synonyms: record.synonyms,
    family: "metal or salt",
    sources: record.sources,
    summary: record.summary,
    range: { T: record.T, p: fitPressureRange },
    uncertainty: `density ${percent(density)}, cp ${percent(cp)}, viscosity ${percent(viscosity)}, conductivity ${percent(conductivity)}`,
    fluid: () =>
      fittedLiquid({
        name: record.name,
        synonyms: record.synonyms,
        family: "metal or salt",
        sources: record.sources,
        T: record.T,
        density: curveOf(record.density),
        cp: curveOf(record.cp),
        viscosity: curveOf(record.viscosity),
        conductivity: curveOf(record.conductivity),
        uncertainty: uncertaintyOf(record),
        freezingPoint: record.melting,
        ...(record.molarMass !== undefined && { molarMass: record.molarMass }),
        ...(record.vapourPressure && { vapourPressure: curveOf(record.vapourPressure).at }),
        cautions: record.cautions,
      }),
  };
}

function uncertaintyOf(record: MetalRecord): Uncertainty {
  return { ...record.uncertainty, expansivity: 0.1, origin: record.origin };
}

function curveOf(fit: MetalFit): Curve {
  switch (fit.form) {
    case "kelvin":
      return polynomial(fit.c);
    case "celsius":
      return polynomial(fit.c, zeroCelsius);
    case "from":
      return polynomial(fit.c, fit.base);
    case "with inverse square": {
      const plain = polynomial(fit.c);
      return { at: (T) => plain.at(T) + fit.d / (T * T), slope: (T) => plain.slope(T) - (2 * fit.d) / (T * T * T) };
    }
    case "Arrhenius":
      return exponentialOf({ at: (T) => Math.log(fit.a) + fit.b / T, slope: (T) => -fit.b / (T * T) });
    case "function":
      return numerical(fit.at);
  }
}
