/** A host whose sheets are each read once: five thousand formulas then cost one round trip a sheet, not one each. */
import type { CellBlock } from "../../cells/cell.js";
import type { Area, SheetHost } from "../host.js";

export function readingOnce(host: SheetHost): SheetHost {
  const sheets = new Map<string, Promise<CellBlock | undefined>>();
  const names = new Map<string, Promise<CellBlock | undefined>>();
  const whole = (sheet: string): Promise<CellBlock | undefined> => {
    const key = sheet.toLowerCase();
    const known = sheets.get(key);
    if (known !== undefined) return known;
    const fresh = host
      .read([{ sheet, row: 0, column: 0, rows: Number.POSITIVE_INFINITY, columns: Number.POSITIVE_INFINITY }])
      .then(([block]) => block);
    sheets.set(key, fresh);
    return fresh;
  };
  const one = async (area: Area): Promise<CellBlock | undefined> => {
    if (area.spilled === true) return (await host.read([area]))[0];
    const block = await whole(area.sheet);
    return block === undefined ? undefined : cut(block, area);
  };
  return {
    facts: () => host.facts(),
    selection: () => host.selection(),
    onSelectionChanged: (listener) => host.onSelectionChanged(listener),
    onValuesChanged: (listener) => host.onValuesChanged(listener),
    read: (areas) => Promise.all(areas.map(one)),
    readName: (name, at) => {
      // Names of a sheet and columns of "this row" depend on where they stand.
      const key = /[@#]/.test(name) ? undefined : `${at.sheet}\n${name}`;
      if (key === undefined) return host.readName(name, at);
      const known = names.get(key) ?? host.readName(name, at);
      names.set(key, known);
      return known;
    },
    ...(host.evaluate === undefined ? {} : { evaluate: (expression, at) => host.evaluate?.(expression, at) ?? Promise.resolve(undefined) }),
    write: (at, cells) => host.write(at, cells),
    formulas: (holding) => host.formulas(holding),
    goTo: (place) => host.goTo(place),
  };
}

/** Beyond what is used all cells are blank; a whole column ends where the sheet's use ends. */
function cut(block: CellBlock, area: Area): CellBlock {
  const rows = Number.isFinite(area.rows) ? area.rows : Math.max(1, block.length - area.row);
  const columns = Number.isFinite(area.columns) ? area.columns : Math.max(1, (block[0]?.length ?? 0) - area.column);
  return Array.from({ length: rows }, (_, row) =>
    Array.from({ length: columns }, (__, column) => block[area.row + row]?.[area.column + column] ?? ""),
  );
}
