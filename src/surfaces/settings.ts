import type { SettingDefinition, Surface } from "./surface.js";

/** Settings that every function knows; a surface adds its own. */
export const commonSettings: readonly SettingDefinition[] = [
  {
    name: "pressure",
    key: "pressure",
    kind: "quantity",
    dimensions: ["pressure"],
    sign: "positive",
    describe: "absolute unless psig or barg; 101 325 Pa when absent",
  },
  {
    name: "altitude",
    key: "altitude",
    kind: "quantity",
    dimensions: ["length"],
    low: -1000,
    high: 11000,
    describe: "standard atmosphere; beside a pressure it serves only gauge readings",
  },
  {
    name: "gravity",
    key: "gravity",
    kind: "quantity",
    dimensions: ["acceleration"],
    sign: "positive",
    describe: "9.80665 m/s² when absent",
  },
  { name: "units", key: "units", kind: "word", words: ["SI", "US"], describe: "units of bare numbers and of results" },
  { name: "equation", key: "equation", kind: "text", describe: "words of the equation's name, authors or year" },
  { name: "beyond range", key: "beyondRange", kind: "word", words: ["refuse", "flag"], describe: "what to do outside a published range" },
  {
    name: "bounds",
    key: "bounds",
    kind: "word",
    words: ["statistical", "worst"],
    describe: "how contributions combine: quadrature or sum",
  },
  { name: "concern", key: "concern", kind: "word", words: ["too hot", "too cold"], describe: "what must not happen to the part" },
  {
    name: "position",
    key: "position",
    kind: "quantity",
    dimensions: ["length"],
    sign: "positive",
    describe: "where a local value is wanted, from the leading edge or inlet",
  },
  { name: "area", key: "area", kind: "quantity", dimensions: ["area"], sign: "positive", describe: "area of the face, for the heat rate" },
  {
    name: "emissivity",
    key: "emissivity",
    kind: "quantity",
    dimensions: ["none"],
    low: 0,
    high: 1,
    describe: "of the surface, for radiation",
  },
  {
    name: "surroundings",
    key: "surroundings",
    kind: "quantity",
    dimensions: ["temperature"],
    describe: "temperature that the surface sees",
  },
  {
    name: "humidity",
    key: "humidity",
    kind: "quantity",
    dimensions: ["none"],
    low: 0,
    high: 1,
    describe: "relative humidity of air at the bulk, such as 60 %",
  },
  { name: "dew point", key: "dewPoint", kind: "quantity", dimensions: ["temperature"], describe: "of air, in place of its humidity" },
  { name: "composition", key: "composition", kind: "text", describe: "of a gas mixture by mole, such as N2 71 %, CO2 10 %, H2O 19 %" },
  {
    name: "sand roughness",
    key: "sandRoughness",
    kind: "quantity",
    dimensions: ["length"],
    sign: "not negative",
    describe: "equivalent sand-grain roughness k_s",
  },
  {
    name: "profile roughness",
    key: "profileRoughness",
    kind: "quantity",
    dimensions: ["length"],
    sign: "not negative",
    describe: "arithmetic profile roughness of the drawing",
  },
];

const bySurface = new WeakMap<Surface, readonly SettingDefinition[]>();

/** All settings that a function knows: the common ones, then the surface's own. */
export function settingsOf(surface: Surface): readonly SettingDefinition[] {
  let list = bySurface.get(surface);
  if (list === undefined) {
    list = [...commonSettings, ...surface.settings];
    bySurface.set(surface, list);
  }
  return list;
}
