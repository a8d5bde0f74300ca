/** Gas mixtures of the user's own: combustion gases and blends of the shelf's gases by mole fraction. */
import { coverageProblem, isProblem, type Problem, valueProblem } from "../quantities/problems.js";
import type { Fluid } from "./fluid.js";
import { mixtureOf, type Part } from "./gas-mixture.js";
import { type GasComponent, lowDensityGases } from "./low-density-gas.js";
import { findFluid, keyOf } from "./shelf.js";

export interface NamedPart {
  /** Formula or name of a gas: `CO2`, `carbon dioxide`, `air`, or any gas of the shelf. */
  readonly name: string;
  /** Mole fraction, or per cent where all of them sum to a hundred. */
  readonly fraction: number;
}

/** Dry air by mole. */
const air = [
  ["N2", 0.78084],
  ["O2", 0.20946],
  ["Ar", 0.00934],
  ["CO2", 0.00036],
] as const;

/** The mixture as an ideal gas (Wilke; Wassiljewa, Mason & Saxena), or every part that is not understood, in one sentence. */
export function mixture(parts: readonly NamedPart[], label = "gas mixture"): Fluid | Problem {
  const found = parts.flatMap(({ name, fraction }) => (isAir(name) ? airParts(fraction) : [partOf(name, fraction)]));
  const problems = found.filter(isProblem);
  if (problems.length > 0) return valueProblem("composition", problems.map((problem) => problem.sentence).join(" "));
  return mixtureOf(found as readonly Part[], { name: label, synonyms: [], family: "mixture", cautions: [] });
}

function isAir(name: string): boolean {
  return ["air", "dryair"].includes(keyOf(name));
}

function airParts(fraction: number): readonly (Part | Problem)[] {
  return air.map(([formula, share]) => partOf(formula, share * fraction));
}

function partOf(name: string, fraction: number): Part | Problem {
  const key = keyOf(name);
  const gas =
    lowDensityGases.find((one) => keyOf(one.formula) === key || keyOf(one.name) === key) ??
    (key === "water" || key === "steam" ? steam() : undefined);
  if (gas) return { gas, fraction };
  const shelved = shelfGas(name);
  return isProblem(shelved) ? shelved : { gas: shelved, fraction };
}

function steam(): GasComponent | undefined {
  return lowDensityGases.find((gas) => gas.formula === "H2O");
}

/** Low enough for any gas of the shelf to be ideal, Pa. */
const thin = 1000;

/** A pure gas of the shelf at low density, over the temperatures at which its formulation gives all that a mixture needs. */
function shelfGas(name: string): GasComponent | Problem {
  const fluid = findFluid(name);
  if (isProblem(fluid)) return fluid;
  const { molarMass } = fluid;
  if (molarMass === undefined) return valueProblem("composition", `"${name}" is itself a mixture; name its parts.`);
  const span = gasSpan(fluid);
  if (!span)
    return coverageProblem("composition", `"${name}" has no published viscosity and conductivity as a thin gas, so it cannot be mixed.`);
  return {
    formula: fluid.name,
    name: fluid.name,
    molarMass,
    T: span,
    at(T) {
      const state = fluid.state(T, thin);
      if (isProblem(state)) return { cp: Number.NaN, viscosity: Number.NaN, conductivity: Number.NaN };
      return { cp: state.cp * molarMass, viscosity: state.viscosity ?? Number.NaN, conductivity: state.conductivity ?? Number.NaN };
    },
  };
}

/** The part of the fluid's range where it is a thin gas with transport: from the coldest such point on, found to a tenth of a kelvin. */
function gasSpan(fluid: Fluid): readonly [number, number] | undefined {
  const serves = (T: number): boolean => {
    const state = fluid.state(T, thin);
    return !isProblem(state) && state.phase !== "liquid" && state.viscosity !== undefined && state.conductivity !== undefined;
  };
  const [coldest, hottest] = fluid.range.T;
  const steps = 60;
  const grid = Array.from({ length: steps + 1 }, (_, k) => coldest + ((hottest - coldest) * k) / steps);
  const last = lastIndexServing(grid, serves);
  if (last < 0) return undefined;
  let first = last;
  while (first > 0 && serves(grid[first - 1] as number)) first--;
  const low = first === 0 ? coldest : edge(grid[first - 1] as number, grid[first] as number, serves);
  const high = last === steps ? hottest : edge(grid[last + 1] as number, grid[last] as number, serves);
  return [low, high];
}

function lastIndexServing(grid: readonly number[], serves: (T: number) => boolean): number {
  for (let k = grid.length - 1; k >= 0; k--) if (serves(grid[k] as number)) return k;
  return -1;
}

function edge(outside: number, inside: number, serves: (T: number) => boolean): number {
  let out = outside;
  let within = inside;
  while (Math.abs(within - out) > 0.1) {
    const middle = (out + within) / 2;
    if (serves(middle)) within = middle;
    else out = middle;
  }
  return within;
}
