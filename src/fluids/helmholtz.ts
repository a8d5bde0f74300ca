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
  const groups = distinct(terms.map((term) => term.density));
  const amounts = Float64Array.from(terms, (term) => term.n);
  const isotherm = isothermSums(temperatures.list, amounts, temperatures.of, groups.of, groups.list.length);
  const densities = densityFunctions(groups.list);
  const critical = record.nonAnalytic ? nonAnalytic(record.nonAnalytic) : undefined;
  const associating = record.association ? association(record.association) : undefined;
  const out: Residual = { a: 0, d: 0, dd: 0, t: 0, tt: 0, dt: 0 };

  const { s0, s1, s2 } = isotherm;
  const { value, first, second } = densities;
  const count = groups.list.length;

  return {
    pressurePart(tau, delta) {
      isotherm.at(tau);
      densities.at(delta);
      let a = 0;
      let d = 0;
      let dd = 0;
      for (let k = 0; k < count; k++) {
        const part = (s0[k] as number) * (value[k] as number);
        a += part;
        d += part * (first[k] as number);
        dd += part * (second[k] as number);
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
      densities.at(delta);
      let a = 0;
      let d = 0;
      let dd = 0;
      let t = 0;
      let tt = 0;
      let dt = 0;
      for (let k = 0; k < count; k++) {
        const g = value[k] as number;
        const part = (s0[k] as number) * g;
        const slope = first[k] as number;
        const warm = (s1[k] as number) * g;
        a += part;
        d += part * slope;
        dd += part * (second[k] as number);
        t += warm;
        tt += (s2[k] as number) * g;
        dt += warm * slope;
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

/** Σ n F, Σ n τF′ and Σ n τ²F″ of every density function, for the τ of the last call of `at`. */
function isothermSums(keys: readonly TemperatureKey[], amounts: Float64Array, keyOf: Int32Array, groupOf: Int32Array, groupCount: number) {
  const s0 = new Float64Array(groupCount);
  const s1 = new Float64Array(groupCount);
  const s2 = new Float64Array(groupCount);
  const f0 = new Float64Array(keys.length);
  const f1 = new Float64Array(keys.length);
  const f2 = new Float64Array(keys.length);
  const plain = keys.map((key) => key[1] === 0 && key[2] === 0 && key[4] === 0);
  let last = Number.NaN;
  const evaluate = (tau: number): void => {
    const logTau = Math.log(tau);
    for (let i = 0; i < keys.length; i++) {
      const [t, m, beta, gamma, c, b] = keys[i] as TemperatureKey;
      if (plain[i]) {
        const f = t === 0 ? 1 : Math.exp(t * logTau);
        f0[i] = f;
        f1[i] = f * t;
        f2[i] = f * t * (t - 1);
        continue;
      }
      let exponent = t * logTau;
      let slope = t;
      let bend = 0;
      const away = tau - gamma;
      if (m !== 0) {
        const power = Math.exp(m * logTau);
        exponent -= power;
        slope -= m * power;
        bend -= m * m * power;
      }
      if (beta !== 0) {
        exponent -= beta * away * away;
        slope -= 2 * beta * tau * away;
        bend -= 2 * beta * tau * (2 * tau - gamma);
      }
      if (c !== 0) {
        const q = 1 / (c * away * away + b);
        exponent += q;
        slope -= 2 * c * tau * away * q * q;
        bend += 2 * c * tau * q * q * (4 * c * tau * away * away * q - (2 * tau - gamma));
      }
      const f = Math.exp(exponent);
      f0[i] = f;
      f1[i] = f * slope;
      f2[i] = f * (slope * slope - slope + bend);
    }
  };
  return {
    s0,
    s1,
    s2,
    at(tau: number): void {
      if (tau === last) return;
      last = tau;
      evaluate(tau);
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

/** G, δG′/G and δ²G″/G of every density function, for the δ of the last call of `at`. */
function densityFunctions(keys: readonly DensityKey[]) {
  const value = new Float64Array(keys.length);
  const first = new Float64Array(keys.length);
  const second = new Float64Array(keys.length);
  const degree = Int32Array.from(keys, (key) => key[0]);
  const factors = distinct(keys.map(([, l, g, eta, epsilon]) => [l, g, eta, epsilon] as const));
  const factorOf = factors.of;
  const highest = Math.max(...keys.map((key) => Math.max(key[0], key[1])));
  const powers = new Float64Array(highest + 1);
  const size = factors.list.length;
  const l = Int32Array.from(factors.list, (factor) => factor[0]);
  const g = Float64Array.from(factors.list, (factor) => factor[1]);
  const eta = Float64Array.from(factors.list, (factor) => factor[2]);
  const epsilon = Float64Array.from(factors.list, (factor) => factor[3]);
  const e = new Float64Array(size);
  const slope = new Float64Array(size);
  const bend = new Float64Array(size);
  let last = Number.NaN;
  return {
    value,
    first,
    second,
    at(delta: number): void {
      if (delta === last) return;
      last = delta;
      powers[0] = 1;
      for (let k = 1; k <= highest; k++) powers[k] = (powers[k - 1] as number) * delta;
      for (let j = 0; j < size; j++) {
        const gj = g[j] as number;
        const ej = eta[j] as number;
        if (gj !== 0) {
          const lj = l[j] as number;
          const power = gj * (powers[lj] as number);
          e[j] = Math.exp(-power);
          slope[j] = -lj * power;
          bend[j] = -lj * lj * power;
        } else if (ej !== 0) {
          const away = delta - (epsilon[j] as number);
          e[j] = Math.exp(-ej * away * away);
          slope[j] = -2 * ej * delta * away;
          bend[j] = -2 * ej * delta * (delta + away);
        } else {
          e[j] = 1;
          slope[j] = 0;
          bend[j] = 0;
        }
      }
      for (let k = 0; k < keys.length; k++) {
        const j = factorOf[k] as number;
        const d = degree[k] as number;
        const s = d + (slope[j] as number);
        value[k] = (powers[d] as number) * (e[j] as number);
        first[k] = s;
        second[k] = s * s - s + (bend[j] as number);
      }
    },
  };
}
