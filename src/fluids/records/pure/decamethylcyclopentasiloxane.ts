import type { PureRecord } from "../../pure-record.js";

export const decamethylcyclopentasiloxane: PureRecord = {
  name: "decamethylcyclopentasiloxane",
  synonyms: ["D5", "C10H30O5Si5"],
  family: "organic liquid",
  sources: ["thol-2019-fpe-siloxanes", "mulero-2014-jpcrd"],
  molarMass: 0.3707697, gasConstant: 8.3144598,
  reducing: { T: 618.3, p: 1077687.780257, rho: 810 },
  critical: { T: 618.3, p: 1077687.780257 },
  T: [226, 630], pMax: 100000000,
  ideal: { lead: [94.38924286309562, -31.110222240232282], logTau: 3, einstein: [[51, 0.3574316674753356], [57.9, 2.802846514636908], [35, 7.349183244379751]] },
  residual: { power: [[0.0177345, 1, 4, 0], [4.3133088, 0.43, 1, 0], [-6.1586863, 0.754, 1, 0], [-1.4503945, 0.84, 2, 0], [0.9519342, 0.72, 3, 0], [-2.3848036, 2.35, 1, 2], [-1.4114529, 2.58, 3, 2], [0.7255071, 0.66, 2, 1], [-2.9966803, 1.71, 2, 2], [-0.0902228, 1.0163, 7, 1]], gaussian: [[6.3033323, 1.114, 1, 1.046, 0.787, 0.37, 1.626], [-1.0592923, 1.85, 3, 0.993, 0.567, 0.11, 1.05], [0.79365281, 0.9, 2, 0.545, 0.685, 0.1, 1.11], [-1.8982515, 1.05, 2, 1.128, 0.577, 0.37, 1.22], [-0.01351964, 1.09, 1, 13.9, 0.936, 519, 1.083]] },
  saturation: { pressure: { T: 618.3, value: 1077700, form: "exp T", terms: [[-9.256, 1], [3.987, 1.5], [-11.02, 2.24], [-19.286, 3.48], [16.524, 2.86], [-8.14, 11.6]] }, liquid: { T: 618.3, value: 810, form: "1 + sum", terms: [[1.0938, 0.25], [5.254, 0.79], [-12.31, 1.33], [19.364, 1.9], [-15.81, 2.52], [5.983, 3.22]] }, vapour: { T: 618.3, value: 810, form: "exp", terms: [[-0.916, 0.23], [-5.911, 0.68], [-18.617, 2.24], [-74.29, 5.1], [-154.4, 10.7], [-284.1, 18.9]] } },
  surfaceTension: { T: 619.15, terms: [[0.04408, 1.357]] },
  uncertainty: { density: 0.5, cp: 2, origin: "common practice" },
  cautions: ["Flammable: explosion protection and local codes come first."],
};
