import { describe, expect, test } from "vitest";
import { bibliography } from "../../src/bibliography.js";
import { findFluid, keyOf, shelf } from "../../src/fluids/shelf.js";
import { isProblem } from "../../src/quantities/problems.js";

function sentence(name: string): string {
  const found = findFluid(name);
  return isProblem(found) ? found.sentence : `found ${found.name}`;
}

describe("names", () => {
  // Common practice: usual synonyms and formulas.
  test.each([
    ["water", "water"],
    ["WATER", "water"],
    ["h2o", "water"],
    ["H₂O", "water"],
    [" Steam ", "water"],
  ])("%s is %s", (given, name) => {
    const found = findFluid(given);
    expect(isProblem(found) ? found.sentence : found.name).toBe(name);
  });

  test("the same fluid is built once", () => {
    expect(findFluid("water")).toBe(findFluid("steam"));
  });

  test.each([
    ["", /needed/],
    ["watr", /Did you mean "water"/],
    ["zzzzqqq", /No fluid is called "zzzzqqq"\. =FILM/],
    ["water 40 %", /takes no number/],
  ])("%s is refused with a sentence", (given, wanted) => {
    expect(sentence(given)).toMatch(wanted);
  });

  test("no two entries share a name", () => {
    const names = shelf().flatMap((entry) => [...new Set([entry.name, ...entry.synonyms].map(keyOf))]);
    const doubles = names.filter((name, k) => names.indexOf(name) !== k);
    expect(doubles).toEqual([]);
  });

  test("every source stands in the bibliography", () => {
    for (const entry of shelf()) {
      expect(entry.sources.length, entry.name).toBeGreaterThan(0);
      for (const key of entry.sources) expect(Object.keys(bibliography), entry.name).toContain(key);
    }
  });
});
