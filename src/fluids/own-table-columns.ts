/** The headers that a property table of the user's own may have: names, synonyms, what kind of quantity each is. */
import { isProblem, type Problem, valueProblem } from "../quantities/problems.js";
import type { Dimension } from "../quantities/quantity.js";
import { readUnit } from "../quantities/units.js";

export type ColumnName =
  | "temperature"
  | "density"
  | "cp"
  | "conductivity"
  | "viscosity"
  | "kinematic viscosity"
  | "Pr"
  | "diffusivity"
  | "expansivity"
  | "saturation temperature"
  | "latent heat"
  | "surface tension"
  | "vapour density"
  | "vapour cp"
  | "vapour conductivity"
  | "vapour viscosity";

interface ColumnKind {
  readonly dimension: Dimension;
  /** Whether zero and negative numbers are allowed. */
  readonly signed: boolean;
  readonly synonyms: readonly string[];
}

const densityWords = ["density", "rho", "ρ", "mass density"];
const cpWords = ["cp", "specific heat", "heat capacity", "specific heat capacity", "isobaric specific heat", "c"];
const conductivityWords = ["conductivity", "thermal conductivity", "k", "lambda", "λ"];
const viscosityWords = ["viscosity", "dynamic viscosity", "absolute viscosity", "mu", "μ", "eta", "η"];

/** The same property of the vapour: "vapour density", "vapor rho", "rho vapour", "rho_v". */
function ofVapour(words: readonly string[]): readonly string[] {
  return words.flatMap((word) => [`vapour ${word}`, `vapor ${word}`, `${word} vapour`, `${word} vapor`, `${word} v`, `${word} g`]);
}

export const columnKinds: Readonly<Record<ColumnName, ColumnKind>> = {
  temperature: { dimension: "temperature", signed: true, synonyms: ["temp", "t"] },
  density: { dimension: "density", signed: false, synonyms: densityWords },
  cp: { dimension: "specific heat", signed: false, synonyms: cpWords },
  conductivity: { dimension: "conductivity", signed: false, synonyms: conductivityWords },
  viscosity: { dimension: "viscosity", signed: false, synonyms: viscosityWords },
  "kinematic viscosity": { dimension: "kinematic viscosity", signed: false, synonyms: ["nu", "ν", "kin viscosity", "kinematic"] },
  Pr: { dimension: "none", signed: false, synonyms: ["prandtl", "prandtl number"] },
  diffusivity: { dimension: "kinematic viscosity", signed: false, synonyms: ["thermal diffusivity", "alpha", "α", "a"] },
  expansivity: {
    dimension: "expansivity",
    signed: true,
    synonyms: [
      "beta",
      "β",
      "expansion",
      "expansion coefficient",
      "thermal expansion",
      "thermal expansivity",
      "volumetric expansion",
      "coefficient of expansion",
      "coefficient of thermal expansion",
      "thermal expansion coefficient",
      "volumetric thermal expansion coefficient",
    ],
  },
  "saturation temperature": { dimension: "temperature", signed: true, synonyms: ["tsat", "t sat", "boiling point", "boiling temperature"] },
  "latent heat": {
    dimension: "specific energy",
    signed: false,
    synonyms: [
      "hfg",
      "h fg",
      "heat of vaporisation",
      "heat of vaporization",
      "enthalpy of vaporisation",
      "enthalpy of vaporization",
      "latent heat of vaporisation",
      "latent heat of vaporization",
    ],
  },
  "surface tension": { dimension: "surface tension", signed: false, synonyms: ["sigma", "σ"] },
  "vapour density": { dimension: "density", signed: false, synonyms: ofVapour(densityWords) },
  "vapour cp": { dimension: "specific heat", signed: false, synonyms: ofVapour(cpWords) },
  "vapour conductivity": { dimension: "conductivity", signed: false, synonyms: ofVapour(conductivityWords) },
  "vapour viscosity": { dimension: "viscosity", signed: false, synonyms: ofVapour(viscosityWords) },
};

const names = Object.keys(columnKinds) as readonly ColumnName[];

const byWord: ReadonlyMap<string, ColumnName> = new Map(
  names.flatMap((name) => [name, ...columnKinds[name].synonyms].map((word) => [keyOf(word), name] as const)),
);

function keyOf(word: string): string {
  return word
    .normalize("NFKC")
    .toLowerCase()
    .replace(/[\s_\-.]+/g, "");
}

export interface Column {
  readonly name: ColumnName;
  /** Place in the row, from 0. */
  readonly at: number;
  /** Unit of its bare numbers; absent where the header has no brackets. */
  readonly unit?: string;
  readonly header: string;
}

/** `density [kg/m³]`, `cp (J/(kg·K))` or `Pr`: name and unit, or what is wrong with the header. */
export function columnOf(header: string, at: number): Column | Problem {
  const bracketed = /^(.*?)\s*[[(](.*)[\])]\s*$/.exec(header.trim());
  const word = bracketed ? (bracketed[1] as string) : header.trim();
  const unit = bracketed?.[2]?.trim();
  const name = byWord.get(keyOf(word));
  if (name === undefined) {
    return valueProblem(
      "fluid",
      `The table's header "${header}" is not known; headers are ${names.join(", ")}, each with its unit in brackets.`,
    );
  }
  if (unit === undefined || unit === "") return { name, at, header };
  if (columnKinds[name].dimension === "none") return unitlessColumn(name, at, header, unit);
  const found = readUnit(unit);
  if (isProblem(found)) return valueProblem("fluid", `The table's header "${header}" has a unit that is not understood: ${found.sentence}`);
  if (!serves(found.dimension, columnKinds[name].dimension)) {
    return valueProblem(
      "fluid",
      `The table's header "${header}" has the unit of a ${found.dimension}; ${name} needs that of a ${columnKinds[name].dimension}.`,
    );
  }
  return { name, at, header, unit };
}

function unitlessColumn(name: ColumnName, at: number, header: string, unit: string): Column | Problem {
  if (unit === "-" || unit === "1" || unit === "–") return { name, at, header };
  return valueProblem("fluid", `The table's header "${header}" has a unit, but ${name} is a pure number; leave the brackets out.`);
}

/** 1/K is an expansivity; a unit of temperature is listed as such and may come as a difference. */
function serves(found: Dimension, wanted: Dimension): boolean {
  return found === wanted || (wanted === "temperature" && found === "temperature difference");
}
