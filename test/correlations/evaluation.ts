/** Records evaluated and sampled for the tests of this folder. */
import { readFileSync } from "node:fs";
import type { Correlation } from "../../src/correlations/correlation.js";
import { linesOf } from "../../src/correlations/expand.js";
import { compileProgram, type Program } from "../../src/equations/program.js";
import { textCode } from "../../src/equations/text-code.js";

export type Inputs = Readonly<Record<string, number | string>>;

export interface Compiled {
  readonly record: Correlation;
  readonly program: Program;
  readonly last: string;
  /** The value of the last line, or of another one. */
  at(inputs: Inputs, of?: string): number;
}

/** Lines named in `given` become inputs, such as a friction factor that a source states. */
export function compiled(record: Correlation, given: readonly string[] = []): Compiled {
  const lines = linesOf(record).filter((line) => !given.includes(line.name));
  const program = compileProgram(lines);
  const values = new Float64Array(program.size);
  const last = lines[lines.length - 1]?.name ?? "";
  return {
    record,
    program,
    last,
    at(inputs, of = last) {
      for (const symbol of program.inputs) {
        const value = inputs[symbol];
        if (value === undefined) throw new Error(`${record.id} needs ${symbol}.`);
        values[program.slot(symbol)] = typeof value === "string" ? textCode(value) : value;
      }
      program.run(values);
      return values[program.slot(of)] as number;
    },
  };
}

export function readData<T>(name: string): T {
  return JSON.parse(readFileSync(new URL(`../data/${name}`, import.meta.url), "utf8")) as T;
}

/** Numbers that look random and are the same in every run. */
export function randomNumbers(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 1664525 + 1013904223) % 4294967296;
    return state / 4294967296;
  };
}

/** Draws for inputs that the record itself does not bound. */
const usual: Readonly<Record<string, readonly [number, number]>> = {
  Pr: [0.7, 7],
  Re: [1e4, 1e5],
  mub_muw: [0.5, 2],
  Pr_Prw: [0.5, 2],
  D_L: [0.001, 0.1],
  heated: [0, 1],
  ratio: [0.2, 1],
  S_L: [2, 4],
  slender: [0.2, 20],
  Rel: [100, 1e4],
};

const samples = readData<Readonly<Record<string, Readonly<Record<string, readonly [number, number]>>>>>("correlation-samples.json");

/** Where an input may lie: the published range, or a draw of the tests' own. Undefined for words. */
export function boxOf(one: Compiled): ReadonlyMap<string, readonly [number, number]> {
  const { record, program } = one;
  const own = samples[record.id] ?? {};
  const box = new Map<string, readonly [number, number]>();
  for (const symbol of program.inputs) {
    const range = own[symbol] ?? record.ranges[symbol] ?? usual[symbol];
    if (range !== undefined) box.set(symbol, range);
    else if (wordsOf(one, symbol).length === 0) throw new Error(`${record.id}: where does ${symbol} lie?`);
  }
  return box;
}

/** The words that a symbol's key tables know. */
export function wordsOf(one: Compiled, symbol: string): readonly string[] {
  const table = Object.values(one.record.tables ?? {}).find((candidate) => candidate.how === "key" && candidate.of === symbol);
  return table?.how === "key" ? table.rows.map(([word]) => word) : [];
}

/** Whether every range of the record holds, those on its own lines too. */
export function inRange(one: Compiled, inputs: Inputs): boolean {
  return Object.entries(one.record.ranges).every(([symbol, [low, high]]) => {
    const value = symbol in inputs ? inputs[symbol] : one.program.names.includes(symbol) ? one.at(inputs, symbol) : low;
    return typeof value !== "number" || (value >= low && value <= high);
  });
}

export function draw([low, high]: readonly [number, number], random: () => number): number {
  return low > 0 && high / low > 20 ? low * (high / low) ** random() : low + (high - low) * random();
}

/** Up to `count` points inside all ranges. */
export function pointsOf(one: Compiled, count: number, seed = 20240): readonly Inputs[] {
  const random = randomNumbers(seed);
  const box = boxOf(one);
  const points: Inputs[] = [];
  for (let tries = 0; tries < 40 * count && points.length < count; tries++) {
    const point: Record<string, number | string> = {};
    for (const symbol of one.program.inputs) {
      const words = wordsOf(one, symbol);
      const range = box.get(symbol);
      point[symbol] = range === undefined ? (words[Math.floor(random() * words.length)] as string) : draw(range, random);
    }
    if ("heated" in point) point["heated"] = Math.round(point["heated"] as number);
    if (inRange(one, point)) points.push(point);
  }
  return points;
}
