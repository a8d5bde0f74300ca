import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { kinds } from "../../src/quantities/dimensions.js";
import { formatQuantity } from "../../src/quantities/format.js";
import { isProblem, type Problem } from "../../src/quantities/problems.js";
import type { Dimension, Quantity, Reading } from "../../src/quantities/quantity.js";
import { readQuantity } from "../../src/quantities/reading.js";
import { unitNames } from "../../src/quantities/units.js";

const SI: Reading = { system: "SI", ambient: 101325 };
const US: Reading = { system: "US", ambient: 101325 };
const surface: readonly Dimension[] = ["temperature", "heat flux"];
const flow: readonly Dimension[] = ["speed", "mass flow", "volume flow", "mass flux"];

function read(given: string | number, wanted: Dimension | readonly Dimension[], reading = SI): Quantity {
  const found = readQuantity(given, wanted, reading, "argument");
  if (isProblem(found)) throw new Error(`${given}: ${found.sentence}`);
  return found;
}

function refusal(given: string | number, wanted: Dimension | readonly Dimension[], reading = SI): Problem {
  const found = readQuantity(given, wanted, reading, "height");
  if (!isProblem(found)) throw new Error(`${given} was read as ${found.value} (${found.dimension})`);
  return found;
}

// Expected values follow from the exact definitions of the units (NIST SP 811, appendix B), worked by hand.
describe("values", () => {
  test.each([
    [20, surface, 293.15, "temperature"],
    [0, surface, 273.15, "temperature"],
    [0.3, "length", 0.3, "length"],
    [-0.3, "length", -0.3, "length"],
    [90, "angle", Math.PI / 2, "angle"],
    [101325, "pressure", 101325, "pressure"],
    ["20", surface, 293.15, "temperature"],
    ["20 C", surface, 293.15, "temperature"],
    ["20°C", surface, 293.15, "temperature"],
    ["293.15 K", surface, 293.15, "temperature"],
    ["72 degF", surface, (72 + 459.67) / 1.8, "temperature"],
    ["−40 °F", surface, 233.15, "temperature"],
    ["–40 °C", surface, 233.15, "temperature"],
    ["540 °R", surface, 300, "temperature"],
    ["500 W/m2", surface, 500, "heat flux"],
    ["-500 W/m²", surface, -500, "heat flux"],
    ["1e+07 W/m2", surface, 1e7, "heat flux"],
    ["3 in", "length", 0.0762, "length"],
    ['3"', "length", 0.0762, "length"],
    ["3 mil", "length", 7.62e-5, "length"],
    ["3 m", "length", 3, "length"],
    ["3 mi", "length", 4828.032, "length"],
    ["12,5 mm", "length", 0.0125, "length"],
    ["0,5 m", "length", 0.5, "length"],
    [",5 m", "length", 0.5, "length"],
    [".5 m", "length", 0.5, "length"],
    ["1,0005 m", "length", 1.0005, "length"],
    ["1,5e3 mm", "length", 1.5, "length"],
    ["101\u00a0325 Pa", "pressure", 101325, "pressure"],
    ["1\u202f000\u202f000\u2009Pa", "pressure", 1e6, "pressure"],
    ["2.1×10^3 mm", "length", 2.1, "length"],
    ["2·10⁻³ m", "length", 2e-3, "length"],
    ["+5 m", "length", 5, "length"],
    ["30 psig", "pressure", 30 * 6894.757293168361 + 101325, "pressure"],
    ["0 barg", "pressure", 101325, "pressure"],
    ["30 psi", "pressure", 30 * 6894.757293168361, "pressure"],
    ["2 bar", "pressure", 2e5, "pressure"],
    ["5 %", "none", 0.05, "none"],
    ["0.9 -", "none", 0.9, "none"],
    [2, flow, 2, "speed"],
    ["10 ft/s", flow, 3.048, "speed"],
    ["0.4 kg/s", flow, 0.4, "mass flow"],
    ["12 gpm", flow, 12 * 6.30901964e-5, "volume flow"],
    ["300 kg/m2s", flow, 300, "mass flux"],
    ["3000 rpm", "rotation", 100 * Math.PI, "rotation"],
    ["50 Hz", "rotation", 100 * Math.PI, "rotation"],
    ["5 K", "temperature difference", 5, "temperature difference"],
    ["5 °C", "temperature difference", 5, "temperature difference"],
    ["9 °F", "temperature difference", 5, "temperature difference"],
    ["9 Δ°F", "temperature difference", 5, "temperature difference"],
    ["0.003 1/K", "expansivity", 0.003, "expansivity"],
    ["0.003/K", "expansivity", 0.003, "expansivity"],
    ["5 W m-2 K-1", "film coefficient", 5, "film coefficient"],
  ] as const)("%j as %j", (given, wanted, value, dimension) => {
    const quantity = read(given, wanted);
    expect(Math.abs(quantity.value - value)).toBeLessThanOrEqual(
      4e-15 * Math.max(1e-3, Math.abs(value)) + 6e-14 * Number(dimension === "temperature"),
    );
    expect(quantity).toMatchObject({ dimension, given });
    expect(quantity.tolerance).toBeUndefined();
  });

  test("the unit is the one written, or the default supplied", () => {
    expect(read("3 W/m2K", "film coefficient").unit).toBe("W/m2K");
    expect(read(3, "film coefficient").unit).toBe("W/(m²·K)");
    expect(read("3", "film coefficient", US).unit).toBe("Btu/(h·ft²·°F)");
  });

  test.each([
    [72, surface, 295.37222222222226],
    [1, "length", 0.3048],
    [14.7, "pressure", 14.7 * 6894.757293168361],
    [9, "temperature difference", 5],
    [100, "rotation", 100],
    ["20 °C", surface, 293.15],
  ] as const)("%j under units = US", (given, wanted, value) => {
    expect(read(given, wanted, US).value).toBeCloseTo(value, 9);
  });

  test("the unit of one argument overrides the system for bare numbers alone", () => {
    expect(read(12, "length", { ...US, unit: "mm" }).value).toBeCloseTo(0.012, 15);
    expect(read("12", "length", { ...US, unit: "mm" }).value).toBeCloseTo(0.012, 15);
    expect(read("12 in", "length", { ...US, unit: "mm" }).value).toBeCloseTo(0.3048, 15);
    expect(read(3, flow, { ...SI, unit: "kg/h" })).toMatchObject({ dimension: "mass flow", value: 3 * (1 / 3600) });
    expect(read(9, "temperature difference", { ...SI, unit: "°F" }).value).toBe(5);
    expect(read(50, "none", { ...SI, unit: "%" }).value).toBe(0.5);
  });

  test("gauge pressures add the ambient of the reading", () => {
    expect(read("1 barg", "pressure", { ...SI, ambient: 80000 }).value).toBe(180000);
    expect(read(1, "pressure", { ...SI, ambient: 80000, unit: "barg" }).value).toBe(180000);
  });
});

describe("tolerances", () => {
  test.each([
    ["20 ± 2 °C", surface, 293.15, 2],
    ["20 °C ± 2 K", surface, 293.15, 2],
    ["20 °C ± 2", surface, 293.15, 2],
    ["(20 ± 2) °C", surface, 293.15, 2],
    ["20 °C ± 1.8 °F", surface, 293.15, 1],
    ["20 °C ± 2 ΔK", surface, 293.15, 2],
    ["68 ± 2 °F", surface, 293.15, 10 / 9],
    ["300 K ± 5 %", surface, 300, 15],
    ["0.30 +/- 0.01 m", "length", 0.3, 0.01],
    ["0.30+-0.01m", "length", 0.3, 0.01],
    ["0,30 ± 0,01 m", "length", 0.3, 0.01],
    ["30 cm ± 5 mm", "length", 0.3, 0.005],
    ["12 m/s ± 10 %", flow, 12, 1.2],
    ["12 ± 10 % m/s", flow, 12, 1.2],
    ["(12 ± 10 %) m/s", flow, 12, 1.2],
    ["12 ± 10 %", flow, 12, 1.2],
    ["12 ± 1", flow, 12, 1],
    ["-2 m/s ± 10 percent", flow, -2, 0.2],
    ["6.5435e+07 +/- 1e+05 W/m2", surface, 6.5435e7, 1e5],
    ["6.5435e+07+/-1e+05 W/m2", surface, 6.5435e7, 1e5],
    ["2 bar ± 5 %", "pressure", 2e5, 1e4],
    ["2 barg ± 0.1 bar", "pressure", 301325, 1e4],
    ["(5 ± 1) %", "none", 0.05, 0.01],
    ["0.9 ± 0.05", "none", 0.9, 0.05],
    ["5 ± 0 m", "length", 5, 0],
  ] as const)("%j", (given, wanted, value, tolerance) => {
    const quantity = read(given, wanted);
    expect(quantity.value).toBeCloseTo(value, 9);
    expect(quantity.tolerance).toBeCloseTo(tolerance, 9);
  });
});

describe("refusals", () => {
  const length = 'a length is needed, such as 0.3 or "0.3 m"';
  const temperature = 'a temperature or heat flux is needed, such as 20 or "20 °C"';
  const comma =
    "has a comma that cannot be read for certain; write the number with one decimal point and no thousands separators, such as 1234.5.";
  const several = 'holds more than one number; write one number without spaces and one unit, such as "1500 mm".';
  test.each([
    ["", "length", `is empty; ${length}.`],
    [" \u00a0\t", "length", `is empty; ${length}.`],
    ["abc", "length", `"abc" does not begin with a number; ${length}.`],
    ["NaN", "length", `"NaN" does not begin with a number; ${length}.`],
    ["Infinity m", "length", `"Infinity m" does not begin with a number; ${length}.`],
    ["~20 m", "length", `"~20 m" does not begin with a number; ${length}.`],
    ["1.2.3 m", "length", `"1.2.3 m" holds "1.2.3", which is not a number; ${length}.`],
    [Number.NaN, "length", `is not a finite number; ${length}.`],
    [Number.POSITIVE_INFINITY, "length", `is not a finite number; ${length}.`],
    ["1e999 m", "length", `"1e999 m" is too large a number; ${length}.`],
    ["1e308 km", "length", `"1e308 km" is too large a number; ${length}.`],
    ["0.3 m/s", "length", `"0.3 m/s" is a speed; ${length}.`],
    ["3 min", "length", `"3 min" is a time; ${length}.`],
    ["3 K", "length", `"3 K" is a temperature; ${length}.`],
    ["5 %", "length", `"5 %" is a number without dimension; ${length}.`],
    ["3 kg", "length", `"3 kg" is a mass; ${length}.`],
    ["5 Nm", "length", `"5 Nm" is an energy; ${length}.`],
    ["3 mtr", "length", `"3 mtr" has an unknown unit, "mtr"; ${length}, in a unit such as m, mm or ft.`],
    [
      "3 kg/cm2",
      "pressure",
      '"3 kg/cm2" has an unknown unit, "kg/cm2"; a pressure is needed, such as 101325 or "101325 Pa", in a unit such as kgf/cm², kPa or atm.',
    ],
    ["5 Mm", "length", '"5 Mm" has an unclear unit: "Mm" may be millimetres or megametres; write "mm" for millimetres.'],
    ["5 mpa", "pressure", '"5 mpa" has an unclear unit: "mpa" may be mPa or MPa; capitals decide, so write one of them.'],
    ["20 k", surface, '"20 k" has an unclear unit: "k" may be kelvin or a thousand; write "K" for kelvin.'],
    [
      "50 1/s",
      "rotation",
      '"50 1/s" has an unclear unit: "1/s" does not say whether revolutions or radians are meant; write "rev/s" or "rad/s".',
    ],
    ["1,000", "length", '"1,000" has a comma that may separate thousands or decimals; write 1000 or 1.000.'],
    ["1,000 m", "length", '"1,000 m" has a comma that may separate thousands or decimals; write 1000 or 1.000.'],
    ["12,500e3 Pa", "pressure", '"12,500e3 Pa" has a comma that may separate thousands or decimals; write 12500e3 or 12.500e3.'],
    ["0,125 m", "length", '"0,125 m" has a comma with three digits after it; write 0.125 with a decimal point.'],
    ["1.000,5 m", "length", `"1.000,5 m" ${comma}`],
    ["1,000.5 m", "length", `"1,000.5 m" ${comma}`],
    ["1,000,000 Pa", "pressure", `"1,000,000 Pa" ${comma}`],
    ["5, m", "length", `"5, m" ${comma}`],
    ["5 ± 1,000 m", "length", '"5 ± 1,000 m" has a comma that may separate thousands or decimals; write 1000 or 1.000.'],
    ["0,5 ± 0.1 m", "length", '"0,5 ± 0.1 m" mixes a decimal comma with a decimal point; write both numbers with a point.'],
    ["5-7 m", "length", '"5-7 m" is a range of two numbers; write the middle and the half-width, such as "6 ± 1 m".'],
    ["5–7 m", "length", '"5–7 m" is a range of two numbers; write the middle and the half-width, such as "6 ± 1 m".'],
    ["5 to 7", "length", '"5 to 7" is a range of two numbers; write the middle and the half-width, such as "6 ± 1".'],
    ["5..7 m", "length", '"5..7 m" is a range of two numbers; write the middle and the half-width, such as "6 ± 1 m".'],
    ["5…7 m", "length", '"5…7 m" is a range of two numbers; write the middle and the half-width, such as "6 ± 1 m".'],
    ["-5 - -7 °C", surface, '"-5 - -7 °C" is a range of two numbers; write the middle and the half-width, such as "-6 ± 1 °C".'],
    [
      "1e5-3e5 Pa",
      "pressure",
      '"1e5-3e5 Pa" is a range of two numbers; write the middle and the half-width, such as "200000 ± 100000 Pa".',
    ],
    ["5 m - 7 m", "length", '"5 m - 7 m" is a range of two numbers; write the middle and the half-width, such as "6 ± 1 m".'],
    ["20 °C to 30 °C", surface, '"20 °C to 30 °C" is a range of two numbers; write the middle and the half-width, such as "25 ± 5 °C".'],
    ["5 ft 6 in", "length", `"5 ft 6 in" ${several}`],
    ["5' 6\"", "length", `"5' 6"" ${several}`],
    ["101 325 Pa", "pressure", `"101 325 Pa" ${several}`],
    ["1/2 in", "length", '"1/2 in" holds a fraction; write it as a decimal, such as "0.5 in".'],
    ["1-3/4 in", "length", '"1-3/4 in" holds a fraction; write it as a decimal, such as "1.75 in".'],
    ["-300 °C", surface, '"-300 °C" is below absolute zero, which is -273.15 °C, -459.67 °F or 0 K.'],
    [-300, surface, "-300 °C is below absolute zero, which is -273.15 °C, -459.67 °F or 0 K."],
    ["-1 K", surface, '"-1 K" is below absolute zero, which is -273.15 °C, -459.67 °F or 0 K.'],
    ["5 ΔK", surface, `"5 ΔK" is a temperature difference; ${temperature}.`],
    ["3 m", surface, `"3 m" is a length; ${temperature}.`],
    [
      "20 °C ± 5 %",
      surface,
      '"20 °C ± 5 %" has a percentage of °C, whose zero is arbitrary; write the half-width in degrees, such as "20 ± 2 °C".',
    ],
    [
      "70 ± 5 % °F",
      surface,
      '"70 ± 5 % °F" has a percentage of °F, whose zero is arbitrary; write the half-width in degrees, such as "70 ± 2 °F".',
    ],
    [
      "20 ± 5 %",
      surface,
      '"20 ± 5 %" has a percentage of °C, whose zero is arbitrary; write the half-width in degrees, such as "20 ± 2 °C".',
    ],
    ["20 ± -2 °C", surface, '"20 ± -2 °C" has a negative tolerance; write the half-width as a positive number.'],
    ["20 ± °C", surface, '"20 ± °C" has no number after the ±; write it as in "20 ± 2 °C".'],
    ["20 ± 2 ± 3 °C", surface, '"20 ± 2 ± 3 °C" has more than one tolerance; write one half-width, such as "20 ± 2 °C".'],
    ["20 °C ± 2 m", surface, '"20 °C ± 2 m" has a tolerance that is a length; the tolerance of a temperature is needed, such as "± 2 °C".'],
    ["3 m ± 2 min", "length", '"3 m ± 2 min" has a tolerance whose unit "min" is a time.'],
    ["12 m/s ± 10 % m/s", flow, '"12 m/s ± 10 % m/s" has a unit after a percentage as well; write it as in "12 m/s ± 10 %".'],
    ["0.9 ± 5 %", "none", '"0.9 ± 5 %" may mean percent of the value or percentage points; write "0.9 ± 0.045" or "(0.9 ± 5) %".'],
    ["5 % ± 1 %", "none", '"5 % ± 1 %" may mean percent of the value or percentage points; write "(5 ± 0.05) %" or "(5 ± 1) %".'],
    [
      "-20 psig",
      "pressure",
      '"-20 psig" is below vacuum (-36570 Pa absolute); write a positive pressure, or "psig" or "barg" for one against the ambient.',
    ],
    [-5, "pressure", '-5 Pa is below vacuum (-5 Pa absolute); write a positive pressure, or "psig" or "barg" for one against the ambient.'],
    ["3 K", flow, '"3 K" is a temperature; a speed, mass flow, volume flow or mass flux is needed, such as 2 or "2 m/s".'],
    ["x", "none", '"x" does not begin with a number; a number without dimension is needed, such as 0.9.'],
  ] as const)("%j for %j", (given, wanted, sentence) => {
    expect(refusal(given, wanted)).toEqual({ problem: true, fault: "value", argument: "height", sentence });
  });

  test("examples follow the system and the unit of the argument", () => {
    expect(refusal("x", "length", US).sentence).toBe('"x" does not begin with a number; a length is needed, such as 1 or "1 ft".');
    expect(refusal("x", "length", { ...SI, unit: "mm" }).sentence).toBe(
      '"x" does not begin with a number; a length is needed, such as "0.3 m".',
    );
  });

  test("a unit of the argument that is none of its dimensions is refused", () => {
    expect(refusal(3, "length", { ...SI, unit: "m/s" }).sentence).toBe(
      'has the setting "unit of height" as "m/s", which is a speed; a length needs a unit such as "m".',
    );
    expect(refusal("3", "length", { ...SI, unit: "kg" }).sentence).toBe(
      'has the setting "unit of height" as "kg", which is a mass; a length needs a unit such as "m".',
    );
  });

  test("long texts are cut short in the sentence", () => {
    expect(refusal(`3 ${"q".repeat(190)}`, "length").sentence.length).toBeLessThan(250);
    expect(refusal("9".repeat(5000), "length").sentence.length).toBeLessThan(250);
  });
});

describe("laws", () => {
  const dimensions = fc.constantFrom(...kinds.map((kind) => kind.dimension));
  const readings = fc.constantFrom(SI, US, { ...SI, unit: "mm" }, { ...US, ambient: 0 });

  function isSound(found: Quantity | Problem): boolean {
    if (isProblem(found)) return found.sentence.endsWith(".") && !/undefined|NaN|null/.test(found.sentence.replace(/"[^"]*"/g, ""));
    return Number.isFinite(found.value) && (found.tolerance === undefined || (Number.isFinite(found.tolerance) && found.tolerance >= 0));
  }

  test("any text and any number give a finite quantity or a sentence", () => {
    const pieces = fc.constantFrom(
      "5",
      "1,5",
      "1e",
      "+07",
      "-",
      "–",
      "±",
      "+/-",
      " ",
      ".",
      ",",
      "%",
      "°C",
      "m",
      "/",
      "s",
      "(",
      ")",
      "K",
      "to",
      "psig",
      "×10^",
      "⁻",
      "2",
      "\u00a0",
      "NaN",
    );
    const texts = fc.oneof(
      fc.array(pieces, { maxLength: 10 }).map((list) => list.join("")),
      fc.string({ unit: "binary" }),
      fc.string(),
    );
    fc.assert(
      fc.property(texts, dimensions, readings, (text, wanted, reading) => isSound(readQuantity(text, wanted, reading, "height"))),
      { numRuns: 5000 },
    );
    fc.assert(
      fc.property(fc.double(), dimensions, readings, (value, wanted, reading) => isSound(readQuantity(value, wanted, reading, "height"))),
      { numRuns: 2000 },
    );
  });

  test("a text reads the same the second time", () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), fc.constantFrom(...unitNames()), (value, { symbol, dimension }) => {
        const text = `${value} ${symbol}`;
        expect(readQuantity(text, dimension, SI, "height")).toEqual(readQuantity(text, dimension, SI, "height"));
      }),
    );
  });

  test("what is formatted reads back, in both systems and every dimension", () => {
    const values = fc.double({ min: 1e-6, max: 1e9, noNaN: true });
    fc.assert(
      fc.property(values, dimensions, fc.constantFrom(SI, US), (value, dimension, reading) => {
        const text = formatQuantity(value, dimension, reading.system, 12);
        const back = readQuantity(text, dimension, reading, "height");
        // Twelve digits of a reading in °C or °F; next to the zero of those scales the size of a kelvin value decides.
        const size = dimension === "temperature" ? Math.max(value, 1000) : value;
        expect(isProblem(back) ? text + back.sentence : Math.abs(back.value - value) / size).toBeLessThan(1e-11);
      }),
      { numRuns: 3000 },
    );
  });

  test("the same half-width whether its unit stands before or after", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 999 }),
        fc.integer({ min: 0, max: 99 }),
        fc.constantFrom("°C", "°F", "K"),
        (value, half, unit) => {
          const before = read(`${value} ± ${half} ${unit}`, "temperature");
          const after = read(`${value} ${unit} ± ${half} ${unit}`, "temperature");
          expect([after.value, after.tolerance]).toEqual([before.value, before.tolerance]);
        },
      ),
    );
  });

  test("every listed unit is wanted by its own dimension and refused by every other", () => {
    for (const { symbol, dimension } of unitNames()) {
      for (const { dimension: other } of kinds) {
        const accepted = !isProblem(readQuantity(`300 ${symbol}`, other, SI, "height"));
        const degrees = dimension === "temperature" && other === "temperature difference";
        expect(accepted, `${symbol} as ${other}`).toBe(other === dimension || degrees);
      }
    }
  });
});
