import type { Reading } from '../model/cells';
import type { EvidenceDescriptor, Finding } from '../model/comparison';
import { metFinding, passedOver } from './passedOver';

/** Numbers of one reading whose digits are grouped. */
export function groupedNumbers(reading: Reading): readonly Finding[] {
  const met = passedOver(reading, 'thousands-mark');
  return met === null
    ? []
    : [metFinding('thousands-marks', 'note', met, { text: met.met[0]?.text ?? '', mark: reading.thousands })];
}

/** Numbers with marks between groups of three digits, which were taken off: 1 234,5 is read as 1234.5. */
export const thousandsMarks: EvidenceDescriptor<'thousands-marks'> = {
  id: 'thousands-marks',
  thresholds: [],
  references: [],
  look: ({ table }) => (table?.readings ?? []).flatMap(groupedNumbers),
  canTell: () => true,
  title: t => t('thousands marks'),
  say: ({ facts }, t) =>
    Number(facts['count']) === 1
      ? t(
          '1 number has a mark between its thousands, taken off when it was read: "{0}".',
          String(facts['text']),
        )
      : t(
          '{0} numbers have a mark between their thousands, taken off when they were read: "{1}".',
          Number(facts['count']),
          String(facts['text']),
        ),
};
