// Whatever a sheet hands over, a cell function answers with a rectangular block of numbers, texts and errors that carry
// a sentence. Fails on an exception, NaN, Infinity, an error without a sentence, or a number out of range without its mark.
import fc from "fast-check";
import { expect, test } from "vitest";
import { answer, type Arguments } from "../../src/cells/answer.js";
import { CellError, type CellValue } from "../../src/cells/cell.js";
import { keyOfName } from "../../src/cells/cases.js";
import { argumentNames } from "../../src/cells/surface-call.js";
import { stateFunctions } from "../../src/cells/state-functions.js";
import { allSurfaces } from "../../src/surfaces/index.js";

const signatures: readonly (readonly [id: string, names: readonly string[]])[] = [
  ...allSurfaces.map((surface) => [surface.id, argumentNames(surface)] as const),
  ...stateFunctions.map(
    (one) => [one.id, [...(one.takesFluid ? ["fluid"] : []), ...one.arguments.map((argument) => argument.name)]] as const,
  ),
  ["FLUID", ["fluid", "temperature"]],
  ["UNIT", ["value", "from", "to"]],
  ["LIST", ["what", "filter"]],
];

const texts = [
  "air",
  "water",
  "",
  " ",
  "72 degF",
  "20 ± 2 °C",
  "500 W/m2",
  "-500 W/m2",
  "0.4 kg/s",
  "3 in",
  "12,5 mm",
  "5-7",
  "1e400",
  "°C",
  "h",
  "verdict",
  "trace",
  "all",
  "compare",
  "fluids",
  "=1+1",
  "'",
  "±",
  "99999999 m",
  "0 K",
  "-300 °C",
  "m",
  "\u0000",
  "temperature [°C]",
];
const cell = fc.oneof(
  fc.constantFrom<unknown>(...texts),
  fc.constantFrom<unknown>(
    0,
    -1,
    1e-300,
    1e300,
    20,
    80,
    0.3,
    5,
    Number.NaN,
    Number.POSITIVE_INFINITY,
    Number.MAX_VALUE,
    null,
    undefined,
    true,
    false,
  ),
  fc.constantFrom<unknown>({ code: "#DIV/0!" }, { code: "#N/A", message: "gone" }),
  fc.double({ noNaN: true, min: -1e4, max: 1e4 }),
  fc.string({ maxLength: 12 }),
);
const block = fc.oneof(
  { weight: 4, arbitrary: cell.map((one) => [[one]]) },
  {
    weight: 1,
    arbitrary: fc
      .tuple(fc.integer({ min: 1, max: 3 }), fc.integer({ min: 1, max: 3 }))
      .chain(([rows, columns]) =>
        fc.array(fc.array(cell, { minLength: columns, maxLength: columns }), { minLength: rows, maxLength: rows }),
      ),
  },
  { weight: 1, arbitrary: fc.constant(null) },
);
const give = fc.oneof(
  block,
  fc.constantFrom(
    [["h", "verdict", "Ra [-]", "q [Btu/(h·ft²)]", "cautions"]],
    [["h low"], ["h high"]],
    [["trace"]],
    [["compare"]],
    [["all"]],
    null,
  ),
);
const settings = fc.oneof(
  block,
  fc.constantFrom(
    null,
    [["beyond range=flag"]],
    [["pressure=2 bar; units=US"]],
    [["equation=Churchill"]],
    [["tilt", 30]],
    [["emissivity=0.9; surroundings=20"]],
    [["position=0.1"]],
  ),
);

test.each(signatures)("FILM.%s answers anything with a proper block", (id, names) => {
  fc.assert(
    fc.property(fc.array(block, { minLength: names.length, maxLength: names.length }), give, settings, (blocks, asked, set) => {
      const args: Record<string, unknown[][] | null> = {};
      names.forEach((name, i) => {
        args[keyOfName(name)] = blocks[i] as unknown[][] | null;
      });
      checkBlock(answer(id, args as Arguments, asked as unknown[][] | null, set as unknown[][] | null));
    }),
    { numRuns: 150, seed: 20261201 },
  );
});

function checkBlock(cells: CellValue[][]): void {
  expect(cells.length).toBeGreaterThan(0);
  const width = cells[0]?.length;
  for (const row of cells) {
    expect(row.length).toBe(width);
    for (const one of row) checkCell(one);
  }
}

function checkCell(one: CellValue): void {
  if (typeof one === "number") expect(Number.isFinite(one)).toBe(true);
  else if (one instanceof CellError) {
    // Errors of the sheet's own pass through as they came; ours must say something, and never be a fault of the code.
    if (one.code === "#VALUE!" || one.code === "#N/A") expect(one.message).not.toMatch(/fault of its own|undefined|\bNaN\b|\[object/);
  } else if (typeof one === "string") expect(one).not.toMatch(/\bNaN\b|undefined|\[object|Infinity/);
  else expect(typeof one).toBe("boolean");
}

const sensible = fc.record({
  surface: fc.double({ min: -20, max: 400, noNaN: true }),
  bulk: fc.double({ min: -20, max: 200, noNaN: true }),
  size: fc.double({ min: -6, max: 2, noNaN: true }),
  speed: fc.double({ min: -4, max: 2.5, noNaN: true }),
});

test.each(allSurfaces.map((surface) => [surface.id, surface] as const))(
  "FILM.%s never passes an unmarked number off as in range",
  (id, surface) => {
    fc.assert(
      fc.property(sensible, fc.constantFrom("air", "water"), fc.boolean(), (one, fluid, flag) => {
        const args: Record<string, unknown[][]> = { fluid: [[fluid]], [surface.wallName]: [[one.surface]], bulk: [[one.bulk]] };
        for (const argument of surface.arguments) {
          if (argument.optional !== true) args[keyOfName(argument.name)] = [[argument.key === "flow" ? 10 ** one.speed : 10 ** one.size]];
        }
        const [[h, low, high, verdict] = []] = answer(
          id,
          args,
          [["h", "h low", "h high", "verdict"]],
          flag ? [["beyond range=flag"]] : null,
        );
        expect(typeof verdict).toBe("string");
        if (typeof h !== "number") return;
        expect(h).toBeGreaterThanOrEqual(0);
        expect(low as number).toBeLessThanOrEqual(h);
        expect(high as number).toBeGreaterThanOrEqual(h);
        if (!flag) expect(verdict).toMatch(/^(in range|no driving difference)/);
      }),
      { numRuns: 150, seed: 20261201 },
    );
  },
);
