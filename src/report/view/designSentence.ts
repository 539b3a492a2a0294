import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { groupLabel } from '../words/groupLabels';
import { showLabel } from '../words/label';
import { columnNoun, counted, unitNoun, type Noun } from '../words/unitNoun';

/** How many values stand against how many, and what each of them is. */
export function designSentence(comparison: Comparison, t: Say): string {
  const { groups, settings, design } = comparison;
  const noun = unitNoun(comparison, t);
  const sizes = sizesOf(comparison, noun, t);
  if (settings.layout.kind === 'summary' || settings.layout.kind === 'typed')
    return t('{0}, as stated; no check of the data was possible.', sizes);
  if (design === 'pairs' || design === 'pairedCounts') return pairsSentence(comparison, t);
  const { relation } = settings;
  switch (relation.kind) {
    case 'units': {
      const outer = relation.columns.map(column => showLabel(column)).join(', ');
      return relation.columns.length > 1
        ? t('{0}, readings averaged level by level ({1}).', sizes, outer)
        : t(
            '{0}, each {1} with its own readings averaged.',
            sizes,
            columnNoun(relation.columns[0] ?? '', t).one,
          );
    }
    case 'independent':
      return t('{0}, each row counted once, as stated.', sizes);
    case 'pairs':
    case 'rows':
      return groups.length === 0
        ? ''
        : t('{0}, each row counted once; that rows are independent was not stated.', sizes);
  }
}

function sizesOf(comparison: Comparison, noun: Noun, t: Say): string {
  const { groups } = comparison;
  const [test, reference] = groups;
  if (test === undefined || reference === undefined || groups.length > 2)
    return groups
      .map(group => t('{0} in {1}', counted(group.n, noun), groupLabel(group.label, comparison)))
      .join(', ');
  return t('{0} against {1}', counted(test.n, noun), reference.n);
}

function pairsSentence({ pairs, settings, groups }: Comparison, t: Say): string {
  const n = pairs?.complete ?? groups[0]?.n ?? 0;
  const noun: Noun = { one: t('pair'), many: t('pairs') };
  const column = settings.relation.kind === 'pairs' ? settings.relation.column : '';
  const whole = t(
    '{0} matched by {1}; the difference is taken within each pair and averaged.',
    counted(n, noun),
    showLabel(column),
  );
  const unmatched = pairs?.unmatched ?? [];
  return unmatched.length === 0
    ? whole
    : `${whole} ${t('Without a partner and not used: {0}.', someOf(unmatched))}`;
}

const MOST_NAMED = 12;

function someOf(names: readonly string[]): string {
  const shown = names.slice(0, MOST_NAMED).map(showLabel).join(', ');
  return names.length > MOST_NAMED ? `${shown}, …` : shown;
}
