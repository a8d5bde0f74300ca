/** Boundary conditions as plain tables: for a sheet, or as comma-separated values (RFC 4180) for whatever solver reads them. */
import { findFilm } from "../../findings/film-finding.js";
import { formatNumber } from "../../quantities/format.js";
import { fromSI } from "../../quantities/conversion.js";
import type { Dimension } from "../../quantities/quantity.js";
import { defaultUnit } from "../../quantities/units.js";
import type { Written } from "../host.js";
import { words } from "../words.js";
import type { Boundary, Scanned } from "./scan.js";

export type System = "SI" | "US";

function head(word: string, dimension: Dimension, system: System): string {
  return `${word} [${defaultUnit(dimension, system).symbol}]`;
}

function inUnits(value: number | undefined, dimension: Dimension, system: System): Written {
  return value === undefined ? "" : Number(fromSI(value, defaultUnit(dimension, system)).toPrecision(9));
}

type Row = Scanned & { readonly boundary: Boundary };

export function withBoundary(rows: readonly Scanned[]): readonly Row[] {
  return rows.filter((row): row is Row => row.boundary !== undefined);
}

/** One line a boundary: where it stands, what it is, h with its bounds, the reference it belongs to. */
export function boundaryTable(rows: readonly Scanned[], system: System): readonly (readonly Written[])[] {
  const { cell, what, fluid, verdict } = words.workbook.heads;
  return [
    [
      cell,
      what,
      fluid,
      head("area", "area", system),
      head("h low", "film coefficient", system),
      head("h", "film coefficient", system),
      head("h high", "film coefficient", system),
      head("reference temperature", "temperature", system),
      verdict,
    ],
    ...withBoundary(rows).map((row): Written[] => [
      plain(row.address),
      `FILM.${row.functionId}`,
      plain(row.boundary.fluid),
      inUnits(row.boundary.area, "area", system),
      inUnits(row.boundary.hLow, "film coefficient", system),
      inUnits(row.boundary.h, "film coefficient", system),
      inUnits(row.boundary.hHigh, "film coefficient", system),
      inUnits(row.boundary.reference, "temperature", system),
      row.verdict,
    ]),
  ];
}

/** Surface temperatures of a table, kelvin, both ends in it. */
export interface Span {
  readonly from: number;
  readonly to: number;
  readonly count: number;
}

/** h of every boundary over the surface temperature, everything else as it stands in its cell. */
export function* temperatureRows(rows: readonly Scanned[], span: Span, system: System): Generator<readonly Written[]> {
  const { cell, verdict } = words.workbook.heads;
  yield [
    cell,
    head("Ts", "temperature", system),
    head("h low", "film coefficient", system),
    head("h", "film coefficient", system),
    head("h high", "film coefficient", system),
    head("reference temperature", "temperature", system),
    verdict,
  ];
  for (const row of withBoundary(rows)) {
    for (let i = 0; i < span.count; i++) {
      const T = span.from + ((span.to - span.from) * i) / Math.max(1, span.count - 1);
      const { surface, inputs, reference } = row.boundary;
      const finding = findFilm(surface, { ...inputs, wall: { kind: "temperature", T } });
      yield [
        plain(row.address),
        inUnits(T, "temperature", system),
        inUnits(finding.hLow, "film coefficient", system),
        inUnits(finding.h, "film coefficient", system),
        inUnits(finding.hHigh, "film coefficient", system),
        inUnits(reference, "temperature", system),
        finding.verdict,
      ];
    }
  }
}

/** A text that a spreadsheet would take for a formula is kept from being one. */
function plain(text: string): string {
  return /^[=+\-@\t\r]/.test(text) ? `'${text}` : text;
}

export function csvOf(rows: readonly (readonly Written[])[]): string {
  const field = (value: Written): string => {
    const text = typeof value === "number" ? formatNumber(value, 9) : String(value);
    return /[",\r\n]/.test(text) ? `"${text.replace(/"/g, '""')}"` : text;
  };
  return `${rows.map((row) => row.map(field).join(",")).join("\r\n")}\r\n`;
}
