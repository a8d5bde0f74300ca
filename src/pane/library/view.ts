/** "Surfaces and fluids" as a tree. */
import type { Correlation } from "../../correlations/correlation.js";
import { fullCitation } from "../../findings/citation.js";
import type { ShelfEntry } from "../../fluids/shelf-entry.js";
import { formatNumber, formatQuantity } from "../../quantities/format.js";
import type { Surface } from "../../surfaces/surface.js";
import { along, type Axis, marks, markText } from "../drawings/axis.js";
import { plotDrawing } from "../drawings/plot.js";
import { surfaceDrawing } from "../drawings/surfaces.js";
import { figure, raisedPowers } from "../figures.js";
import { type Child, el, type PageElement, svg } from "../node.js";
import type { Signature } from "../signature.js";
import { words } from "../words.js";
import { fluidNameToUse, fluidPlots, type Library } from "./entries.js";

export interface LibraryActions {
  search(text: string): void;
  /** Told when an entry is folded out, so that its body is made only then. */
  unfold(id: string): void;
  useFunction?(id: string): void;
  useFluid?(name: string): void;
}

export interface LibraryState {
  readonly search: string;
  readonly found: Library;
  readonly unfolded: ReadonlySet<string>;
}

const { library: says } = words;

export function libraryHead(actions: LibraryActions): readonly Child[] {
  return [
    el("div", { class: "heading" }, el("h2", { id: "page-title" }, says.title)),
    el("label", { class: "field", for: "library-search" }, says.search),
    el("input", {
      type: "search",
      id: "library-search",
      placeholder: says.placeholder,
      autocomplete: "off",
      input: (event) => actions.search((event.target as HTMLInputElement).value),
    }),
  ];
}

export function libraryBody(state: LibraryState, actions: LibraryActions): readonly Child[] {
  const { surfaces, functions, fluids } = state.found;
  const isEmpty = surfaces.length + functions.length + fluids.length === 0;
  return [
    el(
      "p",
      { class: "quiet small", role: "status" },
      isEmpty ? says.nothing : says.found(surfaces.length + functions.length, fluids.length),
    ),
    ...group(
      "lib-surfaces",
      says.surfaces,
      surfaces.map((one) => surfaceEntry(one.surface, one.equations, state, actions)),
    ),
    ...group(
      "lib-states",
      says.states,
      functions.map((one) => functionEntry(one.signature, state, actions)),
    ),
    ...group(
      "lib-fluids",
      says.fluids,
      fluids.map((one) => fluidEntry(one.entry, state, actions)),
    ),
  ];
}

function group(id: string, title: string, entries: readonly PageElement[]): readonly PageElement[] {
  return entries.length === 0 ? [] : [el("section", { class: "part", "aria-labelledby": id }, el("h3", { id }, title), ...entries)];
}

function entry(
  id: string,
  head: readonly (Child | undefined)[],
  state: LibraryState,
  actions: LibraryActions,
  body: () => readonly (Child | undefined | false)[],
): PageElement {
  const isOpen = state.unfolded.has(id);
  return el(
    "details",
    {
      class: "entry",
      id,
      open: isOpen,
      toggle: (event) => {
        if ((event.target as HTMLDetailsElement).open && !isOpen) actions.unfold(id);
      },
    },
    el("summary", {}, ...head),
    ...(isOpen ? [el("div", { class: "entry-body" }, ...body())] : []),
  );
}

function idOf(kind: string, name: string): string {
  return `${kind}-${name.toLowerCase().replace(/[^a-z0-9]+/g, "-")}`;
}

function surfaceEntry(surface: Surface, equations: readonly Correlation[], state: LibraryState, actions: LibraryActions): PageElement {
  const { useFunction } = actions;
  const head = [
    surfaceDrawing(surface.id),
    el("span", { class: "entry-name" }, surface.title, el("code", { class: "quiet small" }, `FILM.${surface.id}`)),
  ];
  return entry(idOf("surface", surface.id), head, state, actions, () => [
    el("p", {}, surface.describe),
    useFunction !== undefined &&
      el("p", {}, el("button", { type: "button", id: idOf("use", surface.id), click: () => useFunction(surface.id) }, says.use)),
    el("p", { class: "small" }, `${says.reference(surface.reference)} ${says.first(surface.preference)}`),
    el("h4", {}, says.arguments),
    definitions([
      ...surface.arguments.map((one) => [one.name, `${one.describe}${one.optional === true ? `; ${says.optional}` : ""}`] as const),
    ]),
    surface.settings.length > 0 && el("h4", {}, says.settings),
    surface.settings.length > 0 &&
      definitions(
        surface.settings.map((one) => [one.name, `${one.describe}${one.words === undefined ? "" : `: ${one.words.join(" / ")}`}`] as const),
      ),
    el("h4", {}, says.equations(equations.length)),
    rangesChart(equations),
    el("ul", { class: "equations" }, ...equations.map(equationItem)),
  ]);
}

function definitions(rows: readonly (readonly [string, string])[]): PageElement {
  return el("dl", { class: "terms" }, ...rows.map(([name, text]) => el("div", {}, el("dt", {}, name), el("dd", {}, text))));
}

function equationItem(record: Correlation): PageElement {
  const ranges = Object.entries(record.ranges).map(([symbol, [low, high]]) => `${symbol} ${figure(low)} to ${figure(high)}`);
  return el(
    "li",
    {},
    el("p", {}, el("strong", {}, record.name)),
    el(
      "p",
      { class: "quiet small" },
      [
        `${words.library.extent[record.extent] ?? record.extent}, ${words.library.wall[record.wall] ?? record.wall}`,
        ranges.join(", "),
        words.equation.scatter(formatNumber(100 * record.scatter.value, 3), record.scatter.origin),
      ]
        .filter((piece) => piece !== "")
        .join("; "),
    ),
    el("p", { class: "quiet small" }, fullCitation(record.source.work, record.source.at)),
  );
}

/** The ranges of all equations by the group that most of them are limited in, one bar each on one axis. */
function rangesChart(equations: readonly Correlation[]): PageElement | undefined {
  const symbol = ["Ra", "Re", "RaStar", "Gr"]
    .map((one) => [one, equations.filter((record) => record.ranges[one] !== undefined).length] as const)
    .sort((one, other) => other[1] - one[1])[0]?.[0];
  if (symbol === undefined) return undefined;
  const bars = equations.flatMap((record): { record: Correlation; low: number; high: number }[] => {
    const range = record.ranges[symbol];
    return range === undefined ? [] : [{ record, low: range[0], high: range[1] }];
  });
  const ends = bars.flatMap(({ low, high }) => [low, high]).filter((value) => value > 0 && Number.isFinite(value));
  if (bars.length < 2 || ends.length < 2) return undefined;
  const axis: Axis = {
    scale: "log",
    from: 10 ** Math.floor(Math.log10(Math.min(...ends)) - 0.5),
    to: 10 ** Math.ceil(Math.log10(Math.max(...ends)) + 0.5),
  };
  const place = (value: number): number => (value <= 0 ? 0 : Number.isFinite(value) ? Math.min(1, Math.max(0, along(axis, value))) : 1);
  const percent = (part: number): string => `${Math.round(part * 1e4) / 100}%`;
  const row = 9;
  const height = bars.length * row + 22;
  const sentences = bars.map(({ record, low, high }) => says.rangeSays(record.name, symbol, figure(low), figure(high)));
  return svg(
    "svg",
    { class: "ranges-chart", width: "100%", height, role: "img", "aria-label": `${says.ranges(symbol)}. ${sentences.join(". ")}` },
    ...bars.map(({ low, high }, i) =>
      svg("rect", {
        class: "strip-interval edged",
        x: percent(place(low)),
        width: percent(Math.max(0.004, place(high) - place(low))),
        y: i * row + 1,
        height: row - 3,
      }),
    ),
    ...marks(axis, 5).map((value) =>
      svg("text", { class: "strip-text", x: percent(along(axis, value)), y: height - 4, "text-anchor": "middle" }, markText(axis, value)),
    ),
  );
}

function functionEntry(signature: Signature, state: LibraryState, actions: LibraryActions): PageElement {
  const { useFunction } = actions;
  const head = [el("span", { class: "entry-name" }, signature.title, el("code", { class: "quiet small" }, `FILM.${signature.id}`))];
  return entry(idOf("function", signature.id), head, state, actions, () => [
    useFunction !== undefined &&
      el("p", {}, el("button", { type: "button", id: idOf("use", signature.id), click: () => useFunction(signature.id) }, says.use)),
    el("h4", {}, says.arguments),
    definitions(signature.parameters.map((one) => [one.name, `${one.describe}${one.optional ? `; ${says.optional}` : ""}`] as const)),
  ]);
}

function fluidEntry(fluid: ShelfEntry, state: LibraryState, actions: LibraryActions): PageElement {
  const { useFluid } = actions;
  const name = fluidNameToUse(fluid);
  const [low, high] = fluid.range.T;
  const range = `${formatQuantity(low, "temperature", "SI")} to ${formatQuantity(high, "temperature", "SI")}`;
  const head = [el("span", { class: "entry-name" }, name, el("span", { class: "quiet small" }, `${fluid.family}, ${range}`))];
  return entry(idOf("fluid", fluid.name), head, state, actions, () => {
    const plots = fluidPlots(fluid);
    return [
      el("p", {}, fluid.summary),
      useFluid !== undefined &&
        el("p", {}, el("button", { type: "button", id: idOf("use-fluid", fluid.name), click: () => useFluid(name) }, says.useFluid)),
      definitions(
        [
          [says.also, fluid.synonyms.join(", ")],
          [
            says.range,
            `${range}; ${raisedPowers(formatQuantity(fluid.range.p[0], "pressure", "SI"))} to ${raisedPowers(formatQuantity(fluid.range.p[1], "pressure", "SI"))}`,
          ],
          [says.uncertainty, fluid.uncertainty],
          [says.source, fluid.sources.map((work) => fullCitation(work)).join("; ")],
        ].filter((row): row is [string, string] => row[1] !== ""),
      ),
      ...(plots.length === 0
        ? [el("p", { class: "quiet small" }, says.noPlot)]
        : plots.map((plot) => el("figure", { class: "plot-figure" }, el("figcaption", { class: "small" }, plot.says), plotDrawing(plot)))),
    ];
  });
}
