import type { PureRecord } from "../../pure-record.js";

export const r143a: PureRecord = {
  name: "R143a",
  synonyms: ["1,1,1-trifluoroethane", "HFC-143a"],
  family: "refrigerant",
  sources: ["lemmonjacobsen-2000-jpcrd", "klein-1997-ijr", "mclinden-2000-ijr", "mulero-2014-jpcrd"],
  molarMass: 0.084041, gasConstant: 8.314472,
  reducing: { T: 345.857, p: 3761000, rho: 5128.45 },
  critical: { T: 345.857, p: 3761000 },
  T: [161.34, 650], pMax: 100000000,
  ideal: { lead: [-14.5097255563124, 11.3073331727654], logTau: -1, cpPower: [[1.0578, 0.33]], cpFrom: 273.15, einstein: [[4.4402, 5.178440800677737], [3.7515, 2.379596191489546]] },
  residual: { power: [[7.7736443, 0.67, 1, 0], [-8.70185, 0.833, 1, 0], [-0.27779799, 1.7, 1, 0], [0.1460922, 1.82, 2, 0], [0.0089581616, 0.35, 5, 0], [-0.20552116, 3.9, 1, 1], [0.10653258, 0.95, 3, 1], [0.023270816, 0, 5, 1], [-0.013247542, 1.19, 7, 1], [-0.04279387, 7.2, 1, 2], [0.36221685, 5.9, 2, 2], [-0.25671899, 7.65, 2, 2], [-0.092326113, 7.5, 3, 2], [0.083774837, 7.45, 4, 2], [0.017128445, 15.5, 2, 3], [-0.01725611, 22, 3, 3], [0.0049080492, 19, 5, 3]] },
  saturation: { pressure: { T: 345.857, value: 3761000, form: "exp T", terms: [[0.002757544974909, 0.286], [0.3877058646919, 0.768], [-6.752272877217, 0.952], [-0.5997730155886, 2.711], [-3.228539057891, 4.226], [91.83265252025, 18.933]] }, liquid: { T: 345.857, value: 5128.45, form: "1 + sum", terms: [[2.66478095992, 0.381], [-0.2547721689476, 0.463], [97.84474908939, 3.927], [-105.1304757408, 4.049], [13272.9420398, 16.046], [-116968.3122995, 19.95]] }, vapour: { T: 345.857, value: 5128.45, form: "exp T", terms: [[-6.21806993981, 0.454], [4.259381698949, 0.587], [-4.417810181992, 1.058], [23.70234830312, 3.611], [-50.98632502013, 4.279], [29.10814375492, 5.478]] } },
  surfaceTension: { T: 345.857, terms: [[0.0537, 1.25]] },
  viscosity: { form: "corresponding states", reference: "R134a", lennardJones: { epsilon: 267.1, sigma: 5.025e-10 }, shape: { rho: 5128.45, a: [[1.134, 0], [-0.0801, 1]] } },
  conductivity: { form: "corresponding states", reference: "R134a", shape: { rho: 5128.45, a: [[1.1779, 0], [-0.20541, 1], [0.06487, 2], [-0.006473, 3]] }, internal: [[0.0010066, 0], [1.3729e-06, 1]] },
  predictive: "viscosity and conductivity",
  uncertainty: { density: 0.1, cp: 0.5, viscosity: 10, conductivity: 10, origin: "from memory" },
  cautions: ["Strong greenhouse gas: emission and use are restricted by law in many countries.", "Mildly flammable: refrigerant safety codes come first."],
};
