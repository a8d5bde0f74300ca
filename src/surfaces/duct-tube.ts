import type { Correlation } from "../correlations/correlation.js";
import { correlationById } from "../correlations/index.js";
import { serving } from "./candidates.js";
import { mixedRivals } from "./mixing.js";
import type { Circumstances, Surface, Variant } from "./surface.js";

/** Below this Reynolds number flow in a duct stays laminar, above the second it is turbulent; between them it may be either. */
const laminarUpTo = 2300;
const turbulentFrom = 4000;
/** Liquid metals never use the ordinary turbulent laws. */
const metalBelow = 0.05;

const ordinary = serving("DUCT.TUBE", ["tube-default-T-mean", "tube-default-T-local", "tube-default-H-mean", "tube-default-H-local"]);

const corrected = new Map<string, Correlation>();

/** The default times its property ratio: liquids by the Prandtl numbers at bulk and wall, heated gases by the temperatures. */
function withPropertyRatio(record: Correlation, phase: Circumstances["phase"]): Correlation {
  const factor = correlationById(phase === "liquid" ? "property-liquid-pr" : "property-gas-temperature");
  const id = `${record.id}+${factor.id}`;
  let made = corrected.get(id);
  if (made === undefined) {
    made = {
      ...record,
      id,
      name: `${record.name}, with property ratio`,
      parts: { constant: { of: record }, ratio: { of: factor } },
      tables: undefined,
      lines: { Nu: "Nu_constant*Factor_ratio" },
      ranges: { ...record.ranges, ...factor.ranges },
      note: `${record.note ?? ""} Times the property ratio: ${factor.note ?? ""}`.trim(),
    };
    corrected.set(id, made);
  }
  return made;
}

function candidates(at: Circumstances): readonly Correlation[] {
  return ordinary(at).map((record) => (record.id.startsWith("tube-default") ? withPropertyRatio(record, at.phase) : record));
}

function groups({ given, local }: Variant): Record<string, string> {
  const along = local ? "position" : "length";
  const long = given.has("length") || local;
  return {
    L: "diameter",
    flowArea: "PI()*diameter^2/4",
    heated: "IF(Ts>Tb,1,0)",
    Ref: "u*diameter*2*rho/(mu_b+mu_w)",
    Tw_Tb: "Ts/Tb",
    D_L: long ? `diameter/${along}` : "0",
    ...(long ? { L_D: `${along}/diameter`, x_D: `${along}/diameter`, xs: `${along}/(diameter*Re*Pr)`, xp: `${along}/(diameter*Re)` } : {}),
    e_D: roughness(given),
    ...(given.has("length")
      ? { wettedArea: "PI()*diameter*length", pressureDrop: "f_friction*length/diameter*rho_b*u^2/2" }
      : {}),
  };
}

function roughness(given: ReadonlySet<string>): string {
  if (given.has("sandRoughness")) return "sandRoughness/diameter";
  if (given.has("profileRoughness")) return "5.9*profileRoughness/diameter";
  return "0";
}

/** A circular tube, laminar to turbulent, developing or developed. */
export const ductTube: Surface = {
  id: "DUCT.TUBE",
  title: "Inside a circular tube",
  describe: "Film coefficient inside a circular tube: mean from the inlet over the length, local at a position, or developed without a length.",
  motion: "duct",
  wallName: "wall",
  reference: "the fluid's bulk temperature, mean over the length (local with position)",
  arguments: [
    { key: "flow", name: "flow", dimensions: ["speed", "mass flow", "volume flow"], sign: "not negative", describe: "mean speed, m/s, or a mass or volume flow as text" },
    { key: "diameter", name: "diameter", dimensions: ["length"], sign: "positive", describe: "inside diameter, m" },
    { key: "length", name: "length", dimensions: ["length"], sign: "positive", describe: "heated length from the inlet, m", optional: true },
  ],
  settings: [],
  takesRoughness: true,
  groups,
  beside: [],
  candidates,
  preference: "laminar limits joined (developed and Lévêque), Gnielinski 2013 through transition and beyond, with the property ratio",
  regime: (_, value) => {
    const Re = value("Re");
    if (Re < laminarUpTo) return "laminar";
    return Re < turbulentFrom ? "transition" : "turbulent";
  },
  cautions: (_, value) =>
    value("Pr") < metalBelow ? ["Liquid metal: only equations made for liquid metals may be taken, never the ordinary turbulent ones."] : [],
  words: {
    "friction factor": { symbol: "f_friction", dimension: "none", describe: "Darcy friction factor" },
    "pressure drop": { symbol: "pressureDrop", dimension: "pressure", describe: "friction over the length" },
  },
};
