/** "This cell": follows the selection, reads, explains, shows. */
import { explain } from "../../cells/answer.js";
import type { Explanation } from "../../cells/explanation.js";
import { type ReadCell, readSelection } from "../cell-reading.js";
import { el } from "../node.js";
import type { Frame, Page } from "../page.js";
import { show } from "../render.js";
import { words } from "../words.js";
import { reportText } from "./report.js";
import { followSymbols } from "./symbols.js";
import { compareSection } from "./sections.js";
import { caseAt } from "./what-if.js";
import { WhatIf } from "./what-if-view.js";
import { type Actions, cellView, comparisonPlace, emptyView } from "./view.js";

/** Long enough to let a held arrow key pass, short enough to feel immediate. */
const pause = 90;
const comparisonPause = 30;

export const thisCellPage: Page = {
  id: "this-cell",
  title: words.pages.thisCell,
  begin: (frame) => {
    const follower = new Follower(frame);
    return () => follower.end();
  },
};

class Follower {
  private timer: ReturnType<typeof setTimeout> | undefined;
  private round = 0;
  private hasEnded = false;
  private comparisonOpen = true;
  private movedInput = "surface";
  private chosen = { anchor: "", call: 0 };
  private readonly stops: (() => void)[];

  constructor(private readonly frame: Frame) {
    const soon = (): void => this.soon();
    this.stops = [frame.host.onSelectionChanged(soon), frame.host.onValuesChanged(soon), followSymbols(frame.content)];
    frame.show([el("p", { class: "quiet" }, words.loading)]);
    void this.refresh();
  }

  end(): void {
    this.hasEnded = true;
    clearTimeout(this.timer);
    this.round++;
    for (const stop of this.stops) stop();
  }

  private soon(): void {
    if (this.hasEnded) return;
    clearTimeout(this.timer);
    this.timer = setTimeout(() => void this.refresh(), pause);
  }

  private async refresh(): Promise<void> {
    const round = ++this.round;
    try {
      const selection = await this.frame.host.selection();
      if (round !== this.round) return;
      if (selection === undefined) return this.frame.show([el("p", { class: "quiet" }, words.trouble.noSelection)]);
      const cell = await readSelection(selection, this.frame.host);
      if (round === this.round) this.present(cell);
    } catch (fault) {
      if (round === this.round)
        this.frame.show([el("p", { class: "trouble" }, words.fault(fault instanceof Error ? fault.message : String(fault)))]);
    }
  }

  private present(cell: ReadCell): void {
    if (cell.calls.length === 0 && cell.trouble === undefined)
      return this.frame.show(emptyView(this.actions(cell), cell.selection.address));
    const anchor = JSON.stringify(cell.anchor);
    if (anchor !== this.chosen.anchor || this.chosen.call >= cell.calls.length) this.chosen = { anchor, call: 0 };
    const { call } = this.chosen;
    const explanation = explanationOf(cell, call);
    const isOpen = this.frame.content.querySelector<HTMLDetailsElement>("#compare")?.open ?? this.comparisonOpen;
    this.comparisonOpen = isOpen;
    this.frame.show(cellView(cell, call, explanation, { ...this.actions(cell), later: true }));
    this.fillComparison(explanation, this.round);
  }

  /** Every other equation is solved for this cell too: that waits until the reader has what was asked for. */
  private fillComparison(explanation: Explanation | undefined, round: number): void {
    const place = this.frame.content.querySelector<HTMLElement>(`#${comparisonPlace}`);
    const finding = explanation?.finding;
    if (place === null || finding === undefined) return;
    setTimeout(() => {
      if (round !== this.round || !place.isConnected) return;
      const section = compareSection(finding.compare(), explanation?.units ?? "SI", this.comparisonOpen);
      if (section !== undefined) show(place, [section]);
    }, comparisonPause);
  }

  private fillWhatIf(cell: ReadCell, place: HTMLElement): void {
    const read = cell.calls[this.chosen.call];
    const explanation = explanationOf(cell, this.chosen.call);
    const one = read === undefined || explanation === undefined ? undefined : caseAt(read, explanation.caseNumber);
    if (one === undefined || explanation === undefined) return;
    new WhatIf(place, one, explanation.units, this.movedInput, (key) => {
      this.movedInput = key;
    });
  }

  private actions(cell: ReadCell): Actions {
    const read = cell.calls[this.chosen.call];
    const { frame } = this;
    return {
      choose: (call) => {
        this.chosen = { ...this.chosen, call };
        this.present(cell);
      },
      mend: (formula) => void this.write(cell, formula),
      copyReport: () => void this.copyReport(cell),
      whatIf: (place) => this.fillWhatIf(cell, place),
      ...(frame.has("new-formula")
        ? {
            compose: () => frame.open("new-formula"),
            edit: () =>
              read !== undefined && frame.open("new-formula", { edit: { formula: cell.formula, call: read.call, at: cell.anchor } }),
          }
        : {}),
    };
  }

  private async write(cell: ReadCell, formula: string): Promise<void> {
    try {
      await this.frame.host.write(cell.anchor, [[formula]]);
      this.soon();
    } catch (fault) {
      this.frame.say(words.trouble.notWritten(fault instanceof Error ? fault.message : String(fault)));
    }
  }

  private async copyReport(cell: ReadCell): Promise<void> {
    const read = cell.calls[this.chosen.call];
    const explanation = explanationOf(cell, this.chosen.call);
    if (read === undefined || explanation === undefined) return;
    const text = reportText(cell.selection.address, cell.formula, read, explanation);
    const says = this.frame.content.querySelector("#copy-says");
    try {
      await navigator.clipboard.writeText(text);
      if (says !== null) says.textContent = words.trace.copied;
    } catch {
      showForCopying(says, text);
    }
  }
}

/** Some hosts keep pages away from the clipboard: the text is then laid out, selected, ready to be copied by hand. */
function showForCopying(says: Element | null, text: string): void {
  if (says === null) return;
  says.textContent = words.trace.copyBelow;
  const area = document.createElement("textarea");
  area.readOnly = true;
  area.rows = 8;
  area.value = text;
  area.setAttribute("aria-label", words.trace.copyBelow);
  says.append(area);
  area.select();
}

export function explanationOf(cell: ReadCell, call: number): Explanation | undefined {
  const read = cell.calls[call];
  if (read === undefined || read.troubles.length > 0) return undefined;
  return explain(read.id, read.args, read.give, read.settings, cell.at);
}
