// Plain ratios of one run. Absolute times are this machine's and noisy; the ratios are what counts.
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { gzipSync } from "node:zlib";
import { answer } from "../../src/cells/answer.js";
import type { Fluid } from "../../src/fluids/fluid.js";
import { findFluid } from "../../src/fluids/shelf.js";
import { stateCosts } from "../fluids/state-cost.js";
import { ductTubeByHand, freePlateBoundedByHand, freePlateByHand } from "./by-hand.js";
import { firstValue } from "./page.js";

const root = process.argv[2] as string;
const collect = (globalThis as { gc?: () => void }).gc ?? ((): void => {});
const now = (): number => performance.now();
const air = findFluid("air") as Fluid;
const water = findFluid("water") as Fluid;

function surfaces(rows: number): number[][] {
  return Array.from({ length: rows }, (_, i) => [30 + (60 * i) / rows]);
}

/** Median of several pairs taken in turn, so that a machine that slows down slows both. */
function pairs(ours: () => void, byHand: () => void, runs = 7): { ours: number; byHand: number; ratio: number } {
  ours();
  byHand();
  const taken = Array.from({ length: runs }, () => {
    const start = now();
    ours();
    const middle = now();
    byHand();
    return [middle - start, now() - middle] as const;
  });
  const median = (values: number[]): number => values.sort((a, b) => a - b)[Math.floor(values.length / 2)] as number;
  return {
    ours: median(taken.map(([a]) => a)),
    byHand: median(taken.map(([, b]) => b)),
    ratio: median(taken.map(([a, b]) => a / b)),
  };
}

let sink = 0;
const head = [["h", "h low", "h high", "verdict"]];
const cases = (rows: number) => {
  const column = surfaces(rows);
  const kelvins = column.map(([t]) => (t as number) + 273.15);
  return {
    "FREE.PLATE in air, h": [
      () => void (sink += answer("FREE.PLATE", { fluid: [["air"]], surface: column, bulk: [[20]], height: [[0.3]] }).length),
      () => {
        for (const T of kelvins) sink += freePlateByHand(air, T, 293.15, 0.3);
      },
    ],
    "FREE.PLATE in air, h with bounds and verdict": [
      () => void (sink += answer("FREE.PLATE", { fluid: [["air"]], surface: column, bulk: [[20]], height: [[0.3]] }, head).length),
      () => {
        for (const T of kelvins) sink += freePlateBoundedByHand(air, T, 293.15, 0.3).h;
      },
    ],
    "DUCT.TUBE in water, h": [
      () => void (sink += answer("DUCT.TUBE", { fluid: [["water"]], wall: column, bulk: [[20]], flow: [[1]], diameter: [[0.02]] }).length),
      () => {
        for (const T of kelvins) sink += ductTubeByHand(water, T, 293.15, 1, 0.02);
      },
    ],
  } as const;
};

console.log("Against the same calculation by hand (median of pairs taken in turn)");
console.log("rows        case                                             µs a row   by hand    ratio");
const perRow: Record<string, number[]> = {};
for (const rows of [1, 100, 1000, 10_000, 100_000]) {
  for (const [name, [ours, byHand]] of Object.entries(cases(rows))) {
    const repeat = Math.max(1, Math.floor(2000 / rows));
    const again = (run: () => void) => () => {
      for (let i = 0; i < repeat; i++) run();
    };
    const found = pairs(again(ours), again(byHand), rows >= 100_000 ? 3 : 7);
    const scale = 1000 / (rows * repeat);
    (perRow[name] ??= []).push(found.ours * scale);
    console.log(
      `${String(rows).padEnd(11)} ${name.padEnd(48)} ${(found.ours * scale).toFixed(2).padStart(8)} ${(found.byHand * scale).toFixed(2).padStart(9)} ${found.ratio.toFixed(2).padStart(8)}`,
    );
  }
}

console.log("\nGrowth: time a row at 100 000 rows over time a row at 1000 rows (1 is linear)");
for (const [name, times] of Object.entries(perRow)) console.log(`  ${name}: ${((times[4] as number) / (times[2] as number)).toFixed(2)}`);

collect();
const before = process.memoryUsage();
const million = surfaces(1_000_000);
const start = now();
const cells = answer("FREE.PLATE", { fluid: [["air"]], surface: million, bulk: [[20]], height: [[0.3]] });
const took = now() - start;
const after = process.memoryUsage();
console.log(
  `\nA million rows of FREE.PLATE: ${(took / 1000).toFixed(1)} s, ${cells.length} answers, ${Math.round((after.heapUsed - before.heapUsed) / 1e6)} MB of heap more with input and output`,
);

console.log("\nFull state of each fluid against water's in this run (worst ten)");
const costs = [...stateCosts(now)].sort((a, b) => b.timesWater - a.timesWater);
for (const { name, time, timesWater } of costs.slice(0, 10))
  console.log(`  ${name}: ${timesWater.toFixed(1)} times water's, ${time.toFixed(1)} µs`);

const size = gzipSync(readFileSync(join(root, "dist/functions.js")), { level: 9 }).length;
console.log(`\nfunctions.js: ${Math.round(size / 1000)} kB gzipped`);

firstValue(root)
  .then((text) => console.log(text))
  .finally(() => process.exit(sink === -1 ? 1 : 0)); // the sum is looked at, so that no calculation is left out as unused
