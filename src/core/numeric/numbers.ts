import type { Numbers } from '../model/cells';
import { decimalText } from './decimal';
import { numbersFromIntegers } from './fromIntegers';
import type { Integers } from './integerOrder';
import { quotient } from './quotient';
import { EXACT_POWERS, LARGEST_STEP, scaleOf, type Steps } from './steps';

/** How many values there are. */
export const countOf = (numbers: Numbers): number =>
  numbers.form === 'steps' ? numbers.steps.length : numbers.offsets.length;

/** value[i] · 10^decimals · per, a whole number; null for computed doubles. */
export function integerAt(numbers: Numbers, i: number): bigint | null {
  if (numbers.form === 'steps') return numbers.shift + BigInt(numbers.steps[i] ?? 0);
  return numbers.exact === null ? null : (numbers.exact[i] ?? 0n);
}

/** The double nearest to value[i]. */
export function valueAt(numbers: Numbers, i: number): number {
  const integer = integerAt(numbers, i);
  if (integer === null) return numbers.form === 'wide' ? (numbers.offsets[i] ?? 0) : 0;
  return quotient(integer, scaleOf(numbers.decimals, numbers.per));
}

/** The doubles nearest to all values, in order. */
export function nearestDoubles(numbers: Numbers): Float64Array {
  if (numbers.form === 'wide' && numbers.exact === null) return numbers.offsets;
  const doubles = new Float64Array(countOf(numbers));
  const scale = exactScale(numbers.decimals, numbers.per);
  const base = Number(numbers.shift);
  const canAdd = numbers.form === 'steps' && scale !== null && Math.abs(base) < LARGEST_STEP;
  for (let i = 0; i < doubles.length; i++) {
    const sum = canAdd ? base + (numbers.steps[i] as number) : Infinity;
    doubles[i] = canAdd && Math.abs(sum) < LARGEST_STEP ? sum / scale : valueAt(numbers, i);
  }
  return doubles;
}

/** value[i] − shift / (10^decimals · per) of all values, each rounded once, in units of the values. */
export function offsetsOf(numbers: Numbers): Float64Array {
  if (numbers.form === 'wide') return numbers.offsets;
  const { steps } = numbers;
  const offsets = new Float64Array(steps.length);
  const scale = exactScale(numbers.decimals, numbers.per);
  const divisor = scaleOf(numbers.decimals, numbers.per);
  for (let i = 0; i < steps.length; i++) {
    const step = steps[i] as number;
    offsets[i] = scale === null ? quotient(BigInt(step), divisor) : step / scale;
  }
  return offsets;
}

/**
 * The shortest exact decimal of value[i], with a point and without an exponent. A fraction that has no finite decimal
 * (a mean of three), and computed doubles, as the shortest text of the nearest double.
 */
export function exactText(numbers: Numbers, i: number): string {
  const integer = integerAt(numbers, i);
  if (integer === null) return String(valueAt(numbers, i));
  const per = BigInt(numbers.per);
  if (integer % per === 0n) return decimalText(integer / per, numbers.decimals);
  const more = decimalsToDivide(per);
  if (more === null) return String(valueAt(numbers, i));
  return decimalText((integer * 10n ** BigInt(more)) / per, numbers.decimals + more);
}

/** Fewest decimals after which 1 / per ends, or null when it never does. */
function decimalsToDivide(per: bigint): number | null {
  let rest = per;
  let twos = 0;
  let fives = 0;
  for (; rest % 2n === 0n; rest /= 2n) twos++;
  for (; rest % 5n === 0n; rest /= 5n) fives++;
  return rest === 1n ? Math.max(twos, fives) : null;
}

/** The values at these indices, in their order and in the same frame. */
export function gather(numbers: Numbers, rows: Int32Array): Numbers {
  if (numbers.form === 'steps') return { ...numbers, steps: pick(numbers.steps, rows) };
  const { decimals, per, shift, offsets, exact } = numbers;
  let order: Steps | null = null;
  return {
    form: 'wide',
    decimals,
    per,
    shift,
    offsets: pick(offsets, rows),
    exact: exact === null ? null : pickIntegers(exact, rows),
    get order(): Steps {
      return (order ??= pick(numbers.order, rows));
    },
  };
}

function pickIntegers(integers: Integers, rows: Int32Array): Integers {
  if (!(integers instanceof BigInt64Array)) return Array.from(rows, row => integers[row] ?? 0n);
  const picked = new BigInt64Array(rows.length);
  for (let i = 0; i < rows.length; i++) picked[i] = integers[rows[i] ?? 0] ?? 0n;
  return picked;
}

function pick<T extends Steps>(values: T, rows: Int32Array): T {
  const picked = new (values.constructor as new (length: number) => T)(rows.length);
  for (let i = 0; i < rows.length; i++) picked[i] = values[rows[i] ?? 0] ?? 0;
  return picked;
}

/**
 * The same values, all in one frame (decimals, per, shift), so that differences, ties and ranks across lists are exact:
 * for columns of a wide layout, for two files, for unit means of two groups. Where computed doubles are among them, all
 * become doubles.
 */
export function alignFrames(list: readonly Numbers[]): Numbers[] {
  const [first] = list;
  if (first === undefined || list.every(numbers => isSameFrame(first, numbers))) return [...list];
  const decimals = Math.max(...list.map(numbers => numbers.decimals));
  const per = list.reduce((multiple, numbers) => leastCommonMultiple(multiple, BigInt(numbers.per)), 1n);
  const integers = list.map(numbers => {
    const factor = scaleOf(decimals - numbers.decimals, per / BigInt(numbers.per));
    const own: bigint[] = [];
    for (let i = 0; i < countOf(numbers); i++) {
      const integer = integerAt(numbers, i);
      if (integer === null) return null;
      own.push(integer * factor);
    }
    return { own, shift: numbers.shift * factor };
  });
  const exact = integers.flatMap(entry => (entry === null ? [] : [entry.own]));
  if (exact.length < list.length) return list.map(numbers => numbersFromDoubles(nearestDoubles(numbers)));
  return numbersFromIntegers(exact, { decimals, per, shift: integers[0]?.shift ?? 0n });
}

/** Computed doubles as they are: their own order, no decimals behind them. */
export const numbersFromDoubles = (values: Float64Array): Numbers => ({
  form: 'wide',
  decimals: 0,
  per: 1n,
  shift: 0n,
  offsets: values,
  order: values,
  exact: null,
});

/** −1, 0 or 1: value[i] of `a` against value[j] of `b` (of the same frame), decided on the exact values. */
export function compareAt(a: Numbers, i: number, b: Numbers, j: number): -1 | 0 | 1 {
  const left = keysOf(a)[i] ?? 0;
  const right = keysOf(b)[j] ?? 0;
  return left < right ? -1 : left > right ? 1 : 0;
}

/** Whether value[i] of `a` equals value[j] of `b` (of the same frame) exactly. */
export const equalAt = (a: Numbers, i: number, b: Numbers, j: number): boolean => compareAt(a, i, b, j) === 0;

/** Keys that stand in the order of the exact values and are equal exactly where those are, across lists of one frame. */
export const keysOf = (numbers: Numbers): Steps => (numbers.form === 'steps' ? numbers.steps : numbers.order);

function isSameFrame(a: Numbers, b: Numbers): boolean {
  if (
    a.form !== b.form ||
    a.decimals !== b.decimals ||
    BigInt(a.per) !== BigInt(b.per) ||
    a.shift !== b.shift
  )
    return false;
  // the order of wide numbers is common only to lists cut from one
  return a.form === 'steps' || b.form === 'steps' || a === b || (a.exact === null && b.exact === null);
}

/** Least common multiple of two numbers above 0. */
export function leastCommonMultiple(a: bigint, b: bigint): bigint {
  let [x, y] = [a, b];
  while (y !== 0n) [x, y] = [y, x % y];
  return (a / x) * b;
}

function exactScale(decimals: number, per: number | bigint): number | null {
  const power = EXACT_POWERS[decimals];
  if (power === undefined) return null;
  if (BigInt(per) === 1n) return power;
  const scale = power * Number(per);
  return scale < LARGEST_STEP ? scale : null;
}
