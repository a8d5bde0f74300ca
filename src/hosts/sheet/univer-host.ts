/** The embedded sheet behind the pane's host interface. */
import { FormulaDataModel } from "@univerjs/preset-sheets-core";
import type { FUniver, FWorkbook, FWorksheet, Univer } from "./univer-types.js";
import type { CellBlock } from "../../cells/cell.js";
import { evaluate, isUnresolved } from "../../pane/arithmetic.js";
import { isUnread, parseFormula } from "../../pane/formula.js";
import type { Area, FormulaCell, HostFacts, Place, Selection, SheetHost, Spill, Written } from "../../pane/host.js";
import { cellName, sheetPrefix } from "../../pane/reference.js";

/** Where a spilled block lies; all four ends are in it. */
interface SpillRange {
  readonly startRow: number;
  readonly endRow: number;
  readonly startColumn: number;
  readonly endColumn: number;
}

const errorCodes: ReadonlySet<string> = new Set(
  "#DIV/0! #NAME? #VALUE! #NUM! #N/A #CYCLE! #REF! #SPILL! #CALC! #ERROR! #GETTING_DATA #NULL!".split(" "),
);
const evaluationTime = 2000;
const selecting: ReadonlySet<string> = new Set([
  "sheet.operation.set-selections",
  "sheet.operation.set-worksheet-active",
  "sheet.mutation.set-worksheet-name",
]);

export class UniverHost implements SheetHost {
  private readonly themeListeners = new Set<() => void>();

  constructor(
    private readonly univer: Univer,
    private readonly api: FUniver,
    private theme: HostFacts["theme"] = "system",
  ) {}

  private get book(): FWorkbook | undefined {
    return this.api.getActiveWorkbook() ?? undefined;
  }

  facts(): Promise<HostFacts> {
    return Promise.resolve({ name: "Standalone sheet", theme: this.theme, decimalSeparator: ".", listSeparator: "," });
  }

  setTheme(theme: HostFacts["theme"]): void {
    this.theme = theme;
    for (const listener of this.themeListeners) listener();
  }

  onThemeChanged(listener: () => void): () => void {
    this.themeListeners.add(listener);
    return () => this.themeListeners.delete(listener);
  }

  selection(): Promise<Selection | undefined> {
    const sheet = this.book?.getActiveSheet();
    const cell = sheet?.getActiveCell();
    if (sheet === undefined || cell === null || cell === undefined) return Promise.resolve(undefined);
    const place: Place = { sheet: sheet.getSheetName(), row: cell.getRow(), column: cell.getColumn() };
    const spill = this.spillAt(sheet, place);
    const range = sheet.getActiveRange();
    const area =
      range === null
        ? undefined
        : { sheet: place.sheet, row: range.getRow(), column: range.getColumn(), rows: range.getHeight(), columns: range.getWidth() };
    return Promise.resolve({
      place,
      address: addressOf(place),
      ...(area === undefined ? {} : { area }),
      formula: this.formulaAt(sheet, place.row, place.column),
      shown: String(this.valueAt(sheet, place.row, place.column) ?? ""),
      ...(spill === undefined ? {} : { spill }),
    });
  }

  private spillAt(sheet: FWorksheet, place: Place): Spill | undefined {
    for (const [row, column, range] of this.spills(sheet)) {
      const inside =
        place.row >= range.startRow && place.row <= range.endRow && place.column >= range.startColumn && place.column <= range.endColumn;
      if (!inside || (place.row === row && place.column === column)) continue;
      const anchor = { sheet: place.sheet, row, column };
      return {
        anchor,
        anchorAddress: addressOf(anchor),
        formula: this.formulaAt(sheet, row, column),
        rowOffset: place.row - row,
        columnOffset: place.column - column,
      };
    }
    return undefined;
  }

  private *spills(sheet: FWorksheet): Generator<readonly [row: number, column: number, range: SpillRange]> {
    const ranges = this.model.getArrayFormulaRange()[this.book?.getId() ?? ""]?.[sheet.getSheetId()];
    if (ranges === undefined || ranges === null) return;
    for (const [row, columns] of Object.entries(ranges)) {
      for (const [column, range] of Object.entries(columns as Record<string, SpillRange | undefined>)) {
        if (range !== undefined && range !== null) yield [Number(row), Number(column), range];
      }
    }
  }

  private get model(): FormulaDataModel {
    return this.univer.__getInjector().get(FormulaDataModel);
  }

  private formulaAt(sheet: FWorksheet, row: number, column: number): string {
    return this.model.getFormulaStringByCell(row, column, sheet.getSheetId(), this.book?.getId() ?? "") ?? "";
  }

  private valueAt(sheet: FWorksheet, row: number, column: number): unknown {
    const own = sheet.getSheet().getCellRaw(row, column)?.v;
    if (own !== undefined && own !== null && own !== "") return own;
    const spilled = this.model.getArrayFormulaCellData()[this.book?.getId() ?? ""]?.[sheet.getSheetId()];
    return (
      (spilled as Record<number, Record<number, { v?: unknown } | undefined> | undefined> | undefined)?.[row]?.[column]?.v ?? own ?? ""
    );
  }

  /** The sheet's own selection events miss the first move by the name box: the commands behind them do not. */
  onSelectionChanged(listener: () => void): () => void {
    const executed = this.api.addEvent(this.api.Event.CommandExecuted, ({ id }) => {
      if (selecting.has(id)) listener();
    });
    return () => executed.dispose();
  }

  onValuesChanged(listener: () => void): () => void {
    const changed = this.api.addEvent(this.api.Event.SheetValueChanged, listener);
    const calculated = this.api.getFormula().calculationResultApplied(listener);
    return () => {
      changed.dispose();
      calculated.dispose();
    };
  }

  read(areas: readonly Area[]): Promise<readonly (CellBlock | undefined)[]> {
    return Promise.resolve(areas.map((area) => this.readArea(area)));
  }

  private readArea(area: Area): CellBlock | undefined {
    const sheet = this.sheetNamed(area.sheet);
    if (sheet === undefined) return undefined;
    const { rows, columns } = this.cut(sheet, area);
    return Array.from({ length: rows }, (_, row) =>
      Array.from({ length: columns }, (__, column) => cellOf(this.valueAt(sheet, area.row + row, area.column + column))),
    );
  }

  private sheetNamed(name: string): FWorksheet | undefined {
    const wanted = name.toLowerCase();
    return this.book?.getSheets().find((one) => one.getSheetName().toLowerCase() === wanted);
  }

  /** Whole columns and rows end where the last value stands; a spilled block is as large as it is. */
  private cut(sheet: FWorksheet, area: Area): { readonly rows: number; readonly columns: number } {
    if (area.spilled === true) {
      const own = [...this.spills(sheet)].find(([row, column]) => row === area.row && column === area.column)?.[2];
      return own === undefined
        ? { rows: 1, columns: 1 }
        : { rows: own.endRow - own.startRow + 1, columns: own.endColumn - own.startColumn + 1 };
    }
    if (Number.isFinite(area.rows) && Number.isFinite(area.columns)) return area;
    let [lastRow, lastColumn] = [sheet.getLastRow(), sheet.getLastColumn()];
    for (const [, , range] of this.spills(sheet)) {
      lastRow = Math.max(lastRow, range.endRow);
      lastColumn = Math.max(lastColumn, range.endColumn);
    }
    return {
      rows: Number.isFinite(area.rows) ? area.rows : Math.max(1, lastRow - area.row + 1),
      columns: Number.isFinite(area.columns) ? area.columns : Math.max(1, lastColumn - area.column + 1),
    };
  }

  async readName(name: string, at: Place): Promise<CellBlock | undefined> {
    const text = this.book?.getDefinedName(name)?.getFormulaOrRefString();
    const tree = text === undefined ? undefined : parseFormula(text);
    if (tree === undefined || isUnread(tree)) return undefined;
    const value = evaluate(tree, (one) => {
      if (one.kind !== "reference" || one.reference.book !== undefined) return undefined;
      return this.readArea({ ...one.reference, sheet: one.reference.sheet ?? at.sheet });
    });
    return isUnresolved(value) ? this.evaluate(text as string, at) : value;
  }

  async evaluate(expression: string, at: Place): Promise<CellBlock | undefined> {
    const unit = this.book?.getId();
    const sheet = this.sheetNamed(at.sheet)?.getSheetId();
    if (unit === undefined || sheet === undefined) return undefined;
    const formula = expression.startsWith("=") ? expression : `=${expression}`;
    const found = await this.api
      .getFormula()
      .executeFormulas({ [unit]: { [sheet]: { [at.row]: { [at.column]: [formula] } } } }, evaluationTime)
      .catch(() => undefined);
    const value = found?.[unit]?.[sheet]?.[at.row]?.[at.column]?.[0]?.value;
    if (value === undefined || value === null) return undefined;
    return Array.isArray(value) ? value.map((row) => row.map(cellOf)) : [[cellOf(value)]];
  }

  write(at: Place, cells: readonly (readonly Written[])[]): Promise<void> {
    const sheet = this.sheetNamed(at.sheet);
    const columns = cells[0]?.length ?? 0;
    if (sheet === undefined || columns === 0) return Promise.reject(new Error(`no sheet “${at.sheet}”`));
    const data = cells.map((row) =>
      row.map((one) =>
        typeof one === "string" && one.startsWith("=") ? { f: one, v: null, p: null } : { v: one, f: null, si: null, p: null },
      ),
    );
    sheet.getRange(at.row, at.column, cells.length, columns).setValues(data);
    return Promise.resolve();
  }

  formulas(holding: string): Promise<readonly FormulaCell[]> {
    const wanted = holding.toLowerCase();
    const found: FormulaCell[] = [];
    for (const sheet of this.book?.getSheets() ?? []) {
      const name = sheet.getSheetName();
      sheet
        .getSheet()
        .getCellMatrix()
        .forValue((row, column, cell) => {
          if (cell === null || cell === undefined || (!cell.f && !cell.si)) return;
          const formula = this.formulaAt(sheet, row, column);
          if (!formula.toLowerCase().includes(wanted)) return;
          const place = { sheet: name, row, column };
          found.push({ place, address: addressOf(place), formula, shown: String(this.valueAt(sheet, row, column) ?? "") });
        });
    }
    return Promise.resolve(found);
  }

  goTo(place: Place): Promise<void> {
    const sheet = this.sheetNamed(place.sheet);
    if (sheet === undefined || this.book === undefined) return Promise.resolve();
    this.book.setActiveSheet(sheet);
    sheet.getRange(place.row, place.column).activate();
    return Promise.resolve();
  }
}

function addressOf(place: Place): string {
  return `${sheetPrefix(place.sheet)}${cellName(place.row, place.column)}`;
}

function cellOf(value: unknown): unknown {
  if (value === null || value === undefined) return "";
  return typeof value === "string" && errorCodes.has(value) ? { code: value, message: "" } : value;
}
