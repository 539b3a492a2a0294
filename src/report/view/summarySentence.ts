import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { sayP } from '../numbersPrinted';
import type { Scale } from '../words/scale';
import { sharesWords } from './answer';
import { headline } from './headline';
import { intervalSentence } from './interval';

/** The answer in one sentence that stands alone: shares first, then the decision, its interval and p. */
export function summarySentence(comparison: Comparison, scale: Scale, t: Say): string {
  const { chosen, settings } = comparison;
  const p = chosen.result?.p ?? null;
  const shares = sharesWords(comparison, t);
  const parts = [
    headline(comparison, scale, t),
    intervalSentence(comparison, scale, t),
    p === null ? null : sayP(p, settings.confidence),
  ].filter(part => part !== null);
  return `${shares === null ? '' : `${shares}; `}${parts.join(', ')}.`;
}
