import { FileSystemError, l10n, workspace, type TextDocument, type Uri } from 'vscode';
import { RefusedError } from '../compute/computeClient';
import { diskPath } from '../platform/disk.node';
import type { FileInput } from '../../protocol/files';
import { lastPart } from './root';

export interface OpenedFile {
  readonly input: FileInput;
  /** The editor's text differs from the file: what is computed from it can't be repeated from the file. */
  readonly unsaved: boolean;
}

/** The document of a file, when an editor holds its text. Above 50 MB there is none. */
export const documentOf = (uri: Uri): TextDocument | undefined =>
  workspace.textDocuments.find(document => document.uri.toString() === uri.toString() && !document.isClosed);

/**
 * A file as the worker gets it: the editor's text where that is not saved, else as it is stored. Rejects with RefusedError
 * when nothing is there.
 */
export async function openFile(uri: Uri, name: string): Promise<OpenedFile> {
  const document = documentOf(uri);
  if (document === undefined || !(document.isDirty || document.isUntitled))
    return { input: await savedFile(uri, name), unsaved: false };
  const bytes = new TextEncoder().encode(document.getText());
  return { input: { name, path: null, bytes, stamp: await stampOf(uri, bytes) }, unsaved: true };
}

/** A file as it is stored: a path where there is a disk, else its bytes. Rejects with RefusedError. */
export async function savedFile(uri: Uri, name: string): Promise<FileInput> {
  try {
    const { mtime, size } = await workspace.fs.stat(uri);
    const path = diskPath(uri);
    if (path !== null) return { name, path, bytes: null, stamp: `${uri.toString()} ${mtime} ${size}` };
    const bytes = await workspace.fs.readFile(uri);
    return { name, path, bytes, stamp: await stampOf(uri, bytes) };
  } catch (error) {
    throw notThere(uri, error);
  }
}

/** Versions of a document begin anew when it is opened again, and a file system may not tell times: the bytes do. */
async function stampOf(uri: Uri, bytes: Uint8Array): Promise<string> {
  const digest = new Uint8Array(await crypto.subtle.digest('SHA-256', Uint8Array.from(bytes)));
  return `${uri.toString()} ${Array.from(digest, byte => byte.toString(16).padStart(2, '0')).join('')}`;
}

function notThere(uri: Uri, error: unknown): RefusedError {
  const missing = error instanceof FileSystemError && error.code === 'FileNotFound';
  return new RefusedError({
    code: 'file-not-found',
    message: missing
      ? l10n.t('{0} is not there any more.', lastPart(uri))
      : l10n.t('{0} could not be read.', lastPart(uri)),
    where: uri.path,
    fix: l10n.t('Put the file back or choose another one, then run the comparison again.'),
    at: null,
  });
}
