/** How far a pure fluid's values may be trusted at a state, and what its user must know. */
import { isProblem, type Problem } from "../quantities/problems.js";
import type { State, Uncertainty } from "./fluid.js";
import type { ReferenceRecords } from "./pure-model.js";
import type { PureRecord } from "./pure-record.js";
import { sayTemperature } from "./refusal.js";

/** Where properties change so steeply that figures away from the critical point do not hold. */
function isCloseToCritical({ critical }: PureRecord, T: number, p: number): boolean {
  return Math.abs(T / critical.T - 1) < 0.05 && p > 0.75 * critical.p && p < 1.6 * critical.p;
}

/** The stated figures; close to the critical point density ten times and the rest three times as wide (common practice). */
export function uncertaintyOf(record: PureRecord): (T: number, p: number) => Uncertainty {
  const away = widened(record, 1, 1);
  const close = widened(record, 10, 3);
  return (T, p) => (isCloseToCritical(record, T, p) ? close : away);
}

function widened({ uncertainty }: PureRecord, forDensity: number, forRest: number): Uncertainty {
  const { density, cp, viscosity = 10, conductivity = 10, origin } = uncertainty;
  const share = (percent: number): number => (forRest * percent) / 100;
  return {
    density: (forDensity * density) / 100,
    cp: share(cp),
    viscosity: share(viscosity),
    conductivity: share(conductivity),
    expansivity: share(cp + 2 * density),
    origin,
  };
}

/** `stateAt` is asked only whether a published viscosity reaches the state. */
export function cautionsOf(record: PureRecord, references: ReferenceRecords, stateAt: (T: number, p: number) => State | Problem) {
  const { name } = record;
  const predictedFrom = predictedFromTemperature(record, references);
  return (T: number, p: number): readonly string[] => {
    const said = [...record.cautions];
    if (isCloseToCritical(record, T, p)) {
      said.push(
        `Close to the critical point of ${name} properties change steeply and heat transfer can deteriorate; ordinary equations do not hold here.`,
      );
    }
    if (record.predictive) said.push(`Transport of ${name} (${record.predictive}) comes from a predictive method, good to 5 to 10 %.`);
    if (T < predictedFrom) {
      said.push(
        `Below ${sayTemperature(predictedFrom)} the method that predicts transport of ${name} leaves its reference fluid's range; expect twice its uncertainty or more.`,
      );
    }
    if (!record.melting && p > 1e7 && T < 1.2 * record.T[0]) {
      said.push(`No melting line of ${name} stands on the shelf: under this pressure it may be solid so close to its freezing point.`);
    }
    const missing = missingTransport(record, T, p, stateAt);
    return missing === undefined ? said : [...said, missing];
  };
}

function missingTransport(
  record: PureRecord,
  T: number,
  p: number,
  stateAt: (T: number, p: number) => State | Problem,
): string | undefined {
  const { name, viscosityT: limits } = record;
  if (!record.viscosity) return `No published viscosity and conductivity of ${name} stand on the shelf: density and cp only.`;
  if (limits && (T < limits[0] || T > limits[1])) {
    return `The viscosity of ${name} holds from ${sayTemperature(limits[0])} to ${sayTemperature(limits[1])} only; none is given here.`;
  }
  const found = stateAt(T, p);
  const reached = isProblem(found) || found.viscosity !== undefined;
  return reached ? undefined : `The published viscosity of ${name} does not reach this state; none is given here.`;
}

/** K: where corresponding states reach the lowest temperature of the reference fluid; 0 where the method is not used. */
function predictedFromTemperature({ viscosity, critical }: PureRecord, references: ReferenceRecords): number {
  if (viscosity?.form !== "corresponding states") return 0;
  const reference = references(viscosity.reference);
  return (reference.T[0] / reference.critical.T) * critical.T;
}
