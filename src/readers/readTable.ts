import type { Reading, Table } from '../core/model/cells';
import type { Ticker } from '../core/model/problem';
import type { ByteSource } from './byteSource';
import { FedBytes } from './fedBytes';
import { fallenBack } from './fallenBack';
import { readFile } from './readFile';
import { ReadRows } from './readRows';
import type { Scouted } from './scout';
import { TableRead } from './tableRead';
import { NotUtf8 } from './utf8Chunks';
import { WantedColumns } from './wantedColumns';

/** Indices of the columns wanted (of the first file), and the lines whose cells are wanted as they stand. */
export interface Wanted {
  readonly numbers: readonly number[];
  readonly labels: readonly number[];
  readonly keepLines?: ReadonlySet<number> | 'all';
}

export interface ReadOptions {
  readonly tick?: Ticker;
  /** Gets every byte of every file once, in order. */
  readonly onBytes?: (file: number, chunk: Uint8Array) => void;
}

/**
 * Reads files once for the columns wanted; the columns of a second file are found by the names of the first.
 * @param scouted what `scout` gave for each source
 * @throws Refusal column-unknown, column-ambiguous, quote-unclosed, number-unusable, encoding-invalid, file-binary,
 * file-header-only; Cancelled
 */
export async function readTable(
  sources: readonly ByteSource[],
  scouted: readonly Scouted[],
  wanted: Wanted,
  options: ReadOptions = {},
): Promise<Table> {
  const fed = new FedBytes(sources, options);
  const heads = [...scouted];
  for (;;) {
    try {
      return await readAll(sources, heads, wanted, fed);
    } catch (error) {
      if (!(error instanceof NotUtf8)) throw error;
      const index = sources.indexOf(error.source);
      const head = heads[index];
      if (head === undefined) throw error;
      heads[index] = await fallenBack(error.source, head, error.byte, index);
      fed.again();
    }
  }
}

async function readAll(
  sources: readonly ByteSource[],
  heads: readonly Scouted[],
  wanted: Wanted,
  fed: FedBytes,
): Promise<Table> {
  const fields = heads[0]?.fields ?? [];
  const expectedRows = heads.reduce((sum, head) => sum + (head.expectedRows ?? 0), 0);
  const columns = new WantedColumns(fields, wanted, expectedRows);
  const rows = new ReadRows(wanted.keepLines ?? new Set());
  const readings: Reading[] = [];
  for (const [file, source] of sources.entries()) {
    const head = heads[file];
    if (head === undefined) throw new RangeError(`${source.name} was not looked at before it is read`);
    rows.startFile();
    const reading = await readFile(source, head, file, {
      onChunk: chunk => fed.take(file, chunk),
      sinks: (format, met) => columns.sinksOf(head.fields, format, met),
      rows,
    });
    readings.push(reading);
  }
  return new TableRead(fields, readings, rows, columns.build());
}
