/** One fluid's equation of state with its saturation line: which branch a temperature and pressure lie on, and the density there. */
import { type Ancillary, ancillary } from "./ancillary.js";
import { compressedDensity, cubicCompressibility, densityOn } from "./density.js";
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

/** Which side of the saturation line; "beyond" above its end, "between" on a pure fluid's line or inside a blend's dome. */
export type Side = "liquid" | "gas" | "beyond" | "between";

export interface PhaseEquation {
  readonly equation: Helmholtz;
  /** K; above it there is one fluid phase only. */
  readonly domeTop: number;
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
  const { reducing, gasConstant, critical } = record;
  const linePressure = lastOf(ancillary(record.saturation.pressure));
  const dewPressure = record.saturation.dewPressure && ancillary(record.saturation.dewPressure);
  const liquidLine = ancillary(record.saturation.liquid);
  const vapourLine = ancillary(record.saturation.vapour);
  const domeTop = dewPressure ? record.saturation.pressure.T : critical.T;
  const scale = reducing.rho * gasConstant;
  const acentric = acentricFactor(record.saturation.pressure, critical.T, critical.p);

  const pairAt = lastOf((T: number): Coexistence | undefined =>
    T >= domeTop ? undefined : coexistence(equation, reducing.T / T, liquidLine(T) / reducing.rho, vapourLine(T) / reducing.rho),
  );

  const isFar = (T: number, p: number): boolean => {
    const ratio = p / linePressure(T);
    return T < closeTo * domeTop ? Math.abs(ratio - 1) > margin : ratio < 0.5 || ratio > 2;
  };

  const sideOf = (T: number, p: number): Side => {
    if (T >= domeTop) return "beyond";
    const rough = linePressure(T);
    if (dewPressure) {
      if (p >= rough) return "liquid";
      return p <= dewPressure(T) ? "gas" : "between";
    }
    if (isFar(T, p)) return p > rough ? "liquid" : "gas";
    const pair = pairAt(T);
    const exact = pair ? pair.pressure * scale * T : rough;
    if (Math.abs(p - exact) < onLine * exact) return "between";
    return p > exact ? "liquid" : "gas";
  };

  const density = (T: number, p: number, side: Side): number | undefined => {
    const target = p / (scale * T);
    const found = side === "beyond" ? beyond(T, p, target) : (beside(T, p, target, side) ?? nearTop(T, p, target));
    return found === undefined ? undefined : found * reducing.rho;
  };

  const cubicDensity = (T: number, p: number, target: number): number =>
    target / cubicCompressibility(T / critical.T, p / critical.p, acentric);

  const beyond = (T: number, p: number, target: number): number | undefined =>
    densityOn(equation, reducing.T / T, target, { low: 0, high: Number.POSITIVE_INFINITY, start: cubicDensity(T, p, target) });

  /** Close under the dome's top the short equations for the branches can miss; there the whole isotherm is searched. */
  const nearTop = (T: number, p: number, target: number): number | undefined => (T > 0.98 * domeTop ? beyond(T, p, target) : undefined);

  const beside = (T: number, p: number, target: number, side: Side): number | undefined => {
    const tau = reducing.T / T;
    const near = !dewPressure && !isFar(T, p);
    const pair = near ? pairAt(T) : undefined;
    if (near && !pair) return beyond(T, p, target);
    if (side === "gas") {
      const high = pair ? pair.vapour * (1 + 1e-9) : (1.1 * vapourLine(T)) / reducing.rho;
      return densityOn(equation, tau, target, { low: 0, high, start: Math.min(cubicDensity(T, p, target), high) });
    }
    const low = pair ? pair.liquid * (1 - 1e-9) : (0.95 * liquidLine(T)) / reducing.rho;
    return densityOn(equation, tau, target, {
      low,
      high: Number.POSITIVE_INFINITY,
      start: compressedDensity(equation, tau, target, pair ? pair.liquid : low / 0.95),
    });
  };

  const blendSaturation = (T: number, bubble: number, dew: number): SaturationPoint | undefined => {
    if (T >= domeTop) return undefined;
    const liquid = density(T, bubble, "liquid");
    const vapour = density(T, dew, "gas");
    return liquid === undefined || vapour === undefined ? undefined : { liquid, vapour, pressure: bubble, dewPressure: dew };
  };

  return {
    equation,
    domeTop,
    sideOf,
    density,
    roughPressure: linePressure,
    saturation(T) {
      if (dewPressure) return blendSaturation(T, linePressure(T), dewPressure(T));
      const pair = pairAt(T);
      if (!pair) return undefined;
      const pressure = pair.pressure * scale * T;
      return { liquid: pair.liquid * reducing.rho, vapour: pair.vapour * reducing.rho, pressure, dewPressure: pressure };
    },
  };
}

/** Keeps the last result, since one state asks for the same temperature several times. It changes no result. */
function lastOf<R>(evaluate: (T: number) => R): (T: number) => R {
  let lastT = Number.NaN;
  let last: R;
  return (T) => {
    if (T !== lastT) {
      last = evaluate(T);
      lastT = T;
    }
    return last;
  };
}

/** ω = −lg(p/pc) − 1 at 0.7 Tc, Pitzer's definition, from the short equation. */
function acentricFactor(pressure: Ancillary, Tc: number, pc: number): number {
  return -Math.log10(ancillary(pressure)(0.7 * Tc) / pc) - 1;
}
