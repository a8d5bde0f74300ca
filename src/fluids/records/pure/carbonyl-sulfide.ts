import type { PureRecord } from "../../pure-record.js";

export const carbonylSulfide: PureRecord = {
  name: "carbonyl sulfide",
  synonyms: ["COS", "OCS", "carbonyl sulphide"],
  family: "gas",
  sources: ["lemmon-2006-jced", "mulero-2012-jpcrd"],
  molarMass: 0.0600751, gasConstant: 8.314472,
  reducing: { T: 378.77, p: 6370000, rho: 7410 },
  critical: { T: 378.77, p: 6370000 },
  T: [134.3, 650], pMax: 50000000,
  ideal: { lead: [-3.6587449805, 3.7349245016], logTau: 2.5, einstein: [[2.1651, 2.027615703461204], [0.93456, 3.59848984872086], [1.0623, 8.382395649074637], [0.34269, 33.87015867148929]] },
  residual: { power: [[0.94374, 0.25, 1, 0], [-2.5348, 1.125, 1, 0], [0.59058, 1.5, 1, 0], [-0.021488, 1.375, 2, 0], [0.082083, 0.25, 3, 0], [0.00024689, 0.875, 7, 0], [0.21226, 0.625, 2, 1], [-0.041251, 1.75, 5, 1], [-0.22333, 3.625, 1, 2], [-0.050828, 3.625, 4, 2], [-0.028333, 14.5, 3, 3], [0.016983, 12, 4, 3]] },
  saturation: { pressure: { T: 378.77, value: 6370000, form: "exp T", terms: [[-5.89898040448, 0.98], [1.441194257273, 1.966], [-46.79232527748, 3.287], [56.09470221996, 3.429], [-13.25987358924, 4.051], [-0.8514913400498, 18.959]] }, liquid: { T: 378.77, value: 7410, form: "1 + sum", terms: [[-0.006565517887509, 0.187], [9.861398057771, 0.539], [-49.2867835312, 0.811], [50.76548990441, 0.921], [-18.83645698143, 1.495], [10.18026228087, 1.774]] }, vapour: { T: 378.77, value: 7410, form: "exp T", terms: [[1.776086114558, 0.376], [-28.20299757514, 0.531], [43.7268964289, 0.641], [-22.91875726931, 0.783], [2.365655894375, 2.208], [-4.806350485892, 3.625]] } },
  surfaceTension: { T: 378.77, terms: [[0.07246, 1.407]] },
  uncertainty: { density: 0.5, cp: 2, origin: "common practice" },
  cautions: ["Toxic: exposure limits and local codes come first.", "Flammable: explosion protection and local codes come first."],
};
