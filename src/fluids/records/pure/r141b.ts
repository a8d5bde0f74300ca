import type { PureRecord } from "../../pure-record.js";

export const r141b: PureRecord = {
  name: "R141b",
  synonyms: ["1,1-dichloro-1-fluoroethane", "HCFC-141b"],
  family: "refrigerant",
  sources: ["lemmon-2006-jced", "huber-2003-iecr", "mulero-2012-jpcrd"],
  molarMass: 0.11694962,
  gasConstant: 8.314472,
  reducing: { T: 477.5, p: 4212000, rho: 3921 },
  critical: { T: 477.5, p: 4212000 },
  T: [169.68, 500],
  pMax: 100000000,
  ideal: {
    lead: [-15.5074814985, 9.1871858933],
    logTau: 3,
    einstein: [
      [6.8978, 1.05130890052356],
      [7.8157, 3.290052356020942],
      [3.2039, 9.63979057591623],
    ],
  },
  residual: {
    power: [
      [1.1469, 0.25, 1, 0],
      [-3.6799, 1.25, 1, 0],
      [1.3469, 1.5, 1, 0],
      [0.083329, 0.25, 3, 0],
      [0.00025137, 0.875, 7, 0],
      [0.3272, 2.375, 1, 1],
      [0.46946, 2, 2, 1],
      [-0.029829, 2.125, 5, 1],
      [-0.31621, 3.5, 1, 2],
      [-0.026219, 6.5, 1, 2],
      [-0.078043, 4.75, 4, 2],
      [-0.020498, 12.5, 2, 3],
    ],
  },
  saturation: {
    pressure: {
      T: 477.5,
      value: 4212000,
      form: "exp T",
      terms: [
        [-30.18152776122, 1.049],
        [24.4130103759, 1.078],
        [-1.111267633791, 2.184],
        [-3.125275291917, 4.325],
        [-1.737112908976, 9.594],
        [-1.701712223568, 16.104],
      ],
    },
    liquid: {
      T: 477.5,
      value: 3921,
      form: "1 + sum",
      terms: [
        [-0.937837745762, 0.29],
        [3.21483740209, 0.341],
        [1.065335052211, 2.503],
        [-4378.068628184, 15.166],
        [272955.3298632, 18.069],
        [-277906.3197209, 18.242],
      ],
    },
    vapour: {
      T: 477.5,
      value: 3921,
      form: "exp T",
      terms: [
        [0.6509988493016, 0.279],
        [-3.856064364423, 0.374],
        [-69.71635657604, 1.89],
        [75.36138733741, 1.986],
        [-12.17483683923, 3.019],
        [-0.9652029917534, 8.269],
      ],
    },
  },
  surfaceTension: {
    T: 477.5,
    terms: [
      [7.3958e-5, 0.066331],
      [0.059941, 1.2214],
    ],
  },
  viscosity: {
    form: "corresponding states",
    reference: "propane",
    lennardJones: { epsilon: 370.44, sigma: 5.493000000000001e-10 },
    shape: {
      rho: 3933,
      a: [
        [0.92135, 0],
        [0.041091, 1],
        [0, 2],
      ],
    },
  },
  conductivity: {
    form: "corresponding states",
    reference: "propane",
    shape: {
      rho: 3933,
      a: [
        [1.0867, 0],
        [-0.0216469, 1],
      ],
    },
    internal: [
      [0.000521722, 0],
      [2.92456e-6, 1],
    ],
  },
  predictive: "viscosity and conductivity",
  uncertainty: { density: 0.5, cp: 2, viscosity: 10, conductivity: 10, origin: "common practice" },
  cautions: [
    "Harms the ozone layer: use is restricted by law in most countries.",
    "Mildly flammable: refrigerant safety codes come first.",
  ],
};
