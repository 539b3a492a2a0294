import type { Change } from '../core/model/settings';

/**
 * The changes of an earlier sitting followed by those of this one: a key that was changed in both goes from its first
 * value to its last, and is no change when these are the same.
 */
export function changesKept(earlier: readonly Change[], now: readonly Change[]): readonly Change[] {
  const before = new Map(earlier.map(change => [change.key, change]));
  const untouched = earlier.filter(({ key }) => !now.some(change => change.key === key));
  const joined = now.map(change => ({ ...change, from: before.get(change.key)?.from ?? change.from }));
  return [...untouched, ...joined.filter(({ from, to }) => JSON.stringify(from) !== JSON.stringify(to))];
}
