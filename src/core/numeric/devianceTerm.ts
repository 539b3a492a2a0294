const SERIES_WITHIN = 0.3;

/**
 * φ(e) = −ln(1 − e) − e for e < 1: how far the logarithm bends from its tangent. Relative accuracy near 1e-16 also where
 * both parts cancel. With e = 1 − p/q it makes the deviance of saddle-point forms (Loader 2000), taken as −ln(1 − e) =
 * 2 artanh(e/(2 − e)).
 */
export function logBend(e: number): number {
  if (Math.abs(e) >= SERIES_WITHIN) return -Math.log1p(-e) - e;
  const u = e / (2 - e);
  const square = u * u;
  let sum = 0;
  let power = u * square;
  for (let odd = 3; ; odd += 2) {
    const term = (2 * power) / odd;
    sum += term;
    if (Math.abs(term) <= 1e-17 * Math.abs(sum) || term === 0) break;
    power *= square;
  }
  return (e * e) / (2 - e) + sum;
}

/**
 * Deviance term x ln(x/m) + m − x for x ≥ 0, m > 0, without loss where x and m are close.
 * Source: Loader 2000, Fast and accurate computation of binomial probabilities, bd0.
 */
export function devianceTerm(x: number, m: number): number {
  const e = (x - m) / x;
  if (Math.abs(e) < SERIES_WITHIN) return x * logBend(e);
  return x === 0 ? m : x * Math.log(x / m) + m - x;
}
