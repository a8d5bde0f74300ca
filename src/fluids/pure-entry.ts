/** The shelf's line for a pure fluid: plain data from its record, the fluid itself when someone asks. */
import type { Fluid } from "./fluid.js";
import { pureFluid, pureRange } from "./pure-fluid.js";
import type { ReferenceRecords } from "./pure-model.js";
import type { PureRecord } from "./pure-record.js";
import type { ShelfEntry } from "./shelf-entry.js";

export function pureEntry(record: PureRecord, references: ReferenceRecords): ShelfEntry {
  let built: Fluid | undefined;
  return {
    name: record.name,
    synonyms: record.synonyms,
    family: record.family,
    sources: record.sources,
    summary: summaryOf(record),
    range: pureRange(record),
    uncertainty: uncertaintyText(record),
    fluid() {
      built ??= pureFluid(record, references);
      return built;
    },
  };
}

function summaryOf(record: PureRecord): string {
  const kind = record.saturation.dewPressure
    ? "Gas and liquid as a pseudo-pure fluid, refused between bubble and dew line"
    : "Gas, liquid and beyond the critical point";
  if (!record.viscosity) return `${kind}, by a multiparameter equation of state; density and cp only, no transport.`;
  const transport = record.predictive ? `published transport (${record.predictive} predicted, 5 to 10 %)` : "published transport";
  return `${kind}, by a multiparameter equation of state with ${transport}.`;
}

function uncertaintyText({ uncertainty, viscosity }: PureRecord): string {
  const parts = [`density ${uncertainty.density} %`, `cp ${uncertainty.cp} %`];
  if (viscosity) parts.push(`viscosity ${uncertainty.viscosity} %`, `conductivity ${uncertainty.conductivity} %`);
  return `${parts.join(", ")} (${uncertainty.origin})`;
}
