// A stand-in for the parts of Office.js that the host uses, after its documentation: properties may be read only after load() and sync(), objects that do not
// exist are null objects, events are registered on sync.
import type { ExcelApi, OfficeApi } from "../../src/hosts/excel/office-api.js";
import { parseArea } from "../../src/pane/reference.js";

export interface StandInCell {
  readonly formula?: string;
  readonly value: number | string | boolean;
  readonly isError?: boolean;
  readonly text?: string;
}

export interface StandInBook {
  readonly sheets: Record<string, Record<string, StandInCell>>;
  active: { sheet: string; cell: string };
  /** The selected block around the active cell; "several" for a selection of several blocks. */
  selected?: string;
  readonly names?: Readonly<Record<string, string | number>>;
  readonly tables?: Readonly<Record<string, Readonly<Record<string, string>>>>;
  /** Areas that a formula spills into, by its address "Sheet!A1". */
  readonly spills?: Readonly<Record<string, string>>;
  readonly decimalSeparator?: string;
}

interface Box {
  readonly sheet: string;
  readonly row: number;
  readonly column: number;
  readonly rows: number;
  readonly columns: number;
}

export class StandIn {
  syncs = 0;
  readonly listeners: Record<"selection" | "calculated" | "changed", Set<() => Promise<void>>> = {
    selection: new Set(),
    calculated: new Set(),
    changed: new Set(),
  };

  constructor(
    readonly book: StandInBook,
    readonly version = "1.20",
    private readonly theme: OfficeApi["context"]["officeTheme"] = undefined,
  ) {}

  get office(): OfficeApi {
    const known = this.version.split(".").map(Number);
    return {
      onReady: () => Promise.resolve({ host: "Excel" }),
      context: {
        requirements: {
          isSetSupported: (_, version) => {
            const asked = version.split(".").map(Number);
            return (known[0] as number) > (asked[0] as number) || (known[1] as number) >= (asked[1] as number);
          },
        },
        ...(this.theme === undefined ? {} : { officeTheme: this.theme }),
      },
    };
  }

  get excel(): ExcelApi {
    return { run: (act) => act(this.context() as never) };
  }

  fire(event: "selection" | "calculated" | "changed"): void {
    for (const listener of this.listeners[event]) void listener();
  }

  private pending: (() => void)[] = [];

  private context(): unknown {
    const context: { sync(): Promise<void>; workbook: object } = {
      sync: () => {
        this.syncs++;
        const waiting = this.pending;
        this.pending = [];
        for (const one of waiting) one();
        return Promise.resolve();
      },
      workbook: this.workbook(() => context),
    };
    return context;
  }

  /** An object whose properties are there only after load() and sync(). */
  private proxy(values: Readonly<Record<string, () => unknown>>, extra: object, isNull = false): object {
    const ready = new Set<string>();
    const target: Record<string, unknown> = {
      load: (names: string) => {
        this.pending.push(() => {
          ready.add("isNullObject");
          if (!isNull)
            for (const name of names.split(","))
              ready.add(name.trim().split("/").at(-1) as string).add(name.trim().split("/")[0] as string);
        });
      },
    };
    Object.defineProperties(target, Object.getOwnPropertyDescriptors(extra));
    for (const [name, read] of Object.entries({ ...values, isNullObject: () => isNull })) {
      const setter = Object.getOwnPropertyDescriptor(extra, name)?.set;
      Object.defineProperty(target, name, {
        configurable: true,
        set: setter,
        get: () => {
          if (!ready.has(name))
            throw new Error(`The property '${name}' is not available. Before reading the property's value, call the load method.`);
          return read();
        },
      });
    }
    return target;
  }

  private nothing(): object {
    return this.proxy({}, {}, true);
  }

  private workbook(context: () => unknown): object {
    const { book } = this;
    const events = (name: "selection" | "calculated" | "changed") => ({
      add: (listener: () => Promise<void>) => {
        this.pending.push(() => this.listeners[name].add(listener));
        return { context: context(), remove: () => this.pending.push(() => this.listeners[name].delete(listener)) };
      },
    });
    return {
      getActiveCell: () => this.range(this.boxOf(`${book.active.sheet}!${book.active.cell}`)),
      getSelectedRange: () => {
        if (book.selected === "several") throw new Error("InvalidSelection: The current selection is invalid for this operation.");
        return this.range(this.boxOf(`${book.active.sheet}!${book.selected ?? book.active.cell}`));
      },
      application: this.proxy({ decimalSeparator: () => book.decimalSeparator ?? "." }, {}),
      names: { getItemOrNullObject: (name: string) => this.named(name) },
      tables: { getItemOrNullObject: (name: string) => this.table(name) },
      onSelectionChanged: events("selection"),
      worksheets: this.proxy(
        { items: () => Object.keys(book.sheets).map((name) => this.loadedSheet(name)) },
        {
          getItemOrNullObject: (name: string) =>
            this.sheetName(name) === undefined ? this.nothing() : this.sheet(this.sheetName(name) as string),
          onCalculated: events("calculated"),
          onChanged: events("changed"),
        },
      ),
    };
  }

  private sheetName(name: string): string | undefined {
    return Object.keys(this.book.sheets).find((one) => one.toLowerCase() === name.toLowerCase());
  }

  private loadedSheet(name: string): object {
    const sheet = this.sheet(name) as { load(names: string): void };
    sheet.load("name");
    this.pending.pop()?.();
    return sheet;
  }

  private sheet(name: string): object {
    return this.proxy(
      { name: () => name },
      {
        getRangeByIndexes: (row: number, column: number, rows: number, columns: number) =>
          this.range({ sheet: name, row, column, rows, columns }),
        getUsedRangeOrNullObject: () => this.used(name),
        names: { getItemOrNullObject: () => this.nothing() },
        activate: () => {
          this.pending.push(() => {
            this.book.active = { ...this.book.active, sheet: name };
          });
        },
      },
    );
  }

  private used(name: string): object {
    const places = Object.keys(this.book.sheets[name] ?? {}).map((cell) => parseArea(cell));
    if (places.length === 0) return this.nothing();
    const rows = places.map((one) => one?.row ?? 0);
    const columns = places.map((one) => one?.column ?? 0);
    const [row, column] = [Math.min(...rows), Math.min(...columns)];
    return this.range({ sheet: name, row, column, rows: Math.max(...rows) - row + 1, columns: Math.max(...columns) - column + 1 });
  }

  private boxOf(text: string): Box {
    const cut = text.lastIndexOf("!");
    const area = parseArea(text.slice(cut + 1));
    if (area === undefined) throw new Error(`${text} is no range`);
    return { sheet: text.slice(0, cut), row: area.row, column: area.column, rows: area.rows, columns: area.columns };
  }

  private range(box: Box): object {
    if (!(box.rows >= 1 && box.columns >= 1 && Number.isFinite(box.rows * box.columns)))
      throw new Error("InvalidArgument: a range has at least one cell");
    const grid =
      <T>(read: (cell: StandInCell | undefined) => T): (() => T[][]) =>
      () =>
        Array.from({ length: box.rows }, (_, i) =>
          Array.from({ length: box.columns }, (__, j) => read(this.cellAt(box.sheet, box.row + i, box.column + j))),
        );
    const { book } = this;
    const outer = this;
    return this.proxy(
      {
        address: () => `${box.sheet}!${nameOf(box.row, box.column)}`,
        rowIndex: () => box.row,
        columnIndex: () => box.column,
        rowCount: () => box.rows,
        columnCount: () => box.columns,
        values: grid((cell) => cell?.value ?? ""),
        valueTypes: grid((cell) =>
          cell?.isError === true ? "Error" : cell === undefined ? "Empty" : typeof cell.value === "number" ? "Double" : "String",
        ),
        text: grid((cell) => cell?.text ?? String(cell?.value ?? "")),
        formulas: grid((cell) => cell?.formula ?? cell?.value ?? ""),
      },
      {
        worksheet: this.sheet(box.sheet),
        set formulas(cells: readonly (readonly (string | number | boolean)[])[]) {
          outer.pending.push(() => outer.put(box, cells));
        },
        getSpillParentOrNullObject: () => this.spillParent(box),
        getSpillingToRangeOrNullObject: () => {
          const area = book.spills?.[`${box.sheet}!${nameOf(box.row, box.column)}`];
          return area === undefined ? this.nothing() : this.range(this.boxOf(`${box.sheet}!${area}`));
        },
        select: () => {
          this.pending.push(() => {
            book.active = { sheet: box.sheet, cell: nameOf(box.row, box.column) };
          });
        },
      },
    );
  }

  private put(box: Box, cells: readonly (readonly (string | number | boolean)[])[]): void {
    const sheet = this.book.sheets[box.sheet] as Record<string, StandInCell>;
    cells.forEach((row, i) => {
      row.forEach((value, j) => {
        const isFormula = typeof value === "string" && value.startsWith("=");
        sheet[nameOf(box.row + i, box.column + j)] = isFormula ? { formula: value, value: 0 } : { value };
      });
    });
  }

  private cellAt(sheet: string, row: number, column: number): StandInCell | undefined {
    return this.book.sheets[sheet]?.[nameOf(row, column)];
  }

  private spillParent(box: Box): object {
    for (const [anchor, area] of Object.entries(this.book.spills ?? {})) {
      const at = this.boxOf(anchor);
      const block = this.boxOf(`${at.sheet}!${area}`);
      const inside =
        box.sheet === at.sheet &&
        box.row >= block.row &&
        box.row < block.row + block.rows &&
        box.column >= block.column &&
        box.column < block.column + block.columns;
      if (inside) return this.range(at);
    }
    return this.nothing();
  }

  private named(name: string): object {
    const stands = Object.entries(this.book.names ?? {}).find(([one]) => one.toLowerCase() === name.toLowerCase())?.[1];
    if (stands === undefined) return this.nothing();
    const isRange = typeof stands === "string" && stands.startsWith("=");
    return this.proxy(
      { value: () => stands },
      { getRangeOrNullObject: () => (isRange ? this.range(this.boxOf((stands as string).slice(1))) : this.nothing()) },
    );
  }

  private table(name: string): object {
    const columns = this.book.tables?.[name];
    if (columns === undefined) return this.nothing();
    return this.proxy(
      { name: () => name },
      {
        columns: {
          getItemOrNullObject: (column: string) => {
            const area = columns[column];
            return area === undefined
              ? this.nothing()
              : this.proxy({ name: () => column }, { getDataBodyRange: () => this.range(this.boxOf(area)) });
          },
        },
      },
    );
  }
}

function nameOf(row: number, column: number): string {
  return `${String.fromCharCode(65 + column)}${row + 1}`;
}
