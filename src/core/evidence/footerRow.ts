import type { EvidenceDescriptor, Finding } from '../model/comparison';
import type { Field, Reading } from '../model/cells';

/** The filled cells of a row as written in the file, each with its field. Quotation marks around a cell are taken off. */
function filledCells(
  text: string,
  delimiter: string,
): readonly { readonly field: number; readonly cell: string }[] {
  return text
    .split(delimiter)
    .map((cell, field) => ({ field, cell: cell.trim().replace(/^"(.*)"$/, '$1') }))
    .filter(({ cell }) => cell !== '');
}

/** What one reading passed over at its foot; `fields` are the columns of that file, `name` its name where there are two. */
export const footerFindings = (
  reading: Reading,
  file: number,
  fields: readonly Field[],
  name: string | null = null,
): readonly Finding[] =>
  reading.footer.map(({ line, text }) => {
    const [first, ...more] = filledCells(text, reading.delimiter);
    const field = first?.field ?? 0;
    return {
      id: 'footer-row',
      level: 'warn',
      facts: {
        what: more.length > 0 ? 'totals' : 'note',
        line,
        file: name,
        cell: first?.cell ?? '',
        column: fields[field]?.name ?? '',
      },
      group: null,
      count: 1,
      cells: [{ file, line, field }],
      answers: [],
    };
  });

/** Rows at the foot of a file that sum it up (totals, means) and notes below it, none of them taken as data: each is said. */
export const footerRow: EvidenceDescriptor<'footer-row'> = {
  id: 'footer-row',
  thresholds: [],
  references: [],
  look: ({ table, settings: { files } }) =>
    table === null
      ? []
      : table.readings.flatMap((reading, file) =>
          footerFindings(reading, file, table.fields, files.length > 1 ? (files[file] ?? null) : null),
        ),
  canTell: () => true,
  title: t => t('totals rows at the foot'),
  say({ facts }, t) {
    const { file } = facts;
    const place =
      typeof file === 'string'
        ? t('{0}, line {1}', file, Number(facts['line']))
        : t('Line {0}', Number(facts['line']));
    const cell = String(facts['cell']);
    return facts['what'] === 'note'
      ? t('{0} reads "{1}": taken as a note below the table, not as data.', place, cell)
      : t(
          '{0} reads "{1}" under {2}: taken as a totals row, not as data.',
          place,
          cell,
          String(facts['column']),
        );
  },
};
