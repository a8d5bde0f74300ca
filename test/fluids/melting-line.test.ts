import { describe, expect, test } from "vitest";
import { meltingPressure, meltingTemperature } from "../../src/fluids/melting-line.js";
import { pureRecords } from "../../src/fluids/records/pure/index.js";

const lines = pureRecords().flatMap((record) => (record.melting ? [[record.name, record, record.melting] as const] : []));

describe("melting lines", () => {
  test.each(lines)("%s rises from the triple point, a few megapascals a kelvin, without a gap", (_, record, line) => {
    const coldest = record.T[0];
    const hottest = Math.min(coldest + 30, line.at(-1)?.T[1] ?? 0);
    let last = -1;
    for (let k = 1; k <= 60; k++) {
      const T = coldest + ((hottest - coldest) * k) / 60;
      const p = meltingPressure(line, T);
      expect(p).toBeGreaterThan(last);
      last = p as number;
    }
    // Clapeyron with the heats and volumes of melting of simple substances: 1 to 13 MPa/K (common practice).
    const slope = ((meltingPressure(line, coldest + 2) as number) - (meltingPressure(line, coldest + 1) as number)) / 1e6;
    expect(slope).toBeGreaterThan(1);
    expect(slope).toBeLessThan(13);
  });

  test.each(lines)("%s: temperature from pressure is the way back", (_, record, line) => {
    const T = record.T[0] + 3;
    expect(meltingTemperature(line, meltingPressure(line, T) as number)).toBeCloseTo(T, 6);
  });

  test("beyond the line there is no answer", () => {
    const [, , line] = lines.find(([name]) => name === "fluorine") ?? [];
    if (!line) throw new Error("fluorine has a line");
    expect(meltingPressure(line, 60)).toBeUndefined();
    expect(meltingTemperature(line, 1e9)).toBeUndefined();
  });

  // The printed joint of the two stretches of ethylene's line: 110.369 K, 46.8 MPa (Smukala, Span & Wagner 2000; published).
  test("ethylene's two stretches meet", () => {
    const line = lines.find(([name]) => name === "ethylene")?.[2] ?? [];
    expect((meltingPressure(line, 110.36899) as number) / 46.8e6).toBeCloseTo(1, 3);
    expect((meltingPressure(line, 110.3691) as number) / 46.8e6).toBeCloseTo(1, 3);
  });
});
