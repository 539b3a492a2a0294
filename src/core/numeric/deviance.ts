/** Beyond this |u| the series is slow, and the plain form no longer cancels. */
const SERIES_WITHIN = 0.5;
const SPLITTER = 2 ** 27 + 1;

/**
 * exp(−D), D = n ln(n/m) + m − n: how much less likely a count n > 0 is than the expected m, with offset = n − m given too
 * because callers know it better than the difference would. D = offset²/(n + m) + 2n Σ u^(2k+1)/(2k+1), k ≥ 1, with
 * u = offset/(n + m): Loader 2000, Fast and accurate computation of binomial probabilities. The leading term is carried
 * beyond double precision, since an error of D is a relative error of the result.
 */
export function deviancePower(count: number, expected: number, offset: number): number {
  const sum = 2 * count - offset;
  const u = offset / sum;
  if (u > SERIES_WITHIN) return Math.exp(offset - count * Math.log(count / expected));
  if (u < -SERIES_WITHIN) return Math.exp(-count * bend(offset / count));
  const lead = (offset * offset) / sum;
  const rest = productRest(offset, offset, lead, sum) / sum + 2 * count * cubicOn(u);
  // One exponential each keeps the digits of both; where the first would be 0 there are none to keep.
  return lead > 600 ? Math.exp(-(lead + rest)) : Math.exp(-lead) * Math.exp(-rest);
}

/** −ln(1 − e) − e for e < −⅔, where the two parts no longer cancel. */
const bend = (e: number): number => -Math.log1p(-e) - e;

/** u³/3 + u⁵/5 + …: artanh(u) − u. */
function cubicOn(u: number): number {
  const square = u * u;
  let power = u * square;
  let sum = 0;
  for (let odd = 3; ; odd += 2) {
    const term = power / odd;
    sum += term;
    if (Math.abs(term) <= 1e-17 * Math.abs(sum) || term === 0) return sum;
    power *= square;
  }
}

/** a·b − c·d where both products are nearly equal: each as a double and its exact rest (Dekker 1971). */
function productRest(a: number, b: number, c: number, d: number): number {
  const [left, leftRest] = exactProduct(a, b);
  const [right, rightRest] = exactProduct(c, d);
  return left - right + (leftRest - rightRest);
}

function exactProduct(a: number, b: number): readonly [product: number, rest: number] {
  const product = a * b;
  const [aHigh, aLow] = halves(a);
  const [bHigh, bLow] = halves(b);
  return [product, aLow * bLow - (product - aHigh * bHigh - aLow * bHigh - aHigh * bLow)];
}

function halves(a: number): readonly [high: number, low: number] {
  const scaled = SPLITTER * a;
  const high = scaled - (scaled - a);
  return [high, a - high];
}
