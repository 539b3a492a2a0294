import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { notebookParagraph } from './paragraph';
import { isStated, statedOr } from './stated';
import { changedSentences } from './changed';
import type { ViewContext } from './context';
import type { StateKey } from '../panel/action';
import type { Scale } from '../words/scale';
import type { NotebookShown } from './shown';

/** What goes into the notebook: what a person states, what was changed after a result was seen, the block. */
export function notebookOf(comparison: Comparison, context: ViewContext, scale: Scale): NotebookShown {
  const { t, provenance, blockText } = context;
  return {
    heading: t('For the notebook'),
    states: [
      stateOf('sampling', t('Sampling'), provenance.sampling, '--sampling "..."', t),
      stateOf('analyst', t('Analyst'), provenance.analyst, '--analyst "..."', t),
    ],
    changed: changedSentences(provenance, comparison, t),
    isChanged: provenance.changed.length > 0 || comparison.leftOut.some(row => row.afterResult),
    blockHeading: t('Settings block'),
    blockText,
    noBlock: blockText === null ? noBlock(comparison, t) : null,
    paragraph: notebookParagraph(comparison, context, scale),
  };
}

function stateOf(
  key: StateKey,
  label: string,
  text: string,
  flag: string,
  t: Say,
): NotebookShown['states'][number] {
  return { key, label, value: statedOr(text, t), flag: isStated(text) ? null : flag };
}

const noBlock = ({ open }: Comparison, t: Say): string =>
  open.length > 0
    ? t('No settings block until the open question is answered.')
    : t('No settings block: what was compared is not what stands in the file.');
