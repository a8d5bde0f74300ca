/**
 * One continuous law for round tubes from laminar to turbulent flow: laminar composite held above Re 2300, Gnielinski held below Re 4000,
 * and between them his linear interpolation. D_L is diameter / length, or diameter / distance from the inlet for local values; 0 is developed flow.
 */
import type { Correlation } from "./correlation.js";
import { gnielinskiTubeHLocal, gnielinskiTubeTLocal, gnielinskiTubeTMeanThermal, levequeTubeHMean } from "./tube-laminar.js";
import { gnielinski2013Tube, gnielinski2013TubeLocal } from "./tube-turbulent.js";

type Wall = "isothermal" | "uniform flux";
type Extent = "mean" | "local";

/** The laminar part without its own x/(D*Re*Pr), which is infinite where the flow is developed. */
function laminarPart(record: Correlation): Correlation {
  return { ...record, lines: { ...record.lines, Gz: "ReL*Pr*D_L" } };
}

function tubeDefault(id: string, laminar: Correlation, wall: Wall, extent: Extent): Correlation {
  return {
    id,
    name: `Gnielinski, laminar to turbulent, ${wall === "isothermal" ? "uniform temperature" : wall}, ${extent}`,
    serves: ["DUCT.TUBE"],
    result: "Nu",
    extent,
    wall,
    propertiesAt: "bulk",
    length: "diameter",
    parts: {
      lam: { of: laminarPart(laminar) },
      turb: { of: extent === "mean" ? gnielinski2013Tube : gnielinski2013TubeLocal, with: { Re: "MAX(Re,4000)" } },
    },
    lines: {
      ReL: "MIN(Re,2300)",
      gamma: "MAX(0,MIN(1,(Re-2300)/1700))",
      PrT: "IF(Re<=2300,1,Pr)",
      Nu: "(1-gamma)*Nu_lam+gamma*Nu_turb",
    },
    ranges: { Re: [1, 1e6], D_L: [0, 1], PrT: [0.5, 2000] },
    rangeOrigin: "published",
    scatter: {
      value: 0.1,
      origin: "common practice",
      by: {
        symbol: "Re",
        steps: [
          [2300, 0.07],
          [4000, 0.3],
          [Number.POSITIVE_INFINITY, 0.1],
        ],
      },
    },
    source: { work: "gnielinski-2013", at: "also VDI Heat Atlas, sect. G1" },
    confidence: "N",
    note: "Laminar part with developed velocity; an undeveloped velocity gives more near the inlet. Property factor apart. The Pr limits hold where the flow is not laminar: PrT is 1 there.",
    symbols: {
      PrT: "Pr where the turbulent part counts, 1 in laminar flow",
      gamma: "share of the turbulent value between Re 2300 and 4000",
      ReL: "Re, held at 2300",
    },
  };
}

export const tubeDefaultTMean = tubeDefault("tube-default-T-mean", gnielinskiTubeTMeanThermal, "isothermal", "mean");
export const tubeDefaultTLocal = tubeDefault("tube-default-T-local", gnielinskiTubeTLocal, "isothermal", "local");
export const tubeDefaultHMean = tubeDefault("tube-default-H-mean", levequeTubeHMean, "uniform flux", "mean");
export const tubeDefaultHLocal = tubeDefault("tube-default-H-local", gnielinskiTubeHLocal, "uniform flux", "local");
