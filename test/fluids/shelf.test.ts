import { readFileSync } from "node:fs";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { bibliography } from "../../src/bibliography.js";
import type { Fluid } from "../../src/fluids/fluid.js";
import { findFluid, keyOf, shelf } from "../../src/fluids/shelf.js";
import { isProblem } from "../../src/quantities/problems.js";

function fluidOf(name: string): Fluid {
  const found = findFluid(name);
  if (isProblem(found)) throw new Error(found.sentence);
  return found;
}

function sentence(name: string): string {
  const found = findFluid(name);
  return isProblem(found) ? found.sentence : `found ${found.name}`;
}

const gridNames = readFileSync(new URL("../data/fluid-names.txt", import.meta.url), "utf8")
  .split("\n")
  .filter((line) => line !== "" && !line.startsWith("#"));

describe("names", () => {
  test("every name of the reference grids resolves", () => {
    expect(gridNames.length).toBeGreaterThan(200);
    expect(gridNames.filter((name) => isProblem(findFluid(name)))).toEqual([]);
  });

  // Common practice: usual synonyms, formulas and ways of writing.
  test.each([
    ["water", "water"],
    ["WATER", "water"],
    ["h2o", "water"],
    ["H₂O", "water"],
    [" Steam ", "water"],
    ["dry air", "air"],
    ["N2", "nitrogen"],
    ["CO2", "carbon dioxide"],
    ["R-134a", "R134a"],
    ["r 410a", "R410A"],
    ["NH3", "ammonia"],
    ["NH3 20 %", "ammonia-water 20 %"],
    ["methanol", "methanol"],
    ["methanol 30 %", "methanol-water 30 %"],
    ["humid air 60 % RH", "humid air 60 %"],
    ["moist air 45%", "humid air 45 %"],
    ["ISO VG 46", "gear oil 46"],
    ["hydraulic oil 46", "gear oil 46"],
    ["silicone oil 100 cSt", "silicone oil 100 cSt"],
    ["engine oil", "engine oil, unused"],
    ["NaK", "sodium-potassium eutectic"],
    ["LBE", "lead-bismuth eutectic"],
    ["NO2", "nitrogen dioxide"],
  ])("%s is %s", (given, name) => {
    expect(fluidOf(given).name).toBe(name);
  });

  test("the same fluid is built once", () => {
    expect(findFluid("water")).toBe(findFluid("steam"));
    expect(findFluid("MEG 40 %")).toBe(findFluid("MEG 40 %"));
  });

  test.each([
    ["", /needed/],
    ["watr", /Did you mean "water"\?/],
    ["nitogen", /Did you mean "nitrogen"/],
    ["R134", /Did you mean "R134a"/],
    ["propane gas", /Did you mean "propane"/],
    ["engine oli", /Did you mean "engine oil, unused"/],
    ["glycol", /"ethylene glycol 40 %" or "propylene glycol 40 %"/],
    ["zzzzqqq", /No fluid is called "zzzzqqq"\. =FILM/],
    ["water 40 %", /takes no number/],
    ["ethylene glycol 30 cSt", /concentration of ethylene glycol is given in %/],
  ])("%s is refused with a sentence", (given, wanted) => {
    expect(sentence(given)).toMatch(wanted);
  });

  test("no two entries share a name", () => {
    const names = shelf().flatMap((entry) => [...new Set([entry.name, ...entry.synonyms].map(keyOf))]);
    expect(names.filter((name, k) => names.indexOf(name) !== k)).toEqual([]);
  });

  test("any text is a fluid or a sentence", () => {
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ maxLength: 40 }),
          fc.constantFrom(...gridNames).chain((name) => fc.string({ maxLength: 4 }).map((tail) => name + tail)),
        ),
        (text) => {
          const found = findFluid(text);
          if (isProblem(found)) expect(found.sentence.length).toBeGreaterThan(10);
          else expect(found.name.length).toBeGreaterThan(0);
        },
      ),
      { numRuns: 1500 },
    );
  });
});

describe("lists", () => {
  test.each(shelf().map((entry) => [entry.name, entry] as const))(
    "%s has sources of the bibliography, a range, an uncertainty and a summary",
    (_name, entry) => {
      expect(entry.sources.length).toBeGreaterThan(0);
      for (const key of entry.sources) expect(Object.keys(bibliography)).toContain(key);
      expect(entry.range.T[0]).toBeLessThan(entry.range.T[1]);
      expect(entry.range.p[0]).toBeLessThan(entry.range.p[1]);
      expect(entry.uncertainty).toMatch(/%/);
      expect(entry.summary).toMatch(/^[A-Z0-9].*\.$/);
      const fluid = entry.fluid(entry.parameter ? (entry.parameter.otherwise ?? entry.parameter.example) : undefined);
      if (isProblem(fluid)) throw new Error(fluid.sentence);
      for (const key of fluid.sources) expect(Object.keys(bibliography)).toContain(key);
    },
  );
});

describe("laws of every fluid", () => {
  const built = shelf().map((entry) => {
    const fluid = entry.fluid(entry.parameter ? (entry.parameter.otherwise ?? entry.parameter.example) : undefined);
    if (isProblem(fluid)) throw new Error(fluid.sentence);
    return [entry.name, fluid] as const;
  });

  test.each(built)("%s: any temperature and pressure give numbers or a sentence", (_name, fluid) => {
    const [coldest, hottest] = fluid.range.T;
    const [thinnest, highest] = fluid.range.p;
    const wild = fc.oneof(
      { weight: 5, arbitrary: fc.double({ min: 0, max: 1, noNaN: true }).map((u) => coldest + u * (hottest - coldest)) },
      { weight: 1, arbitrary: fc.double() },
      { weight: 1, arbitrary: fc.constantFrom(coldest, hottest, 0, -1, Number.NaN, Number.POSITIVE_INFINITY) },
    );
    const wildPressure = fc.oneof(
      { weight: 5, arbitrary: fc.double({ min: 0, max: 1, noNaN: true }).map((u) => thinnest * (highest / thinnest) ** u) },
      { weight: 1, arbitrary: fc.double() },
      { weight: 1, arbitrary: fc.constantFrom(thinnest, highest, 0, -1, Number.NaN) },
    );
    fc.assert(
      fc.property(wild, wildPressure, (T, p) => {
        const found = fluid.state(T, p);
        if (isProblem(found)) {
          expect(found.sentence).toMatch(/^.{10,}\.$/s);
          expect(found.sentence).not.toMatch(/NaN|undefined|Infinity/);
          return;
        }
        for (const value of [found.density, found.cp, found.viscosity, found.conductivity])
          if (value !== undefined) expect(value).toBeGreaterThan(0);
        for (const value of Object.values(found)) if (typeof value === "number") expect(Number.isFinite(value)).toBe(true);
        const { origin, ...parts } = fluid.uncertainty(T, p);
        expect(origin.length).toBeGreaterThan(0);
        for (const part of Object.values(parts)) expect(part >= 0 && Number.isFinite(part)).toBe(true);
        for (const caution of fluid.cautions(T, p)) expect(caution).toMatch(/^[^a-z].*\.$/s);
      }),
      { numRuns: 150 },
    );
  });
});
