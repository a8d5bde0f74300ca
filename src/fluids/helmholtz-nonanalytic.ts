/** The non-analytic terms of the critical region, n Δ^b δ ψ, as printed with the equations of state of water (1995) and carbon dioxide (1996). */
import type { Residual } from "./helmholtz.js";

export interface NonAnalyticTerm {
  readonly n: number;
  readonly a: number;
  readonly b: number;
  readonly beta: number;
  readonly A: number;
  readonly B: number;
  readonly C: number;
  readonly D: number;
}

/** Beyond this exponent ψ is below 1e-19 and the term is nothing. */
const vanished = 44;
/** The terms are 0/0 at δ = 1; this far beside it they are not. */
const aside = 1e-10;

export function nonAnalytic(terms: readonly NonAnalyticTerm[]) {
  return {
    /** Adds all six derivatives; those that the caller did not ask for are simply left behind. */
    add(tau: number, delta: number, out: Residual): void {
      for (const term of terms)
        addTerm(term, Math.abs(tau - 1) < aside ? 1 + aside : tau, Math.abs(delta - 1) < aside ? 1 + aside : delta, out);
    },
  };
}

function addTerm(term: NonAnalyticTerm, tau: number, delta: number, out: Residual): void {
  const { n, a, b, beta, A, B, C, D } = term;
  const x = delta - 1;
  const y = tau - 1;
  const exponent = C * x * x + D * y * y;
  if (exponent > vanished) return;
  const square = x * x;
  const root = square ** (1 / (2 * beta) - 1);
  const theta = -y + A * root * square;
  const wide = B * square ** (a - 1);
  const Delta = theta * theta + wide * square;
  const perX = A * theta * (2 / beta) * root + 2 * a * wide;
  const Delta_d = x * perX;
  const Delta_dd =
    perX +
    4 * a * (a - 1) * wide +
    2 * A * A * (1 / beta) ** 2 * root * root * square +
    A * theta * (4 / beta) * (1 / (2 * beta) - 1) * root;

  const P = Delta ** b;
  const P1 = (b * P) / Delta;
  const P2 = ((b - 1) * P1) / Delta;
  const P_d = P1 * Delta_d;
  const P_dd = P1 * Delta_dd + P2 * Delta_d * Delta_d;
  const P_t = -2 * theta * P1;
  const P_tt = 2 * P1 + 4 * theta * theta * P2;
  const P_dt = -A * (2 / beta) * P1 * x * root - 2 * theta * P2 * Delta_d;

  const psi = Math.exp(-exponent);
  const psi_d = -2 * C * x * psi;
  const psi_dd = (2 * C * square - 1) * 2 * C * psi;
  const psi_t = -2 * D * y * psi;
  const psi_tt = (2 * D * y * y - 1) * 2 * D * psi;
  const psi_dt = 4 * C * D * x * y * psi;

  const whole = psi + delta * psi_d;
  out.a += n * P * delta * psi;
  out.d += delta * n * (P * whole + P_d * delta * psi);
  out.dd += delta * delta * n * (P * (2 * psi_d + delta * psi_dd) + 2 * P_d * whole + P_dd * delta * psi);
  out.t += tau * n * delta * (P_t * psi + P * psi_t);
  out.tt += tau * tau * n * delta * (P_tt * psi + 2 * P_t * psi_t + P * psi_tt);
  out.dt += delta * tau * n * (P * (psi_t + delta * psi_dt) + delta * P_d * psi_t + P_t * whole + P_dt * delta * psi);
}
