/** What a page shows, as plain data: built by pure functions, then made into elements by one renderer, or written as text for tests and files. */

export type Space = "html" | "svg" | "math";

export type Listener = (event: Event) => void;

export interface PageElement {
  readonly tag: string;
  readonly space: Space;
  readonly attributes: Readonly<Record<string, string>>;
  readonly children: readonly Child[];
  readonly on: Readonly<Record<string, Listener>>;
}

/** Text is always text: no child is ever read as markup. */
export type Child = PageElement | string;

export type Given = string | number | boolean | undefined | Listener;

type Kids = readonly (Child | undefined | false | readonly (Child | undefined | false)[])[];

function make(space: Space, tag: string, given: Readonly<Record<string, Given>>, kids: Kids): PageElement {
  const attributes: Record<string, string> = {};
  const on: Record<string, Listener> = {};
  for (const [name, value] of Object.entries(given)) {
    if (typeof value === "function") on[name] = value;
    else if (value === true) attributes[name] = "";
    else if (value !== undefined && value !== false) attributes[name] = String(value);
  }
  const children = kids.flat().filter((kid): kid is Child => kid !== undefined && kid !== false && kid !== "");
  return { tag, space, attributes, children, on };
}

/** An HTML element; functions among the attributes become listeners of the event of that name. */
export function el(tag: string, given: Readonly<Record<string, Given>> = {}, ...kids: Kids): PageElement {
  return make("html", tag, given, kids);
}

export function svg(tag: string, given: Readonly<Record<string, Given>> = {}, ...kids: Kids): PageElement {
  return make("svg", tag, given, kids);
}

export function math(tag: string, given: Readonly<Record<string, Given>> = {}, ...kids: Kids): PageElement {
  return make("math", tag, given, kids);
}

const empty: ReadonlySet<string> = new Set(["br", "hr", "img", "input", "meta", "link", "col"]);

/** The tree as text: HTML, SVG or MathML with everything escaped. */
export function markupOf(child: Child): string {
  if (typeof child === "string") return escaped(child);
  const attributes = Object.entries(child.attributes).map(([name, value]) => ` ${name}="${escaped(value)}"`);
  const root = child.space === "svg" && child.tag === "svg" ? ' xmlns="http://www.w3.org/2000/svg"' : "";
  const opening = `<${child.tag}${root}${attributes.join("")}`;
  if (child.space === "html" && empty.has(child.tag)) return `${opening}>`;
  return `${opening}>${child.children.map(markupOf).join("")}</${child.tag}>`;
}

function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`);
}

/** All text of a tree, for searching and copying. */
export function textIn(child: Child): string {
  return typeof child === "string" ? child : child.children.map(textIn).join("");
}
