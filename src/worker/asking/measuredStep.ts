import type { StepItem } from '../../protocol/asking';
import { choice, isAnswered, type AskContext, type Asker, type ColumnFacts } from './askContext';
import { canBeLabels, canBeMeasured, hasTwoOutcomes, measuredLikelihood } from './columnRoles';

/** Which column holds the values, or which columns hold one group each. */
export const measuredStep: Asker = context => {
  if (isAnswered(context, 'measured', 'measured', 'columns', 'summary', 'typed')) return null;
  const measurable = narrowed(context, context.columns.filter(canBeMeasured));
  const labels = context.columns.filter(canBeLabels);
  const items: StepItem[] = measurable.map(column => numberItem(context, column));
  const wide = context.files.length === 1 && measurable.length > 1;
  const likelihoods = measurable.map(column => measuredLikelihood(column, context.rows));
  let guess = Math.max(0, likelihoods.indexOf(Math.max(...likelihoods)));

  if (wide) {
    const pair = context.picked?.length === 2 && measurable.length === 2 ? measurable : null;
    if (pair !== null || labels.length === 0) guess = items.length;
    items.push(wideItem(context, pair));
  }
  const groupings = labels.filter(column => column.kind === 'label' || column.distinct === 2);
  // A column that alone can name the groups is no outcome.
  const outcomes = context.columns.filter(
    column => hasTwoOutcomes(column) && groupings.some(other => other !== column),
  );
  for (const column of narrowed(context, outcomes)) {
    items.push(outcomeItem(context, column));
  }
  const summary = summaryItem(context);
  if (summary !== null) {
    guess = items.length;
    items.push(summary);
  }
  const only = items[0];
  if (only === undefined) return null;
  if (items.length === 1) return { plain: only.adds };
  return choice(
    context,
    {
      title: context.t('What was measured?'),
      prompt: context.t('The column that holds the values'),
      items,
    },
    guess,
  );
};

/** The columns the selection singled out, when one of them will do. */
function narrowed(context: AskContext, columns: readonly ColumnFacts[]): readonly ColumnFacts[] {
  const { picked } = context;
  const within = picked === null ? [] : columns.filter(column => picked.includes(column.name));
  return within.length > 0 ? within : columns;
}

function numberItem({ t }: AskContext, column: ColumnFacts): StepItem {
  const facts = [t('{0} values', column.values)];
  if (column.missing > 0) facts.push(t('{0} missing', column.missing));
  if (column.texts > 0) facts.push(t('{0} cells are text', column.texts));
  if (column.min !== null && column.max !== null) facts.push(t('{0} to {1}', column.min, column.max));
  return {
    label: column.name,
    description: column.unit === null ? t('numbers') : t('numbers, {0}', column.unit),
    detail: facts.join(' · '),
    adds: { measured: [column.name] },
  };
}

function wideItem({ t }: AskContext, pair: readonly ColumnFacts[] | null): StepItem {
  const detail = t('Each group has a column of its own; its name is the label');
  return pair === null
    ? { label: t('One column for each group…'), description: '', detail, adds: { columns: [] } }
    : {
        label: t('{0} and {1}', pair[0]?.name ?? '', pair[1]?.name ?? ''),
        description: t('one column for each group'),
        detail,
        adds: { columns: pair.map(column => column.name) },
      };
}

function outcomeItem({ t }: AskContext, column: ColumnFacts): StepItem {
  const [a, b] = column.labels;
  return {
    label: column.name,
    description: t(
      'two outcomes: {0} ({1}), {2} ({3})',
      a?.label ?? '',
      a?.count ?? 0,
      b?.label ?? '',
      b?.count ?? 0,
    ),
    detail: t('The shares of one outcome are compared'),
    adds: { measured: [column.name], measure: 'proportion' },
  };
}

/** A file of summaries: a row a group with its n, mean and SD, or with how many of how many. */
function summaryItem({ t, columns }: AskContext): StepItem | null {
  const has = (name: string): boolean => columns.some(column => column.name.trim().toLowerCase() === name);
  const label = columns.find(({ kind }) => kind === 'label');
  const means = has('n') && has('mean') && has('sd');
  if (label === undefined || !(means || (has('x') && has('n')))) return null;
  return {
    label: t('Each row is a summary'),
    description: means ? 'n, mean, sd' : 'x, n',
    detail: t('Compared as given; the values behind them cannot be checked'),
    adds: { summary: true, label: label.name, ...(means ? {} : { measure: 'proportion' as const }) },
  };
}
