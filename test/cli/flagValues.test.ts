import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { around, namesOf, numberOf, rangesOf, twoNumbersOf, wholeNumberOf } from '../../src/cli/flagValues';
import { UsageError } from '../../src/cli/usageError';

const fixOf = (make: () => unknown): string => {
  try {
    make();
  } catch (error) {
    if (error instanceof UsageError) return `${error.message}. ${error.fix}`;
    throw error;
  }
  return 'accepted';
};

describe('numbers on the command line', () => {
  it('read back every finite number as it is printed', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), value => {
        expect(numberOf('against', String(value)) === value).toBe(true);
      }),
    );
  });

  it('take a typographic minus sign', () => {
    expect(numberOf('against', '\u22122.5')).toBe(-2.5);
  });

  it('take a percentage typed as a number, for the comparison itself to refuse', () => {
    expect(numberOf('confidence', '95')).toBe(95);
  });

  it.each([
    ['0,95', 'On the command line numbers have a point: --confidence 0.95.'],
    ['95%', 'Write a plain number, as 0.95.'],
    ['', 'Write a plain number'],
    ['12abc', 'Write a plain number'],
    ['0x10', 'Write a plain number'],
    ['1_000', 'Write a plain number'],
    ['Infinity', 'Write a plain number'],
    ['NaN', 'Write a plain number'],
    ['1e999', 'Write a plain number'],
  ])('refuse %j and say how to write it', (text, fix) => {
    expect(fixOf(() => numberOf('confidence', text))).toContain(fix);
  });

  it('refuse a line number that is not whole or below the least', () => {
    expect(fixOf(() => wholeNumberOf('header', '1.5', 1))).toContain('not a whole number of at least 1');
    expect(fixOf(() => wholeNumberOf('header', '0', 1))).toContain('not a whole number of at least 1');
    expect(wholeNumberOf('header', '3', 1)).toBe(3);
  });

  it('take two numbers with one comma, and no decimal commas among them', () => {
    expect(twoNumbersOf('sigma', '2.5, 3', 'T,R')).toEqual([2.5, 3]);
    expect(fixOf(() => twoNumbersOf('sigma', '2,5,3', 'T,R'))).toContain('--sigma T,R');
    expect(fixOf(() => twoNumbersOf('sigma', '2', 'T,R'))).toContain('is not two numbers');
  });
});

describe('names, ranges and pairs on the command line', () => {
  it('keep spaces inside names and refuse empty ones', () => {
    expect(namesOf('per', ['firing,tile no', 'reading'])).toEqual(['firing', 'tile no', 'reading']);
    expect(fixOf(() => namesOf('per', ['firing,']))).toContain('empty name');
  });

  it('read ranges of lines, single lines, and several of them', () => {
    expect(rangesOf('rows', ['2-41', '50, 60-61'])).toEqual([
      [2, 41],
      [50, 50],
      [60, 61],
    ]);
  });

  it.each(['41-2', '0-5', 'a-b', '', '2-'])('refuse %j as a range and show one', text => {
    expect(fixOf(() => rangesOf('rows', [text]))).toContain('as 2-41');
  });

  it('part at the first mark, so that labels keep their spaces', () => {
    expect(around('same', ' -> ', 'control  -> control', '…')).toEqual(['control ', 'control']);
    expect(around('where', '=', 'site=a=b', '…')).toEqual(['site', 'a=b']);
    expect(fixOf(() => around('where', '=', 'site', '"site=North"'))).toContain(
      'Write --where "site=North".',
    );
  });
});
