import { describe, expect, test } from "vitest";
import type { Fluid, State } from "../../src/fluids/fluid.js";
import { humidAir } from "../../src/fluids/humid-air.js";
import { findFluid } from "../../src/fluids/shelf.js";
import { isProblem, type Problem } from "../../src/quantities/problems.js";
import { numberIn, readCsv } from "../data/read-csv.js";

function sure<T extends object | number>(thing: T | Problem | undefined): T {
  if (thing === undefined) throw new Error("nothing was given");
  if (isProblem(thing)) throw new Error(thing.sentence);
  return thing as T;
}

const rows = readCsv("humid-air-states.csv").map((row) => [row.fluid as string, row.t_C as string, row.p_Pa as string, row] as const);

describe("against a virial real-gas model", () => {
  test.each(rows)("%s at %s °C, %s Pa", (name, _t, _p, row) => {
    const T = (numberIn(row, "t_C") as number) + 273.15;
    const p = numberIn(row, "p_Pa") as number;
    const found: State = sure(sure(findFluid(name)).state(T, p));
    // Mixing rules differ by 3 % in transport.
    const tolerances = { density: 5e-4, cp: 3e-3, viscosity: 0.03, conductivity: 0.03, expansivity: 2e-3 } as const;
    for (const quantity of Object.keys(tolerances) as readonly (keyof typeof tolerances)[]) {
      const expected = numberIn(row, quantity);
      if (expected === undefined) continue;
      expect(Math.abs((found[quantity] as number) / expected - 1), quantity).toBeLessThan(tolerances[quantity]);
    }
  });

  test.each(rows.filter(([name, , , row]) => name !== "humid air 0 %" && /dew point/.test(row.note as string)))(
    "dew point of %s at %s °C, %s Pa",
    (name, _t, _p, row) => {
      const T = (numberIn(row, "t_C") as number) + 273.15;
      const printed = Number(/dew point (-?[\d.]+) C/.exec(row.note as string)?.[1]);
      const dew = sure(sure(findFluid(name)).dewPoint?.(T, numberIn(row, "p_Pa") as number));
      expect(Math.abs(dew - 273.15 - printed)).toBeLessThan(0.03);
    },
  );
});

describe("moisture", () => {
  const fluid: Fluid = sure(findFluid("humid air 60 %"));

  test("film and wall keep the bulk's moisture", () => {
    const kept = sure(fluid.atBulk?.(303.15, 101325));
    const dew = sure(fluid.dewPoint?.(303.15, 101325));
    expect(sure(kept.dewPoint?.(343.15, 101325))).toBeCloseTo(dew, 6);
    expect(sure(kept.state(303.15, 101325)).density).toBeCloseTo(sure(fluid.state(303.15, 101325)).density, 9);
    // Drier at 70 °C than air of 60 % there.
    expect(sure(kept.state(343.15, 101325)).cp).toBeLessThan(sure(fluid.state(343.15, 101325)).cp);
  });

  test("a surface below the dew point is a caution, not a refusal", () => {
    const kept = sure(fluid.atBulk?.(303.15, 101325));
    expect(isProblem(kept.state(283.15, 101325))).toBe(false);
    expect(kept.cautions(283.15, 101325).join()).toMatch(/below the dew point, 21\.\d °C: water condenses/);
    expect(kept.cautions(303.15, 101325)).toEqual([]);
  });

  test("dew point and humidity ratio say the same as relative humidity", () => {
    const dew = sure(fluid.dewPoint?.(303.15, 101325));
    const byDew = sure(sure(humidAir({ dewPoint: dew })).state(303.15, 101325));
    expect(byDew.density).toBeCloseTo(sure(fluid.state(303.15, 101325)).density, 6);
    // Humidity ratio of a row of the table: 50 % at 18.8 °C, 101325 Pa.
    const byRatio = sure(sure(humidAir({ humidityRatio: 0.00676301 })).state(291.95, 101325));
    expect(Math.abs(byRatio.density / 1.20468207 - 1)).toBeLessThan(5e-4);
  });

  test("dry air is dry air", () => {
    const dry = sure(sure(humidAir({ relativeHumidity: 0 })).state(300, 101325));
    const air = sure(sure(findFluid("air")).state(300, 101325));
    expect(Math.abs(dry.density / air.density - 1)).toBeLessThan(4e-4);
    expect(Math.abs(dry.cp / air.cp - 1)).toBeLessThan(1e-3);
    expect(Math.abs((dry.conductivity as number) / (air.conductivity as number) - 1)).toBeLessThan(5e-3);
  });

  test.each<readonly [string, Fluid | Problem, RegExp]>([
    ["above saturation", humidAir({ relativeHumidity: 140 }), /0 to 100 %/],
    ["no number", humidAir({ relativeHumidity: Number.NaN }), /./],
    ["a ratio below zero", humidAir({ humidityRatio: -1 }), /is none/],
    ["a dew point too high", humidAir({ dewPoint: 900 }), /between -100 °C and 200 °C/],
    ["without a number", findFluid("humid air"), /needs its relative humidity.*"humid air 60 %"/],
    ["above a hundred per cent", findFluid("humid air 120 %"), /nearest: "humid air 100 %"/],
  ])("%s is refused", (_name, found, sentence) => {
    expect(isProblem(found) ? found.sentence : "found").toMatch(sentence);
  });

  test("where water boils, relative humidity is refused", () => {
    const found = fluid.state(380, 101325);
    expect(isProblem(found) ? found.sentence : "").toMatch(/water boils; give a dew point/);
    expect(isProblem(sure(humidAir({ dewPoint: 330 })).state(420, 101325))).toBe(false);
  });
});
