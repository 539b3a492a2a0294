import { describe, expect, it } from 'vitest';
import { locate } from '../../src/readers/locate';

const text = 'site;mass;note\r\n"Hall; 2";1,5;fine\rKöln😀;"2\nlines";x\nlast;3';

describe('a cell', () => {
  it.each([
    [1, 1, { line: 1, startColumn: 6, endColumn: 10 }],
    [2, 0, { line: 2, startColumn: 1, endColumn: 10 }],
    [2, 1, { line: 2, startColumn: 11, endColumn: 14 }],
    [3, 0, { line: 3, startColumn: 1, endColumn: 7 }],
    [3, 1, { line: 3, startColumn: 8, endColumn: 10 }],
    [3, 2, { line: 4, startColumn: 8, endColumn: 9 }],
    [5, 1, { line: 5, startColumn: 6, endColumn: 7 }],
  ])('of the row on line %i, field %i, is found where an editor shows it', (line, field, place) => {
    expect(locate(text, line, field, ';')).toEqual(place);
  });

  it('that the row or the text does not have is not found', () => {
    expect(locate(text, 5, 2, ';')).toBeNull();
    expect(locate(text, 6, 0, ';')).toBeNull();
  });

  it('is found behind a quoted cell longer than any window', () => {
    const long = `a,b\n"${'x,\n'.repeat(5000)}",2\n`;
    expect(locate(long, 2, 1, ',')).toEqual({ line: 5002, startColumn: 3, endColumn: 4 });
  });
});
