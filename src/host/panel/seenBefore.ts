import type { Memento } from 'vscode';
import { readSeen, type Seen } from '../../protocol/session';

const keyOf = (cells: string): string => `seen ${cells}`;

/** How often results on these cells were seen, and what was asked the first time; kept when panels are closed. */
export const seenBefore = (state: Memento, cells: string): Seen | null => readSeen(state.get(keyOf(cells)));

export const keepSeen = (state: Memento, cells: string, seen: Seen): Thenable<void> =>
  state.update(keyOf(cells), seen);
