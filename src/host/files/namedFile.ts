import { Uri, workspace } from 'vscode';
import type { NamedFile } from '../../protocol/toWorker';
import { diskPath, followLinks } from '../platform/disk.node';
import { openFile } from './openedFile';
import { rootOf } from './root';

/**
 * The file that a block of a notebook names: looked for from the root, then from the notebook's folder upwards. A name
 * that leads out of the root, by itself or through a link, is refused.
 */
export async function findNamedFile(name: string, notebook: Uri): Promise<NamedFile> {
  const root = rootOf(notebook);
  for (const folder of [root, ...foldersUpTo(root, notebook)]) {
    const uri = Uri.joinPath(folder, name);
    if (!isWithin(uri, root)) return { name, input: null, outside: true };
    if (!(await exists(uri))) continue;
    if (await leavesByLink(uri, root)) return { name, input: null, outside: true };
    const { input } = await openFile(uri, name);
    return { name, input, outside: false };
  }
  return { name, input: null, outside: false };
}

/** The notebook's folder and those above it, up to the root and without it. */
function foldersUpTo(root: Uri, notebook: Uri): readonly Uri[] {
  const folders: Uri[] = [];
  for (
    let folder = Uri.joinPath(notebook, '..');
    isWithin(folder, root);
    folder = Uri.joinPath(folder, '..')
  ) {
    folders.push(folder);
  }
  return folders;
}

function isWithin(uri: Uri, root: Uri): boolean {
  const base = root.path.endsWith('/') ? root.path : `${root.path}/`;
  return uri.scheme === root.scheme && uri.authority === root.authority && uri.path.startsWith(base);
}

const exists = (uri: Uri): Promise<boolean> =>
  Promise.resolve(workspace.fs.stat(uri)).then(
    () => true,
    () => false,
  );

async function leavesByLink(uri: Uri, root: Uri): Promise<boolean> {
  const [path, base] = [diskPath(uri), diskPath(root)];
  if (path === null || base === null) return false;
  const [real, realBase] = await Promise.all([followLinks(path), followLinks(base)]);
  return real !== null && realBase !== null && !isWithin(Uri.file(real), Uri.file(realBase));
}
