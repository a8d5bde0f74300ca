import type { Correlation } from "../correlations/correlation.js";
import { correlationById } from "../correlations/index.js";
import { serving } from "./candidates.js";
import { mixedRivals } from "./mixing.js";
import type { Circumstances, Rival, Surface, Values } from "./surface.js";

/** Natural transition is taken here (common practice); a tripped layer may be turbulent as well up to the second figure. */
const transition = 5e5;
const settled = 1e7;

const laminarFirst = [
  "pohlhausen-1921-mean",
  "pohlhausen-1921-local",
  "colburn-1933-plate-mixed",
  "churchill-ozoe-1973-mean",
  "churchill-ozoe-1973-local",
  "churchill-ozoe-1973-flux-mean",
  "churchill-ozoe-1973-flux-local",
  "lienhard-2020-plate-local",
  "white-plate-local",
];
const turbulentFirst = ["colburn-1933-plate-mean-tripped", "petukhov-plate-turbulent", "white-plate-local"];
const naturally = serving("FORCED.PLATE", laminarFirst);
const tripped = serving("FORCED.PLATE", turbulentFirst);

const unheated = {
  laminar: { mean: "unheated-length-laminar-mean", local: "unheated-length-laminar-local" },
  turbulent: { mean: "unheated-length-turbulent-mean", local: "unheated-length-turbulent-local" },
} as const;

const corrected = new Map<string, Correlation>();

/** The equation times the factor for a length upstream that is not heated. */
function afterUnheatedLength(record: Correlation): Correlation {
  let made = corrected.get(record.id);
  if (made === undefined) {
    const regime = isTurbulent(record) ? "turbulent" : "laminar";
    const factor = correlationById(unheated[regime][record.extent === "local" ? "local" : "mean"]);
    made = {
      ...record,
      id: `${record.id}+${factor.id}`,
      name: `${record.name}, after an unheated length`,
      parts: { whole: { of: record }, unheated: { of: factor } },
      tables: undefined,
      lines: { Nu: "Nu_whole*Factor_unheated" },
      ranges: { ...record.ranges, xi: [0, 0.99] },
      note: `${record.note ?? ""} Times the factor for an unheated starting length: ${factor.note ?? ""}`.trim(),
    };
    corrected.set(record.id, made);
  }
  return made;
}

function isTurbulent(record: Correlation): boolean {
  const [low] = record.ranges.Re ?? [0, 0];
  return low >= 1e5 || record.id.includes("tripped") || record.id.includes("turbulent");
}

function candidates(at: Circumstances): readonly Correlation[] {
  const list = at.inputs.words.boundaryLayer === "tripped" ? tripped(at).filter(isTurbulent) : naturally(at);
  return at.inputs.numbers.unheatedLength === undefined ? list : list.map(afterUnheatedLength);
}

function rivals(at: Circumstances, value: Values, chosen: Correlation): readonly Rival[] {
  const free = at.local
    ? []
    : mixedRivals(value("Ri"), chosen, correlationById("raithby-hollands-1998-plate"), correlationById("churchill-1977-plate-horizontal"));
  const Re = value("Re");
  const open = at.inputs.words.boundaryLayer === undefined && !at.local && Re > transition && Re < settled;
  if (!open) return free;
  return [
    ...free,
    {
      record: correlationById("colburn-1933-plate-mean-tripped"),
      cause: "boundary layer tripped at the leading edge",
      origin: "common practice",
      remark: "natural transition taken, bounds also hold a tripped boundary layer",
    },
  ];
}

/** A flat plate along a stream. */
export const forcedPlate: Surface = {
  id: "FORCED.PLATE",
  title: "Flat plate along a stream, forced convection",
  describe: "Film coefficient of forced convection on a flat plate along the flow: mean over the length, or local at a position.",
  motion: "forced",
  wallName: "surface",
  reference: "the free-stream bulk temperature",
  arguments: [
    { key: "flow", name: "speed", dimensions: ["speed"], sign: "not negative", describe: "free-stream speed, m/s" },
    { key: "length", name: "length", dimensions: ["length"], sign: "positive", describe: "length along the flow, m" },
  ],
  settings: [
    {
      name: "boundary layer",
      key: "boundaryLayer",
      kind: "word",
      words: ["natural", "tripped"],
      describe: "whether the layer is laminar at first or tripped at the leading edge",
    },
    {
      name: "unheated length",
      key: "unheatedLength",
      kind: "quantity",
      dimensions: ["length"],
      sign: "positive",
      describe: "from the leading edge to where heating begins",
    },
  ],
  groups: ({ local, given }) => ({
    L: local ? "position" : "length",
    Rec: "500000",
    Rel: "500000",
    Reu: "500000",
    ...(given.has("unheatedLength") ? { xi: "unheatedLength/L" } : {}),
    ...roughnessLines(given),
  }),
  candidates,
  prefers: [...laminarFirst, ...turbulentFirst],
  preference:
    "Pohlhausen while laminar (Churchill & Ozoe beyond ordinary Pr), then laminar and turbulent parts in one line, transition at Re 5e5",
  rivals,
  regime: (at, value) => {
    const Re = value("Re");
    if (at.inputs.words.boundaryLayer === "tripped") return "turbulent from the leading edge";
    if (Re <= transition) return "laminar";
    return at.local ? "turbulent" : "laminar, then turbulent";
  },
  // Similarity: the difference grows with x^(1/2) while laminar, with x^(1/5) in a turbulent layer; between them the place of transition decides.
  peak: (at, value) =>
    at.local ? undefined : at.inputs.words.boundaryLayer === "tripped" ? 1.2 : value("Re") <= transition ? 1.5 : undefined,
};

function roughnessLines(given: ReadonlySet<string>): Record<string, string> {
  const ks = given.has("sandRoughness") ? "sandRoughness" : given.has("profileRoughness") ? "5.9*profileRoughness" : undefined;
  return ks === undefined ? {} : { x_ks: `L/(${ks})`, L_ks: `L/(${ks})` };
}
