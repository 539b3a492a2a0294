import { describe, expect, it } from 'vitest';
import { demo, folderWith, weighbeam } from './terminal';

async function inspect(text: string | Uint8Array, ...argv: readonly string[]) {
  await using temp = await folderWith({ 'data.csv': text });
  return await weighbeam(temp.folder, 'inspect', 'data.csv', ...argv); // the folder is there until it is read
}

interface InspectionJson {
  readonly format: string;
  readonly rows: number;
  readonly reading: Record<string, unknown>;
  readonly columns: readonly { readonly name: string; readonly kind: string }[];
  readonly findings: readonly {
    readonly id: string;
    readonly level: string;
    readonly sentence: string;
    readonly lines: readonly number[];
  }[];
}
const json = async (text: string | Uint8Array, ...argv: readonly string[]) =>
  JSON.parse((await inspect(text, ...argv, '--format', 'json')).out) as InspectionJson;

describe('inspect', () => {
  it('says how an instrument export was read, what its columns hold, and what needs a look', async () => {
    const { code, out, err } = await weighbeam(demo, 'inspect', 'firings-april.csv');
    expect([code, err]).toEqual([0, '']);
    for (const words of [
      '72, lines 5 to 76',
      'separated by semicolon, decimal comma',
      'line 3, units on line 4',
      'before the header: “Hardness bench 2;glaze trial K4”',
      'hardness, MPa',
      '731 to 871',
      'Line 77 reads "Mean"',
      '“<0,02” (6)',
      '“Slow cool” (2)',
    ]) {
      expect(out).toContain(words);
    }
    for (const line of out.split('\n')) expect(line.length).toBeLessThanOrEqual(80);
  });

  it('has nothing to say of a plain file', async () => {
    const { out } = await inspect('site,mass\nN,1.2\nN,1.3\nS,2.1\nS,2.2\n');
    expect(out).toContain('Nothing needs a look.');
  });

  it('names text among numbers, uneven rows and blank lines with their lines', async () => {
    const { findings } = await json('site,mass,note\nN,1.2,a\nN,about 1,b\n\nS,2.1\nS,2.2,c,d\nS,2.3,e\n');
    expect(findings.map(({ id, lines }) => [id, lines])).toEqual([
      ['text-in-measured', []],
      ['ragged-rows', [6]],
      ['ragged-rows', [5]],
      ['blank-line', [4]],
    ]);
    expect(findings[0]?.sentence).toContain('“about 1” (1)');
  });

  it('says when bytes were not UTF-8', async () => {
    const latin = Buffer.from('site,mass\nKöln,1\nB,2\nB,3\n', 'latin1');
    const { reading, findings } = await json(latin);
    expect(reading['encoding']).toBe('windows-1252');
    expect(findings.map(({ id }) => id)).toContain('read-otherwise');
    expect(findings[0]?.sentence).toContain('read as windows-1252');
  });

  it('reads as it is told', async () => {
    const text = 'site;mass\nN;1,250\nN;1,375\nS;2,125\n';
    expect((await inspect(text)).code).toBe(3);
    expect((await json(text, '--decimal', 'comma')).reading['decimal']).toBe(',');
    expect((await json(text, '--delimiter', 'semicolon', '--decimal', ',')).rows).toBe(3);
    const words = await json('site,mass\nN,1.2\nN,gone\nS,2.2\n', '--missing', 'gone');
    expect(words.columns[1]?.kind).toBe('number');
  });

  it('takes one file that is there', async () => {
    expect((await weighbeam(demo, 'inspect')).code).toBe(2);
    expect((await weighbeam(demo, 'inspect', 'no.csv')).code).toBe(3);
  });
});
