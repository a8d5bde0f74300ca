/** Lines compiled to closures over numbered slots: no text is built, nothing is allocated while a program runs. */
import { compileNode, type Step } from "./closure.js";
import { LineError, type Node, parseLine } from "./line.js";
import { symbolsOf } from "./rewrite.js";
import { lowerTable, type Table } from "./table.js";

export interface Line {
  readonly name: string;
  readonly node: Node;
}

export interface Program {
  /** Free symbols in order of first use; preset their slots before running. */
  readonly inputs: readonly string[];
  /** Names of the lines in order. */
  readonly names: readonly string[];
  /** How many numbers `values` must hold. */
  readonly size: number;
  /** Where a symbol or a line's value stands. Throws for an unknown name. */
  slot(name: string): number;
  /** Fills the slot of every line from the slots of the inputs; texts stand as their `textCode`. */
  run(values: Float64Array): void;
  readonly nodes: readonly Node[];
}

/** Compiles lines in their order: a line may use the inputs and the lines before it. Throws `LineError` otherwise. */
export function compileProgram(
  lines: readonly (readonly [name: string, text: string])[] | readonly Line[],
  options: { readonly tables?: Readonly<Record<string, Table>> } = {},
): Program {
  const whole = withTables(lines.map(lineOf), options.tables ?? {});
  const names = whole.map((line) => line.name);
  const inputs = inputsOf(whole);
  const slots = new Map([...inputs, ...names].map((name, i) => [name, i]));
  const slot = (name: string): number => {
    const found = slots.get(name);
    if (found === undefined) throw new Error(`The program has no symbol ${name}.`);
    return found;
  };
  const steps = whole.map((line) => compileNode(line.node, slot));
  return {
    inputs,
    names,
    size: slots.size,
    slot,
    run: runner(steps, inputs.length),
    nodes: whole.map((line) => line.node),
  };
}

function lineOf(line: readonly [name: string, text: string] | Line): Line {
  return "node" in line ? line : { name: line[0], node: parseLine(line[1]) };
}

/** Each table becomes a line of its own, in front of the first line that uses it. */
export function withTables(lines: readonly Line[], tables: Readonly<Record<string, Table>>): readonly Line[] {
  const waiting = new Map(Object.entries(tables));
  const whole: Line[] = [];
  for (const line of lines) {
    for (const name of symbolsOf(line.node)) {
      const table = waiting.get(name);
      if (table === undefined) continue;
      waiting.delete(name);
      whole.push({ name, node: lowerTable(name, table) });
    }
    whole.push(line);
  }
  return whole;
}

function inputsOf(lines: readonly Line[]): readonly string[] {
  const all = new Set(lines.map((line) => line.name));
  if (all.size < lines.length) throw new LineError(`The name ${twice(lines)} is given to two lines; each needs a name of its own.`, 1);
  const known = new Set<string>();
  const inputs = new Set<string>();
  for (const line of lines) {
    for (const symbol of symbolsOf(line.node)) {
      if (known.has(symbol)) continue;
      if (all.has(symbol)) throw new LineError(`The line ${line.name} uses ${symbol} before ${symbol} is worked out; change the order.`, 1);
      inputs.add(symbol);
    }
    known.add(line.name);
  }
  return [...inputs];
}

function twice(lines: readonly Line[]): string {
  return lines.find((line, i) => lines.findIndex((other) => other.name === line.name) < i)?.name ?? "";
}

function runner(steps: readonly Step[], first: number): (values: Float64Array) => void {
  return (values) => {
    for (let i = 0; i < steps.length; i++) values[first + i] = (steps[i] as Step)(values);
  };
}
