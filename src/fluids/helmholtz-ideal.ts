/** Ideal-gas part of the Helmholtz energy: τα0_τ and τ²α0_ττ, which is all that enthalpy and the heat capacities need. */

export interface IdealRecord {
  /** α0 = ln δ + a1 + a2 τ + … */
  readonly lead: readonly [a1: number, a2: number];
  /** a ln τ */
  readonly logTau?: number;
  /** n, t: n τ^t */
  readonly power?: readonly (readonly [n: number, t: number])[];
  /** n, θ in kelvin: n ln(1 − exp(−θ/T)) (Planck–Einstein) */
  readonly einsteinKelvin?: readonly (readonly [n: number, theta: number])[];
  /** n, t: n ln(1 − exp(−tτ)) (Planck–Einstein) */
  readonly einstein?: readonly (readonly [n: number, t: number])[];
  /** n, t, c, d: n ln(c + d exp(tτ)) (Planck–Einstein, general) */
  readonly einsteinGeneral?: readonly (readonly [n: number, t: number, c: number, d: number])[];
  /** n, t: part n T^t of cp0/R, T in kelvin, integrated from `cpFrom` */
  readonly cpPower?: readonly (readonly [n: number, t: number])[];
  /** n, θ: parts n ((θ/T)/sinh(θ/T))² and n ((θ/T)/cosh(θ/T))² of cp0/R, integrated from `cpFrom` */
  readonly cpSinh?: readonly (readonly [n: number, theta: number])[];
  readonly cpCosh?: readonly (readonly [n: number, theta: number])[];
  /** K */
  readonly cpFrom?: number;
}

export interface Ideal {
  /** τα0_τ */
  t: number;
  /** τ²α0_ττ */
  tt: number;
}

/** The object is the evaluator's own and changes at the next call. */
export function idealPart(record: IdealRecord, Tr: number): (T: number) => Ideal {
  const out: Ideal = { t: 0, tt: 0 };
  const quanta = [...(record.einstein ?? []), ...(record.einsteinKelvin ?? []).map(([n, theta]) => [n, theta / Tr] as const)];
  const quantaN = Float64Array.from(quanta, (row) => row[0]);
  const quantaT = Float64Array.from(quanta, (row) => row[1]);
  const from = record.cpFrom ?? Tr;
  let last = Number.NaN;
  const evaluate = (T: number): void => {
    const tau = Tr / T;
    let t = record.lead[1] * tau + (record.logTau ?? 0);
    let tt = -(record.logTau ?? 0);
    for (const [n, power] of record.power ?? []) {
      const part = n * power * tau ** power;
      t += part;
      tt += part * (power - 1);
    }
    for (let i = 0; i < quantaN.length; i++) {
      const n = quantaN[i] as number;
      const x = (quantaT[i] as number) * tau;
      const rest = Math.expm1(x);
      const share = rest === Number.POSITIVE_INFINITY ? 0 : x / rest;
      t += n * share;
      tt -= n * share * x * (1 + 1 / rest);
    }
    for (const [n, power, c, d] of record.einsteinGeneral ?? []) {
      const x = power * tau;
      const grown = d * Math.exp(x);
      const share = grown / (c + grown);
      t += n * x * share;
      tt += n * x * x * share * (1 - share);
    }
    for (const [n, power] of record.cpPower ?? []) {
      t += power === -1 ? (n * Math.log(T / from)) / T : (n * (T ** (power + 1) - from ** (power + 1))) / ((power + 1) * T);
      tt -= n * T ** power;
    }
    for (const [n, theta] of record.cpSinh ?? []) {
      const x = theta / T;
      t += (n * theta * (1 / Math.tanh(x) - 1 / Math.tanh(theta / from))) / T;
      tt -= n * (x / Math.sinh(x)) ** 2;
    }
    for (const [n, theta] of record.cpCosh ?? []) {
      const x = theta / T;
      t -= (n * theta * (Math.tanh(x) - Math.tanh(theta / from))) / T;
      tt -= n * (x / Math.cosh(x)) ** 2;
    }
    out.t = t;
    out.tt = tt;
  };
  return (T) => {
    if (T !== last) {
      last = T;
      evaluate(T);
    }
    return out;
  };
}
