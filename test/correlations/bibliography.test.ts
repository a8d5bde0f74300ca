import { readdirSync, readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { bibliography } from "../../src/bibliography.js";

const folder = new URL("../../src/", import.meta.url);

/** Every source file but the bibliography itself. */
function sources(): string {
  const files = readdirSync(folder, { recursive: true, encoding: "utf8" }).filter(
    (name) => /\.(ts|tsx|json)$/.test(name) && name !== "bibliography.ts",
  );
  return files.map((name) => readFileSync(new URL(name, folder), "utf8")).join("\n");
}

test("every work in the bibliography is cited somewhere", () => {
  const text = sources();
  expect(Object.keys(bibliography).filter((key) => !text.includes(`"${key}"`))).toEqual([]);
});

test("keys stand in alphabetical order, and no work stands twice", () => {
  const keys = Object.keys(bibliography);
  expect(keys).toEqual([...keys].sort());
  const cites = Object.values(bibliography).map((work) => work.cite);
  expect(cites.filter((cite, i) => cites.indexOf(cite) < i)).toEqual([]);
});
