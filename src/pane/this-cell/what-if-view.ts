/** The part "What if" of a cell: made when it is folded out, moved by a slider that keys and pointers work alike. */
import { fromSI } from "../../quantities/conversion.js";
import { formatQuantity } from "../../quantities/format.js";
import { defaultUnit } from "../../quantities/units.js";
import { axisAround } from "../drawings/axis.js";
import { bandDrawing } from "../drawings/band.js";
import { raisedPowers, shownValue } from "../figures.js";
import { el } from "../node.js";
import { show } from "../render.js";
import { words } from "../words.js";
import { type Case, type Curve, curveOf, findingWith, type Movable } from "./what-if.js";

const steps = 200;

export class WhatIf {
  private curve: Curve | undefined;

  constructor(
    private readonly place: HTMLElement,
    private readonly one: Case,
    private readonly units: "SI" | "US",
    private key: string,
    private readonly chosen: (key: string) => void,
  ) {
    this.draw();
  }

  private get movable(): Movable {
    return (this.one.movables.find((one) => one.key === this.key) ?? this.one.movables[0]) as Movable;
  }

  private draw(): void {
    const { movable } = this;
    this.curve = curveOf(this.one, movable);
    const { from, to } = this.curve;
    const start = Math.round(((movable.value - from) / (to - from)) * steps);
    show(this.place, [
      el("label", { class: "field", for: "what-if-input" }, words.whatIf.input),
      el(
        "select",
        { id: "what-if-input", change: (event) => this.choose((event.target as HTMLSelectElement).value) },
        ...this.one.movables.map((one) => el("option", { value: one.key, selected: one.key === movable.key }, one.name)),
      ),
      el("div", { id: "what-if-plot" }),
      el("input", {
        type: "range",
        id: "what-if-slider",
        min: 0,
        max: steps,
        value: start,
        "aria-label": words.whatIf.slider(movable.name),
        "aria-valuetext": this.shown(movable.value),
        input: (event) => this.ask(event.target as HTMLInputElement),
      }),
      el("p", { id: "what-if-says", role: "status" }),
      el("p", { class: "quiet small" }, words.whatIf.says),
    ]);
    this.answer(movable.value);
  }

  private choose(key: string): void {
    this.key = key;
    this.chosen(key);
    this.draw();
  }

  private ask(slider: HTMLInputElement): void {
    const { from, to } = this.curve as Curve;
    const value = from + ((to - from) * Number(slider.value)) / steps;
    slider.setAttribute("aria-valuetext", this.shown(value));
    this.answer(value);
  }

  private shown(value: number): string {
    return raisedPowers(formatQuantity(value, this.movable.dimension, this.units, 3));
  }

  private answer(value: number): void {
    const { movable, units } = this;
    const curve = this.curve as Curve;
    const finding = findingWith(this.one, movable, value);
    const says = this.place.querySelector<HTMLElement>("#what-if-says");
    const plot = this.place.querySelector<HTMLElement>("#what-if-plot");
    const h = shownValue(finding.word("h"), units, 3);
    if (says !== null) {
      show(says, [
        el("strong", {}, `${movable.name} ${this.shown(value)}: ${h === undefined ? "" : `h ${h}`}`),
        finding.verdict === "in range" ? "" : ` ${raisedPowers(finding.verdict)}`,
      ]);
    }
    if (plot === null || curve.points.length < 2) return;
    const unit = defaultUnit(movable.dimension, units);
    const coefficient = defaultUnit("film coefficient", units);
    const inX = (one: number): number => fromSI(one, unit);
    const inY = (one: number): number => fromSI(one, coefficient);
    const points = curve.points.map((one) => ({ ...one, x: inX(one.x), h: inY(one.h), low: inY(one.low), high: inY(one.high) }));
    // The line gives the height of the plot, so that a wide band out of range does not press it flat.
    const highest = Math.max(...points.map((one) => (one.inRange ? one.high : one.h)));
    show(plot, [
      bandDrawing({
        says: words.whatIf.plot(movable.name, unit.symbol, coefficient.symbol),
        x: { scale: "linear", from: inX(curve.from), to: inX(curve.to) },
        y: axisAround([highest], true),
        points,
        now: inX(movable.value),
        asked: { x: inX(value), h: finding.h === undefined ? undefined : inY(finding.h) },
      }),
      el("p", { class: "quiet small" }, words.whatIf.axes(movable.name, unit.symbol, coefficient.symbol)),
    ]);
  }
}
