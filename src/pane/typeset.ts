/** Equation lines as typeset maths whose symbols can be asked for their meaning. */
import { meaningOf, symbolMath, symbolMeaning } from "../correlations/symbols.js";
import { parseLine } from "../equations/line.js";
import { escapeXml, toMathML } from "../equations/mathml.js";
import type { Step } from "../findings/finding.js";
import { figure } from "./figures.js";
import { type Child, math, type PageElement } from "./node.js";

/** One line as a tree of maths elements. Each symbol is an `mrow` of class `symbol` with its name in `data-symbol`. */
export function typesetLine(name: string, algebra: string): PageElement | undefined {
  try {
    return readMaths(toMathML(name, parseLine(algebra), markedSymbol));
  } catch {
    // A line that cannot be typeset is shown as algebra.
    return undefined;
  }
}

function markedSymbol(name: string): string {
  return `<mrow class="symbol" data-symbol="${escapeXml(name)}">${symbolMath(name)}</mrow>`;
}

/** A symbol alone, as in a list of symbols. */
export function typesetSymbol(name: string): PageElement {
  const tree = readMaths(`<math>${symbolMath(name)}</math>`);
  return tree ?? math("math", {}, math("mi", {}, name));
}

const allowedTags: ReadonlySet<string> = new Set(
  "math mrow mi mn mo mtext msub msup msubsup mfrac msqrt mroot mtable mtr mtd mspace mover munder".split(" "),
);
const allowedAttributes: ReadonlySet<string> = new Set(
  "display mathvariant stretchy form lspace rspace columnalign class data-symbol".split(" "),
);
const piece = /<(\/?)([a-z]+)((?:\s+[a-z-]+="[^"<]*")*)\s*(\/?)>|([^<]+)/gy;

/** Reads our own presentation MathML into a tree; undefined where it holds anything else. */
export function readMaths(text: string): PageElement | undefined {
  const stack: { tag: string; attributes: Record<string, string>; children: Child[] }[] = [{ tag: "", attributes: {}, children: [] }];
  piece.lastIndex = 0;
  let end = 0;
  for (let found = piece.exec(text); found !== null; found = piece.exec(text)) {
    end = piece.lastIndex;
    const [, closing, tag = "", attributes = "", selfClosing, plain] = found;
    const top = stack[stack.length - 1] as (typeof stack)[number];
    if (plain !== undefined) {
      top.children.push(decoded(plain));
      continue;
    }
    if (!allowedTags.has(tag)) return undefined;
    if (closing === "/") {
      if (top.tag !== tag || stack.length < 2) return undefined;
      stack.pop();
      (stack[stack.length - 1] as (typeof stack)[number]).children.push(math(tag, top.attributes, top.children));
    } else if (selfClosing === "/") top.children.push(math(tag, attributesOf(attributes)));
    else stack.push({ tag, attributes: attributesOf(attributes), children: [] });
    if (end === text.length) break;
  }
  const root = stack[0]?.children[0];
  return end === text.length && stack.length === 1 && typeof root === "object" ? root : undefined;
}

function attributesOf(text: string): Record<string, string> {
  const attributes: Record<string, string> = {};
  for (const found of text.matchAll(/([a-z-]+)="([^"]*)"/g)) {
    if (allowedAttributes.has(found[1] as string)) attributes[found[1] as string] = decoded(found[2] as string);
  }
  return attributes;
}

const entities: Readonly<Record<string, string>> = { lt: "<", gt: ">", amp: "&", quot: '"', apos: "'" };

function decoded(text: string): string {
  return text.replace(/&(?:#x([0-9a-f]+)|#(\d+)|([a-z]+));/gi, (whole, hex?: string, decimal?: string, name?: string) => {
    if (name !== undefined) return entities[name] ?? whole;
    const code = hex !== undefined ? Number.parseInt(hex, 16) : Number(decimal);
    return code > 0 && code <= 0x10ffff ? String.fromCodePoint(code) : whole;
  });
}

/** What a symbol is, with its value here where the steps give one: "Rayleigh number: 1.074·10⁸". */
export function symbolSays(name: string, steps: readonly Step[]): string {
  const step = steps.find((one) => one.symbol === name);
  const meaning = step !== undefined && step.meaning !== name ? step.meaning : meaningOf(name);
  const unit = step?.unit ?? symbolMeaning[name]?.unit ?? "";
  const value = step === undefined ? "" : typeof step.value === "number" ? figure(step.value) : step.value;
  const measured = [value, value === "" ? "" : unit].filter((one) => one !== "").join(" ");
  return [meaning === "" ? name : meaning, measured].filter((one) => one !== "").join(": ");
}
