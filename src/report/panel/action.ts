import type { CellRef } from '../../core/model/problem';

/** What a control of the panel changes; the host asks for the new value by a quick pick or an input box. */
export type ChangeKey = 'question' | 'variance' | 'confidence' | 'measure' | 'matters' | 'margin';

/** What a person states for the record; it changes no number. */
export type StateKey = 'sampling' | 'analyst';

/** Everything that a control of the panel can ask of the host. The panel itself changes nothing. */
export type PanelAction =
  | { readonly kind: 'change'; readonly key: ChangeKey }
  | { readonly kind: 'state'; readonly key: StateKey }
  /** Go to the cell in the file. */
  | { readonly kind: 'show'; readonly at: CellRef }
  /** A point was clicked: go to its cell and offer to leave its row out. */
  | { readonly kind: 'point'; readonly at: CellRef }
  /** Use a left-out row again. */
  | { readonly kind: 'takeBack'; readonly file: number; readonly line: number }
  | { readonly kind: 'copyBlock' };

export type Send = (action: PanelAction) => void;
