/**
 * Liquid metals and molten salts: published fits with their ranges. T in kelvin, t in degrees Celsius.
 * `T` of a record is where all four of its fits hold.
 */
import type { WorkKey } from "../../bibliography.js";

export type MetalFit =
  /** Σ c T^k */
  | { readonly form: "kelvin"; readonly c: readonly number[] }
  /** Σ c t^k */
  | { readonly form: "celsius"; readonly c: readonly number[] }
  /** Σ c (T − base)^k */
  | { readonly form: "from"; readonly base: number; readonly c: readonly number[] }
  /** Σ c T^k + d/T² */
  | { readonly form: "with inverse square"; readonly c: readonly number[]; readonly d: number }
  /** a exp(b/T) */
  | { readonly form: "Arrhenius"; readonly a: number; readonly b: number }
  /** A form that only one substance has. */
  | { readonly form: "function"; readonly at: (T: number) => number };

export interface MetalRecord {
  readonly name: string;
  readonly synonyms: readonly string[];
  readonly summary: string;
  readonly sources: readonly WorkKey[];
  readonly T: readonly [number, number];
  readonly melting: number;
  readonly molarMass?: number;
  readonly density: MetalFit;
  readonly cp: MetalFit;
  readonly viscosity: MetalFit;
  readonly conductivity: MetalFit;
  readonly vapourPressure?: MetalFit;
  readonly uncertainty: { readonly density: number; readonly cp: number; readonly viscosity: number; readonly conductivity: number };
  readonly origin: string;
  readonly cautions: readonly string[];
}

const alkali = "Alkali metals burn in air and react violently with water; the handbooks and licensed practice come first.";
const toxicVapour = "Its vapour is toxic; closed systems, local codes and licensed practice come first.";
const oxidiser = "Molten nitrate is a strong oxidiser and burns skin at once; local codes and licensed practice come first.";
const beryllium = "Beryllium compounds are highly toxic; licensed practice only.";

const fromCelsius = (T: number): number => T - 273.15;

/** Foust: ρ of potassium, kg/m³. */
function potassiumDensity(T: number): number {
  const t = fromCelsius(T);
  return 1000 * (0.8415 + t * (-2.172e-4 + t * (-2.7e-8 + t * 4.77e-12)));
}

/** Foust: η = A r^(1/3) exp(B r/T) mPa·s with r in g/cm³, one pair of constants below 400 °C and one above. */
function alkaliViscosity(
  density: (T: number) => number,
  cold: readonly [number, number],
  hot: readonly [number, number],
): (T: number) => number {
  return (T) => {
    const r = density(T) / 1000;
    const [A, B] = fromCelsius(T) <= 400 ? cold : hot;
    return 1e-3 * A * Math.cbrt(r) * Math.exp((B * r) / T);
  };
}

/** Foust: specific volumes of the parts, weighed by mass. */
function nakDensity(T: number): number {
  return 1 / (0.778 / potassiumDensity(T) + 0.222 / (1000 * (0.9453 - 2.2473e-4 * fromCelsius(T))));
}

/** Straight lines between printed points; cp of mercury changes by 4 % over the whole range. */
function between(points: readonly (readonly [number, number])[]): (T: number) => number {
  return (T) => {
    const above = Math.max(
      1,
      points.findIndex(([x]) => x >= T),
    );
    const [x0, y0] = points[above - 1] as readonly [number, number];
    const [x1, y1] = points[above] as readonly [number, number];
    return y0 + ((y1 - y0) * (T - x0)) / (x1 - x0);
  };
}

export const metals: readonly MetalRecord[] = [
  {
    name: "lead",
    synonyms: ["Pb", "liquid lead"],
    summary: "Liquid lead by the recommendations of the nuclear energy agency's handbook.",
    sources: ["oecd-nea-2015"],
    T: [600.6, 1300],
    melting: 600.6,
    molarMass: 207.2e-3,
    density: { form: "kelvin", c: [11441, -1.2795] },
    cp: { form: "with inverse square", c: [176.2, -0.04923, 1.544e-5], d: -1.524e6 },
    viscosity: { form: "Arrhenius", a: 4.55e-4, b: 1069 },
    conductivity: { form: "kelvin", c: [9.2, 0.011] },
    vapourPressure: { form: "Arrhenius", a: 5.76e9, b: -22131 },
    uncertainty: { density: 0.01, cp: 0.05, viscosity: 0.05, conductivity: 0.15 },
    origin: "published",
    cautions: [toxicVapour],
  },
  {
    name: "lead-bismuth eutectic",
    synonyms: ["LBE", "lead bismuth", "Pb-Bi"],
    summary: "44.5 % lead and 55.5 % bismuth by mass.",
    sources: ["oecd-nea-2015"],
    T: [400, 1200],
    melting: 398,
    // A copied summary prints −1.2793; the handbook's own expansivity, 1/(8558 − T), agrees with −1.293.
    density: { form: "kelvin", c: [11065, -1.293] },
    cp: { form: "with inverse square", c: [164.8, -0.0394, 1.25e-5], d: -4.56e5 },
    viscosity: { form: "Arrhenius", a: 4.94e-4, b: 754.1 },
    conductivity: { form: "kelvin", c: [3.284, 0.01617, -2.305e-6] },
    vapourPressure: { form: "Arrhenius", a: 1.22e10, b: -22552 },
    uncertainty: { density: 0.008, cp: 0.07, viscosity: 0.08, conductivity: 0.15 },
    origin: "published",
    cautions: [toxicVapour],
  },
  {
    name: "bismuth",
    synonyms: ["Bi", "liquid bismuth"],
    summary: "Liquid bismuth by the recommendations of the nuclear energy agency's handbook.",
    sources: ["oecd-nea-2015"],
    T: [545, 1000],
    melting: 544.6,
    molarMass: 208.98e-3,
    density: { form: "kelvin", c: [10725, -1.22] },
    cp: { form: "with inverse square", c: [118.2, 0.005934], d: 7.183e6 },
    viscosity: { form: "Arrhenius", a: 4.456e-4, b: 780 },
    conductivity: { form: "kelvin", c: [7.34, 0.0095] },
    vapourPressure: { form: "Arrhenius", a: 2.67e10, b: -22858 },
    uncertainty: { density: 0.005, cp: 0.07, viscosity: 0.05, conductivity: 0.15 },
    origin: "published",
    cautions: [],
  },
  {
    name: "sodium",
    synonyms: ["Na", "liquid sodium"],
    summary: "Liquid sodium after Fink & Leibowitz.",
    sources: ["fink-leibowitz-1995"],
    T: [371, 1156],
    melting: 370.98,
    molarMass: 22.98977e-3,
    density: { form: "function", at: (T) => 219 + 275.32 * (1 - T / 2503.7) + 511.58 * Math.sqrt(1 - T / 2503.7) },
    cp: { form: "with inverse square", c: [1658.2, -0.8479, 4.4541e-4], d: -2.9926e6 },
    viscosity: { form: "function", at: (T) => Math.exp(-6.4406 - 0.3958 * Math.log(T) + 556.835 / T) },
    conductivity: { form: "kelvin", c: [124.67, -0.11381, 5.5226e-5, -1.1842e-8] },
    uncertainty: { density: 0.004, cp: 0.02, viscosity: 0.05, conductivity: 0.05 },
    origin: "from memory",
    cautions: [alkali],
  },
  {
    name: "potassium",
    synonyms: ["K", "liquid potassium"],
    summary: "Liquid potassium after Foust's handbook.",
    sources: ["foust-1972"],
    T: [473, 973],
    melting: 336.7,
    molarMass: 39.0983e-3,
    density: { form: "function", at: potassiumDensity },
    cp: { form: "celsius", c: [4184 * 0.2004, 4184 * -8.777e-5, 4184 * 1.097e-7] },
    viscosity: { form: "function", at: alkaliViscosity(potassiumDensity, [0.1131, 680], [0.0799, 978]) },
    conductivity: { form: "function", at: (T) => 100 * (0.438 - 2.22e-4 * fromCelsius(T) + 39.5 / (fromCelsius(T) + 273.2)) },
    uncertainty: { density: 0.0025, cp: 0.05, viscosity: 0.05, conductivity: 0.05 },
    origin: "from memory",
    cautions: [alkali],
  },
  {
    name: "sodium-potassium eutectic",
    synonyms: ["NaK", "NaK-78", "sodium potassium", "sodium-potassium", "NaK eutectic"],
    summary: "77.8 % potassium and 22.2 % sodium by mass, after Foust's handbook.",
    sources: ["foust-1972"],
    T: [423, 953],
    melting: 260.5,
    density: { form: "function", at: nakDensity },
    cp: { form: "celsius", c: [4184 * 0.232, 4184 * -8.82e-5, 4184 * 8.2e-8] },
    viscosity: { form: "function", at: alkaliViscosity(nakDensity, [0.116, 688], [0.082, 979]) },
    conductivity: { form: "celsius", c: [21.4, 0.0207, -2.2e-5] },
    uncertainty: { density: 0.01, cp: 0.03, viscosity: 0.05, conductivity: 0.05 },
    origin: "published",
    cautions: [alkali, "NaK is liquid at room temperature and can form a peroxide that explodes; licensed practice only."],
  },
  {
    name: "mercury",
    synonyms: ["Hg", "quicksilver"],
    summary: "Mercury at about atmospheric pressure.",
    sources: ["beattie-1941", "incropera-a5", "open-metal-data"],
    T: [273.15, 573],
    melting: 234.32,
    molarMass: 200.592e-3,
    density: {
      form: "function",
      at: (T) => {
        const t = fromCelsius(T);
        return 13595.08 / (1 + 1e-8 * t * (18144.01 + t * (0.7016 + t * (2.8655e-3 + t * 2.621e-6))));
      },
    },
    cp: {
      form: "function",
      at: between([
        [273, 140.4],
        [300, 139.3],
        [350, 137.7],
        [400, 136.5],
        [450, 135.7],
        [500, 135.3],
        [550, 135.2],
        [600, 135.5],
      ]),
    },
    viscosity: { form: "kelvin", c: [0.00355837, -1.00131e-5, 1.23684e-8, -5.1684e-12] },
    conductivity: { form: "kelvin", c: [3.98691, 0.0170967, -6.3862e-6] },
    uncertainty: { density: 0.0005, cp: 0.01, viscosity: 0.03, conductivity: 0.05 },
    origin: "from memory",
    cautions: [toxicVapour],
  },
  {
    name: "gallium",
    synonyms: ["Ga", "liquid gallium"],
    summary: "Liquid gallium: reference density and viscosity; cp and conductivity are handbook values from memory.",
    sources: ["assael-2012-metals", "handbook-from-memory"],
    T: [303, 800],
    melting: 302.914,
    molarMass: 69.723e-3,
    density: { form: "from", base: 302.914, c: [6077, -0.611] },
    cp: { form: "kelvin", c: [397] },
    viscosity: { form: "Arrhenius", a: 1e-3 * 10 ** -0.4465, b: 204.03 * Math.LN10 },
    conductivity: { form: "from", base: 302.914, c: [29, 0.04] },
    uncertainty: { density: 0.004, cp: 0.05, viscosity: 0.06, conductivity: 0.15 },
    origin: "from memory",
    cautions: ["Gallium attacks aluminium and many other metals."],
  },
  {
    name: "tin",
    synonyms: ["Sn", "liquid tin"],
    summary: "Liquid tin: reference density and viscosity; cp and conductivity are handbook values from memory.",
    sources: ["assael-2010-metals", "handbook-from-memory"],
    T: [506, 1280],
    melting: 505.08,
    molarMass: 118.71e-3,
    density: { form: "from", base: 505.08, c: [6979, -0.652] },
    cp: { form: "kelvin", c: [245] },
    viscosity: { form: "Arrhenius", a: 1e-3 * 10 ** -0.408, b: 343.4 * Math.LN10 },
    conductivity: { form: "from", base: 505.08, c: [29, 0.019] },
    uncertainty: { density: 0.004, cp: 0.07, viscosity: 0.05, conductivity: 0.15 },
    origin: "from memory",
    cautions: [],
  },
  {
    name: "lead-lithium",
    synonyms: ["PbLi", "Pb-Li", "lead lithium eutectic", "lead-lithium eutectic"],
    summary: "Lead with about 15.7 atom per cent of lithium; sources of conductivity differ by nearly a factor of two.",
    sources: ["mas-de-les-valls-2008", "schulz-1991", "mogahed-1995"],
    T: [508, 625],
    melting: 508,
    density: { form: "kelvin", c: [10520.35, -1.19051] },
    cp: { form: "kelvin", c: [195, -0.009116] },
    viscosity: { form: "Arrhenius", a: 1.87e-4, b: 1400.048111618956 },
    conductivity: { form: "kelvin", c: [14.51, 0.019631] },
    uncertainty: { density: 0.01, cp: 0.05, viscosity: 0.1, conductivity: 0.5 },
    origin: "published",
    cautions: ["Published conductivities of lead-lithium differ by nearly a factor of two; the bounds hold that.", toxicVapour],
  },
  {
    name: "nitrate salt 60/40",
    synonyms: ["solar salt", "60/40 nitrate salt", "sodium-potassium nitrate", "NaNO3-KNO3", "nitrate salt", "binary nitrate salt"],
    summary: "60 % sodium nitrate and 40 % potassium nitrate by mass; not the eutectic, freezing starts near 238 °C.",
    sources: ["zavoico-2001"],
    T: [573.15, 873.15],
    melting: 511,
    density: { form: "celsius", c: [2090, -0.636] },
    cp: { form: "celsius", c: [1443, 0.172] },
    viscosity: { form: "celsius", c: [0.022714, -1.2e-4, 2.281e-7, -1.474e-10] },
    conductivity: { form: "celsius", c: [0.443, 1.9e-4] },
    uncertainty: { density: 0.01, cp: 0.03, viscosity: 0.05, conductivity: 0.1 },
    origin: "published",
    cautions: [oxidiser],
  },
  {
    name: "ternary nitrate salt",
    synonyms: ["heat transfer salt", "HTS", "nitrate-nitrite salt", "KNO3-NaNO2-NaNO3"],
    summary: "53 % KNO3, 40 % NaNO2 and 7 % NaNO3 by mass; the literature's cp differs by 25 %.",
    sources: ["sohal-2010", "chang-2015", "handbook-from-memory"],
    T: [523, 773],
    melting: 415,
    density: { form: "kelvin", c: [2293.6, -0.7497] },
    cp: { form: "kelvin", c: [1560] },
    // Temperature in °C: with kelvin the viscosity is off by a factor of four.
    viscosity: { form: "function", at: (T) => Math.exp(-4.343 - 2.0143 * (Math.log(fromCelsius(T)) - 5.011)) },
    conductivity: { form: "from", base: 533.15, c: [0.421, -6.53e-4] },
    uncertainty: { density: 0.02, cp: 0.25, viscosity: 0.1, conductivity: 0.2 },
    origin: "published",
    cautions: [
      "The cp of ternary nitrate salt is disputed: 1560 J/(kg·K) is the usual design value; another published fit gives 25 % more, and the bounds hold that.",
      oxidiser,
    ],
  },
  {
    name: "FLiBe",
    synonyms: ["LiF-BeF2", "lithium beryllium fluoride"],
    summary: "67 % lithium fluoride and 33 % beryllium fluoride by mole.",
    sources: ["romatoski-hu-2017"],
    T: [732, 1473],
    melting: 732,
    density: { form: "kelvin", c: [2413, -0.4884] },
    cp: { form: "kelvin", c: [2416] },
    viscosity: { form: "Arrhenius", a: 1.16e-4, b: 3755 },
    conductivity: { form: "kelvin", c: [0.63, 5e-4] },
    uncertainty: { density: 0.02, cp: 0.03, viscosity: 0.2, conductivity: 0.15 },
    origin: "published",
    cautions: [beryllium],
  },
  {
    name: "FLiNaK",
    synonyms: ["LiF-NaF-KF", "lithium sodium potassium fluoride"],
    summary: "46.5 % LiF, 11.5 % NaF and 42 % KF by mole.",
    sources: ["romatoski-hu-2017"],
    T: [727, 1473],
    melting: 727,
    density: { form: "kelvin", c: [2729, -0.73] },
    cp: { form: "kelvin", c: [2010] },
    viscosity: { form: "Arrhenius", a: 4e-5, b: 4170 },
    conductivity: { form: "kelvin", c: [0.43, 5e-4] },
    uncertainty: { density: 0.02, cp: 0.2, viscosity: 0.2, conductivity: 0.15 },
    origin: "published",
    cautions: ["The cp of FLiNaK is 2010 J/(kg·K) here; 1884 is also in use, and the bounds hold that."],
  },
];
