import type { Numbers } from '../model/cells';
import { orderOf, type Integers } from './integerOrder';
import { quotient } from './quotient';
import { compactSteps, LARGEST_STEP, powerOfTen, scaleOf } from './steps';

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
export function numbersFromIntegers(lists: readonly Integers[], frame: Frame): Numbers[] {
  const { decimals, per, shift } = frame;
  const steps = per < LARGEST ? lists.map(list => stepsOf(list, shift)) : [];
  const fitting = steps.flatMap(list => list ?? []);
  if (fitting.length < lists.length) return wideNumbers(lists, frame);
  return fitting.map(list => ({
    form: 'steps',
    decimals,
    per: Number(per),
    shift,
    steps: compactSteps(list),
  }));
}

/** The integers less the shift; null when one of them needs more than 53 bits. */
function stepsOf(integers: Integers, shift: bigint): Float64Array | null {
  const steps = new Float64Array(integers.length);
  for (let i = 0; i < steps.length; i++) {
    const step = (integers[i] as bigint) - shift;
    if (step >= LARGEST || step <= -LARGEST) return null;
    steps[i] = Number(step);
  }
  return steps;
}

function wideNumbers(lists: readonly Integers[], frame: Frame): Numbers[] {
  const offsets = lists.map(list => offsetsOf(list, frame));
  let orders: readonly Float64Array[] | null = null;
  return lists.map((exact, index) => ({
    form: 'wide',
    ...frame,
    offsets: offsets[index] ?? new Float64Array(),
    exact,
    // ranks are seldom asked for, and cost a sort
    get order(): Float64Array {
      orders ??= orderOf(lists, offsets);
      return orders[index] ?? new Float64Array();
    },
  }));
}

/** (integer − shift) / (10^decimals · per), each rounded once. */
function offsetsOf(integers: Integers, { decimals, per, shift }: Frame): Float64Array {
  const offsets = new Float64Array(integers.length);
  const scale = scaleOf(decimals, per);
  const isDecimal = scale === powerOfTen(decimals);
  for (let i = 0; i < offsets.length; i++) {
    const step = (integers[i] as bigint) - shift;
    // the language reads a decimal to the nearest double, quicker than big integers divide
    offsets[i] = isDecimal ? Number(`${step.toString()}e-${decimals}`) : quotient(step, scale);
  }
  return offsets;
}
