import type { Count } from '../../core/model/groups';
import { printShare } from '../numbersPrinted';

/** "12/36 (33%)": numerator and denominator before the percentage. */
export const shareWords = ({ x, n }: Pick<Count, 'x' | 'n'>): string =>
  n > 0 ? `${x}/${n} (${printShare(x, n)}%)` : `${x}/${n}`;
