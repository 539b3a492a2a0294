import { stat } from 'node:fs/promises';
import { UsageError } from './usageError';

const fix = 'Save its text to a file and name that: a file is read more than once, and records name it.';

/**
 * Refuses what can be read only once, or without end: standard input, a pipe, a device. A name that there is nothing of,
 * and a folder, are left to whoever opens them. Throws UsageError.
 *
 * @param file the path to look at
 * @param name as it was typed
 */
export async function refusePipe(file: string, name: string): Promise<void> {
  const found = await stat(file).catch(() => null);
  if (found === null && name === '-')
    throw new UsageError('- would be standard input, and that is no file', fix);
  if (found === null || found.isFile() || found.isDirectory()) return;
  throw new UsageError(`${name} is no file on a disk but a pipe or a device`, fix);
}
