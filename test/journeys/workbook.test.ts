// The whole workbook in a real browser: what is wrong stands first, a result is jumped to, boundary conditions are saved and written.
import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { axeFinds, cellShown, goTo, hasBrowser, Place, screenshot, type Visit, patiently } from "./browser.js";

const axe = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");

describe.runIf(hasBrowser)("the whole workbook", () => {
  let place: Place;
  let visit: Visit;

  beforeAll(async () => {
    place = await Place.open();
    visit = await place.sheet();
    await visit.page.locator("#tab-workbook").click();
    await visit.page.locator("#scan-again").waitFor();
  });
  afterAll(async () => {
    await place?.close();
  });

  test("every result is listed, the worst first, and axe finds nothing", async () => {
    const { page } = visit;
    expect(await page.locator("#row-0").innerText()).toContain("'Start here'!B34");
    expect(await page.locator("#workbook-body").innerText()).toMatch(/\d\d results read/);
    expect(await axeFinds(page, axe)).toEqual([]);
    await screenshot(page, "page-workbook", "#pane");
  });

  test("filters by verdict and by words", async () => {
    const { page } = visit;
    await page.locator("#kind-good").uncheck();
    await page.locator("#kind-remark").uncheck();
    expect(await page.locator(".scanned > li").count()).toBe(4);
    await page.locator("#kind-good").check();
    await page.locator("#workbook-search").fill("cooling tube");
    await patiently(() => page.locator("#row-0").innerText()).toContain("Cooling loop");
    await page.locator("#workbook-search").fill("");
  });

  test("a result is jumped to, on whatever sheet it stands", async () => {
    const { page } = visit;
    await page.locator("#workbook-search").fill("charger forced");
    await patiently(() => page.locator("#row-0").innerText()).toContain("Charger!");
    const address = /Charger!([A-Z]+\d+)/.exec(await page.locator("#row-0").innerText())?.[1] ?? "";
    await page.locator("#row-0").click();
    await page.locator("#tab-this-cell").click();
    await patiently(() => page.locator("#pane .where").innerText()).toContain(`Charger!${address}`);
    await page.locator("#tab-workbook").click();
    await page.locator("#scan-again").waitFor();
  });

  test("boundary conditions are saved as comma-separated values", async () => {
    const { page } = visit;
    const [file] = await Promise.all([page.waitForEvent("download"), page.locator("#save-boundaries").click()]);
    const text = readFileSync(await file.path(), "utf8");
    expect(text.split("\r\n")[0]).toBe(
      "cell,function,fluid,area [m²],h low [W/(m²·K)],h [W/(m²·K)],h high [W/(m²·K)],reference temperature [°C],verdict",
    );
    expect(text).toMatch(/'Start here'!B5,FILM\.FREE\.PLATE,air,/);
    const [tables] = await Promise.all([page.waitForEvent("download"), page.locator("#save-tables").click()]);
    expect(readFileSync(await tables.path(), "utf8").split("\r\n").length).toBeGreaterThan(100);
  });

  test("and written to the sheet, over blank cells only", async () => {
    const { page } = visit;
    await page.locator("#tab-this-cell").click();
    await goTo(page, "P100");
    await page.locator("#tab-workbook").click();
    await page.locator("#scan-again").waitFor();
    await page.locator("#write-boundaries").click();
    await patiently(() => page.locator("#pane .says").innerText()).toMatch(/Written into/);
    await page.locator("#write-boundaries").click();
    await patiently(() => page.locator("#boundaries-ask").innerText()).toMatch(/something in/);
    await page.locator("#tab-this-cell").click();
    expect(await cellShown(page, "P100")).toBe("cell");
  });

  test("nothing went wrong unseen, nothing left the machine", () => expect(visit.faults).toEqual([]));
});
