/** "Whole workbook": every FILM result with its verdict, worst first; boundary conditions to take away. */
import { toSI } from "../../quantities/conversion.js";
import { defaultUnit } from "../../quantities/units.js";
import { askView } from "../compose/view.js";
import type { Area, Written } from "../host.js";
import { el } from "../node.js";
import type { Frame, Page } from "../page.js";
import { cellName, sheetPrefix } from "../reference.js";
import { show } from "../render.js";
import type { VerdictKind } from "../this-cell/sections.js";
import { words } from "../words.js";
import { boundaryTable, csvOf, type Span, temperatureRows } from "./boundaries.js";
import { type Scanned, scanWorkbook } from "./scan.js";
import { type WorkbookActions, workbookBody, workbookHead, type WorkbookState } from "./view.js";

const listed = 100;
const drawPause = 150;

export const workbookPage: Page = {
  id: "workbook",
  title: words.pages.workbook,
  begin: (frame) => {
    const overseer = new Overseer(frame);
    return () => overseer.end();
  },
};

class Overseer {
  private state: WorkbookState = {
    rows: [],
    progress: { cells: 0, of: 0 },
    wasCancelled: false,
    hidden: new Set(),
    search: "",
    most: listed,
    system: "SI",
    span: { from: "-20", to: "100", count: "13" },
  };
  private stop = new AbortController();
  private readonly body: HTMLElement;
  private timer: ReturnType<typeof setTimeout> | undefined;
  private drawn = 0;

  constructor(private readonly frame: Frame) {
    frame.show([...workbookHead((search) => this.change({ search, most: listed })), el("div", { id: "workbook-body" })]);
    this.body = frame.content.querySelector("#workbook-body") as HTMLElement;
    void this.scan();
  }

  end(): void {
    clearTimeout(this.timer);
    this.stop.abort();
  }

  private async scan(): Promise<void> {
    this.stop.abort();
    this.stop = new AbortController();
    const { signal } = this.stop;
    this.change({ rows: [], progress: { cells: 0, of: 0 }, wasCancelled: false, most: listed });
    try {
      const { rows, isWhole } = await scanWorkbook(this.frame.host, signal, (progress, found) => {
        if (!signal.aborted) this.advance({ progress, rows: [...found] });
      });
      if (signal === this.stop.signal) this.change({ rows, progress: undefined, wasCancelled: !isWhole });
    } catch (fault) {
      if (signal !== this.stop.signal) return;
      this.change({ progress: undefined, wasCancelled: true });
      this.frame.say(words.fault(fault instanceof Error ? fault.message : String(fault)));
    }
  }

  /** While reading, the list is drawn now and then: drawing it for every cell would cost more than reading it. */
  private advance(change: Partial<WorkbookState>): void {
    this.state = { ...this.state, ...change };
    if (performance.now() - this.drawn > drawPause) this.draw();
  }

  private change(change: Partial<WorkbookState>): void {
    this.state = { ...this.state, ...change };
    this.draw();
  }

  private draw(): void {
    this.drawn = performance.now();
    show(this.body, workbookBody(this.state, this.actions()));
  }

  private actions(): WorkbookActions {
    return {
      again: () => void this.scan(),
      cancel: () => this.stop.abort(),
      toggle: (kind) => this.toggle(kind),
      more: () => this.change({ most: this.state.most + listed }),
      goTo: (row) => void this.goTo(row),
      system: (system) => this.change({ system }),
      span: (change) => {
        this.state = { ...this.state, span: { ...this.state.span, ...change } };
      },
      writeBoundaries: () => void this.writeBoundaries(false),
      saveBoundaries: () => save("boundary-conditions.csv", csvOf(boundaryTable(this.state.rows, this.state.system))),
      saveTables: () => void this.saveTables(),
    };
  }

  private toggle(kind: VerdictKind): void {
    const hidden = new Set(this.state.hidden);
    if (!hidden.delete(kind)) hidden.add(kind);
    this.change({ hidden, most: listed });
  }

  private async goTo(row: Scanned): Promise<void> {
    await this.frame.host.goTo(row.place);
    this.frame.say(words.workbook.wentTo(row.address));
  }

  /** From the selected cell on, over blank cells unless it is told otherwise. */
  private async writeBoundaries(over: boolean): Promise<void> {
    const { host } = this.frame;
    const selection = await host.selection();
    if (selection === undefined) return this.frame.say(words.compose.noSelection);
    const cells: readonly (readonly Written[])[] = boundaryTable(this.state.rows, this.state.system);
    const area: Area = { ...selection.place, rows: cells.length, columns: cells[0]?.length ?? 1 };
    const ask = this.body.querySelector<HTMLElement>("#boundaries-ask");
    const [block] = over ? [undefined] : await host.read([area]);
    if (block?.some((row) => row.some((cell) => cell !== "" && cell !== null))) {
      const end = cellName(area.row + area.rows - 1, area.column + area.columns - 1);
      const name = `${sheetPrefix(area.sheet)}${cellName(area.row, area.column)}:${end}`;
      if (ask !== null)
        show(
          ask,
          askView(words.compose.taken(name), () => void this.writeBoundaries(true)),
        );
      return;
    }
    ask?.replaceChildren();
    try {
      await host.write(selection.place, cells);
      this.frame.say(words.compose.inserted(selection.address));
    } catch (fault) {
      this.frame.say(words.trouble.notWritten(fault instanceof Error ? fault.message : String(fault)));
    }
  }

  private async saveTables(): Promise<void> {
    const span = this.spanInKelvin();
    if (span === undefined) return this.frame.say(words.workbook.noSpan);
    const rows: (readonly Written[])[] = [];
    let until = performance.now() + 12;
    for (const row of temperatureRows(this.state.rows, span, this.state.system)) {
      rows.push(row);
      if (performance.now() < until) continue;
      await new Promise((resume) => setTimeout(resume, 0));
      until = performance.now() + 12;
    }
    save("h-against-temperature.csv", csvOf(rows));
  }

  private spanInKelvin(): Span | undefined {
    const { span, system } = this.state;
    const unit = defaultUnit("temperature", system);
    const [from, to, count] = [span.from, span.to, span.count].map((text) =>
      text.trim() === "" ? Number.NaN : Number(text.replace(",", ".")),
    );
    if (from === undefined || to === undefined || count === undefined) return undefined;
    const ends = { from: toSI(from, unit), to: toSI(to, unit), count: Math.round(count) };
    const isGood = ends.from > 0 && ends.to > ends.from && ends.count >= 2 && ends.count <= 500;
    return isGood ? ends : undefined;
  }
}

/** Hands a file to the browser; nothing leaves the machine. */
function save(name: string, text: string): void {
  const address = URL.createObjectURL(new Blob([text], { type: "text/csv;charset=utf-8" }));
  const link = document.createElement("a");
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
