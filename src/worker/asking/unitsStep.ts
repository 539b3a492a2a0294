import type { LabelColumn } from '../../core/model/cells';
import type { StepItem } from '../../protocol/asking';
import { choice, isAnswered, type AskContext, type Asker } from './askContext';
import { canBeIds, hasTwoOutcomes } from './columnRoles';
import { groupLabels } from './groupLabels';
import { idFacts, nestIds, type IdFacts } from './relation';

interface Candidate {
  readonly column: LabelColumn;
  readonly facts: IdFacts;
}

/** What received the treatment as one piece, or what makes two values partners. */
export const unitsStep: Asker = context => {
  const { t, request } = context;
  if (isAnswered(context, 'units', 'per', 'pair')) return null;
  const items: StepItem[] = [eachRow(context)];
  let guess = 0;
  for (const candidate of candidates(context)) {
    const { facts, column } = candidate;
    if (facts.pairs) {
      guess ||= items.length;
      items.push(pairItem(context, candidate));
      continue;
    }
    if (facts.most < 2) continue;
    if (facts.withinGroups) {
      const inner = innerColumn(context, column);
      if (inner !== null) {
        guess ||= items.length;
        items.push(nestedItem(context, candidate, inner));
      }
      guess ||= items.length;
      items.push(unitItem(context, candidate));
    } else {
      items.push(restartingItem(context, candidate));
    }
  }
  if (items.length === 1) return request.columns === undefined ? null : { plain: {} };
  return choice(
    context,
    {
      title: t('What received the treatment as one piece?'),
      prompt: t('Rows of one piece are averaged; each piece counts once'),
      items,
    },
    guess,
  );
};

/** Columns that could hold ids, with how their ids stand to the groups; only for one column of labels. */
function candidates(context: AskContext): readonly Candidate[] {
  const { request, columns } = context;
  const label = request.label === undefined ? null : context.labelsOf(request.label);
  if (label === null) return [];
  const compared =
    request.test === undefined || request.reference === undefined
      ? groupLabels(context).map(group => group.label)
      : [request.test, request.reference];
  const used = [...(request.measured ?? []), request.label];
  return columns
    .filter(column => canBeIds(column) && !hasTwoOutcomes(column) && !used.includes(column.name))
    .flatMap(({ name }) => {
      const column = context.labelsOf(name);
      return column === null ? [] : [{ column, facts: idFacts(label, column, compared) }];
    })
    .filter(({ facts }) => facts.ids >= 2);
}

/** A second column under which readings come again within each id: a tile of a firing read several times. */
function innerColumn(context: AskContext, outer: LabelColumn): LabelColumn | null {
  const label = context.request.label === undefined ? null : context.labelsOf(context.request.label);
  if (label === null) return null;
  const compared = groupLabels(context).map(group => group.label);
  for (const { column, facts } of candidates(context)) {
    if (column.name === outer.name || facts.most < 2) continue;
    const nested = idFacts(label, nestIds(outer, column), compared);
    const alone = idFacts(label, outer, compared);
    if (nested.most >= 2 && nested.ids > alone.ids) return column;
  }
  return null;
}

const eachRow = ({ t, request }: AskContext): StepItem => ({
  label: t('Each row'),
  description: '',
  detail:
    request.columns === undefined
      ? t('Claims that every row received the treatment on its own')
      : t('Claims that every value received the treatment on its own'),
  adds: { per: 'none' },
});

const unitItem = ({ t }: AskContext, { column, facts }: Candidate): StepItem => ({
  label: t('Each {0}', column.name),
  description: counted(t, facts),
  detail: t(
    'Claims that the rows of one {0} received it together: they are averaged and count once',
    column.name,
  ),
  adds: { per: [column.name] },
});

const nestedItem = ({ t }: AskContext, { column, facts }: Candidate, inner: LabelColumn): StepItem => ({
  label: t('Each {0}, with several readings of each {1}', column.name, inner.name),
  description: counted(t, facts),
  detail: t('Readings are averaged by {0} first, then by {1}; each {1} counts once', inner.name, column.name),
  adds: { per: [column.name, inner.name] },
});

const restartingItem = ({ t }: AskContext, { column, facts }: Candidate): StepItem => ({
  label: t('Each {0} of each group', column.name),
  description: counted(t, facts),
  detail: t(
    'Claims that the numbering of {0} starts again in each group; rows of one id are averaged',
    column.name,
  ),
  adds: { per: [column.name], pair: 'none' },
});

const pairItem = ({ t }: AskContext, { column, facts }: Candidate): StepItem => ({
  label: t('Pairs by {0}', column.name),
  description: t('{0} pairs', facts.ids),
  detail: t(
    'Claims that the two values of one {0} belong together: their differences are compared',
    column.name,
  ),
  adds: { pair: column.name },
});

const counted = (t: AskContext['t'], facts: IdFacts): string =>
  facts.fewest === facts.most
    ? t('{0} ids, {1} rows each', facts.ids, facts.most)
    : t('{0} ids, {1} to {2} rows each', facts.ids, facts.fewest, facts.most);
