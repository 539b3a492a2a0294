import type { Decision } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';

/** A decision as it stands in a line of a table. */
export function decisionWords(decision: Decision, t: Say): string {
  switch (decision) {
    case 'differs':
      return t('differs');
    case 'not settled':
      return t('not settled');
    case 'higher':
      return t('higher');
    case 'lower':
      return t('lower');
    case 'not shown':
      return t('not shown');
    case 'within margin':
      return t('within margin');
    case 'outside margin':
      return t('outside margin');
    case 'not shown within margin':
      return t('not shown within margin');
    case 'not lower by the margin':
      return t('not lower by the margin');
    case 'lower by at least the margin':
      return t('lower by at least the margin');
    case 'not higher by the margin':
      return t('not higher by the margin');
    case 'higher by at least the margin':
      return t('higher by at least the margin');
    case 'some differ':
      return t('some differ');
  }
}
