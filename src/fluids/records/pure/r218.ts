import type { PureRecord } from "../../pure-record.js";

export const r218: PureRecord = {
  name: "R218",
  synonyms: ["C3F8", "octafluoropropane", "PFC-218"],
  family: "refrigerant",
  sources: ["lemmon-2006-jced", "huber-2003-iecr", "mulero-2012-jpcrd"],
  molarMass: 0.18801933,
  gasConstant: 8.314472,
  reducing: { T: 345.02, p: 2640000, rho: 3340 },
  critical: { T: 345.02, p: 2640000 },
  T: [125.45, 440],
  pMax: 20000000,
  ideal: {
    lead: [-15.6587335175, 11.4531412796],
    logTau: 3,
    einstein: [
      [7.2198, 0.9448727609993625],
      [7.2692, 1.724537707958959],
      [11.599, 4.315691843951075],
    ],
  },
  residual: {
    power: [
      [1.327, 0.25, 1, 0],
      [-3.8433, 1.25, 1, 0],
      [0.922, 1.5, 1, 0],
      [0.1136, 0.25, 3, 0],
      [0.00036195, 0.875, 7, 0],
      [1.1001, 2.375, 1, 1],
      [1.1896, 2, 2, 1],
      [-0.025147, 2.125, 5, 1],
      [-0.65923, 3.5, 1, 2],
      [-0.027969, 6.5, 1, 2],
      [-0.1833, 4.75, 4, 2],
      [-0.02163, 12.5, 2, 3],
    ],
  },
  saturation: {
    pressure: {
      T: 345.02,
      value: 2640000,
      form: "exp T",
      terms: [
        [-8.242713023596, 1.008],
        [19.08779845534, 1.599],
        [-17.23308991523, 1.665],
        [-1.422792519034, 2.07],
        [-3.364817666486, 4.314],
        [-10.21393875409, 17.759],
      ],
    },
    liquid: {
      T: 345.02,
      value: 3340,
      form: "1 + sum",
      terms: [
        [7.303753750603, 0.517],
        [-7.730626041358, 0.714],
        [3.674253188196, 1.159],
        [-3.583953896319, 3.98],
        [5.552496612345, 5.488],
        [-211.5431930017, 19.277],
      ],
    },
    vapour: {
      T: 345.02,
      value: 3340,
      form: "exp T",
      terms: [
        [3.329585797094, 0.372],
        [-6.84473461977, 0.41],
        [-1.111183378844, 0.775],
        [-2.071198546958, 1.882],
        [-4.658013576001, 4.237],
        [0.291427934951, 8.879],
      ],
    },
  },
  surfaceTension: { T: 345.02, terms: [[0.04322, 1.224]] },
  viscosity: {
    form: "corresponding states",
    reference: "propane",
    lennardJones: { epsilon: 266.35, sigma: 5.8e-10 },
    shape: {
      rho: 3340,
      a: [
        [1.10225, 0],
        [-0.00550442, 1],
        [0, 2],
      ],
    },
  },
  conductivity: {
    form: "corresponding states",
    reference: "propane",
    shape: {
      rho: 3340,
      a: [
        [1.2877, 0],
        [-0.0758811, 1],
      ],
    },
    internal: [
      [0.000892659, 0],
      [1.14912e-6, 1],
    ],
  },
  predictive: "viscosity and conductivity",
  uncertainty: { density: 0.5, cp: 2, viscosity: 10, conductivity: 10, origin: "common practice" },
  cautions: ["Strong greenhouse gas: emission and use are restricted by law in many countries."],
};
