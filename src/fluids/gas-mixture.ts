/**
 * Ideal-gas mixtures: density and cp by ideal mixing, viscosity by Wilke's rule, conductivity by Wassiljewa's form with the coefficients of
 * Mason & Saxena. Composition frozen, by mole.
 */
import { coverageProblem, type Problem, valueProblem } from "../quantities/problems.js";
import type { Fluid, FluidRange, State, Uncertainty } from "./fluid.js";
import type { GasComponent, GasProperties } from "./low-density-gas.js";
import { impossible, outside, sayTemperature, sayTenths } from "./refusal.js";
import { dewPointOf, vapourPressureOfWater } from "./water-equations.js";
import { backgroundConductivity, backgroundViscosity } from "./water-transport.js";

/** J/(mol·K), exact by definition of the SI. */
export const gasConstant = 8.31446261815324;

/** The ideal gas leaves out about half a per cent in density for each bar. */
const pressureRange: readonly [number, number] = [1, 1e6];
const dissociating = 2000;

export interface Part {
  readonly gas: GasComponent;
  /** Mole fraction. */
  readonly fraction: number;
}

export interface MixtureProperties {
  /** J/(mol·K) */
  readonly cp: number;
  readonly viscosity: number;
  readonly conductivity: number;
}

/**
 * Mixing rules alone: properties of the parts in, of the mixture out. `polar` multiplies the interaction in the conductivity of unlike
 * parts: 1 after Wilke, 0.85 after Tondon & Saxena for polar with nonpolar gases.
 */
export function mix(
  fractions: readonly number[],
  molarMasses: readonly number[],
  parts: readonly GasProperties[],
  polar = 1,
): MixtureProperties {
  let cp = 0;
  let viscosity = 0;
  let conductivity = 0;
  for (let i = 0; i < parts.length; i++) {
    const x = fractions[i] as number;
    const one = parts[i] as GasProperties;
    let unlike = 0;
    for (let j = 0; j < parts.length; j++) {
      if (j === i) continue;
      unlike +=
        (fractions[j] as number) *
        interaction(one.viscosity / (parts[j] as GasProperties).viscosity, (molarMasses[i] as number) / (molarMasses[j] as number));
    }
    cp += x * one.cp;
    viscosity += (x * one.viscosity) / (x + unlike);
    conductivity += (x * one.conductivity) / (x + polar * unlike);
  }
  return { cp, viscosity, conductivity };
}

/** φ_ij of Wilke, which Mason & Saxena found to serve as A_ij too, once the ratio of translational conductivities is written with viscosities. */
function interaction(viscosityRatio: number, massRatio: number): number {
  const root = 1 + Math.sqrt(viscosityRatio) / Math.sqrt(Math.sqrt(massRatio));
  return (root * root) / Math.sqrt(8 * (1 + massRatio));
}

export interface MixtureAbout {
  readonly name: string;
  readonly synonyms: readonly string[];
  readonly family: string;
  readonly cautions: readonly string[];
}

/** A gas mixture as a fluid, or what is wrong with its composition. Fractions may be mole fractions or per cent; they must sum to one or a hundred. */
export function mixtureOf(parts: readonly Part[], about: MixtureAbout): Fluid | Problem {
  const merged = mergeParts(parts);
  const sum = merged.reduce((all, part) => all + part.fraction, 0);
  const fault = compositionFault(merged, sum);
  if (fault) return fault;
  const present = merged.filter((part) => part.fraction > 0);
  return fluidOf(
    present.map(({ gas, fraction }) => ({ gas, fraction: fraction / sum })),
    about,
  );
}

function mergeParts(parts: readonly Part[]): readonly Part[] {
  const merged = new Map<string, Part>();
  for (const part of parts) {
    const before = merged.get(part.gas.formula);
    merged.set(part.gas.formula, { gas: part.gas, fraction: part.fraction + (before?.fraction ?? 0) });
  }
  return [...merged.values()];
}

function compositionFault(parts: readonly Part[], sum: number): Problem | undefined {
  if (parts.length === 0) return valueProblem("composition", "A mixture needs at least one gas with its mole fraction.");
  const bad = parts.find((part) => !(part.fraction >= 0) || !Number.isFinite(part.fraction));
  if (bad) return valueProblem("composition", `The mole fraction of ${bad.gas.name} is ${bad.fraction}; it must be zero or above.`);
  if (Math.abs(sum - 1) <= 0.005 || Math.abs(sum - 100) <= 0.5) return undefined;
  return valueProblem("composition", `The mole fractions sum to ${Number(sum.toPrecision(4))}; they must sum to 1 (or 100 %).`);
}

function fluidOf(parts: readonly Part[], about: MixtureAbout): Fluid {
  const fractions = parts.map((part) => part.fraction);
  const molarMasses = parts.map((part) => part.gas.molarMass);
  const molarMass = fractions.reduce((all, x, k) => all + x * (molarMasses[k] as number), 0);
  const water = parts.find((part) => part.gas.formula === "H2O")?.fraction ?? 0;
  const range: FluidRange = { T: [Math.max(...parts.map(coldestOf)), Math.min(...parts.map((part) => part.gas.T[1]))], p: pressureRange };
  const refusal = (T: number, p: number): Problem | undefined =>
    impossible(T, p) ?? outside(about.name, range, T, p) ?? condensing(about.name, water, T, p);
  const state = (T: number, p: number): State | Problem =>
    refusal(T, p) ??
    stateAt(
      T,
      p,
      molarMass,
      mix(
        fractions,
        molarMasses,
        parts.map((part) => propertiesAt(part.gas, T)),
      ),
    );
  return {
    name: about.name,
    synonyms: about.synonyms,
    family: about.family,
    sources: parts.length === 1 ? ["svehla-1995", "mcbride-2002"] : ["svehla-1995", "mcbride-2002", "wilke-1950", "mason-saxena-1958"],
    range,
    molarMass,
    critical: undefined,
    freezingPoint: undefined,
    constantDensity: false,
    state,
    density: (T, p) => refusal(T, p) ?? (p * molarMass) / (gasConstant * T),
    uncertainty: (T, p) => uncertaintyAt(T, p, parts.length),
    ...(water > 0 && { dewPoint: (_T: number, p: number) => dewPointOf(water * p) }),
    cautions: (T, p) => cautionsAt(about, parts, water, T, p),
  };
}

/** Water vapour below the range of its fit follows the release for viscosity and conductivity at zero density. */
const steamFrom = 273.15;

function coldestOf(part: Part): number {
  return part.gas.formula === "H2O" ? steamFrom : part.gas.T[0];
}

function propertiesAt(gas: GasComponent, T: number): GasProperties {
  if (gas.formula !== "H2O" || T >= gas.T[0]) return gas.at(T);
  return { cp: gas.at(T).cp, viscosity: backgroundViscosity(T, 0), conductivity: backgroundConductivity(T, 0) };
}

function stateAt(T: number, p: number, molarMass: number, mixture: MixtureProperties): State {
  return {
    T,
    p,
    phase: "gas",
    density: (p * molarMass) / (gasConstant * T),
    cp: mixture.cp / molarMass,
    viscosity: mixture.viscosity,
    conductivity: mixture.conductivity,
    expansivity: 1 / T,
    enthalpy: undefined,
    speedOfSound: Math.sqrt((mixture.cp / (mixture.cp - gasConstant)) * (gasConstant / molarMass) * T),
  };
}

function condensing(name: string, water: number, T: number, p: number): Problem | undefined {
  if (water === 0 || T > 647 || water * p <= vapourPressureOfWater(T) * (1 + 1e-9)) return undefined;
  return coverageProblem(
    undefined,
    `${name} at ${sayTemperature(T)} is below its dew point, ${sayTenths(dewPointOf(water * p))}: water condenses. Take a warmer state.`,
  );
}

function uncertaintyAt(T: number, p: number, count: number): Uncertainty {
  const hot = T > 1000;
  const mixing = count > 1 ? 0.02 : 0;
  const density = 0.001 + (0.005 * p) / 1e5;
  return {
    density,
    cp: 0.01,
    viscosity: (hot ? 0.05 : 0.02) + mixing,
    conductivity: (hot ? 0.1 : 0.05) + mixing,
    expansivity: density,
    origin: "published",
  };
}

function cautionsAt(about: MixtureAbout, parts: readonly Part[], water: number, T: number, p: number): readonly string[] {
  const said = [...about.cautions];
  if (T > dissociating) said.push("Above about 1700 °C gases dissociate; these figures keep the composition frozen.");
  if (water > 0 && T < dewPointOf(water * p) + 20)
    said.push("Near the dew point water may condense on colder surfaces; its latent heat is not in h.");
  if (parts.some((part) => part.gas.formula === "SO2") && water > 0 && T < 433)
    said.push("Flue gas with sulfur has an acid dew point at about 110 to 150 °C; colder surfaces corrode.");
  if (
    parts.some((part) => part.gas.formula === "CO" || part.gas.formula === "H2S" || part.gas.formula === "NO" || part.gas.formula === "NO2")
  )
    said.push("The gas is toxic; local codes and licensed practice come first.");
  return said;
}
