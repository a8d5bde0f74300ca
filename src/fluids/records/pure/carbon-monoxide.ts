import type { PureRecord } from "../../pure-record.js";

export const carbonMonoxide: PureRecord = {
  name: "carbon monoxide",
  synonyms: ["CO"],
  family: "gas",
  sources: ["lemmon-2006-jced", "huber-2018-nistir-8209", "barreiros-1982-jct", "mulero-2012-jpcrd"],
  molarMass: 0.0280101, gasConstant: 8.314472,
  reducing: { T: 132.86, p: 3494000, rho: 10850 },
  critical: { T: 132.86, p: 3494000 },
  T: [68.16, 500], pMax: 100000000,
  ideal: { lead: [-3.3728318564, 3.3683460039], logTau: 2.5, power: [[-9.111274701235156e-05, -1.5]], einstein: [[1.0128, 23.25003763359927]] },
  residual: { power: [[0.90554, 0.25, 1, 0], [-2.4515, 1.125, 1, 0], [0.53149, 1.5, 1, 0], [0.024173, 1.375, 2, 0], [0.072156, 0.25, 3, 0], [0.00018818, 0.875, 7, 0], [0.19405, 0.625, 2, 1], [-0.043268, 1.75, 5, 1], [-0.12778, 3.625, 1, 2], [-0.027896, 3.625, 4, 2], [-0.034154, 14.5, 3, 3], [0.016329, 12, 4, 3]] },
  saturation: { pressure: { T: 132.86, value: 3494000, form: "exp T", terms: [[0.003165559471116, 0.052], [-5.386279334978, 0.968], [-0.440894361777, 1.972], [1.540340181749, 2.761], [-5.692323589834, 4.199], [3.030819590672, 5.126]] }, liquid: { T: 132.86, value: 10850, form: "1 + sum", terms: [[3.973336124072, 0.44], [-3.262687458485, 0.672], [3.349943207066, 1.334], [-42.12917416639, 3.874], [56.52859432308, 4.413], [-110.7002275612, 9.257]] }, vapour: { T: 132.86, value: 10850, form: "exp T", terms: [[-3.645928914224, 0.444], [1.516796222856, 0.75], [-114.1017405221, 1.847], [292.7876490688, 2.04], [-183.6056308955, 2.169], [4746.634272544, 19.966]] } },
  surfaceTension: { T: 132.86, terms: [[0.02843, 1.148]] },
  melting: [{ form: "Simon", T: [68.16, 90], T0: 1, p0: -142921439.2, a: 19560.8, c: 2.10747 }],
  viscosity: { form: "corresponding states", reference: "nitrogen", lennardJones: { epsilon: 103.697, sigma: 3.615e-10 }, shape: { rho: 10850, a: [[1.07369, 0], [-0.0283067, 1]] } },
  conductivity: { form: "corresponding states", reference: "nitrogen", lennardJones: { epsilon: 103.697, sigma: 3.615e-10 }, shape: { rho: 10850, a: [[1.00037, 0], [-0.0082682, 1]] }, internal: [[0.000329558, 0], [3.05976e-06, 1], [-3.13222e-09, 2]], critical: { form: "Olchowy-Sengers", R0: 1.02, Gamma: 0.059, zeta0: 1.64e-10, qD: 2288329519.450801, T: 199.29000000000002 } },
  predictive: "viscosity and conductivity",
  uncertainty: { density: 0.3, cp: 2, viscosity: 5, conductivity: 5, origin: "from memory" },
  cautions: ["Toxic: exposure limits and local codes come first.", "Flammable: explosion protection and local codes come first."],
};
