import { readFile, stat, writeFile } from 'node:fs/promises';
import type { BigIntStats } from 'node:fs';
import path from 'node:path';
import { findBlocks } from '../settings/findBlocks';
import { UsageError } from './usageError';

/** What a command made, and the flag and name that say where it goes. */
export interface Output {
  readonly flag: 'out' | 'figure';
  readonly name: string;
  readonly text: string;
}

/**
 * Writes what a command made to files, all or none: never over a data file or a notebook it has read, by whatever name or
 * link, nor over a file that holds settings blocks, for a record that is written over is lost. Throws UsageError.
 */
export async function writeOut(
  outputs: readonly Output[],
  { cwd, read }: { readonly cwd: string; readonly read: readonly string[] },
): Promise<void> {
  const sources = await Promise.all(read.map(file => statOf(path.resolve(cwd, file))));
  for (const output of outputs) await refuseLoss(output, cwd, sources);
  await refuseSameTarget(outputs, cwd);
  for (const { name, text } of outputs) await writeFile(path.resolve(cwd, name), text);
}

async function refuseLoss(
  { flag, name }: Output,
  cwd: string,
  sources: readonly (BigIntStats | null)[],
): Promise<void> {
  const target = path.resolve(cwd, name);
  const there = await statOf(target);
  if (there === null) return;
  if (sources.some(source => isSameFile(source, there))) {
    throw new UsageError(
      `--${flag} ${name} is a file that was read`,
      'Choose another name; it is never written to.',
    );
  }
  // What is no file, as a terminal, holds no record, and to read it could mean to wait for ever.
  if (!there.isFile() || findBlocks(await readFile(target, 'utf8')).length === 0) return;
  throw new UsageError(
    `--${flag} ${name} holds settings blocks already, which would be lost`,
    flag === 'figure'
      ? 'Choose another name.'
      : `Choose another name, or leave --${flag} away and append with >> ${name}.`,
  );
}

async function refuseSameTarget(outputs: readonly Output[], cwd: string): Promise<void> {
  const [one, other] = outputs;
  if (one === undefined || other === undefined) return;
  const targets = [one, other].map(({ name }) => path.resolve(cwd, name));
  const [first = null, second = null] = await Promise.all(targets.map(statOf));
  const isOne = targets[0] === targets[1] || (first?.isFile() === true && isSameFile(first, second));
  if (!isOne) return;
  throw new UsageError(
    `--${other.flag} ${other.name} and --${one.flag} ${one.name} are the same file`,
    'Choose two names.',
  );
}

/** Device and number of a file, which all its names and links share; null where there is none yet. */
const statOf = (file: string): Promise<BigIntStats | null> => stat(file, { bigint: true }).catch(() => null);

const isSameFile = (one: BigIntStats | null, other: BigIntStats | null): boolean =>
  one !== null && other !== null && one.dev === other.dev && one.ino === other.ino;
