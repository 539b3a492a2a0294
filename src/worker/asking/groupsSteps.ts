import { choice, isAnswered, type AskContext, type Asker } from './askContext';
import { soundsLikeReference } from './columnRoles';
import { groupLabels, type GroupLabel } from './groupLabels';

/** Which group the others are measured against. With two groups the other one is the test group. */
export const referenceStep: Asker = context => {
  const { t } = context;
  if (isAnswered(context, 'reference', 'reference', 'test')) return null;
  const groups = groupLabels(context);
  if (groups.length < 2) return null;
  const other = groups.length === 2 ? (at: number) => groups[1 - at]?.label : () => undefined;
  const items = groups.map((group, index) => {
    const test = other(index);
    return {
      label: group.label,
      description: rowsOf(context, group),
      detail: test === undefined ? '' : t('The difference is {0} − {1}', test, group.label),
      adds: test === undefined ? { reference: group.label } : { reference: group.label, test },
    };
  });
  const sounding = groups.findIndex(group => soundsLikeReference(group.label));
  return choice(
    context,
    { title: t('Which group is the reference?'), prompt: t('The difference is test − reference'), items },
    sounding >= 0 ? sounding : 1,
  );
};

/** Which group is compared with the reference, when there are more than two. */
export const testStep: Asker = context => {
  const { t, request } = context;
  if (request.reference === undefined || isAnswered(context, 'test', 'test')) return null;
  const items = groupLabels(context)
    .filter(group => group.label !== request.reference)
    .map(group => ({
      label: group.label,
      description: rowsOf(context, group),
      detail: t('The difference is {0} − {1}', group.label, request.reference ?? ''),
      adds: { test: group.label },
    }));
  const only = items[0];
  if (only === undefined) return null;
  if (items.length === 1) return { plain: only.adds };
  return choice(context, {
    title: t('Which group is compared with {0}?', request.reference),
    prompt: t('The test group'),
    items,
  });
};

const rowsOf = ({ t }: AskContext, group: GroupLabel): string =>
  group.rows === null ? '' : t('{0} rows', group.rows);
