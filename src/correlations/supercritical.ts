/** Fluids above their critical pressure in tubes; normal heat transfer only. */
import type { Correlation } from "./correlation.js";

export const jackson2002Supercritical: Correlation = {
  id: "jackson-2002-supercritical",
  name: "Jackson (Krasnoshchekov-Protopopov family), supercritical water and CO2",
  serves: ["DUCT.TUBE"],
  result: "Nu",
  extent: "either",
  wall: "uniform flux",
  propertiesAt: "bulk",
  propertiesNote: "ratios at the wall",
  length: "diameter",
  lines: {
    n: "IF(OR(Tw<=Tpc,Tb>=1.2*Tpc),0.4,IF(Tb<=Tpc,0.4+0.2*(Tw/Tpc-1),0.4+0.2*(Tw/Tpc-1)*(1-5*(Tb/Tpc-1))))",
    Nu: "0.0183*Re^0.82*Pr^0.5*rhow_rhob^0.3*cpm_cpb^n",
  },
  ranges: { Re: [2e4, 1e6], Pr: [0.8, 30] },
  rangeOrigin: "from memory",
  scatter: { value: 0.25, origin: "common practice" },
  source: { work: "jackson-2013" },
  confidence: "N",
  note: "Constants confirmed, range from memory. Normal heat transfer only, forced flow with negligible buoyancy; absolute temperatures. Deterioration of heat transfer is not predicted.",
  symbols: {
    Tw: "wall temperature, K",
    Tpc: "temperature where cp peaks at this pressure, K",
    rhow_rhob: "density at the wall / in the bulk",
    cpm_cpb: "enthalpy difference over temperature difference, wall to bulk, over cp in the bulk",
  },
};

export const mokry2011SupercriticalWater: Correlation = {
  id: "mokry-2011-supercritical-water",
  name: "Mokry et al., supercritical water, upward",
  serves: ["DUCT.TUBE"],
  result: "Nu",
  extent: "either",
  wall: "uniform flux",
  propertiesAt: "bulk",
  propertiesNote: "mean cp in Prm",
  length: "diameter",
  lines: { Nu: "0.0061*Re^0.904*Prm^0.684*rhow_rhob^0.564" },
  ranges: { Re: [2e4, 5e5], Prm: [0.7, 10], rhow_rhob: [0.1, 1] },
  rangeOrigin: "from memory",
  scatter: { value: 0.25, origin: "published" },
  source: { work: "mokry-pioro-2011" },
  confidence: "N",
  note: "Constants confirmed, range from memory. 24 MPa, 200-1500 kg/(m2 s), flux to 1250 kW/m2, bare vertical tube 10 mm.",
  symbols: { Prm: "Prandtl number with the mean cp between wall and bulk", rhow_rhob: "density at the wall / in the bulk" },
};
