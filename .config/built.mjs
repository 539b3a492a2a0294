// Builds when the sources are newer than the bundles.
import { existsSync } from 'node:fs';
import { readdir, stat } from 'node:fs/promises';
import path from 'node:path';
import { command, root } from './command.mjs';

const stamp = path.join(root, 'dist', 'NOTICES.txt'); // written last
const sources = ['src', 'esbuild.mjs', 'package.json', 'package-lock.json', 'tsconfig.json'];

async function newest(file) {
  const { mtimeMs } = await stat(file);
  if (!file.endsWith('src')) return mtimeMs;
  const entries = await readdir(file, { recursive: true });
  const times = await Promise.all(entries.map(async entry => (await stat(path.join(file, entry))).mtimeMs));
  return Math.max(mtimeMs, ...times);
}

async function isStale() {
  if (!existsSync(stamp)) return true;
  const times = await Promise.all(sources.map(source => newest(path.join(root, source))));
  return Math.max(...times) > (await stat(stamp)).mtimeMs;
}

export const build = () => command(process.execPath, ['esbuild.mjs']);

/** Says nothing unless the build fails; then throws what the build printed. */
export async function ensureBuilt() {
  if (!(await isStale())) return;
  const { code, output } = await build();
  if (code !== 0) throw new Error(`The build failed.\n${output}`);
}
