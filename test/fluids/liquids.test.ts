import { describe, expect, test } from "vitest";
import { findFluid } from "../../src/fluids/shelf.js";
import { isProblem } from "../../src/quantities/problems.js";
import { numberIn, readCsv } from "../data/read-csv.js";

describe("rows of the published fits", () => {
  test.each(readCsv("liquid-states.csv").map((row) => [row["fluid"] as string, row["t_C"] as string, row["p_Pa"] as string, row] as const))("%s at %s °C, %s Pa", (name, _t, _p, row) => {
    const fluid = findFluid(name);
    if (isProblem(fluid)) throw new Error(fluid.sentence);
    const state = fluid.state((numberIn(row, "t_C") as number) + 273.15, numberIn(row, "p_Pa") as number);
    if (isProblem(state)) throw new Error(state.sentence);
    const off: string[] = [];
    for (const q of ["density","cp","viscosity","conductivity","expansivity"] as const) {
      const e = numberIn(row, q);
      if (e === undefined) continue;
      const d = (state[q] as number)/e-1;
      if (!(Math.abs(d) < 2e-6)) off.push(`${q} ${d.toExponential(2)}`);
    }
    expect(off.join()).toBe("");
  });
});
