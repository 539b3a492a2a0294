import { realpath } from 'node:fs/promises';
import type { Uri } from 'vscode';

/** The path of a file that lies on this machine's disk, so that the worker can stream it; null: elsewhere. */
export const diskPath = (uri: Uri): string | null => (uri.scheme === 'file' ? uri.fsPath : null);

/** The path with every link followed, or null when nothing is there. */
export const followLinks = (path: string): Promise<string | null> => realpath(path).catch(() => null);
