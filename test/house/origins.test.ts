// Every expected number says where it comes from: fails on a data file that the count leaves out, and on a row without origin.
import { readdirSync } from "node:fs";
import { join, resolve } from "node:path";
import { expect, test } from "vitest";
import { origins, originsByFile, originsOfTable, summary, withoutNumbers } from "../origins.js";

const counted = originsByFile() as Readonly<Record<string, readonly (string | undefined)[]>>;

test("every file of data is counted, or named as one without expected numbers", () => {
  for (const name of readdirSync(join(resolve(import.meta.dirname, ".."), "data"))) {
    expect(withoutNumbers.includes(name) || `data/${name}` in counted, name).toBe(true);
  }
});

test.each(Object.entries(counted))("%s gives an origin for each of its numbers", (_, found) => {
  expect(found.length).toBeGreaterThan(0);
  expect(found.filter((one) => one === undefined || !origins.includes(one))).toEqual([]);
});

test("a row's own note lowers the origin of its table, and a table without origin is noticed", () => {
  expect(originsOfTable("# Printed in a paper; published.\na,b\n1,2\n3,from memory\n")).toEqual(["published", "from memory"]);
  expect(originsOfTable("# Printed somewhere.\na,b\n1,2\n")).toEqual([undefined]);
});

test("most numbers come from outside", () => {
  const all = Object.values(counted).flat();
  const outside = all.filter((one) => one === "published" || one === "independent").length;
  expect(outside).toBeGreaterThan(all.length / 2);
  expect(summary()).toMatch(/published \d+, independent \d+/);
});
