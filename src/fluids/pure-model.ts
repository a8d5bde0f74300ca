/** All equations of one pure fluid together: its state at temperature and density, on whichever side of the saturation line. */
import { ancillary } from "./ancillary.js";
import { type ConductivityParts, conductivityOf, denseConductivityOf } from "./conductivity.js";
import { conformalSearch, type ReferenceFluid, type Relation } from "./corresponding-states.js";
import type { Phase, State } from "./fluid.js";
import { helmholtz } from "./helmholtz.js";
import { idealPart } from "./helmholtz-ideal.js";
import { type PhaseEquation, phaseEquation } from "./phase-equation.js";
import type { PureRecord } from "./pure-record.js";
import type { Substance, TransportState, Viscosity } from "./transport.js";
import { viscosityOf } from "./viscosity.js";

/** Records of the fluids that corresponding states refer to. */
export type ReferenceRecords = (name: string) => PureRecord;

export interface PureModel {
  readonly phases: PhaseEquation;
  /** Pa at K and mol/m³ */
  pressure(T: number, rho: number): number;
  /** The state at K, Pa and mol/m³ that belong together; undefined where the fluid is unstable or cp has no finite value. */
  state(T: number, p: number, rho: number, phase: Phase): State | undefined;
}

/** Above this ratio to the gas constant, cp says only that the critical point is near. */
const divergentCp = 5000;

export function pureModel(record: PureRecord, references: ReferenceRecords): PureModel {
  const substance: Substance = { molarMass: record.molarMass, gasConstant: record.gasConstant, reducing: record.reducing };
  const phases = phaseEquation(record);
  const ideal = idealPart(record.ideal, record.reducing.T);
  const transport = transportOf(record, substance, references);
  const { molarMass, gasConstant: R, reducing } = record;
  const scratch: TransportState = { T: 0, rho: 0, p: 0, pT: 0, pRho: 0, cp: 0, cv: 0, alpha: 0, alphaD: 0, idealTT: 0 };

  return {
    phases,
    pressure: (T, rho) => rho * R * T * (1 + phases.equation.pressurePart(reducing.T / T, rho / reducing.rho).d),
    state(T, p, rho, phase) {
      const r = phases.equation.residual(reducing.T / T, rho / reducing.rho);
      const i = ideal(T);
      const slope = 1 + 2 * r.d + r.dd;
      const rise = 1 + r.d - r.dt;
      const cv = -R * (i.tt + r.tt);
      const cp = cv + (R * rise * rise) / slope;
      if (!(slope > 0 && cv > 0 && cp < divergentCp * R)) return undefined;
      scratch.T = T;
      scratch.rho = rho;
      scratch.p = p;
      scratch.pT = R * rho * rise;
      scratch.pRho = R * T * slope;
      scratch.cp = cp;
      scratch.cv = cv;
      scratch.alpha = r.a;
      scratch.alphaD = r.d;
      scratch.idealTT = i.tt;
      const enthalpy = (R * T * (1 + i.t + r.t + r.d)) / molarMass;
      const speedOfSound = Math.sqrt(((R * T) / molarMass) * slope * (cp / cv));
      const { viscosity, conductivity } = transport(scratch);
      const expansivity = rise / (T * slope);
      return { T, p, phase, density: rho * molarMass, cp: cp / molarMass, viscosity, conductivity, expansivity, enthalpy, speedOfSound };
    },
  };
}

/** The object is the evaluator's own and changes at the next call. */
type Transport = (state: TransportState) => { viscosity: number | undefined; conductivity: number | undefined };

function transportOf(record: PureRecord, substance: Substance, references: ReferenceRecords): Transport {
  const out: ReturnType<Transport> = { viscosity: undefined, conductivity: undefined };
  if (!record.viscosity || !record.conductivity) return () => out;
  const relations = new Map<string, Relation>();
  const relate = (name: string): Relation => {
    const known = relations.get(name);
    if (known) return known;
    const reference = referenceFluid(references(name));
    const relation = { reference, search: conformalSearch(substance, reference) };
    relations.set(name, relation);
    return relation;
  };
  const viscosity = viscosityOf(record.viscosity, substance, relate);
  const parts: ConductivityParts = {
    substance,
    viscosity,
    equation: () => helmholtz(record.residual),
    relate,
    vapourDensity: ancillary(record.saturation.vapour),
  };
  const conductivity = conductivityOf(record.conductivity, parts);
  const [coldest, hottest] = record.viscosityT ?? record.T;
  return (state) => {
    const full = positive(viscosity.dilute(state.T) + viscosity.excess(state));
    out.viscosity = state.T < coldest || state.T > hottest ? undefined : full;
    // Only the critical enhancement asks for the viscosity; where there is none, it is nothing.
    out.conductivity = positive(conductivity(state, full ?? Number.POSITIVE_INFINITY));
    return out;
  };
}

/** A correlation led outside its own range can go below zero: then it says nothing. */
function positive(value: number): number | undefined {
  return value > 0 && value < Number.POSITIVE_INFINITY ? value : undefined;
}

function referenceFluid(record: PureRecord): ReferenceFluid {
  const substance: Substance = { molarMass: record.molarMass, gasConstant: record.gasConstant, reducing: record.reducing };
  const { viscosity, conductivity } = record;
  if (!viscosity || conductivity?.form !== "sum" || !conductivity.dense)
    throw new Error(`${record.name} cannot serve as a reference fluid`);
  return {
    substance,
    equation: helmholtz(record.residual),
    viscosity: referenceViscosity(viscosity, substance),
    denseConductivity: denseConductivityOf(conductivity.dense, substance),
  };
}

function referenceViscosity(record: NonNullable<PureRecord["viscosity"]>, substance: Substance): Viscosity {
  return viscosityOf(record, substance, () => {
    throw new Error("a reference fluid has a viscosity of its own");
  });
}
