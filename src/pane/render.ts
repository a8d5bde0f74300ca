/** The one place that makes real elements: everything goes through createElement, setAttribute and text nodes, never through markup. */
import type { Child, PageElement, Space } from "./node.js";

const spaces: Readonly<Record<Space, string>> = {
  html: "http://www.w3.org/1999/xhtml",
  svg: "http://www.w3.org/2000/svg",
  math: "http://www.w3.org/1998/Math/MathML",
};

export function render(child: Child): Node {
  if (typeof child === "string") return document.createTextNode(child);
  const element = document.createElementNS(spaces[child.space], child.tag);
  for (const [name, value] of Object.entries(child.attributes)) {
    if (isSafe(name, value)) element.setAttribute(name, value);
  }
  for (const [event, listener] of Object.entries(child.on)) element.addEventListener(event, listener);
  element.append(...child.children.map(render));
  return element;
}

/** No attribute may carry script or style: a slip of ours must not become a hole. */
function isSafe(name: string, value: string): boolean {
  if (/^(?:on|style$|srcdoc$)/i.test(name)) return false;
  return !/^(?:href|src|xlink:href)$/i.test(name) || /^(?:#|\.?\/|https:)/i.test(value);
}

/** Puts a new tree in the place of what a container shows; the focus, the scroll and what was folded out stay where they were. */
export function show(container: HTMLElement, children: readonly Child[]): void {
  const focused = container.contains(document.activeElement) ? document.activeElement?.id : undefined;
  const open = new Map([...container.querySelectorAll("details[id]")].map((one) => [one.id, (one as HTMLDetailsElement).open]));
  const { scrollTop } = container;
  container.replaceChildren(...children.map(render));
  for (const [id, isOpen] of open) {
    const details = container.querySelector(`#${CSS.escape(id)}`);
    if (details instanceof HTMLDetailsElement) details.open = isOpen;
  }
  container.scrollTop = scrollTop;
  if (focused !== undefined && focused !== "")
    (container.querySelector(`#${CSS.escape(focused)}`) as HTMLElement | null)?.focus({ preventScroll: true });
}

export type { PageElement };
