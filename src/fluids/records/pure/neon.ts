import type { PureRecord } from "../../pure-record.js";

export const neon: PureRecord = {
  name: "neon",
  synonyms: ["Ne", "R720"],
  family: "gas",
  sources: ["thol-2019-jpcrd-neon", "huber-2018-nistir-8209", "mulero-2012-jpcrd"],
  molarMass: 0.020179, gasConstant: 8.3144598,
  reducing: { T: 44.4, p: 2661630.808595, rho: 24100 },
  critical: { T: 44.4, p: 2661630.808595 },
  T: [24.5561, 725], pMax: 100000000,
  ideal: { lead: [-3.0384719151147275, 3.253690479855404], logTau: 1.5 },
  residual: { power: [[0.031522418, 1, 4, 0], [3.7716418, 0.431, 1, 0], [-4.27399448, 0.592, 1, 0], [-0.756466758, 1.105, 2, 0], [0.066679921, 0.49, 3, 0], [-0.356928434, 2.3, 1, 2], [-0.053124761, 3.18, 3, 2], [0.9407234, 1.36, 2, 1], [-0.969302374, 2, 2, 2], [0.461243234, 0.5, 4, 1], [0.008184422, 1.12, 7, 1]], gaussian: [[7.84771604, 0.41, 1, 0.76, 0.5775, 0.537, 1.997], [6.39604094, 0.64, 1, 2.126, 0.9137, 0.765, 1.782], [-1.27480579, 0.579, 3, 2.168, 0.7895, 0.883, 1.663], [-5.51887999, 0.6, 2, 2.033, 0.6229, 0.751, 1.837], [-8.76652276, 0.52, 1, 0.743, 0.4992, 0.531, 1.953], [-0.351732709, 0.655, 2, 4.38, 0.869, 11.4, 1.658]] },
  saturation: { pressure: { T: 44.4918, value: 2680000, form: "exp T", terms: [[-0.000745007950371, 0.019], [-3.682372301668, 0.9], [-9.78153179091, 1.026], [4.096945170442, 1.808], [-2.988639369012, 2.247], [7.178339654951, 0.954]] }, liquid: { T: 44.4918, value: 23882, form: "1 + sum", terms: [[0.2220765986999, 0.361], [2.457320054633, 0.489], [-1969.430283589, 3.226], [6749.387057644, 3.371], [-4813.477464107, 3.443], [591.6954480241, 9.965]] }, vapour: { T: 44.4918, value: 23882, form: "exp T", terms: [[-1.347463996096, 0.408], [-2.757199449001, 0.648], [0.009650364682862, 1.315], [2.035400345757, 2.286], [-3.227001419325, 2.901], [122.4607716765, 11.792]] } },
  surfaceTension: { T: 44.4918, terms: [[0.012254, 1.4136], [0.02728, 1.4517], [-0.025715, 1.6567]] },
  viscosity: { form: "corresponding states", reference: "nitrogen", lennardJones: { epsilon: 45.58, sigma: 2.707e-10 }, Fc: 0.989544, shape: { rho: 24100, a: [[1.12101, 0], [-0.0388911, 1]] } },
  conductivity: { form: "corresponding states", reference: "nitrogen", lennardJones: { epsilon: 45.58, sigma: 2.707e-10 }, Fc: 0.989544, shape: { rho: 24100, a: [[0.83, 0]] }, internal: [[0.00132, 0]], critical: { form: "Olchowy-Sengers", R0: 1.02, Gamma: 0.06, zeta0: 1.31e-10, qD: 3021148036.2537766, T: 66.6 } },
  predictive: "viscosity and conductivity",
  uncertainty: { density: 0.2, cp: 1, viscosity: 5, conductivity: 5, origin: "from memory" },
  cautions: ["Displaces air: asphyxiation hazard in closed rooms."],
};
