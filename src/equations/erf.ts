/** Error function to full double precision: the series near zero, the continued fraction beyond. */
export function erf(x: number): number {
  const size = Math.abs(x);
  if (size > 6) return Math.sign(x);
  return Math.sign(x) * (size < 2.5 ? series(size) : 1 - tail(size));
}

function series(x: number): number {
  let term = x;
  let sum = x;
  for (let n = 1; Math.abs(term) > 1e-18 * sum; n++) {
    term *= (-x * x) / n;
    sum += term / (2 * n + 1);
  }
  return (2 / Math.sqrt(Math.PI)) * sum;
}

function tail(x: number): number {
  let fraction = 0;
  for (let n = 60; n > 0; n--) fraction = n / 2 / (x + fraction);
  return Math.exp(-x * x) / Math.sqrt(Math.PI) / (x + fraction);
}
