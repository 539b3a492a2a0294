import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { answer, type Answered, type AnswerPlatform } from '../../src/compare/answer';
import type { Request } from '../../src/compare/request';
import { Cancelled, Refusal } from '../../src/core/model/problem';
import { bytesSource } from '../../src/readers/byteSource';
import { digits } from '../core/close';
import { sevenToNine } from '../core/fixtures/equalLeadingDigits';
import { fixture } from '../core/fixtures/read';
import { rowOf } from './ask';

const platform: AnswerPlatform = {
  tick: () => undefined,
  createHasher: () => {
    const hash = createHash('sha256');
    return { update: bytes => void hash.update(bytes), hex: () => hash.digest('hex') };
  },
};

function answered(texts: Readonly<Record<string, string>>, request: Partial<Request>): Promise<Answered> {
  const sources = Object.entries(texts).map(([name, text]) =>
    bytesSource(name, new TextEncoder().encode(text)),
  );
  return answer(sources, { files: Object.keys(texts), wish: {}, ...request }, platform);
}

async function refused(texts: Readonly<Record<string, string>>, request: Partial<Request>): Promise<Refusal> {
  const error = await answered(texts, request).then(
    () => null,
    (reason: unknown) => reason,
  );
  if (error instanceof Refusal) return error;
  throw new Error('it was not refused');
}

const EXPORT = `Kiln log;;;;
Operator: RK;;;;

schedule;firing;tile;hardness;note
;;;MPa;
slow;1;a;840,5;
slow;1;b;;cracked
standard;2;a;815,0;
standard;2;b;821,4;
slow;3;a;861,2;saw
slow;3;b;846,0;
standard;4;a;809,9;
Mean;;;832,3;
`;
const exportAsked = { measured: ['hardness'], label: 'schedule' };

describe('from bytes to an answer', () => {
  it('reads an instrument export: preamble, units row, decimal commas, totals row', async () => {
    const { comparison, table, files } = await answered({ 'a.csv': EXPORT }, exportAsked);
    expect(comparison.groups.map(({ label, n, missing }) => [label, n, missing])).toEqual([
      ['slow', 3, 1],
      ['standard', 3, 0],
    ]);
    expect(comparison.unit).toBe('MPa');
    expect(comparison.settings.reading).toMatchObject({ delimiter: ';', decimal: ',', header: 4 });
    expect(
      digits(comparison.chosen.result!.estimate!, (840.5 + 861.2 + 846 - 815 - 821.4 - 809.9) / 3),
    ).toBeGreaterThan(13);
    const bytes = new TextEncoder().encode(EXPORT);
    expect(files).toEqual([
      { path: 'a.csv', bytes: bytes.length, sha256: createHash('sha256').update(bytes).digest('hex') },
    ]);
    expect(table?.rows).toBeGreaterThan(0);
  });

  it('keeps the cells of a left-out row as written', async () => {
    const leaveOut = [{ file: 0, line: 10, reason: 'saw mark', afterResult: true }];
    const { comparison, table } = await answered(
      { 'a.csv': EXPORT },
      { ...exportAsked, per: ['firing', 'tile'], leaveOut },
    );
    expect(comparison.leftOut).toMatchObject([
      {
        line: 10,
        value: '861,2',
        group: 'slow',
        unit: [
          ['firing', '3'],
          ['tile', 'a'],
        ],
        afterResult: true,
      },
    ]);
    expect(table?.cells(comparison.leftOut[0]!.row)).toEqual(['slow', '3', 'a', '861,2', 'saw']);
    expect(rowOf(comparison, 'separate-t', 'all').counted).toBe(true);
  });

  it('compares two files of the same columns', async () => {
    const { comparison, files } = await answered(
      { 'kiln/april.csv': 'x,y\n1,0\n2,0\n4,0\n', 'kiln/may.csv': 'y,x\n0,2\n0,5\n0,9\n' },
      { measured: ['x'] },
    );
    expect(comparison.chosen.result?.estimate).toBe(-3);
    expect(comparison.groups.map(({ label }) => label)).toEqual(['april.csv', 'may.csv']);
    expect(files.map(({ path }) => path)).toEqual(['kiln/april.csv', 'kiln/may.csv']);
  });

  it('needs no file for typed numbers', async () => {
    const typed = [
      { label: 'a', n: 5, mean: 3, sd: 1 },
      { label: 'b', n: 5, mean: 2, sd: 1 },
    ];
    const { comparison, table, files } = await answered({}, { typed });
    expect([table, files]).toEqual([null, []]);
    expect(comparison.chosen.result?.estimate).toBe(1);
  });

  it('names line and column of text among numbers and of an unknown column', async () => {
    const text = await refused({ 'a.csv': 'g,x\na,1\na,2\nb,soft\nb,3\n' }, { measured: ['x'], label: 'g' });
    expect(text).toMatchObject({ code: 'text-in-measured', where: { file: 0, line: 4, field: 1 } });
    const unknown = await refused({ 'a.csv': 'g,x\na,1\nb,2\n' }, { measured: ['y'], label: 'g' });
    expect(unknown).toMatchObject({ code: 'column-unknown', facts: { name: 'y', columns: ['g', 'x'] } });
  });

  it('stops when the person gives up', async () => {
    const tick = (): never => {
      throw new Cancelled();
    };
    const source = bytesSource('a.csv', new TextEncoder().encode('g,x\na,1\na,2\nb,3\nb,5\n'));
    const asked: Request = { files: ['a.csv'], wish: {}, measured: ['x'], label: 'g' };
    await expect(answer([source], asked, { ...platform, tick })).rejects.toBeInstanceOf(Cancelled);
  });
});

describe('reference sets, from their text', () => {
  // source: NIST Statistical Reference Datasets, Analysis of Variance, SmLs07 to SmLs09: see core/methods/nist.test.ts
  it.each(sevenToNine())(
    'two treatments of $name give difference, SD and t to 14 digits',
    async ({ treatments }) => {
      const lines = treatments.flatMap(({ values }, index) => values.map(value => `${index + 1},${value}`));
      const text = `treatment,response\n${lines.join('\n')}\n`;
      for (const [test, reference] of [
        ['1', '2'],
        ['3', '4'],
      ] as const) {
        const { comparison } = await answered(
          { 'set.csv': text },
          { measured: ['response'], label: 'treatment', test, reference },
        );
        const n = comparison.groups[0]!.n;
        const truth = test === '1' ? 0.1 : 0.2;
        const { estimate, statistic } = comparison.chosen.result!;
        expect(digits(estimate!, truth)).toBeGreaterThanOrEqual(14);
        expect(digits(statistic!, truth / (0.1 * Math.sqrt(2 / n)))).toBeGreaterThanOrEqual(14);
        for (const { sd } of comparison.groups) expect(digits(sd, 0.1)).toBeGreaterThanOrEqual(14);
      }
    },
  );

  // source: NIST Statistical Reference Datasets, Analysis of Variance, AtmWtAg
  it('AtmWtAg gives its certified F as the square of the pooled t', async () => {
    const silver = fixture<{
      first: string[];
      second: string[];
      certified: { F: number; residualSd: number };
    }>('silver.json');
    const lines = [...silver.first.map(value => `1;${value}`), ...silver.second.map(value => `2;${value}`)];
    const { comparison } = await answered(
      { 'AtmWtAg.csv': `instrument;weight\n${lines.join('\n')}` },
      { measured: ['weight'], label: 'instrument', variance: 'pooled' },
    );
    const { statistic, se } = comparison.chosen.result!;
    expect(digits(statistic! ** 2, silver.certified.F)).toBeGreaterThanOrEqual(14);
    expect(digits(se! / Math.sqrt(2 / 24), silver.certified.residualSd)).toBeGreaterThanOrEqual(14);
  });
});
