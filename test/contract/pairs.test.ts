// Formula and answer as data, run through the built bundle: the contract that workbooks hold us to. A pair that declares
// no verdict must be clean. Fails where a published value, a definition or a verdict no longer comes out.
import { expect, test } from "vitest";
import { loadBundle, PlatformError } from "./bundle.js";
import { argumentNamesOf, runFormula } from "./formula.js";
import pairs from "./pairs.json" with { type: "json" };

const { functions } = loadBundle();
const origins = ["published", "independent", "common practice", "from memory", "pinned"];

test("every pair says where its number comes from", () => {
  expect(pairs.length).toBeGreaterThanOrEqual(30);
  for (const pair of pairs) expect(origins).toContain(pair.origin);
  const called = new Set(pairs.map((pair) => /^=FILM\.([A-Z.]+)\(/.exec(pair.formula)?.[1]));
  expect([...called].sort()).toEqual(
    Object.keys(functions)
      .filter((id) => id !== "LIST")
      .sort(),
  );
});

test.each(pairs.map((pair) => [pair.formula, pair] as const))("%s", (formula, pair) => {
  const [[cell] = []] = runFormula(formula, (id, args) => functions[id]?.(...args) ?? []);
  expect(cell instanceof PlatformError ? cell.message : typeof cell).toBe("number");
  expect(Math.abs((cell as number) / pair.value - 1), `${cell} against ${pair.value} (${pair.source})`).toBeLessThanOrEqual(pair.within);
  const verdict = runFormula(formula, (id, args) => {
    const place = argumentNamesOf(id).indexOf("give");
    if (place < 0) return undefined;
    const asked = [...args];
    asked[place] = [["verdict"]];
    return functions[id]?.(...asked)[0]?.[0];
  });
  if (verdict !== undefined) expect(verdict).toBe((pair as { verdict?: string }).verdict ?? "in range");
});
