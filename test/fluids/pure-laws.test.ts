import { describe, expect, test } from "vitest";
import type { Fluid, Saturation, State } from "../../src/fluids/fluid.js";
import { pureFluid } from "../../src/fluids/pure-fluid.js";
import { pureModel } from "../../src/fluids/pure-model.js";
import type { PureRecord } from "../../src/fluids/pure-record.js";
import { pureFluids, pureRecord, pureRecords } from "../../src/fluids/records/pure/index.js";
import { figures } from "../../src/fluids/refusal.js";
import { findFluid } from "../../src/fluids/shelf.js";
import { isProblem, type Problem } from "../../src/quantities/problems.js";
import { bibliography } from "../../src/bibliography.js";
import { readCsv } from "../data/read-csv.js";

const table = pureRecords().map((record) => [record.name, record, pureFluid(record, pureRecord)] as const);

function sure<T>(found: T | Problem): T {
  if (isProblem(found)) throw new Error(found.sentence);
  return found;
}

function saturationAt(fluid: Fluid, T: number): Saturation {
  return sure((fluid.saturationAtTemperature as NonNullable<Fluid["saturationAtTemperature"]>)(T));
}

function sentenceOf(found: unknown): string {
  return isProblem(found) ? found.sentence : `no problem but ${JSON.stringify(found)}`;
}

/** Gas, liquid, dense and critical-isotherm states inside the range, away from any line. */
function someStates(record: PureRecord, fluid: Fluid): readonly State[] {
  const { T: Tc, p: pc } = record.critical;
  const asked = [
    [0.8, 0.02],
    [0.75, 0.8],
    [0.85, 3],
    [1.05, 0.5],
    [1.1, 2.5],
    [1.3, 5],
  ] as const;
  return asked
    .map(([t, p]) => [t * Tc, p * pc] as const)
    .filter(([T, p]) => T > record.T[0] && T < record.T[1] && p < record.pMax)
    .map(([T, p]) => sure(fluid.state(T, p)));
}

describe("thermodynamic consistency", () => {
  test.each(table)("%s", (_, record, fluid) => {
    const states = someStates(record, fluid);
    expect(states.length).toBeGreaterThanOrEqual(2);
    for (const { T, p, cp, density, expansivity, enthalpy, speedOfSound } of states) {
      const h = 1e-5 * T;
      const warmer = sure(fluid.state(T + h, p));
      const colder = sure(fluid.state(T - h, p));
      // cp = (∂h/∂T) and β = −(∂ρ/∂T)/ρ at constant pressure.
      const slope = ((warmer.enthalpy as number) - (colder.enthalpy as number)) / (2 * h);
      expect(Math.abs(slope / cp - 1)).toBeLessThan(2e-6);
      const thinning = -(warmer.density - colder.density) / (2 * h * density);
      expect(Math.abs(thinning / (expansivity as number) - 1)).toBeLessThan(2e-6);
      // (∂h/∂p) = (1 − βT)/ρ at constant temperature.
      const step = 1e-4 * p;
      const pressed = sure(fluid.state(T, p + step));
      const eased = sure(fluid.state(T, p - step));
      const throttled = ((pressed.enthalpy as number) - (eased.enthalpy as number)) / (2 * step);
      const expected = (1 - (expansivity as number) * T) / density;
      expect(Math.abs(throttled - expected)).toBeLessThan(1e-4 / density);
      // w⁻² = (∂ρ/∂p)_T − T β²/cp
      const compressed = (pressed.density - eased.density) / (2 * step);
      const isentropic = compressed - (T * (expansivity as number) ** 2) / cp;
      expect(Math.abs(isentropic * (speedOfSound as number) ** 2 - 1)).toBeLessThan(2e-5);
      expect(enthalpy).toBeDefined();
    }
  });
});

describe("the saturation line", () => {
  const pure = table.filter(([, record]) => !record.saturation.dewPressure);

  test.each(pure)("%s: equal Gibbs energy, Clapeyron's slope, both ways", (_, record, fluid) => {
    const model = pureModel(record, pureRecord);
    const { reducing, molarMass } = record;
    const coldest = record.T[0];
    for (const share of [0.05, 0.3, 0.6, 0.9, 0.98]) {
      const T = coldest + share * (record.critical.T - coldest);
      const { liquid, vapour, p, latentHeat } = saturationAt(fluid, T);
      const gibbs = (state: State): number => {
        const delta = state.density / molarMass / reducing.rho;
        const { a, d } = model.phases.equation.residual(reducing.T / T, delta);
        return a + d + Math.log(delta);
      };
      expect(Math.abs(gibbs(liquid) - gibbs(vapour))).toBeLessThan(1e-9);
      // The liquid's pressure is a small difference of large terms: held to what a part in 1e10 of its density makes.
      const stiff = (liquid.speedOfSound as number) ** 2 * liquid.density;
      expect(Math.abs(model.pressure(T, liquid.density / molarMass) - p)).toBeLessThan(1e-9 * p + 1e-10 * stiff);
      const h = 1e-4 * T;
      const slope = (saturationAt(fluid, T + h).p - saturationAt(fluid, T - h).p) / (2 * h);
      const clapeyron = latentHeat / (T * (1 / vapour.density - 1 / liquid.density));
      expect(Math.abs(slope / clapeyron - 1)).toBeLessThan(1e-4);
      const back = sure((fluid.saturationAtPressure as NonNullable<Fluid["saturationAtPressure"]>)(p));
      expect(Math.abs(back.T / T - 1)).toBeLessThan(1e-9);
    }
  });

  test.each(pure)("%s: a state on the line is refused with its saturation values, one beside it is not", (_, record, fluid) => {
    const T = 0.5 * (record.T[0] + record.critical.T);
    const { p, liquid, vapour } = saturationAt(fluid, T);
    const sentence = sentenceOf(fluid.state(T, p));
    expect(sentence).toMatch(/on its saturation line/);
    expect(sentence).toContain(figures(liquid.density));
    expect(sentence).toContain(figures(vapour.density));
    expect(sure(fluid.state(T, 1.001 * p)).phase).toBe("liquid");
    expect(sure(fluid.state(T, 0.999 * p)).phase).toBe("gas");
  });

  test("blends are refused between bubble and dew line", () => {
    for (const name of ["air", "R404A", "R407C", "R410A", "R507A"]) {
      const record = pureRecord(name);
      const fluid = pureFluid(record, pureRecord);
      const T = 0.8 * record.critical.T;
      const { p, vapour } = saturationAt(fluid, T);
      expect(vapour.p).toBeLessThan(p);
      expect(sentenceOf(fluid.state(T, Math.sqrt(p * vapour.p)))).toMatch(/inside its two-phase region: it boils at .* and condenses at/);
      expect(sure(fluid.state(T, 1.001 * p)).phase).toBe("liquid");
      expect(sure(fluid.state(T, 0.999 * vapour.p)).phase).toBe("gas");
    }
  });

  test("outside the line there is no saturation state", () => {
    const fluid = pureFluid(pureRecord("nitrogen"), pureRecord);
    expect(sentenceOf(fluid.saturationAtTemperature?.(300))).toMatch(/only from -209.999 °C to -146.958 °C/);
    expect(sentenceOf(fluid.saturationAtPressure?.(1e8))).toMatch(/boils only between .* and its critical pressure, 3.3958 MPa/);
    expect(sentenceOf(fluid.saturationAtPressure?.(Number.NaN))).toMatch(/no number/);
    expect(sentenceOf(fluid.saturationAtTemperature?.(Number.NaN))).toMatch(/no number/);
  });

  // Normal boiling points from handbooks; common practice (0.2 K for the samples behind them).
  test.each([
    ["nitrogen", 77.355],
    ["oxygen", 90.188],
    ["argon", 87.302],
    ["methane", 111.667],
    ["propane", 231.04],
    ["ammonia", 239.82],
    ["R134a", 247.08],
    ["isobutane", 261.4],
    ["n-pentane", 309.21],
    ["ethanol", 351.4],
    ["benzene", 353.2],
    ["toluene", 383.75],
    ["helium", 4.222],
    ["hydrogen", 20.37],
  ])("%s boils at %d K under one atmosphere", (name, T) => {
    const fluid = pureFluid(pureRecord(name), pureRecord);
    expect(Math.abs(sure((fluid.saturationAtPressure as NonNullable<Fluid["saturationAtPressure"]>)(101325)).T - T)).toBeLessThan(0.2);
  });
});

describe("transport", () => {
  const moving = table.filter(([, record]) => record.viscosity !== undefined);

  test.each(moving)("%s: saturated liquid thins as it warms and vapour and gas have finite, positive values", (name, record, fluid) => {
    const [coldest] = record.viscosityT ?? record.T;
    let last = Number.POSITIVE_INFINITY;
    // Liquid helium close to its lambda point does thicken.
    const from = Math.max(coldest, name === "helium" ? 3 : 0);
    for (let k = 0; k < 40; k++) {
      const T = from + (k / 40) * (0.98 * record.critical.T - from) + 0.01;
      const { liquid, vapour } = saturationAt(fluid, T);
      expect(liquid.viscosity).toBeLessThan(last);
      last = liquid.viscosity as number;
      expect(liquid.viscosity).toBeGreaterThan(1e-7);
      expect(vapour.viscosity).toBeGreaterThan(1e-7);
      expect(vapour.viscosity).toBeLessThan(liquid.viscosity as number);
      for (const side of [liquid, vapour]) expect(side.conductivity).toBeGreaterThan(1e-4);
    }
  });

  test("no transport is made up where none is published", () => {
    const still = table.filter(([, record]) => !record.viscosity);
    expect(still.map(([name]) => name).sort()).toEqual(
      [
        "R1234ze(Z)",
        "R1336mzz(E)",
        "R161",
        "R41",
        "carbonyl sulfide",
        "decamethylcyclopentasiloxane",
        "deuterium",
        "fluorine",
        "fluoroketone 5-1-12",
        "hexamethyldisiloxane",
        "hydrogen chloride",
        "octamethylcyclotetrasiloxane",
        "octamethyltrisiloxane",
      ].sort(),
    );
    for (const [, record, fluid] of still) {
      const found = sure(fluid.state(0.5 * (record.critical.T + record.T[1]), 1e5));
      expect([found.viscosity, found.conductivity]).toEqual([undefined, undefined]);
      expect(fluid.cautions(found.T, found.p).join(" ")).toMatch(/density and cp only/);
    }
  });

  test("predicted transport says so, and its 5 to 10 % stand in the uncertainty", () => {
    const predicted = table.filter(([, record]) => record.predictive);
    expect(predicted.length).toBeGreaterThan(15);
    for (const [, record, fluid] of predicted) {
      const T = 1.2 * record.critical.T;
      expect(fluid.cautions(T, 1e5).join(" ")).toMatch(/predictive method, good to 5 to 10 %/);
      const { viscosity, conductivity } = fluid.uncertainty(T, 1e5);
      if (record.predictive?.includes("viscosity")) expect(viscosity).toBeGreaterThanOrEqual(0.05);
      if (record.predictive?.includes("conductivity")) expect(conductivity).toBeGreaterThanOrEqual(0.05);
    }
  });

  test("R152a's viscosity ends at 240 K and n-pentane's at 220 K, and the caution says so", () => {
    for (const [name, T] of [
      ["R152a", 235],
      ["n-pentane", 215],
    ] as const) {
      const fluid = pureFluid(pureRecord(name), pureRecord);
      const found = sure(fluid.state(T, 1e6));
      expect(found.viscosity).toBeUndefined();
      expect(found.conductivity).toBeGreaterThan(0.05);
      expect(fluid.cautions(T, 1e6).join(" ")).toMatch(/viscosity of .* holds from/);
    }
  });
});

describe("limits", () => {
  test.each(table)("%s: just inside, at and just outside each limit", (_, record, fluid) => {
    const [coldest, hottest] = record.T;
    expect(isProblem(fluid.state(hottest, 1e5))).toBe(false);
    expect(isProblem(fluid.state(0.999 * hottest, 1e5))).toBe(false);
    expect(sentenceOf(fluid.state(1.001 * hottest, 1e5))).toMatch(/above its published range.*nearest/);
    expect(sentenceOf(fluid.state(0.999 * coldest, 1e5))).toMatch(/below its published range.*nearest/);
    expect(isProblem(fluid.state(hottest, record.pMax))).toBe(false);
    expect(sentenceOf(fluid.state(hottest, 1.001 * record.pMax))).toMatch(/above its published range.*nearest/);
  });

  test.each([
    ["not a number", Number.NaN, 1e5, /not a number/],
    ["endless", Number.POSITIVE_INFINITY, 1e5, /not a number/],
    ["below absolute zero", -5, 1e5, /absolute zero/],
    ["no pressure", 300, 0, /above zero/],
    ["negative pressure", 300, -1e5, /above zero/],
    ["no number for pressure", 300, Number.NaN, /not a number/],
  ])("%s is refused by state and density", (_, T, p, pattern) => {
    for (const name of ["air", "carbon dioxide", "R404A"]) {
      const fluid = pureFluid(pureRecord(name), pureRecord);
      expect(sentenceOf(fluid.state(T, p))).toMatch(pattern);
      expect(sentenceOf(fluid.density(T, p))).toMatch(pattern);
    }
  });

  // Melting temperatures under pressure from handbooks, from memory: 1 K for the first four; the Simon line of helium at 4 K, 12.9 MPa.
  test.each([
    ["nitrogen", 100e6, 82.6],
    ["argon", 100e6, 107.2],
    ["methane", 100e6, 113.5],
    ["carbon dioxide", 100e6, 236.2],
    ["helium", 12.9e6, 4.0],
  ])("%s at %d Pa melts near %d K", (name, p, T) => {
    const fluid = pureFluid(pureRecord(name), pureRecord);
    expect(sentenceOf(fluid.state(0.97 * T, p))).toMatch(/is solid: it melts at/);
    expect(isProblem(fluid.state(1.03 * T, p))).toBe(false);
  });

  test("the critical point itself is refused", () => {
    for (const name of ["carbon dioxide", "nitrogen", "R134a", "ethane"]) {
      const record = pureRecord(name);
      const fluid = pureFluid(record, pureRecord);
      const found = fluid.state(record.critical.T, record.critical.p);
      if (isProblem(found)) expect(found.sentence).toMatch(/critical point/);
      else expect(found.cp).toBeGreaterThan(1e4);
      expect(fluid.cautions(record.critical.T, record.critical.p).join(" ")).toMatch(/[Cc]ritical point/);
    }
  });
});

describe("the shelf's lines", () => {
  test("names and synonyms of all resolve to themselves", () => {
    for (const entry of pureFluids) {
      for (const name of [entry.name, ...entry.synonyms, entry.name.toUpperCase()]) {
        const found = findFluid(name);
        expect([name, isProblem(found) ? found.sentence : found.name]).toEqual([name, entry.name]);
      }
    }
  });

  test.each([
    ["R-134a", "R134a"],
    ["r 717", "ammonia"],
    ["R744", "carbon dioxide"],
    ["R290", "propane"],
    ["R600a", "isobutane"],
    ["n2", "nitrogen"],
    ["SF6", "sulfur hexafluoride"],
    ["dry air", "air"],
  ])("%s is %s", (asked, name) => {
    expect(sure(findFluid(asked)).name).toBe(name);
  });

  test("every name of the reference grids is on the shelf", () => {
    const names = new Set([...readCsv("pure-states.csv"), ...readCsv("pure-saturation.csv")].map((row) => row.fluid as string));
    expect(names.size).toBe(81);
    for (const name of names) expect([name, isProblem(findFluid(name))]).toEqual([name, false]);
  });

  test("every source is in the bibliography", () => {
    for (const { name, sources } of pureFluids) {
      expect(sources.length).toBeGreaterThan(0);
      for (const key of sources) expect([name, key, key in bibliography]).toEqual([name, key, true]);
    }
  });

  test("air's published uncertainties stand at its line", () => {
    const air = sure(findFluid("air"));
    expect(air.uncertainty(300, 1e5)).toMatchObject({
      density: 0.001,
      cp: 0.01,
      viscosity: 0.05,
      conductivity: 0.05,
      origin: "from memory",
    });
    expect(air.range.T).toEqual([60, 2000]);
    expect(air.range.p[1]).toBe(1e8);
  });
});
