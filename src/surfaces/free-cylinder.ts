import { serving } from "./candidates.js";
import type { Surface } from "./surface.js";

const prefers = ["churchill-chu-1975-cylinder-all", "churchill-chu-1975-cylinder-laminar", "morgan-1975-free-cylinder"];

/** A long horizontal cylinder or wire in still fluid. */
export const freeCylinder: Surface = {
  id: "FREE.CYLINDER",
  title: "Horizontal cylinder, free convection",
  describe: "Film coefficient of free convection on a long horizontal cylinder, pipe or wire.",
  motion: "free",
  wallName: "surface",
  reference: "the bulk temperature far from the cylinder",
  arguments: [{ key: "diameter", name: "diameter", dimensions: ["length"], sign: "positive", describe: "outside diameter, m" }],
  settings: [],
  groups: () => ({ L: "diameter" }),
  candidates: serving("FREE.CYLINDER", prefers),
  prefers,
  preference: "Churchill & Chu 1975 for all Ra: continuous, with a limit as Ra goes to zero",
  regime: (_, value) => (value("Ra") < 1e9 ? "laminar" : "turbulent"),
};
