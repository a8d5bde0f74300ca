import type { Correlation } from "../correlations/correlation.js";
import { serving } from "./candidates.js";
import type { Circumstances, Surface } from "./surface.js";

const whenLeaving = ["raithby-hollands-1998-top", "hedh-1983-top", "lloyd-moran-1974-top-turbulent"];
const whenHeld = ["raithby-hollands-1998-under", "mcadams-1954-under"];
const unstable = serving("FREE.TOPFACE", whenLeaving);
const stable = serving("FREE.UNDERSIDE", whenHeld);

const sides = [
  { key: "length", name: "length", dimensions: ["length"], sign: "positive", describe: "one side of the face, m" },
  { key: "width", name: "width", dimensions: ["length"], sign: "positive", describe: "the other side of the face, m" },
] as const;

/** Lengths that the sources use: area over perimeter, the shorter side, the mean of the sides. */
const groups: Readonly<Record<string, string>> = {
  L: "length*width/(2*(length+width))",
  wettedArea: "length*width",
  side: "MIN(length,width)",
  meanSide: "(length+width)/2",
  S_L: "side/L",
  M_L: "meanSide/L",
  RaS: "Ra*S_L^3",
  RaM: "Ra*M_L^3",
  ratio: "MIN(length,width)/MAX(length,width)",
};

function regime(value: (symbol: string) => number, leaves: boolean): string {
  if (!leaves) return "fluid held against the face: slow flow to the edges";
  return `plumes leave the face, ${value("Ra") < 1e7 ? "laminar" : "turbulent"}`;
}

function face(id: "FREE.TOPFACE" | "FREE.UNDERSIDE", title: string, describe: string, leavesWhenRising: boolean): Surface {
  const leaves = (at: Circumstances): boolean => at.rising === leavesWhenRising;
  return {
    id,
    title,
    describe,
    motion: "free",
    wallName: "surface",
    reference: "the bulk temperature far from the plate",
    arguments: sides,
    settings: [],
    groups: () => groups,
    candidates: (at): readonly Correlation[] => (leaves(at) ? unstable(at) : stable(at)),
    prefers: [...whenLeaving, ...whenHeld],
    preference: "Raithby & Hollands 1998 for the side that buoyancy decides: continuous over all Ra",
    area: "length*width",
    regime: (at, value) => regime(value, leaves(at)),
  };
}

/** The upper face of a horizontal plate: hot, its fluid rises away; cold, it lies on the face. */
export const freeTopface = face(
  "FREE.TOPFACE",
  "Upper face of a horizontal plate, free convection",
  "Film coefficient of free convection on the upper face of a horizontal plate, hot or cold: the sign of the difference decides.",
  true,
);

/** The lower face of a horizontal plate: hot, its fluid is held under it; cold, it falls away. */
export const freeUnderside = face(
  "FREE.UNDERSIDE",
  "Lower face of a horizontal plate, free convection",
  "Film coefficient of free convection on the lower face of a horizontal plate, hot or cold: the sign of the difference decides.",
  false,
);
