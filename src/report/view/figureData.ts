import type { Table } from '../../core/model/cells';
import type { Comparison } from '../../core/model/comparison';
import type { Sample } from '../../core/model/groups';
import type { CellRef } from '../../core/model/problem';
import type { Say } from '../../core/model/say';
import { withMinus } from '../numbersPrinted';
import { shareWords } from '../words/count';
import { estimateName, estimatesOf } from '../words/estimates';
import { groupLabel } from '../words/groupLabels';
import { showLabel } from '../words/label';
import { measuredName, outcomeOf } from '../words/measuredName';
import { measuredField, placeWords } from '../words/places';
import type { Scale } from '../words/scale';
import { columnNoun } from '../words/unitNoun';
import { densityOf, tooManyPoints } from './density';
import { figureSentence } from './figureSentence';
import type { FigureShown, GroupFigure, IntervalShown, PointShown } from './figureShown';
import { meanInterval } from './meanInterval';
import { rulesOf } from './rules';

type Group = Comparison['groups'][number];

/** What the figure draws: every value of every group, each mean with its interval, and the difference on an axis of its own. */
export function figureData(
  comparison: Comparison,
  table: Table | null,
  scale: Scale,
  t: Say,
): FigureShown | null {
  const { groups, design } = comparison;
  if (groups.length === 0) return null;
  const crowded = tooManyPoints(groups);
  return {
    sentence: figureSentence(comparison, scale, t),
    caption: captionOf(comparison, crowded, t),
    axis: axisLabel(comparison, t),
    kind: design === 'pairs' ? 'pairs' : holdsShares(groups) ? 'shares' : 'values',
    groups: groups.map((group, index) => groupFigure(comparison, group, index, table, crowded, t)),
    lines: design === 'pairs' && !crowded ? pairLines(groups) : [],
    difference: differenceFigure(comparison, scale, t),
  };
}

const holdsShares = (groups: readonly Group[]): boolean => groups.some(({ count }) => count !== null);

function groupFigure(
  comparison: Comparison,
  group: Group,
  index: number,
  table: Table | null,
  crowded: boolean,
  t: Say,
): GroupFigure {
  const { settings } = comparison;
  const field = table === null ? null : measuredField(comparison, table, index);
  const cellOf = (row: number): CellRef | null =>
    table === null || field === null ? null : { file: table.file(row), line: table.line(row), field };
  const pointsOf = (sample: Sample | null, isUnit: boolean): readonly PointShown[] => {
    if (sample === null) return [];
    const values = sample.values();
    return Array.from(values, (value, at) => {
      const cell = cellOf(sample.rows[at] ?? 0);
      const unit = isUnit ? group.units?.[at]?.path.map(showLabel).join(', ') : undefined;
      const place = unit ?? (cell === null ? '' : placeWords(cell, settings.files, t));
      return {
        value,
        text: withMinus(String(value)),
        label: place,
        at: isUnit ? null : cell,
        far: isFar(value, group),
      };
    });
  };
  const averaged = group.units !== null;
  const density = crowded && group.sample !== null ? densityOf(group.sample) : null;
  return {
    label: groupLabel(group.label, comparison),
    n: group.count === null ? t('n = {0}', group.n) : shareWords(group.count),
    points:
      density === null
        ? pointsOf(group.sample, averaged)
        : density.outside.map(value => ({ value, text: '', label: '', at: null, far: true })),
    small: crowded || !averaged ? [] : pointsOf(group.readingSample, false),
    density: density?.bins ?? null,
    mean: meanInterval(group, settings.confidence),
  };
}

/** Outside the fences: more than 1.5 times the distance of the quartiles beyond them. Source: Tukey 1977, Exploratory Data Analysis. */
function isFar(value: number, { q1, q3 }: Group): boolean {
  if (q1 === null || q3 === null) return false;
  const reach = 1.5 * (q3 - q1);
  return value < q1 - reach || value > q3 + reach;
}

function pairLines(groups: readonly Group[]): readonly (readonly [number, number])[] {
  const [test, reference] = groups.map(group => group.sample?.values());
  if (test === undefined || reference === undefined) return [];
  return Array.from(test, (value, at) => [value, reference[at] ?? value] as const);
}

function differenceFigure(comparison: Comparison, scale: Scale, t: Say): FigureShown['difference'] {
  const { chosen, groups, design } = comparison;
  const result = chosen.result;
  const estimate = result?.estimate ?? null;
  if (result === null || estimate === null) return null;
  const drawn: IntervalShown = { estimate, lower: result.lower, upper: result.upper };
  const label = estimateName(comparison, t);
  return {
    ...drawn,
    label,
    axis: scale.unit === '' ? label : `${label}, ${scale.unit}`,
    unit: scale.unit,
    power: scale.unit !== '' && (design === 'counts' || design === 'pairedCounts') ? 2 : 0,
    rules: rulesOf(comparison, scale, t),
    points:
      design === 'pairs' && estimatesOf(chosen) === 'difference' && !tooManyPoints(groups)
        ? pairLines(groups).map(([value, other]) => value - other)
        : [],
  };
}

function axisLabel(comparison: Comparison, t: Say): string {
  const { unit } = comparison;
  if (holdsShares(comparison.groups)) return t('{0}, percent', outcomeOf(comparison) ?? t('share'));
  const name = comparison.measured === '' ? t('value') : measuredName(comparison);
  return unit === null ? name : `${name}, ${unit}`;
}

function captionOf(comparison: Comparison, crowded: boolean, t: Say): string {
  const { groups, settings, design } = comparison;
  const hasDifference = (comparison.chosen.result?.estimate ?? null) !== null;
  const bar = hasDifference
    ? t('The bar on an axis of its own shows the difference, not either group.')
    : null;
  const open = groups.some(group => hasFar(group))
    ? t('Hollow marks lie far from the middle half of their group.')
    : null;
  const lines = [marksSentence(), crowded ? null : open, bar];
  return lines.filter(line => line !== null).join(' ');

  function marksSentence(): string | null {
    if (holdsShares(groups)) return null;
    if (crowded)
      return t('Shaded: how many values lie where; every value outside the middle 99% is a point.');
    if (design === 'pairs') return t('Each line joins the two values of a pair.');
    if (settings.relation.kind === 'units' && groups.some(group => group.units !== null)) {
      const { many } = columnNoun(settings.relation.columns.at(-1) ?? '', t);
      return t('Large marks are {0}, small ones their readings.', many);
    }
    return groups.every(group => group.sample === null) ? t('Only means and SDs were given.') : null;
  }
}

/** Whether any value drawn for the group lies outside its fences. */
const hasFar = (group: Group): boolean =>
  [group.sample, group.readingSample].some(
    sample => sample !== null && sample.values().some(value => isFar(value, group)),
  );
