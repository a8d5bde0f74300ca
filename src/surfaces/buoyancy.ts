/** Buoyancy is taken from the densities where β·ΔT misses their difference by more than this (water around 4 °C). */
const mismatch = 0.1;

/** Relative density difference that drives free convection, by both ways, and which of them counts. */
export interface Buoyancy {
  /** β·(Ts − Tb); undefined where the fluid has no expansivity. */
  readonly byExpansivity: number | undefined;
  /** (ρ bulk − ρ wall)/ρ film; undefined where the fluid cannot tell the densities apart. */
  readonly byDensities: number | undefined;
  readonly taken: "expansivity" | "densities";
  /** True where the fluid at the wall is the lighter and rises. */
  readonly rising: boolean;
}

export function buoyancyOf(
  dT: number,
  film: { readonly density: number; readonly expansivity: number | undefined } | undefined,
  densities: { readonly wall: number; readonly bulk: number } | undefined,
): Buoyancy {
  const byExpansivity = film?.expansivity === undefined ? undefined : film.expansivity * dT;
  const byDensities = densities === undefined || film === undefined ? undefined : (densities.bulk - densities.wall) / film.density;
  const taken = choose(byExpansivity, byDensities);
  const size = taken === "densities" ? byDensities : byExpansivity;
  return { byExpansivity, byDensities, taken, rising: size === undefined || size === 0 ? dT >= 0 : size > 0 };
}

function choose(byExpansivity: number | undefined, byDensities: number | undefined): "expansivity" | "densities" {
  if (byDensities === undefined) return "expansivity";
  if (byExpansivity === undefined) return "densities";
  return Math.abs(byExpansivity - byDensities) > mismatch * Math.abs(byDensities) ? "densities" : "expansivity";
}
