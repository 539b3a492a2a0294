import type { BlockResult } from '../settings/document';
import type { OutcomeChange } from './outcome';

const DIGITS = 12;

/** Keys of a result in the order of the block; names of rows that were counted are part of the recipe, not of the result. */
const COMPARED = [
  'n',
  'readings',
  'x',
  'mean',
  'sd',
  'difference',
  'interval',
  'statistic-name',
  'statistic',
  'df',
  'p',
  'decision',
  'depends-on-choice',
  'with-left-out-kept',
] as const;

type Leaf = string | number;

/** Every number and word that differs between two results. Numbers are held to 12 significant digits. */
export function resultChanges(was: BlockResult, is: BlockResult): readonly OutcomeChange[] {
  return COMPARED.flatMap(key => {
    const before = leaves(`result.${key}`, was[key]);
    const after = leaves(`result.${key}`, is[key]);
    return [...new Set([...before.keys(), ...after.keys()])].flatMap(path =>
      changeOf(path, before.get(path) ?? 'none', after.get(path) ?? 'none'),
    );
  });
}

function changeOf(key: string, was: Leaf, is: Leaf): readonly OutcomeChange[] {
  if (typeof was === 'number' && typeof is === 'number') {
    return sameNumber(was, is) ? [] : [{ key, was, is, change: is - was }];
  }
  return was === is ? [] : [{ key, was, is, change: null }];
}

/** Equal to 12 significant digits: a difference of less than half a unit in the 12th digit of the larger. */
export function sameNumber(a: number, b: number): boolean {
  if (a === b || (Number.isNaN(a) && Number.isNaN(b))) return true;
  const size = Math.max(Math.abs(a), Math.abs(b));
  return Number.isFinite(size) && Math.abs(a - b) <= 0.5 * 10 ** (Math.floor(Math.log10(size)) - DIGITS + 1);
}

function leaves(path: string, value: unknown): ReadonlyMap<string, Leaf> {
  if (typeof value === 'number' || typeof value === 'string') return new Map([[path, value]]);
  if (Array.isArray(value))
    return new Map(value.flatMap((item, index) => [...leaves(`${path}[${index}]`, item)]));
  if (typeof value === 'object' && value !== null) {
    return new Map(Object.entries(value).flatMap(([key, item]) => [...leaves(`${path}.${key}`, item)]));
  }
  return new Map();
}
