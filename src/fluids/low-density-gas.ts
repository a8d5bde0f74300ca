/**
 * Gases at low density: viscosity and conductivity after Svehla (NASA TM-4647), heat capacity after McBride et al. (NASA/TP-2002-211556),
 * each in two pieces joined at 1000 K. Composition is frozen: no dissociation.
 */
import records from "./records/low-density-gases.json";

/** Universal gas constant that the heat capacity fits were made with, J/(mol·K). */
const fittedGasConstant = 8.31451;

/** Properties of one gas of a mixture at a temperature, where its fits hold. */
export interface GasProperties {
  /** J/(mol·K) */
  readonly cp: number;
  /** Pa·s */
  readonly viscosity: number;
  /** W/(m·K) */
  readonly conductivity: number;
}

export interface GasComponent {
  readonly formula: string;
  readonly name: string;
  /** kg/mol */
  readonly molarMass: number;
  /** K */
  readonly T: readonly [number, number];
  at(T: number): GasProperties;
}

type Piece = readonly number[];

interface GasRecord {
  readonly formula: string;
  readonly name: string;
  /** g/mol */
  readonly M: number;
  /** `[from, to, A, B, C, D]`: ln(µ/0.1 µPa·s) = A ln T + B/T + C/T² + D */
  readonly viscosity: readonly Piece[];
  /** The same for ln(k/0.1 mW/(m·K)) */
  readonly conductivity: readonly Piece[];
  /** `[from, to, a₁ … a₇]`: cp/R = a₁/T² + a₂/T + a₃ + a₄T + … + a₇T⁴ */
  readonly cp: readonly Piece[];
}

function pieceAt(pieces: readonly Piece[], T: number): Piece {
  return pieces.find((piece) => T <= (piece[1] as number)) ?? (pieces[pieces.length - 1] as Piece);
}

function transport(pieces: readonly Piece[], T: number): number {
  const [, , A = 0, B = 0, C = 0, D = 0] = pieceAt(pieces, T);
  return Math.exp(A * Math.log(T) + (B + C / T) / T + D);
}

function heatCapacity(pieces: readonly Piece[], T: number): number {
  const [, , a1 = 0, a2 = 0, a3 = 0, a4 = 0, a5 = 0, a6 = 0, a7 = 0] = pieceAt(pieces, T);
  return fittedGasConstant * ((a1 / T + a2) / T + a3 + T * (a4 + T * (a5 + T * (a6 + T * a7))));
}

function componentOf(record: GasRecord): GasComponent {
  const from = Math.max(...[record.viscosity, record.conductivity, record.cp].map((pieces) => pieces[0]?.[0] as number));
  return {
    formula: record.formula,
    name: record.name,
    molarMass: record.M / 1000,
    T: [from, 5000],
    at: (T) => ({
      cp: heatCapacity(record.cp, T),
      viscosity: 1e-7 * transport(record.viscosity, T),
      conductivity: 1e-4 * transport(record.conductivity, T),
    }),
  };
}

export const lowDensityGases: readonly GasComponent[] = (records as readonly unknown[] as readonly GasRecord[]).map(componentOf);
