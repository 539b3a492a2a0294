import type { SayProblem } from './told';

/** Why the values cannot be compared, or a settings block cannot be computed again. */
export const computingProblems = {
  'values-too-few': ({ t, text, number }) => ({
    message: t(
      'Group {0} has {1} values: two are the least for a mean with a spread',
      text('label') ?? '?',
      number('n') ?? 0,
    ),
    fix: t(
      'Check that its rows were read and not left out; one value is enough only with known standard deviations.',
    ),
  }),
  'values-all-equal': ({ t, text }) => ({
    message:
      text('value') === null
        ? t('All values of all groups are equal: there is nothing to compare')
        : t('All values of all groups equal {0}: there is nothing to compare', text('value') ?? ''),
    fix: t('Check that the right column was chosen and at what resolution it was recorded.'),
  }),
  'summary-invalid': ({ t, text }) => ({
    message:
      text('label') === null
        ? t('A summary does not make sense')
        : t('The summary of {0} does not make sense', text('label') ?? ''),
    fix: t(
      'n is a whole number of at least 2, the SD not below 0; for counts, x is a whole number from 0 to n.',
    ),
  }),
  'block-not-readable': ({ t, text }) => ({
    message:
      text('reason') === null
        ? t('The settings block cannot be read')
        : t('The settings block cannot be read: {0}', text('reason') ?? ''),
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
    message: t(
      'The row left out on line {0} ({1}) is not in the file any more, or no longer the only one of its kind',
      number('line') ?? '?',
      text('value') ?? '?',
    ),
    fix: t('Look up the row, then leave out the right one in a new comparison.'),
  }),
} as const satisfies Record<string, SayProblem>;
