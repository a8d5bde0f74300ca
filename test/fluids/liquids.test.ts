import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Fluid, State } from "../../src/fluids/fluid.js";
import { kinematicViscosity, mineralOil } from "../../src/fluids/mineral-oil.js";
import { findFluid, shelf } from "../../src/fluids/shelf.js";
import { isProblem } from "../../src/quantities/problems.js";
import { numberIn, readCsv } from "../data/read-csv.js";

function fluidOf(name: string): Fluid {
  const found = findFluid(name);
  if (isProblem(found)) throw new Error(found.sentence);
  return found;
}

function stateOf(name: string, T: number, p: number): State {
  const found = fluidOf(name).state(T, p);
  if (isProblem(found)) throw new Error(found.sentence);
  return found;
}

type Tolerances = Readonly<Record<"density" | "cp" | "viscosity" | "conductivity" | "expansivity", number>>;

/** The same fit twice; expansivity of the table was a difference quotient. */
const sameFit: Tolerances = { density: 2e-6, cp: 2e-6, viscosity: 2e-6, conductivity: 2e-6, expansivity: 2e-5 };
/** Another fit of the same fluid. */
const otherFit: Tolerances = { density: 5e-3, cp: 0.02, viscosity: 0.05, conductivity: 0.02, expansivity: 0.1 };
/** R13-08 with the industrial water in place of the scientific one. */
const gibbs: Tolerances = { density: 2e-5, cp: 3e-4, viscosity: 0, conductivity: 0, expansivity: 1e-2 };
/** Engineering fits where the scientific function takes their place: the note's own figures, and what follows for the slope. */
const seawaterFit: Tolerances = { density: 5e-4, cp: 3e-3, viscosity: 2e-6, conductivity: 2e-6, expansivity: 0.06 };
/** Table points: expansivity to the 5 % that the row states. */
const printed: Tolerances = { density: 1e-9, cp: 1e-9, viscosity: 1e-9, conductivity: 1e-9, expansivity: 0.06 };

function tolerancesOf(note: string, hot: boolean): Tolerances {
  if (note.startsWith("third fit")) return otherFit;
  if (note.startsWith("IAPWS-08")) return gibbs;
  if (note.startsWith("Sharqawy")) return hot ? sameFit : seawaterFit;
  return note.includes("table point") ? printed : sameFit;
}

describe("rows of the published fits", () => {
  test.each(readCsv("liquid-states.csv").map((row) => [row.fluid as string, row.t_C as string, row.p_Pa as string, row] as const))(
    "%s at %s °C, %s Pa",
    (name, _t, _p, row) => {
      const t = numberIn(row, "t_C") as number;
      const found = stateOf(name, t + 273.15, numberIn(row, "p_Pa") as number);
      const tolerances = tolerancesOf(row.note as string, t >= 80 || name === "seawater 12 %");
      for (const quantity of Object.keys(tolerances) as readonly (keyof Tolerances)[]) {
        const expected = numberIn(row, quantity);
        if (expected === undefined) continue;
        const value = found[quantity] as number;
        // Expansivity near a density maximum is judged by its size elsewhere.
        const scale = quantity === "expansivity" ? Math.max(Math.abs(expected), 5e-5) : Math.abs(expected);
        expect(Math.abs(value - expected) / scale, `${quantity}: ${value} for ${expected}`).toBeLessThan(tolerances[quantity]);
      }
    },
  );
});

describe("seawater", () => {
  // IAPWS R13-08 values, computed with an open implementation of the Gibbs function; independent. Fits: the papers' own equations, a second implementation.
  test.each([
    [35, 25, 1023.21955092, 3999.77673821, 0.000297425875286],
    [35, 0, 1027.97467251, 3987.43399621, 5.2514219987e-5],
    [10, 20, 1005.75837294, 4127.38464219, 0.000222409431986],
    [40, 38, 1022.34348685, 3982.85505781, 0.000391103726404],
  ])("%d g/kg at %d °C", (S, t, density, cp, expansivity) => {
    const found = stateOf(`seawater ${S} g/kg`, t + 273.15, 101325);
    expect(Math.abs(found.density / density - 1)).toBeLessThan(2e-5);
    expect(Math.abs(found.cp / cp - 1)).toBeLessThan(3e-4);
    expect(Math.abs((found.expansivity as number) / expansivity - 1)).toBeLessThan(1e-2);
  });

  // R13-08 freezing points at 101325 Pa; independent
  test.each([
    [10, -0.536113],
    [35.16504, -1.919114],
    [40, -2.196413],
  ])("freezing point at %d g/kg", (S, t) => {
    expect((fluidOf(`seawater ${S} g/kg`).freezingPoint as number) - 273.15).toBeCloseTo(t, 1);
  });

  test("no step where the formulations pass into each other", () => {
    const density = (t: number): number => stateOf("seawater 3.5 %", t + 273.15, 2e5).density;
    for (const t of [40, 80]) expect(Math.abs(density(t + 1e-6) / density(t - 1e-6) - 1)).toBeLessThan(1e-8);
  });

  test("boiling is refused with the pressure that it needs", () => {
    const found = fluidOf("seawater").state(383.15, 101325);
    expect(isProblem(found) ? found.sentence : "").toMatch(/boils below 1\d\d\.?\d* kPa/);
  });
});

describe("refusals and cautions", () => {
  test.each([
    ["ethylene glycol 40 %", 240, /starts to freeze at -23\.81 °C/],
    ["ethylene glycol 40 %", 400, /above its published range.*nearest: 100 °C/],
    ["sodium", 360, /freeze/],
    ["nitrate salt 60/40", 1000, /above its published range/],
  ])("%s at %d K", (name, T, sentence) => {
    const found = fluidOf(name).state(T, 101325);
    expect(isProblem(found) ? found.sentence : "").toMatch(sentence);
  });

  test.each([
    ["ethylene glycol 70 %", /0 to 60 %.*nearest: "ethylene glycol 60 %"/],
    ["ethylene glycol 5 % by volume", /10 to 60 % by volume/],
    ["ethylene glycol", /needs its concentration.*"ethylene glycol 40 %"/],
    ["calcium chloride 20 % by volume", /counted by mass/],
    ["seawater 40 %", /0 to 12 %/],
    ["glycol", /Did you mean "ethylene glycol 40 %"/],
  ])("%s", (name, sentence) => {
    const found = findFluid(name);
    expect(isProblem(found) ? found.sentence : "").toMatch(sentence);
  });

  test("needed pressure, flash point and hazards are cautions", () => {
    expect(fluidOf("ethylene glycol 40 %").cautions(370, 5e4).join()).toMatch(/boils unless/);
    expect(fluidOf("ethylene glycol 40 %").cautions(300, 101325).join()).toMatch(/toxic/);
    expect(fluidOf("diphenyl oxide/biphenyl eutectic").cautions(420, 101325).join()).toMatch(/flash point/);
    expect(fluidOf("diphenyl oxide/biphenyl eutectic").cautions(570, 101325).join()).toMatch(/boils unless/);
    expect(fluidOf("NaK").cautions(500, 101325).join()).toMatch(/burn/);
  });

  // Common practice: what the trade writes.
  test.each([
    ["MEG 40 %", "ethylene glycol 40 %"],
    ["meg 40%", "ethylene glycol 40 %"],
    ["40 % ethylene glycol", "ethylene glycol 40 %"],
    ["Ethylene Glycol 50 vol%", "ethylene glycol 50 % by volume"],
    ["propylene glycol 30 % (by volume)", "propylene glycol 30 % by volume"],
    ["ethanol 25 %", "ethanol-water 25 %"],
    ["CaCl2 24 %", "calcium chloride 24 %"],
    ["seawater 35 g/kg", "seawater 3.5 %"],
    ["seawater", "seawater 3.5 %"],
    ["solar salt", "nitrate salt 60/40"],
    ["12,5 % MEG", "ethylene glycol 12.5 %"],
  ])("%s is %s", (given, name) => {
    expect(fluidOf(given).name).toBe(name);
  });
});

describe("oils", () => {
  // ASTM D2270's own table: oils of viscosity index 95 by definition lie between L and H; typical sheets of mineral gear oils, common practice.
  test.each([
    [46, 6.7],
    [100, 11.1],
    [220, 18.7],
    [460, 30.2],
  ])("ISO VG %d has about %d mm²/s at 100 °C", (grade, at100) => {
    const found = stateOf(`gear oil ${grade}`, 373.15, 101325);
    expect(Math.abs((((found.viscosity as number) / found.density) * 1e6) / at100 - 1)).toBeLessThan(0.02);
    const at40 = stateOf(`gear oil ISO VG ${grade}`, 313.15, 101325);
    expect(((at40.viscosity as number) / at40.density) * 1e6).toBeCloseTo(grade, 6);
  });

  test("two viscosities give the whole line (ASTM D341), which passes through both", () => {
    const nu = kinematicViscosity(150, 14.7);
    expect(nu(313.15)).toBeCloseTo(150, 9);
    expect(nu(373.15)).toBeCloseTo(14.7, 9);
    expect(nu(293.15)).toBeGreaterThan(400);
  });

  // Cragoe 1929 at 20 °C, specific gravity 0.88: k = 0.1172/0.88·(1 − 0.0108), cp = (1685 + 68)/√0.88; the paper's equations worked by hand.
  test("transformer oil by Cragoe's estimates", () => {
    const found = stateOf("transformer oil", 293.15, 101325);
    expect(found.conductivity).toBeCloseTo(0.1317, 3);
    expect(Math.abs(found.cp / 1869 - 1)).toBeLessThan(2e-3);
    // Common practice: thermal expansion of mineral oil about 7e-4 1/K.
    expect(Math.abs((found.expansivity as number) / 7.1e-4 - 1)).toBeLessThan(0.05);
  });

  test("silicone oil has its grade at 25 °C", () => {
    for (const grade of [10, 100, 5000]) {
      const found = stateOf(`silicone oil ${grade} cSt`, 298.15, 101325);
      expect(((found.viscosity as number) / found.density) * 1e6).toBeCloseTo(grade, 6);
    }
    expect(stateOf("silicone oil 100", 298.15, 101325).density).toBeCloseTo(966, 6);
  });

  test.each([
    ["gear oil 5", /10 to 1500/],
    ["silicone oil 100 %", /given in cSt/],
    ["gear oil", /needs its ISO viscosity grade.*"gear oil 220"/],
  ])("%s is refused", (name, sentence) => {
    const found = findFluid(name);
    expect(isProblem(found) ? found.sentence : "found").toMatch(sentence);
  });

  test("contradictory sheets are refused", () => {
    const sheet = {
      name: "oil",
      viscosity40: 10,
      viscosity100: 12,
      density15: 880,
      flashPoint: 200,
      T: [273, 400] as const,
      sources: [],
      viscosityUncertainty: 0.1,
    };
    expect(isProblem(mineralOil(sheet))).toBe(true);
    expect(isProblem(mineralOil({ ...sheet, viscosity100: 3, density15: 8 }))).toBe(true);
    expect(isProblem(mineralOil({ ...sheet, viscosity100: 3 }))).toBe(false);
  });
});

describe("laws", () => {
  const families = ["coolant", "oil", "metal or salt"];
  const entries = shelf().filter((entry) => families.includes(entry.family));

  test.each(entries.map((entry) => [entry.name, entry] as const))(
    "%s is finite, positive and consistent over its range",
    (_name, entry) => {
      fc.assert(
        fc.property(fc.double({ min: 0, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true }), (u, v) => {
          const [least, most] = entry.parameter?.limits ?? [0, 0];
          const fluid = entry.fluid(entry.parameter ? least + v * (most - least) : undefined);
          if (isProblem(fluid)) throw new Error(fluid.sentence);
          const [coldest, hottest] = fluid.range.T;
          const T = coldest + u * (hottest - coldest);
          const found = fluid.state(T, 5e6);
          if (isProblem(found)) throw new Error(found.sentence);
          const all = [found.density, found.cp, found.viscosity as number, found.conductivity as number];
          expect(Math.min(...all)).toBeGreaterThan(0);
          expect(all.every(Number.isFinite)).toBe(true);
          const step = 1e-3;
          if (T - step < coldest || T + step > hottest) return;
          const slope = ((fluid.density(T + step, 5e6) as number) - (fluid.density(T - step, 5e6) as number)) / (2 * step);
          // A handbook's table prints expansivity to two digits in a column of its own, beside its densities.
          const tabled = fluid.sources.includes("incropera-a5");
          expect(Math.abs(-slope / found.density - (found.expansivity as number))).toBeLessThan(tabled ? 2e-4 : 1e-6);
        }),
        { numRuns: 200 },
      );
    },
  );
});
