import { Uri, workspace } from 'vscode';

/** The folder that names in records are relative to: the workspace folder that holds the file, else the file's own. */
export const rootOf = (uri: Uri): Uri => workspace.getWorkspaceFolder(uri)?.uri ?? Uri.joinPath(uri, '..');

/** The name of a file as records write it: relative to the root, with '/'; just its last part when it lies elsewhere. */
export function recordName(uri: Uri, root: Uri): string {
  const base = root.path.endsWith('/') ? root.path : `${root.path}/`;
  const within = uri.scheme === root.scheme && uri.authority === root.authority && uri.path.startsWith(base);
  return within ? uri.path.slice(base.length) : lastPart(uri);
}

/** The file's own name, without its folders. */
export const lastPart = (uri: Uri): string => uri.path.slice(uri.path.lastIndexOf('/') + 1);
