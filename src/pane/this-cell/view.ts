/** "This cell" as a tree: what was read and found in, what is shown out. */
import { answer } from "../../cells/answer.js";
import { isErrorCell } from "../../cells/cell.js";
import type { Explanation } from "../../cells/explanation.js";
import type { ReadCall, ReadCell } from "../cell-reading.js";
import { figure, raisedPowers } from "../figures.js";
import { type Child, el, type PageElement } from "../node.js";
import { words } from "../words.js";
import { type Mending, mendings } from "./mending.js";
import {
  boundsSection,
  cautionsSection,
  compareSection,
  equationSection,
  groupsSection,
  inputsSection,
  rangesSection,
  resultSection,
  section,
  stateSection,
  traceSection,
  verdictSection,
} from "./sections.js";

/** What a reader can do from the page. */
export interface Actions {
  choose(call: number): void;
  mend(formula: string): void;
  copyReport(): void;
  /** Told when the part "What if" is folded out, with the place to fill. */
  whatIf?(place: HTMLElement): void;
  /** True where the comparison, the costliest part, is filled in a moment later: see `comparisonPlace`. */
  readonly later?: boolean;
  /** Absent while there is no such page. */
  compose?(): void;
  edit?(): void;
}

export const comparisonPlace = "comparison-place";

export function emptyView(actions: Actions, address?: string): readonly Child[] {
  return [
    heading(words.empty.title, address),
    el("p", {}, words.empty.says),
    el("p", {}, words.empty.try),
    el("p", { class: "example" }, el("code", {}, words.empty.example), el("span", { class: "quiet small" }, ` ${words.empty.exampleSays}`)),
    ...(actions.compose === undefined
      ? []
      : [el("p", {}, el("button", { type: "button", id: "compose", click: actions.compose }, words.empty.compose))]),
  ];
}

function heading(title: string, address?: string, more?: string): PageElement {
  const where = [address === undefined ? "" : words.cell(address), more ?? ""].filter((one) => one !== "").join(", ");
  return el(
    "div",
    { class: "heading" },
    where !== "" && el("p", { class: "quiet small where" }, where),
    el("h2", { tabindex: -1, id: "page-title" }, title),
  );
}

/** The page for a cell with at least one FILM call, or with a formula that cannot be read. */
export function cellView(cell: ReadCell, chosen: number, explanation: Explanation | undefined, actions: Actions): readonly Child[] {
  const { selection } = cell;
  const spilled = selection.spill === undefined ? undefined : words.spilledFrom(selection.spill.anchorAddress);
  const read = cell.calls[chosen];
  if (read === undefined)
    return [heading(words.verdict.error, selection.address, spilled), el("p", { class: "trouble" }, cell.trouble ?? "")];
  const title = read.signature?.title ?? read.id;
  return [
    heading(title, selection.address, spilled),
    el(
      "p",
      { class: "function" },
      el("code", {}, `FILM.${read.id}`),
      explanation !== undefined &&
        explanation.cases > 1 &&
        el("span", { class: "quiet" }, ` ${words.caseOf(explanation.caseNumber, explanation.cases)}`),
    ),
    ...(cell.calls.length > 1 ? [chooser(cell.calls, chosen, actions)] : []),
    ...(actions.edit === undefined || read.signature === undefined
      ? []
      : [el("p", {}, el("button", { type: "button", id: "edit", class: "plain", click: actions.edit }, words.opens))]),
    ...(explanation === undefined ? troubles(read, selection.shown) : explained(cell, read, explanation, actions)),
  ];
}

function chooser(calls: readonly ReadCall[], chosen: number, actions: Actions): PageElement {
  return el(
    "fieldset",
    { class: "chooser" },
    el("legend", {}, words.chooser),
    ...calls.map((one, i) =>
      el(
        "label",
        { class: "choice" },
        el("input", { type: "radio", name: "call", id: `call-${i}`, checked: i === chosen, change: () => actions.choose(i) }),
        el("code", {}, one.text),
      ),
    ),
  );
}

function troubles(read: ReadCall, shown: string): readonly Child[] {
  return [
    section("problems", words.problems.title, el("ul", { class: "trouble-list" }, ...read.troubles.map((one) => el("li", {}, one)))),
    ...(shown === "" ? [] : [section("shown", words.result.shown, el("p", { class: "headline" }, shown))]),
    section(
      "inputs",
      words.inputs.title,
      el(
        "dl",
        { class: "facts" },
        ...Object.entries(read.texts).map(([name, text]) => el("div", {}, el("dt", {}, name), el("dd", {}, el("code", {}, text)))),
      ),
    ),
  ];
}

function explained(cell: ReadCell, read: ReadCall, explanation: Explanation, actions: Actions): readonly Child[] {
  const { finding, problems, units } = explanation;
  const mends = mendings(cell.formula, read, explanation);
  const steps = finding?.steps() ?? [];
  const equation = finding?.equation();
  const list: (Child | undefined)[] = [
    problemsSection(explanation, mends, actions),
    problems.length === 0 ? verdictSection(explanation) : undefined,
    problems.length === 0 && (finding === undefined || steps.length > 0) ? resultSection(explanation) : undefined,
    read.id === "FLUID" && problems.length === 0 ? fluidTable(read) : undefined,
    finding !== undefined && steps.length > 0 ? rangesSection(finding.rangeTests()) : undefined,
    equation === undefined ? undefined : equationSection(equation, steps),
    explanation.inputs.length > 0 ? inputsSection(explanation, read.texts, read.settings) : undefined,
    stateSection(steps),
    groupsSection(steps),
    finding === undefined ? undefined : boundsSection(finding, units),
    finding === undefined
      ? undefined
      : actions.later === true
        ? el("div", { id: comparisonPlace })
        : compareSection(finding.compare(), units, true),
    finding !== undefined && steps.length > 0 && actions.whatIf !== undefined ? whatIfPart(actions.whatIf) : undefined,
    finding === undefined ? undefined : cautionsSection(finding.cautions()),
    steps.length > 0 ? traceSection(steps, actions.copyReport) : undefined,
  ];
  return list.filter((one): one is Child => one !== undefined);
}

function whatIfPart(unfold: (place: HTMLElement) => void): PageElement {
  const opened = (event: Event): void => {
    const details = event.target as HTMLDetailsElement;
    const place = details.querySelector<HTMLElement>("#what-if-place");
    if (details.open && place !== null && place.childElementCount === 0) unfold(place);
  };
  return el(
    "details",
    { class: "part what-if", id: "what-if", toggle: opened },
    el("summary", {}, el("h3", {}, words.whatIf.title)),
    el("div", { id: "what-if-place" }),
  );
}

/** The sentences that the grid cannot show, and the changes that would mend them. */
function problemsSection(explanation: Explanation, mends: readonly Mending[], actions: Actions): PageElement | undefined {
  const { problems, finding } = explanation;
  if (problems.length === 0 && (finding === undefined || finding.answered)) return undefined;
  const sentences =
    problems.length > 0
      ? problems.map((one) => el("li", {}, one.argument !== undefined && el("strong", {}, `${one.argument}: `), one.sentence))
      : [el("li", {}, shortenedRefusal(explanation))];
  return section(
    "problems",
    words.problems.title,
    el("div", { role: "alert" }, el("ul", { class: "trouble-list" }, ...sentences)),
    mends.length > 0 && el("p", { class: "small" }, words.problems.offer),
    mends.length > 0 &&
      el(
        "ul",
        { class: "mends" },
        ...mends.map((one, i) =>
          el(
            "li",
            {},
            el("button", { type: "button", id: `mend-${i}`, click: () => actions.mend(one.formula) }, one.label),
            el("code", { class: "small" }, one.formula),
          ),
        ),
      ),
  );
}

function shortenedRefusal(explanation: Explanation): string {
  const h = explanation.finding?.word("h");
  return raisedPowers(typeof h === "object" && "sentence" in h ? h.sentence : (explanation.finding?.verdict ?? ""));
}

const mostRows = 60;

/** What FLUID says of the state with every word it knows. */
function fluidTable(read: ReadCall): PageElement | undefined {
  const [head = [], ...rows] = answer("FLUID", read.args, [["all"]], read.settings);
  if (rows.length === 0) return undefined;
  const cell = (value: unknown): string => (typeof value === "number" ? figure(value, 6) : isErrorCell(value) ? value.code : String(value));
  return section(
    "state",
    words.state.title,
    el(
      "table",
      { class: "table" },
      el("thead", {}, el("tr", {}, ...head.map((one) => el("th", { scope: "col" }, cell(one))))),
      el(
        "tbody",
        {},
        ...rows
          .slice(0, mostRows)
          .map((row) => el("tr", {}, ...row.map((one, i) => el(i === 0 ? "th" : "td", i === 0 ? { scope: "row" } : {}, cell(one))))),
      ),
    ),
  );
}
