// Bundles the tests of this folder and runs them inside a real editor.
import { build } from 'esbuild';
import { cp, mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { command, root } from '../../.config/command.mjs';

const here = import.meta.dirname;
const bundled = path.join(root, '.cache', 'host-tests');

/** Gives how many tests passed and failed; prints each that failed. */
export default async function stage() {
  await rm(bundled, { recursive: true, force: true });
  await build({
    entryPoints: [`${here}/suite.ts`, `${here}/*.test.ts`],
    outdir: bundled,
    bundle: true,
    platform: 'node',
    format: 'cjs',
    target: 'node20',
    external: ['vscode', 'mocha'],
    sourcemap: 'inline',
    logLevel: 'warning',
  });
  const folder = await mkdtemp(path.join(tmpdir(), 'weighbeam-host-'));
  try {
    const workspace = path.join(folder, 'tile works');
    await cp(path.join(root, 'media', 'demo'), workspace, { recursive: true });
    return await launch(workspace, path.join(folder, 'profile'), path.join(folder, 'results.jsonl'));
  } finally {
    await rm(folder, { recursive: true, force: true, maxRetries: 5 });
  }
}

async function launch(workspace, profile, results) {
  const args = [path.join(here, 'launch.mjs'), root, path.join(bundled, 'suite.js'), workspace, profile];
  const env = { WEIGHBEAM_TEST_RESULTS: results, WEIGHBEAM_ROOT: root };
  const { code, output } = await command(process.execPath, args, { env });
  const lines = (await readFile(results, 'utf8').catch(() => '')).split('\n').filter(Boolean).map(JSON.parse);
  const failures = lines.filter(({ passed }) => passed === false);
  for (const { title, error } of failures) console.log(`✗ ${title}\n${error}\n`);
  const passed = lines.filter(line => line.passed).length;
  const complete = lines.some(({ ended }) => ended) && passed + failures.length > 0;
  if (complete && (code === 0) === (failures.length === 0)) return { passed, failed: failures.length };
  console.log(`${output.trim()}\nThe run in the editor did not come to its end (exit code ${code}).`);
  return { passed, failed: failures.length + 1 };
}
