import type { PureRecord } from "../../pure-record.js";

export const r116: PureRecord = {
  name: "R116",
  synonyms: ["C2F6", "hexafluoroethane", "PFC-116"],
  family: "refrigerant",
  sources: ["lemmon-2006-jced", "huber-2003-iecr", "mulero-2012-jpcrd"],
  molarMass: 0.13801182,
  gasConstant: 8.314472,
  reducing: { T: 293.03, p: 3048000, rho: 4444 },
  critical: { T: 293.03, p: 3048000 },
  T: [173.1, 425],
  pMax: 50000000,
  ideal: {
    lead: [-10.7088650331, 8.9148979056],
    logTau: 3,
    einstein: [
      [2.4818, 0.6483977749718459],
      [7.0622, 2.122649558065727],
      [7.9951, 5.016551206361124],
    ],
  },
  residual: {
    power: [
      [1.1632, 0.25, 1, 0],
      [-2.8123, 1.125, 1, 0],
      [0.77202, 1.5, 1, 0],
      [-0.14331, 1.375, 2, 0],
      [0.10227, 0.25, 3, 0],
      [0.00024629, 0.875, 7, 0],
      [0.30893, 0.625, 2, 1],
      [-0.028499, 1.75, 5, 1],
      [-0.30343, 3.625, 1, 2],
      [-0.068793, 3.625, 4, 2],
      [-0.027218, 14.5, 3, 3],
      [0.010665, 12, 4, 3],
    ],
  },
  saturation: {
    pressure: {
      T: 293.03,
      value: 3048000,
      form: "exp T",
      terms: [
        [-7.187037699454, 0.994],
        [1.167902093389, 1.389],
        [-6.070415204531, 3.286],
        [4.623641136795, 3.827],
        [-8.973143537957, 6.643],
        [135.1233103795, 12.512],
      ],
    },
    liquid: {
      T: 293.03,
      value: 4444,
      form: "1 + sum",
      terms: [
        [9.032000509756, 0.481],
        [-9.13904298936, 0.603],
        [4.358123910469, 1.19],
        [-10.17298583658, 3.414],
        [3844.905990172, 9.072],
        [-8268.032474054, 10.136],
      ],
    },
    vapour: {
      T: 293.03,
      value: 4444,
      form: "exp T",
      terms: [
        [-3.223875924083, 0.42],
        [-2.882263657855, 1.175],
        [8.522219528342, 2.321],
        [-9.783624985989, 2.482],
        [-19811843.68068, 19.211],
        [33374328.47668, 19.828],
      ],
    },
  },
  surfaceTension: {
    T: 293.03,
    terms: [
      [0.047593, 1.2666],
      [-0.0073402, 1.9892],
    ],
  },
  viscosity: {
    form: "corresponding states",
    reference: "R134a",
    lennardJones: { epsilon: 226.16, sigma: 5.249e-10 },
    shape: {
      rho: 4518,
      a: [
        [1.21996, 0],
        [-0.0647835, 1],
        [0, 2],
      ],
    },
  },
  conductivity: {
    form: "corresponding states",
    reference: "R134a",
    shape: {
      rho: 4518,
      a: [
        [1.1804, 0],
        [-0.0539975, 1],
      ],
    },
    internal: [
      [0.00132, 0],
      [0, 1],
    ],
  },
  predictive: "viscosity and conductivity",
  uncertainty: { density: 0.5, cp: 2, viscosity: 10, conductivity: 10, origin: "common practice" },
  cautions: ["Strong greenhouse gas: emission and use are restricted by law in many countries."],
};
