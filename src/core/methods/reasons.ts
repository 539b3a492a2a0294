import type { Designs } from '../model/groups';
import type { Reason, Say } from '../model/say';
import { meanDifference } from '../numeric/meanDifference';

type Two = Designs['two'];

/** A group with fewer than two values has no SD. */
function oneValue({ test, reference }: Two): Reason | null {
  const short = [test, reference].find(group => group.n < 2);
  return short === undefined ? null : { code: 'one-value', facts: { label: short.label, n: short.n } };
}

/** Neither group scatters: there is nothing to hold the difference against. */
function noSpread({ test, reference }: Two): Reason | null {
  if (test.sd !== 0 || reference.sd !== 0) return null;
  const decimals = test.sample?.numbers.decimals;
  const resolution = decimals === undefined ? null : Number(`1e-${decimals}`);
  return { code: 'zero-spread', facts: { difference: meanDifference(test, reference), resolution } };
}

/** What every method that takes its spread from the two groups needs. */
export const spreadMissing = (data: Two): Reason | null => oneValue(data) ?? noSpread(data);

/** Sentences for the reasons that more than one method gives, and for those that the comparison itself gives. */
export function commonWhy({ code, facts }: Reason, t: Say): string {
  const text = (key: string): string => {
    const fact = facts[key];
    return Array.isArray(fact) ? fact.join(', ') : String(fact ?? '');
  };
  switch (code) {
    case 'one-value':
      return t('{0} has {1} value: one value has no spread', text('label'), text('n'));
    case 'zero-spread':
      return facts['resolution'] === null
        ? t(
            'no spread in either group: the difference is {0}, and a p-value would be meaningless',
            text('difference'),
          )
        : t(
            'no spread in either group at the recorded resolution ({0}): the difference is {1} as recorded, and a p-value would be meaningless',
            text('resolution'),
            text('difference'),
          );
    case 'no-pairs':
      return t('pairs: no pair column');
    case 'pairs-given':
      return t('the values are paired; comparing them as if they were not is not defensible here');
    case 'not-this-design':
      return t('not for this kind of data');
    case 'question-not-for-method':
      return t('this method does not answer that question');
    case 'other-unit':
      return t('it answers in another unit than the one that was asked in');
    case 'ruled-out':
      return t('ruled out by a stated reason');
    case 'variant-refused':
      return t('with these rows no number can be computed');
    case 'too-much-work':
      return t('takes long on this many values; computed when asked for');
    default:
      return code;
  }
}
