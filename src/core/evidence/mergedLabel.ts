import type { Settings } from '../model/settings';

/** What a label counts as after the declared merges, followed one after another; a circle of merges ends where it began. */
export function mergedLabel(label: string, same: Settings['same']): string {
  const seen = new Set<string>();
  let now = label;
  while (!seen.has(now)) {
    seen.add(now);
    now = same.find(([from]) => from === now)?.[1] ?? now;
  }
  return now;
}
