import type { Finding, WordValue } from "../findings/finding.js";
import type { Problem } from "../quantities/problems.js";

/** One argument as it was understood, for the pane. */
export interface InputShown {
  readonly name: string;
  readonly given: string;
  /** The value as read, with its unit, e.g. "80 °C ± 2 K"; empty when it could not be read. */
  readonly read: string;
  readonly describe: string;
}

/** Everything the pane shows of one FILM call at one case. */
export interface Explanation {
  readonly functionId: string;
  readonly title: string;
  readonly problems: readonly Problem[];
  readonly inputs: readonly InputShown[];
  /** The word that the asked cell answers, e.g. "h". */
  readonly word: string;
  readonly value: WordValue | undefined;
  /** Present for functions of surfaces; the state functions have none. */
  readonly finding: Finding | undefined;
  readonly units: "SI" | "US";
  /** Which case of how many the cell shows. */
  readonly caseNumber: number;
  readonly cases: number;
}
