import type { Count, Designs } from '../model/groups';
import { shareDifference } from './shares';

/**
 * Newcombe's hybrid score limits (method 10) for x₁/n₁ − x₂/n₂ at a normal quantile: the distances of each share to its
 * Wilson limits, added in quadrature. Sources: Newcombe 1998, Statistics in Medicine 17:873–890; Wilson 1927,
 * Journal of the American Statistical Association 22:209–212.
 */
export function newcombeLower(counts: Designs['counts'], quantile: number): number {
  const { below } = wilsonDistances(counts.test, quantile);
  const { above } = wilsonDistances(counts.reference, quantile);
  return shareDifference(counts) - Math.hypot(below, above);
}

export function newcombeUpper(counts: Designs['counts'], quantile: number): number {
  const { above } = wilsonDistances(counts.test, quantile);
  const { below } = wilsonDistances(counts.reference, quantile);
  return shareDifference(counts) + Math.hypot(above, below);
}

/** From the share down to its lower Wilson limit and up to its upper one; formed directly, not as p − l and u − p. */
function wilsonDistances({ x, n }: Count, z: number): { readonly below: number; readonly above: number } {
  const square = z * z;
  const width = z * Math.sqrt(square + (4 * x * (n - x)) / n);
  const tilt = (square * (2 * x - n)) / n;
  const scale = 2 * (n + square);
  return { below: (width + tilt) / scale, above: (width - tilt) / scale };
}
