import type { Say } from '../../core/model/say';
import type { Question } from '../../core/model/settings';
import { choice, isAnswered, type Asker } from './askContext';
import { methodsAsked } from './methodsAsked';

const order: readonly Question[] = ['differs', 'higher', 'lower', 'equivalent', 'not-lower', 'not-higher'];

/** What is to be decided about the test group against the reference group. */
export const questionStep: Asker = context => {
  const { t, request } = context;
  if (isAnswered(context, 'question', 'question', 'method')) return null;
  const offered = new Set(methodsAsked(request).flatMap(method => [...method.questions]));
  const test = request.test ?? t('the test group');
  const reference = request.reference ?? t('the reference group');
  const items = order
    .filter(question => offered.has(question))
    .map(question => ({ ...words(question, test, reference, t), description: '', adds: { question } }));
  const only = items[0];
  if (only === undefined) return null;
  if (items.length === 1) return { plain: only.adds };
  return choice(context, {
    title: t('What is to be decided?'),
    prompt: t('Decide it before looking at the result'),
    items,
  });
};

function words(
  question: Question,
  test: string,
  reference: string,
  t: Say,
): { label: string; detail: string } {
  switch (question) {
    case 'differs':
      return {
        label: t('Do {0} and {1} differ?', test, reference),
        detail: t('Either direction counts: nothing was claimed about it beforehand'),
      };
    case 'higher':
      return {
        label: t('Is {0} higher than {1}?', test, reference),
        detail: t('Only higher counts: claims that this was asked before the values were seen'),
      };
    case 'lower':
      return {
        label: t('Is {0} lower than {1}?', test, reference),
        detail: t('Only lower counts: claims that this was asked before the values were seen'),
      };
    case 'equivalent':
      return {
        label: t('Is {0} within a margin of {1}?', test, reference),
        detail: t('Needs a margin fixed beforehand, on both sides'),
      };
    case 'not-lower':
      return {
        label: t('Is {0} not lower than {1} by a margin?', test, reference),
        detail: t('Needs a margin fixed beforehand'),
      };
    case 'not-higher':
      return {
        label: t('Is {0} not higher than {1} by a margin?', test, reference),
        detail: t('Needs a margin fixed beforehand'),
      };
  }
}
