import fc from "fast-check";
import { expect, test } from "vitest";
import { formatNumber, formatQuantity } from "../../src/quantities/format.js";

// Rounding to significant digits, worked by hand.
test.each([
  [0, "0"],
  [-0, "0"],
  [0.3, "0.3"],
  [0.1 + 0.2, "0.3"],
  [-2.5, "-2.5"],
  [1234.56, "1235"],
  [101325, "101300"],
  [999999, "1e6"],
  [2.1e13, "2.1e13"],
  [1e12, "1e12"],
  [-1.23456e-5, "-1.235e-5"],
  [0.001, "0.001"],
  [0.00099999, "0.001"],
  [0.0009999, "9.999e-4"],
  [Number.NaN, "no number"],
  [Number.POSITIVE_INFINITY, "no upper limit"],
  [Number.NEGATIVE_INFINITY, "no lower limit"],
])("%d is written %s", (value, text) => {
  expect(formatNumber(value)).toBe(text);
});

test("digits are asked for, within what a double holds", () => {
  expect(formatNumber(101325, 6)).toBe("101325");
  expect(formatNumber(Math.PI, 1)).toBe("3");
  expect(formatNumber(Math.PI, 0)).toBe("3");
  expect(formatNumber(0.1, 99)).toBe("0.1");
});

test.each([
  [(72 + 459.67) / 1.8, "temperature", "US", "72 °F"],
  [293.15, "temperature", "SI", "20 °C"],
  [273.15, "temperature", "SI", "0 °C"],
  [273.15, "temperature", "US", "32 °F"],
  [273.15 + 1e-13, "temperature", "SI", "0 °C"],
  [5, "temperature difference", "US", "9 °F"],
  [5, "temperature difference", "SI", "5 K"],
  [0.3, "length", "SI", "0.3 m"],
  [0.3048, "length", "US", "1 ft"],
  [101325, "pressure", "US", "14.7 psia"],
  [5.678263341113487, "film coefficient", "US", "1 Btu/(h·ft²·°F)"],
  [Math.PI / 6, "angle", "SI", "30 deg"],
  [2.1e13, "none", "SI", "2.1e13"],
] as const)("%d as %s in %s is %s", (value, dimension, system, text) => {
  expect(formatQuantity(value, dimension, system)).toBe(text);
});

test("four digits are kept of any number, with no plus sign and no trailing zeros", () => {
  fc.assert(
    fc.property(fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e300, max: 1e300 }), (value) => {
      const text = formatNumber(value);
      expect(text).toMatch(/^-?(?:0|[1-9]\d{0,5}|\d{1,3}\.\d*[1-9]|[1-9](?:\.\d*[1-9])?e-?\d+)$/);
      expect(Math.abs(Number(text) - value)).toBeLessThanOrEqual(5.001e-4 * Math.abs(value));
    }),
    { numRuns: 2000 },
  );
});
