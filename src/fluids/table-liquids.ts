/** Liquids known by a handbook's table: monotone interpolation between its rows, viscosity in its logarithm. */
import type { WorkKey } from "../bibliography.js";
import { type Curve, exponentialOf } from "./fit.js";
import { fitPressureRange, fittedLiquid } from "./fitted-liquid.js";
import type { Uncertainty } from "./fluid.js";
import { monotone } from "./interpolation.js";
import type { ShelfEntry } from "./shelf-entry.js";

interface TableLiquid {
  readonly name: string;
  readonly synonyms: readonly string[];
  readonly summary: string;
  readonly sources: readonly WorkKey[];
  /** 1/K, the table's own column. */
  readonly expansivity: number;
  /** °C, typical, from memory. */
  readonly flashPoint: number;
  readonly cautions: readonly string[];
  /** K, kg/m³, J/(kg·K), Pa·s, W/(m·K) */
  readonly rows: readonly (readonly [number, number, number, number, number])[];
}

const liquids: readonly TableLiquid[] = [
  {
    name: "engine oil, unused",
    synonyms: ["engine oil", "unused engine oil", "motor oil"],
    summary: "Unused engine oil by the saturated-liquid table of a heat-transfer textbook, from memory; oils differ by grade.",
    sources: ["incropera-a5"],
    expansivity: 7e-4,
    flashPoint: 200,
    cautions: ["Oils of different grade differ several times in viscosity; the bounds hold the table's reading only."],
    rows: [
      [273, 899.1, 1796, 3.85, 0.147],
      [280, 895.3, 1827, 2.17, 0.144],
      [290, 890.0, 1868, 0.999, 0.145],
      [300, 884.1, 1909, 0.486, 0.145],
      [310, 877.9, 1951, 0.253, 0.145],
      [320, 871.8, 1993, 0.141, 0.143],
      [330, 865.8, 2035, 0.0836, 0.141],
      [340, 859.9, 2076, 0.0531, 0.139],
      [350, 853.9, 2118, 0.0356, 0.138],
      [360, 847.8, 2161, 0.0252, 0.138],
      [370, 841.8, 2206, 0.0186, 0.137],
      [380, 836.0, 2250, 0.0141, 0.136],
      [390, 830.6, 2294, 0.011, 0.135],
      [400, 825.1, 2337, 0.00874, 0.134],
      [410, 818.9, 2381, 0.00698, 0.133],
      [420, 812.1, 2427, 0.00564, 0.133],
      [430, 806.5, 2471, 0.0047, 0.132],
    ],
  },
  {
    name: "glycerol",
    synonyms: ["glycerin", "glycerine", "propane-1,2,3-triol"],
    summary: "Pure glycerol by the saturated-liquid table of a heat-transfer textbook, from memory; a little water thins it much.",
    sources: ["incropera-a5"],
    expansivity: 4.8e-4,
    flashPoint: 160,
    cautions: ["Glycerol takes up water from air; one per cent of it lowers the viscosity by about a fifth."],
    rows: [
      [273, 1276.0, 2261, 10.6, 0.282],
      [280, 1271.9, 2298, 5.34, 0.284],
      [290, 1265.8, 2367, 1.85, 0.286],
      [300, 1259.9, 2427, 0.799, 0.286],
      [310, 1253.9, 2490, 0.352, 0.286],
      [320, 1247.2, 2564, 0.21, 0.287],
    ],
  },
];

const usual: Uncertainty = { density: 0.005, cp: 0.02, viscosity: 0.1, conductivity: 0.05, expansivity: 0.05, origin: "common practice" };

export const tableLiquids: readonly ShelfEntry[] = liquids.map((liquid) => {
  const first = liquid.rows[0] as TableLiquid["rows"][number];
  const last = liquid.rows[liquid.rows.length - 1] as TableLiquid["rows"][number];
  const T = [first[0], last[0]] as const;
  return {
    name: liquid.name,
    synonyms: liquid.synonyms,
    family: "oil",
    sources: liquid.sources,
    summary: liquid.summary,
    range: { T, p: fitPressureRange },
    uncertainty: "density 0.5 %, cp 2 %, viscosity 10 %, conductivity 5 %",
    fluid: () => {
      const temperatures = liquid.rows.map((row) => row[0]);
      const through = (column: 1 | 2 | 4): Curve =>
        monotone(
          temperatures,
          liquid.rows.map((row) => row[column]),
        );
      return fittedLiquid({
        name: liquid.name,
        synonyms: liquid.synonyms,
        family: "oil",
        sources: liquid.sources,
        T,
        density: through(1),
        cp: through(2),
        viscosity: exponentialOf(
          monotone(
            temperatures,
            liquid.rows.map((row) => Math.log(row[3])),
          ),
        ),
        conductivity: through(4),
        expansivity: liquid.expansivity,
        uncertainty: usual,
        flashPoint: liquid.flashPoint + 273.15,
        cautions: liquid.cautions,
      });
    },
  };
});
