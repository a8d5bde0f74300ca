/**
 * Reads a compound unit as engineers write it: words with powers, joined by points, stars, dashes, spaces or nothing, divided by slashes
 * or "per". After a slash everything divides up to the closing parenthesis, for that is what `W/m2 K` and `BTU/hr-ft2-F` mean.
 */
import { type Atom, atomNames, type Vector } from "./unit-table.js";

export interface Factor {
  readonly atom: Atom;
  readonly power: number;
}

export type UnitText =
  | { readonly kind: "product"; readonly factors: readonly Factor[] }
  /** Capitals decide here (mW, MW), and the text does not follow them. */
  | { readonly kind: "ambiguous"; readonly word: string; readonly choices: readonly string[] }
  | { readonly kind: "unknown" };

const superscripts = "⁰¹²³⁴⁵⁶⁷⁸⁹";
const subscripts = "₀₁₂₃₄₅₆₇₈₉";
const largestPower = 9;
const longestRun = 9;

/** Superscript runs as `^-2`, so that 10⁷ never turns into 107. */
export function superscriptsToPowers(text: string): string {
  return text.replace(/[⁺⁻]?[⁰¹²³⁴⁵⁶⁷⁸⁹]+/g, (run) => `^${[...run].map((one) => superscriptToPlain(one)).join("")}`);
}

function superscriptToPlain(one: string): string {
  if (one === "⁻") return "-";
  if (one === "⁺") return "";
  return String(superscripts.indexOf(one));
}

/** One spelling for what looks alike: signs, degree signs, micro signs, columns of water and mercury. */
export function normaliseUnit(text: string): string {
  return superscriptsToPowers(text)
    .replace(/[₀-₉]/g, (one) => String(subscripts.indexOf(one)))
    .replace(/[º˚]/g, "°")
    .replace(/[∆Δ]|\bdelta(?![a-bd-eg-jl-qs-z])/gi, "Δ")
    .normalize("NFKC")
    .replace(/[−–—﹣‐‑]/g, "-")
    .replace(/[×∙⋅•‧∗]/g, "·")
    .replace(/[⁄∕÷]/g, "/")
    .replace(/\s+/g, " ")
    .replace(/Δ[\s_-]+/g, "Δ")
    .replace(
      /\b(in|inch|inches|mm|cm|ft|m)\.?\s?(?:of\s)?(?:h2o(?=[ag]?\b)|water\b|w\.c\.|wc\b)/gi,
      (_all, unit: string) => `${columnUnit(unit)}HHO`,
    )
    .replace(/\b(in|inch|inches|mm)\.?\s?(?:of\s)?(?:hg\b|mercury\b)/gi, (_all, unit: string) => `${columnUnit(unit)}Hg`)
    .replace(/(?:°|\bdeg(?:ree)?s?\b\.?)\s?(?=celsius|centigrade|fahrenheit|kelvin|rankine)/gi, "")
    .replace(/(?:°|\bdeg(?:ree)?s?\b\.?)[\s-]?(?=[CFKR](?![A-Za-z]))/gi, "°")
    .replace(/deg(?=[CFKR](?![A-Za-z]))/gi, "°")
    .replace(/°[cfkr](?![A-Za-z])/g, (one) => one.toUpperCase())
    .replace(/\s?\((g|gauge)\)$|[\s-](?:gauge|g)$/i, "GAUGE")
    .replace(/\s?\((a|abs\.?|absolute)\)$|[\s-](?:absolute|abs\.?|a)$/i, "ABSOLUTE")
    .trim();
}

function columnUnit(unit: string): string {
  const lower = unit.toLowerCase();
  return lower.startsWith("in") ? "in" : lower;
}

/** Names whose capitals were not kept, by their lower-case form. */
function buildFolded(names: Iterable<[string, Atom]>): ReadonlyMap<string, readonly Atom[]> {
  const folded = new Map<string, Atom[]>();
  for (const [name, atom] of names) {
    const key = name.toLowerCase();
    const same = folded.get(key) ?? [];
    if (!same.some((other) => equal(other, atom))) same.push(atom);
    folded.set(key, same);
  }
  return folded;
}

function equal(one: Atom, other: Atom): boolean {
  return one.factor === other.factor && one.offset === other.offset && one.gauge === other.gauge && sameVector(one.vector, other.vector);
}

function sameVector(one: Vector, other: Vector): boolean {
  return one.every((power, at) => power === other[at]);
}

const foldedNames = buildFolded(atomNames);
const joiningNames: ReadonlyMap<string, Atom> = new Map([...atomNames].filter(([name, atom]) => atom.joins && name.length <= 3));
const foldedJoiningNames = buildFolded(joiningNames);

type Word = readonly Atom[] | { readonly word: string; readonly choices: readonly string[] } | undefined;

/** As written; as written but run together; then the same two without regard to capitals. */
function readWord(word: string): Word {
  const exact = atomNames.get(word);
  if (exact) return [exact];
  const joined = split(word, (part) => joiningNames.get(part));
  if (joined) return joined;
  const folded = foldedNames.get(word.toLowerCase());
  if (folded) return folded.length === 1 ? folded : { word, choices: folded.map((atom) => atom.symbol) };
  return split(word, (part) => soleJoining(part));
}

function soleJoining(part: string): Atom | undefined {
  const found = foldedJoiningNames.get(part.toLowerCase());
  return found?.length === 1 ? found[0] : undefined;
}

/** The fewest pieces that spell the word; nothing when two ways do. */
function split(word: string, find: (part: string) => Atom | undefined): readonly Atom[] | undefined {
  if (word.length > longestRun) return undefined;
  for (const count of [2, 3]) {
    const ways = splits(word, count, find);
    if (ways.length === 1) return ways[0];
    if (ways.length > 1) return undefined;
  }
  return undefined;
}

function splits(word: string, count: number, find: (part: string) => Atom | undefined): readonly (readonly Atom[])[] {
  if (count === 1) {
    const atom = find(word);
    return atom ? [[atom]] : [];
  }
  const ways: (readonly Atom[])[] = [];
  for (let at = 1; at < word.length; at++) {
    const head = find(word.slice(0, at));
    // Degrees end a run (`m2K`, `lbF`) and never begin one: `KW` and `Kg` are kilowatts and kilograms with a capital slip.
    if (head?.vector[3] !== 0) continue;
    for (const tail of splits(word.slice(at), count - 1, find)) {
      // Two lengths run together (`mft`) are a slip of the keyboard, not an area.
      if (!tail.some((atom) => sameVector(atom.vector, head.vector))) ways.push([head, ...tail]);
    }
  }
  return ways;
}

const powerWords: Readonly<Record<string, number>> = { sq: 2, square: 2, cu: 3, cubic: 3 };
const joinedPowerWord = /^(sq|cu)(m|mm|cm|ft|in|yd)$/i;

class UnitReader {
  readonly factors: Factor[] = [];
  trouble: Extract<UnitText, { kind: "ambiguous" }> | undefined;
  private at = 0;

  constructor(private readonly text: string) {}

  /** Whether the whole text was a product of known units. */
  read(): boolean {
    const done = this.product(1, 0) && this.at === this.text.length;
    return done && this.factors.length > 0;
  }

  private product(sign: number, depth: number): boolean {
    let direction = sign;
    let needed = true;
    let divided = false;
    if (depth > 3) return false;
    for (;;) {
      this.match(/ /y);
      if (this.at === this.text.length) return !needed;
      if (this.text[this.at] === ")") return !needed && depth > 0;
      if (this.match(/ ?(?:\/|per\b) ?/y)) {
        // A text may begin with its slash (`/K`), but two slashes never meet.
        if (needed && (divided || this.factors.length > 0)) return false;
        direction = -sign;
        needed = true;
        divided = true;
        continue;
      }
      if (!needed && this.match(/ ?(?:\*(?!\*)|·|\.-?|-(?!\d)) ?/y)) {
        if (this.at === this.text.length) return this.text.endsWith(".");
        needed = true;
      }
      if (!this.term(direction, depth)) return false;
      needed = false;
    }
  }

  private term(direction: number, depth: number): boolean {
    if (this.match(/1(?= ?(?:\/|per\b))/y)) return true;
    if (this.match(/\( ?/y)) return this.group(direction, depth);
    const word = this.match(/Δ?°?[A-Za-zμ]+|°/y);
    if (word === undefined) return false;
    const power = powerWords[word.toLowerCase()];
    if (power !== undefined) return this.poweredWord(power * direction);
    const joined = joinedPowerWord.exec(word);
    if (joined) return this.push(joined[2] as string, direction * (powerWords[(joined[1] as string).toLowerCase()] as number), 1);
    return this.push(word, direction, this.power());
  }

  private poweredWord(power: number): boolean {
    this.match(/\.? ?/y);
    const word = this.match(/[A-Za-zμ]+/y);
    return word !== undefined && this.push(word, power, 1);
  }

  private group(direction: number, depth: number): boolean {
    const from = this.factors.length;
    if (!this.product(direction, depth + 1) || !this.match(/\)/y)) return false;
    const power = this.power();
    if (power === undefined) return false;
    for (let at = from; at < this.factors.length; at++) {
      const factor = this.factors[at] as Factor;
      this.factors[at] = { atom: factor.atom, power: factor.power * power };
    }
    return true;
  }

  /** `2`, `^2`, `**2`, `^-2`, `-2`, `^(-2)`; one when nothing follows. */
  private power(): number | undefined {
    const written = this.match(/(?:\^|\*\*) ?(?:[+-]?\d+|\([+-]?\d+\))|-?\d+/y);
    if (written === undefined) return 1;
    const power = Number(written.replace(/[^\d-]/g, ""));
    return power !== 0 && Math.abs(power) <= largestPower ? power : undefined;
  }

  private push(word: string, direction: number, power: number | undefined): boolean {
    if (power === undefined) return false;
    const atoms = readWord(word);
    if (atoms === undefined) return false;
    if ("choices" in atoms) {
      this.trouble = { kind: "ambiguous", word: atoms.word, choices: atoms.choices };
      return false;
    }
    const last = atoms.length - 1;
    atoms.forEach((atom, at) => {
      this.factors.push({ atom, power: at === last ? direction * power : direction });
    });
    return true;
  }

  private match(pattern: RegExp): string | undefined {
    pattern.lastIndex = this.at;
    const found = pattern.exec(this.text);
    if (found === null) return undefined;
    this.at += found[0].length;
    return found[0];
  }
}

/** `text` has gone through `normaliseUnit`. */
export function readProduct(text: string): UnitText {
  const reader = new UnitReader(text);
  if (reader.read()) return { kind: "product", factors: reader.factors };
  return reader.trouble ?? { kind: "unknown" };
}
