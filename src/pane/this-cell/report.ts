/** One call as plain text for a report: everything that a reader needs to check the number, nothing that only a screen can show. */
import type { Explanation } from "../../cells/explanation.js";
import { sentenceOf } from "../../quantities/problems.js";
import { version } from "../../version.js";
import type { ReadCall } from "../cell-reading.js";
import { figure, shownValue } from "../figures.js";
import { words } from "../words.js";
import { settingsShown, stepValue } from "./sections.js";

export function reportText(address: string, formula: string, read: ReadCall, explanation: Explanation): string {
  const { finding, units } = explanation;
  const lines = [
    words.report.heading(read.id, explanation.title),
    `${words.cell(address)}. ${words.report.formula}: ${formula}`,
    "",
    `${words.inputs.title}:`,
    ...explanation.inputs.map((one) => `  ${one.name}: ${one.read === "" ? one.given : one.read}`),
  ];
  if (read.settings !== null) lines.push(`  ${words.inputs.settings}: ${settingsShown(read.settings)}`);
  if (explanation.problems.length > 0) lines.push("", sentenceOf(explanation.problems));
  if (finding !== undefined) {
    for (const word of ["h", "h low", "h high", "q", "Ts", "reference temperature"]) {
      const shown = shownValue(finding.word(word), units);
      if (shown !== undefined) lines.push(`${word}: ${shown}`);
    }
    lines.push(`${words.verdict.title}: ${finding.verdict}`, "");
    const equation = finding.equation();
    if (equation !== undefined) {
      lines.push(
        `${words.equation.title}: ${equation.name}`,
        ...equation.lines.map(([name, algebra]) => `  ${name} = ${algebra}`),
        `  ${words.equation.source}: ${equation.source}`,
      );
      lines.push(`  ${words.equation.scatter(figure(100 * equation.scatter, 3), equation.scatterOrigin)}`, "");
    }
    for (const test of finding.rangeTests())
      lines.push(words.ranges.sentence(test.symbol, figure(test.value), figure(test.low), figure(test.high), test.within, test.source));
    lines.push("", `${words.trace.title}:`);
    for (const step of finding.steps())
      lines.push(`  ${step.symbol} = ${stepValue(step)}   ${step.meaning}${step.line === undefined ? "" : ` = ${step.line}`}`);
    const cautions = finding.cautions();
    if (cautions.length > 0) lines.push("", `${words.cautions.title}:`, ...cautions.map((one) => `  ${one}`));
  }
  lines.push("", words.report.version(version));
  return lines.join("\n");
}
