// Whole blocks and refusals as data, run through the built bundle: where each answer lands, which cells stay blank or hold
// an error, and the words of the sentence. Numbers stand only where a definition gives them. Fails where a shape, a blank,
// an error's row or a sentence is not the one that workbooks rely on.
import { describe, expect, test } from "vitest";
import { loadBundle, PlatformError } from "./bundle.js";
import { type Grid, runFormula } from "./formula.js";
import refusals from "./refusals.json" with { type: "json" };
import tables from "./tables.json" with { type: "json" };

const { functions } = loadBundle();

/** A number, a text, any value of a type, or an error of a code. */
type Expected = number | string | { readonly a: string } | { readonly error: string };

interface Table {
  readonly formula: string;
  readonly grid?: Grid;
  readonly why: string;
  readonly block: readonly (readonly Expected[])[];
}

interface Refusal {
  readonly formula: string;
  readonly grid?: Grid;
  readonly code: string;
  readonly says: string;
}

function answerTo(formula: string, grid?: Grid): readonly (readonly unknown[])[] {
  return runFormula(formula, (id, args) => functions[id]?.(...args) ?? [], grid);
}

function expectCell(cell: unknown, expected: Expected): void {
  if (typeof expected === "number") {
    expect(typeof cell).toBe("number");
    expect(Math.abs((cell as number) - expected)).toBeLessThanOrEqual(1e-12 * Math.abs(expected));
  } else if (typeof expected === "string") expect(cell).toBe(expected);
  else if ("a" in expected) expect(typeof cell).toBe(expected.a);
  else {
    expect(cell).toBeInstanceOf(PlatformError);
    expect((cell as PlatformError).code).toBe(expected.error);
  }
}

describe("blocks", () => {
  test.each((tables as readonly Table[]).map((one) => [one.formula, one] as const))("%s", (formula, { grid, block }) => {
    const cells = answerTo(formula, grid);
    expect(cells.map((row) => row.length)).toEqual(block.map((row) => row.length));
    block.forEach((row, i) => {
      row.forEach((expected, j) => {
        expectCell(cells[i]?.[j], expected);
      });
    });
  });
});

describe("refusals", () => {
  test.each((refusals as readonly Refusal[]).map((one) => [one.formula, one] as const))("%s", (formula, { grid, code, says }) => {
    const [[cell] = []] = answerTo(formula, grid);
    expect(cell).toBeInstanceOf(PlatformError);
    expect((cell as PlatformError).code).toBe(code);
    expect((cell as PlatformError).message).toContain(says);
  });
});
