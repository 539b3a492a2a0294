import assert from 'node:assert/strict';
import * as vscode from 'vscode';
import { closeAll, commandLine, compare, workspaceUri, write } from './editor';
import { long, outcomes, wide } from './data';

const april = {
  measured: ['hardness'],
  label: 'schedule',
  test: 'slow cool',
  reference: 'standard',
  same: [['Slow cool', 'slow cool']],
};
const aprilFlags = ['--of', 'hardness', '--by', 'schedule', '--test', 'slow cool', '--reference', 'standard'];
const sameLabel = ['--same', 'Slow cool -> slow cool'];

/** Each: what it is, its file, what the panel is asked, and the same for the command line. */
const cases: readonly (readonly [string, string, object, readonly string[]])[] = [
  [
    'long data',
    'long.csv',
    { measured: ['density (g/cm3)'], label: 'kiln' },
    ['--of', 'density (g/cm3)', '--by', 'kiln'],
  ],
  [
    'wide data',
    'wide.csv',
    { columns: ['east (g/cm3)', 'west (g/cm3)'] },
    ['--columns', 'east (g/cm3),west (g/cm3)'],
  ],
  [
    'units, a label declared the same, and a row left out',
    'firings-april.csv',
    {
      ...april,
      per: ['firing'],
      matters: 15,
      leaveOut: [{ file: 0, line: 31, reason: 'tile cracked on the saw', afterResult: false }],
    },
    [
      ...aprilFlags,
      ...sameLabel,
      '--per',
      'firing',
      '--matters',
      '15',
      '--leave-out',
      '31:tile cracked on the saw',
    ],
  ],
  [
    'pooled variances and a one-sided question',
    'firings-april.csv',
    { ...april, per: 'none', variance: 'pooled', question: 'higher', confidence: 0.9 },
    [
      ...aprilFlags,
      ...sameLabel,
      '--per',
      'none',
      '--variance',
      'pooled',
      '--question',
      'higher',
      '--confidence',
      '0.9',
    ],
  ],
  [
    'pairs',
    'water-uptake-refired.csv',
    { columns: ['after (%)', 'before (%)'], pair: 'tile' },
    ['--columns', 'after (%),before (%)', '--pair', 'tile'],
  ],
  [
    'shares',
    'outcomes.csv',
    { measured: ['crazed'], label: 'kiln', measure: 'proportion', success: 'yes' },
    ['--of', 'crazed', '--by', 'kiln', '--measure', 'proportion', '--success', 'yes'],
  ],
  ['summaries', 'mills-summary.csv', { summary: true }, ['--summary']],
];

suite('panel and command line', () => {
  suiteSetup(async () => {
    await write('long.csv', long);
    await write('wide.csv', wide);
    await write('outcomes.csv', outcomes);
  });
  teardown(closeAll);

  for (const [name, file, request, flags] of cases) {
    test(`give the same numbers to the last digit: ${name}`, async () => {
      const shown = await compare(vscode.Uri.joinPath(workspaceUri(), file), request);
      assert.equal(shown.problem, null);
      const { code, output } = await commandLine('compare', file, ...flags, '--format', 'json');
      assert.equal(code, 0, output);
      assert.deepEqual(shown.numbers, JSON.parse(output));
    });
  }
});
