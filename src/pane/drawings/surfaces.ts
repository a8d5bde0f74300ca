/** Our own line drawings of the surfaces: the solid hatched, the wetted face heavy, the fluid by arrows. */
import { type PageElement, svg } from "../node.js";

interface Sketch {
  /** Outline of the solid, closed. */
  readonly solid?: string;
  /** The wetted face. */
  readonly face: string;
  /** Paths of the fluid, each with a head at its end. */
  readonly flows: readonly string[];
}

/** On a field of 72 by 54, the origin at the upper left. */
const sketches: Readonly<Record<string, Sketch>> = {
  "FREE.PLATE": {
    solid: "M 26 5 H 36 V 49 H 26 Z",
    face: "M 36 5 V 49",
    flows: ["M 43 46 C 42 34 42 24 44 10", "M 52 48 C 49 36 47 26 49 12"],
  },
  "FREE.TOPFACE": {
    solid: "M 10 36 H 62 V 46 H 10 Z",
    face: "M 10 36 H 62",
    flows: ["M 5 30 C 18 33 28 32 30 8", "M 67 30 C 54 33 44 32 42 8"],
  },
  "FREE.UNDERSIDE": {
    solid: "M 10 8 H 62 V 18 H 10 Z",
    face: "M 10 18 H 62",
    flows: ["M 32 26 C 18 25 8 24 5 8", "M 40 26 C 54 25 64 24 67 8"],
  },
  "FREE.CYLINDER": {
    solid: "M 36 18 A 13 13 0 1 1 35.9 18 Z",
    face: "M 36 18 A 13 13 0 1 1 35.9 18",
    flows: ["M 28 50 C 14 40 16 20 33 6", "M 44 50 C 58 40 56 20 39 6"],
  },
  "FREE.POST": {
    solid: "M 29 6 H 43 V 48 H 29 Z",
    face: "M 29 6 V 48 M 43 6 V 48",
    flows: ["M 22 48 C 24 34 24 22 22 8", "M 50 48 C 48 34 48 22 50 8"],
  },
  "FREE.SPHERE": {
    solid: "M 36 16 A 14 14 0 1 1 35.9 16 Z M 22 30 C 28 35 44 35 50 30",
    face: "M 36 16 A 14 14 0 1 1 35.9 16",
    flows: ["M 28 51 C 12 40 15 18 33 5", "M 44 51 C 60 40 57 18 39 5"],
  },
  "FORCED.PLATE": {
    solid: "M 12 36 H 64 V 44 H 12 Z",
    face: "M 12 36 H 64",
    flows: ["M 3 14 H 22", "M 3 23 H 22", "M 26 30 C 38 29 50 27 66 22"],
  },
  "FORCED.CYLINDER": {
    solid: "M 42 15 A 12 12 0 1 1 41.9 15 Z",
    face: "M 42 15 A 12 12 0 1 1 41.9 15",
    flows: ["M 3 27 H 24", "M 3 17 C 20 17 26 8 44 8 C 54 8 60 12 68 14", "M 3 37 C 20 37 26 46 44 46 C 54 46 60 42 68 40"],
  },
  "FORCED.SPHERE": {
    solid: "M 42 14 A 13 13 0 1 1 41.9 14 Z M 29 27 C 35 31 49 31 55 27",
    face: "M 42 14 A 13 13 0 1 1 41.9 14",
    flows: ["M 3 27 H 23", "M 3 16 C 20 16 26 7 44 7 C 54 7 60 11 68 13", "M 3 38 C 20 38 26 47 44 47 C 54 47 60 43 68 41"],
  },
  "DUCT.TUBE": {
    solid: "M 8 8 H 64 V 15 H 8 Z M 8 39 H 64 V 46 H 8 Z",
    face: "M 8 15 H 64 M 8 39 H 64",
    flows: ["M 12 27 H 60", "M 16 21 H 48", "M 16 33 H 48"],
  },
};

/** Decoration beside words; undefined where there is no drawing of the surface. */
export function surfaceDrawing(id: string): PageElement | undefined {
  const sketch = sketches[id];
  if (sketch === undefined) return undefined;
  return svg(
    "svg",
    { class: "sketch", viewBox: "0 0 72 54", width: 72, height: 54, "aria-hidden": "true", focusable: "false" },
    sketch.solid !== undefined && svg("path", { class: "sketch-solid", d: sketch.solid }),
    svg("path", { class: "sketch-face", d: sketch.face }),
    ...sketch.flows.flatMap((flow) => [
      svg("path", { class: "sketch-flow", d: flow }),
      svg("path", { class: "sketch-head", d: headOf(flow) }),
    ]),
  );
}

/** An arrowhead at the end of a path, along its last stretch. */
function headOf(path: string): string {
  const commands = [...path.matchAll(/([MCHV])([^MCHV]*)/g)].map(
    (found) => [found[1] as string, (found[2] as string).trim().split(/\s+/).map(Number)] as const,
  );
  let [x, y, fromX, fromY] = [0, 0, 0, 0];
  for (const [kind, numbers] of commands) {
    const last = numbers.slice(-2) as [number, number];
    const before = (kind === "C" ? numbers.slice(-4, -2) : [x, y]) as [number, number];
    [fromX, fromY] = before;
    [x, y] = kind === "H" ? [numbers[0] as number, y] : kind === "V" ? [x, numbers[0] as number] : last;
  }
  const length = Math.hypot(x - fromX, y - fromY) || 1;
  const [alongX, alongY] = [(x - fromX) / length, (y - fromY) / length];
  const corner = (side: number): string => `${round(x - 5 * alongX - 3 * side * alongY)} ${round(y - 5 * alongY + 3 * side * alongX)}`;
  return `M ${corner(1)} L ${round(x)} ${round(y)} L ${corner(-1)}`;
}

function round(value: number): number {
  return Math.round(value * 10) / 10;
}

export function hasDrawing(id: string): boolean {
  return sketches[id] !== undefined;
}
