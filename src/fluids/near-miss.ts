/** Which fluids a misspelt or half-remembered name may have meant. */
import type { ShelfEntry } from "./shelf-entry.js";

/** At most three entries, the nearest first; none where nothing is near. */
export function nearMisses(name: string, entries: readonly ShelfEntry[]): readonly ShelfEntry[] {
  const wanted = name.normalize("NFKC").toLowerCase().trim().slice(0, 60);
  if (wanted === "") return [];
  return entries
    .map((entry) => ({ entry, distance: Math.min(...[entry.name, ...entry.synonyms].map((one) => distanceTo(wanted, one.toLowerCase()))) }))
    .filter(({ distance }) => distance < 1)
    .sort((a, b) => a.distance - b.distance)
    .slice(0, 3)
    .map(({ entry }) => entry);
}

/** More than a third of the letters changed is another word. */
const furthest = 0.34;

/** 0 for the same text, below 1 where it may have been meant: few letters changed, or whole words shared. */
function distanceTo(wanted: string, candidate: string): number {
  const longer = Math.max(wanted.length, candidate.length);
  const nearby = within(wanted, candidate, furthest * longer) ? edits(wanted, candidate) / longer : 1;
  const own = wordsOf(wanted);
  const others = wordsOf(candidate);
  const shared = others.filter((word) => word.length > 2 && own.some((other) => within(other, word, word.length / 6)));
  if (shared.length === 0) return nearby;
  const share = (2 * lettersIn(shared)) / (lettersIn(own) + lettersIn(others));
  return Math.min(nearby, 0.45 * (1 - Math.min(share, 1)));
}

/** Whether few enough edits lead from one text to the other; most pairs are told apart by their lengths or their letters alone. */
function within(a: string, b: string, most: number): boolean {
  if (a === b) return true;
  if (most < 1 || Math.abs(a.length - b.length) > most) return false;
  const missing = [...a].filter((letter) => !b.includes(letter)).length;
  return missing <= most && edits(a, b) <= most;
}

function lettersIn(words: readonly string[]): number {
  return words.reduce((sum, word) => sum + word.length, 0);
}

function wordsOf(text: string): readonly string[] {
  return text.split(/[^a-z0-9]+/).filter((word) => word !== "");
}

/** Insertions, deletions, substitutions and swaps of neighbours that lead from one text to the other. */
function edits(a: string, b: string): number {
  const width = b.length + 1;
  const cost = new Uint16Array((a.length + 1) * width);
  const at = (i: number, j: number): number => cost[i * width + j] as number;
  for (let i = 0; i <= a.length; i++) cost[i * width] = i;
  for (let j = 0; j <= b.length; j++) cost[j] = j;
  for (let i = 1; i <= a.length; i++) {
    for (let j = 1; j <= b.length; j++) {
      const change = a[i - 1] === b[j - 1] ? 0 : 1;
      let best = Math.min(at(i - 1, j) + 1, at(i, j - 1) + 1, at(i - 1, j - 1) + change);
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]) best = Math.min(best, at(i - 2, j - 2) + 1);
      cost[i * width + j] = best;
    }
  }
  return at(a.length, b.length);
}
