import { spawnSync } from 'node:child_process';
import { readdirSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { root } from './root';

interface Violation {
  readonly from: string;
  readonly rule: { readonly name: string };
}

const fixture = path.join(root, 'test', 'fixtures-badImport');

function violations(): readonly Violation[] {
  const config = path.join(root, '.config', 'depcruise.cjs');
  const program = path.join(root, 'node_modules', '.bin', 'depcruise');
  const { stdout } = spawnSync(program, ['--config', config, '--output-type', 'json', 'src'], {
    cwd: fixture,
    encoding: 'utf8',
  });
  const { summary } = JSON.parse(stdout) as { summary: { violations: readonly Violation[] } };
  return summary.violations;
}

describe('import directions', () => {
  const found = violations();

  it('are broken by every file of the bad fixture that imports anything', () => {
    const files = readdirSync(path.join(fixture, 'src'), { recursive: true, encoding: 'utf8' })
      .filter(file => file.endsWith('.ts') && !file.endsWith('paints.ts'))
      .map(file => `src/${file}`);
    const broken = new Set(found.map(({ from }) => from));
    // The second half of the cycle is reported once, under the first.
    expect(files.filter(file => !broken.has(file))).toEqual(['src/protocol/secondOfCycle.ts']);
  });

  it.each([
    ['an editor symbol in a pure folder', 'src/core/numeric/opensEditor.ts', 'vscode has its own place'],
    ['even only its types', 'src/core/numeric/namesEditorType.ts', 'vscode has its own place'],
    [
      'node in a pure folder',
      'src/compare/readsDisk.ts',
      'node only on the platform side and the command line',
    ],
    ['a folder below', 'src/readers/reachesUp.ts', 'readers imports only what stands above it'],
    ['a panel that computes', 'src/webview/computes.ts', 'webview imports only what stands above it'],
    ['one surface in another', 'src/host/usesOtherSurface.ts', 'host imports only what stands above it'],
    ['a second place that parses', 'src/compare/parsesItself.ts', 'papaparse has its own place'],
    ['a package nobody agreed on', 'src/compare/addsPackage.ts', 'no other package'],
    ['a cycle', 'src/protocol/firstOfCycle.ts', 'no cycles'],
  ])('refuse %s', (_, file, rule) => {
    expect(found.filter(({ from }) => from === file).map(violation => violation.rule.name)).toContain(rule);
  });
});
