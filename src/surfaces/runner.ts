import type { Correlation } from "../correlations/correlation.js";
import { linesOf } from "../correlations/expand.js";
import { type Node, parseLine } from "../equations/line.js";
import { compileProgram, type Program } from "../equations/program.js";
import { symbolsOf } from "../equations/rewrite.js";
import { closingLines, standardGroups } from "./groups.js";
import { type Intake, intakeOf } from "./intake.js";
import type { Surface, Variant } from "./surface.js";

export interface NamedLine {
  readonly name: string;
  readonly node: Node;
}

export interface RangeLine {
  readonly symbol: string;
  readonly slot: number;
  readonly low: number;
  readonly high: number;
}

/** A program with the places of its inputs. */
export interface Evaluator {
  readonly program: Program;
  readonly intake: Intake;
  readonly lines: readonly NamedLine[];
  has(symbol: string): boolean;
}

/** One record on one surface, compiled: groups before, the record's lines, h and q behind. */
export interface Runner {
  readonly record: Correlation;
  /** What h, the range tests and the verdict need. */
  readonly core: Evaluator;
  /** All lines, with the groups and frictions that words may ask for: what the trace prints and the review sheet recalculates. */
  whole(): Evaluator;
  readonly lawNames: ReadonlySet<string>;
  readonly ranges: readonly RangeLine[];
  readonly slots: {
    readonly Nu: number;
    readonly h: number;
    readonly q: number;
    readonly Tref: number;
    readonly k: number;
    readonly L: number;
  };
  /** Fraction of the way from bulk to surface at which properties are taken. */
  readonly fraction: number;
  /** The record's lines alone, for its value at a stated group. */
  law(): Program;
}

/** Groups that every verdict looks at. */
const judged: Readonly<Record<Surface["motion"], readonly string[]>> = { free: [], forced: ["Re", "Ri"], duct: ["Re", "Ri"] };

/** Groups that words and cautions may ask for whatever the record itself needs. */
const extras: Readonly<Record<Surface["motion"], readonly string[]>> = {
  free: ["Tf", "nu", "alpha", "Pr", "Gr", "Ra"],
  forced: ["Tf", "nu", "alpha", "Pr", "Re", "Pe", "Gr", "Ra", "Ri"],
  duct: ["Tf", "nu", "alpha", "Pr", "Re", "Pe", "Gr", "Ra", "Ri"],
};

const built = new WeakMap<Surface, Map<Correlation, Map<string, Runner>>>();

/** The compiled runner of a record on a surface; built once for each variant. */
export function runnerOf(surface: Surface, record: Correlation, variant: Variant): Runner {
  let mine = built.get(surface);
  if (mine === undefined) {
    mine = new Map();
    built.set(surface, mine);
  }
  let variants = mine.get(record);
  if (variants === undefined) {
    variants = new Map();
    mine.set(record, variants);
  }
  let runner = variants.get(variant.key);
  if (runner === undefined) {
    runner = build(surface, record, variant);
    variants.set(variant.key, runner);
  }
  return runner;
}

function build(surface: Surface, record: Correlation, variant: Variant): Runner {
  const groups: Record<string, string> = { Tref: "Tb", ...standardGroups(variant), ...surface.groups(variant) };
  const lawLines = linesOf(record);
  const lawNames = new Set(lawLines.map((line) => line.name));
  const lines: NamedLine[] = [];
  const done = new Set<string>();
  const parsed = new Map<string, Node>();
  const groupNode = (name: string): Node | undefined => {
    const text = groups[name];
    if (text === undefined) return undefined;
    let node = parsed.get(name);
    if (node === undefined) {
      node = parseLine(text);
      parsed.set(name, node);
    }
    return node;
  };
  const add = (name: string, shadowed: ReadonlySet<string>): void => {
    if (done.has(name) || shadowed.has(name)) return;
    const node = groupNode(name);
    if (node === undefined) return;
    done.add(name);
    for (const symbol of symbolsOf(node)) add(symbol, shadowed);
    lines.push({ name, node });
  };

  for (const line of lawLines) for (const symbol of symbolsOf(line.node)) add(symbol, lawNames);
  for (const symbol of Object.keys(record.ranges)) add(symbol, lawNames);
  const none: ReadonlySet<string> = new Set();
  add("L", none);
  add("Tref", none);
  for (const line of lawLines) {
    lines.push(line);
    done.add(line.name);
  }
  const last = lawLines[lawLines.length - 1];
  if (last === undefined) throw new Error(`${record.id} has no lines`);
  if (last.name !== "Nu" && !done.has("Nu")) lines.push({ name: "Nu", node: parseLine(last.name) });
  for (const [name, text] of Object.entries(closingLines)) if (!done.has(name)) lines.push({ name, node: parseLine(text) });
  for (const name of judged[surface.motion]) add(name, none);
  const core = evaluatorOf(lines.slice());
  for (const name of extras[surface.motion]) add(name, none);
  for (const beside of surface.beside ?? []) {
    for (const line of linesOf(beside)) {
      if (done.has(line.name)) continue;
      for (const symbol of symbolsOf(line.node)) add(symbol, none);
      lines.push(line);
      done.add(line.name);
    }
  }
  for (const word of Object.values(surface.words ?? {})) add(word.symbol, none);
  if (surface.area !== undefined && !done.has("wettedArea")) add("wettedArea", none);

  let whole: Evaluator | undefined;
  let law: Program | undefined;
  const slot = (symbol: string): number => core.program.slot(symbol);
  return {
    record,
    core,
    whole: () => {
      whole ??= evaluatorOf(lines);
      return whole;
    },
    lawNames,
    ranges: Object.entries(record.ranges).map(([symbol, [low, high]]) => ({ symbol, slot: slot(symbol), low, high })),
    slots: { Nu: slot("Nu"), h: slot("h"), q: slot("q"), Tref: slot("Tref"), k: slot("k"), L: slot("L") },
    fraction: record.propertiesAt === "film" ? 0.5 : record.propertiesAt === "bulk" ? 0 : (record.towardsSurface ?? 0.5),
    law: () => {
      law ??= compileProgram(lawLines);
      return law;
    },
  };
}

function evaluatorOf(lines: readonly NamedLine[]): Evaluator {
  const program = compileProgram(lines);
  const known = new Set([...program.inputs, ...program.names]);
  return { program, intake: intakeOf(program), lines, has: (symbol) => known.has(symbol) };
}
