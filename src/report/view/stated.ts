import type { Say } from '../../core/model/say';
import { visible } from '../words/label';

/** As typed, or that it was not stated. */
export const statedOr = (text: string, t: Say): string =>
  text.trim() === '' || text === 'not stated' ? t('not stated') : visible(text);
