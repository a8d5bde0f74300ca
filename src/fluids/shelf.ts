/** The shelf: every fluid by name, built when first asked for, and the list of them. */
import { coverageProblem, type Problem, valueProblem } from "../quantities/problems.js";
import { coolants } from "./coolants.js";
import type { Fluid } from "./fluid.js";
import { gasEntries } from "./gas-entries.js";
import { heatTransferLiquids } from "./heat-transfer-liquids.js";
import { humidAirEntry } from "./humid-air.js";
import { liquidMetals } from "./liquid-metals.js";
import { mineralOils } from "./mineral-oil.js";
import { nearMisses } from "./near-miss.js";
import { pureFluids } from "./records/pure/index.js";
import { waterEntry } from "./records/water-entry.js";
import { seawater } from "./seawater.js";
import type { Basis, NameParameter, ShelfEntry } from "./shelf-entry.js";
import { siliconeOils } from "./silicone-oil.js";
import { tableLiquids } from "./table-liquids.js";

const entries: readonly ShelfEntry[] = [
  waterEntry,
  ...pureFluids,
  ...coolants,
  seawater,
  ...tableLiquids,
  ...mineralOils,
  siliconeOils,
  ...heatTransferLiquids,
  ...liquidMetals,
  humidAirEntry,
  ...gasEntries,
];

/** Every entry, in the order of the list. */
export function shelf(): readonly ShelfEntry[] {
  return entries;
}

// Invisible caches: what a name found, never what it means.
const found = new Map<string, Fluid | Problem>();
const mostKept = 400;

/**
 * The fluid of a name, formula or synonym, case-blind: `"water"`, `"N2"`, `"MEG 40 %"`, `"ethylene glycol 50 % by volume"`.
 * An unknown name, a missing or impossible number yields a `Problem` with the nearest valid choice.
 */
export function findFluid(name: string): Fluid | Problem {
  const text = name.normalize("NFKC").trim();
  const known = found.get(text);
  if (known) return known;
  const answer = search(text);
  if (found.size >= mostKept) found.clear();
  found.set(text, answer);
  return answer;
}

function search(text: string): Fluid | Problem {
  if (text === "") return valueProblem("fluid", 'A fluid is needed: a name such as "air" or "water", or a property table.');
  const whole = byName().get(keyOf(text));
  if (whole) return buildPlain(whole, text);
  const asked = parseParametrised(text);
  const entry = asked && (byNameWithNumber().get(keyOf(asked.name)) ?? byName().get(keyOf(asked.name)));
  if (asked && entry) return buildParametrised(entry, asked);
  return unknown(text);
}

function buildPlain(entry: ShelfEntry, text: string): Fluid | Problem {
  const { parameter } = entry;
  if (!parameter || parameter.otherwise !== undefined) return entry.fluid(parameter?.otherwise);
  return valueProblem("fluid", `"${text}" needs its ${parameter.meaning}, ${spanOf(parameter)}: write for example "${exampleOf(entry)}".`);
}

function buildParametrised(entry: ShelfEntry, asked: Parametrised): Fluid | Problem {
  const { parameter } = entry;
  if (!parameter) return valueProblem("fluid", `"${entry.name}" takes no number; "${asked.text}" was given: write "${entry.name}".`);
  const unfit = unitFault(entry, parameter, asked);
  if (unfit) return unfit;
  const amount = asked.unit === "g/kg" ? asked.amount / 10 : asked.amount;
  const [low, high] = parameter.limits;
  if (amount < low || amount > high) {
    const nearest = amount < low ? low : high;
    return coverageProblem(
      "fluid",
      `"${asked.text}": the ${parameter.meaning} of ${entry.name} is covered for ${spanOf(parameter)}; nearest: "${written(entry, nearest)}".`,
    );
  }
  return entry.fluid(amount, asked.basis);
}

function unitFault(entry: ShelfEntry, parameter: NameParameter, asked: Parametrised): Problem | undefined {
  if (asked.basis && !parameter.bases?.includes(asked.basis)) {
    const bases = parameter.bases ?? [];
    const wanted = bases.length > 0 ? `is counted by ${bases.join(" or ")}` : "takes no basis";
    return valueProblem("fluid", `"${asked.text}": ${entry.name} ${wanted}; write "${exampleOf(entry)}".`);
  }
  const fits =
    asked.unit === "" || asked.unit === parameter.unit || (asked.unit === "g/kg" && parameter.unit === "%" && parameter.perMille === true);
  if (fits) return undefined;
  return valueProblem(
    "fluid",
    `"${asked.text}": the ${parameter.meaning} of ${entry.name} is given in ${parameter.unit || "plain numbers"}; write "${exampleOf(entry)}".`,
  );
}

function spanOf(parameter: NameParameter): string {
  const unit = parameter.unit === "" ? "" : ` ${parameter.unit}`;
  return `${parameter.limits[0]} to ${parameter.limits[1]}${unit}`;
}

function written(entry: ShelfEntry, amount: number): string {
  const unit = entry.parameter?.unit ?? "";
  return unit === "" ? `${entry.name} ${amount}` : `${entry.name} ${amount} ${unit}`;
}

function exampleOf(entry: ShelfEntry): string {
  const [low, high] = entry.parameter?.limits ?? [0, 0];
  return written(entry, entry.parameter?.example ?? Math.round((low + high) / 2));
}

function unknown(text: string): Problem {
  const asked = parseParametrised(text);
  const near = nearMisses(asked && asked.unit !== "" ? asked.name : text, entries);
  const shown = near.map((entry) => `"${entry.parameter && entry.parameter.otherwise === undefined ? exampleOf(entry) : entry.name}"`);
  const hint = shown.length > 0 ? ` Did you mean ${shown.join(" or ")}?` : "";
  return valueProblem(
    "fluid",
    `No fluid is called "${text}".${hint} =FILM.LIST("fluids") lists them all; a property table of your own serves too.`,
  );
}

interface Parametrised {
  readonly text: string;
  readonly name: string;
  readonly amount: number;
  /** "%", "g/kg", "cSt" or "" where none was written. */
  readonly unit: string;
  readonly basis?: Basis;
}

const number = String.raw`(\d+(?:[.,]\d+)?)`;
const unit = String.raw`(%|percent|per cent|g\/kg|cst|mm2\/s|mm²\/s)?`;
const basisWords = String.raw`(?:\(?(?:by\s+)?(mass|weight|wt|volume|vol|mole|mol|v\/v|w\/w|rh|relative humidity|humidity)\.?\s*(%)?\)?)?`;
const amountLast = new RegExp(String.raw`^(.*?)[\s,:]*${number}\s*${unit}\s*${basisWords}$`, "iu");
const amountFirst = new RegExp(String.raw`^${number}\s*${unit}\s*${basisWords}\s+(.+)$`, "iu");

/** `name number unit basis`, or the amount in front; undefined where the text holds no number at either end. */
function parseParametrised(text: string): Parametrised | undefined {
  const last = amountLast.exec(text);
  if (last && last[1] !== "") return parametrised(text, last[1] as string, last[2] as string, last[3] ?? last[5], last[4]);
  const first = amountFirst.exec(text);
  if (first) return parametrised(text, first[5] as string, first[1] as string, first[2] ?? first[4], first[3]);
  return undefined;
}

function parametrised(
  text: string,
  name: string,
  amount: string,
  unitText: string | undefined,
  basisText: string | undefined,
): Parametrised {
  const basis = basisOf(basisText);
  const parsed = { text, name: name.trim(), amount: Number(amount.replace(",", ".")), unit: unitOf(unitText) };
  return basis ? { ...parsed, basis } : parsed;
}

function unitOf(text: string | undefined): string {
  const lower = text?.toLowerCase() ?? "";
  if (lower === "" || lower === "g/kg") return lower;
  return /^(cst|mm)/.test(lower) ? "cSt" : "%";
}

function basisOf(text: string | undefined): Basis | undefined {
  switch (text?.toLowerCase()) {
    case "mass":
    case "weight":
    case "wt":
    case "w/w":
      return "mass";
    case "volume":
    case "vol":
    case "v/v":
      return "volume";
    case "mole":
    case "mol":
      return "mole";
    default:
      return undefined;
  }
}

/** Names compare without case, spaces, hyphens, underscores and commas. */
export function keyOf(name: string): string {
  return name
    .normalize("NFKC")
    .toLowerCase()
    .replace(/[\s\-–—_,.'’"]+/g, "");
}

let index: Map<string, ShelfEntry> | undefined;

function byName(): ReadonlyMap<string, ShelfEntry> {
  index ??= new Map(entries.flatMap((entry) => [entry.name, ...entry.synonyms].map((name) => [keyOf(name), entry] as const)));
  return index;
}

let indexWithNumber: Map<string, ShelfEntry> | undefined;

function byNameWithNumber(): ReadonlyMap<string, ShelfEntry> {
  indexWithNumber ??= new Map(
    entries.flatMap((entry) => (entry.parameter?.namesWithNumber ?? []).map((name) => [keyOf(name), entry] as const)),
  );
  return indexWithNumber;
}
