import type { PureRecord } from "../../pure-record.js";

export const hydrogenSulfide: PureRecord = {
  name: "hydrogen sulfide",
  synonyms: ["H2S", "hydrogen sulphide"],
  family: "gas",
  sources: ["lemmon-2006-jced", "quinonescisneros-2012-jced", "huber-2018-nistir-8209", "mulero-2012-jpcrd"],
  molarMass: 0.03408088, gasConstant: 8.314472,
  reducing: { T: 373.1, p: 9000000, rho: 10190 },
  critical: { T: 373.1, p: 9000000 },
  T: [187.7, 760], pMax: 100000000,
  ideal: { lead: [-4.0740770957, 3.7632137341], logTau: 3, power: [[-0.002753352822675789, -1.5]], einstein: [[1.1364, 4.886089520235862], [1.9721, 10.62717770034843]] },
  residual: { power: [[0.87641, 0.25, 1, 0], [-2.0367, 1.125, 1, 0], [0.21634, 1.5, 1, 0], [-0.050199, 1.375, 2, 0], [0.066994, 0.25, 3, 0], [0.00019076, 0.875, 7, 0], [0.20227, 0.625, 2, 1], [-0.0045348, 1.75, 5, 1], [-0.2223, 3.625, 1, 2], [-0.034714, 3.625, 4, 2], [-0.014885, 14.5, 3, 3], [0.0074154, 12, 4, 3]] },
  saturation: { pressure: { T: 373.1, value: 9000000, form: "exp T", terms: [[-6.761826097619, 1.003], [-0.005988209650773, 1.146], [-6.882637639836, 1.668], [-2.825455087691, 4.886], [7.704835506786, 1.558], [1.741789150935, 9.098]] }, liquid: { T: 373.1, value: 10190, form: "1 + sum", terms: [[51.60103369398, 0.572], [-49.93595719794, 0.586], [6.987088261413, 2.075], [-24.78469758604, 3.069], [84.07792676769, 4.223], [-68.55133880201, 4.619]] }, vapour: { T: 373.1, value: 10190, form: "exp T", terms: [[-5.046830785559, 0.532], [-38.48572940462, 0.681], [41.23869786806, 0.691], [-2.810072090241, 1.195], [-10.14224939745, 6.002], [21.53827631295, 9.033]] } },
  surfaceTension: { T: 373.1, terms: [[0.078557, 1.2074]] },
  viscosity: { form: "sum", lennardJones: { epsilon: 355.8, sigma: 3.565e-10 }, dilute: { form: "inverse collision integral", C: 8.7721e-07, T: 276, a: [[0.53242, 0], [0.93715, -1], [-0.69339, -2], [1.16432, -3], [-0.84306, -4], [0.20534, -5]] }, first: { form: "Rainwater-Friend", b: [[-19.572881, 0], [219.73999, -0.25], [-1015.3226, -0.5], [2471.01251, -0.75], [-3375.1717, -1], [2491.6597, -1.25], [-787.26086, -1.5], [14.085455, -2.5], [-0.34664158, -5.5]] }, dense: { form: "friction theory", T: 373.1, c1: 0, c2: 0, i: [[0, 0, 0], 1], a: [[6.89659e-08, -2.20494e-08, -4.26126e-08], 1], r: [[1.53406e-07, 8.45198e-09, -1.13967e-07], 1], aa: [[7.8238e-13, -6.4717e-13, 1.39066e-12], 1], rr: [[-9.75792e-12, -3.19303e-12, 1.24263e-11], 1] } },
  conductivity: { form: "corresponding states", reference: "propane", lennardJones: { epsilon: 296.28, sigma: 3.732e-10 }, shape: { rho: 10190, a: [[1, 0]] }, internal: [[0.00015603, 0], [1.78874e-06, 1], [-6.75136e-10, 2]], critical: { form: "Olchowy-Sengers", R0: 1.02, Gamma: 0.058, zeta0: 1.64e-10, qD: 2237136465.3243847, T: 559.6500000000001 } },
  predictive: "conductivity",
  uncertainty: { density: 0.5, cp: 2, viscosity: 5, conductivity: 10, origin: "from memory" },
  cautions: ["Toxic: exposure limits and local codes come first.", "Flammable: explosion protection and local codes come first."],
};
