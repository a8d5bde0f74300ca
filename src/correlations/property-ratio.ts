/** Factors on Nu for properties that vary between bulk and wall. */
import type { Correlation } from "./correlation.js";

export const propertyLiquidPr: Correlation = {
  id: "property-liquid-pr",
  name: "Liquids, Prandtl ratio",
  serves: ["DUCT.TUBE"],
  result: "factor",
  extent: "either",
  wall: "either",
  propertiesAt: "bulk",
  propertiesNote: "ratio of bulk to wall",
  length: "none",
  lines: { Factor: "Pr_Prw^0.11" },
  ranges: { Pr_Prw: [0.05, 20] },
  rangeOrigin: "from memory",
  scatter: { value: 0.1, origin: "common practice" },
  source: { work: "gnielinski-1976" },
  confidence: "M",
  note: "From memory. Hufschmidt & Burck; turbulent heating and cooling. Petukhov: viscosity ratio ^0.11 heating, ^0.25 cooling. Laminar: viscosity ratio ^0.14.",
};

export const propertyLiquidViscosity: Correlation = {
  id: "property-liquid-viscosity",
  name: "Liquids, viscosity ratio (Petukhov)",
  serves: ["DUCT.TUBE"],
  result: "factor",
  extent: "either",
  wall: "either",
  propertiesAt: "bulk",
  propertiesNote: "ratio of bulk to wall",
  length: "none",
  lines: {
    n: "IF(mub_muw>1,0.11,0.25)",
    Factor: "mub_muw^n",
  },
  ranges: { mub_muw: [0.025, 12.5] },
  rangeOrigin: "from memory",
  scatter: { value: 0.1, origin: "common practice" },
  source: { work: "petukhov-1970" },
  confidence: "M",
  note: "From memory. 0.11 heating (wall hotter, ratio above 1), 0.25 cooling. Range of the paper: 0.08 < muw/mub < 40.",
};

export const propertyGasTemperature: Correlation = {
  id: "property-gas-temperature",
  name: "Gases, temperature ratio",
  serves: ["DUCT.TUBE"],
  result: "factor",
  extent: "either",
  wall: "either",
  propertiesAt: "bulk",
  propertiesNote: "ratio of bulk to wall, absolute temperatures",
  length: "none",
  lines: { Factor: "IF(Tb_Tw<1,Tb_Tw^0.45,1)" },
  ranges: { Tb_Tw: [0.5, 2] },
  rangeOrigin: "from memory",
  scatter: { value: 0.1, origin: "common practice" },
  source: { work: "gnielinski-1976" },
  confidence: "M",
  note: "From memory. Heated gas 0.5 < Tb/Tw < 1; cooled gas no correction. CO2: 0.12; steam: -0.18 with 0.67 < Tb/Tw < 1 (VDI Heat Atlas).",
};
