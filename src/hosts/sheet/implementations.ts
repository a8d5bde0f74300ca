/** The implementation of every id that the metadata lists: the very functions that Excel's bundle associates. */
import * as functions from "../../cells/functions.js";
import type { FunctionEntry, Implementation } from "./functions.js";

export function implementationsFor(entries: readonly FunctionEntry[]): Readonly<Record<string, Implementation>> {
  const exported = functions as unknown as Readonly<Record<string, Implementation | undefined>>;
  const found: Record<string, Implementation> = {};
  for (const { id } of entries) {
    const implementation = exported[exportName(id)];
    if (implementation === undefined) throw new Error(`no implementation for ${id}`);
    found[id] = implementation;
  }
  return found;
}

/** FREE.PLATE is exported as freePlate. */
export function exportName(id: string): string {
  return id.toLowerCase().replace(/[._]([a-z0-9])/g, (_, letter: string) => letter.toUpperCase());
}
