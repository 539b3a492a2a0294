import { describe, expect, it } from 'vitest';
import type { Change } from '../../src/core/model/settings';
import { changesKept } from '../../src/worker/changesKept';

const change = (key: string, from: number, to: number): Change => ({
  key,
  from,
  to,
  when: `${to}`,
  reason: 'protocol 12',
});

describe('changes of two sittings', () => {
  it('stand side by side where they are of different keys', () => {
    const [earlier, now] = [change('confidence', 0.95, 0.9), change('matters', 10, 15)];
    expect(changesKept([earlier], [now])).toEqual([earlier, now]);
  });

  it('of the same key go from the first value to the last', () => {
    const kept = changesKept([change('confidence', 0.95, 0.9)], [change('confidence', 0.9, 0.99)]);
    expect(kept).toEqual([change('confidence', 0.95, 0.99)]);
  });

  it('that lead back to where they began are none', () => {
    expect(changesKept([change('confidence', 0.95, 0.9)], [change('confidence', 0.9, 0.95)])).toEqual([]);
  });
});
