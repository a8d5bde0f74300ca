// A sheet in memory behind the pane's host interface: cells by address, FILM formulas answered by the cell functions, blocks spilled. Knows no other function.
import { answer } from "../../src/cells/answer.js";
import type { CellBlock } from "../../src/cells/cell.js";
import { CellError } from "../../src/cells/cell.js";
import { evaluate, isUnresolved } from "../../src/pane/arithmetic.js";
import { readSelection } from "../../src/pane/cell-reading.js";
import { isUnread, parseFormula } from "../../src/pane/formula.js";
import type { Area, FormulaCell, HostFacts, Place, Selection, SheetHost, Written } from "../../src/pane/host.js";
import { cellName, parseArea } from "../../src/pane/reference.js";

export type MemoryCells = Readonly<Record<string, string | number | boolean | CellError>>;

export class MemoryHost implements SheetHost {
  readonly sheets: Map<string, Map<string, string | number | boolean | CellError>>;
  readonly names: Readonly<Record<string, string>>;
  active: Place;
  readonly written: { at: Place; cells: readonly (readonly Written[])[] }[] = [];
  private readonly blocks = new Map<string, Promise<CellBlock>>();
  /** Blocks that are being worked out: a blank that they ask for cannot be theirs. */
  private readonly working = new Set<string>();
  private readonly listeners = new Set<() => void>();

  constructor(sheets: Readonly<Record<string, MemoryCells>>, names: Readonly<Record<string, string>> = {}) {
    this.sheets = new Map(Object.entries(sheets).map(([name, cells]) => [name, new Map(Object.entries(cells))]));
    this.names = names;
    this.active = { sheet: Object.keys(sheets)[0] ?? "", row: 0, column: 0 };
  }

  facts(): Promise<HostFacts> {
    return Promise.resolve({ name: "memory", theme: "light", decimalSeparator: ".", listSeparator: "," });
  }

  stand(sheet: string, address: string): this {
    const area = parseArea(address);
    if (area === undefined) throw new Error(`${address} is no cell`);
    this.active = { sheet, row: area.row, column: area.column };
    for (const listener of this.listeners) listener();
    return this;
  }

  async selection(): Promise<Selection> {
    const { sheet, row, column } = this.active;
    const spill = await this.spillAt(this.active);
    return {
      place: this.active,
      address: `${sheet}!${cellName(row, column)}`,
      formula: this.formulaAt(this.active),
      shown: String(await this.valueAt(this.active)),
      ...(spill === undefined ? {} : { spill }),
    };
  }

  private cellAt({ sheet, row, column }: Place): string | number | boolean | CellError | undefined {
    return this.sheets.get(sheet)?.get(cellName(row, column));
  }

  private formulaAt(place: Place): string {
    const cell = this.cellAt(place);
    return typeof cell === "string" && cell.startsWith("=") ? cell : "";
  }

  /** What a formula comes to, as a block. */
  block(place: Place): Promise<CellBlock> {
    const key = JSON.stringify(place);
    const known = this.blocks.get(key);
    if (known !== undefined) return known;
    this.working.add(key);
    const fresh = this.work(place).finally(() => this.working.delete(key));
    this.blocks.set(key, fresh);
    return fresh;
  }

  private async work(place: Place): Promise<CellBlock> {
    const formula = this.formulaAt(place);
    const tree = parseFormula(formula);
    if (isUnread(tree)) return [[new CellError("#NAME?")]];
    if (tree.kind === "call" && tree.film !== undefined) {
      const cell = await readSelection({ place, address: "", formula, shown: "" }, this);
      const read = cell.calls[0];
      if (read === undefined || read.troubles.length > 0) return [[new CellError("#NAME?", read?.troubles.join(" "))]];
      return answer(read.id, read.args, read.give, read.settings);
    }
    if (tree.kind !== "reference") return [[new CellError("#NAME?")]];
    const [block] = await this.read([{ ...tree.reference, sheet: tree.reference.sheet ?? place.sheet }]);
    const value = evaluate(tree, () => block);
    return isUnresolved(value) ? [[new CellError("#NAME?")]] : value;
  }

  private async spillAt(place: Place): Promise<Selection["spill"]> {
    for (const anchor of this.anchors(place.sheet)) {
      if (anchor.row > place.row || anchor.column > place.column || this.working.has(JSON.stringify(anchor))) continue;
      const block = await this.block(anchor);
      const [rowOffset, columnOffset] = [place.row - anchor.row, place.column - anchor.column];
      const isInside = rowOffset >= 0 && columnOffset >= 0 && rowOffset < block.length && columnOffset < (block[0]?.length ?? 0);
      if (!isInside || (rowOffset === 0 && columnOffset === 0)) continue;
      return { anchor, anchorAddress: cellName(anchor.row, anchor.column), formula: this.formulaAt(anchor), rowOffset, columnOffset };
    }
    return undefined;
  }

  private anchors(sheet: string): readonly Place[] {
    return [...(this.sheets.get(sheet) ?? [])].flatMap(([address, cell]) => {
      const area = parseArea(address);
      return area !== undefined && typeof cell === "string" && cell.startsWith("=") ? [{ sheet, row: area.row, column: area.column }] : [];
    });
  }

  async valueAt(place: Place): Promise<unknown> {
    if (this.formulaAt(place) !== "") return (await this.block(place))[0]?.[0];
    const own = this.cellAt(place);
    if (own !== undefined) return own;
    const spill = await this.spillAt(place);
    return spill === undefined ? "" : (await this.block(spill.anchor))[spill.rowOffset]?.[spill.columnOffset];
  }

  async read(areas: readonly Area[]): Promise<readonly (CellBlock | undefined)[]> {
    return Promise.all(areas.map((area) => this.readArea(area)));
  }

  private async readArea(area: Area): Promise<CellBlock | undefined> {
    if (!this.sheets.has(area.sheet)) return undefined;
    if (area.spilled === true) return this.block(area);
    const used = [...(this.sheets.get(area.sheet)?.keys() ?? [])].map((address) => parseArea(address));
    const rows = Number.isFinite(area.rows) ? area.rows : Math.max(1, ...used.map((one) => (one?.row ?? 0) + 1));
    const columns = Number.isFinite(area.columns) ? area.columns : Math.max(1, ...used.map((one) => (one?.column ?? 0) + 1));
    return Promise.all(
      Array.from({ length: rows }, (_, i) =>
        Promise.all(
          Array.from({ length: columns }, (__, j) => this.valueAt({ sheet: area.sheet, row: area.row + i, column: area.column + j })),
        ),
      ),
    );
  }

  async readName(name: string, at: Place): Promise<CellBlock | undefined> {
    const stands = this.names[name.toLowerCase()];
    const tree = stands === undefined ? undefined : parseFormula(stands);
    if (tree === undefined || isUnread(tree)) return undefined;
    if (tree.kind !== "reference") {
      const value = evaluate(tree, () => undefined);
      return isUnresolved(value) ? undefined : value;
    }
    return (await this.read([{ ...tree.reference, sheet: tree.reference.sheet ?? at.sheet }]))[0];
  }

  write(at: Place, cells: readonly (readonly Written[])[]): Promise<void> {
    this.written.push({ at, cells });
    cells.forEach((row, i) => {
      row.forEach((value, j) => this.sheets.get(at.sheet)?.set(cellName(at.row + i, at.column + j), value));
    });
    this.blocks.clear();
    for (const listener of this.listeners) listener();
    return Promise.resolve();
  }

  async formulas(holding: string): Promise<readonly FormulaCell[]> {
    const found: FormulaCell[] = [];
    for (const sheet of this.sheets.keys()) {
      for (const place of this.anchors(sheet)) {
        const formula = this.formulaAt(place);
        if (!formula.toLowerCase().includes(holding.toLowerCase())) continue;
        found.push({ place, address: `${sheet}!${cellName(place.row, place.column)}`, formula, shown: String(await this.valueAt(place)) });
      }
    }
    return found;
  }

  goTo(place: Place): Promise<void> {
    this.active = place;
    return Promise.resolve();
  }

  onSelectionChanged(listener: () => void): () => void {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  }

  onValuesChanged(listener: () => void): () => void {
    return this.onSelectionChanged(listener);
  }
}
