/**
 * IAPWS R7-97(2012): the basic equations of regions 1, 2, 3 and 5, the saturation line and the boundary between regions 2 and 3.
 * Kelvin, pascal, kg/m³, J/kg. Nothing here tests a range: that is the work of water.ts.
 */
import { boundary23, constants, region1, region2, region3, region4, region5, type Term } from "./records/water.js";

const R = constants.gasConstant;
const [n1, n2, n3, n4, n5, n6, n7, n8, n9, n10] = region4;
const [b1, b2, b3] = boundary23;

/** What a basic equation gives at one state, before transport is added. */
export interface Thermodynamics {
  /** kg/m³ */
  readonly density: number;
  /** J/(kg·K) */
  readonly cp: number;
  /** J/(kg·K) */
  readonly cv: number;
  /** 1/K */
  readonly expansivity: number;
  /** J/kg */
  readonly enthalpy: number;
  /** J/kg; the specific Gibbs energy, equal in both phases at saturation. */
  readonly gibbs: number;
  /** m/s */
  readonly speedOfSound: number;
  /** (∂ρ/∂p) at constant temperature, kg/(m³·Pa) */
  readonly compressibility: number;
}

/** Value and derivatives of Σ n x^I y^J. */
interface Surface {
  f: number;
  x: number;
  xx: number;
  y: number;
  yy: number;
  xy: number;
}

/**
 * Compiles terms to a function that fills `out`. Powers come from ladders of repeated multiplication, of which only the rungs in use are
 * kept: no call of pow in the loop, one multiplication or two a rung.
 */
function surfaceOf(terms: readonly Term[]): (x: number, y: number, out: Surface) => void {
  const count = terms.length;
  const n = Float64Array.from(terms, (term) => term[2]);
  const I = Float64Array.from(terms, (term) => term[0]);
  const J = Float64Array.from(terms, (term) => term[1]);
  const xLadder = ladderOf(terms.map((term) => term[0]));
  const yLadder = ladderOf(terms.map((term) => term[1]));
  return (x, y, out) => {
    const xs = xLadder.climb(x);
    const ys = yLadder.climb(y);
    let f = 0;
    let fx = 0;
    let fxx = 0;
    let fy = 0;
    let fyy = 0;
    let fxy = 0;
    for (let k = 0; k < count; k++) {
      const i = I[k] as number;
      const j = J[k] as number;
      const term = (n[k] as number) * (xs[xLadder.rung[k] as number] as number) * (ys[yLadder.rung[k] as number] as number);
      const ti = i * term;
      const tj = j * term;
      f += term;
      fx += ti;
      fxx += (i - 1) * ti;
      fy += tj;
      fyy += (j - 1) * tj;
      fxy += j * ti;
    }
    out.f = f;
    out.x = fx / x;
    out.xx = fxx / (x * x);
    out.y = fy / y;
    out.yy = fyy / (y * y);
    out.xy = fxy / (x * y);
  };
}

interface Ladder {
  /** For each term the place of its power in what `climb` returns. */
  readonly rung: Int32Array;
  climb(base: number): Float64Array;
}

/** Integer powers of one base. A rung is the product of two lower ones, so that few multiplications reach far exponents. */
function ladderOf(exponents: readonly number[]): Ladder {
  const lowest = Math.min(0, ...exponents);
  const highest = Math.max(1, ...exponents);
  const needed = [...new Set(exponents)].filter((power) => power !== 0);
  const powers: number[] = [0, 1, -1];
  const lower: number[] = [0, 0, 0];
  const upper: number[] = [0, 0, 0];
  const place = (power: number): number => {
    const at = powers.indexOf(power);
    if (at >= 0) return at;
    const half = power > 0 ? Math.floor(power / 2) : Math.ceil(power / 2);
    const first = nearestKnown(powers, power) ?? half;
    const a = place(first);
    const b = place(power - first);
    powers.push(power);
    lower.push(a);
    upper.push(b);
    return powers.length - 1;
  };
  for (const power of needed.filter((one) => one > 0 && one <= highest).sort((a, b) => a - b)) place(power);
  for (const power of needed.filter((one) => one < 0 && one >= lowest).sort((a, b) => b - a)) place(power);
  const steps = powers.length;
  const first = Int32Array.from(lower);
  const second = Int32Array.from(upper);
  const values = new Float64Array(steps);
  const inverse = lowest < 0;
  return {
    rung: Int32Array.from(exponents, (power) => powers.indexOf(power)),
    climb(base) {
      values[0] = 1;
      values[1] = base;
      values[2] = inverse ? 1 / base : 1;
      for (let k = 3; k < steps; k++) values[k] = (values[first[k] as number] as number) * (values[second[k] as number] as number);
      return values;
    },
  };
}

/** A power already on the ladder whose partner to `power` is there too. */
function nearestKnown(powers: readonly number[], power: number): number | undefined {
  return powers.find((one) => one !== 0 && Math.sign(one) === Math.sign(power) && powers.includes(power - one));
}

const surface1 = surfaceOf(region1.terms);
const ideal2 = surfaceOf(region2.ideal);
const residual2 = surfaceOf(region2.residual);
const surface3 = surfaceOf(region3.terms);
const ideal5 = surfaceOf(region5.ideal);
const residual5 = surfaceOf(region5.residual);

// Written anew by every call before it is read: scratch space, not state.
const scratch: Surface = { f: 0, x: 0, xx: 0, y: 0, yy: 0, xy: 0 };
const idealScratch: Surface = { f: 0, x: 0, xx: 0, y: 0, yy: 0, xy: 0 };

export function liquidState(T: number, p: number): Thermodynamics {
  const pi = p / region1.pressure;
  const tau = region1.temperature / T;
  surface1(7.1 - pi, tau - 1.222, scratch);
  const s = scratch;
  return fromGibbs(T, p, pi, tau, s.f, -s.x, s.xx, s.y, s.yy, -s.xy);
}

export function steamState(T: number, p: number): Thermodynamics {
  const pi = p / region2.pressure;
  const tau = region2.temperature / T;
  ideal2(1, tau, idealScratch);
  residual2(pi, tau - 0.5, scratch);
  return fromParts(T, p, pi, tau);
}

export function hotSteamState(T: number, p: number): Thermodynamics {
  const pi = p / region5.pressure;
  const tau = region5.temperature / T;
  ideal5(1, tau, idealScratch);
  residual5(pi, tau, scratch);
  return fromParts(T, p, pi, tau);
}

function fromParts(T: number, p: number, pi: number, tau: number): Thermodynamics {
  const s = scratch;
  const o = idealScratch;
  return fromGibbs(T, p, pi, tau, Math.log(pi) + o.f + s.f, 1 / pi + s.x, -1 / (pi * pi) + s.xx, o.y + s.y, o.yy + s.yy, s.xy);
}

/** R7-97 table 3: properties from γ(π, τ) and its derivatives. */
function fromGibbs(
  T: number,
  p: number,
  pi: number,
  tau: number,
  g: number,
  gPi: number,
  gPiPi: number,
  gTau: number,
  gTauTau: number,
  gPiTau: number,
): Thermodynamics {
  const mixed = gPi - tau * gPiTau;
  const cp = -R * tau * tau * gTauTau;
  const cv = cp + (R * mixed * mixed) / gPiPi;
  const density = p / (R * T * pi * gPi);
  return {
    density,
    cp,
    cv,
    expansivity: mixed / (gPi * T),
    enthalpy: R * T * tau * gTau,
    gibbs: R * T * g,
    speedOfSound: Math.sqrt((-R * T * gPi * gPi * cp) / (gPiPi * cv)),
    compressibility: (-density * pi * gPiPi) / (gPi * p),
  };
}

/** Region 3, by density. */
export function denseState(T: number, density: number): Thermodynamics {
  const delta = density / constants.criticalDensity;
  const tau = constants.criticalTemperature / T;
  surface3(delta, tau, scratch);
  const s = scratch;
  const phi = region3.logarithm * Math.log(delta) + s.f;
  const phiD = region3.logarithm / delta + s.x;
  const phiDD = -region3.logarithm / (delta * delta) + s.xx;
  const slope = 2 * delta * phiD + delta * delta * phiDD;
  const mixed = delta * phiD - delta * tau * s.xy;
  const cv = -R * tau * tau * s.yy;
  const cp = cv + (R * mixed * mixed) / slope;
  const enthalpy = R * T * (tau * s.y + delta * phiD);
  return {
    density,
    cp,
    cv,
    expansivity: mixed / (slope * T),
    enthalpy,
    gibbs: R * T * (phi + delta * phiD),
    speedOfSound: Math.sqrt(R * T * slope * (cp / cv)),
    compressibility: 1 / (R * T * slope),
  };
}

/** Pressure of region 3, Pa, and its slope with density at constant temperature. */
export function densePressure(T: number, density: number): { readonly p: number; readonly slope: number } {
  const delta = density / constants.criticalDensity;
  surface3(delta, constants.criticalTemperature / T, scratch);
  const phiD = region3.logarithm / delta + scratch.x;
  const phiDD = -region3.logarithm / (delta * delta) + scratch.xx;
  return { p: density * R * T * delta * phiD, slope: R * T * (2 * delta * phiD + delta * delta * phiDD) };
}

// Wider than the densities that region 3 holds between its boundaries, 113 to 762 kg/m³.
const thinnest = 80;
const densest = 800;

/**
 * Density in region 3. Below the critical temperature `liquid` says which of the roots is meant: the liquid is
 * approached from the dense end and the vapour from the thin one, where Newton steps cannot pass the root. Every step is held in a bracket
 * that is known to hold a root, and is halved where Newton leaves it, so that the search always ends.
 */
export function denseDensity(T: number, p: number, liquid: boolean): number {
  const subcritical = T < constants.criticalTemperature;
  let low = subcritical && liquid ? constants.criticalDensity : thinnest;
  let high = subcritical && !liquid ? constants.criticalDensity : densest;
  let rho = subcritical ? (liquid ? high : low) : constants.criticalDensity;
  for (let k = 0; k < 100; k++) {
    const { p: here, slope } = densePressure(T, rho);
    const excess = here - p;
    if (Math.abs(excess) <= 1e-12 * p) return rho;
    if (excess > 0) high = rho;
    else low = rho;
    const newton = rho - excess / slope;
    const next = slope > 0 && newton > low && newton < high ? newton : (low + high) / 2;
    if (Math.abs(next - rho) <= 1e-14 * rho) return next;
    rho = next;
  }
  return rho;
}

/** Pa; region 4, the saturation line solved for pressure: 273.15 K to the critical point. */
export function saturationPressure(T: number): number {
  const theta = T + n9 / (T - n10);
  const A = theta * theta + n1 * theta + n2;
  const B = n3 * theta * theta + n4 * theta + n5;
  const C = n6 * theta * theta + n7 * theta + n8;
  const root = (2 * C) / (-B + Math.sqrt(B * B - 4 * A * C));
  const square = root * root;
  return square * square * 1e6;
}

/** Pa; the vapour pressure over ice, IAPWS R14-08(2011), 50 K to the triple point. */
export function sublimationPressure(T: number): number {
  const theta = T / 273.16;
  const sum = -21.2144006 * theta ** 0.00333333333 + 27.3203819 * theta ** 1.20666667 - 6.1059813 * theta ** 1.70333333;
  return 611.657 * Math.exp(sum / theta);
}

/** Pa; over liquid water above the triple point, over ice below it. */
export function vapourPressureOfWater(T: number): number {
  return T >= 273.16 ? saturationPressure(T) : sublimationPressure(T);
}

/** K; where water or ice has this vapour pressure, by bisection over ice. 1e-3 Pa to the critical pressure. */
export function dewPointOf(p: number): number {
  if (p >= 611.657) return saturationTemperature(p);
  const wanted = Math.log(p);
  let low = 150;
  let high = 273.16;
  for (let k = 0; k < 60 && high - low > 1e-9; k++) {
    const middle = (low + high) / 2;
    if (Math.log(sublimationPressure(middle)) > wanted) high = middle;
    else low = middle;
  }
  return (low + high) / 2;
}

/** K; the same equation solved for temperature. 611.213 Pa to the critical point. */
export function saturationTemperature(p: number): number {
  const beta = Math.sqrt(Math.sqrt(p / 1e6));
  const E = beta * beta + n3 * beta + n6;
  const F = n1 * beta * beta + n4 * beta + n7;
  const G = n2 * beta * beta + n5 * beta + n8;
  const D = (2 * G) / (-F - Math.sqrt(F * F - 4 * E * G));
  return (n10 + D - Math.sqrt((n10 + D) * (n10 + D) - 4 * (n9 + n10 * D))) / 2;
}

/** Pa; boundary between regions 2 and 3, 623.15 K to 863.15 K. */
export function boundaryPressure(T: number): number {
  return (b1 + T * (b2 + T * b3)) * 1e6;
}
