import type { Say } from '../../core/model/say';
import type { SayProblem } from './told';

/** Why the values cannot be compared, or a settings block cannot be computed again. */
export const computingProblems = {
  'values-too-few': ({ t, text, number }) =>
    text('what') === 'pairs'
      ? {
          message: t(
            'There are {0} complete pairs: two are the least for a difference with a spread',
            number('n') ?? 0,
          ),
          fix: t('Check that the ids of the pair column are written alike in both groups.'),
        }
      : {
          message: t(
            'Group {0} has {1} usable values ({2} missing, {3} left out): two are the least for a mean with a spread',
            text('label') ?? '?',
            number('n') ?? 0,
            number('missing') ?? 0,
            number('leftOut') ?? 0,
          ),
          fix: t('Check the rows of this group; one value is enough only with known standard deviations.'),
          flag: '--variance known',
        },
  'values-all-equal': ({ t, text }) => ({
    message:
      text('value') === null
        ? t('All values of all groups are equal: there is nothing to compare')
        : t('All values of all groups equal {0}: there is nothing to compare', text('value') ?? ''),
    fix: t('Check that the right column was chosen and at what resolution it was recorded.'),
  }),
  'summary-invalid': ({ t, text }) => ({
    message: summaryFault(text('what'), text('label') ?? '?', t),
    fix: t('n is a whole number above 0, the SD not below 0; for counts, x is a whole number from 0 to n.'),
  }),
  'block-not-readable': ({ t, text }) => ({
    message:
      text('expected') === null
        ? t('The settings block cannot be read')
        : t(
            'The settings block cannot be read: {0}expected {1}, found {2}',
            text('key') === null ? '' : `${text('key') ?? ''}: `,
            text('expected') ?? '',
            text('found') ?? t('nothing'),
          ),
    fix: t('Mend the line, or copy the block anew from the comparison.'),
  }),
  'block-newer-format': ({ t, text }) => ({
    message: t(
      'The settings block has format {0}, which is newer than this version knows',
      text('format') ?? '?',
    ),
    fix: t('Use a newer version of Weighbeam to recheck it.'),
  }),
  'left-out-row-gone': ({ t, number, text }) => ({
    message:
      (number('found') ?? 0) > 1
        ? t(
            'The row left out on line {0} ({1}) now stands {2} times in the file',
            number('line') ?? '?',
            text('value') ?? '?',
            number('found') ?? 0,
          )
        : t(
            'The row left out on line {0} ({1}) is not in the file any more',
            number('line') ?? '?',
            text('value') ?? '?',
          ),
    fix: t('Look up the row, then leave out the right one in a new comparison.'),
  }),
} as const satisfies Record<string, SayProblem>;

function summaryFault(what: string | null, label: string, t: Say): string {
  switch (what) {
    case 'n':
      return t('The summary of {0} has no usable n', label);
    case 'x':
      return t('The summary of {0} has no usable count x', label);
    case 'mean':
      return t('The summary of {0} has no usable mean', label);
    case 'sd':
      return t('The summary of {0} has no usable SD', label);
    case 'repeated':
      return t('There is more than one summary of {0}', label);
    default:
      return t('The summaries are partly of means and partly of counts');
  }
}
