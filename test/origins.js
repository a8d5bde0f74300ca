// Where the expected numbers of the tests come from, counted from the data that they are read from. A number of our own
// making proves nothing, however many there are of it: the report of npm test says how many of each there are.
import { readdirSync, readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

const here = dirname(fileURLToPath(import.meta.url));
const read = (name) => readFileSync(join(here, name), "utf8");
const json = (name) => JSON.parse(read(name));

/** From the best evidence to none; comparison is another published law or a limit. */
export const origins = ["published", "independent", "comparison", "common practice", "from memory", "pinned"];

/** Data that hold no expected numbers: where to sample, which names must resolve, and how constants were confirmed. */
export const withoutNumbers = ["confirmed-elsewhere.json", "correlation-samples.json", "fluid-names.txt", "read-csv.ts"];

/** A table's first line ends by naming the origin of its rows; a row's own note may lower it. */
export function originsOfTable(text) {
  const lines = text.split(/\r?\n/).filter((line) => line !== "");
  const origin = /; (published|independent|common practice|from memory|pinned)\b/.exec(lines[0])?.[1];
  const rows = lines.filter((line) => !line.startsWith("#")).slice(1);
  return rows.map((row) => (row.includes("from memory") ? "from memory" : origin));
}

/** Every file that holds expected numbers, with the origin of each number or row. */
export function originsByFile() {
  const tables = readdirSync(join(here, "data")).filter((name) => name.endsWith(".csv"));
  return {
    ...Object.fromEntries(tables.map((name) => [`data/${name}`, originsOfTable(read(`data/${name}`))])),
    "data/correlation-checks.json": json("data/correlation-checks.json").map((one) => one.kind),
    // Computed from the governing equations by another method, as each entry says.
    "data/exact-solutions.json": json("data/exact-solutions.json").map(() => "independent"),
    "contract/pairs.json": json("contract/pairs.json").map((one) => one.origin),
    "cells/worked-examples.test.ts": [...read("cells/worked-examples.test.ts").matchAll(/^\s*origin: "([^"]+)",$/gm)].map((one) => one[1]),
  };
}

/** One line for the end of the report. */
export function summary() {
  const all = Object.values(originsByFile()).flat();
  const counts = origins.map((origin) => [origin, all.filter((one) => one === origin).length]).filter(([, count]) => count > 0);
  return `Expected values and rows by origin: ${counts.map(([origin, count]) => `${origin} ${count}`).join(", ")}`;
}
