import type { Reading } from '../core/model/cells';
import type { ReadingFacts } from '../protocol/fromWorker';

type Decisions = Pick<Reading, 'encoding' | 'delimiter' | 'decimal' | 'headerLine' | 'metCounts'>;

/** How one file was read, for the log: decisions and counts, no cell. */
export function readingFacts(file: string, reading: Decisions, rows: number): ReadingFacts {
  const { encoding, delimiter, decimal, headerLine, metCounts } = reading;
  return { file, encoding, delimiter, decimal, headerLine, rows, met: Object.entries(metCounts) };
}
