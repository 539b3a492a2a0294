import { Uri, workspace } from 'vscode';
import { Refusal } from '../../core/model/problem';
import type { NamedFile } from '../../protocol/toWorker';
import { candidates } from '../../recheck/candidates';
import { diskPath, followLinks } from '../platform/disk.node';
import { savedFile } from './openedFile';
import { recordName, rootOf } from './root';

/**
 * The file that a block of a notebook names, as it is stored: looked for from the root, then from the notebook's folder upwards. A name
 * that leads out of the root, by itself or through a link, is refused.
 */
export async function findNamedFile(name: string, notebook: Uri): Promise<NamedFile> {
  const root = rootOf(notebook);
  const folder = Uri.joinPath(notebook, '..');
  const places = placesOf(name, folder.path === root.path ? '' : recordName(folder, root));
  if (places === null) return { name, input: null, outside: true };
  for (const place of places) {
    const uri = Uri.joinPath(root, place);
    if (!(await exists(uri))) continue;
    if (await leavesByLink(uri, root)) return { name, input: null, outside: true };
    return { name, input: await savedFile(uri, name), outside: false };
  }
  return { name, input: null, outside: false };
}

/** Where the file may stand, relative to the root; null for a name that leads out of it. */
function placesOf(name: string, notebookFolder: string): readonly string[] | null {
  try {
    return candidates(name, notebookFolder);
  } catch (error) {
    if (error instanceof Refusal) return null;
    throw error;
  }
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
