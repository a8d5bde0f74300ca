import type { PureRecord } from "../../pure-record.js";

export const r124: PureRecord = {
  name: "R124",
  synonyms: ["C2HClF4", "2-chloro-1,1,1,2-tetrafluoroethane", "HCFC-124"],
  family: "refrigerant",
  sources: ["devries-1995-icr", "huber-2003-iecr", "mulero-2012-jpcrd"],
  molarMass: 0.1364762, gasConstant: 8.314471,
  reducing: { T: 395.425, p: 3624295, rho: 4103.279546177 },
  critical: { T: 395.425, p: 3624295 },
  T: [75, 470], pMax: 40000000,
  ideal: { lead: [-11.669550036507408, 9.876117308843154], logTau: 2.175638, power: [[-7.389735, -1], [0.8736831, -2], [-0.1115133, -3]] },
  residual: { power: [[-0.01262962, 2, 1, 0], [2.168373, 0.5, 1, 0], [-3.330033, 1, 1, 0], [0.1610361, 0.5, 2, 0], [-9.666145e-05, 2.5, 2, 0], [0.0119131, -1, 3, 0], [-0.002880217, 1, 5, 0], [0.001681346, 0, 6, 0], [1.594968e-05, -0.5, 8, 0], [0.1289674, 1.5, 2, 1], [1.182213e-05, 1, 12, 1], [-0.4713997, 2.5, 1, 2], [-0.2412873, -0.25, 1, 2], [0.6868066, 1, 1, 2], [-0.08621095, 5, 1, 2], [4.728645e-06, 2, 15, 2], [0.01487933, 15, 3, 3], [-0.03001338, 20, 3, 3], [0.001849606, 15, 4, 4], [0.0004126073, 45, 9, 4]] },
  saturation: { pressure: { T: 395.425, value: 3624295, form: "exp T", terms: [[-5.532034162429, 1.003], [-4.742002285998, 1.051], [4.083301102214, 1.163], [-0.8556260869753, 2.188], [-3.759805971191, 4.015], [-5.094637151195, 19.693]] }, liquid: { T: 395.425, value: 4103.279546177, form: "1 + sum", terms: [[9.076759200951, 0.482], [-17.68501390423, 0.651], [59.69226551115, 0.881], [-48.46415018362, 0.914], [0.6023234565911, 5.001], [-1.093905552712, 10.577]] }, vapour: { T: 395.425, value: 4103.279546177, form: "exp T", terms: [[-3.641106077968, 0.415], [0.382230425107, 0.5], [-19.60356014826, 1.704], [181.0410898999, 2.307], [-168.522166023, 2.394], [-2.518091668423, 13.161]] } },
  surfaceTension: { T: 395.425, terms: [[0.05175, 1.197]] },
  viscosityT: [110, 470],
  viscosity: { form: "corresponding states", reference: "propane", lennardJones: { epsilon: 275.8, sigma: 5.501000000000001e-10 }, shape: { rho: 4103, a: [[1.04253, 0], [0.00138528, 1], [0, 2]] } },
  conductivity: { form: "corresponding states", reference: "propane", lennardJones: { epsilon: 275.8, sigma: 5.501000000000001e-10 }, shape: { rho: 4103, a: [[1.0898, 0], [-0.0154229, 1]] }, internal: [[0.0011769, 0], [6.78397e-07, 1]], critical: { form: "Olchowy-Sengers" } },
  predictive: "viscosity and conductivity",
  uncertainty: { density: 0.5, cp: 2, viscosity: 10, conductivity: 10, origin: "common practice" },
  cautions: ["Harms the ozone layer: use is restricted by law in most countries."],
};
