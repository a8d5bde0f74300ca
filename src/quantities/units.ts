/** Units by name: any sensible spelling of a compound unit to its dimension and its factor to SI. */
import { foreignPhrase, type Kind, kindOfVector, kinds } from "./dimensions.js";
import { isProblem, type Problem, valueProblem } from "./problems.js";
import type { Dimension } from "./quantity.js";
import { type Factor, normaliseUnit, readProduct } from "./unit-grammar.js";
import type { Vector } from "./unit-table.js";

export interface Unit {
  readonly symbol: string;
  readonly dimension: Dimension;
  /** SI value of one of this unit. */
  readonly factor: number;
  /** Kelvin at zero of the scale; temperatures only. */
  readonly offset?: number;
  /** Pressure above the ambient. */
  readonly gauge?: boolean;
}

export interface UnitName {
  readonly symbol: string;
  readonly dimension: Dimension;
  readonly aliases: readonly string[];
  /** Where the factors of its parts come from. */
  readonly source: string;
}

/** Why a text is no unit that any argument takes. `says` follows the text in a sentence. */
export interface UnitProblem extends Problem {
  readonly kind: "unknown" | "foreign" | "unclear";
  readonly says: string;
}

/** Whole texts that no grammar of products can read. */
const wholeTexts: ReadonlyMap<string, string> = new Map(
  Object.entries({
    '"': "in",
    "''": "in",
    "″": "in",
    "”": "in",
    "'": "ft",
    "′": "ft",
    "’": "ft",
    "%": "%",
    pct: "%",
    percent: "%",
    "per cent": "%",
    "-": "-",
    "–": "-",
    "—": "-",
    "1": "-",
    "tons of refrigeration": "ton",
    "ton of refrigeration": "ton",
    "refrigeration tons": "ton",
    // Motor plates write revolutions per minute so; nobody gives radians per minute.
    "1/min": "rpm",
    "/min": "rpm",
    "min^-1": "rpm",
    "min-1": "rpm",
  }),
);

/** Readings so far apart, and one of them so unlikely, that neither is taken for granted. */
const unclearTexts: ReadonlyMap<string, string> = new Map([
  ["k", 'may be kelvin or a thousand; write "K" for kelvin'],
  ["Mm", 'may be millimetres or megametres; write "mm" for millimetres'],
  ["Mbar", 'may be millibar or megabar; write "mbar" for millibar'],
]);

const percent: Unit = { symbol: "%", dimension: "none", factor: 0.01 };
const plain: Unit = { symbol: "-", dimension: "none", factor: 1 };
const millikelvin: Unit = { symbol: "mK", dimension: "temperature", factor: 1e-3 };

const longestUnit = 60;
const cacheSize = 400;
const cache = new Map<string, Unit | UnitProblem>();

/** The unit that `text` names, or `undefined`; `readUnit` says why not. */
export function findUnit(text: string): Unit | undefined {
  const found = readUnit(text);
  return isProblem(found) ? undefined : found;
}

/** The unit that `text` names, or a problem whose sentence begins with the text and says why it is none. */
export function readUnit(text: string): Unit | UnitProblem {
  const known = cache.get(text);
  if (known !== undefined) return known;
  const unit = readAfresh(text);
  if (cache.size >= cacheSize) cache.clear();
  cache.set(text, unit);
  return unit;
}

function unitProblem(kind: UnitProblem["kind"], shown: string, says: string): UnitProblem {
  return { ...valueProblem(undefined, `"${shown}" ${says}.`), kind, says };
}

function unknownUnit(shown: string): UnitProblem {
  return unitProblem("unknown", shown, "is not a known unit");
}

function readAfresh(text: string): Unit | UnitProblem {
  const trimmed = text.trim();
  const shown = shorten(trimmed);
  if (trimmed === "") return { ...valueProblem(undefined, "is empty; a unit is needed."), kind: "unknown", says: "is empty" };
  if (trimmed.length > longestUnit) return unknownUnit(shown);
  const bare = /^\(([^()]*)\)$/.exec(trimmed)?.[1]?.trim() ?? trimmed;
  return readWhole(bare) ?? readGrammatical(bare, shown);
}

function readWhole(text: string): Unit | UnitProblem | undefined {
  if (text === "mK") return millikelvin;
  const unclear = unclearTexts.get(text);
  if (unclear !== undefined) return unitProblem("unclear", text, unclear);
  const meant = wholeTexts.get(text.toLowerCase());
  if (meant === "%") return percent;
  if (meant === "-") return plain;
  return meant === undefined ? undefined : readGrammatical(meant, meant);
}

function readGrammatical(text: string, shown: string): Unit | UnitProblem {
  const normal = normaliseUnit(text);
  const mark = /(GAUGE|ABSOLUTE)$/.exec(normal)?.[1];
  const read = readProduct(mark === undefined ? normal : normal.slice(0, -mark.length).trim());
  if (read.kind === "unknown") return unknownUnit(shown);
  if (read.kind === "ambiguous") {
    const which = read.word === shown ? "may be" : `holds "${read.word}", which may be`;
    return unitProblem("unclear", shown, `${which} ${read.choices.join(" or ")}; capitals decide, so write one of them`);
  }
  const sole = read.factors.length === 1 && read.factors[0]?.power === 1 ? read.factors[0] : undefined;
  if (mark !== undefined) return sole ? markedPressure(sole, mark, shown) : unknownUnit(shown);
  return sole ? soleUnit(sole, shown) : compoundUnit(read.factors, shown);
}

function markedPressure({ atom }: Factor, mark: string, shown: string): Unit | UnitProblem {
  if (kindOfVector(atom.vector)?.dimension !== "pressure" || atom.gauge) return unknownUnit(shown);
  const unit = { dimension: "pressure", factor: atom.factor } as const;
  return mark === "GAUGE" ? { ...unit, symbol: `${atom.symbol}g`, gauge: true } : { ...unit, symbol: `${atom.symbol}a` };
}

function soleUnit({ atom }: Factor, shown: string): Unit | UnitProblem {
  const isTemperature = kindOfVector(atom.vector)?.dimension === "temperature difference";
  const dimension = isTemperature && !atom.difference ? "temperature" : kindOfVector(atom.vector)?.dimension;
  if (dimension === undefined) return foreignUnit(atom.vector, shown);
  const unit = { symbol: atom.symbol, dimension, factor: atom.factor };
  if (atom.offset !== undefined) return { ...unit, offset: atom.offset };
  return atom.gauge ? { ...unit, gauge: true } : unit;
}

function compoundUnit(factors: readonly Factor[], shown: string): Unit | UnitProblem {
  if (factors.some(({ atom }) => atom.gauge)) {
    return unitProblem("unclear", shown, "holds a gauge pressure, which cannot be multiplied or divided");
  }
  const vector = vectorOf(factors);
  const kind = kindOfVector(vector);
  if (kind === undefined) return foreignUnit(vector, shown);
  return { symbol: symbolOf(factors), dimension: kind.dimension, factor: factorOf(factors) };
}

function foreignUnit(vector: Vector, shown: string): UnitProblem {
  if (vector.join() === "0,0,-1,0,0,0") {
    return unitProblem("unclear", shown, 'does not say whether revolutions or radians are meant; write "rev/s" or "rad/s"');
  }
  const phrase = foreignPhrase(vector);
  if (phrase === undefined) return unitProblem("unknown", shown, "is a unit of no quantity that is used here");
  return unitProblem("foreign", shown, `is ${phrase}`);
}

function vectorOf(factors: readonly Factor[]): Vector {
  const sum = [0, 0, 0, 0, 0, 0] as [number, number, number, number, number, number];
  for (const { atom, power } of factors)
    atom.vector.forEach((exponent, at) => {
      sum[at] = (sum[at] as number) + exponent * power;
    });
  return sum;
}

/** One division at the end, so that kg/h is exactly 1/3600. */
function factorOf(factors: readonly Factor[]): number {
  let above = 1;
  let below = 1;
  for (const { atom, power } of factors) {
    if (power > 0) above *= raise(atom.factor, power);
    else below *= raise(atom.factor, -power);
  }
  return above / below;
}

/** Square centimetres are 1e-4 m², not 1.0000000000000002e-4. */
function raise(factor: number, power: number): number {
  return power === 1 ? factor : Number((factor ** power).toPrecision(15));
}

function symbolOf(factors: readonly Factor[]): string {
  const above = factors.filter(({ power }) => power > 0).map(({ atom, power }) => powered(atom.symbol, power));
  const below = factors.filter(({ power }) => power < 0).map(({ atom, power }) => powered(atom.symbol, -power));
  const divisor = below.length > 1 ? `(${below.join("·")})` : below[0];
  if (divisor === undefined) return above.join("·");
  return `${above.length === 0 ? "1" : above.join("·")}/${divisor}`;
}

function powered(symbol: string, power: number): string {
  if (power === 1) return symbol;
  return `${symbol}${[...String(power)].map((digit) => "⁰¹²³⁴⁵⁶⁷⁸⁹"[Number(digit)]).join("")}`;
}

/** At most so much of a user's text is repeated in a sentence. */
export function shorten(text: string): string {
  const longestQuote = 48;
  return text.length <= longestQuote ? text : `${text.slice(0, longestQuote)}…`;
}

/** Units that the lists show; the grammar reads many more. */
const listed: Readonly<Record<Dimension, readonly (readonly [symbol: string, ...aliases: string[]])[]>> = {
  temperature: [
    ["°C", "C", "degC", "deg C", "celsius"],
    ["°F", "F", "degF", "deg F", "fahrenheit"],
    ["K", "degK", "kelvin"],
    ["°R", "R", "degR", "rankine"],
  ],
  "temperature difference": [
    ["ΔK", "Δ°C", "delta C", "delta K"],
    ["Δ°F", "delta F", "Δ°R"],
  ],
  length: [
    ["m", "metre", "meter"],
    ["mm", "millimetre"],
    ["cm"],
    ["µm", "um", "micron"],
    ["km"],
    ["nm"],
    ["in", '"', "inch"],
    ["ft", "'", "foot", "feet"],
    ["µin", "uin", "microinch"],
    ["mil", "thou"],
    ["yd", "yard"],
    ["mi", "mile"],
  ],
  area: [
    ["m²", "m2", "m^2"],
    ["cm²", "cm2"],
    ["mm²", "mm2"],
    ["ft²", "ft2", "sq ft", "sqft"],
    ["in²", "in2", "sq in"],
  ],
  speed: [
    ["m/s", "m s-1"],
    ["ft/s", "fps"],
    ["ft/min", "fpm"],
    ["km/h", "kph"],
    ["mph", "mi/h"],
    ["kn", "kt", "knot", "knots"],
    ["cm/s"],
    ["mm/s"],
    ["in/s"],
  ],
  rotation: [["rad/s"], ["rpm", "rev/min", "1/min"], ["rev/s", "rps", "Hz"], ["deg/s"]],
  "mass flow": [["kg/s"], ["kg/h", "kg/hr"], ["kg/min"], ["g/s"], ["lb/h", "lbm/hr", "lb/hr"], ["lb/s", "lbm/s"], ["lb/min"], ["t/h"]],
  "volume flow": [
    ["m³/s", "m3/s"],
    ["m³/h", "m3/h", "m^3/hr"],
    ["L/min", "l/min", "lpm"],
    ["L/s", "l/s"],
    ["L/h", "lph"],
    ["gpm", "gal/min"],
    ["cfm", "ft3/min"],
    ["ft³/s", "cfs"],
    ["ft³/h", "cfh"],
    ["gph", "gal/h"],
  ],
  "mass flux": [
    ["kg/(m²·s)", "kg/m2s", "kg/m2-s"],
    ["lb/(h·ft²)", "lbm/hr-ft2"],
    ["lb/(s·ft²)", "lbm/s-ft2"],
  ],
  pressure: [
    ["Pa"],
    ["hPa"],
    ["kPa", "kPa(a)"],
    ["MPa"],
    ["bar", "bara", "bar(a)"],
    ["mbar"],
    ["atm"],
    ["psi", "psia"],
    ["psig", "psi(g)"],
    ["barg", "bar(g)"],
    ["kPag", "kPa(g)"],
    ["inH2O", "in H2O", "inWC"],
    ["mmH2O"],
    ["inHg", "in Hg"],
    ["mmHg"],
    ["torr"],
    ["kgf/cm²", "kgf/cm2"],
    ["psf", "lbf/ft2"],
  ],
  "heat flux": [
    ["W/m²", "W/m2"],
    ["kW/m²", "kW/m2"],
    ["MW/m²", "MW/m2"],
    ["W/cm²", "W/cm2"],
    ["Btu/(h·ft²)", "BTU/hr-ft2"],
    ["kcal/(h·m²)", "kcal/h-m2"],
  ],
  power: [
    ["W", "watt"],
    ["mW"],
    ["kW"],
    ["MW"],
    ["Btu/h", "BTU/hr"],
    ["kBtu/h", "MBH"],
    ["ton", "TR", "tons of refrigeration"],
    ["kcal/h"],
    ["hp"],
  ],
  "film coefficient": [
    ["W/(m²·K)", "W/m2K", "W/m^2-K", "W m-2 K-1", "W/m2C"],
    ["kW/(m²·K)", "kW/m2K"],
    ["W/(cm²·K)", "W/cm2K"],
    ["Btu/(h·ft²·°F)", "BTU/hr-ft2-F", "Btu/h ft2 F"],
    ["kcal/(h·m²·°C)", "kcal/h-m2-C"],
  ],
  conductivity: [
    ["W/(m·K)", "W/mK", "W/m-K"],
    ["mW/(m·K)", "mW/mK"],
    ["Btu/(h·ft·°F)", "BTU/hr-ft-F"],
    ["Btu·in/(h·ft²·°F)"],
    ["kcal/(h·m·°C)"],
  ],
  density: [["kg/m³", "kg/m3", "kg m-3"], ["g/cm³", "g/cc", "g/cm3"], ["kg/L"], ["lb/ft³", "lbm/ft3"], ["lb/gal"]],
  "specific heat": [
    ["J/(kg·K)", "J/kgK", "J/kg-K"],
    ["kJ/(kg·K)", "kJ/kgK", "kJ/kg-K"],
    ["Btu/(lb·°F)", "BTU/lbm-F"],
    ["kcal/(kg·°C)", "kcal/kg-C"],
  ],
  viscosity: [
    ["Pa·s", "Pa s", "Pa-s", "kg/(m·s)"],
    ["mPa·s", "mPa s"],
    ["µPa·s", "uPa s"],
    ["cP"],
    ["P", "poise"],
    ["lb/(ft·s)", "lbm/ft-s"],
    ["lb/(ft·h)", "lbm/ft-hr"],
  ],
  "kinematic viscosity": [["m²/s", "m2/s"], ["mm²/s", "mm2/s"], ["cSt"], ["St"], ["ft²/h", "ft2/hr"], ["ft²/s", "ft2/s"]],
  expansivity: [
    ["1/K", "K-1", "/K", "1/°C"],
    ["1/°F", "1/F", "1/°R"],
  ],
  "thermal resistance": [
    ["K/W", "°C/W", "C/W"],
    ["h·°F/Btu", "hr-F/BTU"],
  ],
  "area resistance": [["m²·K/W", "m2K/W", "m2-K/W"], ["mm²·K/W"], ["h·ft²·°F/Btu", "hr-ft2-F/BTU"]],
  "specific energy": [["J/kg"], ["kJ/kg"], ["MJ/kg"], ["Btu/lb", "BTU/lbm"], ["kcal/kg"]],
  "surface tension": [["N/m"], ["mN/m"], ["dyn/cm", "dyne/cm"], ["lbf/ft"]],
  "molar mass": [["kg/mol"], ["g/mol", "kg/kmol"], ["lb/lbmol", "lbm/lbmol"]],
  acceleration: [
    ["m/s²", "m/s2", "m/s^2"],
    ["ft/s²", "ft/s2"],
  ],
  angle: [["deg", "°", "degrees"], ["rad"]],
  none: [
    ["-", "1"],
    ["%", "percent"],
  ],
};

let names: readonly UnitName[] | undefined;

/** Every listed unit with its common spellings; any other sensible spelling is read as well. */
export function unitNames(): readonly UnitName[] {
  names ??= kinds.flatMap((kind) => listed[kind.dimension].map((row) => nameOf(kind, row)));
  return names;
}

function nameOf({ dimension }: Kind, [symbol, ...aliases]: readonly [string, ...string[]]): UnitName {
  return { symbol, dimension, aliases, source: sourceOf(symbol) };
}

function sourceOf(symbol: string): string {
  if (symbol === "%" || symbol === "-") return "dimensionless";
  const read = readProduct(normaliseUnit(symbol));
  return read.kind === "product" ? [...new Set(read.factors.map(({ atom }) => atom.source))].join("; ") : "";
}

/** Symbols and spellings of one dimension, for suggestions. */
export function spellingsOf(dimension: Dimension): readonly (readonly [symbol: string, ...aliases: string[]])[] {
  return listed[dimension];
}

function readDefaults(system: "SI" | "US"): Readonly<Record<Dimension, Unit>> {
  const defaults = kinds.map((kind) => [kind.dimension, defaultOf(kind, system)] as const);
  return Object.fromEntries(defaults) as Record<Dimension, Unit>;
}

function defaultOf(kind: Kind, system: "SI" | "US"): Unit {
  const unit = findUnit(kind[system]) as Unit;
  return kind.dimension === "temperature difference" ? asDifference(unit) : unit;
}

/** The same degrees without their zero: `°C` as a unit of differences. */
export function asDifference(unit: Unit): Unit {
  return { symbol: unit.symbol, dimension: "temperature difference", factor: unit.factor };
}

const defaultsSI = readDefaults("SI");
const defaultsUS = readDefaults("US");

/** Unit of bare numbers and of results. */
export function defaultUnit(dimension: Dimension, system: "SI" | "US"): Unit {
  return system === "US" ? defaultsUS[dimension] : defaultsSI[dimension];
}
