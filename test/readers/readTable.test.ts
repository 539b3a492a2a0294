import { describe, expect, it } from 'vitest';
import { Cell } from '../../src/core/model/cells';
import { Cancelled } from '../../src/core/model/problem';
import { nearestDoubles } from '../../src/core/numeric/numbers';
import { readTable } from '../../src/readers/readTable';
import { scout } from '../../src/readers/scout';
import { inChunks, readAll, refusalOf, source } from './read';

const headsOf = (files: readonly ReturnType<typeof source>[]) =>
  Promise.all(files.map((file, index) => scout(file, {}, index)));

describe('a table read', () => {
  it('keeps the cells of the lines asked for as they stand, and of no others', async () => {
    const file = source('site,mass\nnorth, 1.50\n"so""uth",2\neast,3\n');
    const [head] = await headsOf([file]);
    const table = await readTable([file], [head!], { numbers: [1], labels: [], keepLines: new Set([3]) });
    expect([0, 1, 2].map(row => table.cells(row))).toEqual([null, ['so"uth', '2'], null]);
  });

  it('hands on every byte of the file once and in order', async () => {
    const text = 'site,mass\nnorth,1.5\nsouth,2\n';
    const file = inChunks(text, 7);
    const [head] = await headsOf([file]);
    let seen = '';
    await readTable(
      [file],
      [head!],
      { numbers: [1], labels: [] },
      {
        onBytes: (_, chunk) => (seen += new TextDecoder().decode(chunk)),
      },
    );
    expect(seen).toBe(text);
  });

  it('says how far it is, and stops when the person gave up', async () => {
    const file = inChunks(`a,b\n${'1,2\n'.repeat(100)}`, 50);
    const [head] = await headsOf([file]);
    const wanted = { numbers: [0], labels: [] };
    const told: number[] = [];
    await readTable([file], [head!], wanted, { tick: (done, total) => told.push(done / total) });
    expect(told.at(-1)).toBe(1);
    expect(told).toEqual([...told].sort((a, b) => a - b));
    const stop = () => {
      throw new Cancelled();
    };
    await expect(readTable([file], [head!], wanted, { tick: stop })).rejects.toThrow(Cancelled);
  });

  it('with a column that no row reaches has it missing throughout', async () => {
    const { table } = await readAll(source('a,b,c\n1,2\n3,4\n'), { header: 1, delimiter: ',' });
    expect([...table.numbers(2).state!]).toEqual([Cell.Missing, Cell.Missing]);
    expect([...table.labels(2).codes]).toEqual([0, 0]);
  });

  it('names the first 20 words that stand where numbers should', async () => {
    const rows = Array.from({ length: 60 }, (_, i) => (i % 2 === 0 ? `r${i},${i}` : `r${i},odd ${i}`));
    const { table } = await readAll(source(['id,x', ...rows, ''].join('\n')), { header: 1 });
    const { texts, state } = table.numbers(1);
    expect(texts.length).toBe(20);
    expect(texts[0]).toEqual({ row: 1, text: 'odd 1' });
    expect(state!.filter(code => code === Cell.Text).length).toBe(30);
  });

  it('counts what it met beyond the 20 it names', async () => {
    const { table } = await readAll(source(`a,b\n${'1,2\n\n'.repeat(50)}`));
    const reading = table.readings[0]!;
    expect(reading.metCounts['blank-line']).toBe(50);
    expect(reading.met.filter(({ what }) => what === 'blank-line').map(({ at }) => at.line)).toEqual(
      Array.from({ length: 20 }, (_, i) => 3 + 2 * i),
    );
  });
});

describe('two files', () => {
  it('become one table: columns by name, rows after rows, each with its file and line', async () => {
    const files = [
      source('site,mass\nnorth,1.5\nsouth,2\n', 'april.csv'),
      source('# May\nmass;site\n3,25;east\n', 'may.csv'),
    ];
    const heads = await headsOf(files);
    const table = await readTable(files, heads, { numbers: [1], labels: [0] });
    expect([...nearestDoubles(table.numbers(1).numbers)]).toEqual([1.5, 2, 3.25]);
    expect(table.labels(0).levels).toEqual(['', 'north', 'south', 'east']);
    expect([0, 1, 2].map(row => [table.file(row), table.line(row)])).toEqual([
      [0, 2],
      [0, 3],
      [1, 3],
    ]);
    expect([table.rowAt(1, 3), table.rowAt(0, 3), table.rowAt(1, 2)]).toEqual([2, 1, -1]);
    expect(table.readings.map(({ delimiter }) => delimiter)).toEqual([',', ';']);
  });

  it('are refused when the second lacks a column, with the names it has', async () => {
    const files = [source('site,mass\nnorth,1.5\n', 'april.csv'), source('site,weight\neast,3\n', 'may.csv')];
    const heads = await headsOf(files);
    const refusal = await refusalOf(readTable(files, heads, { numbers: [1], labels: [] }));
    expect([refusal?.code, refusal?.facts]).toEqual([
      'column-unknown',
      { name: 'mass', columns: ['site', 'weight'] },
    ]);
    expect(refusal?.where).toMatchObject({ file: 1 });
  });

  it('put the second file into a problem of the second file', async () => {
    const files = [source('a,b\n1,2\n', 'one.csv'), source('a,b\n1,Infinity\n3,4\n5,6\n', 'two.csv')];
    const heads = await headsOf(files);
    const refusal = await refusalOf(readTable(files, heads, { numbers: [1], labels: [] }));
    expect([refusal?.code, refusal?.where]).toEqual(['number-unusable', { file: 1, line: 2, field: 1 }]);
  });

  it('do not refuse a file for a number in a row that a person named to leave it out', async () => {
    const files = [source('a,b\n1,2\n2,1e400\n3,4\n5,6\n', 'one.csv')];
    const heads = await headsOf(files);
    const wanted = { numbers: [1], labels: [], keepLines: new Set([3]) };
    const table = await readTable(files, heads, wanted);
    expect(table.numbers(1).texts).toEqual([{ row: 1, text: '1e400' }]);
  });
});

describe('an encoding that shows only far down', () => {
  const plain = Array.from({ length: 40_000 }, (_, i) => `plain ${i},1`);
  const withByte = (byte: number): Uint8Array => {
    const bytes = new TextEncoder().encode(['site,mass', ...plain, 'K?ln,2', ''].join('\n'));
    bytes[bytes.lastIndexOf('?'.charCodeAt(0))] = byte;
    return bytes;
  };

  it('is taken for the whole file, and said', async () => {
    const file = source(withByte(0xf6));
    const [head] = await headsOf([file]);
    expect(head!.reading.encoding).toBe('utf-8');
    let bytes = 0;
    const table = await readTable(
      [file],
      [head!],
      { numbers: [1], labels: [0] },
      {
        onBytes: (_, chunk) => (bytes += chunk.length),
      },
    );
    const reading = table.readings[0]!;
    expect(reading.encoding).toBe('windows-1252');
    expect(reading.met[0]).toEqual({
      what: 'encoding-fallback',
      at: { file: 0, line: 40_002, field: 0 },
      text: 'windows-1252',
    });
    expect(table.labels(0).levels.at(-1)).toBe('Köln');
    expect([table.rows, bytes]).toEqual([40_001, file.size]);
  });

  it('is refused with its line where the head is UTF-8 beyond doubt', async () => {
    const head = new TextEncoder().encode('Ort,Härte\nKöln,1\n');
    const rest = withByte(0xf6).subarray('site,mass\n'.length);
    const bytes = new Uint8Array(head.length + rest.length);
    bytes.set(head);
    bytes.set(rest, head.length);
    const file = source(bytes);
    const [scouted] = await headsOf([file]);
    const refusal = await refusalOf(readTable([file], [scouted!], { numbers: [1], labels: [] }));
    expect(refusal?.code).toBe('encoding-invalid');
    expect(refusal?.facts).toMatchObject({ encoding: 'utf-8', line: 40_003 });
  });

  it('is no matter for NUL bytes: they are refused with their line', async () => {
    const file = source(withByte(0));
    const [head] = await headsOf([file]);
    const refusal = await refusalOf(readTable([file], [head!], { numbers: [1], labels: [] }));
    expect([refusal?.code, refusal?.facts['line']]).toEqual(['file-binary', 40_002]);
  });
});
