/** How well the rows of a table carry their interpolation, judged by leaving each row out in turn. */
import { monotone } from "./interpolation.js";
import type { PropertyRow } from "./own-table-row.js";
import { sayTemperature } from "./refusal.js";

/** Estimated largest relative errors of interpolation between the rows. */
export interface Coarseness {
  readonly density: number;
  readonly cp: number;
  readonly conductivity: number;
  readonly viscosity: number;
  readonly expansivity: number;
  /** Set where together they may cost more than 1 % in h. */
  readonly caution?: string;
}

// The largest powers in which common laws of convection hold each property: h ~ ρ^0.8 cp^0.4 k^0.7 μ^0.5 at most.
const weights = { density: 0.8, cp: 0.4, conductivity: 0.7, viscosity: 0.5 } as const;
type Weighed = keyof typeof weights;
const weighed = Object.keys(weights) as readonly Weighed[];

/** Halving the spacing divides the error of a monotone cubic by four at the least (it is of second order beside an extremum). */
const gain = 4;

export function coarseness(temperatures: readonly number[], rows: readonly PropertyRow[]): Coarseness {
  const errors =
    temperatures.length === 2 ? [twoRowErrors(rows)] : rows.slice(1, -1).map((_, k) => leftOutErrors(temperatures, rows, k + 1));
  const largest = (name: Weighed): number => Math.max(...errors.map((error) => error[name]));
  const inH = errors.map((error) => Math.hypot(...weighed.map((name) => weights[name] * error[name])));
  const worst = Math.max(...inH);
  const at = inH.indexOf(worst) + 1;
  return {
    density: largest("density"),
    cp: largest("cp"),
    conductivity: largest("conductivity"),
    viscosity: largest("viscosity"),
    // A slope between rows is known less well than the values at them.
    expansivity: rows.every((row) => row.expansivity !== undefined) ? 0.01 : 0.05,
    ...(worst > 0.01 && { caution: cautionOf(worst, temperatures, at) }),
  };
}

function cautionOf(worst: number, temperatures: readonly number[], at: number): string {
  const from = sayTemperature(temperatures[Math.max(at - 1, 0)] as number);
  const to = sayTemperature(temperatures[Math.min(at + 1, temperatures.length - 1)] as number);
  return `The own table is too coarse for 1 % in h between ${from} and ${to}: about ${(100 * worst).toPrecision(2)} % by leaving a row out; add rows there.`;
}

function leftOutErrors(temperatures: readonly number[], rows: readonly PropertyRow[], out: number): Readonly<Record<Weighed, number>> {
  const xs = temperatures.filter((_, k) => k !== out);
  const others = rows.filter((_, k) => k !== out);
  const T = temperatures[out] as number;
  const row = rows[out] as PropertyRow;
  const error = (name: Weighed): number => {
    const logarithmic = name === "viscosity";
    const ys = others.map((one) => (logarithmic ? Math.log(one[name]) : one[name]));
    const guess = monotone(xs, ys).at(T);
    return Math.abs((logarithmic ? Math.exp(guess) : guess) / row[name] - 1) / gain;
  };
  return { density: error("density"), cp: error("cp"), conductivity: error("conductivity"), viscosity: error("viscosity") };
}

/** Two rows show no curvature; an exponential course between them would leave the straight line by an eighth of the squared log ratio. */
function twoRowErrors(rows: readonly PropertyRow[]): Readonly<Record<Weighed, number>> {
  const [first, last] = rows as readonly [PropertyRow, PropertyRow];
  const error = (name: Weighed): number => Math.log(last[name] / first[name]) ** 2 / 8;
  return { density: error("density"), cp: error("cp"), conductivity: error("conductivity"), viscosity: error("viscosity") };
}
