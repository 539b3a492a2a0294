import type { ComponentChildren } from 'preact';
import type { Send } from './action';

interface FoldProps {
  readonly summary: string;
  readonly send: Send | null;
  readonly children: ComponentChildren;
}

/** A folded part; on a page it stands open. */
export function Fold({ summary, send, children }: FoldProps) {
  return (
    <details class="wb-fold" open={send === null}>
      <summary>{summary}</summary>
      {children}
    </details>
  );
}
