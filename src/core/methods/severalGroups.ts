import type { Designs, Group } from '../model/groups';
import type { Ask, MethodResult } from '../model/methods';
import type { Reason, Say } from '../model/say';
import type { Question } from '../model/settings';
import { commonWhy } from './reasons';

type Several = Designs['several'];

/** All groups at once have no direction, and no one difference to hold against a margin. */
export const severalQuestions: readonly Question[] = ['differs'];

/** What cannot be asked of several groups at once, whatever the method. */
export function severalRefused({ groups }: Several, { against }: Ask): Reason | null {
  if (groups.length < 2) return { code: 'one-group', facts: {} };
  return against === 0 ? null : { code: 'against-not-zero', facts: {} };
}

/** The first group whose values, two or more, are all equal. */
export const constantGroup = (groups: readonly Group[]): Group | undefined =>
  groups.find(({ n, sd }) => n > 1 && sd === 0);

/** p of all groups at once: there is no estimate, and no interval. */
export const ofAllGroups = (
  { confidence }: Ask,
  found: Pick<MethodResult, 'statistic' | 'df' | 'p' | 'extra'>,
): MethodResult => ({ estimate: null, se: null, lower: null, upper: null, confidence, ...found });

/** Sentences for the reasons that methods for several groups have in common. */
export function severalWhy(reason: Reason, t: Say): string {
  const { label } = reason.facts;
  switch (reason.code) {
    case 'one-group':
      return t('there is one group only');
    case 'against-not-zero':
      return t('all groups at once can only be held against being alike');
    case 'no-spread-in-any':
      return t('no spread in any group: there is nothing to hold the differences against');
    case 'one-constant-group':
      return t('{0} does not scatter at all, so the groups cannot be taken to scatter alike', String(label));
    case 'known-exactly':
      return t('{0} does not scatter at all: its mean would count as known exactly', String(label));
    case 'no-values':
      return t('only n, mean and SD are known, not the values');
    default:
      return commonWhy(reason, t);
  }
}
