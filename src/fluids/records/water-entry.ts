import type { ShelfEntry } from "../shelf-entry.js";
import { water } from "../water.js";

export const waterEntry: ShelfEntry = {
  name: water.name,
  synonyms: water.synonyms,
  family: water.family,
  sources: water.sources,
  summary: "Liquid water and steam by the industrial formulation of 1997; temperature and pressure decide the phase.",
  range: water.range,
  uncertainty:
    "liquid: density 0.01 %, cp 0.2 %, viscosity 1 %, conductivity 1.5 %; steam: density 0.1 %, cp 1 %, viscosity 2 %, conductivity 2 %",
  fluid: () => water,
};
