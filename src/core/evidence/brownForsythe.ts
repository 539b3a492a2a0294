import type { Evidence, EvidenceDescriptor } from '../model/comparison';
import type { Sample } from '../model/groups';
import { fUpperTail } from '../numeric/fisherF';
import { quotient } from '../numeric/quotient';
import { CompensatedSum } from '../numeric/sums';

/** Below this the check sees a twofold SD in less than a third of all cases (simulated). */
const LEAST_N = 10;

/**
 * Levene's test about the medians: a one-way analysis of variance of |value − median|. Works on whole numbers of half a
 * step where the values allow it, so that equal deviations are exactly equal. Two or more groups with raw values.
 * Source: Brown & Forsythe 1974, Journal of the American Statistical Association 69:364–367; NIST/SEMATECH e-Handbook of
 * Statistical Methods 1.3.5.10.
 */
export const brownForsythe: EvidenceDescriptor<'brown-forsythe'> = {
  id: 'brown-forsythe',
  thresholds: [],
  references: [
    'Brown & Forsythe 1974, Journal of the American Statistical Association 69:364–367',
    'NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.5.10',
  ],
  look({ groups, settings }) {
    if (settings.measure !== 'mean' || settings.relation.kind === 'pairs') return [];
    const samples = groups.flatMap(({ sample }) => (sample === null ? [] : [sample]));
    if (samples.length < 2 || samples.length < groups.length) return [];
    const test = spreadTest(samples);
    if (test === null) return [];
    const evidence: Evidence = {
      id: 'brown-forsythe',
      level: 'note',
      facts: { smallest: Math.min(...samples.map(({ n }) => n)) },
      group: null,
      count: samples.reduce((sum, { n }) => sum + n, 0),
      cells: [],
      answers: [],
      ...test,
    };
    return [evidence];
  },
  canTell: ({ groups }) =>
    groups.length > 1 && groups.every(({ n, sample }) => sample !== null && n >= LEAST_N),
  title: t => t('spread about the medians'),
  say: ({ facts }, t) =>
    Number(facts['smallest']) < LEAST_N
      ? t(
          'With {0} values in a group even a threefold SD is seldom seen. No evidence against equal SDs is not evidence for them.',
          Number(facts['smallest']),
        )
      : t(
          'Distances from the medians compared (Brown and Forsythe). No evidence against equal SDs is not evidence for them.',
        ),
};

/** null where no group's deviations scatter: there is nothing to divide by. */
function spreadTest(samples: readonly Sample[]): Pick<Evidence, 'statistic' | 'df' | 'p'> | null {
  const deviations = samples.map(fromMedian);
  const all = deviations.reduce((sum, { length }) => sum + length, 0);
  const df = [samples.length - 1, all - samples.length] as const;
  const means = deviations.map(meanOf);
  const grand = means.reduce((sum, mean, group) => sum + (mean * (deviations[group]?.length ?? 0)) / all, 0);
  const between = new CompensatedSum();
  const within = new CompensatedSum();
  deviations.forEach((own, group) => {
    const mean = means[group] ?? 0;
    between.add(own.length * (mean - grand) ** 2);
    for (const deviation of own) within.add((deviation - mean) ** 2);
  });
  if (df[1] < 1 || within.value === 0) return null;
  const statistic = between.value / df[0] / (within.value / df[1]);
  return { statistic, df, p: fUpperTail(statistic, df[0], df[1]) };
}

/** Twice the distances from the median in a common unit (the statistic does not mind the scale): exact before rounding. */
function fromMedian({ numbers }: Sample): Float64Array {
  if (numbers.form === 'steps' || numbers.exact === null) {
    const values = numbers.form === 'steps' ? numbers.steps : numbers.offsets;
    const [low, high] = middlePair(values.slice().sort());
    const distances = new Float64Array(values.length);
    for (let i = 0; i < values.length; i += 1) distances[i] = Math.abs(2 * (values[i] ?? 0) - (low + high));
    return distances;
  }
  const [low, high] = middlePair([...numbers.exact].sort((a, b) => (a < b ? -1 : Number(a > b))));
  const unit = 10n ** BigInt(numbers.decimals) * numbers.per;
  return Float64Array.from(numbers.exact, value => {
    const twice = 2n * value - (low + high);
    return quotient(twice < 0n ? -twice : twice, unit);
  });
}

/** The one or two middle values of an ascending list of at least one. */
function middlePair<T extends number | bigint>(sorted: ArrayLike<T>): readonly [T, T] {
  const last = sorted.length - 1;
  return [sorted[Math.floor(last / 2)] as T, sorted[Math.ceil(last / 2)] as T];
}

function meanOf(values: Float64Array): number {
  const sum = new CompensatedSum();
  for (const value of values) sum.add(value);
  return sum.value / values.length;
}
