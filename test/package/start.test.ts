import { spawnSync } from 'node:child_process';
import { expect, it } from 'vitest';
import { root } from './root';

it('npm start opens an editor that answers, and says what to try', () => {
  const { status, stdout, stderr } = spawnSync('npm', ['start', '--', '--check'], {
    cwd: root,
    encoding: 'utf8',
  });
  expect(stderr).not.toMatch(/error/i);
  expect(stdout).toMatch(/http:\/\/127\.0\.0\.1:\d+\//);
  expect(stdout).toMatch(/1\. .+\n +2\. .+Weighbeam: Compare groups….+\n +3\. /);
  expect(status).toBe(0);
}, 180_000);
