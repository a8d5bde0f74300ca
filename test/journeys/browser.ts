// A real Chromium on the project's own server, for tests that do what a person does. Nothing but this machine may be asked for anything.
import { existsSync, mkdirSync } from "node:fs";
import { resolve } from "node:path";
import { type Browser, type BrowserContextOptions, chromium, type Page } from "playwright-core";
import { expect } from "vitest";

/** Waits until it is so; a busy machine takes its time. */
export const patiently = <T>(read: () => T) => expect.poll(read, { timeout: 30_000, interval: 150 });

const executable = "/usr/bin/chromium";
const root = resolve(import.meta.dirname, "../..");
const screens = resolve(root, "test/screens");

/** False where there is no browser: test/run.js says so loudly, and fails under CI. */
export const hasBrowser = existsSync(executable);
if (!hasBrowser && process.env.CI) throw new Error(`Chromium is not at ${executable}: under CI nothing may be left out.`);

export interface Visit {
  readonly page: Page;
  /** Errors in the console, failures of scripts, requests that left the machine. */
  readonly faults: string[];
  close(): Promise<void>;
}

export class Place {
  private constructor(
    private readonly server: Server,
    private readonly browser: Browser,
  ) {}

  static async open(): Promise<Place> {
    const [server, browser] = await Promise.all([
      served(),
      chromium.launch({
        executablePath: executable,
        args: "--no-sandbox --disable-gpu --disable-quic --no-first-run --disable-background-networking --disable-component-update --disable-sync".split(
          " ",
        ),
      }),
    ]);
    return new Place(server, browser);
  }

  async close(): Promise<void> {
    await this.browser.close();
    await this.server.close();
  }

  async visit(path: string, options: BrowserContextOptions = {}): Promise<Visit> {
    const context = await this.browser.newContext({ viewport: { width: 1400, height: 900 }, ...options });
    await context.grantPermissions(["clipboard-read", "clipboard-write"]).catch(() => undefined);
    const page = await context.newPage();
    const faults: string[] = [];
    page.on("console", (message) => {
      if (message.type() === "error" || message.type() === "warning") faults.push(`console: ${message.text()} ${message.location().url}`);
    });
    page.on("pageerror", (error) => faults.push(`script: ${error.stack ?? error.message}`));
    page.on("requestfailed", (request) => faults.push(`failed: ${request.url()} ${request.failure()?.errorText ?? ""}`));
    const own = new URL(this.server.address).origin;
    await context.route(
      (url) => url.origin !== own && !["data:", "blob:"].includes(url.protocol),
      (route) => {
        faults.push(`left the machine: ${route.request().url()}`);
        return route.abort();
      },
    );
    await page.goto(new URL(path, this.server.address).href);
    return { page, faults, close: () => context.close() };
  }

  /** The standalone sheet, ready to be typed into. */
  async sheet(options: BrowserContextOptions = {}): Promise<Visit> {
    const visit = await this.visit("sheet.html", options);
    await ready(visit.page);
    return visit;
  }
}

export async function ready(page: Page): Promise<void> {
  await page.waitForFunction(() => document.documentElement.dataset.ready === "true");
  // The first calculation of the whole workbook.
  await page.waitForTimeout(800);
}

interface Server {
  readonly address: string;
  close(): Promise<unknown>;
}

/** The project's own server over the build that stands there; FILMBOOK_ADDRESS names one that is already served. */
async function served(): Promise<Server> {
  const given = process.env.FILMBOOK_ADDRESS;
  if (given !== undefined) return { address: given, close: () => Promise.resolve() };
  const module = new URL("../../src/hosts/serve.js", import.meta.url).href;
  const { serve } = (await import(module)) as { serve(): Promise<{ readonly port: number; close(): Promise<unknown> }> };
  const { port, close } = await serve();
  return { address: `http://127.0.0.1:${port}/`, close };
}

/** Goes to a cell by the name box. */
export async function goTo(page: Page, address: string): Promise<void> {
  const box = page.locator('[data-u-comp="defined-name"] input');
  await box.click();
  await box.fill(address);
  await box.press("Enter");
  await page.waitForFunction((wanted) => (document.querySelector("#pane .where")?.textContent ?? "").includes(wanted), `!${address}`);
}

export async function openSheet(page: Page, name: string): Promise<void> {
  await page.locator('[data-u-comp="slide-tab-item"]', { hasText: name }).first().click();
  await page.waitForFunction(
    (wanted) => (document.querySelector("#pane .where")?.textContent ?? "").includes(wanted),
    name.includes(" ") ? `'${name}'!` : `${name}!`,
  );
}

/** Types into a cell as a person does; the pause lets the suggestion list come and go. */
/** Types into a cell as a person would; on a busy machine the suggestion list may swallow a key, and a person would type again. */
export async function type(page: Page, address: string, text: string): Promise<void> {
  for (let tries = 0; tries < 3; tries++) {
    await goTo(page, address);
    await page.keyboard.type(text, { delay: 8 });
    await page.waitForTimeout(350);
    await page.keyboard.press("Tab");
    await page.waitForTimeout(300);
    if ((await cellShown(page, address)) !== "") return;
    await page.keyboard.press("Escape");
  }
}

export function paneText(page: Page): Promise<string> {
  return page.locator("#pane").innerText();
}

/** What a cell shows: copied and read from the clipboard. */
export async function cellShown(page: Page, address: string): Promise<string> {
  const none = "nothing copied yet";
  await goTo(page, address);
  await page.evaluate((text) => navigator.clipboard.writeText(text), none);
  for (let tries = 0; tries < 20; tries++) {
    await page.keyboard.press("Control+c");
    await page.waitForTimeout(60);
    const text = await page.evaluate(() => navigator.clipboard.readText());
    if (text !== none) return text.replace(/\r?\n$/, "");
  }
  throw new Error(`${address} could not be copied`);
}

interface AxeResult {
  readonly violations: readonly {
    readonly id: string;
    readonly nodes: readonly { readonly html: string; readonly failureSummary?: string }[];
  }[];
}

/** What axe finds in the parts of the page that are ours; the embedded grid is its makers'. */
export async function axeFinds(page: Page, source: string): Promise<readonly string[]> {
  await page.evaluate(source);
  const result = (await page.evaluate(() =>
    (globalThis as unknown as { axe: { run(where: unknown): Promise<unknown> } }).axe.run({
      include: [["#pane"], [".bar"], ["#separator"]],
    }),
  )) as AxeResult;
  return result.violations.flatMap((one) => one.nodes.map((node) => `${one.id}: ${node.html.slice(0, 160)} ${node.failureSummary ?? ""}`));
}

export async function screenshot(page: Page, name: string, part?: string): Promise<void> {
  mkdirSync(screens, { recursive: true });
  const path = resolve(screens, `${name}.png`);
  await (part === undefined ? page.screenshot({ path }) : page.locator(part).screenshot({ path }));
}
