import type { Reading } from '../core/model/cells';
import { Refusal } from '../core/model/problem';
import type { ByteSource } from './byteSource';
import type { CellSink } from './cellSink';
import { makeCellFormat, type CellFormat } from './cellText';
import { Met } from './met';
import { readGrouped } from './thousands';
import { Scanner, type RowSink } from './scanner';
import type { Scouted } from './scout';
import { utf8Chunks } from './utf8Chunks';

export interface FilePass {
  /** Called with every chunk of the file's bytes, before it is scanned. */
  readonly onChunk: (chunk: Uint8Array) => void;
  /** Makes the sinks, one a column, null for columns that are not wanted. */
  readonly sinks: (format: CellFormat, met: Met) => readonly (CellSink | null)[];
  readonly rows: RowSink;
}

/**
 * Walks one file from end to end and hands its cells to the sinks.
 * @returns what was decided and met
 * @throws Refusal quote-unclosed, encoding-invalid, file-binary; NotUtf8 where UTF-8 was only presumed
 */
export async function readFile(
  source: ByteSource,
  head: Scouted,
  file: number,
  pass: FilePass,
): Promise<Reading> {
  const { reading, shape } = head;
  const met = new Met(file);
  met.noteAll(reading.met);
  const { decimal, thousands, missingWords } = reading;
  const sinks = pass.sinks(makeCellFormat(decimal, thousands, missingWords), met);
  const scanner = new Scanner(shape, sinks, pass.rows, met);
  let bytes = 0;
  const onBytes = (chunk: Uint8Array): void => {
    bytes += chunk.length;
    pass.onChunk(chunk);
  };
  const wanted = { encoding: reading.encoding, skip: head.skip, presumed: head.presumedUtf8, onBytes };
  for await (const chunk of utf8Chunks(source, wanted)) scanner.feed(chunk);
  scanner.end();
  if (pass.rows.count === 0) {
    const line = reading.headerLine;
    throw new Refusal(
      'file-header-only',
      { name: source.name, line },
      { file, line: Math.max(1, line), field: 0 },
    );
  }
  const firstMark = met.all.find(({ what }) => what === 'thousands-mark');
  return {
    ...reading,
    thousands: thousands === '' && firstMark !== undefined ? markOf(firstMark.text, decimal) : thousands,
    footer: scanner.footer,
    met: met.all,
    metCounts: met.perKind,
    bytes,
    lines: scanner.lines,
  };
}

const markOf = (text: string, decimal: '.' | ','): string => readGrouped(text, decimal)?.mark ?? '';
