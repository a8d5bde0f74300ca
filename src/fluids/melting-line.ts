/** Melting pressure against temperature, in the shapes of the papers: above it the fluid is solid. */

/** One stretch of the line; temperatures in K, pressures in Pa. */
export type MeltingPart =
  /** p = p0 + a ((T/T0)^c − 1) (Simon) */
  | {
      readonly form: "Simon";
      readonly T: readonly [number, number];
      readonly T0: number;
      readonly p0: number;
      readonly a: number;
      readonly c: number;
    }
  /** p = p0 (1 + Σ a ((T/T0)^t − 1)) */
  | {
      readonly form: "powers of T";
      readonly T: readonly [number, number];
      readonly T0: number;
      readonly p0: number;
      readonly a: readonly (readonly [number, number])[];
    }
  /** p = p0 (1 + Σ a (T/T0 − 1)^t) */
  | {
      readonly form: "powers of rise";
      readonly T: readonly [number, number];
      readonly T0: number;
      readonly p0: number;
      readonly a: readonly (readonly [number, number])[];
    };

export type MeltingLine = readonly MeltingPart[];

/** Pa; undefined where no stretch covers the temperature. */
export function meltingPressure(line: MeltingLine, T: number): number | undefined {
  const part = line.find(({ T: [from, to] }) => T >= from && T <= to);
  return part && pressureOf(part, T);
}

function pressureOf(part: MeltingPart, T: number): number {
  const ratio = T / part.T0;
  switch (part.form) {
    case "Simon":
      return part.p0 + part.a * (ratio ** part.c - 1);
    case "powers of T":
      return part.p0 * part.a.reduce((sum, [a, t]) => sum + a * (ratio ** t - 1), 1);
    case "powers of rise":
      return part.p0 * part.a.reduce((sum, [a, t]) => sum + a * Math.max(ratio - 1, 0) ** t, 1);
  }
}

/** The temperature at which the line reaches a pressure, by halving: below it the fluid is solid at that pressure. Undefined beyond the line. */
export function meltingTemperature(line: MeltingLine, p: number): number | undefined {
  const part = line.find((one) => pressureOf(one, one.T[0]) <= p && pressureOf(one, one.T[1]) >= p);
  if (!part) return undefined;
  let [low, high] = part.T;
  for (let count = 0; count < 60; count++) {
    const middle = (low + high) / 2;
    if (pressureOf(part, middle) < p) low = middle;
    else high = middle;
  }
  return high;
}
