import type { OptionSpec } from '../model/methods';
import type { Say } from '../model/say';
import type { Settings } from '../model/settings';

/** A number above or below which a check speaks up: visible, changeable, and part of the settings block. */
interface Threshold extends OptionSpec {
  readonly kind: 'number';
  readonly default: number;
}

export function threshold(key: string, value: number, says: (t: Say) => string): Threshold {
  return { key, flag: key, kind: 'number', default: value, min: 0, says };
}

/** The threshold in force. */
export function valueOf({ key, default: usual }: Threshold, settings: Settings): number {
  const set = settings.options[key];
  return typeof set === 'number' ? set : usual;
}
