/** The continuous laws that surfaces prefer: no steps, right limits, and the values of the laws they join. */
import { describe, expect, test } from "vitest";
import { correlationById } from "../../src/correlations/index.js";
import { compiled, type Inputs } from "./evaluation.js";

const value = (id: string, inputs: Inputs): number => compiled(correlationById(id)).at(inputs);

describe.each(["tube-default-T-mean", "tube-default-T-local", "tube-default-H-mean", "tube-default-H-local"])("%s", (id) => {
  test("is continuous at 2300 and at 4000", () => {
    for (const Re of [2300, 4000]) {
      for (const D_L of [0, 0.001, 0.1]) {
        const [below, above] = [value(id, { Re: Re * (1 - 1e-9), Pr: 6, D_L }), value(id, { Re: Re * (1 + 1e-9), Pr: 6, D_L })];
        expect(Math.abs(above / below - 1)).toBeLessThan(1e-6);
      }
    }
  });

  test("without a length it is the developed value", () => {
    // Exact developed values 3.6568 and 48/11: Shah & London 1978; the composite prints 3.66 and 4.364
    const developed = id.includes("-T-") ? 3.656793 : 48 / 11;
    expect(Math.abs(value(id, { Re: 500, Pr: 6, D_L: 0 }) / developed - 1)).toBeLessThan(0.002);
  });

  test("turbulent, long tube: Gnielinski 1976, which has another friction law, within 3 %", () => {
    for (const Re of [1e4, 1e5, 1e6]) {
      const [ours, older] = [value(id, { Re, Pr: 0.7, D_L: 0 }), value("gnielinski-1976-tube", { Re, Pr: 0.7 })];
      expect(Math.abs(ours / older - 1)).toBeLessThan(0.03);
    }
  });
});

test("the mean of the turbulent law over the length is what its local form adds up to", () => {
  const count = 20000;
  const local = compiled(correlationById("tube-default-T-local"));
  const length = 30;
  let sum = 0;
  // Cubes of the variable crowd the points towards the inlet, where the local value is steep.
  for (let i = 0; i < count; i++) {
    const s = (i + 0.5) / count;
    const x = length * s ** 3;
    sum += (local.at({ Re: 5e4, Pr: 6, D_L: Math.min(1 / x, 1e9) }) * 3 * s ** 2) / count;
  }
  expect(Math.abs(sum / value("tube-default-T-mean", { Re: 5e4, Pr: 6, D_L: 1 / length }) - 1)).toBeLessThan(1e-3);
});

describe("tilted plate of Raithby & Hollands", () => {
  const inputs = { Ra: 1e8, Pr: 0.71 };
  test("upright it is the vertical plate", () => {
    for (const id of ["raithby-hollands-1998-tilted-up", "raithby-hollands-1998-tilted-down"]) {
      expect(value(id, { ...inputs, tilt: 0 })).toBeCloseTo(value("raithby-hollands-1998-plate", inputs), 9);
    }
  });
  test("level it is the horizontal face of a wide plate, whose A/P is half its length", () => {
    const level = { Ra: 1e8 / 8, Pr: 0.71 };
    expect(value("raithby-hollands-1998-tilted-up", { ...inputs, tilt: 90 })).toBeCloseTo(2 * value("raithby-hollands-1998-top", level), 6);
    expect(value("raithby-hollands-1998-tilted-down", { ...inputs, tilt: 90 })).toBeCloseTo(
      2 * value("raithby-hollands-1998-under", level),
      6,
    );
  });
  test("the sign of the tilt is the surface's business", () => {
    expect(value("raithby-hollands-1998-tilted-up", { ...inputs, tilt: -40 })).toBe(
      value("raithby-hollands-1998-tilted-up", { ...inputs, tilt: 40 }),
    );
  });
});

test("the flux blend meets the isothermal one at the same Ra where h no longer depends on the length", () => {
  // With Ra = RaStar/Nu both are CtV*Ra^(1/3) in the turbulent limit.
  const RaStar = 1e16;
  const Nu = value("raithby-hollands-1998-plate-flux", { RaStar, Pr: 0.71 });
  const isothermal = value("raithby-hollands-1998-plate", { Ra: RaStar / Nu, Pr: 0.71 });
  expect(Math.abs(Nu / isothermal - 1)).toBeLessThan(0.01);
});

test("laws on another length give what the same law on the diameter gives", () => {
  // 0.60*(pi/2)^0.5 = 0.752: Churchill & Chu's cylinder and the handbook's form on pi*D/2 are one law.
  for (const Ra of [1e3, 1e6, 1e9]) {
    expect(
      Math.abs(value("hedh-1983-cylinder", { Ra, Pr: 0.71 }) / value("churchill-chu-1975-cylinder-all", { Ra, Pr: 0.71 }) - 1),
    ).toBeLessThan(1e-3);
  }
  // McAdams on the side of a square, four times its A/P: h by hand
  const [side, Ra] = [1, 1e5];
  const h = (0.54 * (Ra * 4 ** 3) ** 0.25) / side;
  expect(value("mcadams-1954-top", { RaM: Ra * 4 ** 3, M_L: 4 }) / (side / 4)).toBeCloseTo(h, 9);
});
