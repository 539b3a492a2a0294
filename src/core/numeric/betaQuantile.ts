import { betaPrefactor, incompleteBeta } from './incompleteBeta';
import { betaStart } from './startingValue';
import { rootOfLogTail } from './rootOfLogTail';

/** x with I_x(a, b) = p, for p in (0, 1) and a, b > 0; 0 and 1 at the ends. */
export function betaQuantile(p: number, a: number, b: number): number {
  if (!(p > 0 && p < 1)) return p === 0 ? 0 : p === 1 ? 1 : NaN;
  const { lower, odds } = root(p, a, b);
  return lower ? 1 / (1 + 1 / odds) : 1 / (1 + odds);
}

/**
 * The root is sought on the odds x/(1 − x), or (1 − x)/x for the upper half: they run over all positive numbers, so that an x
 * close to 0 or to 1 loses nothing, and their smaller tail keeps its relative accuracy.
 */
function root(p: number, a: number, b: number): { readonly lower: boolean; readonly odds: number } {
  const start = betaStart(p, a, b);
  if (p > 0.5) return { lower: true, odds: oddsWithUpperTail(1 - p, a, b, start / (1 - start)) };
  return { lower: false, odds: oddsWithUpperTail(p, b, a, (1 - start) / start) };
}

function oddsWithUpperTail(tail: number, a: number, b: number, start: number): number {
  const shares = (odds: number): readonly [number, number] => [1 / (1 + 1 / odds), 1 / (1 + odds)];
  return rootOfLogTail(
    start,
    tail,
    odds => incompleteBeta(...shares(odds), a, b).upper,
    odds => betaPrefactor(...shares(odds), a, b) / odds,
  );
}
