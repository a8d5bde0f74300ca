import { fullCitation } from "../findings/citation.js";
import { practice } from "../findings/cautions.js";
import type { WordValue } from "../findings/finding.js";
import type { WordEntry } from "../findings/words.js";
import type { Fluid, Saturation, State } from "../fluids/fluid.js";
import { formatQuantity } from "../quantities/format.js";
import { coverageProblem, isProblem, type Problem, sentenceOf } from "../quantities/problems.js";
import type { Dimension } from "../quantities/quantity.js";
import { version } from "../version.js";

/** What FILM.FLUID can be asked, in the order its block lists it. */
const numbers: readonly (readonly [name: string, dimension: Dimension, describe: string])[] = [
  ["density", "density", "density"],
  ["cp", "specific heat", "specific heat at constant pressure"],
  ["conductivity", "conductivity", "thermal conductivity"],
  ["viscosity", "viscosity", "dynamic viscosity"],
  ["kinematic viscosity", "kinematic viscosity", "viscosity over density"],
  ["diffusivity", "kinematic viscosity", "thermal diffusivity"],
  ["Pr", "none", "Prandtl number"],
  ["expansivity", "expansivity", "volumetric thermal expansivity"],
  ["enthalpy", "specific energy", "specific enthalpy, from the formulation's own zero"],
  ["molar mass", "molar mass", "molar mass"],
  ["critical temperature", "temperature", "critical temperature"],
  ["critical pressure", "pressure", "critical pressure"],
  ["freezing point", "temperature", "freezing point"],
  ["saturation pressure", "pressure", "at the temperature asked"],
  ["saturation temperature", "temperature", "at the pressure"],
  ["latent heat", "specific energy", "of vaporisation, at the temperature asked"],
  ["surface tension", "surface tension", "at the temperature asked"],
];

const saturated = ["density", "cp", "viscosity", "conductivity", "expansivity", "Pr"] as const;
const dimensionOf = new Map(numbers.map(([name, dimension]) => [name, dimension]));

export const fluidWords: readonly WordEntry[] = [
  { name: "all", kind: "block", describe: "name, value, unit of every word" },
  { name: "phase", kind: "text", describe: "liquid, gas or supercritical" },
  ...numbers.map(([name, , describe]): WordEntry => ({ name, kind: "number", describe })),
  ...(["liquid", "vapour"] as const).flatMap((side) =>
    saturated.map(
      (name): WordEntry => ({
        name: `saturated ${side} ${name}`,
        kind: "number",
        describe: `${name} of saturated ${side} at the temperature asked`,
      }),
    ),
  ),
  { name: "range", kind: "text", describe: "limits of the formulation" },
  { name: "source", kind: "text", describe: "published formulation" },
  { name: "verdict", kind: "text", describe: "whether the formulation covers the state" },
  { name: "cautions", kind: "text", describe: "what must be known about this fluid here" },
  { name: "version", kind: "text", describe: "version of Filmbook" },
];

/** Answers one word about a fluid at a temperature (K) and a pressure (Pa). */
export function fluidWord(name: string, fluid: Fluid, T: number, p: number, remarks: readonly string[]): WordValue {
  const state = fluid.state(T, p);
  switch (name) {
    case "phase":
      return isProblem(state) ? state : state.phase;
    case "source":
      return fluid.sources.length === 0 ? "the user's own table" : fluid.sources.map((work) => fullCitation(work)).join("; ");
    case "verdict":
      return isProblem(state) ? sentenceOf(state) : "in range";
    case "range":
      return rangeText(fluid);
    case "version":
      return version;
    case "cautions":
      return cautions(state, fluid, T, p, remarks);
    default:
      return numberWord(name, fluid, state, T, p);
  }
}

function cautions(state: State | Problem, fluid: Fluid, T: number, p: number, remarks: readonly string[]): string {
  const list = isProblem(state) ? [...remarks, sentenceOf(state)] : [...remarks, ...fluid.cautions(T, p)];
  return list.length === 0 ? "none" : [...list, practice].join(" ");
}

export function rangeText(fluid: { readonly range: Fluid["range"] }): string {
  const { T, p } = fluid.range;
  const span = (low: number, high: number, dimension: Dimension): string => {
    if (!Number.isFinite(high)) return Number.isFinite(low) && low > 0 ? `from ${formatQuantity(low, dimension, "SI")}` : "";
    return low > 0
      ? `${formatQuantity(low, dimension, "SI")} to ${formatQuantity(high, dimension, "SI")}`
      : `up to ${formatQuantity(high, dimension, "SI")}`;
  };
  const parts = [span(T[0], T[1], "temperature"), span(p[0], p[1], "pressure")].filter((part) => part !== "");
  return parts.length === 0 ? "no limits" : parts.join("; ");
}

function numberWord(name: string, fluid: Fluid, state: State | Problem, T: number, p: number): WordValue {
  if (name.startsWith("saturated ")) return saturatedWord(name, fluid, T);
  const dimension = dimensionOf.get(name) as Dimension;
  const constant = fixedWord(name, fluid, T, p);
  if (constant !== undefined) return isProblem(constant) ? constant : { value: constant, dimension };
  if (isProblem(state)) return state;
  if (fluid.densityAssumed === true && (name === "density" || name === "cp" || name === "viscosity")) return lacking(name, fluid);
  const value = propertyOf(name, state);
  return value === undefined ? lacking(name, fluid) : { value, dimension };
}

/** Words that do not need a single-phase state. */
function fixedWord(name: string, fluid: Fluid, T: number, p: number): number | Problem | undefined {
  switch (name) {
    case "molar mass":
      return fluid.molarMass ?? lacking(name, fluid);
    case "critical temperature":
      return fluid.critical?.T ?? lacking(name, fluid);
    case "critical pressure":
      return fluid.critical?.p ?? lacking(name, fluid);
    case "freezing point":
      return fluid.freezingPoint ?? lacking(name, fluid);
    case "saturation temperature":
      return fromSaturation(fluid.saturationAtPressure?.(p), fluid, (one) => one.T);
    case "saturation pressure":
      return fromSaturation(fluid.saturationAtTemperature?.(T), fluid, (one) => one.p);
    case "latent heat":
      return fromSaturation(fluid.saturationAtTemperature?.(T), fluid, (one) => one.latentHeat);
    case "surface tension":
      return fromSaturation(fluid.saturationAtTemperature?.(T), fluid, (one) => one.surfaceTension);
    default:
      return undefined;
  }
}

function fromSaturation(
  found: Saturation | Problem | undefined,
  fluid: Fluid,
  of: (one: Saturation) => number | undefined,
): number | Problem {
  if (found === undefined) return coverageProblem("fluid", `${fluid.name} has no saturation data here.`);
  if (isProblem(found)) return found;
  return of(found) ?? coverageProblem("fluid", `no published value of ${fluid.name} covers this.`);
}

function saturatedWord(name: string, fluid: Fluid, T: number): WordValue {
  const [, side, ...rest] = name.split(" ");
  const property = rest.join(" ");
  const found = fluid.saturationAtTemperature?.(T);
  if (found === undefined) return coverageProblem("fluid", `${fluid.name} has no saturation data here.`);
  if (isProblem(found)) return found;
  const value = propertyOf(property, side === "liquid" ? found.liquid : found.vapour);
  return value === undefined ? lacking(name, fluid) : { value, dimension: dimensionOf.get(property) as Dimension };
}

function propertyOf(name: string, state: State): number | undefined {
  const { density, cp, conductivity: k, viscosity: mu } = state;
  switch (name) {
    case "density":
      return density;
    case "cp":
      return cp;
    case "conductivity":
      return k;
    case "viscosity":
      return mu;
    case "kinematic viscosity":
      return mu === undefined ? undefined : mu / density;
    case "diffusivity":
      return k === undefined ? undefined : k / (density * cp);
    case "Pr":
      return mu === undefined || k === undefined ? undefined : (mu * cp) / k;
    case "expansivity":
      return state.expansivity;
    case "enthalpy":
      return state.enthalpy;
    default:
      return undefined;
  }
}

function lacking(name: string, fluid: Fluid): Problem {
  return coverageProblem("fluid", `${name} of ${fluid.name} is not known here: no published value or column gives it.`);
}
