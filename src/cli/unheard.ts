import type { Answered } from '../compare/answer';
import { methodById } from '../core/methods/index';
import { Refusal } from '../core/model/problem';
import { findField } from '../readers/findField';
import type { Said } from './compareRequest';
import { UsageError } from './usageError';

/**
 * Refuses what the command line said and what had no effect on the answer. Only what was said is held: a recipe may merge
 * a label that another file does not hold. Throws UsageError, Refusal 'label-unknown'.
 */
export function refuseUnheard({ same = [], sigma, onlyChosen }: Said, answered: Answered): void {
  refuseUnheardMerges(same, answered);
  const { id } = answered.comparison.chosen;
  const takesSigma = methodById(id)?.options.some(({ key }) => key === 'sigma') === true;
  if (sigma !== undefined && onlyChosen === true && !takesSigma) {
    throw new UsageError(
      `--sigma has no effect on ${id}, and --only-chosen leaves its own row out`,
      'Add --variance known, or leave one of them away.',
    );
  }
}

function refuseUnheardMerges(
  same: readonly (readonly [from: string, to: string])[],
  { comparison, table }: Answered,
): void {
  const [first] = same;
  if (first === undefined || table === null) return;
  const { layout, same: all } = comparison.settings;
  if (layout.kind !== 'long' && layout.kind !== 'summary') {
    throw new UsageError(
      `--same "${first.join(' -> ')}" needs a label column, and here each ${
        layout.kind === 'wide' ? 'group is a column (--columns)' : 'of several files is a group'
      }`,
      'Leave --same away.',
    );
  }
  const labels = table.labels(findField(table.fields, layout.label)).levels.slice(1);
  const met = new Set([...labels, ...all.map(([, to]) => to)]);
  const unknown = same.find(([from]) => !met.has(from));
  if (unknown === undefined) return;
  throw new Refusal('label-unknown', { label: unknown[0], column: layout.label, labels });
}
