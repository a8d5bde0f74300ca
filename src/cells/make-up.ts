import { type NamedPart, mixture } from "../fluids/blend.js";
import type { Fluid } from "../fluids/fluid.js";
import { humidAir } from "../fluids/humid-air.js";
import { findFluid } from "../fluids/shelf.js";
import { isProblem, type Problem, valueProblem } from "../quantities/problems.js";
import { quoted } from "./cell.js";
import type { Settled } from "./settings.js";

// Invisible cache: mixtures and moist airs already built, by what was asked.
const made = new Map<string, Fluid | Problem>();
const mostKept = 200;

function kept(key: string, build: () => Fluid | Problem): Fluid | Problem {
  const known = made.get(key);
  if (known !== undefined) return known;
  if (made.size >= mostKept) made.clear();
  const fluid = build();
  made.set(key, fluid);
  return fluid;
}

/** The fluid of a cell, made up as the settings humidity, dew point and composition say. */
export function namedFluid(cell: unknown, settled: Settled): Fluid | Problem {
  if (typeof cell !== "string") {
    return valueProblem("fluid", `${quoted(cell)} is not the name of a fluid; write a name such as "air", or give a property table.`);
  }
  const { composition } = settled.texts;
  if (composition !== undefined) return kept(`${cell}|${composition}`, () => composed(cell, composition));
  const found = findFluid(cell);
  if (isProblem(found)) return found.argument === undefined ? { ...found, argument: "fluid" } : found;
  if (settled.humidity === undefined && settled.dewPoint === undefined) return found;
  if (found.name !== "air") {
    return valueProblem(settled.humidity === undefined ? "dew point" : "humidity", `goes with "air" only, not with ${found.name}.`);
  }
  return settled.humidity === undefined
    ? kept(`dew point ${settled.dewPoint}`, () => humidAir({ dewPoint: settled.dewPoint as number }))
    : kept(`humidity ${settled.humidity}`, () => humidAir({ relativeHumidity: settled.humidity as number }));
}

function composed(label: string, composition: string): Fluid | Problem {
  const shelved = findFluid(label);
  if (!isProblem(shelved) && shelved.family !== "mixture") {
    return valueProblem("composition", `goes with a name of your own, such as "flue gas"; "${label}" is a fluid of the shelf.`);
  }
  const parts = readComposition(composition);
  return isProblem(parts) ? parts : mixture(parts, label);
}

/** "N2 71 %, CO2 10 %, H2O 19 %" or "N2=0.71 + CO2=0.1 + H2O=0.19": names and mole fractions. */
export function readComposition(text: string): readonly NamedPart[] | Problem {
  const parts: NamedPart[] = [];
  for (const piece of text.split(/[,+\n|]/)) {
    if (piece.trim() === "") continue;
    const match = /^\s*(.+?)[\s=:]+(\d+(?:\.\d+)?|\.\d+)\s*(%?)\s*$/.exec(piece);
    if (match === null) {
      return valueProblem(
        "composition",
        `"${piece.trim()}" is not a gas with its mole fraction; write such as "N2 71 %, CO2 10 %, H2O 19 %".`,
      );
    }
    parts.push({ name: match[1] as string, fraction: Number(match[2]) / (match[3] === "%" ? 100 : 1) });
  }
  if (parts.length === 0) return valueProblem("composition", 'is empty; write such as "N2 71 %, CO2 10 %, H2O 19 %".');
  return parts;
}
