// A webpack plugin: reads the documented wrappers, writes functions.json, and appends to the functions bundle the one
// call that associates each id with its function. Any disagreement between the two fails the build.
import { generateCustomFunctionsMetadata } from "custom-functions-metadata";

const name = "FilmbookMetadata";

/** Metadata and the association of ids with exported names; throws with every fault found. */
export async function readMetadata(source) {
  const { metadataJson, associate, errors } = await generateCustomFunctionsMetadata(source);
  if (errors.length > 0) throw new Error(`${source}: ${errors.join("; ")}`);
  const metadata = JSON.parse(metadataJson);
  // Error cells among the inputs must reach the functions, so that one bad row does not spoil a table.
  metadata.allowErrorForDataTypeAny = true;
  return { metadata, associate };
}

/** What is wrong between the ids of the metadata and the functions exported; empty when they agree. */
export function disagreements(metadata, associate, exported) {
  const faults = [];
  const ids = metadata.functions.map((one) => one.id);
  const twice = ids.filter((id, i) => ids.indexOf(id) !== i);
  if (twice.length > 0) faults.push(`ids given twice: ${twice.join(", ")}`);
  const associated = new Map(associate.map((one) => [one.id, one.functionName]));
  for (const id of ids) {
    const functionName = associated.get(id);
    if (functionName === undefined || !exported.includes(functionName)) faults.push(`${id} has no implementation`);
  }
  const known = new Set(associated.values());
  for (const one of exported) if (!known.has(one)) faults.push(`${one} is exported but has no id`);
  return faults;
}

/** Names that a module exports as functions, read from its text. */
export function exportedFunctions(text) {
  return [...text.matchAll(/^export (?:async )?function (\w+)/gm)].map((match) => match[1]);
}

/** Exports of any other form: the generator passes them over in silence, so they would be functions without an id. */
export function strayExports(text) {
  const lines = [...text.matchAll(/^export (?!(?:async )?function \w)(.*)$/gm)];
  return lines.map((match) => `"export ${match[1].trim()}" is no top-level function declaration, so it has no id`);
}

export class MetadataPlugin {
  constructor({ source, bundle, library }) {
    Object.assign(this, { source, bundle, library });
  }

  apply(compiler) {
    compiler.hooks.thisCompilation.tap(name, (compilation) => {
      const { Compilation, sources } = compiler.webpack;
      compilation.fileDependencies.add(this.source);
      compilation.hooks.processAssets.tapPromise({ name, stage: Compilation.PROCESS_ASSETS_STAGE_REPORT }, async () => {
        try {
          const { metadata, associate } = await readMetadata(this.source);
          const text = compiler.inputFileSystem.readFileSync(this.source, "utf8").toString();
          const faults = [...disagreements(metadata, associate, exportedFunctions(text)), ...strayExports(text)];
          if (faults.length > 0) throw new Error(faults.join("; "));
          compilation.emitAsset("functions.json", new sources.RawSource(`${JSON.stringify(metadata, null, 1)}\n`));
          const pairs = associate.map((one) => `${JSON.stringify(one.id)}:${this.library}.${one.functionName}`);
          const call = `\nCustomFunctions.associate({${pairs.join(",")}});\n`;
          compilation.updateAsset(this.bundle, (old) => new sources.ConcatSource(old, call));
        } catch (fault) {
          compilation.errors.push(new compiler.webpack.WebpackError(`cell functions: ${fault.message}`));
        }
      });
    });
  }
}
