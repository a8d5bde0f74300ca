import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { dampedSum, powerSum, powerSum2 } from "../../src/fluids/power-sum.js";

const coefficient = fc.double({ min: -10, max: 10, noNaN: true });
const exponent = fc.oneof(fc.integer({ min: -6, max: 14 }), fc.double({ min: -5.5, max: 13, noNaN: true }));
const density = fc.integer({ min: 0, max: 11 });
const positive = fc.double({ min: 0.05, max: 4, noNaN: true });

/** Equal but for rounding: `scale` is the sum of the terms' sizes. */
function expectEqual(found: number, terms: readonly number[]): void {
  const expected = terms.reduce((sum, term) => sum + term, 0);
  const scale = terms.reduce((sum, term) => sum + Math.abs(term), 1e-300);
  expect(Math.abs(found - expected)).toBeLessThan(1e-12 * scale);
}

describe("sums of powers against the plain power operator", () => {
  test("of one variable", () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(coefficient, exponent), { minLength: 1, maxLength: 8 }), positive, (rows, x) => {
        expectEqual(
          powerSum(rows)(x),
          rows.map(([a, t]) => a * x ** t),
        );
      }),
    );
  });

  test("of two variables", () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(coefficient, exponent, exponent), { minLength: 1, maxLength: 8 }), positive, positive, (rows, x, y) => {
        expectEqual(
          powerSum2(rows)(x, y),
          rows.map(([a, t, d]) => a * x ** t * y ** d),
        );
      }),
    );
  });

  test("whole powers of a negative density", () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(coefficient, exponent, density), { minLength: 1, maxLength: 8 }), positive, positive, (rows, x, y) => {
        expectEqual(
          powerSum2(rows)(x, -y),
          rows.map(([a, t, d]) => a * x ** t * (-y) ** d),
        );
      }),
    );
  });

  test("with exponentials", () => {
    const gamma = fc.constantFrom(0, -1, -0.5);
    const power = fc.constantFrom(1, 2, 3);
    fc.assert(
      fc.property(
        fc.array(fc.tuple(coefficient, exponent, density, gamma, power), { minLength: 1, maxLength: 8 }),
        positive,
        positive,
        (rows, x, y) => {
          expectEqual(
            dampedSum(rows)(x, y),
            rows.map(([a, t, d, g, l]) => a * x ** t * y ** d * Math.exp(g * y ** l)),
          );
        },
      ),
    );
  });
});
