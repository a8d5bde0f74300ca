/** "New formula" as a tree: the choice of a function by drawing and words, then a form with the result beside it. */
import type { Explanation } from "../../cells/explanation.js";
import { shelf } from "../../fluids/shelf.js";
import { surfaceDrawing } from "../drawings/surfaces.js";
import { shownValue } from "../figures.js";
import { fluidNameToUse, type Library } from "../library/entries.js";
import { type Child, el, type PageElement } from "../node.js";
import { type Parameter, type Signature, signatureOf } from "../signature.js";
import { verdictSection } from "../this-cell/sections.js";
import { words } from "../words.js";
import {
  boxedParameters,
  commonWords,
  dimensionsOf,
  type Form,
  settingsKnown,
  systemOf,
  takes,
  unitsFor,
  type Variation,
  wordsChosen,
} from "./form.js";

const { compose: says } = words;

export interface ChooserActions {
  search(text: string): void;
  choose(functionId: string): void;
}

export function chooserHead(actions: ChooserActions): readonly Child[] {
  return [
    el("div", { class: "heading" }, el("h2", { id: "page-title" }, says.title)),
    el("label", { class: "field", for: "function-search" }, says.search),
    el("input", {
      type: "search",
      id: "function-search",
      placeholder: says.placeholder,
      autocomplete: "off",
      input: (event) => actions.search((event.target as HTMLInputElement).value),
    }),
  ];
}

export function chooserBody(found: Library, actions: ChooserActions): readonly Child[] {
  const card = (id: string, title: string): PageElement =>
    el(
      "li",
      {},
      el(
        "button",
        { type: "button", class: "card", id: `choose-${id.toLowerCase().replace(/\./g, "-")}`, click: () => actions.choose(id) },
        surfaceDrawing(id),
        el("span", {}, title),
        el("code", { class: "quiet small" }, `FILM.${id}`),
      ),
    );
  const states = found.functions.filter((one) => one.signature.id !== "LIST");
  return [
    ...(found.surfaces.length === 0
      ? []
      : [
          el("h3", { class: "gap" }, says.choose),
          el("ul", { class: "cards" }, ...found.surfaces.map((one) => card(one.surface.id, one.surface.title))),
        ]),
    ...(states.length === 0
      ? []
      : [
          el("h3", { class: "gap" }, words.library.states),
          el("ul", { class: "cards plain" }, ...states.map((one) => card(one.signature.id, one.signature.title))),
        ]),
    ...(found.surfaces.length + states.length === 0 ? [el("p", { class: "quiet" }, words.library.nothing)] : []),
  ];
}

export interface FormActions {
  other(): void;
  type(name: string, typed: string): void;
  unit(name: string, unit: string): void;
  take(name: string): void;
  toggleWord(word: string): void;
  addWord(): void;
  addSetting(name: string): void;
  setting(index: number, value: string): void;
  removeSetting(index: number): void;
  settingsFrom(text: string): void;
  giveFrom(text: string): void;
  vary(change: Partial<Record<keyof Variation, string>>): void;
  insert(): void;
  insertTable(): void;
}

export interface FormTexts {
  /** Where the formula goes, as the host writes it. */
  readonly target: string;
  readonly isEdit: boolean;
  readonly variation: Readonly<Record<keyof Variation, string>>;
}

export function formView(form: Form, texts: FormTexts, actions: FormActions): readonly Child[] {
  const signature = signatureOf(form.functionId);
  if (signature === undefined) return [];
  return [
    el(
      "div",
      { class: "heading with-sketch" },
      surfaceDrawing(form.functionId),
      el(
        "div",
        {},
        el("p", { class: "quiet small where" }, texts.isEdit ? says.editTitle(texts.target) : says.title),
        el("h2", { id: "page-title", tabindex: -1 }, signature.title),
        el("code", {}, `FILM.${form.functionId}`),
      ),
    ),
    !texts.isEdit && el("p", {}, el("button", { type: "button", class: "plain", id: "other-function", click: actions.other }, says.other)),
    el(
      "section",
      { class: "part first", "aria-labelledby": "compose-inputs" },
      el("h3", { id: "compose-inputs" }, says.inputs),
      ...boxedParameters(signature).map((one) => boxField(form, one, actions)),
      fluidNames(),
    ),
    takes(signature, "give") && giveSection(form, actions),
    takes(signature, "settings") && settingsSection(form, actions),
    el(
      "section",
      { class: "part", "aria-labelledby": "compose-result" },
      el("h3", { id: "compose-result" }, says.result),
      el("div", { id: "compose-live", role: "status" }),
    ),
    el(
      "section",
      { class: "part", "aria-labelledby": "compose-formula" },
      el("h3", { id: "compose-formula" }, says.formula),
      el("p", { class: "example" }, el("code", { id: "compose-text" })),
      el(
        "p",
        {},
        el(
          "button",
          { type: "button", class: "main", id: "insert", click: actions.insert },
          texts.isEdit ? says.change(texts.target) : says.insert(texts.target),
        ),
      ),
      el("div", { id: "compose-ask" }),
    ),
    !texts.isEdit && takes(signature, "give") && tableSection(form, signature, texts, actions),
  ].filter((one): one is PageElement => one !== false);
}

/** One list of names serves the box of the fluid in every form. */
function fluidNames(): PageElement {
  return el("datalist", { id: "fluid-names" }, ...shelf().map((entry) => el("option", { value: fluidNameToUse(entry) })));
}

function fieldId(name: string): string {
  return `box-${name.replace(/[^a-z0-9]+/gi, "-")}`;
}

export function faultId(name: string): string {
  return `fault-${name.replace(/[^a-z0-9]+/gi, "-")}`;
}

function boxField(form: Form, parameter: Parameter, actions: FormActions): PageElement {
  const { name } = parameter;
  const box = form.boxes[name] ?? { typed: "", unit: "" };
  const units = unitsFor(dimensionsOf(form.functionId, name), systemOf(form));
  const id = fieldId(name);
  return el(
    "div",
    { class: "field-row" },
    el(
      "label",
      { class: "field", for: id },
      name,
      el("span", { class: "quiet small" }, ` ${parameter.describe}${parameter.optional ? `; ${says.optional}` : ""}`),
    ),
    el(
      "div",
      { class: "boxes" },
      el("input", {
        type: "text",
        id,
        value: box.typed,
        autocomplete: "off",
        spellcheck: "false",
        "aria-describedby": faultId(name),
        list: name === "fluid" ? "fluid-names" : undefined,
        input: (event) => actions.type(name, (event.target as HTMLInputElement).value),
      }),
      units.length > 0 &&
        el(
          "select",
          {
            "aria-label": says.unitOf(name),
            id: `${id}-unit`,
            change: (event) => actions.unit(name, (event.target as HTMLSelectElement).value),
          },
          ...units.map((unit) => el("option", { value: unit, selected: unit === box.unit }, unit)),
        ),
      el(
        "button",
        {
          type: "button",
          class: "take",
          id: `${id}-take`,
          "aria-label": says.take(name),
          title: says.take(name),
          click: () => actions.take(name),
        },
        says.takeShort,
      ),
    ),
    el("p", { class: "fault small", id: faultId(name) }),
  );
}

function giveSection(form: Form, actions: FormActions): PageElement {
  const chosen = wordsChosen(form);
  const all = [...new Set([...commonWords(form.functionId), ...chosen])];
  return el(
    "section",
    { class: "part", "aria-labelledby": "compose-give" },
    el("h3", { id: "compose-give" }, says.give),
    form.giveFrom !== ""
      ? fromCells("give-from", says.giveFrom, form.giveFrom, actions.giveFrom)
      : el(
          "div",
          {},
          el(
            "div",
            { class: "word-choice", role: "group", "aria-labelledby": "compose-give" },
            ...all.map((word) =>
              el(
                "label",
                { class: "choice" },
                el("input", {
                  type: "checkbox",
                  id: `word-${word.replace(/[^a-z0-9]+/gi, "-")}`,
                  checked: chosen.includes(word),
                  change: () => actions.toggleWord(word),
                }),
                word,
              ),
            ),
          ),
          el(
            "div",
            { class: "boxes" },
            el("input", { type: "text", id: "more-word", "aria-label": says.moreWords, placeholder: says.moreWords, autocomplete: "off" }),
            el("button", { type: "button", id: "add-word", click: actions.addWord }, says.addWord),
          ),
          el("p", { class: "fault small", id: faultId("give") }),
          el("p", { class: "quiet small" }, says.giveHint),
        ),
  );
}

function fromCells(id: string, label: string, value: string, change: (text: string) => void): PageElement {
  return el(
    "div",
    {},
    el("label", { class: "field", for: id }, label),
    el("input", {
      type: "text",
      id,
      value,
      autocomplete: "off",
      spellcheck: "false",
      input: (event) => change((event.target as HTMLInputElement).value),
    }),
  );
}

function settingsSection(form: Form, actions: FormActions): PageElement {
  const known = settingsKnown(form.functionId);
  const free = known.filter((one) => !form.settings.some((row) => row.name === one.name));
  return el(
    "section",
    { class: "part", "aria-labelledby": "compose-settings" },
    el("h3", { id: "compose-settings" }, says.settings),
    form.settingsFrom !== ""
      ? fromCells("settings-from", says.settingsFrom, form.settingsFrom, actions.settingsFrom)
      : el(
          "div",
          {},
          ...form.settings.map((row, i) => settingRow(row.name, row.value, i, known, actions)),
          el(
            "select",
            {
              id: "add-setting",
              "aria-label": says.addSetting,
              change: (event) => {
                const { value } = event.target as HTMLSelectElement;
                if (value !== "") actions.addSetting(value);
              },
            },
            el("option", { value: "" }, `${says.addSetting} …`),
            ...free.map((one) => el("option", { value: one.name }, `${one.name}: ${one.describe}`)),
          ),
          el("p", { class: "quiet small" }, says.settingsHint),
        ),
    el("p", { class: "fault small", id: faultId("settings") }),
  );
}

function settingRow(
  name: string,
  value: string,
  index: number,
  known: ReturnType<typeof settingsKnown>,
  actions: FormActions,
): PageElement {
  const definition = known.find((one) => one.name === name);
  const id = `setting-${index}`;
  const choices = definition?.words;
  return el(
    "div",
    { class: "field-row" },
    el(
      "label",
      { class: "field", for: id },
      name,
      definition !== undefined && el("span", { class: "quiet small" }, ` ${definition.describe}`),
    ),
    el(
      "div",
      { class: "boxes" },
      choices === undefined
        ? el("input", {
            type: "text",
            id,
            value,
            autocomplete: "off",
            input: (event) => actions.setting(index, (event.target as HTMLInputElement).value),
          })
        : el(
            "select",
            { id, change: (event) => actions.setting(index, (event.target as HTMLSelectElement).value) },
            ...["", ...choices].map((one) => el("option", { value: one, selected: one.toLowerCase() === value.toLowerCase() }, one)),
          ),
      el(
        "button",
        {
          type: "button",
          id: `${id}-remove`,
          "aria-label": says.removeSetting(name),
          title: says.removeSetting(name),
          click: () => actions.removeSetting(index),
        },
        "✕",
      ),
    ),
  );
}

function tableSection(form: Form, signature: Signature, texts: FormTexts, actions: FormActions): PageElement {
  const columns = boxedParameters(signature).filter((one) => one.name !== "fluid");
  const { variation } = texts;
  const end = (key: "from" | "to" | "count", label: string): PageElement =>
    el(
      "span",
      { class: "end" },
      el("label", { class: "small", for: `vary-${key}` }, label),
      el("input", {
        type: "text",
        inputmode: "decimal",
        id: `vary-${key}`,
        value: variation[key],
        autocomplete: "off",
        input: (event) => actions.vary({ [key]: (event.target as HTMLInputElement).value }),
      }),
    );
  return el(
    "section",
    { class: "part", "aria-labelledby": "compose-table" },
    el("h3", { id: "compose-table" }, says.table),
    el("label", { class: "field", for: "vary-name" }, says.vary),
    el(
      "select",
      { id: "vary-name", change: (event) => actions.vary({ name: (event.target as HTMLSelectElement).value }) },
      ...columns.map((one) =>
        el("option", { value: one.name, selected: one.name === variation.name }, `${one.name}${unitShown(form, one.name)}`),
      ),
    ),
    el("div", { class: "ends" }, end("from", says.from), end("to", says.to), end("count", says.rows)),
    el("p", {}, el("button", { type: "button", id: "insert-table", click: actions.insertTable }, says.insertTable(texts.target))),
    el("div", { id: "table-ask" }),
  );
}

function unitShown(form: Form, name: string): string {
  const unit = form.boxes[name]?.unit ?? "";
  return unit === "" ? "" : ` [${unit}]`;
}

/** The result beside the form; `undefined` while the formula is not whole. */
export function liveView(explanation: Explanation | undefined, troubles: readonly string[]): readonly Child[] {
  if (troubles.length > 0) return troubles.map((one) => el("p", { class: "trouble" }, one));
  if (explanation === undefined) return [el("p", { class: "quiet" }, says.waiting)];
  const { finding, problems, units } = explanation;
  if (problems.length > 0) {
    return [
      el(
        "ul",
        { class: "trouble-list" },
        ...problems.map((one) => el("li", {}, one.argument !== undefined && el("strong", {}, `${one.argument}: `), one.sentence)),
      ),
    ];
  }
  if (finding === undefined) {
    const value = shownValue(explanation.value, units, 6);
    return [el("p", { class: "number" }, el("strong", {}, value ?? says.waiting))];
  }
  const h = shownValue(finding.word("h"), units);
  const [low, high] = [shownValue(finding.word("h low"), units, 3), shownValue(finding.word("h high"), units, 3)];
  return [
    h === undefined
      ? el("p", {}, words.result.notAnswered)
      : el("p", { class: "number" }, el("span", {}, words.result.h), el("strong", {}, h)),
    ...(low === undefined || high === undefined
      ? []
      : [el("p", { class: "number-bounds" }, `${words.result.to(low.replace(/ .*$/, ""), high)} (${words.result.coverage})`)]),
    verdictSection(explanation),
  ];
}

export function askView(sentence: string, yes: () => void): readonly Child[] {
  return [
    el("p", { class: "trouble", role: "alert" }, sentence),
    el("p", {}, el("button", { type: "button", id: "write-over", click: yes }, says.writeOver)),
  ];
}
