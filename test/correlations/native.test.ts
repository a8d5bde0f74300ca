import { beforeAll, describe, expect, test } from "vitest";
import { linesOf } from "../../src/correlations/expand.js";
import { allCorrelations } from "../../src/correlations/index.js";
import { toNative } from "../../src/equations/native.js";
import { canRecalculate, recalculate, type SheetCell } from "../equations/recalculation.js";
import { compiled, type Inputs, pointsOf } from "./evaluation.js";

/** One record at one point as a column of cells below each other: inputs first, then a formula for each line. */
function cellsOf(record: (typeof allCorrelations)[number], point: Inputs, from: number): readonly SheetCell[][] {
  const one = compiled(record);
  const names = [...one.program.inputs, ...one.program.names];
  const place = (symbol: string): string => `$B$${from + names.indexOf(symbol) + 1}`;
  return [
    ...one.program.inputs.map((symbol) => [symbol, point[symbol] as SheetCell]),
    ...linesOf(record).map((line) => [line.name, `=${toNative(line.node, place)}`]),
  ];
}

describe.runIf(canRecalculate())("LibreOffice Calc recalculates every line of every record to the compiled number", () => {
  const cases = allCorrelations.flatMap((record) => pointsOf(compiled(record), 4, 7).map((point) => ({ record, point })));
  const rows: SheetCell[][] = [];
  const starts: number[] = [];
  for (const { record, point } of cases) {
    starts.push(rows.length);
    rows.push(...cellsOf(record, point, rows.length));
  }
  let answers: ReturnType<typeof recalculate> = [];
  beforeAll(() => {
    answers = recalculate(rows);
  }, 300_000);

  test.each(allCorrelations.map((record) => [record.id, record] as const))("%s", (_, record) => {
    const one = compiled(record);
    const mine = cases.map((one, i) => [one, starts[i] as number] as const).filter(([one]) => one.record === record);
    expect(mine.length).toBeGreaterThan(0);
    for (const [{ point }, start] of mine) {
      one.program.names.forEach((name, i) => {
        const ours = one.at(point, name);
        const cell = answers[start + one.program.inputs.length + i]?.[1] ?? "";
        expect(cell, `${name} at ${JSON.stringify(point)}`).not.toBe("");
        expect(Math.abs(Number(cell) - ours), `${name}: ${cell} against ${ours} at ${JSON.stringify(point)}`).toBeLessThanOrEqual(
          1e-11 * Math.abs(ours) + 1e-20,
        ); // the judge prints twenty decimals
      });
    }
  });
});
