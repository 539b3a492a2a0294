import type { Comparison, Effect } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { clearOf, effectPlace, fullText, printAt, printP, printThree } from '../numbersPrinted';
import { boundsWords } from '../words/boundsWords';
import { shareWords } from '../words/count';
import { showLabel } from '../words/label';
import { outcomeOf, measuredName } from '../words/measuredName';
import type { Scale } from '../words/scale';
import { unitNoun } from '../words/unitNoun';
import { statisticOf } from './answer';
import { evidenceSentence } from './findings';
import { effectName, effectSpecial } from './effects';
import type { NumberRow, NumbersShown, Printed } from './shown';

/** Groups across, quantities down; the difference in its own column where two groups are compared. */
export function numbersTable(comparison: Comparison, scale: Scale, t: Say): NumbersShown {
  const { groups, design } = comparison;
  const labels = groups.map(group => showLabel(group.label));
  const two = groups.length === 2 && design !== 'several';
  const rows = [
    ...countRows(comparison, t),
    ...(design === 'counts' || design === 'pairedCounts'
      ? shareRows(comparison, scale, t)
      : meanRows(comparison, scale, t)),
    ...effectRows(comparison, labels[1] ?? '', t),
    ...pRows(comparison, t),
  ];
  return {
    heading: t('Numbers'),
    caption:
      comparison.measured === ''
        ? t('Numbers of each group')
        : t('Numbers of {0} by group', measuredName(comparison)),
    quantity: t('quantity'),
    columns: two ? [...labels, labels.join(' \u2212 ')] : labels,
    rows: two
      ? rows
      : rows.map(row => ({ ...row, cells: row.cells.slice(0, groups.length) })).filter(hasCells),
    more: moreOf(comparison, t),
  };
}

const hasCells = (row: NumberRow): boolean => row.cells.some(cell => cell !== null);

const words = (text: string): Printed => ({ text, full: '' });
const integer = (value: number): Printed => ({ text: String(value), full: String(value) });

function countRows(comparison: Comparison, t: Say): readonly NumberRow[] {
  const { groups } = comparison;
  const rows: NumberRow[] = [
    { key: 'n', name: unitNoun(comparison, t).many, cells: [...groups.map(group => integer(group.n)), null] },
  ];
  if (groups.some(group => group.units !== null))
    rows.push({
      key: 'readings',
      name: t('readings'),
      cells: [...groups.map(group => readingsCell(group, t)), null],
    });
  if (groups.some(group => group.missing > 0))
    rows.push({
      key: 'missing',
      name: t('missing'),
      cells: [...groups.map(group => integer(group.missing)), null],
    });
  if (groups.some(group => group.leftOut > 0))
    rows.push({
      key: 'leftOut',
      name: t('left out'),
      cells: [...groups.map(group => integer(group.leftOut)), null],
    });
  return rows;
}

/** "35 (2–3 each)". */
function readingsCell({ readings, units }: Comparison['groups'][number], t: Say): Printed {
  const full = String(readings);
  if (units === null || units.length === 0) return { text: full, full };
  const least = units.reduce((low, unit) => Math.min(low, unit.readings), Infinity);
  const most = units.reduce((high, unit) => Math.max(high, unit.readings), 0);
  const each = least === most ? t('{0} each', least) : t('{0}\u2013{1} each', least, most);
  return { text: `${full} (${each})`, full };
}

function shareRows(comparison: Comparison, scale: Scale, t: Say): readonly NumberRow[] {
  const cells = comparison.groups.map(({ count }) => (count === null ? null : words(shareWords(count))));
  return [
    {
      key: 'mean',
      name: outcomeOf(comparison) ?? t('share'),
      cells: [...cells, differenceCell(comparison, scale)],
    },
  ];
}

function meanRows(comparison: Comparison, scale: Scale, t: Say): readonly NumberRow[] {
  const { groups, unit } = comparison;
  const noun = unitNoun(comparison, t);
  const name = (quantity: string): string => (unit === null ? quantity : `${quantity}, ${unit}`);
  const averaged = groups.some(group => group.units !== null);
  const rows: NumberRow[] = [
    {
      key: 'mean',
      name: name(t('mean')),
      cells: [...groups.map(group => scale.number(group.mean)), differenceCell(comparison, scale)],
    },
    {
      key: 'sd',
      name: name(averaged ? t('SD of {0}', noun.many) : t('SD')),
      cells: [...groups.map(group => sdCell(group.sd)), spreadCell(comparison, t)],
    },
    {
      key: 'median',
      name: name(t('median')),
      cells: [...groups.map(group => (group.median === null ? null : scale.observed(group.median))), null],
    },
    {
      key: 'range',
      name: name(t('lowest to highest')),
      cells: [...groups.map(group => rangeCell(group, scale, t)), null],
    },
  ];
  return rows.filter(hasCells);
}

const sdCell = (sd: number): Printed | null =>
  Number.isFinite(sd) ? { text: printThree(sd), full: fullText(sd) } : null;

function rangeCell({ min, max }: Comparison['groups'][number], scale: Scale, t: Say): Printed | null {
  if (min === null || max === null) return null;
  const [low, high] = [scale.observed(min), scale.observed(max)];
  return { text: t('{0} to {1}', low.text, high.text), full: t('{0} to {1}', low.full, high.full) };
}

/** "22.6 (8.6 to 36.6)". */
export function differenceCell({ chosen }: Pick<Comparison, 'chosen'>, scale: Scale): Printed | null {
  const result = chosen.result;
  if (result === null || result.estimate === null) return null;
  const estimate = scale.number(result.estimate);
  if (result.lower === null && result.upper === null) return estimate;
  const interval = scale.interval(result);
  return { text: `${estimate.text} (${interval.text})`, full: `${estimate.full} (${interval.full})` };
}

/** For pairs the SD of the differences; else how many times the test group's SD is that of the reference. */
function spreadCell({ design, chosen, groups, evidence }: Comparison, t: Say): Printed | null {
  if (design === 'pairs') {
    const se = chosen.id === 'paired-t' ? (chosen.result?.se ?? null) : null;
    const sd = se === null ? null : se * Math.sqrt(groups[0]?.n ?? 0);
    return sd === null ? null : { text: t('{0} (of the differences)', printThree(sd)), full: fullText(sd) };
  }
  const facts = evidence.find(({ id }) => id === 'variance-ratio')?.facts;
  const value = facts?.['sdRatio'];
  if (typeof value !== 'number' || !Number.isFinite(value)) return null;
  const interval = facts?.['interval'];
  const [lower = null, upper = null] = Array.isArray(interval) ? interval.map(Number) : [];
  const place = effectPlace(value, lower, upper, [1]);
  const text = t('{0} times', printAt(value, place));
  const full = fullText(value);
  if (lower === null || upper === null) return { text, full };
  return {
    text: `${text} (${t('{0} to {1}', printAt(lower, place), printAt(upper, place))})`,
    full: `${full} (${t('{0} to {1}', fullText(lower), fullText(upper))})`,
  };
}

function effectRows({ effects, groups }: Comparison, reference: string, t: Say): readonly NumberRow[] {
  const percent = effects.find(({ id }) => id === 'percent');
  if (percent === undefined) return [];
  return [
    {
      key: 'percent',
      name: t('percent of {0}', reference),
      cells: [...groups.map(() => null), percentCell(percent, t)],
    },
  ];
}

/** "2.8% (1.0 to 4.5)". */
function percentCell({ value, lower, upper }: Effect, t: Say): Printed {
  const place = effectPlace(value, lower, upper, [0]);
  const text = `${printAt(value, place)}%`;
  const full = fullText(value);
  if (lower === null && upper === null) return { text: t('{0} (no finite interval)', text), full };
  return {
    text: `${text} (${boundsWords(lower, upper, limit => printAt(limit, place), t)})`,
    full: `${full} (${boundsWords(lower, upper, fullText, t)})`,
  };
}

function pRows(comparison: Comparison, t: Say): readonly NumberRow[] {
  const { chosen, groups, settings } = comparison;
  const p = chosen.result?.p ?? null;
  if (p === null) return [];
  const statistic = statisticOf(comparison, t);
  const text = printP(p, settings.confidence);
  return [
    {
      key: 'p',
      name: 'p',
      cells: [
        ...groups.map(() => null),
        { text: statistic === null ? text : `${text} (${statistic})`, full: fullText(p) },
      ],
    },
  ];
}

function moreOf(comparison: Comparison, t: Say): NumbersShown['more'] {
  const effects = comparison.effects
    .filter(({ id }) => id !== 'percent')
    .map(effect => {
      const special = effectSpecial(effect.id);
      const bounded = effect.lower !== null || effect.upper !== null;
      const place = bounded
        ? effectPlace(effect.value, effect.lower, effect.upper, special)
        : clearOf(2, [effect.value], special);
      const limits = bounded
        ? ` (${boundsWords(effect.lower, effect.upper, limit => printAt(limit, place), t)})`
        : '';
      return {
        name: effectName(effect.id, t),
        value: { text: printAt(effect.value, place) + limits, full: fullText(effect.value) },
      };
    });
  const evidence = comparison.evidence.map(found => evidenceSentence(found, comparison, t));
  if (effects.length === 0 && evidence.length === 0) return null;
  const summary =
    effects.length === 0 ? t('Evidence on the assumptions') : t('Size in SDs, evidence on the assumptions');
  return { summary, effects, evidence };
}
