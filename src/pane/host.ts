/** The few verbs that both places where a sheet lives offer to the pane. The pane knows nothing else of its host. */
import type { CellBlock } from "../cells/cell.js";

/** A cell; rows and columns count from 0. */
export interface Place {
  readonly sheet: string;
  readonly row: number;
  readonly column: number;
}

/** A block of cells. Whole columns have `rows` Infinity, whole rows `columns` Infinity: the host cuts them to what is used. */
export interface Area extends Place {
  readonly rows: number;
  readonly columns: number;
  /** True for `A2#`: whatever the formula in that cell spills. */
  readonly spilled?: boolean;
}

/** The cell that the user stands on. */
export interface Selection {
  readonly place: Place;
  /** As the host writes it to a reader: "Walls!C4" or "C4". */
  readonly address: string;
  /** All cells that are selected, where they are one block. */
  readonly area?: Area;
  /** The formula in English with commas and decimal points, from "=" on; empty where the cell holds none. */
  readonly formula: string;
  /** What the cell shows, as text. */
  readonly shown: string;
  /** Set where the cell lies in a block that another cell's formula spills. */
  readonly spill?: Spill;
}

export interface Spill {
  readonly anchor: Place;
  readonly anchorAddress: string;
  readonly formula: string;
  readonly rowOffset: number;
  readonly columnOffset: number;
}

export interface FormulaCell {
  readonly place: Place;
  readonly address: string;
  readonly formula: string;
  readonly shown: string;
}

export interface HostFacts {
  readonly name: string;
  /** "system" follows the operating system's preference. */
  readonly theme: "light" | "dark" | "system";
  readonly decimalSeparator: string;
  readonly listSeparator: string;
}

export type Written = number | string | boolean;

export interface SheetHost {
  facts(): Promise<HostFacts>;
  selection(): Promise<Selection | undefined>;
  /** Calls back whenever the active cell may have changed; the answer stops it. */
  onSelectionChanged(listener: () => void): () => void;
  /** Calls back whenever values or formulas may have changed; the answer stops it. */
  onValuesChanged(listener: () => void): () => void;
  onThemeChanged?(listener: () => void): () => void;
  /** One block for each area, blanks as "", errors as objects with a code; undefined where there is no such place. */
  read(areas: readonly Area[]): Promise<readonly (CellBlock | undefined)[]>;
  /** What a defined name or a table column stands for; undefined where it is not known. */
  readName(name: string, at: Place): Promise<CellBlock | undefined>;
  /** Evaluates a piece of a formula, without "=", where the host can. */
  evaluate?(expression: string, at: Place): Promise<CellBlock | undefined>;
  /** Writes a block from a cell on; text from "=" on is a formula in English. One step of undo where the host can. */
  write(at: Place, cells: readonly (readonly Written[])[]): Promise<void>;
  /** Every formula of the workbook whose text holds the word. */
  formulas(holding: string): Promise<readonly FormulaCell[]>;
  goTo(place: Place): Promise<void>;
}
