import type { Memento, Uri } from 'vscode';
import { readRequest } from '../../protocol/request';
import type { Request } from '../../compare/request';

const keyOf = (files: readonly Uri[]): string => `answers ${files.map(String).join(' ')}`;

/** The answers given last time for these files; null when there were none, or an older version wrote them. */
export function rememberedAnswers(state: Memento, files: readonly Uri[]): Partial<Request> | null {
  try {
    const kept = state.get(keyOf(files));
    return kept === undefined ? null : readRequest(kept);
  } catch {
    return null;
  }
}

/** Keeps what was answered, without the rows: they belong to a selection, not to a habit. */
export async function rememberAnswers(
  state: Memento,
  files: readonly Uri[],
  request: Request,
): Promise<void> {
  const passing: readonly string[] = ['files', 'wish', 'rows', 'leaveOut', 'confidence'];
  const answers = Object.entries(request).filter(([key]) => !passing.includes(key));
  await state.update(keyOf(files), Object.fromEntries(answers));
}
