import { describe, expect, it } from 'vitest';
import type { TextSpan } from '../../../src/protocol/files';
import { splitRecord } from '../../../src/readers/splitRecord';
import { cellSpans, textLines } from '../../../src/worker/selecting/cellSpans';
import { sayTaken } from '../../../src/worker/selecting/sayTaken';
import { selected, type SelectableText } from '../../../src/worker/selecting/selected';
import { sayFrom } from '../../../src/worker/sayFrom';

const fields = ['day', 'schedule', 'hardness'];
const text: SelectableText = {
  lines: textLines(
    [
      'Kiln export', // 1
      'day;schedule;hardness', // 2
      '1;slow cool;840,5', // 3
      '2;standard;817,9', // 4
      '3;"slow;', // 5, its quoted cell goes on
      'cool";851,0', // 6
      '4;standard;809,2', // 7
      '5;slow cool;', // 8
      '', // 9
      'Mean;;829,7', // 10, no data row
    ].join('\r\n'),
  ),
  delimiter: ';',
  headerLine: 2,
  rowLines: [3, 4, 5, 7, 8],
  fields,
};

/** From line and column to line and column, both from 1 as people count. */
const span = (startLine: number, startColumn: number, endLine: number, endColumn: number): TextSpan => ({
  startLine: startLine - 1,
  startCharacter: startColumn - 1,
  endLine: endLine - 1,
  endCharacter: endColumn - 1,
});
const taken = (...spans: TextSpan[]) => selected(spans, text);
const whole = { rows: null, columns: null, rowCount: 5, uneven: false };

describe('what selected text stands for', () => {
  it('takes the whole table when nothing, one place or one cell is selected', () => {
    expect(taken()).toEqual(whole);
    expect(taken(span(4, 3, 4, 3))).toEqual(whole);
    expect(taken(span(4, 3, 4, 11))).toEqual(whole);
  });

  it('takes the whole table when fewer than two data rows are touched', () => {
    expect(taken(span(1, 1, 3, 5))).toEqual(whole);
    expect(taken(span(4, 1, 4, 17))).toEqual(whole);
  });

  it('takes the rows one range touches with all their columns', () => {
    expect(taken(span(3, 5, 4, 2))).toEqual({ ...whole, rows: [[3, 4]], rowCount: 2 });
  });

  it('does not touch the line a range ends at the start of', () => {
    expect(taken(span(3, 1, 5, 1))).toEqual({ ...whole, rows: [[3, 4]], rowCount: 2 });
  });

  it('counts a row of which only the second line is touched, for a quoted cell may hold a line end', () => {
    expect(taken(span(6, 2, 7, 3))).toEqual({ ...whole, rows: [[5, 7]], rowCount: 2 });
  });

  it('does not count lines below the last data row as part of it', () => {
    expect(taken(span(7, 1, 7, 4), span(10, 1, 10, 5))).toEqual(whole);
    expect(taken(span(7, 1, 10, 5)).rows).toEqual([[7, 8]]);
  });

  it('takes every row, so that it grows with the file, when all are touched', () => {
    expect(taken(span(1, 1, 10, 12))).toEqual(whole);
  });

  it('picks columns of all rows by a range inside the header line', () => {
    expect(taken(span(2, 5, 2, 22))).toEqual({ ...whole, columns: [1, 2] });
    expect(taken(span(2, 1, 2, 4), span(2, 14, 2, 18))).toEqual({ ...whole, columns: [0, 2] });
  });

  it('takes the rows and columns that several ranges touch', () => {
    const box = taken(span(3, 3, 3, 18), span(4, 3, 4, 17), span(7, 3, 7, 17));
    expect(box).toEqual({
      rows: [
        [3, 4],
        [7, 7],
      ],
      columns: [1, 2],
      rowCount: 3,
      uneven: false,
    });
  });

  it('takes the union of the columns, and knows it, where the cells are not aligned', () => {
    const box = taken(span(3, 1, 3, 2), span(4, 3, 4, 11));
    expect(box).toEqual({ rows: [[3, 4]], columns: [0, 1], rowCount: 2, uneven: true });
  });

  it('takes an empty cell under a caret of a box', () => {
    expect(taken(span(7, 12, 7, 17), span(8, 13, 8, 13)).columns).toEqual([2]);
  });

  it('does not take the cell behind the delimiter a range ends at', () => {
    expect(taken(span(3, 3, 3, 13), span(4, 3, 4, 12)).columns).toEqual([1]);
  });
});

describe('what was taken, in words', () => {
  const say = (...spans: TextSpan[]): string => sayTaken(taken(...spans), fields, sayFrom(null));

  it('names lines and counts columns', () => {
    expect(say()).toBe('all 5 rows, 3 columns');
    expect(say(span(3, 1, 4, 5))).toBe('lines 3–4, 3 columns');
  });

  it('names the columns where some were singled out', () => {
    expect(say(span(2, 5, 2, 22))).toBe('all 5 rows, columns schedule, hardness');
    expect(say(span(3, 3, 3, 5), span(7, 3, 7, 5))).toBe('lines 3, 7, column schedule');
  });
});

describe('the cells of a row', () => {
  it('are parted as the reader parts them, also where a quoted cell goes on behind its quote', () => {
    const parts = (row: string) => {
      const lines = textLines(row);
      return cellSpans(lines, 0, lines.length, ',').map(cell => [cell.startCharacter, cell.endCharacter]);
    };
    for (const row of ['a,b,c', '"a,1",b', '"a"b,c",2', 'x,"say ""no"", twice",3', ',,']) {
      const read = splitRecord(row, ',');
      expect(parts(row).length, row).toBe(read.length);
    }
    expect(parts('"a,1",b')).toEqual([
      [0, 5],
      [6, 7],
    ]);
  });
});
