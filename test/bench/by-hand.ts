// The same calculations written straight in one function each: what a careful programmer would write for one job, with
// the same properties and the same solver for density, without words, ranges as data, units or broadcasting.
import type { Fluid, State } from "../../src/fluids/fluid.js";

const pressure = 101325;
const gravity = 9.80665;

/** Free convection on a vertical plate by Raithby & Hollands 1998, buoyancy checked against the densities; W/(m²·K). */
export function freePlateByHand(fluid: Fluid, Ts: number, Tb: number, height: number): number {
  const film = fluid.state((Ts + Tb) / 2, pressure) as State;
  const { density, cp, conductivity, viscosity, expansivity } = film as Required<State>;
  const wall = fluid.density(Ts, pressure) as number;
  const bulk = fluid.density(Tb, pressure) as number;
  const byDensities = (bulk - wall) / density;
  let buoyancy = (expansivity as number) * (Ts - Tb);
  if (Math.abs(buoyancy - byDensities) > 0.1 * Math.abs(byDensities)) buoyancy = byDensities;
  return freePlateNumber(density, cp, conductivity as number, viscosity as number, Math.abs(buoyancy), height);
}

function freePlateNumber(density: number, cp: number, k: number, mu: number, buoyancy: number, height: number): number {
  const nu = mu / density;
  const Pr = (mu * cp) / k;
  const Ra = (gravity * buoyancy * height ** 3 * Pr) / (nu * nu);
  const Cl = 0.671 / (1 + (0.492 / Pr) ** (9 / 16)) ** (4 / 9);
  const NuT = Cl * Ra ** 0.25;
  const Nul = 2 / Math.log(1 + 2 / NuT);
  const CtV = (0.13 * Pr ** 0.22) / (1 + 0.61 * Pr ** 0.81) ** 0.42;
  const Nut = (CtV * Ra ** (1 / 3)) / (1 + (1.4e9 * Pr) / Ra);
  const Nu = (Nul ** 6 + Nut ** 6) ** (1 / 6);
  if (!(Ra >= 0.1 && Ra <= 1e12)) return Number.NaN;
  return (Nu * k) / height;
}

export interface Bounded {
  readonly h: number;
  readonly low: number;
  readonly high: number;
  readonly verdict: string;
}

/** The same with bounds from the scatter and the uncertainty of five properties. */
export function freePlateBoundedByHand(fluid: Fluid, Ts: number, Tb: number, height: number): Bounded {
  const Tf = (Ts + Tb) / 2;
  const film = fluid.state(Tf, pressure) as State;
  const { density, cp, expansivity } = film;
  const k = film.conductivity as number;
  const mu = film.viscosity as number;
  const byDensities = ((fluid.density(Tb, pressure) as number) - (fluid.density(Ts, pressure) as number)) / density;
  let buoyancy = (expansivity as number) * (Ts - Tb);
  if (Math.abs(buoyancy - byDensities) > 0.1 * Math.abs(byDensities)) buoyancy = byDensities;
  buoyancy = Math.abs(buoyancy);
  const h = freePlateNumber(density, cp, k, mu, buoyancy, height);
  const u = fluid.uncertainty(Tf, pressure);
  const squares =
    0.1 ** 2 +
    (freePlateNumber(density * (1 + u.density), cp, k, mu, buoyancy, height) / h - 1) ** 2 +
    (freePlateNumber(density, cp * (1 + u.cp), k, mu, buoyancy, height) / h - 1) ** 2 +
    (freePlateNumber(density, cp, k * (1 + u.conductivity), mu, buoyancy, height) / h - 1) ** 2 +
    (freePlateNumber(density, cp, k, mu * (1 + u.viscosity), buoyancy, height) / h - 1) ** 2 +
    (freePlateNumber(density, cp, k, mu, buoyancy * (1 + u.expansivity), height) / h - 1) ** 2;
  const half = Math.sqrt(squares) * h;
  return { h, low: h - half, high: h + half, verdict: Number.isFinite(h) ? "in range" : "out of range" };
}

/** Inside a tube, developed, laminar to turbulent after Gnielinski 2013 with the Prandtl ratio of a liquid; W/(m²·K). */
export function ductTubeByHand(fluid: Fluid, Tw: number, Tb: number, speed: number, diameter: number): number {
  const bulk = fluid.state(Tb, pressure) as State;
  const wall = fluid.state(Tw, pressure) as State;
  const k = bulk.conductivity as number;
  const mu = bulk.viscosity as number;
  const Pr = (mu * bulk.cp) / k;
  const Prw = ((wall.viscosity as number) * wall.cp) / (wall.conductivity as number);
  const Re = (speed * diameter * bulk.density) / mu;
  const gamma = Math.max(0, Math.min(1, (Re - 2300) / 1700));
  const laminar = (3.66 ** 3 + 0.7 ** 3 + (0 - 0.7) ** 3) ** (1 / 3);
  const ReT = Math.max(Re, 4000);
  const f = (1.8 * Math.log10(ReT) - 1.5) ** -2;
  const turbulent = ((f / 8) * (ReT - 1000) * Pr) / (1 + 12.7 * Math.sqrt(f / 8) * (Pr ** (2 / 3) - 1));
  const ratio = (Pr / Prw) ** 0.11;
  if (!(Re >= 1 && Re <= 1e6)) return Number.NaN;
  return (((1 - gamma) * laminar + gamma * turbulent) * ratio * k) / diameter;
}
