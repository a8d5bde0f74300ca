import { symbolMeaning } from "../correlations/symbols.js";
import { printLine } from "../equations/rewrite.js";
import { formatNumber, formatQuantity } from "../quantities/format.js";
import type { Feed } from "../surfaces/runner.js";
import type { Solution } from "../surfaces/solution.js";
import type { Inputs, Surface } from "../surfaces/surface.js";
import { fullCitation } from "./citation.js";
import type { Step } from "./finding.js";

/** Every step from the inputs to h, in the order it is worked out. */
export function stepsOf(surface: Surface, inputs: Inputs, solution: Solution): readonly Step[] {
  const { point } = solution;
  const { runner, values } = point;
  const meaningOf = (symbol: string): { meaning: string; unit: string } => {
    const own = runner.record.symbols?.[symbol];
    const argument = surface.arguments.find((one) => one.key === symbol);
    const known = symbolMeaning[symbol];
    return { meaning: known?.meaning ?? own ?? argument?.describe ?? symbol, unit: known?.unit ?? unitOf(argument?.dimensions[0]) };
  };
  const steps: Step[] = runner.feeds.map((feed) => {
    const symbol = runner.program.inputs.find((name) => runner.program.slot(name) === feed.slot) as string;
    return { symbol, ...meaningOf(symbol), value: finite(values[feed.slot] as number), ...origin(feed, inputs, solution) };
  });
  for (const line of runner.lines) {
    const value = values[runner.program.slot(line.name)] as number;
    const isLaw = runner.lawNames.has(line.name);
    const replaced = point.atLimit && (isLaw || line.name === "Nu");
    steps.push({
      symbol: line.name,
      ...meaningOf(line.name),
      value: finite(value),
      kind: isLaw ? "equation" : line.name === "h" || line.name === "q" ? "result" : "group",
      line: printLine(line.node),
      ...(replaced
        ? { note: `the limit as ${runner.record.limit?.of} goes to zero stands in` }
        : isLaw
          ? { note: fullCitation(runner.record.source.work, runner.record.source.at) }
          : {}),
    });
  }
  return steps;
}

function finite(value: number): number | string {
  return Number.isFinite(value) ? value : "not judged";
}

function unitOf(dimension: string | undefined): string {
  return dimension === "length" ? "m" : dimension === "speed" ? "m/s" : "";
}

function origin(feed: Feed, inputs: Inputs, solution: Solution): { kind: Step["kind"]; note?: string; tolerance?: number } {
  const { point } = solution;
  const { runner } = point;
  const sources = inputs.fluid.sources.map((work) => fullCitation(work)).join("; ");
  const at = (T: number): string =>
    `${inputs.fluid.name} at ${formatQuantity(T, "temperature", "SI")}, ${formatQuantity(inputs.pressure, "pressure", "SI")}${sources === "" ? "" : `; ${sources}`}`;
  switch (feed.from) {
    case "property":
      return { kind: "property", note: at(inputs.Tb + runner.fraction * (point.Ts - inputs.Tb)) };
    case "bulk":
      return { kind: "property", note: at(inputs.Tb) };
    case "wall":
      return { kind: "property", note: at(point.Ts) };
    case "Ts":
      return inputs.wall.kind === "flux"
        ? { kind: "solved", note: `found by the balance; residual ${formatNumber(solution.residual ?? 0)} W/m²` }
        : { kind: "input", ...tolerance(inputs, "surface") };
    case "Tb":
      return { kind: "input", ...tolerance(inputs, "bulk") };
    case "gravity":
    case "pressure":
      return { kind: "setting", ...tolerance(inputs, feed.from) };
    case "flux":
      return { kind: "input", ...tolerance(inputs, "surface") };
    default:
      return { kind: "input", ...tolerance(inputs, feed.key) };
  }
}

function tolerance(inputs: Inputs, key: string): { tolerance?: number } {
  const found = inputs.tolerances.find((one) => one.key === key);
  return found === undefined ? {} : { tolerance: found.halfWidth };
}
