import type { ButtonWords } from '../view/shown';
import type { Send } from './action';

/** What every part of the panel is given. `send` is null on a page: there nothing can be pressed and nothing is folded. */
export interface Part<Shown> {
  readonly shown: Shown;
  readonly words: ButtonWords;
  readonly send: Send | null;
}
