/** What each kind of quantity is called, what its SI exponents are, its default units, and an example for messages. */
import type { Dimension, Reading } from "./quantity.js";
import type { Vector } from "./unit-table.js";

export interface Kind {
  readonly dimension: Dimension;
  /** With its article, as a sentence needs it. */
  readonly phrase: string;
  readonly vector: Vector;
  /** Unit of bare numbers and of results. */
  readonly SI: string;
  readonly US: string;
  /** A likely value in each of these units. */
  readonly example: Readonly<Record<Reading["system"], number>>;
}

function kind(dimension: Dimension, phrase: string, vector: Vector, SI: string, US: string, exampleSI: number, exampleUS: number): Kind {
  return { dimension, phrase, vector, SI, US, example: { SI: exampleSI, US: exampleUS } };
}

export const kinds: readonly Kind[] = [
  kind("temperature", "a temperature", [0, 0, 0, 1, 0, 0], "°C", "°F", 20, 70),
  kind("temperature difference", "a temperature difference", [0, 0, 0, 1, 0, 0], "K", "°F", 5, 10),
  kind("length", "a length", [1, 0, 0, 0, 0, 0], "m", "ft", 0.3, 1),
  kind("area", "an area", [2, 0, 0, 0, 0, 0], "m²", "ft²", 0.5, 5),
  kind("speed", "a speed", [1, 0, -1, 0, 0, 0], "m/s", "ft/s", 2, 6),
  // Radians a second in both systems: a bare 3000 must not change by a factor of ten with a setting.
  kind("rotation", "a speed of rotation", [0, 0, -1, 0, 0, 1], "rad/s", "rad/s", 100, 100),
  kind("mass flow", "a mass flow", [0, 1, -1, 0, 0, 0], "kg/s", "lb/h", 0.4, 3000),
  kind("volume flow", "a volume flow", [3, 0, -1, 0, 0, 0], "m³/s", "ft³/min", 0.02, 40),
  kind("mass flux", "a mass flux", [-2, 1, -1, 0, 0, 0], "kg/(m²·s)", "lb/(h·ft²)", 300, 200000),
  kind("pressure", "a pressure", [-1, 1, -2, 0, 0, 0], "Pa", "psia", 101325, 14.7),
  kind("heat flux", "a heat flux", [0, 1, -3, 0, 0, 0], "W/m²", "Btu/(h·ft²)", 500, 150),
  kind("power", "a power", [2, 1, -3, 0, 0, 0], "W", "Btu/h", 250, 1000),
  kind("film coefficient", "a film coefficient", [0, 1, -3, -1, 0, 0], "W/(m²·K)", "Btu/(h·ft²·°F)", 10, 2),
  kind("conductivity", "a conductivity", [1, 1, -3, -1, 0, 0], "W/(m·K)", "Btu/(h·ft·°F)", 0.6, 0.35),
  kind("density", "a density", [-3, 1, 0, 0, 0, 0], "kg/m³", "lb/ft³", 998, 62),
  kind("specific heat", "a specific heat", [2, 0, -2, -1, 0, 0], "J/(kg·K)", "Btu/(lb·°F)", 4180, 1),
  kind("viscosity", "a dynamic viscosity", [-1, 1, -1, 0, 0, 0], "Pa·s", "lb/(ft·s)", 0.001, 0.0007),
  kind("kinematic viscosity", "a kinematic viscosity or diffusivity", [2, 0, -1, 0, 0, 0], "m²/s", "ft²/h", 1e-5, 0.04),
  kind("expansivity", "an expansivity", [0, 0, 0, -1, 0, 0], "1/K", "1/°F", 0.003, 0.002),
  kind("thermal resistance", "a thermal resistance", [-2, -1, 3, 1, 0, 0], "K/W", "h·°F/Btu", 0.5, 0.3),
  kind("area resistance", "a thermal resistance of unit area", [0, -1, 3, 1, 0, 0], "m²·K/W", "h·ft²·°F/Btu", 0.0002, 0.001),
  kind("specific energy", "an energy per mass", [2, 0, -2, 0, 0, 0], "J/kg", "Btu/lb", 2.26e6, 970),
  kind("surface tension", "a surface tension", [0, 1, -2, 0, 0, 0], "N/m", "lbf/ft", 0.07, 0.005),
  kind("molar mass", "a molar mass", [0, 1, 0, 0, -1, 0], "kg/mol", "lb/lbmol", 0.029, 29),
  kind("acceleration", "an acceleration", [1, 0, -2, 0, 0, 0], "m/s²", "ft/s²", 9.81, 32.2),
  kind("angle", "an angle", [0, 0, 0, 0, 0, 1], "deg", "deg", 30, 30),
  kind("none", "a number without dimension", [0, 0, 0, 0, 0, 0], "-", "-", 0.9, 0.9),
];

const byDimension: ReadonlyMap<Dimension, Kind> = new Map(kinds.map((one) => [one.dimension, one]));

export function kindOf(dimension: Dimension): Kind {
  return byDimension.get(dimension) as Kind;
}

/** A sole temperature unit is a temperature; the grammar decides that before it asks here. */
const byVector: ReadonlyMap<string, Kind> = new Map(
  kinds.filter((one) => one.dimension !== "temperature").map((one) => [one.vector.join(), one]),
);

export function kindOfVector(vector: Vector): Kind | undefined {
  return byVector.get(vector.join());
}

/** Kinds that a text may well carry by mistake though no argument takes them. */
const foreign: Readonly<Record<string, string>> = {
  "0,0,1,0,0,0": "a time",
  "0,1,0,0,0,0": "a mass",
  "3,0,0,0,0,0": "a volume",
  "1,1,-2,0,0,0": "a force",
  "2,1,-2,0,0,0": "an energy",
  "0,0,0,0,1,0": "an amount of substance",
  "2,1,-2,-1,0,0": "a heat capacity",
  "2,1,-2,-1,-1,0": "a molar heat capacity",
  "3,-1,0,0,0,0": "a specific volume",
  "0,0,-2,0,0,1": "an angular acceleration",
};

export function foreignPhrase(vector: Vector): string | undefined {
  return foreign[vector.join()];
}

/** `a speed, mass flow or volume flow`. */
export function phraseOf(wanted: readonly Dimension[]): string {
  const phrases = wanted.map((one) => kindOf(one).phrase);
  const [first = "a number", ...rest] = phrases;
  const later = rest.map((one) => one.replace(/^an? /, ""));
  const last = later.pop();
  return last === undefined ? first : `${[first, ...later].join(", ")} or ${last}`;
}
