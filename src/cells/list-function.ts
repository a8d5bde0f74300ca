import { allCorrelations } from "../correlations/index.js";
import { fullCitation } from "../findings/citation.js";
import { surfaceWords } from "../findings/words.js";
import { shelf } from "../fluids/shelf.js";
import { formatNumber } from "../quantities/format.js";
import { valueProblem } from "../quantities/problems.js";
import { unitNames } from "../quantities/units.js";
import { allSurfaces } from "../surfaces/index.js";
import { commonSettings } from "../surfaces/settings.js";
import { type CellBlock, CellError, type CellValue, isErrorCell, quoted } from "./cell.js";
import { isBlankOrZero } from "./cases.js";
import { fluidWords, rangeText } from "./fluid-function.js";
import { errorOf } from "./render.js";
import { stateFunctions } from "./state-functions.js";

const lists: Readonly<Record<string, () => { readonly head: readonly string[]; readonly rows: readonly CellValue[][] }>> = {
  fluids: () => ({
    head: ["fluid", "also", "family", "range", "uncertainty", "source"],
    rows: shelf().map((entry) => [
      entry.parameter === undefined ? entry.name : `${entry.name} … ${entry.parameter.unit}`,
      entry.synonyms.join(", "),
      entry.family,
      rangeText(entry),
      entry.uncertainty,
      entry.sources.map((work) => fullCitation(work)).join("; "),
    ]),
  }),
  surfaces: () => ({
    head: ["function", "what", "arguments", "equation taken first", "reference temperature"],
    rows: [
      ...allSurfaces.map((surface) => [
        `FILM.${surface.id}`,
        surface.title,
        ["fluid", surface.wallName, "bulk", ...surface.arguments.map((one) => (one.optional === true ? `[${one.name}]` : one.name))].join(
          ", ",
        ),
        surface.preference,
        surface.reference,
      ]),
      ...stateFunctions.map((one) => [
        `FILM.${one.id}`,
        one.title,
        [...(one.takesFluid ? ["fluid"] : []), ...one.arguments.map((argument) => argument.name)].join(", "),
        "",
        "",
      ]),
    ],
  }),
  equations: () => ({
    head: ["equation", "serves", "result", "wall", "ranges", "range from", "scatter", "scatter from", "properties at", "source", "note"],
    rows: allCorrelations.map((record) => [
      record.name,
      record.serves.map((id) => `FILM.${id}`).join(", "),
      `${record.result}, ${record.extent}`,
      record.wall,
      Object.entries(record.ranges)
        .map(([symbol, [low, high]]) => `${symbol} ${formatNumber(low)} to ${formatNumber(high)}`)
        .join("; "),
      record.rangeOrigin,
      record.scatter.value,
      record.scatter.origin,
      record.propertiesNote ?? record.propertiesAt,
      fullCitation(record.source.work, record.source.at),
      record.note ?? "",
    ]),
  }),
  settings: () => ({
    head: ["setting", "meaning", "known by"],
    rows: [
      ...commonSettings.map((one) => [one.name, one.describe + choices(one.words), "every function"]),
      ["unit of NAME", "unit of bare numbers of one argument, such as unit of diameter=mm", "every function"],
      ...allSurfaces.flatMap((surface) =>
        surface.settings.map((one) => [one.name, one.describe + choices(one.words), `FILM.${surface.id}`]),
      ),
    ],
  }),
  words: () => ({
    head: ["word", "kind", "meaning", "known by"],
    rows: [
      ...surfaceWords.map((word) => [word.name, word.kind, word.describe, "surface functions"]),
      ...fluidWords.map((word) => [word.name, word.kind, word.describe, "FILM.FLUID"]),
    ],
  }),
  units: () => ({
    head: ["unit", "of", "also written"],
    rows: unitNames().map((unit) => [unit.symbol, unit.dimension, unit.aliases.join(", ")]),
  }),
};

function choices(words: readonly string[] | undefined): string {
  return words === undefined ? "" : `: ${words.join(" / ")}`;
}

/** FILM.LIST: a table of what there is, narrowed by words that must all occur in a row. */
export function answerList(what: CellBlock | null | undefined, filter: CellBlock | null | undefined): CellValue[][] {
  const asked = what?.[0]?.[0];
  if (isErrorCell(asked)) return [[new CellError(asked.code as CellError["code"], asked.message ?? "")]];
  const name = typeof asked === "string" ? asked.trim().toLowerCase() : "";
  const list = lists[name];
  if (list === undefined) {
    const known = Object.keys(lists)
      .map((one) => `"${one}"`)
      .join(", ");
    return [[errorOf(valueProblem("what", `${isBlankOrZero(asked) ? "nothing" : quoted(asked)} is not a list; write one of ${known}.`))]];
  }
  const { head, rows } = list();
  const wanted = typeof filter?.[0]?.[0] !== "string" ? [] : filter[0][0].trim().toLowerCase().split(/\s+/);
  const kept = rows.filter((row) => {
    const text = row.join(" ").toLowerCase();
    return wanted.every((word) => text.includes(word));
  });
  if (kept.length === 0)
    return [
      [errorOf(valueProblem("filter", `no row of ${name} holds all of "${wanted.join(" ")}"; leave the filter out to see them all.`))],
    ];
  return [head.slice(), ...kept];
}
