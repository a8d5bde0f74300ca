/** One number from a unit to SI and back. */
import type { Unit } from "./units.js";
import { STANDARD_ATMOSPHERE } from "./unit-table.js";

/** SI value; gauge pressures add `ambient` (Pa, the standard atmosphere when not given). */
export function toSI(value: number, unit: Unit, ambient: number = STANDARD_ATMOSPHERE): number {
  return value * unit.factor + zeroOf(unit, ambient);
}

/** The inverse of `toSI`, from the same factor. */
export function fromSI(value: number, unit: Unit, ambient: number = STANDARD_ATMOSPHERE): number {
  return (value - zeroOf(unit, ambient)) / unit.factor;
}

/** A half-width or a difference: the zero of the scale takes no part. */
export function fromSITolerance(halfWidth: number, unit: Unit): number {
  return halfWidth / unit.factor;
}

function zeroOf(unit: Unit, ambient: number): number {
  return unit.offset ?? (unit.gauge ? ambient : 0);
}
