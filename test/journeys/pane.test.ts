// The pane in a real browser: keyboard, accessibility, narrow and wide, light, dark and high contrast. Screens are kept to be looked at.
import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import type { Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { axeFinds, goTo, hasBrowser, openSheet, Place, screenshot, type Visit } from "./browser.js";

const axeSource = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");

describe.runIf(hasBrowser)("the pane", () => {
  let place: Place;
  let visit: Visit;

  beforeAll(async () => {
    place = await Place.open();
    visit = await place.sheet();
  });
  afterAll(async () => {
    await place?.close();
  });

  const cells = [
    ["a result", "Start here", "B5"],
    ["a block's cell", "Start here", "G12"],
    ["an argument to mend", "Start here", "B34"],
    ["out of range", "Start here", "B35"],
    ["no function", "Start here", "A1"],
    ["a flux", "Charger", "E5"],
    ["a duct", "Cooling loop", "F7"],
  ] as const;

  test.each(cells)("axe finds nothing: %s", async (_, sheet, cell) => {
    const { page } = visit;
    await openSheet(page, sheet);
    await goTo(page, cell);
    await page.waitForTimeout(250);
    expect(await axeFinds(page, axeSource)).toEqual([]);
  });

  test("symbols tell what they are on hover, and the arrow keys move among them", async () => {
    const { page } = visit;
    await openSheet(page, "Start here");
    await goTo(page, "B5");
    await page.locator("#pane .symbol[data-symbol=Ra]").first().hover();
    expect(await page.locator("#symbol-says").innerText()).toMatch(/Rayleigh number: 1\.07/);
    const first = page.locator("#line-0 .symbol[tabindex='0']");
    await first.focus();
    const before = await page.locator("#symbol-says").innerText();
    await page.keyboard.press("ArrowRight");
    expect(await page.locator("#symbol-says").innerText()).not.toBe(before);
    expect(await page.evaluate(() => document.activeElement?.getAttribute("data-symbol"))).toBe("Pr");
  });

  test("everything in the pane is reached by the tab key, and what has the focus is seen to have it", async () => {
    const { page } = visit;
    await goTo(page, "B5");
    await page.locator("#separator").focus();
    const reached: string[] = [];
    for (let i = 0; i < 30; i++) {
      await page.keyboard.press("Tab");
      const at = await page.evaluate(() => {
        const active = document.activeElement;
        if (active === null || active.closest("#pane") === null) return "";
        return `${active.id || active.getAttribute("data-symbol") || active.textContent?.slice(0, 20)}|${getComputedStyle(active).outlineStyle}`;
      });
      if (at === "") break;
      reached.push(at);
    }
    expect(reached.length).toBeGreaterThan(4);
    expect(reached.filter((one) => one.endsWith("|none"))).toEqual([]);
    expect(await page.locator("#pane :is(button, summary, input, select, [tabindex='0']):visible").count()).toBeLessThanOrEqual(
      reached.length,
    );
  });

  test("the separator moves with the arrow keys and remembers where it was left", async () => {
    const { page } = visit;
    const width = (): Promise<number> => page.evaluate(() => (document.querySelector("#pane") as HTMLElement).offsetWidth);
    const before = await width();
    await page.locator("#separator").focus();
    await page.keyboard.press("ArrowLeft");
    await page.keyboard.press("ArrowLeft");
    expect(await width()).toBe(before + 48);
    await page.reload();
    await page.waitForFunction(() => document.documentElement.dataset.ready === "true");
    expect(await width()).toBe(before + 48);
    await page.locator("#separator").focus();
    await page.keyboard.press("ArrowRight");
    await page.keyboard.press("ArrowRight");
  });

  test("what if: another value is tried with the arrow keys, the sheet stays as it is", async () => {
    const { page } = visit;
    await goTo(page, "B5");
    await page.locator("#what-if > summary").click();
    await page.locator("#what-if .plot").waitFor();
    const before = await page.locator("#what-if-says").innerText();
    expect(before).toMatch(/surface 80 °C: h 5 W/);
    await page.locator("#what-if-slider").focus();
    await page.keyboard.press("ArrowRight");
    await page.keyboard.press("ArrowRight");
    expect(await page.locator("#what-if-says").innerText()).not.toBe(before);
    expect(await axeFinds(page, axeSource)).toEqual([]);
    await page.locator("#what-if-input").selectOption("height");
    expect(await page.locator("#what-if-says").innerText()).toMatch(/height 0\.3 m/);
    await screenshot(page, "pane-what-if", "#what-if");
    await page.locator("#what-if > summary").click();
  });

  test("the report is copied as text", async () => {
    const { page } = visit;
    await goTo(page, "B5");
    await page.locator("#trace summary").click();
    await page.locator("#copy-report").click();
    await page.waitForFunction(() => (document.querySelector("#copy-says")?.textContent ?? "") !== "");
    expect(await page.evaluate(() => navigator.clipboard.readText())).toMatch(/FILM\.FREE\.PLATE[\s\S]*Every step/);
  });

  test.each([
    [280, "light"],
    [320, "light"],
    [320, "dark"],
    [600, "light"],
    [600, "dark"],
    [1400, "light"],
    [1400, "dark"],
    [1400, "contrast"],
  ] as const)("at %d px, %s, nothing is cut off", async (width, look) => {
    const options = {
      viewport: { width, height: 900 },
      colorScheme: look === "dark" ? ("dark" as const) : ("light" as const),
      ...(look === "contrast" ? { forcedColors: "active" as const, contrast: "more" as const } : {}),
    };
    const one = await place.sheet(options);
    try {
      for (const cell of ["B5", "B35"]) {
        await goTo(one.page, cell);
        await one.page.waitForTimeout(250);
        await screenshot(one.page, `sheet-${width}-${look}-${cell}`);
        await screenshotWholePane(one.page, `pane-${width}-${look}-${cell}`);
        const wide = await one.page.evaluate(() => {
          const page = document.querySelector("#page") as HTMLElement;
          return page.scrollWidth - page.clientWidth;
        });
        expect(wide).toBeLessThanOrEqual(0);
      }
      expect(one.faults).toEqual([]);
    } finally {
      await one.close();
    }
  });

  test("at twice the size of letters nothing is cut off either", async () => {
    const one = await place.sheet({ viewport: { width: 1400, height: 900 } });
    try {
      await one.page.addStyleTag({ path: "" }).catch(() => undefined);
      await one.page.evaluate(() => {
        document.documentElement.style.fontSize = "200%";
      });
      await goTo(one.page, "B5");
      await one.page.waitForTimeout(250);
      await screenshotWholePane(one.page, "pane-zoom-200");
      const wide = await one.page.evaluate(() => {
        const page = document.querySelector("#page") as HTMLElement;
        return page.scrollWidth - page.clientWidth;
      });
      expect(wide).toBeLessThanOrEqual(0);
    } finally {
      await one.close();
    }
  });

  test("outside Excel the task pane says so and does no harm", async () => {
    const one = await place.visit("taskpane.html");
    try {
      await one.page.waitForFunction(() => (document.querySelector("#pane")?.textContent ?? "") !== "");
      expect(await one.page.locator("#pane").innerText()).toMatch(/found no Excel/);
    } finally {
      await one.close();
    }
  });

  test("nothing went wrong unseen, nothing left the machine", () => expect(visit.faults).toEqual([]));
});

/** The pane is as long as its content for the picture. */
async function screenshotWholePane(page: Page, name: string): Promise<void> {
  const before = page.viewportSize();
  const height = await page.evaluate(() => {
    const pane = document.querySelector("#pane") as HTMLElement;
    const content = (document.querySelector("#page") as HTMLElement).scrollHeight;
    pane.style.height = `${content + 60}px`;
    return content + 200;
  });
  if (before !== null) await page.setViewportSize({ width: before.width, height: Math.max(before.height, height) });
  await screenshot(page, name, "#pane");
  await page.evaluate(() => (document.querySelector("#pane") as HTMLElement).style.removeProperty("height"));
  if (before !== null) await page.setViewportSize(before);
}
