import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Fluid, State } from "../../src/fluids/fluid.js";
import { ownTable } from "../../src/fluids/own-table.js";
import { water } from "../../src/fluids/water.js";
import { isProblem, type Problem, sentenceOf } from "../../src/quantities/problems.js";
import type { Reading } from "../../src/quantities/quantity.js";

const si: Reading = { system: "SI", ambient: 101325 };
const us: Reading = { system: "US", ambient: 101325 };
type Cells = readonly (readonly unknown[])[];

function tableOf(cells: Cells, reading: Reading = si): Fluid {
  const found = ownTable(cells, reading);
  if (Array.isArray(found)) throw new Error(sentenceOf(found as readonly Problem[]));
  return found as Fluid;
}

function faultOf(cells: Cells, reading: Reading = si): string {
  const found = ownTable(cells, reading);
  return Array.isArray(found) ? sentenceOf(found as readonly Problem[]) : "no fault";
}

function stateAt(fluid: Fluid, t: number): State {
  const found = fluid.state(t + 273.15, 101325);
  if (isProblem(found)) throw new Error(found.sentence);
  return found;
}

// Water at 300 K; Incropera et al., table A.6, from memory.
const rho = 997;
const cp = 4179;
const k = 0.613;
const mu = 8.55e-4;
const nu = mu / rho;
const alpha = k / (rho * cp);
const Pr = (mu * cp) / k;

describe("any sufficient set of columns gives the same fluid", () => {
  test.each<readonly [string, readonly string[], readonly number[]]>([
    ["all four", ["density [kg/m3]", "cp [J/(kg·K)]", "conductivity [W/(m·K)]", "viscosity [Pa·s]"], [rho, cp, k, mu]],
    ["kinematic viscosity", ["density [kg/m3]", "cp [J/(kg·K)]", "conductivity [W/(m·K)]", "kinematic viscosity [m²/s]"], [rho, cp, k, nu]],
    ["Pr for cp", ["density [kg/m3]", "Pr", "conductivity [W/(m·K)]", "viscosity [Pa·s]"], [rho, Pr, k, mu]],
    ["diffusivity for cp", ["density [kg/m3]", "diffusivity [m²/s]", "conductivity [W/(m·K)]", "viscosity [Pa·s]"], [rho, alpha, k, mu]],
    [
      "diffusivity and Pr for viscosity and cp",
      ["density [kg/m3]", "diffusivity [m²/s]", "conductivity [W/(m·K)]", "Pr"],
      [rho, alpha, k, Pr],
    ],
    [
      "density from both viscosities",
      ["viscosity [Pa·s]", "kinematic viscosity [m²/s]", "conductivity [W/(m·K)]", "cp [J/(kg·K)]"],
      [mu, nu, k, cp],
    ],
    [
      "density from diffusivity",
      ["cp [J/(kg·K)]", "diffusivity [m²/s]", "conductivity [W/(m·K)]", "kinematic viscosity [m²/s]"],
      [cp, alpha, k, nu],
    ],
    ["conductivity from Pr", ["density [kg/m3]", "cp [J/(kg·K)]", "Pr", "viscosity [Pa·s]"], [rho, cp, Pr, mu]],
    [
      "other units",
      ["density [lb/ft3]", "cp [kJ/(kg·K)]", "conductivity [mW/(m·K)]", "viscosity [cP]"],
      [rho / 16.01846337396014, cp / 1000, k * 1000, mu * 1000],
    ],
    ["symbols", ["ρ [kg/m³]", "c_p (J/kg/K)", "λ [W/mK]", "μ [mPa·s]"], [rho, cp, k, mu * 1000]],
  ])("%s", (_name, headers, values) => {
    const fluid = tableOf([
      ["temperature [°C]", ...headers],
      ["", ...values],
    ]);
    const found = stateAt(fluid, 150);
    expect(found.density).toBeCloseTo(rho, 6);
    expect(found.cp).toBeCloseTo(cp, 6);
    expect(found.conductivity).toBeCloseTo(k, 10);
    expect((found.viscosity as number) / mu).toBeCloseTo(1, 10);
    expect(found.expansivity).toBeUndefined();
    expect(fluid.constantDensity).toBe(true);
    expect(fluid.densityAssumed).toBeUndefined();
  });

  test("without density, kinematic viscosity and diffusivity are kept", () => {
    const fluid = tableOf([
      ["temperature", "kinematic viscosity", "Pr", "conductivity", "expansivity"],
      [20, nu, Pr, k, 2.07e-4],
    ]);
    const found = stateAt(fluid, 20);
    expect(fluid.densityAssumed).toBe(true);
    expect(fluid.constantDensity).toBe(true);
    expect((found.viscosity as number) / found.density / nu).toBeCloseTo(1, 12);
    expect((found.conductivity as number) / (found.density * found.cp) / alpha).toBeCloseTo(1, 12);
    expect(found.expansivity).toBe(2.07e-4);
    expect(found.phase).toBe("liquid");
  });

  test.each<readonly [readonly string[], RegExp]>([
    [["cp", "conductivity", "viscosity"], /density is missing/],
    [["density", "cp", "viscosity"], /conductivity is missing/],
    [["density", "cp", "conductivity"], /viscosity \(or kinematic viscosity\) is missing/],
    [["density", "conductivity", "viscosity"], /cp \(or Pr, or diffusivity\) is missing/],
    [["kinematic viscosity", "conductivity"], /cp \(or Pr, or diffusivity\) is missing/],
  ])("%j is not sufficient", (headers, fault) => {
    expect(
      faultOf([
        ["temperature", ...headers],
        [20, ...headers.map(() => 1)],
      ]),
    ).toMatch(fault);
  });

  test("columns that contradict each other are refused, small differences of rounding are said", () => {
    const headers = ["temperature", "density", "cp", "conductivity", "viscosity", "Pr"];
    expect(faultOf([headers, [20, rho, cp, k, mu, 1000 * Pr]])).toMatch(/contradicts itself.*Check the units/);
    expect(
      tableOf([headers, [20, rho, cp, k, mu, 1.05 * Pr]])
        .cautions(300, 1e5)
        .join(),
    ).toMatch(/Pr differs by 5 %/);
    expect(tableOf([headers, [20, rho, cp, k, mu, 1.01 * Pr]]).cautions(300, 1e5)).toEqual([]);
  });
});

/** A table of water at 1 bar from the release's equations. */
function waterTable(from: number, to: number, step: number): Cells {
  const rows: unknown[][] = [["temperature [°C]", "density [kg/m³]", "cp [J/(kg·K)]", "conductivity [W/(m·K)]", "viscosity [Pa·s]"]];
  for (let t = from; t <= to; t += step) {
    const s = water.state(t + 273.15, 101325) as State;
    rows.push([t, s.density, s.cp, s.conductivity, s.viscosity]);
  }
  return rows;
}

describe("several rows", () => {
  test("interpolation meets the fluid that the table was made of", () => {
    const fluid = tableOf(waterTable(0, 95, 5));
    for (let t = 1; t < 95; t += 0.7) {
      const found = stateAt(fluid, t);
      const true_ = water.state(t + 273.15, 101325) as State;
      expect(Math.abs(found.density / true_.density - 1)).toBeLessThan(2e-4);
      expect(Math.abs(found.cp / true_.cp - 1)).toBeLessThan(1e-3);
      expect(Math.abs((found.conductivity as number) / (true_.conductivity as number) - 1)).toBeLessThan(1e-3);
      expect(Math.abs((found.viscosity as number) / (true_.viscosity as number) - 1)).toBeLessThan(4e-3);
      // From the slope of the density between rows.
      if (t > 15) expect(Math.abs((found.expansivity as number) / (true_.expansivity as number) - 1)).toBeLessThan(0.06);
    }
    expect(fluid.cautions(300, 101325)).toEqual([]);
    expect(fluid.constantDensity).toBe(false);
  });

  test("descending rows give the same", () => {
    const [header, ...rows] = waterTable(0, 90, 10) as [readonly unknown[], ...(readonly unknown[])[]];
    expect(stateAt(tableOf([header, ...rows.reverse()]), 33)).toEqual(stateAt(tableOf(waterTable(0, 90, 10)), 33));
  });

  test("no overshoot between rows", () => {
    const fluid = tableOf([
      ["temperature", "density", "cp", "conductivity", "viscosity"],
      [0, 1000, 4000, 0.5, 1e-3],
      [10, 1000, 4000, 0.5, 1e-3],
      [20, 900, 4100, 0.6, 1e-4],
      [30, 900, 4100, 0.6, 1e-4],
    ]);
    for (let t = 0; t <= 30; t += 0.25) {
      const found = stateAt(fluid, t);
      expect(found.density).toBeGreaterThanOrEqual(900 - 1e-9);
      expect(found.density).toBeLessThanOrEqual(1000 + 1e-9);
      expect(found.viscosity as number).toBeGreaterThanOrEqual(1e-4 * (1 - 1e-9));
    }
  });

  test("outside the rows it is refused with the nearest temperature", () => {
    const found = tableOf(waterTable(10, 60, 10)).state(273.15 + 75, 1e5);
    expect(isProblem(found) ? found.sentence : "").toMatch(/holds 10 °C to 60 °C; 75 °C is above it\. Nearest: 60 °C/);
  });

  test("coarse spacing is a caution that names the place", () => {
    const fluid = tableOf(waterTable(0, 90, 45));
    expect(fluid.cautions(300, 1e5).join()).toMatch(/too coarse for 1 % in h between 0 °C and 90 °C/);
    expect(fluid.uncertainty(300, 1e5).viscosity).toBeGreaterThan(0.005);
  });

  test("tolerances in the cells are the table's uncertainty", () => {
    const fluid = tableOf([
      ["temperature", "density", "cp", "conductivity", "viscosity"],
      ["20 °C", "997 ± 1 kg/m3", "4.18 kJ/(kg·K)", "0.6 ± 0.03 W/(m·K)", "1 ± 10 %"],
    ]);
    const found = fluid.uncertainty(293.15, 1e5);
    expect(found.conductivity).toBeCloseTo(0.05, 10);
    expect(found.viscosity).toBeCloseTo(0.1, 10);
    expect(found.cp).toBe(0);
  });
});

describe("faults are sentences that name the cell", () => {
  const headers = ["temperature [°C]", "density", "cp", "conductivity", "viscosity"];
  const row = (t: unknown, density: unknown = 1000): readonly unknown[] => [t, density, 4000, 0.6, 1e-3];
  test.each<readonly [string, Cells, RegExp]>([
    ["a gap", [headers, row(10), row(20, ""), row(30)], /gap: the table's density in row 3 is blank/],
    ["a blank row in the middle", [headers, row(10), ["", "", "", "", ""], row(30)], /row 3/],
    ["a duplicate", [headers, row(10), row(10)], /rows 2 and 3 have the same temperature, 10 °C/],
    ["disorder", [headers, row(10), row(30), row(20), row(40)], /out of order: 30 °C in row 3, then 20 °C in row 4/],
    ["a negative density", [headers, row(10, -5)], /density in row 2 is -5; it must be above zero/],
    ["a zero density", [headers, row(10, 0)], /must be above zero/],
    ["an error value", [headers, row(10, { code: "#N/A" })], /error value in the table: the table's density in row 2/],
    ["an error text", [headers, row(10, "#DIV/0!")], /error value/],
    ["a truth value", [headers, row(10, true)], /A number is needed/],
    ["words in a cell", [headers, row(10, "heavy")], /In row 2 of the table, density/],
    ["another dimension in a cell", [headers, row(10, "3 m/s")], /In row 2 of the table, density.*speed/],
    [
      "an unknown header",
      [
        [...headers, "colour"],
        [...row(10), 1],
      ],
      /header "colour" is not known; headers are temperature, density/,
    ],
    ["an unknown unit", [["temperature [°C]", "density [blobs]", "cp", "conductivity", "viscosity"], row(10)], /density \[blobs\]/],
    [
      "a unit of another kind",
      [["temperature [°C]", "density [m/s]", "cp", "conductivity", "viscosity"], row(10)],
      /unit of a speed; density needs that of a density/,
    ],
    ["a unit for Pr", [["temperature [°C]", "density", "Pr [W]", "conductivity", "viscosity"], row(10)], /pure number/],
    [
      "two columns of one kind",
      [
        [...headers, "rho"],
        [...row(10), 1],
      ],
      /two columns for density/,
    ],
    ["no rows", [headers], /no row of values/],
    ["nothing", [[]], /no header row/],
    ["several rows without temperature", [headers.slice(1), row(10).slice(1), row(20).slice(1)], /needs a column "temperature"/],
    ["absolute zero", [headers, row(-300)], /absolute zero/],
  ])("%s", (_name, cells, fault) => {
    expect(faultOf(cells)).toMatch(fault);
  });

  test("all faults come together", () => {
    expect(faultOf([headers, row(10, -1), row(20, "x")])).toMatch(/row 2.*row 3/s);
  });
});

describe("leniency", () => {
  test("blank rows and columns at the end, nulls and zeros of blank cells, are left out", () => {
    const fluid = tableOf([
      ["Temperature [°C]", "DENSITY", "cp", "conductivity", "viscosity", "", null],
      [20, 1000, 4000, 0.6, 1e-3, "", undefined],
      [40, 990, 4000, 0.62, 7e-4, "", 0],
      ["", "", "", "", "", "", ""],
      [0, 0, 0, 0, 0, 0, 0],
    ]);
    expect(fluid.range.T).toEqual([293.15, 313.15]);
  });

  test("US units where the header has none", () => {
    const fluid = tableOf(
      [
        ["temperature", "density", "cp", "conductivity", "viscosity"],
        [68, 62.4, 1, 0.35, 6.7e-4],
        [104, 62.0, 1, 0.36, 4.4e-4],
      ],
      us,
    );
    expect(fluid.range.T[0]).toBeCloseTo(293.15, 9);
    // Exact factors: 1 lb/ft³ = 16.018463… kg/m³, 1 Btu/(lb·°F) = 4186.8 J/(kg·K)
    expect(stateAt(fluid, 20).density).toBeCloseTo(62.4 * 16.01846337, 5);
    expect(stateAt(fluid, 20).cp).toBeCloseTo(4186.8, 1);
  });

  test("a single row has no limits and needs no temperature", () => {
    const fluid = tableOf([
      ["density", "cp", "conductivity", "viscosity"],
      [1000, 4000, 0.6, 1e-3],
    ]);
    expect(stateAt(fluid, -200).cp).toBe(4000);
    expect(stateAt(fluid, 3000).cp).toBe(4000);
  });
});

describe("gas or liquid", () => {
  test.each([
    [1.2, 1005, 0.026, 1.8e-5, "gas"],
    [1, 1005, 0.026, 1.8e-5, "gas"],
    [1000, 4180, 0.6, 1e-3, "liquid"],
    [1, 4180e3, 0.6, 1e-6, "liquid"],
  ])("density %d is %s", (density, cpHere, kHere, muHere, phase) => {
    const fluid = tableOf([
      ["density", "cp", "conductivity", "viscosity"],
      [density, cpHere, kHere, muHere],
    ]);
    expect(stateAt(fluid, 20).phase).toBe(phase);
  });
});

describe("change of phase", () => {
  // Water at 1 atm; Incropera et al., table A.6, from memory.
  const headers = [
    "temperature [°C]",
    "density",
    "cp",
    "conductivity",
    "viscosity",
    "saturation temperature [°C]",
    "latent heat [kJ/kg]",
    "surface tension [N/m]",
  ];
  const row = [100, 957.9, 4217, 0.68, 279e-6, 100, 2257, 0.0589];
  const vapourHeaders = ["vapour density", "vapour cp", "vapour conductivity", "vapour viscosity"];
  const vapour = [0.5955, 2029, 0.0248, 12.02e-6];

  test("saturation carries both phases", () => {
    const fluid = tableOf([
      [...headers, ...vapourHeaders],
      [...row, ...vapour],
    ]);
    const found = fluid.saturationAtPressure?.(101325);
    if (found === undefined || isProblem(found)) throw new Error("no saturation");
    expect(found.T).toBeCloseTo(373.15, 9);
    expect(found.latentHeat).toBe(2257e3);
    expect(found.surfaceTension).toBe(0.0589);
    expect([found.liquid.density, found.vapour.density, found.vapour.cp]).toEqual([957.9, 0.5955, 2029]);
    expect([found.liquid.phase, found.vapour.phase]).toEqual(["liquid", "gas"]);
    expect(isProblem(fluid.saturationAtTemperature?.(373.15))).toBe(false);
    expect(isProblem(fluid.saturationAtTemperature?.(300))).toBe(true);
  });

  test("above saturation the state is the vapour's, never the liquid's", () => {
    const full = tableOf([
      [...headers, ...vapourHeaders],
      [...row, ...vapour],
    ]);
    expect(stateAt(full, 150).density).toBe(0.5955);
    expect(stateAt(full, 90).density).toBe(957.9);
    const bare = tableOf([
      [...headers, "vapour density"],
      [...row, 0.5955],
    ]);
    const found = bare.state(423.15, 101325);
    expect(isProblem(found) ? found.sentence : "").toMatch(/boils at 100 °C; at 150 °C it is vapour/);
    const saturation = bare.saturationAtPressure?.(101325);
    expect(saturation && !isProblem(saturation) ? saturation.vapourCpGiven : undefined).toBe(false);
  });

  test.each<readonly [string, Cells, RegExp]>([
    [
      "no saturation temperature",
      [
        ["temperature", "density", "cp", "conductivity", "viscosity", "latent heat [kJ/kg]"],
        [100, 958, 4217, 0.68, 279e-6, 2257],
      ],
      /no saturation temperature/,
    ],
    ["no latent heat", [headers.slice(0, 6), row.slice(0, 6)], /"latent heat"/],
    ["two saturation temperatures", [headers, row, [120, 943, 4245, 0.683, 232e-6, 120, 2200, 0.055]], /several saturation temperatures/],
  ])("%s", (_name, cells, fault) => {
    expect(faultOf(cells)).toMatch(fault);
  });
});

describe("robustness", () => {
  const cell = fc.oneof(
    fc.double(),
    fc.string({ maxLength: 8 }),
    fc.constantFrom(
      "temperature [°C]",
      "density",
      "cp",
      "conductivity",
      "viscosity",
      "Pr",
      "nu",
      "20 °C",
      "1 ± 2",
      "",
      null,
      undefined,
      true,
      0,
      20,
      1e308,
      "#N/A",
      { type: "Error" },
    ),
  );
  test("any cells give a fluid or sentences, and a fluid gives numbers or sentences", () => {
    fc.assert(
      fc.property(
        fc.array(fc.array(cell, { maxLength: 7 }), { maxLength: 6 }),
        fc.double({ min: 200, max: 600, noNaN: true }),
        (cells, T) => {
          const found = ownTable(cells, si);
          if (Array.isArray(found)) {
            expect((found as readonly Problem[]).every((one) => one.sentence.length > 0)).toBe(true);
            return;
          }
          const state = (found as Fluid).state(T, 1e5);
          if (!isProblem(state))
            expect([state.density, state.cp, state.conductivity, state.viscosity].every((value) => Number.isFinite(value))).toBe(true);
        },
      ),
      { numRuns: 3000 },
    );
  });

  test("any positive numbers under good headers give a fluid whose numbers are finite", () => {
    const positive = fc.double({ min: 1e-300, max: 1e300, noNaN: true });
    fc.assert(
      fc.property(positive, positive, positive, positive, (a, b, c, d) => {
        const found = ownTable(
          [
            ["temperature", "density", "cp", "conductivity", "viscosity"],
            [20, a, b, c, d],
            [30, d, c, b, a],
          ],
          si,
        );
        if (Array.isArray(found)) return;
        const state = (found as Fluid).state(295.15, 1e5);
        if (!isProblem(state)) {
          expect(
            [state.density, state.cp, state.conductivity, state.viscosity, state.expansivity].every((value) => Number.isFinite(value)),
          ).toBe(true);
        }
      }),
      { numRuns: 2000 },
    );
  });
});
