import type { PureRecord } from "../../pure-record.js";

export const sulfurDioxide: PureRecord = {
  name: "sulfur dioxide",
  synonyms: ["SO2", "R764", "sulphur dioxide"],
  family: "gas",
  sources: ["gao-2016-jced", "huber-2018-nistir-8209", "mulero-2012-jpcrd"],
  molarMass: 0.0640638,
  gasConstant: 8.3144621,
  reducing: { T: 430.64, p: 7886578.893022, rho: 8078 },
  critical: { T: 430.64, p: 7886587.600346 },
  T: [197.7, 525],
  pMax: 35000000,
  ideal: {
    lead: [-4.5414235721, 4.4732289572],
    logTau: 3,
    power: [[-0.0159272204, -1]],
    einstein: [
      [1.0875, 1.8182240386401636],
      [1.916, 4.328441389559726],
    ],
  },
  residual: {
    power: [
      [0.01744413, 1, 4, 0],
      [1.814878, 0.45, 1, 0],
      [-2.246338, 0.9994, 1, 0],
      [-0.4602906, 1, 2, 0],
      [0.1097049, 0.45, 3, 0],
      [-0.9485769, 2.907, 1, 2],
      [-0.8751541, 2.992, 3, 2],
      [0.4228777, 0.87, 2, 1],
      [-0.4174962, 3.302, 2, 2],
      [-0.002903451, 1.002, 7, 1],
    ],
    gaussian: [
      [1.64041, 1.15, 1, 1.061, 0.832, 0.967, 1.276],
      [-0.4103535, 0.997, 1, 0.945, 0.69, 2.538, 0.738],
      [-0.08316597, 1.36, 3, 1.741, 0.35, 2.758, 0.71],
      [-0.2728126, 2.086, 2, 1.139, 0.961, 1.062, 0.997],
      [-0.1075782, 0.855, 2, 1.644, 0.981, 1.039, 1.35],
      [-0.4348434, 0.785, 1, 0.647, 0.333, 0.41, 0.919],
    ],
  },
  saturation: {
    pressure: {
      T: 430.64,
      value: 7886600,
      form: "exp T",
      terms: [
        [-7.303, 1],
        [1.9794, 1.5],
        [-2.078, 2.2],
        [-3.5446, 4.7],
        [0.51776, 6],
      ],
    },
    liquid: {
      T: 430.64,
      value: 8078,
      form: "1 + sum",
      terms: [
        [7.2296, 0.54],
        [-16.928, 0.88],
        [29.832, 1.23],
        [-27.901, 1.6],
        [11.085, 2],
      ],
    },
    vapour: {
      T: 430.64,
      value: 8078,
      form: "exp",
      terms: [
        [-7.487, 0.545],
        [10.118, 0.85],
        [-13.608, 1.2],
        [-25.408, 3.7],
        [-42.04, 7.5],
        [-38.668, 10],
      ],
    },
  },
  surfaceTension: {
    T: 430.64,
    terms: [
      [0.0803, 0.928],
      [0.0139, 1.57],
      [-0.0114, 0.364],
    ],
  },
  viscosity: {
    form: "corresponding states",
    reference: "propane",
    lennardJones: { epsilon: 363, sigma: 4.0260000000000004e-10 },
    shape: {
      rho: 8078,
      a: [
        [0.917778, 0],
        [0.0248405, 1],
      ],
    },
  },
  conductivity: {
    form: "corresponding states",
    reference: "propane",
    lennardJones: { epsilon: 363, sigma: 4.0260000000000004e-10 },
    shape: {
      rho: 8078,
      a: [
        [1.38755, 0],
        [-0.128721, 1],
      ],
    },
    internal: [
      [0.000660505, 0],
      [7.47059e-7, 1],
    ],
    critical: { form: "Olchowy-Sengers", R0: 1.02, Gamma: 0.059, zeta0: 1.67e-10, qD: 2061855670.103093, T: 645.96 },
  },
  predictive: "viscosity and conductivity",
  uncertainty: { density: 0.5, cp: 2, viscosity: 5, conductivity: 5, origin: "from memory" },
  cautions: ["Toxic: exposure limits and local codes come first."],
};
