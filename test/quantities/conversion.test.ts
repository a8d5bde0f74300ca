import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { convert, fromSI, fromSITolerance, toSI } from "../../src/quantities/conversion.js";
import { isProblem } from "../../src/quantities/problems.js";
import { findUnit, type Unit, unitNames } from "../../src/quantities/units.js";

function unitOf(symbol: string): Unit {
  const unit = findUnit(symbol);
  if (unit === undefined) throw new Error(symbol);
  return unit;
}

describe("convert", () => {
  // Fixed points and exact definitions (NIST SP 811, appendix B); from memory.
  test.each([
    [32, "°F", "°C", 0],
    [212, "°F", "°C", 100],
    [-40, "°F", "°C", -40],
    [-459.67, "°F", "K", 0],
    [491.67, "°R", "°C", 0],
    [100, "°C", "°F", 212],
    ["72 degF", "", "°C", 200 / 9],
    ["72", "degF", "°C", 200 / 9],
    ["12,5 mm", "", "cm", 1.25],
    [18, "Δ°F", "ΔK", 10],
    [1, "in", "mm", 25.4],
    [1, "Btu/lb", "kJ/kg", 2.326],
    [1, "kcal/h", "W", 1.163],
    [0, "psig", "atm", 1],
    [1, "atm", "psig", 0],
    [-5, "Pa", "kPa", -0.005],
    [60, "rpm", "rev/s", 1],
    [5, "%", "-", 0.05],
    [1, "W/m2K", "W/cm2K", 1e-4],
  ] as const)("%j %s in %s is %d", (value, from, to, expected) => {
    expect(convert(value, from, to)).toBeCloseTo(expected, 11);
  });

  test.each([
    [1, "m", "s", "to", '"s" is a time; write a unit such as "m", "degF" or "W/(m²·K)".'],
    [1, "m", "K", "to", '"K" is a temperature and "m" is a length; both units must be of one kind.'],
    [1, "°F", "ΔK", "to", '"ΔK" is a temperature difference and "°F" is a temperature; both units must be of one kind.'],
    [1, "m", "", "to", 'is empty; a unit is needed, such as "m" or "degF".'],
    [1, "", "m", "from", 'is empty; a number needs its unit, such as "degF", or write the value as text, such as "72 degF".'],
    ["72", "", "m", "from", 'is empty; a number needs its unit, such as "degF", or write the value as text, such as "72 degF".'],
    ["3 in", "ft", "m", "from", 'must stay empty, for the value "3 in" carries its own unit.'],
    ["3 mtr", "", "m", "value", '"mtr" is not a known unit; write a unit such as "m", "degF" or "W/(m²·K)".'],
    ["5 mpa", "", "bar", "value", '"mpa" may be mPa or MPa; capitals decide, so write one of them.'],
    ["3 ± 1 m", "", "ft", "value", '"3 ± 1 m" has a tolerance, which one number cannot show; convert value and half-width apart.'],
    ["5-7 m", "", "ft", "value", '"5-7 m" is a range of two numbers; write the middle and the half-width, such as "6 ± 1 m".'],
    ["", "m", "ft", "value", 'is empty; write a number, or a text with its unit such as "72 degF".'],
    ["x", "m", "ft", "value", '"x" does not begin with a number; write a text such as "72 degF".'],
    [-300, "°C", "K", "value", "-300 °C is below absolute zero, which is -273.15 °C, -459.67 °F or 0 K."],
    [Number.NaN, "m", "ft", "value", "is not a finite number; write a number such as 72."],
    [1e308, "km", "nm", "value", "is too large a number to convert."],
  ] as const)("%j from %j to %j is refused", (value, from, to, argument, sentence) => {
    expect(convert(value, from, to)).toEqual({ problem: true, fault: "value", argument, sentence });
  });

  test("arbitrary arguments give a finite number or a sentence", () => {
    const units = fc.oneof(fc.constantFrom(...unitNames().map(({ symbol }) => symbol)), fc.string());
    fc.assert(
      fc.property(fc.oneof(fc.double(), fc.string()), units, units, (value, from, to) => {
        const found = convert(value, from, to);
        return isProblem(found) ? found.sentence.endsWith(".") : Number.isFinite(found);
      }),
      { numRuns: 3000 },
    );
  });
});

describe("to SI and back", () => {
  // Down to 1e-200: below 1e-308 a double itself loses digits.
  const readings = fc.tuple(fc.double({ min: 1e-200, max: 1e6, noNaN: true }), fc.constantFrom(1, -1)).map(([size, sign]) => size * sign);
  test.each(unitNames().map(({ symbol }) => [symbol]))("%s", (symbol) => {
    const unit = unitOf(symbol);
    fc.assert(
      fc.property(readings, fc.double({ min: 0, max: 2e5, noNaN: true }), (value, ambient) => {
        const back = fromSI(toSI(value, unit, ambient), unit, ambient);
        // The zero of the scale costs digits of small readings, never more than the spacing of doubles at that zero.
        const zero = (unit.offset ?? (unit.gauge ? ambient : 0)) / unit.factor;
        expect(Math.abs(back - value)).toBeLessThanOrEqual(1e-15 * (Math.abs(value) + 2 * zero));
      }),
    );
  });

  test("half-widths leave the zero of the scale out", () => {
    expect(fromSITolerance(10 / 9, unitOf("°F"))).toBeCloseTo(2, 14);
    expect(fromSITolerance(2, unitOf("°C"))).toBe(2);
    expect(fromSITolerance(1e5, unitOf("barg"))).toBe(1);
  });
});
