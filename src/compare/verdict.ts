import { alphaOf } from '../core/methods/confidence';
import type { Row, WhatIf } from '../core/model/comparison';

/** How far from the line a p may lie for the line itself to be what is undecided (common practice, no source). */
const LINE_FACTOR = 1.5;

/**
 * Whether the decision depends on the choice, over the counted rows and the chosen one. 'on the line': decisions are mixed
 * and every counted p lies within a factor of 1.5 of 1 − confidence, so that no choice of method settles it.
 */
export function whatIfOf(rows: readonly Row[], chosen: Row, confidence: number): WhatIf {
  const counted = rows.flatMap((row, index) => (row.counted ? [index] : []));
  const heard = rows.filter(row => row.result !== null && (row.counted || row === chosen));
  const decisions = new Set(heard.map(row => row.decision));
  return {
    depends: decisions.size < 2 ? 'no' : onTheLine(heard, confidence) ? 'on the line' : 'yes',
    counted,
    rows,
  };
}

function onTheLine(rows: readonly Row[], confidence: number): boolean {
  const alpha = alphaOf(confidence);
  const ps = rows.flatMap(({ result }) => (result === null || result.p === null ? [] : [result.p]));
  return ps.length > 0 && ps.every(p => p >= alpha / LINE_FACTOR && p <= alpha * LINE_FACTOR);
}
