import fc from 'fast-check';
import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import type { Table } from '../../src/core/model/cells';
import { readTable } from '../../src/readers/readTable';
import { scout, type Scouted } from '../../src/readers/scout';
import type { ByteSource } from '../../src/readers/byteSource';
import { inChunks, refusalOf, source } from './read';

// Independent implementation: Papa Parse, told delimiter, line end and nothing else.
const papaRows = (text: string, delimiter: string, newline: '\n' | '\r\n'): string[][] =>
  Papa.parse<string[]>(text, {
    delimiter,
    newline,
    header: false,
    dynamicTyping: false,
    skipEmptyLines: false,
  }).data;

const delimiters = fc.constantFrom(',', ';', '\t', '|');
const cellTexts = fc.oneof(
  { weight: 3, arbitrary: fc.stringMatching(/^[a-z0-9 .,;|"'é\u4e2d-]{0,8}$/) },
  { weight: 1, arbitrary: fc.stringMatching(/^[a-z"\n,;\t\r]{0,6}$/) },
);
const tables = fc.array(fc.tuple(cellTexts, cellTexts, cellTexts), { minLength: 1, maxLength: 12 });

/** Headers that say the layout by themselves; one row of numbers so that there is something to decide. */
const headed = (rows: readonly (readonly string[])[]): string[][] => [
  ['first', 'second', 'third'],
  ['plain', 'row', '1'],
  ...rows.map(row => [...row]),
  ['plain', 'row', '2'],
];

async function readFixed(file: ByteSource, delimiter: string): Promise<{ table: Table; head: Scouted }> {
  const head = await scout(file, { delimiter, header: 1, decimal: '.' });
  const table = await readTable([file], [head], { numbers: [], labels: [0, 1, 2], keepLines: 'all' });
  return { table, head };
}

const keptRows = (table: Table): (readonly string[])[] =>
  Array.from({ length: table.rows }, (_, row) => table.cells(row) ?? []);

const labelRows = (table: Table): string[][] =>
  Array.from({ length: table.rows }, (_, row) =>
    [0, 1, 2].map(field => {
      const { codes, levels } = table.labels(field);
      return levels[codes[row]!]!;
    }),
  );

const isFilled = (row: readonly string[]): boolean => row.some(cell => cell.replace(/[ \t]/g, '') !== '');
/** What stands for a missing label in the table: nothing but blanks. */
const orMissing = (cell: string): string => (cell.replace(/[ \t]/g, '') === '' ? '' : cell);

describe('the scanner', () => {
  it('reads back any table that Papa Parse writes, whatever the chunks', async () => {
    await fc.assert(
      fc.asyncProperty(
        tables,
        delimiters,
        fc.constantFrom('\n' as const, '\r\n' as const),
        fc.boolean(),
        fc.integer({ min: 1, max: 40 }),
        async (rows, delimiter, newline, quotes, size) => {
          const filled = rows.filter(row => isFilled(row) && !row[0].startsWith('#'));
          const text = Papa.unparse(headed(filled), { delimiter, newline, quotes });
          const { table } = await readFixed(inChunks(text, size), delimiter);
          expect(keptRows(table)).toEqual(headed(filled).slice(1));
          expect(labelRows(table)).toEqual(headed(filled.map(row => row.map(orMissing))).slice(1));
        },
      ),
    );
  });

  it('cuts any text into the cells that Papa Parse cuts it into', async () => {
    const lines = fc.array(fc.stringMatching(/^[ab1. ,"]{0,14}$/), { minLength: 1, maxLength: 8 });
    await fc.assert(
      fc.asyncProperty(lines, async body => {
        const text = `first,second,third\nplain,row,1\n${body.join('\n')}\nlast,row,2\n`;
        const truth = papaRows(text, ',', '\n').slice(1, -1);
        const refusal = await refusalOf(readFixed(source(text), ','));
        if (refusal !== null) {
          expect(refusal.code).toBe('quote-unclosed'); // a quote that swallows a line end is never taken in silence
          return;
        }
        const { table } = await readFixed(source(text), ',');
        const kept = keptRows(table);
        expect(kept.filter(isFilled)).toEqual(truth.filter(isFilled));
      }),
      { numRuns: 300 },
    );
  });

  it('knows the line of every row, as an editor counts: CR, LF and CRLF each end one', async () => {
    const ends = fc.constantFrom('\n', '\r', '\r\n');
    const rows = fc.array(fc.tuple(fc.constantFrom('a,1', '"b",2', '"c\nd",3', '"e\r\nf""",4', ' '), ends), {
      maxLength: 30,
    });
    await fc.assert(
      fc.asyncProperty(rows, fc.integer({ min: 1, max: 9 }), async (parts, size) => {
        const text = `word,number\nx,1\n${parts.map(part => part.join('')).join('')}z,9\n`;
        const file = inChunks(text, size);
        const head = await scout(file, { header: 1, delimiter: ',' });
        const table = await readTable([file], [head], { numbers: [1], labels: [0], keepLines: 'all' });
        const lines = text.split(/\r\n|\r|\n/);
        for (let row = 0; row < table.rows; row++) {
          const line = table.line(row);
          const first = table
            .cells(row)![0]!
            .split(/[\r\n]/)[0]!
            .replace(/"/g, '');
          expect(lines[line - 1]!.replace(/"/g, '').startsWith(first)).toBe(true);
          expect(table.rowAt(0, line)).toBe(row);
        }
        expect(table.line(table.rows - 1)).toBe(lines.length - 1);
        expect(table.readings[0]!.lines).toBe(lines.length - 1);
        const blank = parts.filter(([cells]) => cells === ' ').length;
        expect(table.rows + blank).toBe(parts.length + 2);
      }),
    );
  });

  it('reads the same numbers from any chunks of a large file', async () => {
    const rows = Array.from(
      { length: 20_000 },
      (_, i) => `${i},${i % 3 === 0 ? 'slow "cool"' : '"stan,dard"'},${i / 8}`,
    );
    const text = `id,group,value\r\n${rows.join('\r\n')}\r\nMean,,1250\r\n`;
    for (const size of [997, 65_536, 1 << 22]) {
      const file = inChunks(text, size);
      const head = await scout(file, {});
      const table = await readTable([file], [head], { numbers: [0, 2], labels: [1] });
      expect(table.rows).toBe(20_000);
      const { numbers } = table.numbers(2);
      expect(numbers.form === 'steps' && Number(numbers.shift) + numbers.steps[19_999]!).toBe(19_999 * 125);
      expect(table.labels(1).levels).toEqual(['', 'slow "cool"', 'stan,dard']);
      expect(table.line(19_999)).toBe(20_001);
      expect(table.readings[0]!.footer).toEqual([{ line: 20_002, text: 'Mean,,1250' }]);
    }
  });

  it('names the line on which a quote was opened far down a large file', async () => {
    const rows = Array.from({ length: 30_000 }, (_, i) => `${i},fine`);
    rows[25_000] = '25000,"never closed';
    const file = source(['id,note', ...rows, ''].join('\n'));
    const head = await scout(file, {});
    const refusal = await refusalOf(readTable([file], [head], { numbers: [0], labels: [] }));
    expect(refusal?.code).toBe('quote-unclosed');
    expect(refusal?.where).toEqual({ file: 0, line: 25_002, field: 1 });
  });

  it('holds more labels than fit one byte, and more than fit two', async () => {
    const count = 70_000;
    const rows = Array.from({ length: count }, (_, i) => `n${i},${i % 7}`);
    const file = source(['id,value', ...rows, ''].join('\n'));
    const head = await scout(file, {});
    const table = await readTable([file], [head], { numbers: [1], labels: [0] });
    const { codes, levels } = table.labels(0);
    expect(codes).toBeInstanceOf(Int32Array);
    expect([levels.length, levels[codes[300]!], levels[codes[count - 1]!]]).toEqual([
      count + 1,
      'n300',
      `n${count - 1}`,
    ]);
  });

  it('reads cells that are wanted as numbers and as labels both ways', async () => {
    const file = source('id,value\n007,1\n008,2\n');
    const head = await scout(file, {});
    const table = await readTable([file], [head], { numbers: [0, 1], labels: [0] });
    expect(table.labels(0).levels).toEqual(['', '007', '008']);
    expect(table.numbers(0).numbers).toMatchObject({ form: 'steps', shift: 7n, steps: Int32Array.of(0, 1) });
    expect(() => table.labels(1)).toThrow(RangeError);
  });
});
