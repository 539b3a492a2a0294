import { evidenceById } from '../../core/evidence/index';
import type { SayProblem } from './told';

/** Why what was asked cannot be asked of these data, or was asked in a way that could mean two things. */
export const askingProblems = {
  'confidence-out-of-range': ({ t, number, text }) => ({
    message:
      text('question') === null
        ? t('A confidence of {0} does not lie between 0 and 1', number('confidence') ?? '?')
        : t('A confidence of {0} is too low for this question', number('confidence') ?? '?'),
    fix: t('Give a share between 0 and 1, such as 0.95.'),
  }),
  'confidence-as-percent': ({ t, number }) => ({
    message: t('A confidence of {0} looks like a percentage', number('confidence') ?? '?'),
    fix: t('Did you mean {0}? Type it as a share between 0 and 1.', number('meant') ?? 0.95),
  }),
  'sigma-needed': ({ t }) => ({
    message: t('Known standard deviations were asked for and none were given'),
    fix: t('Give both, of single values, test group first.'),
    flag: '--sigma 0.8,1.1',
  }),
  'sigma-not-positive': ({ t, list }) => ({
    message: t('A standard deviation has to be above 0; given: {0}', list('sigma') ?? '?'),
    fix: t('Give both known standard deviations, test group first.'),
    flag: '--sigma 0.8,1.1',
  }),
  'margin-needed': ({ t }) => ({
    message: t('This question needs a margin'),
    fix: t('State it in the units of the measured column, before the result is seen.'),
    flag: '--margin 5 or --margin=-3,5',
  }),
  'margin-invalid': ({ t, number }) => ({
    message:
      number('alike') === 1
        ? t(
            'A margin of ratios runs from between 0 and 1 to above 1; given: {0} to {1}',
            number('low') ?? '?',
            number('high') ?? '?',
          )
        : t(
            'A margin runs from below 0 to above 0; given: {0} to {1}',
            number('low') ?? '?',
            number('high') ?? '?',
          ),
    fix:
      number('alike') === 1
        ? t('Give both ratios, such as 0.8 and 1.25.')
        : t('Give one number above 0, or both bounds.'),
    flag: number('alike') === 1 ? '--margin 0.8,1.25' : '--margin=-3,5',
  }),
  'matters-invalid': ({ t, number }) => ({
    message: t('The size that matters has to be a number above 0; given: {0}', number('matters') ?? '?'),
    fix: t('Give the smallest difference that matters in practice, in the units of the measured column.'),
  }),
  'share-out-of-range': ({ t, number }) => ({
    message: t('A difference of two shares lies between \u22121 and 1; given: {0}', number('value') ?? '?'),
    fix:
      number('meant') === null
        ? t('Give a share: 0.1 stands for 10 percentage points.')
        : t(
            'Give a share: {0} stands for {1} percentage points.',
            number('meant') ?? '?',
            number('value') ?? '?',
          ),
  }),
  'method-unknown': ({ t, text, list }) => ({
    message: t('There is no method {0}', text('method') ?? ''),
    fix: t('The methods are: {0}.', list('methods') ?? ''),
  }),
  'method-not-for-this': ({ t, text, list }) => ({
    message: notForThis(t, text, list),
    fix: t('Leave the method to its default, or see what each one is for.'),
    flag: 'weighbeam methods',
  }),
  'question-not-for-method': ({ t, text, list }) => ({
    message: t('{0} does not answer the question "{1}"', text('method') ?? '', text('question') ?? ''),
    fix: t('It answers: {0}.', list('questions') ?? ''),
  }),
  'answer-needed': ({ t, names }) => ({
    message: t(
      'The data leave a question open, so no record is made: {0}',
      names('open')
        .map(id => evidenceById(id)?.title(t) ?? id)
        .join(', '),
    ),
    fix: t('Answer it; the number itself is shown beside the question.'),
    flag: '--format text',
  }),
  'reason-needed': ({ t, number, text }) => ({
    message:
      number('line') === null
        ? t('A reason is needed for {0}', text('key') ?? t('this change'))
        : t('Line {0} is left out without a reason', number('line') ?? '?'),
    fix: t('State why; the reason stands in the record.'),
  }),
} as const satisfies Record<string, SayProblem>;

function notForThis(
  t: Parameters<SayProblem>[0]['t'],
  text: (name: string) => string | null,
  list: (name: string) => string | null,
): string {
  const asked = [text('method'), text('variance'), text('df'), text('curve')].filter(word => word !== null);
  const name = asked.join(', ');
  const pair = text('pair');
  if (pair !== null && name === '')
    return t('Units ({0}) and pairs ({1}) cannot be used together', list('per') ?? '', pair);
  if (text('needs') === 'two-means')
    return t('Known standard deviations go with the means of two independent groups, not with {0}', name);
  if (text('needs') === 'difference')
    return t('A size that matters is a difference, and this measure gives none');
  if (text('needs') === 'pair') return t('{0} compares pairs, and no pair column is named', name);
  if (pair !== null) return t('{0} does not compare pairs ({1})', name, pair);
  if (text('measure') !== null && name === '')
    return t('There is no method for the measure {0}', text('measure') ?? '');
  if (text('measure') !== null) return t('{0} does not go with the measure {1}', name, text('measure') ?? '');
  return t('These do not go together: {0}', name);
}
