// Laws that every surface must keep, tried over its whole range with constant properties, so that only the equations speak.
// Fails on a jump that the bounds do not cover, on h falling where more flow or a steeper difference must raise it,
// on an equation that its own label does not find, and on groups that change with the unit they are given in.
import { describe, expect, test } from "vitest";
import { labelOf } from "../../src/surfaces/choice.js";
import { allSurfaces } from "../../src/surfaces/index.js";
import type { Circumstances, Inputs } from "../../src/surfaces/surface.js";
import { film, one } from "../cells/call.js";

/** A fluid of constant properties, kinematic viscosity 1e-5, so that a speed or a length is a group up to a factor. */
function fluidOf(Pr: number): unknown[][] {
  return [
    ["temperature", "density", "kinematic viscosity [m2/s]", "conductivity", "Pr", "expansivity"],
    ["", 1, 1e-5, 0.03, Pr, 1e-3],
  ];
}

interface Sweep {
  readonly id: string;
  readonly Pr: number;
  readonly values: (x: number) => readonly unknown[];
  readonly from: number;
  readonly to: number;
  readonly settings?: string;
  /** Why a large part of the sweep has no equation. */
  readonly exempt?: string;
}

const still = (Pr: number) => fluidOf(Pr);
const sweeps: readonly Sweep[] = [0.7, 7, 100].flatMap((Pr): Sweep[] => [
  { id: "FREE.PLATE", Pr, values: (x) => [still(Pr), 30, 20, x], from: 0.003, to: 20 },
  { id: "FREE.PLATE", Pr, values: (x) => [still(Pr), `${x} W/m2`, 20, 0.3], from: 0.01, to: 1e4 },
  { id: "FREE.CYLINDER", Pr, values: (x) => [still(Pr), 30, 20, x], from: 1e-4, to: 10 },
  { id: "FREE.TOPFACE", Pr, values: (x) => [still(Pr), 30, 20, x, x], from: 0.01, to: 5 },
  { id: "FREE.UNDERSIDE", Pr, values: (x) => [still(Pr), 30, 20, x, x], from: 0.1, to: 5 },
  { id: "FORCED.CYLINDER", Pr, values: (x) => [still(Pr), 30, 20, x, 0.01], from: 0.05, to: 5e3 },
  { id: "FORCED.PLATE", Pr, values: (x) => [still(Pr), 30, 20, x, 1], from: 0.02, to: 500 },
  {
    id: "FORCED.PLATE",
    Pr,
    values: (x) => [still(Pr), 30, 20, x, 1],
    from: 0.2,
    to: 500,
    settings: "boundary layer=tripped",
    exempt: Pr > 60 ? "below Re 5e5 no equation for a tripped layer serves such a Prandtl number" : undefined,
  },
  { id: "DUCT.TUBE", Pr, values: (x) => [still(Pr), 30, 20, x, 0.01], from: 0.002, to: 900 },
  { id: "DUCT.TUBE", Pr, values: (x) => [still(Pr), 30, 20, x, 0.01, 1], from: 0.002, to: 900 },
  { id: "DUCT.TUBE", Pr, values: (x) => [still(Pr), "50 W/m2", 20, x, 0.01, 1], from: 0.002, to: 900, settings: "position=0.5" },
]);

type Row = readonly (number | string)[];

const steps = 300;

/** Halves an interval towards its steepest change: what is left of it is a jump. */
function closingIn(sweep: Sweep, from: number, to: number): readonly [below: Row, above: Row] {
  const at = (x: number): Row => film(sweep.id, sweep.values(x), [["h", "h low", "h high"]], sweep.settings)[0] as Row;
  let [low, high] = [from, to];
  let [below, above] = [at(low), at(high)];
  for (let i = 0; i < 40; i++) {
    const middle = (low + high) / 2;
    const there = at(middle);
    if (typeof there[0] !== "number") break;
    if (Math.abs((there[0] as number) - (below[0] as number)) > Math.abs((above[0] as number) - (there[0] as number))) {
      high = middle;
      above = there;
    } else {
      low = middle;
      below = there;
    }
  }
  return [below, above];
}

describe.each(sweeps.map((sweep, i) => [`${i + 1} ${sweep.id} Pr ${sweep.Pr} ${sweep.settings ?? ""}`, sweep] as const))(
  "%s",
  (_, sweep) => {
    const xs = Array.from({ length: steps + 1 }, (__, i) => sweep.from * (sweep.to / sweep.from) ** (i / steps));
    const rows = xs.map(
      (x) => film(sweep.id, sweep.values(x), [["h", "h low", "h high", "equation"]], sweep.settings)[0] as (number | string)[],
    );
    const good = rows.filter((row) => typeof row[0] === "number");

    test("gives a number over most of the sweep, always with bounds around it", () => {
      expect(good.length).toBeGreaterThan((sweep.exempt === undefined ? 0.7 : 0.3) * rows.length);
      for (const row of good) {
        expect(row[1]).toBeLessThanOrEqual(row[0] as number);
        expect(row[2]).toBeGreaterThanOrEqual(row[0] as number);
      }
    });

    test("has no jump that the bounds do not cover", () => {
      for (let i = 1; i < rows.length; i++) {
        const [a, b] = [rows[i - 1] as number[], rows[i] as number[]];
        if (typeof a[0] !== "number" || typeof b[0] !== "number" || Math.abs(b[0] / a[0] - 1) < 0.02) continue;
        const [below, above] = closingIn(sweep, xs[i - 1] as number, xs[i] as number);
        if (Math.abs((above[0] as number) / (below[0] as number) - 1) < 1e-3) continue;
        const covered = (above[0] as number) <= (below[2] as number) && (above[0] as number) >= (below[1] as number);
        expect(covered, `${xs[i]}: ${below[0]} then ${above[0]}`).toBe(true);
      }
    });

    test("the flux rises with flow, length or difference as its equation implies", () => {
      // q grows with speed; for free convection from a larger body h·L grows. A fall of more than 2 % between neighbours is none.
      for (let i = 1; i < rows.length; i++) {
        const [a, b] = [rows[i - 1] as number[], rows[i] as number[]];
        if (typeof a[0] !== "number" || typeof b[0] !== "number") continue;
        if ((a as unknown as string[])[3] !== (b as unknown as string[])[3]) continue; // another equation took over: its bounds are judged above
        const size = sweep.id.startsWith("FREE") && typeof sweep.values(1)[1] === "number" ? (xs[i] as number) / (xs[i - 1] as number) : 1;
        expect(((b[0] as number) / (a[0] as number)) * size, `${xs[i]}`).toBeGreaterThan(0.98);
      }
    });
  },
);

describe("every equation is found by its own label", () => {
  const circumstances = (): readonly Circumstances[] => {
    const inputs = { numbers: {}, words: {}, fluid: { constantDensity: false } } as unknown as Inputs;
    return (["isothermal", "uniform flux"] as const).flatMap((wall) =>
      [true, false].flatMap((rising) =>
        [true, false].map((local): Circumstances => ({ inputs, Ts: 300, rising, wall, local, phase: "gas" })),
      ),
    );
  };
  test.each(allSurfaces.map((surface) => [surface.id, surface] as const))("%s", (id, surface) => {
    for (const at of circumstances()) {
      const labels = surface.candidates(at).map(labelOf);
      expect(new Set(labels).size, `${id} ${labels.join("; ")}`).toBe(labels.length);
    }
  });
});

describe("the same answer in mm, in and ft", () => {
  test.each([
    ["FREE.PLATE", ["air", 80, 20], 0.3],
    ["FREE.CYLINDER", ["air", 80, 20], 0.05],
    ["FORCED.CYLINDER", ["air", 80, 20, 5], 0.05],
    ["DUCT.TUBE", ["water", 40, 20, 1], 0.02],
  ] as const)("%s", (id, before, metres) => {
    const h = one(id, [...before, metres]) as number;
    // International yard and pound agreement 1959: 1 ft is 0.3048 m, 1 in is 25.4 mm.
    for (const text of [`${metres * 1000} mm`, `${metres / 0.0254} in`, `${metres / 0.3048} ft`]) {
      expect((one(id, [...before, text]) as number) / h).toBeCloseTo(1, 10);
    }
  });
});
