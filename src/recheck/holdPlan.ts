import type { Hasher } from '../core/model/hasher';
import { Refusal } from '../core/model/problem';
import { recordId } from '../settings/digests';
import type { ParsedBlock } from '../settings/parseBlock';

/**
 * Holds a block without a result to be a plan. A record whose result was taken out still tells: its id was made of a text
 * with it, and only a computation knows the digest of the cells used. Throws Refusal 'block-not-readable'.
 */
export function holdPlan({ block, text, lineOf }: ParsedBlock, createHasher: () => Hasher): void {
  const { record, data = [] } = block;
  const known = data.findIndex(({ cells }) => cells !== undefined);
  const sealedWithMore =
    record !== undefined && record.id !== '' && record.id !== recordId(text, createHasher);
  if (!sealedWithMore && known < 0) return;
  const key = sealedWithMore ? 'record.id' : `data.${known}.cells`;
  const expected = sealedWithMore
    ? '[result], or a plan as it was when its id was made'
    : '[result], or a plan, which knows no cells';
  const line = lineOf(key);
  throw new Refusal('block-not-readable', { line, expected, found: 'neither', key }, `line ${line}`);
}
