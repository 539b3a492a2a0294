import { methodById, methods } from '../core/methods/index';
import type { Comparison, Row } from '../core/model/comparison';
import type { MethodDescriptor, MethodResult } from '../core/model/methods';
import type { BlockResult } from './document';

/**
 * The numbers of the chosen row: what a recheck holds a later computation against. What could not be computed has no key;
 * only the open end of an interval is infinite.
 */
export function resultOf(comparison: Comparison, list: readonly MethodDescriptor[] = methods): BlockResult {
  const { chosen, groups, whatIf } = comparison;
  const result = chosen.result;
  const counts = groups.flatMap(({ count }) => (count === null ? [] : [count.x]));
  const counted = whatIf.counted.flatMap(index => whatIf.rows[index] ?? []);
  const kept = keptOf(whatIf.rows, chosen);
  return {
    n: groups.map(({ n }) => n),
    ...(groups.some(({ n, readings }) => n !== readings)
      ? { readings: groups.map(({ readings }) => readings) }
      : {}),
    ...(counts.length > 0
      ? { x: counts }
      : {
          ...finite({ mean: groups.map(({ mean }) => mean) }),
          ...finite({ sd: groups.map(({ sd }) => sd) }),
        }),
    ...(result === null ? {} : numbersOf(result, methodById(chosen.id, list)?.statistic ?? '')),
    decision: chosen.decision ?? 'not settled',
    'depends-on-choice': whatIf.depends,
    counted: [...new Set(counted.filter(({ data }) => data === chosen.data).map(({ id }) => id))],
    ...(kept === null ? {} : { 'with-left-out-kept': kept }),
  };
}

function numbersOf(
  result: MethodResult,
  statisticName: string,
): Pick<BlockResult, 'difference' | 'interval' | 'statistic-name' | 'statistic' | 'df' | 'p'> {
  const { estimate, statistic, df, p, lower, upper } = result;
  return {
    ...finite({ difference: estimate }),
    ...intervalOf(lower, upper),
    ...(isComputed(statistic) ? { 'statistic-name': statisticName, statistic } : {}),
    ...finite({
      df: df === null || typeof df === 'number' ? df : ([df[0], df[1]] satisfies [number, number]),
    }),
    ...finite({ p }),
  };
}

/** The ends of an interval, infinite where they are open; nothing where both are, or where one could not be computed. */
function intervalOf(lower: number | null, upper: number | null): { readonly interval?: [number, number] } {
  const ends = [lower, upper].filter(end => end !== null);
  if (ends.length === 0 || !ends.every(Number.isFinite)) return {};
  return { interval: [lower ?? -Infinity, upper ?? Infinity] };
}

function keptOf(rows: readonly Row[], chosen: Row): NonNullable<BlockResult['with-left-out-kept']> | null {
  if (chosen.data === 'all') return null;
  const kept = rows.find(({ id, data }) => id === chosen.id && data === 'all');
  const result = kept?.result;
  if (result === undefined || result === null || !isComputed(result.estimate)) return null;
  const { estimate, lower, upper } = result;
  return {
    difference: estimate,
    ...intervalOf(lower, upper),
    decision: kept?.decision ?? 'not settled',
  };
}

const isComputed = (value: number | null): value is number => value !== null && Number.isFinite(value);

/** A key with its number or numbers, or nothing where one is none. */
function finite<Key extends string, Value extends number | number[]>(
  entry: Readonly<Record<Key, Value | null>>,
): Partial<Record<Key, Value>> {
  const held = Object.entries<Value | null>(entry).filter(
    ([, value]) => value !== null && [value].flat().every(Number.isFinite),
  );
  return Object.fromEntries(held) as Partial<Record<Key, Value>>;
}
