/** The cell functions as the embedded sheet takes them: the same metadata and the same implementation as Excel gets. */
import {
  ArrayValueObject,
  BaseFunction,
  type BaseValueObject,
  BooleanValueObject,
  ErrorType,
  ErrorValueObject,
  FunctionType,
  type IFunctionInfo,
  NumberValueObject,
  StringValueObject,
} from "@univerjs/preset-sheets-core";
import { CellError, isErrorCell } from "../../cells/cell.js";

/** What `functions.json` says of one function, as far as the sheet needs it. */
export interface FunctionEntry {
  readonly id: string;
  readonly name: string;
  readonly description?: string;
  readonly parameters: readonly ParameterEntry[];
}

export interface ParameterEntry {
  readonly name: string;
  readonly description?: string;
  readonly optional?: boolean;
}

export type Implementation = (...args: readonly unknown[]) => unknown;

const namespace = "FILM";
/** A whole column is cut where its last value stands, so that no call gets a million blanks. */
const mostRows = 200_000;

type FunctionClass = new (name: string) => BaseFunction;

export function sheetFunctions(
  entries: readonly FunctionEntry[],
  implementations: Readonly<Record<string, Implementation>>,
): { readonly function: [FunctionClass, string][]; readonly description: IFunctionInfo[] } {
  const known = entries.filter((entry) => implementations[entry.id] !== undefined);
  return {
    function: known.map((entry) => [classOf(entry, implementations[entry.id] as Implementation), nameOf(entry)]),
    description: known.map(describe),
  };
}

function nameOf(entry: FunctionEntry): string {
  return `${namespace}.${entry.name.toUpperCase()}`;
}

function classOf(entry: FunctionEntry, implementation: Implementation): FunctionClass {
  const { parameters } = entry;
  return class extends BaseFunction {
    override minParams = parameters.filter((one) => one.optional !== true).length;
    override maxParams = parameters.length;
    override needsExpandParams = false;

    override calculate(...args: BaseValueObject[]): BaseValueObject {
      return resultOf(implementation(...parameters.map((_, i) => blockOf(args[i]))));
    }
  };
}

/** An omitted argument is null; everything else a block, as Excel hands it over. */
function blockOf(argument: BaseValueObject | undefined): unknown[][] | null {
  if (argument === undefined || (argument.isNull() && !argument.isArray())) return null;
  if (!argument.isArray()) return [[cellOf(argument)]];
  const array = argument as ArrayValueObject;
  const rows = Math.min(array.getRowCount(), mostRows);
  const columns = array.getColumnCount();
  const values = array.getArrayValue();
  const block: unknown[][] = [];
  for (let row = 0; row < rows; row++) {
    const line: unknown[] = [];
    for (let column = 0; column < columns; column++) line.push(cellOf(values[row]?.[column]));
    block.push(line);
  }
  return block;
}

function cellOf(value: BaseValueObject | null | undefined | void): unknown {
  if (!value || value.isNull()) return "";
  if (value.isError())
    return new CellError((value as ErrorValueObject).getErrorType() as CellError["code"], (value as ErrorValueObject).getErrorContent());
  return value.getValue();
}

function resultOf(result: unknown): BaseValueObject {
  if (!Array.isArray(result)) return valueFor(result);
  const rows = result as readonly (readonly unknown[])[];
  if (rows.length === 1 && rows[0]?.length === 1) return valueFor(rows[0][0]);
  return ArrayValueObject.create({
    calculateValueList: rows.map((row) => row.map(valueFor)),
    rowCount: rows.length,
    columnCount: rows[0]?.length ?? 0,
    unitId: "",
    sheetId: "",
    row: -1,
    column: -1,
  });
}

const errorTypes: ReadonlySet<string> = new Set(Object.values(ErrorType));

function valueFor(cell: unknown): BaseValueObject {
  if (typeof cell === "number") return Number.isFinite(cell) ? NumberValueObject.create(cell) : ErrorValueObject.create(ErrorType.NUM);
  if (typeof cell === "boolean") return BooleanValueObject.create(cell);
  if (isErrorCell(cell))
    return ErrorValueObject.create((errorTypes.has(cell.code) ? cell.code : ErrorType.VALUE) as ErrorType, cell.message);
  return StringValueObject.create(cell === null || cell === undefined ? "" : String(cell));
}

function describe(entry: FunctionEntry): IFunctionInfo {
  return {
    functionName: nameOf(entry),
    functionType: FunctionType.User,
    description: entry.description ?? "",
    abstract: entry.description ?? "",
    functionParameter: entry.parameters.map((one) => ({
      name: one.name,
      detail: one.description ?? "",
      example: examples[one.name] ?? one.name,
      require: one.optional === true ? 0 : 1,
      repeat: 0,
    })),
  };
}

const examples: Readonly<Record<string, string>> = {
  fluid: '"air"',
  surface: "80",
  wall: "60",
  bulk: "20",
  height: "0.3",
  length: "0.5",
  width: "0.2",
  diameter: "0.05",
  speed: "2",
  flow: "1",
  temperature: "20",
  give: '"verdict"',
  settings: '"pressure=2 bar"',
};
