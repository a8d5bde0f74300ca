/**
 * Organic heat-transfer liquids by generic chemistry: fits to makers' typical values and to Melinder's handbook. Nothing here is a
 * specification of a product; the supplier's data come first.
 */
import { type Curve, curveOf, type Fit } from "./fit.js";
import { fitPressureRange, fittedLiquid } from "./fitted-liquid.js";
import type { Uncertainty } from "./fluid.js";
import records from "./records/heat-transfer-liquids.json";
import type { ShelfEntry } from "./shelf-entry.js";

interface LiquidRecord {
  readonly name: string;
  readonly T: readonly [number, number];
  readonly base: readonly [number, number];
  readonly density: Fit;
  readonly cp: Fit;
  readonly viscosity: Fit;
  readonly conductivity: Fit;
  readonly vapourPressure?: Fit;
}

interface About {
  readonly synonyms: readonly string[];
  readonly chemistry: string;
  /** °C, typical of the chemistry and on the safe side, from memory; absent where none is known or the liquid does not burn. */
  readonly flashPoint?: number;
  readonly note?: string;
}

const about: Readonly<Record<string, About>> = {
  "diphenyl oxide/biphenyl eutectic": {
    synonyms: [
      "diphenyl/diphenyl oxide eutectic",
      "diphenyl-diphenyl oxide eutectic",
      "biphenyl/diphenyl oxide eutectic",
      "diphenyl oxide",
      "diphenyl ether/biphenyl",
    ],
    chemistry: "73.5 % diphenyl oxide and 26.5 % biphenyl by mass",
    flashPoint: 113,
  },
  "diethylbenzene isomer mixture": {
    synonyms: ["diethylbenzene"],
    chemistry: "alkylated aromatic, isomers of diethylbenzene",
    flashPoint: 55,
  },
  "diethylbenzene mixture (handbook)": {
    synonyms: ["diethylbenzene low temperature"],
    chemistry: "diethylbenzene mixture for low temperatures",
    flashPoint: 55,
  },
  "diphenylethane/alkylated aromatics blend": {
    synonyms: ["diphenylethane"],
    chemistry: "diphenylethane with alkylated aromatics",
    flashPoint: 120,
  },
  "partially hydrogenated terphenyl": {
    synonyms: ["hydrogenated terphenyl", "modified terphenyl"],
    chemistry: "modified terphenyl",
    flashPoint: 170,
  },
  "synthetic aromatic mixture": {
    synonyms: [],
    chemistry: "blend of diphenyl oxide, biphenyl, terphenyl and phenanthrene types",
    flashPoint: 130,
  },
  "isoparaffinic synthetic hydrocarbon": {
    synonyms: ["isoparaffin"],
    chemistry: "synthetic isoparaffins of low viscosity",
    flashPoint: 59,
  },
  "isoparaffinic hydrocarbon mixture (handbook)": { synonyms: [], chemistry: "hydrocarbon mixture for low temperatures", flashPoint: 59 },
  "hydrocarbon blend (handbook)": { synonyms: [], chemistry: "hydrocarbon blend for low temperatures", flashPoint: 40 },
  "polydimethylsiloxane, high-temperature grade": {
    synonyms: ["silicone heat-transfer fluid", "dimethyl silicone high temperature"],
    chemistry: "methyl silicone, about 9 mm²/s at 25 °C",
    flashPoint: 160,
  },
  "polydimethylsiloxane, low-viscosity grade": {
    synonyms: ["dimethyl silicone low viscosity"],
    chemistry: "methyl silicone, about 1.4 mm²/s at 20 °C",
    flashPoint: 47,
  },
  "polydimethylsiloxane grade A (handbook)": { synonyms: [], chemistry: "methyl silicone", flashPoint: 47 },
  "polydimethylsiloxane grade B (handbook)": { synonyms: [], chemistry: "methyl silicone of low viscosity", flashPoint: 40 },
  "synthetic alkyl benzene (handbook)": { synonyms: [], chemistry: "alkyl benzene", flashPoint: 60 },
  "d-limonene (handbook)": { synonyms: ["d-limonene", "limonene"], chemistry: "citrus terpene", flashPoint: 46 },
  "methoxy-nonafluorobutane (handbook)": { synonyms: [], chemistry: "hydrofluoroether C4F9OCH3" },
  "methoxy-nonafluorobutane": {
    synonyms: ["C4F9OCH3", "hydrofluoroether", "methoxynonafluorobutane"],
    chemistry: "hydrofluoroether C4F9OCH3",
  },
  "hydrotreated mineral oil": { synonyms: ["white mineral oil"], chemistry: "hydrotreated white mineral oil", flashPoint: 170 },
  "paraffinic mineral oil": { synonyms: [], chemistry: "highly refined paraffinic mineral oil", flashPoint: 170 },
  "alkyl benzene, long chain": {
    synonyms: ["alkylbenzene long chain", "long-chain alkyl benzene"],
    chemistry: "alkylated aromatic",
    flashPoint: 170,
  },
  "alkylated aromatic, high range": { synonyms: [], chemistry: "alkylated aromatic for high bulk temperature", flashPoint: 140 },
  "aliphatic hydrocarbon, low range": { synonyms: [], chemistry: "paraffinic hydrocarbon for low temperatures", flashPoint: 55 },
  "synthetic hydrocarbon, medium range": { synonyms: [], chemistry: "synthetic hydrocarbon", flashPoint: 140 },
  "low-temperature hydrocarbon blend": { synonyms: [], chemistry: "hydrocarbon blend for cryogenic service", flashPoint: 35 },
  "paraffinic mineral heat-transfer oil": {
    synonyms: ["mineral heat-transfer oil", "thermal oil"],
    chemistry: "mineral oil",
    flashPoint: 200,
  },
  "mineral heat-transfer oil, basic grade": { synonyms: [], chemistry: "mineral oil", flashPoint: 190 },
  "alkylated aromatics": {
    synonyms: [],
    chemistry: "alkylated aromatic",
    flashPoint: 140,
    note: "The density fit of this liquid scatters by 3 %.",
  },
  "aliphatic hydrocarbon": { synonyms: [], chemistry: "aliphatic hydrocarbon for low temperatures", flashPoint: 60 },
};

const usual: Uncertainty = { density: 0.01, cp: 0.03, viscosity: 0.1, conductivity: 0.05, expansivity: 0.1, origin: "common practice" };
const scattered: Uncertainty = { ...usual, density: 0.03, expansivity: 0.2 };
const typical =
  "Typical values of this chemistry, not of a product: ask the supplier for the one in use, and for its film temperature limit.";

export const heatTransferLiquids: readonly ShelfEntry[] = (records as readonly unknown[] as readonly LiquidRecord[]).map(entryOf);

function entryOf(record: LiquidRecord): ShelfEntry {
  const { synonyms, chemistry, flashPoint, note } = about[record.name] ?? { synonyms: [], chemistry: record.name };
  const source = record.name.includes("(handbook)") ? "melinder-2010" : "supplier-typical-values";
  const uncertainty = note === undefined ? usual : scattered;
  const curve = (fit: Fit): Curve => curveOf(fit, record.base, 0);
  return {
    name: record.name,
    synonyms,
    family: "oil",
    sources: [source],
    summary: `${chemistry.charAt(0).toUpperCase()}${chemistry.slice(1)}; typical values, no product is meant.`,
    range: { T: record.T, p: fitPressureRange },
    uncertainty: `density ${100 * uncertainty.density} %, cp 3 %, viscosity 10 %, conductivity 5 %`,
    fluid: () =>
      fittedLiquid({
        name: record.name,
        synonyms,
        family: "oil",
        sources: [source],
        T: record.T,
        density: curve(record.density),
        cp: curve(record.cp),
        viscosity: curve(record.viscosity),
        conductivity: curve(record.conductivity),
        uncertainty,
        ...(flashPoint !== undefined && { flashPoint: flashPoint + 273.15 }),
        ...(record.vapourPressure && { vapourPressure: curve(record.vapourPressure).at }),
        cautions: note === undefined ? [typical] : [typical, note],
      }),
  };
}
