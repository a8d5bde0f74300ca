/** "Whole workbook" as a tree. */
import { raisedPowers } from "../figures.js";
import { formatQuantity } from "../../quantities/format.js";
import { type Child, el, type PageElement } from "../node.js";
import type { VerdictKind } from "../this-cell/sections.js";
import { words } from "../words.js";
import type { System } from "./boundaries.js";
import { counts, type Progress, type Scanned, worstFirst } from "./scan.js";

const { workbook: says } = words;

export interface WorkbookState {
  readonly rows: readonly Scanned[];
  /** Present while the workbook is being read. */
  readonly progress: Progress | undefined;
  readonly wasCancelled: boolean;
  readonly hidden: ReadonlySet<VerdictKind>;
  readonly search: string;
  readonly most: number;
  readonly system: System;
  readonly span: { readonly from: string; readonly to: string; readonly count: string };
}

export interface WorkbookActions {
  again(): void;
  cancel(): void;
  toggle(kind: VerdictKind): void;
  more(): void;
  goTo(row: Scanned): void;
  system(system: System): void;
  span(change: Partial<WorkbookState["span"]>): void;
  writeBoundaries(): void;
  saveBoundaries(): void;
  saveTables(): void;
}

const signs: Readonly<Record<VerdictKind, string>> = { good: "✓", remark: "i", bad: "✕", flagged: "!", error: "✎" };

export function workbookHead(search: (text: string) => void): readonly Child[] {
  return [
    el("div", { class: "heading" }, el("h2", { id: "page-title" }, says.title)),
    el("label", { class: "field", for: "workbook-search" }, says.search),
    el("input", {
      type: "search",
      id: "workbook-search",
      placeholder: says.placeholder,
      autocomplete: "off",
      input: (event) => search((event.target as HTMLInputElement).value),
    }),
  ];
}

const mostWhileReading = 12;

export function workbookBody(state: WorkbookState, actions: WorkbookActions): readonly Child[] {
  const listed = shownRows(state);
  // While the workbook is being read the list is short: drawing it again and again would cost more than the reading.
  const isReading = state.progress !== undefined;
  const most = isReading ? Math.min(state.most, mostWhileReading) : state.most;
  return [
    progressLine(state, actions),
    el(
      "div",
      { class: "word-choice", role: "group", "aria-label": says.filter },
      ...counts(state.rows).map(([kind, count]) =>
        el(
          "label",
          { class: `choice kind ${kind}` },
          el("input", { type: "checkbox", id: `kind-${kind}`, checked: !state.hidden.has(kind), change: () => actions.toggle(kind) }),
          `${signs[kind]} ${words.verdict[kind]} (${count})`,
        ),
      ),
    ),
    state.rows.length === 0 && state.progress === undefined
      ? el("p", { class: "quiet" }, says.none)
      : el("ul", { class: "scanned" }, ...listed.slice(0, most).map((row, i) => rowItem(row, i, actions, state.system))),
    !isReading &&
      listed.length > state.most &&
      el("p", {}, el("button", { type: "button", id: "more-rows", click: actions.more }, says.more(listed.length - state.most))),
    !isReading && state.rows.some((row) => row.boundary !== undefined) && boundaryPart(state, actions),
  ].filter((one): one is PageElement => one !== false);
}

export function shownRows(state: WorkbookState): readonly Scanned[] {
  const wanted = state.search.trim().toLowerCase().split(/\s+/);
  const holds = (row: Scanned): boolean => {
    const text = `${row.address} film.${row.functionId} ${row.verdict} ${row.boundary?.fluid ?? ""}`.toLowerCase();
    return wanted.every((word) => text.includes(word));
  };
  return worstFirst(state.rows.filter((row) => !state.hidden.has(row.kind) && holds(row)));
}

function progressLine(state: WorkbookState, actions: WorkbookActions): PageElement {
  const { progress } = state;
  if (progress === undefined) {
    return el(
      "p",
      { class: "progress-line" },
      el("span", { role: "status" }, state.wasCancelled ? says.cancelled(state.rows.length) : says.read(state.rows.length)),
      el("button", { type: "button", id: "scan-again", click: actions.again }, says.again),
    );
  }
  return el(
    "p",
    { class: "progress-line" },
    el("progress", { max: Math.max(1, progress.of), value: progress.cells, "aria-label": says.reading }),
    el("span", {}, says.progress(progress.cells, progress.of)),
    el("button", { type: "button", id: "scan-cancel", click: actions.cancel }, says.cancel),
  );
}

function rowItem(row: Scanned, index: number, actions: WorkbookActions, system: System): PageElement {
  const h = row.boundary === undefined ? undefined : raisedPowers(formatQuantity(row.boundary.h, "film coefficient", system, 3));
  return el(
    "li",
    { class: row.kind },
    el(
      "button",
      { type: "button", class: "plain row", id: `row-${index}`, click: () => actions.goTo(row) },
      el("span", { class: "row-sign", "aria-hidden": "true" }, signs[row.kind]),
      el("span", { class: "row-text" }, el("strong", {}, row.address), ` FILM.${row.functionId}${h === undefined ? "" : `, ${h}`}`),
    ),
    el("p", { class: "quiet small" }, el("span", { class: "unseen" }, `${words.verdict[row.kind]}: `), raisedPowers(row.verdict)),
  );
}

function boundaryPart(state: WorkbookState, actions: WorkbookActions): PageElement {
  const end = (key: "from" | "to" | "count", label: string): PageElement =>
    el(
      "span",
      { class: "end" },
      el("label", { class: "small", for: `span-${key}` }, label),
      el("input", {
        type: "text",
        inputmode: "decimal",
        id: `span-${key}`,
        value: state.span[key],
        autocomplete: "off",
        input: (event) => actions.span({ [key]: (event.target as HTMLInputElement).value }),
      }),
    );
  return el(
    "section",
    { class: "part", "aria-labelledby": "boundaries" },
    el("h3", { id: "boundaries" }, says.boundaries),
    el("p", { class: "small" }, says.boundariesSay),
    el("label", { class: "field", for: "boundary-units" }, says.units),
    el(
      "select",
      { id: "boundary-units", change: (event) => actions.system((event.target as HTMLSelectElement).value === "US" ? "US" : "SI") },
      ...(["SI", "US"] as const).map((one) => el("option", { value: one, selected: one === state.system }, says.system[one])),
    ),
    el(
      "p",
      { class: "buttons" },
      el("button", { type: "button", id: "write-boundaries", click: actions.writeBoundaries }, says.write),
      el("button", { type: "button", id: "save-boundaries", click: actions.saveBoundaries }, says.save),
    ),
    el("div", { id: "boundaries-ask" }),
    el("h4", {}, says.tables),
    el("p", { class: "small" }, says.tablesSay),
    el("div", { class: "ends" }, end("from", says.from(state.system)), end("to", says.to(state.system)), end("count", words.compose.rows)),
    el("p", {}, el("button", { type: "button", id: "save-tables", click: actions.saveTables }, says.saveTables)),
  );
}
