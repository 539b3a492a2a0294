import { wordsOf } from '../../compare/varianceAssumption';
import { methodById } from '../../core/methods/index';
import type { Row } from '../../core/model/comparison';
import type { MethodDescriptor } from '../../core/model/methods';
import type { Say } from '../../core/model/say';
import { withFacts } from './withFacts';

/** The description of a row's method; a row always bears an id of the registry. */
export function methodOf(id: string): MethodDescriptor {
  const found = methodById(id);
  if (found === undefined) throw new RangeError(`no method ${id}`);
  return found;
}

/** "separate variances", "pooled variance, normal curve": the chosen method as a phrase. */
export function assumptionPhrase(id: string, t: Say): string {
  const words = wordsOf(id);
  if (words === null) return methodOf(id).title(t);
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
  return reason === null ? null : methodOf(id).why(reason, withFacts(t));
}
