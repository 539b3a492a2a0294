import type { Numbers } from '../../src/core/model/cells';
import type { Designs, Group, Sample } from '../../src/core/model/groups';
import type { Ask } from '../../src/core/model/methods';
import type { OptionValue } from '../../src/core/model/settings';
import { decimalText } from '../../src/core/numeric/decimal';
import { alignFrames } from '../../src/core/numeric/numbers';
import { NumbersBuilder } from '../../src/core/numeric/numbersBuilder';
import { pairedDifferences } from '../../src/core/numeric/pairedDifferences';
import { makeSample } from '../../src/core/numeric/sample';
import { groupOf } from '../../src/compare/groupOf';

/** All digits of a double: the decimal that it is exactly. */
export function exactDecimal(x: number): string {
  let whole = x;
  let bits = 0;
  for (; !Number.isInteger(whole); whole *= 2) bits += 1;
  return decimalText(BigInt(whole) * 5n ** BigInt(bits), bits);
}

function numbersOf(texts: readonly string[]): Numbers {
  const builder = new NumbersBuilder();
  for (const text of texts) builder.addDecimal(text);
  return builder.build();
}

/** Samples of decimals as written, all in one frame. */
function samplesOf(lists: readonly (readonly string[])[]): Sample[] {
  return alignFrames(lists.map(numbersOf)).map(numbers =>
    makeSample(
      numbers,
      Int32Array.from({ length: lengthOf(numbers) }, (_, row) => row),
    ),
  );
}

export const groupsOf = (
  lists: readonly (readonly string[])[],
  labels: readonly string[] = ['test', 'reference'],
): Group[] =>
  samplesOf(lists).map((sample, index) =>
    groupOf(labels[index] ?? `group ${index + 1}`, sample, { missing: 0, leftOut: 0 }),
  );

export function twoOf(test: readonly string[], reference: readonly string[]): Designs['two'] {
  const [a, b] = groupsOf([test, reference]);
  return { test: a!, reference: b! };
}

export function pairsOf(test: readonly string[], reference: readonly string[]): Designs['pairs'] {
  const two = twoOf(test, reference);
  return { ...two, differences: pairedDifferences(two.test.sample!, two.reference.sample!), unmatched: [] };
}

/** The same groups with nothing but n, mean and SD. */
export function summariesOf({ test, reference }: Designs['two']): Designs['two'] {
  const bare = (group: Group): Group => ({ ...group, sample: null });
  return { test: bare(test), reference: bare(reference) };
}

export function asking(
  asked: Partial<Ask> & { readonly options?: Readonly<Record<string, OptionValue>> } = {},
): Ask {
  const { options = {}, ...rest } = asked;
  return {
    question: 'differs',
    confidence: 0.95,
    against: 0,
    margin: null,
    option: key => options[key] ?? null,
    ...rest,
  };
}

export const noTick = (): void => undefined;

const lengthOf = (numbers: Numbers): number =>
  numbers.form === 'steps' ? numbers.steps.length : numbers.offsets.length;
