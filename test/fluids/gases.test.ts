import { describe, expect, test } from "vitest";
import { mixture } from "../../src/fluids/blend.js";
import type { Fluid, State } from "../../src/fluids/fluid.js";
import { gasOf } from "../../src/fluids/gas-entries.js";
import { namedMixtures } from "../../src/fluids/records/gas-mixtures.js";
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
  test.each(readCsv("gas-low-density.csv").map((row) => [row.gas as string, row.t_C as string, row] as const))(
    "%s at %s °C",
    (gas, _t, row) => {
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
    },
  );
});

describe("mixtures", () => {
  test.each(readCsv("gas-mixtures.csv").map((row) => [row.mixture as string, row.t_C as string, row] as const))(
    "%s at %s °C",
    (name, _t, row) => {
      const found = stateOf(name, numberIn(row, "t_C") as number, 101325);
      expect(off(fluidOf(name).molarMass, (numberIn(row, "molar_mass_g_mol") as number) / 1000)).toBeLessThan(1e-6);
      expect(off(found.cp, numberIn(row, "cp_J_kgK") as number)).toBeLessThan(2e-5);
      expect(off(found.viscosity, numberIn(row, "viscosity_Wilke_Pa_s") as number)).toBeLessThan(1e-6);
      expect(off(found.conductivity, numberIn(row, "conductivity_Mason_Saxena_W_mK") as number)).toBeLessThan(1e-6);
    },
  );

  test("named mixtures name gases that are there, and sum to one", () => {
    for (const mixture of namedMixtures) {
      expect(Object.keys(mixture.composition).every((formula) => gasOf(formula) !== undefined)).toBe(true);
      expect(Object.values(mixture.composition).reduce((sum, x) => sum + x, 0)).toBeCloseTo(1, 9);
    }
  });
});

describe("mixtures of the user's own", () => {
  const flue = [
    { name: "N2", fraction: 71.5 },
    { name: "carbon dioxide", fraction: 8.5 },
    { name: "water", fraction: 16.5 },
    { name: "O2", fraction: 3.5 },
  ];

  test("per cent and fractions, formulas and names give what the named mixture gives", () => {
    const found = mixture(flue, "my flue gas");
    if (isProblem(found)) throw new Error(found.sentence);
    const named = stateOf("flue gas, natural gas lean", 400, 101325);
    const own = found.state(673.15, 101325) as State;
    expect(own.cp).toBeCloseTo(named.cp, 9);
    expect(own.viscosity).toBeCloseTo(named.viscosity as number, 15);
    expect(found.name).toBe("my flue gas");
  });

  test("air may be a part", () => {
    const found = mixture([{ name: "air", fraction: 1 }]);
    if (isProblem(found)) throw new Error(found.sentence);
    // Dry air at 300 K and 101325 Pa: Lemmon & Jacobsen 2004 at zero density, 18.5230 µPa·s; Mason & Saxena is good to 2 %.
    const state = found.state(300, 101325) as State;
    expect(off(state.viscosity, 18.523e-6)).toBeLessThan(0.01);
    expect(off(state.conductivity, 26.3529e-3)).toBeLessThan(0.02);
    expect(off(state.cp, 1006)).toBeLessThan(3e-3);
  });

  test("gases of the shelf that are not in the low-density tables can be mixed", () => {
    const found = mixture([
      { name: "propane", fraction: 0.5 },
      { name: "N2", fraction: 0.5 },
    ]);
    if (isProblem(found)) throw new Error(found.sentence);
    const state = found.state(400, 101325) as State;
    const propane = stateOf("propane", 126.85, 1000);
    const nitrogen = stateOf("N2, low density", 126.85, 1000);
    expect(state.cp).toBeGreaterThan(nitrogen.cp);
    expect(state.cp).toBeLessThan(propane.cp);
    // The rule lets a mixture fall a little below both of its parts.
    expect(state.conductivity as number).toBeGreaterThan(0.95 * Math.min(propane.conductivity as number, nitrogen.conductivity as number));
  });

  test.each([
    [[], /at least one gas/],
    [[{ name: "N2", fraction: 0.5 }], /sum to 0\.5; they must sum to 1/],
    [
      [
        { name: "N2", fraction: -1 },
        { name: "O2", fraction: 2 },
      ],
      /zero or above/,
    ],
    [[{ name: "unobtainium", fraction: 1 }], /No fluid is called "unobtainium"/],
    [[{ name: "flue gas, oil", fraction: Number.NaN }], /./],
  ])("%j", (parts, sentence) => {
    const found = mixture(parts);
    expect(isProblem(found) ? found.sentence : "none").toMatch(sentence);
  });

  test("below the dew point it is refused, near it a caution is said", () => {
    const found = mixture(flue);
    if (isProblem(found)) throw new Error(found.sentence);
    const cold = found.state(313.15, 101325);
    expect(isProblem(cold) ? cold.sentence : "").toMatch(/below its dew point, 56\.\d °C/);
    expect(found.cautions(335, 101325).join()).toMatch(/condense/);
    expect(fluidOf("flue gas, oil").cautions(400, 101325).join()).toMatch(/acid dew point/);
  });
});
