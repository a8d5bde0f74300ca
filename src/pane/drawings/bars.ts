/** Small bars for lists: a value with its bounds on an axis that all rows share, and the share of one cause. */
import { type PageElement, svg } from "../node.js";
import { along, type Axis } from "./axis.js";

function percent(part: number): string {
  return `${Math.round(Math.min(1, Math.max(0, part)) * 1e4) / 100}%`;
}

/** A whisker from low to high with the value on it; the one that was taken is filled. Decoration: the row says it in figures. */
export function whisker(
  axis: Axis,
  low: number,
  value: number,
  high: number,
  kind: "taken" | "inside" | "outside",
  line?: number,
): PageElement {
  const [from, at, to] = [along(axis, low), along(axis, value), along(axis, high)];
  const middle = 9;
  return svg(
    "svg",
    { class: "whisker", width: "100%", height: 18, "aria-hidden": "true" },
    line !== undefined &&
      svg("line", { class: "whisker-line", x1: percent(along(axis, line)), x2: percent(along(axis, line)), y1: 0, y2: 18 }),
    svg("line", { class: `whisker-bar ${kind}`, x1: percent(from), x2: percent(to), y1: middle, y2: middle }),
    svg("line", { class: `whisker-bar ${kind}`, x1: percent(from), x2: percent(from), y1: middle - 4, y2: middle + 4 }),
    svg("line", { class: `whisker-bar ${kind}`, x1: percent(to), x2: percent(to), y1: middle - 4, y2: middle + 4 }),
    kind === "outside"
      ? svg(
          "svg",
          { x: percent(at), y: middle, overflow: "visible" },
          svg("path", { class: "whisker-point outside", d: "M 0 -5 L 5 0 L 0 5 L -5 0 Z" }),
        )
      : svg("circle", { class: `whisker-point ${kind}`, cx: percent(at), cy: middle, r: kind === "taken" ? 5 : 4 }),
  );
}

/** How far a cause moves the result down and up, from the middle; 1 is the largest of the list. */
export function tug(below: number, above: number): PageElement {
  return svg(
    "svg",
    { class: "tug", width: "100%", height: 10, "aria-hidden": "true" },
    svg("rect", { class: "tug-below", x: percent(0.5 - below / 2), width: percent(below / 2), y: 1, height: 8 }),
    svg("rect", { class: "tug-above", x: "50%", width: percent(above / 2), y: 1, height: 8 }),
    svg("line", { class: "tug-middle", x1: "50%", x2: "50%", y1: 0, y2: 10 }),
  );
}
