import { symbolMeaning } from "../correlations/symbols.js";
import { printLine } from "../equations/rewrite.js";
import { formatNumber, formatQuantity } from "../quantities/format.js";
import { wholeValues } from "../surfaces/point.js";
import type { Solution } from "../surfaces/solution.js";
import type { Inputs, Surface } from "../surfaces/surface.js";
import { fullCitation, shortCitation } from "./citation.js";
import type { Step } from "./finding.js";

/** Every step from the inputs to h, in the order it is worked out. */
export function stepsOf(surface: Surface, inputs: Inputs, solution: Solution): readonly Step[] {
  const { point } = solution;
  const { runner } = point;
  const { program, lines } = runner.whole();
  const values = wholeValues(point);
  const meaningOf = (symbol: string): { meaning: string; unit: string } => {
    const own = runner.record.symbols?.[symbol];
    const argument = surface.arguments.find((one) => one.key === symbol);
    const known = symbolMeaning[symbol];
    return { meaning: known?.meaning ?? own ?? argument?.describe ?? symbol, unit: known?.unit ?? unitOf(argument?.dimensions[0]) };
  };
  const steps = program.inputs.map((symbol): Step => {
    const value = values[program.slot(symbol)] as number;
    return { symbol, ...meaningOf(symbol), value: finite(value), ...origin(symbol, inputs, solution) };
  });
  for (const line of lines) {
    const value = values[program.slot(line.name)] as number;
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

const propertySymbol = /^(rho|cp|k|mu|beta)(_b|_w)?$/;

/** Where an input of the algebra comes from, and of a property where it was taken and whose formulation it is. */
function origin(symbol: string, inputs: Inputs, solution: Solution): { kind: Step["kind"]; note?: string; tolerance?: number } {
  const { point } = solution;
  const property = propertySymbol.exec(symbol);
  if (property !== null) {
    const fraction = property[2] === "_b" ? 0 : property[2] === "_w" ? 1 : point.runner.fraction;
    return { kind: "property", note: stateNote(inputs, inputs.Tb + fraction * (point.Ts - inputs.Tb)) };
  }
  switch (symbol) {
    case "Ts":
      return inputs.wall.kind === "flux"
        ? { kind: "solved", note: `found by the balance; residual ${formatNumber(solution.residual ?? 0)} W/m²` }
        : { kind: "input", ...tolerance(inputs, "surface") };
    case "Tb":
      return { kind: "input", ...tolerance(inputs, "bulk") };
    case "gravity":
    case "pressure":
      return { kind: "setting", ...tolerance(inputs, symbol) };
    case "q_wall":
      return { kind: "input", ...tolerance(inputs, "surface") };
    default:
      return { kind: "input", ...tolerance(inputs, symbol) };
  }
}

function stateNote(inputs: Inputs, T: number): string {
  const sources = inputs.fluid.sources.map(shortCitation).join("; ");
  const place = `${inputs.fluid.name} at ${formatQuantity(T, "temperature", "SI", 6)}, ${formatQuantity(inputs.pressure, "pressure", "SI", 6)}`;
  return sources === "" ? place : `${place}; ${sources}`;
}

function tolerance(inputs: Inputs, key: string): { tolerance?: number } {
  const found = inputs.tolerances.find((one) => one.key === key);
  return found === undefined ? {} : { tolerance: found.halfWidth };
}
