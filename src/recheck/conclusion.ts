import { mattersPlace } from '../compare/mattersPlace';
import type { Block, BlockResult } from '../settings/document';

/**
 * What a record concludes: decision, direction, the answer to what matters, and whether it depends on the choice. Data may
 * move every number; only a change of this turns the record.
 */
export function conclusionOf(result: BlockResult, { comparison }: Block): string {
  const { decision, difference = NaN, interval } = result;
  return [
    decision,
    // Every other decision says its direction, or has none.
    decision === 'differs' ? Math.sign(difference - comparison.against) : '',
    mattersAnswer(interval, comparison.matters),
    result['depends-on-choice'],
  ].join(', ');
}

function mattersAnswer(interval: readonly number[] | undefined, matters: number | undefined): string {
  const [lower, upper] = interval ?? [];
  if (matters === undefined || lower === undefined || upper === undefined) return 'not asked';
  return mattersPlace(lower, upper, matters);
}
