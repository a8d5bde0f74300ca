/** Pipe bends. */
import type { Correlation } from "./correlation.js";

export const ito1960BendLoss90: Correlation = {
  id: "ito-1960-bend-loss-90",
  name: "Ito, loss coefficient of a 90 degree smooth bend",
  serves: ["DUCT.BEND"],
  result: "pressure",
  extent: "either",
  wall: "either",
  propertiesAt: "bulk",
  length: "diameter",
  lines: {
    bend: "IF(R_r<19.7,0.95+17.2/R_r^1.96,1)",
    K: "0.00241*bend*90*R_r^0.84/Re^0.17",
  },
  ranges: { Re: [2e4, 4e5], R_r: [2, 50] },
  rangeOrigin: "from memory",
  scatter: { value: 0.1, origin: "common practice" },
  source: { work: "ito-1960" },
  confidence: "M",
  note: "From memory. Total loss on rho*u^2/2, including the friction of the bend; R_r = bend radius / tube RADIUS. For Re/R_r^2 above 91. Other angles: 45 degrees 1+14.2/R_r^1.47, 180 degrees 1+116/R_r^4.52.",
  symbols: { R_r: "bend radius / tube radius" },
};
