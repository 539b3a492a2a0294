import type { Say } from '../../core/model/say';
import { printThree, withMinus } from '../numbersPrinted';
import { visible } from './label';

/** A number with more significant digits than this was computed, not recorded. */
const MOST_RECORDED_DIGITS = 10;

/**
 * Words for sentences that are made from facts: computed numbers to three significant digits, recorded ones as they are,
 * and text of the file with what cannot be seen made visible.
 */
export const withFacts =
  (t: Say): Say =>
  (english, ...args) =>
    t(english, ...args.map(arg => (typeof arg === 'number' ? factText(arg) : visible(arg))));

function factText(value: number): string {
  if (!Number.isFinite(value)) return '\u2013';
  const digits = value.toExponential().split('e')[0]?.replace(/[-.]/g, '').length ?? 0;
  return digits > MOST_RECORDED_DIGITS ? printThree(value) : withMinus(String(value));
}
