// README and the guide say what the project is: fails when the table of functions is stale, a link leads nowhere,
// a command is missing, or a formula of the first five minutes no longer gives what is printed beside it.
import { existsSync, readFileSync } from "node:fs";
import { join, resolve } from "node:path";
import { expect, test } from "vitest";
import { functionTable, renewed } from "../../src/hosts/build/readme-table.js";
import { version } from "../../src/version.js";
import { formulasIn, runFormula } from "../contract/formula.js";
import { CellError } from "../../src/cells/cell.js";
import { answer } from "../../src/cells/answer.js";
import { argumentNamesOf } from "../contract/formula.js";

const root = resolve(import.meta.dirname, "../..");
const read = (name: string): string => readFileSync(join(root, name), "utf8");
const readme = read("README.md");

test("the table of functions is the one that npm run docs writes", async () => {
  expect(renewed(readme, await functionTable())).toBe(readme);
});

test("the job stands in one paragraph at the top", () => {
  const [title, job, next] = readme.split(/\n{2,}/);
  expect(title).toBe("# Filmbook");
  expect((job as string).length).toBeGreaterThan(200);
  expect(job).not.toContain("\n");
  expect(next).toMatch(/^## /);
});

test("two commands do the set-up, and continuous integration calls the second", () => {
  expect(readme).toContain("npm ci && npm start");
  expect(readme).toContain("npm ci && npm test");
  expect(read(".ci/run")).toContain("npm ci && npm test");
});

test("links lead somewhere", () => {
  for (const file of ["README.md", "DEVELOPERS.md"]) {
    for (const [, target] of read(file).matchAll(/\]\(([^)#]+)\)/g))
      expect(existsSync(join(root, target as string)), `${file}: ${target}`).toBe(true);
  }
});

test("every version says the same", () => {
  expect(JSON.parse(read("package.json")).version).toBe(version);
  expect(read("manifest.xml")).toContain(`<Version>${version}.0</Version>`);
  expect(read("DEVELOPERS.md")).toContain(`### ${version}`);
});

test("the formulas of the first five minutes run, and 60 m is refused", () => {
  const minutes = readme.slice(readme.indexOf("## Your first five minutes"), readme.indexOf("## The functions"));
  const formulas = formulasIn(minutes);
  expect(formulas.length).toBeGreaterThan(6);
  for (const formula of formulas) {
    const cells = runFormula(formula, (id, args) => callByName(id, args));
    const refused = cells[0]?.[0] instanceof CellError;
    expect(refused, formula).toBe(formula.includes(",20,60)"));
  }
  const [[h] = []] = runFormula('=FILM.FREE.PLATE("air",80,20,0.3)', callByName);
  expect((h as number).toFixed(2)).toBe("5.00");
  expect(minutes).toContain("h = 5.00 W/(m²·K)");
});

function callByName(id: string, blocks: readonly (unknown[][] | null)[]): readonly (readonly unknown[])[] {
  const names = argumentNamesOf(id);
  const args = Object.fromEntries(names.map((name, i) => [name, blocks[i] ?? null]));
  return answer(id, args, args.give, args.settings);
}
