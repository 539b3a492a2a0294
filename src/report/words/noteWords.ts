import type { Reason, Say } from '../../core/model/say';
import { methodTitle } from './methodWords';
import { withFacts } from './withFacts';

/** What was decided for the person, or met on the way, in one sentence. */
export function noteWords({ code, facts }: Reason, words: Say): string {
  const t = withFacts(words);
  const text = (key: string): string => {
    const fact = facts[key];
    return Array.isArray(fact) ? fact.join(', ') : String(fact ?? '');
  };
  const count = Number(facts['count']);
  switch (code) {
    case 'first-is-test':
      return t(
        'No group was named: {0}, which comes first, is the test group, {1} the reference.',
        text('test'),
        text('reference'),
      );
    case 'success-is':
      return t('No outcome was named: {0} is counted.', text('success'));
    case 'success-never':
      return t('The outcome {0} never occurs; the outcomes are: {1}.', text('success'), text('outcomes'));
    case 'outcomes-joined':
      return t(
        'Counted is {0}; taken together as the other outcome: {1}.',
        text('success'),
        text('outcomes'),
      );
    case 'summary-only':
      return t('Only n, mean and SD were given: no check of the data was possible.');
    case 'curve-resolved':
      return t(
        'Both groups have more than 30 values: by the rule asked for, the normal curve is used ({0}).',
        methodTitle(text('method'), words),
      );
    case 'confidence-low':
      return t('A confidence of {0} is unusually low.', Number(facts['confidence']));
    case 'rows-without-label':
      return count === 1
        ? t('1 row has no label and is not used.')
        : t('{0} rows have no label and are not used.', count);
    case 'groups-not-compared':
      return count === 1
        ? t('1 row belongs to another group and is not compared.')
        : t('{0} rows belong to other groups and are not compared.', count);
    case 'rows-without-id':
      return count === 1
        ? t('1 row has no id of its unit or pair and is not used.')
        : t('{0} rows have no id of their unit or pair and are not used.', count);
    default:
      return t('{0}: {1}', code, Object.keys(facts).map(text).join(', '));
  }
}
