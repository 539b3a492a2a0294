import { canBeMeasured, looksLikeIds } from './columnRoles';
import type { Asker } from './askContext';

/** Which columns are the groups, when each group has a column of its own. */
export const columnsStep: Asker = context => {
  const { t, request, remembered } = context;
  if (request.columns === undefined || request.columns.length > 0) return null;
  const columns = context.columns.filter(canBeMeasured);
  const before = remembered?.columns ?? [];
  const kept = columns.flatMap((column, index) => (before.includes(column.name) ? [index] : []));
  const guessed = columns
    .flatMap((column, index) => (looksLikeIds(column, context.rows) ? [] : [index]))
    .slice(0, 2);
  return {
    kind: 'many',
    title: t('Which columns are the groups?'),
    prompt: t('Pick two columns; their names are the labels'),
    items: columns.map(column => ({
      label: column.name,
      description: column.unit === null ? t('numbers') : t('numbers, {0}', column.unit),
      detail: t('{0} values · {1} missing', column.values, column.missing),
      adds: { columns: [column.name] },
    })),
    likely: kept.length >= 2 ? kept : guessed,
    least: 2,
  };
};
