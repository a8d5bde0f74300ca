/** The coexistence of liquid and vapour on a Helmholtz equation of state: equal pressure and equal Gibbs energy (Maxwell's criterion). */
import type { Helmholtz } from "./helmholtz.js";

/** Reduced densities and the reduced pressure p/(ρr R T). */
export interface Coexistence {
  readonly liquid: number;
  readonly vapour: number;
  readonly pressure: number;
}

const mostSteps = 60;

/**
 * Newton's method for both densities at once, from the ancillaries' values (Akasaka, J. Thermal Sci. Technol. 3 (2008) 442).
 * Undefined where it meets no pair of distinct phases, as happens within a hair of the critical point.
 */
export function coexistence(equation: Helmholtz, tau: number, liquidStart: number, vapourStart: number): Coexistence | undefined {
  let liquid = liquidStart;
  let vapour = vapourStart;
  for (let count = 0; count < mostSteps; count++) {
    const l = equation.pressurePart(tau, liquid);
    const pressureL = liquid * (1 + l.d);
    const gibbsL = l.d + l.a + Math.log(liquid);
    const slopeL = 1 + 2 * l.d + l.dd;
    const v = equation.pressurePart(tau, vapour);
    const pressureV = vapour * (1 + v.d);
    const gibbsV = v.d + v.a + Math.log(vapour);
    const slopeV = 1 + 2 * v.d + v.dd;
    const pressures = pressureV - pressureL;
    const moved = (gibbsV - gibbsL - pressures / liquid) / (1 / liquid - 1 / vapour);
    let stepV = moved / slopeV;
    let stepL = (moved + pressures) / slopeL;
    if (!(slopeL > 0 && slopeV > 0)) {
      // Inside a spinodal: go back outwards, where the branches are.
      stepL = slopeL > 0 ? 0 : 0.01 * liquid;
      stepV = slopeV > 0 ? 0 : -0.03 * vapour;
    }
    const gap = liquid - vapour;
    stepV = Math.max(-0.5 * vapour, Math.min(stepV, 0.4 * gap, vapour));
    stepL = Math.max(-0.4 * gap, Math.min(stepL, 0.2 * liquid));
    liquid += stepL;
    vapour += stepV;
    if (!(liquid > vapour)) return undefined;
    if (Math.abs(stepL) < 1e-11 * liquid && Math.abs(stepV) < 1e-11 * vapour)
      return { liquid, vapour, pressure: pressureAt(equation, tau, vapour) };
  }
  return undefined;
}

/** From the vapour's side, where nothing cancels. */
function pressureAt(equation: Helmholtz, tau: number, vapour: number): number {
  return vapour * (1 + equation.pressurePart(tau, vapour).d);
}
