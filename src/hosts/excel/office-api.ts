/** The few parts of Office.js that the pane's host uses, as its documentation has them. A stand-in of the same shape serves the tests. */

export interface OfficeApi {
  onReady(): Promise<{ readonly host: string | null }>;
  readonly context: {
    readonly requirements: { isSetSupported(name: string, version: string): boolean };
    readonly officeTheme?: { readonly bodyBackgroundColor?: string; readonly isDarkTheme?: boolean };
  };
}

export interface ExcelApi {
  run<T>(act: (context: ExcelContext) => Promise<T>): Promise<T>;
}

export interface ExcelContext {
  readonly workbook: Workbook;
  sync(): Promise<void>;
}

export interface Loaded {
  load(properties: string): void;
}

export interface MaybeNull extends Loaded {
  readonly isNullObject: boolean;
}

export interface Workbook {
  getActiveCell(): CellRange;
  /** Fails where several blocks are selected at once. */
  getSelectedRange(): CellRange;
  readonly application: Loaded & { readonly decimalSeparator: string };
  readonly worksheets: Worksheets;
  readonly names: { getItemOrNullObject(name: string): NamedItem };
  readonly tables: { getItemOrNullObject(name: string): Table };
  readonly onSelectionChanged: Events;
}

export interface Events {
  add(listener: () => Promise<void>): EventRegistration;
}

export interface EventRegistration {
  readonly context?: ExcelContext;
  remove(): void;
}

export interface Worksheets extends Loaded {
  readonly items: readonly Worksheet[];
  getItemOrNullObject(name: string): Worksheet;
  readonly onCalculated: Events;
  readonly onChanged: Events;
}

export interface Worksheet extends MaybeNull {
  readonly name: string;
  getRangeByIndexes(row: number, column: number, rows: number, columns: number): CellRange;
  getUsedRangeOrNullObject(valuesOnly: boolean): CellRange;
  readonly names: { getItemOrNullObject(name: string): NamedItem };
  activate(): void;
}

export interface CellRange extends MaybeNull {
  readonly address: string;
  readonly rowIndex: number;
  readonly columnIndex: number;
  readonly rowCount: number;
  readonly columnCount: number;
  readonly values: readonly (readonly unknown[])[];
  readonly valueTypes: readonly (readonly string[])[];
  readonly text: readonly (readonly string[])[];
  formulas: readonly (readonly unknown[])[];
  readonly worksheet: Worksheet;
  getSpillParentOrNullObject(): CellRange;
  getSpillingToRangeOrNullObject(): CellRange;
  select(): void;
}

export interface NamedItem extends MaybeNull {
  readonly value: unknown;
  getRangeOrNullObject(): CellRange;
}

export interface Table extends MaybeNull {
  readonly columns: { getItemOrNullObject(name: string): TableColumn };
}

export interface TableColumn extends MaybeNull {
  getDataBodyRange(): CellRange;
}
