import type { Correlation } from "../correlations/correlation.js";
import { serving } from "./candidates.js";
import type { Circumstances, Surface } from "./surface.js";

const prefers = [
  "raithby-hollands-1998-plate",
  "churchill-chu-1975-plate-all",
  "churchill-chu-1975-plate-laminar",
  "raithby-hollands-1998-plate-flux",
  "raithby-hollands-1998-tilted-up",
  "raithby-hollands-1998-tilted-down",
];
const upright = serving("FREE.PLATE", prefers);

function tiltOf(at: Circumstances): number {
  return at.inputs.numbers.slope ?? 0;
}

const standing = new Map<readonly Correlation[], readonly Correlation[]>();

function candidates(at: Circumstances): readonly Correlation[] {
  const all = upright(at);
  const tilt = tiltOf(at);
  if (tilt === 0) {
    const known = standing.get(all) ?? all.filter((record) => !isTilted(record));
    standing.set(all, known);
    return known;
  }
  const looksUp = at.rising ? tilt > 0 : tilt < 0;
  return all.filter((record) => isTilted(record) && facing(record) !== (looksUp ? "down" : "up"));
}

function isTilted(record: Correlation): boolean {
  return record.id.includes("tilted");
}

function facing(record: Correlation): "up" | "down" | "either" {
  if (record.id.endsWith("-up")) return "up";
  return record.id.endsWith("-down") ? "down" : "either";
}

/** A vertical or tilted plate in still fluid. */
export const freePlate: Surface = {
  id: "FREE.PLATE",
  title: "Vertical or tilted plate, free convection",
  describe: "Film coefficient of free convection on a vertical or tilted plate.",
  motion: "free",
  wallName: "surface",
  reference: "the bulk temperature far from the plate",
  arguments: [
    { key: "height", name: "height", dimensions: ["length"], sign: "positive", describe: "height of the plate along its slope, m" },
  ],
  settings: [
    {
      name: "tilt",
      key: "slope",
      kind: "quantity",
      dimensions: ["angle"],
      low: -90,
      high: 90,
      describe: "degrees from vertical, positive when the wetted face looks up",
    },
  ],
  groups: ({ local, given }) => ({ L: local ? "position" : "height", ...(given.has("slope") ? { tilt: "ABS(slope)" } : {}) }),
  candidates,
  prefers,
  preference: "Raithby & Hollands 1998: continuous through transition, the exact layer as its laminar limit",
  regime: (_, value) => (value("Ra") < 1e9 ? "laminar" : "turbulent"),
  // Similarity under a uniform flux: the difference grows with x^(1/5) while laminar, so its largest is 6/5 of its mean.
  peak: (at, value) => (at.local ? undefined : value("Ra") < 1e9 ? 1.2 : 1),
};
