/** A small line plot: one quantity against another, its axes marked with round values. A pure model of points in, a drawing out. */
import { figure } from "../figures.js";
import { type PageElement, svg } from "../node.js";
import { along, type Axis, marks } from "./axis.js";

export interface Plot {
  /** In words, for those who do not see it. */
  readonly says: string;
  readonly x: Axis;
  readonly y: Axis;
  readonly points: readonly (readonly [x: number, y: number])[];
}

const size = { width: 300, height: 110 };
const room = { left: 46, right: 8, top: 8, bottom: 20 };

export function plotDrawing(plot: Plot): PageElement {
  const atX = (value: number): number => round(room.left + along(plot.x, value) * (size.width - room.left - room.right));
  const atY = (value: number): number => round(size.height - room.bottom - along(plot.y, value) * (size.height - room.top - room.bottom));
  const line = plot.points.map(([x, y], i) => `${i === 0 ? "M" : "L"} ${atX(x)} ${atY(y)}`).join(" ");
  const bottom = size.height - room.bottom;
  return svg(
    "svg",
    { class: "plot", viewBox: `0 0 ${size.width} ${size.height}`, role: "img", "aria-label": plot.says },
    ...marks(plot.y, 4).flatMap((value) => [
      svg("line", { class: "plot-grid", x1: room.left, x2: size.width - room.right, y1: atY(value), y2: atY(value) }),
      svg("text", { class: "strip-text", x: room.left - 5, y: atY(value) + 4, "text-anchor": "end" }, figure(value, 3)),
    ]),
    ...marks(plot.x, 5).map((value) =>
      svg("text", { class: "strip-text", x: atX(value), y: size.height - 5, "text-anchor": "middle" }, figure(value, 4)),
    ),
    svg("line", { class: "strip-axis", x1: room.left, x2: size.width - room.right, y1: bottom, y2: bottom }),
    svg("path", { class: "plot-line", d: line }),
  );
}

function round(value: number): number {
  return Math.round(value * 10) / 10;
}
