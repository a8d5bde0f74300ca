import type { Problem } from "../quantities/problems.js";
import { isProblem, sentenceOf } from "../quantities/problems.js";
import { alwaysText } from "../findings/words.js";
import { version } from "../version.js";
import type { Cases } from "./cases.js";
import { CellError, type CellValue } from "./cell.js";
import { errorOf } from "./render.js";
import { isWanted, type Request, type Wanted } from "./request.js";

/** Lays the answers of all cases out: words lie along the axis that the cases leave free. */
export function layOut(request: Request, cases: Cases, answerCase: (row: number, column: number) => CellValue[]): CellValue[][] {
  const { rows, columns } = cases;
  if (rows > 1 && columns > 1) {
    if (request.wanted.length > 1) {
      const sentence = `give: holds ${request.wanted.length} words, but the cases are a grid of ${rows} × ${columns}; a grid takes one word.`;
      return [[new CellError("#VALUE!", sentence)]];
    }
    const cells: CellValue[][] = new Array(rows);
    for (let row = 0; row < rows; row++) {
      const line: CellValue[] = new Array(columns);
      for (let column = 0; column < columns; column++) line[column] = answerCase(row, column)[0] as CellValue;
      cells[row] = line;
    }
    return cells;
  }
  if (rows > 1) {
    const cells: CellValue[][] = new Array(rows);
    for (let row = 0; row < rows; row++) cells[row] = answerCase(row, 0);
    return cells;
  }
  if (columns > 1) {
    const answers = Array.from({ length: columns }, (_, column) => answerCase(0, column));
    return request.wanted.map((_, word) => answers.map((one) => one[word] as CellValue));
  }
  return upright(request, answerCase(0, 0));
}

function upright(request: Request, cells: CellValue[]): CellValue[][] {
  return request.columns === 1 ? cells.map((cell) => [cell]) : [cells];
}

/** What a call shows where its arguments are wrong for every case. */
export function problemsEverywhere(problems: readonly Problem[], request: Request | Problem): CellValue[][] {
  if (isProblem(request)) return [[errorOf(problems)]];
  return upright(request, problemCells(problems, request));
}

/** Text words say what is wrong even when the arguments are; numbers become the error. */
export function problemCells(problems: readonly Problem[], request: Request): CellValue[] {
  return request.wanted.map((one) => (isWanted(one) ? textOrError(one, problems) : unanswered(one)));
}

export function unanswered(one: Problem | undefined): CellValue {
  return one === undefined ? "" : errorOf(one);
}

function textOrError(one: Wanted, problems: readonly Problem[]): CellValue {
  if (one.word.name === "version") return version;
  if (!alwaysText.has(one.word.name)) return errorOf(problems);
  return one.word.name === "verdict" || one.word.name === "cautions" ? sentenceOf(problems) : "not judged";
}
