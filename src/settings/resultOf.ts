import { methodById, methods } from '../core/methods/index';
import type { Comparison, Row } from '../core/model/comparison';
import type { MethodDescriptor, MethodResult } from '../core/model/methods';
import type { BlockResult } from './document';

/** The numbers of the chosen row: what a recheck holds a later computation against. */
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
    ...(counts.length > 0 ? { x: counts } : { mean: groups.map(({ mean }) => mean) }),
    ...(counts.length > 0 || groups.some(({ sd }) => !Number.isFinite(sd))
      ? {}
      : { sd: groups.map(({ sd }) => sd) }),
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
    ...(estimate === null ? {} : { difference: estimate }),
    ...(lower === null && upper === null ? {} : { interval: [lower ?? -Infinity, upper ?? Infinity] }),
    ...(statistic === null ? {} : { 'statistic-name': statisticName, statistic }),
    ...(df === null ? {} : { df: typeof df === 'number' ? df : [df[0], df[1]] }),
    ...(p === null ? {} : { p }),
  };
}

function keptOf(rows: readonly Row[], chosen: Row): NonNullable<BlockResult['with-left-out-kept']> | null {
  if (chosen.data === 'all') return null;
  const kept = rows.find(({ id, data }) => id === chosen.id && data === 'all');
  const result = kept?.result;
  if (result === undefined || result === null || result.estimate === null) return null;
  const { estimate, lower, upper } = result;
  return {
    difference: estimate,
    ...(lower === null && upper === null ? {} : { interval: [lower ?? -Infinity, upper ?? Infinity] }),
    decision: kept?.decision ?? 'not settled',
  };
}
