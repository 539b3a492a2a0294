import { wordsOf } from '../../compare/varianceAssumption';
import { methodById } from '../../core/methods/index';
import type { Row } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { withFacts } from './withFacts';

/** Short name of a method; of one that this version does not know, its id. */
export const methodTitle = (id: string, t: Say): string => methodById(id)?.title(t) ?? id;

/** What choosing a method claims; '' for one that this version does not know. */
export const methodAssumes = (id: string, t: Say): string => methodById(id)?.assumes(t) ?? '';

/** Name of a method's statistic as printed: t, z, F. */
export const statisticName = (id: string, t: Say): string => methodById(id)?.statistic ?? t('statistic');

/** Whether rows of this method count where nothing speaks against them; bounds never do. */
export const usuallyCounted = (id: string): boolean => methodById(id)?.counted ?? false;

/** "separate variances", "pooled variance, normal curve": the chosen method as a phrase. */
export function assumptionPhrase(id: string, t: Say): string {
  const words = wordsOf(id);
  if (words === null) return methodTitle(id, t);
  const variance =
    words.variance === 'separate'
      ? t('separate variances')
      : words.variance === 'pooled'
        ? t('pooled variance')
        : t('known standard deviations');
  const rule = words.df === 'smaller' ? t('smaller df') : null;
  const curve = words.curve === 'normal' && words.variance !== 'known' ? t('normal curve') : null;
  return [variance, rule, curve].filter(part => part !== null).join(', ');
}

/** The sentence for a row's reason, in its method's own words; null where it has none. */
export function reasonWords({ id, reason }: Pick<Row, 'id' | 'reason'>, t: Say): string | null {
  return reason === null ? null : (methodById(id)?.why(reason, withFacts(t)) ?? reason.code);
}
