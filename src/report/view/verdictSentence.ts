import type { Comparison, Row } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { printP, printSignificant } from '../numbersPrinted';
import { decisionWords } from '../words/decisionWords';
import { alikeValue } from '../words/estimates';
import { groupLabel } from '../words/groupLabels';
import type { Scale } from '../words/scale';
import { rowTitle } from './rowTitle';

/** Whether the decision depends on the choice among the counted rows, and how far the interval stays away. */
export function verdictSentence(comparison: Comparison, scale: Scale, t: Say): string {
  const rows = heardRows(comparison);
  switch (comparison.whatIf.depends) {
    case 'no':
      return rows.length < 2
        ? t(
            'Only one row could be counted: nothing beside it shows whether the decision depends on the choice.',
          )
        : agreement(comparison, rows, scale, t);
    case 'yes':
      return disagreement(comparison, rows, scale, t);
    case 'on the line': {
      const ps = rows.flatMap(({ result }) => numberOf(result?.p)).sort((a, b) => a - b);
      const text = (p: number | undefined): string => printP(p ?? Number.NaN, comparison.settings.confidence);
      return t(
        'The result sits on the line itself (p {0} to {1}): no choice of method settles it.',
        text(ps[0]),
        text(ps.at(-1)),
      );
    }
  }
}

/** The verdict without the range of the intervals: for a line of a terminal. */
export function verdictShort(comparison: Comparison, scale: Scale, t: Say): string {
  return comparison.whatIf.depends === 'no' && heardRows(comparison).length > 1
    ? t('The decision does not depend on the choice.')
    : verdictSentence(comparison, scale, t);
}

/** The rows the verdict listens to: the counted ones and the chosen one. */
function heardRows({ whatIf, chosen }: Comparison): readonly Row[] {
  return whatIf.rows.filter(row => row.result !== null && (row.counted || isSame(row, chosen)));
}

const numberOf = (value: number | null | undefined): readonly number[] =>
  typeof value === 'number' ? [value] : [];

export const isSame = (row: Row, chosen: Row): boolean => row.id === chosen.id && row.data === chosen.data;

function agreement(comparison: Comparison, rows: readonly Row[], scale: Scale, t: Say): string {
  const against = comparison.settings.against;
  const zero = heldAgainst(comparison, scale, t);
  const withInterval = rows.filter(
    ({ result }) => result !== null && (result.lower !== null || result.upper !== null),
  );
  const without = rows.filter(row => !withInterval.includes(row));
  const agrees =
    without.length === 0
      ? ''
      : `; ${t('{0} agrees', without.map(row => rowTitle(row, comparison, t)).join(', '))}`;
  const opening = t('The decision does not depend on the choice');
  const all = howMany(withInterval.length, without.length, t);
  if (withInterval.length === 0) return `${opening}${agrees}.`;

  const decision = comparison.chosen.decision;
  const lowers = withInterval.flatMap(({ result }) => numberOf(result?.lower));
  const uppers = withInterval.flatMap(({ result }) => numberOf(result?.upper));
  const decided = decision === 'differs' || decision === 'higher' || decision === 'lower';
  if (decided && lowers.length === withInterval.length && Math.min(...lowers) >= against) {
    const range = rangeWords(lowers, scale, t);
    return `${t('{0}: the interval stays above {1} {2}, its lower end {3}', opening, zero, all, range)}${agrees}.`;
  }
  if (decided && uppers.length === withInterval.length && Math.max(...uppers) <= against) {
    const range = rangeWords(uppers, scale, t);
    return `${t('{0}: the interval stays below {1} {2}, its upper end {3}', opening, zero, all, range)}${agrees}.`;
  }
  if (decision === 'not settled' && withInterval.every(row => holds(row, against)))
    return `${t('{0}: {1} lies inside the interval {2}', opening, zero, all)}${agrees}.`;
  const word = decision === null ? '' : decisionWords(decision, t);
  return t('{0}: "{1}" in all {2} counted rows.', opening, word, rows.length);
}

/** What every interval is held against, in words. */
function heldAgainst(comparison: Comparison, scale: Scale, t: Say): string {
  const { against } = comparison.settings;
  if (against === 0) return t('zero');
  return against === alikeValue(comparison) ? scale.typedNumber(against) : scale.typed(against);
}

/** "in all 3 counted rows that have one", "in all 3 counted rows", "in both counted rows". */
function howMany(withInterval: number, without: number, t: Say): string {
  if (withInterval === 1) return t('in the one row that has one');
  if (without > 0)
    return withInterval === 2
      ? t('in both counted rows that have one')
      : t('in all {0} counted rows that have one', withInterval);
  return withInterval === 2 ? t('in both counted rows') : t('in all {0} counted rows', withInterval);
}

function rangeWords(ends: readonly number[], scale: Scale, t: Say): string {
  const from = scale.number(Math.min(...ends)).text;
  const to = scale.number(Math.max(...ends)).text;
  return from === to ? t('at {0}', scale.withUnit(from)) : t('from {0} to {1}', from, scale.withUnit(to));
}

const holds = ({ result }: Row, value: number): boolean =>
  result !== null && (result.lower ?? -Infinity) <= value && (result.upper ?? Infinity) >= value;

function disagreement(comparison: Comparison, rows: readonly Row[], scale: Scale, t: Say): string {
  const { settings } = comparison;
  const zero = heldAgainst(comparison, scale, t);
  const titles = (list: readonly Row[]): string => list.map(row => rowTitle(row, comparison, t)).join(', ');
  const advice = t(
    'Report the row chosen beforehand together with this sentence; choose from how the measurements were made, not from these rows.',
  );
  const intervals = rows.every(
    ({ result }) => result !== null && result.lower !== null && result.upper !== null,
  );
  if (settings.question === 'differs' && intervals) {
    const outside = rows.filter(row => row.decision === 'differs');
    const inside = rows.filter(row => row.decision !== 'differs');
    return `${t('The decision depends on the choice: {0} is outside under {1}, inside under {2}.', zero, titles(outside), titles(inside))} ${advice}`;
  }
  const decisions = [...new Set(rows.map(row => row.decision))].filter(decision => decision !== null);
  const parts = decisions.map(decision =>
    t('{0} under {1}', decisionWords(decision, t), titles(rows.filter(row => row.decision === decision))),
  );
  return `${t('The decision depends on the choice: {0}.', parts.join('; '))} ${advice}`;
}

/** Where separate and pooled decide differently: which group is smaller and more variable, and what pooling does to that. */
export function explainedBy(comparison: Comparison, t: Say): string | null {
  const { groups, chosen, whatIf } = comparison;
  const decisionOf = (id: string): string | null =>
    whatIf.rows.find(row => row.id === id && row.data === chosen.data)?.decision ?? null;
  const separate = decisionOf('separate-t');
  const pooled = decisionOf('pooled-t');
  const [test, reference] = groups;
  if (
    separate === null ||
    pooled === null ||
    separate === pooled ||
    test === undefined ||
    reference === undefined
  )
    return null;
  const [small, large] = test.n <= reference.n ? [test, reference] : [reference, test];
  const more = small.sd > large.sd ? small : large;
  const ratio = printSignificant(Math.max(test.sd, reference.sd) / Math.min(test.sd, reference.sd), 2);
  if (small.n === large.n)
    return t(
      'The groups are of equal size (n = {0}); {1} is {2} times as variable.',
      small.n,
      groupLabel(more.label, comparison),
      ratio,
    );
  return more === small
    ? t(
        'The smaller group ({0}, n = {1} against {2}) is {3} times as variable: pooling overstates the evidence.',
        groupLabel(small.label, comparison),
        small.n,
        large.n,
        ratio,
      )
    : t(
        'The larger group ({0}, n = {1} against {2}) is {3} times as variable: pooling understates the evidence.',
        groupLabel(large.label, comparison),
        large.n,
        small.n,
        ratio,
      );
}
