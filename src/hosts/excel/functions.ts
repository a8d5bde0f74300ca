// The functions bundle: loads in a bare JavaScript realm that has only CustomFunctions. The build adds one call that
// associates each id of the metadata with the function exported here under its name.
import { CellError } from "../../cells/cell.js";
import * as functions from "../../cells/functions.js";

interface PlatformErrors {
  readonly Error?: new (code: string, message?: string) => unknown;
  readonly ErrorCode?: Readonly<Record<string, string>>;
}

declare const CustomFunctions: PlatformErrors;

type CellFunction = (...blocks: any[]) => unknown[][];

const codes: Readonly<Record<string, string>> = {
  "#VALUE!": "invalidValue",
  "#N/A": "notAvailable",
  "#DIV/0!": "divisionByZero",
  "#NUM!": "invalidNumber",
  "#NAME?": "invalidName",
  "#NULL!": "nullReference",
  "#REF!": "invalidReference",
};

function platformError(error: CellError): unknown {
  const { Error: PlatformError, ErrorCode } = CustomFunctions;
  if (PlatformError === undefined) return { code: error.code, message: error.message };
  const code = ErrorCode?.[codes[error.code] ?? "notAvailable"] ?? error.code;
  // Only #VALUE! and #N/A show a message; an empty one would hide the platform's own.
  return error.message === "" ? new PlatformError(code) : new PlatformError(code, error.message);
}

function platformCell(cell: unknown): unknown {
  if (cell instanceof CellError) return platformError(cell);
  if (typeof cell === "number") return Number.isFinite(cell) ? cell : platformError(new CellError("#N/A", "There is no number here."));
  return cell ?? "";
}

/** What comes after the declared parameters, such as the invocation object, is not ours to read. */
function forPlatform(inner: CellFunction): CellFunction {
  return (...blocks) => inner(...blocks.slice(0, inner.length)).map((row) => row.map(platformCell));
}

/** The functions by the name they are exported under, as the platform is to call them. */
export const platformFunctions: Readonly<Record<string, CellFunction>> = Object.fromEntries(
  Object.entries(functions).map(([name, inner]) => [name, forPlatform(inner as CellFunction)]),
);
