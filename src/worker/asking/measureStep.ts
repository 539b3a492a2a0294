import type { Say } from '../../core/model/say';
import type { Measure } from '../../core/model/settings';
import { methods } from '../../core/methods/index';
import { choice, type Asker } from './askContext';

const order: readonly Measure[] = ['mean', 'ratio', 'rank', 'spread'];

/** On which scale numbers are compared; only those that a method of the registry can answer. */
export const measureStep: Asker = context => {
  const { t } = context;
  const answerable = new Set<Measure>(methods.map(method => method.measure));
  const items = order
    .filter(measure => answerable.has(measure))
    .map(measure => ({ ...words(measure, t), description: '', adds: { measure } }));
  if (items.length < 2) return null;
  return choice(context, {
    title: t('What is compared?'),
    prompt: t('Decide it before looking at the result'),
    items,
  });
};

function words(measure: Measure, t: Say): { label: string; detail: string } {
  switch (measure) {
    case 'mean':
      return {
        label: t('means, as measured'),
        detail: t('The difference is in units of the measured column'),
      };
    case 'ratio':
      return {
        label: t('ratio of geometric means'),
        detail: t('Claims that effects multiply; needs values above 0'),
      };
    case 'rank':
      return { label: t('ranks'), detail: t('The chance that a value of the test group is the higher one') };
    case 'spread':
      return { label: t('spread'), detail: t('Whether one group scatters more, not which lies higher') };
    case 'proportion':
      return { label: t('shares'), detail: t('The share of one outcome in each group') };
  }
}
