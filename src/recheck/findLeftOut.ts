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
 * line, else anywhere in its file, and no two on one line. Throws Refusal 'left-out-row-gone' where fewer rows than were
 * left out have that digest, or more, so that it cannot be said which of them were meant.
 */
export async function findLeftOut(
  rows: readonly Pick<BlockLeftOut, 'row-sha256' | 'value'>[],
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
  const places = new Set(asked.map(({ file, line }) => `${file} ${line}`));
  const onOldLine = asked.every(({ file, line }, index) => {
    const row = near.rowAt(file, line);
    return row >= 0 && digestAt(near, row) === rows[index]?.['row-sha256'];
  });
  if (onOldLine && places.size === asked.length) return asked;

  const table = await tableOf('all');
  const keyOf = (file: number, digest: string): string => `${file} ${digest}`;
  const keys = asked.map(({ file }, index) => keyOf(file, rows[index]?.['row-sha256'] ?? ''));
  const lines = new Map(keys.map((key): [string, number[]] => [key, []]));
  for (let row = 0; row < table.rows; row += 1) {
    if (row % TICK_EVERY === 0) platform.tick(row, table.rows);
    lines.get(keyOf(table.file(row), digestAt(table, row)))?.push(table.line(row));
  }
  const now = linesTaken(
    asked.map(({ line }, index) => ({ line, key: keys[index] ?? '' })),
    lines,
  );
  return asked.map((leftOut, index) => {
    const line = now[index];
    if (line !== undefined) return { ...leftOut, line };
    const { value = '' } = rows[index] ?? {};
    const found = lines.get(keys[index] ?? '')?.length ?? 0;
    const alike = keys.filter(key => key === keys[index]).length;
    const facts = { line: leftOut.line, value, found: found > alike ? found : 0 };
    throw new Refusal('left-out-row-gone', facts, sources[leftOut.file]?.name ?? null);
  });
}

/**
 * The line of each left-out row, each line given once; undefined where it cannot be said. Rows that are alike may stand for
 * one another, so as many as are looked for have to be there, no more and no fewer.
 */
function linesTaken(
  looked: readonly { readonly line: number; readonly key: string }[],
  lines: ReadonlyMap<string, readonly number[]>,
): readonly (number | undefined)[] {
  const free = new Map([...lines].map(([key, found]) => [key, new Set(found)]));
  const now = looked.map(({ line, key }) => (free.get(key)?.delete(line) === true ? line : undefined));
  for (const [key, left] of free) {
    const without = looked.flatMap((row, index) =>
      row.key === key && now[index] === undefined ? [index] : [],
    );
    if (without.length !== left.size) continue;
    const rest = [...left];
    without.forEach((index, at) => (now[index] = rest[at]));
  }
  return now;
}
