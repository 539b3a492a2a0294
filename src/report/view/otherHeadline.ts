import type { Comparison } from '../../core/model/comparison';
import { methodById } from '../../core/methods/index';
import type { Say } from '../../core/model/say';
import { alikeValue, estimateName, estimatesOf } from '../words/estimates';
import { groupLabels } from '../words/groupLabels';
import { subjectOf } from '../words/measuredName';
import type { Scale } from '../words/scale';
import { effectName } from './effects';

/** What a headline is about where it is no plain difference of means or shares. */
type Kind = 'ranks' | 'chance' | 'ratio' | 'share ratio' | 'spread';

/** null for a difference of means or shares, which has headlines of its own. */
export function otherKind({ chosen, settings }: Comparison): Kind | null {
  const measure = methodById(chosen.id)?.measure ?? settings.measure;
  switch (estimatesOf(chosen)) {
    case 'difference':
      return measure === 'rank' ? 'ranks' : measure === 'spread' ? 'spread' : null;
    case 'chance':
      return 'chance';
    case 'ratio':
      return measure === 'spread' ? 'spread' : measure === 'proportion' ? 'share ratio' : 'ratio';
  }
}

/** The decided answer about ranks, chances, ratios and spreads. */
export function otherDecided(comparison: Comparison, kind: Kind, scale: Scale, t: Say): string {
  const { chosen, settings } = comparison;
  const estimate = chosen.result?.estimate ?? null;
  const subject = subjectOf(comparison, t);
  const [test = '', reference = ''] = groupLabels(comparison);
  if (estimate === null)
    return kind === 'spread'
      ? t('{0} does not scatter alike in {1} and {2}', subject, test, reference)
      : t('{0} differs between {1} and {2}', subject, test, reference);
  const alike = alikeValue(comparison);
  if (settings.against !== alike) return heldAgainst(comparison, estimate, scale, t);
  const isHigher = estimate > alike;
  switch (kind) {
    case 'ranks': {
      const size = scale.difference(Math.abs(estimate));
      return isHigher
        ? t('{0} tends to be higher in {1} than in {2}, by {3}', subject, test, reference, size)
        : t('{0} tends to be lower in {1} than in {2}, by {3}', subject, test, reference, size);
    }
    case 'chance': {
      const chance = scale.number(estimate).text;
      return isHigher
        ? t(
            '{0} tends to be higher in {1} than in {2}: a value of {1} is the larger with a chance of {3}',
            subject,
            test,
            reference,
            chance,
          )
        : t(
            '{0} tends to be lower in {1} than in {2}: a value of {1} is the larger with a chance of {3}',
            subject,
            test,
            reference,
            chance,
          );
    }
    case 'ratio': {
      const times = scale.difference(estimate);
      return isHigher
        ? t('{0} is higher in {1} than in {2}: {3} as high', subject, test, reference, times)
        : t('{0} is lower in {1} than in {2}: {3} as high', subject, test, reference, times);
    }
    case 'share ratio': {
      const size = `${effectName(chosen.id, t)} ${scale.number(estimate).text}`;
      return isHigher
        ? t('{0} is higher in {1} than in {2}: {3}', subject, test, reference, size)
        : t('{0} is lower in {1} than in {2}: {3}', subject, test, reference, size);
    }
    case 'spread': {
      const times = scale.difference(estimate);
      return isHigher
        ? t('{0} scatters more in {1} than in {2}: {3} as much', subject, test, reference, times)
        : t('{0} scatters less in {1} than in {2}: {3} as much', subject, test, reference, times);
    }
  }
}

function heldAgainst(comparison: Comparison, estimate: number, scale: Scale, t: Say): string {
  const { against } = comparison.settings;
  const [subject, name] = [subjectOf(comparison, t), estimateName(comparison, t)];
  const [size, held] = [scale.difference(estimate), scale.typed(against)];
  return estimate > against
    ? t('{0}: {1} is {2}, above the {3} it was held against', subject, name, size, held)
    : t('{0}: {1} is {2}, below the {3} it was held against', subject, name, size, held);
}

/** What the interval leaves possible, where it is not one of differences. */
export function otherNotSettled(comparison: Comparison, kind: Kind, scale: Scale, t: Say): string {
  const subject = subjectOf(comparison, t);
  const [test = '', reference = ''] = groupLabels(comparison);
  const result = comparison.chosen.result;
  if (result === null || result.lower === null || result.upper === null)
    return kind === 'spread'
      ? t('Not settled whether {0} scatters alike in {1} and {2}', subject, test, reference)
      : t('Not settled whether {0} differs between {1} and {2}', subject, test, reference);
  const range = scale.withUnit(scale.interval(result).text);
  const name = estimateName(comparison, t);
  return kind === 'spread'
    ? t('Not settled: {1} from {2} in the scatter of {0} is compatible with these data', subject, name, range)
    : t('Not settled: {1} from {2} in {0} is compatible with these data', subject, name, range);
}
