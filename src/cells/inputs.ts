import type { Fluid } from "../fluids/fluid.js";
import { ownTable } from "../fluids/own-table.js";
import { isProblem, type Problem, valueProblem } from "../quantities/problems.js";
import type { Dimension, Quantity, Reading } from "../quantities/quantity.js";
import { readQuantity } from "../quantities/reading.js";
import type { ArgumentDefinition, FlowKind, Inputs, Surface, Tolerance, Wall } from "../surfaces/surface.js";
import { type CellBlock, isErrorCell, quoted } from "./cell.js";
import { isBlank, isBlankOrZero } from "./cases.js";
import { namedFluid } from "./make-up.js";
import type { Settled } from "./settings.js";

/** The raw cells of one case, before anything is read. */
export interface RawCase {
  readonly fluid: unknown;
  readonly surface: unknown;
  readonly bulk: unknown;
  readonly others: readonly unknown[];
  /** The cells that came from ranges: if all of them are blank or 0 the case is a blank row. */
  readonly fromRanges: readonly unknown[];
}

export type ReadCase =
  | { readonly kind: "blank" }
  | { readonly kind: "error"; readonly code: string; readonly message: string }
  | { readonly kind: "problems"; readonly problems: readonly Problem[] }
  | { readonly kind: "inputs"; readonly inputs: Inputs };

const blank: ReadCase = { kind: "blank" };
const zeroTaken = "A temperature of 0 °C was taken where the cell holds 0 or is blank: check that it is meant.";

/** Is this block a property table of the user's own? Its first row holds the word temperature. */
export function isOwnTable(block: CellBlock): boolean {
  return (block[0] ?? []).some((cell) => typeof cell === "string" && /^\s*temperature\b/i.test(cell));
}

export function readFluid(block: CellBlock, reading: Reading): Fluid | readonly Problem[] {
  const found = ownTable(block, reading);
  if (Array.isArray(found)) return found as readonly Problem[];
  return isProblem(found) ? [found] : (found as Fluid);
}

/** Reads one case of a surface function. */
export function readCase(surface: Surface, raw: RawCase, fluid: Fluid | readonly Problem[] | undefined, settled: Settled): ReadCase {
  const cells = [raw.fluid, raw.surface, raw.bulk, ...raw.others];
  const error = cells.find(isErrorCell);
  if (error !== undefined) return { kind: "error", code: error.code, message: error.message ?? "" };
  if (isBlankCase(surface, raw)) return blank;

  const problems: Problem[] = [];
  const remarks: string[] = [];
  const tolerances: Tolerance[] = [...settled.tolerances];
  const found = fluid ?? namedFluid(raw.fluid, settled);
  if (Array.isArray(found)) problems.push(...(found as readonly Problem[]));
  else if (isProblem(found)) problems.push(found);

  const take = (cell: unknown, dimensions: readonly Dimension[], name: string, key: string): Quantity | undefined => {
    const quantity = readCell(cell, dimensions, name, settled);
    if (isProblem(quantity)) {
      problems.push(quantity);
      return undefined;
    }
    if (quantity.tolerance !== undefined && quantity.tolerance > 0) tolerances.push({ key, name, halfWidth: quantity.tolerance });
    return quantity;
  };
  const takeTemperature = (cell: unknown, dimensions: readonly Dimension[], name: string, key: string): Quantity | undefined => {
    if (isBlankOrZero(cell)) remarks.push(`${name}: ${zeroTaken}`);
    return take(isBlank(cell) ? 0 : cell, dimensions, name, key);
  };

  const wallQuantity = takeTemperature(raw.surface, ["temperature", "heat flux"], surface.wallName, "surface");
  const bulkQuantity = takeTemperature(raw.bulk, ["temperature"], "bulk", "bulk");
  const numbers: Record<string, number> = { ...settled.numbers };
  let flow: FlowKind | undefined;
  surface.arguments.forEach((argument, i) => {
    const cell = raw.others[i];
    if (isBlankOrZero(cell) && argument.optional === true) return;
    const quantity = take(isBlank(cell) ? 0 : cell, argument.dimensions, argument.name, argument.key);
    if (quantity === undefined) return;
    const wrong = wrongSign(argument, quantity);
    if (wrong !== undefined) problems.push(wrong);
    numbers[argument.key] = quantity.value;
    if (argument.key === "flow") flow = quantity.dimension as FlowKind;
  });
  if (flow === "mass flow" && !Array.isArray(found) && (found as Fluid).densityAssumed === true) {
    problems.push(
      valueProblem("fluid", "the property table gives no density, which a mass flow needs; add the column density, or give a speed."),
    );
  }
  if (problems.length > 0) return { kind: "problems", problems };
  const moist = (found as Fluid).atBulk?.((bulkQuantity as Quantity).value, settled.pressure);
  if (moist !== undefined && isProblem(moist)) return { kind: "problems", problems: [moist] };

  const wall = wallQuantity as Quantity;
  const driven: Wall = wall.dimension === "heat flux" ? { kind: "flux", q: wall.value } : { kind: "temperature", T: wall.value };
  const inputs: Inputs = {
    fluid: moist ?? (found as Fluid),
    wall: driven,
    Tb: (bulkQuantity as Quantity).value,
    pressure: settled.pressure,
    gravity: settled.gravity,
    numbers,
    words: settled.words,
    flow,
    radiation:
      settled.emissivity !== undefined && settled.surroundings !== undefined
        ? { emissivity: settled.emissivity, surroundings: settled.surroundings }
        : undefined,
    equation: settled.texts.equation,
    beyondRange: settled.words.beyondRange === "flag" ? "flag" : "refuse",
    bounds: settled.words.bounds === "worst" ? "worst" : "statistical",
    concern: settled.words.concern as Inputs["concern"],
    area: settled.area,
    remarks,
    tolerances,
  };
  const unfit = surface.check?.(inputs);
  return unfit === undefined ? { kind: "inputs", inputs } : { kind: "problems", problems: [unfit] };
}

/** All its broadcast cells blank or 0, or a blank or 0 where zero is impossible: tables can be longer than their data. */
function isBlankCase(surface: Surface, raw: RawCase): boolean {
  if (raw.fromRanges.length > 0 && raw.fromRanges.every(isBlankOrZero)) return true;
  if (isBlank(raw.fluid)) return true;
  return surface.arguments.some(
    (argument, i) => argument.optional !== true && argument.sign === "positive" && isBlankOrZero(raw.others[i]),
  );
}

export function readCell(cell: unknown, dimensions: readonly Dimension[], name: string, settled: Settled): Quantity | Problem {
  if (typeof cell !== "number" && typeof cell !== "string") {
    return valueProblem(name, `${quoted(cell)} is not a quantity; write a number, or text with its unit.`);
  }
  const unit = settled.units.size === 0 ? undefined : settled.units.get(name.toLowerCase());
  return readQuantity(cell, dimensions, unit === undefined ? settled.reading : { ...settled.reading, unit }, name);
}

function wrongSign(argument: ArgumentDefinition, quantity: Quantity): Problem | undefined {
  if (argument.sign === "positive" && !(quantity.value > 0)) {
    return valueProblem(argument.name, `${quoted(quantity.given)} is not above zero; ${argument.describe}.`);
  }
  if (argument.sign === "not negative" && quantity.value < 0) {
    return valueProblem(argument.name, `${quoted(quantity.given)} is below zero; ${argument.describe}.`);
  }
  return undefined;
}
