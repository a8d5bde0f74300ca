// "Surfaces and fluids": everything of the registries is in it, is found, and can be drawn.
import { describe, expect, test } from "vitest";
import { allCorrelations } from "../../src/correlations/index.js";
import { findFluid, shelf } from "../../src/fluids/shelf.js";
import { isProblem } from "../../src/quantities/problems.js";
import { cautionsView } from "../../src/pane/cautions-page.js";
import { surfaceDrawing } from "../../src/pane/drawings/surfaces.js";
import { plotDrawing } from "../../src/pane/drawings/plot.js";
import { fluidNameToUse, fluidPlots, library, searched } from "../../src/pane/library/entries.js";
import { libraryBody } from "../../src/pane/library/view.js";
import { markupOf, textIn } from "../../src/pane/node.js";
import { allSurfaces } from "../../src/surfaces/index.js";

const nothing = new Proxy({}, { get: () => () => undefined }) as never;

test("every surface with every equation that serves it", () => {
  for (const surface of allSurfaces) {
    const entry = library().surfaces.find((one) => one.surface.id === surface.id);
    const serving = allCorrelations.filter((record) => record.serves.includes(surface.id) && record.result === "Nu");
    expect(entry?.equations.map((one) => one.id)).toEqual(serving.map((one) => one.id));
    expect(serving.length, surface.id).toBeGreaterThan(0);
  }
});

test("a folded-out surface shows arguments, equations with ranges and sources", () => {
  const text = libraryBody(
    { search: "", found: searched(library(), "vertical or tilted"), unfolded: new Set(["surface-free-plate"]) },
    nothing,
  )
    .map(textIn)
    .join("\n");
  for (const piece of ["height", "tilt", "Churchill & Chu", "Ra 0.1 to 10¹²", "Heat Mass Transfer", "Scatter"])
    expect(text).toContain(piece);
});

describe("search", () => {
  test.each([
    ["glycol", "fluids", "ethylene glycol"],
    ["zukauskas", "surfaces", "FORCED.CYLINDER"],
    ["R-134a", "fluids", "R134a"],
    ["prandtl", "functions", "PRANDTL"],
  ] as const)("%s finds among %s %s", (search, kind, name) => {
    const found = searched(library(), search);
    const names =
      kind === "fluids"
        ? found.fluids.map((one) => one.entry.name)
        : kind === "surfaces"
          ? found.surfaces.map((one) => one.surface.id)
          : found.functions.map((one) => one.signature.id);
    expect(names.join(" ")).toContain(name);
  });
});

describe("fluids", () => {
  test.each(shelf().map((entry) => [fluidNameToUse(entry)] as const))("%s is a name that the functions know", (name) => {
    expect(isProblem(findFluid(name))).toBe(false);
  });

  test("water is plotted as a liquid: denser than 950 kg/m³ throughout, between 0 and 100 °C", () => {
    const water = shelf().find((entry) => entry.name === "water");
    const [density] = fluidPlots(water as NonNullable<typeof water>);
    if (density === undefined) throw new Error("no plot");
    // IAPWS R7-97: saturated liquid at 1 atm has 958.4 kg/m³, the densest liquid 999.97 kg/m³.
    for (const [T, rho] of density.points) {
      expect(T).toBeGreaterThanOrEqual(0);
      expect(T).toBeLessThanOrEqual(100);
      expect(rho).toBeGreaterThan(957);
      expect(rho).toBeLessThan(1000.1);
    }
    expect(markupOf(plotDrawing(density))).not.toMatch(/NaN|Infinity/);
  });

  test("every fluid folds out without a fault", () => {
    for (const { entry } of library().fluids) {
      for (const plot of fluidPlots(entry)) expect(markupOf(plotDrawing(plot)), entry.name).not.toMatch(/NaN|Infinity/);
    }
  });
});

test("every surface of this version has a drawing of its own", () => {
  const drawings = allSurfaces.map((surface) => {
    const drawing = surfaceDrawing(surface.id);
    expect(drawing, surface.id).toBeDefined();
    return drawing === undefined ? "" : markupOf(drawing);
  });
  expect(new Set(drawings).size).toBe(drawings.length);
  for (const one of drawings) expect(one).not.toMatch(/NaN/);
});

test("the cautions name danger, limits and who must check", () => {
  const text = cautionsView().map(textIn).join("\n");
  for (const piece of [/local codes/i, /licensed practice/i, /burns skin/, /from memory/, /does not know/, /Filmbook \d/])
    expect(text).toMatch(piece);
});
