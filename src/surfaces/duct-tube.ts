import type { Correlation } from "../correlations/correlation.js";
import { correlationById } from "../correlations/index.js";
import { serving } from "./candidates.js";
import { formatNumber, formatQuantity } from "../quantities/format.js";
import { type Problem, valueProblem } from "../quantities/problems.js";
import { freeMatters } from "./mixing.js";
import type { Circumstances, Inputs, Rival, Surface, Values, Variant } from "./surface.js";

/** Below this Reynolds number flow in a duct stays laminar, above the second it is turbulent; between them it may be either. */
const laminarUpTo = 2300;
const turbulentFrom = 4000;
/** Liquid metals never use the ordinary turbulent laws. */
const metalBelow = 0.05;

const prefers = ["tube-default-T-mean", "tube-default-T-local", "tube-default-H-mean", "tube-default-H-local"];
const ordinary = serving("DUCT.TUBE", prefers);

const corrected = new Map<string, Correlation>();

/**
 * The default times its property ratio (liquids by the Prandtl numbers at bulk and wall; heated gases by the temperatures,
 * in so far as the flow is turbulent: a laminar gas takes none) and, where the wall is rough, times what roughness gains: less than friction does, and no more beyond four times smooth friction.
 */
function completed(record: Correlation, byPrandtl: boolean, rough: boolean): Correlation {
  const ratio = correlationById(byPrandtl ? "property-liquid-pr" : "property-gas-temperature");
  const factor = byPrandtl ? "Factor_ratio" : "(1+gamma_constant*(Factor_ratio-1))";
  const id = `${record.id}+${ratio.id}${rough ? "+norris-1971-rough" : ""}`;
  let made = corrected.get(id);
  if (made === undefined) {
    const friction = correlationById("churchill-1977-friction");
    const gain = correlationById("norris-1971-rough");
    const roughParts: Correlation["parts"] = {
      rough: { of: friction },
      smooth: { of: friction, with: { e_D: "0" } },
      gain: { of: gain, with: { f_fs: "f_rough/f_smooth" } },
    };
    made = {
      ...record,
      id,
      name: `${record.name}, with property ratio${rough ? " and roughness" : ""}`,
      parts: { constant: { of: record }, ratio: { of: ratio }, ...(rough ? roughParts : {}) },
      tables: undefined,
      lines: { Nu: rough ? `Nu_constant*${factor}*Factor_gain` : `Nu_constant*${factor}` },
      ranges: { ...rangesOf(record), ...ratio.ranges, ...(rough ? { e_D: [0, roughest] as const } : {}) },
      scatter: rough ? roughScatter(record) : record.scatter,
      note: [record.note, `Property ratio: ${ratio.note ?? ratio.name}`, rough ? `Roughness: ${gain.note ?? gain.name}` : ""]
        .filter(Boolean)
        .join(" "),
    };
    corrected.set(id, made);
  }
  return made;
}

/** Ranges of a part's own helper lines go by the name the line has inside the whole. */
function rangesOf(record: Correlation): Record<string, readonly [number, number]> {
  return Object.fromEntries(
    Object.entries(record.ranges).map(([symbol, range]) => [symbol in record.lines ? `${symbol}_constant` : symbol, range]),
  );
}

function roughScatter(record: Correlation): Correlation["scatter"] {
  const { scatter } = record;
  const gain = correlationById("norris-1971-rough").scatter.value;
  if (scatter.by === undefined) return { ...scatter, value: Math.max(scatter.value, gain) };
  const steps = scatter.by.steps.map(([upTo, value]) => [upTo, upTo <= laminarUpTo ? value : Math.max(value, gain)] as const);
  return { ...scatter, by: { ...scatter.by, steps } };
}

// Sixteen lists at most, by what the four circumstances say; a column asks for the same one row after row.
const completedLists: (readonly Correlation[] | undefined)[] = [];

function candidates(at: Circumstances): readonly Correlation[] {
  const { numbers, fluid } = at.inputs;
  const rough = (numbers.sandRoughness ?? numbers.profileRoughness ?? 0) > 0;
  // A table of one row says that properties are constant: its Prandtl ratio is 1 whatever the phase.
  const byPrandtl = at.phase === "liquid" || fluid.constantDensity;
  const place = (byPrandtl ? 1 : 0) + (rough ? 2 : 0) + (at.wall === "uniform flux" ? 4 : 0) + (at.local ? 8 : 0);
  let list = completedLists[place];
  if (list === undefined) {
    list = ordinary(at).map((record) => (record.id.startsWith("tube-default") ? completed(record, byPrandtl, rough) : record));
    completedLists[place] = list;
  }
  return list;
}

/** A wall rougher than this part of the diameter is no pipe: the unit was probably µm. */
const roughest = 0.05;
/** Sand roughness from the arithmetic profile roughness; published relations scatter by a factor of two. */
const sandFromProfile = 5.9;

function check(inputs: Inputs): Problem | undefined {
  const { sandRoughness, profileRoughness, diameter } = inputs.numbers;
  const sand = sandRoughness ?? (profileRoughness === undefined ? undefined : sandFromProfile * profileRoughness);
  if (sand === undefined || diameter === undefined || sand <= roughest * diameter) return undefined;
  const name = sandRoughness === undefined ? "profile roughness" : "sand roughness";
  return valueProblem(
    name,
    `${formatQuantity(sandRoughness ?? profileRoughness ?? 0, "length", "SI")} is more than ${roughest} of the diameter; was µm meant, such as "50 um"?`,
  );
}

const friction: Correlation = {
  ...correlationById("churchill-1977-friction"),
  id: "tube-friction-beside",
  parts: { friction: { of: correlationById("churchill-1977-friction") } },
  lines: { frictionFactor: "f_friction" },
};

/** Laminar flow in a level tube under buoyancy: a published mixed law shows how far h may move. */
function rivals(_: Circumstances, value: Values): readonly Rival[] {
  const Ri = value("Ri");
  if (!Number.isFinite(Ri) || Ri < freeMatters || value("Re") > turbulentFrom) return [];
  return [
    {
      record: correlationById("brown-thomas-1965-tube"),
      cause: "free convection in a level tube",
      origin: "published",
      remark: `free convection matters: Ri ${formatNumber(Ri)} is above ${freeMatters} (common practice)`,
    },
  ];
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
    Gz: "Re*Pr*D_L",
    D_L: long ? `diameter/${along}` : "0",
    ...(long ? { L_D: `${along}/diameter`, x_D: `${along}/diameter`, xs: `${along}/(diameter*Re*Pr)`, xp: `${along}/(diameter*Re)` } : {}),
    e_D: roughness(given),
    ...(given.has("length") ? { wettedArea: "PI()*diameter*length", pressureDrop: "frictionFactor*length/diameter*rho_b*u^2/2" } : {}),
  };
}

function roughness(given: ReadonlySet<string>): string {
  if (given.has("sandRoughness")) return "sandRoughness/diameter";
  if (given.has("profileRoughness")) return `${sandFromProfile}*profileRoughness/diameter`;
  return "0";
}

/** A circular tube, laminar to turbulent, developing or developed. */
export const ductTube: Surface = {
  id: "DUCT.TUBE",
  title: "Inside a circular tube",
  describe:
    "Film coefficient inside a circular tube: mean from the inlet over the length, local at a position, or developed without a length.",
  motion: "duct",
  wallName: "wall",
  reference: "the fluid's bulk temperature, mean over the length (local with position)",
  arguments: [
    {
      key: "flow",
      name: "flow",
      dimensions: ["speed", "mass flow", "volume flow"],
      sign: "not negative",
      describe: "mean speed, m/s, or a mass or volume flow as text",
    },
    { key: "diameter", name: "diameter", dimensions: ["length"], sign: "positive", describe: "inside diameter, m" },
    {
      key: "length",
      name: "length",
      dimensions: ["length"],
      sign: "positive",
      describe: "heated length from the inlet, m",
      optional: true,
    },
  ],
  settings: [],
  takesRoughness: true,
  groups,
  check,
  beside: [friction],
  candidates,
  prefers,
  rivals,
  preference: "laminar limits joined (developed and Lévêque), Gnielinski 2013 through transition and beyond, with the property ratio",
  regime: (_, value) => {
    const Re = value("Re");
    if (Re < laminarUpTo) return "laminar";
    return Re < turbulentFrom ? "transition" : "turbulent";
  },
  cautions: (_, value) =>
    value("Pr") < metalBelow
      ? ["Liquid metal: only equations made for liquid metals may be taken, never the ordinary turbulent ones."]
      : [],
  words: {
    "friction factor": { symbol: "frictionFactor", dimension: "none", describe: "Darcy friction factor" },
    "pressure drop": { symbol: "pressureDrop", dimension: "pressure", describe: "friction over the length" },
  },
};
