import type { Problem } from "../quantities/problems.js";
import type { Fluid, FluidRange } from "./fluid.js";

/** What the number in a fluid's name says: `ethylene glycol 40 %`, `humid air 60 %`, `silicone oil 100`, `gear oil 220`. */
export interface NameParameter {
  /** "mass fraction", "relative humidity", "viscosity grade" … for lists and messages. */
  readonly meaning: string;
  /** "%" or the grade's unit, e.g. "cSt". */
  readonly unit: string;
  /** Smallest and largest number allowed; both ends included. */
  readonly limits: readonly [number, number];
  /** The number when the name comes without one; absent where the name needs one. */
  readonly otherwise?: number;
  /** How per cent may be counted; the first is the one meant when the name does not say. Absent where it is not a concentration. */
  readonly bases?: readonly Basis[];
  /** True where g/kg may stand for a tenth of a per cent, as for salinity. */
  readonly perMille?: boolean;
  /** Further names that mean this fluid only where a number follows; alone they are another fluid ("ethanol" and "ethanol 40 %"). */
  readonly namesWithNumber?: readonly string[];
  /** A usual number, for the examples in messages. */
  readonly example?: number;
}

/** How a concentration is counted. */
export type Basis = "mass" | "volume" | "mole";

/**
 * One line of the shelf: what a list shows of a fluid, and how the fluid is built when someone first asks for it.
 * Everything but `fluid` is plain data, so that listing the shelf builds nothing.
 */
export interface ShelfEntry {
  /** The name as lists show it, lower case unless a formula or designation. */
  readonly name: string;
  /** Other names and formulas; matching is case-blind and ignores spaces and hyphens. */
  readonly synonyms: readonly string[];
  readonly family: string;
  /** Keys of the bibliography, the formulation first. */
  readonly sources: readonly string[];
  /** One sentence: what it is and how well it is known. */
  readonly summary: string;
  /** Outer limits, kelvin and pascal; for a parametrised fluid those of the widest member. */
  readonly range: FluidRange;
  /** Typical relative 95 % uncertainty as a short text, e.g. "density 0.1 %, cp 0.5 %, viscosity 2 %, conductivity 2 %". */
  readonly uncertainty: string;
  /** Set where the name carries a number. */
  readonly parameter?: NameParameter;
  /** Builds the fluid; the shelf calls it once for each name and amount, and keeps the result. */
  fluid(amount?: number, basis?: Basis): Fluid | Problem;
}
