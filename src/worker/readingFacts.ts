import type { Reading } from '../core/model/cells';
import type { ReadingFacts } from '../protocol/fromWorker';

type Decisions = Pick<Reading, 'encoding' | 'delimiter' | 'decimal' | 'headerLine' | 'met'>;

/** How one file was read, for the log: decisions and counts, no cell. */
export function readingFacts(file: string, reading: Decisions, rows: number): ReadingFacts {
  const times = new Map<string, number>();
  for (const { what } of reading.met) times.set(what, (times.get(what) ?? 0) + 1);
  const { encoding, delimiter, decimal, headerLine } = reading;
  return { file, encoding, delimiter, decimal, headerLine, rows, met: [...times] };
}
