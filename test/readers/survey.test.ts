import { describe, expect, it } from 'vitest';
import { Cancelled } from '../../src/core/model/problem';
import { survey } from '../../src/readers/survey';
import { source } from './read';

describe('a survey', () => {
  it('says what each column holds', async () => {
    const text = [
      'Bench 2',
      'tile,glaze,mass (mg),leach,note',
      'T1,slow,10.5,<0.02,',
      'T2,fast,NA,0.05,',
      'T3,slow,12,broken,',
      'T4,fast,9.5,0.03,',
      '',
    ].join('\n');
    const { columns, rows, firstLine, lastLine, reading } = await survey(source(text), {});
    expect([rows, firstLine, lastLine, reading.headerLine]).toEqual([4, 3, 6, 2]);
    expect(
      columns.map(({ name, kind, values, missing, texts }) => [name, kind, values, missing, texts]),
    ).toEqual([
      ['tile', 'label', 0, 0, 4],
      ['glaze', 'label', 0, 0, 4],
      ['mass (mg)', 'number', 3, 1, 0],
      ['leach', 'mixed', 3, 0, 1],
      ['note', 'empty', 0, 4, 0],
    ]);
    expect(columns[2]).toMatchObject({ unit: 'mg', min: 9.5, max: 12, field: 2, distinct: 3 });
    expect(columns[4]).toMatchObject({ min: null, max: null, distinct: 0, labels: [] });
    expect(columns[1]).toMatchObject({
      distinct: 2,
      nearlyUnique: false,
      labels: [
        { label: 'slow', count: 2 },
        { label: 'fast', count: 2 },
      ],
    });
    expect(columns[0]!.nearlyUnique).toBe(true);
  });

  it('stops counting different cells at 1000 and names the first 50', async () => {
    const rows = Array.from({ length: 5000 }, (_, i) => `n${i},${i % 60}`);
    const { columns } = await survey(source(['id,code', ...rows, ''].join('\n')), {});
    expect([columns[0]!.distinct, columns[0]!.nearlyUnique, columns[0]!.labels.length]).toEqual([
      1000,
      true,
      50,
    ]);
    expect([columns[1]!.distinct, columns[1]!.nearlyUnique, columns[1]!.labels.length]).toEqual([
      60,
      false,
      50,
    ]);
    expect(columns[1]!.labels[3]).toEqual({ label: '3', count: 84 });
    expect(columns[0]!.texts).toBe(5000);
  });

  it('counts numbers that stand for a missing value as missing', async () => {
    const { columns } = await survey(source('a,b\n1,-99\n2,-99.0\n3,4\n'), { missing: ['-99'] });
    expect(columns[1]).toMatchObject({ values: 1, missing: 2, min: 4, distinct: 1 });
  });

  it('falls back to windows-1252 like reading does', async () => {
    const bytes = new TextEncoder().encode(`site,mass\n${'plain,1\n'.repeat(40_000)}K?ln,2\n`);
    bytes[bytes.lastIndexOf('?'.charCodeAt(0))] = 0xf6;
    const { columns, reading } = await survey(source(bytes), {});
    expect(reading.encoding).toBe('windows-1252');
    expect(columns[0]!.labels).toEqual([
      { label: 'plain', count: 40_000 },
      { label: 'Köln', count: 1 },
    ]);
  });

  it('can be given up', async () => {
    const stop = () => {
      throw new Cancelled();
    };
    await expect(survey(source('a,b\n1,2\n'), {}, stop)).rejects.toThrow(Cancelled);
  });
});
