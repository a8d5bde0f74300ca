import type { PureRecord } from "../../pure-record.js";

export const krypton: PureRecord = {
  name: "krypton",
  synonyms: ["Kr", "R784"],
  family: "gas",
  sources: ["lemmon-2006-jced", "huber-2018-nistir-8209", "michels-1962-physica", "mulero-2012-jpcrd"],
  molarMass: 0.083798, gasConstant: 8.314472,
  reducing: { T: 209.48, p: 5525000, rho: 10850 },
  critical: { T: 209.48, p: 5525000 },
  T: [115.77, 750], pMax: 100000000,
  ideal: { lead: [-3.7506412806, 3.7798018435], logTau: 1.5 },
  residual: { power: [[0.83561, 0.25, 1, 0], [-2.3725, 1.125, 1, 0], [0.54567, 1.5, 1, 0], [0.014361, 1.375, 2, 0], [0.066502, 0.25, 3, 0], [0.0001931, 0.875, 7, 0], [0.16818, 0.625, 2, 1], [-0.033133, 1.75, 5, 1], [-0.15008, 3.625, 1, 2], [-0.022897, 3.625, 4, 2], [-0.021454, 14.5, 3, 3], [0.0069397, 12, 4, 3]] },
  saturation: { pressure: { T: 209.48, value: 5525000, form: "exp T", terms: [[0.6286380394786, 0.822], [-6.084114621398, 0.961], [0.9243637669285, 1.811], [-1.217729162332, 2.937], [-484.8408507524, 13.131], [2458.926650746, 15.629]] }, liquid: { T: 209.48, value: 10850, form: "1 + sum", terms: [[2.546150113785, 0.423], [-5.378194265124, 1.611], [8.373146326332, 2.063], [-116.8127990117, 6.632], [18068.9510652, 12.833], [-1719409.74066, 19.438]] }, vapour: { T: 209.48, value: 10850, form: "exp T", terms: [[-5.118395258885, 0.487], [1.852485504654, 0.544], [-2.332708391377, 1.593], [5.670498376648, 3.18], [-13.43781755136, 4.851], [2923.704628658, 14.775]] } },
  surfaceTension: { T: 209.48, terms: [[0.0447, 1.245]] },
  melting: [{ form: "Simon", T: [115.77, 170], T0: 1, p0: -237497645.7, a: 109479.2307, c: 1.6169841 }],
  viscosity: { form: "corresponding states", reference: "nitrogen", lennardJones: { epsilon: 178.9, sigma: 3.6550000000000003e-10 }, Fc: 1.008291, shape: { rho: 10850, a: [[1, 0]] } },
  conductivity: { form: "corresponding states", reference: "nitrogen", lennardJones: { epsilon: 178.9, sigma: 3.6550000000000003e-10 }, Fc: 1.008291, shape: { rho: 10850, a: [[0.962573, 0], [-0.0118156, 1]] }, internal: [[0.00132, 0]], critical: { form: "Olchowy-Sengers", R0: 1.02, Gamma: 0.058, zeta0: 1.68e-10, qD: 2288329519.450801, T: 314.21999999999997 } },
  predictive: "viscosity and conductivity",
  uncertainty: { density: 0.2, cp: 1, viscosity: 5, conductivity: 5, origin: "from memory" },
  cautions: ["Displaces air: asphyxiation hazard in closed rooms."],
};
