/** A published equation as data. The lines are the equation that runs, that is typeset and that the reviewer recalculates. */
import type { Table } from "../equations/table.js";

/** A tabulated constant; becomes nested IFs in the algebra, so that it runs and prints like any other line. */
export type { Table } from "../equations/table.js";

export type Origin = "published" | "common practice" | "customary" | "from memory";

export interface Scatter {
  /** Relative half-width at about 95 %, as a fraction. */
  readonly value: number;
  readonly origin: Origin;
  /** Where the scatter differs by regime: upper limits of one symbol, ascending, the last Infinity. */
  readonly by?: { readonly symbol: string; readonly steps: readonly (readonly [number, number])[] };
}

/** A record evaluated inside another one: its lines and the symbols given in `with` get the suffix `_NAME`; its other symbols are the outer record's. */
export interface Part {
  readonly of: Correlation;
  /** The part's own symbols replaced by algebra in the outer record's symbols, e.g. `{ Ra: "Ra*COS(RADIANS(tilt))" }`. */
  readonly with?: Readonly<Record<string, string>>;
}

export interface Correlation {
  /** Stable id: authors-year-what. */
  readonly id: string;
  /** Authors and what, as an engineer would name it. */
  readonly name: string;
  /** Surfaces it serves, e.g. ["FREE.PLATE"]. */
  readonly serves: readonly string[];
  /** Pieces of one published set share this word; the range picks the piece, the first listed where several hold. */
  readonly set?: string;
  /** What the last line is. Factors and frictions are used by other records or by surfaces, never offered alone. */
  readonly result: "Nu" | "factor" | "friction" | "criterion" | "pressure" | "temperature" | "h" | "q";
  readonly extent: "mean" | "local" | "either";
  readonly wall: "isothermal" | "uniform flux" | "either";
  /** Where properties are taken; "film" is the mean of surface and bulk. Wall values are the symbols with suffix w (Prw, muw). */
  readonly propertiesAt: "film" | "bulk" | "other";
  /** Where propertiesAt is "other": the fraction of the way from bulk to surface (0.5 would be the film). */
  readonly towardsSurface?: number;
  /** In words where propertiesAt is "other" or more must be said. */
  readonly propertiesNote?: string;
  /** What the length in the groups is, in the words of the source. */
  readonly length: string;
  /** Records evaluated inside this one, by suffix. */
  readonly parts?: Readonly<Record<string, Part>>;
  readonly tables?: Readonly<Record<string, Table>>;
  /** Lines of spreadsheet algebra: named helper lines first, the final line last. */
  readonly lines: Readonly<Record<string, string>>;
  readonly ranges: Readonly<Record<string, readonly [number, number]>>;
  readonly rangeOrigin: Origin;
  readonly scatter: Scatter;
  /** The final line's value as the driving group goes to zero, where such a limit exists: a number. */
  readonly limit?: { readonly of: string; readonly value: number };
  readonly source: { readonly work: string; readonly at?: string };
  /** S: the source's text was seen; N: constants confirmed by exact solution, worked example or independent implementation; M: from memory. */
  readonly confidence: "S" | "N" | "M";
  readonly note?: string;
  /** Meanings of symbols that only this record uses. */
  readonly symbols?: Readonly<Record<string, string>>;
}
