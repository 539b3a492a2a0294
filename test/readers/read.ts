import type { Table } from '../../src/core/model/cells';
import { Refusal } from '../../src/core/model/problem';
import { bytesSource, type ByteSource } from '../../src/readers/byteSource';
import { findField } from '../../src/readers/findField';
import type { ReadingWish } from '../../src/readers/readingWish';
import { readTable } from '../../src/readers/readTable';
import { scout, type Scouted } from '../../src/readers/scout';

/** A file of this text, or of these bytes. */
export const source = (content: string | Uint8Array, name = 'bench.csv'): ByteSource =>
  bytesSource(name, typeof content === 'string' ? new TextEncoder().encode(content) : content);

/** The same bytes in chunks of this size. */
export const inChunks = (content: string, size: number): ByteSource => {
  const bytes = new TextEncoder().encode(content);
  return {
    name: 'bench.csv',
    size: bytes.length,
    // eslint-disable-next-line @typescript-eslint/require-await -- an AsyncIterable that never waits
    async *chunks() {
      for (let at = 0; at < bytes.length; at += size) yield bytes.slice(at, at + size);
    },
  };
};

export interface ReadBack {
  readonly table: Table;
  readonly head: Scouted;
}

/** Reads every column as numbers and as labels, and keeps every row as it stands. */
export async function readAll(file: ByteSource, wish: ReadingWish = {}): Promise<ReadBack> {
  const head = await scout(file, wish);
  const all = head.fields.map((_, index) => index);
  const table = await readTable([file], [head], { numbers: all, labels: all, keepLines: 'all' });
  return { table, head };
}

/** One column as numbers. */
export async function readNumbers(file: ByteSource, name: string, wish: ReadingWish = {}) {
  const head = await scout(file, wish);
  const field = findField(head.fields, name);
  const table = await readTable([file], [head], { numbers: [field], labels: [] });
  return table.numbers(field);
}

/** What was refused, or null. */
export async function refusalOf(work: Promise<unknown>): Promise<Refusal | null> {
  try {
    await work;
    return null;
  } catch (error) {
    if (error instanceof Refusal) return error;
    throw error;
  }
}
