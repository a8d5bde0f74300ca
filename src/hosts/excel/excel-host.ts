/** Excel behind the pane's host interface. What an older Excel lacks is done without. */
import type { CellBlock } from "../../cells/cell.js";
import type { Area, FormulaCell, HostFacts, Place, Selection, SheetHost, Spill, Written } from "../../pane/host.js";
import { cellName, sheetPrefix } from "../../pane/reference.js";
import { words } from "../../pane/words.js";
import type { CellRange, Events, ExcelApi, ExcelContext, OfficeApi, Worksheet } from "./office-api.js";

/** Cells that one request may fetch when a whole workbook is read: larger sheets are fetched in strips of rows. */
const cellsAtOnce = 50_000;

export class ExcelHost implements SheetHost {
  constructor(
    private readonly office: OfficeApi,
    private readonly excel: ExcelApi,
  ) {}

  private has(version: string): boolean {
    return this.office.context.requirements.isSetSupported("ExcelApi", version);
  }

  async facts(): Promise<HostFacts> {
    const theme = themeOf(this.office.context.officeTheme);
    const decimalSeparator = this.has("1.11") ? await this.decimalSeparator() : ".";
    return { name: "Excel", theme, decimalSeparator, listSeparator: decimalSeparator === "," ? ";" : "," };
  }

  private decimalSeparator(): Promise<string> {
    return this.excel.run(async (context) => {
      const { application } = context.workbook;
      application.load("decimalSeparator");
      await context.sync();
      return application.decimalSeparator;
    });
  }

  selection(): Promise<Selection | undefined> {
    if (!this.has("1.7")) return Promise.reject(new Error(words.excel.tooOld));
    return this.excel.run(async (context) => {
      const cell = context.workbook.getActiveCell();
      cell.load("address,rowIndex,columnIndex,formulas,text");
      cell.worksheet.load("name");
      const parent = this.has("1.12") ? cell.getSpillParentOrNullObject() : undefined;
      parent?.load("address,rowIndex,columnIndex,formulas");
      await context.sync();
      const place = { sheet: cell.worksheet.name, row: cell.rowIndex, column: cell.columnIndex };
      const area = await selectedArea(context, place.sheet);
      const spill = parent === undefined || parent.isNullObject ? undefined : spillOf(parent, place);
      return {
        place,
        address: cell.address,
        ...(area === undefined ? {} : { area }),
        formula: formulaIn(cell.formulas[0]?.[0]),
        shown: cell.text[0]?.[0] ?? "",
        ...(spill === undefined ? {} : { spill }),
      };
    });
  }

  onSelectionChanged(listener: () => void): () => void {
    return this.has("1.2") ? this.listen((context) => [context.workbook.onSelectionChanged], listener) : (): void => undefined;
  }

  onValuesChanged(listener: () => void): () => void {
    return this.listen(
      ({ workbook }) => [
        ...(this.has("1.8") ? [workbook.worksheets.onCalculated] : []),
        ...(this.has("1.9") ? [workbook.worksheets.onChanged] : []),
      ],
      listener,
    );
  }

  /** Registering takes a round trip: who stops listening before it is done still gets rid of it. */
  private listen(events: (context: ExcelContext) => readonly Events[], listener: () => void): () => void {
    let stopped = false;
    const registered = this.excel.run(async (context) => {
      const registrations = events(context).map((one) =>
        one.add(() => {
          if (!stopped) listener();
          return Promise.resolve();
        }),
      );
      await context.sync();
      return { context, registrations };
    });
    registered.catch(() => undefined);
    return () => {
      stopped = true;
      void registered
        .then(({ context, registrations }) => {
          for (const one of registrations) one.remove();
          return context.sync();
        })
        .catch(() => undefined);
    };
  }

  read(areas: readonly Area[]): Promise<readonly (CellBlock | undefined)[]> {
    return this.excel.run(async (context) => {
      const sheets = areas.map((area) => context.workbook.worksheets.getItemOrNullObject(area.sheet));
      for (const sheet of sheets) sheet.load("name");
      await context.sync();
      const used = areas.map((area, i) => this.boundsFor(area, sheets[i] as Worksheet));
      await context.sync();
      const ranges = areas.map((area, i) => rangeFor(area, sheets[i] as Worksheet, used[i]));
      for (const range of ranges) range?.load("values,valueTypes");
      await context.sync();
      return ranges.map((range) => (range === undefined ? undefined : blockOf(range)));
    });
  }

  /** What must be known before a range can be asked for: how far a whole column is used, how far a block spills. */
  private boundsFor(area: Area, sheet: Worksheet): CellRange | undefined {
    if (sheet.isNullObject) return undefined;
    const isOpen = !Number.isFinite(area.rows) || !Number.isFinite(area.columns);
    const range = isOpen
      ? sheet.getUsedRangeOrNullObject(true)
      : area.spilled === true && this.has("1.12")
        ? sheet.getRangeByIndexes(area.row, area.column, 1, 1).getSpillingToRangeOrNullObject()
        : undefined;
    range?.load("rowIndex,columnIndex,rowCount,columnCount");
    return range;
  }

  readName(name: string, at: Place): Promise<CellBlock | undefined> {
    const column = tableColumn.exec(name)?.groups;
    return column === undefined
      ? this.readDefinedName(name, at)
      : this.readTableColumn(column.table as string, (column.column ?? column.inner) as string, column.row !== undefined, at);
  }

  private readDefinedName(name: string, at: Place): Promise<CellBlock | undefined> {
    if (!this.has("1.4")) return Promise.resolve(undefined);
    const [sheet, bare] = name.includes("!")
      ? [unquoted(name.slice(0, name.lastIndexOf("!"))), name.slice(name.lastIndexOf("!") + 1)]
      : [at.sheet, name];
    return this.excel.run(async (context) => {
      const { workbook } = context;
      const worksheet = workbook.worksheets.getItemOrNullObject(sheet);
      worksheet.load("name");
      const wide = workbook.names.getItemOrNullObject(bare);
      wide.load("value");
      await context.sync();
      const local = worksheet.isNullObject ? undefined : worksheet.names.getItemOrNullObject(bare);
      local?.load("value");
      await context.sync();
      const item = local !== undefined && !local.isNullObject ? local : wide;
      if (item.isNullObject) return undefined;
      const range = item.getRangeOrNullObject();
      range.load("values,valueTypes");
      await context.sync();
      return range.isNullObject ? constantOf(item.value) : blockOf(range);
    });
  }

  private readTableColumn(table: string, column: string, thisRow: boolean, at: Place): Promise<CellBlock | undefined> {
    if (!this.has("1.4")) return Promise.resolve(undefined);
    return this.excel.run(async (context) => {
      const found = context.workbook.tables.getItemOrNullObject(table);
      found.load("name");
      await context.sync();
      if (found.isNullObject) return undefined;
      const own = found.columns.getItemOrNullObject(column.replace(/'(.)/g, "$1"));
      own.load("name");
      await context.sync();
      if (own.isNullObject) return undefined;
      const range = own.getDataBodyRange();
      range.load("values,valueTypes,rowIndex,rowCount");
      await context.sync();
      const block = blockOf(range);
      return thisRow ? block.slice(at.row - range.rowIndex, at.row - range.rowIndex + 1) : block;
    });
  }

  write(at: Place, cells: readonly (readonly Written[])[]): Promise<void> {
    return this.excel.run(async (context) => {
      const sheet = context.workbook.worksheets.getItemOrNullObject(at.sheet);
      sheet.load("name");
      await context.sync();
      if (sheet.isNullObject) throw new Error(`no sheet “${at.sheet}”`);
      sheet.getRangeByIndexes(at.row, at.column, cells.length, cells[0]?.length ?? 1).formulas = cells;
      await context.sync();
    });
  }

  formulas(holding: string): Promise<readonly FormulaCell[]> {
    return this.excel.run(async (context) => {
      const { worksheets } = context.workbook;
      worksheets.load("items/name");
      await context.sync();
      const found: FormulaCell[] = [];
      for (const sheet of worksheets.items) found.push(...(await formulasOf(sheet, holding.toLowerCase(), context)));
      return found;
    });
  }

  goTo(place: Place): Promise<void> {
    return this.excel.run(async (context) => {
      const sheet = context.workbook.worksheets.getItemOrNullObject(place.sheet);
      sheet.load("name");
      await context.sync();
      if (sheet.isNullObject) return;
      sheet.activate();
      sheet.getRangeByIndexes(place.row, place.column, 1, 1).select();
      await context.sync();
    });
  }
}

/** Several blocks at once are no range that one argument could take: the host then refuses to name one. */
async function selectedArea(context: ExcelContext, sheet: string): Promise<Area | undefined> {
  try {
    const range = context.workbook.getSelectedRange();
    range.load("rowIndex,columnIndex,rowCount,columnCount");
    await context.sync();
    return { sheet, row: range.rowIndex, column: range.columnIndex, rows: range.rowCount, columns: range.columnCount };
  } catch {
    return undefined;
  }
}

/** `Table1[Surface]`, `Table1[@Surface]`, `Table1[@[Surface °C]]`, `Table1[[#This Row],[Surface °C]]`. */
const tableColumn =
  /^(?<table>[\p{L}_\\][\p{L}\p{N}_.\\]*)\[(?:(?<row>@|\[#This Row\],)?\s*(?:\[(?<inner>[^\][#@]+)\]|(?<column>[^\][#@,]+)))\]$/u;

function spillOf(parent: CellRange, place: Place): Spill | undefined {
  const rowOffset = place.row - parent.rowIndex;
  const columnOffset = place.column - parent.columnIndex;
  if (rowOffset === 0 && columnOffset === 0) return undefined;
  return {
    anchor: { sheet: place.sheet, row: parent.rowIndex, column: parent.columnIndex },
    anchorAddress: parent.address,
    formula: formulaIn(parent.formulas[0]?.[0]),
    rowOffset,
    columnOffset,
  };
}

/** Where a cell holds no formula, the host gives its value in the place of one. */
function formulaIn(given: unknown): string {
  return typeof given === "string" && given.startsWith("=") ? given : "";
}

function rangeFor(area: Area, sheet: Worksheet, known: CellRange | undefined): CellRange | undefined {
  if (sheet.isNullObject) return undefined;
  const { row, column } = area;
  if (area.spilled === true) {
    const size = known === undefined || known.isNullObject ? { rowCount: 1, columnCount: 1 } : known;
    return sheet.getRangeByIndexes(row, column, size.rowCount, size.columnCount);
  }
  const isUsed = known !== undefined && !known.isNullObject;
  const bottom = isUsed ? known.rowIndex + known.rowCount : row + 1;
  const right = isUsed ? known.columnIndex + known.columnCount : column + 1;
  const rows = Number.isFinite(area.rows) ? area.rows : Math.max(1, bottom - row);
  const columns = Number.isFinite(area.columns) ? area.columns : Math.max(1, right - column);
  return sheet.getRangeByIndexes(row, column, rows, columns);
}

function blockOf(range: CellRange): CellBlock {
  return range.values.map((row, i) =>
    row.map((value, j) => (range.valueTypes[i]?.[j] === "Error" ? { code: String(value), message: "" } : value)),
  );
}

/** A name may stand for a number or a text of its own: the host then gives the value itself. */
function constantOf(value: unknown): CellBlock | undefined {
  return typeof value === "number" || typeof value === "boolean" || (typeof value === "string" && !value.startsWith("="))
    ? [[value]]
    : undefined;
}

function unquoted(sheet: string): string {
  return sheet.startsWith("'") ? sheet.slice(1, -1).replace(/''/g, "'") : sheet;
}

async function formulasOf(sheet: Worksheet, wanted: string, context: ExcelContext): Promise<readonly FormulaCell[]> {
  const used = sheet.getUsedRangeOrNullObject(true);
  used.load("rowIndex,columnIndex,rowCount,columnCount");
  await context.sync();
  if (used.isNullObject) return [];
  const found: FormulaCell[] = [];
  const rowsAtOnce = Math.max(1, Math.floor(cellsAtOnce / used.columnCount));
  for (let from = 0; from < used.rowCount; from += rowsAtOnce) {
    const strip = sheet.getRangeByIndexes(
      used.rowIndex + from,
      used.columnIndex,
      Math.min(rowsAtOnce, used.rowCount - from),
      used.columnCount,
    );
    strip.load("rowIndex,columnIndex,formulas,text");
    await context.sync();
    collect(strip, sheet.name, wanted, found);
  }
  return found;
}

function collect(strip: CellRange, sheet: string, wanted: string, found: FormulaCell[]): void {
  strip.formulas.forEach((row, i) => {
    row.forEach((given, j) => {
      const formula = formulaIn(given);
      if (formula === "" || !formula.toLowerCase().includes(wanted)) return;
      const place = { sheet, row: strip.rowIndex + i, column: strip.columnIndex + j };
      found.push({ place, address: addressOf(place), formula, shown: strip.text[i]?.[j] ?? "" });
    });
  });
}

function addressOf(place: Place): string {
  return `${sheetPrefix(place.sheet)}${cellName(place.row, place.column)}`;
}

function themeOf(theme: OfficeApi["context"]["officeTheme"]): HostFacts["theme"] {
  if (theme?.isDarkTheme !== undefined) return theme.isDarkTheme ? "dark" : "light";
  const found = /^#?([0-9a-f]{2})([0-9a-f]{2})([0-9a-f]{2})$/i.exec(theme?.bodyBackgroundColor ?? "");
  if (found === null) return "system";
  const [red = 0, green = 0, blue = 0] = found.slice(1).map((pair) => Number.parseInt(pair, 16));
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue < 128 ? "dark" : "light";
}
