/** Keeps the workbook in the browser's own storage, so that edits survive a reload. Nothing leaves the machine. */
import type { WorkbookData } from "./univer-types.js";

const database = "filmbook";
const store = "workbooks";
const key = "standalone";

/** What was kept; undefined where nothing was. */
export async function keptWorkbook(): Promise<WorkbookData | undefined> {
  const found = await transact("readonly", (workbooks) => workbooks.get(key));
  return isWorkbook(found) ? found : undefined;
}

export async function keep(workbook: WorkbookData): Promise<void> {
  await transact("readwrite", (workbooks) => workbooks.put(workbook, key));
}

export async function forget(): Promise<void> {
  await transact("readwrite", (workbooks) => workbooks.delete(key));
}

function transact<T>(mode: IDBTransactionMode, act: (workbooks: IDBObjectStore) => IDBRequest<T>): Promise<T> {
  return new Promise((resolve, reject) => {
    const opening = indexedDB.open(database, 1);
    opening.onupgradeneeded = () => opening.result.createObjectStore(store);
    opening.onerror = () => reject(opening.error ?? new Error("the browser keeps no data for this page"));
    opening.onblocked = () => reject(new Error("another window holds the data"));
    opening.onsuccess = () => {
      const opened = opening.result;
      const transaction = opened.transaction(store, mode);
      const request = act(transaction.objectStore(store));
      transaction.oncomplete = () => {
        opened.close();
        resolve(request.result);
      };
      transaction.onerror = transaction.onabort = () => {
        opened.close();
        reject(transaction.error ?? new Error("the browser refused to keep the sheet"));
      };
    };
  });
}

function isWorkbook(thing: unknown): thing is WorkbookData {
  if (typeof thing !== "object" || thing === null) return false;
  const { id, sheets, sheetOrder } = thing as Partial<WorkbookData>;
  return typeof id === "string" && typeof sheets === "object" && sheets !== null && Array.isArray(sheetOrder) && sheetOrder.length > 0;
}

/** The workbook without what formulas come to: that is worked out anew when it is opened, by whatever version opens it. */
export function withoutResults(workbook: WorkbookData): WorkbookData {
  const sheets = Object.entries(workbook.sheets).map(
    ([id, sheet]) => [id, { ...sheet, cellData: withoutValues(sheet.cellData ?? {}) }] as const,
  );
  return { ...workbook, sheets: Object.fromEntries(sheets) };
}

type CellRows = NonNullable<WorkbookData["sheets"][string]["cellData"]>;

interface Cell {
  readonly f?: string | null;
  readonly si?: string | null;
  readonly v?: unknown;
  readonly t?: unknown;
}

function withoutValues(rows: CellRows): CellRows {
  const kept: CellRows = {};
  for (const [row, cells] of Object.entries(rows)) {
    const line: CellRows[number] = {};
    for (const [column, cell] of Object.entries((cells ?? {}) as Record<string, Cell | null>)) {
      if (cell === null || cell === undefined) continue;
      const { v, t, ...rest } = cell;
      line[Number(column)] = (cell.f || cell.si ? rest : cell) as CellRows[number][number];
    }
    kept[Number(row)] = line;
  }
  return kept;
}
