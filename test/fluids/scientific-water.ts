/**
 * IAPWS R6-95(2018), the scientific formulation, as a check on the industrial one: the release's table of coefficients, evaluated with
 * second-order jets so that no derivative is written by hand. Checked itself against the release's table 7.
 */

const R = 461.51805;
const criticalTemperature = 647.096;
const criticalDensity = 322;

/** A function of δ and τ with its first and second derivatives. */
interface Jet {
  readonly f: number;
  readonly d: number;
  readonly t: number;
  readonly dd: number;
  readonly tt: number;
  readonly dt: number;
}

const constant = (f: number): Jet => ({ f, d: 0, t: 0, dd: 0, tt: 0, dt: 0 });
const add = (a: Jet, b: Jet): Jet => ({ f: a.f + b.f, d: a.d + b.d, t: a.t + b.t, dd: a.dd + b.dd, tt: a.tt + b.tt, dt: a.dt + b.dt });
const times = (a: Jet, b: Jet): Jet => ({
  f: a.f * b.f,
  d: a.d * b.f + a.f * b.d,
  t: a.t * b.f + a.f * b.t,
  dd: a.dd * b.f + 2 * a.d * b.d + a.f * b.dd,
  tt: a.tt * b.f + 2 * a.t * b.t + a.f * b.tt,
  dt: a.dt * b.f + a.d * b.t + a.t * b.d + a.f * b.dt,
});
const scaled = (a: Jet, factor: number): Jet => times(a, constant(factor));
/** g(a) from g, g′ and g″ at a. */
const chain = (a: Jet, g: number, g1: number, g2: number): Jet => ({
  f: g,
  d: g1 * a.d,
  t: g1 * a.t,
  dd: g2 * a.d * a.d + g1 * a.dd,
  tt: g2 * a.t * a.t + g1 * a.tt,
  dt: g2 * a.d * a.t + g1 * a.dt,
});
const exponential = (a: Jet): Jet => chain(a, Math.exp(a.f), Math.exp(a.f), Math.exp(a.f));
const power = (a: Jet, n: number): Jet => chain(a, a.f ** n, n * a.f ** (n - 1), n * (n - 1) * a.f ** (n - 2));
const logarithm = (a: Jet): Jet => chain(a, Math.log(a.f), 1 / a.f, -1 / (a.f * a.f));

// Table 1
const ideal = [
  [0.012436, 1.28728967],
  [0.97315, 3.53734222],
  [1.2795, 7.74073708],
  [0.96956, 9.24437796],
  [0.24873, 27.5075105],
] as const;

// Table 2: d, t, n
const polynomial = [
  [1, -0.5, 0.12533547935523e-1],
  [1, 0.875, 0.78957634722828e1],
  [1, 1, -0.87803203303561e1],
  [2, 0.5, 0.31802509345418],
  [2, 0.75, -0.26145533859358],
  [3, 0.375, -0.78199751687981e-2],
  [4, 1, 0.88089493102134e-2],
] as const;
// c, d, t, n
const damped = [
  [1, 1, 4, -0.66856572307965],
  [1, 1, 6, 0.20433810950965],
  [1, 1, 12, -0.66212605039687e-4],
  [1, 2, 1, -0.19232721156002],
  [1, 2, 5, -0.25709043003438],
  [1, 3, 4, 0.16074868486251],
  [1, 4, 2, -0.40092828925807e-1],
  [1, 4, 13, 0.39343422603254e-6],
  [1, 5, 9, -0.75941377088144e-5],
  [1, 7, 3, 0.56250979351888e-3],
  [1, 9, 4, -0.15608652257135e-4],
  [1, 10, 11, 0.11537996422951e-8],
  [1, 11, 4, 0.36582165144204e-6],
  [1, 13, 13, -0.13251180074668e-11],
  [1, 15, 1, -0.62639586912454e-9],
  [2, 1, 7, -0.10793600908932],
  [2, 2, 1, 0.17611491008752e-1],
  [2, 2, 9, 0.22132295167546],
  [2, 2, 10, -0.40247669763528],
  [2, 3, 10, 0.58083399985759],
  [2, 4, 3, 0.49969146990806e-2],
  [2, 4, 7, -0.31358700712549e-1],
  [2, 4, 10, -0.74315929710341],
  [2, 5, 10, 0.4780732991548],
  [2, 6, 6, 0.20527940895948e-1],
  [2, 6, 10, -0.13636435110343],
  [2, 7, 10, 0.14180634400617e-1],
  [2, 9, 1, 0.83326504880713e-2],
  [2, 9, 2, -0.29052336009585e-1],
  [2, 9, 3, 0.38615085574206e-1],
  [2, 9, 4, -0.20393486513704e-1],
  [2, 9, 8, -0.16554050063734e-2],
  [2, 10, 6, 0.19955571979541e-2],
  [2, 10, 9, 0.15870308324157e-3],
  [2, 12, 8, -0.1638856834253e-4],
  [3, 3, 16, 0.43613615723811e-1],
  [3, 4, 22, 0.34994005463765e-1],
  [3, 4, 23, -0.76788197844621e-1],
  [3, 5, 23, 0.22446277332006e-1],
  [4, 14, 10, -0.62689710414685e-4],
  [6, 3, 50, -0.55711118565645e-9],
  [6, 6, 44, -0.19905718354408],
  [6, 6, 46, 0.31777497330738],
  [6, 6, 50, -0.11841182425981],
] as const;
// t, n, β, γ
const bells = [
  [0, -0.31306260323435e2, 150, 1.21],
  [1, 0.31546140237781e2, 150, 1.21],
  [4, -0.25213154341695e4, 250, 1.25],
] as const;
// b, n, C, D
const critical = [
  [0.85, -0.14874640856724, 28, 700],
  [0.95, 0.31806110878444, 32, 800],
] as const;

function residual(d: Jet, t: Jet): Jet {
  const dOff = add(d, constant(-1));
  const tOff = add(t, constant(-1));
  const dSquare = times(dOff, dOff);
  const tSquare = times(tOff, tOff);
  let sum = constant(0);
  for (const [i, j, n] of polynomial) sum = add(sum, scaled(times(power(d, i), power(t, j)), n));
  for (const [c, i, j, n] of damped)
    sum = add(sum, scaled(times(times(power(d, i), power(t, j)), exponential(scaled(power(d, c), -1))), n));
  for (const [j, n, beta, gamma] of bells) {
    const off = add(t, constant(-gamma));
    const exponent = add(scaled(dSquare, -20), scaled(times(off, off), -beta));
    sum = add(sum, scaled(times(times(power(d, 3), power(t, j)), exponential(exponent)), n));
  }
  for (const [b, n, C, D] of critical) {
    const theta = add(scaled(tOff, -1), scaled(power(dSquare, 1 / 0.6), 0.32));
    const distance = add(times(theta, theta), scaled(power(dSquare, 3.5), 0.2));
    const psi = exponential(add(scaled(dSquare, -C), scaled(tSquare, -D)));
    sum = add(sum, scaled(times(times(power(distance, b), d), psi), n));
  }
  return sum;
}

function idealPart(d: Jet, t: Jet): Jet {
  let sum = add(logarithm(d), add(constant(-8.3204464837497), add(scaled(t, 6.6832105275932), scaled(logarithm(t), 3.00632))));
  for (const [n, gamma] of ideal) {
    const decay = exponential(scaled(t, -gamma));
    sum = add(sum, scaled(logarithm(add(constant(1), scaled(decay, -1))), n));
  }
  return sum;
}

export interface ScientificState {
  readonly p: number;
  readonly cp: number;
  readonly cv: number;
  readonly compressibility: number;
  readonly expansivity: number;
}

/** Kelvin and kg/m³ in, pascal and J/(kg·K) out. Steps aside by 1e-10 where the critical terms are 0/0. */
export function scientificState(T: number, rho: number): ScientificState {
  const delta = rho / criticalDensity;
  const tau = criticalTemperature / T;
  const d: Jet = { ...constant(delta === 1 ? 1 + 1e-10 : delta), d: 1 };
  const t: Jet = { ...constant(tau), t: 1 };
  const r = residual(d, t);
  const o = idealPart(d, t);
  const slope = 1 + 2 * delta * r.d + delta * delta * r.dd;
  const mixed = 1 + delta * r.d - delta * tau * r.dt;
  const cv = -R * tau * tau * (o.tt + r.tt);
  return {
    p: rho * R * T * (1 + delta * r.d),
    cv,
    cp: cv + (R * mixed * mixed) / slope,
    compressibility: 1 / (R * T * slope),
    expansivity: mixed / (slope * T),
  };
}
