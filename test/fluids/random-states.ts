/** Random states of every pure fluid of the shelf, to see whether the density search ever fails; also run a million strong by the benchmark. */
import { isProblem } from "../../src/quantities/problems.js";
import { meltingPressure } from "../../src/fluids/melting-line.js";
import { pureFluid } from "../../src/fluids/pure-fluid.js";
import { type PureModel, pureModel } from "../../src/fluids/pure-model.js";
import type { PureRecord } from "../../src/fluids/pure-record.js";
import { pureRecord, pureRecords } from "../../src/fluids/records/pure/index.js";

export interface RandomStates {
  /** States that were asked for inside the published range. */
  readonly asked: number;
  /** Of these, refused as two-phase, solid or critical. */
  readonly refused: number;
  /** Of these, within 1e-4 of the critical temperature, where the side of the line is the short equation's word. */
  readonly critical: number;
  /** One line for every state with a wrong or missing answer. */
  readonly failures: readonly string[];
}

/** A small linear congruential generator, so that a failure can be met again. */
function generator(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 4294967296;
  };
}

/** Five kinds in turn: anywhere; below the critical temperature; close to the saturation line; close to the critical point; dense and above it. */
function randomState(record: PureRecord, model: PureModel, kind: number, random: () => number): readonly [T: number, p: number] {
  const [coldest, hottest] = record.T;
  const { T: Tc, p: pc } = record.critical;
  const anyPressure = (): number => Math.exp(random() * Math.log(record.pMax));
  switch (kind % 5) {
    case 0:
      return [coldest + random() * (hottest - coldest), anyPressure()];
    case 1:
      return [coldest + random() * (Tc - coldest), anyPressure()];
    case 2: {
      const T = coldest + random() * (model.phases.domeTop - coldest);
      return [T, model.phases.roughPressure(T) * Math.exp((random() - 0.5) * 0.2 * random())];
    }
    case 3:
      return [Tc * (1 + (random() - 0.5) * 0.1 * random() ** 4), pc * Math.exp((random() - 0.5) * random() ** 2)];
    default:
      return [Tc * (1 + random() * 0.3), pc * Math.exp(random() * 3)];
  }
}

export function randomStates(perFluid: number, seed = 1): RandomStates {
  const random = generator(seed);
  let asked = 0;
  let refused = 0;
  let critical = 0;
  const failures: string[] = [];
  for (const record of pureRecords()) {
    const fluid = pureFluid(record, pureRecord);
    const model = pureModel(record, pureRecord);
    for (let i = 0; i < perFluid; i++) {
      const [T, p] = randomState(record, model, i, random);
      if (T < record.T[0] || T > record.T[1] || p < fluid.range.p[0] || p > record.pMax) continue;
      asked++;
      const found = fluid.state(T, p);
      if (isProblem(found)) {
        refused++;
        const why = unfounded(record, model, T, p, found.sentence);
        if (why) failures.push(`${record.name} ${T} K ${p} Pa: ${why}: ${found.sentence}`);
        continue;
      }
      if (Math.abs(T / record.critical.T - 1) < 4e-4) critical++;
      const why = wrong(model, T, p, found.density / record.molarMass, [found.cp, found.speedOfSound as number, found.density]);
      if (why) failures.push(`${record.name} ${T} K ${p} Pa: ${why}`);
    }
  }
  return { asked, refused, critical, failures };
}

/** Why a refusal has no ground, or undefined. */
function unfounded(record: PureRecord, model: PureModel, T: number, p: number, sentence: string): string | undefined {
  if (sentence.includes("critical point")) {
    const close = Math.abs(T / record.critical.T - 1) < 2e-3 && Math.abs(p / record.critical.p - 1) < 2e-2;
    return close ? undefined : "not close to the critical point";
  }
  if (sentence.includes("is solid")) {
    const melts = record.melting && meltingPressure(record.melting, T);
    return melts !== undefined && p > melts ? undefined : "below its melting pressure";
  }
  const pair = model.phases.saturation(T);
  if (!pair) return "no saturation state";
  const inside = p > pair.dewPressure * (1 - 2e-7) && p < pair.pressure * (1 + 2e-7);
  return inside ? undefined : "not two phases";
}

function wrong(model: PureModel, T: number, p: number, rho: number, values: readonly number[]): string | undefined {
  if (!values.every((value) => Number.isFinite(value) && value > 0)) return `values ${values.join(", ")}`;
  // A liquid's pressure is a small difference of large terms: the density is right if a part in 1e11 of it makes up the rest.
  const slope = (model.pressure(T, rho * (1 + 1e-6)) - model.pressure(T, rho * (1 - 1e-6))) / (2e-6 * rho);
  if (!(slope > 0)) return `pressure falls with density at ${rho} mol/m³`;
  const miss = Math.abs(model.pressure(T, rho) - p) / slope;
  if (!(miss < 1e-9 * rho)) return `the pressure at ${rho} mol/m³ is ${model.pressure(T, rho)} Pa`;
  const pair = T < model.phases.domeTop ? model.phases.saturation(T) : undefined;
  if (!pair) return undefined;
  if (p >= pair.pressure && rho < pair.liquid * (1 - 1e-7)) return `lighter than saturated liquid, ${pair.liquid} mol/m³`;
  if (p <= pair.dewPressure && rho > pair.vapour * (1 + 1e-7)) return `heavier than saturated vapour, ${pair.vapour} mol/m³`;
  return undefined;
}
