import type { LabelColumn } from '../../core/model/cells';
import type { StepItem } from '../../protocol/asking';
import { choice, isAnswered, type AskContext, type Asker, type ColumnFacts } from './askContext';
import { canBeIds, hasTwoOutcomes } from './columnRoles';
import { groupLabels, mergedInto } from './groupLabels';
import { idFacts, nestIds, type IdFacts } from './relation';

interface Candidate {
  readonly column: LabelColumn;
  readonly facts: IdFacts;
}

/** What received the treatment as one piece, or what makes two values partners. */
export const unitsStep: Asker = context => {
  const { t } = context;
  if (isAnswered(context, 'units', 'per', 'pair')) return null;
  const items: StepItem[] = [eachRow(context)];
  let guess = 0;
  // Ids that come again in every group may be the same pieces or others: taken only where nothing clearer is there.
  let doubtful = 0;
  for (const found of candidates(context)) {
    const { facts } = found;
    if (facts.pairs) {
      guess ||= items.length;
      items.push(pairItem(context, found.column.name, facts.ids));
      continue;
    }
    if (facts.most < 2) continue;
    if (facts.withinGroups) {
      const inner = innerColumn(context, found);
      if (inner !== null) {
        guess ||= items.length;
        items.push(nestedItem(context, found, inner));
      }
      guess ||= items.length;
      items.push(unitItem(context, found));
    } else {
      if (facts.ids * 2 >= facts.most) doubtful ||= items.length;
      items.push(restartingItem(context, found));
    }
  }
  for (const column of partnersOfWide(context)) {
    guess ||= items.length;
    items.push(pairItem(context, column.name, column.distinct));
  }
  if (items.length === 1) return null;
  return choice(
    context,
    {
      title: t('What received the treatment as one piece?'),
      prompt: t('Rows of one piece are averaged; each piece counts once'),
      items,
    },
    guess || doubtful,
  );
};

/** Where each group has a column of its own: columns in which every row has an id of its own, so that it can be a pair. */
function partnersOfWide({ request, columns, rows }: AskContext): readonly ColumnFacts[] {
  const groups = request.columns;
  if (groups === undefined) return [];
  return columns.filter(
    column => canBeIds(column) && column.distinct === rows && !groups.includes(column.name),
  );
}

/** Columns that could hold ids, with how their ids stand to the groups; only where one column holds the labels. */
function candidates(context: AskContext): readonly Candidate[] {
  const { request, columns } = context;
  const used = [...(request.measured ?? []), request.label];
  return columns
    .filter(column => canBeIds(column) && !hasTwoOutcomes(column) && !used.includes(column.name))
    .flatMap(({ name }) => candidate(context, context.labelsOf(name)))
    .filter(({ facts }) => facts.ids >= 2);
}

function candidate(context: AskContext, column: LabelColumn | null): readonly Candidate[] {
  const { request } = context;
  const groups = request.label === undefined ? null : context.labelsOf(request.label);
  if (groups === null || column === null) return [];
  const { test, reference } = request;
  const compared =
    test === undefined || reference === undefined
      ? groupLabels(context).map(({ label }) => label)
      : [test, reference];
  return [{ column, facts: idFacts(groups, column, compared, label => mergedInto(label, request)) }];
}

/** A second column under which readings come again within each id: a tile of a firing read several times. */
function innerColumn(context: AskContext, outer: Candidate): LabelColumn | null {
  for (const inner of candidates(context)) {
    if (inner.column.name === outer.column.name || inner.facts.most < 2) continue;
    const [nested] = candidate(context, nestIds(outer.column, inner.column));
    if (nested !== undefined && nested.facts.most >= 2 && nested.facts.ids > outer.facts.ids)
      return inner.column;
  }
  return null;
}

const eachRow = ({ t, request }: AskContext): StepItem => ({
  label: t('Each row'),
  description: '',
  detail:
    request.columns === undefined
      ? t('Claims that every row received it on its own')
      : t('Claims that every value received it on its own'),
  adds: { per: 'none' },
});

const unitItem = ({ t }: AskContext, { column, facts }: Candidate): StepItem => ({
  label: t('Each {0}', column.name),
  description: counted(t, facts),
  detail: t('Claims that the rows of one {0} received it together; they count once', column.name),
  adds: { per: [column.name] },
});

const nestedItem = ({ t }: AskContext, { column, facts }: Candidate, inner: LabelColumn): StepItem => ({
  label: t('Each {0}, each {1} in it read several times', column.name, inner.name),
  description: counted(t, facts),
  detail: t('Readings are averaged by {0}, then by {1}; each {1} counts once', inner.name, column.name),
  adds: { per: [column.name, inner.name] },
});

const restartingItem = ({ t }: AskContext, { column, facts }: Candidate): StepItem => ({
  label: t('Each {0} of each group', column.name),
  description: counted(t, facts),
  detail: t('Claims that {0} is numbered anew in each group; rows of one id count once', column.name),
  adds: { per: [column.name], pair: 'none' },
});

const pairItem = ({ t }: AskContext, column: string, pairs: number): StepItem => ({
  label: t('Pairs by {0}', column),
  description: t('{0} pairs', pairs),
  detail: t('Claims that the two values of one {0} belong together', column),
  adds: { pair: column },
});

const counted = (t: AskContext['t'], facts: IdFacts): string =>
  facts.fewest === facts.most
    ? t('{0} ids, {1} rows each', facts.ids, facts.most)
    : t('{0} ids, {1} to {2} rows each', facts.ids, facts.fewest, facts.most);
