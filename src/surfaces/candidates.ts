import type { Correlation } from "../correlations/correlation.js";
import { allCorrelations } from "../correlations/index.js";
import type { Circumstances } from "./surface.js";

const confidenceOrder = { S: 0, N: 0, M: 1 } as const;

/**
 * The records that serve a surface, those named in `first` in front, then by how far they could be confirmed.
 * A uniform flux takes the equations for it before those for one temperature, which serve with the mean difference.
 */
export function serving(id: string, first: readonly string[]): (at: Circumstances) => readonly Correlation[] {
  const all = allCorrelations.filter((record) => record.result === "Nu" && record.serves.includes(id));
  const missing = first.filter((wanted) => !all.some((record) => record.id === wanted));
  if (missing.length > 0) throw new Error(`${id} prefers ${missing.join(", ")}, which no record is called`);
  const rank = (record: Correlation): number => {
    const place = first.indexOf(record.id);
    return place >= 0 ? place : first.length + confidenceOrder[record.confidence];
  };
  const ordered = all.map((record, i) => ({ record, i })).sort((a, b) => rank(a.record) - rank(b.record) || a.i - b.i);
  const cache: (readonly Correlation[] | undefined)[] = [];
  return (at) => {
    const place = (at.wall === "uniform flux" ? 1 : 0) + (at.local ? 2 : 0);
    let list = cache[place];
    if (list === undefined) {
      const extent = at.local ? "local" : "mean";
      const here = ordered.map((one) => one.record).filter((record) => record.extent === extent || record.extent === "either");
      list = [
        ...here.filter((record) => record.wall === at.wall || record.wall === "either"),
        ...(at.wall === "uniform flux" ? here.filter((record) => record.wall === "isothermal") : []),
      ];
      cache[place] = list;
    }
    return list;
  };
}
