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

export const ErrorCode = {
  invalidValue: "#VALUE!",
  notAvailable: "#N/A",
  divisionByZero: "#DIV/0!",
  invalidNumber: "#NUM!",
  nullReference: "#NULL!",
  invalidName: "#NAME?",
  invalidReference: "#REF!",
};

export type PlatformFunction = (...args: unknown[]) => unknown[][];

export interface Bundle {
  readonly functions: Readonly<Record<string, PlatformFunction>>;
  readonly metadata: Metadata;
  readonly realm: vm.Context;
  readonly text: string;
}

export function loadBundle(): Bundle {
  const bundle = join(root, "dist/functions.js");
  if (!existsSync(bundle)) build();
  const functions: Record<string, PlatformFunction> = {};
  const CustomFunctions = {
    associate: (map: Record<string, PlatformFunction>) => Object.assign(functions, map),
    Error: PlatformError,
    ErrorCode,
  };
  const text = readFileSync(bundle, "utf8");
  const realm = loadText(text, { CustomFunctions });
  return { functions, metadata: JSON.parse(readFileSync(join(root, "dist/functions.json"), "utf8")) as Metadata, realm, text };
}

/** Runs the text of a bundle in a realm of its own that has only what is given. */
export function loadText(text: string, given: Readonly<Record<string, unknown>>): vm.Context {
  const realm = vm.createContext({ ...given }, { codeGeneration: { strings: false, wasm: false } });
  vm.runInContext(text, realm, { filename: "functions.js" });
  return realm;
}

export function runIn(realm: vm.Context, line: string): unknown {
  const value: unknown = vm.runInContext(line, realm);
  return Array.isArray(value) ? [...value] : value;
}

function build(): void {
  const { status } = spawnSync(process.execPath, [join(root, "src/hosts/build/build.js")], { stdio: "inherit" });
  if (status !== 0) throw new Error("the build failed");
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
