import { describe, expect, it } from 'vitest';
import { folderWith, weighbeam, type Said } from './terminal';

const good =
  'site,mass,volume\nNorth,1.2,3\nNorth,1.4,4\nNorth,1.3,5\nSouth,2.1,6\nSouth,2.4,7\nSouth,2.2,8\n';
const asked = ['data.csv', '--of', 'mass', '--by', 'site', '--per', 'none'];
const wide = ['data.csv', '--columns', 'mass,volume', '--per', 'none'];
const several = ['data.csv', 'more.csv', '--of', 'mass', '--per', 'none'];

async function compare(...argv: readonly string[]): Promise<Said> {
  await using temp = await folderWith({ 'data.csv': good, 'more.csv': good.replace('1.2', '1.5') });
  const said = await weighbeam(temp.folder, 'compare', ...argv);
  if (said.code !== 0) expect([said.out, said.err]).toEqual(['', expect.stringMatching(/^[a-z-]+: .+\n$/)]);
  return said;
}

describe('flags that contradict each other', () => {
  const cases: readonly (readonly [argv: readonly string[], one: string, other: string])[] = [
    [[...wide, '--of', 'mass'], '--columns', '--of'],
    [[...wide, '--by', 'site'], '--columns', '--by'],
    [[...asked, '--summary'], '--summary', '--of'],
    [['data.csv', '--columns', 'mass,volume', '--summary'], '--summary', '--columns'],
    [[...several, '--by', 'site'], 'several files', '--by'],
    [[...wide, 'more.csv'], 'several files', '--columns'],
    [[...wide, '--same', 'mass -> volume'], '--columns', '--same'],
    [[...several, '--same', 'North -> South'], 'several files', '--same'],
    [[...asked, '--per', 'site'], '--per none', '--per site'],
    [['data.csv', '--columns', 'mass,mass', '--per', 'none'], '--columns', 'mass twice'],
    [['data.csv', './data.csv', '--of', 'mass', '--per', 'none'], 'data.csv', './data.csv'],
    [[...asked, '--leave-out', '4:cracked', '--leave-out', '4:lost'], '4:cracked', '4:lost'],
    [[...asked, '--leave-out', '4:cracked', '--leave-out', '4:cracked'], '4:cracked', 'twice'],
    [[...several, '--leave-out', 'more.csv:4:a', '--leave-out', 'more.csv:4:b'], 'more.csv:4:a', ':4:b'],
    [[...asked, '--same', 'North -> South', '--same', 'North -> West'], 'North -> South', 'North -> West'],
    [[...asked, '--reason', 'method=a', '--reason', 'method=b'], 'method=a', 'method=b'],
    [[...asked, '--only-chosen', '--only-chosen'], '--only-chosen', 'twice'],
    [[...asked, '--test', 'North', '--test', 'South'], 'North', 'South'],
    [[...asked, '--only-chosen', '--sigma', '1,2'], '--sigma', '--only-chosen'],
  ];
  it.each(cases)('%j are refused with the names of both', async (argv, one, other) => {
    const { code, err } = await compare(...argv);
    expect([code, err]).toEqual([2, expect.stringContaining(one)]);
    expect(err).toContain(other);
  });

  it('are not seen where none is', async () => {
    for (const argv of [
      asked,
      wide,
      several,
      [...asked, '--leave-out', '4:cracked', '--leave-out', '5:lost'],
      [...several, '--leave-out', 'data.csv:4:a', '--leave-out', 'more.csv:4:a'],
      [...asked, '--sigma', '1,2'],
      [...asked, '--only-chosen', '--variance', 'known', '--sigma', '1,2'],
      [...asked, '--where', 'site=North', '--where', 'site=South'],
    ]) {
      const { code, err } = await compare(...argv);
      expect([code, err]).toEqual([0, '']);
    }
  });

  it('show known standard deviations in a row of their own where another variance is asked for', async () => {
    expect((await compare(...asked, '--sigma', '1,2')).out).toMatch(/^ +known SDs /m);
  });
});

describe('a label declared the same', () => {
  it('is refused when the file does not hold it, with the labels there are', async () => {
    const { code, err } = await compare(...asked, '--same', 'Nord -> North');
    expect(code).toBe(3);
    expect(err).toMatch(/^label-unknown: Nord does not occur in column site.*North.*South/);
  });

  it('may be one that another merge makes, and may be carried by a recipe to a file without it', async () => {
    await using temp = await folderWith({ 'data.csv': good.replace('North', 'north'), 'clean.csv': good });
    const merges = ['--same', 'north -> N', '--same', 'N -> North'];
    const words = ['compare', ...asked, ...merges, '--format', 'block'];
    const first = await weighbeam(temp.folder, ...words);
    expect([first.code, first.err]).toEqual([0, '']);
    await temp.write('note.md', first.out);
    const next = await weighbeam(temp.folder, 'compare', 'clean.csv', '--like', 'note.md');
    expect([next.code, next.err]).toEqual([0, '']);
  });
});
