import { alikeLabels } from '../core/evidence/alikeLabels';
import { footerFindings } from '../core/evidence/footerRow';
import { passedOver } from '../core/evidence/passedOver';
import { longRows, shortRows } from '../core/evidence/raggedRows';
import { takenOtherwise } from '../core/evidence/readOtherwise';
import { groupedNumbers } from '../core/evidence/thousandsMarks';
import type { Finding } from '../core/model/comparison';
import type { Say } from '../core/model/say';
import { parseDecimal } from '../core/numeric/decimal';
import { fieldName } from '../readers/findField';
import type { Survey } from '../readers/survey';
import { findingSentence } from '../report/view/findings';
import { quoted } from '../report/words/label';

/** Something about a file that a person should look at before comparing anything. */
export interface InspectionFinding {
  readonly id: string;
  readonly level: Finding['level'];
  readonly sentence: string;
  /** The first 20 lines it is about; empty where it is about a column. */
  readonly lines: readonly number[];
}

const NAMED = 10;

type Column = Survey['columns'][number];

const listed = (texts: readonly { readonly label: string; readonly count: number }[]): string =>
  texts
    .slice(0, NAMED)
    .map(({ label, count }) => `${quoted(label)} (${count})`)
    .join(', ') + (texts.length > NAMED ? ', …' : '');

function columnFindings(
  column: Column,
  name: string,
  { reading }: Survey,
  t: Say,
): readonly InspectionFinding[] {
  const about = (id: string, level: InspectionFinding['level'], sentence: string) => ({
    id,
    level,
    sentence,
    lines: [],
  });
  const missing = new Set(reading.missingWords);
  const isNumber = (text: string) => parseDecimal(text.trim(), reading.decimal) !== null;
  const censored = column.kind === 'label' ? [] : column.labels.filter(({ label }) => /^\s*[<>]/.test(label));
  const texts =
    column.kind === 'mixed'
      ? column.labels.filter(
          ({ label }) => !/^\s*[<>]/.test(label) && !isNumber(label) && !missing.has(label.trim()),
        )
      : [];
  const alike = column.kind === 'label' ? alikeLabels(column.labels.map(({ label }) => label)) : [];
  const withCounts = (labels: readonly string[]) =>
    column.labels.filter(({ label }) => labels.includes(label));
  return [
    ...(texts.length === 0
      ? []
      : [
          about(
            'text-in-measured',
            'ask',
            t('{0} holds {1} cells that are no numbers: {2}.', name, column.texts, listed(texts)),
          ),
        ]),
    ...(censored.length === 0
      ? []
      : [
          about(
            'censored',
            'ask',
            t(
              '{0} holds readings below or above a limit: {1}. Say what they count as (--below zero, half or limit).',
              name,
              listed(censored),
            ),
          ),
        ]),
    ...alike.map(labels =>
      about(
        'label-variants',
        'ask',
        t(
          '{0} holds labels that differ only in capitals or spaces: {1}. If they are the same: --same "A -> B".',
          name,
          listed(withCounts(labels)),
        ),
      ),
    ),
  ];
}

/** What a file shows before anything is compared: rows passed over, text among numbers, limits, spellings of a label. */
export function inspectionFindings(survey: Survey, t: Say): readonly InspectionFinding[] {
  const { reading, fields } = survey;
  const told = [
    ...footerFindings(reading, 0, fields),
    ...longRows(reading, passedOver(reading, 'ragged-long')),
    ...shortRows(passedOver(reading, 'ragged-short')),
    ...takenOtherwise(reading),
    ...groupedNumbers(reading),
  ];
  return [
    ...survey.columns.flatMap(column => columnFindings(column, fieldName(fields, column.field), survey, t)),
    ...told.map(finding => ({
      id: finding.id,
      level: finding.level,
      sentence: findingSentence(finding, t),
      lines: finding.cells.map(({ line }) => line),
    })),
    ...blankLines(survey, t),
  ];
}

function blankLines({ reading }: Survey, t: Say): readonly InspectionFinding[] {
  const met = passedOver(reading, 'blank-line');
  if (met === null) return [];
  const lines = met.met.map(({ at }) => at.line);
  return [
    { id: 'blank-line', level: 'note', sentence: t('blank lines: {0}, passed over.', met.count), lines },
  ];
}
