import type { Request } from '../../compare/request';
import type { AskContext } from './askContext';

export interface GroupLabel {
  readonly label: string;
  /** Rows that carry it, or values of its column; null: not known before the file is read. */
  readonly rows: number | null;
}

/** The groups that can be compared, in order of first appearance; labels declared the same count once. */
export function groupLabels(context: AskContext): readonly GroupLabel[] {
  const { request, columns, files } = context;
  if (files.length > 1) return files.map(label => ({ label, rows: null }));
  if (request.columns !== undefined) {
    return request.columns.map(name => ({
      label: name,
      rows: columns.find(column => column.name === name)?.values ?? null,
    }));
  }
  const column = columns.find(({ name }) => name === request.label);
  const merged = new Map<string, number>();
  for (const { label, count } of column?.labels ?? []) {
    if (label === '') continue;
    const name = mergedInto(label, request);
    merged.set(name, (merged.get(name) ?? 0) + count);
  }
  return [...merged].map(([label, rows]) => ({ label, rows }));
}

/** The group a label belongs to: its own, or the one it was declared the same as. */
export const mergedInto = (label: string, request: Partial<Request>): string =>
  request.same?.find(([from]) => from === label)?.[1] ?? label;
