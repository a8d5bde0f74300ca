// The comparison that the build makes between the metadata's ids and the functions exported: fails where a fault that
// the platform would only show as #NAME? in a cell gets through the build.
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join, resolve } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { disagreements, exportedFunctions, readMetadata, strayExports } from "../../src/hosts/build/metadata-plugin.js";

const metadata = (...ids: readonly string[]) => ({ functions: ids.map((id) => ({ id })) });
const associate = (...pairs: readonly (readonly [string, string])[]) => pairs.map(([id, functionName]) => ({ id, functionName }));

describe("disagreements", () => {
  test("none where both sides say the same", () => {
    expect(disagreements(metadata("A", "B.C"), associate(["A", "a"], ["B.C", "bC"]), ["a", "bC"])).toEqual([]);
  });

  test("an id that nothing is associated with", () => {
    expect(disagreements(metadata("A", "B"), associate(["A", "a"]), ["a"])).toEqual(["B has no implementation"]);
  });

  test("an id associated with a function that is not exported", () => {
    expect(disagreements(metadata("A", "B"), associate(["A", "a"], ["B", "b"]), ["a"])).toEqual(["B has no implementation"]);
  });

  test("an exported function without id", () => {
    expect(disagreements(metadata("A"), associate(["A", "a"]), ["a", "b"])).toEqual(["b is exported but has no id"]);
  });

  test("an id given twice", () => {
    const faults = disagreements(metadata("A", "A"), associate(["A", "a"], ["A", "again"]), ["a", "again"]);
    expect(faults).toContain("ids given twice: A");
  });

  test("all faults at once", () => {
    expect(disagreements(metadata("A", "A", "B"), associate(["A", "a"]), ["a", "c"])).toEqual([
      "ids given twice: A",
      "B has no implementation",
      "c is exported but has no id",
    ]);
  });
});

describe("exportedFunctions", () => {
  test("finds declarations, async ones too, over several lines", () => {
    expect(exportedFunctions("export function a(x) {}\nexport async function b(\n  x,\n) {}\n")).toEqual(["a", "b"]);
  });

  test("passes over what the metadata generator passes over too", () => {
    const text =
      'function inner() {}\nexport const arrow = () => 1;\n// export function told() {}\nexport { x } from "./x.js";\n  export function indented() {}\n';
    expect(exportedFunctions(text)).toEqual([]);
  });
});

describe("strayExports", () => {
  test.each([
    "export const arrow = () => 1;",
    'export { x } from "./x.js";',
    'export * from "./x.js";',
    "export default function () {}",
    "export function* many() {}",
  ])("%s has no id", (line) => {
    expect(strayExports(`export function a() {}\n${line}\nexport async function b() {}\n`)).toEqual([
      `"${line}" is no top-level function declaration, so it has no id`,
    ]);
  });

  test("declarations are none, nor is a comment", () => {
    expect(strayExports("export function a(\n  x,\n) {}\nexport async function b() {}\n// export const c = 1;\n")).toEqual([]);
  });
});

describe("readMetadata", () => {
  let folder: string;
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), "filmbook-metadata-"));
  });
  afterAll(() => rmSync(folder, { recursive: true }));

  function source(text: string): string {
    const path = join(folder, "functions.ts");
    writeFileSync(path, text);
    return path;
  }

  test("lets error cells through to the functions", async () => {
    const read = await readMetadata(
      source("/**\n * Twice.\n * @customfunction TWICE TWICE\n */\nexport function twice(x: any[][]): any[][] {\n  return x;\n}\n"),
    );
    expect(read.metadata.allowErrorForDataTypeAny).toBe(true);
    expect(read.metadata.functions.map((one: { id: string }) => one.id)).toEqual(["TWICE"]);
  });

  test("a fault that the generator reports stops the build", async () => {
    const faulty =
      "type Block = any[][];\n/**\n * Twice.\n * @customfunction TWICE TWICE\n */\nexport function twice(x: Block): any[][] {\n  return x;\n}\n";
    await expect(readMetadata(source(faulty))).rejects.toThrow(/functions\.ts: /);
  });

  test("an arrow function, which the generator passes over in silence, is not mistaken for a function", async () => {
    const once = "/**\n * Once.\n * @customfunction ONCE ONCE\n */\nexport function once(x: any[][]): any[][] {\n  return x;\n}\n";
    const twice = "/**\n * Twice.\n * @customfunction TWICE TWICE\n */\nexport const twice = (x: any[][]): any[][] => x;\n";
    const read = await readMetadata(source(once + twice));
    expect(read.metadata.functions.map((one: { id: string }) => one.id)).toEqual(["ONCE"]);
    expect(exportedFunctions(once + twice)).toEqual(["once"]);
  });

  test("the project's own functions agree", async () => {
    const path = resolve(import.meta.dirname, "../../src/cells/functions.ts");
    const read = await readMetadata(path);
    const exported = exportedFunctions(readFileSync(path, "utf8"));
    expect(exported).toHaveLength(read.metadata.functions.length);
    expect(disagreements(read.metadata, read.associate, exported)).toEqual([]);
    expect(strayExports(readFileSync(path, "utf8"))).toEqual([]);
  });
});
