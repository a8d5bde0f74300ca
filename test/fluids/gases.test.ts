import { describe, expect, test } from "vitest";
import { gasOf } from "../../src/fluids/gas-entries.js";
import { namedMixtures } from "../../src/fluids/records/gas-mixtures.js";
import type { Fluid, State } from "../../src/fluids/fluid.js";
import { findFluid } from "../../src/fluids/shelf.js";
import { isProblem } from "../../src/quantities/problems.js";
import { numberIn, readCsv } from "../data/read-csv.js";

function fluidOf(name: string): Fluid {
  const found = findFluid(name);
  if (isProblem(found)) throw new Error(found.sentence);
  return found;
}

function stateOf(name: string, t: number, p: number): State {
  const found = fluidOf(name).state(t + 273.15, p);
  if (isProblem(found)) throw new Error(found.sentence);
  return found;
}

function off(value: number | undefined, expected: number): number {
  return value === undefined ? Number.NaN : Math.abs(value / expected - 1);
}

describe("gases at low density", () => {
  test.each(readCsv("gas-low-density.csv").map((row) => [row["gas"] as string, row["t_C"] as string, row] as const))("%s at %s °C", (gas, _t, row) => {
    const t = numberIn(row, "t_C") as number;
    const fitted = numberIn(row, "viscosity_Pa_s");
    if (fitted === undefined && gas !== "H2O") {
      expect(isProblem(fluidOf(`${gas}, low density`).state(t + 273.15, 100))).toBe(true);
      return;
    }
    const found = stateOf(`${gas}, low density`, t, 100);
    expect(off(found.cp, numberIn(row, "cp_J_kgK") as number)).toBeLessThan(2e-5);
    // Below the range of its fit, water vapour follows the IAPWS releases; they are checked by the multiparameter columns.
    if (fitted !== undefined) {
      expect(off(found.viscosity, fitted)).toBeLessThan(1e-6);
      expect(off(found.conductivity, numberIn(row, "conductivity_W_mK") as number)).toBeLessThan(1e-6);
    }
    // Against the multiparameter equations: the tolerances that properties of low density deserve.
    const ammonia = gas === "NH3";
    const cp = numberIn(row, "cp_multiparameter");
    const viscosity = numberIn(row, "viscosity_multiparameter");
    const conductivity = numberIn(row, "conductivity_multiparameter");
    if (cp !== undefined) expect(off(found.cp, cp)).toBeLessThan(0.004);
    if (viscosity !== undefined) expect(off(found.viscosity, viscosity)).toBeLessThan(0.02);
    if (conductivity !== undefined) expect(off(found.conductivity, conductivity)).toBeLessThan(ammonia ? 0.08 : 0.05);
  });
});

describe("mixtures", () => {
  test.each(readCsv("gas-mixtures.csv").map((row) => [row["mixture"] as string, row["t_C"] as string, row] as const))("%s at %s °C", (name, _t, row) => {
    const found = stateOf(name, numberIn(row, "t_C") as number, 101325);
    expect(off(fluidOf(name).molarMass, (numberIn(row, "molar_mass_g_mol") as number) / 1000)).toBeLessThan(1e-6);
    expect(off(found.cp, numberIn(row, "cp_J_kgK") as number)).toBeLessThan(2e-5);
    expect(off(found.viscosity, numberIn(row, "viscosity_Wilke_Pa_s") as number)).toBeLessThan(1e-6);
    expect(off(found.conductivity, numberIn(row, "conductivity_Mason_Saxena_W_mK") as number)).toBeLessThan(1e-6);
  });

  test("named mixtures name gases that are there, and sum to one", () => {
    for (const mixture of namedMixtures) {
      expect(Object.keys(mixture.composition).every((formula) => gasOf(formula) !== undefined)).toBe(true);
      expect(Object.values(mixture.composition).reduce((sum, x) => sum + x, 0)).toBeCloseTo(1, 9);
    }
  });
});
