/** What the library holds, as data made from the registries: functions with their equations, fluids with their ranges. */
import type { Correlation } from "../../correlations/correlation.js";
import { allCorrelations } from "../../correlations/index.js";
import { fullCitation } from "../../findings/citation.js";
import type { Fluid } from "../../fluids/fluid.js";
import { shelf } from "../../fluids/shelf.js";
import type { ShelfEntry } from "../../fluids/shelf-entry.js";
import { formatQuantity } from "../../quantities/format.js";
import { isProblem } from "../../quantities/problems.js";
import { allSurfaces } from "../../surfaces/index.js";
import type { Surface } from "../../surfaces/surface.js";
import type { Plot } from "../drawings/plot.js";
import { axisAround } from "../drawings/axis.js";
import { allSignatures, type Signature } from "../signature.js";
import { words } from "../words.js";

export interface SurfaceEntry {
  readonly surface: Surface;
  readonly equations: readonly Correlation[];
  /** Everything that a search may find it by, in lower case. */
  readonly text: string;
}

export interface FunctionEntry {
  readonly signature: Signature;
  readonly text: string;
}

export interface FluidEntry {
  readonly entry: ShelfEntry;
  readonly text: string;
}

export interface Library {
  readonly surfaces: readonly SurfaceEntry[];
  readonly functions: readonly FunctionEntry[];
  readonly fluids: readonly FluidEntry[];
}

let whole: Library | undefined;

export function library(): Library {
  whole ??= {
    surfaces: allSurfaces.map((surface) => {
      const equations = allCorrelations.filter((record) => record.serves.includes(surface.id) && record.result === "Nu");
      const texts = [
        surface.id,
        surface.title,
        surface.describe,
        ...equations.map((one) => `${one.name} ${fullCitation(one.source.work)}`),
      ];
      return { surface, equations, text: texts.join(" ").toLowerCase() };
    }),
    functions: allSignatures()
      .filter((signature) => !allSurfaces.some((surface) => surface.id === signature.id))
      .map((signature) => ({ signature, text: `${signature.id} ${signature.title}`.toLowerCase() })),
    fluids: shelf().map((entry) => ({
      entry,
      text: [entry.name, ...entry.synonyms, entry.family, entry.summary, ...entry.sources.map((work) => fullCitation(work))]
        .join(" ")
        .toLowerCase(),
    })),
  };
  return whole;
}

/** Those entries whose text holds every word of the search. */
export function searched(all: Library, search: string): Library {
  const wanted = search.trim().toLowerCase().split(/\s+/);
  // "R-134a", "R 134a" and "R134a" are one name.
  const bare = (text: string): string => text.replace(/[-\s]/g, "");
  const holds = ({ text }: { readonly text: string }): boolean =>
    wanted.every((word) => text.includes(word) || bare(text).includes(bare(word)));
  return { surfaces: all.surfaces.filter(holds), functions: all.functions.filter(holds), fluids: all.fluids.filter(holds) };
}

/** How a name with a number is written, such as "ethylene glycol 40 %". */
export function fluidNameToUse(entry: ShelfEntry): string {
  const { parameter } = entry;
  if (parameter === undefined || parameter.otherwise !== undefined) return entry.name;
  const amount = parameter.example ?? Math.round((parameter.limits[0] + parameter.limits[1]) / 2);
  return [entry.name, String(amount), parameter.unit].filter((piece) => piece !== "").join(" ");
}

const atmosphere = 101325;
const points = 40;
const plotted = ["density", "cp", "conductivity", "viscosity"] as const;
const units: Readonly<Record<(typeof plotted)[number], string>> = {
  density: "kg/m³",
  cp: "J/(kg·K)",
  conductivity: "W/(m·K)",
  viscosity: "Pa·s",
};
/** Where people work; a formulation that reaches to 2000 K would else show nothing of it. */
const usual = [173.15, 673.15] as const;
const room = 293.15;

/** Properties over temperature at one atmosphere, where the fluid has a single phase there. */
export function fluidPlots(entry: ShelfEntry): readonly Plot[] {
  const fluid = entry.fluid(
    entry.parameter === undefined
      ? undefined
      : (entry.parameter.otherwise ?? entry.parameter.example ?? (entry.parameter.limits[0] + entry.parameter.limits[1]) / 2),
  );
  if (isProblem(fluid)) return [];
  const states = statesOf(fluid);
  return plotted.flatMap((property) => {
    const found = states.flatMap((state): (readonly [number, number])[] => {
      const value = state[property];
      return value === undefined ? [] : [[state.T - 273.15, value]];
    });
    if (found.length < 3) return [];
    const says = `${words.library.plot(words.library.plotted[property], fluid.name, formatQuantity(atmosphere, "pressure", "SI"))}, ${units[property]}`;
    return [
      {
        says,
        x: axisAround(
          found.map(([T]) => T),
          false,
        ),
        y: axisAround(
          found.map(([, value]) => value),
          false,
        ),
        points: found,
      },
    ];
  });
}

type State = Exclude<ReturnType<Fluid["state"]>, { problem: true }>;

/** Liquid and gas do not belong on one curve: the phase that is there near room temperature is shown, over all of its reach. */
function statesOf(fluid: Fluid): readonly State[] {
  const [low, high] = fluid.range.T;
  const [from, to] = high < usual[0] || low > usual[1] ? [low, high] : [Math.max(low, usual[0]), Math.min(high, usual[1])];
  const coarse = singles(fluid, from, to);
  const distance = (state: State): number => Math.abs(state.T - room);
  const nearest = coarse.reduce<State | undefined>(
    (best, state) => (best === undefined || distance(state) < distance(best) ? state : best),
    undefined,
  );
  const alike = coarse.filter((state) => (state.phase === "liquid") === (nearest?.phase === "liquid"));
  const [first, last] = [alike[0], alike[alike.length - 1]];
  if (first === undefined || last === undefined) return [];
  return singles(fluid, first.T, last.T).filter((state) => (state.phase === "liquid") === (nearest?.phase === "liquid"));
}

function singles(fluid: Fluid, from: number, to: number): readonly State[] {
  const states = Array.from({ length: points + 1 }, (_, i) => fluid.state(from + ((to - from) * i) / points, atmosphere));
  return states.filter((state): state is State => !isProblem(state));
}
