import type { ComponentChildren } from 'preact';
import type { PanelAction, Send } from './action';

interface ButtonProps {
  readonly action: PanelAction;
  readonly send: Send | null;
  /** What it acts on, for those who do not see beside what it stands. */
  readonly about?: string;
  readonly kind?: 'plain' | 'main' | 'control';
  readonly children: ComponentChildren;
}

/** A button that asks the host for something; nothing on a page. */
export function Button({ action, send, about, kind = 'plain', children }: ButtonProps) {
  if (send === null) return null;
  return (
    <button type="button" class={`wb-button wb-button-${kind}`} title={about} onClick={() => send(action)}>
      {children}
      {about !== undefined && <span class="wb-unseen"> {about}</span>}
    </button>
  );
}
