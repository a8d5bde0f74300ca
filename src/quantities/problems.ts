/**
 * What can be wrong, as data, and the one place that writes it as a sentence for an engineer.
 * Grammar: argument, what was given in the user's own unit, what is allowed or wanted, what to write instead.
 */

/** `value` becomes #VALUE! (the arguments are at fault); `coverage` becomes #N/A (no published equation or formulation covers it). */
export type Fault = "value" | "coverage";

export interface Problem {
  readonly problem: true;
  readonly fault: Fault;
  /** Name of the argument or setting at fault, as the function's help spells it. */
  readonly argument?: string;
  /** The whole sentence, without the argument's name in front. */
  readonly sentence: string;
}

export function valueProblem(argument: string | undefined, sentence: string): Problem {
  return argument === undefined ? { problem: true, fault: "value", sentence } : { problem: true, fault: "value", argument, sentence };
}

export function coverageProblem(argument: string | undefined, sentence: string): Problem {
  return argument === undefined ? { problem: true, fault: "coverage", sentence } : { problem: true, fault: "coverage", argument, sentence };
}

export function isProblem(thing: unknown): thing is Problem {
  return typeof thing === "object" && thing !== null && (thing as { problem?: unknown }).problem === true;
}

/** All bad arguments together, as one text: `height: … diameter: …`. */
export function sentenceOf(problems: Problem | readonly Problem[]): string {
  const list = Array.isArray(problems) ? (problems as readonly Problem[]) : [problems as Problem];
  return list.map((one) => (one.argument === undefined ? one.sentence : `${one.argument}: ${one.sentence}`)).join(" ");
}
