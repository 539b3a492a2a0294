import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { gather } from '../../src/core/numeric/numbers';
import { lag1 } from '../../src/core/numeric/lag1';
import { meanDifference } from '../../src/core/numeric/meanDifference';
import { makeSample } from '../../src/core/numeric/sample';
import type { Sample } from '../../src/core/model/groups';
import { readTable } from '../../src/readers/readTable';
import { scout } from '../../src/readers/scout';
import { readNumbers, source } from './read';

// Source of every value: NIST Statistical Reference Datasets (StRD), Univariate Summary Statistics and Analysis of
// Variance, certified values. What is read is text; the patterned sets are written by a few lines here.
const folder = new URL('fixtures/nist/', import.meta.url);
interface OneColumn {
  n: number;
  mean: string;
  sd: string;
  lag1: string;
}
interface OneWay {
  df: [number, number];
  f: string;
  between: string;
  within: string;
  rSquared: string;
  residualSd: string;
}
const certified = JSON.parse(readFileSync(new URL('certified.json', folder), 'utf8')) as {
  oneColumn: Record<string, OneColumn>;
  oneWay: Record<string, OneWay>;
};

/** −log10 of the relative error, at most 15. */
const digits = (value: number, truth: number): number =>
  value === truth ? 15 : Math.min(15, -Math.log10(Math.abs(value - truth) / Math.abs(truth)));

const stored = (name: string): string => readFileSync(new URL(`${name}.csv`, folder), 'utf8');

/** centre, centre − 0.1, centre + 0.1, centre − 0.1, … */
const alternating = (whole: string, tenth: number, count: number): string[] =>
  Array.from({ length: count }, (_, i) => `${whole}.${tenth + (i === 0 ? 0 : i % 2 === 1 ? -1 : 1)}`);

const generatedColumns: Record<string, string> = {
  numAcc2: ['reading', ...alternating('1', 2, 1001), ''].join('\n'),
  numAcc3: ['reading', ...alternating('1000000', 2, 1001), ''].join('\n'),
  numAcc4: ['reading', ...alternating('10000000', 2, 1001), ''].join('\n'),
};

/** Nine treatments around x.4, x.3, x.5, x.3, x.5, … */
const nineTreatments = (whole: string, replicates: number): string => {
  const rows = [4, 3, 5, 3, 5, 3, 5, 3, 5].flatMap((tenth, treatment) =>
    alternating(whole, tenth, replicates).map(reading => `${treatment + 1},${reading}`),
  );
  return ['treatment,reading', ...rows, ''].join('\n');
};

const generatedTables: Record<string, string> = {
  smLs01: nineTreatments('1', 21),
  smLs02: nineTreatments('1', 201),
  smLs03: nineTreatments('1', 2001),
  smLs04: nineTreatments('1000000', 21),
  smLs05: nineTreatments('1000000', 201),
  smLs06: nineTreatments('1000000', 2001),
  smLs07: nineTreatments('1000000000000', 21),
  smLs08: nineTreatments('1000000000000', 201),
  smLs09: nineTreatments('1000000000000', 2001),
};

async function groupsOf(text: string): Promise<Sample[]> {
  const file = source(text);
  const head = await scout(file, {});
  const table = await readTable([file], [head], { numbers: [1], labels: [0] });
  const { codes, levels } = table.labels(0);
  return levels.slice(1).map((_, level) => {
    const rows = Int32Array.from([...codes.keys()].filter(row => codes[row] === level + 1));
    return makeSample(gather(table.numbers(1).numbers, rows), rows);
  });
}

describe('NIST StRD, one column', () => {
  it.each(Object.entries(certified.oneColumn))(
    '%s keeps 14 digits and more of mean, SD and lag 1',
    async (name, truth) => {
      const { numbers } = await readNumbers(source(generatedColumns[name] ?? stored(name)), 'reading');
      const sample = makeSample(numbers, new Int32Array(truth.n));
      const { mean, ss } = sample.moments();
      expect(sample.n).toBe(truth.n);
      expect(digits(mean, Number(truth.mean))).toBeGreaterThanOrEqual(14.7);
      expect(digits(Math.sqrt(ss / (truth.n - 1)), Number(truth.sd))).toBeGreaterThanOrEqual(14.7);
      expect(digits(lag1(sample), Number(truth.lag1))).toBeGreaterThanOrEqual(14.7);
    },
  );
});

describe('NIST StRD, one-way analysis of variance', () => {
  it.each(Object.entries(certified.oneWay))(
    '%s keeps 14 digits and more of every certified value',
    async (name, truth) => {
      const groups = await groupsOf(generatedTables[name] ?? stored(name));
      const n = groups.reduce((sum, group) => sum + group.n, 0);
      const [first] = groups;
      const offsets = groups.map(group => meanFrom(first!, group));
      const grand = groups.reduce((sum, group, i) => sum + group.n * offsets[i]!, 0) / n;
      const between = groups.reduce((sum, group, i) => sum + group.n * (offsets[i]! - grand) ** 2, 0);
      const within = groups.reduce((sum, group) => sum + group.moments().ss, 0);
      const [df1, df2] = [groups.length - 1, n - groups.length];
      expect([df1, df2]).toEqual(truth.df);
      expect(digits(between, Number(truth.between))).toBeGreaterThanOrEqual(14);
      expect(digits(within, Number(truth.within))).toBeGreaterThanOrEqual(14);
      expect(digits(between / df1 / (within / df2), Number(truth.f))).toBeGreaterThanOrEqual(14);
      expect(digits(between / (between + within), Number(truth.rSquared))).toBeGreaterThanOrEqual(14);
      expect(digits(Math.sqrt(within / df2), Number(truth.residualSd))).toBeGreaterThanOrEqual(14);
    },
  );
});

/** Mean of a group less the mean of the first. */
function meanFrom(first: Sample, group: Sample): number {
  const asGroup = (sample: Sample) => ({
    label: '',
    n: sample.n,
    mean: 0,
    sd: 0,
    sample,
    readings: sample.n,
    missing: 0,
    leftOut: 0,
    units: null,
    readingSample: null,
    unitOf: null,
  });
  return meanDifference(asGroup(group), asGroup(first));
}
