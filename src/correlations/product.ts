/** A published law times a published factor, as one record. */
import type { Correlation } from "./correlation.js";
import { linesOf } from "./expand.js";

/** The result is the law's Nu times the factor; ranges of both hold. The factor's scatter adds nothing: the law's own data hold it. */
export function productOf(law: Correlation, factor: Correlation): Correlation {
  return {
    ...law,
    id: `${law.id}+${factor.id}`,
    name: `${law.name}, times ${factor.name}`,
    parts: { law: { of: law }, factor: { of: factor } },
    tables: undefined,
    lines: { Nu: `${lastName(law)}_law*${lastName(factor)}_factor` },
    ranges: { ...rangesIn(law, "law"), ...rangesIn(factor, "factor") },
    limit: undefined,
    note: [law.note, `Times ${factor.name} (${factor.source.work}). ${factor.note ?? ""}`].filter(Boolean).join(" ").trim(),
    symbols: { ...factor.symbols, ...law.symbols },
  };
}

function lastName(record: Correlation): string {
  const names = Object.keys(record.lines);
  return names[names.length - 1] as string;
}

/** A range on one of the part's own lines follows that line's new name. */
function rangesIn(record: Correlation, part: string): Correlation["ranges"] {
  const own = new Set(linesOf(record).map((line) => line.name));
  return Object.fromEntries(Object.entries(record.ranges).map(([symbol, range]) => [own.has(symbol) ? `${symbol}_${part}` : symbol, range]));
}
