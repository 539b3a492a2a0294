import type { Uri } from 'vscode';

/** No file lies on a disk that a browser could stream from. */
export const diskPath: (uri: Uri) => string | null = () => null;

/** There are no links to follow. */
export const followLinks = (path: string): Promise<string | null> => Promise.resolve(path);
