import type { Correlation } from "../correlations/correlation.js";
import { formatNumber } from "../quantities/format.js";
import type { Rival } from "./surface.js";

/** Between these Richardson numbers neither free nor forced convection may be left out (common practice). */
export const freeMatters = 0.1;
export const freeGoverns = 10;

const blends = new Map<string, Correlation>();

/** Forced and free blended by a published rule, to see how far free convection can move a forced result. */
function blended(forced: Correlation, free: Correlation, rule: Correlation, sign: "1" | "-1"): Correlation {
  const id = `${forced.id}+${free.id}${sign}`;
  let record = blends.get(id);
  if (record === undefined) {
    record = {
      ...rule,
      id,
      name: `${forced.name} blended with ${free.name}`,
      propertiesAt: forced.propertiesAt,
      towardsSurface: forced.towardsSurface,
      parts: { F: { of: forced }, N: { of: free }, mixed: { of: rule, with: { NuF: "Nu_F", NuN: "Nu_N", sign } } },
      tables: undefined,
      lines: { Nu: "Nu_mixed" },
      ranges: {},
    };
    blends.set(id, record);
  }
  return record;
}

/** The two ends that free convection may move a forced result to, with the remark for the verdict. */
export function mixedRivals(Ri: number, forced: Correlation, free: Correlation, rule: Correlation): readonly Rival[] {
  if (!Number.isFinite(Ri) || Ri < freeMatters) return [];
  const remark =
    Ri > freeGoverns
      ? `free convection governs: Ri ${formatNumber(Ri)} is above ${freeGoverns} (common practice)`
      : `free convection matters: Ri ${formatNumber(Ri)} is above ${freeMatters} (common practice)`;
  return [
    { record: blended(forced, free, rule, "1"), cause: "free convection assisting", origin: rule.source.work, remark },
    { record: blended(forced, free, rule, "-1"), cause: "free convection opposing", origin: rule.source.work },
  ];
}
