import { readFileSync } from "node:fs";

/** Rows of a comma-separated file beside this one as records of text; lines that start with # are its sources and are left out. */
export function readCsv(file: string): readonly Readonly<Record<string, string>>[] {
  const lines = readFileSync(new URL(file, import.meta.url), "utf8")
    .split("\n")
    .filter((line) => line.trim() !== "" && !line.startsWith("#"));
  const headers = cellsOf(lines[0] as string);
  return lines.slice(1).map((line) => {
    const cells = cellsOf(line);
    return Object.fromEntries(headers.map((header, k) => [header, cells[k] ?? ""]));
  });
}

/** A number, or undefined for a blank cell; anything else fails the test that reads it. */
export function numberIn(row: Readonly<Record<string, string>>, column: string): number | undefined {
  const text = row[column];
  if (text === undefined) throw new Error(`no column ${column}`);
  if (text === "") return undefined;
  const value = Number(text);
  if (!Number.isFinite(value)) throw new Error(`${column}: ${text} is not a number`);
  return value;
}

function cellsOf(line: string): readonly string[] {
  return [...line.matchAll(/("(?:[^"]|"")*"|[^,]*)(?:,|$)/g)]
    .map((match) => (match[1] as string).replace(/^"|"$/g, "").replaceAll('""', '"'))
    .slice(0, -1);
}
