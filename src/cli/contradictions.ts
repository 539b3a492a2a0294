import type { Options } from './options';
import { UsageError } from './usageError';

/** Flags of which only one could be followed. */
const EXCLUDE: readonly (readonly [flag: string, other: string, fix: string])[] = [
  ['columns', 'of', 'With --columns each column is a group and is measured itself: give one of them.'],
  ['columns', 'by', 'With --columns each column is a group, with --by each label: give one of them.'],
  ['columns', 'summary', 'Rows that are summaries have the columns n, mean, sd: leave --columns away.'],
  ['summary', 'of', 'Rows that are summaries have the columns n, mean, sd: leave --of away.'],
];
/** Flags that say where the groups of one file are. */
const OF_ONE_FILE = ['by', 'columns'];

/** Refuses flags that cannot all be followed, so that none is dropped in silence. Throws UsageError. */
export function refuseContradictions(options: Options): void {
  for (const [flag, other, fix] of EXCLUDE) {
    if (options.has(flag) && options.has(other))
      throw new UsageError(`--${flag} and --${other} contradict each other`, fix);
  }
  const ofOneFile = OF_ONE_FILE.find(flag => options.has(flag));
  if (options.words.length > 1 && ofOneFile !== undefined) {
    throw new UsageError(
      `--${ofOneFile} and several files contradict each other (${options.words.join(', ')})`,
      `Each file is a group: leave --${ofOneFile} away, or name one file.`,
    );
  }
  const per = options.texts('per');
  const other = per.find(text => text !== 'none');
  if (per.includes('none') && other !== undefined) {
    throw new UsageError(
      `--per none and --per ${other} contradict each other`,
      'Rows are independent, or readings of a unit belong together: give one of them.',
    );
  }
}

/**
 * Refuses a second text of a flag about the same thing, equal or not. `about` tells what a text is about: the line left out,
 * the label merged. Throws UsageError.
 */
export function refuseTwice<Value>(
  flag: string,
  texts: readonly string[],
  values: readonly Value[],
  about: (value: Value) => string,
): readonly Value[] {
  const first = new Map<string, string>();
  for (const [index, value] of values.entries()) {
    const text = texts[index] ?? '';
    const before = first.get(about(value));
    if (before !== undefined) {
      throw new UsageError(
        before === text
          ? `--${flag} "${text}" stands twice`
          : `--${flag} "${before}" and --${flag} "${text}" are about the same`,
        'Give one of them.',
      );
    }
    first.set(about(value), text);
  }
  return values;
}
