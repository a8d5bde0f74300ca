import type { PureRecord } from "../../pure-record.js";

export const nitrousOxide: PureRecord = {
  name: "nitrous oxide",
  synonyms: ["N2O", "R744A", "laughing gas", "dinitrogen monoxide"],
  family: "gas",
  sources: ["lemmon-2006-jced", "huber-2018-nistir-8209", "mulero-2012-jpcrd"],
  molarMass: 0.0440128,
  gasConstant: 8.314472,
  reducing: { T: 309.52, p: 7245000, rho: 10270 },
  critical: { T: 309.52, p: 7245000 },
  T: [182.33, 525],
  pMax: 50000000,
  ideal: {
    lead: [-4.4262736272, 4.3120475243],
    logTau: 2.5,
    einstein: [
      [2.1769, 2.839881106229],
      [1.6145, 7.663478935125356],
      [0.48393, 17.598216593435],
    ],
  },
  residual: {
    power: [
      [0.88045, 0.25, 1, 0],
      [-2.4235, 1.25, 1, 0],
      [0.38237, 1.5, 1, 0],
      [0.068917, 0.25, 3, 0],
      [0.00020367, 0.875, 7, 0],
      [0.13122, 2.375, 1, 1],
      [0.46032, 2, 2, 1],
      [-0.0036985, 2.125, 5, 1],
      [-0.23263, 3.5, 1, 2],
      [-0.00042859, 6.5, 1, 2],
      [-0.04281, 4.75, 4, 2],
      [-0.023038, 12.5, 2, 3],
    ],
  },
  saturation: {
    pressure: {
      T: 309.52,
      value: 7245000,
      form: "exp T",
      terms: [
        [-24.19848566391, 1.06],
        [18.98015792117, 1.105],
        [-0.991563758476, 1.754],
        [-3.605225645254, 4.415],
        [52.20126113056, 9.887],
        [-340.239546389, 12.55],
      ],
    },
    liquid: {
      T: 309.52,
      value: 10270,
      form: "1 + sum",
      terms: [
        [2.248014962727, 0.374],
        [1354.881440799, 6.796],
        [-227009237.4318, 13.027],
        [312935961.0721, 13.205],
        [-139155040.7744, 14.362],
        [295107831.043, 18.638],
      ],
    },
    vapour: {
      T: 309.52,
      value: 10270,
      form: "exp T",
      terms: [
        [-3.439484106429, 0.428],
        [-35.87348642351, 2.405],
        [98.43310989646, 3.115],
        [-173.8756921346, 4.433],
        [30857.72406343, 8.312],
        [-31916.96723126, 8.395],
      ],
    },
  },
  surfaceTension: { T: 309.52, terms: [[0.07087, 1.204]] },
  viscosity: {
    form: "corresponding states",
    reference: "nitrogen",
    lennardJones: { epsilon: 232.4, sigma: 3.828e-10 },
    shape: {
      rho: 10270,
      a: [
        [0.88769, 0],
        [0.0214265, 1],
      ],
    },
  },
  conductivity: {
    form: "corresponding states",
    reference: "nitrogen",
    lennardJones: { epsilon: 232.4, sigma: 3.828e-10 },
    shape: {
      rho: 10270,
      a: [
        [0.923824, 0],
        [0.03315898, 1],
      ],
    },
    internal: [
      [0.000515648, 0],
      [2.85508e-6, 1],
      [-2.46391e-9, 2],
    ],
    critical: { form: "Olchowy-Sengers", R0: 1.02, Gamma: 0.057, zeta0: 1.59e-10, qD: 2242152466.367713, T: 464.28 },
  },
  predictive: "viscosity and conductivity",
  uncertainty: { density: 0.25, cp: 2, viscosity: 5, conductivity: 5, origin: "from memory" },
  cautions: ["Feeds fire: materials and cleanliness for oxygen service come first."],
};
