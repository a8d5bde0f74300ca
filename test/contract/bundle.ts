// The built functions.js in a bare realm: no DOM, no office.js, no evaluation of text; only a stand-in for the platform.
import { spawnSync } from "node:child_process";
import { existsSync, readFileSync } from "node:fs";
import { join, resolve } from "node:path";
import vm from "node:vm";

const root = resolve(import.meta.dirname, "../..");

export class PlatformError {
  constructor(
    readonly code: string,
    readonly message?: string,
  ) {}
}

const ErrorCode = {
  invalidValue: "#VALUE!",
  notAvailable: "#N/A",
  divisionByZero: "#DIV/0!",
  invalidNumber: "#NUM!",
  nullReference: "#NULL!",
  invalidName: "#NAME?",
  invalidReference: "#REF!",
};

export type PlatformFunction = (...args: unknown[]) => unknown[][];

export function loadBundle(): { readonly functions: Readonly<Record<string, PlatformFunction>>; readonly metadata: Metadata } {
  const bundle = join(root, "dist/functions.js");
  if (!existsSync(bundle)) {
    const { status } = spawnSync(process.execPath, [join(root, "src/hosts/build/build.js")], { stdio: "inherit" });
    if (status !== 0) throw new Error("the build failed");
  }
  const functions: Record<string, PlatformFunction> = {};
  const CustomFunctions = {
    associate: (map: Record<string, PlatformFunction>) => Object.assign(functions, map),
    Error: PlatformError,
    ErrorCode,
  };
  const realm = vm.createContext({ CustomFunctions }, { codeGeneration: { strings: false, wasm: false } });
  vm.runInContext(readFileSync(bundle, "utf8"), realm, { filename: "functions.js" });
  return { functions, metadata: JSON.parse(readFileSync(join(root, "dist/functions.json"), "utf8")) as Metadata };
}

export interface Metadata {
  readonly allowErrorForDataTypeAny?: boolean;
  readonly functions: readonly {
    readonly id: string;
    readonly name: string;
    readonly description: string;
    readonly parameters: readonly {
      readonly name: string;
      readonly type: string;
      readonly dimensionality: string;
      readonly optional?: boolean;
      readonly description?: string;
    }[];
    readonly result: { readonly dimensionality: string };
  }[];
}
