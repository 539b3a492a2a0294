// npm run bench -- commandLine: whole runs of the command line on generated files, wall time.
import { spawn } from 'node:child_process';
import { createWriteStream } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { once } from 'node:events';
import { root } from '../../.config/command.mjs';
import { median } from './median.mjs';

const REPEATS = 5;

/** Invented: five columns, two kilns in turn, about 40 bytes a row. */
async function writeTable(file, rows) {
  const out = createWriteStream(file);
  out.write('batch,kiln,density,uptake,shelf\n');
  let text = '';
  for (let index = 0; index < rows; index++) {
    text += `B${100_000 + (index >> 2)},${index % 2 ? 'east' : 'west'},2.${10_000 + ((index * 7919) % 79_999)},${(index * 31) % 97}.${index % 10},upper ${index % 9}\n`;
    if (text.length > 1e6) {
      if (!out.write(text)) await once(out, 'drain');
      text = '';
    }
  }
  out.end(text);
  await once(out, 'finish');
}

/** Runs a program; gives its wall time in seconds. */
function run(program, args, cwd) {
  const started = performance.now();
  const child = spawn('/usr/bin/env', [program, ...args], { cwd, stdio: ['ignore', 'ignore', 'inherit'] });
  return new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('exit', code =>
      code === 0
        ? resolve((performance.now() - started) / 1000)
        : reject(new Error(`${program} ${args.join(' ')} ended with ${code}`)),
    );
  });
}

async function medianOf(...args) {
  const times = [];
  for (let turn = 0; turn < REPEATS; turn++) times.push(await run(...args));
  return median(times);
}

/** Prints one line a measurement: medians in seconds. */
export default async function bench() {
  const folder = await mkdtemp(path.join(tmpdir(), 'weighbeam-bench-'));
  const cli = path.join(root, 'dist', 'cli.js');
  const asked = ['--of', 'density', '--by', 'kiln', '--per', 'none', '--format', 'json'];
  try {
    for (const rows of [2_000, 200_000, 1_000_000]) {
      const file = `rows-${rows}.csv`;
      await writeTable(path.join(folder, file), rows);
      for (const [what, flags] of [
        ['chosen row only', ['--only-chosen']],
        ['every row', []],
      ]) {
        const seconds = await medianOf(process.execPath, [cli, 'compare', file, ...asked, ...flags], folder);
        console.log(`command line, ${rows} rows of 5 columns, ${what}: ${seconds.toFixed(2)} s`);
      }
    }
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}
