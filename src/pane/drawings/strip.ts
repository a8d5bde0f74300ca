/** A range strip: the published interval of one group, and where the case lies in it. A pure model, then a drawing of it. */
import type { RangeTest } from "../../findings/finding.js";
import { figure } from "../figures.js";
import { type PageElement, svg } from "../node.js";
import { words } from "../words.js";
import { along, type Axis, marks, markText } from "./axis.js";

export interface Strip {
  readonly axis: Axis;
  /** Ends of the published interval, from 0 to 1 along the axis; `open` where there is no limit. */
  readonly interval: { readonly from: number; readonly to: number; readonly openLow: boolean; readonly openHigh: boolean };
  /** Where the case lies, from 0 to 1; `beyond` where it lies off the drawn axis. */
  readonly point: { readonly at: number; readonly beyond: "low" | "high" | undefined };
  readonly within: boolean;
  readonly marks: readonly { readonly at: number; readonly text: string }[];
  /** The whole strip as a sentence. */
  readonly says: string;
}

const farthest = 3;
const mostMarks = 5;

export function stripOf(test: RangeTest): Strip {
  const axis = axisOf(test);
  const openLow = !Number.isFinite(test.low) || (axis.scale === "log" && test.low <= 0);
  const openHigh = !Number.isFinite(test.high);
  const at = axis.scale === "log" && !(test.value > 0) ? Number.NEGATIVE_INFINITY : along(axis, test.value);
  return {
    axis,
    interval: { from: openLow ? 0 : along(axis, test.low), to: openHigh ? 1 : along(axis, test.high), openLow, openHigh },
    point: { at: Math.min(1, Math.max(0, at)), beyond: at < 0 ? "low" : at > 1 ? "high" : undefined },
    within: test.within,
    marks: marks(axis, mostMarks).map((value) => ({
      at: along(axis, value),
      text: markText(axis, value),
    })),
    says: words.ranges.sentence(test.symbol, figure(test.value), figure(test.low), figure(test.high), test.within, test.source),
  };
}

/** Logarithmic where the interval spans more than a decade and a half, or is open, and everything is above zero. */
function axisOf({ low, high, value }: RangeTest): Axis {
  const wide = low > 0 ? high / low > 30 : low === 0 && (high > 100 || !Number.isFinite(high));
  return wide && value >= 0 ? logAxis(low, high, value) : linearAxis(low, high, value);
}

function logAxis(low: number, high: number, value: number): Axis {
  const point = value > 0 ? Math.log10(value) : undefined;
  const top = Number.isFinite(high) ? Math.log10(high) : Math.max(point ?? 0, low > 0 ? Math.log10(low) : 0) + 2;
  const bottom = low > 0 ? Math.log10(low) : Math.min(point ?? top, top - 4) - 1;
  const from = Math.max(bottom - farthest, Math.min(bottom, point ?? bottom));
  const to = Math.min(top + farthest, Math.max(top, point ?? top));
  return { scale: "log", from: 10 ** (Math.floor(from * 2) / 2 - 0.5), to: 10 ** (Math.ceil(to * 2) / 2 + 0.5) };
}

function linearAxis(low: number, high: number, value: number): Axis {
  const ends = [low, high].filter((one) => Number.isFinite(one));
  const span = ends.length === 2 ? high - low : Math.abs((ends[0] ?? 0) - value) || Math.abs(value) || 1;
  const bottom = Number.isFinite(low) ? low : Math.min(high, value) - span;
  const top = Number.isFinite(high) ? high : Math.max(low, value) + span;
  const from = Math.max(bottom - 2 * span, Math.min(bottom, value));
  const to = Math.min(top + 2 * span, Math.max(top, value));
  const room = 0.12 * (to - from || 1);
  return { scale: "linear", from: from - room, to: to + room };
}

const height = 40;
const middle = 13;

/** Places are in per cent of the width, so that the strip fills its column and its letters keep their size. */
export function stripDrawing(strip: Strip): PageElement {
  const { interval, point } = strip;
  return svg(
    "svg",
    { class: "strip", width: "100%", height, role: "img", "aria-label": strip.says },
    svg("line", { class: "strip-axis", x1: "0%", x2: "100%", y1: middle, y2: middle }),
    svg("rect", {
      class: "strip-interval",
      x: percent(interval.from),
      width: percent(interval.to - interval.from),
      y: middle - 5,
      height: 10,
    }),
    interval.openLow ? arrow(interval.from, "low") : cap(interval.from),
    interval.openHigh ? arrow(interval.to, "high") : cap(interval.to),
    ...strip.marks.flatMap((mark) => markDrawing(mark)),
    pointDrawing(point, strip.within),
  );
}

function percent(part: number): string {
  return `${Math.round(part * 1e4) / 100}%`;
}

/** Shapes of fixed size hang in a nested drawing at a place given in per cent. */
function hung(at: number, ...shapes: readonly PageElement[]): PageElement {
  return svg("svg", { x: percent(at), y: middle, overflow: "visible", class: "hung" }, ...shapes);
}

function cap(at: number): PageElement {
  return svg("line", { class: "strip-cap", x1: percent(at), x2: percent(at), y1: middle - 8, y2: middle + 8 });
}

function arrow(at: number, end: "low" | "high"): PageElement {
  return hung(at, svg("path", { class: "strip-arrow", d: end === "low" ? "M 10 -8 L 1 0 L 10 8" : "M -10 -8 L -1 0 L -10 8" }));
}

function markDrawing(mark: { readonly at: number; readonly text: string }): readonly PageElement[] {
  const anchor = mark.at < 0.08 ? "start" : mark.at > 0.92 ? "end" : "middle";
  return [
    svg("line", { class: "strip-mark", x1: percent(mark.at), x2: percent(mark.at), y1: middle + 5, y2: middle + 10 }),
    svg("text", { class: "strip-text", x: percent(mark.at), y: height - 4, "text-anchor": anchor }, mark.text),
  ];
}

/** Inside a full disc, outside an open diamond, beyond the drawing an arrowhead: told apart without colour. */
function pointDrawing(point: Strip["point"], within: boolean): PageElement {
  if (within) return hung(point.at, svg("circle", { class: "strip-point", r: 6 }));
  if (point.beyond === undefined) return hung(point.at, svg("path", { class: "strip-point outside", d: "M 0 -8 L 8 0 L 0 8 L -8 0 Z" }));
  return hung(
    point.at,
    svg("path", { class: "strip-point outside", d: point.beyond === "low" ? "M 0 0 L 11 -8 L 11 8 Z" : "M 0 0 L -11 -8 L -11 8 Z" }),
  );
}
