import { alikeLabels } from '../core/evidence/alikeLabels';
import { footerFindings, footerRow } from '../core/evidence/footerRow';
import type { Say } from '../core/model/say';
import { parseDecimal } from '../core/numeric/decimal';
import { fieldName } from '../readers/findField';
import type { Survey } from '../readers/survey';
import { quoted } from '../report/words/label';

/** Something about a file that a person should look at before comparing anything. */
export interface InspectionFinding {
  readonly id: string;
  readonly level: 'ask' | 'warn' | 'note';
  readonly sentence: string;
  /** The first 20 lines it is about; empty where it is about a column. */
  readonly lines: readonly number[];
}

const NAMED = 10;
const LINES = 20;

type Column = Survey['columns'][number];

/** What was met while reading, in words: one sentence a kind, `count` of them. */
const metWords: Readonly<Record<string, (count: number, text: string, t: Say) => string>> = {
  'blank-line': (count, _, t) => t('blank lines: {0}, passed over.', count),
  'ragged-short': (count, _, t) =>
    t('rows with fewer cells than columns: {0}; the cells that are not there count as missing.', count),
  'ragged-long': (count, _, t) =>
    t('rows with more cells than columns: {0}; the cells beyond the last column are not used.', count),
  'quote-inside': (count, _, t) =>
    t('rows with a quotation mark inside a cell: {0}, taken as part of the text.', count),
  'encoding-fallback': (_, encoding, t) =>
    t('The bytes are not UTF-8 from here on: read as {0}. If letters look wrong, say --encoding.', encoding),
};

function metFindings({ reading }: Survey, t: Say): readonly InspectionFinding[] {
  return Object.entries(metWords).flatMap(([what, words]) => {
    const met = reading.met.filter(one => one.what === what);
    const [first] = met;
    if (first === undefined) return [];
    const count = reading.metCounts[what] ?? met.length;
    const level = what === 'blank-line' ? 'note' : 'warn';
    return [
      {
        id: what,
        level,
        sentence: words(count, first.text, t),
        lines: met.slice(0, LINES).map(({ at }) => at.line),
      },
    ];
  });
}

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
  const footers = footerFindings(survey.reading, 0, survey.fields).map(finding => ({
    id: finding.id,
    level: 'warn' as const,
    sentence: footerRow.say(finding, t),
    lines: finding.cells.map(({ line }) => line),
  }));
  return [
    ...survey.columns.flatMap(column =>
      columnFindings(column, fieldName(survey.fields, column.field), survey, t),
    ),
    ...footers,
    ...metFindings(survey, t),
  ];
}
