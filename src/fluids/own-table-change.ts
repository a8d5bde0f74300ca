/** Change of phase in an own table: saturation, and the vapour above it. */
import { coverageProblem, type Problem, valueProblem } from "../quantities/problems.js";
import type { Fluid, Saturation, State } from "./fluid.js";
import { monotone } from "./interpolation.js";
import type { ColumnName } from "./own-table-columns.js";
import { phaseChangeColumns, type TableCells, type TableRow, temperatureOf } from "./own-table-reading.js";
import { sayTemperature } from "./refusal.js";

export interface PhaseChange {
  readonly temperature: number;
  readonly latentHeat: number;
  readonly surfaceTension: number | undefined;
  readonly vapour:
    | { readonly density: number; readonly cp?: number; readonly conductivity?: number; readonly viscosity?: number }
    | undefined;
}

/** What the table says of change of phase; undefined where it has no such columns. */
export function readPhaseChange({ rows, columns }: TableCells): PhaseChange | readonly Problem[] | undefined {
  const given = columns.map((column) => column.name).filter((name) => phaseChangeColumns.has(name) && rows.some((row) => row.values[name]));
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
function valueAt(rows: readonly TableRow[], name: ColumnName, T: number): number | undefined {
  const filled = rows.filter((row) => row.values[name]);
  const ys = filled.map((row) => row.values[name]?.value as number);
  if (ys.length < 2) return ys[0];
  if (ys.every((y) => y === ys[0])) return ys[0];
  const xs = filled.map(temperatureOf);
  const inside = Math.min(Math.max(T, xs[0] as number), xs[xs.length - 1] as number);
  return monotone(xs, ys).at(inside);
}

/** The state above saturation, or what the table lacks for it. */
export function vapourState(change: PhaseChange, T: number, p: number): State | Problem {
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

export function saturationOf(
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
