/** Cost of a full state of every pure fluid beside water's in the same run, for the benchmark. */
import type { Fluid } from "../../src/fluids/fluid.js";
import { pureFluid } from "../../src/fluids/pure-fluid.js";
import type { PureRecord } from "../../src/fluids/pure-record.js";
import { pureRecord, pureRecords } from "../../src/fluids/records/pure/index.js";
import { water } from "../../src/fluids/water.js";
import { isProblem } from "../../src/quantities/problems.js";

export interface StateCost {
  readonly name: string;
  /** Microseconds a state, the best of some sweeps. */
  readonly time: number;
  /** Times water's in the same sweep, the best of some. */
  readonly timesWater: number;
}

/** `now` in milliseconds; `states` a sweep, half of them thin gas, half dense. */
export function stateCosts(now: () => number, states = 1500, sweeps = 7): readonly StateCost[] {
  const waterSweep = (): number => sweep(water, [280, 700], [101325, 3e7], states, now);
  for (let k = 0; k < 20; k++) waterSweep();
  return pureRecords().map((record) => {
    const run = sweepOf(record, states, now);
    run();
    run();
    let time = Number.POSITIVE_INFINITY;
    let timesWater = Number.POSITIVE_INFINITY;
    for (let k = 0; k < sweeps; k++) {
      const of = waterSweep();
      const own = run();
      time = Math.min(time, own);
      timesWater = Math.min(timesWater, own / of);
    }
    return { name: record.name, time, timesWater };
  });
}

function sweepOf(record: PureRecord, states: number, now: () => number): () => number {
  const fluid = pureFluid(record, pureRecord);
  const { T: Tc, p: pc } = record.critical;
  const temperatures = [Math.max(record.T[0], 0.55 * Tc), Math.min(record.T[1], 2 * Tc)] as const;
  return () => sweep(fluid, temperatures, [Math.min(3e5, 0.1 * pc), 1.5 * pc], states, now);
}

function sweep(
  fluid: Fluid,
  [low, high]: readonly [number, number],
  pressures: readonly [number, number],
  states: number,
  now: () => number,
): number {
  let sum = 0;
  const begun = now();
  for (let i = 0; i < states; i++) {
    const found = fluid.state(low + (high - low) * ((i * 0.618034) % 1), pressures[i % 2] as number);
    if (!isProblem(found)) sum += found.density;
  }
  const time = (1000 * (now() - begun)) / states;
  if (!(sum > 0)) throw new Error(`${fluid.name} gave no density`);
  return time;
}
