// npm run bench: bundles the bench as the product is bundled (a test runner's module system would blur the ratios) and runs it.
import { spawnSync } from "node:child_process";
import { rmSync } from "node:fs";
import { dirname, join, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import webpack from "webpack";

const root = resolve(dirname(fileURLToPath(import.meta.url)), "../..");
// Below node_modules, so that what is left outside the bundle is still found.
const folder = join(root, "node_modules/.cache/filmbook-bench");

const compiler = webpack({
  mode: "production",
  target: "node20",
  entry: join(root, "test/bench/bench.ts"),
  output: { path: folder, filename: "bench.cjs", library: { type: "commonjs2" } },
  resolve: { extensions: [".ts", ".js"], extensionAlias: { ".js": [".ts", ".js"] } },
  module: { rules: [{ test: /\.ts$/, loader: "ts-loader", options: { transpileOnly: true, compilerOptions: { noEmit: false } } }] },
  externals: { "playwright-core": "commonjs playwright-core" },
  performance: { hints: false },
});

compiler.run((fault, stats) => {
  if (fault || stats.hasErrors()) {
    console.error(fault ?? stats.toString("errors-only"));
    process.exit(1);
  }
  const { status } = spawnSync(process.execPath, ["--expose-gc", "--max-old-space-size=8192", join(folder, "bench.cjs"), root], {
    stdio: "inherit",
    cwd: root,
  });
  rmSync(folder, { recursive: true });
  process.exit(status ?? 1);
});
