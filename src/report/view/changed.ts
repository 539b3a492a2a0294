import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import type { Change, OptionValue, Provenance } from '../../core/model/settings';
import { visible } from '../words/label';

/** One sentence a change made after a result was seen, or that there was none. */
export function changedSentences(provenance: Provenance, { leftOut }: Comparison, t: Say): readonly string[] {
  const late = leftOut.filter(row => row.afterResult).length;
  const sentences = [
    ...provenance.changed.map(change => changeSentence(change, t)),
    ...(late === 0
      ? []
      : [
          late === 1
            ? t('1 row was left out after the result was seen.')
            : t('{0} rows were left out after the result was seen.', late),
        ]),
  ];
  return sentences.length === 0 ? [t('Nothing was changed after the result was seen.')] : sentences;
}

function changeSentence({ key, from, to, reason }: Change, t: Say): string {
  const change = t(
    'After the result was seen, {0} was changed from {1} to {2}',
    key,
    optionText(from),
    optionText(to),
  );
  return reason === '' ? t('{0}; no reason given.', change) : t('{0}: {1}.', change, visible(reason));
}

const optionText = (value: OptionValue): string =>
  typeof value === 'object' ? value.join(', ') : typeof value === 'string' ? visible(value) : String(value);
