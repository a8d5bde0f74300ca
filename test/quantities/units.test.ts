import fc from "fast-check";
import Qty from "js-quantities";
import { describe, expect, test } from "vitest";
import { kinds } from "../../src/quantities/dimensions.js";
import { isProblem } from "../../src/quantities/problems.js";
import type { Dimension } from "../../src/quantities/quantity.js";
import { atomNames } from "../../src/quantities/unit-table.js";
import { defaultUnit, findUnit, readUnit, unitNames } from "../../src/quantities/units.js";

function factor(symbol: string): number {
  const unit = findUnit(symbol);
  if (unit === undefined) throw new Error(`${symbol} is not read`);
  return unit.factor;
}

/** Half a unit of the last printed digit of a value printed with seven significant digits. */
function halfOfLastDigit(printed: number): number {
  return 0.5 * 10 ** (Math.floor(Math.log10(printed)) - 6) * (1 + 1e-9);
}

describe("factors against published tables", () => {
  // NIST SP 811 (2008), appendix B.8, printed to seven digits; written down from memory.
  test.each([
    ["Btu/h", 2.930711e-1],
    ["Btu·ft/(h·ft²·°F)", 1.730735],
    ["Btu·in/(h·ft²·°F)", 1.442279e-1],
    ["Btu/(h·ft²·°F)", 5.678263],
    ["Btu/(s·ft²)", 1.135653e4],
    ["Btu/(h·ft²)", 3.154591],
    ["h·ft²·°F/Btu", 1.761102e-1],
    ["h·°F/Btu", 1.895634],
    ["ft³/min", 4.719474e-4],
    ["ft³/s", 2.831685e-2],
    ["gal/min", 6.30902e-5],
    ["hp", 7.456999e2],
    ["inHg", 3.386389e3],
    ["inH2O", 2.490889e2],
    ["ftH2O", 2.989067e3],
    ["mmHg", 1.333224e2],
    ["torr", 1.333224e2],
    ["kn", 5.144444e-1],
    ["lb/ft³", 1.601846e1],
    ["lb/gal", 1.198264e2],
    ["lb/(ft·h)", 4.133789e-4],
    ["lb/(ft·s)", 1.488164],
    ["lb/h", 1.259979e-4],
    ["psi", 6.894757e3],
    ["psf", 4.788026e1],
    ["lbf/ft", 1.45939e1],
    ["lbf·s/ft²", 4.788026e1],
    ["ton", 3.516853e3],
    ["rpm", 1.047198e-1],
  ])("%s is %d in SI", (symbol, printed) => {
    expect(Math.abs(factor(symbol) - printed)).toBeLessThanOrEqual(halfOfLastDigit(printed));
  });

  // Exact by definition: yard and pound agreement of 1959; steam conference of 1956; NIST SP 811 (bold factors). From memory.
  test.each([
    ["in", 0.0254],
    ["ft", 0.3048],
    ["yd", 0.9144],
    ["mi", 1609.344],
    ["mil", 2.54e-5],
    ["µin", 2.54e-8],
    ["mph", 0.44704],
    ["ft/min", 5.08e-3],
    ["ft²/h", 2.58064e-5],
    ["in²", 6.4516e-4],
    ["lb/s", 0.45359237],
    ["Btu/lb", 2326],
    ["Btu/(lb·°F)", 4186.8],
    ["kcal/h", 1.163],
    ["kcal/(h·m²·°C)", 1.163],
    ["atm", 101325],
    ["kgf/cm²", 98066.5],
    ["mmH2O", 9.80665],
    ["cSt", 1e-6],
    ["cP", 1e-3],
    ["dyn/cm", 1e-3],
    ["L/min", 1e-3 / 60],
    ["km/h", 1 / 3.6],
    ["lb/lbmol", 1e-3],
    ["deg", Math.PI / 180],
    ["rev/s", 2 * Math.PI],
  ])("%s is exactly %d in SI", (symbol, exact) => {
    expect(Math.abs(factor(symbol) / exact - 1)).toBeLessThan(5e-16);
  });
});

describe("factors against a general library", () => {
  /** Units that js-quantities 1.8.0 lacks, or takes for something else; each is held by the tables above instead. */
  const notComparable: Readonly<Record<string, string>> = {
    ton: "there a short ton of mass",
    torr: "there equal to mmHg, not atm/760; compared apart",
    inH2O: "there water at 4 °C, 249.082 Pa",
    mmH2O: "unknown",
    "kgf/cm²": "kgf is unknown",
    psf: "unknown",
    psig: "gauge pressures are unknown",
    barg: "gauge pressures are unknown",
    kPag: "gauge pressures are unknown",
    "kcal/h": "there the thermochemical calorie, 4.184 J",
    "kcal/(h·m²)": "there the thermochemical calorie, 4.184 J",
    "kcal/(h·m²·°C)": "there the thermochemical calorie, 4.184 J",
    "kcal/(h·m·°C)": "there the thermochemical calorie, 4.184 J",
    "kcal/(kg·°C)": "there the thermochemical calorie, 4.184 J",
    "kcal/kg": "there the thermochemical calorie, 4.184 J",
    "lb/lbmol": "lbmol is unknown",
    "-": "no unit",
    "%": "no unit",
  };

  const spelledThere: Readonly<Record<string, string>> = {
    gpm: "gal/min",
    gph: "gal/h",
    cfm: "ft^3/min",
    rpm: "rpm",
    "rev/s": "rotation/s",
    "kBtu/h": "kbtu/h",
    ΔK: "degK",
    "Δ°F": "degF",
    "1/K": "1/degK",
    "1/°F": "1/degF",
  };

  function spell(symbol: string): string {
    if (spelledThere[symbol] !== undefined) return spelledThere[symbol];
    return symbol
      .replace(/[()]/g, "")
      .replaceAll("·", "*")
      .replaceAll("²", "^2")
      .replaceAll("³", "^3")
      .replaceAll("µ", "u")
      .replace(/°([CFR])/g, "deg$1")
      .replace(/\bK\b/g, "degK")
      .replaceAll("Btu", "btu");
  }

  // Its own constants have six or seven digits (Btu 1055.056 J, psi 6894.76 Pa, lbf 4.448222 N, gallon 0.0037854118 m³).
  const comparable = unitNames().filter(({ symbol }) => notComparable[symbol] === undefined);
  test.each(comparable.map(({ symbol }) => [symbol, spell(symbol)]))("%s as %s", (symbol, there) => {
    expect(Math.abs(factor(symbol) / Qty(`1 ${there}`).toBase().scalar - 1)).toBeLessThan(1e-6);
  });

  test("every exception is a listed unit, and nearly all units are compared", () => {
    const symbols = new Set(unitNames().map(({ symbol }) => symbol));
    for (const symbol of Object.keys(notComparable)) expect(symbols).toContain(symbol);
    expect(comparable.length).toBeGreaterThan(100);
  });

  test("torr to the accuracy of mmHg there", () => {
    expect(Math.abs(factor("torr") / Qty("1 torr").toBase().scalar - 1)).toBeLessThan(1e-6);
  });

  test.each([
    ["°C", "tempC"],
    ["°F", "tempF"],
    ["K", "tempK"],
    ["°R", "tempR"],
  ])("zero of %s as %s", (symbol, there) => {
    const kelvin = findUnit(symbol)?.offset ?? 0;
    expect(kelvin + 300 * factor(symbol)).toBeCloseTo(Qty(`300 ${there}`).to("tempK").scalar, 10);
  });
});

describe("the grammar", () => {
  const spellings: readonly (readonly [symbol: string, dimension: Dimension, ...spellings: string[]])[] = [
    [
      "W/(m²·K)",
      "film coefficient",
      "W/m2K",
      "W/m2 K",
      "W/m2-K",
      "W/m2.K",
      "W/m2*K",
      "W/m^2K",
      "W/m^2-K",
      "W/m^2*K",
      "W/m**2/K",
      "W/m²K",
      "W/m²·K",
      "W/(m²K)",
      "W/(m2.K)",
      "W/(m^2*K)",
      "W m-2 K-1",
      "W m^-2 K^-1",
      "W·m⁻²·K⁻¹",
      "W.m-2.K-1",
      "W*m^-2*K^-1",
      "W/m2/K",
      "W / ( m2 K )",
      "W per m2 K",
      "w/m2k",
      "W/㎡K",
      "W/m2°C",
      "W/m2C",
      "W/m2-degC",
      "W/(m2 deg C)",
      "watt/m2-K",
      "W/sqm-K",
      "J/(s·m²·K)",
      "N/(m·s·K)",
    ],
    [
      "Btu/(h·ft²·°F)",
      "film coefficient",
      "BTU/hr-ft2-F",
      "Btu/h-ft2-F",
      "BTU/hr ft2 F",
      "Btu/hr.ft2.F",
      "BTU/(hr*ft^2*F)",
      "Btu/(h ft² °F)",
      "BTU/HR-FT2-F",
      "btu/hr-ft^2-degF",
      "Btu/h/ft2/F",
      "BTU/hrft2F",
      "Btu/hft2F",
      "BTU/(hr·sq ft·°F)",
      "BTU/hr-sqft-F",
      "BTU per hr per ft2 per F",
      "Btu hr-1 ft-2 F-1",
      "BTU/hr-ft2-R",
      "BTU/hr. ft2. °F",
    ],
    ["Btu/(h·ft·°F)", "conductivity", "BTU/hr-ft-F", "Btu/hftF", "BTU ft/hr ft2 F", "Btu·ft/(h·ft²·°F)"],
    ["W/(m·K)", "conductivity", "W/mK", "W/m-K", "W/m K", "W m-1 K-1", "W/m/K", "W/m°C", "w/mk", "W/mC"],
    ["kJ/(kg·K)", "specific heat", "kJ/kg-K", "kJ/kgK", "kJ/kg K", "kJ kg-1 K-1", "KJ/KG-K", "kj/kg-k", "J/gK", "kJ/kgC", "kJ/kg°C"],
    ["Btu/(lb·°F)", "specific heat", "BTU/lbm-F", "Btu/lb F", "BTU/lbmF", "Btu/lbF", "BTU/lbm-R", "kcal/kgK"],
    ["lb/ft³", "density", "lbm/ft3", "lb/ft^3", "LBM/FT3", "lb/cu ft", "lb/cuft", "pounds per cubic foot"],
    ["kg/m³", "density", "kg/m3", "kg/m^3", "kg m-3", "KG/M3", "Kg/m3", "kg·m⁻³", "kg/cu m", "g/L", "㎏/㎥"],
    ["mPa·s", "viscosity", "mPas", "mPa s", "mPa-s", "mPa.s", "cP", "cp", "centipoise"],
    ["Pa·s", "viscosity", "Pas", "Pa s", "Pa-s", "kg/m-s", "kg/(m s)", "kg/ms", "N s/m2", "N·s/m²"],
    ["m²/s", "kinematic viscosity", "m2/s", "m^2/s", "m² s⁻¹", "sq m/s", "M2/S", "m2 per sec"],
    ["mm²/s", "kinematic viscosity", "mm2/s", "cSt", "CST", "cst", "centistokes"],
    ["ft²/h", "kinematic viscosity", "ft2/hr", "sq ft/h", "FT2/HR"],
    ["m³/h", "volume flow", "m3/h", "m^3/hr", "m3/hour", "cubic meters per hour", "M3/H"],
    ["gpm", "volume flow", "GPM", "gal/min", "gallons per minute"],
    ["cfm", "volume flow", "CFM", "ft3/min", "cu ft/min", "cubic feet per minute"],
    ["L/min", "volume flow", "l/min", "lpm", "LPM", "liters/min", "litre/min", "dm3/min"],
    ["lb/h", "mass flow", "lb/hr", "lbm/hr", "LB/HR", "lbs/hr", "pounds per hour", "lb h-1"],
    ["kg/(m²·s)", "mass flux", "kg/m2s", "kg/m2-s", "kg/m2 s", "kg/(m^2 s)", "kg m-2 s-1", "kg/s/m2", "kg/s-m2"],
    ["lb/(h·ft²)", "mass flux", "lbm/hr-ft2", "lb/h ft2", "lb/hr/sqft"],
    ["W/cm²", "heat flux", "W/cm2", "W/cm^2", "W cm-2", "W per sq cm"],
    ["Btu/(h·ft²)", "heat flux", "BTU/hr-ft2", "Btu/h ft²", "BTU/hr/ft2"],
    ["h·ft²·°F/Btu", "area resistance", "hr-ft2-F/BTU", "h ft² °F / Btu", "F·ft2·h/Btu", "hr ft2 F/BTU"],
    ["m²·K/W", "area resistance", "m2K/W", "m2-K/W", "m^2 K/W", "K m2/W", "m2·°C/W", "m2 K W-1"],
    ["K/W", "thermal resistance", "°C/W", "C/W", "degC/W", "K W-1", "kelvin per watt"],
    ["ft/s", "speed", "fps", "ft/sec", "FT/S", "feet per second", "ft s-1", "ft·s⁻¹"],
    ["m/s", "speed", "M/S", "m/sec", "m s-1", "m·s⁻¹", "metres per second", "m/s."],
    ["rpm", "rotation", "RPM", "rev/min", "1/min", "min^-1", "min-1", "r/min".replace("r/", "rev/")],
    ["inH2O", "pressure", "in H2O", "inH₂O", "inWC", "in WC", "in. w.c.", "inches of water", "INH2O"],
    ["mmHg", "pressure", "mm Hg", "MMHG", "mm of mercury"],
    ["psig", "pressure", "PSIG", "psi(g)", "psi (g)", "psi gauge", "psi g"],
    ["barg", "pressure", "bar(g)", "bar (g)", "Barg", "bar gauge", "bar g"],
    ["kPag", "pressure", "kPa(g)", "kPa (gauge)", "kPa g", "KPAG"],
    ["psi", "pressure", "psia", "PSIA", "psi(a)", "psi abs", "psi absolute", "lbf/in2", "lbf/sq in"],
    [
      "°C",
      "temperature",
      "C",
      "c",
      "degC",
      "deg C",
      "deg. C",
      "Deg C",
      "degrees C",
      "degrees Celsius",
      "celsius",
      "º C",
      "° C",
      "℃",
      "˚C",
      "DEGC",
      "deg-C",
    ],
    ["°F", "temperature", "F", "f", "degF", "deg F", "DEG F", "degrees Fahrenheit", "ºF", "℉", "°f"],
    ["K", "temperature", "degK", "°K", "kelvin", "Kelvin", "\u212a"],
    ["°R", "temperature", "R", "degR", "Rankine"],
    ["ΔK", "temperature difference", "Δ°C", "ΔC", "delta C", "deltaC", "delta degC", "∆K", "delta_K"],
    ["µm", "length", "um", "\u00b5m", "\u03bcm", "micron", "microns", "UM", "micrometer"],
    ["in", "length", "IN", "In", "in.", "inch", "inches", '"', "″"],
    ["ft", "length", "FT", "ft.", "foot", "feet", "'", "′"],
    ["mm", "length", "MM", "millimeter", "millimetres", "㎜"],
    ["mil", "length", "mils", "thou", "MIL"],
    ["ft²", "area", "ft2", "sq ft", "sq. ft.", "sqft", "square feet", "SQ FT", "ft^2", "ft**2"],
    ["N/m", "surface tension", "J/m2", "kg/s2", "n/m"],
    ["dyn/cm", "surface tension", "dyne/cm", "mN/m", "dynes per cm"],
    ["1/K", "expansivity", "K-1", "K^-1", "K⁻¹", "/K", "1/°C", "per K", "1/degC"],
    ["ton", "power", "tons", "TR", "tons of refrigeration"],
    ["kcal/(h·m²·°C)", "film coefficient", "kcal/h-m2-C", "kcal/hm2C", "kcal/(m2 h °C)"],
    ["g/mol", "molar mass", "kg/kmol", "g mol-1", "lb/lbmol"],
    ["m/s²", "acceleration", "m/s2", "m/s^2", "m/s/s", "m s-2"],
    ["deg", "angle", "°", "degrees", "Degree"],
    ["%", "none", "percent", "per cent", "(%)"],
    ["-", "none", "(-)", "1", "–"],
  ];
  test.each(spellings.map((row) => [row[0], row] as const))("%s in its spellings", (symbol, [, dimension, ...texts]) => {
    const wanted = findUnit(symbol);
    for (const text of texts) {
      const unit = findUnit(text);
      expect(unit?.dimension, text).toBe(dimension);
      expect(Math.abs((unit?.factor ?? 0) / (wanted?.factor ?? 1) - 1), text).toBeLessThan(1e-14);
      expect(unit?.offset, text).toBe(wanted?.offset);
      expect(unit?.gauge, text).toBe(wanted?.gauge);
    }
  });

  test.each([
    ["", "is empty; a unit is needed."],
    ["mtr", '"mtr" is not a known unit.'],
    ["min", '"min" is a time.'],
    ["kg", '"kg" is a mass.'],
    ["Nm", '"Nm" is an energy.'],
    ["mpa", '"mpa" may be mPa or MPa; capitals decide, so write one of them.'],
    ["Mpa", '"Mpa" may be mPa or MPa; capitals decide, so write one of them.'],
    ["mw/m2", '"mw/m2" holds "mw", which may be mW or MW; capitals decide, so write one of them.'],
    ["Mm", '"Mm" may be millimetres or megametres; write "mm" for millimetres.'],
    ["Mbar", '"Mbar" may be millibar or megabar; write "mbar" for millibar.'],
    ["k", '"k" may be kelvin or a thousand; write "K" for kelvin.'],
    ["1/s", '"1/s" does not say whether revolutions or radians are meant; write "rev/s" or "rad/s".'],
    ["psig/ft", '"psig/ft" holds a gauge pressure, which cannot be multiplied or divided.'],
    ["kg/cm2", '"kg/cm2" is a unit of no quantity that is used here.'],
    ["scfm", '"scfm" is not a known unit.'],
    ["Nm3/h", '"Nm3/h" is a unit of no quantity that is used here.'],
    ["ms", '"ms" is a unit of no quantity that is used here.'],
    ["mft", '"mft" is not a known unit.'],
    ["m//s", '"m//s" is not a known unit.'],
    ["m/(s", '"m/(s" is not a known unit.'],
    ["m^0", '"m^0" is not a known unit.'],
    ["m^99", '"m^99" is not a known unit.'],
    ["constructor", '"constructor" is not a known unit.'],
  ])("%j is refused", (text, sentence) => {
    const unit = readUnit(text);
    expect(isProblem(unit) && unit.sentence).toBe(sentence);
    expect(findUnit(text)).toBeUndefined();
  });

  test.each([
    ["mW", 1e-3],
    ["MW", 1e6],
    ["kW", 1e3],
    ["KW", 1e3],
    ["Kw", 1e3],
    ["mPa", 1e-3],
    ["MPa", 1e6],
    ["kpa", 1e3],
    ["KPA", 1e3],
    ["mN/m", 1e-3],
    ["MN/m", 1e6],
    ["mK", 1e-3],
  ])("capitals of %s give %d", (text, value) => {
    expect(factor(text)).toBe(value);
  });

  test("arbitrary text is a finite unit or a sentence, never an exception", () => {
    const pieces = fc.array(
      fc.constantFrom(
        "W",
        "m",
        "K",
        "/",
        "-",
        "2",
        "^",
        "(",
        ")",
        "·",
        " ",
        "Btu",
        "hr",
        "ft",
        "°",
        "F",
        "%",
        "g",
        ".",
        "*",
        "1",
        "Δ",
        "psi",
      ),
      { maxLength: 12 },
    );
    const texts = fc.oneof(
      fc.string({ unit: "binary" }),
      fc.string(),
      pieces.map((list) => list.join("")),
    );
    fc.assert(
      fc.property(texts, (text) => {
        const unit = readUnit(text);
        if (isProblem(unit)) return unit.sentence.endsWith(".") && !unit.sentence.includes("undefined");
        return Number.isFinite(unit.factor) && unit.factor > 0 && unit.symbol !== "";
      }),
      { numRuns: 3000 },
    );
  });
});

describe("the lists", () => {
  test("every listed unit reads as itself, and every alias as the same unit", () => {
    for (const { symbol, dimension, aliases, source } of unitNames()) {
      expect(findUnit(symbol)).toMatchObject({ symbol, dimension });
      expect(source, symbol).not.toBe("");
      for (const alias of aliases) {
        expect(findUnit(alias)?.dimension, alias).toBe(dimension);
        expect(Math.abs((findUnit(alias)?.factor ?? 0) / factor(symbol) - 1), alias).toBeLessThan(1e-14);
      }
    }
  });

  test("no unit is listed twice", () => {
    const symbols = unitNames().map(({ symbol }) => symbol);
    expect(new Set(symbols).size).toBe(symbols.length);
  });

  test("every symbol that a unit shows is read back as that unit", () => {
    for (const [name, atom] of atomNames) {
      const unit = findUnit(name);
      if (unit === undefined) continue;
      expect(findUnit(unit.symbol), name).toMatchObject({ factor: atom.factor, dimension: unit.dimension });
    }
  });

  test.each([
    ["temperature", "°C", "°F"],
    ["length", "m", "ft"],
    ["speed", "m/s", "ft/s"],
    ["pressure", "Pa", "psia"],
    ["heat flux", "W/m²", "Btu/(h·ft²)"],
    ["film coefficient", "W/(m²·K)", "Btu/(h·ft²·°F)"],
    ["conductivity", "W/(m·K)", "Btu/(h·ft·°F)"],
    ["density", "kg/m³", "lb/ft³"],
    ["specific heat", "J/(kg·K)", "Btu/(lb·°F)"],
    ["viscosity", "Pa·s", "lb/(ft·s)"],
    ["kinematic viscosity", "m²/s", "ft²/h"],
    ["mass flow", "kg/s", "lb/h"],
    ["power", "W", "Btu/h"],
    ["expansivity", "1/K", "1/°F"],
    ["area", "m²", "ft²"],
    ["angle", "deg", "deg"],
    ["rotation", "rad/s", "rad/s"],
  ] as const)("%s by default in %s or %s", (dimension, symbolSI, symbolUS) => {
    expect(defaultUnit(dimension, "SI").symbol).toBe(symbolSI);
    expect(defaultUnit(dimension, "US").symbol).toBe(symbolUS);
  });

  test("every dimension has defaults of its own dimension, and SI defaults are SI but for °C and degrees", () => {
    for (const { dimension } of kinds) {
      expect(defaultUnit(dimension, "US").dimension).toBe(dimension);
      const unit = defaultUnit(dimension, "SI");
      expect(unit.dimension).toBe(dimension);
      expect(unit.factor, dimension).toBe(dimension === "angle" ? Math.PI / 180 : 1);
    }
    expect(defaultUnit("temperature difference", "US").offset).toBeUndefined();
  });
});
