import type { Correlation } from "../correlations/correlation.js";
import { linesOf } from "../correlations/expand.js";
import { type Node, parseLine } from "../equations/line.js";
import { compileProgram, type Program } from "../equations/program.js";
import { symbolsOf } from "../equations/rewrite.js";
import { closingLines, standardGroups } from "./groups.js";
import type { Surface, Variant } from "./surface.js";

export interface NamedLine {
  readonly name: string;
  readonly node: Node;
}

/** Where an input symbol of a program takes its number from. */
export type Feed =
  | {
      readonly slot: number;
      readonly from: "property" | "bulk" | "wall";
      readonly property: "density" | "cp" | "conductivity" | "viscosity" | "expansivity";
    }
  | { readonly slot: number; readonly from: "Ts" | "Tb" | "gravity" | "pressure" | "flux" }
  | { readonly slot: number; readonly from: "number"; readonly key: string };

export interface RangeLine {
  readonly symbol: string;
  readonly slot: number;
  readonly low: number;
  readonly high: number;
}

/** One record on one surface, compiled: groups before, the record's lines, h and q behind. */
export interface Runner {
  readonly record: Correlation;
  readonly program: Program;
  /** All lines in the order they run: what the trace prints and the review sheet recalculates. */
  readonly lines: readonly NamedLine[];
  readonly lawNames: ReadonlySet<string>;
  readonly feeds: readonly Feed[];
  readonly ranges: readonly RangeLine[];
  readonly slots: { readonly Nu: number; readonly h: number; readonly q: number; readonly Tref: number };
  readonly needsWall: boolean;
  readonly needsBulk: boolean;
  /** Fraction of the way from bulk to surface at which properties are taken. */
  readonly fraction: number;
  /** The record's lines alone, for its value at a stated group. */
  readonly law: Program;
  slot(symbol: string): number | undefined;
}

const properties = { rho: "density", cp: "cp", k: "conductivity", mu: "viscosity", beta: "expansivity" } as const;

/** Groups that words, verdicts and cautions may ask for whatever the record itself needs. */
const extras: Readonly<Record<Surface["motion"], readonly string[]>> = {
  free: ["Tf", "nu", "alpha", "Pr", "Gr", "Ra"],
  forced: ["Tf", "nu", "alpha", "Pr", "Re", "Pe", "Gr", "Ra", "Ri"],
  duct: ["Tf", "nu", "alpha", "Pr", "Re", "Pe", "Gr", "Ra", "Ri"],
};

const built = new WeakMap<Surface, Map<string, Runner>>();

/** The compiled runner of a record on a surface; built once for each variant. */
export function runnerOf(surface: Surface, record: Correlation, variant: Variant): Runner {
  let mine = built.get(surface);
  if (mine === undefined) {
    mine = new Map();
    built.set(surface, mine);
  }
  const key = variantKey(record, variant, surface);
  let runner = mine.get(key);
  if (runner === undefined) {
    runner = build(surface, record, variant);
    mine.set(key, runner);
  }
  return runner;
}

function variantKey(record: Correlation, variant: Variant, surface: Surface): string {
  let key = `${record.id}|${variant.flow}|${variant.buoyancy}|${variant.local}`;
  for (const name of variant.given) key += `|${name}`;
  for (const word of surface.wordsInLines ?? []) key += `|${word}=${variant.words[word] ?? ""}`;
  return key;
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

  const program = compileProgram(lines);
  const feeds = program.inputs.map((symbol) => feedOf(symbol, program.slot(symbol)));
  const ranges = Object.entries(record.ranges).map(([symbol, [low, high]]) => ({ symbol, slot: program.slot(symbol), low, high }));
  const known = new Set([...program.inputs, ...program.names]);
  return {
    record,
    program,
    lines,
    lawNames,
    feeds,
    ranges,
    slots: { Nu: program.slot("Nu"), h: program.slot("h"), q: program.slot("q"), Tref: program.slot("Tref") },
    needsWall: feeds.some((feed) => feed.from === "wall"),
    needsBulk: feeds.some((feed) => feed.from === "bulk"),
    fraction: record.propertiesAt === "film" ? 0.5 : record.propertiesAt === "bulk" ? 0 : (record.towardsSurface ?? 0.5),
    law: compileProgram(lawLines),
    slot: (symbol) => (known.has(symbol) ? program.slot(symbol) : undefined),
  };
}

function feedOf(symbol: string, slot: number): Feed {
  if (symbol === "Ts" || symbol === "Tb" || symbol === "gravity" || symbol === "pressure") return { slot, from: symbol };
  if (symbol === "q_wall") return { slot, from: "flux" };
  const [base, suffix] = symbol.split("_");
  const property = base !== undefined && base in properties ? properties[base as keyof typeof properties] : undefined;
  if (property !== undefined && suffix === undefined) return { slot, from: "property", property };
  if (property !== undefined && suffix === "b") return { slot, from: "bulk", property };
  if (property !== undefined && suffix === "w") return { slot, from: "wall", property };
  return { slot, from: "number", key: symbol };
}
