import type { Table } from '../core/model/cells';
import type { Comparison } from '../core/model/comparison';
import type { Count, Group, Summary } from '../core/model/groups';
import { Refusal, type Ticker } from '../core/model/problem';
import type { Settings } from '../core/model/settings';
import { countGroups } from './countGroups';
import { pairCounts } from './pairCounts';
import { pairCorrelation } from './pairCorrelation';
import { pairGroups } from './pairGroups';
import type { DesignData } from './runRow';
import { selectRows, type Selection } from './selection';
import { checkedSummary, groupOfSummary, summaryRows } from './summaryGroups';
import { uncounted } from './uncounted';
import { valueGroups } from './valueGroups';

/** The data of one comparison, ready for the methods. */
export interface Prepared {
  readonly selection: Selection | null;
  readonly design: keyof DesignData;
  readonly designs: DesignData;
  readonly groups: readonly Group[];
  /** For shares: the counts behind the groups. */
  readonly counts: readonly Count[] | null;
  readonly pairs: Comparison['pairs'];
}

/** Takes the values that `settings` names and puts them into the designs that methods work on. Throws Refusal. */
export function prepare(table: Table | null, settings: Settings, tick: Ticker): Prepared {
  if (table === null) return fromSummaries(typedSummaries(settings), settings, null);
  const selection = selectRows(table, settings, tick);
  if (settings.layout.kind === 'summary')
    return fromSummaries(summaryRows(table, selection, settings), settings, selection);
  if (settings.measure === 'proportion') return fromOutcomes(table, selection, settings);
  const groups = valueGroups(selection, settings);
  refuseEmpty(groups);
  if (settings.test === null) return ofSeveral(groups, settings, selection);
  const [test, reference] = groups;
  if (test === undefined || reference === undefined)
    throw new Refusal('groups-too-few', { labels: selection.groups });
  const two = { test, reference };
  if (settings.relation.kind !== 'pairs') {
    return { selection, design: 'two', designs: { two }, groups, counts: null, pairs: null };
  }
  const pairs = pairGroups(table, selection, settings);
  return {
    selection,
    design: 'pairs',
    designs: { two, pairs },
    groups: [pairs.test, pairs.reference],
    counts: null,
    pairs: { complete: pairs.differences.n, unmatched: pairs.unmatched, correlation: pairCorrelation(pairs) },
  };
}

function fromOutcomes(table: Table, selection: Selection, settings: Settings): Prepared {
  if (settings.relation.kind === 'pairs') return fromPairedOutcomes(table, selection, settings);
  const counted = countGroups(table, selection, settings);
  const rest = uncounted(selection, settings.layout);
  const groups = counted.map(({ count, readings, units }, group) => ({
    ...groupOfCount(count),
    ...(rest[group] ?? {}),
    readings,
    units,
  }));
  refuseEmpty(groups);
  return ofCounts(
    counted.map(({ count }) => count),
    groups,
    selection,
  );
}

function fromPairedOutcomes(table: Table, selection: Selection, settings: Settings): Prepared {
  const { table: pairedCounts, counts, unmatched } = pairCounts(table, selection, settings);
  const rest = uncounted(selection, settings.layout);
  const groups = counts.map((count, group) => ({ ...groupOfCount(count), ...(rest[group] ?? {}) }));
  return {
    selection,
    design: 'pairedCounts',
    designs: { pairedCounts },
    groups,
    counts,
    pairs: { complete: counts[0].n, unmatched, correlation: null },
  };
}

function fromSummaries(
  summaries: readonly (Summary | Count)[],
  settings: Settings,
  selection: Selection | null,
): Prepared {
  const counts = summaries.filter(summary => 'x' in summary);
  if (counts.length === summaries.length) return ofCounts(counts, counts.map(groupOfCount), selection);
  const summarised = summaries.filter(summary => 'mean' in summary).map(groupOfSummary);
  if (settings.test === null && summarised.length === summaries.length)
    return ofSeveral(summarised, settings, selection);
  const [test, reference] = summarised;
  if (test === undefined || reference === undefined) throw new Refusal('summary-invalid', { what: 'mixed' });
  const groups = [test, reference];
  return {
    selection,
    design: 'two',
    designs: { two: { test, reference } },
    groups,
    counts: null,
    pairs: null,
  };
}

function ofSeveral(groups: readonly Group[], { reference }: Settings, selection: Selection | null): Prepared {
  const at = groups.findIndex(({ label }) => label === reference);
  const several = { groups, reference: at < 0 ? null : at };
  return { selection, design: 'several', designs: { several }, groups, counts: null, pairs: null };
}

function ofCounts(counts: readonly Count[], groups: readonly Group[], selection: Selection | null): Prepared {
  const [test, reference] = counts;
  if (test === undefined || reference === undefined) throw new RangeError('counts need two groups');
  return {
    selection,
    design: 'counts',
    designs: { counts: { test, reference } },
    groups,
    counts,
    pairs: null,
  };
}

/** The typed groups named as test and reference, in that order, or all of them. */
function typedSummaries({ layout, test, reference }: Settings): readonly (Summary | Count)[] {
  if (layout.kind !== 'typed') throw new RangeError('only typed numbers can do without a table');
  const labels = test === null ? layout.groups.map(({ label }) => label) : [test, reference];
  return labels.map(label => {
    const group = layout.groups.find(typed => typed.label === label);
    if (group === undefined)
      throw new Refusal('label-unknown', { label, labels: layout.groups.map(own => own.label) });
    return checkedSummary(group, null);
  });
}

/** A share as a group: mean x/n, SD that of a single outcome, √(p(1 − p)). */
function groupOfCount({ label, x, n }: Count): Group {
  const share = x / n;
  return { ...groupOfSummary({ label, n, mean: share, sd: 0 }), sd: Math.sqrt(share * (1 - share)) };
}

function refuseEmpty(groups: readonly Group[]): void {
  const empty = groups.find(({ n }) => n === 0);
  if (empty === undefined) return;
  const { label, missing, leftOut } = empty;
  throw new Refusal('values-too-few', { label, n: 0, missing, leftOut });
}
