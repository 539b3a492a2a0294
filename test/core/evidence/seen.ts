import type { Seen } from '../../../src/core/model/comparison';
import type { Group } from '../../../src/core/model/groups';
import type { Settings } from '../../../src/core/model/settings';

const settings: Settings = {
  files: [],
  reading: {
    encoding: 'utf-8',
    delimiter: ',',
    decimal: '.',
    thousands: '',
    header: 1,
    missing: [],
    below: 'refuse',
  },
  rows: 'all',
  where: [],
  layout: { kind: 'typed', groups: [] },
  relation: { kind: 'rows' },
  numberingRestarts: false,
  test: 'test',
  reference: 'reference',
  same: [],
  leftOut: [],
  measure: 'mean',
  method: 'separate-t',
  question: 'differs',
  confidence: 0.95,
  against: 0,
  margin: null,
  matters: null,
  options: {},
};

/** What an evidence check is shown: groups without a table. */
export const seenOf = (groups: readonly Group[], change: Partial<Settings> = {}): Seen => ({
  table: null,
  groups,
  settings: { ...settings, ...change },
  rows: [],
});
