import { mkdir, mkdtemp, realpath, rm, symlink, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { findNotebooks, patternOf } from '../../src/cli/notebooks';
import { findNamed, nameFiles, rootOf } from '../../src/cli/paths';
import { Refusal } from '../../src/core/model/problem';

let folder = '';
beforeAll(async () => {
  folder = await realpath(await mkdtemp(path.join(tmpdir(), 'weighbeam-paths-')));
  for (const inside of ['work/notes/old', 'work/data', 'work/.hidden', 'work/node_modules/x', 'elsewhere']) {
    await mkdir(path.join(folder, inside), { recursive: true });
  }
  const files = [
    'work/notes/a.md',
    'work/notes/old/b.txt',
    'work/notes/c.csv',
    'work/.hidden/d.md',
    'work/node_modules/x/e.md',
  ];
  for (const file of [...files, 'work/data/f.csv', 'elsewhere/g.csv', 'work/notes/f.csv']) {
    await writeFile(path.join(folder, file), 'a,b\n1,2\n');
  }
  await symlink(path.join(folder, 'elsewhere/g.csv'), path.join(folder, 'work/data/link.csv'));
});
afterAll(() => rm(folder, { recursive: true }));

const at = (...parts: string[]) => path.join(folder, ...parts);
const codeOf = async (promise: Promise<unknown>) =>
  promise.then(
    () => 'accepted',
    (error: unknown) => (error instanceof Refusal ? error.code : String(error)),
  );

describe('notebooks', () => {
  const found = async (...words: string[]) =>
    (await findNotebooks(words, at('work'))).map(file => path.relative(at('work'), file));

  it('of a folder are those with the usual endings, but not in hidden folders or packages', async () => {
    expect(await found('.')).toEqual(['notes/a.md', 'notes/old/b.txt']);
  });

  it('are found by patterns, each once', async () => {
    expect(await found('notes/**/*.{md,txt}', 'notes/a.md')).toEqual(['notes/a.md', 'notes/old/b.txt']);
    expect(await found('notes/*.md')).toEqual(['notes/a.md']);
  });

  it('that are named count whatever their ending', async () => {
    expect(await found('notes/c.csv')).toEqual(['notes/c.csv']);
  });

  it('that are nowhere are said to be so', async () => {
    await expect(found('nowhere.md')).rejects.toThrow('There is no file nowhere.md');
    await expect(found('data')).rejects.toThrow('There is no notebook in data');
  });

  it('have patterns in which other marks mean themselves', () => {
    expect(patternOf('a+(b).md').test('a+(b).md')).toBe(true);
    expect(patternOf('a.md').test('axmd')).toBe(false);
    expect(patternOf('?.md').test('/.md')).toBe(false);
    expect(patternOf('a,b.md').test('a,b.md')).toBe(true);
  });
});

describe('names of data files', () => {
  it('start from the current folder, with slashes', async () => {
    expect(await nameFiles(['data/f.csv'], at('work'), undefined)).toEqual([
      { file: at('work/data/f.csv'), name: 'data/f.csv' },
    ]);
  });

  it('start from the root that was given, and files outside it are refused', async () => {
    expect((await nameFiles([at('work/data/f.csv')], at('elsewhere'), at('work')))[0]?.name).toBe(
      'data/f.csv',
    );
    expect(await codeOf(nameFiles([at('elsewhere/g.csv')], at('work'), at('work')))).toBe(
      'file-outside-root',
    );
  });

  it('start from the folder that holds all files when they lie outside the current one', async () => {
    const named = await nameFiles([at('elsewhere/g.csv'), at('work/data/f.csv')], at('work'), undefined);
    expect(named.map(({ name }) => name)).toEqual(['elsewhere/g.csv', 'work/data/f.csv']);
  });

  it('that lead nowhere are refused', async () => {
    expect(await codeOf(nameFiles(['no.csv'], at('work'), undefined))).toBe('file-not-found');
  });
});

describe('a file that a block names', () => {
  it('is looked for from the root, then from the notebook up to the root', async () => {
    const notebook = at('work/notes/old/b.txt');
    expect(await findNamed('data/f.csv', at('work'), notebook)).toBe(at('work/data/f.csv'));
    expect(await findNamed('f.csv', at('work'), notebook)).toBe(at('work/notes/f.csv'));
    expect(await findNamed('gone.csv', at('work'), notebook)).toBeNull();
  });

  it('is refused outside the root: by dots, by an absolute path, by a link', async () => {
    for (const name of ['../elsewhere/g.csv', at('elsewhere/g.csv'), 'C:\\g.csv', 'data/link.csv']) {
      expect(await codeOf(findNamed(name, at('work'), at('work/notes/a.md')))).toBe('file-outside-root');
    }
  });

  it('has the current folder as root, or the notebook’s own when that lies elsewhere', async () => {
    expect(await rootOf(at('work/notes/a.md'), at('work'), undefined)).toBe(at('work'));
    expect(await rootOf(at('work/notes/a.md'), at('elsewhere'), undefined)).toBe(at('work/notes'));
    expect(await rootOf(at('work/notes/a.md'), at('work'), 'notes')).toBe(at('work/notes'));
  });
});
