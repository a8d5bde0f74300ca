// From opening the standalone page to the first value that the sheet shows, in Chromium.
import { existsSync } from "node:fs";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { chromium } from "playwright-core";

const executablePath = "/usr/bin/chromium";
const flags = [
  "--no-sandbox",
  "--disable-gpu",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];

export async function firstValue(root: string): Promise<string> {
  if (!existsSync(executablePath) || !existsSync(join(root, "dist/sheet.html"))) return "\nPage load: left out (no Chromium, or no build)";
  const { serve } = (await import(/* webpackIgnore: true */ pathToFileURL(join(root, "src/hosts/serve.js")).href)) as {
    serve: (options: { port: number; folder: string }) => Promise<{ port: number; close: () => void }>;
  };
  const server = await serve({ port: 4300, folder: join(root, "dist") });
  const browser = await chromium.launch({ executablePath, args: flags });
  try {
    const times: number[] = [];
    for (let i = 0; i < 3; i++) {
      const page = await browser.newPage();
      const start = performance.now();
      await page.goto(`http://localhost:${server.port}/sheet.html`);
      await page.waitForFunction(() => document.documentElement.dataset.ready === "true", undefined, { timeout: 60_000 });
      times.push(performance.now() - start);
      await page.close();
    }
    return `\nFrom opening the page to the sheet with its values: ${times.map((time) => `${Math.round(time)} ms`).join(", ")}`;
  } finally {
    await browser.close();
    server.close();
  }
}
