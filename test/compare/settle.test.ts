import { describe, expect, it } from 'vitest';
import { settle } from '../../src/compare/settle';
import type { Request } from '../../src/compare/request';
import { base, refusal } from './ask';
import { tableFrom } from './tableFrom';

const table = tableFrom('g,x,x2\na,1,1\na,2,1\nb,3,4\nb,5,9');
const settled = (request: Partial<Request>): ReturnType<typeof settle> =>
  settle({ ...base, measured: ['x'], label: 'g', ...request }, table);
const code = (request: Partial<Request>): string => refusal(() => settled(request)).code;

describe('defaults', () => {
  it('are the separate-variance t, whether groups differ, at 95%, against 0', () => {
    expect(settled({})).toMatchObject({
      method: 'separate-t',
      measure: 'mean',
      question: 'differs',
      confidence: 0.95,
      against: 0,
      margin: null,
      matters: null,
      rows: 'all',
      relation: { kind: 'rows' },
      numberingRestarts: false,
      test: 'a',
      reference: 'b',
    });
  });

  it('take over how the file was read', () => {
    expect(settled({}).reading).toMatchObject({ delimiter: ',', decimal: '.', header: 1, below: 'refuse' });
  });

  it('tell independence that was stated from rows of which nothing was said', () => {
    expect(settled({ per: 'none' }).relation).toEqual({ kind: 'independent' });
    expect(settled({ pair: 'none' })).toMatchObject({ relation: { kind: 'rows' }, numberingRestarts: true });
  });
});

describe('the words of a variance assumption choose a method', () => {
  it.each([
    [{}, 'separate-t'],
    [{ variance: 'separate', df: 'welch', curve: 't' }, 'separate-t'],
    [{ df: 'smaller' }, 'conservative-t'],
    [{ curve: 'normal' }, 'large-n-z'],
    [{ variance: 'pooled' }, 'pooled-t'],
    [{ variance: 'pooled', curve: 't' }, 'pooled-t'],
    [{ variance: 'known', sigma: [1, 2] }, 'known-sigma-z'],
    [{ method: 'conservative-t', variance: 'separate' }, 'conservative-t'],
    [{ pair: 'x2', variance: 'separate' }, 'paired-t'],
  ] as const)('%j is %s', (request, method) => {
    expect(settled(request).method).toBe(method);
  });

  it('and a rule about n stays an option', () => {
    expect(settled({ curve: 'normal-over-30' })).toMatchObject({
      method: 'separate-t',
      options: { curve: 'normal-over-30' },
    });
  });

  it.each([
    { variance: 'pooled', df: 'smaller' },
    { variance: 'pooled', curve: 'normal' },
    { variance: 'known', curve: 't', sigma: [1, 2] },
    { df: 'smaller', curve: 'normal' },
    { method: 'pooled-t', variance: 'separate' },
    { pair: 'x2', variance: 'pooled' },
    { pair: 'x2', per: ['x2'] },
    { method: 'paired-t' },
    { method: 'newcombe', measure: 'mean' },
    { measure: 'rank' },
    { success: '1', variance: 'pooled' },
  ] as const)('%j is refused', request => {
    expect(code(request)).toBe('method-not-for-this');
  });
});

describe('what is asked wrongly is refused', () => {
  it.each([
    [{ confidence: 95 }, 'confidence-as-percent'],
    [{ confidence: 5 }, 'confidence-as-percent'],
    [{ confidence: 0 }, 'confidence-out-of-range'],
    [{ confidence: 1 }, 'confidence-out-of-range'],
    [{ confidence: -0.5 }, 'confidence-out-of-range'],
    [{ confidence: 100 }, 'confidence-out-of-range'],
    [{ confidence: Number.NaN }, 'confidence-out-of-range'],
    [{ variance: 'known' }, 'sigma-needed'],
    [{ variance: 'known', sigma: [1, 0] }, 'sigma-not-positive'],
    [{ sigma: [-1, 1] }, 'sigma-not-positive'],
    [{ question: 'equivalent' }, 'margin-needed'],
    [{ question: 'equivalent', margin: [1, 2] }, 'margin-invalid'],
    [{ question: 'not-lower', margin: [0, 2] }, 'margin-invalid'],
    [{ question: 'equivalent', margin: [-1, 1], confidence: 0.5 }, 'confidence-out-of-range'],
    [{ matters: 0 }, 'matters-invalid'],
    [{ method: 'median-test' }, 'method-unknown'],
    [{ success: '1', margin: [-10, 10] }, 'share-out-of-range'],
    [{ success: '1', question: 'not-lower', margin: [-1, 1] }, 'share-out-of-range'],
    [{ success: '1', against: -1 }, 'share-out-of-range'],
    [{ success: '1', matters: 5 }, 'share-out-of-range'],
    [{ success: '1', sigma: [1, 1] }, 'method-not-for-this'],
    [{ pair: 'x2', sigma: [1, 1] }, 'method-not-for-this'],
    [
      { method: 'proportion-z', success: '1', question: 'equivalent', margin: [-1, 1] },
      'question-not-for-method',
    ],
    [{ measured: ['y'] }, 'column-unknown'],
    [{ label: 'group' }, 'column-unknown'],
    [{ measured: [] }, 'column-needed'],
    [{ columns: ['x'] }, 'groups-too-few'],
    [{ test: 'a', reference: 'a' }, 'groups-too-few'],
    [{ leaveOut: [{ file: 0, line: 2, reason: '', afterResult: false }] }, 'reason-needed'],
  ] as const)('%j: %s', (request, expected) => {
    expect(code(request as Partial<Request>)).toBe(expected);
  });

  it('a confidence in percent comes with what was meant', () => {
    expect(refusal(() => settled({ confidence: 95 })).facts).toEqual({ confidence: 95, meant: 0.95 });
    expect(refusal(() => settled({ confidence: 99.9 })).facts).toEqual({ confidence: 99.9, meant: 0.999 });
  });

  it('a margin in percentage points comes with the share that was meant', () => {
    expect(refusal(() => settled({ success: '1', margin: [-10, 10] })).facts).toEqual({
      value: 10,
      meant: 0.1,
    });
    expect(refusal(() => settled({ success: '1', matters: 250 })).facts).toEqual({ value: 250 });
  });

  it('pairs and units need values, not summaries', () => {
    const typed = [
      { label: 'a', n: 3, mean: 1, sd: 1 },
      { label: 'b', n: 3, mean: 1, sd: 1 },
    ];
    for (const part of [{ pair: 'x' }, { per: ['x'] }]) {
      expect(refusal(() => settle({ files: [], wish: {}, typed, ...part }, null))).toMatchObject({
        code: 'method-not-for-this',
        facts: { needs: 'values' },
      });
    }
  });

  it('a label column that was not named is asked for, with the columns there are', () => {
    expect(refusal(() => settle({ ...base, measured: ['x'] }, table))).toMatchObject({
      code: 'column-needed',
      facts: { needed: 'label', columns: ['g', 'x', 'x2'] },
    });
  });

  it('a name that fits two columns is refused, a place is not', () => {
    const twice = tableFrom('g,x,x\na,1,1\nb,2,2');
    expect(refusal(() => settle({ ...base, measured: ['x'], label: 'g' }, twice)).code).toBe(
      'column-ambiguous',
    );
    expect(settle({ ...base, measured: ['#3'], label: 'g' }, twice).layout).toMatchObject({
      measured: ['#3'],
    });
  });
});
