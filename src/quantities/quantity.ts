/** Kinds of quantity that an argument, a setting or a result may be. */
export type Dimension =
  | "temperature"
  | "temperature difference"
  | "length"
  | "area"
  | "speed"
  | "rotation"
  | "mass flow"
  | "volume flow"
  | "mass flux"
  | "pressure"
  | "heat flux"
  | "power"
  | "film coefficient"
  | "conductivity"
  | "density"
  | "specific heat"
  | "viscosity"
  | "kinematic viscosity"
  | "expansivity"
  | "thermal resistance"
  | "area resistance"
  | "specific energy"
  | "surface tension"
  | "molar mass"
  | "acceleration"
  | "angle"
  | "none";

/** A value read from a cell. SI throughout; temperatures in kelvin. */
export interface Quantity {
  readonly value: number;
  readonly dimension: Dimension;
  /** Half-width of a 95 % interval, SI (kelvin for temperatures); absent when none was given. */
  readonly tolerance?: number;
  /** What stood in the cell, for messages and traces. */
  readonly given: string | number;
  /** The unit the number was given in, as the user wrote it or as the default supplied it. */
  readonly unit: string;
}

/** How bare numbers and gauge pressures are to be understood. */
export interface Reading {
  readonly system: "SI" | "US";
  /** Unit of bare numbers for this argument (setting `unit of NAME`), overriding the system. */
  readonly unit?: string;
  /** Absolute ambient pressure, Pa, to which gauge readings add. */
  readonly ambient: number;
}
