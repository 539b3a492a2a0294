import type { Uri } from 'vscode';
export type Where = Uri;
