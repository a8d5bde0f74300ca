/**
 * The user's own property table: a range whose first row names the columns. One row is a fluid of constant properties, several are
 * interpolated by a monotone cubic (viscosity in its logarithm) and refused outside.
 */
import { coverageProblem, isProblem, type Problem, valueProblem } from "../quantities/problems.js";
import type { Quantity, Reading } from "../quantities/quantity.js";
import { readQuantity } from "../quantities/reading.js";
import type { Fluid, Phase, Saturation, State, Uncertainty } from "./fluid.js";
import { type Interpolant, monotone } from "./interpolation.js";
import { type Column, type ColumnName, columnKinds, columnOf } from "./own-table-columns.js";
import { completeRow, type PropertyRow } from "./own-table-row.js";
import { impossible, isBelow, sayTemperature } from "./refusal.js";
import { type Coarseness, coarseness } from "./table-spacing.js";

export interface OwnTableSettings {
  /** What messages and lists call it; "own table" when absent. */
  readonly name?: string;
}

/** The fluid of a table, or everything that is wrong with it. */
export function ownTable(
  cells: readonly (readonly unknown[])[],
  reading: Reading,
  settings: OwnTableSettings = {},
): Fluid | readonly Problem[] {
  const trimmed = trim(cells);
  const columns = readColumns(trimmed[0] ?? []);
  if (isProblemList(columns)) return columns;
  const rows = readRows(trimmed.slice(1), columns, reading);
  if (isProblemList(rows)) return rows;
  const ordered = inOrder(rows, columns);
  if (isProblemList(ordered)) return ordered;
  const solved = solveRows(ordered, columns);
  if (isProblemList(solved)) return solved;
  const change = readPhaseChange(ordered, columns);
  if (change !== undefined && isProblemList(change)) return change;
  return fluidOf(solved, change, settings.name ?? "own table", toleranceOf(ordered));
}

/** Whether a range is a property table: its first row holds the word temperature, or enough headers for a fluid. */
export function looksLikeTable(cells: readonly (readonly unknown[])[]): boolean {
  const first = cells[0] ?? [];
  return first.some((cell) => typeof cell === "string" && /^\s*temperature\b/i.test(cell));
}

type Row = { readonly number: number; readonly values: Partial<Record<ColumnName, Quantity>> };

function isProblemList(thing: unknown): thing is readonly Problem[] {
  return Array.isArray(thing) && thing.length > 0 && isProblem(thing[0]);
}

// ---- reading -------------------------------------------------------------------------------------------------------------------------

function isBlank(cell: unknown): boolean {
  return cell === undefined || cell === null || (typeof cell === "string" && cell.trim() === "");
}

/** Without blank rows and columns at the end. A blank numeric cell may reach us as 0, so a row of nothing but blanks and zeros is one. */
function trim(cells: readonly (readonly unknown[])[]): readonly (readonly unknown[])[] {
  const width = (cells[0] ?? []).reduce<number>((last, cell, k) => (isBlank(cell) ? last : k + 1), 0);
  const rows = cells.map((row) => row.slice(0, width));
  let height = rows.length;
  while (height > 1 && (rows[height - 1] as readonly unknown[]).every((cell) => isBlank(cell) || cell === 0)) height--;
  return rows.slice(0, height);
}

function readColumns(header: readonly unknown[]): readonly Column[] | readonly Problem[] {
  const problems: Problem[] = [];
  const columns: Column[] = [];
  header.forEach((cell, at) => {
    if (isBlank(cell)) return;
    const column =
      typeof cell === "string"
        ? columnOf(cell, at)
        : valueProblem("fluid", `The table's header ${nameOfColumn(at)} is not text; headers are names with a unit in brackets.`);
    if (isProblem(column)) problems.push(column);
    else if (columns.some((other) => other.name === column.name))
      problems.push(valueProblem("fluid", `The table has two columns for ${column.name}; keep one.`));
    else columns.push(column);
  });
  if (problems.length > 0) return problems;
  if (columns.length === 0)
    return [valueProblem("fluid", 'The table has no header row; its first row must name the columns, such as "temperature [°C]".')];
  return columns;
}

/** Column in the table, counted from A at its left edge. */
function nameOfColumn(at: number): string {
  return `in column ${at + 1}`;
}

function readRows(
  cells: readonly (readonly unknown[])[],
  columns: readonly Column[],
  reading: Reading,
): readonly Row[] | readonly Problem[] {
  if (cells.length === 0) return [valueProblem("fluid", "The table has headers but no row of values.")];
  const problems: Problem[] = [];
  const single = cells.length === 1;
  const rows = cells.map((row, k) => {
    const values: Partial<Record<ColumnName, Quantity>> = {};
    for (const column of columns) {
      const cell = row[column.at];
      const quantity = readCell(cell, column, k + 2, reading, single);
      if (quantity === undefined) continue;
      if (isProblem(quantity)) problems.push(quantity);
      else values[column.name] = quantity;
    }
    return { number: k + 2, values };
  });
  return problems.length > 0 ? problems : rows;
}

/** Columns that may stay blank in some rows. */
const sparse: ReadonlySet<ColumnName> = new Set([
  "saturation temperature",
  "latent heat",
  "surface tension",
  "vapour density",
  "vapour cp",
  "vapour conductivity",
  "vapour viscosity",
]);

function readCell(cell: unknown, column: Column, row: number, reading: Reading, single: boolean): Quantity | Problem | undefined {
  const where = `the table's ${column.name} in row ${row}`;
  if (isBlank(cell)) {
    if (sparse.has(column.name) || single) return undefined;
    return valueProblem("fluid", `There is a gap: ${where} is blank. Fill it, or leave the row out.`);
  }
  if (isErrorCell(cell)) return valueProblem("fluid", `There is an error value in the table: ${where}.`);
  if (typeof cell !== "number" && typeof cell !== "string") return valueProblem("fluid", `A number is needed for ${where}.`);
  const kind = columnKinds[column.name];
  const quantity = readQuantity(cell, kind.dimension, column.unit === undefined ? reading : { ...reading, unit: column.unit }, "fluid");
  if (isProblem(quantity)) return { ...quantity, sentence: `In row ${row} of the table, ${column.name}: ${quantity.sentence}` };
  if (!kind.signed && quantity.value <= 0) return valueProblem("fluid", `${capital(where)} is ${cell}; it must be above zero.`);
  if (kind.dimension === "temperature" && quantity.value <= 0)
    return valueProblem("fluid", `${capital(where)} is at or below absolute zero.`);
  return quantity;
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

function isErrorCell(cell: unknown): boolean {
  if (typeof cell === "object" && cell !== null) return true;
  return typeof cell === "string" && /^#(?:N\/A|VALUE!|REF!|DIV\/0!|NUM!|NAME\?|NULL!|SPILL!|CALC!|BUSY!|GETTING_DATA)/i.test(cell.trim());
}

// ---- order ---------------------------------------------------------------------------------------------------------------------------

function inOrder(rows: readonly Row[], columns: readonly Column[]): readonly Row[] | readonly Problem[] {
  if (rows.length === 1) return rows;
  if (!columns.some((column) => column.name === "temperature")) {
    return [valueProblem("fluid", 'A table of several rows needs a column "temperature".')];
  }
  const first = temperatureOf(rows[0] as Row);
  const rising = first <= temperatureOf(rows[rows.length - 1] as Row);
  const ordered = rising ? rows : [...rows].reverse();
  for (let k = 1; k < ordered.length; k++) {
    const before = ordered[k - 1] as Row;
    const here = ordered[k] as Row;
    const step = temperatureOf(here) - temperatureOf(before);
    const [earlier, later] = rising ? [before, here] : [here, before];
    if (step === 0)
      return [
        valueProblem(
          "fluid",
          `The table's rows ${earlier.number} and ${later.number} have the same temperature, ${sayTemperature(temperatureOf(here))}; keep one.`,
        ),
      ];
    if (step < 0) {
      return [
        valueProblem(
          "fluid",
          `The table's temperatures are out of order: ${sayTemperature(temperatureOf(earlier))} in row ${earlier.number}, then ${sayTemperature(temperatureOf(later))} in row ${later.number}. Sort the rows by temperature.`,
        ),
      ];
    }
  }
  return ordered;
}

function temperatureOf(row: Row): number {
  return row.values.temperature?.value ?? Number.NaN;
}

// ---- properties ----------------------------------------------------------------------------------------------------------------------

interface Solved {
  readonly temperatures: readonly number[];
  readonly rows: readonly PropertyRow[];
  readonly densityGiven: boolean;
  readonly cautions: readonly string[];
}

function solveRows(rows: readonly Row[], columns: readonly Column[]): Solved | readonly Problem[] {
  const problems: Problem[] = [];
  const solved: PropertyRow[] = [];
  const cautions: string[] = [];
  for (const row of rows) {
    const value = (name: ColumnName): number | undefined => row.values[name]?.value;
    const complete = completeRow({
      density: value("density"),
      cp: value("cp"),
      conductivity: value("conductivity"),
      viscosity: value("viscosity"),
      kinematicViscosity: value("kinematic viscosity"),
      Pr: value("Pr"),
      diffusivity: value("diffusivity"),
      expansivity: value("expansivity"),
    });
    if (typeof complete === "string") {
      problems.push(
        valueProblem("fluid", `The table is not sufficient: ${complete}. It has ${columns.map((column) => column.name).join(", ")}.`),
      );
      return problems;
    }
    if (complete.contradiction > 0.1) {
      problems.push(
        valueProblem(
          "fluid",
          `Row ${row.number} of the table contradicts itself by ${Math.round(100 * complete.contradiction)} %: its ${complete.contradicting} does not follow from its other columns. Check the units.`,
        ),
      );
    } else if (complete.contradiction > 0.03) {
      cautions.push(
        `Row ${row.number} of the table: ${complete.contradicting} differs by ${Math.round(100 * complete.contradiction)} % from what the other columns give; the others are used.`,
      );
    }
    solved.push(complete);
  }
  if (problems.length > 0) return problems;
  return { temperatures: rows.map(temperatureOf), rows: solved, densityGiven: solved.every((row) => row.densityGiven), cautions };
}

/** Relative tolerance that the cells themselves carry (`"0.6 ± 2 %"`), the largest of each column. */
function toleranceOf(rows: readonly Row[]): (name: ColumnName) => number {
  return (name) =>
    Math.max(
      0,
      ...rows.map((row) => {
        const quantity = row.values[name];
        return quantity?.tolerance === undefined || quantity.value === 0 ? 0 : Math.abs(quantity.tolerance / quantity.value);
      }),
    );
}

// ---- change of phase -----------------------------------------------------------------------------------------------------------------

interface PhaseChange {
  readonly temperature: number;
  readonly latentHeat: number;
  readonly surfaceTension: number | undefined;
  readonly vapour:
    | { readonly density: number; readonly cp?: number; readonly conductivity?: number; readonly viscosity?: number }
    | undefined;
}

function readPhaseChange(rows: readonly Row[], columns: readonly Column[]): PhaseChange | readonly Problem[] | undefined {
  const given = columns.map((column) => column.name).filter((name) => sparse.has(name) && rows.some((row) => row.values[name]));
  if (given.length === 0) return undefined;
  const temperatures = new Set(rows.flatMap((row) => row.values["saturation temperature"]?.value ?? []));
  if (temperatures.size !== 1) {
    const fault = temperatures.size === 0 ? "no saturation temperature" : "several saturation temperatures";
    return [
      valueProblem(
        "fluid",
        `The table has columns for change of phase (${given.join(", ")}) but ${fault}; give one, the same in every row or in one row only.`,
      ),
    ];
  }
  const temperature = [...temperatures][0] as number;
  const at = (name: ColumnName): number | undefined => valueAt(rows, name, temperature);
  const latentHeat = at("latent heat");
  if (latentHeat === undefined) return [valueProblem("fluid", 'For change of phase the table needs a column "latent heat" too.')];
  const density = at("vapour density");
  const cp = at("vapour cp");
  const conductivity = at("vapour conductivity");
  const viscosity = at("vapour viscosity");
  const vapour =
    density === undefined
      ? undefined
      : {
          density,
          ...(cp !== undefined && { cp }),
          ...(conductivity !== undefined && { conductivity }),
          ...(viscosity !== undefined && { viscosity }),
        };
  return { temperature, latentHeat, surfaceTension: at("surface tension"), vapour };
}

/** The one value of a column, or its value at saturation where the rows differ. */
function valueAt(rows: readonly Row[], name: ColumnName, T: number): number | undefined {
  const filled = rows.filter((row) => row.values[name]);
  const ys = filled.map((row) => row.values[name]?.value as number);
  if (ys.length < 2) return ys[0];
  if (ys.every((y) => y === ys[0])) return ys[0];
  const xs = filled.map(temperatureOf);
  const inside = Math.min(Math.max(T, xs[0] as number), xs[xs.length - 1] as number);
  return monotone(xs, ys).at(inside);
}

// ---- the fluid -----------------------------------------------------------------------------------------------------------------------

interface Curves {
  density(T: number): number;
  cp(T: number): number;
  conductivity(T: number): number;
  viscosity(T: number): number;
  expansivity(T: number): number | undefined;
}

function curvesOf(solved: Solved): Curves {
  const [first] = solved.rows as readonly [PropertyRow, ...PropertyRow[]];
  if (solved.rows.length === 1) {
    return {
      density: () => first.density,
      cp: () => first.cp,
      conductivity: () => first.conductivity,
      viscosity: () => first.viscosity,
      expansivity: () => first.expansivity,
    };
  }
  const through = (pick: (row: PropertyRow) => number): Interpolant => monotone(solved.temperatures, solved.rows.map(pick));
  const density = through((row) => row.density);
  const cp = through((row) => row.cp);
  const conductivity = through((row) => row.conductivity);
  const logViscosity = through((row) => Math.log(row.viscosity));
  const expansivity = solved.rows.every((row) => row.expansivity !== undefined) ? through((row) => row.expansivity as number) : undefined;
  return {
    density: density.at,
    cp: cp.at,
    conductivity: conductivity.at,
    viscosity: (T) => Math.exp(logViscosity.at(T)),
    expansivity: (T) => {
      if (expansivity) return expansivity.at(T);
      return solved.densityGiven ? -density.slope(T) / density.at(T) : undefined;
    },
  };
}

// A single row holds everywhere; these are the ends of what a temperature or pressure can sensibly be.
const anyTemperature = [1e-3, 1e5] as const;
const anyPressure = [1e-6, 1e12] as const;

function fluidOf(solved: Solved, change: PhaseChange | undefined, name: string, tolerance: (column: ColumnName) => number): Fluid {
  const curves = curvesOf(solved);
  const single = solved.rows.length === 1;
  const limits = single
    ? anyTemperature
    : ([solved.temperatures[0] as number, solved.temperatures[solved.temperatures.length - 1] as number] as const);
  const coarse = single ? undefined : coarseness(solved.temperatures, solved.rows);
  const refusal = (T: number, p: number): Problem | undefined => impossible(T, p) ?? outsideRows(name, limits, T);
  const liquidState = (T: number, p: number): State => stateFrom(curves, T, p, change ? "liquid" : phaseOf(curves, T, solved.densityGiven));
  const state = (T: number, p: number): State | Problem => {
    if (change && T > change.temperature * (1 + 1e-12)) return impossible(T, p) ?? vapourState(change, T, p);
    return refusal(T, p) ?? liquidState(T, p);
  };
  const constantDensity = single || !solved.densityGiven || solved.rows.every((row) => row.density === solved.rows[0]?.density);
  return {
    name,
    synonyms: [],
    family: "own table",
    sources: [],
    range: { T: limits, p: anyPressure },
    molarMass: undefined,
    critical: undefined,
    freezingPoint: undefined,
    constantDensity,
    ...(!solved.densityGiven && { densityAssumed: true }),
    state,
    density: (T, p) => {
      const found = state(T, p);
      return isProblem(found) ? found : found.density;
    },
    uncertainty: () => uncertaintyOf(coarse, tolerance),
    ...(change && saturationOf(change, liquidState, refusal)),
    cautions: () => [...solved.cautions, ...(coarse?.caution ? [coarse.caution] : [])],
  };
}

function outsideRows(name: string, [coldest, hottest]: readonly [number, number], T: number): Problem | undefined {
  if (!isBelow(T, coldest) && !isBelow(hottest, T)) return undefined;
  const side = T < coldest ? "below" : "above";
  const nearest = T < coldest ? coldest : hottest;
  return coverageProblem(
    undefined,
    `The ${name} holds ${sayTemperature(coldest)} to ${sayTemperature(hottest)}; ${sayTemperature(T)} is ${side} it. Nearest: ${sayTemperature(nearest)}; or add rows.`,
  );
}

function stateFrom(curves: Curves, T: number, p: number, phase: Phase): State {
  return {
    T,
    p,
    phase,
    density: curves.density(T),
    cp: curves.cp(T),
    viscosity: curves.viscosity(T),
    conductivity: curves.conductivity(T),
    expansivity: curves.expansivity(T),
    enthalpy: undefined,
    speedOfSound: undefined,
  };
}

/**
 * A table does not say whether it is of a gas. Dense means liquid; a thin one, or one without density or with the 1 kg/m³ of a table that
 * knows only kinematic viscosity, is a gas where its Prandtl number is that of one.
 */
function phaseOf(curves: Curves, T: number, densityGiven: boolean): Phase {
  const density = curves.density(T);
  if (densityGiven && density > 100) return "liquid";
  if (densityGiven && density !== 1) return "gas";
  const Pr = (curves.viscosity(T) * curves.cp(T)) / curves.conductivity(T);
  return Pr >= 0.5 && Pr <= 1.3 ? "gas" : "liquid";
}

function vapourState(change: PhaseChange, T: number, p: number): State | Problem {
  const { vapour } = change;
  if (vapour?.cp === undefined || vapour.conductivity === undefined || vapour.viscosity === undefined) {
    return coverageProblem(
      undefined,
      `The own table's liquid boils at ${sayTemperature(change.temperature)}; at ${sayTemperature(T)} it is vapour, for which the table needs vapour density, vapour cp, vapour conductivity and vapour viscosity.`,
    );
  }
  return vapourAt(change, T, p, vapour.density);
}

function vapourAt(change: PhaseChange, T: number, p: number, density: number): State {
  return {
    T,
    p,
    phase: "gas",
    density,
    cp: change.vapour?.cp ?? 1,
    viscosity: change.vapour?.viscosity,
    conductivity: change.vapour?.conductivity,
    expansivity: undefined,
    enthalpy: undefined,
    speedOfSound: undefined,
  };
}

function saturationOf(
  change: PhaseChange,
  liquidState: (T: number, p: number) => State,
  refusal: (T: number, p: number) => Problem | undefined,
): Pick<Fluid, "saturationAtPressure" | "saturationAtTemperature"> {
  const saturation = (p: number): Saturation | Problem => {
    const T = change.temperature;
    const refused = refusal(T, p);
    if (refused) return refused;
    if (!change.vapour) return coverageProblem(undefined, 'The own table gives no "vapour density"; change of phase needs it.');
    return {
      T,
      p,
      liquid: liquidState(T, p),
      vapour: vapourAt(change, T, p, change.vapour.density),
      latentHeat: change.latentHeat,
      surfaceTension: change.surfaceTension,
      ...(change.vapour.cp === undefined && { vapourCpGiven: false }),
    };
  };
  return {
    saturationAtPressure: saturation,
    saturationAtTemperature: (T) => {
      if (Math.abs(T - change.temperature) < 1e-6 * change.temperature) return saturation(standardPressure);
      return coverageProblem(undefined, `The own table gives saturation at ${sayTemperature(change.temperature)} only.`);
    },
  };
}

// The table does not say at which pressure it was made; its saturation holds at the user's own.
const standardPressure = 101_325;

/** What the cells themselves carry as tolerance, with the error of interpolation; the table's own truth is the user's to know. */
function uncertaintyOf(coarse: Coarseness | undefined, tolerance: (column: ColumnName) => number): Uncertainty {
  const of = (column: ColumnName, interpolation: number | undefined): number => Math.hypot(tolerance(column), interpolation ?? 0);
  return {
    density: of("density", coarse?.density),
    cp: of("cp", coarse?.cp),
    viscosity: Math.hypot(of("viscosity", coarse?.viscosity), tolerance("kinematic viscosity")),
    conductivity: of("conductivity", coarse?.conductivity),
    expansivity: of("expansivity", coarse?.expansivity),
    origin: "own table: tolerances of its cells and error of interpolation",
  };
}
