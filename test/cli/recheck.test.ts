import { symlink } from 'node:fs/promises';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { folderWith, mainCase, weighbeam, type Said } from './terminal';

const rows = [
  ...[12.1, 12.4, 11.9, 12.6, 12.2, 12.5].map(value => ['new', value] as const),
  ...[11.2, 11.6, 11.1, 11.5, 11.0, 11.4].map(value => ['old', value] as const),
];
const csv = (values: readonly (readonly [string, number])[] = rows): string =>
  ['kiln,hardness,room', ...values.map(([kiln, value]) => `${kiln},${value},20`)].join('\n') + '\n';
const asked = ['data.csv', '--of', 'hardness', '--by', 'kiln', '--per', 'none'];

async function notebookWith(...argv: readonly string[]) {
  const temp = await folderWith({ 'data.csv': csv() });
  const { code, out, err } = await weighbeam(
    temp.folder,
    'compare',
    ...asked,
    ...argv,
    '--format',
    'markdown',
  );
  expect([code, err]).toEqual([0, '']);
  await temp.write('note.md', `# Kiln\n\n${out}`);
  return { ...temp, text: `# Kiln\n\n${out}` };
}

const recheck = (folder: string, ...argv: readonly string[]): Promise<Said> =>
  weighbeam(folder, 'recheck', 'note.md', ...argv);
const outcomeOf = ({ out }: Said): string => /^note\.md:\d+: (\w+): .+\n$/.exec(out)?.[1] ?? out;

describe('a block rechecked', () => {
  it('on an unchanged file is the same', async () => {
    await using note = await notebookWith();
    const said = await recheck(note.folder);
    expect([said.code, outcomeOf(said)]).toEqual([0, 'same']);
  });

  it('is the same when a column that was not used has changed', async () => {
    await using note = await notebookWith();
    await note.write('data.csv', csv().replace('12.1,20', '12.1,21'));
    const said = await recheck(note.folder);
    expect([said.code, outcomeOf(said)]).toEqual([0, 'same']);
  });

  it('is the same when a line was put in above the data', async () => {
    await using note = await notebookWith();
    await note.write('data.csv', `exported from bench 2\n${csv()}`);
    const said = await recheck(note.folder);
    expect([said.code, outcomeOf(said)]).toEqual([0, 'same']);
  });

  it('has moved when a used cell changed and the conclusion holds', async () => {
    await using note = await notebookWith();
    await note.write('data.csv', csv().replace('12.1', '12.2'));
    const said = await recheck(note.folder);
    expect([said.code, outcomeOf(said)]).toEqual([1, 'moved']);
    expect(said.out).toMatch(/difference/);
    expect((await recheck(note.folder, '--allow', 'moved')).code).toBe(0);
  });

  it('has turned when the conclusion changed with the data', async () => {
    await using note = await notebookWith();
    await note.write(
      'data.csv',
      csv(rows.map(([kiln, value]) => [kiln, kiln === 'new' ? value - 1 : value])),
    );
    const said = await recheck(note.folder, '--allow', 'moved');
    expect([said.code, outcomeOf(said)]).toEqual([1, 'turned']);
  });

  it('is altered when a digit of its result was edited, and names the line', async () => {
    await using note = await notebookWith();
    const line = note.text.split('\n').findIndex(text => text.startsWith('difference = ')) + 1;
    await note.write(
      'note.md',
      note.text.replace(
        /^difference = (\d+\.\d*)/m,
        (_, digits: string) => `difference = ${Number(digits) + 0.1}`,
      ),
    );
    const said = await recheck(note.folder);
    expect([said.code, outcomeOf(said)]).toEqual([1, 'altered']);
    expect(said.out).toContain(`note.md:${line}:`);
  });

  it('is blocked when a row that was left out is gone', async () => {
    await using note = await notebookWith('--leave-out', '4:cracked');
    expect((await recheck(note.folder)).code).toBe(0);
    await note.write('data.csv', csv(rows.filter(([, value]) => value !== 11.9)));
    const said = await recheck(note.folder);
    expect([said.code, outcomeOf(said)]).toEqual([1, 'blocked']);
  });

  it('finds a row that was left out on another line', async () => {
    await using note = await notebookWith('--leave-out', '4:cracked');
    await note.write('data.csv', `a line above\n${csv()}`);
    expect(outcomeOf(await recheck(note.folder))).toBe('same');
  });

  it('is blocked when the file is gone', async () => {
    await using note = await notebookWith();
    await note.write('note.md', note.text.replace('file = "data.csv"', 'file = "gone.csv"'));
    const said = await recheck(note.folder);
    expect([said.code, outcomeOf(said)]).toEqual([1, 'blocked']);
    expect(said.out).toContain('gone.csv');
  });

  it.each(['../data.csv', '/etc/hostname', 'link.csv'])(
    'is blocked when it names %s, outside the root',
    async name => {
      await using note = await notebookWith();
      await using outside = await folderWith({ 'data.csv': csv() });
      await symlink(path.join(outside.folder, 'data.csv'), path.join(note.folder, 'link.csv'));
      await note.write('note.md', note.text.replace('file = "data.csv"', `file = "${name}"`));
      const said = await recheck(note.folder);
      expect([said.code, outcomeOf(said)]).toEqual([1, 'blocked']);
      expect(said.out).toContain(name);
    },
  );

  it('is planned while it has no result', async () => {
    await using note = await notebookWith();
    const plan = note.text.replace(/^\[result\][\s\S]*?(?=^\[by\])/m, '').replace(/^cells = .*\n/m, '');
    await note.write('note.md', plan);
    const said = await recheck(note.folder);
    expect([said.code, outcomeOf(said)]).toEqual([0, 'planned']);
  });

  it('is blocked, not planned, when only its result was deleted', async () => {
    await using note = await notebookWith();
    await note.write('note.md', note.text.replace(/^\[result\][\s\S]*?(?=^\[record\])/m, ''));
    const said = await recheck(note.folder);
    expect([said.code, outcomeOf(said)]).toEqual([1, 'blocked']);
    expect(said.out).toContain('[result]');
  });

  it.each([
    ['a row that was left out is gone', csv(rows.filter(([, value]) => value !== 11.9))],
    ['a label is gone', csv().replaceAll('old', 'older')],
    ['a column is gone', csv().replace('hardness', 'strength')],
    ['it holds text', csv().replace('12.4', 'about 12')],
    ['it is empty', ''],
  ])('that is blocked because of the data names the file: %s', async (_, text) => {
    await using note = await notebookWith('--leave-out', '4:cracked', '--test', 'new', '--reference', 'old');
    await note.write('data.csv', text);
    const said = await recheck(note.folder);
    expect([said.code, outcomeOf(said)]).toEqual([1, 'blocked']);
    expect(said.out).toMatch(/\(data\.csv[^)]*\)/);
  });

  it('that is blocked because of itself names no file', async () => {
    await using note = await notebookWith();
    await note.write('note.md', note.text.replace('against = 0', 'against = "zero"'));
    expect((await recheck(note.folder)).out).not.toContain('data.csv');
  });

  it('is planned also when its file is not there yet and nothing of it is known', async () => {
    await using note = await notebookWith();
    const known = /^(?:bytes|sha256|cells|encoding|delimiter|decimal|header) = .*\n/gm;
    const plan = note.text.replace(/^\[result\][\s\S]*?(?=^\[by\])/m, '').replace(known, '');
    await note.write('note.md', plan.replace('file = "data.csv"', 'file = "june.csv"'));
    expect(outcomeOf(await recheck(note.folder))).toBe('planned');
    await note.write('note.md', note.text.replace(known, ''));
    expect(outcomeOf(await recheck(note.folder))).toBe('blocked');
  });

  it('is blocked, not passed over, when it cannot be read', async () => {
    await using note = await notebookWith();
    await note.write('note.md', note.text.replace('question = "differs"', 'question = differs'));
    const said = await recheck(note.folder);
    expect([said.code, outcomeOf(said)]).toEqual([1, 'blocked']);
  });
});

describe('recheck', () => {
  it('looks through folders and patterns, one line a block', async () => {
    await using note = await notebookWith();
    await note.write('other.md', note.text);
    for (const words of [['.'], ['*.md'], ['note.md', 'other.md']]) {
      const { code, out } = await weighbeam(note.folder, 'recheck', ...words);
      expect([code, out.trim().split('\n').length]).toEqual([0, 2]);
    }
  });

  it('takes the root from --root', async () => {
    await using note = await notebookWith();
    const { code } = await weighbeam(
      '/',
      'recheck',
      path.join(note.folder, 'note.md'),
      '--root',
      note.folder,
    );
    expect(code).toBe(0);
  });

  it('gives the outcomes as JSON', async () => {
    await using note = await notebookWith();
    const { out } = await recheck(note.folder, '--format', 'json');
    const { format, blocks } = JSON.parse(out) as { format: string; blocks: Record<string, unknown>[] };
    expect([format, blocks[0]?.['path'], blocks[0]?.['outcome']]).toEqual([
      'weighbeam recheck 1',
      'note.md',
      'same',
    ]);
  });

  it('that finds nothing to recheck is a usage error, never silence', async () => {
    await using temp = await folderWith({ 'note.md': '# nothing here\n' });
    for (const words of [[], ['note.md'], ['no.md'], ['note.md', '--allow', 'mooved']]) {
      const { code, err } = await weighbeam(temp.folder, 'recheck', ...words);
      expect([code, err]).toEqual([2, expect.stringMatching(/^usage: /)]);
    }
  });
});

describe('the recipe of a block', () => {
  it('gives the same numbers on the same file', async () => {
    await using temp = await folderWith('demo');
    const first = await weighbeam(temp.folder, 'compare', ...mainCase, '--format', 'block');
    await temp.write('note.md', first.out);
    const again = await weighbeam(
      temp.folder,
      'compare',
      'firings-april.csv',
      '--like',
      'note.md',
      '--format',
      'block',
    );
    expect(again).toEqual(first);
  });

  it('compares the next file in the same way, without rows that were left out of the first', async () => {
    await using temp = await folderWith('demo');
    await temp.write(
      'note.md',
      (await weighbeam(temp.folder, 'compare', ...mainCase, '--format', 'block')).out,
    );
    const { code, out } = await weighbeam(
      temp.folder,
      'compare',
      'firings-may.csv',
      '--like',
      'note.md',
      '--format',
      'json',
    );
    const { settings, groups } = JSON.parse(out) as {
      settings: { leftOut: unknown[]; matters: number };
      groups: { n: number; readings: number }[];
    };
    expect([code, settings.leftOut, settings.matters]).toEqual([0, [], 15]);
    expect(groups.map(({ n, readings }) => [n, readings])).toEqual([
      [12, 36],
      [12, 36],
    ]);
  });

  it('yields to what the command line says', async () => {
    await using temp = await folderWith('demo');
    await temp.write(
      'note.md',
      (await weighbeam(temp.folder, 'compare', ...mainCase, '--format', 'block')).out,
    );
    const argv = [
      'compare',
      'firings-april.csv',
      '--like',
      'note.md:3',
      '--variance',
      'pooled',
      '--format',
      'json',
    ];
    const { chosen } = JSON.parse((await weighbeam(temp.folder, ...argv)).out) as { chosen: { id: string } };
    expect(chosen.id).toBe('pooled-t');
  });

  it.each([
    ['a curve', ['--pair', 'none', '--curve', 'normal-over-30'], ['--curve', 't'], 'separate-t'],
    ['pairs', ['--pair', 'none'], ['--pair', 'day'], 'paired-t'],
  ])('yields in %s that the recipe had said otherwise', async (_, before, after, method) => {
    const values = Array.from(
      { length: 31 },
      (__, day) => `a,${day},${5 + (day % 7)}\nb,${day},${6 + (day % 5)}\n`,
    );
    await using temp = await folderWith({ 'data.csv': `kiln,day,x\n${values.join('')}` });
    const words = ['--of', 'x', '--by', 'kiln', '--test', 'a', '--reference', 'b', '--per', 'none'];
    const first = await weighbeam(
      temp.folder,
      'compare',
      'data.csv',
      ...words,
      ...before,
      '--format',
      'block',
    );
    expect(first.code).toBe(0);
    await temp.write('note.md', first.out);
    const argv = ['compare', 'data.csv', '--like', 'note.md', ...after, '--format', 'json'];
    const { chosen } = JSON.parse((await weighbeam(temp.folder, ...argv)).out) as { chosen: { id: string } };
    expect(chosen.id).toBe(method);
  });

  it('of a notebook with several needs the line', async () => {
    await using temp = await folderWith('demo');
    const { out } = await weighbeam(temp.folder, 'compare', ...mainCase, '--format', 'block');
    await temp.write('note.md', `${out}\n${out}`);
    const { code, err } = await weighbeam(temp.folder, 'compare', 'firings-may.csv', '--like', 'note.md');
    expect([code, err]).toEqual([2, expect.stringContaining('--like note.md:1')]);
  });
});
