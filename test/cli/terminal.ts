import { cp, mkdtemp, realpath, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { run } from '../../src/cli/run';

export interface Said {
  readonly code: number;
  readonly out: string;
  readonly err: string;
}

export const demo = path.resolve(import.meta.dirname, '../../media/demo');

/** Runs one command line in this process, as if typed in `cwd`. */
export async function weighbeam(cwd: string, ...argv: readonly string[]): Promise<Said> {
  let out = '';
  let err = '';
  const code = await run(argv, {
    cwd,
    write: text => (out += text),
    complain: text => (err += text),
    now: () => new Date('2031-04-02T09:31:00Z'),
  });
  return { code, out, err };
}

/** A folder that is removed when the test is over, with these files in it, or with a copy of the demo. */
export async function folderWith(files: Readonly<Record<string, string | Uint8Array>> | 'demo'): Promise<{
  readonly folder: string;
  write(name: string, text: string | Uint8Array): Promise<void>;
  [Symbol.asyncDispose](): Promise<void>;
}> {
  const folder = await realpath(await mkdtemp(path.join(tmpdir(), 'weighbeam-cli-')));
  const write = (name: string, text: string | Uint8Array) => writeFile(path.join(folder, name), text);
  if (files === 'demo') await cp(demo, folder, { recursive: true });
  else for (const [name, text] of Object.entries(files)) await write(name, text);
  return { folder, write, [Symbol.asyncDispose]: () => rm(folder, { recursive: true }) };
}

/** The main case of the demo, as a colleague would type it. */
export const mainCase = [
  'firings-april.csv',
  '--of',
  'hardness',
  '--by',
  'schedule',
  '--test',
  'slow cool',
  '--reference',
  'standard',
  '--per',
  'firing',
  '--matters',
  '15',
  '--same',
  'Slow cool -> slow cool',
  '--leave-out',
  '31:tile cracked on the saw',
];
