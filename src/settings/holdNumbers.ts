import { Refusal } from '../core/model/problem';
import type { Block } from './document';

/**
 * Holds every number of a block to be finite, but for its result, whose open interval ends are infinite: no other reads
 * back as what it was. Throws Refusal 'number-unusable' with the key.
 */
export function holdNumbers(block: Block): void {
  hold({ ...block, result: null }, '');
}

function hold(value: unknown, key: string): void {
  if (typeof value === 'number' && !Number.isFinite(value)) {
    throw new Refusal('number-unusable', { text: String(value) }, key);
  }
  if (typeof value !== 'object' || value === null) return;
  for (const [name, item] of Object.entries(value)) {
    const isIndex = Array.isArray(value) && (typeof item !== 'object' || item === null);
    hold(item, isIndex ? `${key}[${name}]` : key === '' ? name : `${key}.${name}`);
  }
}
