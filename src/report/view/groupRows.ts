import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { effectPlace, fullText, printAt, printThree } from '../numbersPrinted';
import { significantPlace } from '../words/rounding';
import { shareWords } from '../words/count';
import { outcomeOf } from '../words/measuredName';
import type { Scale } from '../words/scale';
import { unitNoun } from '../words/unitNoun';
import type { NumberRow, Printed } from './shown';

type Group = Comparison['groups'][number];
type Cell = (group: Group) => Printed | null;

/** What is known of each group: how many, mean or share, spread, extremes. */
export function groupRows(comparison: Comparison, scale: Scale, t: Say): readonly NumberRow[] {
  const { groups, unit, design } = comparison;
  const noun = unitNoun(comparison, t).many;
  const some = (is: (group: Group) => boolean): boolean => groups.some(is);
  const row = (
    key: NumberRow['key'],
    short: string,
    cell: Cell,
    difference: Printed | null = null,
  ): NumberRow => ({
    key,
    name: short,
    short,
    cells: [...groups.map(cell), difference],
  });
  const inUnit = (own: NumberRow, name = own.name): NumberRow => ({
    ...own,
    name: unit === null ? name : `${name}, ${unit}`,
  });
  const difference = differenceCell(comparison, scale);
  const shares = design === 'counts' || design === 'pairedCounts';
  const averaged = some(group => group.units !== null);
  const rows = [
    row('n', noun, group => integer(group.n)),
    ...(averaged ? [row('readings', t('readings'), group => readingsCell(group, t))] : []),
    ...(some(group => group.missing > 0)
      ? [row('missing', t('missing'), group => integer(group.missing))]
      : []),
    ...(some(group => group.leftOut > 0)
      ? [row('leftOut', t('left out'), group => integer(group.leftOut))]
      : []),
    ...(shares
      ? [row('mean', outcomeOf(comparison) ?? t('share'), shareCell, difference)]
      : [
          inUnit(row('mean', t('mean'), group => scale.mean(group.mean, group.se), difference)),
          inUnit(
            row('sd', t('SD'), sdCell, spreadCell(comparison, t)),
            averaged ? t('SD of {0}', noun) : t('SD'),
          ),
          inUnit(
            row('median', t('median'), ({ median }) => (median === null ? null : scale.observed(median))),
          ),
          inUnit(
            row('range', t('range'), group => rangeCell(group, scale, t)),
            t('lowest to highest'),
          ),
        ]),
  ];
  return rows.filter(({ cells }) => cells.some(cell => cell !== null));
}

const integer = (value: number): Printed => ({ text: String(value), full: String(value) });

const shareCell: Cell = ({ count, mean }) =>
  count === null ? null : { text: shareWords(count), full: fullText(mean) };

const sdCell: Cell = ({ sd }) => (Number.isFinite(sd) ? { text: printThree(sd), full: fullText(sd) } : null);

/** "35 (2–3 each)". */
function readingsCell({ readings, units }: Group, t: Say): Printed {
  const full = String(readings);
  if (units === null || units.length === 0) return { text: full, full };
  const least = units.reduce((low, unit) => Math.min(low, unit.readings), Infinity);
  const most = units.reduce((high, unit) => Math.max(high, unit.readings), 0);
  const each = least === most ? t('{0} each', least) : t('{0}\u2013{1} each', least, most);
  return { text: `${full} (${each})`, full };
}

function rangeCell({ min, max }: Group, scale: Scale, t: Say): Printed | null {
  if (min === null || max === null) return null;
  const [low, high] = [scale.observed(min), scale.observed(max)];
  return { text: t('{0} to {1}', low.text, high.text), full: t('{0} to {1}', low.full, high.full) };
}

/** "22.6 (8.6 to 36.6)". */
function differenceCell({ chosen }: Comparison, scale: Scale): Printed | null {
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
  const least = Math.min(value, lower ?? value, upper ?? value);
  const place = Math.max(effectPlace(value, lower, upper, [1]), least > 0 ? significantPlace(least, 1) : 0);
  const text = t('{0} times', printAt(value, place));
  const full = fullText(value);
  if (lower === null || upper === null) return { text, full };
  return {
    text: `${text} (${t('{0} to {1}', printAt(lower, place), printAt(upper, place))})`,
    full: `${full} (${t('{0} to {1}', fullText(lower), fullText(upper))})`,
  };
}
