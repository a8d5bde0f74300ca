/** Powers with a constant exponent by the cheapest exact way. */

type Step = (values: Float64Array) => number;

/** Roots of negative numbers stay "not a number", as with a general power. */
export function powerOf(base: Step, exponent: number): Step {
  const special = shapes.get(exponent);
  return special === undefined ? (v) => base(v) ** exponent : special(base);
}

function cubeRoot(x: number): number {
  return x < 0 ? Number.NaN : Math.cbrt(x);
}

/** Each agrees with the general power to 1e-15. */
const shapes: ReadonlyMap<number, (base: Step) => Step> = new Map<number, (base: Step) => Step>([
  [1, (base) => base],
  [0.5, (base) => (v) => Math.sqrt(base(v))],
  [0.25, (base) => (v) => Math.sqrt(Math.sqrt(base(v)))],
  [
    0.75,
    (base) => (v) => {
      const root = Math.sqrt(base(v));
      return root * Math.sqrt(root);
    },
  ],
  [
    1.5,
    (base) => (v) => {
      const x = base(v);
      return x * Math.sqrt(x);
    },
  ],
  [
    9 / 16,
    (base) => (v) => {
      const root = Math.sqrt(base(v));
      return root * Math.sqrt(Math.sqrt(Math.sqrt(root)));
    },
  ],
  [1 / 3, (base) => (v) => cubeRoot(base(v))],
  [1 / 6, (base) => (v) => Math.sqrt(cubeRoot(base(v)))],
  [
    2 / 3,
    (base) => (v) => {
      const root = cubeRoot(base(v));
      return root * root;
    },
  ],
  [
    2,
    (base) => (v) => {
      const x = base(v);
      return x * x;
    },
  ],
  [
    3,
    (base) => (v) => {
      const x = base(v);
      return x * x * x;
    },
  ],
  [
    4,
    (base) => (v) => {
      const x = base(v);
      return x * x * (x * x);
    },
  ],
  [
    6,
    (base) => (v) => {
      const x = base(v);
      const cube = x * x * x;
      return cube * cube;
    },
  ],
  [-1, (base) => (v) => 1 / base(v)],
  [
    -2,
    (base) => (v) => {
      const x = base(v);
      return 1 / (x * x);
    },
  ],
]);
