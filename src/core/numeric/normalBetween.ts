import { normalDensity, normalUpperTail } from './normal';

/** Narrower than this, the difference of two tails would lose digits. */
const NARROW = 0.25;

/** Half of the nodes and weights of the Gauss–Legendre rule of 8 points on [−1, 1]; the other half mirrors them. */
const NODES = [
  [0.183434642495649805, 0.362683783378361983],
  [0.525532409916328986, 0.313706645877887287],
  [0.79666647741362674, 0.222381034453374471],
  [0.960289856497536232, 0.101228536290376259],
] as const;

/** P(high − width ≤ Z ≤ high) of the standard normal distribution, with its relative accuracy however narrow. */
export function normalBetween(high: number, width: number): number {
  if (width < NARROW) return overNarrow(high - width / 2, width / 2);
  const low = high - width;
  return low + high > 0
    ? normalUpperTail(low) - normalUpperTail(high)
    : normalUpperTail(-high) - normalUpperTail(-low);
}

const overNarrow = (middle: number, half: number): number =>
  NODES.reduce(
    (sum, [node, weight]) =>
      sum + weight * half * (normalDensity(middle - half * node) + normalDensity(middle + half * node)),
    0,
  );
