// The walls of the house: a room imports only rooms before it, and the inner rooms know no browser, no Office and no Node.
// Fails on an arrow against the flow, and on a word of a host inside.
import { readdirSync, readFileSync, statSync } from "node:fs";
import { join, relative, resolve, sep } from "node:path";
import { describe, expect, test } from "vitest";

const root = resolve(import.meta.dirname, "../..");
const src = join(root, "src");
const rooms = ["quantities", "fluids", "equations", "correlations", "surfaces", "findings", "cells", "review", "pane", "hosts"];
const inner = rooms.slice(0, rooms.indexOf("pane"));
/** Files that stand outside the rooms and may be read from all of them. */
const free = new Set(["bibliography.ts", "version.ts"]);

function filesBelow(folder: string): readonly string[] {
  return readdirSync(folder).flatMap((name) => {
    const path = join(folder, name);
    return statSync(path).isDirectory() ? filesBelow(path) : /\.[tj]s$/.test(name) ? [path] : [];
  });
}

const files = filesBelow(src).map((path) => ({ path, name: relative(src, path).split(sep).join("/"), text: readFileSync(path, "utf8") }));

function importsOf(text: string): readonly string[] {
  return [...text.matchAll(/^(?:import|export)\b[^;"']*?from\s*"([^"]+)"|^import\s+"([^"]+)"/gm)].map(
    (match) => (match[1] ?? match[2]) as string,
  );
}

test("there is something to look at", () => expect(files.length).toBeGreaterThan(100));

test("imports follow the flow of data", () => {
  const against: string[] = [];
  for (const { path, name, text } of files) {
    const from = rooms.indexOf(name.split("/")[0] as string);
    if (from < 0) continue;
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
    for (const { name, text } of mine) {
      const code = text.replace(/\/\*[\s\S]*?\*\/|\/\/.*|"(?:[^"\\]|\\.)*"|`(?:[^`\\]|\\.)*`/g, "");
      expect(code, name).not.toMatch(
        /\b(?:document|window|Office|Excel|localStorage|fetch|process|require)\b\s*[.(]|\beval\s*\(|new\s+Function\b/,
      );
    }
  });
});
