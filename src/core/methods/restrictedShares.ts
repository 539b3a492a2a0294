import type { Designs } from '../model/groups';

/**
 * The two shares of greatest likelihood whose difference is `delta` (test − reference): the root of the score equation
 *   x₁/r₁ − (n₁ − x₁)/(1 − r₁) + x₂/r₂ − (n₂ − x₂)/(1 − r₂) = 0,  r₁ = r₂ + delta,
 * which falls over the whole range of r₂, so bisection finds it to the last bit. (The closed form by Cardano loses half
 * its digits near double roots.) Domain: −1 ≤ delta ≤ 1, n ≥ 1.
 * Source: Miettinen & Nurminen 1985, Statistics in Medicine 4:213–226, appendix I.
 */
export function restrictedShares(
  { test, reference }: Designs['counts'],
  delta: number,
): readonly [number, number] {
  if (delta === 0) {
    const pooled = (test.x + reference.x) / (test.n + reference.n);
    return [pooled, pooled];
  }
  const slope = (share: number): number =>
    ratio(test.x, share + delta) -
    ratio(test.n - test.x, 1 - (share + delta)) +
    ratio(reference.x, share) -
    ratio(reference.n - reference.x, 1 - share);
  let low = Math.max(0, -delta);
  let high = Math.min(1, 1 - delta);
  if (slope(low) <= 0) return [low + delta, low];
  if (slope(high) >= 0) return [high + delta, high];
  for (let middle = (low + high) / 2; middle > low && middle < high; middle = (low + high) / 2) {
    if (slope(middle) > 0) low = middle;
    else high = middle;
  }
  return [low + delta, low];
}

/** A count over a share; no count contributes nothing, even at a share of 0. */
const ratio = (count: number, share: number): number => (count === 0 ? 0 : count / Math.max(0, share));
