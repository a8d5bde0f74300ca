/** One fluid's equation of state with its saturation line: which branch a temperature and pressure lie on, and the density there. */
import { type Ancillary, ancillaryAt } from "./ancillary.js";
import { cubicCompressibility, densityOn } from "./density.js";
import { type Helmholtz, helmholtz } from "./helmholtz.js";
import type { PureRecord } from "./pure-record.js";
import { type Coexistence, coexistence } from "./vapour-pressure.js";

/** mol/m³ and Pa; for a blend the pressure of the bubble and of the dew line. */
export interface SaturationPoint {
  readonly liquid: number;
  readonly vapour: number;
  readonly pressure: number;
  readonly dewPressure: number;
}

export type Side = "liquid" | "gas" | "beyond" | "between";

export interface PhaseEquation {
  readonly equation: Helmholtz;
  /** K; above it there is one fluid phase only. */
  readonly domeTop: number;
  /** Which side of the saturation line; "beyond" above its end, "between" on a pure fluid's line or inside a blend's dome. */
  sideOf(T: number, p: number): Side;
  /** mol/m³ on that side; undefined where the equation holds none. */
  density(T: number, p: number, side: Side): number | undefined;
  /** Undefined above the dome, and within a hair of its top where the equation knows no pair of phases. */
  saturation(T: number): SaturationPoint | undefined;
  /** Pa by the short equation, good to about a per cent. */
  roughPressure(T: number): number;
}

/** Nearer to the ancillary's pressure than this, Maxwell's criterion decides: the worst ancillary of the shelf is 10 % out in a cold liquid. */
const margin = 0.15;
/** Above this share of the critical temperature it decides within a factor 2, for the branches lie close. */
const closeTo = 0.94;
/** A pure fluid nearer to its line than this is two phases as far as anyone can say. */
const onLine = 1e-7;

export function phaseEquation(record: PureRecord): PhaseEquation {
  const equation = helmholtz(record.residual);
  const { reducing, gasConstant, saturation: lines } = record;
  const blend = lines.dewPressure !== undefined;
  const domeTop = blend ? lines.pressure.T : record.critical.T;
  const scale = reducing.rho * gasConstant;
  const acentric = acentricFactor(lines.pressure, record.critical.T, record.critical.p);

  let lastT = Number.NaN;
  let lastPair: Coexistence | undefined;
  const pairAt = (T: number): Coexistence | undefined => {
    if (T === lastT) return lastPair;
    lastT = T;
    const liquid = ancillaryAt(lines.liquid, T) / reducing.rho;
    const vapour = ancillaryAt(lines.vapour, T) / reducing.rho;
    lastPair = T >= domeTop ? undefined : coexistence(equation, reducing.T / T, liquid, vapour);
    return lastPair;
  };

  const sideOf = (T: number, p: number): Side => {
    if (T >= domeTop) return "beyond";
    const rough = ancillaryAt(lines.pressure, T);
    if (lines.dewPressure) {
      if (p >= rough) return "liquid";
      return p <= ancillaryAt(lines.dewPressure, T) ? "gas" : "between";
    }
    if (isFar(T, p, rough)) return p > rough ? "liquid" : "gas";
    const pair = pairAt(T);
    const exact = pair ? pair.pressure * scale * T : rough;
    if (Math.abs(p - exact) < onLine * exact) return "between";
    return p > exact ? "liquid" : "gas";
  };

  const isFar = (T: number, p: number, rough: number): boolean => {
    const ratio = p / rough;
    return T < closeTo * domeTop ? Math.abs(ratio - 1) > margin : ratio < 0.5 || ratio > 2;
  };

  const density = (T: number, p: number, side: Side): number | undefined => {
    const tau = reducing.T / T;
    const target = p / (scale * T);
    const found = side === "beyond" ? beyond(tau, target, T, p) : (beside(tau, target, T, p, side) ?? nearTop(tau, target, T, p));
    return found === undefined ? undefined : found * reducing.rho;
  };

  const beyond = (tau: number, target: number, T: number, p: number): number | undefined => {
    const start = target / cubicCompressibility(T / record.critical.T, p / record.critical.p, acentric);
    return densityOn(equation, tau, target, { low: 0, high: Number.POSITIVE_INFINITY, start });
  };

  /** Close under the dome's top the short equations for the branches can miss; there the whole isotherm is searched. */
  const nearTop = (tau: number, target: number, T: number, p: number): number | undefined =>
    T > 0.98 * domeTop ? beyond(tau, target, T, p) : undefined;

  const beside = (tau: number, target: number, T: number, p: number, side: Side): number | undefined => {
    const near = !blend && !isFar(T, p, ancillaryAt(lines.pressure, T));
    const pair = near ? pairAt(T) : undefined;
    if (near && !pair) return beyond(tau, target, T, p);
    if (side === "gas") {
      const high = pair ? pair.vapour * (1 + 1e-9) : (1.1 * ancillaryAt(lines.vapour, T)) / reducing.rho;
      const start = target / cubicCompressibility(T / record.critical.T, p / record.critical.p, acentric);
      return densityOn(equation, tau, target, { low: 0, high, start: Math.min(start, high) });
    }
    const low = pair ? pair.liquid * (1 - 1e-9) : (0.95 * ancillaryAt(lines.liquid, T)) / reducing.rho;
    return densityOn(equation, tau, target, { low, high: Number.POSITIVE_INFINITY, start: pair ? low : low / 0.95 });
  };

  return {
    equation,
    domeTop,
    sideOf,
    density,
    roughPressure: (T) => ancillaryAt(lines.pressure, T),
    saturation(T) {
      if (lines.dewPressure) return blendSaturation(T, ancillaryAt(lines.pressure, T), ancillaryAt(lines.dewPressure, T));
      const pair = pairAt(T);
      if (!pair) return undefined;
      const pressure = pair.pressure * scale * T;
      return { liquid: pair.liquid * reducing.rho, vapour: pair.vapour * reducing.rho, pressure, dewPressure: pressure };
    },
  };

  function blendSaturation(T: number, bubble: number, dew: number): SaturationPoint | undefined {
    if (T >= domeTop) return undefined;
    const liquid = density(T, bubble, "liquid");
    const vapour = density(T, dew, "gas");
    return liquid === undefined || vapour === undefined ? undefined : { liquid, vapour, pressure: bubble, dewPressure: dew };
  }
}

/** ω = −lg(p/pc) − 1 at 0.7 Tc, Pitzer's definition, from the short equation. */
function acentricFactor(pressure: Ancillary, Tc: number, pc: number): number {
  return -Math.log10(ancillaryAt(pressure, 0.7 * Tc) / pc) - 1;
}
