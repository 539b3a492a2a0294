import type { Field, Reading } from '../core/model/cells';
import type { ByteSource } from './byteSource';
import { decideLayout, type Layout } from './decideLayout';
import { footLength } from './foot';
import { readHead, type HeadBytes } from './readHead';
import type { ReadingWish } from './readingWish';
import { Met } from './met';
import type { TableShape } from './tableShape';
import { unitInHeader, unitOfCell } from './unitText';

/** What the head of a file decides: everything that reading the rest needs. */
export interface Scouted {
  readonly fields: readonly Field[];
  readonly reading: Pick<
    Reading,
    'encoding' | 'delimiter' | 'decimal' | 'thousands' | 'headerLine' | 'unitsLine' | 'missingWords' | 'met'
  >;
  /** The first data rows as text. */
  readonly sample: readonly { readonly line: number; readonly cells: readonly string[] }[];
  /** Columns whose cells are mostly numbers, in the sample. */
  readonly numeric: readonly number[];
  readonly shape: TableShape;
  /** Bytes of the byte order mark. */
  readonly skip: number;
  /** UTF-8 was presumed from plain ASCII; a byte further on may show windows-1252. */
  readonly presumedUtf8: boolean;
  /** Roughly how many data rows there are; null: not known. */
  readonly expectedRows: number | null;
}

/**
 * Looks at the first 256 kB of a file and decides how to read it.
 * @param wish what a person has said; it goes before what the file shows
 * @param file index of the file, for problems
 * @throws Refusal file-empty, file-header-only, file-binary, encoding-invalid, quote-unclosed, decimal-undecidable,
 * layouts-equal, header-not-found
 */
export async function scout(source: ByteSource, wish: ReadingWish, file = 0): Promise<Scouted> {
  const head = await readHead(source, wish.encoding, file);
  const layout = decideLayout(head, wish, source.name, file);
  const { records } = layout.head;
  const { header, units, data, numeric } = layout.place;
  const below = records.slice(data);
  const foot = head.whole ? footLength(below, [], layout.width) : 0;
  const rows = below.slice(0, below.length - foot).map(({ line, cells }) => ({ line, cells }));
  const { choice } = head;
  return {
    fields: fieldsOf(layout, file),
    reading: {
      encoding: choice.encoding,
      delimiter: layout.delimiter,
      decimal: layout.decimal,
      thousands: layout.thousands,
      headerLine: records[header]?.line ?? 0,
      unitsLine: units === null ? null : (records[units]?.line ?? null),
      missingWords: layout.missing,
      met: metAbove(head, layout, file),
    },
    sample: rows,
    numeric,
    shape: {
      delimiter: layout.delimiter,
      width: layout.width,
      dataLine: data === 0 ? 1 : (records[data - 1]?.nextLine ?? 1),
      sample: rows.map(({ cells }) => cells),
    },
    skip: choice.skip,
    presumedUtf8: choice.encoding === 'utf-8' && !choice.certain,
    expectedRows: expectedRows(source, layout),
  };
}

function fieldsOf({ head, place, width }: Layout, file: number): readonly Field[] {
  const names = head.records[place.header]?.cells ?? [];
  const units = place.units === null ? undefined : head.records[place.units]?.cells;
  return Array.from({ length: width }, (_, column) => {
    const name = names[column] ?? '';
    const below = unitOfCell(units?.[column] ?? '');
    return { name, unit: (below === '' ? null : below) ?? unitInHeader(name), file };
  });
}

function metAbove(
  { choice, fallbackLine }: HeadBytes,
  { head, place }: Layout,
  file: number,
): Reading['met'] {
  const met = new Met(file);
  if (choice.fallback) met.note('encoding-fallback', fallbackLine, choice.encoding);
  head.records
    .slice(0, Math.max(0, place.header))
    .forEach(({ line, text }) => met.note('preamble', line, text));
  const units = place.units === null ? undefined : head.records[place.units];
  if (units !== undefined) met.note('units-row', units.line, units.text);
  return met.all;
}

function expectedRows(source: ByteSource, { head, place }: Layout): number | null {
  const rows = head.records.slice(place.data);
  if (source.size === null || rows.length === 0) return null;
  const bytes = rows.reduce((sum, { text }) => sum + text.length + 1, 0);
  return Math.ceil((source.size / bytes) * rows.length * 1.02);
}
