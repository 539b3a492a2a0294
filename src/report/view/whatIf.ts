import type { Comparison, Row } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { decisionWords } from '../words/decisionWords';
import { onOneAxis } from '../words/estimates';
import { methodAssumes, reasonWords, usuallyCounted } from '../words/methodWords';
import { intervalOfRow, type Scale } from '../words/scale';
import { rulesOf } from './rules';
import { putsBack, rowTitle } from './rowTitle';
import type { RowShown, WhatIfShown } from './shown';
import { explainedBy, isSame, verdictSentence, verdictShort } from './verdictSentence';

/** The rows under other assumptions and what they say together: chosen first, then the order of the registry. */
export function whatIfOf(comparison: Comparison, scale: Scale, t: Say): WhatIfShown {
  const { whatIf, chosen } = comparison;
  const rows = [chosen, ...whatIf.rows.filter(row => !isSame(row, chosen))];
  const open = rows.filter(row => isSame(row, chosen) || row.counted || isBound(row, chosen));
  const others = rows.filter(row => !open.includes(row) && row.applies && !isDoubted(row));
  const absent = rows.filter(row => !open.includes(row) && !others.includes(row));
  const shown = (row: Row): RowShown => rowOf(row, comparison, scale, t);
  return {
    heading: t('Under other assumptions'),
    caption: t('Each row answers the same question under another assumption'),
    verdict: verdictSentence(comparison, scale, t),
    verdictShort: verdictShort(comparison, scale, t),
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
            summary: absent.some(row => row.applies)
              ? t('Does not apply or is not relied on ({0})', absent.length)
              : t('Does not apply ({0})', absent.length),
            rows: absent.map(row => ({
              title: rowTitle(row, comparison, t),
              why: reasonWords(row, t) ?? '',
            })),
          },
    rules: rulesOf(comparison, scale, t),
  };
}

/** A method that never counts but is about the same difference: it has the same estimate. */
function isBound(row: Row, chosen: Row): boolean {
  const estimate = row.result?.estimate ?? null;
  const same = estimate !== null && row.data === chosen.data && estimate === chosen.result?.estimate;
  return same && row.applies && onOneAxis(row, chosen) && !usuallyCounted(row.id);
}

/** Counted on other data, but something speaks against it on these. */
const isDoubted = (row: Row): boolean => row.reason !== null && usuallyCounted(row.id);

function rowOf(row: Row, comparison: Comparison, scale: Scale, t: Say): RowShown {
  const { chosen } = comparison;
  const isChosen = isSame(row, chosen);
  const { result } = row;
  const hasInterval =
    result !== null && (result.lower !== null || result.upper !== null) && onOneAxis(row, chosen);
  return {
    id: row.id,
    data: row.data,
    title: rowTitle(row, comparison, t),
    chosen: isChosen,
    chosenWord: isChosen ? t('chosen') : '',
    counted: row.counted,
    interval: intervalOfRow(row, comparison, scale, t),
    decision: row.decision === null || (!row.counted && !isChosen) ? '' : decisionWords(row.decision, t),
    note:
      reasonWords(row, t) ??
      (putsBack(row, comparison) ? t('what was left out counts') : methodAssumes(row.id, t)),
    bar: hasInterval ? { estimate: result.estimate, lower: result.lower, upper: result.upper } : null,
  };
}
