import { readFile, realpath, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { findBlocks } from '../settings/findBlocks';
import { UsageError } from './usageError';

/**
 * Writes what a command made to a file, but never over a data file or a notebook it has read, nor over a file that
 * holds settings blocks (`keepsRecords`): a record that is written over is lost.
 */
export async function writeOut(
  flag: string,
  name: string,
  text: string,
  {
    cwd,
    read,
    keepsRecords,
  }: { readonly cwd: string; readonly read: readonly string[]; readonly keepsRecords: boolean },
): Promise<void> {
  const target = path.resolve(cwd, name);
  const there = await realpath(target).catch(() => null);
  const sources = await Promise.all(read.map(file => realpath(path.resolve(cwd, file))));
  if (there !== null && sources.includes(there)) {
    throw new UsageError(
      `--${flag} ${name} is a file that was read`,
      'Choose another name; it is never written to.',
    );
  }
  if (there !== null && keepsRecords && findBlocks(await readFile(there, 'utf8')).length > 0) {
    throw new UsageError(
      `--${flag} ${name} holds settings blocks already, which would be lost`,
      `Choose another name, or leave --${flag} away and append with >> ${name}.`,
    );
  }
  await writeFile(target, text);
}
