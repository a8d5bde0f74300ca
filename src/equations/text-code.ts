/**
 * A number that stands for a text in a program's slots, so that a symbol may hold a word ("square") and a line may compare with it.
 * Case-blind, as comparison is in a spreadsheet. Negative and large: no measured quantity equals it by accident.
 */
export function textCode(text: string): number {
  const lower = text.toLowerCase();
  return -(2 ** 52 + hash(lower, 0x811c9dc5) * 2 ** 20 + (hash(lower, 0x2f5a3c61) & 0xfffff));
}

/** FNV-1a, 32 bits. */
function hash(text: string, seed: number): number {
  let code = seed;
  for (let i = 0; i < text.length; i++) code = Math.imul(code ^ text.charCodeAt(i), 0x01000193);
  return code >>> 0;
}
