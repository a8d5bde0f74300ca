/**
 * Reduced Helmholtz energy α(τ, δ) of one fluid, τ = Tr/T, δ = ρ/ρr, in the term shapes of the published equations of state.
 * Every residual term but two is a product F(τ)·G(δ): terms of one G are summed once for a temperature, so that a search for density costs only
 * the few distinct G. All derivatives come out multiplied by the powers of τ and δ that make them plain ratios (τα_τ, δ²α_δδ …).
 */
import { type Association, association } from "./helmholtz-association.js";
import { type NonAnalyticTerm, nonAnalytic } from "./helmholtz-nonanalytic.js";

type Rows<N extends readonly number[]> = readonly N[];

/** Coefficients as the papers print them, one row a term. */
export interface ResidualRecord {
  /** n, t, d, l: n τ^t δ^d exp(−δ^l); without the exponential where l = 0. */
  readonly power?: Rows<readonly [n: number, t: number, d: number, l: number]>;
  /** n, t, d, l, g: n τ^t δ^d exp(−g δ^l). */
  readonly exponential?: Rows<readonly [n: number, t: number, d: number, l: number, g: number]>;
  /** n, t, d, l, m: n τ^t δ^d exp(−δ^l) exp(−τ^m), each exponential only where its exponent is not 0. */
  readonly doubleExponential?: Rows<readonly [n: number, t: number, d: number, l: number, m: number]>;
  /** n, t, d, η, ε, β, γ: n τ^t δ^d exp(−η(δ−ε)² − β(τ−γ)²). */
  readonly gaussian?: Rows<readonly [n: number, t: number, d: number, eta: number, epsilon: number, beta: number, gamma: number]>;
  /** n, t, d, η, ε, β, γ, b: n τ^t δ^d exp(−η(δ−ε)² + 1/(β(τ−γ)² + b)). */
  readonly bell?: Rows<readonly [n: number, t: number, d: number, eta: number, epsilon: number, beta: number, gamma: number, b: number]>;
  /** Terms of the critical region, n Δ^b δ ψ. */
  readonly nonAnalytic?: readonly NonAnalyticTerm[];
  readonly association?: Association;
}

/** Residual part: α, δα_δ, δ²α_δδ, τα_τ, τ²α_ττ, δτα_δτ. */
export interface Residual {
  a: number;
  d: number;
  dd: number;
  t: number;
  tt: number;
  dt: number;
}

export interface Helmholtz {
  /** Only `a`, `d` and `dd` are brought up to date; the object is the evaluator's own and changes at the next call. */
  pressurePart(tau: number, delta: number): Residual;
  /** All six; the object is the evaluator's own and changes at the next call. */
  residual(tau: number, delta: number): Residual;
}

/** The distinct functions of τ: τ^t exp(−τ^m) exp(−β(τ−γ)²) exp(1/(c(τ−γ)²+b)). */
type TemperatureKey = readonly [t: number, m: number, beta: number, gamma: number, c: number, b: number];
/** The distinct functions of δ: δ^d exp(−g δ^l − η(δ−ε)²). */
type DensityKey = readonly [d: number, l: number, g: number, eta: number, epsilon: number];

interface SeparableTerm {
  readonly n: number;
  readonly temperature: TemperatureKey;
  readonly density: DensityKey;
}

function separableTerms(record: ResidualRecord): readonly SeparableTerm[] {
  const terms: SeparableTerm[] = [];
  for (const [n, t, d, l] of record.power ?? []) terms.push({ n, temperature: [t, 0, 0, 0, 0, 0], density: [d, l, l === 0 ? 0 : 1, 0, 0] });
  for (const [n, t, d, l, g] of record.exponential ?? []) terms.push({ n, temperature: [t, 0, 0, 0, 0, 0], density: [d, l, g, 0, 0] });
  for (const [n, t, d, l, m] of record.doubleExponential ?? []) {
    terms.push({ n, temperature: [t, m, 0, 0, 0, 0], density: [d, l, l === 0 ? 0 : 1, 0, 0] });
  }
  for (const [n, t, d, eta, epsilon, beta, gamma] of record.gaussian ?? []) {
    terms.push({ n, temperature: [t, 0, beta, gamma, 0, 0], density: [d, 0, 0, eta, epsilon] });
  }
  for (const [n, t, d, eta, epsilon, beta, gamma, b] of record.bell ?? []) {
    terms.push({ n, temperature: [t, 0, 0, gamma, beta, b], density: [d, 0, 0, eta, epsilon] });
  }
  return terms;
}

function distinct<K extends readonly number[]>(keys: readonly K[]): { readonly list: readonly K[]; readonly of: Int32Array } {
  const places = new Map<string, number>();
  const list: K[] = [];
  const of = Int32Array.from(keys, (key) => {
    const text = key.join();
    const known = places.get(text);
    if (known !== undefined) return known;
    list.push(key);
    places.set(text, list.length - 1);
    return list.length - 1;
  });
  return { list, of };
}

/** The evaluator of one record. It keeps the temperature part of the call before, which changes no result. */
export function helmholtz(record: ResidualRecord): Helmholtz {
  const terms = separableTerms(record);
  const temperatures = distinct(terms.map((term) => term.temperature));
  const factors = distinct(terms.map(({ density: [, l, g, eta, epsilon] }) => [l, g, eta, epsilon] as const));
  // Groups of one power of δ under one exponential, those of one exponential side by side.
  const groups = distinct(terms.map((term, i) => [factors.of[i] as number, term.density[0]] as const));
  const order = groups.list.map((_, k) => k).sort((a, b) => groupRank(groups.list[a]) - groupRank(groups.list[b]));
  const placeOf = Int32Array.from(groups.list, (_, k) => order.indexOf(k));
  const groupOf = groups.of.map((group) => placeOf[group] as number);
  const degrees = Int32Array.from(order, (k) => (groups.list[k] as readonly [number, number])[1]);
  const starts = Int32Array.from(
    [...factors.list.keys(), factors.list.length],
    (j) => order.filter((k) => (groups.list[k] as readonly [number, number])[0] < j).length,
  );

  const amounts = Float64Array.from(terms, (term) => term.n);
  const isotherm = isothermSums(temperatures.list, amounts, temperatures.of, groupOf, order.length);
  const exponentials = densityFactors(factors.list, Math.max(...degrees));
  const critical = record.nonAnalytic ? nonAnalytic(record.nonAnalytic) : undefined;
  const associating = record.association ? association(record.association) : undefined;
  const out: Residual = { a: 0, d: 0, dd: 0, t: 0, tt: 0, dt: 0 };

  const { s0, s1, s2 } = isotherm;
  const { powers, e, x1, x2 } = exponentials;
  const count = factors.list.length;

  return {
    pressurePart(tau, delta) {
      isotherm.at(tau);
      exponentials.at(delta);
      let a = 0;
      let d = 0;
      let dd = 0;
      for (let j = 0; j < count; j++) {
        let p0 = 0;
        let p1 = 0;
        let p2 = 0;
        const end = starts[j + 1] as number;
        for (let k = starts[j] as number; k < end; k++) {
          const degree = degrees[k] as number;
          const part = (s0[k] as number) * (powers[degree] as number);
          const once = degree * part;
          p0 += part;
          p1 += once;
          p2 += (degree - 1) * once;
        }
        const ej = e[j] as number;
        const slope = x1[j] as number;
        a += ej * p0;
        d += ej * (p1 + slope * p0);
        dd += ej * (p2 + 2 * slope * p1 + (slope * slope - slope + (x2[j] as number)) * p0);
      }
      out.a = a;
      out.d = d;
      out.dd = dd;
      critical?.add(tau, delta, out);
      associating?.add(tau, delta, out);
      return out;
    },
    residual(tau, delta) {
      isotherm.at(tau);
      exponentials.at(delta);
      let a = 0;
      let d = 0;
      let dd = 0;
      let t = 0;
      let tt = 0;
      let dt = 0;
      for (let j = 0; j < count; j++) {
        let p0 = 0;
        let p1 = 0;
        let p2 = 0;
        let q0 = 0;
        let q1 = 0;
        let r0 = 0;
        const end = starts[j + 1] as number;
        for (let k = starts[j] as number; k < end; k++) {
          const degree = degrees[k] as number;
          const power = powers[degree] as number;
          const part = (s0[k] as number) * power;
          const once = degree * part;
          const warm = (s1[k] as number) * power;
          p0 += part;
          p1 += once;
          p2 += (degree - 1) * once;
          q0 += warm;
          q1 += degree * warm;
          r0 += (s2[k] as number) * power;
        }
        const ej = e[j] as number;
        const slope = x1[j] as number;
        a += ej * p0;
        d += ej * (p1 + slope * p0);
        dd += ej * (p2 + 2 * slope * p1 + (slope * slope - slope + (x2[j] as number)) * p0);
        t += ej * q0;
        tt += ej * r0;
        dt += ej * (q1 + slope * q0);
      }
      out.a = a;
      out.d = d;
      out.dd = dd;
      out.t = t;
      out.tt = tt;
      out.dt = dt;
      critical?.add(tau, delta, out);
      associating?.add(tau, delta, out);
      return out;
    },
  };
}

function groupRank(group: readonly [factor: number, degree: number] | undefined): number {
  return group ? 1000 * group[0] + group[1] : 0;
}

/** Σ n F, Σ n τF′ and Σ n τ²F″ of every group, for the τ of the last call of `at`. */
function isothermSums(keys: readonly TemperatureKey[], amounts: Float64Array, keyOf: Int32Array, groupOf: Int32Array, groupCount: number) {
  const s0 = new Float64Array(groupCount);
  const s1 = new Float64Array(groupCount);
  const s2 = new Float64Array(groupCount);
  const functions = temperatureFunctions(keys);
  const { f0, f1, f2 } = functions;
  let last = Number.NaN;
  return {
    s0,
    s1,
    s2,
    at(tau: number): void {
      if (tau === last) return;
      last = tau;
      functions.at(tau);
      s0.fill(0);
      s1.fill(0);
      s2.fill(0);
      for (let i = 0; i < amounts.length; i++) {
        const n = amounts[i] as number;
        const key = keyOf[i] as number;
        const group = groupOf[i] as number;
        s0[group] = (s0[group] as number) + n * (f0[key] as number);
        s1[group] = (s1[group] as number) + n * (f1[key] as number);
        s2[group] = (s2[group] as number) + n * (f2[key] as number);
      }
    },
  };
}

const highestWhole = 40;

/** F, τF′ and τ²F″ of the distinct functions of τ. A power is a whole part from a table times one of a few fractional parts. */
function temperatureFunctions(keys: readonly TemperatureKey[]) {
  const f0 = new Float64Array(keys.length);
  const f1 = new Float64Array(keys.length);
  const f2 = new Float64Array(keys.length);
  const column = (index: number): Float64Array => Float64Array.from(keys, (key) => key[index] as number);
  const [ts, ms, betas, gammas, cs, bs] = [column(0), column(1), column(2), column(3), column(4), column(5)] as const;
  const plain = Uint8Array.from(keys, (key) => (key[1] === 0 && key[2] === 0 && key[4] === 0 ? 1 : 0));
  const wholes = Int32Array.from(keys, ([t]) => (t >= 0 && t < highestWhole ? Math.floor(t) : 0));
  const fractions = distinct(keys.map(([t], i) => [Number((t - (wholes[i] as number)).toPrecision(12))] as const));
  const fractionOf = fractions.of;
  const fraction = Float64Array.from(fractions.list, (one) => one[0]);
  const fractional = new Float64Array(fraction.length);
  const whole = new Float64Array(1 + Math.max(...wholes));
  const special = (i: number, tau: number, logTau: number, power: number): void => {
    const m = ms[i] as number;
    const beta = betas[i] as number;
    const c = cs[i] as number;
    const away = tau - (gammas[i] as number);
    let exponent = 0;
    let slope = ts[i] as number;
    let bend = 0;
    if (m !== 0) {
      const grown = Math.exp(m * logTau);
      exponent -= grown;
      slope -= m * grown;
      bend -= m * m * grown;
    }
    if (beta !== 0) {
      exponent -= beta * away * away;
      slope -= 2 * beta * tau * away;
      bend -= 2 * beta * tau * (tau + away);
    }
    if (c !== 0) {
      const q = 1 / (c * away * away + (bs[i] as number));
      exponent += q;
      slope -= 2 * c * tau * away * q * q;
      bend += 2 * c * tau * q * q * (4 * c * tau * away * away * q - (tau + away));
    }
    const f = power * Math.exp(exponent);
    f0[i] = f;
    f1[i] = f * slope;
    f2[i] = f * (slope * slope - slope + bend);
  };
  return {
    f0,
    f1,
    f2,
    at(tau: number): void {
      const logTau = Math.log(tau);
      whole[0] = 1;
      for (let k = 1; k < whole.length; k++) whole[k] = (whole[k - 1] as number) * tau;
      for (let k = 0; k < fraction.length; k++) fractional[k] = fraction[k] === 0 ? 1 : Math.exp((fraction[k] as number) * logTau);
      for (let i = 0; i < ts.length; i++) {
        const t = ts[i] as number;
        const f = (whole[wholes[i] as number] as number) * (fractional[fractionOf[i] as number] as number);
        if (plain[i] === 0) {
          special(i, tau, logTau, f);
          continue;
        }
        f0[i] = f;
        f1[i] = f * t;
        f2[i] = f * t * (t - 1);
      }
    },
  };
}

/** The distinct exponentials E of δ with x1 = δE′/E and x2 = δ·dx1/dδ, and the powers of δ, for the δ of the last call of `at`. */
function densityFactors(keys: readonly (readonly [l: number, g: number, eta: number, epsilon: number])[], highestDegree: number) {
  const size = keys.length;
  const l = Int32Array.from(keys, (key) => key[0]);
  const g = Float64Array.from(keys, (key) => key[1]);
  const eta = Float64Array.from(keys, (key) => key[2]);
  const epsilon = Float64Array.from(keys, (key) => key[3]);
  const powers = new Float64Array(1 + Math.max(highestDegree, ...l));
  const e = new Float64Array(size);
  const x1 = new Float64Array(size);
  const x2 = new Float64Array(size);
  let last = Number.NaN;
  return {
    powers,
    e,
    x1,
    x2,
    at(delta: number): void {
      if (delta === last) return;
      last = delta;
      powers[0] = 1;
      for (let k = 1; k < powers.length; k++) powers[k] = (powers[k - 1] as number) * delta;
      for (let j = 0; j < size; j++) {
        const gj = g[j] as number;
        const ej = eta[j] as number;
        if (gj !== 0) {
          const lj = l[j] as number;
          const power = gj * (powers[lj] as number);
          e[j] = Math.exp(-power);
          x1[j] = -lj * power;
          x2[j] = -lj * lj * power;
        } else if (ej !== 0) {
          const away = delta - (epsilon[j] as number);
          e[j] = Math.exp(-ej * away * away);
          x1[j] = -2 * ej * delta * away;
          x2[j] = -2 * ej * delta * (delta + away);
        } else {
          e[j] = 1;
          x1[j] = 0;
          x2[j] = 0;
        }
      }
    },
  };
}
