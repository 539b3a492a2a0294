import type { Comparison } from '../../core/model/comparison';
import type { Reading } from '../../core/model/cells';
import type { Say } from '../../core/model/say';
import { visible } from '../words/label';
import type { ViewContext } from './context';
import type { RecordPart } from './shown';

const MOST_LINES = 20;

/** Each file with its digest, how it was read, and everything met that is not a plain cell, line by line. */
export function dataParts(
  { readings, settings }: Comparison,
  { t, files, table }: ViewContext,
): readonly RecordPart[] {
  return files.map(({ path, bytes, sha256 }, index) => {
    const reading = readings[index];
    return {
      heading: t('Data: {0}', visible(path)),
      rows: [
        [t('bytes'), String(bytes)],
        ['SHA-256', sha256],
        ...(reading === undefined ? [] : readingRows(reading, t)),
        [t('values below a limit'), settings.reading.below],
        [t('data rows read'), String(rowsOfFile(table, index))],
      ],
    };
  });
}

function rowsOfFile(table: ViewContext['table'], file: number): number {
  if (table === null) return 0;
  let rows = 0;
  for (let row = 0; row < table.rows; row += 1) if (table.file(row) === file) rows += 1;
  return rows;
}

function readingRows(reading: Reading, t: Say): RecordPart['rows'] {
  return [
    [t('encoding'), reading.encoding],
    [t('delimiter'), reading.delimiter === '\t' ? t('tab') : reading.delimiter],
    [t('decimal mark'), reading.decimal],
    ...(reading.thousands === '' ? [] : [[t('thousands mark'), visible(reading.thousands)] as const]),
    [t('header'), t('line {0}', reading.headerLine)],
    ...(reading.unitsLine === null ? [] : [[t('units'), t('line {0}', reading.unitsLine)] as const]),
    ...reading.footer.map(
      ({ line, text }) => [t('totals row'), t('line {0}: {1}', line, visible(text))] as const,
    ),
    [t('words for missing'), reading.missingWords.map(word => visible(word)).join(', ')],
    ...metRows(reading, t),
  ];
}

/** What was met, one line a kind: how often and on which lines. */
function metRows({ met }: Reading, t: Say): RecordPart['rows'] {
  const kinds = [...new Set(met.map(({ what }) => what))];
  return kinds.map(kind => {
    const own = met.filter(({ what }) => what === kind);
    const lines = own
      .slice(0, MOST_LINES)
      .map(({ at }) => String(at.line))
      .join(', ');
    return [kind, own.length > MOST_LINES ? t('lines {0}, …', lines) : t('lines {0}', lines)] as const;
  });
}
