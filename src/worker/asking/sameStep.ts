import { alikeLabels } from '../../core/evidence/alikeLabels';
import { choice, isAnswered, type Asker } from './askContext';
import { groupLabels, type GroupLabel } from './groupLabels';

/** Whether labels that differ only in capitals or spaces mean the same group. */
export const sameStep: Asker = context => {
  const { t, request } = context;
  if (request.label === undefined || isAnswered(context, 'same', 'same')) return null;
  const same = variants(groupLabels(context));
  if (same.length === 0) return null;
  const pairs = same.map(([from, to]) => t('“{0}” and “{1}”', from, to)).join(', ');
  return choice(context, {
    title: t('Do these labels mean the same group?'),
    prompt: pairs,
    items: [
      {
        label: t('The same: {0}', pairs),
        description: '',
        detail: t('Their rows are one group; the settings block names the labels that were merged'),
        adds: { same },
      },
      {
        label: t('Different groups'),
        description: '',
        detail: t('Each label stays a group of its own'),
        // A label declared the same as itself is declared a group of its own.
        adds: { same: same.map(([from]) => [from, from] as const) },
      },
    ],
  });
};

/** Each label that looks like a more frequent one, with that one. */
function variants(groups: readonly GroupLabel[]): readonly (readonly [from: string, to: string])[] {
  const byCount = [...groups].sort((a, b) => (b.rows ?? 0) - (a.rows ?? 0));
  return alikeLabels(byCount.map(({ label }) => label)).flatMap(([usual = '', ...rare]) =>
    rare.map(label => [label, usual] as const),
  );
}
