import type { AnswerPlatform } from '../compare/answer';
import { Refusal } from '../core/model/problem';
import type { Table } from '../core/model/cells';
import type { LeftOut } from '../core/model/settings';
import type { ByteSource } from '../readers/byteSource';
import type { ReadingWish } from '../readers/readingWish';
import { readTable } from '../readers/readTable';
import { scout } from '../readers/scout';
import { rowDigest } from '../settings/digests';
import type { BlockLeftOut } from '../settings/document';

const TICK_EVERY = 0x1000;

/**
 * The lines on which the left-out rows of a block stand now: each is found by the digest of its cells, first on its old
 * line, else anywhere in its file. Throws Refusal 'left-out-row-gone' where none or more than one row has that digest.
 */
export async function findLeftOut(
  rows: readonly BlockLeftOut[],
  asked: readonly LeftOut[],
  sources: readonly ByteSource[],
  wish: ReadingWish,
  platform: AnswerPlatform,
): Promise<readonly LeftOut[]> {
  if (rows.length === 0) return asked;
  const digestAt = (table: Table, row: number): string =>
    rowDigest(table.cells(row) ?? [], platform.createHasher);
  const tableOf = async (keepLines: ReadonlySet<number> | 'all'): Promise<Table> => {
    const scouted = [];
    for (const source of sources) scouted.push(await scout(source, wish));
    return readTable(sources, scouted, { numbers: [], labels: [], keepLines }, { tick: platform.tick });
  };
  const near = await tableOf(new Set(asked.map(({ line }) => line)));
  const onOldLine = asked.every(({ file, line }, index) => {
    const row = near.rowAt(file, line);
    return row >= 0 && digestAt(near, row) === rows[index]?.['row-sha256'];
  });
  if (onOldLine) return asked;

  const table = await tableOf('all');
  const keyOf = (file: number, digest: string): string => `${file} ${digest}`;
  const keys = asked.map(({ file }, index) => keyOf(file, rows[index]?.['row-sha256'] ?? ''));
  const lines = new Map(keys.map((key): [string, number[]] => [key, []]));
  for (let row = 0; row < table.rows; row += 1) {
    if (row % TICK_EVERY === 0) platform.tick(row, table.rows);
    lines.get(keyOf(table.file(row), digestAt(table, row)))?.push(table.line(row));
  }
  return asked.map((leftOut, index) => {
    const found = lines.get(keys[index] ?? '') ?? [];
    const [line] = found.includes(leftOut.line) ? [leftOut.line] : found;
    if (line === undefined || (found.length > 1 && line !== leftOut.line)) {
      const { value = '' } = rows[index] ?? {};
      throw new Refusal('left-out-row-gone', { line: leftOut.line, value, found: found.length });
    }
    return { ...leftOut, line };
  });
}
