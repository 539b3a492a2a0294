import { realpath, stat } from 'node:fs/promises';
import path from 'node:path';
import { Refusal } from '../core/model/problem';
import { candidates } from '../recheck/candidates';
import { refusePipe } from './regularFile';
import { UsageError } from './usageError';

/** A file by its place on disk and by its name from the root, with / between folders. */
export interface NamedFile {
  readonly file: string;
  readonly name: string;
}

/** Whether a path lies in a folder or is it; both without links. */
const isInside = (folder: string, file: string): boolean => {
  const relative = path.relative(folder, file);
  return relative !== '..' && !relative.startsWith(`..${path.sep}`) && !path.isAbsolute(relative);
};

const slashes = (name: string): string => name.split(path.sep).join('/');

/** The folder that --root names, without links. Throws UsageError where it is none. */
async function realRoot(cwd: string, root: string): Promise<string> {
  const folder = await realpath(path.resolve(cwd, root)).catch(() => null);
  if (folder !== null && (await stat(folder)).isDirectory()) return folder;
  throw new UsageError(
    `--root ${root} is no folder`,
    'Name the folder that file names in blocks start from; it is looked for from the current one.',
  );
}

async function real(file: string, name: string): Promise<string> {
  await refusePipe(file, name);
  return realpath(file).catch(() => {
    throw new Refusal('file-not-found', { name }, name);
  });
}

/** The deepest folder that holds all of these files. */
const commonFolder = (files: readonly string[]): string =>
  files
    .map(file => path.dirname(file))
    .reduce((folder, other) => {
      let common = folder;
      while (!isInside(common, other)) common = path.dirname(common);
      return common;
    });

/**
 * Names data files as a settings block will: from the root, which is `root` or else the current directory. A file
 * outside a root that was given is refused, after links are resolved, and so is a file that is named twice; outside the current directory the folder that
 * holds the files becomes the root. Errors: file-not-found, file-outside-root.
 */
export async function nameFiles(
  files: readonly string[],
  cwd: string,
  root: string | undefined,
): Promise<readonly NamedFile[]> {
  const base = root === undefined ? await realpath(cwd) : await realRoot(cwd, root);
  const reals = await Promise.all(files.map(file => real(path.resolve(cwd, file), file)));
  const twice = reals.findIndex((file, index) => reals.indexOf(file) !== index);
  if (twice >= 0) {
    const first = files[reals.indexOf(reals[twice] ?? '')] ?? '';
    throw new UsageError(`${first} and ${files[twice] ?? ''} are the same file`, 'Name each file once.');
  }
  const outside = reals.findIndex(file => !isInside(base, file));
  if (outside >= 0 && root !== undefined) {
    throw new Refusal('file-outside-root', { name: files[outside] ?? '', root }, files[outside] ?? null);
  }
  const from = outside >= 0 ? commonFolder(reals) : base;
  return reals.map(file => ({ file, name: slashes(path.relative(from, file)) }));
}

/**
 * Finds the file that a block of `notebook` names: from the root, else from the folders between the notebook and the
 * root, nearest first; null when it is nowhere. Throws file-outside-root for a path that leaves the root, also by a link.
 */
export async function findNamed(name: string, root: string, notebook: string): Promise<string | null> {
  const base = await realpath(root);
  const notebookFolder = path.relative(base, path.dirname(await realpath(notebook)));
  for (const candidate of candidates(name, slashes(notebookFolder))) {
    const found = await realpath(path.resolve(base, candidate)).catch(() => null);
    if (found === null) continue;
    if (!isInside(base, found)) {
      throw new Refusal('file-outside-root', { name, root: path.basename(base) }, name);
    }
    return found;
  }
  return null;
}

/** The root of a recheck: what was given, else the current directory, else (notebook elsewhere) the notebook's folder. */
export async function rootOf(notebook: string, cwd: string, given: string | undefined): Promise<string> {
  if (given !== undefined) return realRoot(cwd, given);
  const here = await realpath(cwd);
  const folder = path.dirname(await realpath(notebook));
  return isInside(here, folder) ? here : folder;
}
