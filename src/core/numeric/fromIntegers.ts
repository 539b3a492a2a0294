import type { Numbers } from '../model/cells';
import { quotient } from './quotient';
import { compactSteps, LARGEST_STEP, scaleOf } from './steps';

const LARGEST = BigInt(LARGEST_STEP);

/** What lists of numbers have in common: value = integer / (10^decimals · per). */
export interface Frame {
  readonly decimals: number;
  readonly per: bigint;
  readonly shift: bigint;
}

/**
 * Numbers from whole numbers of 1 / (10^decimals · per), several lists in one frame: as steps from the shift when all of
 * them fit 53 bits, else every list in wide form with one common order.
 */
export function numbersFromIntegers(lists: readonly (readonly bigint[])[], frame: Frame): Numbers[] {
  const { decimals, per, shift } = frame;
  const fits = per < LARGEST && lists.every(list => list.every(value => isSmall(value - shift)));
  if (!fits) return wideNumbers(lists, frame);
  return lists.map(list => ({
    form: 'steps',
    decimals,
    per: Number(per),
    shift,
    steps: compactSteps(Float64Array.from(list, value => Number(value - shift))),
  }));
}

function wideNumbers(lists: readonly (readonly bigint[])[], { decimals, per, shift }: Frame): Numbers[] {
  const scale = scaleOf(decimals, per);
  const all = lists.flat();
  const offsets = Float64Array.from(all, value => quotient(value - shift, scale));
  const order = denseRanks(all, offsets);
  let end = 0;
  return lists.map(exact => {
    const start = end;
    end += exact.length;
    return {
      form: 'wide',
      decimals,
      per,
      shift,
      offsets: offsets.slice(start, end),
      order: order.slice(start, end),
      exact,
    };
  });
}

/** Rounding keeps the order, so the exact values need to be looked at only where their doubles are equal. */
function denseRanks(exact: readonly bigint[], offsets: Float64Array): Int32Array {
  const at = (index: number): bigint => exact[index] ?? 0n;
  const sorted = Int32Array.from(exact, (_, index) => index).sort((a, b) => {
    const difference = (offsets[a] ?? 0) - (offsets[b] ?? 0);
    if (difference !== 0) return difference;
    return at(a) < at(b) ? -1 : Number(at(a) > at(b));
  });
  const ranks = new Int32Array(exact.length);
  let rank = 0;
  sorted.forEach((index, place) => {
    const before = sorted[place - 1];
    if (before !== undefined && at(before) !== at(index)) rank++;
    ranks[index] = rank;
  });
  return ranks;
}

const isSmall = (value: bigint): boolean => value < LARGEST && value > -LARGEST;
