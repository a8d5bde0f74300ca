/** The sections of "This cell": each a pure function from what was found to what is shown. */
import { type CellBlock, isErrorCell } from "../../cells/cell.js";
import type { Explanation } from "../../cells/explanation.js";
import type { Alternative, Contribution, EquationShown, Finding, RangeTest, Step, WordValue } from "../../findings/finding.js";
import { formatNumber, formatQuantity } from "../../quantities/format.js";
import { isProblem } from "../../quantities/problems.js";
import { axisAround } from "../drawings/axis.js";
import { tug, whisker } from "../drawings/bars.js";
import { stripDrawing, stripOf } from "../drawings/strip.js";
import { figure, raisedPowers, shownValue } from "../figures.js";
import { type Child, el, type PageElement } from "../node.js";
import { symbolSays, typesetLine, typesetSymbol } from "../typeset.js";
import { words } from "../words.js";

export function section(id: string, title: string, ...content: readonly (Child | undefined | false)[]): PageElement {
  return el("section", { class: `part ${id}`, "aria-labelledby": `${id}-title` }, el("h3", { id: `${id}-title` }, title), ...content);
}

export function folded(id: string, title: string, isOpen: boolean, ...content: readonly (Child | undefined | false)[]): PageElement {
  return el("details", { class: `part ${id}`, id, open: isOpen }, el("summary", {}, el("h3", {}, title)), ...content);
}

export type VerdictKind = "good" | "remark" | "bad" | "flagged" | "error";

/** How the verdict is shown: a word and a sign beside it, never colour alone. */
export function verdictKind(explanation: Explanation): VerdictKind {
  const { finding, problems } = explanation;
  if (problems.length > 0) return problems.some((one) => one.fault === "value") ? "error" : "bad";
  if (finding === undefined) return "good";
  if (!finding.inRange) return finding.answered ? "flagged" : "bad";
  return finding.verdict === "in range" ? "good" : "remark";
}

const signs: Readonly<Record<VerdictKind, string>> = { good: "✓", remark: "i", bad: "✕", flagged: "!", error: "✎" };

export function verdictSection(explanation: Explanation): PageElement {
  const kind = verdictKind(explanation);
  const sentence = explanation.finding?.verdict;
  return el(
    "p",
    { class: `verdict ${kind}` },
    el("span", { class: "verdict-sign", "aria-hidden": "true" }, signs[kind]),
    el(
      "span",
      { class: "verdict-words" },
      el("strong", {}, words.verdict[kind]),
      sentence !== undefined && sentence !== "in range" && `: ${raisedAnywhere(sentence)}`,
    ),
  );
}

function raisedAnywhere(sentence: string): string {
  return raisedPowers(sentence);
}

export function resultSection(explanation: Explanation): PageElement {
  const { finding, word, value, units } = explanation;
  const asked = shownValue(value, units);
  const isH = word === "h";
  return section(
    "result",
    words.result.title,
    finding === undefined ? bareResult(explanation) : el("div", { class: "headline" }, ...headline(finding, units)),
    finding !== undefined && !isH && asked !== undefined && el("p", { class: "asked" }, `${word}: `, el("strong", {}, asked)),
    finding !== undefined && facts(finding, units),
  );
}

function bareResult(explanation: Explanation): PageElement | undefined {
  const shown = shownValue(explanation.value, explanation.units, 6);
  return shown === undefined ? undefined : el("p", { class: "headline" }, el("strong", {}, shown));
}

function headline(finding: Finding, units: "SI" | "US"): readonly Child[] {
  const h = finding.word("h");
  if (isProblem(h)) return [el("p", { class: "no-number" }, `${words.result.h}: ${words.result.notAnswered}`)];
  const [low, high] = [finding.word("h low"), finding.word("h high")];
  const bare = (one: WordValue): string => (shownValue(one, units, 3) ?? "").replace(/ .*$/, "");
  const parts: readonly (Child | false)[] = [
    el("p", { class: "number" }, el("span", { class: "number-name" }, words.result.h), el("strong", {}, shownValue(h, units) ?? "")),
    el("p", { class: "number-bounds" }, `${words.result.to(bare(low), shownValue(high, units, 3) ?? "")} (${words.result.coverage})`),
    finding.h !== undefined &&
      finding.hLow !== undefined &&
      finding.hHigh !== undefined &&
      whisker(
        axisAround([finding.hLow, finding.hHigh], true),
        finding.hLow,
        finding.h,
        finding.hHigh,
        finding.inRange ? "taken" : "outside",
      ),
  ];
  return parts.filter((one): one is Child => one !== false);
}

function facts(finding: Finding, units: "SI" | "US"): PageElement {
  const rows: readonly (readonly [string, string | undefined])[] = [
    [words.result.surface, shownValue(finding.word("Ts"), units)],
    [words.result.reference, shownValue(finding.word("reference temperature"), units)],
    [words.result.flux, shownValue(finding.word("q"), units)],
  ];
  return el(
    "dl",
    { class: "facts" },
    ...rows.map(([name, value]) => value !== undefined && el("div", {}, el("dt", {}, name), el("dd", {}, value))),
  );
}

export function rangesSection(tests: readonly RangeTest[]): PageElement {
  return section(
    "ranges",
    words.ranges.title,
    tests.length === 0 ? el("p", { class: "quiet" }, words.ranges.none) : el("ul", { class: "strips" }, ...tests.map(rangeItem)),
  );
}

function rangeItem(test: RangeTest): PageElement {
  return el(
    "li",
    { class: test.within ? "range" : "range outside" },
    el(
      "p",
      { class: "range-head" },
      el("span", { class: "range-symbol" }, typesetSymbol(test.symbol), ` = ${figure(test.value)}`),
      el(
        "span",
        { class: "range-word" },
        `${test.within ? words.ranges.inside : words.ranges.outside} ${words.ranges.interval(figure(test.low), figure(test.high))}`,
      ),
    ),
    stripDrawing(stripOf(test)),
    el("p", { class: "quiet small" }, `${test.meaning}. ${words.ranges.origin(test.source, test.origin)}`),
  );
}

export function equationSection(equation: EquationShown, steps: readonly Step[]): PageElement {
  const symbols = symbolsIn(equation);
  return section(
    "equation",
    words.equation.title,
    el("p", { class: "equation-name" }, equation.name),
    el("div", { class: "lines" }, ...equation.lines.map(([name, algebra], i) => lineShown(name, algebra, i, steps))),
    el("p", { class: "symbol-says quiet", role: "status", id: "symbol-says" }, words.equation.symbolHint),
    el("p", { class: "source" }, el("strong", {}, `${words.equation.source}: `), equation.source),
    el(
      "p",
      { class: "quiet small" },
      `${words.equation.scatter(formatNumber(100 * equation.scatter, 3), equation.scatterOrigin)}. ${words.equation.properties(equation.propertiesAt)}.`,
    ),
    words.equation.confidence[equation.confidence] !== undefined &&
      el("p", { class: "quiet small" }, words.equation.confidence[equation.confidence]),
    equation.note !== "" && el("p", { class: "quiet small" }, equation.note),
    folded(
      "symbols",
      words.equation.symbols,
      false,
      el(
        "dl",
        { class: "symbol-list" },
        ...symbols.map((name) => el("div", {}, el("dt", {}, typesetSymbol(name)), el("dd", {}, symbolSays(name, steps)))),
      ),
    ),
  );
}

function symbolsIn(equation: EquationShown): readonly string[] {
  const found = new Set<string>();
  for (const [name, algebra] of equation.lines) {
    const tree = typesetLine(name, algebra);
    if (tree !== undefined) collectSymbols(tree, found);
  }
  return [...found];
}

function collectSymbols(node: PageElement, found: Set<string>): void {
  const name = node.attributes["data-symbol"];
  if (name !== undefined) found.add(name);
  for (const child of node.children) if (typeof child !== "string") collectSymbols(child, found);
}

/** A line is one stop of the tab key; arrow keys move among its symbols. */
function lineShown(name: string, algebra: string, index: number, steps: readonly Step[]): PageElement {
  const tree = typesetLine(name, algebra);
  if (tree === undefined) return el("p", { class: "line plain" }, `${name} = ${algebra}`);
  const told = new Set<string>();
  return el(
    "div",
    { class: "line", role: "group", "aria-label": words.equation.maths(name), id: `line-${index}` },
    telling(tree, steps, told),
  );
}

/** Each symbol of the tree with what it says; the first one takes the tab key. */
function telling(node: PageElement, steps: readonly Step[], told: Set<string>): PageElement {
  const name = node.attributes["data-symbol"];
  const own: Readonly<Record<string, string>> =
    name === undefined ? {} : { "data-says": symbolSays(name, steps), tabindex: told.size === 0 ? "0" : "-1" };
  if (name !== undefined) told.add(name);
  return {
    ...node,
    attributes: { ...node.attributes, ...own },
    children: node.children.map((child) => (typeof child === "string" ? child : telling(child, steps, told))),
  };
}

export function inputsSection(explanation: Explanation, texts: Readonly<Record<string, string>>, settings: CellBlock | null): PageElement {
  const rows = explanation.inputs.map((one) => ({ ...one, text: texts[one.name] ?? "" }));
  return section(
    "inputs",
    words.inputs.title,
    el(
      "table",
      { class: "table" },
      el(
        "thead",
        {},
        el("tr", {}, ...[words.inputs.name, words.inputs.given, words.inputs.read].map((head) => el("th", { scope: "col" }, head))),
      ),
      el(
        "tbody",
        {},
        ...rows.map((row) =>
          el(
            "tr",
            {},
            el("th", { scope: "row", title: row.describe }, row.name),
            el(
              "td",
              {},
              row.given === "" ? words.inputs.omitted : row.given,
              row.text !== "" && isReference(row.text, row.given) && el("span", { class: "quiet small from" }, row.text),
            ),
            el("td", {}, row.read),
          ),
        ),
      ),
    ),
    settings !== null &&
      el(
        "p",
        { class: "small" },
        el("strong", {}, `${words.inputs.settings}: `),
        settingsShown(settings),
        texts.settings !== undefined &&
          isReference(texts.settings, String(settings[0]?.[0])) &&
          el("span", { class: "quiet small from" }, texts.settings),
      ),
  );
}

/** Text as it is; two columns as "name = value"; a table by its rows. */
export function settingsShown(settings: CellBlock): string {
  const shown = (cell: unknown): string => (isErrorCell(cell) ? cell.code : String(cell ?? ""));
  const rows = settings.map((row) => row.map(shown).filter((text) => text !== ""));
  return rows
    .filter((row) => row.length > 0)
    .map((row) => row.join(row.length === 2 ? " = " : ", "))
    .join("; ");
}

/** What stands in the formula is worth showing where it is not simply the value. */
function isReference(text: string, given: string): boolean {
  return text !== given && text !== `"${given}"`;
}

/** Properties grouped by the state they were taken at. */
export function stateSection(steps: readonly Step[]): PageElement | undefined {
  const properties = steps.filter((one) => one.kind === "property");
  if (properties.length === 0) return undefined;
  const states = new Map<string, Step[]>();
  for (const one of properties) {
    const state = one.note ?? "";
    states.set(state, [...(states.get(state) ?? []), one]);
  }
  return section(
    "state",
    words.state.title,
    ...[...states].map(([note, list], i) => {
      const [where = "", ...sources] = note.split("; ");
      return el(
        "div",
        { class: "state-block" },
        el("h4", {}, where),
        stepTable(list),
        sources.length > 0 && folded(`source-${i}`, words.state.source, false, el("p", { class: "quiet small" }, sources.join("; "))),
      );
    }),
  );
}

export function groupsSection(steps: readonly Step[]): PageElement | undefined {
  const groups = steps.filter((one) => one.kind === "group");
  return groups.length === 0 ? undefined : section("groups", words.groups.title, stepTable(groups));
}

/** The meaning heads the row: a symbol alone says nothing to a reader who hears the table. */
function stepTable(steps: readonly Step[]): PageElement {
  const heads = [words.table.symbol, words.table.meaning, words.table.value].map((head) => el("th", { scope: "col" }, head));
  const rows = steps.map((one) =>
    el(
      "tr",
      {},
      el("td", { class: "sym" }, typesetSymbol(one.symbol)),
      el("th", { scope: "row", class: "meaning" }, one.meaning),
      el("td", { class: "value" }, stepValue(one)),
    ),
  );
  return el("table", { class: "table steps" }, el("thead", { class: "unseen" }, el("tr", {}, ...heads)), el("tbody", {}, ...rows));
}

export function stepValue(step: Step): string {
  if (typeof step.value === "string") return step.value;
  const isTemperature = step.unit === "K" && /^T(s|b|f|ref|aw|star)$/.test(step.symbol);
  if (isTemperature) return formatQuantity(step.value, "temperature", "SI", 5);
  return [figure(step.value), step.unit].filter((one) => one !== "").join(" ");
}

export function boundsSection(finding: Finding, units: "SI" | "US"): PageElement | undefined {
  const causes = finding.contributions();
  if (!finding.answered) return undefined;
  const largest = Math.max(...causes.flatMap((one) => [one.below, one.above]), 0);
  const squares = causes.reduce((sum, one) => sum + reach(one) ** 2, 0);
  return section(
    "bounds",
    words.bounds.title,
    causes.length === 0 || largest === 0
      ? el("p", { class: "quiet" }, words.bounds.none)
      : el(
          "ul",
          { class: "causes" },
          ...[...causes].sort((one, other) => reach(other) - reach(one)).map((one) => causeItem(one, largest, squares, units)),
        ),
    causes.length > 0 && el("p", { class: "quiet small" }, words.bounds.says),
  );
}

function reach(one: Contribution): number {
  return Math.max(one.below, one.above);
}

function causeItem(one: Contribution, largest: number, squares: number, units: "SI" | "US"): PageElement {
  const shown = (value: number): string => raisedPowers(formatQuantity(value, "film coefficient", units, 2));
  const share = squares > 0 ? formatNumber((100 * reach(one) ** 2) / squares, 2) : "0";
  return el(
    "li",
    {},
    el("p", { class: "cause-head" }, el("span", {}, one.cause), el("span", { class: "cause-share" }, words.bounds.share(share))),
    tug(one.below / largest, one.above / largest),
    el("p", { class: "quiet small" }, `−${shown(one.below).replace(/ .*$/, "")} / +${shown(one.above)}; ${one.origin}`),
  );
}

export function compareSection(alternatives: readonly Alternative[], units: "SI" | "US", isOpen: boolean): PageElement | undefined {
  if (alternatives.length === 0) return undefined;
  const inRange = alternatives.filter((one) => one.inRange).length;
  const taken = alternatives.find((one) => one.chosen)?.h;
  const axis = axisAround(
    alternatives.filter((one) => one.inRange || one.chosen).flatMap((one) => [one.h ?? 0, one.high ?? 0]),
    true,
  );
  return folded(
    "compare",
    `${words.compare.title}: ${words.compare.count(inRange, alternatives.length)}`,
    isOpen,
    el("p", { class: "quiet small" }, words.compare.says),
    el(
      "ul",
      { class: "alternatives" },
      ...alternatives.map((one) => {
        const kind = one.chosen ? "taken" : one.inRange ? "inside" : "outside";
        const value = one.h === undefined ? words.compare.none : raisedPowers(formatQuantity(one.h, "film coefficient", units, 3));
        return el(
          "li",
          { class: kind, title: one.source },
          el("p", { class: "alternative-head" }, el("span", {}, one.equation), el("span", { class: "alternative-value" }, value)),
          one.h !== undefined && one.low !== undefined && one.high !== undefined && whisker(axis, one.low, one.h, one.high, kind, taken),
          el(
            "p",
            { class: "quiet small" },
            [one.chosen ? words.compare.taken : "", one.inRange ? words.compare.inRange : raisedPowers(one.verdict)]
              .filter((text) => text !== "")
              .join("; "),
          ),
        );
      }),
    ),
  );
}

export function cautionsSection(cautions: readonly string[]): PageElement {
  return section(
    "cautions",
    words.cautions.title,
    cautions.length === 0
      ? el("p", { class: "quiet" }, words.cautions.none)
      : el("ul", { class: "caution-list" }, ...cautions.map((one) => el("li", {}, one))),
  );
}

export function traceSection(steps: readonly Step[], copy: () => void): PageElement {
  return folded(
    "trace",
    words.trace.title,
    false,
    stepTable(steps),
    el("p", {}, el("button", { type: "button", id: "copy-report", click: copy }, words.trace.copy)),
    el("p", { class: "quiet small", role: "status", id: "copy-says" }),
  );
}
