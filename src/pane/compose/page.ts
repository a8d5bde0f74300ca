/** "New formula": choose a function, fill the form, see the result, put the formula or a whole table into the sheet. */
import { explain } from "../../cells/answer.js";
import { readSelection } from "../cell-reading.js";
import { isUnread, parseFormula } from "../formula.js";
import type { Area, Place, Selection, Written } from "../host.js";
import { library, searched } from "../library/entries.js";
import { el } from "../node.js";
import type { Errand, Frame, Page } from "../page.js";
import { cellName, columnLetters, sheetPrefix } from "../reference.js";
import { show } from "../render.js";
import { signatureOf } from "../signature.js";
import { words } from "../words.js";
import { type Form, formOfCall, formulaText, freshForm, tableCells, type Variation, wordsChosen } from "./form.js";
import { askView, chooserBody, chooserHead, faultId, formView, liveView } from "./view.js";

const pause = 120;

export const newFormulaPage: Page = {
  id: "new-formula",
  title: words.pages.newFormula,
  begin: (frame, errand) => {
    const composer = new Composer(frame, errand);
    return () => composer.end();
  },
};

class Composer {
  private form: Form | undefined;
  private readonly edit: Errand["edit"];
  private readonly fluid: string | undefined;
  private selection: Selection | undefined;
  private variation: Record<keyof Variation, string> = { name: "", from: "", to: "", count: "8" };
  private timer: ReturnType<typeof setTimeout> | undefined;
  private round = 0;
  private readonly stop: () => void;

  constructor(
    private readonly frame: Frame,
    errand: Errand,
  ) {
    this.edit = errand.edit;
    this.fluid = errand.fluid;
    this.stop = frame.host.onSelectionChanged(() => void this.followSelection());
    if (errand.edit !== undefined) this.take(formOfCall(errand.edit.formula, errand.edit.call));
    else if (errand.functionId !== undefined) this.take(freshForm(errand.functionId, errand.fluid));
    else this.showChooser();
    void this.followSelection();
  }

  end(): void {
    clearTimeout(this.timer);
    this.round++;
    this.stop();
  }

  private showChooser(): void {
    let timer: ReturnType<typeof setTimeout> | undefined;
    const actions = {
      search: (text: string) => {
        clearTimeout(timer);
        timer = setTimeout(() => refresh(text), pause / 2);
      },
      choose: (functionId: string) => {
        clearTimeout(timer);
        this.take(freshForm(functionId, this.fluid));
      },
    };
    this.form = undefined;
    this.frame.show([...chooserHead(actions), el("div", { id: "chooser-body" })]);
    const body = this.frame.content.querySelector("#chooser-body") as HTMLElement;
    const refresh = (text: string): void => show(body, chooserBody(searched(library(), text), actions));
    refresh("");
  }

  private take(form: Form): void {
    this.form = form;
    const signature = signatureOf(form.functionId);
    const first = signature?.parameters.find((one) => one.name !== "fluid" && !one.optional);
    const typed = Number(form.boxes[first?.name ?? ""]?.typed ?? "");
    const middle = Number.isFinite(typed) ? typed : 0;
    this.variation = { name: first?.name ?? "", from: String(middle - 20), to: String(middle + 15), count: "8" };
    this.draw();
    this.frame.content.querySelector<HTMLElement>("#page-title")?.focus({ preventScroll: true });
  }

  private get target(): Place | undefined {
    return this.edit?.at ?? this.selection?.place;
  }

  private draw(): void {
    const { form } = this;
    if (form === undefined) return;
    const { target } = this;
    this.frame.show(
      formView(
        form,
        { target: target === undefined ? "…" : addressOf(target), isEdit: this.edit !== undefined, variation: this.variation },
        {
          other: () => this.showChooser(),
          type: (name, typed) =>
            this.change({ boxes: { ...this.formNow.boxes, [name]: { unit: this.formNow.boxes[name]?.unit ?? "", typed } } }),
          unit: (name, unit) =>
            this.change({ boxes: { ...this.formNow.boxes, [name]: { typed: this.formNow.boxes[name]?.typed ?? "", unit } } }),
          take: (name) => this.takeCells(name),
          toggleWord: (word) => this.toggleWord(word),
          addWord: () => this.addWord(),
          addSetting: (name) =>
            this.redraw({ settings: [...this.formNow.settings, { name, value: "" }] }, `setting-${this.formNow.settings.length}`),
          setting: (index, value) => this.setting(index, value),
          removeSetting: (index) => this.redraw({ settings: this.formNow.settings.filter((_, i) => i !== index) }, "add-setting"),
          settingsFrom: (settingsFrom) => this.change({ settingsFrom }),
          giveFrom: (giveFrom) => this.change({ giveFrom }),
          vary: (change) => {
            this.variation = { ...this.variation, ...change };
          },
          insert: () => void this.insert(false),
          insertTable: () => void this.insertTable(false),
        },
      ),
    );
    this.soon(0);
  }

  private get formNow(): Form {
    return this.form as Form;
  }

  private change(change: Partial<Form>): void {
    this.form = { ...this.formNow, ...change };
    this.soon(pause);
  }

  /** A change of what boxes there are: the page is drawn anew, the focus goes where the change leads. */
  private redraw(change: Partial<Form>, focus: string): void {
    this.form = { ...this.formNow, ...change };
    this.draw();
    this.frame.content.querySelector<HTMLElement>(`#${focus}`)?.focus();
  }

  private toggleWord(word: string): void {
    const chosen = wordsChosen(this.formNow);
    this.change({ give: chosen.includes(word) ? chosen.filter((one) => one !== word) : [...chosen, word] });
  }

  private addWord(): void {
    const box = this.frame.content.querySelector<HTMLInputElement>("#more-word");
    const word = box?.value.trim() ?? "";
    if (word === "") return;
    const chosen = wordsChosen(this.formNow);
    this.redraw({ give: [...new Set([...chosen, word])] }, "more-word");
  }

  private setting(index: number, value: string): void {
    const changed = this.formNow.settings.map((row, i) => (i === index ? { ...row, value } : row));
    // The system of units changes what stands beside every box.
    if (changed[index]?.name === "units") this.redraw({ settings: changed }, `setting-${index}`);
    else this.change({ settings: changed });
  }

  private takeCells(name: string): void {
    const area = this.selection?.area ?? (this.selection === undefined ? undefined : { ...this.selection.place, rows: 1, columns: 1 });
    if (area === undefined) return this.frame.say(words.compose.noSelection);
    const typed = referenceTo(area, this.target?.sheet ?? area.sheet);
    const unit = this.formNow.boxes[name]?.unit ?? "";
    this.redraw({ boxes: { ...this.formNow.boxes, [name]: { typed, unit } } }, `box-${name.replace(/[^a-z0-9]+/gi, "-")}`);
  }

  private async followSelection(): Promise<void> {
    const selection = await this.frame.host.selection().catch(() => undefined);
    this.selection = selection;
    if (selection === undefined || this.edit !== undefined) return;
    const address = addressOf(selection.place);
    const { content } = this.frame;
    const insert = content.querySelector("#insert");
    const table = content.querySelector("#insert-table");
    if (insert !== null) insert.textContent = words.compose.insert(address);
    if (table !== null) table.textContent = words.compose.insertTable(address);
    for (const ask of content.querySelectorAll("#compose-ask, #table-ask")) ask.replaceChildren();
    this.soon(pause);
  }

  private soon(after: number): void {
    clearTimeout(this.timer);
    this.timer = setTimeout(() => void this.live(), after);
  }

  /** The result as the sheet would have it, worked out before anything is written. */
  private async live(): Promise<void> {
    const { form } = this;
    const into = this.frame.content.querySelector<HTMLElement>("#compose-live");
    if (form === undefined || into === null) return;
    const round = ++this.round;
    const formula = formulaText(form);
    const text = this.frame.content.querySelector("#compose-text");
    if (text !== null) text.textContent = formula;
    const place = this.target ?? { sheet: "", row: 0, column: 0 };
    const cell = await readSelection({ place, address: "", formula, shown: "" }, this.frame.host).catch(() => undefined);
    if (round !== this.round) return;
    const read = cell?.calls[0];
    const troubles = [...(cell?.trouble === undefined ? [] : [cell.trouble]), ...(read?.troubles ?? [])];
    const explanation =
      read === undefined || troubles.length > 0 ? undefined : explain(read.id, read.args, read.give, read.settings, { row: 0, column: 0 });
    show(into, liveView(explanation, troubles));
    this.markFaults(explanation?.problems ?? []);
  }

  /** Each problem also stands under the box that it is about. */
  private markFaults(problems: readonly { readonly argument?: string; readonly sentence: string }[]): void {
    for (const place of this.frame.content.querySelectorAll(".fault")) {
      const mine = problems.filter((one) => one.argument !== undefined && faultId(one.argument) === place.id);
      place.textContent = mine.map((one) => one.sentence).join(" ");
    }
  }

  private async insert(over: boolean): Promise<void> {
    const { target, form } = this;
    if (target === undefined || form === undefined) return this.frame.say(words.compose.noSelection);
    const formula = this.edit === undefined ? formulaText(form) : edited(this.edit, formulaText(form));
    const size = this.edit === undefined ? { rows: 1, columns: Math.max(1, form.give.length) } : { rows: 0, columns: 0 };
    await this.write(target, [[formula]], size, over, "#compose-ask", () => void this.insert(true));
  }

  private async insertTable(over: boolean): Promise<void> {
    const { target, form } = this;
    if (target === undefined || form === undefined) return this.frame.say(words.compose.noSelection);
    const { name, from, to, count } = this.variation;
    const cells = tableCells(
      form,
      { name, from: Number(from.replace(",", ".")), to: Number(to.replace(",", ".")), count: Number(count) },
      target,
    );
    if (cells === undefined) return this.frame.say(words.compose.noTable);
    await this.write(
      target,
      cells,
      { rows: cells.length, columns: cells[0]?.length ?? 1 },
      over,
      "#table-ask",
      () => void this.insertTable(true),
    );
  }

  /** Writes only over blank cells, unless it is told to write over what is there. */
  private async write(
    at: Place,
    cells: readonly (readonly Written[])[],
    size: { rows: number; columns: number },
    over: boolean,
    askAt: string,
    again: () => void,
  ): Promise<void> {
    const ask = this.frame.content.querySelector<HTMLElement>(askAt);
    const area: Area = { ...at, ...size };
    if (!over && size.rows > 0 && (await this.isTaken(area))) {
      if (ask !== null) show(ask, askView(words.compose.taken(areaName(area)), again));
      return;
    }
    ask?.replaceChildren();
    try {
      await this.frame.host.write(at, cells);
      this.frame.say(words.compose.inserted(addressOf(at)));
    } catch (fault) {
      this.frame.say(words.trouble.notWritten(fault instanceof Error ? fault.message : String(fault)));
    }
  }

  private async isTaken(area: Area): Promise<boolean> {
    const [block] = await this.frame.host.read([area]).catch(() => [undefined]);
    return block?.some((row) => row.some((cell) => cell !== "" && cell !== null && cell !== undefined)) ?? false;
  }
}

/** The edited formula: its old call replaced by the new one, everything around it kept. */
function edited(edit: NonNullable<Errand["edit"]>, fresh: string): string {
  const tree = parseFormula(edit.formula);
  const call = fresh.replace(/^=/, "");
  return isUnread(tree) ? fresh : `${edit.formula.slice(0, edit.call.start)}${call}${edit.formula.slice(edit.call.end)}`;
}

function addressOf(place: Place): string {
  return `${sheetPrefix(place.sheet)}${cellName(place.row, place.column)}`;
}

function areaName(area: Area): string {
  const first = cellName(area.row, area.column);
  return area.rows * area.columns === 1 ? first : `${first}:${cellName(area.row + area.rows - 1, area.column + area.columns - 1)}`;
}

/** Whole columns stay whole; a sheet is named only where it is another. */
function referenceTo(area: Area, from: string): string {
  const prefix = area.sheet === from ? "" : sheetPrefix(area.sheet);
  const tall = area.rows > 100_000;
  return prefix + (tall ? `${columnLetters(area.column)}:${columnLetters(area.column + area.columns - 1)}` : areaName(area));
}
