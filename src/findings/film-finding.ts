import { symbolMeaning } from "../correlations/symbols.js";
import { printLine } from "../equations/rewrite.js";
import { coverageProblem, isProblem, type Problem, sentenceOf, valueProblem } from "../quantities/problems.js";
import type { Dimension } from "../quantities/quantity.js";
import { type Interval, boundsOf, scatterAt } from "../surfaces/bounds.js";
import { candidatesFor, labelOf } from "../surfaces/choice.js";
import { valueAt } from "../surfaces/point.js";
import { type Solution, solve } from "../surfaces/solution.js";
import type { Inputs, Surface } from "../surfaces/surface.js";
import { version } from "../version.js";
import { cautionsAt, practice } from "./cautions.js";
import { fullCitation, shortCitation } from "./citation.js";
import type { Alternative, Contribution, EquationShown, Finding, RangeTest, Step, WordValue } from "./finding.js";
import { stepsOf } from "./trace.js";
import { verdictOf } from "./verdict.js";

const outOfRangeHelp = 'Bring the case into range, name another equation, or set "beyond range=flag" to see the number marked.';

/** Solves a case and keeps what any word may ask of it. */
export function findFilm(surface: Surface, inputs: Inputs): Finding {
  const solution = solve(surface, inputs);
  return isProblem(solution) ? new NoFinding(surface, inputs, solution) : new FilmFinding(surface, inputs, solution);
}

/** A case without an answer: given temperatures stay numbers, texts say why, everything else is the problem. */
class NoFinding implements Finding {
  readonly inRange = false;
  readonly answered = false;
  readonly h = undefined;
  readonly hLow = undefined;
  readonly hHigh = undefined;
  readonly functionId: string;
  readonly verdict: string;

  constructor(
    surface: Surface,
    private readonly inputs: Inputs,
    private readonly problem: Problem,
  ) {
    this.functionId = surface.id;
    this.verdict = sentenceOf(problem);
  }

  word(name: string): WordValue {
    const { inputs } = this;
    switch (name) {
      case "verdict":
        return this.verdict;
      case "cautions":
        return [...(inputs.remarks ?? []), this.verdict].join(" ");
      case "equation":
      case "source":
      case "regime":
      case "scatter":
        return "not judged";
      case "version":
        return version;
      case "Tb":
        return { value: inputs.Tb, dimension: "temperature" };
      case "Ts":
        return inputs.wall.kind === "temperature" ? { value: inputs.wall.T, dimension: "temperature" } : this.problem;
      default:
        return this.problem;
    }
  }

  steps(): readonly Step[] {
    return [];
  }
  rangeTests(): readonly RangeTest[] {
    return [];
  }
  contributions(): readonly Contribution[] {
    return [];
  }
  compare(): readonly Alternative[] {
    return [];
  }
  cautions(): readonly string[] {
    return [...(this.inputs.remarks ?? []), this.verdict];
  }
  equation(): EquationShown | undefined {
    return undefined;
  }
}

class FilmFinding implements Finding {
  readonly functionId: string;
  readonly inRange: boolean;
  readonly answered: boolean;
  private interval: Interval | undefined;
  private judged: string | undefined;

  constructor(
    readonly surface: Surface,
    readonly inputs: Inputs,
    readonly solution: Solution,
  ) {
    this.functionId = surface.id;
    this.inRange = solution.point.inRange;
    this.answered = this.inRange || inputs.beyondRange === "flag";
  }

  get verdict(): string {
    this.judged ??= verdictOf(this.solution);
    return this.judged;
  }
  get h(): number | undefined {
    return this.answered ? this.solution.point.h : undefined;
  }
  get hLow(): number | undefined {
    return this.answered ? this.bounds().low.h : undefined;
  }
  get hHigh(): number | undefined {
    return this.answered ? this.bounds().high.h : undefined;
  }

  private bounds(): Interval {
    this.interval ??= boundsOf(this.surface, this.inputs, this.solution);
    return this.interval;
  }

  private refusal(): Problem {
    return coverageProblem(undefined, `${this.verdict}. ${outOfRangeHelp}`);
  }

  word(name: string): WordValue {
    const text = this.textWord(name);
    if (text !== undefined) return text;
    const guarded = this.guardedWord(name);
    if (guarded !== undefined) return this.answered ? guarded() : this.refusal();
    return this.openWord(name);
  }

  /** Words that are text whatever happens. */
  private textWord(name: string): string | undefined {
    const { point } = this.solution;
    const { record } = point.runner;
    switch (name) {
      case "verdict":
        return this.verdict;
      case "cautions": {
        const list = this.cautions();
        return list.length === 0 ? "none" : list.join(" ");
      }
      case "equation":
        return labelOf(record);
      case "source":
        return fullCitation(record.source.work, record.source.at);
      case "scatter":
        return `±${Math.round(1000 * scatterAt(point)) / 10} % (${record.scatter.origin})`;
      case "regime":
        return point.atLimit ? "no driving difference" : this.surface.regime(point.at, (symbol) => valueAt(point, symbol));
      case "version":
        return version;
      default:
        return undefined;
    }
  }

  /** Words that an equation out of its range may not answer. */
  private guardedWord(name: string): (() => WordValue) | undefined {
    const { point } = this.solution;
    const coefficient = (value: number): WordValue => ({ value, dimension: "film coefficient" });
    const flux = (value: number): WordValue => ({ value, dimension: "heat flux" });
    const temperature = (value: number): WordValue => ({ value, dimension: "temperature" });
    const number = (value: number): WordValue => ({ value, dimension: "none" });
    switch (name) {
      case "h":
        return () => coefficient(point.h);
      case "h low":
        return () => coefficient(this.bounds().low.h);
      case "h high":
        return () => coefficient(this.bounds().high.h);
      case "Nu":
        return () => number(point.Nu);
      case "Nu low":
        return () => number(this.bounds().low.Nu);
      case "Nu high":
        return () => number(this.bounds().high.Nu);
      case "q":
        return () => flux(point.q);
      case "q low":
        return () => flux(this.bounds().low.q);
      case "q high":
        return () => flux(this.bounds().high.q);
      case "h conservative":
        return () => this.conservativeCoefficient();
      case "h total":
        return () => this.radiating((hRadiant) => coefficient(point.h + hRadiant));
      case "q total":
        return () => this.radiating(() => flux(point.q + (point.qRadiant ?? 0)));
      case "heat rate":
        return () => this.overArea((area) => ({ value: point.q * area, dimension: "power" }));
      case "Ts max":
        return () => this.hottest();
      case "Ts":
        return this.inputs.wall.kind === "flux" ? () => temperature(point.Ts) : undefined;
      case "Ts low":
        return this.inputs.wall.kind === "flux" ? () => temperature(this.bounds().low.Ts) : undefined;
      case "Ts high":
        return this.inputs.wall.kind === "flux" ? () => temperature(this.bounds().high.Ts) : undefined;
      default:
        return undefined;
    }
  }

  /** Groups, properties and given temperatures: numbers also when the equation is out of its range. */
  private openWord(name: string): WordValue {
    const { point } = this.solution;
    const { inputs } = this;
    switch (name) {
      case "Ts":
      case "Ts low":
      case "Ts high":
        return { value: point.Ts + this.offset("surface", name), dimension: "temperature" };
      case "Tb":
      case "Tb low":
      case "Tb high":
        return { value: inputs.Tb + this.offset("bulk", name), dimension: "temperature" };
      case "Tb conservative":
        return this.conservativeBulk();
      case "reference temperature":
        return { value: this.reference(), dimension: "temperature" };
      case "film temperature":
        return { value: (point.Ts + inputs.Tb) / 2, dimension: "temperature" };
      case "h radiant":
        return this.radiating((hRadiant) => ({ value: hRadiant, dimension: "film coefficient" }));
      case "q radiant":
        return this.radiating(() => ({ value: point.qRadiant ?? 0, dimension: "heat flux" }));
      case "area":
        return this.overArea((area) => ({ value: area, dimension: "area" }));
      default:
        return this.symbolWord(name);
    }
  }

  private symbolWord(name: string): WordValue {
    const known = symbolWords[name] ?? this.surface.words?.[name];
    if (known === undefined) return valueProblem("give", `FILM.${this.functionId} has no ${name}.`);
    if (this.inputs.fluid.densityAssumed === true && needsDensity.has(name)) {
      return coverageProblem("fluid", `${name} is not given: the property table has no density.`);
    }
    const value = valueAt(this.solution.point, known.symbol);
    if (Number.isFinite(value)) return { value, dimension: known.dimension };
    return coverageProblem(undefined, `${name} is not judged: these inputs and this fluid do not give it.`);
  }

  private offset(key: string, name: string): number {
    const half = this.inputs.tolerances.find((tolerance) => tolerance.key === key)?.halfWidth ?? 0;
    return name.endsWith(" low") ? -half : name.endsWith(" high") ? half : 0;
  }

  /** The bulk, or where the surface also sees surroundings at another temperature the equivalent one for h total. */
  private reference(): number {
    const { point } = this.solution;
    const { radiation } = this.inputs;
    if (radiation === undefined || point.hRadiant === undefined || radiation.surroundings === point.Tref) return point.Tref;
    return (point.h * point.Tref + point.hRadiant * radiation.surroundings) / (point.h + point.hRadiant);
  }

  private radiating(then: (hRadiant: number) => WordValue): WordValue {
    const { hRadiant } = this.solution.point;
    return hRadiant === undefined
      ? valueProblem("settings", 'radiation needs both emissivity and surroundings, such as "emissivity=0.9; surroundings=20".')
      : then(hRadiant);
  }

  private overArea(then: (area: number) => WordValue): WordValue {
    const area = this.inputs.area ?? valueAt(this.solution.point, "wettedArea");
    return Number.isFinite(area)
      ? then(area)
      : valueProblem("area", 'the dimensions do not give the area; add the setting area, such as "area=0.5 m2".');
  }

  private hottest(): WordValue {
    const { point } = this.solution;
    if (this.inputs.wall.kind === "temperature") return { value: point.Ts, dimension: "temperature" };
    const factor = this.surface.peak?.(point.at, (symbol) => valueAt(point, symbol));
    if (factor === undefined)
      return coverageProblem("Ts max", "no published equation gives the largest temperature of this surface under a uniform flux.");
    return { value: point.Tref + factor * (point.Ts - point.Tref), dimension: "temperature" };
  }

  private conservativeCoefficient(): WordValue {
    const { concern } = this.inputs;
    if (concern === undefined) return noConcern("h conservative");
    const { point } = this.solution;
    const fluidHeats = point.Tref > point.Ts;
    const wantsHigh = concern === "too hot" ? fluidHeats : !fluidHeats;
    return { value: wantsHigh ? this.bounds().high.h : this.bounds().low.h, dimension: "film coefficient" };
  }

  private conservativeBulk(): WordValue {
    const { concern } = this.inputs;
    if (concern === undefined) return noConcern("Tb conservative");
    return { value: this.inputs.Tb + this.offset("bulk", concern === "too hot" ? "Tb high" : "Tb low"), dimension: "temperature" };
  }

  steps(): readonly Step[] {
    return stepsOf(this.surface, this.inputs, this.solution);
  }

  rangeTests(): readonly RangeTest[] {
    const { point } = this.solution;
    const { record, ranges } = point.runner;
    return ranges.map((range) => {
      const value = point.values[range.slot] as number;
      return {
        symbol: range.symbol,
        meaning: symbolMeaning[range.symbol]?.meaning ?? record.symbols?.[range.symbol] ?? range.symbol,
        value,
        low: range.low,
        high: range.high,
        within: value >= range.low && value <= range.high,
        origin: record.rangeOrigin,
        source: shortCitation(record.source.work),
      };
    });
  }

  contributions(): readonly Contribution[] {
    if (!this.answered) return [];
    return this.bounds().shares.map((share) => ({ cause: share.cause, origin: share.origin, below: share.below.h, above: share.above.h }));
  }

  compare(): readonly Alternative[] {
    const { point } = this.solution;
    const open: Inputs = { ...this.inputs, equation: undefined, beyondRange: "flag" };
    const candidates = candidatesFor(this.surface, { ...point.at, inputs: open });
    if (isProblem(candidates)) return [];
    return (candidates as readonly (typeof point.runner.record)[]).map((record) => this.alternative(record, open));
  }

  private alternative(record: FilmFinding["solution"]["point"]["runner"]["record"], open: Inputs): Alternative {
    const inputs: Inputs = { ...open, only: record };
    const base = {
      id: record.id,
      equation: labelOf(record),
      source: fullCitation(record.source.work, record.source.at),
      chosen: record === this.solution.point.runner.record,
    };
    const solution = solve(this.surface, inputs);
    if (isProblem(solution)) {
      return { ...base, h: undefined, low: undefined, high: undefined, inRange: false, verdict: sentenceOf(solution) };
    }
    const bounds = boundsOf(this.surface, inputs, solution);
    return {
      ...base,
      h: solution.point.h,
      low: bounds.low.h,
      high: bounds.high.h,
      inRange: solution.point.inRange,
      verdict: verdictOf(solution),
    };
  }

  cautions(): readonly string[] {
    const list = cautionsAt(this.solution.point);
    return list.length === 0 ? list : [...list, practice];
  }

  equation(): EquationShown | undefined {
    const { point } = this.solution;
    const { record, lawNames } = point.runner;
    return {
      id: record.id,
      name: labelOf(record),
      source: fullCitation(record.source.work, record.source.at),
      scatter: scatterAt(point),
      scatterOrigin: record.scatter.origin,
      confidence: record.confidence,
      note: record.note ?? "",
      propertiesAt: record.propertiesNote ?? record.propertiesAt,
      lines: point.runner.core.lines.filter((line) => lawNames.has(line.name)).map((line) => [line.name, printLine(line.node)] as const),
    };
  }
}

function noConcern(word: string): Problem {
  return valueProblem("concern", `${word} needs the setting concern: "too hot" or "too cold", whichever must not happen to the part.`);
}

/** Figures that mean nothing where a table without density had 1 kg/m³ put in its place. */
const needsDensity = new Set(["density", "cp", "viscosity", "pressure drop"]);

/** Words that are a symbol of every program. */
export const symbolWords: Readonly<Record<string, { readonly symbol: string; readonly dimension: Dimension }>> = {
  Re: { symbol: "Re", dimension: "none" },
  Gr: { symbol: "Gr", dimension: "none" },
  Ra: { symbol: "Ra", dimension: "none" },
  Pr: { symbol: "Pr", dimension: "none" },
  Ri: { symbol: "Ri", dimension: "none" },
  Pe: { symbol: "Pe", dimension: "none" },
  length: { symbol: "L", dimension: "length" },
  density: { symbol: "rho", dimension: "density" },
  cp: { symbol: "cp", dimension: "specific heat" },
  conductivity: { symbol: "k", dimension: "conductivity" },
  viscosity: { symbol: "mu", dimension: "viscosity" },
  "kinematic viscosity": { symbol: "nu", dimension: "kinematic viscosity" },
  expansivity: { symbol: "beta", dimension: "expansivity" },
};
