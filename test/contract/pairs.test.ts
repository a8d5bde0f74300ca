// Formula and answer as data, run through the built bundle: the contract that workbooks hold us to. A pair that declares
// no verdict must be clean. Fails where a published value, a definition, a unit or a verdict no longer comes out.
import { expect, test } from "vitest";
import { loadBundle, PlatformError } from "./bundle.js";
import { argumentNamesOf, runFormula } from "./formula.js";
import data from "./pairs.json" with { type: "json" };

interface Pair {
  readonly formula: string;
  readonly value: number | string;
  /** Relative; a text must be the same. */
  readonly within: number;
  /** Row and column of the answer in what spills, from 1; the first when absent. */
  readonly at?: readonly number[];
  /** Unit that the value stands in: the word asked for with it must give the same. */
  readonly unit?: string;
  readonly verdict?: string;
  readonly origin: string;
  readonly source: string;
}

type Blocks = readonly (unknown[][] | null)[];

const pairs: readonly Pair[] = data;
const { functions } = loadBundle();
const origins = ["published", "independent", "common practice", "from memory", "pinned"];
const call = (id: string, args: Blocks): unknown[][] => functions[id]?.(...args) ?? [];

/** The same call asked for another word; nothing where the function takes no words. */
function asked(formula: string, wordFor: (given: unknown) => string): unknown {
  return runFormula(formula, (id, args) => {
    const place = argumentNamesOf(id).indexOf("give");
    if (place < 0) return undefined;
    const changed = Array.from({ length: Math.max(args.length, place + 1) }, (_, i) => args[i] ?? null);
    changed[place] = [[wordFor(args[place]?.[0]?.[0])]];
    return call(id, changed)[0]?.[0];
  });
}

function expectAnswer(cell: unknown, { value, within, source }: Pair): void {
  expect(cell instanceof PlatformError ? cell.message : typeof cell).toBe(typeof value);
  if (typeof value === "string") expect(cell).toBe(value);
  else expect(Math.abs((cell as number) / value - 1), `${cell} against ${value} (${source})`).toBeLessThanOrEqual(within);
}

test("every pair says where its number comes from, and no function is without one that is not our own output", () => {
  expect(pairs.length).toBeGreaterThanOrEqual(30);
  for (const pair of pairs) {
    expect(origins).toContain(pair.origin);
    expect(pair.source.length).toBeGreaterThan(10);
  }
  expect(new Set(pairs.map((pair) => pair.formula)).size).toBe(pairs.length);
  const called = new Set(
    pairs.filter((pair) => pair.origin !== "pinned").map((pair) => /^=FILM\.([A-Z.]+)\(/.exec(pair.formula)?.[1] as string),
  );
  expect([...called].sort()).toEqual(Object.keys(functions).sort());
});

test.each(pairs.map((pair) => [pair.formula, pair] as const))("%s", (formula, pair) => {
  const [row, column] = pair.at ?? [1, 1];
  expectAnswer(runFormula(formula, call)[(row as number) - 1]?.[(column as number) - 1], pair);
  const verdict = asked(formula, () => "verdict");
  if (verdict !== undefined) expect(verdict).toBe(pair.verdict ?? "in range");
  else expect(pair.verdict).toBeUndefined();
  if (pair.unit !== undefined)
    expectAnswer(
      asked(formula, (given) => `${given ?? "h"} [${pair.unit}]`),
      pair,
    );
});

test("the reader of formulas reads what a sheet reads", () => {
  const read = (formula: string): Blocks => runFormula(formula, (_, args) => args);
  expect(read('=FILM.X(-1.5e-3,"a ""b"", {c};d",{1,2;-3,"x,y"},,TRUE)')).toEqual([
    [[-0.0015]],
    [['a "b", {c};d']],
    [
      [1, 2],
      [-3, "x,y"],
    ],
    null,
    [[true]],
  ]);
  expect(() => read("=FILM.X(A1)")).toThrow(/not a literal/);
  expect(() => read("=FILM.X(1)+1")).toThrow();
});
