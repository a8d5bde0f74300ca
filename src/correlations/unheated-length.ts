/** Factors for a plate whose heating begins behind its leading edge; xi is the unheated part of the length. */
import type { Correlation } from "./correlation.js";

export const unheatedLengthLaminarLocal: Correlation = {
  id: "unheated-length-laminar-local",
  name: "Unheated starting length, laminar, local factor",
  serves: ["FORCED.PLATE"],
  result: "factor",
  extent: "local",
  wall: "isothermal",
  propertiesAt: "film",
  length: "x",
  lines: { Factor: "1/(1-xi^0.75)^(1/3)" },
  ranges: { xi: [0, 0.99] },
  rangeOrigin: "customary",
  scatter: { value: 0.05, origin: "common practice" },
  source: { work: "eckert-1942", at: "as in Kays & Crawford, Convective Heat and Mass Transfer" },
  confidence: "M",
  note: "From memory. xi = unheated length / x.",
};

export const unheatedLengthTurbulentLocal: Correlation = {
  id: "unheated-length-turbulent-local",
  name: "Unheated starting length, turbulent, local factor",
  serves: ["FORCED.PLATE"],
  result: "factor",
  extent: "local",
  wall: "isothermal",
  propertiesAt: "film",
  length: "x",
  lines: { Factor: "1/(1-xi^0.9)^(1/9)" },
  ranges: { xi: [0, 0.99] },
  rangeOrigin: "customary",
  scatter: { value: 0.1, origin: "common practice" },
  source: { work: "reynolds-kays-1958" },
  confidence: "M",
  note: "From memory.",
};

export const unheatedLengthLaminarMean: Correlation = {
  id: "unheated-length-laminar-mean",
  name: "Unheated starting length, laminar, mean factor",
  serves: ["FORCED.PLATE"],
  result: "factor",
  extent: "mean",
  wall: "isothermal",
  propertiesAt: "film",
  length: "length",
  lines: { Factor: "(1-xi^0.75)^(2/3)/(1-xi)" },
  ranges: { xi: [0, 0.99] },
  rangeOrigin: "customary",
  scatter: { value: 0.05, origin: "common practice" },
  source: { work: "ameel-1997" },
  confidence: "M",
  note: "From memory. Mean over the heated part; Nu on the whole length L. General: L/(L-xi L)*(1-xi^((p+1)/(p+2)))^(p/(p+1)) with p = 2 laminar, 8 turbulent.",
};

export const unheatedLengthTurbulentMean: Correlation = {
  id: "unheated-length-turbulent-mean",
  name: "Unheated starting length, turbulent, mean factor",
  serves: ["FORCED.PLATE"],
  result: "factor",
  extent: "mean",
  wall: "isothermal",
  propertiesAt: "film",
  length: "length",
  lines: { Factor: "(1-xi^0.9)^(8/9)/(1-xi)" },
  ranges: { xi: [0, 0.99] },
  rangeOrigin: "customary",
  scatter: { value: 0.1, origin: "common practice" },
  source: { work: "ameel-1997" },
  confidence: "M",
  note: "From memory.",
};
