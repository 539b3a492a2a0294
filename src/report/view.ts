import type { Comparison } from '../core/model/comparison';
import type { Say } from '../core/model/say';
import { answerOf } from './view/answer';
import type { ViewContext } from './view/context';
import { figureData } from './view/figureData';
import { findingsOf } from './view/findings';
import { leftOutOf } from './view/leftOut';
import { notebookOf } from './view/notebook';
import { numbersTable } from './view/numbersTable';
import { recordOf } from './view/record';
import type { ButtonWords, View } from './view/shown';
import { severalTables } from './view/severalTables';
import { whatIfOf } from './view/whatIf';
import { estimateName } from './words/estimates';
import { measuredName } from './words/measuredName';
import { scaleOf } from './words/scale';

export type { ViewContext } from './view/context';
export type { View } from './view/shown';

/**
 * A comparison in words and printed numbers, as plain data that can be sent to another thread. Panel, terminal, notebook
 * entry and page are made from it alone, so that they say the same.
 */
export function viewOf(comparison: Comparison, context: ViewContext): View {
  const { t, table } = context;
  const scale = scaleOf(comparison, t);
  return {
    title: titleOf(comparison, t),
    answer: answerOf(comparison, context.provenance.questionInWords, scale, t),
    figure: figureData(comparison, table, scale, t),
    whatIf: whatIfOf(comparison, scale, t),
    findings: findingsOf(comparison, t),
    numbers: numbersTable(comparison, scale, t),
    tables: severalTables(comparison, scale, t),
    leftOut: leftOutOf(comparison, table, scale, t),
    notebook: notebookOf(comparison, context, scale),
    record: recordOf(comparison, context),
    words: buttonWords(t),
    columns: comparison.columns.map(column => viewOf(column, context)),
  };
}

/** "hardness: slow cool − standard". */
function titleOf(comparison: Comparison, t: Say): string {
  const labels = estimateName(comparison, t);
  return comparison.measured === '' ? labels : t('{0}: {1}', measuredName(comparison), labels);
}

const buttonWords = (t: Say): ButtonWords => ({
  show: t('Show'),
  takeBack: t('Take back'),
  copyBlock: t('Copy block'),
  full: t('Every number in full'),
  values: t('Every value with its line: go there, or leave the row out'),
  ask: t('ask'),
  theFile: t('the file:'),
  leftOut: t('left out:'),
});
