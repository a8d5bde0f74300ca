// npm run build: the compiler's own check, then both bundles; the size of functions.js is printed and held to a budget.
import { spawnSync } from "node:child_process";
import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { dirname, join, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import { gzipSync } from "node:zlib";

const root = resolve(dirname(fileURLToPath(import.meta.url)), "../../..");
const require = createRequire(import.meta.url);
/** Gzipped bytes of functions.js with the whole shelf of fluids on it. */
const budget = 300_000;

function run(script, ...args) {
  const { status } = spawnSync(process.execPath, [script, ...args], { cwd: root, stdio: "inherit" });
  if (status !== 0) process.exit(status ?? 1);
}

run(require.resolve("typescript/bin/tsc"), "-p", ".", "--noEmit");
run(join(dirname(require.resolve("webpack-cli/package.json")), "bin/cli.js"), "--mode", "production");
const size = gzipSync(readFileSync(join(root, "dist/functions.js")), { level: 9 }).length;
console.log(`functions.js: ${Math.round(size / 1000)} kB gzipped of ${budget / 1000} kB allowed`);
if (size > budget) process.exit(1);
