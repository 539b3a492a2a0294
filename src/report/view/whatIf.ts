import type { Comparison, Row } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { decisionWords } from '../words/decisionWords';
import { methodOf, reasonWords } from '../words/methodWords';
import type { Scale } from '../words/scale';
import { rulesOf } from './rules';
import { putsBack, rowTitle } from './rowTitle';
import type { RowShown, WhatIfShown } from './shown';
import { explainedBy, isSame, verdictSentence } from './verdictSentence';

/** The rows under other assumptions and what they say together: chosen first, then the order of the registry. */
export function whatIfOf(comparison: Comparison, scale: Scale, t: Say): WhatIfShown {
  const { whatIf, chosen } = comparison;
  const rows = [chosen, ...whatIf.rows.filter(row => !isSame(row, chosen))];
  const open = rows.filter(
    row => isSame(row, chosen) || (row.applies && (row.counted || isSameQuantity(row, chosen))),
  );
  const others = rows.filter(row => row.applies && !open.includes(row));
  const absent = rows.filter(row => !row.applies && !open.includes(row));
  const shown = (row: Row): RowShown => rowOf(row, comparison, scale, t);
  return {
    heading: t('Under other assumptions'),
    caption: t('Each row answers the same question under another assumption'),
    verdict: verdictSentence(comparison, scale, t),
    explained: explainedBy(comparison, t),
    sameData: t('The rows share the same data: agreement among them is not extra evidence.'),
    words: {
      assumption: t('assumption'),
      interval: t('interval'),
      decision: t('decision'),
      note: t('what it takes for granted'),
    },
    rows: open.map(shown),
    others:
      others.length === 0
        ? null
        : {
            summary: t('Other questions about the same values ({0}, not counted)', others.length),
            rows: others.map(shown),
          },
    notApplying:
      absent.length === 0
        ? null
        : {
            summary: t('Does not apply ({0})', absent.length),
            rows: absent.map(row => ({
              title: rowTitle(row, comparison, t),
              why: reasonWords(row, t) ?? '',
            })),
          },
    rules: rulesOf(comparison, scale, t),
  };
}

/** Rows of one quantity have one estimate: a bound or an uncounted rule of the same difference. */
function isSameQuantity(row: Row, chosen: Row): boolean {
  const estimate = row.result?.estimate ?? null;
  return estimate !== null && row.data === chosen.data && estimate === chosen.result?.estimate;
}

function rowOf(row: Row, comparison: Comparison, scale: Scale, t: Say): RowShown {
  const { chosen } = comparison;
  const method = methodOf(row.id);
  const isChosen = isSame(row, chosen);
  const { result } = row;
  const hasInterval = result !== null && (result.lower !== null || result.upper !== null);
  return {
    id: row.id,
    data: row.data,
    title: rowTitle(row, comparison, t),
    chosen: isChosen,
    chosenWord: isChosen ? t('chosen') : '',
    counted: row.counted,
    interval: scale.interval(result),
    decision: row.decision === null || (!row.counted && !isChosen) ? '' : decisionWords(row.decision, t),
    note:
      reasonWords(row, t) ?? (putsBack(row, comparison) ? t('what was left out counts') : method.assumes(t)),
    bar: hasInterval ? { estimate: result.estimate, lower: result.lower, upper: result.upper } : null,
  };
}
