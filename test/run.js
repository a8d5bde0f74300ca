// npm test: formatting and lint, the two type checks (all of it, and the inner rooms without a browser's or Node's types),
// one build, then every test. The last line counts the tests. Says loudly what this machine lacks; under CI that fails.
import { spawnSync } from "node:child_process";
import { existsSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { createRequire } from "node:module";
import { tmpdir } from "node:os";
import { dirname, join, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import { summary } from "./origins.js";

const root = resolve(dirname(fileURLToPath(import.meta.url)), "..");
const require = createRequire(import.meta.url);
const needed = { Chromium: ["/usr/bin/chromium"], "LibreOffice Calc": ["/usr/bin/soffice", "/usr/bin/libreoffice"] };

const lacking = Object.entries(needed).filter(([, paths]) => !paths.some((path) => existsSync(path)));
for (const [name] of lacking) console.error(`\n*** ${name} is not on this machine: the tests that need it are LEFT OUT. ***\n`);
if (lacking.length > 0 && process.env.CI) {
  console.error("Under CI nothing may be left out.");
  process.exit(1);
}

function run(what, script, ...args) {
  console.log(`\n— ${what}`);
  const { status } = spawnSync(process.execPath, [script, ...args], { cwd: root, stdio: "inherit" });
  if (status !== 0) {
    console.error(`${what}: failed`);
    process.exit(status ?? 1);
  }
}

const tsc = require.resolve("typescript/bin/tsc");
run("format and lint", join(dirname(require.resolve("@biomejs/biome/package.json")), "bin/biome"), "check", ".");
run("types of the inner rooms", tsc, "-p", "src/tsconfig.inner.json");
run("build", join(root, "src/hosts/build/build.js"));

console.log("\n— tests");
const folder = mkdtempSync(join(tmpdir(), "filmbook-"));
const report = join(folder, "report.json");
const vitest = join(dirname(require.resolve("vitest/package.json")), "vitest.mjs");
const only = process.argv.slice(2);
const args = [
  vitest,
  "run",
  "--config",
  "test/vitest.config.ts",
  "--reporter=default",
  "--reporter=json",
  `--outputFile.json=${report}`,
  ...only,
];
const { status } = spawnSync(process.execPath, args, { cwd: root, stdio: "inherit" });
if (!existsSync(report)) process.exit(status || 1);
const { numPassedTests: passed, numFailedTests, numPendingTests: skipped, testResults } = JSON.parse(readFileSync(report, "utf8"));
rmSync(folder, { recursive: true });
// A file that cannot even be loaded has no tests to count: it counts as one that failed.
const unloaded = testResults.filter((file) => file.status === "failed" && file.assertionResults.length === 0).length;
const failed = numFailedTests + unloaded;
console.log(`\n${summary()}`);
if (skipped > 0)
  console.log(`*** ${skipped} tests were LEFT OUT, for want of ${lacking.map(([name]) => name).join(" and ") || "their tools"}. ***`);
console.log(`\n${passed} passed, ${failed} failed`);
process.exit(status || (passed === 0 || failed > 0 ? 1 : 0));
