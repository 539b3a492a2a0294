import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { alikeValue } from '../words/estimates';
import type { Scale } from '../words/scale';
import type { RuleShown } from './figureShown';

/**
 * The values ruled on the axis of a difference: what it is held against, a margin, and what matters: on the side of the
 * estimate, or on both sides where the interval crosses 0.
 */
export function rulesOf(comparison: Comparison, scale: Scale, t: Say): readonly RuleShown[] {
  const { against, margin, question } = comparison.settings;
  const alike = alikeValue(comparison);
  const bounds =
    margin === null
      ? []
      : question === 'not-lower'
        ? [margin[0]]
        : question === 'not-higher'
          ? [margin[1]]
          : margin;
  return [
    ...(against === alike ? [] : [{ at: alike, label: '', kind: 'zero' as const }]),
    { at: against, label: against === alike ? '' : scale.typedNumber(against), kind: 'against' },
    ...mattersOf(comparison).map(at => ({
      at,
      label: t('{0} matters', scale.typedNumber(at)),
      kind: 'matters' as const,
    })),
    ...bounds.map(at => ({ at, label: t('{0} margin', scale.typedNumber(at)), kind: 'margin' as const })),
  ];
}

function mattersOf({ settings, chosen }: Comparison): readonly number[] {
  const { matters, question } = settings;
  if (matters === null) return [];
  if (question === 'higher' || question === 'not-lower') return [matters];
  if (question === 'lower' || question === 'not-higher') return [-matters];
  const lower = chosen.result?.lower ?? 0;
  const upper = chosen.result?.upper ?? 0;
  if (lower < 0 && upper > 0) return [-matters, matters];
  return upper <= 0 && lower < 0 ? [-matters] : [matters];
}
