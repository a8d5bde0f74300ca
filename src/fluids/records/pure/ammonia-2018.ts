import type { PureRecord } from "../../pure-record.js";
import { ammonia } from "./ammonia.js";

/** Ammonia with the reference correlations of 2018 for transport. */
export const ammonia2018: PureRecord = {
  ...ammonia,
  name: "ammonia, 2018 transport",
  synonyms: ["NH3, 2018 transport"],
  sources: ["gao-2023-jpcrd", "monogenidou-2018-viscosity", "monogenidou-2018-conductivity", "mulero-2012-jpcrd"],
  viscosity: {
    form: "sum",
    lennardJones: { epsilon: 386, sigma: 2.957e-10 },
    dilute: {
      form: "collision integral",
      C: 2.1357e-8,
      M: 0.01703052,
      a: [
        [0.39175, 0],
        [-0.59918, 1],
        [-0.00022, 2],
        [0.19871, 3],
        [-0.06942, 4],
      ],
    },
    first: {
      form: "Rainwater-Friend",
      b: [
        [-19.572881, 0],
        [219.73999, -0.25],
        [-1015.3226, -0.5],
        [2471.01251, -0.75],
        [-3375.1717, -1],
        [2491.6597, -1.25],
        [-787.26086, -1.5],
        [14.085455, -2.5],
        [-0.34664158, -5.5],
      ],
      lennardJones: { epsilon: 386, sigma: 2.957e-10 },
    },
    dense: {
      form: "scaled",
      T: 405.56,
      density: 233.25,
      scale: 1,
      bracket: {
        of: "powers",
        a: [
          [3.93308e-8, 0, 0],
          [1.6724735e-5, 0, 1],
          [1.1975934e-6, 0, 4],
          [1.6995e-9, -4, 8],
          [-4.2399794e-6, 1, 2],
        ],
      },
    },
  },
  conductivity: {
    form: "sum",
    dilute: {
      form: "ratio",
      T: 405.56,
      a: [
        [0.0869294, 0],
        [-0.1705502, 1],
        [0.6080287, 2],
        [-0.1009764, 3],
        [0.0851986, 4],
      ],
      b: [
        [4.68994, 0],
        [9.21307, 1],
        [-1.53637, 2],
        [1, 3],
      ],
    },
    dense: {
      form: "polynomial",
      T: 405.56,
      density: 233.25,
      B: [
        [0.103432, 0, 1],
        [-0.112597, 0, 2],
        [0.233301, 0, 3],
        [-0.112536, 0, 4],
        [0.0141129, 0, 5],
        [-0.0283976, -1, 1],
        [0.048252, -1, 2],
        [-0.0644124, -1, 3],
        [0.00529376, -1, 4],
        [0.00891203, -1, 5],
      ],
    },
    critical: { form: "Olchowy-Sengers", R0: 1.02, Gamma: 0.053, zeta0: 1.4e-10, qD: 2500000000, T: 608.34 },
  },
  uncertainty: { ...ammonia.uncertainty, viscosity: 3.3, conductivity: 4, origin: "published" },
};
