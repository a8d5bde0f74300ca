import type { Fluid, State } from "../fluids/fluid.js";
import { parseLine } from "../equations/line.js";
import { compileProgram, type Program } from "../equations/program.js";
import { symbolsOf } from "../equations/rewrite.js";
import type { WordValue } from "../findings/finding.js";
import { coverageProblem, isProblem } from "../quantities/problems.js";
import type { Dimension, Quantity } from "../quantities/quantity.js";
import { buoyancyOf } from "../surfaces/buoyancy.js";
import { standardGroups } from "../surfaces/groups.js";
import type { ArgumentDefinition } from "../surfaces/surface.js";
import type { Settled } from "./settings.js";

/** One case of a state function: the fluid where there is one, and the arguments as quantities by key. */
export interface StateCase {
  readonly fluid: Fluid | undefined;
  readonly quantities: Readonly<Record<string, Quantity>>;
  readonly settled: Settled;
}

/** A function of state or of numbers: one value a case. */
export interface StateFunction {
  readonly id: string;
  readonly title: string;
  readonly takesFluid: boolean;
  readonly arguments: readonly ArgumentDefinition[];
  /** What the value is, for the unit it is shown in. */
  value(one: StateCase): WordValue;
}

const temperature = (key: string, describe: string): ArgumentDefinition => ({
  key,
  name: key,
  dimensions: ["temperature"],
  sign: "any",
  describe,
});
const length = (key = "length", name = key): ArgumentDefinition => ({
  key,
  name,
  dimensions: ["length"],
  sign: "positive",
  describe: "a length, m",
});
const speed: ArgumentDefinition = { key: "speed", name: "speed", dimensions: ["speed"], sign: "not negative", describe: "a speed, m/s" };
const coefficient: ArgumentDefinition = {
  key: "h",
  name: "h",
  dimensions: ["film coefficient"],
  sign: "not negative",
  describe: "a film coefficient, W/(m²·K)",
};

export const stateFunctions: readonly StateFunction[] = [
  {
    id: "REYNOLDS",
    title: "Reynolds number",
    takesFluid: true,
    arguments: [temperature("temperature", "of the fluid, °C"), speed, length()],
    value: (one) =>
      group("Re", one, { Ts: at(one, "temperature"), Tb: at(one, "temperature"), flow: at(one, "speed"), L: at(one, "length") }),
  },
  {
    id: "PRANDTL",
    title: "Prandtl number",
    takesFluid: true,
    arguments: [temperature("temperature", "of the fluid, °C")],
    value: (one) => group("Pr", one, { Ts: at(one, "temperature"), Tb: at(one, "temperature") }),
  },
  {
    id: "GRASHOF",
    title: "Grashof number at the film temperature",
    takesFluid: true,
    arguments: [temperature("surface", "of the surface, °C"), temperature("bulk", "of the fluid, °C"), length()],
    value: (one) => group("Gr", one, between(one)),
  },
  {
    id: "RAYLEIGH",
    title: "Rayleigh number at the film temperature",
    takesFluid: true,
    arguments: [temperature("surface", "of the surface, °C"), temperature("bulk", "of the fluid, °C"), length()],
    value: (one) => group("Ra", one, between(one)),
  },
  {
    id: "RICHARDSON",
    title: "Richardson number, Gr/Re²",
    takesFluid: true,
    arguments: [
      temperature("surface", "of the surface, °C"),
      temperature("bulk", "of the fluid, °C"),
      { ...speed, sign: "positive" },
      length(),
    ],
    value: (one) => group("Ri", one, { ...between(one), flow: at(one, "speed") }),
  },
  {
    id: "NUSSELT",
    title: "Nusselt number, h·L/k of the fluid",
    takesFluid: false,
    arguments: [
      coefficient,
      length(),
      { key: "k", name: "conductivity", dimensions: ["conductivity"], sign: "positive", describe: "of the fluid, W/(m·K)" },
    ],
    value: (one) => algebra("h*L/k", { h: at(one, "h"), L: at(one, "length"), k: at(one, "k") }, "none"),
  },
  {
    id: "BIOT",
    title: "Biot number, h·L/k of the solid",
    takesFluid: false,
    arguments: [
      coefficient,
      length(),
      { key: "k", name: "solid conductivity", dimensions: ["conductivity"], sign: "positive", describe: "of the solid, W/(m·K)" },
    ],
    value: (one) => algebra("h*L/k", { h: at(one, "h"), L: at(one, "length"), k: at(one, "k") }, "none"),
  },
  {
    id: "FLUX",
    title: "Heat flux, positive from surface to fluid",
    takesFluid: false,
    arguments: [coefficient, temperature("surface", "of the surface, °C"), temperature("reference", "that h is taken against, °C")],
    value: (one) => algebra("h*(Ts-Tref)", { h: at(one, "h"), Ts: at(one, "surface"), Tref: at(one, "reference") }, "heat flux"),
  },
];

function at(one: StateCase, key: string): number {
  return one.quantities[key]?.value ?? Number.NaN;
}

function between(one: StateCase): Record<string, number> {
  return { Ts: at(one, "surface"), Tb: at(one, "bulk"), L: at(one, "length") };
}

const programs = new Map<string, Program>();

function algebra(line: string, inputs: Readonly<Record<string, number>>, dimension: Dimension): WordValue {
  let program = programs.get(line);
  if (program === undefined) {
    program = compileProgram([["value", line]]);
    programs.set(line, program);
  }
  return run(program, "value", inputs, dimension);
}

function run(program: Program, name: string, inputs: Readonly<Record<string, number>>, dimension: Dimension): WordValue {
  const values = new Float64Array(program.size);
  for (const symbol of program.inputs) values[program.slot(symbol)] = inputs[symbol] ?? Number.NaN;
  program.run(values);
  const value = values[program.slot(name)] as number;
  return Number.isFinite(value)
    ? { value, dimension }
    : coverageProblem(undefined, "these inputs give no number: a divisor is zero or a property is missing.");
}

/** The same group lines that every surface runs, with the properties at the film (or the one) temperature. */
function group(name: string, one: StateCase, inputs: Record<string, number>): WordValue {
  const fluid = one.fluid as Fluid;
  const Tf = ((inputs.Ts as number) + (inputs.Tb as number)) / 2;
  const state = fluid.state(Tf, one.settled.pressure);
  if (isProblem(state))
    return state.argument === undefined ? { ...state, argument: inputs.Ts === inputs.Tb ? "temperature" : "film" } : state;
  const densities = densitiesFor(name, one, inputs, state);
  const variant = densities === undefined ? "expansivity" : "densities";
  const program = groupProgram(name, variant);
  const properties = {
    rho: state.density,
    cp: state.cp,
    k: state.conductivity ?? Number.NaN,
    mu: state.viscosity ?? Number.NaN,
    beta: state.expansivity ?? Number.NaN,
    gravity: one.settled.gravity,
  };
  return run(program, name, { ...properties, ...densities, ...inputs }, "none");
}

/** Densities at wall and bulk, where buoyancy is to be taken from them. */
function densitiesFor(name: string, one: StateCase, inputs: Record<string, number>, film: State): Record<string, number> | undefined {
  if (name === "Re" || name === "Pr" || inputs.Ts === inputs.Tb) return undefined;
  const fluid = one.fluid as Fluid;
  if (fluid.constantDensity) return undefined;
  const wall = fluid.density(inputs.Ts as number, one.settled.pressure);
  const bulk = fluid.density(inputs.Tb as number, one.settled.pressure);
  if (isProblem(wall) || isProblem(bulk)) return undefined;
  const buoyancy = buoyancyOf((inputs.Ts as number) - (inputs.Tb as number), film, { wall, bulk });
  return buoyancy.taken === "densities" ? { rho_w: wall, rho_b: bulk } : undefined;
}

function groupProgram(name: string, buoyancy: "expansivity" | "densities"): Program {
  const key = `${name}|${buoyancy}`;
  let program = programs.get(key);
  if (program === undefined) {
    const groups = standardGroups({ key, flow: "speed", buoyancy, local: false, given: new Set(), words: {} });
    const lines: [string, string][] = [];
    const add = (symbol: string): void => {
      const text = groups[symbol];
      if (text === undefined || lines.some(([done]) => done === symbol)) return;
      for (const inner of symbolsOf(parseLine(text))) add(inner);
      lines.push([symbol, text]);
    };
    add(name);
    program = compileProgram(lines);
    programs.set(key, program);
  }
  return program;
}
