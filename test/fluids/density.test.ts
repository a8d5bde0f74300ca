import { describe, expect, test } from "vitest";
import { compressedDensity, cubicCompressibility, densityOn } from "../../src/fluids/density.js";
import { helmholtz } from "../../src/fluids/helmholtz.js";
import { pureFluid } from "../../src/fluids/pure-fluid.js";
import { pureRecord, pureRecords } from "../../src/fluids/records/pure/index.js";
import { isProblem } from "../../src/quantities/problems.js";
import { randomStates } from "./random-states.js";

describe("the density search", () => {
  test("answers or rightly refuses random states of every fluid", () => {
    const run = randomStates(400, 20);
    expect(run.failures).toEqual([]);
    expect(run.asked).toBeGreaterThan(25000);
    expect(run.refused).toBeLessThan(0.1 * run.asked);
  });

  test("says so where a branch does not reach the pressure", () => {
    const { residual } = pureRecord("nitrogen");
    // At 0.8 Tc vapour exists to a quarter of the critical density at most: no gas root for the pressure of a dense liquid.
    expect(densityOn(helmholtz(residual), 1 / 0.8, 2, { low: 0, high: 0.05, start: 0.01 })).toBeUndefined();
  });

  test("begins near the root: the cubic of a gas, Murnaghan's law of a liquid", () => {
    // Van der Waals' limit: no pressure, Z = 1.
    expect(cubicCompressibility(1.5, 1e-9, 0.1)).toBeCloseTo(1, 8);
    const { residual, reducing } = pureRecord("propane");
    const equation = helmholtz(residual);
    const tau = reducing.T / 250;
    const known = 12600 / reducing.rho;
    const part = equation.pressurePart(tau, 1.05 * known);
    expect(compressedDensity(equation, tau, 1.05 * known * (1 + part.d), known) / known).toBeCloseTo(1.05, 2);
  });

  test("one density, whatever was asked before", () => {
    for (const name of ["air", "carbon dioxide", "R134a"]) {
      const fresh = pureFluid(pureRecord(name), pureRecord);
      const used = pureFluid(pureRecord(name), pureRecord);
      for (let k = 1; k <= 50; k++) used.state(250 + k, 1e4 * k);
      expect(used.density(300, 2e5)).toBe(fresh.density(300, 2e5));
      expect(used.state(300, 2e5)).toBe(used.state(300, 2e5));
      expect(used.state(300, 2e5)).toEqual(fresh.state(300, 2e5));
    }
  });

  test("density alone is the state's density", () => {
    for (const record of pureRecords()) {
      const fluid = pureFluid(record, pureRecord);
      const T = 0.5 * (record.critical.T + record.T[1]);
      const state = fluid.state(T, 1e5);
      expect(isProblem(state) ? state.sentence : state.density).toBe(fluid.density(T, 1e5));
    }
  });
});
