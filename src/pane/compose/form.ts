/** The form of "New formula" as data: from boxes to the text of a formula, and from a formula back to boxes. */
import { stateFunctions } from "../../cells/state-functions.js";
import type { Dimension } from "../../quantities/quantity.js";
import { parseQuantity } from "../../quantities/quantity-text.js";
import { isProblem } from "../../quantities/problems.js";
import { defaultUnit, findUnit, spellingsOf } from "../../quantities/units.js";
import { commonSettings, settingsOf } from "../../surfaces/settings.js";
import { surfaceById } from "../../surfaces/index.js";
import type { SettingDefinition } from "../../surfaces/surface.js";
import { type Expression, type FilmCall, isUnread, parseFormula } from "../formula.js";
import type { Place, Written } from "../host.js";
import { cellName } from "../reference.js";
import { type Parameter, type Signature, signatureOf } from "../signature.js";

/** What stands in a box: what was typed, and the unit chosen beside it. */
export interface Box {
  readonly typed: string;
  /** A unit's symbol; "" where the argument takes none. */
  readonly unit: string;
}

export interface SettingRow {
  readonly name: string;
  readonly value: string;
}

export interface Form {
  readonly functionId: string;
  /** By the parameter's name. */
  readonly boxes: Readonly<Record<string, Box>>;
  readonly give: readonly string[];
  /** A reference or other expression in the place of words; "" where words are chosen. */
  readonly giveFrom: string;
  readonly settings: readonly SettingRow[];
  readonly settingsFrom: string;
}

const laidOut: ReadonlySet<string> = new Set(["give", "settings"]);

/** The parameters that have a box of their own. */
export function boxedParameters(signature: Signature): readonly Parameter[] {
  return signature.parameters.filter((one) => !laidOut.has(one.key));
}

export function takes(signature: Signature, key: "give" | "settings"): boolean {
  return signature.parameters.some((one) => one.key === key);
}

/** The kinds of quantity that an argument may be; none for names and words. */
export function dimensionsOf(functionId: string, name: string): readonly Dimension[] {
  const surface = surfaceById(functionId);
  if (surface !== undefined) {
    if (name === surface.wallName) return ["temperature", "heat flux"];
    if (name === "bulk") return ["temperature"];
    return surface.arguments.find((one) => one.name === name)?.dimensions ?? [];
  }
  if (functionId === "FLUID" && name === "temperature") return ["temperature"];
  return stateFunctions.find((one) => one.id === functionId)?.arguments.find((one) => one.name === name)?.dimensions ?? [];
}

/** Units to choose from, the one of bare numbers first. */
export function unitsFor(dimensions: readonly Dimension[], system: "SI" | "US"): readonly string[] {
  if (dimensions.length === 0 || (dimensions.length === 1 && dimensions[0] === "none")) return [];
  const first = defaultUnit(dimensions[0] as Dimension, system).symbol;
  const all = dimensions.flatMap((dimension) => spellingsOf(dimension).map((spellings) => spellings[0]));
  return [...new Set([first, ...all])];
}

export function systemOf(form: Form): "SI" | "US" {
  return form.settings.some((one) => one.name === "units" && one.value.trim().toUpperCase() === "US") ? "US" : "SI";
}

/** The settings that a function knows. */
export function settingsKnown(functionId: string): readonly SettingDefinition[] {
  const surface = surfaceById(functionId);
  return surface === undefined ? commonSettings : settingsOf(surface);
}

const examples: Readonly<Partial<Record<string, string>>> = {
  fluid: "air",
  surface: "80",
  wall: "60",
  hot: "80",
  bulk: "20",
  cold: "20",
  temperature: "20",
  height: "0.3",
  length: "0.5",
  width: "0.3",
  diameter: "0.05",
  speed: "2",
  flow: "1",
  h: "10",
  conductivity: "0.026",
  "solid conductivity": "50",
  reference: "20",
};

/** A form filled with a usual case, so that there is a result to look at from the start. */
export function freshForm(functionId: string, fluid?: string): Form {
  const signature = signatureOf(functionId);
  const boxes = Object.fromEntries(
    (signature === undefined ? [] : boxedParameters(signature)).map((one): [string, Box] => {
      const [unit = ""] = unitsFor(dimensionsOf(functionId, one.name), "SI");
      const typed = one.optional ? "" : one.name === "fluid" ? (fluid ?? "air") : (examples[one.name] ?? "");
      return [one.name, { typed, unit }];
    }),
  );
  return { functionId, boxes, give: [], giveFrom: "", settings: [], settingsFrom: "" };
}

/** The formula that the form stands for, from "=" on. */
export function formulaText(form: Form): string {
  const signature = signatureOf(form.functionId);
  if (signature === undefined) return "=";
  return `=FILM.${form.functionId}(${argumentTexts(form, signature).join(",")})`;
}

function argumentTexts(form: Form, signature: Signature): readonly string[] {
  const texts = signature.parameters.map((one) => {
    if (one.key === "give") return form.giveFrom === "" ? giveText(form.give, wordOtherwise(form.functionId)) : form.giveFrom;
    if (one.key === "settings") return form.settingsFrom === "" ? settingsText(form.settings) : form.settingsFrom;
    return boxText(form.boxes[one.name] ?? { typed: "", unit: "" }, dimensionsOf(form.functionId, one.name), systemOf(form));
  });
  while (texts.length > 0 && texts[texts.length - 1] === "") texts.pop();
  return texts;
}

function quoted(text: string): string {
  return `"${text.replace(/"/g, '""')}"`;
}

/** What a function returns when no word is asked for; undefined where that is a whole block. */
function wordOtherwise(functionId: string): string | undefined {
  return surfaceById(functionId) === undefined ? undefined : "h";
}

/** The words that are chosen, the one that comes by itself among them. */
export function wordsChosen(form: Form): readonly string[] {
  const otherwise = wordOtherwise(form.functionId);
  return form.give.length > 0 || otherwise === undefined ? form.give : [otherwise];
}

/** Words to choose from at once; any other may be added. */
export function commonWords(functionId: string): readonly string[] {
  return functionId === "FLUID" ? fluidCommon : surfaceCommon;
}

const surfaceCommon = ["h", "h low", "h high", "q", "Ts", "Ra", "Re", "verdict"] as const;
const fluidCommon = ["density", "cp", "conductivity", "viscosity", "Pr", "phase", "verdict"] as const;

function giveText(words: readonly string[], otherwise: string | undefined): string {
  if (words.length === 0 || (words.length === 1 && words[0] === otherwise)) return "";
  return words.length === 1 ? quoted(words[0] as string) : `{${words.map(quoted).join(",")}}`;
}

function settingsText(rows: readonly SettingRow[]): string {
  const filled = rows.filter((one) => one.value.trim() !== "");
  return filled.length === 0 ? "" : quoted(filled.map((one) => `${one.name}=${one.value.trim()}`).join("; "));
}

/** What a box puts into the formula: a number, a text with its unit, or what refers to cells. */
export function boxText(box: Box, dimensions: readonly Dimension[], system: "SI" | "US"): string {
  const typed = box.typed.trim();
  if (typed === "") return "";
  const expression = referring(typed);
  const isPlain = box.unit === "" || box.unit === unitsFor(dimensions, system)[0];
  if (expression !== undefined) return isPlain ? expression : `${expression}&${quoted(` ${box.unit}`)}`;
  if (dimensions.length === 0) return quotedUnlessNumber(typed);
  const number = decimal(typed);
  if (number !== undefined) return isPlain ? number : quoted(`${number} ${box.unit}`);
  const parsed = parseQuantity(typed);
  const lacksUnit = parsed.kind === "quantity" && parsed.unit === undefined;
  return quoted(lacksUnit && box.unit !== "" ? `${typed} ${box.unit}` : typed);
}

function quotedUnlessNumber(typed: string): string {
  return decimal(typed) ?? quoted(typed);
}

/** A number as a formula writes it; one decimal comma is understood where it cannot be a thousands separator. */
function decimal(typed: string): string | undefined {
  const point = /^[-+]?\d+,\d+$/.test(typed) && !/,\d{3}$/.test(typed) ? typed.replace(",", ".") : typed;
  return /^[-+]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d+)?$/i.test(point) ? point.replace(/^\+/, "") : undefined;
}

/** Cells, or anything after "=": it goes into the formula as it is. */
function referring(typed: string): string | undefined {
  const forced = typed.startsWith("=");
  const tree = parseFormula(typed);
  if (isUnread(tree)) return undefined;
  const bare = forced ? typed.slice(1).trim() : typed;
  return forced || tree.kind === "reference" ? bare : undefined;
}

/** The form of a call that stands in a formula. */
export function formOfCall(formula: string, call: FilmCall): Form {
  const signature = signatureOf(call.film);
  const fresh = freshForm(call.film);
  if (signature === undefined) return fresh;
  const boxes: Record<string, Box> = {};
  let rest: Pick<Form, "give" | "giveFrom" | "settings" | "settingsFrom"> = { give: [], giveFrom: "", settings: [], settingsFrom: "" };
  signature.parameters.forEach((parameter, i) => {
    const argument = call.args[i];
    const text = argument === undefined ? "" : formula.slice(argument.start, argument.end);
    if (parameter.key === "give") rest = { ...rest, ...giveOf(argument, text) };
    else if (parameter.key === "settings") rest = { ...rest, ...settingsIn(argument, text) };
    else boxes[parameter.name] = boxOf(argument, text, dimensionsOf(call.film, parameter.name));
  });
  return { functionId: call.film, boxes, ...rest };
}

function giveOf(argument: Expression | undefined, text: string): Pick<Form, "give" | "giveFrom"> {
  if (argument === undefined) return { give: [], giveFrom: "" };
  if (argument.kind === "text") return { give: [argument.value], giveFrom: "" };
  const cells = argument.kind === "array" ? argument.rows.flat() : [];
  const isRow = argument.kind === "array" && argument.rows.length === 1;
  if (isRow && cells.every((one) => one.kind === "text"))
    return { give: cells.map((one) => (one.kind === "text" ? one.value : "")), giveFrom: "" };
  return { give: [], giveFrom: text };
}

function settingsIn(argument: Expression | undefined, text: string): Pick<Form, "settings" | "settingsFrom"> {
  if (argument === undefined) return { settings: [], settingsFrom: "" };
  if (argument.kind !== "text") return { settings: [], settingsFrom: text };
  const rows = argument.value.split(";").filter((piece) => piece.trim() !== "");
  return {
    settings: rows.map((piece) => {
      const cut = piece.indexOf("=");
      return cut < 0 ? { name: piece.trim(), value: "" } : { name: piece.slice(0, cut).trim(), value: piece.slice(cut + 1).trim() };
    }),
    settingsFrom: "",
  };
}

function boxOf(argument: Expression | undefined, text: string, dimensions: readonly Dimension[]): Box {
  const units = unitsFor(dimensions, "SI");
  const unit = units[0] ?? "";
  if (argument === undefined) return { typed: "", unit };
  if (argument.kind === "text") return textBox(argument.value, units);
  const isNumber = argument.kind === "number" || (argument.kind === "sign" && argument.of.kind === "number");
  return { typed: isNumber || argument.kind === "reference" ? text : `=${text}`, unit };
}

/** "72 degF" becomes 72 beside °F where that unit can be chosen; anything else stays as it was written. */
function textBox(text: string, units: readonly string[]): Box {
  const first = units[0] ?? "";
  const found = /^\s*([-+]?[\d.]+(?:e[-+]?\d+)?)\s*(\D.*?)\s*$/i.exec(text);
  const unit = found === null ? undefined : findUnit(found[2] as string);
  if (found === null || unit === undefined || isProblem(unit) || !units.includes(unit.symbol)) return { typed: text, unit: first };
  return { typed: found[1] as string, unit: unit.symbol };
}

/** A table of cases: one argument runs from one value to another, the others stay. */
export interface Variation {
  readonly name: string;
  readonly from: number;
  readonly to: number;
  readonly count: number;
}

const mostRows = 1000;

/** Head row, inputs, and one formula that answers the whole: what to write from a cell on; undefined where nothing varies sensibly. */
export function tableCells(form: Form, variation: Variation, at: Place): readonly (readonly Written[])[] | undefined {
  const signature = signatureOf(form.functionId);
  const count = Math.min(mostRows, Math.round(variation.count));
  if (signature === undefined || !takes(signature, "give") || !(count >= 2) || ![variation.from, variation.to].every(Number.isFinite))
    return undefined;
  const columns = boxedParameters(signature).filter((one) => one.name !== "fluid" && (form.boxes[one.name]?.typed.trim() ?? "") !== "");
  if (!columns.some((one) => one.name === variation.name)) return undefined;
  const words =
    form.give.length > 0
      ? form.give
      : wordOtherwise(form.functionId) === undefined
        ? ["density", "verdict"]
        : ["h", "h low", "h high", "verdict"];
  const cellsOf = (parameter: Parameter, row: number): Written => {
    const box = form.boxes[parameter.name] as Box;
    if (parameter.name !== variation.name) return inCell(box, dimensionsOf(form.functionId, parameter.name), systemOf(form));
    const value = Number((variation.from + ((variation.to - variation.from) * row) / (count - 1)).toPrecision(10));
    return inCell({ ...box, typed: String(value) }, dimensionsOf(form.functionId, parameter.name), systemOf(form));
  };
  const head: Written[] = [...columns.map((one) => headOf(form, one)), ...words];
  const rows = Array.from({ length: count }, (_, row): Written[] => [...columns.map((one) => cellsOf(one, row)), ...words.map(() => "")]);
  (rows[0] as Written[])[columns.length] = tableFormula(form, signature, columns, words.length, at, count);
  return [head, ...rows];
}

function headOf(form: Form, parameter: Parameter): string {
  const unit = form.boxes[parameter.name]?.unit ?? "";
  return unit === "" ? parameter.name : `${parameter.name} [${unit}]`;
}

/** A number where it is one in the unit of bare numbers, else text with its unit, or a formula. */
function inCell(box: Box, dimensions: readonly Dimension[], system: "SI" | "US"): Written {
  const text = boxText(box, dimensions, system);
  const number = Number(text);
  if (text !== "" && Number.isFinite(number)) return number;
  return text.startsWith('"') && text.endsWith('"') ? text.slice(1, -1).replace(/""/g, '"') : `=${text}`;
}

function tableFormula(
  form: Form,
  signature: Signature,
  columns: readonly Parameter[],
  wordCount: number,
  at: Place,
  count: number,
): string {
  const texts = [...argumentTexts({ ...form, give: [], giveFrom: "" }, signature)];
  columns.forEach((parameter, i) => {
    const index = signature.parameters.indexOf(parameter);
    texts[index] = `${cellName(at.row + 1, at.column + i)}:${cellName(at.row + count, at.column + i)}`;
  });
  const giveAt = signature.parameters.findIndex((one) => one.key === "give");
  const first = at.column + columns.length;
  texts[giveAt] = `${cellName(at.row, first)}:${cellName(at.row, first + wordCount - 1)}`;
  return `=FILM.${form.functionId}(${Array.from(texts, (text) => text ?? "").join(",")})`;
}
