/** A curve with its band: h between its bounds over one input; outside the published range the line is broken. */
import { figure } from "../figures.js";
import { type PageElement, svg } from "../node.js";
import { along, type Axis, marks } from "./axis.js";

export interface Band {
  readonly says: string;
  readonly x: Axis;
  readonly y: Axis;
  readonly points: readonly {
    readonly x: number;
    readonly h: number;
    readonly low: number;
    readonly high: number;
    readonly inRange: boolean;
  }[];
  /** The case as it stands in the cell. */
  readonly now: number;
  readonly asked: { readonly x: number; readonly h: number | undefined };
}

const size = { width: 300, height: 140 };
const room = { left: 44, right: 8, top: 8, bottom: 20 };

export function bandDrawing(band: Band): PageElement {
  const bottom = size.height - room.bottom;
  const right = size.width - room.right;
  const atX = (value: number): number => round(room.left + along(band.x, value) * (right - room.left));
  const atY = (value: number): number => round(bottom - Math.min(1, Math.max(0, along(band.y, value))) * (bottom - room.top));
  const { points } = band;
  const edge = [
    ...points.map((one) => `${atX(one.x)} ${atY(one.high)}`),
    ...[...points].reverse().map((one) => `${atX(one.x)} ${atY(one.low)}`),
  ];
  const pieces = points.slice(1).map((point, i) => {
    const before = points[i] as (typeof points)[number];
    const isInside = point.inRange && before.inRange;
    return svg("line", {
      class: isInside ? "plot-line" : "plot-line outside",
      x1: atX(before.x),
      y1: atY(before.h),
      x2: atX(point.x),
      y2: atY(point.h),
    });
  });
  return svg(
    "svg",
    { class: "plot", viewBox: `0 0 ${size.width} ${size.height}`, role: "img", "aria-label": band.says },
    ...marks(band.y, 5).flatMap((value) => [
      svg("line", { class: "plot-grid", x1: room.left, x2: right, y1: atY(value), y2: atY(value) }),
      svg("text", { class: "strip-text", x: room.left - 5, y: atY(value) + 4, "text-anchor": "end" }, figure(value, 3)),
    ]),
    ...marks(band.x, 5).map((value) =>
      svg("text", { class: "strip-text", x: atX(value), y: size.height - 5, "text-anchor": "middle" }, figure(value, 4)),
    ),
    svg("line", { class: "strip-axis", x1: room.left, x2: right, y1: bottom, y2: bottom }),
    points.length > 1 && svg("path", { class: "plot-band", d: `M ${edge.join(" L ")} Z` }),
    ...pieces,
    svg("line", { class: "plot-now", x1: atX(band.now), x2: atX(band.now), y1: room.top, y2: bottom }),
    band.asked.h !== undefined && svg("circle", { class: "strip-point", cx: atX(band.asked.x), cy: atY(band.asked.h), r: 5 }),
  );
}

function round(value: number): number {
  return Math.round(value * 10) / 10;
}
