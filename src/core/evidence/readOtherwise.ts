import type { Reading } from '../model/cells';
import type { EvidenceDescriptor, Finding } from '../model/comparison';
import { metFinding, passedOver } from './passedOver';

const LEVELS: readonly (readonly [what: string, level: Finding['level']])[] = [
  ['encoding-fallback', 'warn'],
  ['quote-inside', 'warn'],
  ['comment-line', 'note'],
];

/** What one reading took otherwise than a plain table asks for. */
export const takenOtherwise = (reading: Reading): readonly Finding[] =>
  LEVELS.flatMap(([what, level]) => {
    const met = passedOver(reading, what);
    return met === null
      ? []
      : [metFinding('read-otherwise', level, met, { what, text: met.met[0]?.text ?? '' })];
  });

/** Bytes that are no UTF-8, quotation marks inside cells, and comment lines, each read in a way that a person should know. */
export const readOtherwise: EvidenceDescriptor<'read-otherwise'> = {
  id: 'read-otherwise',
  thresholds: [],
  references: [],
  look: ({ table }) => (table?.readings ?? []).flatMap(takenOtherwise),
  canTell: () => true,
  title: t => t('text read in another way than it looks'),
  say({ facts }, t) {
    const count = Number(facts['count']);
    switch (facts['what']) {
      case 'encoding-fallback':
        return t(
          'The bytes are not UTF-8 from here on: read as {0}. If letters look wrong, name the encoding.',
          String(facts['text']),
        );
      case 'quote-inside':
        return count === 1
          ? t('1 row has a quotation mark inside a cell, taken as part of the text.')
          : t('{0} rows have a quotation mark inside a cell, taken as part of the text.', count);
      default:
        return count === 1
          ? t('1 comment line was passed over: "{0}".', String(facts['text']))
          : t('{0} comment lines were passed over, the first: "{1}".', count, String(facts['text']));
    }
  },
};
