import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { permutation } from '../../../src/core/methods/permutation';
import { signFlip } from '../../../src/core/methods/signFlip';
import { asking, noTick, pairsOf, twoOf } from '../groupsFrom';

/** Every way of choosing n of the indices below N. */
function* choices(n: number, from: number, of: number): Generator<readonly number[]> {
  if (n === 0) yield [];
  else
    for (let first = from; first <= of - n; first++)
      for (const rest of choices(n - 1, first + 1, of)) yield [first, ...rest];
}

const total = (values: readonly bigint[]): bigint => values.reduce((sum, value) => sum + value, 0n);

/** Separate t, squared with its sign, as a fraction of whole numbers: straight from the definition, for tests only. */
function signedSquare(test: readonly bigint[], reference: readonly bigint[]): readonly [bigint, bigint] {
  const [n, m] = [BigInt(test.length), BigInt(reference.length)];
  const over = total(test) * m - total(reference) * n;
  const spread = (values: readonly bigint[], size: bigint): bigint =>
    values.reduce((sum, value) => sum + (size * value - total(values)) ** 2n, 0n);
  // variance of a mean = Σ(nx − Σx)² / (n³ (n − 1)), over one denominator for both groups
  const under = spread(test, n) * m ** 3n * (m - 1n) + spread(reference, m) * n ** 3n * (n - 1n);
  return [over < 0n ? -(over * over) : over * over, under];
}

const size = (value: bigint): bigint => (value < 0n ? -value : value);
const isAtLeast = ([a, b]: readonly [bigint, bigint], [c, d]: readonly [bigint, bigint]): boolean =>
  b === 0n || d === 0n ? (b === 0n && a > 0n) || (b === d && a >= c) : a * d >= c * b;

/** The share of allotments, by the definition and on whole numbers throughout. */
function shareOfWays(test: readonly number[], reference: readonly number[], twoSided: boolean): number {
  const values = [...test, ...reference].map(BigInt);
  const met = signedSquare(values.slice(0, test.length), values.slice(test.length));
  let [ways, counted] = [0, 0];
  for (const chosen of choices(test.length, 0, values.length)) {
    const rest = values.filter((_, index) => !chosen.includes(index));
    const [over, under] = signedSquare(
      chosen.map(index => values[index] ?? 0n),
      rest,
    );
    ways++;
    if (twoSided ? isAtLeast([size(over), under], [size(met[0]), met[1]]) : isAtLeast([over, under], met))
      counted++;
  }
  return counted / ways;
}

const texts = (values: readonly number[]): readonly string[] => values.map(String);
const tenths = (values: readonly number[]): readonly string[] => values.map(value => (value / 10).toFixed(1));

describe('sign flips', () => {
  // Source: Box, Hunter & Hunter 2005, Statistics for Experimenters, chapter 3, wear of two shoe soles; the counts, 3 of
  // 1024 larger and 4 equal, from memory.
  const a = ['13.2', '8.2', '10.9', '14.3', '10.7', '6.6', '9.5', '10.8', '8.8', '13.3'];
  const b = ['14.0', '8.8', '11.2', '14.2', '11.8', '6.4', '9.8', '11.3', '9.3', '13.6'];

  it('count the shoes as published: 7 of 1024 at least as far to one side, 14 to both', () => {
    const pairs = pairsOf(b, a);
    expect(signFlip.run(pairs, asking({ question: 'differs' }), noTick).p).toBe(14 / 1024);
    expect(signFlip.run(pairs, asking({ question: 'higher' }), noTick).p).toBe(7 / 1024);
    expect(signFlip.run(pairs, asking({ question: 'lower' }), noTick).p).toBe((1024 - 3) / 1024);
  });

  it('hold the differences against what is asked, exactly', () => {
    const pairs = pairsOf(['0.4', '0.5', '0.3'], ['0.1', '0.2', '0.0']);
    expect(signFlip.run(pairs, asking({ against: 0.3 }), noTick).p).toBe(1);
    expect(signFlip.run(pairs, asking({ against: 0 }), noTick).p).toBe(2 / 8);
  });

  it('say when there are too few pairs for a small p, and too many to go through', () => {
    const five = pairsOf(texts([1, 2, 3, 4, 5]), texts([0, 0, 0, 0, 0]));
    expect(signFlip.doubts(five, asking())?.code).toBe('cannot-reach');
    expect(signFlip.doubts(five, asking({ question: 'higher' }))).toBeNull();
    const many = Array.from({ length: 21 }, (_, index) => index);
    expect(signFlip.applies(pairsOf(texts(many), texts(many.map(() => 0))), asking())?.code).toBe(
      'too-many-ways',
    );
  });

  it('mirror when the groups change places', () => {
    const values = fc.array(fc.tuple(fc.integer({ min: -40, max: 40 }), fc.integer({ min: -40, max: 40 })), {
      minLength: 2,
      maxLength: 9,
    });
    fc.assert(
      fc.property(values, drawn => {
        const [x, y] = [drawn.map(([one]) => one), drawn.map(([, other]) => other)];
        const there = signFlip.run(pairsOf(tenths(x), tenths(y)), asking({ question: 'higher' }), noTick);
        const back = signFlip.run(pairsOf(tenths(y), tenths(x)), asking({ question: 'lower' }), noTick);
        expect(there.p).toBe(back.p);
        expect(there.twoSided?.p).toBe(back.twoSided?.p);
      }),
    );
  });
});

describe('the permutation', () => {
  const group = fc.array(fc.integer({ min: -6, max: 6 }), { minLength: 2, maxLength: 5 });
  const scattering = fc.tuple(group, group).filter(groups => groups.some(values => new Set(values).size > 1));

  it('counts the ways as its definition does, ties and all', () => {
    fc.assert(
      fc.property(scattering, fc.boolean(), ([test, reference], twoSided) => {
        const asked = asking({ question: twoSided ? 'differs' : 'higher' });
        const { p } = permutation.run(twoOf(tenths(test), tenths(reference)), asked, noTick);
        expect(p).toBe(shareOfWays(test, reference, twoSided));
      }),
      { numRuns: 200 },
    );
  });

  it('is moved by no constant, however large beside the values', () => {
    fc.assert(
      fc.property(scattering, ([test, reference]) => {
        const moved = (values: readonly number[]) => values.map(value => `100000000000${value + 20}`);
        const near = permutation.run(twoOf(texts(test), texts(reference)), asking(), noTick);
        const far = permutation.run(twoOf(moved(test), moved(reference)), asking(), noTick);
        expect(far.p).toBe(near.p);
      }),
      { numRuns: 50 },
    );
  });

  it('shifts the test values by what the difference is held against', () => {
    const data = twoOf(['1.5', '1.7', '1.9', '2.4'], ['1.2', '1.1', '1.6']);
    const shifted = twoOf(['1.25', '1.45', '1.65', '2.15'], ['1.2', '1.1', '1.6']);
    expect(permutation.run(data, asking({ against: 0.25 }), noTick).p).toBe(
      permutation.run(shifted, asking(), noTick).p,
    );
  });

  // Yields of tomato plants under two fertilizers: Box, Hunter & Hunter 2005, chapter 3 (462 ways; values from memory).
  it('goes through all 462 ways of the tomatoes, and says when there are too many', () => {
    const data = twoOf(
      ['26.6', '23.7', '28.5', '14.2', '17.9', '24.3'],
      ['29.9', '11.4', '25.3', '16.5', '21.1'],
    );
    const { p, extra } = permutation.run(data, asking({ question: 'higher' }), noTick);
    expect(extra?.['ways']).toBe(462);
    expect(p).toBe(shareOfWays([266, 237, 285, 142, 179, 243], [299, 114, 253, 165, 211], false));
    const many = texts(Array.from({ length: 11 }, (_, index) => index));
    expect(permutation.applies(twoOf(many, many), asking())?.code).toBe('too-many-ways');
    const few = texts([1, 2, 4]);
    expect(permutation.doubts(twoOf(few, few), asking())?.code).toBe('cannot-reach');
  });
});
