/** The association term of SAFT as the equation of state of methanol carries it: a m (ln X − X/2 + 1/2). */
import type { Residual } from "./helmholtz.js";

export interface Association {
  readonly a: number;
  readonly m: number;
  readonly epsilon: number;
  readonly kappa: number;
  readonly vbar: number;
}

/** X = 2/(1+√(1+4y)) with y = δ g(η) κ (exp(ετ) − 1), g = (1−η/2)/(1−η)³, η = v̄δ: a function of one product of a δ and a τ part. */
export function association({ a, m, epsilon, kappa, vbar }: Association) {
  return {
    add(tau: number, delta: number, out: Residual): void {
      const eta = vbar * delta;
      const half = eta / 2 / (1 - eta / 2);
      const rest = eta / (1 - eta);
      const grown = Math.exp(epsilon * tau);
      const y = ((delta * (1 - eta / 2)) / (1 - eta) ** 3) * kappa * (grown - 1);
      const s = Math.sqrt(1 + 4 * y);
      const X = 2 / (1 + s);
      const yA1 = (-a * m * X * X * y) / 2;
      const yyA2 = (a * m * X * X * X * y * y) / s;
      const h1 = 1 - half + 3 * rest;
      const h2 = h1 * h1 - h1 - half / (1 - eta / 2) + (3 * rest) / (1 - eta);
      const w1 = (epsilon * tau * grown) / (grown - 1);
      const w2 = epsilon * tau * w1;
      out.a += a * m * (Math.log(X) - X / 2 + 0.5);
      out.d += yA1 * h1;
      out.dd += yyA2 * h1 * h1 + yA1 * h2;
      out.t += yA1 * w1;
      out.tt += yyA2 * w1 * w1 + yA1 * w2;
      out.dt += (yyA2 + yA1) * h1 * w1;
    },
  };
}
