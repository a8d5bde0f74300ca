/** What is written down of a pure (or pseudo-pure) fluid: the published coefficients and nothing that follows from them. */
import type { WorkKey } from "../bibliography.js";
import type { Ancillary } from "./ancillary.js";
import type { ConductivityRecord } from "./conductivity.js";
import type { ResidualRecord } from "./helmholtz.js";
import type { IdealRecord } from "./helmholtz-ideal.js";
import type { MeltingLine } from "./melting-line.js";
import type { ViscosityRecord } from "./viscosity.js";

export interface PureRecord {
  readonly name: string;
  readonly synonyms: readonly string[];
  readonly family: "gas" | "refrigerant" | "organic liquid" | "water";
  /** The equation of state first, then transport, melting line, surface tension. */
  readonly sources: readonly WorkKey[];
  /** kg/mol */
  readonly molarMass: number;
  /** J/(mol·K), as the paper has it */
  readonly gasConstant: number;
  /** K, Pa, mol/m³ */
  readonly reducing: { readonly T: number; readonly p: number; readonly rho: number };
  /** K, Pa */
  readonly critical: { readonly T: number; readonly p: number };
  /** K: triple point, or where the equation begins; highest temperature. */
  readonly T: readonly [number, number];
  /** False where the lowest temperature is the equation's limit and not the freezing point. */
  readonly beginsAtFreezing?: false;
  /** Pa, highest pressure */
  readonly pMax: number;
  readonly ideal: IdealRecord;
  readonly residual: ResidualRecord;
  readonly saturation: {
    /** Of the liquid (bubble) where a blend has two. */
    readonly pressure: Ancillary;
    /** Dew pressure of a pseudo-pure blend, which has no meaning between the two. */
    readonly dewPressure?: Ancillary;
    readonly liquid: Ancillary;
    readonly vapour: Ancillary;
  };
  /** N/m: Σ a (1 − T/Tc)^n */
  readonly surfaceTension?: { readonly T: number; readonly terms: readonly (readonly [a: number, n: number])[] };
  readonly melting?: MeltingLine;
  readonly viscosity?: ViscosityRecord;
  readonly conductivity?: ConductivityRecord;
  /** K: where the viscosity holds, if narrower than the equation of state. */
  readonly viscosityT?: readonly [number, number];
  /** Set where viscosity or conductivity is predicted and not fitted to measurements of the fluid. */
  readonly predictive?: "viscosity" | "conductivity" | "viscosity and conductivity";
  /** Per cent: away from the critical region. */
  readonly uncertainty: {
    readonly density: number;
    readonly cp: number;
    readonly viscosity?: number;
    readonly conductivity?: number;
    readonly origin: string;
  };
  /** Dangers and peculiarities that hold at any state. */
  readonly cautions: readonly string[];
}
