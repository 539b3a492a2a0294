import type { Say } from '../../core/model/say';
import { visible } from '../words/label';

export const isStated = (text: string): boolean => text.trim() !== '' && text !== 'not stated';

/** As typed, or that it was not stated. */
export const statedOr = (text: string, t: Say): string => (isStated(text) ? visible(text) : t('not stated'));
