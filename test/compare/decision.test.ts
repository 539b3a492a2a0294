import { describe, expect, it } from 'vitest';
import { decide } from '../../src/compare/decision';
import { whatIfOf } from '../../src/compare/verdict';
import type { Decision, Row } from '../../src/core/model/comparison';
import type { MethodResult } from '../../src/core/model/methods';
import type { Question } from '../../src/core/model/settings';

const result = (part: Partial<MethodResult>): MethodResult => ({
  estimate: 0,
  se: 1,
  statistic: 0,
  df: 10,
  p: null,
  lower: null,
  upper: null,
  confidence: 0.95,
  ...part,
});
const asked = { confidence: 0.95, against: 0, margin: [-2, 3] as const };

describe('the word for a result', () => {
  it.each<[Question, Partial<MethodResult>, Decision]>([
    ['differs', { p: 0.0499 }, 'differs'],
    ['differs', { p: 0.05 }, 'not settled'],
    ['higher', { p: 0.01 }, 'higher'],
    ['higher', { p: 0.99 }, 'not shown'],
    ['lower', { p: 0.01 }, 'lower'],
    ['lower', { p: 0.5 }, 'not shown'],
    ['equivalent', { p: 0.01, lower: -1, upper: 1 }, 'within margin'],
    ['equivalent', { p: 0.5, lower: -1, upper: 4 }, 'not shown within margin'],
    ['equivalent', { p: 0.999, lower: 3.1, upper: 6 }, 'outside margin'],
    ['equivalent', { p: 0.999, lower: -6, upper: -2 }, 'outside margin'],
    ['not-lower', { p: 0.01 }, 'not lower by the margin'],
    ['not-lower', { p: 0.3 }, 'not shown'],
    ['not-lower', { p: 0.99, twoSided: { p: 0.9, lower: -8, upper: -2.5 } }, 'lower by at least the margin'],
    ['not-lower', { p: 0.96, twoSided: { p: 0.9, lower: -8, upper: -1.9 } }, 'not shown'],
    ['not-lower', { p: 0.01, twoSided: { p: 0.01, lower: 3.5, upper: 8 } }, 'not lower by the margin'],
    ['not-higher', { p: 0.01 }, 'not higher by the margin'],
    ['not-higher', { p: 0.3 }, 'not shown'],
    ['not-higher', { p: 0.99, twoSided: { p: 0.9, lower: 3.5, upper: 8 } }, 'higher by at least the margin'],
    ['not-higher', { p: 0.96, twoSided: { p: 0.9, lower: 2.9, upper: 8 } }, 'not shown'],
  ])('%s with %j: %s', (question, part, word) => {
    expect(decide(question, result(part), asked)).toBe(word);
  });

  it.each<[Question, Partial<MethodResult>, Decision]>([
    ['differs', { lower: 0.1, upper: 2 }, 'differs'],
    ['differs', { lower: -2, upper: -0.1 }, 'differs'],
    ['differs', { lower: 0, upper: 2 }, 'not settled'],
    ['higher', { lower: 0.1 }, 'higher'],
    ['higher', { lower: -0.1 }, 'not shown'],
    ['lower', { upper: -0.1 }, 'lower'],
    ['lower', { upper: 0.1 }, 'not shown'],
    ['equivalent', { lower: -1.9, upper: 2.9 }, 'within margin'],
    ['equivalent', { lower: -2.1, upper: 2.9 }, 'not shown within margin'],
    ['not-lower', { lower: -1.9 }, 'not lower by the margin'],
    ['not-higher', { upper: 2.9 }, 'not higher by the margin'],
    [
      'not-lower',
      { lower: -7, twoSided: { p: null, lower: -8, upper: -2.5 } },
      'lower by at least the margin',
    ],
    ['not-lower', { lower: -7, twoSided: { p: null, lower: -8, upper: -1 } }, 'not shown'],
    ['not-lower', { lower: -2, twoSided: { p: null, lower: 4, upper: 8 } }, 'not shown'],
    [
      'not-higher',
      { upper: 9, twoSided: { p: null, lower: 3.5, upper: 10 } },
      'higher by at least the margin',
    ],
  ])('%s without a p, from the interval %j: %s', (question, part, word) => {
    expect(decide(question, result(part), asked)).toBe(word);
  });
});

it('a p that is not a number is never taken for "not shown"', () => {
  expect(() => decide('differs', result({ p: Number.NaN }), asked)).toThrow(RangeError);
});

describe('whether the decision depends on the choice', () => {
  const row = (id: string, p: number, counted = true): Row => ({
    id,
    data: 'all',
    result: result({ p }),
    applies: true,
    counted,
    reason: null,
    decision: p < 0.05 ? 'differs' : 'not settled',
  });
  const depends = (...rows: Row[]): string => whatIfOf(rows, rows[0]!, 0.95).depends;

  it('no: all counted rows say the same, whatever the others say', () => {
    expect(depends(row('a', 0.01), row('b', 0.02), row('c', 0.2, false))).toBe('no');
    expect(depends(row('a', 0.01))).toBe('no');
  });

  it('yes: they do not', () => {
    expect(depends(row('a', 0.01), row('b', 0.2))).toBe('yes');
    expect(depends(row('a', 0.01), row('b', 0.06))).toBe('yes');
  });

  it('on the line: they do not, and every counted p lies within a factor of 1.5 of it', () => {
    expect(depends(row('a', 0.046), row('b', 0.055))).toBe('on the line');
    expect(depends(row('a', 0.034), row('b', 0.075))).toBe('on the line');
    expect(depends(row('a', 0.033), row('b', 0.055))).toBe('yes');
    expect(depends(row('a', 0.046), row('b', 0.055), row('c', 0.9, false))).toBe('on the line');
  });

  it('hears the chosen row even where it is a bound, and names the counted rows by their place', () => {
    const rows = [row('bound', 0.2, false), row('b', 0.01), row('c', 0.02)];
    expect(whatIfOf(rows, rows[0]!, 0.95)).toMatchObject({ depends: 'yes', counted: [1, 2] });
  });
});
