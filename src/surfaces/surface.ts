import type { Correlation } from "../correlations/correlation.js";
import type { Fluid } from "../fluids/fluid.js";
import type { Problem } from "../quantities/problems.js";
import type { Dimension } from "../quantities/quantity.js";

/** An argument between bulk and `give`: its key is also its symbol in the lines. */
export interface ArgumentDefinition {
  readonly key: string;
  readonly name: string;
  readonly dimensions: readonly Dimension[];
  readonly sign: "positive" | "not negative" | "any";
  readonly describe: string;
  readonly optional?: boolean;
}

/** A setting: a quantity, one of a few words, or free text. */
export interface SettingDefinition {
  readonly name: string;
  readonly key: string;
  readonly kind: "quantity" | "word" | "text";
  readonly dimensions?: readonly Dimension[];
  readonly words?: readonly string[];
  readonly sign?: "positive" | "not negative" | "any";
  readonly low?: number;
  readonly high?: number;
  readonly describe: string;
}

/** What drives the surface: its own temperature, or the flux it must give off (positive out of the part). */
export type Wall = { readonly kind: "temperature"; readonly T: number } | { readonly kind: "flux"; readonly q: number };

export type FlowKind = "speed" | "mass flow" | "volume flow";

/** One case, read and in SI: kelvin, pascal absolute; angles in degrees. */
export interface Inputs {
  readonly fluid: Fluid;
  readonly wall: Wall;
  readonly Tb: number;
  readonly pressure: number;
  readonly gravity: number;
  /** Dimensions and numeric settings by symbol. */
  readonly numbers: Readonly<Record<string, number>>;
  /** Word settings by key. */
  readonly words: Readonly<Record<string, string>>;
  readonly flow?: FlowKind;
  /** Radiating surfaces: both or neither. */
  readonly radiation?: { readonly emissivity: number; readonly surroundings: number };
  readonly equation?: string;
  /** One record alone, for comparing; set by us, never by a cell. */
  readonly only?: Correlation;
  /** What the reading of the cells leaves to be said, such as a blank taken as 0 °C. */
  readonly remarks?: readonly string[];
  readonly beyondRange: "refuse" | "flag";
  readonly bounds: "statistical" | "worst";
  readonly concern?: "too hot" | "too cold";
  readonly area?: number;
  readonly tolerances: readonly Tolerance[];
}

/** An input that is known only within a 95 % interval. */
export interface Tolerance {
  /** "surface", "bulk", "pressure", "gravity", "emissivity", "surroundings" or the key of a number. */
  readonly key: string;
  readonly name: string;
  readonly halfWidth: number;
}

/** What a surface may ask before it names its candidates. */
export interface Circumstances {
  readonly inputs: Inputs;
  readonly Ts: number;
  /** True where buoyancy lifts the fluid at the wall: surface the lighter side. */
  readonly rising: boolean;
  readonly wall: "isothermal" | "uniform flux";
  readonly local: boolean;
  readonly phase: "liquid" | "gas" | "supercritical";
}

/** What a group line may depend on besides its symbols. */
export interface Variant {
  readonly flow: FlowKind | "none";
  /** Buoyancy from the expansivity, or from the densities at wall and bulk. */
  readonly buoyancy: "expansivity" | "densities";
  readonly local: boolean;
  /** Optional numbers that the case gives, such as a length: lines may differ without them. */
  readonly given: ReadonlySet<string>;
  /** All of the above as one text, under which compiled programs are kept. */
  readonly key: string;
  /** Words of settings, for the few that change a line. */
  readonly words: Readonly<Record<string, string>>;
}

/** A second regime that might hold as well: the bounds reach to it, and the verdict says so. */
export interface Rival {
  readonly record: Correlation;
  readonly cause: string;
  /** Goes into the verdict after "in range"; absent where the cause alone stands in the trace. */
  readonly remark?: string;
  readonly origin: string;
}

/** Reads the value of any symbol at the point that was chosen. */
export type Values = (symbol: string) => number;

export interface Surface {
  readonly id: string;
  readonly title: string;
  readonly describe: string;
  readonly motion: "free" | "forced" | "duct";
  readonly arguments: readonly ArgumentDefinition[];
  readonly settings: readonly SettingDefinition[];
  /** Names for `surface` and `bulk` where the function's help uses others. */
  readonly wallName: "surface" | "wall";
  /** Word settings on which `groups` depends. */
  readonly wordsInLines?: readonly string[];
  /** What q = h·(Ts − reference) is taken against, in words. */
  readonly reference: string;
  /** Lines of algebra beyond, or in place of, the standard groups. */
  groups(variant: Variant): Readonly<Record<string, string>>;
  /** What is wrong with the dimensions taken together, before anything is evaluated. */
  check?(inputs: Inputs): Problem | undefined;
  /** Published equations for the circumstances, in order of preference. */
  candidates(at: Circumstances): readonly Correlation[];
  /** Ids of the records that stand in front; those from memory are taken without being named only if they are among these. */
  readonly prefers: readonly string[];
  /** Why the first of them stands first: for help and the pane. */
  readonly preference: string;
  rivals?(at: Circumstances, value: Values, chosen: Correlation): readonly Rival[];
  /** Records evaluated beside the Nusselt number, such as a friction factor: their last lines are symbols for words and groups. */
  readonly beside?: readonly Correlation[];
  regime(at: Circumstances, value: Values): string;
  /** Largest over mean of (Ts − reference) under uniform flux, where the equation's source gives it. */
  peak?(at: Circumstances, value: Values): number | undefined;
  /** Wetted area from the dimensions alone, m², as algebra; absent where a dimension is missing. */
  readonly area?: string;
  cautions?(at: Circumstances, value: Values): readonly string[];
  /** True where its lines take account of roughness; elsewhere a roughness setting earns a caution. */
  readonly takesRoughness?: boolean;
  /** Symbols that `give` may ask for by the same name. */
  readonly words?: Readonly<Record<string, { readonly symbol: string; readonly dimension: Dimension; readonly describe: string }>>;
}
