import { isProblem, type Problem, valueProblem } from "../quantities/problems.js";
import type { Quantity, Reading } from "../quantities/quantity.js";
import { readQuantity } from "../quantities/reading.js";
import { findUnit } from "../quantities/units.js";
import { formatNumber } from "../quantities/format.js";
import { standardPressure } from "../surfaces/atmosphere.js";
import type { SettingDefinition, Tolerance } from "../surfaces/surface.js";
import type { CellBlock } from "./cell.js";
import { isErrorCell, quoted } from "./cell.js";
import { isBlank, isOmitted, sizeOf } from "./cases.js";

const standardGravity = 9.80665;
const standardAmbient = 101325;

/** Settings as they stood in the cells: one map for all cases, or one for each. */
export interface RawSettings {
  readonly rows: readonly ReadonlyMap<string, unknown>[];
}

const unitOf = /^unit of (.+)$/;

/** Reads a list of (name, value) rows, a table headed by names, or text such as "pressure=2 bar; emissivity=0.9". */
export function readSettings(block: CellBlock | null | undefined, known: readonly SettingDefinition[]): RawSettings | Problem {
  if (isOmitted(block)) return { rows: [new Map()] };
  const cells = block as CellBlock;
  const [rows, columns] = sizeOf(cells);
  if (rows === 1 && columns === 1) return fromText(cells[0]?.[0], known);
  const heads = (cells[0] ?? []).filter((cell) => !isBlank(cell));
  const headed = rows > 1 && heads.length > 0 && heads.every((cell) => isKnown(nameOf(cell), known));
  if (headed) return fromTable(cells, known);
  if (columns === 2) return fromList(cells, known);
  if (rows === 1 || columns === 1) {
    const pieces = cells.flat().filter((cell) => !isBlank(cell));
    const odd = pieces.find((cell) => typeof cell !== "string");
    return odd === undefined ? fromText(pieces.join(";"), known) : fromText(odd, known);
  }
  return valueProblem(
    "settings",
    `is a range of ${rows} × ${columns} cells; give two columns (name, value), or a table whose first row is all setting names, or text such as "pressure=2 bar".`,
  );
}

function nameOf(cell: unknown): string {
  return (typeof cell === "string" ? cell : quoted(cell)).replace(/\s+/g, " ").trim().toLowerCase();
}

function isKnown(name: string, known: readonly SettingDefinition[]): boolean {
  return unitOf.test(name) || known.some((one) => one.name.toLowerCase() === name);
}

function unknownName(name: string, known: readonly SettingDefinition[]): Problem {
  return valueProblem(
    "settings",
    `"${name}" is not a setting here; known are ${known.map((one) => one.name).join(", ")} and unit of NAME.`,
  );
}

function fromText(cell: unknown, known: readonly SettingDefinition[]): RawSettings | Problem {
  if (typeof cell !== "string") {
    return valueProblem("settings", `${quoted(cell)} is not a setting; write text such as "pressure=2 bar; emissivity=0.9".`);
  }
  const map = new Map<string, unknown>();
  for (const piece of cell.split(/[;\n]/)) {
    if (piece.trim() === "") continue;
    const at = piece.indexOf("=");
    if (at < 0) return valueProblem("settings", `"${piece.trim()}" has no "="; write name=value, such as "pressure=2 bar".`);
    const trouble = put(map, nameOf(piece.slice(0, at)), piece.slice(at + 1).trim(), known);
    if (trouble !== undefined) return trouble;
  }
  return { rows: [map] };
}

function put(map: Map<string, unknown>, name: string, value: unknown, known: readonly SettingDefinition[]): Problem | undefined {
  if (!isKnown(name, known)) return unknownName(name, known);
  if (map.has(name)) return valueProblem("settings", `"${name}" is given twice; give it once.`);
  if (!isBlank(value)) map.set(name, value);
  return undefined;
}

function fromList(cells: CellBlock, known: readonly SettingDefinition[]): RawSettings | Problem {
  const map = new Map<string, unknown>();
  for (const row of cells) {
    if (isBlank(row[0]) || row[0] === 0) continue;
    const trouble = put(map, nameOf(row[0]), row[1], known);
    if (trouble !== undefined) return trouble;
  }
  return { rows: [map] };
}

function fromTable(cells: CellBlock, known: readonly SettingDefinition[]): RawSettings | Problem {
  const names = (cells[0] ?? []).map((cell) => (isBlank(cell) ? "" : nameOf(cell)));
  const rows: Map<string, unknown>[] = [];
  for (const row of cells.slice(1)) {
    const map = new Map<string, unknown>();
    for (let column = 0; column < names.length; column++) {
      const name = names[column] as string;
      if (name === "") continue;
      const trouble = put(map, name, row[column], known);
      if (trouble !== undefined) return trouble;
    }
    rows.push(map);
  }
  return { rows };
}

/** The settings of a case, read and checked. */
export interface Settled {
  readonly system: "SI" | "US";
  readonly reading: Reading;
  /** Units of bare numbers by argument name, lower case. */
  readonly units: ReadonlyMap<string, string>;
  readonly pressure: number;
  readonly gravity: number;
  readonly area: number | undefined;
  readonly emissivity: number | undefined;
  readonly surroundings: number | undefined;
  /** Relative humidity as a fraction, and dew point in kelvin: at most one of them. */
  readonly humidity: number | undefined;
  readonly dewPoint: number | undefined;
  readonly numbers: Readonly<Record<string, number>>;
  readonly words: Readonly<Record<string, string>>;
  readonly texts: Readonly<Record<string, string>>;
  readonly tolerances: readonly Tolerance[];
}

/** Quantities with a field of their own; the rest become numbers of the case. */
const fields: ReadonlySet<string> = new Set([
  "pressure",
  "gravity",
  "area",
  "emissivity",
  "surroundings",
  "altitude",
  "humidity",
  "dewPoint",
]);

const unset = assemble("SI", { system: "SI", ambient: standardAmbient }, new Map(), new Map(), {}, {}, []);

/** Reads one map of settings; error cells among them are reported by name. */
export function settle(raw: ReadonlyMap<string, unknown>, known: readonly SettingDefinition[]): Settled | readonly Problem[] {
  if (raw.size === 0) return unset;
  const problems: Problem[] = [];
  const words: Record<string, string> = {};
  const texts: Record<string, string> = {};
  const units = new Map<string, string>();
  for (const [name, value] of raw) {
    const unit = unitOf.exec(name);
    if (unit !== null) {
      const trouble = takeUnit(units, unit[1] as string, value);
      if (trouble !== undefined) problems.push(trouble);
    }
  }
  for (const definition of known) {
    const value = raw.get(definition.name.toLowerCase());
    if (value === undefined) continue;
    if (isErrorCell(value)) problems.push(valueProblem(definition.name, `holds the error ${value.code}.`));
    else if (definition.kind === "text") texts[definition.key] = String(value).trim();
    else if (definition.kind === "word") {
      const word = takeWord(definition, value);
      if (isProblem(word)) problems.push(word);
      else words[definition.key] = word;
    }
  }
  const system = words.units === "US" ? "US" : "SI";
  const quantities = new Map<string, Quantity>();
  const reading0: Reading = { system, ambient: standardAmbient };
  const altitude = takeQuantity("altitude", raw, known, units, reading0, quantities, problems);
  const ambient = altitude === undefined ? standardAmbient : standardPressure(altitude);
  const reading: Reading = { system, ambient };
  for (const definition of known) {
    if (definition.kind === "quantity" && definition.key !== "altitude") {
      takeQuantity(definition.key, raw, known, units, reading, quantities, problems);
    }
  }
  if (quantities.has("sandRoughness") && quantities.has("profileRoughness")) {
    problems.push(valueProblem("sand roughness", "and profile roughness are both given; give one of them."));
  }
  if (quantities.has("humidity") && quantities.has("dewPoint")) {
    problems.push(valueProblem("humidity", "and dew point are both given; give one of them."));
  }
  if (quantities.has("emissivity") !== quantities.has("surroundings")) {
    const missing = quantities.has("emissivity") ? "surroundings" : "emissivity";
    problems.push(valueProblem(missing, `is missing; radiation needs both, such as "emissivity=0.9; surroundings=20".`));
  }
  if (problems.length > 0) return problems;
  return assemble(system, reading, units, quantities, words, texts, known);
}

function assemble(
  system: "SI" | "US",
  reading: Reading,
  units: ReadonlyMap<string, string>,
  quantities: ReadonlyMap<string, Quantity>,
  words: Record<string, string>,
  texts: Record<string, string>,
  known: readonly SettingDefinition[],
): Settled {
  const numbers: Record<string, number> = {};
  const tolerances: Tolerance[] = [];
  for (const [key, quantity] of quantities) {
    if (!fields.has(key)) numbers[key] = inDegrees(quantity);
    if (
      quantity.tolerance !== undefined &&
      quantity.tolerance > 0 &&
      key !== "altitude" &&
      key !== "area" &&
      key !== "humidity" &&
      key !== "dewPoint"
    ) {
      const name = known.find((one) => one.key === key)?.name ?? key;
      tolerances.push({ key, name, halfWidth: quantity.dimension === "angle" ? degrees(quantity.tolerance) : quantity.tolerance });
    }
  }
  return {
    system,
    reading,
    units,
    pressure: quantities.get("pressure")?.value ?? reading.ambient,
    gravity: quantities.get("gravity")?.value ?? standardGravity,
    area: quantities.get("area")?.value,
    emissivity: quantities.get("emissivity")?.value,
    surroundings: quantities.get("surroundings")?.value,
    humidity: quantities.get("humidity")?.value,
    dewPoint: quantities.get("dewPoint")?.value,
    numbers,
    words,
    texts,
    tolerances,
  };
}

function degrees(radians: number): number {
  return (radians * 180) / Math.PI;
}

function inDegrees(quantity: Quantity): number {
  return quantity.dimension === "angle" ? degrees(quantity.value) : quantity.value;
}

function takeUnit(units: Map<string, string>, argument: string, value: unknown): Problem | undefined {
  const text = String(value).trim();
  if (findUnit(text) === undefined) return valueProblem(`unit of ${argument}`, `"${text}" is not a unit known here.`);
  units.set(argument, text);
  return undefined;
}

function takeWord(definition: SettingDefinition, value: unknown): string | Problem {
  const text = String(value).replace(/\s+/g, " ").trim().toLowerCase();
  const found = definition.words?.find((word) => word.toLowerCase() === text);
  if (found !== undefined) return found;
  return valueProblem(
    definition.name,
    `${quoted(value)} is not known; write ${(definition.words ?? []).map((word) => `"${word}"`).join(" or ")}.`,
  );
}

function takeQuantity(
  key: string,
  raw: ReadonlyMap<string, unknown>,
  known: readonly SettingDefinition[],
  units: ReadonlyMap<string, string>,
  reading: Reading,
  quantities: Map<string, Quantity>,
  problems: Problem[],
): number | undefined {
  const definition = known.find((one) => one.key === key);
  if (definition === undefined) return undefined;
  const value = raw.get(definition.name.toLowerCase());
  if (value === undefined || isErrorCell(value)) return undefined;
  if (typeof value !== "number" && typeof value !== "string") {
    problems.push(valueProblem(definition.name, `${quoted(value)} is not a quantity.`));
    return undefined;
  }
  const unit = units.get(definition.name.toLowerCase());
  const read = readQuantity(value, definition.dimensions ?? ["none"], unit === undefined ? reading : { ...reading, unit }, definition.name);
  const checked = isProblem(read) ? read : withinLimits(definition, read);
  if (isProblem(checked)) {
    problems.push(checked);
    return undefined;
  }
  quantities.set(key, checked);
  return checked.value;
}

function withinLimits(definition: SettingDefinition, quantity: Quantity): Quantity | Problem {
  const value = inDegrees(quantity);
  const { sign, low, high } = definition;
  const given = quoted(quantity.given);
  if (sign === "positive" && !(value > 0)) return valueProblem(definition.name, `${given} is not above zero.`);
  if (sign === "not negative" && value < 0) return valueProblem(definition.name, `${given} is below zero.`);
  if ((low !== undefined && value < low) || (high !== undefined && value > high)) {
    return valueProblem(
      definition.name,
      `${given} is outside ${formatNumber(low ?? Number.NEGATIVE_INFINITY)} to ${formatNumber(high ?? Number.POSITIVE_INFINITY)}.`,
    );
  }
  return quantity;
}
