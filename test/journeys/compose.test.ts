// Composing a formula with the form, a table, an edit of what is there; the library and the cautions. In a real browser.
import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { answer } from "../../src/cells/answer.js";
import { axeFinds, cellShown, goTo, hasBrowser, Place, screenshot, type Visit, patiently } from "./browser.js";

const plate = (Ts: number, height: number): number =>
  answer("FREE.PLATE", { fluid: [["air"]], surface: [[Ts]], bulk: [[20]], height: [[height]] })[0]?.[0] as number;

describe.runIf(hasBrowser)("pages of the pane", () => {
  let place: Place;
  let visit: Visit;
  const axe = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");

  beforeAll(async () => {
    place = await Place.open();
    visit = await place.sheet();
  });
  afterAll(async () => {
    await place?.close();
  });

  test("a function is chosen by drawing, filled in with a result beside it, and inserted; undo takes it back", async () => {
    const { page } = visit;
    await goTo(page, "B60");
    await page.locator("#tab-new-formula").click();
    expect(await axeFinds(page, axe)).toEqual([]);
    await screenshot(page, "page-choose", "#pane");
    await page.locator("#choose-free-plate").click();
    await page.locator("#box-height").fill("");
    await page.locator("#box-height").pressSequentially("450", { delay: 20 });
    await page.locator("#box-height-unit").selectOption("mm");
    await patiently(() => page.locator("#compose-live").innerText()).toMatch(/4\.4\d+ W/);
    expect(await page.locator("#compose-text").innerText()).toBe('=FILM.FREE.PLATE("air",80,20,"450 mm")');
    expect(await axeFinds(page, axe)).toEqual([]);
    await screenshot(page, "page-form", "#pane");
    await page.locator("#insert").click();
    await page.locator("#tab-this-cell").click();
    await patiently(async () => Number(await cellShown(page, "B60"))).toBeCloseTo(plate(80, 0.45), 4);
    await page.keyboard.press("Control+z");
    await patiently(() => cellShown(page, "B60")).toBe("");
  });

  test("a fault stands under the box that it is about", async () => {
    const { page } = visit;
    await page.locator("#tab-new-formula").click();
    await page.locator("#choose-forced-cylinder").click();
    await page.locator("#box-speed").fill("3 m");
    await patiently(() => page.locator("#fault-speed").innerText()).toMatch(/is a length; a speed/);
    await page.locator("#box-speed").fill("3");
    await patiently(() => page.locator("#fault-speed").innerText()).toBe("");
  });

  test("cells are taken from the sheet, and a block beside them answers for all", async () => {
    const { page } = visit;
    await page.locator("#tab-this-cell").click();
    await goTo(page, "B25");
    await page.keyboard.down("Shift");
    for (let i = 0; i < 3; i++) await page.keyboard.press("ArrowDown");
    await page.keyboard.up("Shift");
    await page.locator("#tab-new-formula").click();
    await page.locator("#choose-free-plate").click();
    await page.waitForTimeout(200);
    await page.locator("#box-surface-take").click();
    expect(await page.locator("#box-surface").inputValue()).toBe("B25:B28");
    await patiently(() => page.locator("#compose-live").innerText()).toMatch(/W\/\(m²·K\)/);
  });

  test("a table of cases is written with its head row and answers", async () => {
    const { page } = visit;
    await page.locator("#tab-this-cell").click();
    await goTo(page, "B62");
    await page.locator("#tab-new-formula").click();
    await page.locator("#choose-free-plate").click();
    await page.locator("#vary-from").fill("30");
    await page.locator("#vary-to").fill("80");
    await page.locator("#vary-count").fill("6");
    await patiently(() => page.locator("#insert-table").innerText()).toContain("B62");
    await page.locator("#insert-table").click();
    await page.locator("#tab-this-cell").click();
    await patiently(async () => Number(await cellShown(page, "E68"))).toBeCloseTo(plate(80, 0.3), 4);
    expect(await cellShown(page, "B62")).toBe("surface [°C]");
    await page.locator("#tab-new-formula").click();
    await page.locator("#choose-free-plate").click();
    await page.locator("#insert-table").click();
    await patiently(() => page.locator("#table-ask").innerText()).toMatch(/something in/);
  });

  test("an existing formula is opened in the form and changed in its place, what stands around it kept", async () => {
    const { page } = visit;
    await page.locator("#tab-this-cell").click();
    await goTo(page, "D60");
    await page.keyboard.type('=2*FILM.FREE.PLATE("air",80,20,0.3)', { delay: 4 });
    await page.waitForTimeout(250);
    await page.keyboard.press("Tab");
    await goTo(page, "D60");
    await page.locator("#edit").click();
    expect(await page.locator("#box-height").inputValue()).toBe("0.3");
    await page.locator("#box-height").fill("0.6");
    await patiently(() => page.locator("#compose-text").innerText()).toContain("0.6");
    await page.locator("#insert").click();
    await page.locator("#tab-this-cell").click();
    await patiently(async () => Number(await cellShown(page, "D60"))).toBeCloseTo(2 * plate(80, 0.6), 4);
  });

  test("the library is searched, an entry folded out, and used", async () => {
    const { page } = visit;
    await page.locator("#tab-library").click();
    await page.locator("#library-search").fill("glycol");
    await patiently(() => page.locator("#library-body").innerText()).toMatch(/ethylene glycol/);
    await page.locator("#fluid-ethylene-glycol > summary").first().click();
    await page.locator("#fluid-ethylene-glycol .plot").first().waitFor();
    expect(await axeFinds(page, axe)).toEqual([]);
    await screenshot(page, "page-library", "#pane");
    await page.locator("#use-fluid-ethylene-glycol").first().click();
    await page.locator("#choose-duct-tube").click();
    expect(await page.locator("#box-fluid").inputValue()).toBe("ethylene glycol 40 %");
  });

  test("the cautions are there to be read", async () => {
    const { page } = visit;
    await page.locator("#tab-cautions").click();
    expect(await page.locator("#pane").innerText()).toMatch(/Local codes and licensed practice come first/);
    expect(await axeFinds(page, axe)).toEqual([]);
    await screenshot(page, "page-cautions", "#pane");
  });

  test.each([
    [280, "light"],
    [320, "dark"],
    [600, "light"],
    [1400, "dark"],
  ] as const)("every page fits at %d px, %s", async (width, colorScheme) => {
    const one = await place.sheet({ viewport: { width, height: 1000 }, colorScheme });
    try {
      for (const tab of ["new-formula", "library", "cautions"] as const) {
        await one.page.locator(`#tab-${tab}`).click();
        await one.page.waitForTimeout(200);
        const heading = {
          "new-formula": "New formula",
          library: "Surfaces and fluids",
          cautions: "What these numbers are, and what they are not",
        }[tab];
        expect(await one.page.locator("#page-title").innerText()).toBe(heading);
        if (tab === "library") await one.page.locator("#surface-free-plate > summary").click();
        await one.page.waitForTimeout(200);
        await screenshot(one.page, `${tab}-${width}-${colorScheme}`);
        const wide = await one.page.evaluate(() => {
          const content = document.querySelector("#page") as HTMLElement;
          return content.scrollWidth - content.clientWidth;
        });
        expect(wide, tab).toBeLessThanOrEqual(0);
      }
      expect(one.faults).toEqual([]);
    } finally {
      await one.close();
    }
  });

  test("nothing went wrong unseen, nothing left the machine", () => expect(visit.faults).toEqual([]));
});
