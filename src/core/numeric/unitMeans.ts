import type { Numbers } from '../model/cells';
import { numbersFromIntegers } from './fromIntegers';
import { countOf, integerAt, leastCommonMultiple, nearestDoubles, numbersFromDoubles } from './numbers';

export interface UnitMeans {
  /** One mean a unit, in order of first appearance: exact fractions over the least common multiple of the counts. */
  readonly means: Numbers;
  /** Unit of each reading. */
  readonly unitOf: Int32Array;
  /** How many readings each unit has. */
  readonly readings: Int32Array;
  /** Index of the first reading of each unit. */
  readonly first: Int32Array;
}

/** Nodes of one level: the parent of each and, for the innermost level, which node each reading belongs to. */
interface Level {
  readonly parent: Int32Array;
  readonly count: number;
}

/**
 * Averages readings level by level, innermost first, until each unit (outermost level) has one mean: every piece of a
 * level counts once within the piece above it, however many readings it has.
 * @param numbers readings in file order, missing ones and left-out ones taken away before
 * @param levels codes of the unit columns for each reading, outermost first; at least one. Codes of an inner level need to
 * differ only within one piece of the level above.
 */
export function unitMeans(numbers: Numbers, levels: readonly ArrayLike<number>[]): UnitMeans {
  const n = countOf(numbers);
  const { nodes, leafOf } = nest(levels, n);
  const unitOf = leafOf.slice();
  for (let depth = nodes.length - 1; depth > 0; depth--) {
    const parent = nodes[depth]?.parent ?? unitOf;
    for (let i = 0; i < n; i++) unitOf[i] = parent[unitOf[i] ?? 0] ?? 0;
  }
  const units = nodes[0]?.count ?? 0;
  const readings = new Int32Array(units);
  const first = new Int32Array(units).fill(-1);
  for (let i = 0; i < n; i++) {
    const unit = unitOf[i] ?? 0;
    readings[unit] = (readings[unit] ?? 0) + 1;
    if (first[unit] === -1) first[unit] = i;
  }
  const parents = [
    leafOf,
    ...nodes
      .slice(1)
      .map(level => level.parent)
      .reverse(),
  ];
  const counts = nodes.map(level => level.count).reverse();
  return { means: meansOf(numbers, parents, counts), unitOf, readings, first };
}

/** Gives every distinct path of codes a node on each level, numbered in order of first appearance. */
function nest(levels: readonly ArrayLike<number>[], n: number): { nodes: Level[]; leafOf: Int32Array } {
  let above = new Int32Array(n);
  const nodes = levels.map(codes => {
    const found = new Map<number, Map<number, number>>();
    const parent: number[] = [];
    const node = new Int32Array(n);
    for (let i = 0; i < n; i++) {
      const over = above[i] ?? 0;
      let within = found.get(over);
      if (within === undefined) found.set(over, (within = new Map<number, number>()));
      const code = codes[i] ?? 0;
      let index = within.get(code);
      if (index === undefined) {
        index = parent.length;
        within.set(code, index);
        parent.push(over);
      }
      node[i] = index;
    }
    above = node;
    return { parent: Int32Array.from(parent), count: parent.length };
  });
  return { nodes, leafOf: above };
}

/** Means of means: `parents[k]` gives the piece above each piece (or reading) of stage k, `counts[k]` how many there are. */
function meansOf(numbers: Numbers, parents: readonly Int32Array[], counts: readonly number[]): Numbers {
  const integers: bigint[] = [];
  for (let i = 0; i < countOf(numbers); i++) {
    const integer = integerAt(numbers, i);
    if (integer === null) return numbersFromDoubles(doubleMeans(nearestDoubles(numbers), parents, counts));
    integers.push(integer);
  }
  let values = integers;
  let per = BigInt(numbers.per);
  let shift = numbers.shift;
  parents.forEach((parent, stage) => {
    const sums = new Array<bigint>(counts[stage] ?? 0).fill(0n);
    const sizes = new Int32Array(sums.length);
    values.forEach((value, i) => {
      const above = parent[i] ?? 0;
      sums[above] = (sums[above] ?? 0n) + value;
      sizes[above] = (sizes[above] ?? 0) + 1;
    });
    const multiple = [...new Set(sizes)].reduce((all, size) => leastCommonMultiple(all, BigInt(size)), 1n);
    values = sums.map((sum, i) => sum * (multiple / BigInt(sizes[i] ?? 1)));
    per *= multiple;
    shift *= multiple;
  });
  const [means = numbers] = numbersFromIntegers([values], { decimals: numbers.decimals, per, shift });
  return means;
}

function doubleMeans(
  doubles: Float64Array,
  parents: readonly Int32Array[],
  counts: readonly number[],
): Float64Array {
  let values = doubles;
  parents.forEach((parent, stage) => {
    const sums = new Float64Array(counts[stage] ?? 0);
    const sizes = new Int32Array(sums.length);
    values.forEach((value, i) => {
      const above = parent[i] ?? 0;
      sums[above] = (sums[above] ?? 0) + value;
      sizes[above] = (sizes[above] ?? 0) + 1;
    });
    values = sums.map((sum, i) => sum / (sizes[i] ?? 1));
  });
  return values;
}
