import { describe, expect, test } from "vitest";
import { helmholtz, type Residual } from "../../src/fluids/helmholtz.js";
import { idealPart } from "../../src/fluids/helmholtz-ideal.js";
import { pureRecords } from "../../src/fluids/records/pure/index.js";

/** Derivatives by central differences of the lower order, in ln τ and ln δ. */
function differences(at: (tau: number, delta: number) => Residual, tau: number, delta: number): Omit<Residual, "a"> {
  const h = 1e-5;
  const shifted = (x: number, y: number): Residual => ({ ...at(tau * Math.exp(x), delta * Math.exp(y)) });
  const [up, down, right, left] = [shifted(h, 0), shifted(-h, 0), shifted(0, h), shifted(0, -h)];
  const here = shifted(0, 0);
  const slope = (a: number, b: number): number => (a - b) / (2 * h);
  return {
    d: slope(right.a, left.a),
    // ∂(δα_δ)/∂ln δ = δα_δ + δ²α_δδ
    dd: slope(right.d, left.d) - here.d,
    t: slope(up.a, down.a),
    tt: slope(up.t, down.t) - here.t,
    dt: slope(up.d, down.d),
  };
}

describe("all derivatives of the residual Helmholtz energy against differences of the lower ones", () => {
  const points = [
    [0.7, 0.05],
    [0.9, 1.3],
    [1.001, 0.99],
    [1.2, 2.2],
    [1.5, 2.6],
  ] as const;

  test.each(pureRecords().map((record) => [record.name, record] as const))("%s", (_, record) => {
    const equation = helmholtz(record.residual);
    for (const [tau, delta] of points) {
      const found = { ...equation.residual(tau, delta) };
      const expected = differences(equation.residual, tau, delta);
      const scale = 1 + Math.abs(found.a) + Math.abs(found.dd) + Math.abs(found.tt);
      for (const key of ["d", "dd", "t", "tt", "dt"] as const) expect(Math.abs(found[key] - expected[key])).toBeLessThan(2e-6 * scale);
      const part = equation.pressurePart(tau, delta);
      expect([part.a, part.d, part.dd]).toEqual([found.a, found.d, found.dd]);
    }
  });
});

describe("the ideal-gas part", () => {
  test.each(pureRecords().map((record) => [record.name, record] as const))("%s: cp0 is the slope of enthalpy", (_, record) => {
    const ideal = idealPart(record.ideal, record.reducing.T);
    // h/R = T (1 + τα0_τ), cp0/R = 1 − τ²α0_ττ
    const enthalpy = (T: number): number => T * (1 + ideal(T).t);
    for (const T of [record.T[0] * 1.1, record.critical.T, record.T[1] * 0.95]) {
      const h = 1e-4 * T;
      const slope = (enthalpy(T + h) - enthalpy(T - h)) / (2 * h);
      const cp = 1 - ideal(T).tt;
      expect(Math.abs(slope / cp - 1)).toBeLessThan(1e-6);
      // A monatomic gas has 5/2; nothing has less.
      expect(cp).toBeGreaterThan(2.49);
    }
  });

  test("monatomic gases have 5/2 exactly", () => {
    for (const name of ["argon", "helium", "neon", "krypton", "xenon"]) {
      const record = pureRecords().find((one) => one.name === name);
      if (!record) throw new Error(name);
      expect(1 - idealPart(record.ideal, record.reducing.T)(300).tt).toBeCloseTo(2.5, 10);
    }
  });
});
