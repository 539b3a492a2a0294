import { link, readFile, symlink } from 'node:fs/promises';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { demo, folderWith, mainCase, weighbeam } from './terminal';

/** A row under other assumptions, as the JSON contract has it. */
interface MethodJson {
  readonly id: string;
  readonly data: string;
  readonly estimate: number;
  readonly statistic: number;
  readonly df: number | null;
  readonly p: number;
  readonly lower: number;
  readonly upper: number;
  readonly applies: boolean;
  readonly counted: boolean;
  readonly decision: string;
}
interface ComparisonJson {
  readonly format: string;
  readonly settings: Record<string, unknown>;
  readonly open: readonly string[];
  readonly groups: readonly Record<string, unknown>[];
  readonly chosen: MethodJson;
  readonly whatIf: {
    readonly depends: string;
    readonly sentence: string;
    readonly rows: readonly MethodJson[];
  };
  readonly effects: readonly Record<string, unknown>[];
  readonly evidence: readonly Record<string, unknown>[];
  readonly findings: readonly Record<string, unknown>[];
  readonly sentence: string;
}

async function json(...argv: readonly string[]): Promise<ComparisonJson> {
  const { code, out, err } = await weighbeam(demo, 'compare', ...argv, '--format', 'json');
  expect([code, err]).toEqual([0, '']);
  return JSON.parse(out) as ComparisonJson;
}

const golden = (name: string) => readFile(path.join(import.meta.dirname, 'golden', name), 'utf8');

describe('the main case of the demo', () => {
  it('reads in the terminal as it was agreed to read', async () => {
    const { code, out, err } = await weighbeam(demo, 'compare', ...mainCase);
    expect([code, err]).toEqual([0, '']);
    expect(out).toBe(await golden('mainCase.txt'));
  });

  it('keeps to 80 columns and never says what the data cannot say', async () => {
    const { out } = await weighbeam(demo, 'compare', ...mainCase);
    for (const line of out.split('\n')) expect(line.length).toBeLessThanOrEqual(80);
    expect(out).not.toMatch(/no difference|p = 0\.000|significant|undefined|NaN|null/i);
  });

  // Recomputed outside the project with SciPy 1.17.1 from the 24 unit means of the file: ttest_ind with and without
  // equal_var, its confidence intervals, and again with line 31 kept.
  it('has the numbers that another program gives for the same unit means', async () => {
    const { chosen, whatIf } = await json(...mainCase);
    const near = (value: number, expected: number) =>
      expect(Math.abs(value / expected - 1)).toBeLessThan(1e-12);
    near(chosen.estimate, 22.59722222222217);
    near(chosen.statistic, 3.3824353750002283);
    near(chosen.df ?? 0, 19.387986814328276);
    near(chosen.p, 0.003058581829950728);
    near(chosen.lower, 8.6331563346941);
    near(chosen.upper, 36.561288109750244);
    const pooled = whatIf.rows.find(({ id, data }) => id === 'pooled-t' && data === chosen.data);
    near(pooled?.lower ?? 0, 8.742184245005609);
    near(pooled?.upper ?? 0, 36.45226019943873);
    const kept = whatIf.rows.find(({ id, data }) => id === 'separate-t' && data === 'all');
    near(kept?.estimate ?? 0, 20.666666666666742);
    near(kept?.lower ?? 0, 3.995869755772194);
    near(kept?.upper ?? 0, 37.337463577561294);
    near(kept?.p ?? 0, 0.018101317289547565);
  });

  it('carries the keys of the JSON contract', async () => {
    const { groups, ...comparison } = await json(...mainCase);
    expect(Object.keys(comparison)).toEqual(
      expect.arrayContaining([
        'format',
        'settings',
        'open',
        'chosen',
        'whatIf',
        'effects',
        'evidence',
        'findings',
        'pairs',
        'family',
        'columns',
        'sentence',
      ]),
    );
    expect(comparison.format).toBe('weighbeam comparison 1');
    const ofGroup = [
      'label',
      'n',
      'mean',
      'sd',
      'se',
      'median',
      'q1',
      'q3',
      'min',
      'max',
      'missing',
      'leftOut',
      'readings',
    ];
    for (const group of groups) expect(Object.keys(group)).toEqual(expect.arrayContaining(ofGroup));
    expect(groups.map(({ label, n, readings, leftOut }) => [label, n, readings, leftOut])).toEqual([
      ['slow cool', 12, 35, 1],
      ['standard', 12, 36, 0],
    ]);
    const ofMethod = [
      'id',
      'data',
      'estimate',
      'se',
      'statistic',
      'df',
      'p',
      'lower',
      'upper',
      'confidence',
      'question',
      'applies',
      'counted',
      'why',
      'decision',
      'twoSided',
    ];
    for (const row of [comparison.chosen, ...comparison.whatIf.rows]) {
      expect(Object.keys(row)).toEqual(expect.arrayContaining(ofMethod));
    }
    const ofFinding = ['id', 'level', 'group', 'sentence', 'count', 'lines'];
    for (const finding of comparison.findings)
      expect(Object.keys(finding)).toEqual(expect.arrayContaining([...ofFinding, 'cells']));
    for (const evidence of comparison.evidence)
      expect(Object.keys(evidence)).toEqual(expect.arrayContaining([...ofFinding, 'statistic', 'p', 'df']));
    expect(comparison.open).toEqual([]);
    expect(comparison.whatIf.depends).toBe('no');
    expect(
      comparison.whatIf.rows.filter(
        ({ id, data }) => id === comparison.chosen.id && data === comparison.chosen.data,
      ),
    ).toHaveLength(1);
  });

  it('is drawn as a picture that stands alone', async () => {
    await using temp = await folderWith('demo');
    const { code } = await weighbeam(
      temp.folder,
      'compare',
      ...mainCase,
      '--figure',
      'hardness.svg',
      '--format',
      'json',
    );
    const drawn = await readFile(path.join(temp.folder, 'hardness.svg'), 'utf8');
    expect(code).toBe(0);
    expect(drawn).toMatch(/^<svg[^>]* xmlns="http:\/\/www\.w3\.org\/2000\/svg"/);
    expect(drawn).toContain('slow cool');
  });

  it('is written as a page, a notebook entry and a block that end with the same record', async () => {
    const block = (await weighbeam(demo, 'compare', ...mainCase, '--format', 'block')).out;
    expect(block).toMatch(/^# weighbeam settings block, format 1\n[\s\S]*\n# end of settings block\n$/);
    const markdown = (await weighbeam(demo, 'compare', ...mainCase, '--format', 'markdown')).out;
    expect(markdown).toContain(`\`\`\`toml\n${block}\`\`\`\n`);
    const page = (await weighbeam(demo, 'compare', ...mainCase, '--format', 'html')).out;
    expect(page).toMatch(/^<!doctype html>/i);
    expect(page).toContain('# weighbeam settings block, format 1');
  });

  it('prints the same numbers in every format', async () => {
    for (const format of ['text', 'markdown', 'html']) {
      const { out } = await weighbeam(demo, 'compare', ...mainCase, '--format', format);
      for (const number of ['22.6', '8.6 to 36.6', '0.003']) expect(out).toContain(number);
    }
  });
});

describe('an open question', () => {
  const open = [
    'firings-april.csv',
    '--of',
    'hardness',
    '--by',
    'schedule',
    '--test',
    'slow cool',
    '--reference',
    'standard',
    '--per',
    'none',
  ];

  it('does not hide the number, but no record is made of it', async () => {
    // The same tile numbers stand in both mills' rows: a pair or two numberings? Only a person knows.
    await using temp = await folderWith({
      'mills.csv':
        'id,mill,loi\n1,north,6.1\n2,north,6.4\n3,north,6.2\n1,river,5.8\n2,river,5.5\n3,river,5.9\n',
    });
    const asked = ['mills.csv', '--of', 'loi', '--by', 'mill', '--per', 'id'];
    const { code, out } = await weighbeam(temp.folder, 'compare', ...asked, '--format', 'json');
    const comparison = JSON.parse(out) as ComparisonJson;
    expect([code, comparison.open.length > 0, Number.isFinite(comparison.chosen.estimate)]).toEqual([
      0,
      true,
      true,
    ]);
    for (const format of ['block', 'markdown', 'html']) {
      const refused = await weighbeam(temp.folder, 'compare', ...asked, '--format', format);
      expect([refused.code, refused.err]).toEqual([3, expect.stringMatching(/^answer-needed: /)]);
    }
    const answered = await weighbeam(temp.folder, 'compare', ...asked, '--pair', 'none', '--format', 'block');
    expect([answered.code, answered.err]).toEqual([0, '']);
  });

  it('is printed before the number, with the flag that answers it', async () => {
    const { out } = await weighbeam(demo, 'compare', ...open);
    expect(out.length).toBeGreaterThan(0);
  });
});

describe('what is written', () => {
  it('never goes over a file that was read', async () => {
    await using temp = await folderWith('demo');
    const before = await readFile(path.join(temp.folder, 'firings-april.csv'));
    for (const flag of ['--out', '--figure']) {
      const { code, err } = await weighbeam(temp.folder, 'compare', ...mainCase, flag, './firings-april.csv');
      expect([code, err]).toEqual([2, expect.stringContaining('is a file that was read')]);
    }
    expect(await readFile(path.join(temp.folder, 'firings-april.csv'))).toEqual(before);
  });

  it('never goes over a file that was read through another name of it', async () => {
    await using temp = await folderWith('demo');
    const at = (name: string): string => path.join(temp.folder, name);
    await link(at('firings-april.csv'), at('hard.csv'));
    await symlink(at('hard.csv'), at('soft.csv'));
    const before = await readFile(at('firings-april.csv'));
    for (const name of ['hard.csv', 'soft.csv']) {
      for (const argv of [
        ['compare', ...mainCase, '--out', name],
        ['compare', ...mainCase, '--figure', name],
        ['inspect', 'firings-april.csv', '--out', name],
      ]) {
        const { code, err } = await weighbeam(temp.folder, ...argv);
        expect([code, err]).toEqual([2, expect.stringContaining('is a file that was read')]);
      }
    }
    expect(await readFile(at('firings-april.csv'))).toEqual(before);
  });

  it.each([
    ...['text', 'json', 'block', 'markdown', 'html'].map(format => ['--format', format, '--out', 'note.md']),
    ['--figure', 'note.md'],
  ])('never goes over a notebook that holds records: %s %s %s %s', async (...argv) => {
    await using temp = await folderWith('demo');
    const asked = ['compare', ...mainCase];
    expect((await weighbeam(temp.folder, ...asked, '--format', 'markdown', '--out', 'note.md')).code).toBe(0);
    const first = await readFile(path.join(temp.folder, 'note.md'), 'utf8');
    const { code, err } = await weighbeam(temp.folder, ...asked, ...argv);
    expect([code, err]).toEqual([2, expect.stringContaining('settings blocks already')]);
    const looked = await weighbeam(temp.folder, 'inspect', 'firings-april.csv', '--out', 'note.md');
    expect([looked.code, looked.err]).toEqual([2, expect.stringContaining('settings blocks already')]);
    expect(await readFile(path.join(temp.folder, 'note.md'), 'utf8')).toBe(first);
  });

  it('may go over an earlier answer, but not over itself', async () => {
    await using temp = await folderWith('demo');
    const asked = ['compare', ...mainCase, '--figure', 'a.svg', '--format', 'html', '--out'];
    expect((await weighbeam(temp.folder, ...asked, 'a.html')).code).toBe(0);
    expect((await weighbeam(temp.folder, ...asked, 'a.html')).code).toBe(0);
    const { code, err } = await weighbeam(temp.folder, ...asked, './a.svg');
    expect([code, err]).toEqual([2, expect.stringMatching(/--out \.\/a\.svg and --figure a\.svg/)]);
    expect(await readFile(path.join(temp.folder, 'a.svg'), 'utf8')).toMatch(/^<svg/);
  });

  it('says so when the place cannot be written to', async () => {
    await using temp = await folderWith('demo');
    const { code, err } = await weighbeam(temp.folder, 'compare', ...mainCase, '--out', 'nowhere/a.txt');
    expect([code, err]).toEqual([3, expect.stringMatching(/^file-not-usable: /)]);
  });
});
