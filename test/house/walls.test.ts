// The walls of the house: a room imports only rooms before it, and the inner rooms know no browser, no Office and no Node.
// Fails on an arrow against the flow, on a word of a host inside, and on a text that names a machine or a registry.
import { readdirSync, readFileSync, statSync } from "node:fs";
import { join, relative, resolve, sep } from "node:path";
import { describe, expect, test } from "vitest";

const root = resolve(import.meta.dirname, "../..");
const src = join(root, "src");
const rooms = ["quantities", "fluids", "equations", "correlations", "surfaces", "findings", "cells", "review", "pane", "hosts"];
const inner = rooms.slice(0, rooms.indexOf("pane"));
/** Globals of a browser, of Office and of Node, and what makes code of text. */
const hostWords =
  /(?<![.\w])(?:document|window|navigator|localStorage|sessionStorage|fetch|XMLHttpRequest|Office|Excel|CustomFunctions|process|Buffer|require|setTimeout)\b(?!\s*\??:)|\beval\s*\(|\bnew\s+Function\b/;
const passedOver = new Set(["node_modules", "dist", ".git", "screens"]);
const binary = /\.(?:png|xlsx|woff2?|ttf|ico)$/;
/** Files that stand outside the rooms and may be read from all of them. */
const free = new Set(["bibliography.ts", "version.ts"]);

function filesBelow(folder: string): readonly string[] {
  return readdirSync(folder).flatMap((name) => {
    const path = join(folder, name);
    return statSync(path).isDirectory() ? filesBelow(path) : /\.[tj]s$/.test(name) ? [path] : [];
  });
}

const files = filesBelow(src).map((path) => ({ path, name: relative(src, path).split(sep).join("/"), text: readFileSync(path, "utf8") }));

/** What a file reads: imports and re-exports, also over several lines, also types, also at run time. */
function importsOf(text: string): readonly string[] {
  const declared = [...text.matchAll(/^\s*(?:import|export)\b[^;"']*?from\s*["']([^"']+)["']|^\s*import\s*["']([^"']+)["']/gm)];
  const called = [...codeOf(text, true).matchAll(/\b(?:import|require)\s*\(\s*["'`]([^"'`]+)["'`]/g)];
  return [...declared, ...called].map((match) => (match[1] ?? match[2]) as string);
}

/** A text without its comments and, unless they are wanted, without what stands in quotes. */
function codeOf(text: string, withTexts = false): string {
  return text.replace(/"(?:[^"\\\n]|\\.)*"|'(?:[^'\\\n]|\\.)*'|`(?:[^`\\]|\\.)*`|\/\*[\s\S]*?\*\/|\/\/.*/g, (found) =>
    found.startsWith("/") ? "" : withTexts ? found : '""',
  );
}

test("imports are found in every form", () => {
  const text = [
    'import { a } from "./a.js";',
    'import type {\n  B,\n  C,\n} from "./b.js";',
    'import "./c.js";',
    'export * from "./d.js";',
    'export { e } from "./e.js";',
    'const f = await import("./f.js");',
    'const g = require("./g.js");',
    '// import { no } from "no"',
    "/* require('no') */",
  ].join("\n");
  expect([...importsOf(text)].sort()).toEqual(["a", "b", "c", "d", "e", "f", "g"].map((name) => `./${name}.js`));
});

test("there is something to look at", () => expect(files.length).toBeGreaterThan(100));

test("imports follow the flow of data", () => {
  const against: string[] = [];
  for (const { path, name, text } of files) {
    const from = rooms.indexOf(name.split("/")[0] as string);
    if (from < 0) {
      if (!free.has(name)) against.push(`${name} stands in no room`);
      continue;
    }
    for (const target of importsOf(text).filter((one) => one.startsWith("."))) {
      const reached = relative(src, resolve(path, "..", target))
        .split(sep)
        .join("/")
        .replace(/\.js$/, ".ts");
      if (free.has(reached)) continue;
      const to = rooms.indexOf(reached.split("/")[0] as string);
      if (to < 0 || to > from) against.push(`${name} imports ${reached}`);
    }
  }
  expect(against).toEqual([]);
});

describe.each(inner)("%s", (room) => {
  const mine = files.filter((file) => file.name.startsWith(`${room}/`));
  test("imports nothing but the house's own rooms", () => {
    for (const { name, text } of mine) for (const target of importsOf(text)) expect(target, name).toMatch(/^\.\.?\//);
  });
  test("names no host, no page, no evaluation of text", () => {
    for (const { name, text } of mine) expect(codeOf(text), name).not.toMatch(hostWords);
  });
});

test("a word of a host would be noticed, in code and not in words", () => {
  for (const line of ["document.title", "x = window", "new Function(a)", "eval(a)", "Excel.run(f)", "process.env.X", 'require("x")'])
    expect(codeOf(line), line).toMatch(hostWords);
  for (const line of ["// window", '"Excel opens"', "point.process", "{ window: 1 }", "evaluate(a)", "windowless"])
    expect(codeOf(line), line).not.toMatch(hostWords);
});

test("the pane draws a page, and knows no spreadsheet program", () => {
  for (const { name, text } of files.filter((file) => file.name.startsWith("pane/")))
    expect(codeOf(text), name).not.toMatch(/\b(?:Office|Excel|OfficeExtension|CustomFunctions)\b|\beval\s*\(|\bnew\s+Function\b/);
});

test("the files outside the rooms read nothing", () => {
  for (const { name, text } of files.filter((file) => free.has(file.name))) expect(importsOf(text), name).toEqual([]);
});

/** Texts that are kept: all but what is installed, built or drawn anew. */
function keptTexts(folder: string): readonly string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) return passedOver.has(entry.name) ? [] : keptTexts(path);
    return entry.isFile() && !binary.test(entry.name) ? [path] : [];
  });
}

// Each put together here, so that this file does not name what it forbids.
const machinePaths = ["work", "tmp", "root", "home", "Users"].map((name) => `/${name}/`);
const registries = [
  ["registry", "[a-z0-9-]+"],
  ["npmjs", "(?:org|com)"],
  ["yarnpkg", "com"],
  ["pypi", "org"],
  ["pythonhosted", "org"],
  ["crates", "io"],
  ["golang", "org"],
].map((parts) => parts.join("\\."));
const unwanted: readonly (readonly [string, RegExp])[] = [
  ["a path of one machine", new RegExp(`(?<![\\w.~*)}\\]-])(?:${machinePaths.join("|")})\\w`)],
  ["a host that packages come from", new RegExp(`\\b(?:${registries.join("|")})\\b`, "i")],
  ["where a package was fetched from", new RegExp(`"${"resol"}ved":`)],
];

describe("texts that are kept", () => {
  const texts = keptTexts(root).map((path) => ({ name: relative(root, path), text: readFileSync(path, "utf8") }));
  test("there is something to look at", () => {
    const names = texts.map((one) => one.name);
    for (const name of ["README.md", "package-lock.json", "manifest.xml", join(".ci", "run")]) expect(names).toContain(name);
  });

  test.each(unwanted)("name no place of their making: %s", (_, pattern) => {
    const found = texts.flatMap(({ name, text }) => {
      const match = pattern.exec(text);
      return match === null ? [] : [`${name}: ${text.slice(Math.max(0, match.index - 20), match.index + 40)}`];
    });
    expect(found).toEqual([]);
  });

  test("a path and a host would be noticed", () => {
    const [path, host, fetched] = unwanted.map(([, pattern]) => pattern) as [RegExp, RegExp, RegExp];
    expect(`see ${machinePaths[0]}main`).toMatch(path);
    expect(`"${machinePaths[3]}someone/x"`).toMatch(path);
    expect(`test${machinePaths[0]}x`).not.toMatch(path);
    expect(`https://${["registry", "example", "net"].join(".")}/x`).toMatch(host);
    expect(`"${"resol"}ved": "https://x"`).toMatch(fetched);
  });
});
