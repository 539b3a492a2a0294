import type { Comparison } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { showLabel } from './label';

/** What is counted in a comparison: a word for one and for many. */
export interface Noun {
  readonly one: string;
  readonly many: string;
}

/** What each value of a group is: a firing, a pair, an outcome, or simply a value. */
export function unitNoun(comparison: Comparison, t: Say): Noun {
  const { relation } = comparison.settings;
  if (comparison.design === 'counts') return { one: t('outcome'), many: t('outcomes') };
  if (relation.kind === 'pairs') return { one: t('pair'), many: t('pairs') };
  const column = relation.kind === 'units' ? relation.columns.at(-1) : undefined;
  return column === undefined ? { one: t('value'), many: t('values') } : columnNoun(column, t);
}

/** A column name as a noun: "firing", "firings". What is no plain word stands beside a word of ours: "units (sample_id)". */
export function columnNoun(column: string, t: Say): Noun {
  const name = column.trim();
  if (!/^\p{L}+$/u.test(name) || name === name.toUpperCase())
    return { one: t('unit ({0})', showLabel(column)), many: t('units ({0})', showLabel(column)) };
  return { one: name, many: plural(name) };
}

function plural(word: string): string {
  if (/[^aeiou]y$/i.test(word)) return `${word.slice(0, -1)}ies`;
  return /(s|x|z|ch|sh)$/i.test(word) ? `${word}es` : `${word}s`;
}

/** "1 firing", "12 firings". */
export const counted = (n: number, noun: Noun): string => `${n} ${n === 1 ? noun.one : noun.many}`;
