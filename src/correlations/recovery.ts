/** High speed: recovery factors and the reference temperature. */
import type { Correlation } from "./correlation.js";

export const recoveryFactorLaminar: Correlation = {
  id: "recovery-factor-laminar",
  name: "Recovery factor, laminar layer",
  serves: ["BULK.RECOVERY", "FORCED.PLATE"],
  result: "factor",
  extent: "either",
  wall: "either",
  propertiesAt: "film",
  length: "none",
  lines: { r: "Pr^0.5" },
  ranges: { Pr: [0.5, 10] },
  rangeOrigin: "customary",
  scatter: { value: 0.03, origin: "common practice" },
  source: { work: "eckert-1956", at: "theory: Pohlhausen 1921" },
  confidence: "N",
  note: "Pr^(1/2) is 7 % high at Pr 10: keep to Pr below 3 or so for better than 2 %.",
};

export const recoveryFactorTurbulent: Correlation = {
  id: "recovery-factor-turbulent",
  name: "Recovery factor, turbulent layer",
  serves: ["BULK.RECOVERY", "FORCED.PLATE"],
  result: "factor",
  extent: "either",
  wall: "either",
  propertiesAt: "film",
  length: "none",
  lines: { r: "Pr^(1/3)" },
  ranges: { Pr: [0.5, 10] },
  rangeOrigin: "customary",
  scatter: { value: 0.03, origin: "common practice" },
  source: { work: "eckert-1956" },
  confidence: "M",
  note: "From memory.",
};

export const eckert1956ReferenceTemperature: Correlation = {
  id: "eckert-1956-reference-temperature",
  name: "Eckert reference temperature, high speed",
  serves: ["BULK.RECOVERY", "FORCED.PLATE"],
  result: "temperature",
  extent: "either",
  wall: "either",
  propertiesAt: "other",
  propertiesNote: "reference temperature itself",
  length: "none",
  lines: {
    Taw: "Tb*(1+r*(gam-1)/2*Mach^2)",
    Tstar: "Tb+0.50*(Ts-Tb)+0.22*(Taw-Tb)",
  },
  ranges: { Mach: [0.3, 5] },
  rangeOrigin: "customary",
  scatter: { value: 0.05, origin: "common practice" },
  source: { work: "eckert-1955" },
  confidence: "M",
  note: "From memory. Absolute temperatures. Low-speed equations with properties at Tstar, h on Ts - Taw. Large changes of cp: use enthalpies. Upper Mach by agreement; far higher has been used.",
  symbols: { r: "recovery factor", gam: "ratio of specific heats", Mach: "Mach number of the stream" },
};
