/**
 * The user's own property table: a range whose first row names the columns. One row is a fluid of constant properties, several are
 * interpolated by a monotone cubic (viscosity in its logarithm) and refused outside.
 */
import { coverageProblem, isProblem, type Problem, valueProblem } from "../quantities/problems.js";
import type { Reading } from "../quantities/quantity.js";
import type { Fluid, Phase, State, Uncertainty } from "./fluid.js";
import { type Interpolant, monotone } from "./interpolation.js";
import { type PhaseChange, readPhaseChange, saturationOf, vapourState } from "./own-table-change.js";
import type { ColumnName } from "./own-table-columns.js";
import { isProblemList, readTable, type TableCells, type TableRow, temperatureOf } from "./own-table-reading.js";
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
  const table = readTable(cells, reading);
  if (isProblemList(table)) return table;
  const solved = solveRows(table);
  if (isProblemList(solved)) return solved;
  const change = readPhaseChange(table);
  if (change !== undefined && isProblemList(change)) return change;
  return fluidOf(solved, change, settings.name ?? "own table", toleranceOf(table.rows));
}

interface Solved {
  readonly temperatures: readonly number[];
  readonly rows: readonly PropertyRow[];
  readonly densityGiven: boolean;
  readonly cautions: readonly string[];
}

function solveRows({ rows, columns }: TableCells): Solved | readonly Problem[] {
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
          `TableRow ${row.number} of the table contradicts itself by ${Math.round(100 * complete.contradiction)} %: its ${complete.contradicting} does not follow from its other columns. Check the units.`,
        ),
      );
    } else if (complete.contradiction > 0.03) {
      cautions.push(
        `TableRow ${row.number} of the table: ${complete.contradicting} differs by ${Math.round(100 * complete.contradiction)} % from what the other columns give; the others are used.`,
      );
    }
    solved.push(complete);
  }
  if (problems.length > 0) return problems;
  return { temperatures: rows.map(temperatureOf), rows: solved, densityGiven: solved.every((row) => row.densityGiven), cautions };
}

/** Relative tolerance that the cells themselves carry (`"0.6 ± 2 %"`), the largest of each column. */
function toleranceOf(rows: readonly TableRow[]): (name: ColumnName) => number {
  return (name) =>
    Math.max(
      0,
      ...rows.map((row) => {
        const quantity = row.values[name];
        return quantity?.tolerance === undefined || quantity.value === 0 ? 0 : Math.abs(quantity.tolerance / quantity.value);
      }),
    );
}

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
