/** A record as the lines that run: tables as lines of their own, the records inside it with their names marked. */
import { parseLine } from "../equations/line.js";
import { type Line, withTables } from "../equations/program.js";
import { renameSymbols, symbolsOf } from "../equations/rewrite.js";
import type { Correlation, Part } from "./correlation.js";

/**
 * All lines of a record in the order they run, its own last line last.
 * The names of a part's lines get the suffix `_PART`; the symbols it replaces become lines `SYMBOL_PART`; its other symbols are shared.
 */
export function linesOf(record: Correlation): readonly Line[] {
  const own = Object.entries(record.lines).map(([name, text]) => ({ name, node: parseLine(text, { strict: true }) }));
  const lines = withTables(own, record.tables ?? {});
  const parts = Object.entries(record.parts ?? {}).flatMap(([name, part]) => partLines(name, part));
  return inOrder([...parts, ...lines]);
}

function partLines(name: string, part: Part): readonly Line[] {
  const given = Object.entries(part.with ?? {}).map(([symbol, text]) => ({ name: symbol, node: parseLine(text, { strict: true }) }));
  const inner = linesOf(part.of);
  const marked = Object.fromEntries([...given, ...inner].map((line) => [line.name, `${line.name}_${name}`]));
  return [
    ...given.map((line) => ({ name: marked[line.name] as string, node: line.node })),
    ...inner.map((line) => ({ name: marked[line.name] as string, node: renameSymbols(line.node, marked) })),
  ];
}

/** Each line behind those it uses, otherwise as written; what is written last stays last. */
function inOrder(lines: readonly Line[]): readonly Line[] {
  const byName = new Map(lines.map((line) => [line.name, line]));
  const ordered = new Set<Line>();
  const place = (line: Line): void => {
    if (ordered.has(line)) return;
    for (const symbol of symbolsOf(line.node)) {
      const needed = byName.get(symbol);
      if (needed !== undefined && needed !== line) place(needed);
    }
    ordered.add(line);
  };
  for (const line of lines) place(line);
  return [...ordered];
}
