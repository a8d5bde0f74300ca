/** What the frame of the pane gives to a page, and what a page gives back. */
import type { FilmCall } from "./formula.js";
import type { Place, SheetHost } from "./host.js";
import type { Child } from "./node.js";

export type PageId = "this-cell" | "new-formula" | "library" | "workbook" | "cautions";

/** What one page may hand to the next: a formula to edit, a function or a fluid to begin with. */
export interface Errand {
  readonly functionId?: string;
  readonly fluid?: string;
  readonly edit?: { readonly formula: string; readonly call: FilmCall; readonly at: Place };
}

export interface Frame {
  readonly host: SheetHost;
  readonly content: HTMLElement;
  /** Puts a tree in the page's place, keeping focus and folds. */
  show(children: readonly Child[]): void;
  /** Shows another page; false where this pane has none of that name. */
  open(page: PageId, errand?: Errand): void;
  has(page: PageId): boolean;
  /** Says something to all readers, screen readers included. */
  say(sentence: string): void;
}

export interface Page {
  readonly id: PageId;
  readonly title: string;
  /** Begins the page; the answer ends it. */
  begin(frame: Frame, errand: Errand): () => void;
}
