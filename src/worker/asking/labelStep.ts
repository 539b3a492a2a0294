import { canBeLabels, groupsSpelled, looksLikeIds, saysOutcome } from './columnRoles';
import { choice, isAnswered, type AskContext, type Asker, type ColumnFacts } from './askContext';

const SHOWN = 4;

/** Which column says what group a value belongs to. */
export const labelStep: Asker = context => {
  const { t, request, files } = context;
  if (isAnswered(context, 'label', 'label') || request.columns !== undefined || files.length > 1) return null;
  const measured = request.measured ?? [];
  const columns = context.columns.filter(column => canBeLabels(column) && !measured.includes(column.name));
  const items = columns.map(column => ({
    label: column.name,
    description: t('{0} labels', column.distinct),
    detail: shownLabels(context, column),
    adds: { label: column.name },
  }));
  const only = items[0];
  if (only === undefined) return null;
  if (items.length === 1) return { plain: only.adds };
  const ranked = columns
    .map((column, index) => ({ index, score: likelihood(column, context) }))
    .sort((a, b) => b.score - a.score || a.index - b.index);
  return choice(
    context,
    { title: t('What are the groups?'), prompt: t('The column that holds the group labels'), items },
    ranked[0]?.index,
  );
};

function shownLabels({ t }: AskContext, column: ColumnFacts): string {
  const parts = column.labels.slice(0, SHOWN).map(({ label, count }) => `${label} (${count})`);
  const more = column.distinct - parts.length;
  return more > 0 ? t('{0} and {1} more', parts.join(', '), more) : parts.join(', ');
}

function likelihood(column: ColumnFacts, context: AskContext): number {
  let score = 0;
  if (context.picked?.includes(column.name) === true) score += 8;
  if (column.kind === 'label') score += 4;
  if (groupsSpelled(column) === 2) score += 4;
  if (saysOutcome(column)) score -= 3;
  if (looksLikeIds(column, context.rows)) score -= 4;
  return score - column.distinct / 100;
}
