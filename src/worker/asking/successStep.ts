import { choice, isAnswered, type Asker } from './askContext';

const GOOD_NEWS = /^(no|n|false|0|fail|failed|not?[ -].*|ok|intact|none)$/i;

/** Which of two outcomes is counted. */
export const successStep: Asker = context => {
  const { t, request } = context;
  if (request.measure !== 'proportion' || isAnswered(context, 'success', 'success')) return null;
  const column = context.columns.find(({ name }) => name === request.measured?.[0]);
  if (column === undefined) return null;
  const items = column.labels.map(({ label, count }) => ({
    label,
    description: t('{0} rows', count),
    detail: t('The share of {0} is compared', label),
    adds: { success: label },
  }));
  if (items.length === 0) return null;
  const guess = items.findIndex(({ label }) => !GOOD_NEWS.test(label.trim()));
  return choice(
    context,
    { title: t('Which outcome is counted?'), prompt: t('Its share is compared between the groups'), items },
    guess,
  );
};
