import { execFileSync } from 'node:child_process';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { methods } from '../../src/core/methods/index';
import { folderWith, weighbeam, type Said } from './terminal';

const good = 'site,mass\nNorth,1.2\nNorth,1.4\nNorth,1.3\nSouth,2.1\nSouth,2.4\nSouth,2.2\n';
const compare = ['compare', 'data.csv', '--of', 'mass', '--by', 'site'];

/** What is said about one file; every problem is one line of the form `code: message (where). fix`. */
async function about(text: string | Uint8Array, ...argv: readonly string[]): Promise<Said> {
  await using temp = await folderWith({ 'data.csv': text });
  const said = await weighbeam(temp.folder, ...argv);
  if (said.code !== 0) {
    expect(said.err).toMatch(/^[a-z-]+: .+\n$/);
    expect(said.err).not.toMatch(/ {2}at |undefined|\[object/);
    expect(said.out).toBe('');
  }
  return said;
}

describe('a file that cannot be compared gets a problem that says where and what to do', () => {
  const cases: readonly (readonly [
    name: string,
    text: string | Uint8Array,
    code: string,
    words: readonly string[],
  ])[] = [
    ['an empty file', '', 'file-empty', ['data.csv']],
    ['a file with only a header', 'site,mass\n', 'file-header-only', ['data.csv', '1']],
    [
      'a binary file',
      new Uint8Array([0x50, 0x4b, 3, 4, 0, 0, 0, 0, 0xff, 0xfe, 0, 1, 2, 0, 0, 7]),
      'file-binary',
      ['data.csv'],
    ],
    ['an unclosed quote', 'site,mass\nNorth,"1.2\nNorth,1.4\nSouth,2\nSouth,3\n', 'quote-unclosed', ['2']],
    [
      'text where numbers should be',
      good.replace('1.4', 'about 1'),
      'text-in-measured',
      ['line 3, column 2', 'about 1'],
    ],
    [
      'a group with one value',
      'site,mass\nNorth,1.2\nSouth,2.1\nSouth,2.4\n',
      'label-single-value',
      ['North', 'occurs once', '--same'],
    ],
    [
      'a group with one value and rows without any',
      'site,mass\nNorth,1.2\nNorth,\nSouth,2.1\nSouth,2.4\n',
      'values-too-few',
      ['North', '1'],
    ],
    ['values too large to compute with', good.replace(/(\d\.\d)/g, '$1e300'), 'number-unusable', ['North']],
    ['values too small to compute with', good.replace(/(\d\.\d)/g, '$1e-300'), 'number-unusable', ['North']],
    [
      'points that part thousands as well as decimals',
      'site;mass\nNorth;1.234\nNorth;345\nSouth;3.456\nSouth;999\n',
      'decimal-undecidable',
      ['line 2, column 2', '1.234', '1234', '--decimal'],
    ],
    [
      'a decimal comma that comes late',
      `site;mass\n${'North;3\nSouth;4\nNorth;5\nSouth;7\n'.repeat(100)}North;1,5\n`,
      'text-in-measured',
      ['line 402, column 2', '1,5', '--decimal comma'],
    ],
    ['a byte that no text has', good.replace('1.3', '1.3\0'), 'file-binary', ['line 4']],
    ['all values of all groups equal', good.replace(/\d\.\d/g, '5'), 'values-all-equal', ['5']],
  ];
  it.each(cases)('%s', async (_, text, code, words) => {
    const { code: exit, err } = await about(text, ...compare);
    expect([exit, err.split(':')[0]]).toEqual([3, code]);
    for (const word of words) expect(err).toContain(word);
  });

  it('a column that does not exist: the columns there are', async () => {
    const { code, err } = await about(good, 'compare', 'data.csv', '--of', 'mas', '--by', 'site');
    expect(code).toBe(3);
    expect(err).toMatch(/^column-unknown: .*mas.*data\.csv line 1.*site.*mass/);
  });

  it('a name that fits two columns: their places', async () => {
    const { code, err } = await about('site,mass,mass\nN,1,2\nN,2,3\nS,3,4\nS,5,6\n', ...compare);
    expect(code).toBe(3);
    expect(err).toMatch(/^column-ambiguous: .*#2.*#3/);
  });

  it('a label that is not there: the labels there are, with their counts', async () => {
    const { code, err } = await about(good, ...compare, '--test', 'Nord', '--reference', 'South');
    expect(code).toBe(3);
    expect(err).toMatch(/^label-unknown: .*Nord.*North.*3.*South.*3/);
  });

  it('a named label that occurs once', async () => {
    const { code, err } = await about(
      `${good}West,3.1\n`,
      ...compare,
      '--test',
      'West',
      '--reference',
      'South',
    );
    expect(code).toBe(3);
    expect(err).toMatch(/West/);
  });

  it('values below a limit without an answer to what they count as', async () => {
    const { code, err } = await about(good.replace('1.4', '<1.1'), ...compare);
    expect(code).toBe(3);
    expect(err).toMatch(/^censored-unanswered: .*--below/);
  });

  it('no label column named: which columns there are', async () => {
    const { code, err } = await about(good, 'compare', 'data.csv', '--of', 'mass');
    expect(code).toBe(3);
    expect(err).toMatch(/^column-needed: .*--by/);
  });
});

describe('what is asked for is checked', () => {
  it.each(['95', '1', '0', '-0.5', '1.5'])('confidence %s is outside 0 to 1', async confidence => {
    const { code, err } = await about(good, ...compare, '--confidence', confidence);
    expect(code).toBe(3);
    expect(err).toMatch(/^confidence-/);
  });

  it('confidence typed as 95 is asked about, not assumed', async () => {
    const { err } = await about(good, ...compare, '--confidence', '95');
    expect(err).toMatch(/^confidence-as-percent: .*0\.95/);
  });

  it.each(['0,2', '-1,2', '2,0'])('sigma %s is not above 0', async sigma => {
    const { code, err } = await about(good, ...compare, '--variance', 'known', '--sigma', sigma);
    expect(code).toBe(3);
    expect(err).toMatch(/^sigma-not-positive: /);
  });

  it('known variances need their sigma', async () => {
    const { code, err } = await about(good, ...compare, '--variance', 'known');
    expect(code).toBe(3);
    expect(err).toMatch(/^sigma-needed: .*--sigma/);
  });

  it('words of the variance assumption that contradict each other are a usage error', async () => {
    const { code, err } = await about(good, ...compare, '--variance', 'pooled', '--df', 'smaller');
    expect(code).toBe(2);
    expect(err).toMatch(/pooled.*smaller/);
  });

  it.each([
    [['compare'], 'No file was named'],
    [[...compare, '--confidence', '0,95'], '--confidence 0.95'],
    [[...compare, '--confidence', 'high'], 'is not a number'],
    [[...compare, '--leave-out', '3'], 'the line and why'],
    [[...compare, '--leave-out', '3:'], 'the line and why'],
    [[...compare, '--same', 'North'], '"Slow cool -> slow cool"'],
    [[...compare, '--method', 'separatet'], 'separate-t'],
    [[...compare, '--refrence', 'South'], 'Did you mean --reference?'],
    [['comapre', 'data.csv'], 'Did you mean weighbeam compare?'],
    [['explain', 'pooledt'], 'Did you mean pooled-t?'],
  ] as const)('%j is a usage error that says how to put it', async (argv, words) => {
    const { code, err } = await about(good, ...argv);
    expect(code).toBe(2);
    expect(err).toContain(words);
  });

  it('a measure with no method is not among the words, also where every measure is known', async () => {
    const { code, err } = await about(good, ...compare, '--measure', 'rnk');
    expect([code, err]).toEqual([2, expect.stringMatching(/--measure rnk.*mean, /)]);
    for (const measure of ['mean', 'ratio', 'proportion', 'rank', 'spread']) {
      if (methods.some(method => method.measure === measure)) continue;
      const said = await about(good, ...compare, '--measure', measure);
      expect([said.code, said.err]).toEqual([2, expect.stringContaining(`--measure ${measure}`)]);
    }
  });

  it.each(['nowhere', 'data.csv'])('a root that is no folder, %s, is named with its flag', async root => {
    await using temp = await folderWith({ 'data.csv': good, 'note.md': '' });
    for (const argv of [compare, ['recheck', 'note.md']]) {
      const { code, out, err } = await weighbeam(temp.folder, ...argv, '--root', root);
      expect([code, out]).toEqual([2, '']);
      expect(err).toMatch(new RegExp(`^usage: .*--root ${root.replace('.', '\\.')}\\b`));
    }
  });

  it('a line to leave out that holds no row', async () => {
    const { code, err } = await about(good, ...compare, '--leave-out', '99:cracked');
    expect(code).toBe(3);
    expect(err).toContain('99');
  });

  it.each([
    ['compare', ['--of', 'mass', '--by', 'site']],
    ['inspect', []],
    ['recheck', []],
  ] as const)('%s of standard input or of a pipe says that a file is needed', async (command, asked) => {
    await using temp = await folderWith({});
    const pipe = path.join(temp.folder, 'pipe');
    execFileSync('/usr/bin/mkfifo', [pipe]);
    for (const name of ['-', 'pipe', '/dev/null']) {
      const { code, out, err } = await weighbeam(temp.folder, command, name, ...asked);
      expect([code, out]).toEqual([2, '']);
      expect(err).toMatch(/^usage: .*(?:standard input|no file on a disk).*Save/);
    }
  });

  it('a file that is not there, and a folder in its place', async () => {
    await using temp = await folderWith({ 'data.csv': good });
    for (const name of ['no.csv', '.']) {
      const { code, err } = await weighbeam(temp.folder, 'compare', name, '--of', 'mass', '--by', 'site');
      expect(code).toBe(3);
      expect(err).toMatch(/^file-not-found: /);
    }
  });
});

describe('what is unusual but can be answered is answered, with a word about it', () => {
  it('one group without spread is a warning', async () => {
    const { code, out } = await about(good.replace(/1\.\d/g, '1.3'), ...compare);
    expect(code).toBe(0);
    expect(out).toContain('North');
  });

  it('a success value that never occurs is counted as never', async () => {
    const text = 'kiln,cracked\nA,no\nA,no\nB,yes\nB,no\n';
    const asked = ['--of', 'cracked', '--by', 'kiln', '--measure', 'proportion', '--success', 'yes'];
    const { code } = await about(text, 'compare', 'data.csv', ...asked);
    expect(code).toBe(0);
    const never = await about(text.replace('yes', 'no'), 'compare', 'data.csv', ...asked);
    expect([never.code, never.err]).toEqual([0, '']);
  });

  it('with JSON asked for, a problem is JSON on standard output too', async () => {
    await using temp = await folderWith({ 'data.csv': '' });
    for (const format of [['--format', 'json'], ['--format=json']]) {
      const { code, out, err } = await weighbeam(temp.folder, ...compare, ...format);
      const { problem } = JSON.parse(out) as { problem: Record<string, string> };
      expect([code, problem['code'], Object.keys(problem)]).toEqual([
        3,
        'file-empty',
        ['code', 'message', 'where', 'fix'],
      ]);
      expect(err).toMatch(/^file-empty: /);
    }
  });
});
