import type { Uri } from 'vscode';
import type { Request } from '../../compare/request';
import type { TextSpan } from '../../protocol/files';

/** The files a comparison is about, and the folder their names in records are relative to. */
export interface Subject {
  readonly files: readonly Uri[];
  readonly root: Uri;
  /** What was selected in the text of the only file, as long as it could not be told which rows that is. */
  readonly spans: readonly TextSpan[];
}

/** What makes two comparisons the same one: files, columns and rows; not the question or the method. */
export function subjectKey({ files }: Subject, request: Request): string {
  const { measured, label, columns, summary, rows, where, measure } = request;
  return JSON.stringify([files.map(String), measured, label, columns, summary, rows, where, measure]);
}
