import type { Say } from '../../core/model/say';

/** "1.0 to 4.5", "at least 1.0", "at most 4.5". */
export function boundsWords(
  lower: number | null,
  upper: number | null,
  text: (limit: number) => string,
  t: Say,
): string {
  if (lower !== null && upper !== null) return t('{0} to {1}', text(lower), text(upper));
  return lower !== null ? t('at least {0}', text(lower)) : t('at most {0}', text(upper ?? Number.NaN));
}
