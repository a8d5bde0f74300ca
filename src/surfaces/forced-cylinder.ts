import { correlationById } from "../correlations/index.js";
import { serving } from "./candidates.js";
import { mixedRivals } from "./mixing.js";
import type { Surface } from "./surface.js";

const prefers = ["churchill-bernstein-1977", "zukauskas-1972-cylinder", "hilpert-1933-revised"];

/** A long cylinder across a stream. */
export const forcedCylinder: Surface = {
  id: "FORCED.CYLINDER",
  title: "Cylinder across a stream, forced convection",
  describe: "Film coefficient of forced convection on a long cylinder across the flow, mean around it.",
  motion: "forced",
  wallName: "surface",
  reference: "the free-stream bulk temperature",
  arguments: [
    { key: "flow", name: "speed", dimensions: ["speed"], sign: "not negative", describe: "free-stream speed, m/s" },
    { key: "diameter", name: "diameter", dimensions: ["length"], sign: "positive", describe: "outside diameter, m" },
  ],
  settings: [],
  groups: () => ({ L: "diameter" }),
  candidates: serving("FORCED.CYLINDER", prefers),
  prefers,
  preference: "Churchill & Bernstein 1977: one continuous line over all Re and Pr",
  rivals: (_, value, chosen) =>
    mixedRivals(value("Ri"), chosen, correlationById("churchill-chu-1975-cylinder-all"), correlationById("churchill-1977-cylinder-along")),
  regime: (_, value) => {
    const Re = value("Re");
    if (Re < 5) return "creeping flow";
    if (Re < 40) return "attached vortices";
    return Re < 2e5 ? "subcritical, laminar boundary layer" : "critical or beyond, turbulent boundary layer";
  },
};
