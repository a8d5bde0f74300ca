/** Laws that every record of the registry must keep. Exceptions stand in the lists below, each with its reason. */
import { describe, expect, test } from "vitest";
import { bibliography } from "../../src/bibliography.js";
import type { Correlation } from "../../src/correlations/correlation.js";
import { linesOf } from "../../src/correlations/expand.js";
import { allCorrelations } from "../../src/correlations/index.js";
import { meaningOf, symbolMath } from "../../src/correlations/symbols.js";
import { parseLine } from "../../src/equations/line.js";
import { toMathML } from "../../src/equations/mathml.js";
import { fitsOneCell, toNative } from "../../src/equations/native.js";
import { type Compiled, compiled, type Inputs, inRange, pointsOf } from "./evaluation.js";

/** Groups and closing lines that surfaces write around a record: a record's line of that name must say the same. */
const shared: Readonly<Record<string, string>> = { Pe: "Re*Pr", Ri: "Gr/Re^2" };
const reserved = new Set([
  "h",
  "q",
  "k",
  "L",
  "u",
  "nu",
  "mu",
  "rho",
  "cp",
  "alpha",
  "beta",
  "Re",
  "Pr",
  "Gr",
  "Ra",
  "RaStar",
  "Ts",
  "Tb",
  "Tf",
  "Tref",
  "dT",
  "gravity",
  "flow",
  "buoyancy",
]);

/** Steps of more than about 1 % that stand in the source, or come with the table: symbol, where, and why nobody smoothed them. */
const steps: Readonly<Record<string, string>> = {
  "bayley-1955-plate-turbulent": "two power laws meet at Ra 1e12",
  "fujii-imura-1972-top": "23 % at RaS 2e8 in the source",
  "goldstein-1973-top-low-ra": "two power laws meet at Ra 200",
  "mcadams-1954-top": "two power laws meet at RaM 2e7",
  "hedh-1983-top": "two power laws meet at Ra*f2 7e4",
  "al-arabi-khamis-1982-post": "laminar and turbulent law meet at Ra 2.6e9",
  "mcadams-1954-cylinder": "38 % at Ra 1e9 in the source",
  "hilpert-1933-air": "table of power laws",
  "hilpert-1933-revised": "table of power laws",
  "zukauskas-1972-cylinder": "table of power laws; exponent of Pr changes at 10",
  "morgan-1975-forced-cylinder": "table of power laws",
  "eckert-drake-cylinder": "two laws meet at Re 1000",
  "zukauskas-1972-bank-aligned": "table of power laws",
  "zukauskas-1972-bank-staggered": "table of power laws",
  "zukauskas-1987-bank-aligned": "table of power laws",
  "zukauskas-1987-bank-staggered": "table of power laws",
  "becker-kaye-1962-gap": "2 % at the onset of vortices",
};

/** Records whose result falls as a driving group rises, by nature. */
const falling: Readonly<Record<string, string>> = {
  "lienhard-2020-plate-local": "Rel: a later transition lowers h",
  "gnielinski-2013-transition-T": "a very short tube has more in laminar flow at 2300 than in turbulent flow at 4000",
  "gnielinski-2013-transition-H": "a very short tube has more in laminar flow at 2300 than in turbulent flow at 4000",
  "nakai-okazaki-type-cylinder-assisting": "at a fixed Gr a faster stream takes away from free convection before it adds its own",
};

/** Groups in which a Nusselt number rises. */
const driving = ["Ra", "RaS", "RaM", "RaStar", "Gr", "Re", "Rel", "Ref", "Rew", "Ta"];

const every = allCorrelations.map((record) => [record.id, record] as const);

describe.each(every)("%s", (_, record) => {
  const one = compiled(record);
  const points = pointsOf(one, 60);

  test("is finite and positive over its range", () => {
    expect(points.length).toBeGreaterThan(20);
    for (const point of points) {
      const value = one.at(point);
      expect(Number.isFinite(value) && value > 0, `${value} at ${JSON.stringify(point)}`).toBe(true);
    }
  });

  test("keeps the rules of a record", () => rulesOf(record, one));

  const symbols = record.result === "Nu" ? driving.filter((symbol) => one.program.inputs.includes(symbol)) : [];
  if (symbols.length > 0) {
    test("rises with what drives it, without steps", () => {
      for (const symbol of symbols) for (const point of points.slice(0, 12)) walk(one, point, symbol);
    });
  }
});

function rulesOf(record: Correlation, one: Compiled): void {
  for (const text of Object.values(record.lines)) expect(() => parseLine(text, { strict: true })).not.toThrow();
  const lines = linesOf(record);
  for (const line of lines) {
    const native = toNative(line.node, (symbol) => `$AB$${1000 + symbol.length}`);
    expect(fitsOneCell(native, line.node), `${line.name} fits a cell`).toBe(true);
    expect(toMathML(line.name, line.node, symbolMath)).not.toMatch(/undefined|NaN/);
    const closing = record.result === "h" || record.result === "q" ? record.result : "";
    if (line.name !== closing && reserved.has(line.name))
      throw new Error(`${record.id} writes the line ${line.name}, a name of the surfaces.`);
    const own = record.lines[line.name];
    if (shared[line.name] !== undefined && own !== undefined) expect(own).toBe(shared[line.name]);
  }
  const last = lines[lines.length - 1]?.name;
  if (record.result === "Nu" || record.result === "h" || record.result === "q") expect(last).toBe(record.result);
  for (const symbol of one.program.inputs) expect(meaningOf(symbol, record), `meaning of ${symbol}`).not.toBe("");
  for (const symbol of Object.keys(record.symbols ?? {})) expect([...one.program.inputs, ...one.program.names]).toContain(symbol);
  for (const [low, high] of Object.values(record.ranges)) expect(low).toBeLessThan(high);
  if (record.confidence === "M") expect(record.note ?? "").toMatch(/memory/);
  if (record.propertiesAt === "other") expect(record.propertiesNote ?? "").not.toBe("");
  if (record.limit !== undefined) limitHolds(record, one);
}

/** The stated limit is what the lines come to far below the range; a limit of 0 is reached only with the logarithm, so there the fall is tested. */
function limitHolds(record: Correlation, one: Compiled): void {
  const { of, value } = record.limit ?? { of: "", value: Number.NaN };
  const driver = one.program.inputs.includes(of) ? of : "Ra";
  const point = pointsOf(one, 1)[0] as Inputs;
  const low = record.ranges[of]?.[0] ?? Number.NaN;
  if (value === 0) {
    const [at, below] = [one.at({ ...point, [driver]: low }), one.at({ ...point, [driver]: low / 100 })];
    expect(below).toBeLessThan(at);
    expect(below).toBeGreaterThan(0);
    return;
  }
  const got = one.at({ ...point, [driver]: 1e-30 });
  expect(Math.abs(got / value - 1), `${got} at ${of} near 0`).toBeLessThanOrEqual(0.02);
}

/** Walks one group through its range, the others held. */
function walk(one: Compiled, start: Inputs, symbol: string): void {
  const range = one.record.ranges[symbol];
  const at = start[symbol] as number;
  const [low, high] = range === undefined ? [at / 30, at * 30] : range;
  const from = Math.max(low, high * 1e-12, 1e-12);
  const count = 240;
  let before: readonly [x: number, y: number] | undefined;
  for (let i = 0; i <= count; i++) {
    const x = from * (high / from) ** (i / count);
    if (!inRange(one, { ...start, [symbol]: x })) {
      before = undefined;
      continue;
    }
    const y = one.at({ ...start, [symbol]: x });
    if (before !== undefined) judge(one, start, symbol, before, [x, y]);
    before = [x, y];
  }
}

function judge(one: Compiled, start: Inputs, symbol: string, a: readonly [number, number], b: readonly [number, number]): void {
  const step = stepBetween(one, start, symbol, a, b);
  const falls = b[1] < a[1] * (1 - 1e-12);
  if (step === 0 && !falls) return;
  const { id } = one.record;
  met.add(id);
  if (id in steps || (step === 0 && id in falling)) return;
  if (step !== 0) throw new Error(`${id} steps by ${(100 * step).toFixed(1)} % in ${symbol} near ${a[0]} at ${JSON.stringify(start)}`);
  throw new Error(`${id} falls in ${symbol} from ${a} to ${b} at ${JSON.stringify(start)}`);
}

/** Records in which a step or a fall was met: the lists of exceptions must need each of their entries. */
const met = new Set<string>();

/** Halves the interval until only a step is left; 0 where the difference shrinks away. */
function stepBetween(one: Compiled, start: Inputs, symbol: string, a: readonly [number, number], b: readonly [number, number]): number {
  let [low, high] = [a, b];
  for (let halvings = 0; halvings < 45 && Math.abs(high[1] / low[1] - 1) > smallestStep; halvings++) {
    const x = Math.sqrt(low[0] * high[0]);
    const middle = [x, one.at({ ...start, [symbol]: x })] as const;
    if (Math.abs(middle[1] / low[1] - 1) > Math.abs(high[1] / middle[1] - 1)) high = middle;
    else low = middle;
  }
  const left = high[1] / low[1] - 1;
  return Math.abs(left) > smallestStep ? left : 0;
}

const smallestStep = 0.005;

test("ids are unique", () => {
  const ids = allCorrelations.map((record) => record.id);
  expect(ids.filter((id, i) => ids.indexOf(id) < i)).toEqual([]);
});

test("every work that is cited stands in the bibliography", () => {
  expect(
    allCorrelations.filter((record) => !(record.source.work in bibliography)).map((record) => `${record.id}: ${record.source.work}`),
  ).toEqual([]);
});

test("the lists of exceptions hold no record that does not need it", () => {
  expect([...Object.keys(steps), ...Object.keys(falling)].filter((id) => !met.has(id))).toEqual([]);
});
