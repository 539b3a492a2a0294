import type { SayProblem } from './told';

/** Why a file could not be read. */
/** A number with a comma for its decimal mark, met where points were expected. */
const OTHER_MARK = /^[+\-\u2212]?\d+,\d+$/;

export const readingProblems = {
  'file-empty': ({ t }) => ({
    message: t('The file is empty'),
    fix: t('Export the data again, or choose another file.'),
  }),
  'file-header-only': ({ t }) => ({
    message: t('The file has a header and no data row under it'),
    fix: t('Export the data again with its rows, or name the header’s line if another line holds it.'),
    flag: '--header N',
  }),
  'file-binary': ({ t }) => ({
    message: t('The file is not text: it holds bytes that no text has'),
    fix: t('Export the sheet as CSV and choose that file.'),
  }),
  'file-not-found': ({ t, text }) => ({
    message: t('There is no file {0}', text('name') ?? ''),
    fix: t('Check the name and the folder it is looked for in.'),
  }),
  'file-outside-root': ({ t, text }) => ({
    message: t('{0} lies outside the root folder', text('name') ?? t('The file')),
    fix: t('Move the file under the root, or name a root that holds it.'),
    flag: '--root DIR',
  }),
  'encoding-invalid': ({ t, text }) => ({
    message:
      text('encoding') === null
        ? t('The bytes of the file do not fit its encoding')
        : t('The bytes of the file do not fit the encoding {0}', text('encoding') ?? ''),
    fix: t('Name the encoding the file was written in, or save it as UTF-8.'),
    flag: '--encoding E',
  }),
  'quote-unclosed': ({ t }) => ({
    message: t('A quotation mark is opened and never closed'),
    fix: t('Close the quotation mark that starts in this cell.'),
  }),
  'decimal-undecidable': ({ t, text }) => ({
    message: t(
      '{0} can be read as {1} and as {2}, and nothing in the file says which',
      text('text') ?? '1,234',
      text('asDecimal') ?? '1.234',
      text('asThousands') ?? '1234',
    ),
    fix: t('Say which mark parts the decimals.'),
    flag: '--decimal , or --decimal .',
  }),
  'layouts-equal': ({ t, names }) => ({
    message: t(
      'The lines can be cut into cells equally well by {0}',
      names('delimiters')
        .map(mark => (mark === '\t' ? t('tab') : mark))
        .join(t(' and by ')),
    ),
    fix: t('Name the delimiter.'),
    flag: '--delimiter C',
  }),
  'header-not-found': ({ t, text }) => ({
    message:
      text('header') === null
        ? t('No line of the file looks like a header')
        : t('Line {0} is not in the file, so it cannot be the header', text('header') ?? ''),
    fix: t('Name the line that holds the column names.'),
    flag: '--header N',
  }),
  'text-in-measured': ({ t, number, list, names }) => ({
    message: t(
      '{0} of the measured cells hold text that is not a number: {1}',
      number('count') ?? 1,
      list('texts') ?? '',
    ),
    ...(names('texts').some(text => OTHER_MARK.test(text.trim()))
      ? {
          fix: t(
            'If the comma parts the decimals, name it as the decimal mark; else correct the cells in the file, or leave those rows out with a reason.',
          ),
          flag: '--decimal comma, or --leave-out "LINE:reason"',
        }
      : {
          fix: t('Correct the cells in the file, or leave those rows out with a reason.'),
          flag: '--leave-out "LINE:reason"',
        }),
  }),
  'censored-unanswered': ({ t, number }) => ({
    message: t(
      '{0} of the measured cells say only that the value lies below or above a limit',
      number('count') ?? 1,
    ),
    fix: t(
      'Say how such values are counted: as zero, half the limit or the limit. Each can change the answer.',
    ),
    flag: '--below zero, half or limit',
  }),
  'number-unusable': ({ t, text, number }) => ({
    message:
      text('text') === null
        ? t(
            'The spread of {0}, whose values run from {1} to {2}, cannot be computed: it is too large or too small',
            text('label') ?? t('a group'),
            number('lowest') ?? '?',
            number('highest') ?? '?',
          )
        : t('{0} cannot be used as a number', text('text') ?? ''),
    fix: t('Correct the number, give the column in other units, or leave the row out with a reason.'),
  }),
} as const satisfies Record<string, SayProblem>;
