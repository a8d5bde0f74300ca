import type { Problem } from "../quantities/problems.js";
import type { Dimension } from "../quantities/quantity.js";

/** Where a step's number comes from. */
export type StepKind = "input" | "setting" | "property" | "group" | "equation" | "result" | "solved";

/** One line of the way from the inputs to h: what the trace, the pane and the review sheet show. SI; temperatures in kelvin. */
export interface Step {
  readonly symbol: string;
  readonly meaning: string;
  readonly value: number | string;
  /** SI unit as text, "" for pure numbers. */
  readonly unit: string;
  readonly kind: StepKind;
  /** The line of algebra that gives the value; absent for inputs, properties and solved values. */
  readonly line?: string;
  /** Citation or remark: property source and the state it was taken at, the equation's source, the residual of a solved value. */
  readonly note?: string;
  /** Half-width of the input's 95 % interval, SI, where one was given. */
  readonly tolerance?: number;
}

/** The published interval of one group, and where the case lies: data for verdicts, strips and the review sheet. */
export interface RangeTest {
  readonly symbol: string;
  readonly meaning: string;
  readonly value: number;
  readonly low: number;
  readonly high: number;
  readonly within: boolean;
  readonly origin: string;
  /** Short citation, e.g. "Churchill & Chu 1975". */
  readonly source: string;
}

/** How far one cause alone moves h, W/(m²·K): both numbers are zero or positive. */
export interface Contribution {
  readonly cause: string;
  readonly below: number;
  readonly above: number;
  readonly origin: string;
}

/** One row of `compare`. */
export interface Alternative {
  readonly id: string;
  readonly equation: string;
  readonly source: string;
  /** NaN never appears: undefined where the equation gives no number here. */
  readonly h: number | undefined;
  readonly low: number | undefined;
  readonly high: number | undefined;
  readonly inRange: boolean;
  readonly verdict: string;
  readonly chosen: boolean;
}

export interface EquationShown {
  readonly id: string;
  readonly name: string;
  /** Full citation with the place in the work. */
  readonly source: string;
  readonly scatter: number;
  readonly scatterOrigin: string;
  readonly confidence: string;
  readonly note: string;
  readonly propertiesAt: string;
  /** The record's own lines, parts expanded, in order: name and algebra. */
  readonly lines: readonly (readonly [name: string, algebra: string])[];
}

/** A value that a word asked for: SI with its dimension, a text, or the problem that stands in its place. */
export type WordValue = { readonly value: number; readonly dimension: Dimension } | string | Problem;

/** What one case of one surface comes to. Everything but the point itself is worked out when it is asked for. */
export interface Finding {
  readonly functionId: string;
  /** Short sentence: "in range", or what is wrong, first things first. */
  readonly verdict: string;
  readonly inRange: boolean;
  /** True where h, Nu and q may be shown (in range, or out of range with `beyond range = flag`). */
  readonly answered: boolean;
  /** The value of any word of `give` but the blocks, in SI. */
  word(name: string): WordValue;
  readonly h: number | undefined;
  readonly hLow: number | undefined;
  readonly hHigh: number | undefined;
  steps(): readonly Step[];
  rangeTests(): readonly RangeTest[];
  contributions(): readonly Contribution[];
  compare(): readonly Alternative[];
  cautions(): readonly string[];
  equation(): EquationShown | undefined;
}
