// npm test [-- --only unit,host,...] [--editor 1.139]: every check of the project. The last line is 'N passed, N failed'.
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { parseArgs } from 'node:util';
import { build, ensureBuilt } from './built.mjs';
import { lint, types } from './checks.mjs';
import { command, tool } from './command.mjs';

/** Each gives how many checks held and how many did not; what a person needs to mend one is printed as it fails. */
const stages = {
  build: () => checks([['build', build]]),
  lint: () => checks(lint),
  types: () => checks(types),
  unit: () => vitest(['--exclude', 'test/package/**']),
  package: async () => (await ensureBuilt(), vitest(['test/package', '--no-file-parallelism'])),
  host: async () => (await ensureBuilt(), (await import('../test/host/stage.mjs')).default()),
  webview: async () => (await ensureBuilt(), (await import('../test/webview/stage.mjs')).default()),
};

/** Runs checks two at a time; prints the output of those that fail. */
async function checks(list) {
  const waiting = [...list];
  const count = { passed: 0, failed: 0 };
  const work = async () => {
    for (let next = waiting.shift(); next !== undefined; next = waiting.shift()) {
      const [name, program, args] = next;
      const { code, output } = await (typeof program === 'function' ? program() : command(program, args));
      count[code === 0 ? 'passed' : 'failed']++;
      if (code !== 0) console.log(`\n${output.trim()}\n✗ ${name} (exit code ${code})\n`);
    }
  };
  await Promise.all([work(), work()]);
  return count;
}

async function vitest(args) {
  const folder = await mkdtemp(path.join(tmpdir(), 'weighbeam-unit-'));
  const report = path.join(folder, 'report.json');
  try {
    const reporters = ['--reporter=dot', '--reporter=json', `--outputFile.json=${report}`];
    const config = ['--config', '.config/vitest.mts', '--coverage.enabled=false'];
    const { output, code } = await command(tool('vitest'), ['run', ...config, ...reporters, ...args]);
    const counted = await readFile(report, 'utf8').then(JSON.parse, () => undefined);
    const passed = counted?.numPassedTests ?? 0;
    // A file that cannot be loaded, or an error outside any test, has no failed test of its own but is a failure.
    const unloaded = counted?.testResults.filter(
      file => file.status === 'failed' && !file.assertionResults.length,
    );
    const failed = (counted?.numFailedTests ?? 0) + (unloaded?.length ?? 0);
    if (code !== 0) console.log(output.trim());
    return { passed, failed: code === 0 ? failed : Math.max(failed, 1) };
  } finally {
    await rm(folder, { recursive: true });
  }
}

const { values } = parseArgs({ options: { only: { type: 'string' }, editor: { type: 'string' } } });
if (values.editor !== undefined) process.env.WEIGHBEAM_EDITOR = values.editor; // read where the editor is installed
const wanted = values.only?.split(',') ?? Object.keys(stages);
const unknown = wanted.filter(name => !(name in stages));
if (unknown.length) {
  console.error(`Unknown stage ${unknown.join(', ')}; there are ${Object.keys(stages).join(', ')}.`);
  process.exit(2);
}

const total = { passed: 0, failed: 0 };
for (const name of wanted) {
  const started = performance.now();
  const count = await stages[name]().catch(error => {
    console.log(error.message);
    return { passed: 0, failed: 1 };
  });
  total.passed += count.passed;
  total.failed += count.failed;
  const seconds = ((performance.now() - started) / 1000).toFixed(1);
  console.log(`${name.padEnd(8)} ${count.passed} passed, ${count.failed} failed  ${seconds} s`);
}
console.log(`${total.passed} passed, ${total.failed} failed`);
process.exit(total.failed === 0 && total.passed > 0 ? 0 : 1);
