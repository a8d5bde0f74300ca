// What the platform sees: metadata that agrees with the bundle, and functions that answer every way of calling them with
// a proper block. Fails on an id without function, an illegal name, NaN, null, an exception, or an error without a sentence.
import { describe, expect, test } from "vitest";
import { ErrorCode, loadBundle, loadText, PlatformError, type PlatformFunction, runIn } from "./bundle.js";

const { functions, metadata, realm, text } = loadBundle();
const entries = metadata.functions.map((one) => [one.id, one] as const);

describe("realm", () => {
  test("has no page, no Office, no Node, and evaluates no text", () => {
    for (const name of ["document", "window", "self", "Office", "Excel", "require", "process", "fetch", "setTimeout"])
      expect(runIn(realm, `typeof ${name}`), name).toBe("undefined");
    expect(() => runIn(realm, 'eval("1 + 1")')).toThrow(/Code generation from strings disallowed/);
    expect(() => runIn(realm, 'new Function("return 1")')).toThrow(/Code generation from strings disallowed/);
  });

  test("gains one name of ours, and the file itself evaluates no text", () => {
    expect(runIn(realm, "Object.keys(globalThis)")).toEqual(["CustomFunctions", "FilmbookFunctions"]);
    expect(text).not.toMatch(/\beval\s*\(|\bnew\s+Function\b|\bimportScripts\b|\bimport\s*\(/);
  });

  test("a function that fails to load would be noticed: without the platform there is an error", () => {
    expect(() => loadText(text, {})).toThrow(/CustomFunctions/);
  });
});

describe("metadata", () => {
  test("ids and functions are the same set", () => {
    expect(metadata.functions.map((one) => one.id).sort()).toEqual(Object.keys(functions).sort());
    expect(metadata.functions).toHaveLength(18);
    expect(metadata.allowErrorForDataTypeAny).toBe(true);
  });

  test.each(entries)("%s has a legal name, help, and matrices throughout", (_, entry) => {
    expect(entry.name).toMatch(/^[A-Z][A-Z0-9._]{2,127}$/);
    expect(entry.name).not.toMatch(/^[A-Z]{1,3}\d+$|^R\d*C\d*$/); // would look like a cell, A1 or R1C1
    expect(entry.id).toBe(entry.name);
    expect(entry.description.length).toBeGreaterThan(10);
    expect(entry.description.length).toBeLessThan(200);
    expect(entry.result.dimensionality).toBe("matrix");
    let optional = false;
    for (const parameter of entry.parameters) {
      expect(parameter.type).toBe("any");
      expect(parameter.dimensionality).toBe("matrix");
      expect(parameter.name).toMatch(/^[a-z][A-Za-z]*$/);
      expect(parameter.description?.length ?? 0).toBeGreaterThan(1);
      expect(parameter.description?.length ?? 0).toBeLessThan(200);
      if (optional) expect(parameter.optional).toBe(true);
      optional ||= parameter.optional === true;
    }
  });
});

const invocation = { address: "Sheet1!A1", setResult: () => undefined };
const errorCell = { code: "#DIV/0!" };

function checked(cells: unknown[][]): unknown[][] {
  expect(Array.isArray(cells)).toBe(true);
  expect(cells.length).toBeGreaterThan(0);
  expect(cells[0]?.length).toBeGreaterThan(0);
  for (const row of cells) {
    expect(row.length).toBe(cells[0]?.length);
    for (const cell of row) {
      if (typeof cell === "number") expect(Number.isFinite(cell)).toBe(true);
      else if (cell instanceof PlatformError) {
        expect(Object.values(ErrorCode)).toContain(cell.code);
        // The platform shows a message with these two alone; an error cell passed on brings none of ours.
        if (cell.code === "#VALUE!" || cell.code === "#N/A") expect(cell.message?.length ?? 0).toBeGreaterThan(10);
      } else expect(["string", "boolean"]).toContain(typeof cell);
    }
  }
  return cells;
}

describe.each(entries)("FILM.%s called as the platform calls", (id, entry) => {
  const call = functions[id] as PlatformFunction;
  const count = entry.parameters.length;
  const all = (value: unknown): unknown[] => entry.parameters.map(() => value);
  test.each<[string, unknown[]]>([
    ["nothing but omitted arguments", [...all(null), invocation]],
    ["blank texts", [...all([[""]]), invocation]],
    ["blank zeros", [...all([[0]]), invocation]],
    ["blank nulls", [...all([[null]]), invocation]],
    ["a text in each", [...all([["x"]]), invocation]],
    ["numbers in each", [...all([[1]]), invocation]],
    ["error cells", [...all([[errorCell]]), invocation]],
    ["booleans", [...all([[true]]), invocation]],
    ["blocks that do not fit", [...all([[1, 2, 3]]).map((block, i) => (i % 2 === 0 ? block : [[1], [2]])), invocation]],
    ["no argument at all", []],
    ["the last argument missing", all([["x"]]).slice(0, -1)],
    ["arguments missing after the first", [[["air"]]]],
    ["undefined in each", [...all(undefined), invocation]],
    ["more than it declares", [...all(null), invocation, "more", 7]],
    ["long columns", [...all(Array.from({ length: 50 }, (_, i) => [i])), invocation]],
  ])("%s", (_, args) => {
    expect(count).toBeGreaterThan(0);
    checked(call(...args));
  });
});

test("errors of single cells keep to their row and carry the platform's codes", () => {
  const cells = checked(functions["FREE.PLATE"]?.([["air"]], [[80], [errorCell], [60]], [[20]], [[0.3]], null, null, invocation) ?? []);
  expect(typeof cells[0]?.[0]).toBe("number");
  expect((cells[1]?.[0] as PlatformError).code).toBe("#DIV/0!");
  expect(typeof cells[2]?.[0]).toBe("number");
  const refused = functions["FREE.PLATE"]?.([["air"]], [[80]], [[20]], [["0.3 m/s"]], null, null)[0]?.[0] as PlatformError;
  expect(refused.code).toBe("#VALUE!");
  expect(refused.message).toMatch(/is a speed; a length is needed/);
});
