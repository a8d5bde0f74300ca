// npm run docs: writes README's table of functions between its markers, from the same documentation that Excel's help is made of.
import { readFileSync, writeFileSync } from "node:fs";
import { dirname, join, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import { readMetadata } from "./metadata-plugin.js";

const root = resolve(dirname(fileURLToPath(import.meta.url)), "../../..");
const begin = "<!-- functions: written by npm run docs -->";
const end = "<!-- /functions -->";

/** The table as Markdown: one row a function. */
export async function functionTable() {
  const { metadata } = await readMetadata(join(root, "src/cells/functions.ts"));
  const rows = metadata.functions.map((one) => {
    const args = one.parameters.map((parameter) => (parameter.optional ? `[${words(parameter.name)}]` : words(parameter.name)));
    return `| \`FILM.${one.name}\` | ${args.join(", ")} | ${one.description} |`;
  });
  return ["| function | arguments | what it gives |", "|---|---|---|", ...rows].join("\n");
}

function words(name) {
  return name.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
}

/** README with its table renewed. */
export function renewed(readme, table) {
  const from = readme.indexOf(begin);
  const to = readme.indexOf(end);
  if (from < 0 || to < from) throw new Error(`README.md lacks the markers ${begin} and ${end}`);
  return `${readme.slice(0, from + begin.length)}\n${table}\n${readme.slice(to)}`;
}

if (process.argv[1] !== undefined && resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  const path = join(root, "README.md");
  writeFileSync(path, renewed(readFileSync(path, "utf8"), await functionTable()));
}
