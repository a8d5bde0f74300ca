/** Tabulated constants lowered to nested IFs, so that they compile, print and typeset like any other line. */
import { binaryNode, callNode, type Node, nameNode, numberNode } from "./line.js";

/**
 * `step`: the first row whose limit is not below the value; `linear`: straight between rows; both hold their ends.
 * `key`: by word, no number for an unknown word. `bilinear`: z[ix][iy], ends held.
 */
export type Table =
  | { readonly of: string; readonly how: "step" | "linear"; readonly rows: readonly (readonly [number, number])[] }
  | { readonly of: string; readonly how: "key"; readonly rows: readonly (readonly [string, number])[] }
  | {
      readonly of: readonly [string, string];
      readonly how: "bilinear";
      readonly x: readonly number[];
      readonly y: readonly number[];
      readonly z: readonly (readonly number[])[];
    };

/** The tree that gives the table's value in the symbols it is of. Throws where rows are missing, unsorted or ragged. */
export function lowerTable(name: string, table: Table): Node {
  switch (table.how) {
    case "key":
      return keys(table.of, table.rows);
    case "step":
      return steps(table.of, checked(name, table.rows));
    case "linear":
      return linear(table.of, checked(name, table.rows));
    case "bilinear":
      return bilinear(name, table);
  }
}

function checked(name: string, rows: readonly (readonly [number, number])[]): readonly (readonly [number, number])[] {
  const ascending = rows.every(([limit], i) => i === 0 || limit > (rows[i - 1]?.[0] ?? Number.NaN));
  if (rows.length === 0 || !ascending) throw new Error(`The table ${name} needs rows in ascending order.`);
  return rows;
}

/** An unknown word gives 0/0: an error in a sheet, not a number in ours; the surface refuses it by name before. */
function keys(of: string, rows: readonly (readonly [string, number])[]): Node {
  const unknown: Node = binaryNode("/", numberNode(0), numberNode(0));
  return rows.reduceRight<Node>(
    (otherwise, [word, value]) =>
      callNode("IF", binaryNode("=", nameNode(of), { kind: "text", value: word }), numberNode(value), otherwise),
    unknown,
  );
}

function steps(of: string, rows: readonly (readonly [number, number])[]): Node {
  return choose(
    of,
    rows.slice(0, -1).map(([limit]) => limit),
    rows.map(([, value]) => numberNode(value)),
  );
}

function linear(of: string, rows: readonly (readonly [number, number])[]): Node {
  const values = rows.map(([, value]) => numberNode(value));
  return between(
    of,
    rows.map(([limit]) => limit),
    values,
  );
}

function bilinear(name: string, table: Table & { how: "bilinear" }): Node {
  const [ofX, ofY] = table.of;
  const whole = table.z.length === table.x.length && table.z.every((row) => row.length === table.y.length);
  if (!whole) throw new Error(`The table ${name} needs ${table.x.length} rows of ${table.y.length} values.`);
  const rows = table.z.map((row) => between(ofY, table.y, row.map(numberNode)));
  return between(ofX, table.x, rows);
}

/** Straight between the knots, ends held. */
function between(of: string, knots: readonly number[], values: readonly Node[]): Node {
  const inner = knots.slice(1).map((knot, i) => {
    const [from, low, high] = [knots[i] as number, values[i] as Node, values[i + 1] as Node];
    return { knot, piece: piece(of, from, knot, low, high) };
  });
  return choose(of, knots, [values[0] as Node, ...inner.map((one) => one.piece), values[values.length - 1] as Node]);
}

function piece(of: string, from: number, to: number, low: Node, high: Node): Node {
  if (sameNumber(low, high)) return low;
  const along = binaryNode("-", nameNode(of), numberNode(from));
  const rise = binaryNode("-", high, low);
  const run = binaryNode("-", numberNode(to), numberNode(from));
  return binaryNode("+", low, binaryNode("/", binaryNode("*", along, rise), run));
}

function sameNumber(a: Node, b: Node): boolean {
  return a.kind === "number" && b.kind === "number" && a.value === b.value;
}

/** The first choice whose limit is not below the symbol, the last choice otherwise; halved while long, so that nesting stays shallow. */
function choose(of: string, limits: readonly number[], choices: readonly Node[]): Node {
  if (limits.length === 0) return choices[0] as Node;
  const at = limits.length > longestChain ? Math.floor(limits.length / 2) : 0;
  const test = binaryNode("<=", nameNode(of), numberNode(limits[at] as number));
  return callNode(
    "IF",
    test,
    choose(of, limits.slice(0, at), choices.slice(0, at + 1)),
    choose(of, limits.slice(at + 1), choices.slice(at + 1)),
  );
}

/** A longer chain reads badly and nests too deep. */
const longestChain = 16;
