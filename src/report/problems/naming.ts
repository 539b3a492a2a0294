import type { Say } from '../../core/model/say';
import type { ProblemWords, SayProblem } from './told';

/** Why the columns, groups or rows named do not make a comparison. */
export const namingProblems = {
  'column-unknown': ({ t, text, list }) => ({
    message: t('There is no column {0}', text('name') ?? ''),
    fix: t('The columns are: {0}.', list('columns') ?? t('none')),
  }),
  'column-ambiguous': ({ t, text, list }) => ({
    message: t('More than one column is called {0}', text('name') ?? ''),
    fix: t('Name it by its place: {0}.', list('columns') ?? ''),
  }),
  'column-needed': ({ t, text, list }) => ({
    message: columnNeeded(t, text('needed') ?? ''),
    ...columnRemedy(t, text('needed') ?? '', list('columns') ?? t('none')),
  }),
  'label-unknown': ({ t, text, list }) => ({
    message:
      text('column') === null
        ? t('There is no group {0}', text('label') ?? '')
        : t('{0} does not occur in column {1}', text('label') ?? '', text('column') ?? ''),
    fix: t('The labels are: {0}. They are compared exactly as written.', list('labels') ?? t('none')),
  }),
  'label-needed': ({ t, list }) => ({
    message: t('It is not said which groups are compared'),
    fix: t('Name the test group and the reference group; the labels are: {0}.', list('labels') ?? ''),
  }),
  'label-single-value': ({ t, text, list, names }) => ({
    message: t('The label {0} occurs once: one value has no spread', text('label') ?? ''),
    fix:
      names('labels').length < 3
        ? t('Check whether it is another group misspelt, or give it more values.')
        : t('Check whether it is another group misspelt, or choose among: {0}.', list('labels') ?? ''),
    flag: '--same "FROM -> TO"',
  }),
  'groups-too-few': ({ t, list }) => ({
    message: t('There are not two groups to compare'),
    fix:
      list('labels') === null
        ? t('Name two different groups.')
        : t('Name two different groups; found: {0}.', list('labels') ?? ''),
  }),
  'groups-too-many': ({ t, list }) => ({
    message: t('There are more than two groups: {0}', list('labels') ?? ''),
    fix: t('Name the two to compare. To choose them after seeing the values overstates what they show.'),
    flag: '--test L --reference L',
  }),
  'columns-too-many': ({ t, list }) => ({
    message: t('More than one measured column was named: {0}', list('columns') ?? ''),
    fix: t('Compare one measured column at a time.'),
  }),
  'row-unknown': ({ t, number }) => ({
    message: t('No data row starts on lines {0} to {1}', number('from') ?? '?', number('to') ?? '?'),
    fix: t('The data rows stand on lines {0} to {1}.', number('first') ?? '?', number('last') ?? '?'),
  }),
  'leave-out-unknown': ({ t, number }) => ({
    message: t('No data row starts on line {0}, so it cannot be left out', number('line') ?? '?'),
    fix: t('Give the line on which the row starts; the first line of the file is 1.'),
  }),
  'success-needed': ({ t, list }) => ({
    message: t('It is not said which outcome is counted'),
    fix: t('Name it; the outcomes are: {0}.', list('outcomes') ?? list('labels') ?? ''),
    flag: '--success VALUE',
  }),
  'outcomes-too-many': ({ t, list, text }) => ({
    message: t(
      'A share is of two outcomes; {0} holds more: {1}',
      text('column') ?? t('the column'),
      list('outcomes') ?? list('labels') ?? '',
    ),
    fix: t('Declare outcomes the same, or name the one that is counted.'),
    flag: '--same "FROM -> TO", --success VALUE',
  }),
  'units-disagree': ({ t, text }) => ({
    message: t(
      'The readings of {0} {1} disagree: some are the counted outcome and some are not',
      text('column') ?? t('unit'),
      text('unit') ?? '',
    ),
    fix: t('A unit has one outcome: correct the file, or compare rows one by one.'),
    flag: '--per none',
  }),
  'pairs-repeated': ({ t, text, list }) => ({
    message: t(
      'The id {0} stands more than once in {1}{2}',
      text('id') ?? '',
      text('label') ?? t('a group'),
      list('lines') === null ? '' : `, ${t('on lines {0}', list('lines') ?? '')}`,
    ),
    fix: t(
      'A pair has one value in each group: average the readings of an id first, or take another pair column.',
    ),
  }),
  'pairs-none': ({ t, text }) => ({
    message: t(
      'Fewer than two ids{0} occur in both groups',
      text('column') === null ? '' : ` (${text('column') ?? ''})`,
    ),
    fix: t('Check the pair column: the same id has to stand in both groups, exactly as written.'),
  }),
} as const satisfies Record<string, SayProblem>;

function columnRemedy(t: Say, needed: string, columns: string): Pick<ProblemWords, 'fix' | 'flag'> {
  if (needed === 'measured') return { fix: t('Name it; the columns are: {0}.', columns), flag: '--of COL' };
  if (needed === 'label')
    return {
      fix: t('Name it, or one column a group; the columns are: {0}.', columns),
      flag: '--by COL or --columns A,B',
    };
  return { fix: t('The columns are: {0}.', columns) };
}

function columnNeeded(t: Say, needed: string): string {
  if (needed === 'measured') return t('No measured column is named');
  if (needed === 'label') return t('No label column is named');
  return t('A file of summaries needs a column {0}', needed);
}
