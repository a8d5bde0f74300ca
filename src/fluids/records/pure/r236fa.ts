import type { PureRecord } from "../../pure-record.js";

export const r236fa: PureRecord = {
  name: "R236fa",
  synonyms: ["1,1,1,3,3,3-hexafluoropropane", "HFC-236fa"],
  family: "refrigerant",
  sources: ["pan-2012-fpe", "huber-2003-iecr", "mulero-2012-jpcrd"],
  molarMass: 0.1520384,
  gasConstant: 8.314472,
  reducing: { T: 398.07, p: 3200000, rho: 3626 },
  critical: { T: 398.07, p: 3200000 },
  T: [179.6, 400],
  pMax: 70000000,
  ideal: {
    lead: [-17.5983849, 8.87150449],
    logTau: 9.175,
    einstein: [
      [9.8782, 2.416660386364208],
      [18.236, 6.014017635089306],
      [49.934, 13.03288366367724],
    ],
  },
  residual: {
    power: [
      [0.04453255, 1.07, 4, 0],
      [1.777017, 0.222, 1, 0],
      [-2.230519, 0.66, 1, 0],
      [-0.6708606, 1.33, 2, 0],
      [0.1587907, 0.227, 3, 0],
      [-1.425119, 2.33, 1, 2],
      [-0.6461628, 1.94, 3, 2],
      [0.8469985, 1.53, 2, 1],
      [-0.5635356, 2.65, 2, 2],
      [-0.01535611, 0.722, 7, 1],
    ],
    gaussian: [
      [1.156362, 1.11, 1, 1.02, 0.712, 1.42, 1.13],
      [-0.407031, 2.31, 1, 1.336, 0.91, 2.31, 0.67],
      [-0.2172753, 3.68, 3, 1.055, 0.677, 0.89, 0.46],
      [-1.007176, 4.23, 3, 5.84, 0.718, 80, 1.28],
      [-6.902909e-5, 0.614, 2, 16.2, 1.64, 108, 1.2],
    ],
  },
  saturation: {
    pressure: {
      T: 398.07,
      value: 3200000,
      form: "exp T",
      terms: [
        [-0.004924985027324, 0.017],
        [0.01281614822575, 0.253],
        [-6.976743392966, 0.971],
        [0.3470965211637, 2.069],
        [-3.389030035622, 3.12],
        [-3.905418212194, 5.366],
      ],
    },
    liquid: {
      T: 398.07,
      value: 3626,
      form: "1 + sum",
      terms: [
        [-0.6129462210276, 0.177],
        [2.329756184775, 0.276],
        [0.4402661052815, 0.561],
        [0.1856940812884, 0.741],
        [0.416007637008, 1.15],
        [0.3257761223989, 3.764],
      ],
    },
    vapour: {
      T: 398.07,
      value: 3626,
      form: "exp T",
      terms: [
        [-3.79984163837, 0.436],
        [-7.207160418715, 1.661],
        [47.73949958715, 2.91],
        [-59.04075488538, 3.307],
        [33.03413077299, 5.447],
        [-27.22855527815, 6.392],
      ],
    },
  },
  surfaceTension: { T: 398.07, terms: [[0.05389, 1.249]] },
  viscosity: {
    form: "corresponding states",
    reference: "R134a",
    lennardJones: { epsilon: 307.24, sigma: 5.644e-10 },
    shape: {
      rho: 3626,
      a: [
        [1.10195, 0],
        [-0.0294253, 1],
        [0, 2],
      ],
    },
  },
  conductivity: {
    form: "corresponding states",
    reference: "R134a",
    shape: {
      rho: 3626,
      a: [
        [1.1627, 0],
        [-0.0437246, 1],
      ],
    },
    internal: [
      [0.00100946, 0],
      [1.21255e-6, 1],
    ],
  },
  predictive: "viscosity and conductivity",
  uncertainty: { density: 0.5, cp: 2, viscosity: 10, conductivity: 10, origin: "common practice" },
  cautions: ["Strong greenhouse gas: emission and use are restricted by law in many countries."],
};
