/**
 * The one table of unit factors: every symbol that stands alone in a unit text, its exact factor to SI and where that factor comes from.
 * Compound units (W/(m²·K), Btu/(h·ft²·°F)) have no factor of their own: the grammar multiplies these.
 */

/** Exponents of metre, kilogram, second, kelvin, mole and radian. */
export type Vector = readonly [m: number, kg: number, s: number, K: number, mol: number, rad: number];

export interface Atom {
  /** As results print it. */
  readonly symbol: string;
  readonly vector: Vector;
  /** SI value of one of this unit (for temperatures: of one degree). */
  readonly factor: number;
  /** Kelvin at zero of the scale; only for scales that do not start at absolute zero. */
  readonly offset?: number;
  /** Pressure above the ambient. */
  readonly gauge?: boolean;
  /** A temperature difference even when it stands alone. */
  readonly difference?: boolean;
  /** May be run together with its neighbours (`mK` in `W/mK`, `Pas`, `hft`). */
  readonly joins?: boolean;
  readonly source: string;
}

interface Row extends Atom {
  /** Symbols that prefixes may precede and that are read case by case. */
  readonly symbols: readonly string[];
  /** Words, in lower case. */
  readonly words?: readonly string[];
  readonly prefixes?: string;
}

const LENGTH: Vector = [1, 0, 0, 0, 0, 0];
const VOLUME: Vector = [3, 0, 0, 0, 0, 0];
const MASS: Vector = [0, 1, 0, 0, 0, 0];
const TIME: Vector = [0, 0, 1, 0, 0, 0];
const TEMPERATURE: Vector = [0, 0, 0, 1, 0, 0];
const AMOUNT: Vector = [0, 0, 0, 0, 1, 0];
const ANGLE: Vector = [0, 0, 0, 0, 0, 1];
const SPEED: Vector = [1, 0, -1, 0, 0, 0];
const ROTATION: Vector = [0, 0, -1, 0, 0, 1];
const FORCE: Vector = [1, 1, -2, 0, 0, 0];
const PRESSURE: Vector = [-1, 1, -2, 0, 0, 0];
const ENERGY: Vector = [2, 1, -2, 0, 0, 0];
const POWER: Vector = [2, 1, -3, 0, 0, 0];
const VISCOSITY: Vector = [-1, 1, -1, 0, 0, 0];
const DIFFUSIVITY: Vector = [2, 0, -1, 0, 0, 0];
const VOLUME_FLOW: Vector = [3, 0, -1, 0, 0, 0];

const SI = "SI Brochure, 9th edition";
const YARD_AND_POUND = "international yard and pound agreement, 1959";
const SP811 = "NIST SP 811 (2008), appendix B";

// Defining constants, each exact and typed once; the table below derives everything else from them.
const FOOT = 0.3048;
const INCH = 0.0254;
const POUND = 0.45359237;
/** Standard acceleration of free fall, m/s² (3rd CGPM, 1901). */
export const STANDARD_GRAVITY = 9.80665;
/** Standard atmosphere, Pa (10th CGPM, 1954). */
export const STANDARD_ATMOSPHERE = 101325;
/** International Table Btu, J: 1 Btu/lb = 2326 J/kg exactly (5th International Conference on the Properties of Steam, 1956). */
const BTU = 2326 * POUND;
/** International Table calorie, J. */
const CALORIE = 4.1868;
const US_GALLON = 231 * INCH ** 3;
/** Conventional density of mercury for manometers, kg/m³; conventional water is 1000 kg/m³ (ISO 80000-4, NIST SP 811). */
const MERCURY = 13595.1;
const WATER = 1000;
const REVOLUTION = 2 * Math.PI;
const FAHRENHEIT_DEGREE = 5 / 9;

const rows: readonly Row[] = [
  // Length, volume
  {
    symbol: "m",
    symbols: ["m"],
    words: ["metre", "metres", "meter", "meters"],
    prefixes: "n μ u m c d k",
    vector: LENGTH,
    factor: 1,
    joins: true,
    source: SI,
  },
  { symbol: "mm", symbols: ["MM"], vector: LENGTH, factor: 1e-3, source: SI },
  { symbol: "µm", symbols: [], words: ["micron", "microns"], vector: LENGTH, factor: 1e-6, source: SI },
  { symbol: "in", symbols: ["in"], words: ["inch", "inches"], vector: LENGTH, factor: INCH, joins: true, source: YARD_AND_POUND },
  {
    symbol: "µin",
    symbols: ["μin", "uin"],
    words: ["microinch", "microinches"],
    vector: LENGTH,
    factor: INCH / 1e6,
    source: YARD_AND_POUND,
  },
  { symbol: "mil", symbols: ["mil"], words: ["mils", "thou"], vector: LENGTH, factor: INCH / 1000, source: YARD_AND_POUND },
  { symbol: "ft", symbols: ["ft"], words: ["foot", "feet"], vector: LENGTH, factor: FOOT, joins: true, source: YARD_AND_POUND },
  { symbol: "yd", symbols: ["yd"], words: ["yard", "yards"], vector: LENGTH, factor: 3 * FOOT, source: YARD_AND_POUND },
  { symbol: "mi", symbols: ["mi"], words: ["mile", "miles"], vector: LENGTH, factor: 5280 * FOOT, source: YARD_AND_POUND },
  {
    symbol: "L",
    symbols: ["L", "l"],
    words: ["litre", "litres", "liter", "liters", "ltr"],
    prefixes: "μ u m c d h",
    vector: VOLUME,
    factor: 1e-3,
    source: SI,
  },
  { symbol: "cm³", symbols: ["cc"], vector: VOLUME, factor: 1e-6, source: SI },
  {
    symbol: "gal",
    symbols: ["gal"],
    words: ["gallon", "gallons"],
    vector: VOLUME,
    factor: US_GALLON,
    source: `${SP811}: US gallon, 231 in³`,
  },
  // Mass, amount, time
  {
    symbol: "g",
    symbols: ["g"],
    words: ["gram", "grams", "gramme", "grammes"],
    prefixes: "μ u m k",
    vector: MASS,
    factor: 1e-3,
    joins: true,
    source: SI,
  },
  { symbol: "t", symbols: ["t"], words: ["tonne", "tonnes"], vector: MASS, factor: 1000, source: SI },
  {
    symbol: "lb",
    symbols: ["lb", "lbm", "lbs"],
    words: ["pound", "pounds"],
    vector: MASS,
    factor: POUND,
    joins: true,
    source: YARD_AND_POUND,
  },
  { symbol: "oz", symbols: ["oz"], words: ["ounce", "ounces"], vector: MASS, factor: POUND / 16, source: YARD_AND_POUND },
  { symbol: "slug", symbols: ["slug"], words: ["slugs"], vector: MASS, factor: (POUND * STANDARD_GRAVITY) / FOOT, source: SP811 },
  { symbol: "mol", symbols: ["mol"], words: ["mole", "moles"], prefixes: "m k", vector: AMOUNT, factor: 1, joins: true, source: SI },
  { symbol: "lbmol", symbols: ["lbmol"], vector: AMOUNT, factor: POUND * 1000, source: "kmol scaled by the pound" },
  // No prefixes: `kg/ms` means kg/(m·s), never kilograms per millisecond.
  { symbol: "s", symbols: ["s", "sec"], words: ["secs", "second", "seconds"], vector: TIME, factor: 1, joins: true, source: SI },
  { symbol: "min", symbols: ["min"], words: ["mins", "minute", "minutes"], vector: TIME, factor: 60, joins: true, source: SI },
  { symbol: "h", symbols: ["h", "hr"], words: ["hrs", "hour", "hours"], vector: TIME, factor: 3600, joins: true, source: SI },
  { symbol: "d", symbols: [], words: ["day", "days"], vector: TIME, factor: 86400, source: SI },
  // Temperature. No prefixes: `W/mK` means W/(m·K).
  { symbol: "K", symbols: ["K", "°K"], words: ["kelvin", "kelvins"], vector: TEMPERATURE, factor: 1, joins: true, source: SI },
  {
    symbol: "°C",
    symbols: ["°C", "C"],
    words: ["celsius", "centigrade"],
    vector: TEMPERATURE,
    factor: 1,
    offset: 273.15,
    joins: true,
    source: SI,
  },
  {
    symbol: "°F",
    symbols: ["°F", "F"],
    words: ["fahrenheit"],
    vector: TEMPERATURE,
    factor: FAHRENHEIT_DEGREE,
    offset: 459.67 * FAHRENHEIT_DEGREE,
    joins: true,
    source: SP811,
  },
  { symbol: "°R", symbols: ["°R", "R"], words: ["rankine"], vector: TEMPERATURE, factor: FAHRENHEIT_DEGREE, joins: true, source: SP811 },
  { symbol: "ΔK", symbols: ["ΔK", "Δ°C", "ΔC"], vector: TEMPERATURE, factor: 1, difference: true, source: SI },
  { symbol: "Δ°F", symbols: ["Δ°F", "ΔF", "Δ°R", "ΔR"], vector: TEMPERATURE, factor: FAHRENHEIT_DEGREE, difference: true, source: SP811 },
  // Angle and rotation
  { symbol: "rad", symbols: ["rad"], words: ["radian", "radians"], prefixes: "m", vector: ANGLE, factor: 1, joins: true, source: SI },
  { symbol: "deg", symbols: ["deg", "°"], words: ["degree", "degrees"], vector: ANGLE, factor: Math.PI / 180, source: SI },
  { symbol: "rev", symbols: ["rev"], words: ["revs", "revolution", "revolutions"], vector: ANGLE, factor: REVOLUTION, source: SP811 },
  { symbol: "rpm", symbols: ["rpm"], vector: ROTATION, factor: REVOLUTION / 60, source: SP811 },
  { symbol: "rps", symbols: ["rps"], vector: ROTATION, factor: REVOLUTION, source: SP811 },
  {
    symbol: "Hz",
    symbols: ["Hz"],
    words: ["hertz"],
    prefixes: "m k",
    vector: ROTATION,
    factor: REVOLUTION,
    source: `${SI}; read as revolutions per second`,
  },
  // Speed
  { symbol: "mph", symbols: ["mph"], vector: SPEED, factor: (5280 * FOOT) / 3600, source: YARD_AND_POUND },
  { symbol: "km/h", symbols: ["kph", "kmh"], vector: SPEED, factor: 1 / 3.6, source: SI },
  {
    symbol: "kn",
    symbols: ["kn", "kt", "kts"],
    words: ["knot", "knots"],
    vector: SPEED,
    factor: 1852 / 3600,
    source: `${SP811}: nautical mile of 1852 m an hour`,
  },
  { symbol: "ft/min", symbols: ["fpm"], vector: SPEED, factor: FOOT / 60, source: YARD_AND_POUND },
  { symbol: "ft/s", symbols: ["fps"], vector: SPEED, factor: FOOT, source: YARD_AND_POUND },
  // Volume flow
  { symbol: "gpm", symbols: ["gpm"], vector: VOLUME_FLOW, factor: US_GALLON / 60, source: `${SP811}: US gallon, 231 in³` },
  { symbol: "gph", symbols: ["gph"], vector: VOLUME_FLOW, factor: US_GALLON / 3600, source: `${SP811}: US gallon, 231 in³` },
  { symbol: "cfm", symbols: ["cfm"], vector: VOLUME_FLOW, factor: FOOT ** 3 / 60, source: YARD_AND_POUND },
  { symbol: "cfs", symbols: ["cfs"], vector: VOLUME_FLOW, factor: FOOT ** 3, source: YARD_AND_POUND },
  { symbol: "cfh", symbols: ["cfh"], vector: VOLUME_FLOW, factor: FOOT ** 3 / 3600, source: YARD_AND_POUND },
  { symbol: "L/min", symbols: ["lpm"], vector: VOLUME_FLOW, factor: 1e-3 / 60, source: SI },
  { symbol: "L/h", symbols: ["lph"], vector: VOLUME_FLOW, factor: 1e-3 / 3600, source: SI },
  // Force
  { symbol: "N", symbols: ["N"], words: ["newton", "newtons"], prefixes: "μ u m k M", vector: FORCE, factor: 1, joins: true, source: SI },
  { symbol: "dyn", symbols: ["dyn"], words: ["dyne", "dynes"], vector: FORCE, factor: 1e-5, source: SP811 },
  {
    symbol: "lbf",
    symbols: ["lbf"],
    vector: FORCE,
    factor: POUND * STANDARD_GRAVITY,
    joins: true,
    source: `${YARD_AND_POUND}; standard gravity`,
  },
  {
    symbol: "kgf",
    symbols: ["kgf", "kp"],
    words: ["kilopond"],
    vector: FORCE,
    factor: STANDARD_GRAVITY,
    source: `${SP811}; standard gravity`,
  },
  // Energy and power
  { symbol: "J", symbols: ["J"], words: ["joule", "joules"], prefixes: "m k M G", vector: ENERGY, factor: 1, joins: true, source: SI },
  {
    symbol: "Btu",
    symbols: ["Btu"],
    words: ["btus"],
    prefixes: "k MM",
    vector: ENERGY,
    factor: BTU,
    joins: true,
    source: `${SP811}: International Table Btu`,
  },
  {
    symbol: "cal",
    symbols: ["cal"],
    words: ["calorie", "calories"],
    prefixes: "k M",
    vector: ENERGY,
    factor: CALORIE,
    joins: true,
    source: `${SP811}: International Table calorie`,
  },
  { symbol: "erg", symbols: ["erg"], words: ["ergs"], vector: ENERGY, factor: 1e-7, source: SP811 },
  { symbol: "W", symbols: ["W"], words: ["watt", "watts"], prefixes: "μ u m k M G", vector: POWER, factor: 1, joins: true, source: SI },
  {
    symbol: "hp",
    symbols: ["hp"],
    words: ["horsepower"],
    vector: POWER,
    factor: 550 * FOOT * POUND * STANDARD_GRAVITY,
    source: `${SP811}: 550 ft·lbf/s`,
  },
  {
    symbol: "ton",
    symbols: ["ton", "TR"],
    words: ["tons"],
    vector: POWER,
    factor: (12000 * BTU) / 3600,
    source: `${SP811}: ton of refrigeration, 12 000 Btu/h`,
  },
  { symbol: "kBtu/h", symbols: ["MBH"], vector: POWER, factor: (1000 * BTU) / 3600, source: `${SP811}: International Table Btu` },
  // Pressure
  {
    symbol: "Pa",
    symbols: ["Pa"],
    words: ["pascal", "pascals"],
    prefixes: "μ u m h k M G",
    vector: PRESSURE,
    factor: 1,
    joins: true,
    source: SI,
  },
  { symbol: "bar", symbols: ["bar"], words: ["bars"], prefixes: "m", vector: PRESSURE, factor: 1e5, source: SP811 },
  {
    symbol: "atm",
    symbols: ["atm"],
    words: ["atmosphere", "atmospheres"],
    vector: PRESSURE,
    factor: STANDARD_ATMOSPHERE,
    source: "10th CGPM, 1954",
  },
  {
    symbol: "psi",
    symbols: ["psi"],
    vector: PRESSURE,
    factor: (POUND * STANDARD_GRAVITY) / INCH ** 2,
    source: `${YARD_AND_POUND}; standard gravity`,
  },
  {
    symbol: "psf",
    symbols: ["psf"],
    vector: PRESSURE,
    factor: (POUND * STANDARD_GRAVITY) / FOOT ** 2,
    source: `${YARD_AND_POUND}; standard gravity`,
  },
  {
    symbol: "ksi",
    symbols: ["ksi"],
    vector: PRESSURE,
    factor: (1000 * POUND * STANDARD_GRAVITY) / INCH ** 2,
    source: `${YARD_AND_POUND}; standard gravity`,
  },
  { symbol: "torr", symbols: ["torr"], vector: PRESSURE, factor: STANDARD_ATMOSPHERE / 760, source: `${SP811}: atm/760` },
  // Manometer columns are the conventional ones (water 1000 kg/m³, mercury 13 595.1 kg/m³), not water at 4 °C or 60 °F.
  {
    symbol: "mmHg",
    symbols: ["mmHg"],
    vector: PRESSURE,
    factor: 1e-3 * MERCURY * STANDARD_GRAVITY,
    source: `${SP811}: conventional mercury`,
  },
  {
    symbol: "inHg",
    symbols: ["inHg"],
    vector: PRESSURE,
    factor: INCH * MERCURY * STANDARD_GRAVITY,
    source: `${SP811}: conventional mercury`,
  },
  {
    symbol: "inH2O",
    symbols: ["inHHO"],
    vector: PRESSURE,
    factor: INCH * WATER * STANDARD_GRAVITY,
    source: `${SP811}: conventional water`,
  },
  {
    symbol: "ftH2O",
    symbols: ["ftHHO"],
    vector: PRESSURE,
    factor: FOOT * WATER * STANDARD_GRAVITY,
    source: `${SP811}: conventional water`,
  },
  {
    symbol: "mmH2O",
    symbols: ["mmHHO"],
    vector: PRESSURE,
    factor: 1e-3 * WATER * STANDARD_GRAVITY,
    source: `${SP811}: conventional water`,
  },
  {
    symbol: "cmH2O",
    symbols: ["cmHHO"],
    vector: PRESSURE,
    factor: 1e-2 * WATER * STANDARD_GRAVITY,
    source: `${SP811}: conventional water`,
  },
  { symbol: "mH2O", symbols: ["mHHO"], vector: PRESSURE, factor: WATER * STANDARD_GRAVITY, source: `${SP811}: conventional water` },
  // Viscosity
  { symbol: "P", symbols: ["P"], words: ["poise"], prefixes: "m c", vector: VISCOSITY, factor: 0.1, source: SP811 },
  { symbol: "St", symbols: ["St"], words: ["stokes"], prefixes: "c", vector: DIFFUSIVITY, factor: 1e-4, source: SP811 },
];

interface Prefix {
  readonly factor: number;
  readonly word: string;
  readonly shown: string;
}

const prefixes: Readonly<Record<string, Prefix>> = {
  n: { factor: 1e-9, word: "nano", shown: "n" },
  μ: { factor: 1e-6, word: "micro", shown: "µ" },
  u: { factor: 1e-6, word: "micro", shown: "µ" },
  m: { factor: 1e-3, word: "milli", shown: "m" },
  c: { factor: 1e-2, word: "centi", shown: "c" },
  d: { factor: 1e-1, word: "deci", shown: "d" },
  h: { factor: 1e2, word: "hecto", shown: "h" },
  k: { factor: 1e3, word: "kilo", shown: "k" },
  M: { factor: 1e6, word: "mega", shown: "M" },
  G: { factor: 1e9, word: "giga", shown: "G" },
  // Millions of Btu in the way of United States practice; a single M is thousand there and is not read at all.
  MM: { factor: 1e6, word: "million", shown: "MM" },
};

/** Pressures may also be written as gauge (`…g`) or absolute (`…a`). */
function isPressure(atom: Atom): boolean {
  return atom.vector === PRESSURE;
}

function atomOf(row: Row): Atom {
  const { symbols: _symbols, words: _words, prefixes: _prefixes, ...atom } = row;
  return atom;
}

function prefixed(row: Row, prefix: Prefix): Atom {
  // 0.001 × 0.001 is not the double nearest 1e-6; fifteen digits give the decimal back, and no factor here has more.
  const factor = Number((row.factor * prefix.factor).toPrecision(15));
  return { ...atomOf(row), symbol: `${prefix.shown}${row.symbol}`, factor };
}

function buildNames(): ReadonlyMap<string, Atom> {
  const names = new Map<string, Atom>();
  const add = (name: string, atom: Atom): void => {
    if (names.has(name)) throw new Error(`two units are called ${name}`);
    names.set(name, atom);
    if (!isPressure(atom) || atom.gauge) return;
    names.set(`${name}g`, { ...atom, symbol: `${atom.symbol}g`, gauge: true, joins: false });
    names.set(`${name}a`, { ...atom, symbol: `${atom.symbol}a`, joins: false });
  };
  for (const row of rows) {
    const atom = atomOf(row);
    for (const name of row.symbols) add(name, atom);
    for (const word of row.words ?? []) add(word, atom);
    for (const key of row.prefixes?.split(" ") ?? []) {
      const prefix = prefixes[key] as Prefix;
      const scaled = prefixed(row, prefix);
      for (const name of row.symbols) add(`${key}${name}`, scaled);
      if (key !== "u") for (const word of row.words ?? []) add(`${prefix.word}${word}`, scaled);
    }
  }
  return names;
}

/** Every name of every atom, prefixes applied. */
export const atomNames: ReadonlyMap<string, Atom> = buildNames();
