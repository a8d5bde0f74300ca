import type { PureRecord } from "../../pure-record.js";

export const r142b: PureRecord = {
  name: "R142b",
  synonyms: ["1-chloro-1,1-difluoroethane", "HCFC-142b"],
  family: "refrigerant",
  sources: ["lemmon-2006-jced", "huber-2003-iecr", "mulero-2012-jpcrd"],
  molarMass: 0.10049503,
  gasConstant: 8.314472,
  reducing: { T: 410.26, p: 4055000, rho: 4438 },
  critical: { T: 410.26, p: 4055000 },
  T: [142.72, 470],
  pMax: 60000000,
  ideal: {
    lead: [-12.6016527149, 8.3160183265],
    logTau: 3,
    einstein: [
      [5.0385, 1.152927411885146],
      [6.8356, 3.061473212109394],
      [4.0591, 6.086384244137864],
      [2.8136, 16.67235411690148],
    ],
  },
  residual: {
    power: [
      [1.0038, 0.25, 1, 0],
      [-2.7662, 1.25, 1, 0],
      [0.42921, 1.5, 1, 0],
      [0.081363, 0.25, 3, 0],
      [0.00024174, 0.875, 7, 0],
      [0.48246, 2.375, 1, 1],
      [0.75542, 2, 2, 1],
      [-0.00743, 2.125, 5, 1],
      [-0.4146, 3.5, 1, 2],
      [-0.016558, 6.5, 1, 2],
      [-0.10644, 4.75, 4, 2],
      [-0.021704, 12.5, 2, 3],
    ],
  },
  saturation: {
    pressure: {
      T: 410.26,
      value: 4055000,
      form: "exp T",
      terms: [
        [-7.053583364114, 0.993],
        [1.620065366586, 1.485],
        [-3.599230269819, 2.56],
        [30.25677580183, 3.61],
        [-31.31254647753, 3.733],
        [-0.7436150349113, 14.147],
      ],
    },
    liquid: {
      T: 410.26,
      value: 4438,
      form: "1 + sum",
      terms: [
        [-9.714230485566, 0.247],
        [11.76380298847, 0.26],
        [2.415334211439, 1.896],
        [-3.019513959116, 3.015],
        [8.696072645236, 7.62],
        [-74.79644293555, 15.172],
      ],
    },
    vapour: {
      T: 410.26,
      value: 4438,
      form: "exp T",
      terms: [
        [0.07060973078462, 0.092],
        [-0.1101282083101, 0.165],
        [-2.929712616016, 0.398],
        [-2.550579057792, 1.037],
        [0.8675055868776, 3.911],
        [-5.524200468568, 4.103],
      ],
    },
  },
  surfaceTension: { T: 410.26, terms: [[0.05685, 1.237]] },
  viscosity: {
    form: "corresponding states",
    reference: "propane",
    lennardJones: { epsilon: 278.2, sigma: 5.362000000000001e-10 },
    shape: {
      rho: 4438,
      a: [
        [0.9716, 0],
        [0.019181, 1],
        [0, 2],
      ],
    },
  },
  conductivity: {
    form: "corresponding states",
    reference: "propane",
    shape: {
      rho: 4438,
      a: [
        [1.0749, 0],
        [-0.0177916, 1],
      ],
    },
    internal: [
      [0.000940725, 0],
      [9.88196e-7, 1],
    ],
  },
  predictive: "viscosity and conductivity",
  uncertainty: { density: 0.5, cp: 2, viscosity: 10, conductivity: 10, origin: "common practice" },
  cautions: [
    "Harms the ozone layer: use is restricted by law in most countries.",
    "Mildly flammable: refrigerant safety codes come first.",
  ],
};
