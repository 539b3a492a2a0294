import { isAnswered, type Asker } from './askContext';

const needsMargin: readonly (string | undefined)[] = ['equivalent', 'not-lower', 'not-higher'];

/** How large a difference would still be no matter: for the questions that are asked against a margin. */
export const marginStep: Asker = context => {
  const { t, request, remembered } = context;
  if (!needsMargin.includes(request.question) || isAnswered(context, 'margin', 'margin')) return null;
  const unit = context.columns.find(({ name }) => name === request.measured?.[0])?.unit ?? '';
  return {
    kind: 'number',
    title: t('How wide is the margin?'),
    prompt: t('In units of the measured column, fixed before the values were seen'),
    unit,
    likely: remembered?.margin?.[1] ?? null,
  };
};
