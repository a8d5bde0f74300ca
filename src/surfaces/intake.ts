import type { Program } from "../equations/program.js";
import type { State } from "../fluids/fluid.js";

/** Properties that enter the algebra, in the order of their slots. */
export const properties = ["density", "cp", "conductivity", "viscosity", "expansivity"] as const;
export type Property = (typeof properties)[number];

const symbols = ["rho", "cp", "k", "mu", "beta"] as const;

/** Slots of the five properties at one place, −1 where the program does without. */
export type PropertySlots = readonly [number, number, number, number, number];

/** Where the inputs of a program stand: worked out once, so that filling them is a matter of a few stores. */
export interface Intake {
  readonly own: PropertySlots;
  readonly bulk: PropertySlots | undefined;
  readonly wall: PropertySlots | undefined;
  /** The wall's density alone is cheaper to find than its state. */
  readonly wallDensityOnly: boolean;
  readonly Ts: number;
  readonly Tb: number;
  readonly gravity: number;
  readonly pressure: number;
  readonly flux: number;
  /** Dimensions and numeric settings by key. */
  readonly numbers: readonly (readonly [slot: number, key: string])[];
}

const reserved = new Set(["Ts", "Tb", "gravity", "pressure", "q_wall"]);

export function intakeOf(program: Program): Intake {
  const inputs = new Set(program.inputs);
  const slotOf = (symbol: string): number => (inputs.has(symbol) ? program.slot(symbol) : -1);
  const slotsAt = (suffix: string): PropertySlots => symbols.map((symbol) => slotOf(symbol + suffix)) as unknown as PropertySlots;
  const some = (slots: PropertySlots): PropertySlots | undefined => (slots.some((slot) => slot >= 0) ? slots : undefined);
  const wall = some(slotsAt("_w"));
  const taken = new Set(["", "_b", "_w"].flatMap((suffix) => symbols.map((symbol) => symbol + suffix)));
  return {
    own: slotsAt(""),
    bulk: some(slotsAt("_b")),
    wall,
    wallDensityOnly: wall?.every((slot, i) => i === 0 || slot < 0) ?? false,
    Ts: slotOf("Ts"),
    Tb: slotOf("Tb"),
    gravity: slotOf("gravity"),
    pressure: slotOf("pressure"),
    flux: slotOf("q_wall"),
    numbers: program.inputs.filter((symbol) => !reserved.has(symbol) && !taken.has(symbol)).map((symbol) => [program.slot(symbol), symbol]),
  };
}

/** Writes a state into its slots; names a property that the program needs and the state lacks. */
export function putState(values: Float64Array, slots: PropertySlots, state: State): Property | undefined {
  let missing: Property | undefined;
  const [rho, cp, k, mu, beta] = slots;
  if (rho >= 0) values[rho] = state.density;
  if (cp >= 0) values[cp] = state.cp;
  if (k >= 0) {
    if (state.conductivity === undefined) missing = "conductivity";
    values[k] = state.conductivity ?? Number.NaN;
  }
  if (mu >= 0) {
    if (state.viscosity === undefined) missing = "viscosity";
    values[mu] = state.viscosity ?? Number.NaN;
  }
  if (beta >= 0) {
    if (state.expansivity === undefined) missing ??= "expansivity";
    values[beta] = state.expansivity ?? Number.NaN;
  }
  return missing;
}
