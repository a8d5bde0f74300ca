// What a person does on the standalone page, in a real browser. Values are asked for by copying a cell, as a person would.
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { answer } from "../../src/cells/answer.js";
import { cellShown, goTo, hasBrowser, openSheet, paneText, Place, ready, type, type Visit, patiently } from "./browser.js";

const number = (text: string): number => Number(text.replace(/[^\d.eE+-]/g, ""));
const plate = (Ts: number, height: number): number =>
  answer("FREE.PLATE", { fluid: [["air"]], surface: [[Ts]], bulk: [[20]], height: [[height]] })[0]?.[0] as number;

describe.runIf(hasBrowser)("the standalone sheet", () => {
  let place: Place;
  let visit: Visit;

  beforeAll(async () => {
    place = await Place.open();
    visit = await place.sheet();
  });
  afterAll(async () => {
    await place?.close();
  });

  test("the first sheet teaches with working results", async () => {
    const { page } = visit;
    expect(number(await cellShown(page, "B5"))).toBeCloseTo(plate(80, 0.3), 2);
    expect(await cellShown(page, "E6")).toBe("in range");
    expect(await cellShown(page, "E14")).toBe("");
    expect(number(await cellShown(page, "H13"))).toBeLessThan(0);
  });

  test("a typed formula answers, and the pane explains it", async () => {
    const { page } = visit;
    await type(page, "B41", '=FILM.FREE.PLATE("air",80,20,0.3)');
    expect(number(await cellShown(page, "B41"))).toBeCloseTo(plate(80, 0.3), 2);
    const text = await paneText(page);
    for (const piece of ["FILM.FREE.PLATE", "In range", "Published range", "Equation", "air at 50 °C", "Rayleigh number", "Cautions"])
      expect(text).toContain(piece);
  });

  test("a formula filled down follows its row", async () => {
    const { page } = visit;
    await goTo(page, "E19");
    await page.keyboard.down("Shift");
    await page.keyboard.press("ArrowDown");
    await page.keyboard.press("ArrowDown");
    await page.keyboard.up("Shift");
    await page.keyboard.press("Control+d");
    await page.waitForTimeout(500);
    const values = [await cellShown(page, "E19"), await cellShown(page, "E20"), await cellShown(page, "E21")].map(number);
    const cylinder = (Ts: number, diameter: number): number =>
      answer("FREE.CYLINDER", { fluid: [["air"]], surface: [[Ts]], bulk: [[35]], diameter: [[diameter]] })[0]?.[0] as number;
    [cylinder(65, 0.012), cylinder(75, 0.012), cylinder(85, 0.02)].forEach((wanted, i) => expect(values[i]).toBeCloseTo(wanted, 1));
  });

  test("words in braces spill to the right, and a cell of the block knows that it is one", async () => {
    const { page } = visit;
    await expect.poll(() => cellShown(page, "E6"), { timeout: 30_000, interval: 500 }).toBe("in range");
    await goTo(page, "C6");
    await expect.poll(() => paneText(page), { timeout: 10_000 }).toContain("part of the block");
  });

  test("a changed input changes what depends on it, in the sheet and in the pane", async () => {
    const { page } = visit;
    const before = number(await cellShown(page, "E10"));
    await type(page, "B10", "60");
    await goTo(page, "E10");
    await page.waitForTimeout(400);
    expect(number(await cellShown(page, "E10"))).toBeCloseTo(plate(60, 1.9), 2);
    expect(number(await cellShown(page, "E10"))).toBeGreaterThan(before);
    expect(await paneText(page)).toContain("60 °C");
  });

  test.each([
    ["a wrong dimension", '=FILM.FREE.PLATE("air",80,20,"0.3 m/s")', "#VALUE!", /is a speed; a length is needed/],
    ["an unknown fluid", '=FILM.FREE.PLATE("watr",80,20,0.3)', "#VALUE!", /watr/],
    ["an unknown word", '=FILM.FREE.PLATE("air",80,20,0.3,"verdct")', "#VALUE!", /verdct/],
    ["an unknown setting", '=FILM.FREE.PLATE("air",80,20,0.3,"h","presure=2 bar")', "#VALUE!", /presure/],
    ["shapes that do not fit", '=FILM.FREE.PLATE("air",{40;60},20,{0.3;0.6;0.9})', "#VALUE!", /3 rows.*2/],
    ["out of range", '=FILM.FREE.PLATE("water",60,20,30)', "#N/A", /is above/],
    ["a fluid that would boil", '=FILM.FREE.PLATE("water",160,20,0.3)', "#N/A", /boil/i],
    ["an error cell among the inputs", '=FILM.FREE.PLATE("air",1/0,20,0.3)', "#DIV/0!", /.*/],
  ])("%s", async (_, formula, code, sentence) => {
    const { page } = visit;
    await type(page, "B45", formula);
    await patiently(() => cellShown(page, "B45")).toBe(code);
    await goTo(page, "B45");
    await page.waitForTimeout(300);
    expect(await paneText(page)).toMatch(sentence);
  });

  test("the offered change mends the formula, and undo takes it back", async () => {
    const { page } = visit;
    await type(page, "B45", '=FILM.FREE.PLATE("air",80,20,"0.3 m/s")');
    await goTo(page, "B45");
    await page.locator("#mend-0").click();
    await page.waitForFunction(() => document.querySelector("#pane .verdict")?.classList.contains("good"));
    await page
      .locator("#sheet canvas")
      .first()
      .focus()
      .catch(() => undefined);
    await page.keyboard.press("Control+z");
    await page.waitForFunction(() => document.querySelector("#pane .problems") !== null);
  });

  test("typing a name offers the function with what it is and its arguments", async () => {
    const { page } = visit;
    await goTo(page, "B47");
    await page.keyboard.type("=FILM.FREE.PL", { delay: 15 });
    await page.waitForTimeout(600);
    expect(await page.locator("body").innerText()).toMatch(/FILM\.FREE\.PLATE[\s\S]*vertical or tilted plate/i);
    await page.keyboard.type('ATE("air",', { delay: 15 });
    await page.waitForTimeout(600);
    expect(await page.locator("body").innerText()).toMatch(/surface[\s\S]*bulk[\s\S]*height/);
    await page.keyboard.press("Escape");
    await page.keyboard.press("Escape");
  });

  test("every sheet of the prepared workbook opens without an error but those meant to be shown", async () => {
    const { page } = visit;
    for (const [sheet, cell] of [
      ["Faces", "F5"],
      ["Charger", "E5"],
      ["Cooling loop", "F5"],
      ["h against T", "B5"],
      ["Compare and look up", "B23"],
    ] as const) {
      await openSheet(page, sheet);
      expect(number(await cellShown(page, cell)), sheet).toBeGreaterThan(0);
    }
    await openSheet(page, "Start here");
  });

  test("a reload keeps what was typed; starting again brings the example back", async () => {
    const { page } = visit;
    await type(page, "B49", "kept across a reload");
    await page.waitForFunction(() => document.querySelector("#kept")?.textContent === "Kept in this browser");
    await page.reload();
    await ready(page);
    expect(await cellShown(page, "B49")).toBe("kept across a reload");
    expect(number(await cellShown(page, "E10"))).toBeCloseTo(plate(60, 1.9), 2);

    await page.locator("#reset").click();
    await page.locator("#reset-dialog button[value=no]").click();
    expect(await cellShown(page, "B49")).toBe("kept across a reload");
    await page.locator("#reset").click();
    await Promise.all([page.waitForEvent("load"), page.locator("#reset-dialog button[value=yes]").click()]);
    await ready(page);
    expect(await cellShown(page, "B49")).toBe("");
    expect(await cellShown(page, "B10")).toBe("38");
  });

  test("nothing went wrong unseen, nothing left the machine", () => {
    expect(visit.faults).toEqual([]);
  });
});
