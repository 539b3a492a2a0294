import { describe, expect, it } from 'vitest';
import type { Group, Sample } from '../../../src/core/model/groups';
import { alignFrames } from '../../../src/core/numeric/numbers';
import { meanDifference } from '../../../src/core/numeric/meanDifference';
import { makeSample } from '../../../src/core/numeric/sample';
import { numbersOf } from './arbitraries';

const groupOf = (sample: Sample | null, mean: number): Group => ({
  label: '',
  n: sample?.n ?? 3,
  mean,
  sd: 1,
  sample,
  readings: 3,
  missing: 0,
  leftOut: 0,
  units: null,
  readingSample: null,
  unitOf: null,
});

const samplesOf = (...lists: readonly string[][]): Sample[] =>
  alignFrames(lists.map(numbersOf)).map(numbers => makeSample(numbers, new Int32Array(9)));

describe('the difference of two means', () => {
  it('is exact where doubles have rounded the values already', () => {
    const [a, b] = samplesOf(['1000000000000.4', '1000000000000.3'], ['1000000000000.3', '1000000000000.2']);
    expect(meanDifference(groupOf(a!, 0), groupOf(b!, 0))).toBe(0.1);
  });

  it('is exact for values that need more than 53 bits', () => {
    const [a, b] = samplesOf(
      ['1e20', '100000000000000000000.0000003'],
      ['1e20', '100000000000000000000.0000001'],
    );
    expect(a!.numbers.form).toBe('steps');
    expect(meanDifference(groupOf(a!, 0), groupOf(b!, 0))).toBe(1e-7);
    const [c, d] = samplesOf(['1e20', '0.5'], ['1e20', '0.25']);
    expect(c!.numbers.form).toBe('wide');
    expect(meanDifference(groupOf(c!, 0), groupOf(d!, 0))).toBeCloseTo(0.125, 16);
  });

  it('of summaries is that of the means stated', () => {
    expect(meanDifference(groupOf(null, 5.5), groupOf(null, 5))).toBe(0.5);
  });

  it('of samples that share no frame goes through their means', () => {
    const [a] = samplesOf(['1.5', '2.5']);
    const [b] = samplesOf(['1', '2']);
    expect(meanDifference(groupOf(a!, 0), groupOf(b!, 0))).toBe(0.5);
  });
});
