import { alikeLabels } from '../../core/evidence/alikeLabels';
import type { ColumnFacts } from './askContext';

const MOST_LABELS = 50;
const ID_NAME = /(^|[\s_.-])(id|ids|no|nr|num|number|index|idx|row|line|date|day|time|year|week)($|[\s_.-])/i;
const OUTCOME = /^(yes|no|y|n|true|false|pass(ed)?|fail(ed)?|ok|nok|intact|broken)$/i;
const REFERENCE_LABEL =
  /^(standard|control|reference|ref|baseline|before|blank|untreated|placebo|old|current|usual|none)\b/i;

/** Holds numbers, at least in half of its cells that are filled. */
export const canBeMeasured = (column: ColumnFacts): boolean =>
  column.kind === 'number' || (column.kind === 'mixed' && column.values >= column.texts);

/** Has few enough labels that come again. */
export const canBeLabels = (column: ColumnFacts): boolean =>
  column.kind !== 'empty' &&
  column.distinct >= 2 &&
  column.distinct <= MOST_LABELS &&
  !column.nearlyUnique &&
  !hasFractions(column);

/** Could name units or partners: ids, labels, dates; anything that is not a measured number with decimals. */
export const canBeIds = (column: ColumnFacts): boolean =>
  column.kind !== 'empty' && column.distinct >= 2 && !hasFractions(column);

/** Two words and no third: yes and no, pass and fail. */
export const hasTwoOutcomes = (column: ColumnFacts): boolean =>
  column.kind === 'label' && column.distinct === 2 && column.labels.length === 2;

/** Numbers that rather name things than measure them: their name says so, they count up, or few of them come again and again. */
export function looksLikeIds(column: ColumnFacts, rows: number): boolean {
  if (column.kind !== 'number' || column.unit !== null || hasFractions(column)) return false;
  if (ID_NAME.test(column.name)) return true;
  const span = column.min === null || column.max === null ? Infinity : column.max - column.min + 1;
  return span === column.distinct && (column.distinct === rows || column.distinct * 2 <= rows);
}

/** How many labels there are when those that look alike count once. */
export function groupsSpelled(column: ColumnFacts): number {
  const alike = alikeLabels(column.labels.map(({ label }) => label));
  return column.distinct - alike.reduce((surplus, set) => surplus + set.length - 1, 0);
}

/** Yes and no, passed and failed: rather what came out than what was done. */
export const saysOutcome = (column: ColumnFacts): boolean =>
  column.labels.every(({ label }) => OUTCOME.test(label.trim()));

/** How likely it is that a column holds what was measured: it has a unit or decimals, and names nothing. */
export const measuredLikelihood = (column: ColumnFacts, rows: number): number =>
  (looksLikeIds(column, rows) ? 0 : 4) + (column.unit !== null ? 2 : hasFractions(column) ? 1 : 0);

/** Whether a label is one that usually names what is compared against. */
export const soundsLikeReference = (label: string): boolean => REFERENCE_LABEL.test(label.trim());

function hasFractions(column: ColumnFacts): boolean {
  if (column.kind !== 'number') return false;
  if (column.min !== null && !Number.isInteger(column.min)) return true;
  if (column.max !== null && !Number.isInteger(column.max)) return true;
  return column.labels.some(({ label }) => /\d[.,]\d/.test(label));
}
